#ifndef CONVELOPE_FLUIDS_DETAIL_HUMID_AIR_HPP
#define CONVELOPE_FLUIDS_DETAIL_HUMID_AIR_HPP

#include "convelope/scalar.hpp"

namespace convelope {
inline namespace v0 {
namespace detail {

/// Saturation pressure over liquid water in Pa, 273.15 .. 473.15 K: Hyland, Wexler, ASHRAE Trans.
/// 89 (1983) 500-519, the equation of the ASHRAE Handbook.
template <class T>
CONVELOPE_FUNCTION constexpr T hyland_wexler(const T& temperature_K) {
  const T& t = temperature_K;
  return math::exp(T(-5.8002206e3 / t + 6.5459673 * math::log(t) +
                     ((-1.4452093e-8 * t + 4.1764768e-5) * t - 4.8640239e-2) * t + 1.3914993));
}

template <class T>
struct vapour_values {
  T specific_heat;
  T conductivity;
  T viscosity;
};

/// Water vapour as an ideal, dilute gas, also below its boiling point: polynomials in
/// x = (T - 600 K)/(T + 600 K) fitted to IAPWS-IF97 region 2 (cp, within 4.2e-5), R15-11
/// (k, 5.4e-6) and R12-08 (mu, 5.4e-5) at zero density, 273.15 .. 1073.15 K.
template <class T>
CONVELOPE_FUNCTION constexpr vapour_values<T> dilute_vapour(const T& x, const T& root) {
  const T cp =
      T((((((-7.739600865e+03 * x - 1.833576093e+03) * x + 2.046374540e+03) * x + 9.917949721e+02) *
              x +
          1.041899667e+03) *
             x +
         7.578209295e+02) *
            x +
        2.016323373e+03);
  const T k =
      T((((((8.883381777e-04 * x + 7.131807139e-04) * x + 1.941378915e-03) * x + 2.089196902e-03) *
              x +
          3.617005764e-03) *
             x +
         3.492775959e-03) *
            x +
        1.889220543e-03);
  const T mu =
      T((((((2.518943733e-06 * x - 6.714158725e-07) * x + 2.893002841e-08) * x - 2.666468303e-07) *
              x +
          4.997495547e-07) *
             x +
         1.148842434e-06) *
            x +
        8.749668676e-07);
  return {cp, T(root * k), T(root * mu)};
}

}  // namespace detail
}  // namespace v0
}  // namespace convelope

#endif
