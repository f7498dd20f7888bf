#include <cmath>

#include "check.hpp"
#include "convelope/correlations/external/flat_plate.hpp"

namespace {

using namespace check;
using namespace convelope::flat_plate;
using convelope::not_stated;
using convelope::state_rule;

TEST_CASE("laminar plate: power laws against plain powers in 50 digits") {
  for (const double Re : {1e3, 4.7e4, 5e5}) {
    for (const double Pr : {0.6, 0.71, 7.0, 60.0}) {
      const exact both = raised(Re, 1, 2) * raised(Pr, 1, 3);
      check_value<laminar_isothermal_local>(0.332_exact * both, Re, Pr);
      check_value<laminar_isothermal_average>(0.664_exact * both, Re, Pr);
      check_value<laminar_isoflux_local>(0.453_exact * both, Re, Pr);
      check_value<laminar_isoflux_average>(0.680_exact * both, Re, Pr);
    }
  }
}

TEST_CASE("laminar plate, every Prandtl number: against plain powers in 50 digits") {
  for (const double Re : {2e4, 1e5, 4.9e5}) {
    for (const double Pr : {0.005, 0.05, 0.71, 300.0}) {
      const exact both = raised(Re, 1, 2) * raised(Pr, 1, 3);
      const exact isothermal = raised(1 + raised(0.0468_exact / Pr, 2, 3), 1, 4);
      const exact isoflux = raised(1 + raised(0.02052_exact / Pr, 2, 3), 1, 4);
      check_value<churchill_ozoe_1973_isothermal_local>(0.3387_exact * both / isothermal, Re, Pr);
      check_value<churchill_ozoe_1973_isothermal_average>(0.6774_exact * both / isothermal, Re, Pr);
      check_value<churchill_ozoe_1973_isoflux_local>(0.4637_exact * both / isoflux, Re, Pr);
      const exact pi = acos(exact(-1));
      check_value<laminar_low_prandtl_local>(raised(exact(Re) * Pr / pi, 1, 2), Re, Pr);
    }
  }
}

// H. Schlichting, Boundary-Layer Theory, 7th ed., table 12.1 (from memory): a1 in
// Nu_x = a1 Re_x^(1/2), which the text calls 0.332 Pr^(1/3) to good accuracy.
TEST_CASE("laminar isothermal plate: the published heat transfer coefficients of Pohlhausen") {
  const double table[][2] = {{0.6, 0.276}, {0.7, 0.293}, {0.8, 0.307},  {0.9, 0.320}, {1.0, 0.332},
                             {1.1, 0.344}, {7.0, 0.645}, {10.0, 0.730}, {15.0, 0.835}};
  for (const auto& row : table) {
    const double Pr = row[0];
    const double a1 = row[1];
    CAPTURE(Pr);
    CHECK(laminar_isothermal_local::formula(1.0, Pr) == doctest::Approx(a1).epsilon(0.021));
    CHECK(churchill_ozoe_1973_isothermal_local::formula(1.0, Pr) ==
          doctest::Approx(a1).epsilon(0.015));
  }
}

// Exact limits of the boundary-layer equations: slug flow, Nu_x = (Pe/pi)^(1/2) and
// (pi Pe)^(1/2)/2 (conduction into a half-space); a linear velocity profile at the wall of shear
// 0.332057, Nu_x = 0.33872 and 0.46369 Re^(1/2) Pr^(1/3) (Leveque).
TEST_CASE("laminar plate: limits of small and large Prandtl number") {
  const double pi = 3.14159265358979;
  const double Pr = 1e-9;
  CHECK(churchill_ozoe_1973_isothermal_local::formula(1.0, Pr) ==
        doctest::Approx(std::sqrt(Pr / pi)).epsilon(2e-4));
  CHECK(churchill_ozoe_1973_isoflux_local::formula(1.0, Pr) ==
        doctest::Approx(0.5 * std::sqrt(Pr * pi)).epsilon(2e-4));
  CHECK(churchill_ozoe_1973_isothermal_local::formula(1.0, 1e9) ==
        doctest::Approx(338.72).epsilon(2e-4));
  CHECK(churchill_ozoe_1973_isoflux_local::formula(1.0, 1e9) ==
        doctest::Approx(463.69).epsilon(2e-4));
}

TEST_CASE("laminar plate: envelopes") {
  const auto power_law = []<class C>(C) {
    expect_inside<C>(1e3, 0.6);
    expect_inside<C>(5e5, 60.0);
    expect_crossed<C>(0, side::below, below(1e3), 1.0);
    expect_crossed<C>(0, side::above, above(5e5), 1.0);
    expect_crossed<C>(1, side::below, 1e4, below(0.6));
    expect_crossed<C>(1, side::above, 1e4, above(60.0));
    expect_not_finite<C>(1e4, 1.0);
  };
  power_law(laminar_isothermal_local{});
  power_law(laminar_isothermal_average{});
  power_law(laminar_isoflux_local{});
  power_law(laminar_isoflux_average{});
  const auto any_prandtl = []<class C>(C) {
    expect_inside<C>(5e5, 1e3);
    expect_inside<C>(1e5, 0.001);
    expect_inside<C>(1e-3, 1e6);
    expect_crossed<C>(0, side::above, above(5e5), 1.0);
    expect_also_crossed<C>(0, side::below, -1e3, -1.0);
    expect_also_crossed<C>(1, side::below, -1e3, -1.0);
    expect_crossed<C>(2, side::below, 1e5, below(0.001));
    expect_not_finite<C>(1e5, 0.7);
  };
  any_prandtl(churchill_ozoe_1973_isothermal_local{});
  any_prandtl(churchill_ozoe_1973_isothermal_average{});
  any_prandtl(churchill_ozoe_1973_isoflux_local{});
  using low = laminar_low_prandtl_local;
  expect_inside<low>(1e5, 0.001);
  expect_inside<low>(5e5, 0.05);
  expect_crossed<low>(0, side::above, above(5e5), 0.01);
  expect_also_crossed<low>(0, side::below, -1e5, -0.01);
  expect_crossed<low>(1, side::above, 1e5, above(0.05));
  expect_also_crossed<low>(1, side::below, 1e5, -0.01);
  expect_crossed<low>(2, side::below, 1e4, below(0.01));
  expect_not_finite<low>(1e5, 0.01);
}

TEST_CASE("laminar plate: every number type") {
  check_scalars<laminar_isothermal_local>(4.7e4, 0.71);
  check_scalars<laminar_isothermal_average>(4.7e4, 0.71);
  check_scalars<laminar_isoflux_local>(4.7e4, 0.71);
  check_scalars<laminar_isoflux_average>(4.7e4, 0.71);
  check_scalars<churchill_ozoe_1973_isothermal_local>(4.7e4, 0.03);
  check_scalars<churchill_ozoe_1973_isothermal_average>(4.7e4, 0.03);
  check_scalars<churchill_ozoe_1973_isoflux_local>(4.7e4, 0.03);
  check_scalars<laminar_low_prandtl_local>(4.7e4, 0.03);
}

TEST_CASE("laminar plate: no flow is no convection, not a crash") {
  CHECK(laminar_isothermal_average::formula(0.0, 0.7) == 0.0);
  CHECK(churchill_ozoe_1973_isothermal_local::formula(0.0, 0.7) == 0.0);
  expect_crossed<laminar_isothermal_average>(0, side::below, 0.0, 0.7);
  expect_crossed<churchill_ozoe_1973_isothermal_local>(2, side::below, 0.0, 0.7);
}

TEST_CASE("laminar plate: records") {
  constexpr auto film = state_rule::film;
  expect_record<laminar_isothermal_local>("flat-plate/laminar-isothermal-local", "Nu_x", not_stated,
                                          film);
  expect_record<laminar_isothermal_average>("flat-plate/laminar-isothermal-average", "Nu_L",
                                            not_stated, film);
  expect_record<laminar_isoflux_local>("flat-plate/laminar-isoflux-local", "Nu_x", not_stated,
                                       film);
  expect_record<laminar_isoflux_average>("flat-plate/laminar-isoflux-average", "Nu_L", not_stated,
                                         film);
  expect_record<churchill_ozoe_1973_isothermal_local>(
      "flat-plate/churchill-ozoe-1973-isothermal-local", "Nu_x", not_stated, film);
  expect_record<churchill_ozoe_1973_isothermal_average>(
      "flat-plate/churchill-ozoe-1973-isothermal-average", "Nu_L", not_stated, film);
  expect_record<churchill_ozoe_1973_isoflux_local>("flat-plate/churchill-ozoe-1973-isoflux-local",
                                                   "Nu_x", not_stated, film);
  expect_record<laminar_low_prandtl_local>("flat-plate/laminar-low-prandtl-local", "Nu_x",
                                           not_stated, film);
  expect_keys<laminar_isothermal_local>("Re", "Pr");
  expect_keys<laminar_isothermal_average>("Re", "Pr");
}

}  // namespace
