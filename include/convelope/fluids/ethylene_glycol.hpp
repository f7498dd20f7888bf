#ifndef CONVELOPE_FLUIDS_ETHYLENE_GLYCOL_HPP
#define CONVELOPE_FLUIDS_ETHYLENE_GLYCOL_HPP

#include "convelope/fluids/detail/within_limits.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference ethylene_glycol_source{
    "F. P. Incropera, D. P. DeWitt, T. L. Bergman, A. S. Lavine", 2007,
    "Fundamentals of Heat and Mass Transfer, table A.5, ethylene glycol", known::recalled,
    "smooth fits to the table: within 0.35 % in density, 0.07 % in heat capacity, 0.5 % in "
    "conductivity, 0.7 % in viscosity; expansion from the density fit, up to 4 % below and 0.8 % "
    "above the table's constant 6.5e-4"};
inline constexpr limit_info ethylene_glycol_limits[] = {{"T", 273.0, 373.0}, {"p", 0.0, 2e6}};
// Common practice; the table states nothing.
inline constexpr fluid_info ethylene_glycol_info{"ethylene glycol",
                                                 &ethylene_glycol_source,
                                                 ethylene_glycol_limits,
                                                 2,
                                                 {0.005, 0.02, 0.03, 0.05, 0.08}};
}  // namespace detail

/// Ethylene glycol without water, 273 .. 373 K: a textbook table, made smooth.
/// Cost: one exp, two divisions.
struct ethylene_glycol {
  static constexpr expansion_rule expansion_at = expansion_rule::film;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K, const T&) const {
    const T x = T(temperature_K - 320.0);
    const T rho = T(1098.280 - 0.6830649 * x);
    const T viscous = detail::held_between(temperature_K, 220.0, 1e4);
    return {rho, T(2503.674 + 4.480358 * x), T(0.25738955 + x * (2.2040722e-4 - 2.519107e-6 * x)),
            math::exp(T(-9.775704619 + 753.4537740 / (viscous - 166.0))), T(0.6830649 / rho)};
  }
  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    return detail::within_limits<detail::ethylene_glycol_limits>(temperature_K, pressure_Pa);
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const {
    return &detail::ethylene_glycol_info;
  }
};

}  // namespace v0
}  // namespace convelope

#endif
