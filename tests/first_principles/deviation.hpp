#pragma once

// How far a correlation stands from a solution over a range of its inputs, as a two-sided check:
// both ends of the band of deviations have to lie where stated, so that a constant that moves them
// fails.

#include <doctest/doctest.h>

#include <algorithm>
#include <initializer_list>

namespace first_principles {

struct interval {
  double low, high;
};

/// Least and greatest deviation, per cent, of ratio(x) from 1 over the points.
template <class Ratio>
interval deviations(std::initializer_list<double> points, const Ratio& ratio) {
  interval band{1e300, -1e300};
  for (const double x : points) {
    const double deviation = 100.0 * (ratio(x) - 1.0);
    band.low = (std::min)(band.low, deviation);
    band.high = (std::max)(band.high, deviation);
  }
  return band;
}

/// Both ends of the band, per cent, to within so many per cent.
inline void check_band(const interval& band, double least, double greatest, double within = 0.02) {
  CHECK(band.low > least - within);
  CHECK(band.low < least + within);
  CHECK(band.high > greatest - within);
  CHECK(band.high < greatest + within);
}

}  // namespace first_principles
