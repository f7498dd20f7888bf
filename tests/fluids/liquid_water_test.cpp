#include "convelope/fluids/liquid_water.hpp"

#include <doctest/doctest.h>

#include <limits>

#include "close_to.hpp"

using namespace convelope;

static_assert(fluid<liquid_water>);
static_assert(liquid_water::expansion_at == expansion_rule::film);

namespace {
using detail::word::of_fluid;

verdict<std::uint64_t> seen(double T, double p) {
  return verdict<std::uint64_t>(liquid_water{}.check(T, p));
}
double expansion(double T, double p) { return liquid_water{}.values(T, p).expansion; }
}  // namespace

TEST_CASE("liquid water: inside its envelope nothing is flagged") {
  for (const double T : {273.15, 277.0, 300.0, 373.15, 500.0, 623.15}) {
    CAPTURE(T);
    const double p_sat = liquid_water::saturation_pressure(T);
    for (const double p : {p_sat, 0.9998 * p_sat, 20e6, 100e6}) CHECK(seen(T, p).bits() == 0);
  }
}

TEST_CASE("liquid water: each limit is flagged on its side, and no other") {
  CHECK(seen(273.1, 1e5).bits() == of_fluid(0, side::below));
  CHECK(seen(623.2, 50e6).bits() == of_fluid(0, side::above));
  CHECK(seen(300.0, 1.001e8).bits() == of_fluid(1, side::above));
  CHECK(seen(300.0, 3500.0).bits() == of_fluid(2, side::below));
  CHECK(seen(300.0, 3570.0).bits() == 0);
  CHECK(seen(380.0, 101325.0).bits() == of_fluid(2, side::below));  // it would boil
  CHECK(seen(373.1, 101325.0).bits() == 0);
  CHECK(seen(600.0, 12.3e6).bits() == of_fluid(2, side::below));
  CHECK(seen(600.0, 12.4e6).bits() == 0);
  CHECK(seen(300.0, -1.0).bits() == (of_fluid(1, side::below) | of_fluid(2, side::below)));
  // Outside the temperature limits the saturation line is taken at the nearest end.
  CHECK(seen(200.0, 600.0).bits() == (of_fluid(0, side::below) | of_fluid(2, side::below)));
  CHECK(seen(200.0, 620.0).bits() == of_fluid(0, side::below));
  CHECK(seen(650.175, 16e6).bits() == (of_fluid(0, side::above) | of_fluid(2, side::below)));
  CHECK(seen(5000.0, 17e6).bits() == of_fluid(0, side::above));
}

TEST_CASE("liquid water: what is not finite is flagged and never crashes") {
  const volatile double nan = std::numeric_limits<double>::quiet_NaN();
  const volatile double infinite = std::numeric_limits<double>::infinity();
  for (const double bad : {double(nan), double(infinite), -double(infinite)}) {
    CHECK_FALSE(seen(bad, 1e8).finite_input());
    CHECK_FALSE(seen(300.0, bad).finite_input());
    CHECK(seen(300.0, bad).fluid_outside());
    CHECK_FALSE(seen(300.0, bad).fluid_crossed(0, side::below));
    CHECK_FALSE(seen(bad, 5e7).fluid_crossed(2, side::below));
    if (zero_divisor_stops) continue;
    (void)liquid_water{}.values(bad, 1e5);
    (void)liquid_water{}.values(300.0, bad);
  }
  for (const double T : {-300.0, 0.0, 1e-300, 650.175, 1386.0 / 1.222, 1e300}) {
    CHECK_FALSE(seen(T, 1e5).inside());
    if (!zero_divisor_stops) (void)liquid_water{}.values(T, 1e5);
  }
}

TEST_CASE("liquid water: cold water contracts when it is warmed") {
  // Density maximum at 1 atm: 3.983 degC (Tanaka et al. 2001, Metrologia 38, 301-309).
  double low = 275.0;
  double high = 280.0;
  CHECK(expansion(low, 101325.0) < 0.0);
  CHECK(expansion(high, 101325.0) > 0.0);
  for (int i = 0; i < 50; ++i) {
    const double middle = 0.5 * (low + high);
    (expansion(middle, 101325.0) < 0.0 ? low : high) = middle;
  }
  MESSAGE("density maximum at " << low << " K");
  CHECK(std::fabs(low - 277.133) < 0.03);  // IF97 has it at 277.113 K
  // Pressure moves the maximum down; at 30 MPa it has left the liquid.
  CHECK(expansion(273.15, 30e6) > 0.0);
  CHECK(expansion(273.15, 101325.0) == doctest::Approx(-6.8e-5).epsilon(0.01));
}

TEST_CASE("liquid water: superheated, the values go on smoothly") {
  const auto before = liquid_water{}.values(372.0, 101325.0);
  const auto after = liquid_water{}.values(376.0, 101325.0);
  const auto middle = liquid_water{}.values(374.0, 101325.0);
  CHECK(close_to(middle.density, 0.5 * (before.density + after.density), 1e-5));
  CHECK(close_to(middle.conductivity, 0.5 * (before.conductivity + after.conductivity), 1e-4));
}

TEST_CASE("liquid water tells where it comes from") {
  const fluid_info* info = liquid_water{}.info();
  CHECK(info->limit_count == 3);
  CHECK(info->limits[0].low == 273.15);
  CHECK(info->limits[0].high == 623.15);
  CHECK(info->limits[1].high == 100e6);
  CHECK(info->limits[2].low == 0.99975);
  const auto state = state_of(liquid_water{}, typed<kinds::bulk_temperature>::from_si(380.0),
                              typed<kinds::pressure>::from_si(1e5));
  CHECK_FALSE(state.density().inside());
  CHECK(state.density().verdict().fluid_crossed(2, side::below));
}
