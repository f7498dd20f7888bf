#ifndef CONVELOPE_FLUIDS_DETAIL_IF97_REGION1_HPP
#define CONVELOPE_FLUIDS_DETAIL_IF97_REGION1_HPP

#include <array>

#include "convelope/scalar.hpp"

// IAPWS R7-97(2012), region 1: the Gibbs function of liquid water,
// g/(R T) = gamma(pi, tau) = sum n (7.1 - pi)^i (tau - 1.222)^j, pi = p/16.53 MPa, tau = 1386 K/T.

namespace convelope {
inline namespace v0 {
namespace detail::if97 {

struct term {
  int i;
  int j;
  double n;
};

// Table 2 of the release, in its order.
inline constexpr term region1_terms[] = {
    {0, -2, 0.14632971213167e0},      {0, -1, -0.84548187169114e0},
    {0, 0, -0.37563603672040e1},      {0, 1, 0.33855169168385e1},
    {0, 2, -0.95791963387872e0},      {0, 3, 0.15772038513228e0},
    {0, 4, -0.16616417199501e-1},     {0, 5, 0.81214629983568e-3},
    {1, -9, 0.28319080123804e-3},     {1, -7, -0.60706301565874e-3},
    {1, -1, -0.18990068218419e-1},    {1, 0, -0.32529748770505e-1},
    {1, 1, -0.21841717175414e-1},     {1, 3, -0.52838357969930e-4},
    {2, -3, -0.47184321073267e-3},    {2, 0, -0.30001780793026e-3},
    {2, 1, 0.47661393906987e-4},      {2, 3, -0.44141845330846e-5},
    {2, 17, -0.72694996297594e-15},   {3, -4, -0.31679644845054e-4},
    {3, 0, -0.28270797985312e-5},     {3, 6, -0.85205128120103e-9},
    {4, -5, -0.22425281908000e-5},    {4, -2, -0.65171222895601e-6},
    {4, 10, -0.14341729937924e-12},   {5, -8, -0.40516996860117e-6},
    {8, -11, -0.12734301741641e-8},   {8, -6, -0.17424871230634e-9},
    {21, -29, -0.68762131295531e-18}, {23, -31, 0.14478307828521e-19},
    {29, -38, 0.26335781662795e-22},  {30, -39, -0.11947622640071e-22},
    {31, -40, 0.18228094581404e-23},  {32, -41, -0.93537087292458e-25}};

// A derivative of gamma weights each term by a product of its exponents.
struct by_pi {
  static constexpr double weight(int i, int) { return i; }
};
struct by_pi_tau {
  static constexpr double weight(int i, int j) { return i * j; }
};
struct by_tau_tau {
  static constexpr double weight(int, int j) { return j * (j - 1); }
};

/// The weighted coefficients, numbered from 1 as in the release.
template <class Derivative>
inline constexpr auto region1_coefficients = [] {
  std::array<double, 35> k{};
  for (std::size_t m = 1; m < k.size(); ++m) {
    const term& t = region1_terms[m - 1];
    k[m] = Derivative::weight(t.i, t.j) * t.n;
  }
  return k;
}();

/// The powers all sums share: a = 7.1 - pi, b = tau - 1.222, c = 1/b, d = a/b.
template <class T>
struct region1_powers {
  T a, b, c;
  T a3;
  T b2, b3, b6, b10, b17;
  T c2, c3, c4, c5, c6, c7, c8, c9, c11;
  T d, d2, d6c, high;

  CONVELOPE_FUNCTION constexpr region1_powers(const T& pi, const T& tau)
      : a(T(7.1 - pi)),
        b(T(tau - 1.222)),
        c(T(1.0 / b)),
        a3(T(a * a * a)),
        b2(T(b * b)),
        b3(T(b2 * b)),
        b6(T(b3 * b3)),
        b10(T(b6 * b3 * b)),
        b17(T(b10 * b6 * b)),
        c2(T(c * c)),
        c3(T(c2 * c)),
        c4(T(c2 * c2)),
        c5(T(c4 * c)),
        c6(T(c3 * c3)),
        c7(T(c4 * c3)),
        c8(T(c4 * c4)),
        c9(T(c8 * c)),
        c11(T(c8 * c3)),
        d(T(a * c)),
        d2(T(d * d)),
        d6c(T(d2 * d2 * d2 * c)),
        high(c9) {
    const T d4 = T(d2 * d2);
    const T d8 = T(d4 * d4);
    high = T(d8 * d8 * d4 * c9);  // a^20 b^-29
  }
};

/// sum of weight n a^(i-1) b^j over the terms with i >= 1.
template <class Derivative, class T>
CONVELOPE_FUNCTION constexpr T region1_sum(const region1_powers<T>& w) {
  constexpr auto k = region1_coefficients<Derivative>;
  const T of1 = T(k[9] * w.c9 + k[10] * w.c7 + k[11] * w.c + k[12] + k[13] * w.b + k[14] * w.b3);
  const T of2 = T(k[15] * w.c3 + k[16] + k[17] * w.b + k[18] * w.b3 + k[19] * w.b17);
  const T of3 = T(k[20] * w.c4 + k[21] + k[22] * w.b6);
  const T of4 = T(k[23] * w.c5 + k[24] * w.c2 + k[25] * w.b10);
  const T of5 = T(k[26] * w.c8);
  const T of8 = T(k[27] * w.c11 + k[28] * w.c6);
  const T to29 = T(((k[34] * w.d + k[33]) * w.d + k[32]) * w.d + k[31]);
  const T to21 = T((to29 * w.d6c + k[30]) * w.d2 + k[29]);
  return T((((of8 * w.a3 + of5) * w.a + of4) * w.a + of3) * w.a * w.a + of2 * w.a + of1 +
           to21 * w.high);
}

/// b^2 gamma_tautau.
template <class T>
CONVELOPE_FUNCTION constexpr T region1_tau_tau(const region1_powers<T>& w) {
  constexpr auto k = region1_coefficients<by_tau_tau>;
  const T of0 =
      T(k[1] * w.c2 + k[2] * w.c + k[5] * w.b2 + k[6] * w.b3 + (k[7] + k[8] * w.b) * (w.b2 * w.b2));
  return T(of0 + w.a * region1_sum<by_tau_tau>(w));
}

inline constexpr double gas_constant = 461.526;  // J/(kg K), of the release

template <class T>
struct liquid_state {
  T density;
  T specific_heat;
  T expansion;
};

/// inverse = 1/T.
template <class T>
CONVELOPE_FUNCTION constexpr liquid_state<T> region1(const T& inverse, const T& pressure_Pa) {
  const T tau = T(1386.0 * inverse);
  const region1_powers<T> w(T(pressure_Pa * (1.0 / 16.53e6)), tau);
  const T ratio = T(tau * w.c);
  const T pi_part = T(1.0 / region1_sum<by_pi>(w));  // -1/gamma_pi
  return {T(-16.53e6 / gas_constant * inverse * pi_part),
          T(-gas_constant * (ratio * ratio * region1_tau_tau(w))),
          T((1.0 - ratio * region1_sum<by_pi_tau>(w) * pi_part) * inverse)};
}

}  // namespace detail::if97
}  // namespace v0
}  // namespace convelope

#endif
