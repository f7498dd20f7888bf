#ifndef CONVELOPE_TESTS_FLUIDS_FLUID_SLOPES_HPP
#define CONVELOPE_TESTS_FLUIDS_FLUID_SLOPES_HPP

#include <doctest/doctest.h>

#include <boost/multiprecision/cpp_bin_float.hpp>

#include "close_to.hpp"
#include "convelope/fluids/fluid.hpp"

// Derivatives of a fluid's values against central differences in 50 digits, whose step's square,
// 1e-24 of the value, is far below what is asked.

namespace fluid_slopes {

using precise = boost::multiprecision::cpp_bin_float_50;

template <class V, class Act>
void each(const V& v, Act act) {
  act(0, v.density);
  act(1, v.specific_heat);
  act(2, v.conductivity);
  act(3, v.viscosity);
  act(4, v.expansion);
}

template <class Fluid>
convelope::fluid_values<precise> slope(const Fluid& f, const precise& T, const precise& p,
                                       bool by_pressure) {
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

/// `noise`: rounding of one value in double, as a part of the property's own scale.
template <class Fluid>
void against_50_digits(const Fluid& f, double T, double p, double noise) {
  using number = convelope::dual<double, 2>;
  CAPTURE(T);
  CAPTURE(p);
  const auto seen = f.values(number::variable(T, 0), number::variable(p, 1));
  double x[5], dT[5], dp[5];
  each(f.values(precise(T), precise(p)),
       [&](int i, const precise& y) { x[i] = static_cast<double>(y); });
  each(slope(f, T, p, false), [&](int i, const precise& y) { dT[i] = static_cast<double>(y); });
  each(slope(f, T, p, true), [&](int i, const precise& y) { dp[i] = static_cast<double>(y); });
  each(seen, [&](int i, const number& y) {
    CAPTURE(i);
    const double scale = std::fabs(x[i]) + (i == 4 ? 1.0 / T : 0.0);
    CHECK(close_to(y.value, x[i], 0.0, noise * scale));
    CHECK(close_to(y.slope[0], dT[i], 1e-10, noise * scale / T));
    CHECK(close_to(y.slope[1], dp[i], 1e-10, noise * scale / p));
  });
}

/// The expansion coefficient is -(1/rho)(d rho/dT)_p, which may pass through zero; both come from
/// the same terms, whose weights are rounded to double one by one.
template <class Fluid>
void expansion_is_of_density(const Fluid& f, double T, double p, double noise) {
  CAPTURE(T);
  CAPTURE(p);
  const auto v = f.values(precise(T), precise(p));
  const precise expected = -slope(f, T, p, false).density / v.density;
  CHECK(close_to(static_cast<double>(v.expansion), static_cast<double>(expected), 5.0 * noise,
                 5.0 * noise / T));
}

/// The expansion coefficient is -(1/rho)(d rho/dT)_p, and (d cp/dp)_T = -T (d2 v/dT2)_p.
template <class Fluid>
void thermodynamically_consistent(const Fluid& f, double T, double p, double relative) {
  CAPTURE(T);
  CAPTURE(p);
  const auto volume = [&](const precise& t) {
    return precise(1 / f.values(t, precise(p)).density);
  };
  const precise h = precise(T) * precise(1e-12);
  const precise up = volume(precise(T) + h);
  const precise here = volume(precise(T));
  const precise down = volume(precise(T) - h);
  const auto v = f.values(T, p);
  CHECK(close_to(v.expansion, static_cast<double>((up - down) / (2 * h * here)), relative));
  const double curvature = static_cast<double>(-T * (up - 2 * here + down) / (h * h));
  CHECK(close_to(static_cast<double>(slope(f, T, p, true).specific_heat), curvature, 1e-9,
                 relative * v.specific_heat / p));
}

}  // namespace fluid_slopes

#endif
