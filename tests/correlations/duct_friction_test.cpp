// Friction of straight ducts: every law against the same law spelled with pow and log10 in 50
// digits, against published tables, and at its limits.

#include "convelope/correlations/friction/duct_friction.hpp"

#include <algorithm>
#include <cmath>

#include "check.hpp"
#include "convelope/correlations/friction/rough_duct.hpp"

using namespace convelope;
using check::above;
using check::below;
using check::check_scalars;
using check::check_value;
using check::exact;
using check::expect_crossed;
using check::expect_inside;
using check::expect_not_finite;

namespace {

exact raised(double x, double p) { return pow(exact(x), exact(p)); }
exact log_law(double a, double b, double Re) {
  const exact d = a * log10(exact(Re)) - b;
  return 1 / (d * d);
}
/// Smooth-wall law by bisection on f: 1/sqrt(f) - 2 log10(Re sqrt(f)) + 0.8 falls with f.
exact smooth_wall(double Re) {
  exact low = 1e-4;
  exact high = 100.0;
  for (int i = 0; i < 180; ++i) {
    const exact f = (low + high) / 2;
    const exact left = 1 / sqrt(f) - 2 * log10(Re * sqrt(f)) + 0.8;
    (left > 0 ? low : high) = f;
  }
  return low;
}
/// Colebrook's law by repeated substitution; every turn gains a digit or more.
exact colebrook(double Re, double e) {
  exact root_f = 0.2;
  for (int i = 0; i < 120; ++i) {
    root_f = -1 / (2 * log10(e / exact(3.7) + exact(2.51) / (Re * root_f)));
  }
  return root_f * root_f;
}
exact churchill(double Re, double e) {
  const exact A = pow(exact(2.457) * log(1 / (raised(7.0 / Re, 0.9) + exact(0.27) * e)), exact(16));
  const exact B = pow(37530 / exact(Re), exact(16));
  return 8 * pow(pow(8 / exact(Re), exact(12)) + pow(A + B, exact(-1.5)), 1 / exact(12));
}

template <class F>
constexpr bool becomes_darcy = requires(const F& f) { friction::to_darcy(f); };

template <class C>
double number(double Re, double e) {
  return C::formula(Re, e);
}

/// Inside at both ends of the range of Re, flagged just outside of either.
template <class C>
void range_of_Re(double low, double high) {
  expect_inside<C>(low);
  expect_inside<C>(high);
  expect_crossed<C>(0, side::below, below(low));
  expect_crossed<C>(0, side::above, above(high));
  expect_not_finite<C>(0.5 * (low + high));
}

}  // namespace

