#ifndef CONVELOPE_SURFACES_FLAT_PLATE_HPP
#define CONVELOPE_SURFACES_FLAT_PLATE_HPP

#include "convelope/correlations/external/flat_plate.hpp"
#include "convelope/groups/state.hpp"
#include "convelope/surfaces/film.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
using plate_layer_laminar = flat_plate::churchill_ozoe_1973_isothermal_average;
using plate_layer_turbulent = flat_plate::mixed_average;

/// The plate's boundary layer, laminar to turbulent, for any surface that has one.
template <class T>
struct plate_layer {
  T Nu;
  plain_t<T> turbulent_share;

  /// Laminar up to Re_c; the mixed law from 2 Re_c; between them a quintic hand-over.
  CONVELOPE_FUNCTION constexpr plate_layer(const T& Re, const T& Pr, double Re_c) {
    const T w = math::hand_over(Re, Re_c, 2.0 * Re_c);
    Nu = math::weighted(
        plate_layer_laminar::formula(Re, Pr),
        plate_layer_turbulent::formula(Re, Pr, T(scalar_adaptor<T>::constant(Re_c))), w);
    turbulent_share = plain(w);
  }
};
}  // namespace detail

/// One side of a thin plate along an unbounded stream, isothermal, boundary layer from its edge.
///
/// Laminar flat-plate/churchill-ozoe-1973-isothermal-average, then flat-plate/mixed-average, handed
/// over between Re_c and 2 Re_c. Forced flow only: at rest h is 0. For a plate that also feels
/// buoyancy take vertical_wall or horizontal_wall.
struct plate_along_stream {
  typed<kinds::plate_length> length;
  /// Where the boundary layer turns turbulent; 5e5 on a smooth plate in a quiet stream
  /// (common practice), 1e5 .. 3e6 seen.
  typed<kinds::transition_reynolds> transition = typed<kinds::transition_reynolds>::from_si(5e5);

  using layer_laminar = detail::plate_layer_laminar;
  using layer_turbulent = detail::plate_layer_turbulent;
  static constexpr const char* name = "plate along a stream";
  static constexpr const speakers& speaks = detail::speakers_of<layer_laminar, layer_turbulent>;
  template <class T>
  using exposure = stream<T>;

  template <fluid Fluid, class T>
  CONVELOPE_FUNCTION constexpr film<T> film_at(const Fluid& f, const stream<T>& s,
                                               const T& wall) const {
    using P = plain_t<T>;
    const detail::usable_length l(length.si());
    const detail::usable_transition turning(transition);
    const T& ambient = s.temperature.si();
    const T& p = s.pressure.si();
    const T at = detail::state_of<layer_laminar, layer_turbulent>(wall, ambient);
    const fluid_values<T> v = f.values(at, p);
    const T Pr = v.prandtl();
    const T Re = detail::rounded_reynolds(v, s.velocity.si(), l.metres);
    const detail::plate_layer<T> layer(Re, Pr, turning.Re);

    const P turbulent = layer.turbulent_share;
    const P laminar = detail::complement(turbulent);
    const T Re_c = scalar_adaptor<T>::constant(turning.Re);
    const bits_t<T> bits(bits_t<T>(l.bits | turning.bits) | f.check(at, p) |
                         detail::sound<T>(wall, ambient, p, s.velocity.si()) |
                         detail::asked<layer_laminar, T>(0, laminar, Re, Pr) |
                         detail::asked<layer_turbulent, T>(1, turbulent, Re, Pr, Re_c));
    return detail::film_of(layer.Nu, v.conductivity, l.metres, ambient, bits,
                           P(laminar * detail::variance_of<layer_laminar, T>() +
                             turbulent * detail::variance_of<layer_turbulent, T>()),
                           laminar, turbulent);
  }
};

}  // namespace v0
}  // namespace convelope

#endif
