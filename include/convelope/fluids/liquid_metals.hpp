#ifndef CONVELOPE_FLUIDS_LIQUID_METALS_HPP
#define CONVELOPE_FLUIDS_LIQUID_METALS_HPP

#include "convelope/fluids/detail/within_limits.hpp"

// Prandtl numbers of 0.004 .. 0.05: most correlations for Pr > 0.5 do not hold.

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference sodium_source{
    "J. K. Fink, L. Leibowitz", 1995,
    "Thermodynamic and Transport Properties of Sodium Liquid and Vapor, ANL/RE-95/2",
    known::quoted};
inline constexpr limit_info sodium_limits[] = {
    {"T", 370.98, 2000.0}, {"p", 0.0, 1e7}, {"p/p_sat", 1.0, unbounded}};
// The largest up to 2000 K (from memory).
inline constexpr fluid_info sodium_info{
    "sodium", &sodium_source, sodium_limits, 3, {0.01, 0.03, 0.12, 0.12, not_stated}};

inline constexpr reference nak_source{
    "O. J. Foust (editor)", 1972, "Sodium-NaK Engineering Handbook, vol. 1, Gordon and Breach",
    known::quoted,
    "0.6733 taken as the mole fraction of potassium: as a mass fraction the density comes out 0.8 "
    "% "
    "low; the factor 1.003 stands in one of two copies and agrees with tables; the two viscosity "
    "equations, 1 % apart at 400 degC, are joined within 10 K of it"};
// Boils at 1058 K at atmospheric pressure (common practice).
inline constexpr limit_info nak_limits[] = {{"T", 323.15, 1058.0}, {"p", 9e4, 1e7}};
inline constexpr fluid_info nak_info{
    "NaK-78", &nak_source, nak_limits, 2, {0.01, 0.05, 0.1, 0.15, not_stated}};

inline constexpr reference heavy_metal_source{
    "OECD Nuclear Energy Agency", 2015,
    "Handbook on Lead-bismuth Eutectic Alloy and Lead Properties, chapter 2", known::quoted,
    "the 2007 edition differs; vapour pressure and ranges from memory"};
inline constexpr limit_info lead_limits[] = {
    {"T", 600.6, 1300.0}, {"p", 0.0, 1e7}, {"p/p_sat", 1.0, unbounded}};
inline constexpr fluid_info lead_info{
    "lead", &heavy_metal_source, lead_limits, 3, {0.01, 0.07, 0.15, 0.05, not_stated}};
inline constexpr limit_info lead_bismuth_limits[] = {
    {"T", 398.0, 1100.0}, {"p", 0.0, 1e7}, {"p/p_sat", 1.0, unbounded}};
inline constexpr fluid_info lead_bismuth_info{"lead-bismuth eutectic",
                                              &heavy_metal_source,
                                              lead_bismuth_limits,
                                              3,
                                              {0.01, 0.07, 0.15, 0.08, not_stated}};

inline constexpr reference mercury_source{
    "F. P. Incropera, D. P. DeWitt, T. L. Bergman, A. S. Lavine", 2007,
    "Fundamentals of Heat and Mass Transfer, table A.5, mercury; density: volume equation of the "
    "CRC Handbook of Chemistry and Physics",
    known::recalled,
    "smooth fits to the table: within 0.04 % in heat capacity, 0.11 % in conductivity, 0.17 % in "
    "viscosity, which is within 2 % of Assael et al. 2012"};
inline constexpr limit_info mercury_limits[] = {{"T", 273.0, 600.0}, {"p", 0.0, 1e7}};
inline constexpr fluid_info mercury_info{
    "mercury", &mercury_source, mercury_limits, 2, {1e-3, 0.01, 0.05, 0.073, not_stated}};

// A vapour pressure keeps the liquid liquid.
template <class Metal, const auto& Limits, class T>
CONVELOPE_FUNCTION constexpr bits_t<T> check_metal(const T& temperature_K, const T& pressure_Pa) {
  constexpr auto limits = constants_of(Limits);
  const T held = held_between(temperature_K, limits[0].low, limits[0].high);
  return bits_t<T>(within_limits<Limits>(temperature_K, pressure_Pa) |
                   scalar_adaptor<T>::bits_where(!(pressure_Pa >= Metal::saturation_pressure(held)),
                                                 word::of_fluid(2, side::below)));
}
}  // namespace detail