TEST_SUITE("duct friction") {
  TEST_CASE("laminar: exact") {
    using C = friction::hagen_poiseuille;
    check_value<C>(exact(64) / 37, 37.0);
    check_value<C>(exact(64) / 2000, 2000.0);
    check_value<C>(exact(64) * 1000, 1e-3);
    check_scalars<C>(1234.5);
    range_of_Re<C>(1e-12, 2300.0);
    expect_crossed<C>(0, side::below, 0.0);
    expect_crossed<C>(0, side::below, -10.0);
  }

  TEST_CASE("explicit smooth laws") {
    for (const double Re : {4000.0, 2.7e4, 9.9e4}) {
      check_value<friction::blasius_1913>(exact(0.3164) / raised(Re, 0.25), Re);
      check_value<friction::filonenko_1954>(log_law(1.82, 1.64, Re), Re);
      check_value<friction::konakov_1946>(log_law(1.8, 1.5, Re), Re);
      const exact d = exact(0.790) * log(exact(Re)) - exact(1.64);
      check_value<friction::petukhov_1970>(1 / (d * d), Re);
      check_value<friction::drew_koo_mcadams_1932>(
          exact(0.00140) + exact(0.125) * raised(Re, -0.32), Re);
    }
    check_scalars<friction::blasius_1913>(5e4);
    check_scalars<friction::filonenko_1954>(1.3e5);
    check_scalars<friction::petukhov_1970>(1.3e5);
    check_scalars<friction::konakov_1946>(1.3e5);
    check_scalars<friction::drew_koo_mcadams_1932>(1.3e5);
    range_of_Re<friction::blasius_1913>(4000.0, 1e5);
    range_of_Re<friction::filonenko_1954>(3000.0, 5e6);
    range_of_Re<friction::petukhov_1970>(3000.0, 5e6);
    range_of_Re<friction::konakov_1946>(4000.0, 1e7);
    range_of_Re<friction::drew_koo_mcadams_1932>(4000.0, 5e6);
  }

  TEST_CASE("Filonenko's law is Petukhov's to 0.14 %") {
    for (const double Re : {4000.0, 1e5, 5e6}) {
      const double ratio =
          friction::filonenko_1954::formula(Re) / friction::petukhov_1970::formula(Re);
      CHECK(ratio == doctest::Approx(1.0).epsilon(1.5e-3));
      CHECK(ratio < 0.9995);
    }
  }

  TEST_CASE("smooth-wall law, implicit") {
    using C = friction::prandtl_karman_nikuradse;
    for (const double Re : {4000.0, 12345.0, 1e5, 3.4e6}) check_value<C>(smooth_wall(Re), Re);
    // far outside the root is still found
    for (const double Re : {1.0, 10.0, 300.0, 1e9, 1e15}) check_value<C>(smooth_wall(Re), Re);
    check_scalars<C>(4100.0);
    check_scalars<C>(2.2e6);
    range_of_Re<C>(4000.0, 3.4e6);
    // F. M. White, Fluid Mechanics, numerical values beside Prandtl's smooth-wall law (from memory)
    CHECK(C::formula(4000.0) == doctest::Approx(0.0399).epsilon(2e-3));
    CHECK(C::formula(1e4) == doctest::Approx(0.0309).epsilon(2e-3));
    CHECK(C::formula(1e5) == doctest::Approx(0.0180).epsilon(3e-3));
    CHECK(C::formula(1e6) == doctest::Approx(0.0116).epsilon(5e-3));
    CHECK(C::formula(1e7) == doctest::Approx(0.0081).epsilon(7e-3));
    CHECK(C::formula(1e8) == doctest::Approx(0.0059).epsilon(9e-3));
  }

  TEST_CASE("explicit smooth laws against the smooth-wall law") {
    // largest deviations over 4000 <= Re <= 5e6 (Blasius: to 1e5)
    double worst[4] = {};
    for (double Re = 4000.0; Re < 5e6; Re *= 1.1) {
      const double f = friction::prandtl_karman_nikuradse::formula(Re);
      const double other[] = {friction::filonenko_1954::formula(Re),
                              friction::konakov_1946::formula(Re),
                              4.0 * friction::drew_koo_mcadams_1932::formula(Re),
                              Re < 1e5 ? friction::blasius_1913::formula(Re) : f};
      for (int i = 0; i < 4; ++i) worst[i] = std::max(worst[i], std::abs(other[i] / f - 1.0));
    }
    CHECK(worst[0] == doctest::Approx(0.037).epsilon(0.05));
    CHECK(worst[1] < 0.0125);
    CHECK(worst[2] < 0.032);
    CHECK(worst[3] == doctest::Approx(0.028).epsilon(0.02));
  }

  TEST_CASE("three pieces of Bhatti and Shah") {
    using C = friction::bhatti_shah_1987;
    const auto middle = [](double Re) {
      return exact(exact(0.0054) + exact(2.3e-8) * raised(Re, 1.5));
    };
    const auto upper = [](double Re) {
      return exact(exact(1.28e-3) + exact(0.1143) * pow(exact(Re), -1 / exact(3.2154)));
    };
    check_value<C>(exact(16) / 900, 900.0);
    check_value<C>(exact(16) / 2100, 2100.0);
    check_value<C>(middle(above(2100.0)), above(2100.0));
    check_value<C>(middle(3000.0), 3000.0);
    check_value<C>(middle(4000.0), 4000.0);
    check_value<C>(upper(above(4000.0)), above(4000.0));
    check_value<C>(upper(1e5), 1e5);
    check_value<C>(upper(9e6), 9e6);
    check_scalars<C>(1500.0);
    check_scalars<C>(3300.0);
    check_scalars<C>(7e5);
    range_of_Re<C>(1e-12, 1e7);
    expect_crossed<C>(0, side::below, 0.0);
    // the steps of the source, which its doc comment states
    CHECK(C::formula(above(2100.0)) / C::formula(2100.0) == doctest::Approx(0.9993).epsilon(1e-4));
    CHECK(C::formula(above(4000.0)) / C::formula(4000.0) == doctest::Approx(0.8864).epsilon(1e-4));
  }

  TEST_CASE("Colebrook, implicit") {
    using C = friction::colebrook_1939;
    for (const double Re : {4000.0, 1e5, 7e6, 1e8}) {
      for (const double e : {0.0, 1e-6, 4e-4, 0.01, 0.05}) check_value<C>(colebrook(Re, e), Re, e);
    }
    check_value<C>(colebrook(150.0, 0.3), 150.0, 0.3);
    check_scalars<C>(4500.0, 0.0);
    check_scalars<C>(4500.0, 0.045);
    check_scalars<C>(9e7, 1e-6);
    expect_inside<C>(4000.0, 0.0);
    expect_inside<C>(1e8, 0.05);
    expect_crossed<C>(0, side::below, below(4000.0), 1e-3);
    expect_crossed<C>(0, side::above, above(1e8), 1e-3);
    expect_crossed<C>(1, side::below, 1e5, -1e-9);
    expect_crossed<C>(1, side::above, 1e5, above(0.05));
    expect_not_finite<C>(1e5, 1e-3);
    // fully rough limit: von Karman, 1/sqrt(f) = 2 log10(3.7 D/eps)
    CHECK(1.0 / std::sqrt(C::formula(1e14, 0.01)) ==
          doctest::Approx(2.0 * std::log10(370.0)).epsilon(1e-9));
    // smooth limit: 0.02 % from 2 log10(Re sqrt(f)) - 0.8, since 2.51 is not 10^0.4
    CHECK(C::formula(1e6, 0.0) ==
          doctest::Approx(friction::prandtl_karman_nikuradse::formula(1e6)).epsilon(3e-4));
  }

  TEST_CASE("implicit laws stay finite and positive far outside") {
    for (const double Re : {-1e300, -5.0, 0.0, 1e-300, 1e-9, 1.0, 50.0, 1e300}) {
      for (const double e : {-1.0, 0.0, 1e-6, 1.0, 3.7, 1e6}) {
        const double f = friction::colebrook_1939::formula(Re, e);
        CHECK(f > 0.0);
        CHECK(f < 10.0);
      }
      const double f = friction::prandtl_karman_nikuradse::formula(Re);
      CHECK(f > 0.0);
      CHECK(f < 20.0);
    }
  }

  TEST_CASE("Haaland") {
    using C = friction::haaland_1983;
    const auto want = [](double Re, double e) {
      const exact r =
          exact(-1.8) * log10(pow(exact(e) / exact(3.7), exact(1.11)) + exact(6.9) / Re);
      return exact(1 / (r * r));
    };
    for (const double Re : {4000.0, 3e5, 1e8}) {
      for (const double e : {1e-6, 1e-3, 0.05}) check_value<C>(want(Re, e), Re, e);
    }
    const exact smooth = exact(-1.8) * log10(exact(6.9) / 1e5);
    check_value<C>(1 / (smooth * smooth), 1e5, 0.0);
    check_scalars<C>(2e5, 2e-3);
    check_scalars<C>(2e5, 0.0);
    expect_inside<C>(4000.0, 0.0);
    expect_inside<C>(1e8, 0.05);
    expect_crossed<C>(0, side::below, below(4000.0), 1e-3);
    expect_crossed<C>(0, side::above, above(1e8), 1e-3);
    expect_crossed<C>(1, side::below, 1e5, -1e-9);
    expect_crossed<C>(1, side::above, 1e5, above(0.05));
    expect_not_finite<C>(1e5, 1e-3);
    double worst = 0.0;
    for (double Re = 4000.0; Re < 1e8; Re *= 1.3) {
      for (const double e : {0.0, 1e-6, 1e-5, 1e-4, 1e-3, 0.01, 0.05}) {
        const double ratio = number<C>(Re, e) / number<friction::colebrook_1939>(Re, e);
        worst = std::max(worst, std::abs(ratio - 1.0));
      }
    }
    CHECK(worst < 0.02);  // of the source
    CHECK(worst > 0.01);
  }

  TEST_CASE("Churchill, all regimes") {
    using C = friction::churchill_1977;
    for (const double Re : {0.5, 7.0, 640.0, 2100.0, 2600.0, 3300.0, 1e4, 2e6, 1e8}) {
      for (const double e : {0.0, 1e-5, 0.01, 0.05}) check_value<C>(churchill(Re, e), Re, e);
    }
    check_scalars<C>(900.0, 0.0);
    check_scalars<C>(2400.0, 1e-3);
    check_scalars<C>(6e4, 1e-3);
    expect_inside<C>(1e-12, 0.0);
    expect_inside<C>(1e30, 0.05);
    expect_crossed<C>(0, side::below, 0.0, 1e-3);
    expect_crossed<C>(1, side::below, 1e5, -1e-9);
    expect_crossed<C>(1, side::above, 1e5, above(0.05));
    expect_not_finite<C>(1e5, 1e-3);
    // no overflow where (A + B)^(3/2) has left the doubles, and 64/Re there
    for (const double Re : {1e-12, 1e-9, 1e-6, 1e-3, 1.0}) {
      CHECK(C::formula(Re, 0.0) * Re == doctest::Approx(64.0).epsilon(1e-12));
      const auto slope = C::formula(dual<double>::variable(Re), dual<double>(0.0)).slope[0];
      CHECK(slope * Re * Re == doctest::Approx(-64.0).epsilon(1e-12));
    }
    const working_t<float> tiny = C::formula(working_t<float>(1e-12F), working_t<float>(0.0F));
    CHECK(tiny.value == doctest::Approx(6.4e13F).epsilon(1e-5));
    CHECK(C::formula(2000.0, 0.0) == doctest::Approx(1.0014 * 64.0 / 2000.0).epsilon(1e-4));
    // 3.1 % from Colebrook's law at Re 4000, eps/D 0.01
    CHECK(C::formula(4000.0, 0.01) / friction::colebrook_1939::formula(4000.0, 0.01) ==
          doctest::Approx(1.0305).epsilon(1e-3));
  }

  TEST_CASE("entrance lengths") {
    using H = friction::entrance_length_laminar_velocity;
    check_value<H>(exact(0.6), 0.0, 1.0);
    check_value<H>(exact(0.60) / (1 + exact(0.035) * 40) + exact(0.056) * 40, 40.0, 1.0);
    check_value<H>(exact(0.60) / (1 + exact(0.035) * 2300) + exact(0.056) * 2300, 2300.0, 6.0);
    check_scalars<H>(70.0, 1.0);
    expect_inside<H>(0.0, 1.0);
    expect_inside<H>(2300.0, 1.0);
    expect_crossed<H>(0, side::above, above(2300.0), 1.0);
    expect_crossed<H>(0, side::below, -1.0, 1.0);
    expect_not_finite<H>(100.0, 1.0);

    using L = friction::entrance_length_laminar_temperature;
    check_value<L>(exact(0.05) * 1000 * 6, 1000.0, 6.0);
    check_value<L>(exact(0.05) * 2300 * exact(0.7), 2300.0, 0.7);
    check_value<L>(exact(0.05) * 3 * 900, 3.0, 900.0);
    check_scalars<L>(1000.0, 6.0);
    expect_inside<L>(0.0, 1.0);
    expect_inside<L>(2300.0, 0.0);
    expect_crossed<L>(0, side::above, above(2300.0), 1.0);
    expect_crossed<L>(0, side::below, -1.0, 1.0);
    expect_crossed<L>(1, side::below, 100.0, -0.7);
    expect_not_finite<L>(100.0, 1.0);

    using V = friction::entrance_length_turbulent_velocity;
    check_value<V>(exact(1.359) * raised(2e4, 0.25), 2e4);
    check_value<V>(exact(1.359) * raised(1e6, 0.25), 1e6);
    check_value<V>(exact(13.59), 1e4);
    check_scalars<V>(5e4);
    expect_inside<V>(1e4);
    expect_crossed<V>(0, side::below, below(1e4));
    expect_not_finite<V>(5e4);
  }

  TEST_CASE("property correction of liquids") {
    using C = friction::property_correction_liquid;
    using friction::direction;
    using friction::regime;
    for (const double r : {0.15, 0.6, 1.0, 2.0, 9.0}) {
      check_value<C>(raised(1.0 / r, 0.58), r, regime::laminar, direction::heating);
      check_value<C>(raised(1.0 / r, 0.50), r, regime::laminar, direction::cooling);
      check_value<C>(raised(1.0 / r, 0.25), r, regime::turbulent, direction::heating);
      check_value<C>(raised(1.0 / r, 0.25), r, regime::turbulent, direction::cooling);
    }
    check_scalars<C>(3.0, regime::laminar, direction::heating);
    check_scalars<C>(0.7, regime::turbulent, direction::cooling);
    expect_inside<C>(above(0.1), regime::laminar, direction::cooling);
    expect_inside<C>(below(10.0), regime::laminar, direction::heating);
    expect_crossed<C>(0, side::above, below(0.1), regime::laminar, direction::cooling);
    expect_crossed<C>(0, side::below, above(10.0), regime::laminar, direction::heating);
    expect_inside<C>(above(0.5), regime::turbulent, direction::cooling);
    expect_crossed<C>(1, side::above, below(0.5), regime::turbulent, direction::cooling);
    expect_inside<C>(below(1.0 / 0.3), regime::turbulent, direction::heating);
    expect_crossed<C>(1, side::below, above(1.0 / 0.3), regime::turbulent, direction::heating);
    expect_not_finite<C>(2.0, regime::laminar, direction::heating);
  }

  TEST_CASE("Darcy and Fanning") {
    constexpr auto f_D = darcy_friction(0.02);
    constexpr auto f_F = friction::to_fanning(f_D);
    static_assert(std::is_same_v<decltype(f_F)::kind_type, kinds::fanning_friction>);
    static_assert(f_F.si() == 0.005);
    static_assert(friction::to_darcy(f_F).si() == 0.02);
    static_assert(becomes_darcy<decltype(f_F)> && !becomes_darcy<decltype(f_D)>);
    // an estimate keeps its verdict, scatter and correlation
    const auto outside = friction::drew_koo_mcadams_1932{}(reynolds_of<hydraulic_diameter>(3000.0));
    const auto darcy = friction::to_darcy(outside);
    CHECK(darcy.si() == doctest::Approx(4.0 * outside.si()).epsilon(1e-15));
    CHECK(darcy.verdict().correlation_crossed(0, 0, side::below));
    CHECK(darcy.scatter() == doctest::Approx(0.05));
    CHECK(darcy.correlation() == outside.correlation());
    const auto in_float = friction::to_fanning(darcy_friction(0.04F));
    static_assert(std::is_same_v<decltype(in_float)::value_type, float>);
    CHECK(in_float.si() == 0.01F);
  }
}
