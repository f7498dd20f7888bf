#ifndef CONVELOPE_TESTS_FLUIDS_CLOSE_TO_HPP
#define CONVELOPE_TESTS_FLUIDS_CLOSE_TO_HPP

#include <cmath>

/// A sanitizer that stops at 1.0 / 0.0, which otherwise is infinite and no crash.
#if defined(__has_feature)
#if __has_feature(undefined_behavior_sanitizer)
inline constexpr bool zero_divisor_stops = true;
#else
inline constexpr bool zero_divisor_stops = false;
#endif
#else
inline constexpr bool zero_divisor_stops = false;
#endif

/// In positive form: false where a number is NaN.
inline bool close_to(double seen, double expected, double relative, double absolute = 0.0) {
  return std::fabs(seen - expected) <= relative * std::fabs(expected) + absolute;
}

#endif