/// Liquid sodium, melting point .. 2000 K, above its saturation pressure: Fink and Leibowitz 1995.
/// Cost: two exp, one log, one square root, two divisions.
struct sodium {
  static constexpr expansion_rule expansion_at = expansion_rule::film;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K, const T&) const {
    const T& t = temperature_K;
    const T inverse = T(1.0 / t);
    const T root = math::sqrt(below_critical(t));
    const T rho = T(219.0 + root * (511.58 + 275.32 * root));
    const T cp = T(1658.2 + t * (-0.84790 + 4.4541e-4 * t) - 2.9926e6 * (inverse * inverse));
    const T k = T(124.67 + t * (-0.11381 + t * (5.5226e-5 - 1.1842e-8 * t)));
    const T mu = math::exp(T(-6.4406 - 0.3958 * math::log(t) + 556.835 * inverse));
    return {rho, cp, k, mu, T((275.32 + 0.5 * 511.58 / root) / (critical_temperature * rho))};
  }
  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    return detail::check_metal<sodium, detail::sodium_limits>(temperature_K, pressure_Pa);
  }
  /// Pa, 864 .. 2503.7 K (below that extrapolated)
  template <class T>
  CONVELOPE_FUNCTION static constexpr T saturation_pressure(const T& temperature_K) {
    return T(1e6 *
             math::exp(T(11.9463 - 12633.73 / temperature_K - 0.4672 * math::log(temperature_K))));
  }
  /// J/kg, 371 .. 2503.7 K
  template <class T>
  CONVELOPE_FUNCTION static constexpr T latent_heat(const T& temperature_K) {
    const T x = below_critical(temperature_K);
    return T(1e3 * (393.37 * x + 4398.6 * math::exp(T(0.29302 * math::log(x)))));
  }
  /// N/m, 371 .. 2503.7 K
  template <class T>
  CONVELOPE_FUNCTION static constexpr T surface_tension(const T& temperature_K) {
    return T(0.2405 * math::exp(T(1.126 * math::log(below_critical(temperature_K)))));
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::sodium_info; }

  static constexpr double critical_temperature = 2503.7;  // K

 private:
  // 1 - T/T_c, held above zero so that no root fails.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T below_critical(const T& temperature_K) {
    const T held = detail::held_between(temperature_K, 1.0, 2503.0);
    return T(1.0 - held * (1.0 / critical_temperature));
  }
};

/// The eutectic of sodium with 77.8 % potassium by mass, 50 .. 785 degC: Foust 1972. The
/// conductivity was measured at 150 .. 680 degC and is extrapolated outside.
/// Cost: one exp, one cbrt, six divisions.
struct nak78 {
  static constexpr expansion_rule expansion_at = expansion_rule::film;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K, const T&) const {
    const T t = T(temperature_K - 273.15);
    // g/cm3
    const T potassium = T(0.8415 + t * (-2.172e-4 + t * (-2.7e-8 + 4.77e-12 * t)));
    const T potassium_slope = T(-2.172e-4 + t * (-2.0 * 2.7e-8 + 3.0 * 4.77e-12 * t));
    const T sodium_density = T(0.9453 - 2.2473e-4 * t);
    const T a = T(0.6733 / potassium);
    const T b = T((1.0 - 0.6733) / sodium_density);
    const T volume = T(a + b);  // over 1.003
    const T rho = T(1.0 / (1.003 * volume));
    const T beta =
        T((2.2473e-4 * (b / sodium_density) - potassium_slope * (a / potassium)) / volume);
    const T cp = T(4186.8 * (0.2320 + t * (-8.82e-5 + 8.2e-8 * t)));
    const T k = T(100.0 * (0.214 + t * (2.07e-4 - 2.2e-7 * t)));
    const T w = math::hand_over(temperature_K, 663.15, 683.15);
    const T log_A = T(-2.1541650878757723 - 0.3468709438421116 * w);  // log 0.116, log 0.082
    const T mu = T(1e-3 * math::cbrt(rho) *
                   math::exp(T(log_A + (688.0 + 291.0 * w) * (rho / temperature_K))));
    return {T(1000.0 * rho), cp, k, mu, beta};
  }
  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    return detail::within_limits<detail::nak_limits>(temperature_K, pressure_Pa);
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::nak_info; }
};

