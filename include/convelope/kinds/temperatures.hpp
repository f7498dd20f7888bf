#ifndef CONVELOPE_KINDS_TEMPERATURES_HPP
#define CONVELOPE_KINDS_TEMPERATURES_HPP

#include "convelope/kinds/typed.hpp"

namespace convelope {
inline namespace v0 {

namespace kinds {
struct temperature_station {
  using unit_type = unit_types::absolute_temperature;
  static constexpr const char* unit = "K";
};
struct wall_temperature : temperature_station {
  static constexpr const char* symbol = "T_w";
  static constexpr const char* words = "wall temperature";
};
/// Mean of wall and stream.
struct film_temperature : temperature_station {
  static constexpr const char* symbol = "T_f";
  static constexpr const char* words = "film temperature";
};
/// Mixing-cup mean over the flow area of a duct.
struct bulk_temperature : temperature_station {
  static constexpr const char* symbol = "T_b";
  static constexpr const char* words = "bulk temperature";
};
struct free_stream_temperature : temperature_station {
  static constexpr const char* symbol = "T_inf";
  static constexpr const char* words = "free-stream temperature";
};
/// Of a fluid at rest far from the wall.
struct ambient_temperature : temperature_station {
  static constexpr const char* symbol = "T_amb";
  static constexpr const char* words = "ambient temperature";
};
struct saturation_temperature : temperature_station {
  static constexpr const char* symbol = "T_sat";
  static constexpr const char* words = "saturation temperature";
};
/// Of a wall that passes no heat in a fast stream (recovery temperature).
struct adiabatic_wall_temperature : temperature_station {
  static constexpr const char* symbol = "T_aw";
  static constexpr const char* words = "adiabatic-wall temperature";
};
/// A difference, never a point: kelvin with no zero.
struct temperature_difference {
  using unit_type = boost::units::si::temperature;
  static constexpr const char* unit = "K";
  static constexpr const char* symbol = "dT";
  static constexpr const char* words = "temperature difference";
};
}  // namespace kinds

inline constexpr gate<kinds::wall_temperature> wall_temperature{};
inline constexpr gate<kinds::film_temperature> film_temperature{};
inline constexpr gate<kinds::bulk_temperature> bulk_temperature{};
inline constexpr gate<kinds::free_stream_temperature> free_stream_temperature{};
inline constexpr gate<kinds::ambient_temperature> ambient_temperature{};
inline constexpr gate<kinds::saturation_temperature> saturation_temperature{};
inline constexpr gate<kinds::adiabatic_wall_temperature> adiabatic_wall_temperature{};
inline constexpr gate<kinds::temperature_difference> temperature_difference{};

template <class K>
concept temperature_kind = std::is_base_of_v<kinds::temperature_station, K>;
template <class A>
concept measures_a_temperature = has_kind<A> && temperature_kind<typename A::kind_type>;

/// The difference of two absolute temperatures, of any two stations.
template <temperature_kind A, temperature_kind B, class T>
CONVELOPE_FUNCTION constexpr typed<kinds::temperature_difference, T> operator-(
    const typed<A, T>& a, const typed<B, T>& b) {
  return typed<kinds::temperature_difference, T>::from_si(T(a.si() - b.si()));
}

/// The film temperature between a wall and what flows or rests before it: (T_w + T) / 2.
template <class T, temperature_kind B>
CONVELOPE_FUNCTION constexpr typed<kinds::film_temperature, T> film_between(
    const typed<kinds::wall_temperature, T>& wall, const typed<B, T>& stream) {
  static_assert(!std::is_same_v<B, kinds::wall_temperature>,
                "film_between needs the stream's temperature, not a second wall's");
  return typed<kinds::film_temperature, T>::from_si(T(0.5 * (wall.si() + stream.si())));
}

}  // namespace v0
}  // namespace convelope

#endif
