#ifndef CONVELOPE_FLUIDS_ARGON_HPP
#define CONVELOPE_FLUIDS_ARGON_HPP

#include "convelope/fluids/detail/lemmon_jacobsen.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference argon_source{
    "E. W. Lemmon, R. T Jacobsen", 2004,
    "Int. J. Thermophys. 25 (2004) 21-69; Tegeler, Span, Wagner, J. Phys. Chem. Ref. Data 28 "
    "(1999) 779-850",
    known::quoted,
    "no third virial coefficient, transport linear in density; the uncertainties include what that "
    "leaves out at 200 K and 2 MPa, where it is largest"};

// Below 1 kPa the mean free path passes 7 um at 300 K: common practice, not from the sources.
inline constexpr limit_info argon_limits[] = {{"T", 200.0, 2000.0}, {"p", 1e3, 2e6}};
// Left out, at 200 K and 2 MPa where it is largest: density 0.30 %, cp 0.55 %, beta 1.0 %,
// viscosity 0.6 %, conductivity 0.9 %. Transport itself 2 % (from memory).
inline constexpr fluid_info argon_info{
    "argon", &argon_source, argon_limits, 2, {0.004, 0.01, 0.025, 0.02, 0.012}};
}  // namespace detail

/// Argon gas, 200 .. 2000 K, 1 kPa .. 2 MPa.
/// Heat capacity of the ideal gas, density, real-gas heat capacity and expansion: Tegeler et al.
/// 1999, ended after the second virial coefficient. Viscosity and conductivity: Lemmon and Jacobsen
/// 2004, the dilute gas and the term linear in density.
/// Cost: one log, four square roots, four exp.
struct argon : detail::gas<detail::argon_info> {
  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    using equation = detail::argon_transport;
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
                             detail::root_over_collision(root, T(reduced + 0.050962583284080584)));
    const T rising = math::exp(T(-0.42 * reduced));  // tau^0.42
    const T steeper = math::exp(T(-0.9 * reduced));  // tau^0.9
    const T falling = math::exp(T(0.77 * reduced));  // tau^-0.77
    const T micro_Pa_s = T(micro_dilute + delta * (12.19 * rising - 6.698 * steeper));
    const T milli_W_mK = T(0.8158 * micro_dilute - 0.4320 * falling +
                           delta * (13.73 - (3.973 * 12.275463331377761) * (root * inverse)));
    return {T(equation::molar_mass * state.density),
            T((equation::gas_constant / equation::molar_mass) * state.cp_over_R),
            T(1e-3 * milli_W_mK), T(1e-6 * micro_Pa_s), state.expansion};
  }
};

}  // namespace v0
}  // namespace convelope

#endif
