#ifndef CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_CHOICES_HPP
#define CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_CHOICES_HPP

#include "convelope/estimate/correlation.hpp"

namespace convelope {
inline namespace v0 {

namespace round_duct {
/// What the wall holds constant along the duct.
enum class wall { uniform_temperature, uniform_flux };
/// What develops behind the inlet: the temperature alone, or the velocity with it.
enum class entry { thermal, combined };
/// What happens to the fluid.
enum class mode { heating, cooling };
}  // namespace round_duct

template <>
struct choice_words<round_duct::wall> {
  static constexpr const char* key = "bc";
  static constexpr const char* about = "uniform wall temperature T or uniform heat flux H";
  static constexpr const char* words[] = {"T", "H", nullptr};
};
template <>
struct choice_words<round_duct::entry> {
  static constexpr const char* key = "entry";
  static constexpr const char* about = "temperature profile alone or both profiles developing";
  static constexpr const char* words[] = {"thermal", "combined", nullptr};
};
template <>
struct choice_words<round_duct::mode> {
  static constexpr const char* key = "mode";
  static constexpr const char* about = "what happens to the fluid";
  static constexpr const char* words[] = {"heating", "cooling", nullptr};
};

}  // namespace v0
}  // namespace convelope

#endif
