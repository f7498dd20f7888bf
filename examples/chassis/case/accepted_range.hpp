// The numbers a key accepts, in words and as a test.
#pragma once

#include <limits>
#include <string>

namespace chassis {

struct accepted_range {
  double lowest = std::numeric_limits<double>::lowest();
  double highest = (std::numeric_limits<double>::max)();
  bool lowest_excluded = false;
  std::string hint;  // e.g. the unit, or the unit mistake that is usual here

  bool holds(double value) const;
  std::string words() const;
  /// Throws case_error with the path, the value and what was expected.
  double checked(double value, const std::string& path) const;
};

accepted_range positive();
accepted_range not_negative();
accepted_range between(double lowest, double highest, std::string hint = "");

/// A number as a person writes it: shortest form that is still exact to 6 digits.
std::string plain(double value);

}  // namespace chassis
