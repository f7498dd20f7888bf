#ifndef CONVELOPE_KINDS_HUMIDITY_HPP
#define CONVELOPE_KINDS_HUMIDITY_HPP

#include "convelope/kinds/numbers.hpp"

namespace convelope {
inline namespace v0 {

namespace kinds {
/// Partial pressure of the vapour over the saturation pressure: 0 .. 1, not percent
struct relative_humidity : pure_number {
  static constexpr const char* symbol = "phi";
  static constexpr const char* words = "relative humidity";
};
/// Mass of vapour per mass of dry air, kg/kg
struct humidity_ratio : pure_number {
  static constexpr const char* symbol = "W";
  static constexpr const char* words = "humidity ratio";
};
}  // namespace kinds

inline constexpr gate<kinds::relative_humidity> relative_humidity{};
inline constexpr gate<kinds::humidity_ratio> humidity_ratio{};

}  // namespace v0
}  // namespace convelope

#endif
