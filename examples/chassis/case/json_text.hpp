// JSON text to a value; a fault is told with its line and column.
#pragma once

#include <nlohmann/json.hpp>
#include <string>

namespace chassis {

/// `file` is only used in messages. A key that stands twice in one object is refused too.
nlohmann::json parsed_json(const std::string& text, const std::string& file);

}  // namespace chassis
