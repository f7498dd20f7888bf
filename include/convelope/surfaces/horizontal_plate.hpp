#ifndef CONVELOPE_SURFACES_HORIZONTAL_PLATE_HPP
#define CONVELOPE_SURFACES_HORIZONTAL_PLATE_HPP

#include "convelope/correlations/natural/horizontal_plate_down.hpp"
#include "convelope/correlations/natural/horizontal_plate_up.hpp"
#include "convelope/groups/state.hpp"
#include "convelope/surfaces/buoyancy.hpp"
#include "convelope/surfaces/flat_plate.hpp"

namespace convelope {
inline namespace v0 {

/// Which way the wetted face of a horizontal plate looks.
enum class facing : unsigned char { up, down };

/// One face of a horizontal plate, in a fluid at rest or in a stream along it.
///
/// Natural: raithby-hollands-1998 for the face that drives (hot face up or cold face down) and for
/// the face that holds back (hot face down or cold face up); which one is decided by the signs of
/// beta and T_wall - T_stream, passing smoothly through zero. Forced: the boundary layer of
/// plate_along_stream. Joined with exponent 7/2, for buoyancy across the stream along a horizontal
/// plate (Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, section 9.9, from memory).
struct horizontal_wall {
  typed<kinds::area_over_perimeter> area_over_perimeter;
  typed<kinds::plate_length> length;  // in the stream's direction
  facing face = facing::up;
  typed<kinds::transition_reynolds> transition = typed<kinds::transition_reynolds>::from_si(5e5);
  typed<kinds::gravity> gravity = standard_gravity;

  using driving = horizontal_plate_up::raithby_hollands_1998;
  using holding = horizontal_plate_down::raithby_hollands_1998;
  using forced = detail::plate_layer_laminar;
  using forced_turbulent = detail::plate_layer_turbulent;
  static constexpr const char* name = "horizontal wall";
  static constexpr const speakers& speaks =
      detail::speakers_of<driving, holding, forced, forced_turbulent>;
  template <class T>
  using exposure = stream<T>;

  template <fluid Fluid, class T>
  CONVELOPE_FUNCTION constexpr film<T> film_at(const Fluid& f, const stream<T>& s,
                                               const T& wall) const {
    using P = plain_t<T>;
    const detail::usable_length b(area_over_perimeter.si());
    const detail::usable_length l(length.si());
    const detail::usable_transition turning(transition);
    const T& ambient = s.temperature.si();
    const T& p = s.pressure.si();
    const T at = detail::state_of<driving, holding, forced, forced_turbulent>(wall, ambient);
    const fluid_values<T> v = f.values(at, p);
    const T Pr = v.prandtl();

    const detail::buoyancy<T> drive(f, v, wall, ambient, p, b.metres, gravity.si());
    const T& Ra = drive.Ra;
    const double up = face == facing::up ? 1.0 : -1.0;
    const T w = T(0.5 * (1.0 - up * drive.side));
    const T natural_Nu = math::weighted(driving::formula(Ra, Pr), holding::formula(Ra, Pr), w);

    const T Re = detail::rounded_reynolds(v, s.velocity.si(), l.metres);
    const detail::plate_layer<T> layer(Re, Pr, turning.Re);
    // Both on A/P.
    const T F_on_b = T(layer.Nu * (b.metres / l.metres));
    const T Fn = math::power<7, 2>(F_on_b);
    const T Nn = math::power<7, 2>(natural_Nu);
    const T sum = T(Fn + Nn);

    const P forced_share = P(plain(Fn) / plain(sum));
    const P holding_share = P(plain(w) * detail::complement(forced_share));
    const P driving_share = P(detail::complement(plain(w)) * detail::complement(forced_share));
    const P forced_laminar = P(forced_share * detail::complement(layer.turbulent_share));
    const P forced_tripped = P(forced_share * layer.turbulent_share);
    const T Re_c = scalar_adaptor<T>::constant(turning.Re);
    const bits_t<T> bits(bits_t<T>(b.bits | l.bits | turning.bits) | f.check(at, p) |
                         detail::sound<T>(wall, ambient, p, s.velocity.si(), gravity.si()) |
                         detail::asked<driving, T>(0, driving_share, Ra, Pr) |
                         detail::asked<holding, T>(1, holding_share, Ra, Pr) |
                         detail::asked<forced, T>(2, forced_laminar, Re, Pr) |
                         detail::asked<forced_turbulent, T>(3, forced_tripped, Re, Pr, Re_c));
    return detail::film_of(math::power<2, 7>(sum), v.conductivity, b.metres, ambient, bits,
                           P(driving_share * detail::variance_of<driving, T>() +
                             holding_share * detail::variance_of<holding, T>() +
                             forced_laminar * detail::variance_of<forced, T>() +
                             forced_tripped * detail::variance_of<forced_turbulent, T>()),
                           driving_share, holding_share, forced_laminar, forced_tripped);
  }
};

}  // namespace v0
}  // namespace convelope

#endif
