#ifndef CONVELOPE_SURFACES_VERTICAL_PLATE_HPP
#define CONVELOPE_SURFACES_VERTICAL_PLATE_HPP

#include "convelope/correlations/natural/vertical_plate.hpp"
#include "convelope/groups/state.hpp"
#include "convelope/surfaces/buoyancy.hpp"
#include "convelope/surfaces/flat_plate.hpp"

namespace convelope {
inline namespace v0 {

/// Which way a stream passes a vertical wall. A negative velocity turns it round.
enum class stream_direction : unsigned char { upward, downward, horizontal };

/// A vertical isothermal wall in a fluid at rest or in a stream along it.
///
/// Natural: vertical-plate/churchill-chu-laminar-1975, handed over to churchill-chu-1975 between
/// Ra 1e9 and 1e10. Forced: the boundary layer of plate_along_stream on the height, or on
/// the length if the stream is horizontal.
/// Joined by Nu^6 = F^6 + N^6 + 2 s F^3 N^3. s = 1 (buoyancy assists the stream) is the exponent-3
/// rule of Churchill 1977, AIChE J. 23, 10-16; s = -7/8 stands for an opposing stream, where the
/// rule's difference F^3 - N^3 would pass through zero: the least, 0.785 of the greater, is near
/// F = N (a choice of this library, on the safe side of common practice); s = sqrt(2) - 1 for a
/// horizontal stream equals the exponent-4 rule at F = N. s passes smoothly through the change of
/// side at T_wall = T_stream.
struct vertical_wall {
  typed<kinds::height> height;
  stream_direction direction = stream_direction::upward;
  /// Along a horizontal stream; not looked at otherwise.
  typed<kinds::plate_length> length = typed<kinds::plate_length>::from_si(0.0);
  typed<kinds::transition_reynolds> transition = typed<kinds::transition_reynolds>::from_si(5e5);
  typed<kinds::gravity> gravity = standard_gravity;

  using natural_laminar = vertical_plate::churchill_chu_laminar_1975;
  using natural_all = vertical_plate::churchill_chu_1975;
  using forced = detail::plate_layer_laminar;
  using forced_turbulent = detail::plate_layer_turbulent;
  static constexpr const char* name = "vertical wall";
  static constexpr const speakers& speaks =
      detail::speakers_of<natural_laminar, natural_all, forced, forced_turbulent>;
  template <class T>
  using exposure = stream<T>;

  template <fluid Fluid, class T>
  CONVELOPE_FUNCTION constexpr film<T> film_at(const Fluid& f, const still<T>& s,
                                               const T& wall) const {
    const auto calm =
        typed<kinds::free_stream_velocity, T>::from_si(scalar_adaptor<T>::constant(0.0));
    const auto ambient = typed<kinds::free_stream_temperature, T>::from_si(s.temperature.si());
    return film_at(f, stream<T>{calm, ambient, s.pressure}, wall);
  }

  template <fluid Fluid, class T>
  CONVELOPE_FUNCTION constexpr film<T> film_at(const Fluid& f, const stream<T>& s,
                                               const T& wall) const {
    using P = plain_t<T>;
    const detail::usable_length h(height.si());
    const bool level = direction == stream_direction::horizontal;
    const detail::usable_length run(level ? length.si() : height.si());
    const detail::usable_transition turning(transition);
    const T& ambient = s.temperature.si();
    const T& p = s.pressure.si();
    const T at =
        detail::state_of<natural_laminar, natural_all, forced, forced_turbulent>(wall, ambient);
    const fluid_values<T> v = f.values(at, p);
    const T Pr = v.prandtl();
    const T& u = s.velocity.si();

    const detail::buoyancy<T> drive(f, v, wall, ambient, p, h.metres, gravity.si());
    const T& Ra = drive.Ra;
    // Handed over in Ra^(1/6), which the formulas share: 31.6 is 1e9, 46.4 is 1e10.
    const T w = math::hand_over(math::power<1, 6>(Ra), 31.622776601683793, 46.415888336127789);
    const T natural_Nu =
        math::weighted(natural_laminar::formula(Ra, Pr), natural_all::formula(Ra, Pr), w);

    const T Re_signed = T(run.metres * v.density * u / v.viscosity);
    const T Re = math::smooth_magnitude(Re_signed, detail::least_reynolds);
    const detail::plate_layer<T> layer(Re, Pr, turning.Re);

    const T F3 = math::power<3>(T(layer.Nu * (h.metres / run.metres)));  // on the height, too
    const T N3 = math::power<3>(natural_Nu);
    const T Nu6 = T(F3 * F3 + N3 * N3 + 2.0 * assistance(drive.side, Re_signed) * F3 * N3);

    const P f6 = P(plain(F3) * plain(F3));
    const P n6 = P(plain(N3) * plain(N3));
    const P forced_share = P(f6 / (f6 + n6));
    const P turbulent = P(plain(w) * detail::complement(forced_share));
    const P laminar = P(detail::complement(plain(w)) * detail::complement(forced_share));
    const P forced_laminar = P(forced_share * detail::complement(layer.turbulent_share));
    const P forced_tripped = P(forced_share * layer.turbulent_share);
    const T Re_c = scalar_adaptor<T>::constant(turning.Re);
    const bits_t<T> bits(bits_t<T>(h.bits | run.bits | turning.bits) | f.check(at, p) |
                         detail::sound<T>(wall, ambient, p, u, gravity.si()) |
                         detail::asked<natural_laminar, T>(0, laminar, Ra, Pr) |
                         detail::asked<natural_all, T>(1, turbulent, Ra, Pr) |
                         detail::asked<forced, T>(2, forced_laminar, Re, Pr) |
                         detail::asked<forced_turbulent, T>(3, forced_tripped, Re, Pr, Re_c));
    return detail::film_of(math::power<1, 6>(Nu6), v.conductivity, h.metres, ambient, bits,
                           P(laminar * detail::variance_of<natural_laminar, T>() +
                             turbulent * detail::variance_of<natural_all, T>() +
                             forced_laminar * detail::variance_of<forced, T>() +
                             forced_tripped * detail::variance_of<forced_turbulent, T>()),
                           laminar, turbulent, forced_laminar, forced_tripped);
  }

 private:
  template <class T>
  CONVELOPE_FUNCTION constexpr T assistance(const T& side, const T& Re_signed) const {
    if (direction == stream_direction::horizontal) {
      return scalar_adaptor<T>::constant(0.41421356237309503);
    }
    const double up = direction == stream_direction::upward ? 1.0 : -1.0;
    const T s = T(up * side * math::smooth_sign(Re_signed, 1.0));
    return T(s * (15.0 + s) * (1.0 / 16.0));
  }
};

}  // namespace v0
}  // namespace convelope

#endif
