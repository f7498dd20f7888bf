#ifndef CONVELOPE_BENCH_HAND_HPP
#define CONVELOPE_BENCH_HAND_HPP

#include "convelope/faces/widest.hpp"

// Air across a cylinder, written by hand for packs: the law of cylinder_in_crossflow and the
// polynomials of dry_air_fast, differentiated on paper through relative slopes. No verdict, no
// kinds, no other fluid or shape, no wall at the temperature of the stream.

namespace hand {

using convelope::math::power;

struct tube {
  double diameter;
  double velocity;
  double stream;
  double pressure;
};

template <class V>
struct with_slope {
  V value;
  V slope;
};

template <class V, std::size_t Count>
inline with_slope<V> horner(const V& x, const double (&c)[Count]) {
  V p(c[Count - 1]);
  V d(0.0);
  for (std::size_t i = Count - 1; i-- > 0;) {
    d = d * x + p;
    p = p * x + V(c[i]);
  }
  return {p, d};
}

/// q and dq/dT_wall.
template <class V>
inline with_slope<V> flux(const tube& t, const V& wall) {
  static constexpr double cp_c[] = {1.051207756e+03,  2.777177730e+02,  4.344173448e+02,
                                    -2.357082856e+02, -8.815870604e+02, 2.491843220e+02,
                                    9.622736931e+02};
  static constexpr double k_c[] = {1.877744676e-03, 1.011307562e-03, 1.504423947e-06,
                                   5.057781711e-04, 1.244534287e-04, 7.065317160e-04,
                                   6.391036853e-04};
  static constexpr double mu_c[] = {1.255748635e-06, 4.755282923e-07,  -1.621611925e-07,
                                    2.329811291e-07, -1.145031784e-08, 3.298852992e-07,
                                    2.782510173e-07};
  const V dT = wall - V(t.stream);
  const V T = V(0.5) * (wall + V(t.stream));
  const V per_T = V(1.0) / T;
  const V below = V(1.0) / (T + V(600.0));
  const V x = (T - V(600.0)) * below;
  const V dx = V(1200.0) * below * below;
  const V root = convelope::math::sqrt(T);
  const auto cp = horner(x, cp_c);
  const auto k0 = horner(x, k_c);
  const auto mu0 = horner(x, mu_c);
  const V k = root * k0.value;
  const V mu = root * mu0.value;
  const V rho = V(t.pressure / (8.31451 / 28.9586e-3)) * per_T;
  // Relative slopes with the film temperature.
  const V r_cp = cp.slope / cp.value * dx;
  const V r_k = k0.slope / k0.value * dx + V(0.5) * per_T;
  const V r_mu = mu0.slope / mu0.value * dx + V(0.5) * per_T;
  const V r_Pr = r_cp + r_mu - r_k;
  const V r_Re = -(per_T + r_mu);

  const V per_k = V(1.0) / k;
  const V per_mu = V(1.0) / mu;
  const V Pr = cp.value * mu * per_k;
  const V Re = V(t.velocity * t.diameter) * rho * per_mu;

  const V b1 = V(0.5428835233189813143) * power<-2, 3>(Pr);
  const V b = V(1.0) + b1;
  const V s1 = V(3.922783205509214561e-04) * power<5, 8>(Re);
  const V s = V(1.0) + s1;
  const V low = V(0.62) * power<1, 2>(Re) * power<1, 3>(Pr) * power<-1, 4>(b) * power<4, 5>(s);
  const V F = V(0.3) + low;
  const V dF = low * (V(0.5) * r_Re + r_Pr * (V(1.0 / 3.0) + V(1.0 / 6.0) * b1 / b) +
                      V(0.5) * s1 / s * r_Re);

  const V Ra = V(9.80665 / t.stream * t.diameter * t.diameter * t.diameter) * abs(dT) * rho * rho *
               cp.value * per_mu * per_k;
  const V B1 = V(0.7209732340347784737) * power<-9, 16>(Pr);
  const V B = V(1.0) + B1;
  const V n = V(0.387) * power<1, 6>(Ra) * power<-8, 27>(B);
  const V r_Ra = r_cp - r_mu - r_k - V(2.0) * per_T;
  // d/dT_wall: half the film's slope, and the wall's own dT.
  const V dn = n * (V(1.0 / 6.0) * (V(0.5) * r_Ra + V(1.0) / dT) +
                    V(0.5 * 8.0 / 27.0 * 9.0 / 16.0) * B1 / B * r_Pr);
  const V m = V(0.60) + n;
  const V N = m * m;
  const V dN = V(2.0) * m * dn;

  const V F3 = F * F * F;
  const V N3 = N * N * N;
  const V sum = F3 * F + N3 * N - V(0.3 * 0.3 * 0.3 * 0.3);
  const V Nu = power<1, 4>(sum);
  const V dNu = Nu / sum * (V(0.5) * F3 * dF + N3 * dN);
  const V per_D(1.0 / t.diameter);
  const V h = Nu * k * per_D;
  return {h * dT, h + dT * per_D * k * (dNu + V(0.5) * Nu * r_k)};
}

}  // namespace hand

#endif
