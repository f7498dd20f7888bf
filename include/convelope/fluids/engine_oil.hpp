#ifndef CONVELOPE_FLUIDS_ENGINE_OIL_HPP
#define CONVELOPE_FLUIDS_ENGINE_OIL_HPP

#include "convelope/fluids/detail/within_limits.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference engine_oil_source{
    "F. P. Incropera, D. P. DeWitt, T. L. Bergman, A. S. Lavine", 2007,
    "Fundamentals of Heat and Mass Transfer, table A.5, engine oil (unused)", known::quoted,
    "smooth fits to the table: within 0.09 % in density, 0.26 % in heat capacity, 1.5 % in "
    "conductivity, 2.2 % in viscosity; expansion from the density fit, 1.1 to 4.2 % below the "
    "table's constant 7e-4"};
// Viscosity rises by some 2 % per MPa (common practice).
inline constexpr limit_info engine_oil_limits[] = {{"T", 273.0, 430.0}, {"p", 0.0, 1e6}};
// What products differ by: common practice, the table states nothing.
inline constexpr fluid_info engine_oil_info{
    "engine oil", &engine_oil_source, engine_oil_limits, 2, {0.03, 0.05, 0.1, 0.3, 0.1}};

inline constexpr reference cragoe_source{
    "C. S. Cragoe", 1929, "Thermal properties of petroleum products, NBS Misc. Publ. 97",
    known::recalled};
}  // namespace detail

/// Engine oil, unused and of no brand, 273 .. 430 K: a textbook table, made smooth. Products differ
/// by tens of percent in viscosity: host_fluid takes a data sheet's.
/// The fit of the viscosity turns over at 260.7 K, so it stays what it is at 262 K below that.
/// Cost: one exp, two divisions.
struct engine_oil {
  static constexpr expansion_rule expansion_at = expansion_rule::film;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K, const T&) const {
    const T x = T(temperature_K - 350.0);
    const T rho = T(854.0219 - 0.5921548 * x);
    const T viscous = detail::held_between(temperature_K, 262.0, 1e4);
    const T w = T(1.0 / (viscous - 219.0));
    return {rho, T(2122.742 + 4.277052 * x), T(0.13912347 - 9.679449e-5 * x),
            math::exp(T(-9.363230903 + w * (941.7399102 - 19651.13443 * w))), T(0.5921548 / rho)};
  }
  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    return detail::within_limits<detail::engine_oil_limits>(temperature_K, pressure_Pa);
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::engine_oil_info; }
};

/// Heat capacity and conductivity of any petroleum oil from its specific gravity, 0.75 .. 0.96,
/// 273 .. 473 K: Cragoe 1929 (from memory: 2 .. 4 % and 10 %).
struct petroleum_oil {
  static constexpr limit_info limits[] = {{"T", 273.15, 473.15}, {"d", 0.75, 0.96}};

  /// J/(kg K)
  template <class T>
  CONVELOPE_FUNCTION static constexpr T specific_heat(
      const T& temperature_K, const typed<kinds::specific_gravity>& gravity_15C) {
    const double root = math::sqrt(gravity_15C.si());
    return T((4186.8 * (0.403 + 0.00081 * (temperature_K - 273.15))) * (1.0 / root));
  }
  /// W/(m K)
  template <class T>
  CONVELOPE_FUNCTION static constexpr T conductivity(
      const T& temperature_K, const typed<kinds::specific_gravity>& gravity_15C) {
    return T((1.0 - 0.00054 * (temperature_K - 273.15)) * (0.1172 / gravity_15C.si()));
  }
};

}  // namespace v0
}  // namespace convelope

#endif
