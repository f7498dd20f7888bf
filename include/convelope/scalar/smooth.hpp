#ifndef CONVELOPE_SCALAR_SMOOTH_HPP
#define CONVELOPE_SCALAR_SMOOTH_HPP

#include "convelope/scalar/dual.hpp"

namespace convelope {
inline namespace v0 {
namespace math {

/// |x| rounded off near zero: sqrt(x^2 + r^2). Finite value and slope at x = 0.
template <class T>
CONVELOPE_FUNCTION constexpr T smooth_magnitude(const T& x, double r) {
  return math::sqrt(T(x * x + scalar_adaptor<T>::constant(r * r)));
}
template <class T, int Size>  // the same with fewer products
  requires(Size > 0)
CONVELOPE_FUNCTION constexpr dual<T, Size> smooth_magnitude(const dual<T, Size>& x, double r) {
  const T v = smooth_magnitude(x.value, r);
  const T k = T(x.value * T(scalar_adaptor<T>::constant(1.0) / v));
  return x.chain(v, [&](const T& s) { return T(k * s); });
}

/// -1 .. 1 with a finite slope at zero: x / sqrt(x^2 + r^2).
template <class T>
CONVELOPE_FUNCTION constexpr T smooth_sign(const T& x, double r) {
  return T(x / smooth_magnitude(x, r));
}

/// 0 below `from`, 1 above `to`, between them the quintic with two continuous derivatives.
template <class T>
CONVELOPE_FUNCTION constexpr T hand_over(const T& x, double from, double to) {
  const T s = T((x - from) * (1.0 / (to - from)));
  const T t = math::smaller(math::larger(s, T(0.0)), T(1.0));
  return T(t * t * t * (10.0 + t * (6.0 * t - 15.0)));
}

/// a where w = 0, b where w = 1.
template <class T>
CONVELOPE_FUNCTION constexpr T weighted(const T& a, const T& b, const T& w) {
  return T(a + w * (b - a));
}

/// (a^n + b^n)^(1/n), both >= 0: the joining rule of Churchill and Usagi 1972,
/// AIChE J. 18, 1121-1128.
template <int Exponent, class T>
CONVELOPE_FUNCTION constexpr T joined(const T& a, const T& b) {
  return power<1, Exponent>(T(power<Exponent>(a) + power<Exponent>(b)));
}

}  // namespace math
}  // namespace v0
}  // namespace convelope

#endif
