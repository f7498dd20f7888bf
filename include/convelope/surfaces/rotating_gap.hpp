#ifndef CONVELOPE_SURFACES_ROTATING_GAP_HPP
#define CONVELOPE_SURFACES_ROTATING_GAP_HPP

#include "convelope/correlations/external/annular_gap.hpp"
#include "convelope/groups/state.hpp"
#include "convelope/surfaces/film.hpp"

namespace convelope {
inline namespace v0 {

/// The wall of a turning inner cylinder before a still outer cylinder, no axial flow.
///
/// Conduction (annular-gap/conduction-limit) up to Ta 41, where vortices begin; from Ta 100 the
/// upper law of annular-gap/taylor-gazley; between them a quintic hand-over in place of the
/// published middle law, which meets neither neighbour. q = h (T_inner - T_outer) per inner area.
struct rotating_inner_cylinder {
  typed<kinds::radius> inner_radius;
  typed<kinds::gap> gap;

  using conduction = annular_gap::conduction_limit;
  using rotation = annular_gap::taylor_gazley;
  static constexpr const char* name = "rotating inner cylinder";
  static constexpr const speakers& speaks = detail::speakers_of<conduction, rotation>;
  template <class T>
  using exposure = rotating_gap_flow<T>;

  template <fluid Fluid, class T>
  CONVELOPE_FUNCTION constexpr film<T> film_at(const Fluid& f, const rotating_gap_flow<T>& s,
                                               const T& wall) const {
    using P = plain_t<T>;
    using adaptor = scalar_adaptor<T>;
    const detail::usable_length r(inner_radius.si());
    const detail::usable_length b(gap.si());
    const T& outer = s.temperature.si();
    const T& p = s.pressure.si();
    const T at = detail::state_of<conduction, rotation>(wall, outer);
    const fluid_values<T> v = f.values(at, p);
    const T Pr = v.prandtl();

    const T eta = adaptor::constant(r.metres / (r.metres + b.metres));
    const T Ta =
        T(detail::rounded_reynolds(v, s.velocity.si(), b.metres) * math::sqrt(b.metres / r.metres));
    const T above = math::larger(Ta, adaptor::constant(101.0));
    // The upper law, drawn out below Ta 100 by its own square root.
    const T turning = T(rotation::formula(above, Pr) * math::sqrt(T(Ta / above)));
    const T w = math::hand_over(Ta, 41.0, 100.0);

    const P turning_share = plain(w);
    const P still_share = detail::complement(turning_share);
    const bits_t<T> bits(bits_t<T>(r.bits | b.bits) | f.check(at, p) |
                         detail::sound<T>(wall, outer, p, s.velocity.si()) |
                         detail::asked<conduction, T>(0, still_share, eta) |
                         detail::asked<rotation, T>(1, turning_share, Ta, Pr));
    return detail::film_of(math::weighted(conduction::formula(eta), turning, w), v.conductivity,
                           2.0 * b.metres, outer, bits,
                           P(still_share * detail::variance_of<conduction, T>() +
                             turning_share * detail::variance_of<rotation, T>()),
                           still_share, turning_share);
  }
};

}  // namespace v0
}  // namespace convelope

#endif
