// Component lists, from JSON or from a CSV file with the same column names.
#pragma once

#include <nlohmann/json.hpp>
#include <string>
#include <vector>

#include "case/case.hpp"

namespace chassis {

/// A component and the place in the input it came from, for messages of later checks.
struct placed_component {
  component part;
  std::string path;
};

std::vector<placed_component> components_from_json(const nlohmann::json& list,
                                                   const std::string& path);
std::vector<placed_component> components_from_csv(const std::string& text, const std::string& file,
                                                  const std::string& path);

/// Every component on the board, none over another one on the same face, no name twice.
void check_placement(const std::vector<placed_component>& parts, double board_length,
                     double board_width);

}  // namespace chassis
