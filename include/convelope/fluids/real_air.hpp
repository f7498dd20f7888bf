#ifndef CONVELOPE_FLUIDS_REAL_AIR_HPP
#define CONVELOPE_FLUIDS_REAL_AIR_HPP

#include "convelope/fluids/detail/lemmon_jacobsen.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference real_air_source{
    "E. W. Lemmon, R. T Jacobsen, S. G. Penoncello, D. G. Friend", 2000,
    "J. Phys. Chem. Ref. Data 29 (2000) 331-385; Lemmon, Jacobsen, Int. J. Thermophys. 25 (2004) "
    "21-69",
    known::quoted,
    "without the critical enhancement: conductivity low by up to 3.8 % at 200 K and 13 MPa, by 1.1 "
    "% at 250 K, nothing above 265 K"};
// Below 1 kPa the mean free path passes 7 um at 300 K: common practice, not from the sources.
inline constexpr limit_info real_air_limits[] = {{"T", 200.0, 2000.0}, {"p", 1e3, 2e7}};
// Density 0.1 %, heat capacity 1 %, transport 2 % (from memory), and the enhancement left out.
// Expansion: common practice.
inline constexpr fluid_info real_air_info{
    "real air", &real_air_source, real_air_limits, 2, {0.001, 0.01, 0.045, 0.02, 0.01}};
}  // namespace detail

/// Dry air as a real gas, 200 .. 2000 K, 1 kPa .. 20 MPa.
/// Density, heat capacity, expansion: equation of state of Lemmon et al. 2000. Viscosity and
/// conductivity: Lemmon and Jacobsen 2004, without the critical enhancement of the conductivity.
/// The density is found by seven Newton steps, two of which carry derivatives; from an ideal gas,
/// six are enough anywhere in the envelope.
/// Below 0.3 MPa dry_air is as good and several times cheaper.
/// Cost: 33 exp, four log, two square roots, eight evaluations of 19 terms.
struct real_air : detail::gas<detail::real_air_info> {
  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    using equation = detail::air_transport;
    namespace helmholtz = detail::helmholtz;
    const T inverse = T(1.0 / temperature_K);
    const T p_over_RT = T(pressure_Pa * inverse * (1.0 / equation::gas_constant));
    const auto at =
        helmholtz::isotherm_of<equation>(T(equation::reducing_temperature * inverse),
                                         T(temperature_K * (1.0 / equation::reducing_temperature)));
    T rho = guess(plain(temperature_K), plain(p_over_RT));
    for (int i = 0; i < 2; ++i) rho = helmholtz::closer_density(at, rho, p_over_RT);
    const auto s = helmholtz::state_of(
        at, rho, temperature_K, inverse,
        equation::ideal_heat(temperature_K, inverse, math::sqrt(temperature_K)));
    const auto b = detail::background<equation>(rho, temperature_K, inverse);
    return {T(equation::molar_mass * rho),
            T((equation::gas_constant / equation::molar_mass) * s.cp_over_R),
            T(1e-3 * b.conductivity), T(1e-6 * b.viscosity), s.expansion};
  }

 private:
  // Without derivatives: the last steps give rho its own.
  template <class P>
  CONVELOPE_FUNCTION static constexpr P guess(const P& temperature_K, const P& p_over_RT) {
    using equation = detail::air_transport;
    const auto at = detail::helmholtz::isotherm_of<equation>(
        P(equation::reducing_temperature / temperature_K),
        P(temperature_K * (1.0 / equation::reducing_temperature)));
    P rho = p_over_RT;
    for (int i = 0; i < 5; ++i) rho = detail::helmholtz::closer_density(at, rho, p_over_RT);
    return rho;
  }
};

}  // namespace v0
}  // namespace convelope

#endif
