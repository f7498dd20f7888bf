#ifndef CONVELOPE_SCALAR_POWER_HPP
#define CONVELOPE_SCALAR_POWER_HPP

#include "convelope/scalar/functions.hpp"

namespace convelope {
inline namespace v0 {
namespace math {

namespace detail {
constexpr int greatest_divisor(int a, int b) { return b == 0 ? a : greatest_divisor(b, a % b); }

// How often q can be divided by f.
constexpr int factor_count(int q, int f) { return q % f == 0 ? 1 + factor_count(q / f, f) : 0; }
constexpr int power_of(int base, int n) { return n == 0 ? 1 : base * power_of(base, n - 1); }

/// x^n by squaring.
template <int Exponent, class T>
CONVELOPE_FUNCTION constexpr T whole_power(const T& x) {
  static_assert(Exponent >= 0);
  if constexpr (Exponent == 0) {
    return scalar_adaptor<T>::constant(1.0);
  } else if constexpr (Exponent == 1) {
    return x;
  } else if constexpr (Exponent % 2 == 0) {
    const T half = whole_power<Exponent / 2>(x);
    return T(half * half);
  } else {
    return T(whole_power<Exponent - 1>(x) * x);
  }
}

template <int Squares, int Cubes, class T>
CONVELOPE_FUNCTION constexpr T root(const T& x) {
  if constexpr (Squares > 0) {
    return root<Squares - 1, Cubes>(math::sqrt(x));
  } else if constexpr (Cubes > 0) {
    return root<Squares, Cubes - 1>(math::cbrt(x));
  } else {
    return x;
  }
}

// Divided in T, so that a number wider than double gets all its digits; compilers fold it.
template <class T>
CONVELOPE_FUNCTION constexpr T ratio(int p, int q) {
  return T(scalar_adaptor<T>::constant(p) / scalar_adaptor<T>::constant(q));
}

// P/Q in lowest terms, both positive.
template <int P, int Q, class T>
CONVELOPE_FUNCTION constexpr T positive_power(const T& x) {
  constexpr int twos = factor_count(Q, 2);
  constexpr int threes = factor_count(Q, 3);
  constexpr bool by_roots =
      power_of(2, twos) * power_of(3, threes) == Q && twos <= 4 && threes <= 1;
  if constexpr (Q == 1) {
    return whole_power<P>(x);
  } else if constexpr (P > Q && by_roots) {
    return T(whole_power<P / Q>(x) * positive_power<P % Q, Q>(x));
  } else if constexpr (by_roots) {
    return whole_power<P>(root<twos, threes>(x));
  } else {
    return math::exp(T(math::log(x) * ratio<T>(P, Q)));
  }
}
}  // namespace detail

/// x^(P/Q) for x >= 0, chosen at compile time: roots and products where the denominator allows (2,
/// 3, 4, 5, 6, 8, 10, 12, 16), otherwise one exp/log pair. Error in units in the last place, P/Q in
/// lowest terms: below 2 |P| + 8 by roots, below 2 (1 + |log2 x P/Q|) by the exp/log pair.
template <int P, int Q = 1, class T>
CONVELOPE_FUNCTION constexpr T power(const T& x) {
  static_assert(Q > 0, "write the sign of the exponent in its numerator");
  constexpr int divisor = detail::greatest_divisor(P < 0 ? -P : P, Q);
  if constexpr (P == 0) {
    return scalar_adaptor<T>::constant(1.0);
  } else if constexpr (requires { scalar_adaptor<T>::template power<P, Q>(x); }) {
    return scalar_adaptor<T>::template power<P / divisor, Q / divisor>(x);
  } else if constexpr (P < 0) {
    return T(scalar_adaptor<T>::constant(1.0) /
             detail::positive_power<-P / divisor, Q / divisor>(x));
  } else {
    return detail::positive_power<P / divisor, Q / divisor>(x);
  }
}

}  // namespace math
}  // namespace v0
}  // namespace convelope

#endif
