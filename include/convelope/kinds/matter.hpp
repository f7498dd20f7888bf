#ifndef CONVELOPE_KINDS_MATTER_HPP
#define CONVELOPE_KINDS_MATTER_HPP

#include "convelope/kinds/typed.hpp"

namespace convelope {
inline namespace v0 {

namespace kinds {
struct pressure {
  using unit_type = boost::units::si::pressure;
  static constexpr const char* symbol = "p";
  static constexpr const char* words = "absolute pressure";
  static constexpr const char* unit = "Pa";
};
struct density {
  using unit_type = boost::units::si::mass_density;
  static constexpr const char* symbol = "rho";
  static constexpr const char* words = "density";
  static constexpr const char* unit = "kg/m3";
};
struct specific_heat {
  using unit_type = unit_types::specific_heat;
  static constexpr const char* symbol = "cp";
  static constexpr const char* words = "specific heat at constant pressure";
  static constexpr const char* unit = "J/(kg K)";
};
struct conductivity {
  using unit_type = unit_types::thermal_conductivity;
  static constexpr const char* symbol = "k";
  static constexpr const char* words = "thermal conductivity";
  static constexpr const char* unit = "W/(m K)";
};
struct viscosity {
  using unit_type = boost::units::si::dynamic_viscosity;
  static constexpr const char* symbol = "mu";
  static constexpr const char* words = "dynamic viscosity";
  static constexpr const char* unit = "Pa s";
};
struct kinematic_viscosity {
  using unit_type = unit_types::diffusivity;
  static constexpr const char* symbol = "nu";
  static constexpr const char* words = "kinematic viscosity";
  static constexpr const char* unit = "m2/s";
};
struct thermal_diffusivity {
  using unit_type = unit_types::diffusivity;
  static constexpr const char* symbol = "alpha";
  static constexpr const char* words = "thermal diffusivity";
  static constexpr const char* unit = "m2/s";
};
/// -(1/rho) (d rho/d T)_p; negative for water below its density maximum.
struct expansion_coefficient {
  using unit_type = unit_types::volumetric_expansion;
  static constexpr const char* symbol = "beta";
  static constexpr const char* words = "volumetric expansion coefficient";
  static constexpr const char* unit = "1/K";
};
struct surface_tension {
  using unit_type = unit_types::surface_tension;
  static constexpr const char* symbol = "sigma";
  static constexpr const char* words = "surface tension";
  static constexpr const char* unit = "N/m";
};
/// Acceleration that drives buoyancy.
struct gravity {
  using unit_type = boost::units::si::acceleration;
  static constexpr const char* symbol = "g";
  static constexpr const char* words = "gravitational acceleration";
  static constexpr const char* unit = "m/s2";
};
}  // namespace kinds

inline constexpr gate<kinds::pressure> pressure{};
inline constexpr gate<kinds::density> density{};
inline constexpr gate<kinds::specific_heat> specific_heat{};
inline constexpr gate<kinds::conductivity> conductivity{};
inline constexpr gate<kinds::viscosity> viscosity{};
inline constexpr gate<kinds::kinematic_viscosity> kinematic_viscosity{};
inline constexpr gate<kinds::thermal_diffusivity> thermal_diffusivity{};
inline constexpr gate<kinds::expansion_coefficient> expansion_coefficient{};
inline constexpr gate<kinds::surface_tension> surface_tension{};
inline constexpr gate<kinds::gravity> gravity{};
/// 9.80665 m/s2, the conventional value (3rd CGPM, 1901).
inline constexpr typed<kinds::gravity> standard_gravity = typed<kinds::gravity>::from_si(9.80665);

}  // namespace v0
}  // namespace convelope

#endif
