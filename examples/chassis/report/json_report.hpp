// The report for a program. Keys are explained in the README of this folder.
#pragma once

#include <nlohmann/json.hpp>

#include "model/newton.hpp"
#include "model/solution.hpp"

namespace chassis {

nlohmann::ordered_json json_report(const chassis_case& c, const solution& s,
                                   const newton_result& run);

}  // namespace chassis
