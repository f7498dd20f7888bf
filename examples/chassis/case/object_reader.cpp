#include "case/object_reader.hpp"

#include <algorithm>
#include <cmath>

namespace chassis {
namespace {

std::string shown(const nlohmann::json& value) {
  if (value.is_object()) return "an object";
  if (value.is_array()) return "a list";
  return value.dump(-1, ' ', false, nlohmann::json::error_handler_t::replace);
}

}  // namespace

std::string joined(const std::string& path, std::string_view key) {
  std::string result = path + "/";
  for (const char c : key) {
    if (c == '~') {
      result += "~0";
    } else if (c == '/') {
      result += "~1";
    } else {
      result += c;
    }
  }
  return result;
}

object_reader::object_reader(const nlohmann::json& value, std::string path,
                             std::initializer_list<std::string_view> known_keys)
    : value_(value), path_(std::move(path)) {
  if (!value_.is_object()) {
    throw case_error(path_.empty() ? "/" : path_,
                     shown(value_) + " stands here; expected an object");
  }
  for (const auto& item : value_.items()) {
    if (std::find(known_keys.begin(), known_keys.end(), item.key()) != known_keys.end()) continue;
    std::string expected;
    for (const auto known : known_keys) {
      expected += (expected.empty() ? "" : ", ") + std::string(known);
    }
    throw case_error(path_of(item.key()), "unknown key; expected one of " + expected);
  }
}

bool object_reader::has(std::string_view key) const {
  return value_.find(std::string(key)) != value_.end();
}

const nlohmann::json& object_reader::required(std::string_view key,
                                              const std::string& expected) const {
  const auto found = value_.find(std::string(key));
  if (found == value_.end()) throw case_error(path_of(key), "missing; expected " + expected);
  return *found;
}

double object_reader::number(std::string_view key, const accepted_range& range) const {
  const auto& value = required(key, range.words());
  if (!value.is_number()) {
    throw case_error(path_of(key), shown(value) + " is not a number; expected " + range.words());
  }
  return range.checked(value.get<double>(), path_of(key));
}

double object_reader::number(std::string_view key, const accepted_range& range,
                             double if_missing) const {
  return has(key) ? number(key, range) : if_missing;
}

std::size_t object_reader::whole_number(std::string_view key, const accepted_range& range) const {
  const double value = number(key, range);
  if (value != std::floor(value)) {
    throw case_error(path_of(key),
                     plain(value) + " is not a whole number; expected " + range.words());
  }
  return static_cast<std::size_t>(value);
}

std::string object_reader::text(std::string_view key) const {
  const auto& value = required(key, "a text");
  if (!value.is_string()) {
    throw case_error(path_of(key), shown(value) + " is not a text; expected a text in quotes");
  }
  auto given = value.get<std::string>();
  if (given.empty()) throw case_error(path_of(key), "the text is empty; expected some letters");
  return given;
}

const nlohmann::json& object_reader::object(std::string_view key) const {
  return required(key, "an object");  // its own reader checks that it is one
}

const nlohmann::json& object_reader::list(std::string_view key, std::size_t least_count) const {
  const std::string expected =
      "a list of at least " + std::to_string(least_count) + (least_count == 1 ? " item" : " items");
  const auto& value = required(key, expected);
  if (!value.is_array()) {
    throw case_error(path_of(key), shown(value) + " is not a list; expected " + expected);
  }
  if (value.size() < least_count) {
    throw case_error(path_of(key), "the list has " + std::to_string(value.size()) +
                                       (value.size() == 1 ? " item" : " items") + "; expected " +
                                       expected);
  }
  return value;
}

}  // namespace chassis
