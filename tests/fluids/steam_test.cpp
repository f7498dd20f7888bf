#include "convelope/fluids/steam.hpp"

#include <doctest/doctest.h>

#include <limits>

#include "convelope/fluids/detail/if97_region3.hpp"
#include "convelope/fluids/detail/if97_region5.hpp"
#include "convelope/fluids/liquid_water.hpp"
#include "convelope/fluids/saturated_water.hpp"
#include "fluid_numbers.hpp"
#include "fluid_slopes.hpp"

using namespace convelope;

static_assert(fluid<steam>);
static_assert(steam::expansion_at == expansion_rule::ambient);

namespace {
namespace if97 = detail::if97;
using detail::word::of_fluid;

verdict<std::uint64_t> seen(double T, double p) {
  return verdict<std::uint64_t>(steam{}.check(T, p));
}
double rho(double T, double p) { return steam{}.values(T, p).density; }

// The last two lie outside.
constexpr fluid_numbers::point points[8] = {{300.0, 3500.0}, {373.2, 101325.0}, {450.0, 5e5},
                                            {600.0, 1e6},    {700.0, 3e7},      {1073.0, 1e8},
                                            {270.0, 1e3},    {400.0, 3e5}};
}  // namespace

TEST_CASE("steam: slopes, expansion and heat capacity against 50 digits") {
  for (const double T : {273.15, 300.0, 373.15, 450.0, 550.0, 623.15, 700.0, 863.15, 1073.15}) {
    const double most = T <= 623.15 ? if97::saturation_pressure(T)
                        : T < 863.0 ? if97::b23_pressure(T)
                                    : 1e8;
    for (const double p : {100.0, 0.1 * most, 0.7 * most, most}) {
      fluid_slopes::against_50_digits(steam{}, T, p, 2e-13);
      fluid_slopes::thermodynamically_consistent(steam{}, T, p, 1e-12);
    }
  }
}

TEST_CASE("steam on every number type") { fluid_numbers::on_every_number(steam{}, points, 1e-4); }

TEST_CASE("steam: each limit is flagged on its side, and no other") {
  for (const double T : {273.15, 300.0, 373.15, 500.0, 623.15}) {
    CAPTURE(T);
    const double saturated = if97::saturation_pressure(T);
    CHECK(seen(T, 100.0).bits() == 0);
    CHECK(seen(T, saturated).bits() == 0);
    CHECK(seen(T, 1.0002 * saturated).bits() == 0);
    CHECK(seen(T, 1.0003 * saturated).bits() == of_fluid(2, side::above));
    CHECK(seen(T, 99.0).bits() == of_fluid(1, side::below));
  }
  for (const double T : {624.0, 647.096, 700.0, 862.0}) {
    CAPTURE(T);
    const double line = if97::b23_pressure(T);
    CHECK(seen(T, 0.9999 * line).bits() == 0);
    CHECK(seen(T, 1.0001 * line).bits() == of_fluid(3, side::above));
  }
  CHECK(seen(873.15, 100e6).bits() == 0);
  CHECK(seen(1073.15, 100e6).bits() == 0);
  CHECK(seen(1073.2, 1e5).bits() == of_fluid(0, side::above));
  CHECK(seen(900.0, 1.001e8).bits() == of_fluid(1, side::above));
  CHECK(seen(273.1, 500.0).bits() == of_fluid(0, side::below));
  // Colder than the saturation line goes, it is taken at its end.
  CHECK(seen(250.0, 620.0).bits() == (of_fluid(0, side::below) | of_fluid(2, side::above)));
  CHECK(seen(300.0, 1e5).bits() == of_fluid(2, side::above));  // it would condense
}

