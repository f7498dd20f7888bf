#include "convelope/fluids/dry_air.hpp"

#include <doctest/doctest.h>

#include <limits>

#include "close_to.hpp"

using namespace convelope;

static_assert(fluid<dry_air> && fluid<dry_air_fast>);
static_assert(dry_air::expansion_at == expansion_rule::ambient);

namespace {
verdict<std::uint64_t> seen(double T, double p) {
  CHECK(dry_air{}.check(T, p) == dry_air_fast{}.check(T, p));
  return verdict<std::uint64_t>(dry_air{}.check(T, p));
}
}  // namespace

TEST_CASE("dry air is an ideal gas") {
  for (const double T : {200.0, 288.15, 700.0, 2000.0}) {
    for (const double p : {1e3, 101325.0, 3e5}) {
      CAPTURE(T);
      CAPTURE(p);
      const auto v = dry_air{}.values(T, p);
      CHECK(close_to(v.density, p * 28.9586e-3 / (8.31451 * T), 1e-14));
      CHECK(close_to(v.expansion, 1.0 / T, 1e-15));
    }
  }
}

TEST_CASE("dry air: inside its envelope, ends included, nothing is flagged") {
  for (const double T : {200.0, 300.0, 2000.0}) {
    for (const double p : {1e3, 101325.0, 3e5}) CHECK(seen(T, p).bits() == 0);
  }
}

TEST_CASE("dry air: each limit is flagged on its side, and no other") {
  using detail::word::of_fluid;
  CHECK(seen(199.9, 1e5).bits() == of_fluid(0, side::below));
  CHECK(seen(2000.1, 1e5).bits() == of_fluid(0, side::above));
  CHECK(seen(300.0, 999.0).bits() == of_fluid(1, side::below));
  CHECK(seen(300.0, 3.001e5).bits() == of_fluid(1, side::above));
  CHECK(seen(0.0, 1e5).bits() == of_fluid(0, side::below));
  CHECK(seen(-40.0, -1.0).bits() == (of_fluid(0, side::below) | of_fluid(1, side::below)));
}

TEST_CASE("dry air: what is not finite is flagged and never crashes") {
  const volatile double nan = std::numeric_limits<double>::quiet_NaN();
  const volatile double infinite = std::numeric_limits<double>::infinity();
  for (const double bad : {double(nan), double(infinite), -double(infinite)}) {
    CHECK_FALSE(seen(bad, 1e5).finite_input());
    CHECK_FALSE(seen(300.0, bad).finite_input());
    CHECK(seen(300.0, bad).fluid_outside());
    CHECK_FALSE(seen(300.0, bad).fluid_crossed(0, side::below));
    if (zero_divisor_stops) continue;
    (void)dry_air{}.values(bad, 1e5);
    (void)dry_air_fast{}.values(bad, 1e5);
  }
  for (const double T : {-600.0, -300.0, -1e-300, 0.0, 1e-300, 1e300}) {
    CHECK_FALSE(seen(T, 1e5).inside());
    if (zero_divisor_stops) continue;
    (void)dry_air{}.values(T, 1e5);
    (void)dry_air_fast{}.values(T, 1e5);
  }
}

TEST_CASE("dry air, fast: within its stated error of dry air over the whole envelope") {
  double cp = 0.0;
  double k = 0.0;
  double mu = 0.0;
  for (int i = 0; i <= 18000; ++i) {
    const double T = 200.0 + 0.1 * i;
    const auto exact = dry_air{}.values(T, 101325.0);
    const auto fast = dry_air_fast{}.values(T, 101325.0);
    const auto worst = [](double& so_far, double a, double b) {
      const double e = std::fabs(a / b - 1.0);
      if (!(e <= so_far)) so_far = e;
    };
    worst(cp, fast.specific_heat, exact.specific_heat);
    worst(k, fast.conductivity, exact.conductivity);
    worst(mu, fast.viscosity, exact.viscosity);
    REQUIRE(fast.density == exact.density);
    REQUIRE(fast.expansion == exact.expansion);
  }
  MESSAGE("largest error: cp " << cp << ", k " << k << ", mu " << mu);
  // The bound of the documentation is the largest of the three: no less, hardly more.
  CHECK(cp < 7.7e-5);
  CHECK(k < 7.7e-5);
  CHECK(mu < 7.7e-5);
  CHECK(std::fmax(cp, std::fmax(k, mu)) > 7.6e-5);
}

TEST_CASE("dry air, fast: its slopes, as a part of value over temperature") {
  using number = dual<double, 1>;
  double worst = 0.0;
  for (int i = 0; i <= 1800; ++i) {
    const number T = number::variable(200.0 + i);
    const number p(101325.0);
    const auto exact = dry_air{}.values(T, p);
    const auto fast = dry_air_fast{}.values(T, p);
    const auto compare = [&](const number& a, const number& b) {
      worst = std::fmax(worst, std::fabs(a.slope[0] - b.slope[0]) * T.value / b.value);
    };
    compare(fast.specific_heat, exact.specific_heat);
    compare(fast.conductivity, exact.conductivity);
    compare(fast.viscosity, exact.viscosity);
  }
  MESSAGE("largest slope error " << worst);
  CHECK(worst < 3e-3);
}

TEST_CASE("dry air tells where it comes from") {
  const fluid_info* info = dry_air{}.info();
  CHECK(info->limit_count == 2);
  CHECK(info->limits[0].low == 200.0);
  CHECK(info->limits[0].high == 2000.0);
  CHECK(info->limits[1].high == 3e5);
  CHECK(info->source->year == 2004);
  CHECK(dry_air_fast{}.info() != info);
  const auto state = state_of(dry_air{}, typed<kinds::film_temperature>::from_si(300.0),
                              typed<kinds::pressure>::from_si(1e5));
  CHECK(state.density().inside());
  CHECK(state.viscosity().scatter() == doctest::Approx(0.02));
  CHECK(state.prandtl_number().fluid() == info);
}
