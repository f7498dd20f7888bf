#ifndef CONVELOPE_SURFACES_BUOYANCY_HPP
#define CONVELOPE_SURFACES_BUOYANCY_HPP

#include "convelope/surfaces/film.hpp"

namespace convelope {
inline namespace v0 {
namespace detail {

// A Rayleigh number this small is rounded off, so that roots of it keep a finite slope.
inline constexpr double least_rayleigh = 1e-10;
// Scale of Ra on which hot side turns into cold side.
inline constexpr double side_rayleigh = 1.0;

/// beta by the fluid's rule: gases at the ambient temperature, liquids at the film temperature.
template <fluid Fluid, class T>
CONVELOPE_FUNCTION constexpr T expansion_by_rule(const Fluid& f, const fluid_values<T>& at_film,
                                                 const T& ambient, const T& p) {
  if constexpr (!is_gas<Fluid>) {
    return at_film.expansion;
  } else if constexpr (requires { f.expansion(ambient, p); }) {
    return f.expansion(ambient, p);
  } else {
    return f.values(ambient, p).expansion;
  }
}

/// What drives natural convection at a wall: Ra = g |beta dT| L^3/(nu alpha), film properties,
/// finite with a finite slope everywhere; and its side, -1 .. 1, the sign of beta dT, smooth
/// through zero.
///
/// With its film at a density maximum (water, 4 degC) a wall has beta = 0 but not a fluid at rest:
/// the densest layer lies between wall and stream, beta' dT^2/8 denser than either for
/// beta = beta' (T - T_max). Where a fluid states beta' as `expansion_slope`, Ra does not fall
/// below what that drives; for beta five times as large this adds 0.08 % to Ra (a choice of this
/// library: the bare rule sends h to conduction in a cusp with slopes of 1e11 W/(m2 K)).
template <class T>
struct buoyancy {
  T Ra;
  T side;

  template <fluid Fluid>
  CONVELOPE_FUNCTION constexpr buoyancy(const Fluid& f, const fluid_values<T>& at_film,
                                        const T& wall, const T& ambient, const T& p, double length,
                                        double g) {
    const double k = g * length * length * length;
    const T dT = T(wall - ambient);
    // Gr Pr, of groups that Re and the laws need too.
    const T per_nu = T(at_film.density / at_film.viscosity);
    const T per_beta = T(k * dT * T(per_nu * per_nu) * at_film.prandtl());
    const T given = T(per_beta * expansion_by_rule(f, at_film, ambient, p));
    if constexpr (requires { Fluid::expansion_slope; }) {
      const T square = T(given * given + least_rayleigh * least_rayleigh);
      const T least = T(per_beta * dT * (0.125 * Fluid::expansion_slope));
      const T other = T(least * least);
      Ra = math::sqrt(T(square + other * (other / (square + other))));
    } else {
      Ra = math::smooth_magnitude(given, least_rayleigh);
    }
    side = T(given / math::smooth_magnitude(Ra, side_rayleigh));
  }
};

}  // namespace detail
}  // namespace v0
}  // namespace convelope

#endif
