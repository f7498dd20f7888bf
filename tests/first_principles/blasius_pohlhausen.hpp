#pragma once

// Laminar boundary layer of a flat plate at zero incidence, constant properties.
//   momentum  f''' + f f''/2 = 0                     f(0) = f'(0) = 0, f'(inf) = 1
//   isothermal wall  th'' + (Pr/2) f th' = 0         th(0) = 1, th(inf) = 0
//   isoflux wall     th'' + (Pr/2)(f th' - f' th) = 0  th'(0) = -1, th(inf) = 0
//   adiabatic wall   th'' + (Pr/2) f th' + 2 Pr f''^2 = 0  th'(0) = 0, th(inf) = 0
// with eta = y (U/(nu x))^(1/2). H. Blasius, Z. Math. Phys. 56 (1908) 1-37; E. Pohlhausen, ZAMM 1
// (1921) 115-121. No shooting is needed: the momentum equation has a scaling group (K. Toepfer,
// Z. Math. Phys. 60 (1912) 397-398) and the energy equations are linear.

#include <array>
#include <boost/numeric/odeint/integrate/integrate_adaptive.hpp>
#include <boost/numeric/odeint/stepper/controlled_runge_kutta.hpp>
#include <boost/numeric/odeint/stepper/generation/generation_controlled_runge_kutta.hpp>
#include <boost/numeric/odeint/stepper/generation/generation_runge_kutta_fehlberg78.hpp>
#include <boost/numeric/odeint/stepper/generation/make_controlled.hpp>
#include <boost/numeric/odeint/stepper/runge_kutta_fehlberg78.hpp>
#include <cmath>

namespace first_principles {

/// f''(0), from F''(0) = 1 and the group f(eta) = c F(c eta).
inline double blasius_wall_shear() {
  namespace odeint = boost::numeric::odeint;
  using state = std::array<double, 3>;
  state y{0.0, 0.0, 1.0};
  const auto rhs = [](const state& s, state& ds, double) { ds = {s[1], s[2], -0.5 * s[0] * s[2]}; };
  odeint::integrate_adaptive(
      odeint::make_controlled<odeint::runge_kutta_fehlberg78<state>>(1e-14, 1e-14), rhs, y, 0.0,
      16.0, 0.01);
  return std::pow(y[1], -1.5);
}

struct plate_layer {
  double isothermal;   // Nu_x / Re_x^(1/2)
  double isoflux;      // Nu_x / Re_x^(1/2), on the local wall excess
  double recovery;     // (T_aw - T_e) / (U^2 / (2 cp))
  double outer_shift;  // limit of eta - f
};

inline plate_layer solve_plate_layer(double Pr, double tolerance = 1e-13) {
  namespace odeint = boost::numeric::odeint;
  // f, f', f'', integral of f, isothermal integral, dissipation slope and integral,
  // two independent isoflux solutions with their slopes
  using state = std::array<double, 11>;
  static const double wall_shear = blasius_wall_shear();
  state y{0.0, 0.0, wall_shear, 0.0, 0.0, 0.0, 0.0, 1.0, 0.0, 0.0, 1.0};
  const auto rhs = [Pr](const state& s, state& ds, double) {
    const double f = s[0];
    const double df = s[1];
    const double ddf = s[2];
    ds = {df,
          ddf,
          -0.5 * f * ddf,
          f,
          std::exp(-0.5 * Pr * s[3]),
          ddf * ddf - 0.5 * Pr * f * s[5],
          s[5],
          s[8],
          0.5 * Pr * (df * s[7] - f * s[8]),
          s[10],
          0.5 * Pr * (df * s[9] - f * s[10])};
  };
  // beyond the velocity layer the temperature falls as exp(-Pr (eta - 1.72)^2 / 4)
  const double far = 16.0 + 13.0 / std::sqrt(Pr);
  odeint::integrate_adaptive(
      odeint::make_controlled<odeint::runge_kutta_fehlberg78<state>>(tolerance, tolerance), rhs, y,
      0.0, far, 1e-3);
  return {1.0 / y[4], y[7] / y[9], 2.0 * Pr * y[6], far - y[0]};
}

}  // namespace first_principles
