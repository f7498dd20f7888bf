#ifndef CONVELOPE_FLUIDS_DRY_AIR_HPP
#define CONVELOPE_FLUIDS_DRY_AIR_HPP

#include "convelope/fluids/detail/gas_equations.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference dry_air_source{
    "E. W. Lemmon, R. T Jacobsen, S. G. Penoncello, D. G. Friend", 2004,
    "J. Phys. Chem. Ref. Data 29 (2000) 331-385; Lemmon, Jacobsen, Int. J. Thermophys. 25 (2004) "
    "21-69",
    known::quoted,
    "ideal-gas density and cp, dilute-gas viscosity and conductivity; the uncertainties include "
    "what that leaves out at 200 K and 0.3 MPa, where it is largest"};
inline constexpr reference dry_air_fast_source{
    dry_air_source.authors, dry_air_source.year, dry_air_source.where, known::computed,
    "polynomials fitted to dry_air, within 7.7e-5 of it"};

// Below 1 kPa the mean free path passes 7 um at 300 K: common practice, not from the sources.
inline constexpr limit_info dry_air_limits[] = {{"T", 200.0, 2000.0}, {"p", 1e3, 3e5}};

// Against the full equation of state at 200 K and 0.3 MPa: density 0.7 %, cp 1.3 %, beta 2.5 %
// (at 300 K and 0.1 MPa 0.03, 0.16 and 0.26 %). Transport: 1 % and 2 % of the dilute gas (from
// memory) and up to 0.4 % and 0.8 % for the density left out.
inline constexpr property_uncertainty dry_air_uncertainty{0.008, 0.015, 0.03, 0.02, 0.026};
inline constexpr fluid_info dry_air_info{"dry air", &dry_air_source, dry_air_limits, 2,
                                         dry_air_uncertainty};
inline constexpr fluid_info dry_air_fast_info{"dry air (fast)", &dry_air_fast_source,
                                              dry_air_limits, 2, dry_air_uncertainty};

template <const fluid_info& Info>
struct ideal_air : gas<Info> {
  /// Of the equation of state: 8.31451 J/(mol K) over 28.9586 g/mol.
  static constexpr double gas_constant = 8.31451 / 28.9586e-3;
};
}  // namespace detail

/// Dry air as an ideal gas, 200 .. 2000 K, 1 kPa .. 0.3 MPa.
/// Heat capacity: Lemmon et al. 2000, eq. for cp0 (three Einstein terms). Viscosity and
/// conductivity: dilute-gas part of Lemmon and Jacobsen 2004. Expansion: 1/T.
/// Dissociation and nitric oxide, noticeable towards 2000 K, are left out.
/// Cost: one log, one square root, five exp.
struct dry_air : detail::ideal_air<detail::dry_air_info> {
  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    const T& t = temperature_K;
    const T inverse = T(1.0 / t);
    const T root = math::power<1, 2>(t);  // its slope shares 1/t

    // 0.0266958 sqrt(M) / sigma^2, sigma = 0.360 nm; log(132.6312 / 103.3)
    const T reduced = math::log(T(t * (1.0 / 132.6312)));
    const T over_collision = detail::root_over_collision(root, T(reduced + 0.24993496806649704));
    const T micro_Pa_s = T(over_collision * (0.0266958 * 5.381319540781796 / 0.1296));

    // tau^-1.1 and tau^-0.3 from one exp
    const T tenth = math::exp(T(0.1 * reduced));
    const T milli_W_mK =
        T(1.308 * micro_Pa_s + tenth * ((1.405 / 132.6312) * t - 1.036 * (tenth * tenth)));

    const T cp_over_R = detail::air_equation::ideal_heat(t, inverse, root);

    return {T(pressure_Pa * inverse * (1.0 / gas_constant)), T(gas_constant * cp_over_R),
            T(1e-3 * milli_W_mK), T(1e-6 * micro_Pa_s), inverse};
  }
};

/// dry_air by polynomials of degree 6 in (T - 600 K)/(T + 600 K): no exp or log, one square root.
/// Within 7.7e-5 of dry_air in heat capacity, viscosity and conductivity, 200 .. 2000 K; density
/// and expansion are the same. Outside that range the polynomials diverge.
struct dry_air_fast : detail::ideal_air<detail::dry_air_fast_info> {
  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    const T& t = temperature_K;
    const T inverse = T(1.0 / t);
    const T x = T((t - 600.0) / (t + 600.0));
    const T root = math::power<1, 2>(t);  // its slope shares 1/t
    const T cp =
        math::polynomial(x, 1.051207756e+03, 2.777177730e+02, 4.344173448e+02, -2.357082856e+02,
                         -8.815870604e+02, 2.491843220e+02, 9.622736931e+02);
    const T k =
        math::polynomial(x, 1.877744676e-03, 1.011307562e-03, 1.504423947e-06, 5.057781711e-04,
                         1.244534287e-04, 7.065317160e-04, 6.391036853e-04);
    const T mu =
        math::polynomial(x, 1.255748635e-06, 4.755282923e-07, -1.621611925e-07, 2.329811291e-07,
                         -1.145031784e-08, 3.298852992e-07, 2.782510173e-07);
    return {T(pressure_Pa * inverse * (1.0 / gas_constant)), cp, T(root * k), T(root * mu),
            inverse};
  }
};

}  // namespace v0
}  // namespace convelope

#endif