/// Liquid lead, 600.6 .. 1300 K: OECD/NEA handbook, 2015 edition. Cost: one exp, two divisions.
struct lead {
  static constexpr expansion_rule expansion_at = expansion_rule::film;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K, const T&) const {
    const T& t = temperature_K;
    const T inverse = T(1.0 / t);
    const T rho = T(11441.0 - 1.2795 * t);
    return {rho, T(176.2 + t * (-4.923e-2 + 1.544e-5 * t) - 1.524e6 * (inverse * inverse)),
            T(9.2 + 0.011 * t), T(4.55e-4 * math::exp(T(1069.0 * inverse))), T(1.2795 / rho)};
  }
  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    return detail::check_metal<lead, detail::lead_limits>(temperature_K, pressure_Pa);
  }
  /// Pa
  template <class T>
  CONVELOPE_FUNCTION static constexpr T saturation_pressure(const T& temperature_K) {
    return T(5.76e9 * math::exp(T(-22131.0 / temperature_K)));
  }
  /// N/m
  template <class T>
  CONVELOPE_FUNCTION static constexpr T surface_tension(const T& temperature_K) {
    return T(0.5259 - 1.13e-4 * temperature_K);
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::lead_info; }
};

/// Lead with 55.5 % bismuth by mass, the eutectic, 398 .. 1100 K: as lead.
struct lead_bismuth {
  static constexpr expansion_rule expansion_at = expansion_rule::film;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K, const T&) const {
    const T& t = temperature_K;
    const T inverse = T(1.0 / t);
    const T rho = T(11065.0 - 1.293 * t);
    return {rho, T(164.8 + t * (-3.94e-2 + 1.25e-5 * t) - 4.56e5 * (inverse * inverse)),
            T(3.284 + t * (1.617e-2 - 2.305e-6 * t)), T(4.94e-4 * math::exp(T(754.1 * inverse))),
            T(1.293 / rho)};
  }
  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    return detail::check_metal<lead_bismuth, detail::lead_bismuth_limits>(temperature_K,
                                                                          pressure_Pa);
  }
  /// Pa
  template <class T>
  CONVELOPE_FUNCTION static constexpr T saturation_pressure(const T& temperature_K) {
    return T(1.22e10 * math::exp(T(-22552.0 / temperature_K)));
  }
  /// N/m
  template <class T>
  CONVELOPE_FUNCTION static constexpr T surface_tension(const T& temperature_K) {
    return T(0.4485 - 7.99e-5 * temperature_K);
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::lead_bismuth_info; }
};

/// Liquid mercury, 273 .. 600 K. Cost: one exp, two divisions.
struct mercury {
  static constexpr expansion_rule expansion_at = expansion_rule::film;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K, const T&) const {
    const T t = T(temperature_K - 273.15);
    const T x = T(temperature_K - 400.0);
    const T volume = T(0.073554 + t * (1.3245e-5 + 1.22823e-9 * t));  // cm3/g
    const T rho = T(1000.0 / volume);
    const T beta = T((1.3245e-5 + 2.45646e-9 * t) * (1e-3 * rho));
    const T viscous = detail::held_between(temperature_K, 100.0, 1e4);
    return {rho, T(136.52032 + x * (-0.020392468 + 7.7051702e-5 * x)),
            T(9.8048148 + x * (0.012005191 - 6.4247798e-6 * x)),
            math::exp(T(-7.488439597 + 284.4270981 / (viscous - 15.5))), beta};
  }
  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    return detail::within_limits<detail::mercury_limits>(temperature_K, pressure_Pa);
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::mercury_info; }
};

}  // namespace v0
}  // namespace convelope

#endif