TEST_CASE("steam: what is not finite is flagged and never crashes") {
  const volatile double nan = std::numeric_limits<double>::quiet_NaN();
  const volatile double infinite = std::numeric_limits<double>::infinity();
  for (const double bad : {double(nan), double(infinite), -double(infinite)}) {
    CHECK_FALSE(seen(bad, 500.0).finite_input());
    CHECK_FALSE(seen(600.0, bad).finite_input());
    CHECK_FALSE(seen(600.0, bad).inside());
    if (zero_divisor_stops) continue;
    (void)steam{}.values(bad, 1e5);
    (void)steam{}.values(600.0, bad);
  }
  for (const double T : {-300.0, 0.0, 1e-300, 650.175, 1080.0, 1e300}) {
    CHECK_FALSE(seen(T, 3e7).inside());
    if (!zero_divisor_stops) (void)steam{}.values(T, 3e7);
  }
  // Just beyond the hot end, where tau - 0.5 passes through zero.
  CHECK(std::isfinite(steam{}.values(1080.0, 1e5).expansion));
}

TEST_CASE("steam is not quite an ideal gas") {
  const double p = 101325.0;
  CHECK(373.2 * steam{}.values(373.2, p).expansion == doctest::Approx(1.0823).epsilon(1e-3));
  CHECK(500.0 * steam{}.values(500.0, p).expansion == doctest::Approx(1.0167).epsilon(1e-3));
  // At 100 Pa it is: R7-97 gives R = 461.526 J/(kg K).
  CHECK(close_to(rho(900.0, 100.0), 100.0 / (461.526 * 900.0), 1e-6));
  CHECK(close_to(900.0 * steam{}.values(900.0, 100.0).expansion, 1.0, 3e-6));
}

TEST_CASE("steam: natural convection is driven by the ambient's expansion coefficient") {
  const double p = 101325.0;
  for (const double ambient : {373.2, 380.0, 400.0}) {
    for (const double wall : {410.0, 450.0, 500.0, 700.0}) {
      CAPTURE(ambient);
      CAPTURE(wall);
      const double driving = rho(ambient, p) / rho(wall, p) - 1.0;
      const double difference = wall - ambient;
      const double of_ambient = steam{}.values(ambient, p).expansion * difference;
      const double of_film = steam{}.values(0.5 * (wall + ambient), p).expansion * difference;
      CHECK(close_to(of_ambient, driving, 0.051));
      CHECK(std::fabs(of_ambient - driving) < std::fabs(of_film - driving));
    }
  }
}

TEST_CASE("IAPWS-IF97: the regions meet") {
  // Supplementary statement of R7-97(2012), section 8 (from memory): at the boundaries of regions
  // 1/3 and 2/3 the specific volumes differ by less than 0.05 %, the enthalpies by 0.2 kJ/kg.
  const auto region3_at = [](double T, double p, double rho) {
    for (int i = 0; i < 50; ++i) {
      const auto s = if97::region3_state(T, rho);
      rho -= (s.pressure - p) / s.pressure_slope;
    }
    return if97::region3_state(T, rho).rest;
  };
  const auto meet = [](const if97::state<double>& a, const if97::state<double>& b) {
    CHECK(close_to(a.volume, b.volume, 5e-4));
    CHECK(close_to(a.enthalpy, b.enthalpy, 0.0, 200.0));
    CHECK(close_to(a.entropy, b.entropy, 0.0, 0.2));
    CHECK(close_to(a.cp, b.cp, 0.01));
    CHECK(close_to(a.sound_speed, b.sound_speed, 0.005));
  };
  for (const double T : {623.15, 650.0, 700.0, 800.0, 863.0}) {
    CAPTURE(T);
    const double p = if97::b23_pressure(T);
    const auto vapour = if97::region2_state(T, p);
    meet(vapour, region3_at(T, p, 1.0 / vapour.volume));
    CHECK(close_to(if97::b23_temperature(p), T, 1e-10));
  }
  for (const double p : {17e6, 20e6, 50e6, 100e6}) {
    CAPTURE(p);
    const auto liquid = if97::region1_state(623.15, p);
    meet(liquid, region3_at(623.15, p, 1.0 / liquid.volume));
  }
  for (const double p : {1e4, 1e6, 1e7, 5e7}) {
    CAPTURE(p);
    meet(if97::region2_state(1073.15, p), if97::region5_state(1073.15, p));
  }
}

