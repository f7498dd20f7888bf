#ifndef CONVELOPE_SURFACES_EXPOSURE_HPP
#define CONVELOPE_SURFACES_EXPOSURE_HPP

#include "convelope/kinds.hpp"

// What a wall is exposed to: the larger scale's answer at this wall.

namespace convelope {
inline namespace v0 {

/// 101325 Pa (ISO 2533).
inline constexpr typed<kinds::pressure> standard_pressure =
    typed<kinds::pressure>::from_si(101325.0);

namespace detail {
template <class W, class K, class T>
CONVELOPE_FUNCTION constexpr typed<K, W> converted(const typed<K, T>& x) {
  if constexpr (std::is_same_v<T, double>) {
    return typed<K, W>::from_si(scalar_adaptor<W>::constant(x.si()));
  } else {
    return typed<K, W>::from_si(W(x.si()));
  }
}
template <class T>
CONVELOPE_FUNCTION constexpr typed<kinds::pressure, T> pressure_or_standard() {
  return typed<kinds::pressure, T>::from_si(scalar_adaptor<T>::constant(standard_pressure.si()));
}
}  // namespace detail

// The guides take anything, so that a wrong kind is told by its member: "no conversion from
// wall_temperature to free_stream_temperature".

/// An unbounded stream, or fluid at rest (velocity 0). Velocity of either sign.
template <class T = double>
struct stream {
  typed<kinds::free_stream_velocity, T> velocity;
  typed<kinds::free_stream_temperature, T> temperature;
  typed<kinds::pressure, T> pressure = detail::pressure_or_standard<T>();

  template <class W>
  CONVELOPE_FUNCTION constexpr stream<W> as() const {
    return {detail::converted<W>(velocity), detail::converted<W>(temperature),
            detail::converted<W>(pressure)};
  }
};
template <has_kind First, class... Rest>
stream(First, Rest...) -> stream<typename First::value_type>;

/// Fluid at rest far from the wall.
template <class T = double>
struct still {
  typed<kinds::ambient_temperature, T> temperature;
  typed<kinds::pressure, T> pressure = detail::pressure_or_standard<T>();

  template <class W>
  CONVELOPE_FUNCTION constexpr still<W> as() const {
    return {detail::converted<W>(temperature), detail::converted<W>(pressure)};
  }
};
template <has_kind First, class... Rest>
still(First, Rest...) -> still<typename First::value_type>;

/// Flow through a duct, at the segment's own bulk temperature.
template <class T = double>
struct duct_flow {
  typed<kinds::mean_velocity, T> velocity;
  typed<kinds::bulk_temperature, T> temperature;
  typed<kinds::pressure, T> pressure = detail::pressure_or_standard<T>();

  template <class W>
  CONVELOPE_FUNCTION constexpr duct_flow<W> as() const {
    return {detail::converted<W>(velocity), detail::converted<W>(temperature),
            detail::converted<W>(pressure)};
  }
};
template <has_kind First, class... Rest>
duct_flow(First, Rest...) -> duct_flow<typename First::value_type>;

/// The gap between a turning inner cylinder (whose wall is asked for) and a still outer one.
/// `temperature` is that of the outer wall.
template <class T = double>
struct rotating_gap_flow {
  typed<kinds::rotor_surface_velocity, T> velocity;
  typed<kinds::wall_temperature, T> temperature;
  typed<kinds::pressure, T> pressure = detail::pressure_or_standard<T>();

  template <class W>
  CONVELOPE_FUNCTION constexpr rotating_gap_flow<W> as() const {
    return {detail::converted<W>(velocity), detail::converted<W>(temperature),
            detail::converted<W>(pressure)};
  }
};
template <has_kind First, class... Rest>
rotating_gap_flow(First, Rest...) -> rotating_gap_flow<typename First::value_type>;

}  // namespace v0
}  // namespace convelope

#endif
