#ifndef CONVELOPE_KINDS_RESULTS_HPP
#define CONVELOPE_KINDS_RESULTS_HPP

#include "convelope/kinds/typed.hpp"

namespace convelope {
inline namespace v0 {

namespace kinds {
/// From the wall to the fluid, per wall area.
struct heat_flux {
  using unit_type = unit_types::heat_flux;
  static constexpr const char* symbol = "q";
  static constexpr const char* words = "heat flux from the wall";
  static constexpr const char* unit = "W/m2";
};
/// The mean over a wall.
struct film_coefficient {
  using unit_type = unit_types::film_coefficient;
  static constexpr const char* symbol = "h";
  static constexpr const char* words = "mean film coefficient";
  static constexpr const char* unit = "W/(m2 K)";
};
/// At one station along a wall.
struct local_film_coefficient {
  using unit_type = unit_types::film_coefficient;
  static constexpr const char* symbol = "h_x";
  static constexpr const char* words = "local film coefficient";
  static constexpr const char* unit = "W/(m2 K)";
};
/// dq/dT_wall.
struct flux_slope {
  using unit_type = unit_types::film_coefficient;
  static constexpr const char* symbol = "dq/dT_w";
  static constexpr const char* words = "slope of the heat flux over the wall temperature";
  static constexpr const char* unit = "W/(m2 K)";
};
struct area_resistance {
  using unit_type = unit_types::area_resistance;
  static constexpr const char* symbol = "R_A";
  static constexpr const char* words = "thermal resistance times area";
  static constexpr const char* unit = "m2 K/W";
};
struct mass_flux {
  using unit_type = unit_types::mass_flux;
  static constexpr const char* symbol = "G";
  static constexpr const char* words = "mass flux";
  static constexpr const char* unit = "kg/(m2 s)";
};
struct mass_flow {
  using unit_type = unit_types::mass_flow;
  static constexpr const char* symbol = "m";
  static constexpr const char* words = "mass flow rate";
  static constexpr const char* unit = "kg/s";
};
}  // namespace kinds

inline constexpr gate<kinds::heat_flux> heat_flux{};
inline constexpr gate<kinds::area_resistance> area_resistance{};
inline constexpr gate<kinds::mass_flux> mass_flux{};
inline constexpr gate<kinds::mass_flow> mass_flow{};
// The gates film_coefficient and local_film_coefficient also compute: groups/film.hpp.

}  // namespace v0
}  // namespace convelope

#endif
