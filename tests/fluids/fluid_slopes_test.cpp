// Values, slopes and the expansion coefficient against 50-digit differences, over the envelopes.
#include <doctest/doctest.h>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include "close_to.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/fluids/liquid_water.hpp"

using namespace convelope;

namespace {

using precise = boost::multiprecision::cpp_bin_float_50;
using number = dual<double, 2>;

template <class V, class Act>
void each(const V& v, Act act) {
  act(0, v.density);
  act(1, v.specific_heat);
  act(2, v.conductivity);
  act(3, v.viscosity);
  act(4, v.expansion);
}

// Central difference; the step's square, 1e-24 of the value, is far below what is asked.
template <class Fluid>
fluid_values<precise> slope(const Fluid& f, const precise& T, const precise& p, bool by_pressure) {
  const precise step = (by_pressure ? p : T) * precise(1e-12);
  const precise dT = by_pressure ? precise(0) : step;
  const precise dp = by_pressure ? step : precise(0);
  const auto up = f.values(precise(T + dT), precise(p + dp));
  const auto down = f.values(precise(T - dT), precise(p - dp));
  const precise scale = 1 / (2 * step);
  return {(up.density - down.density) * scale, (up.specific_heat - down.specific_heat) * scale,
          (up.conductivity - down.conductivity) * scale, (up.viscosity - down.viscosity) * scale,
          (up.expansion - down.expansion) * scale};
}

// `noise`: rounding of one value in double, as a part of the property's own scale.
template <class Fluid>
void against_50_digits(const Fluid& f, double T, double p, double noise) {
  CAPTURE(T);
  CAPTURE(p);
  const auto seen = f.values(number::variable(T, 0), number::variable(p, 1));
  const auto value = f.values(precise(T), precise(p));
  const auto by_T = slope(f, T, p, false);
  const auto by_p = slope(f, T, p, true);
  double x[5], dT[5], dp[5];
  each(value, [&](int i, const precise& y) { x[i] = static_cast<double>(y); });
  each(by_T, [&](int i, const precise& y) { dT[i] = static_cast<double>(y); });
  each(by_p, [&](int i, const precise& y) { dp[i] = static_cast<double>(y); });
  each(seen, [&](int i, const number& y) {
    CAPTURE(i);
    // A slope or an expansion coefficient may pass through zero.
    const double scale = std::fabs(x[i]) + (i == 4 ? 1.0 / T : 0.0);
    CHECK(close_to(y.value, x[i], 0.0, noise * scale));
    CHECK(close_to(y.slope[0], dT[i], 1e-10, noise * scale / T));
    CHECK(close_to(y.slope[1], dp[i], 1e-10, noise * scale / p));
  });
  const precise expected = -by_T.density / value.density;
  // Both from the same terms, whose weights are rounded to double one by one.
  CHECK(close_to(x[4], static_cast<double>(expected), 5.0 * noise, 5.0 * noise / T));
}

}  // namespace

TEST_CASE("dry air: slopes and expansion against 50 digits") {
  for (const double T : {200.0, 233.0, 300.0, 421.5, 600.0, 987.0, 1500.0, 2000.0}) {
    for (const double p : {1e3, 101325.0, 3e5}) {
      against_50_digits(dry_air{}, T, p, 1e-14);
      against_50_digits(dry_air_fast{}, T, p, 1e-14);
    }
  }
}

TEST_CASE("liquid water: slopes and expansion against 50 digits") {
  for (const double T : {273.15, 276.0, 277.13, 280.0, 300.0, 350.0, 420.0, 500.0, 573.0, 623.15}) {
    const double p_sat = liquid_water::saturation_pressure(T);
    for (const double p : {p_sat, 1.7e7, 5e7, 1e8}) against_50_digits(liquid_water{}, T, p, 2e-13);
  }
}

TEST_CASE("liquid water: saturation pressure and its slope against 50 digits") {
  for (const double T : {273.15, 300.0, 373.124, 450.0, 550.0, 623.15, 647.0}) {
    CAPTURE(T);
    const auto seen = liquid_water::saturation_pressure(dual<double, 1>::variable(T));
    const precise h = precise(T) * precise(1e-12);
    const precise up = liquid_water::saturation_pressure(precise(T + h));
    const precise down = liquid_water::saturation_pressure(precise(T - h));
    CHECK(close_to(seen.value, static_cast<double>((up + down) / 2), 1e-12));
    CHECK(close_to(seen.slope[0], static_cast<double>((up - down) / (2 * h)), 1e-11));
  }
}
