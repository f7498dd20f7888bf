#ifndef CONVELOPE_FLUIDS_DRY_AIR_HPP
#define CONVELOPE_FLUIDS_DRY_AIR_HPP

#include "convelope/fluids/fluid.hpp"

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

struct dry_air_base {
  static constexpr expansion_rule expansion_at = expansion_rule::ambient;
  /// Of the equation of state: 8.31451 J/(mol K) over 28.9586 g/mol.
  static constexpr double gas_constant = 8.31451 / 28.9586e-3;

  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    const auto within = [](int i, const T& x) {
      return fluid_limit(i, x, scalar_adaptor<T>::constant(dry_air_limits[i].low),
                         scalar_adaptor<T>::constant(dry_air_limits[i].high));
    };
    return bits_t<T>(within(0, temperature_K) | within(1, pressure_Pa));
  }
};
}  // namespace detail

/// Dry air as an ideal gas, 200 .. 2000 K, 1 kPa .. 0.3 MPa.
/// Heat capacity: Lemmon et al. 2000, eq. for cp0 (three Einstein terms). Viscosity and
/// conductivity: dilute-gas part of Lemmon and Jacobsen 2004. Expansion: 1/T.
/// Dissociation and nitric oxide, noticeable towards 2000 K, are left out.
/// Cost: one log, one square root, five exp.
struct dry_air : detail::dry_air_base {
  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    using math::exp;
    using math::log;
    using math::sqrt;
    const T& t = temperature_K;
    const T inverse = T(1.0 / t);
    const T root = sqrt(t);

    // 0.0266958 sqrt(M) / sigma^2, sigma = 0.360 nm; Omega on T* = T / 103.3 K
    const T reduced = log(T(t * (1.0 / 132.6312)));
    const T x = T(reduced + 0.24993496806649704);  // log(132.6312 / 103.3)
    const T collision = T(((((0.00331 * x - 0.005341) * x - 0.08406) * x + 0.4623) * x) - 0.431);
    const T micro_Pa_s = T(root * exp(collision) * (0.0266958 * 5.381319540781796 / 0.1296));

    // tau^-1.1 and tau^-0.3 from one exp
    const T tenth = exp(T(0.1 * reduced));
    const T milli_W_mK =
        T(1.308 * micro_Pa_s + tenth * ((1.405 / 132.6312) * t - 1.036 * (tenth * tenth)));

    const T cp_over_R = T(
        ((-3.115413101e-13 * t + 7.172111248e-9) * t + 2.395525583e-6) * t + 3.490888032 +
        0.223806688 * (root * inverse * inverse) + 0.791309509 * vibration(T(3364.011 * inverse)) +
        0.212236768 * vibration(T(2242.45 * inverse)) + 0.197938904 * electronic(inverse));

    return {T(pressure_Pa * inverse * (1.0 / gas_constant)), T(gas_constant * cp_over_R),
            T(1e-3 * milli_W_mK), T(1e-6 * micro_Pa_s), inverse};
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::dry_air_info; }

 private:
  // Einstein's u^2 e^u / (e^u - 1)^2, with e^-u so that a cold gas can't overflow it.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T vibration(const T& u) {
    const T e = math::exp(T(-u));
    const T ratio = T(u / (1.0 - e));
    return T(ratio * ratio * e);
  }
  template <class T>
  CONVELOPE_FUNCTION static constexpr T electronic(const T& inverse) {
    const T w = T(11580.4 * inverse);
    const T e = T((2.0 / 3.0) * math::exp(T(-w)));
    const T ratio = T(w / (e + 1.0));
    return T(ratio * ratio * e);
  }
};

/// dry_air by polynomials of degree 6 in (T - 600 K)/(T + 600 K): no exp or log, one square root.
/// Within 7.7e-5 of dry_air in heat capacity, viscosity and conductivity, 200 .. 2000 K; density
/// and expansion are the same. Outside that range the polynomials diverge.
struct dry_air_fast : detail::dry_air_base {
  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    const T& t = temperature_K;
    const T inverse = T(1.0 / t);
    const T x = T((t - 600.0) / (t + 600.0));
    const T root = math::sqrt(t);
    const T cp = T(
        (((((9.622736931e+02 * x + 2.491843220e+02) * x - 8.815870604e+02) * x - 2.357082856e+02) *
              x +
          4.344173448e+02) *
             x +
         2.777177730e+02) *
            x +
        1.051207756e+03);
    const T k = T(
        (((((6.391036853e-04 * x + 7.065317160e-04) * x + 1.244534287e-04) * x + 5.057781711e-04) *
              x +
          1.504423947e-06) *
             x +
         1.011307562e-03) *
            x +
        1.877744676e-03);
    const T mu = T(
        (((((2.782510173e-07 * x + 3.298852992e-07) * x - 1.145031784e-08) * x + 2.329811291e-07) *
              x -
          1.621611925e-07) *
             x +
         4.755282923e-07) *
            x +
        1.255748635e-06);
    return {T(pressure_Pa * inverse * (1.0 / gas_constant)), cp, T(root * k), T(root * mu),
            inverse};
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::dry_air_fast_info; }
};

}  // namespace v0
}  // namespace convelope

#endif
