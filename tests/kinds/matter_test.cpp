#include "convelope/kinds/matter.hpp"

#include <doctest/doctest.h>

using namespace convelope;

namespace static_test {
// The same unit and still two kinds.
using nu = typed<kinds::kinematic_viscosity>;
using alpha = typed<kinds::thermal_diffusivity>;
static_assert(std::is_same_v<nu::kind_type::unit_type, alpha::kind_type::unit_type>);
static_assert(!std::is_convertible_v<nu, alpha> && !std::is_assignable_v<alpha&, nu>);
}  // namespace static_test

TEST_CASE("properties through their gates") {
  CHECK(density(998.2 * units::kilogram_per_cubic_metre).si() == 998.2);
  CHECK(viscosity(1e-3 * units::pascal_second).si() == 1e-3);
  CHECK(expansion_coefficient(-6e-5 * units::per_kelvin).si() == -6e-5);
  CHECK(surface_tension(0.072 * units::newton_per_metre).si() == 0.072);
  CHECK(pressure(101325.0 * units::pascals).si() == 101325.0);
}

TEST_CASE("standard gravity: 9.80665 m/s2 (3rd CGPM, 1901; ISO 80000-3)") {
  CHECK(standard_gravity.si() == 9.80665);
  CHECK(gravity(standard_gravity.quantity()).si() == 9.80665);
}
