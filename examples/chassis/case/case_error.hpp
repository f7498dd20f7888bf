// The one message a bad input gives: where it stands, what it is, what was expected.
#pragma once

#include <stdexcept>
#include <string>

namespace chassis {

class case_error : public std::runtime_error {
 public:
  case_error(const std::string& where, const std::string& what_is_wrong)
      : std::runtime_error(where + ": " + what_is_wrong) {}
};

}  // namespace chassis
