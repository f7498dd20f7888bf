#include "convelope/correlations/external/flat_plate_turbulent.hpp"

#include <cmath>

#include "check.hpp"
#include "convelope/correlations/external/flat_plate.hpp"

namespace {

using namespace check;
using namespace convelope::flat_plate;
using convelope::not_stated;
using convelope::state_rule;

exact by_analogy(double Re, double Pr) {
  return 0.037_exact * raised(Re, 4, 5) * Pr /
         (1 + 2.443_exact * raised(Re, -1, 10) * (raised(Pr, 2, 3) - 1));
}

TEST_CASE("turbulent plate: against plain powers in 50 digits") {
  for (const double Re : {5e5, 3.1e6, 1e7, 1e8}) {
    for (const double Pr : {0.6, 0.71, 7.0, 60.0}) {
      const exact both = raised(Re, 4, 5) * raised(Pr, 1, 3);
      check_value<turbulent_colburn_local>(0.0296_exact * both, Re, Pr);
      check_value<turbulent_colburn_average>(0.037_exact * both, Re, Pr);
      check_value<turbulent_isoflux_local>(0.0308_exact * both, Re, Pr);

      const exact half_cf = 0.2275_exact / raised(log(0.06_exact * Re), 2);
      check_value<turbulent_white_local>(
          exact(Re) * Pr * half_cf /
              (1 + 12.7_exact * raised(half_cf, 1, 2) * (raised(Pr, 2, 3) - 1)),
          Re, Pr);
      for (const double Re_c : {1e5, 5e5}) {
        const exact laminar = 0.664_exact * raised(Re_c, 1, 2);
        const exact turbulent = 0.037_exact * (raised(Re, 4, 5) - raised(Re_c, 4, 5));
        check_value<mixed_average>((laminar + turbulent) * raised(Pr, 1, 3), Re, Pr, Re_c);
      }
      check_value<petukhov_gnielinski_turbulent_average>(by_analogy(Re, Pr), Re, Pr);
    }
  }
  for (const double Re : {10.0, 3e3, 2e5, 1e7}) {
    for (const double Pr : {0.6, 7.0, 2000.0}) {
      const exact laminar = 0.664_exact * raised(Re, 1, 2) * raised(Pr, 1, 3);
      check_value<gnielinski_1975_combined_average>(
          raised(raised(laminar, 2) + raised(by_analogy(Re, Pr), 2), 1, 2), Re, Pr);
    }
  }
}

// Local and mean of one layer are bound: Nu_L = integral of Nu_x/x dx from 0 to L.
TEST_CASE("turbulent plate: means are the integrals of the local laws") {
  CHECK(turbulent_colburn_average::formula(2e6, 0.7) ==
        doctest::Approx(turbulent_colburn_local::formula(2e6, 0.7) / 0.8).epsilon(1e-12));
  CHECK(mixed_average::formula(5e5, 0.7, 5e5) ==
        doctest::Approx(laminar_isothermal_average::formula(5e5, 0.7)).epsilon(1e-12));
}

// F. P. Incropera and D. P. DeWitt, Fundamentals of Heat and Mass Transfer, eq. 7.41 (5th ed.,
// from memory): A = 871 for Re_c = 5e5.
TEST_CASE("mixed plate: the constant of the textbooks") {
  const double A =
      turbulent_colburn_average::formula(4e6, 1.0) - mixed_average::formula(4e6, 1.0, 5e5);
  CHECK(A == doctest::Approx(871.0).epsilon(0.0005));
}

// W. M. Kays and M. E. Crawford, Convective Heat and Mass Transfer (from memory): in gases
// St Pr^0.4 = 0.0287 Re_x^-0.2, isothermal; the isoflux wall is 4 % higher.
TEST_CASE("turbulent plate: neighbours in air") {
  const double gas = 0.0287 * std::pow(1e6, 0.8) * std::pow(0.71, 0.6);
  CHECK(turbulent_white_local::formula(1e6, 0.71) == doctest::Approx(gas).epsilon(0.02));
  CHECK(turbulent_colburn_local::formula(1e6, 0.71) == doctest::Approx(gas).epsilon(0.15));
  CHECK(turbulent_isoflux_local::formula(1e6, 0.71) / turbulent_colburn_local::formula(1e6, 0.71) ==
        doctest::Approx(1.04).epsilon(0.001));
  CHECK(petukhov_gnielinski_turbulent_average::formula(1e6, 0.71) ==
        doctest::Approx(gas / 0.8).epsilon(0.03));
}

TEST_CASE("turbulent plate: envelopes") {
  const auto colburn = []<class C>(C) {
    expect_inside<C>(5e5, 0.6);
    expect_inside<C>(1e8, 60.0);
    expect_crossed<C>(0, side::below, below(5e5), 1.0);
    expect_crossed<C>(0, side::above, above(1e8), 1.0);
    expect_crossed<C>(1, side::below, 1e6, below(0.6));
    expect_crossed<C>(1, side::above, 1e6, above(60.0));
    expect_not_finite<C>(1e6, 1.0);
  };
  colburn(turbulent_colburn_local{});
  colburn(turbulent_colburn_average{});
  colburn(turbulent_isoflux_local{});

  expect_inside<turbulent_white_local>(5e5, 0.5);
  expect_inside<turbulent_white_local>(1e7, 300.0);
  expect_crossed<turbulent_white_local>(0, side::below, below(5e5), 1.0);
  expect_crossed<turbulent_white_local>(0, side::above, above(1e7), 1.0);
  expect_crossed<turbulent_white_local>(1, side::below, 1e6, below(0.5));
  expect_not_finite<turbulent_white_local>(1e6, 1.0);

  expect_inside<mixed_average>(5e5, 0.6, 5e5);
  expect_inside<mixed_average>(1e8, 60.0, 1e5);
  expect_inside<mixed_average>(1e8, 60.0, 3e6);
  expect_crossed<mixed_average>(0, side::above, above(1e8), 1.0, 5e5);
  expect_also_crossed<mixed_average>(0, side::below, -1.0, 1.0, 5e5);
  expect_crossed<mixed_average>(1, side::below, 1e6, below(0.6), 5e5);
  expect_crossed<mixed_average>(1, side::above, 1e6, above(60.0), 5e5);
  expect_crossed<mixed_average>(2, side::below, 1e6, 1.0, below(1e5));
  expect_crossed<mixed_average>(2, side::above, 1e7, 1.0, above(3e6));
  expect_crossed<mixed_average>(3, side::below, below(5e5), 1.0, 5e5);
  expect_not_finite<mixed_average>(1e6, 1.0, 5e5);

  using analogy = petukhov_gnielinski_turbulent_average;
  expect_inside<analogy>(5e5, 0.6);
  expect_inside<analogy>(1e7, 2000.0);
  expect_crossed<analogy>(0, side::below, below(5e5), 1.0);
  expect_crossed<analogy>(0, side::above, above(1e7), 1.0);
  expect_crossed<analogy>(1, side::below, 1e6, below(0.6));
  expect_crossed<analogy>(1, side::above, 1e6, above(2000.0));
  expect_not_finite<analogy>(1e6, 1.0);

  using combined = gnielinski_1975_combined_average;
  expect_inside<combined>(10.0, 0.6);
  expect_inside<combined>(1e7, 2000.0);
  expect_crossed<combined>(0, side::below, below(10.0), 1.0);
  expect_crossed<combined>(0, side::above, above(1e7), 1.0);
  expect_crossed<combined>(1, side::below, 1e6, below(0.6));
  expect_crossed<combined>(1, side::above, 1e6, above(2000.0));
  expect_not_finite<combined>(1e6, 1.0);
}

TEST_CASE("turbulent plate: every number type") {
  check_scalars<turbulent_colburn_local>(1.3e6, 0.71);
  check_scalars<turbulent_colburn_average>(1.3e6, 0.71);
  check_scalars<turbulent_isoflux_local>(1.3e6, 0.71);
  check_scalars<turbulent_white_local>(1.3e6, 7.0);
  check_scalars<mixed_average>(1.3e6, 0.71, 3e5);
  check_scalars<petukhov_gnielinski_turbulent_average>(1.3e6, 7.0);
  check_scalars<gnielinski_1975_combined_average>(1.3e4, 0.71);
}

TEST_CASE("turbulent plate: no flow is no convection, not a crash") {
  CHECK(turbulent_colburn_average::formula(0.0, 0.7) == 0.0);
  CHECK(turbulent_white_local::formula(0.0, 0.7) == 0.0);
  CHECK(gnielinski_1975_combined_average::formula(0.0, 0.7) == 0.0);
  expect_crossed<gnielinski_1975_combined_average>(0, side::below, 0.0, 0.7);
}

TEST_CASE("turbulent plate: records") {
  constexpr auto film = state_rule::film;
  expect_record<turbulent_colburn_local>("flat-plate/turbulent-colburn-local", "Nu_x", 0.25, film);
  expect_record<turbulent_colburn_average>("flat-plate/turbulent-colburn-average", "Nu_L", 0.25,
                                           film);
  expect_record<turbulent_isoflux_local>("flat-plate/turbulent-isoflux-local", "Nu_x", 0.25, film);
  expect_record<turbulent_white_local>("flat-plate/turbulent-white-local", "Nu_x", 0.15, film);
  expect_record<mixed_average>("flat-plate/mixed-average", "Nu_L", 0.25, film);
  expect_record<petukhov_gnielinski_turbulent_average>(
      "flat-plate/petukhov-gnielinski-turbulent-average", "Nu_L", not_stated,
      state_rule::free_stream_with_wall);
  expect_record<gnielinski_1975_combined_average>("flat-plate/gnielinski-1975-combined-average",
                                                  "Nu_L", not_stated,
                                                  state_rule::free_stream_with_wall);
  expect_keys<mixed_average>("Re", "Pr", "Re_c");
}

}  // namespace
