#ifndef CONVELOPE_FLUIDS_DETAIL_IF97_REGION2_HPP
#define CONVELOPE_FLUIDS_DETAIL_IF97_REGION2_HPP

#include "convelope/fluids/detail/if97_gibbs.hpp"

// IAPWS R7-97(2012), region 2: the Gibbs function of steam, an ideal-gas part and a residual,
// g/(R T) = ln(pi) + sum n0 tau^j0 + sum n pi^i (tau - 0.5)^j, pi = p/1 MPa, tau = 540 K/T.
// Also the line that bounds it against region 3.

namespace convelope {
inline namespace v0 {
namespace detail::if97 {

// Table 11 of the release, in its order.
inline constexpr term region2_terms[] = {
    {1, 0, -0.17731742473213e-2},   {1, 1, -0.17834862292358e-1},
    {1, 2, -0.45996013696365e-1},   {1, 3, -0.57581259083432e-1},
    {1, 6, -0.50325278727930e-1},   {2, 1, -0.33032641670203e-4},
    {2, 2, -0.18948987516315e-3},   {2, 4, -0.39392777243355e-2},
    {2, 7, -0.43797295650573e-1},   {2, 36, -0.26674547914087e-4},
    {3, 0, 0.20481737692309e-7},    {3, 1, 0.43870667284435e-6},
    {3, 3, -0.32277677238570e-4},   {3, 6, -0.15033924542148e-2},
    {3, 35, -0.40668253562649e-1},  {4, 1, -0.78847309559367e-9},
    {4, 2, 0.12790717852285e-7},    {4, 3, 0.48225372718507e-6},
    {5, 7, 0.22922076337661e-5},    {6, 3, -0.16714766451061e-10},
    {6, 16, -0.21171472321355e-2},  {6, 35, -0.23895741934104e2},
    {7, 0, -0.59059564324270e-17},  {7, 11, -0.12621808899101e-5},
    {7, 25, -0.38946842435739e-1},  {8, 8, 0.11256211360459e-10},
    {8, 36, -0.82311340897998e1},   {9, 13, 0.19809712802088e-7},
    {10, 4, 0.10406965210174e-18},  {10, 10, -0.10234747095929e-12},
    {10, 14, -0.10018179379511e-8}, {16, 29, -0.80882908646985e-10},
    {16, 50, 0.10693031879409e0},   {18, 57, -0.33662250574171e0},
    {20, 20, 0.89185845355421e-24}, {20, 35, 0.30629316876232e-12},
    {20, 48, -0.42002467698208e-5}, {21, 21, -0.59056029685639e-25},
    {22, 53, 0.37826947613457e-5},  {23, 39, -0.12768608934681e-14},
    {24, 26, 0.73087610595061e-28}, {24, 40, 0.55414715350778e-16},
    {24, 58, -0.94369707241210e-6}};

/// The weighted coefficients, numbered from 1 as in the release.
template <class Derivative>
inline constexpr auto region2_coefficients = [] {
  std::array<double, 44> k{};
  for (std::size_t m = 1; m < k.size(); ++m) {
    const term& t = region2_terms[m - 1];
    k[m] = Derivative::weight(t.i, t.j) * t.n;
  }
  return k;
}();

/// The powers of b = tau - 0.5 that all sums share. None is negative: b is 0 at 1080 K.
template <class T>
struct region2_powers {
  T pi, b;
  T b2, b3, b4, b5, b7, b8, b10, b11, b13, b17, b18, b22, b23, b26, b32, b33, b36, b37, b45, b47,
      b50, b54, b55;
  T pi2, pi6;

  CONVELOPE_FUNCTION constexpr region2_powers(const T& reduced_pressure, const T& tau)
      : pi(reduced_pressure),
        b(T(tau - 0.5)),
        b2(T(b * b)),
        b3(T(b2 * b)),
        b4(T(b2 * b2)),
        b5(T(b4 * b)),
        b7(T(b4 * b3)),
        b8(T(b4 * b4)),
        b10(T(b8 * b2)),
        b11(T(b8 * b3)),
        b13(T(b8 * b5)),
        b17(T(b10 * b7)),
        b18(T(b10 * b8)),
        b22(T(b11 * b11)),
        b23(T(b18 * b5)),
        b26(T(b13 * b13)),
        b32(T(b22 * b10)),
        b33(T(b22 * b11)),
        b36(T(b18 * b18)),
        b37(T(b26 * b11)),
        b45(T(b23 * b22)),
        b47(T(b37 * b10)),
        b50(T(b32 * b18)),
        b54(T(b36 * b18)),
        b55(T(b33 * b22)),
        pi2(T(pi * pi)),
        pi6(T(pi2 * pi2 * pi2)) {}
};

/// sum of weight n pi^(i-1) b^(j-3) over the terms with j >= 3.
template <class Derivative, class T>
CONVELOPE_FUNCTION constexpr T region2_steep(const region2_powers<T>& w) {
  constexpr const auto& k = region2_coefficients<Derivative>;
  const T of24 = T(k[41] * w.b23 + k[42] * w.b37 + k[43] * w.b55);
  const T of23 = T(of24 * w.pi + k[40] * w.b36);
  const T of22 = T(of23 * w.pi + k[39] * w.b50);
  const T of21 = T(of22 * w.pi + k[38] * w.b18);
  const T of20 = T(of21 * w.pi + k[35] * w.b17 + k[36] * w.b32 + k[37] * w.b45);
  const T of18 = T(of20 * w.pi2 + k[34] * w.b54);
  const T of16 = T(of18 * w.pi2 + k[32] * w.b26 + k[33] * w.b47);
  const T of10 = T(of16 * w.pi6 + k[29] * w.b + k[30] * w.b7 + k[31] * w.b11);
  const T of9 = T(of10 * w.pi + k[28] * w.b10);
  const T of8 = T(of9 * w.pi + k[26] * w.b5 + k[27] * w.b33);
  const T of7 = T(of8 * w.pi + k[24] * w.b8 + k[25] * w.b22);
  const T of6 = T(of7 * w.pi + k[20] + k[21] * w.b13 + k[22] * w.b32);
  const T of5 = T(of6 * w.pi + k[19] * w.b4);
  const T of4 = T(of5 * w.pi + k[18]);
  const T of3 = T(of4 * w.pi + k[13] + k[14] * w.b3 + k[15] * w.b32);
  const T of2 = T(of3 * w.pi + k[8] * w.b + k[9] * w.b4 + k[10] * w.b33);
  return T(of2 * w.pi + k[4] + k[5] * w.b3);
}

/// sum of weight n pi^(i-1) b^(j-2) over the terms with j >= 2, and so on to b^j.
template <class Derivative, class T>
CONVELOPE_FUNCTION constexpr T region2_from2(const region2_powers<T>& w) {
  constexpr const auto& k = region2_coefficients<Derivative>;
  return T(region2_steep<Derivative>(w) * w.b + (k[17] * w.pi2 + k[7]) * w.pi + k[3]);
}
template <class Derivative, class T>
CONVELOPE_FUNCTION constexpr T region2_from1(const region2_powers<T>& w) {
  constexpr const auto& k = region2_coefficients<Derivative>;
  return T(region2_from2<Derivative>(w) * w.b + ((k[16] * w.pi + k[12]) * w.pi + k[6]) * w.pi +
           k[2]);
}
template <class Derivative, class T>
CONVELOPE_FUNCTION constexpr T region2_sum(const region2_powers<T>& w) {
  constexpr const auto& k = region2_coefficients<Derivative>;
  return T(region2_from1<Derivative>(w) * w.b + (k[23] * (w.pi2 * w.pi2) + k[11]) * w.pi2 + k[1]);
}

// Table 10: the ideal-gas part.
template <class T>
CONVELOPE_FUNCTION constexpr T region2_ideal(const T& tau, const T& c) {
  return T(-0.96927686500217e1 + 0.10086655968018e2 * tau +
           (0.21268463753307e-1 * tau - 0.28408632460772e0) * tau * tau +
           ((((-0.56087911283020e-2 * c + 0.71452738081455e-1) * c - 0.40710498223928e0) * c +
             0.14240819171444e1) *
                c -
            0.43839511319450e1) *
               c);
}
/// tau times its slope, and tau^2 times its curvature; c = 1/tau.
template <class T>
CONVELOPE_FUNCTION constexpr T region2_ideal_tau(const T& tau, const T& c) {
  return T(0.10086655968018e2 * tau +
           (3.0 * 0.21268463753307e-1 * tau - 2.0 * 0.28408632460772e0) * tau * tau +
           ((((5.0 * 0.56087911283020e-2 * c - 4.0 * 0.71452738081455e-1) * c +
              3.0 * 0.40710498223928e0) *
                 c -
             2.0 * 0.14240819171444e1) *
                c +
            0.43839511319450e1) *
               c);
}
template <class T>
CONVELOPE_FUNCTION constexpr T region2_ideal_tau_tau(const T& tau, const T& c) {
  return T((6.0 * 0.21268463753307e-1 * tau - 2.0 * 0.28408632460772e0) * tau * tau +
           ((((-30.0 * 0.56087911283020e-2 * c + 20.0 * 0.71452738081455e-1) * c -
              12.0 * 0.40710498223928e0) *
                 c +
             6.0 * 0.14240819171444e1) *
                c -
            2.0 * 0.43839511319450e1) *
               c);
}

template <class T>
struct steam_state {
  T density;
  T specific_heat;
  T expansion;
};

/// inverse = 1/T.
template <class T>
CONVELOPE_FUNCTION constexpr steam_state<T> region2(const T& temperature_K, const T& inverse,
                                                    const T& pressure_Pa) {
  const T tau = T(540.0 * inverse);
  const T c = T(temperature_K * (1.0 / 540.0));
  const region2_powers<T> w(T(1e-6 * pressure_Pa), tau);
  const T part = T(1.0 / (1.0 + w.pi * region2_sum<by_pi>(w)));  // 1/(pi gamma_pi)
  const T curvature =
      T(region2_ideal_tau_tau(tau, c) + tau * tau * w.pi * region2_from2<by_tau_tau>(w));
  return {T((1.0 / gas_constant) * pressure_Pa * inverse * part), T(-gas_constant * curvature),
          T((1.0 - tau * w.pi * region2_from1<by_pi_tau>(w) * part) * inverse)};
}

template <class T>
CONVELOPE_FUNCTION constexpr state<T> region2_state(const T& temperature_K, const T& pressure_Pa) {
  const T tau = T(540.0 / temperature_K);
  const T c = T(temperature_K * (1.0 / 540.0));
  const region2_powers<T> w(T(1e-6 * pressure_Pa), tau);
  const T pi = w.pi;
  return state_of_gibbs<T>(
      {T(math::log(pi) + region2_ideal(tau, c) + pi * region2_sum<plain_sum>(w)),
       T(1.0 + pi * region2_sum<by_pi>(w)),
       T(region2_ideal_tau(tau, c) + tau * pi * region2_from1<by_tau>(w)),
       T(pi * region2_sum<by_pi_pi>(w) - 1.0), T(tau * pi * region2_from1<by_pi_tau>(w)),
       T(region2_ideal_tau_tau(tau, c) + tau * tau * pi * region2_from2<by_tau_tau>(w))},
      temperature_K, pressure_Pa);
}

/// The line between regions 2 and 3, 623.15 .. 863.15 K: equations 5 and 6.
template <class T>
CONVELOPE_FUNCTION constexpr T b23_pressure(const T& temperature_K) {
  return T(1e6 * ((0.10192970039326e-2 * temperature_K - 0.11671859879975e1) * temperature_K +
                  0.34805185628969e3));
}
template <class T>
CONVELOPE_FUNCTION constexpr T b23_temperature(const T& pressure_Pa) {
  return T(0.57254459862746e3 +
           math::sqrt(T((1e-6 * pressure_Pa - 0.13918839778870e2) * (1.0 / 0.10192970039326e-2))));
}

}  // namespace detail::if97
}  // namespace v0
}  // namespace convelope

#endif
