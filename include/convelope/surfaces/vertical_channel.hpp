#ifndef CONVELOPE_SURFACES_VERTICAL_CHANNEL_HPP
#define CONVELOPE_SURFACES_VERTICAL_CHANNEL_HPP

#include "convelope/correlations/natural/vertical_channel.hpp"
#include "convelope/groups/state.hpp"
#include "convelope/surfaces/buoyancy.hpp"

namespace convelope {
inline namespace v0 {

/// Both walls of an open vertical channel at one temperature, flow driven by buoyancy alone.
///
/// vertical-channel/bar-cohen-rohsenow-isothermal-symmetric-1984, on the gap; h and q belong to
/// the difference from the wall to the air that enters.
struct open_vertical_channel {
  typed<kinds::gap> gap;
  typed<kinds::height> height;
  typed<kinds::gravity> gravity = standard_gravity;

  using natural = vertical_channel::bar_cohen_rohsenow_isothermal_symmetric_1984;
  static constexpr const char* name = "open vertical channel";
  static constexpr const speakers& speaks = detail::speakers_of<natural>;
  template <class T>
  using exposure = still<T>;

  template <fluid Fluid, class T>
  CONVELOPE_FUNCTION constexpr film<T> film_at(const Fluid& f, const still<T>& s,
                                               const T& wall) const {
    using P = plain_t<T>;
    const detail::usable_length b(gap.si());
    const detail::usable_length h(height.si());
    const T& ambient = s.temperature.si();
    const T& p = s.pressure.si();
    const T at = detail::state_of<natural>(wall, ambient);
    const fluid_values<T> v = f.values(at, p);
    const T Ra = detail::buoyancy<T>(f, v, wall, ambient, p, b.metres, gravity.si()).Ra;
    const T El = T(Ra * (b.metres / h.metres));

    const P all = scalar_adaptor<P>::constant(1.0);
    const bits_t<T> bits(bits_t<T>(b.bits | h.bits) | f.check(at, p) |
                         detail::sound<T>(wall, ambient, p, gravity.si()) |
                         detail::asked<natural, T>(0, all, El));
    return detail::film_of(natural::formula(El), v.conductivity, b.metres, ambient, bits,
                           detail::variance_of<natural, T>(), all);
  }
};

}  // namespace v0
}  // namespace convelope

#endif
