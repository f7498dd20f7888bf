#ifndef CONVELOPE_KINDS_VELOCITIES_HPP
#define CONVELOPE_KINDS_VELOCITIES_HPP

#include "convelope/kinds/typed.hpp"

namespace convelope {
inline namespace v0 {

namespace kinds {
struct velocity_station {
  using unit_type = boost::units::si::velocity;
  static constexpr const char* unit = "m/s";
};
/// Undisturbed, far from the body.
struct free_stream_velocity : velocity_station {
  static constexpr const char* symbol = "u_inf";
  static constexpr const char* words = "free-stream velocity";
};
/// Volume flow over flow area of a duct.
struct mean_velocity : velocity_station {
  static constexpr const char* symbol = "u_m";
  static constexpr const char* words = "mean velocity";
};
/// In the narrowest section between bodies.
struct minimum_section_velocity : velocity_station {
  static constexpr const char* symbol = "u_max";
  static constexpr const char* words = "minimum-section velocity";
};
/// omega R of a turning inner cylinder.
struct rotor_surface_velocity : velocity_station {
  static constexpr const char* symbol = "u_rot";
  static constexpr const char* words = "rotor surface velocity";
};
}  // namespace kinds

inline constexpr gate<kinds::free_stream_velocity> free_stream_velocity{};
inline constexpr gate<kinds::mean_velocity> mean_velocity{};
inline constexpr gate<kinds::minimum_section_velocity> minimum_section_velocity{};
inline constexpr gate<kinds::rotor_surface_velocity> rotor_surface_velocity{};

template <class K>
concept velocity_kind = std::is_base_of_v<kinds::velocity_station, K>;
namespace detail {
template <class A>
constexpr bool is_velocity = false;
template <has_kind A>
constexpr bool is_velocity<A> = velocity_kind<typename A::kind_type>;
}  // namespace detail
template <class A>
concept measures_a_velocity = detail::is_velocity<A>;

}  // namespace v0
}  // namespace convelope

#endif
