#ifndef CONVELOPE_FLUIDS_DETAIL_HYDROGEN_HPP
#define CONVELOPE_FLUIDS_DETAIL_HYDROGEN_HPP

#include "convelope/fluids/detail/dilute_gas.hpp"

namespace convelope {
inline namespace v0 {

// Conductivity of hydrogen: Assael et al., J. Phys. Chem. Ref. Data 40 (2011) 033101, without the
// critical enhancement; kg/m3, W/(m K).

namespace detail::hydrogen {

template <class T>
CONVELOPE_FUNCTION constexpr T normal_conductivity(const T& rho, const T& temperature_K) {
  const T t = T(temperature_K * (1.0 / 33.145));
  const T r = T(rho * (1.0 / 31.262));
  const T above =
      T((((((-1.13900e-6 * t + 1.90592e-4) * t + 3.16939e-3) * t + 3.26394e-1) * t - 1.45080) * t +
         4.58820) *
            t -
        3.40976e-1);
  const T below = T(((t + 4.57151) * t - 2.21878e1) * t + 1.38497e2);
  const T c1 = T(1.83370e-3 * t + 3.63081e-2);
  const T c2 = T(-8.86716e-3 * t - 2.07629e-2);
  const T c3 = T(1.58260e-2 * t + 3.14810e-2);
  const T c4 = T(-1.06283e-2 * t - 1.43097e-2);
  const T c5 = T(2.80673e-3 * t + 1.74980e-3);
  return T(above / below + ((((c5 * r + c4) * r + c3) * r + c2) * r + c1) * r);
}

template <class T>
CONVELOPE_FUNCTION constexpr T para_conductivity(const T& rho, const T& temperature_K) {
  const T t = T(temperature_K * (1.0 / 32.938));
  const T r = T(rho * (1.0 / 31.323));
  const T above =
      T(((((((1.43979e-2 * t - 5.19659e-1) * t + 1.08260e1) * t - 6.57810e1) * t + 2.46016e2) * t -
          3.31004e2) *
             t +
         3.10212e2) *
            t -
        1.24500);
  const T below = T(
      (((((t - 3.57365e1) * t + 7.28639e2) * t - 4.81812e3) * t + 1.58379e4) * t - 1.93922e4) * t +
      1.42304e4);
  const T c1 = T(-1.21727e-3 * t + 2.65975e-2);
  const T c2 = T(3.66663e-3 * t - 1.33826e-3);
  const T c3 = T(3.88715e-3 * t + 1.30219e-2);
  const T c4 = T(-9.21055e-3 * t - 5.67678e-3);
  const T c5 = T(4.00723e-3 * t - 9.23380e-5);
  return T(above / below + ((((c5 * r + c4) * r + c3) * r + c2) * r + c1) * r);
}

}  // namespace detail::hydrogen

}  // namespace v0
}  // namespace convelope

#endif
