// Gases: envelopes, verdicts, what they say of themselves, and the equations of state behind them.
#include <doctest/doctest.h>

#include <limits>

#include "close_to.hpp"
#include "convelope/fluids/argon.hpp"
#include "convelope/fluids/carbon_dioxide.hpp"
#include "convelope/fluids/detail/dilute_gas.hpp"
#include "convelope/fluids/detail/gas_equations.hpp"
#include "convelope/fluids/helium.hpp"
#include "convelope/fluids/hydrogen.hpp"
#include "convelope/fluids/nitrogen.hpp"
#include "convelope/fluids/oxygen.hpp"

using namespace convelope;
using detail::word::of_fluid;

static_assert(fluid<nitrogen> && fluid<oxygen> && fluid<argon>);
static_assert(fluid<carbon_dioxide> && fluid<helium> && fluid<hydrogen>);
static_assert(nitrogen::expansion_at == expansion_rule::ambient);

namespace {

template <class Fluid>
void each_limit_on_its_side(const Fluid& f, double T_low, double T_high, double p_high) {
  CAPTURE(f.info()->name);
  const double p_low = 1e3;
  for (const double T : {T_low, 300.0, T_high}) {
    for (const double p : {p_low, 101325.0, p_high}) CHECK(f.check(T, p) == 0);
  }
  CHECK(f.check(T_low - 0.1, 1e5) == of_fluid(0, side::below));
  CHECK(f.check(T_high + 0.1, 1e5) == of_fluid(0, side::above));
  CHECK(f.check(300.0, p_low - 1.0) == of_fluid(1, side::below));
  CHECK(f.check(300.0, p_high + 1.0) == of_fluid(1, side::above));
  CHECK(f.check(-40.0, -1.0) == (of_fluid(0, side::below) | of_fluid(1, side::below)));
  const volatile double nan = std::numeric_limits<double>::quiet_NaN();
  const volatile double infinite = std::numeric_limits<double>::infinity();
  for (const double bad : {double(nan), double(infinite), -double(infinite)}) {
    for (const std::uint64_t bits : {f.check(bad, 1e5), f.check(300.0, bad)}) {
      CHECK_FALSE(verdict<std::uint64_t>(bits).finite_input());
      CHECK_FALSE(verdict<std::uint64_t>(bits).inside());
    }
    if (!zero_divisor_stops) (void)f.values(bad, 1e5);
  }
  // A solver's step beyond the envelope meets numbers, not NaN.
  for (const double T : {0.6 * T_low, 0.9 * T_low, 1.5 * T_high}) {
    for (const double p : {0.0, 10.0, 1e5, p_high, 3.0 * p_high}) {
      CAPTURE(T);
      CAPTURE(p);
      const auto v = f.values(T, p);
      CHECK(std::isfinite(v.density));
      CHECK(std::isfinite(v.specific_heat));
      CHECK(std::isfinite(v.conductivity));
      CHECK(std::isfinite(v.viscosity));
      CHECK(std::isfinite(v.expansion));
    }
  }
  // An ideal gas in the end.
  const auto thin = f.values(500.0, 1.0);
  CHECK(close_to(thin.expansion, 1.0 / 500.0, 1e-6));
  CHECK(close_to(f.values(500.0, 2.0).density, 2.0 * thin.density, 1e-6));
}

}  // namespace

TEST_CASE("gases: each limit is flagged on its side, and no other") {
  each_limit_on_its_side(nitrogen{}, 200.0, 2000.0, 2e6);
  each_limit_on_its_side(oxygen{}, 200.0, 2000.0, 2e6);
  each_limit_on_its_side(argon{}, 200.0, 2000.0, 2e6);
  each_limit_on_its_side(carbon_dioxide{}, 220.0, 1100.0, 5e5);
  each_limit_on_its_side(helium{}, 100.0, 1500.0, 5e5);
  each_limit_on_its_side(hydrogen{}, 200.0, 1000.0, 5e5);
}

