#ifndef CONVELOPE_FLUIDS_DETAIL_IF97_SATURATION_HPP
#define CONVELOPE_FLUIDS_DETAIL_IF97_SATURATION_HPP

#include "convelope/scalar.hpp"

namespace convelope {
inline namespace v0 {
namespace detail::if97 {

/// Saturation pressure of water in Pa, 273.15 .. 647.096 K: IAPWS R7-97(2012), region 4, eq. 30.
template <class T>
CONVELOPE_FUNCTION constexpr T saturation_pressure(const T& temperature_K) {
  const T x = T(temperature_K - 0.23855557567849 / (temperature_K - 0.65017534844798e3));
  const T a = T((x + 0.11670521452767e4) * x - 0.72421316703206e6);
  const T b = T((-0.17073846940092e2 * x + 0.12020824702470e5) * x - 0.32325550322333e7);
  const T c = T((0.14915108613530e2 * x - 0.48232657361591e4) * x + 0.40511340542057e6);
  const T y = T(2.0 * c / (math::sqrt(T(b * b - 4.0 * a * c)) - b));
  const T y2 = T(y * y);
  return T(1e6 * y2 * y2);
}

/// Saturation temperature in K, 611.213 Pa .. 22.064 MPa: eq. 31.
template <class T>
CONVELOPE_FUNCTION constexpr T saturation_temperature(const T& pressure_Pa) {
  const T b = math::sqrt(math::sqrt(T(1e-6 * pressure_Pa)));
  const T e = T((b - 0.17073846940092e2) * b + 0.14915108613530e2);
  const T f = T((0.11670521452767e4 * b + 0.12020824702470e5) * b - 0.48232657361591e4);
  const T g = T((-0.72421316703206e6 * b - 0.32325550322333e7) * b + 0.40511340542057e6);
  const T d = T(-2.0 * g / (f + math::sqrt(T(f * f - 4.0 * e * g))));
  const T x = T(0.65017534844798e3 + d);
  return T(0.5 * (x - math::sqrt(T(x * x + 4.0 * (0.23855557567849 - 0.65017534844798e3 * d)))));
}

}  // namespace detail::if97
}  // namespace v0
}  // namespace convelope

#endif