TEST_CASE("IAPWS-IF97: equilibrium of liquid and vapour on the saturation line") {
  for (const double T : {273.16, 300.0, 373.15, 450.0, 550.0, 600.0, 623.15}) {
    CAPTURE(T);
    const double p = if97::saturation_pressure(T);
    const auto liquid = if97::region1_state(T, p);
    const auto vapour = if97::region2_state(T, p);
    // Equal Gibbs energies, within the 0.025 % of the saturation pressure.
    const double of_liquid = liquid.enthalpy - T * liquid.entropy;
    const double of_vapour = vapour.enthalpy - T * vapour.entropy;
    CHECK(close_to(of_liquid, of_vapour, 0.0, 2.5e-4 * p * vapour.volume));
    // The explicit equations of SR1-86 are of the same line.
    CHECK(close_to(saturated_water::latent_heat(T), vapour.enthalpy - liquid.enthalpy, 4e-4));
    CHECK(close_to(detail::sr1_86::liquid_density(T) * liquid.volume, 1.0, 4e-4));
    CHECK(close_to(detail::sr1_86::vapour_density(T) * vapour.volume, 1.0, 6e-4));
    CHECK(close_to(detail::sr1_86::pressure(T), p, 2.5e-4));
    CHECK(close_to(saturated_water::saturation_temperature(p), T, 1e-8));
    CHECK(saturated_water::liquid(T).density == liquid_water{}.values(T, p).density);
    CHECK(saturated_water::vapour(T).density == steam{}.values(T, p).density);
  }
}

TEST_CASE("IAPWS-IF97 region 2: the nested sums are those of the release, term by term") {
  using precise = fluid_slopes::precise;
  for (const double T : {280.0, 450.0, 623.15, 700.0, 863.15, 1073.15}) {
    for (const double p : {1e3, 1e5, 1e7, 1e8}) {
      CAPTURE(T);
      CAPTURE(p);
      const precise tau = 540 / precise(T);
      const precise pi = precise(p) / 1000000;
      const precise b = tau - precise(0.5);
      precise g = 0;
      precise by_pi = 0;
      precise by_tau_tau = 0;
      precise by_pi_tau = 0;
      for (const if97::term& k : if97::region2_terms) {
        const precise x = precise(k.n) * pow(pi, k.i) * pow(b, k.j);
        g += x;
        by_pi += k.i * x / pi;
        by_pi_tau += k.i * k.j * x / (pi * b);
        by_tau_tau += k.j * (k.j - 1) * x / (b * b);
      }
      const if97::region2_powers<precise> w(pi, tau);
      const auto same = [](const precise& a, const precise& e) {
        CHECK(close_to(static_cast<double>(a / e), 1.0, 1e-15));
      };
      // The weighted coefficients are rounded to double one by one.
      const auto nearly = [](const precise& a, const precise& e) {
        CHECK(close_to(static_cast<double>(a / e), 1.0, 1e-10));
      };
      same(pi * if97::region2_sum<if97::plain_sum>(w), g);
      nearly(if97::region2_sum<if97::by_pi>(w), by_pi);
      nearly(if97::region2_from1<if97::by_pi_tau>(w), by_pi_tau);
      nearly(pi * if97::region2_from2<if97::by_tau_tau>(w), by_tau_tau);
    }
  }
}

