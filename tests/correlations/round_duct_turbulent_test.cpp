// Turbulent and transitional flow in a round duct: against the same formulas in 50 digits and at
// their limits.

#include <cmath>

#include "check.hpp"
#include "convelope/correlations/friction/duct_friction.hpp"
#include "convelope/correlations/internal/round_duct.hpp"

using namespace convelope;
using check::above;
using check::below;
using check::check_scalars;
using check::check_value;
using check::exact;
using check::expect_also_crossed;
using check::expect_crossed;
using check::expect_inside;
using check::expect_not_finite;

namespace {

using namespace round_duct;

exact raised(const exact& x, const exact& p) { return pow(x, p); }
exact darcy(double a, double b, double Re) { return raised(a * log10(exact(Re)) - b, -2); }
/// (f/8) X Pr/[K + 12.7 sqrt(f/8) (Pr^(2/3) - 1)]
exact petukhov(const exact& f, const exact& K, const exact& X, double Pr) {
  return f / 8 * X * Pr / (K + exact(12.7) * sqrt(f / 8) * (raised(Pr, exact(2) / 3) - 1));
}
exact entrance(double L_over_D) { return 1 + raised(1 / exact(L_over_D), exact(2) / 3); }

/// Gnielinski's laminar means with both profiles developing, on Re.
exact laminar(double Re, double Pr, double L_over_D, wall bc) {
  const exact Gz = exact(Re) * Pr / L_over_D;
  if (bc == wall::uniform_temperature) {
    return raised(raised(3.66, 3) + raised(0.7, 3) + raised(exact(1.615) * cbrt(Gz) - 0.7, 3) +
                      raised(raised(2 / (1 + 22 * exact(Pr)), exact(1) / 6) * sqrt(Gz), 3),
                  exact(1) / 3);
  }
  return raised(raised(4.364, 3) + raised(0.6, 3) + raised(exact(1.953) * cbrt(Gz) - 0.6, 3) +
                    raised(exact(0.924) * cbrt(exact(Pr)) * sqrt(exact(Re) / L_over_D), 3),
                exact(1) / 3);
}
exact along(double Re, double from, const exact& low, const exact& high) {
  const exact g = (exact(Re) - 2300) / (exact(from) - 2300);
  return (1 - g) * low + g * high;
}

/// One of Gnielinski's two all-regime means over its three parts.
template <class C>
void all_regimes(double turbulent_from, double lost) {
  for (const wall bc : {wall::uniform_temperature, wall::uniform_flux}) {
    for (const double Pr : {0.7, 7.0, 300.0}) {
      for (const double L : {1.0, 40.0, 1000.0}) {
        const auto turbulent = [&](double Re) {
          return exact(petukhov(darcy(1.8, 1.5, Re), 1, exact(Re) - lost, Pr) * entrance(L));
        };
        const auto transition = [&](double Re) {
          return along(Re, turbulent_from, laminar(2300.0, Pr, L, bc), turbulent(turbulent_from));
        };
        for (const double Re : {200.0, 1000.0, 2300.0}) {
          check_value<C>(laminar(Re, Pr, L, bc), Re, Pr, L, bc);
        }
        for (const double Re : {above(2300.0), 3100.0, 3999.0}) {
          check_value<C>(transition(Re), Re, Pr, L, bc);
        }
        for (const double Re : {turbulent_from, 3e4, 1e6}) {
          check_value<C>(turbulent(Re), Re, Pr, L, bc);
        }
      }
    }
    check_scalars<C>(1500.0, 5.0, 60.0, bc);
    check_scalars<C>(3000.0, 0.7, 20.0, bc);
    check_scalars<C>(2e5, 5.0, 60.0, bc);
    expect_inside<C>(0.0, 0.6, 1.0, bc);
    expect_inside<C>(1e6, 1000.0, 1e6, bc);
    expect_crossed<C>(0, side::below, -1.0, 7.0, 10.0, bc);
    expect_crossed<C>(0, side::above, above(1e6), 7.0, 10.0, bc);
    expect_crossed<C>(1, side::below, 5e4, below(0.6), 10.0, bc);
    expect_crossed<C>(1, side::above, 5e4, above(1000.0), 10.0, bc);
    expect_crossed<C>(2, side::below, 5e4, 7.0, below(1.0), bc);
    expect_not_finite<C>(5e4, 7.0, 10.0, bc);
  }
}

}  // namespace

