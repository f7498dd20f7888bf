#include "convelope/fluids/liquid_water_fast.hpp"

#include <doctest/doctest.h>

#include <limits>

#include "convelope/fluids/liquid_water.hpp"
#include "fluid_numbers.hpp"
#include "fluid_slopes.hpp"

using namespace convelope;

static_assert(fluid<liquid_water_fast>);
static_assert(liquid_water_fast::expansion_at == expansion_rule::film);

namespace {
using detail::word::of_fluid;

verdict<std::uint64_t> seen(double T, double p) {
  return verdict<std::uint64_t>(liquid_water_fast{}.check(T, p));
}
double expansion(double T, double p) { return liquid_water_fast{}.values(T, p).expansion; }

// The last two lie outside.
constexpr fluid_numbers::point points[8] = {{273.15, 1e5}, {277.0, 2e5},     {300.0, 1e5},
                                            {320.0, 3e5},  {350.0, 1e5},     {383.0, 2e5},
                                            {270.0, 1e5},  {380.0, 101325.0}};
}  // namespace

TEST_CASE("fast water: slopes and expansion against 50 digits") {
  for (const double T : {273.15, 276.0, 277.13, 280.0, 300.0, 340.0, 372.0, 383.15}) {
    for (const double p : {1e3, 1e5, 101325.0, 3e5}) {
      fluid_slopes::against_50_digits(liquid_water_fast{}, T, p, 2e-13);
      const fluid_slopes::precise x =
          liquid_water_fast{}.values(fluid_slopes::precise(T), fluid_slopes::precise(p)).density;
      const auto by_T = fluid_slopes::slope(liquid_water_fast{}, T, p, false);
      CHECK(close_to(expansion(T, p), static_cast<double>(-by_T.density / x), 1e-11, 1e-15));
      CHECK(close_to(liquid_water_fast{}.expansion(T, p), expansion(T, p), 1e-12, 1e-17));
    }
  }
}

TEST_CASE("fast water: the published derivatives are those of the volume, in 50 digits") {
  using precise = fluid_slopes::precise;
  namespace water = detail::sr6_08;
  for (const double T : {253.15, 260.0, 277.0, 298.15, 340.0, 383.15}) {
    CAPTURE(T);
    const precise h = 1e-15;
    const auto at = [](const precise& t) { return water::poles<precise>(t); };
    const auto slope = [&](auto f) {
      return static_cast<double>((f(precise(T) + h) - f(precise(T) - h)) / (2 * h));
    };
    const water::poles<double> x(T);
    CHECK(close_to(water::volume_T(x), slope([&](precise t) { return water::volume(at(t)); }),
                   1e-10, 1e-17));
    CHECK(close_to(water::volume_TT(x), slope([&](precise t) { return water::volume_T(at(t)); }),
                   1e-10));
    CHECK(close_to(water::volume_pT(x), slope([&](precise t) { return water::volume_p(at(t)); }),
                   1e-9));
    CHECK(close_to(water::entropy(T), -slope([&](precise t) { return water::gibbs_energy(t); }),
                   1e-9, 1e-9));
    CHECK(close_to(water::specific_heat(T, x),
                   T * slope([&](precise t) { return water::entropy(t); }), 1e-10));
  }
}

TEST_CASE("fast water on every number type") {
  fluid_numbers::on_every_number(liquid_water_fast{}, points, 2e-4);
}

TEST_CASE("fast water agrees with the equation for all pressures") {
  for (double T = 273.15; T <= 383.15; T += 1.0) {
    for (const double p : {101325.0, 1.5e5, 3e5}) {
      if (!seen(T, p).inside()) continue;
      CAPTURE(T);
      CAPTURE(p);
      const auto a = liquid_water_fast{}.values(T, p);
      const auto b = liquid_water{}.values(T, p);
      CHECK(close_to(a.density, b.density, 2e-5));
      CHECK(close_to(a.specific_heat, b.specific_heat, 7e-4));
      CHECK(close_to(a.conductivity, b.conductivity, 3e-4));
      CHECK(close_to(a.viscosity, b.viscosity, 3e-4));
      CHECK(close_to(a.expansion, b.expansion, 0.0, 6e-7));
    }
  }
}

