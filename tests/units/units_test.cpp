#include "convelope/units/units.hpp"

#include <doctest/doctest.h>

#include <boost/units/systems/si/prefixes.hpp>
#include <boost/units/systems/temperature/celsius.hpp>

using namespace convelope;
namespace bu = boost::units;
namespace si = boost::units::si;

namespace {

// The unit constants against units put together from Boost's own: an assignment of another
// dimension does not compile.
template <class A, class B>
constexpr bool same_unit(const A&, const B&) {
  return std::is_same_v<decltype(1.0 * A()), decltype(1.0 * B())>;
}

}  // namespace

namespace static_test {

using namespace convelope::units;
static_assert(same_unit(metre, si::meter));
static_assert(same_unit(metre_per_second, si::meter / si::second));
static_assert(same_unit(pascals, si::newton / (si::meter * si::meter)));
static_assert(same_unit(kelvin_difference, si::kelvin));
static_assert(same_unit(radian_per_second, si::radian / si::second));
static_assert(same_unit(kilogram_per_cubic_metre, si::kilogram / si::cubic_meter));
static_assert(same_unit(pascal_second, si::pascal* si::second));
static_assert(same_unit(watt_per_square_metre, si::watt / si::square_meter));
static_assert(same_unit(watt_per_square_metre_kelvin, si::watt / (si::square_meter * si::kelvin)));
static_assert(same_unit(watt_per_metre_kelvin, si::watt / (si::meter * si::kelvin)));
static_assert(same_unit(joule_per_kilogram_kelvin, si::joule / (si::kilogram * si::kelvin)));
static_assert(same_unit(square_metre_per_second, si::square_meter / si::second));
static_assert(same_unit(per_kelvin, si::dimensionless() / si::kelvin));
static_assert(same_unit(square_metre_kelvin_per_watt, si::square_meter* si::kelvin / si::watt));
static_assert(same_unit(kilogram_per_square_metre_second,
                        si::kilogram / (si::square_meter * si::second)));
static_assert(same_unit(kilogram_per_second, si::kilogram / si::second));
static_assert(same_unit(newton_per_metre, si::newton / si::meter));
static_assert(!same_unit(watt_per_metre_kelvin, watt_per_square_metre_kelvin));

// A point and a difference are different types, and no number is either.
using point = bu::quantity<unit_types::absolute_temperature>;
using difference = bu::quantity<si::temperature>;
static_assert(std::is_same_v<decltype(kelvin(300.0)), point>);
static_assert(std::is_same_v<decltype(celsius(20.0)), point>);
static_assert(!std::is_convertible_v<point, difference> && !std::is_convertible_v<double, point>);

}  // namespace static_test

TEST_CASE("units: a quantity of Boost's own names can be assigned") {
  const bu::quantity<unit_types::heat_flux> q = 1000.0 * si::watt / si::square_meter;
  CHECK(q.value() == 1000.0);
  const bu::quantity<unit_types::specific_heat> cp = 4180.0 * si::joule / si::kilogram / si::kelvin;
  CHECK(cp.value() == 4180.0);
  // A scaled unit is converted by Boost, on request.
  const bu::quantity<unit_types::diffusivity> nu(15.0 * si::micro * si::square_meter / si::second);
  CHECK(nu.value() == doctest::Approx(15e-6));
}

TEST_CASE("units: products come out in the unit they should") {
  using namespace convelope::units;
  const bu::quantity<unit_types::heat_flux> q =
      (25.0 * watt_per_square_metre_kelvin) * (4.0 * kelvin_difference);
  CHECK(q.value() == 100.0);
  const bu::quantity<unit_types::film_coefficient> h =
      (0.5 * watt_per_metre_kelvin) / (0.02 * metre);
  CHECK(h.value() == 25.0);
  const bu::quantity<unit_types::area_resistance> r = 1.0 / h;
  CHECK(r.value() == 0.04);
  const bu::quantity<unit_types::diffusivity> alpha =
      (0.6 * watt_per_metre_kelvin) /
      ((1000.0 * kilogram_per_cubic_metre) * (4000.0 * joule_per_kilogram_kelvin));
  CHECK(alpha.value() == doctest::Approx(1.5e-7));
  const bu::quantity<unit_types::mass_flow> m =
      (5.0 * kilogram_per_square_metre_second) * (2.0 * si::square_meter);
  CHECK(m.value() == 10.0);
}

TEST_CASE("kelvin and celsius: ITS-90, t/degC = T/K - 273.15") {
  CHECK(kelvin(330.5).value() == 330.5);
  CHECK(celsius(0.0).value() == 273.15);
  CHECK(celsius(0.01).value() == doctest::Approx(273.16).epsilon(1e-15));  // triple point of water
  CHECK(celsius(-273.15).value() == 0.0);
  CHECK(celsius(25.0F).value() == doctest::Approx(298.15F));
  static_assert(std::is_same_v<decltype(celsius(25.0F))::value_type, float>);
  // Boost's own conversion between the two scales.
  const bu::quantity<unit_types::absolute_temperature> boost_25(
      25.0 * bu::absolute<bu::celsius::temperature>());
  CHECK(celsius(25.0).value() == doctest::Approx(boost_25.value()).epsilon(1e-14));
  CHECK((celsius(60.0) - celsius(20.0)).value() == doctest::Approx(40.0));
}
