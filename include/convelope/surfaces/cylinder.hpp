#ifndef CONVELOPE_SURFACES_CYLINDER_HPP
#define CONVELOPE_SURFACES_CYLINDER_HPP

#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "convelope/correlations/natural/horizontal_cylinder.hpp"
#include "convelope/groups/state.hpp"
#include "convelope/surfaces/buoyancy.hpp"

namespace convelope {
inline namespace v0 {

/// A long horizontal cylinder across an unbounded stream, from rest to Re 1e7.
///
/// Joins cylinder-crossflow/churchill-bernstein-1977 (F) and horizontal-cylinder/
/// churchill-chu-1975 (N), both at the film temperature, by Nu^4 = F^4 + N^4 - 0.3^4: exponent 4
/// for buoyancy across the stream (Churchill 1977, AIChE J. 23, 10-16); the subtraction keeps the
/// conduction limit from counting twice, so that at rest Nu is N alone.
struct cylinder_in_crossflow {
  typed<kinds::diameter> diameter;
  typed<kinds::gravity> gravity = standard_gravity;

  using forced = cylinder_crossflow::churchill_bernstein_1977;
  using natural = horizontal_cylinder::churchill_chu_1975;
  static constexpr const char* name = "cylinder in crossflow";
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
    const T at = detail::state_of<forced, natural>(wall, ambient);
    const fluid_values<T> v = f.values(at, p);
    const T Pr = v.prandtl();

    const T Re = detail::rounded_reynolds(v, s.velocity.si(), d.metres);
    const T Ra = detail::buoyancy<T>(f, v, wall, ambient, p, d.metres, gravity.si()).Ra;
    constexpr double conduction_4 = 0.3 * 0.3 * 0.3 * 0.3;
    const T F4 = T(math::power<4>(forced::formula(Re, Pr)) - conduction_4);
    const T N4 = math::power<4>(natural::formula(Ra, Pr));
    const T sum = T(F4 + N4);

    const P per_sum = P(scalar_adaptor<P>::constant(1.0) / plain(sum));
    const P forced_share = P(plain(F4) * per_sum);
    const P natural_share = P(plain(N4) * per_sum);
    const bits_t<T> bits(bits_t<T>(d.bits) | f.check(at, p) |
                         detail::sound<T>(wall, ambient, p, s.velocity.si(), gravity.si()) |
                         detail::asked<forced, T>(0, forced_share, Re, Pr) |
                         detail::asked<natural, T>(1, natural_share, Ra, Pr));
    return detail::film_of(math::power<1, 4>(sum), v.conductivity, d.metres, ambient, bits,
                           P(forced_share * detail::variance_of<forced, T>() +
                             natural_share * detail::variance_of<natural, T>()),
                           forced_share, natural_share);
  }
};

}  // namespace v0
}  // namespace convelope

#endif