TEST_CASE("fast water: cold water contracts when it is warmed") {
  // Density maximum at 1 atm: 3.983 degC (Tanaka et al. 2001, Metrologia 38, 301-309).
  double low = 275.0;
  double high = 280.0;
  CHECK(expansion(low, 101325.0) < 0.0);
  CHECK(expansion(high, 101325.0) > 0.0);
  for (int i = 0; i < 50; ++i) {
    const double middle = 0.5 * (low + high);
    (expansion(middle, 101325.0) < 0.0 ? low : high) = middle;
  }
  CHECK(std::fabs(low - 277.133) < 0.01);
  // Continuous and rising through it, with the slope it states.
  for (double T = 273.15; T < 281.0; T += 0.05) {
    const double rise = expansion(T + 0.05, 101325.0) - expansion(T, 101325.0);
    CHECK(rise > 0.05 * 1.3e-5);
    CHECK(rise < 0.05 * 1.9e-5);
  }
  const double slope = (expansion(low + 0.01, 101325.0) - expansion(low - 0.01, 101325.0)) / 0.02;
  CHECK(close_to(liquid_water_fast::expansion_slope, slope, 0.01));
}

TEST_CASE("fast water: density of water at 1 atm, Tanaka et al. 2001") {
  // Metrologia 38, 301-309 (from memory): the recommended table
  struct row {
    double t, rho;
  };
  for (const row& r : {row{0, 999.8428}, row{4, 999.9749}, row{10, 999.7025}, row{20, 998.2067},
                       row{30, 995.6488}, row{40, 992.2152}}) {
    CAPTURE(r.t);
    CHECK(close_to(liquid_water_fast{}.values(273.15 + r.t, 101325.0).density, r.rho, 2e-6));
  }
}

TEST_CASE("fast water: each limit is flagged on its side, and no other") {
  for (const double T : {273.15, 277.0, 300.0, 372.0}) {
    CHECK(seen(T, 101325.0).bits() == 0);
    CHECK(seen(T, 3e5).bits() == 0);
  }
  CHECK(seen(383.15, 1.5e5).bits() == 0);
  CHECK(seen(273.1, 1e5).bits() == of_fluid(0, side::below));
  CHECK(seen(383.2, 2e5).bits() == of_fluid(0, side::above));
  CHECK(seen(300.0, 3.01e5).bits() == of_fluid(1, side::above));
  CHECK(seen(300.0, 3500.0).bits() == of_fluid(2, side::below));
  CHECK(seen(300.0, 3570.0).bits() == 0);
  CHECK(seen(380.0, 101325.0).bits() == of_fluid(2, side::below));  // it would boil
  CHECK(seen(300.0, -1.0).bits() == (of_fluid(1, side::below) | of_fluid(2, side::below)));
}

TEST_CASE("fast water: what is not finite is flagged and never crashes") {
  const volatile double nan = std::numeric_limits<double>::quiet_NaN();
  const volatile double infinite = std::numeric_limits<double>::infinity();
  for (const double bad : {double(nan), double(infinite), -double(infinite)}) {
    CHECK_FALSE(seen(bad, 1e5).finite_input());
    CHECK_FALSE(seen(300.0, bad).finite_input());
    CHECK_FALSE(seen(300.0, bad).inside());
    if (zero_divisor_stops) continue;
    (void)liquid_water_fast{}.values(bad, 1e5);
    (void)liquid_water_fast{}.values(300.0, bad);
  }
  for (const double T : {-300.0, 0.0, 232.0, 593.0, 1e300}) {
    CHECK_FALSE(seen(T, 2e5).inside());
    if (!zero_divisor_stops) (void)liquid_water_fast{}.values(T, 2e5);
  }
}

TEST_CASE("fast water tells where it comes from") {
  const fluid_info* info = liquid_water_fast{}.info();
  CHECK(info->limit_count == 3);
  CHECK(info->limits[0].low == 273.15);
  CHECK(info->limits[0].high == 383.15);
  CHECK(info->limits[1].high == 3e5);
  CHECK(info->limits[2].low == 0.99975);
}
