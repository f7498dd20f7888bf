// Reads one JSON object and knows the path that leads to it, so that every message can name the
// wrong key. Unknown keys are refused first: a misspelt key is better reported as unknown than as
// missing.
#pragma once

#include <initializer_list>
#include <nlohmann/json.hpp>
#include <optional>
#include <string>
#include <string_view>
#include <utility>
#include <vector>

#include "case/accepted_range.hpp"
#include "case/case_error.hpp"

namespace chassis {

/// `path` followed by `key` as a JSON pointer (RFC 6901).
std::string joined(const std::string& path, std::string_view key);

class object_reader {
 public:
  object_reader(const nlohmann::json& value, std::string path,
                std::initializer_list<std::string_view> known_keys);

  bool has(std::string_view key) const;
  std::string path_of(std::string_view key) const { return joined(path_, key); }

  double number(std::string_view key, const accepted_range& range) const;
  double number(std::string_view key, const accepted_range& range, double if_missing) const;
  std::size_t whole_number(std::string_view key, const accepted_range& range) const;
  std::string text(std::string_view key) const;

  /// One of a few words.
  template <class Choice>
  Choice choice(std::string_view key,
                std::initializer_list<std::pair<std::string_view, Choice>> words) const {
    std::string expected;
    for (const auto& word : words) {
      expected += (expected.empty() ? "\"" : " or \"") + std::string(word.first) + "\"";
    }
    const std::string given = text(key);
    for (const auto& word : words) {
      if (word.first == given) return word.second;
    }
    throw case_error(path_of(key), "\"" + given + "\" is unknown; expected " + expected);
  }

  const nlohmann::json& object(std::string_view key) const;
  const nlohmann::json& list(std::string_view key, std::size_t least_count) const;

 private:
  const nlohmann::json& required(std::string_view key, const std::string& expected) const;

  const nlohmann::json& value_;
  std::string path_;
};

}  // namespace chassis
