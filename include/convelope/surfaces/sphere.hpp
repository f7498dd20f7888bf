#ifndef CONVELOPE_SURFACES_SPHERE_HPP
#define CONVELOPE_SURFACES_SPHERE_HPP

#include "convelope/correlations/external/sphere.hpp"
#include "convelope/correlations/natural/sphere_natural.hpp"
#include "convelope/groups/state.hpp"
#include "convelope/surfaces/buoyancy.hpp"

namespace convelope {
inline namespace v0 {

/// A sphere in an unbounded stream, from rest.
///
/// Joins sphere/whitaker-1972 (F, properties of the free stream, viscosity at the wall) and
/// sphere/churchill-1983 (N, film temperature) by Nu^4 = F^4 + N^4 - 2^4 (Churchill 1977,
/// AIChE J. 23, 10-16; the subtraction keeps the conduction limit 2 from counting twice).
struct sphere_in_stream {
  typed<kinds::diameter> diameter;
  typed<kinds::gravity> gravity = standard_gravity;

  using forced = sphere::whitaker_1972;
  using natural = sphere::churchill_1983;
  static constexpr const char* name = "sphere in a stream";
  static constexpr const speakers& speaks = detail::speakers_of<forced, natural>;
  template <class T>
  using exposure = stream<T>;

  template <fluid Fluid, class T>
  CONVELOPE_FUNCTION constexpr film<T> film_at(const Fluid& f, const stream<T>& s,
                                               const T& wall) const {
    using P = plain_t<T>;
    const detail::usable_length d(diameter.si());
    const T& ambient = s.temperature.si();
    const T& p = s.pressure.si();
    const T at = detail::state_of<natural>(wall, ambient);
    const T before = detail::state_of<forced>(wall, ambient);
    const fluid_values<T> at_film = f.values(at, p);
    const fluid_values<T> at_stream = f.values(before, p);
    const fluid_values<T> at_wall = f.values(wall, p);

    const T Re = detail::rounded_reynolds(at_stream, s.velocity.si(), d.metres);
    const T Pr_stream = at_stream.prandtl();
    const T mu_ratio = T(at_stream.viscosity / at_wall.viscosity);
    const T Pr_film = at_film.prandtl();
    const T Ra = detail::buoyancy<T>(f, at_film, wall, ambient, p, d.metres, gravity.si()).Ra;
    // Each on its own conductivity, brought to that of the film state.
    const T Nu_F = T(forced::formula(Re, Pr_stream, mu_ratio) *
                     (at_stream.conductivity / at_film.conductivity));
    constexpr double conduction_4 = 16.0;
    const T conduction = math::power<4>(T(at_stream.conductivity / at_film.conductivity));
    const T F4 = T(math::power<4>(Nu_F) - conduction_4 * conduction);
    const T N4 = math::power<4>(natural::formula(Ra, Pr_film));
    const T sum = T(F4 + N4);

    const P forced_share = P(plain(F4) / plain(sum));
    const P natural_share = P(plain(N4) / plain(sum));
    const bits_t<T> bits(bits_t<T>(d.bits) | f.check(at, p) | f.check(wall, p) |
                         f.check(before, p) |
                         detail::sound<T>(wall, ambient, p, s.velocity.si(), gravity.si()) |
                         detail::asked<forced, T>(0, forced_share, Re, Pr_stream, mu_ratio) |
                         detail::asked<natural, T>(1, natural_share, Ra, Pr_film));
    return detail::film_of(math::power<1, 4>(sum), at_film.conductivity, d.metres, ambient, bits,
                           P(forced_share * detail::variance_of<forced, T>() +
                             natural_share * detail::variance_of<natural, T>()),
                           forced_share, natural_share);
  }
};

}  // namespace v0
}  // namespace convelope

#endif
