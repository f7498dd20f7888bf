#ifndef CONVELOPE_FLUIDS_CARBON_DIOXIDE_HPP
#define CONVELOPE_FLUIDS_CARBON_DIOXIDE_HPP

#include "convelope/fluids/detail/carbon_dioxide.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference carbon_dioxide_source{
    "R. Span, W. Wagner", 1996,
    "J. Phys. Chem. Ref. Data 25 (1996) 1509-1596; Laesecke, Muzny, ibid. 46 (2017) 013107; "
    "Huber et al., ibid. 45 (2016) 013102",
    known::quoted,
    "virial coefficients of density from memory; the third is left out, and so are the dense part "
    "of the viscosity and the critical enhancements"};
// Below 1 kPa the mean free path passes 5 um at 300 K: common practice, not from the sources.
inline constexpr limit_info carbon_dioxide_limits[] = {{"T", 220.0, 1100.0}, {"p", 1e3, 5e5}};
// At 220 K and 0.5 MPa, where what is left out is largest; estimated from the saturated vapour.
inline constexpr fluid_info carbon_dioxide_info{"carbon dioxide",
                                                &carbon_dioxide_source,
                                                carbon_dioxide_limits,
                                                2,
                                                {0.005, 0.02, 0.03, 0.01, 0.02}};
}  // namespace detail

/// Carbon dioxide gas, 220 .. 1100 K, 1 kPa .. 0.5 MPa (below the saturation pressure throughout).
/// Heat capacity, density, expansion: Span and Wagner 1996, ended after the second virial
/// coefficient. Viscosity: Laesecke and Muzny 2017, up to the term linear in density.
/// Conductivity: Huber et al. 2016. Critical enhancements are left out.
/// Dissociation is left out.
/// Cost: seven exp, one cube root, six square roots.
struct carbon_dioxide : detail::gas<detail::carbon_dioxide_info> {
  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    namespace co2 = detail::co2;
    const T inverse = T(1.0 / temperature_K);
    const T root = math::sqrt(temperature_K);
    const detail::helmholtz::virial_gas<T> state = detail::helmholtz::gas_of(
        co2::virial(temperature_K, inverse), inverse,
        T(pressure_Pa * inverse * (1.0 / co2::gas_constant)), co2::ideal_heat(inverse));
    const T rho = T(co2::molar_mass * state.density);
    return {rho, T((co2::gas_constant / co2::molar_mass) * state.cp_over_R),
            co2::conductivity(rho, temperature_K, inverse, root),
            T(1e-6 * co2::dilute_viscosity(root) * (1.0 + co2::viscosity_virial(inverse) * rho)),
            state.expansion};
  }
};

}  // namespace v0
}  // namespace convelope

#endif
