#ifndef CONVELOPE_KINDS_MIXTURES_HPP
#define CONVELOPE_KINDS_MIXTURES_HPP

#include "convelope/kinds/numbers.hpp"

namespace convelope {
inline namespace v0 {

namespace kinds {
/// Mass of the solute over mass of the solution: 0.3, not 30.
struct mass_fraction : pure_number {
  static constexpr const char* symbol = "x";
  static constexpr const char* words = "mass fraction of the solute";
};
/// Mass of the dissolved salt over mass of the seawater: 0.035, not 35.
struct salinity : pure_number {
  static constexpr const char* symbol = "S";
  static constexpr const char* words = "salinity, mass of salt over mass of seawater";
};
/// Density at 15.6 degC over that of water at 15.6 degC.
struct specific_gravity : pure_number {
  static constexpr const char* symbol = "d";
  static constexpr const char* words = "specific gravity at 15.6 degC";
};
}  // namespace kinds

inline constexpr gate<kinds::mass_fraction> mass_fraction{};
inline constexpr gate<kinds::salinity> salinity{};
inline constexpr gate<kinds::specific_gravity> specific_gravity{};

}  // namespace v0
}  // namespace convelope

#endif
