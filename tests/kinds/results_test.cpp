#include "convelope/kinds/results.hpp"

#include <doctest/doctest.h>

#include "convelope/groups/film.hpp"

using namespace convelope;

namespace static_test {
// Three kinds in W/(m2 K).
using mean = typed<kinds::film_coefficient>;
using local = typed<kinds::local_film_coefficient>;
using slope = typed<kinds::flux_slope>;
static_assert(!std::is_convertible_v<mean, local> && !std::is_convertible_v<local, mean>);
static_assert(!std::is_convertible_v<mean, slope> && !std::is_convertible_v<slope, mean>);
static_assert(std::is_same_v<kind_of<film_coefficient>, kinds::film_coefficient>);
static_assert(std::is_same_v<kind_of<local_film_coefficient>, kinds::local_film_coefficient>);
}  // namespace static_test

TEST_CASE("results through their gates") {
  using namespace convelope::units;
  CHECK(heat_flux(1000.0 * watt_per_square_metre).si() == 1000.0);
  CHECK(film_coefficient(25.0 * watt_per_square_metre_kelvin).si() == 25.0);
  CHECK(local_film_coefficient(25.0 * watt_per_square_metre_kelvin).si() == 25.0);
  CHECK(area_resistance(1.0 / (25.0 * watt_per_square_metre_kelvin)).si() == 0.04);
  CHECK(mass_flux(5.0 * kilogram_per_square_metre_second).si() == 5.0);
  CHECK(mass_flow(0.1 * kilogram_per_second).si() == 0.1);
  // A quotient of Boost.Units finds its way in.
  const auto q = 1000.0 * watt_per_square_metre;
  CHECK(film_coefficient(q / (40.0 * kelvin_difference)).si() == 25.0);
}
