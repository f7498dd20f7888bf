#ifndef CONVELOPE_FLUIDS_SOLAR_SALT_HPP
#define CONVELOPE_FLUIDS_SOLAR_SALT_HPP

#include "convelope/fluids/detail/within_limits.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference solar_salt_source{
    "A. B. Zavoico", 2001, "Solar Power Tower Design Basis Document, SAND2001-2100, p. 23",
    known::quoted, "one copy prints 22.174 for 22.714 in the viscosity"};
inline constexpr limit_info solar_salt_limits[] = {{"T", 533.15, 873.15}, {"p", 0.0, 2e6}};
// The source states none. Later measurements scatter by this (from memory).
inline constexpr fluid_info solar_salt_info{
    "solar salt", &solar_salt_source, solar_salt_limits, 2, {0.02, 0.05, 0.15, 0.15, not_stated}};
}  // namespace detail

/// Molten 60 % NaNO3, 40 % KNO3 by mass, 260 .. 600 degC: Zavoico 2001. Freezes from 238 degC down.
/// Cost: one division. The viscosity's cubic passes through zero near 700 degC.
struct solar_salt {
  static constexpr expansion_rule expansion_at = expansion_rule::film;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K, const T&) const {
    const T t = T(temperature_K - 273.15);
    const T rho = T(2090.0 - 0.636 * t);
    return {rho, T(1443.0 + 0.172 * t), T(0.443 + 1.9e-4 * t),
            T(1e-3 * (22.714 + t * (-0.120 + t * (2.281e-4 - 1.474e-7 * t)))), T(0.636 / rho)};
  }
  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    return detail::within_limits<detail::solar_salt_limits>(temperature_K, pressure_Pa);
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::solar_salt_info; }
};

}  // namespace v0
}  // namespace convelope

#endif
