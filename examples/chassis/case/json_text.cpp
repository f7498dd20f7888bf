#include "case/json_text.hpp"

#include <algorithm>
#include <cstddef>
#include <set>
#include <string>
#include <vector>

#include "case/case_error.hpp"
#include "case/object_reader.hpp"

namespace chassis {
namespace {

// Follows the parser and remembers which keys the open objects already have.
class duplicate_watch {
 public:
  bool operator()(int /*depth*/, nlohmann::json::parse_event_t event, nlohmann::json& value) {
    using event_t = nlohmann::json::parse_event_t;
    switch (event) {
      case event_t::object_start:
      case event_t::array_start:
        next_item();
        open_.push_back({event == event_t::array_start, 0, {}, {}});
        break;
      case event_t::object_end:
      case event_t::array_end:
        open_.pop_back();
        break;
      case event_t::key:
        open_.back().key = value.get<std::string>();
        if (!open_.back().seen.insert(open_.back().key).second) {
          throw case_error(path(), "this key stands twice; expected it once");
        }
        break;
      case event_t::value:
        next_item();
        break;
    }
    return true;
  }

 private:
  struct level {
    bool is_list;
    std::size_t count;
    std::string key;
    std::set<std::string> seen;
  };

  void next_item() {
    if (!open_.empty() && open_.back().is_list) ++open_.back().count;
  }

  std::string path() const {
    std::string result;
    for (const auto& at : open_) {
      result = joined(result, at.is_list ? std::to_string(at.count - 1) : at.key);
    }
    return result;
  }

  std::vector<level> open_;
};

std::string line_and_column(const std::string& text, std::size_t byte) {
  const std::size_t end = (std::min)(byte == 0 ? 0 : byte - 1, text.size());
  const auto upto = text.begin() + static_cast<std::ptrdiff_t>(end);
  const auto line = 1 + std::count(text.begin(), upto, '\n');
  const std::size_t newline = text.rfind('\n', end == 0 ? 0 : end - 1);
  const std::size_t column = line == 1 ? end + 1 : end - newline;
  return "line " + std::to_string(line) + ", column " + std::to_string(column);
}

// The parser's own words without its tag and its position, on one line.
std::string reason(const std::string& what) {
  std::size_t from = what.find("syntax error");
  if (from == std::string::npos) {
    from = what.find("] ");
    from = from == std::string::npos ? 0 : from + 2;
  }
  std::string words = what.substr(from);
  std::replace(words.begin(), words.end(), '\n', ' ');
  return words;
}

}  // namespace

nlohmann::json parsed_json(const std::string& text, const std::string& file) {
  try {
    duplicate_watch watch;
    return nlohmann::json::parse(
        text, [&watch](int depth, nlohmann::json::parse_event_t event, nlohmann::json& value) {
          return watch(depth, event, value);
        });
  } catch (const nlohmann::json::parse_error& fault) {
    throw case_error(file + ", " + line_and_column(text, fault.byte),
                     "not valid JSON; " + reason(fault.what()));
  } catch (const nlohmann::json::exception& fault) {
    throw case_error(file, "not valid JSON; " + reason(fault.what()));
  }
}

}  // namespace chassis
