// The report for a person at a terminal.
#pragma once

#include <iosfwd>

#include "case/case.hpp"
#include "model/newton.hpp"
#include "model/solution.hpp"

namespace chassis {

void print_report(std::ostream& out, const chassis_case& c, const solution& s,
                  const newton_result& run);

/// What a reader of any of the reports has to know before relying on it.
const char* cautions();

}  // namespace chassis
