#ifndef CONVELOPE_FLUIDS_NITROGEN_HPP
#define CONVELOPE_FLUIDS_NITROGEN_HPP

#include "convelope/fluids/detail/lemmon_jacobsen.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference nitrogen_source{
    "E. W. Lemmon, R. T Jacobsen", 2004,
    "Int. J. Thermophys. 25 (2004) 21-69; Span et al., J. Phys. Chem. Ref. Data 29 (2000) "
    "1361-1433",
    known::quoted,
    "no third virial coefficient, transport linear in density; the uncertainties include what that "
    "leaves out at 200 K and 2 MPa, where it is largest"};

// Below 1 kPa the mean free path passes 7 um at 300 K: common practice, not from the sources.
inline constexpr limit_info nitrogen_limits[] = {{"T", 200.0, 2000.0}, {"p", 1e3, 2e6}};
// Left out, at 200 K and 2 MPa where it is largest: density 0.33 %, cp 0.42 %, beta 1.1 %,
// viscosity 0.5 %, conductivity 1.7 %. Transport itself 2 % (from memory).
inline constexpr fluid_info nitrogen_info{
    "nitrogen", &nitrogen_source, nitrogen_limits, 2, {0.004, 0.01, 0.03, 0.02, 0.012}};
}  // namespace detail

/// Nitrogen gas, 200 .. 2000 K, 1 kPa .. 2 MPa.
/// Heat capacity of the ideal gas, density, real-gas heat capacity and expansion: Span et al. 2000,
/// ended after the second virial coefficient. Viscosity and conductivity: Lemmon and Jacobsen
/// 2004, the dilute gas and the term linear in density.
/// Cost: one log, five square roots, three exp.
struct nitrogen : detail::gas<detail::nitrogen_info> {
  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    using equation = detail::nitrogen_transport;
    const T& t = temperature_K;
    const T inverse = T(1.0 / t);
    const T root = math::sqrt(t);
    const T tau = T(equation::reducing_temperature * inverse);
    const T one_over_tau = T(t * (1.0 / equation::reducing_temperature));
    const detail::helmholtz::virial_gas<T> state =
        detail::gas_by_virial<equation>(t, inverse, root, tau, one_over_tau, pressure_Pa);
    const T delta = T(state.density * (1.0 / equation::reducing_density));
    const T reduced = math::log(one_over_tau);
    const T micro_dilute = T(equation::dilute_viscosity *
                             detail::root_over_collision(root, T(reduced + 0.24329095085607247)));
    // tau^-0.7, and from it tau^0.3
    const T power = math::exp(T(0.7 * reduced));
    const T micro_Pa_s = T(micro_dilute + 4.620 * delta * (tau * power));
    const T milli_W_mK =
        T(1.511 * micro_dilute + 2.117 * one_over_tau - 3.332 * power + 8.862 * delta);
    return {T(equation::molar_mass * state.density),
            T((equation::gas_constant / equation::molar_mass) * state.cp_over_R),
            T(1e-3 * milli_W_mK), T(1e-6 * micro_Pa_s), state.expansion};
  }
};

}  // namespace v0
}  // namespace convelope

#endif
