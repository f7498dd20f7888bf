#ifndef CONVELOPE_FLUIDS_DETAIL_IAPWS_SATURATION_HPP
#define CONVELOPE_FLUIDS_DETAIL_IAPWS_SATURATION_HPP

#include "convelope/scalar.hpp"

// IAPWS SR1-86(1992), after Wagner and Pruss, J. Phys. Chem. Ref. Data 22 (1993) 783-787: explicit
// equations of the saturation line, 273.16 .. 647.096 K.

namespace convelope {
inline namespace v0 {
namespace detail::sr1_86 {

inline constexpr double critical_temperature = 647.096;
inline constexpr double critical_pressure = 22.064e6;
inline constexpr double critical_density = 322.0;

template <class T>
CONVELOPE_FUNCTION constexpr T distance(const T& temperature_K) {
  return T(1.0 - temperature_K * (1.0 / critical_temperature));
}

/// ln(p/p_c), equation 1.
template <class T>
CONVELOPE_FUNCTION constexpr T log_pressure(const T& temperature_K) {
  const T t = distance(temperature_K);
  const T root = math::sqrt(t);
  const T t2 = T(t * t);
  const T sum =
      T(-7.85951783 + 1.84408259 * root +
        t2 * (-11.7866497 + 22.6807411 * root - 15.9618719 * t + 1.80122502 * root * (t2 * t2)));
  return T(critical_temperature / temperature_K * t * sum);
}
template <class T>
CONVELOPE_FUNCTION constexpr T pressure(const T& temperature_K) {
  return T(critical_pressure * math::exp(log_pressure(temperature_K)));
}
template <class T>
CONVELOPE_FUNCTION constexpr T pressure_slope(const T& temperature_K) {
  const T t = distance(temperature_K);
  const T root = math::sqrt(t);
  const T t2 = T(t * t);
  const T log_p = log_pressure(temperature_K);
  const T sum = T(-7.85951783 + 1.5 * 1.84408259 * root - 3.0 * 11.7866497 * t2 +
                  3.5 * 22.6807411 * t2 * root - 4.0 * 15.9618719 * t2 * t +
                  7.5 * 1.80122502 * root * (t2 * t2 * t2));
  return T(-critical_pressure * math::exp(log_p) / temperature_K * (log_p + sum));
}

/// kg/m3, equation 2.
template <class T>
CONVELOPE_FUNCTION constexpr T liquid_density(const T& temperature_K) {
  const T t = distance(temperature_K);
  const T c = math::cbrt(t);
  const T c2 = T(c * c);
  const T t2 = T(t * t);
  const T t4 = T(t2 * t2);
  const T t5 = T(t4 * t);
  const T t9 = T(t5 * t4);
  const T t22 = T(t9 * t9 * t4);
  return T(critical_density *
           (1.0 + 1.99274064 * c + 1.09965342 * c2 - 0.510839303 * t * c2 - 1.75493479 * t5 * c -
            45.5170352 * t5 * t9 * c - 6.74694450e5 * t5 * t9 * t22 * c2));
}

/// kg/m3, equation 3.
template <class T>
CONVELOPE_FUNCTION constexpr T vapour_density(const T& temperature_K) {
  const T t = distance(temperature_K);
  const T root = math::sqrt(t);
  const T c = math::cbrt(t);
  const T s = math::sqrt(c);  // t^(1/6)
  const T t2 = T(t * t);
  const T t3 = T(t2 * t);
  const T t6 = T(t3 * t3);
  return T(critical_density *
           math::exp(T(c * (-2.03150240 - 2.68302940 * c - 5.38626492 * t) - 17.2991605 * t3 -
                       44.7586581 * t6 * s - 63.9201063 * t6 * t3 * t2 * root * c)));
}

/// J/kg, equation 4.
template <class T>
CONVELOPE_FUNCTION constexpr T alpha(const T& temperature_K) {
  const T x = T(temperature_K * (1.0 / critical_temperature));
  const T r = T(critical_temperature / temperature_K);
  const T root = math::sqrt(x);
  const T x2 = T(x * x);
  const T x4 = T(x2 * x2);
  const T x5 = T(x4 * x);
  const T x9 = T(x5 * x4);
  const T x27 = T(x9 * x9 * x9);
  const T r2 = T(r * r);
  const T r4 = T(r2 * r2);
  const T r8 = T(r4 * r4);
  return T(1e3 * (-1135.905627715 - 5.65134998e-8 * (r8 * r8 * r2 * r) + 2690.66631 * x +
                  127.287297 * x4 * root - 135.003439 * x5 + 0.981825814 * x27 * x27 * root));
}

/// J/kg, equations 6 and 7.
template <class T>
CONVELOPE_FUNCTION constexpr T liquid_enthalpy(const T& temperature_K) {
  return T(alpha(temperature_K) +
           temperature_K * pressure_slope(temperature_K) / liquid_density(temperature_K));
}
template <class T>
CONVELOPE_FUNCTION constexpr T vapour_enthalpy(const T& temperature_K) {
  return T(alpha(temperature_K) +
           temperature_K * pressure_slope(temperature_K) / vapour_density(temperature_K));
}
template <class T>
CONVELOPE_FUNCTION constexpr T latent_heat(const T& temperature_K) {
  return T(temperature_K * pressure_slope(temperature_K) *
           (1.0 / vapour_density(temperature_K) - 1.0 / liquid_density(temperature_K)));
}

/// N/m, IAPWS R1-76(2014).
template <class T>
CONVELOPE_FUNCTION constexpr T surface_tension(const T& temperature_K) {
  const T t = distance(temperature_K);
  return T(235.8e-3 * math::exp(T(1.256 * math::log(t))) * (1.0 - 0.625 * t));
}

}  // namespace detail::sr1_86
}  // namespace v0
}  // namespace convelope

#endif
