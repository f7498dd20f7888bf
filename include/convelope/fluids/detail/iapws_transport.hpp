#ifndef CONVELOPE_FLUIDS_DETAIL_IAPWS_TRANSPORT_HPP
#define CONVELOPE_FLUIDS_DETAIL_IAPWS_TRANSPORT_HPP

#include "convelope/scalar.hpp"

namespace convelope {
inline namespace v0 {
namespace detail {

template <class T>
struct transport_values {
  T viscosity;     // Pa s
  T conductivity;  // W/(m K)
};

/// Viscosity of water by IAPWS R12-08 and conductivity by IAPWS R15-11, both without the
/// critical enhancement; inverse = 1/T. One square root, two exp.
template <class T>
CONVELOPE_FUNCTION constexpr transport_values<T> water_transport(const T& temperature_K,
                                                                 const T& inverse,
                                                                 const T& density) {
  const T y = T(647.096 * inverse);
  const T z = T(y - 1.0);
  const T r = T(density * (1.0 / 322.0));
  const T q = T(r - 1.0);
  const T q2 = T(q * q);
  const T q4 = T(q2 * q2);

  // R12-08 Table 2: H_ij (1/T - 1)^i (rho - 1)^j, row by row
  const T h0 =
      T((-3.25372e-2 * q4) + (1.61913e-1 * q - 2.81378e-1) * q2 + 2.22531e-1 * q + 5.20094e-1);
  const T h1 = T((2.57399e-1 * q - 9.06851e-1) * q2 + 9.99115e-1 * q + 8.50895e-2);
  const T h2 = T(-7.72479e-1 * q2 + 1.88797e0 * q - 1.08374e0);
  const T h3 =
      T((-4.35673e-3 * q2 + 6.98452e-2) * q4 - 4.89837e-1 * q2 + 1.26613e0 * q - 2.89555e-1);
  const T h4 = T(8.72102e-3 * q * q4 - 2.57040e-1 * q2);
  const T h5 = T(-5.93264e-4 * q2 * q4 + 1.20573e-1 * q);
  const T viscous = T(((((h5 * z + h4) * z + h3) * z + h2) * z + h1) * z + h0);

  // R15-11 Table 2: L_ij, row by row
  const T l0 = T((0.00609859258 * q - 0.0504123634) * q4 + (0.102997357 * q + 0.111443906) * q2 -
                 0.646013523 * q + 1.60397357);
  const T l1 = T((-0.00719201245 * q + 0.0832827019) * q4 + (-0.463045512 * q + 1.53616167) * q2 -
                 2.78843778 * q + 2.33771842);
  const T l2 = T((-0.0205938816 * q + 0.275418278) * q4 + (-1.40944978 * q + 3.55777244) * q2 -
                 4.54580785 * q + 2.19650529);
  const T l3 = T((0.0716373224 * q - 0.621178141) * q2 + 1.60812989 * q - 1.21051378);
  const T l4 = T((0.012913842 * q - 0.19268305) * q4 + (1.1168348 * q - 3.18369245) * q2 +
                 4.57586331 * q - 2.7203370);
  const T conductive = T((((l4 * z + l3) * z + l2) * z + l1) * z + l0);

  // dilute gas, both denominators in one division
  const T of_mu = T(((-0.241605 * y + 0.6366564) * y + 2.20462) * y + 1.67752);
  const T of_k =
      T((((4.096266e-4 * y - 3.454586e-3) * y + 6.770357e-3) * y + 1.323095e-2) * y + 2.443221e-3);
  const T root = math::sqrt(T(temperature_K * (1.0 / 647.096)));
  const T shared = T(root / (of_mu * of_k));
  return {T(1e-4 * shared * of_k * math::exp(T(r * viscous))),
          T(1e-3 * shared * of_mu * math::exp(T(r * conductive)))};
}

}  // namespace detail
}  // namespace v0
}  // namespace convelope

#endif
