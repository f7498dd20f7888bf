#ifndef CONVELOPE_FLUIDS_HELIUM_HPP
#define CONVELOPE_FLUIDS_HELIUM_HPP

#include "convelope/fluids/detail/dilute_gas.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference helium_source{
    "V. D. Arp, R. D. McCarty, D. G. Friend", 1998,
    "NIST Technical Note 1334 (viscosity); Hands, Arp, Cryogenics 21 (1981) 697-703 (conductivity)",
    known::quoted, "ideal gas, dilute-gas transport; below 100 K the viscosity has another branch"};
// Below 1 kPa the mean free path passes 20 um at 300 K: common practice, not from the sources.
inline constexpr limit_info helium_limits[] = {{"T", 100.0, 1500.0}, {"p", 1e3, 5e5}};
// The second virial coefficient, 12 cm3/mol, leaves out 0.7 % of the density at 100 K and
// 0.5 MPa and as much of the expansion coefficient. Transport: 1 to 2 % (from memory).
inline constexpr fluid_info helium_info{
    "helium", &helium_source, helium_limits, 2, {0.008, 0.002, 0.02, 0.02, 0.01}};
}  // namespace detail

/// Helium as an ideal gas, 100 .. 1500 K, 1 kPa .. 0.5 MPa.
/// Heat capacity 5/2 R. Viscosity: Arp, McCarty, Friend 1998. Conductivity: Hands and Arp 1981;
/// both of the dilute gas. Expansion: 1/T.
/// Cost: one log, two exp.
struct helium : detail::gas<detail::helium_info> {
  static constexpr double gas_constant = 8.314472 / 4.002602e-3;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    const T inverse = T(1.0 / temperature_K);
    const T x = math::log(temperature_K);
    const T mu = math::exp(T(0.71938 * x + (12.451 - 295.67 * inverse) * inverse - 4.1249));
    const T k = math::exp(T(
        0.7034007057 * x +
        (((-49.26397634 * inverse + 59.82252246) * inverse - 26.20316969) * inverse + 3.739232544) *
            inverse));
    return {T(pressure_Pa * inverse * (1.0 / gas_constant)),
            scalar_adaptor<T>::constant(2.5 * gas_constant), T(2.7870034e-3 * k), T(19.6e-6 * mu),
            inverse};
  }
};

}  // namespace v0
}  // namespace convelope

#endif