TEST_CASE("saturation line: slopes against 50 digits") {
  using precise = fluid_slopes::precise;
  using one = dual<double, 1>;
  const auto check = [](auto f, double T, double relative) {
    CAPTURE(T);
    const precise h = precise(T) * precise(1e-12);
    const precise slope = (f(precise(T + h)) - f(precise(T - h))) / (2 * h);
    CHECK(close_to(f(one::variable(T)).slope[0], static_cast<double>(slope), relative));
  };
  for (const double T : {273.16, 300.0, 373.15, 450.0, 550.0, 640.0}) {
    check([](const auto& x) { return detail::sr1_86::pressure(x); }, T, 1e-10);
    check([](const auto& x) { return detail::sr1_86::liquid_density(x); }, T, 1e-10);
    check([](const auto& x) { return detail::sr1_86::vapour_density(x); }, T, 1e-10);
    check([](const auto& x) { return saturated_water::latent_heat(x); }, T, 1e-9);
    check([](const auto& x) { return saturated_water::surface_tension(x); }, T, 1e-10);
    check([](const auto& x) { return detail::sr1_86::liquid_enthalpy(x); }, T, 1e-9);
    CHECK(close_to(detail::sr1_86::pressure(one::variable(T)).slope[0],
                   detail::sr1_86::pressure_slope(T), 1e-10));
  }
  for (const double p : {700.0, 1e5, 1e7, 2.2e7}) {
    CAPTURE(p);
    const precise h = precise(p) * precise(1e-12);
    const precise slope = (if97::saturation_temperature(precise(p + h)) -
                           if97::saturation_temperature(precise(p - h))) /
                          (2 * h);
    CHECK(close_to(if97::saturation_temperature(one::variable(p)).slope[0],
                   static_cast<double>(slope), 1e-9));
  }
}

TEST_CASE("IAPWS-IF97 region 1: the backward equation is within 25 mK of the forward one") {
  for (const double T : {274.0, 300.0, 400.0, 500.0, 600.0, 623.0}) {
    for (const double p : {1.01 * if97::saturation_pressure(T), 3e7, 1e8}) {
      CAPTURE(T);
      CAPTURE(p);
      const double h = if97::region1_state(T, p).enthalpy;
      CHECK(close_to(if97::region1_temperature(p, h), T, 0.0, 0.025));
    }
  }
}

TEST_CASE("IAPWS-IF97: heat capacities and sound speed follow from the other quantities") {
  using two = dual<double, 2>;
  const auto check = [](auto state, double T, double p) {
    CAPTURE(T);
    CAPTURE(p);
    const auto s = state(two::variable(T, 0), two::variable(p, 1));
    const double v = s.volume.value;
    const double v_T = s.volume.slope[0];
    const double v_p = s.volume.slope[1];
    CHECK(close_to(s.cp.value, s.enthalpy.slope[0], 1e-9));
    CHECK(close_to(s.cp.value, T * s.entropy.slope[0], 1e-9));
    CHECK(close_to(s.enthalpy.slope[1], v - T * v_T, 1e-7, 1e-9 * v));
    CHECK(close_to(s.energy.value, s.enthalpy.value - p * v, 1e-9, 1e-6));
    CHECK(close_to(s.compressibility.value, -v_p / v, 1e-9));
    CHECK(close_to(s.cp.value - s.cv.value, -T * v_T * v_T / v_p, 1e-9, 1e-9 * s.cp.value));
    CHECK(close_to(s.sound_speed.value, v / std::sqrt(-v_p * s.cv.value / s.cp.value), 1e-9));
  };
  for (const double p : {1e5, 3e7, 1e8}) {
    check([](const auto& T, const auto& x) { return if97::region1_state(T, x); }, 300.0, p);
    check([](const auto& T, const auto& x) { return if97::region1_state(T, x); }, 360.0, p);
    check([](const auto& T, const auto& x) { return if97::region2_state(T, x); }, 900.0, p);
    check([](const auto& T, const auto& x) { return if97::region2_state(T, x); }, 1050.0, p);
    check([](const auto& T, const auto& x) { return if97::region5_state(T, x); }, 1500.0, p);
  }
}

TEST_CASE("steam tells where it comes from") {
  const fluid_info* info = steam{}.info();
  CHECK(info->limit_count == 4);
  CHECK(info->limits[0].low == 273.15);
  CHECK(info->limits[0].high == 1073.15);
  CHECK(info->limits[1].low == 100.0);
  CHECK(info->limits[1].high == 100e6);
  CHECK(info->limits[2].high == 1.00025);
  CHECK(info->limits[3].high == 1.0);
}