TEST_CASE("gases tell where they come from") {
  CHECK(nitrogen{}.info()->source->year == 2004);
  CHECK(carbon_dioxide{}.info()->source->year == 1996);
  const auto state = state_of(oxygen{}, typed<kinds::film_temperature>::from_si(300.0),
                              typed<kinds::pressure>::from_si(1e5));
  CHECK(state.density().inside());
  CHECK(state.viscosity().scatter() == doctest::Approx(0.05));
  CHECK(state.density().fluid() == oxygen{}.info());
}

namespace {

// p(rho, T) and cv must agree with each other and with the derivatives given beside them.
template <class Equation>
void equation_is_consistent(double T, double rho) {
  using inner = dual<double, 2>;
  using outer = dual<inner, 2>;
  CAPTURE(T);
  CAPTURE(rho);
  const outer t = outer::variable(inner::variable(T, 0), 0);
  const outer r = outer::variable(inner::variable(rho, 1), 1);
  const outer inverse = outer(1.0 / t);
  const auto s = detail::helmholtz::state_of<Equation>(
      r, t, inverse, Equation::ideal_heat(t, inverse, math::sqrt(t)));
  const double R = Equation::gas_constant;
  const double dp_dT = s.pressure.slope[0].value;
  const double dp_drho = s.pressure.slope[1].value;
  const double d2p_dT2 = s.pressure.slope[0].slope[0];
  const double stiffness = s.stiffness.value.value;
  const double cv = R * s.cv_over_R.value.value;
  const double cp = R * s.cp_over_R.value.value;
  CHECK(close_to(stiffness * R * T, dp_drho, 1e-10, 1e-10 * R * T));
  CHECK(close_to(s.expansion.value.value * rho * dp_drho, dp_dT, 1e-10));
  CHECK(close_to((cp - cv) * rho * rho * dp_drho, T * dp_dT * dp_dT, 1e-10));
  CHECK(close_to(R * s.cv_over_R.slope[1].value, -T * d2p_dT2 / (rho * rho), 1e-9, 1e-9 * R / rho));
}

}  // namespace

TEST_CASE("equations of state: pressure, cv, cp, expansion from one Helmholtz energy") {
  const auto everywhere = [](auto equation, double Tc, double rho_c) {
    using E = decltype(equation);
    for (const double T : {0.7 * Tc, 1.02 * Tc, 1.2 * Tc, 2.0 * Tc, 8.0 * Tc}) {
      for (const double rho : {0.01 * rho_c, 0.5 * rho_c, 1.05 * rho_c, 2.5 * rho_c}) {
        equation_is_consistent<E>(T, rho);
      }
    }
  };
  everywhere(detail::air_equation{}, 132.6312, 10447.7);
  everywhere(detail::nitrogen_equation{}, 126.192, 11183.9);
  everywhere(detail::oxygen_equation{}, 154.581, 13630.0);
  everywhere(detail::argon_equation{}, 150.687, 13407.43);
}

TEST_CASE("gases by the second virial coefficient: the limit of the full equation") {
  const auto compare = [](auto equation) {
    using E = decltype(equation);
    for (const double T : {150.0, 300.0, 1000.0}) {
      CAPTURE(T);
      const double inverse = 1.0 / T;
      const double rho = 1e-3;
      const double heat = E::ideal_heat(T, inverse, std::sqrt(T));
      const auto full = detail::helmholtz::state_of<E>(rho, T, inverse, heat);
      const auto v = detail::helmholtz::virial<E::terms, E::unit>(E::reducing_temperature * inverse,
                                                                  T / E::reducing_temperature);
      const double measured = full.pressure / (rho * E::gas_constant * T) - 1.0;
      CHECK(close_to(v.b * rho / E::reducing_density, measured, 1e-5, 1e-14));
    }
  };
  compare(detail::air_equation{});
  compare(detail::nitrogen_equation{});
  compare(detail::oxygen_equation{});
  compare(detail::argon_equation{});
}
