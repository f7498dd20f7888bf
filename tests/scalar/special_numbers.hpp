#pragma once

#include <limits>

/// Numbers at the edges of a floating-point type T, by whether they are finite.
template <class T>
struct special {
  using limits = std::numeric_limits<T>;
  static constexpr T finite[] = {T(0),
                                 -T(0),
                                 limits::denorm_min(),
                                 -limits::min(),
                                 limits::max(),
                                 limits::lowest(),
                                 T(1),
                                 limits::epsilon()};
  static constexpr T not_finite[] = {limits::quiet_NaN(), -limits::quiet_NaN(), limits::infinity(),
                                     -limits::infinity()};
};