TEST_SUITE("round duct, turbulent") {
  TEST_CASE("Dittus and Boelter in McAdams' form") {
    using C = dittus_boelter_mcadams;
    for (const double Re : {1e4, 4e4, 1.2e5}) {
      for (const double Pr : {0.6, 5.0, 160.0}) {
        const exact part = exact(0.023) * raised(Re, 0.8);
        check_value<C>(part * raised(Pr, 0.4), Re, Pr, mode::heating);
        check_value<C>(part * raised(Pr, 0.3), Re, Pr, mode::cooling);
      }
    }
    check_scalars<C>(5e4, 6.0, mode::heating);
    check_scalars<C>(5e4, 6.0, mode::cooling);
    expect_inside<C>(1e4, 0.6, mode::heating);
    expect_inside<C>(1.2e5, 160.0, mode::cooling);
    expect_crossed<C>(0, side::below, below(1e4), 1.0, mode::heating);
    expect_crossed<C>(0, side::above, above(1.2e5), 1.0, mode::heating);
    expect_crossed<C>(1, side::below, 5e4, below(0.6), mode::cooling);
    expect_crossed<C>(1, side::above, 5e4, above(160.0), mode::cooling);
    expect_not_finite<C>(5e4, 1.0, mode::heating);
  }

  TEST_CASE("Petukhov and Kirillov") {
    using C = petukhov_kirillov_1958;
    for (const double Re : {1e4, 2e5, 5e6}) {
      for (const double Pr : {0.5, 1.0, 8.0, 2000.0}) {
        check_value<C>(petukhov(darcy(1.82, 1.64, Re), exact(1.07), Re, Pr), Re, Pr);
      }
    }
    check_scalars<C>(5e4, 6.0);
    expect_inside<C>(1e4, 0.5);
    expect_inside<C>(5e6, 2000.0);
    expect_crossed<C>(0, side::below, below(1e4), 1.0);
    expect_crossed<C>(0, side::above, above(5e6), 1.0);
    expect_crossed<C>(1, side::below, 5e4, below(0.5));
    expect_crossed<C>(1, side::above, 5e4, above(2000.0));
    expect_not_finite<C>(5e4, 1.0);
    // its friction law is the library's own
    const double f = friction::filonenko_1954::formula(7e4);
    CHECK(C::formula(7e4, 1.0) == doctest::Approx(f / 8.0 * 7e4 / 1.07).epsilon(1e-13));
  }

  TEST_CASE("Gnielinski 1976") {
    using C = gnielinski_1976;
    for (const double Re : {3000.0, 4.2e4, 5e6}) {
      for (const double Pr : {0.5, 1.0, 8.0, 2000.0}) {
        const exact developed = petukhov(darcy(1.82, 1.64, Re), 1, exact(Re) - 1000, Pr);
        check_value<C>(developed, Re, Pr, 1e300, 1.0, 1.0);
        check_value<C>(developed * entrance(25.0), Re, Pr, 25.0, 1.0, 1.0);
        check_value<C>(2 * developed, Re, Pr, 1.0, 1.0, 1.0);
        check_value<C>(developed * entrance(80.0) * raised(3.3, 0.11), Re, Pr, 80.0, 3.3, 1.0);
        check_value<C>(developed * raised(0.6, 0.45), Re, Pr, 1e300, 1.0, 0.6);
        check_value<C>(developed * raised(1.4, 0.45), Re, Pr, 1e300, 1.0, 1.4);
      }
    }
    check_scalars<C>(5e4, 6.0, 30.0, 2.0, 1.0);
    check_scalars<C>(5e4, 0.7, 30.0, 1.0, 0.7);
    expect_inside<C>(3000.0, 0.5, 1.0, 0.05, 1.0);
    expect_inside<C>(5e6, 2000.0, 1e300, 20.0, 1.0);
    expect_inside<C>(5e4, 0.7, 50.0, 1.0, 0.5);
    expect_inside<C>(5e4, 0.7, 50.0, 1.0, 1.5);
    expect_crossed<C>(0, side::below, below(3000.0), 1.0, 50.0, 1.0, 1.0);
    expect_crossed<C>(0, side::above, above(5e6), 1.0, 50.0, 1.0, 1.0);
    expect_crossed<C>(1, side::below, 5e4, below(0.5), 50.0, 1.0, 1.0);
    expect_crossed<C>(1, side::above, 5e4, above(2000.0), 50.0, 1.0, 1.0);
    expect_crossed<C>(2, side::below, 5e4, 1.0, below(1.0), 1.0, 1.0);
    expect_crossed<C>(3, side::below, 5e4, 1.0, 50.0, below(0.05), 1.0);
    expect_crossed<C>(3, side::above, 5e4, 1.0, 50.0, above(20.0), 1.0);
    expect_crossed<C>(4, side::below, 5e4, 1.0, 50.0, 1.0, below(0.5));
    expect_crossed<C>(4, side::above, 5e4, 1.0, 50.0, 1.0, above(1.5));
    // one property factor or the other: both of them are told, on either side
    expect_crossed<C>(5, side::above, 5e4, 1.0, 50.0, 1.1, 1.1);
    expect_crossed<C>(5, side::below, 5e4, 1.0, 50.0, 1.1, 0.9);
    expect_not_finite<C>(5e4, 1.0, 50.0, 1.0, 1.0);
    CHECK(C{}(reynolds_of<hydraulic_diameter>(5e4), prandtl_number(6.0), length_ratio(50.0),
              prandtl_ratio(1.5), temperature_ratio(1.0))
              .scatter() == doctest::Approx(0.2));
  }

  TEST_CASE("entrance factors") {
    using M = gnielinski_local_entrance_mean;
    using L = gnielinski_local_entrance_local;
    for (const double L_over_D : {1.0, 7.0, 300.0}) {
      check_value<M>(entrance(L_over_D), L_over_D);
      check_value<L>(1 + raised(L_over_D, exact(-2) / 3) / 3, L_over_D);
      // Nu_x is the derivative of x Nu_m
      const dual<double> x = dual<double>::variable(L_over_D);
      CHECK(dual<double>(x * M::formula(x)).slope[0] ==
            doctest::Approx(L::formula(L_over_D)).epsilon(1e-14));
    }
    check_scalars<M>(12.0);
    check_scalars<L>(12.0);
    expect_inside<M>(1.0);
    expect_crossed<M>(0, side::below, below(1.0));
    expect_not_finite<M>(12.0);
    expect_inside<L>(1.0);
    expect_crossed<L>(0, side::below, below(1.0));
    expect_not_finite<L>(12.0);
  }

  TEST_CASE("Gnielinski 1995, linear between 2300 and 1e4") {
    all_regimes<gnielinski_1995>(1e4, 0.0);
    check_value<gnielinski_1995>(along(8000.0, 1e4, laminar(2300.0, 5.0, 9.0, wall::uniform_flux),
                                       petukhov(darcy(1.8, 1.5, 1e4), 1, 1e4, 5.0) * entrance(9.0)),
                                 8000.0, 5.0, 9.0, wall::uniform_flux);
    // f at 1e4 is (1.8 x 4 - 1.5)^(-2) = 0.0308 (VDI Heat Atlas G1, from memory)
    CHECK(friction::konakov_1946::formula(1e4) == doctest::Approx(0.0308).epsilon(1e-3));
  }

  TEST_CASE("Gnielinski 2013, linear between 2300 and 4000") {
    all_regimes<gnielinski_2013>(4000.0, 1000.0);
    // the two versions at Pr 7, L/D 100: not to be merged
    const wall bc = wall::uniform_temperature;
    CHECK(gnielinski_1995::formula(4000.0, 7.0, 100.0, bc) == doctest::Approx(27.4).epsilon(2e-3));
    CHECK(gnielinski_2013::formula(4000.0, 7.0, 100.0, bc) == doctest::Approx(32.6).epsilon(2e-3));
    CHECK(gnielinski_1995::formula(1e4, 7.0, 100.0, bc) == doctest::Approx(91.0).epsilon(1e-3));
    CHECK(gnielinski_2013::formula(1e4, 7.0, 100.0, bc) == doctest::Approx(81.9).epsilon(1e-3));
  }

  TEST_CASE("nothing crashes far outside") {
    for (const double Re : {-1e9, 0.0, 1e-300, 8.0, 1e300}) {
      for (const double Pr : {-1.0, 0.0, 1e-300, 1e300}) {
        expect_also_crossed<petukhov_kirillov_1958>(1, Pr < 0.5 ? side::below : side::above, Re,
                                                    Pr);
        expect_also_crossed<gnielinski_1976>(1, Pr < 0.5 ? side::below : side::above, Re, Pr, 50.0,
                                             1.0, 1.0);
        expect_also_crossed<gnielinski_1995>(1, Pr < 0.5 ? side::below : side::above, Re, Pr, 50.0,
                                             wall::uniform_flux);
        expect_also_crossed<dittus_boelter_mcadams>(1, Pr < 0.5 ? side::below : side::above, Re, Pr,
                                                    mode::cooling);
      }
    }
  }
}
