// A case file to a checked case. Throws case_error with one message on the first fault.
#pragma once

#include <string>

#include "case/case.hpp"

namespace chassis {

chassis_case read_case_file(const std::string& file);

/// `folder` is where CSV files named in the case are looked for.
chassis_case read_case_text(const std::string& text, const std::string& file,
                            const std::string& folder);

}  // namespace chassis
