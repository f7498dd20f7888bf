#ifndef CONVELOPE_KINDS_LENGTHS_HPP
#define CONVELOPE_KINDS_LENGTHS_HPP

#include "convelope/kinds/typed.hpp"
#include "convelope/kinds/velocities.hpp"

namespace convelope {
inline namespace v0 {

/// Every number's meaning, one struct each. The gate of the same name one level up makes them.
namespace kinds {
struct length_scale {
  using unit_type = boost::units::si::length;
  static constexpr const char* unit = "m";
  using velocity = free_stream_velocity;  // what a Reynolds number on this length takes by default
};

struct diameter : length_scale {
  static constexpr const char* symbol = "D";
  static constexpr const char* words = "diameter";
};
/// 4 x flow area / wetted perimeter; the inside diameter of a round duct.
struct hydraulic_diameter : length_scale {
  static constexpr const char* symbol = "Dh";
  static constexpr const char* words = "hydraulic diameter";
  using velocity = mean_velocity;
};
struct plate_length : length_scale {
  static constexpr const char* symbol = "L";
  static constexpr const char* words = "plate length in the flow direction";
};
struct distance_from_edge : length_scale {
  static constexpr const char* symbol = "x";
  static constexpr const char* words = "distance from the leading edge";
};
/// Along gravity.
struct height : length_scale {
  static constexpr const char* symbol = "H";
  static constexpr const char* words = "height";
};
struct area_over_perimeter : length_scale {
  static constexpr const char* symbol = "A/P";
  static constexpr const char* words = "area over perimeter";
};
/// Of a square plate; the mean of the two sides of a rectangle. Not area over perimeter, which is a
/// quarter of it on a square.
struct plate_side : length_scale {
  static constexpr const char* symbol = "s";
  static constexpr const char* words = "side of the plate";
};
/// Of a long strip, across.
struct strip_width : length_scale {
  static constexpr const char* symbol = "W";
  static constexpr const char* words = "width of the strip";
};
/// Between two walls.
struct gap : length_scale {
  static constexpr const char* symbol = "b";
  static constexpr const char* words = "gap between the walls";
  using velocity = rotor_surface_velocity;
};
struct radius : length_scale {
  static constexpr const char* symbol = "R";
  static constexpr const char* words = "radius";
};
struct duct_length : length_scale {
  static constexpr const char* symbol = "Ld";
  static constexpr const char* words = "heated length of the duct";
  using velocity = mean_velocity;
};
struct distance_from_inlet : length_scale {
  static constexpr const char* symbol = "xi";
  static constexpr const char* words = "distance from the inlet";
  using velocity = mean_velocity;
};
/// Mean diameter of the turn of a coiled tube.
struct coil_diameter : length_scale {
  static constexpr const char* symbol = "Dc";
  static constexpr const char* words = "mean diameter of the coil";
};
/// Equivalent sand-grain roughness.
struct roughness : length_scale {
  static constexpr const char* symbol = "ks";
  static constexpr const char* words = "sand-grain roughness";
  using velocity = mean_velocity;
};
}  // namespace kinds

inline constexpr gate<kinds::diameter> diameter{};
inline constexpr gate<kinds::hydraulic_diameter> hydraulic_diameter{};
inline constexpr gate<kinds::plate_length> plate_length{};
inline constexpr gate<kinds::distance_from_edge> distance_from_edge{};
inline constexpr gate<kinds::height> height{};
inline constexpr gate<kinds::area_over_perimeter> area_over_perimeter{};
inline constexpr gate<kinds::plate_side> plate_side{};
inline constexpr gate<kinds::strip_width> strip_width{};
inline constexpr gate<kinds::gap> gap{};
inline constexpr gate<kinds::radius> radius{};
inline constexpr gate<kinds::duct_length> duct_length{};
inline constexpr gate<kinds::distance_from_inlet> distance_from_inlet{};
inline constexpr gate<kinds::coil_diameter> coil_diameter{};
inline constexpr gate<kinds::roughness> roughness{};

/// A length that a Reynolds, Nusselt or Rayleigh number can be based on.
template <class K>
concept length_kind = std::is_base_of_v<kinds::length_scale, K>;
namespace detail {
template <class A>
constexpr bool is_length = false;
template <has_kind A>
constexpr bool is_length<A> = length_kind<typename A::kind_type>;
}  // namespace detail
template <class A>
concept measures_a_length = detail::is_length<A>;

}  // namespace v0
}  // namespace convelope

#endif
