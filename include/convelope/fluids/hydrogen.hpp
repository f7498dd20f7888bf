#ifndef CONVELOPE_FLUIDS_HYDROGEN_HPP
#define CONVELOPE_FLUIDS_HYDROGEN_HPP

#include "convelope/fluids/detail/hydrogen.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference hydrogen_source{
    "J. W. Leachman, R. T Jacobsen, S. G. Penoncello, E. W. Lemmon", 2009,
    "J. Phys. Chem. Ref. Data 38 (2009) 721-748; Muzny, Huber, Kazakov, J. Chem. Eng. Data 58 "
    "(2013) 969-979; Assael et al., J. Phys. Chem. Ref. Data 40 (2011) 033101",
    known::quoted,
    "normal hydrogen (three quarters ortho) as an ideal gas; para hydrogen has 4 % more heat "
    "capacity at 300 K"};
// Below 1 kPa the mean free path passes 12 um at 300 K: common practice, not from the sources.
inline constexpr limit_info hydrogen_limits[] = {{"T", 200.0, 1000.0}, {"p", 1e3, 5e5}};
// The second virial coefficient, 11 to 17 cm3/mol, leaves out 0.4 % of the density at 0.5 MPa.
inline constexpr fluid_info hydrogen_info{
    "hydrogen", &hydrogen_source, hydrogen_limits, 2, {0.005, 0.005, 0.04, 0.01, 0.01}};
}  // namespace detail

/// Normal hydrogen as an ideal gas, 200 .. 1000 K, 1 kPa .. 0.5 MPa.
/// Heat capacity: Leachman et al. 2009 (five Einstein terms). Viscosity: Muzny et al. 2013, dilute
/// gas. Conductivity: Assael et al. 2011 without the critical enhancement. Expansion: 1/T.
/// Cost: one log, one square root, six exp.
struct hydrogen : detail::gas<detail::hydrogen_info> {
  static constexpr double gas_constant = 8.314472 / 2.01588e-3;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    using detail::einstein;
    const T inverse = T(1.0 / temperature_K);
    const T rho = T(pressure_Pa * inverse * (1.0 / gas_constant));
    const T cp_over_R =
        T(2.5 + 1.616 * einstein(T(531.0 * inverse)) - 0.4117 * einstein(T(751.0 * inverse)) -
          0.792 * einstein(T(1989.0 * inverse)) + 0.758 * einstein(T(2484.0 * inverse)) +
          1.217 * einstein(T(6859.0 * inverse)));
    const T x = math::log(T(temperature_K * (1.0 / 30.41)));
    const T collision =
        T((((2.76981e-3 * x - 3.35325e-2) * x + 1.43602e-1) * x - 4.55274e-1) * x + 2.09630e-1);
    // 0.021357 sqrt(M)/sigma^2, sigma = 0.297 nm
    constexpr double micro = 0.021357 * 1.4198168896023178 / (0.297 * 0.297);
    return {rho, T(gas_constant * cp_over_R),
            detail::hydrogen::normal_conductivity(rho, temperature_K),
            T(1e-6 * micro * math::sqrt(temperature_K) * math::exp(T(-collision))), inverse};
  }
};

}  // namespace v0
}  // namespace convelope

#endif
