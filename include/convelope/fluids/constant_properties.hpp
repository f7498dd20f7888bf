#ifndef CONVELOPE_FLUIDS_CONSTANT_PROPERTIES_HPP
#define CONVELOPE_FLUIDS_CONSTANT_PROPERTIES_HPP

#include "convelope/fluids/fluid.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference own_numbers{"the host", 0, "numbers given by the host", known::recalled};
inline constexpr fluid_info constant_info{
    "constant properties", &own_numbers, nullptr, 0, {0.0, 0.0, 0.0, 0.0, 0.0}};
}  // namespace detail

/// A fluid whose properties the host gives as constants. No envelope of its own: any T > 0.
struct constant_properties {
  static constexpr expansion_rule expansion_at = expansion_rule::film;

  typed<kinds::density> density;
  typed<kinds::specific_heat> specific_heat;
  typed<kinds::conductivity> conductivity;
  typed<kinds::viscosity> viscosity;
  typed<kinds::expansion_coefficient> expansion_coefficient;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T&, const T&) const {
    return {constant<T>(density.si()), constant<T>(specific_heat.si()),
            constant<T>(conductivity.si()), constant<T>(viscosity.si()),
            constant<T>(expansion_coefficient.si())};
  }
  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T&) const {
    return fluid_limit(0, temperature_K, constant<T>(1e-3), constant<T>(1e30));
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::constant_info; }

 private:
  template <class T>
  CONVELOPE_FUNCTION static constexpr T constant(double c) {
    return scalar_adaptor<T>::constant(c);
  }
};

}  // namespace v0
}  // namespace convelope

#endif
