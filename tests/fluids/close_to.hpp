#ifndef CONVELOPE_TESTS_FLUIDS_CLOSE_TO_HPP
#define CONVELOPE_TESTS_FLUIDS_CLOSE_TO_HPP

#include <cmath>

/// In positive form: false where a number is NaN.
inline bool close_to(double seen, double expected, double relative, double absolute = 0.0) {
  return std::fabs(seen - expected) <= relative * std::fabs(expected) + absolute;
}

#endif
