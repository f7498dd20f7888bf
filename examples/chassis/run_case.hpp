// One case from file to reports.
#pragma once

#include <iosfwd>

#include "model/wall_model.hpp"
#include "options.hpp"

namespace chassis {

/// Prints progress and the report, writes the files. Throws case_error.
void run_case(const options& o, const wall_model& walls, std::ostream& out);

}  // namespace chassis
