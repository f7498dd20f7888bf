#ifndef CONVELOPE_GROUPS_STATE_HPP
#define CONVELOPE_GROUPS_STATE_HPP

#include "convelope/estimate/info.hpp"
#include "convelope/kinds/temperatures.hpp"

// The temperature at which a correlation wants its fluid properties, by its own state_at.

namespace convelope {
inline namespace v0 {

namespace kinds {
/// Where properties of a fast boundary layer are taken.
struct reference_temperature : temperature_station {
  static constexpr const char* symbol = "T*";
  static constexpr const char* words = "reference temperature";
};
}  // namespace kinds
inline constexpr gate<kinds::reference_temperature> reference_temperature{};

namespace detail {
/// The one rule several correlations share; those without properties follow any.
template <class... C>
constexpr state_rule shared_rule() {
  state_rule found = state_rule::none;
  bool one = true;
  const auto look = [&](state_rule r) {
    if (r == state_rule::none) return;
    one = one && (found == state_rule::none || found == r);
    found = r;
  };
  (look(C::state_at), ...);
  return one ? found : state_rule::none;
}

template <state_rule Rule>
constexpr bool takes_the_stream = Rule == state_rule::bulk || Rule == state_rule::free_stream ||
                                  Rule == state_rule::free_stream_with_wall;

template <state_rule Rule, class T>
CONVELOPE_FUNCTION constexpr T temperature_by(const T& wall, const T& stream) {
  static_assert(Rule != state_rule::eckert,
                "Eckert's reference temperature needs the adiabatic-wall temperature, too");
  static_assert(Rule != state_rule::none, "no properties enter, or at two different states");
  if constexpr (takes_the_stream<Rule>) {
    return stream;
  } else if constexpr (Rule == state_rule::wall) {
    return wall;
  } else {
    return T(0.5 * (wall + stream));
  }
}

/// Where the properties for all of the correlations C are taken, in kelvin: for geometries.
template <class... C, class T>
CONVELOPE_FUNCTION constexpr T state_of(const T& wall, const T& stream) {
  return temperature_by<shared_rule<C...>()>(wall, stream);
}

/// Whether the temperature of a stream of kind B is the one rule r means.
template <state_rule Rule, class B>
constexpr bool suits_rule =
    Rule == state_rule::bulk            ? std::is_same_v<B, kinds::bulk_temperature>
    : Rule == state_rule::mean_of_walls ? std::is_same_v<B, kinds::wall_temperature>
    : takes_the_stream<Rule>            ? std::is_same_v<B, kinds::free_stream_temperature> ||
                                   std::is_same_v<B, kinds::ambient_temperature>
                             : !std::is_same_v<B, kinds::wall_temperature>;

template <state_rule Rule, class B>
using state_kind = std::conditional_t<
    takes_the_stream<Rule>, B,
    std::conditional_t<Rule == state_rule::wall, kinds::wall_temperature, kinds::film_temperature>>;
}  // namespace detail

/// The temperature correlation C takes its properties at, between a wall and what passes it:
/// state_temperature<cylinder_crossflow::churchill_bernstein_1977>(wall, stream).
template <class C, class T, temperature_kind B>
CONVELOPE_FUNCTION constexpr auto state_temperature(const typed<kinds::wall_temperature, T>& wall,
                                                    const typed<B, T>& stream) {
  static_assert(detail::suits_rule<C::state_at, B>,
                "another temperature belongs to this correlation: see its state_at");
  return typed<detail::state_kind<C::state_at, B>, T>::from_si(
      detail::temperature_by<C::state_at>(wall.si(), stream.si()));
}

/// T* = 0.28 T_inf + 0.50 T_w + 0.22 T_aw: with properties at T* the laws of slow streams hold in
/// a fast stream of gas; q = h (T_w - T_aw).
/// Source: Eckert 1956, Trans. ASME 78, 1273-1283, as T_inf + 0.50 (T_w - T_inf) +
/// 0.22 (T_aw - T_inf).
template <class T>
CONVELOPE_FUNCTION constexpr typed<kinds::reference_temperature, T> eckert_reference(
    const typed<kinds::wall_temperature, T>& wall,
    const typed<kinds::free_stream_temperature, T>& stream,
    const typed<kinds::adiabatic_wall_temperature, T>& adiabatic) {
  return typed<kinds::reference_temperature, T>::from_si(
      T(0.28 * stream.si() + 0.5 * wall.si() + 0.22 * adiabatic.si()));
}
/// The same for a correlation that declares it.
template <class C, class T>
CONVELOPE_FUNCTION constexpr auto state_temperature(
    const typed<kinds::wall_temperature, T>& wall,
    const typed<kinds::free_stream_temperature, T>& stream,
    const typed<kinds::adiabatic_wall_temperature, T>& adiabatic) {
  static_assert(C::state_at == state_rule::eckert,
                "this correlation does not take its properties at Eckert's reference temperature");
  return eckert_reference(wall, stream, adiabatic);
}

}  // namespace v0
}  // namespace convelope

#endif
