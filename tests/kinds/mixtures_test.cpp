#include "convelope/kinds/mixtures.hpp"

#include <doctest/doctest.h>

using namespace convelope;

namespace static_test {
// Three pure numbers that never mix.
using x = typed<kinds::mass_fraction>;
using S = typed<kinds::salinity>;
using d = typed<kinds::specific_gravity>;
static_assert(!std::is_convertible_v<x, S> && !std::is_assignable_v<S&, x>);
static_assert(!std::is_convertible_v<S, d> && !std::is_convertible_v<d, x>);
static_assert(!std::is_convertible_v<double, x> && !std::is_convertible_v<x, double>);
}  // namespace static_test

TEST_CASE("mixtures through their gates") {
  CHECK(mass_fraction(0.3).si() == 0.3);
  CHECK(salinity(0.035).si() == 0.035);
  CHECK(specific_gravity(0.888).si() == 0.888);
}
