#ifndef CONVELOPE_SCALAR_POLYNOMIAL_HPP
#define CONVELOPE_SCALAR_POLYNOMIAL_HPP

#include "convelope/scalar/dual.hpp"

namespace convelope {
inline namespace v0 {
namespace math {
namespace detail {
template <class T>
CONVELOPE_FUNCTION constexpr T polynomial(const T&, double last) {
  return scalar_adaptor<T>::constant(last);
}
template <class T, class... C>
CONVELOPE_FUNCTION constexpr T polynomial(const T& x, double c, C... higher) {
  return T(scalar_adaptor<T>::constant(c) + x * polynomial(x, higher...));
}

/// A polynomial and its derivative.
template <class T>
struct with_derivative {
  T p;
  T d;
};
template <class T>
CONVELOPE_FUNCTION constexpr with_derivative<T> both(const T&, double last) {
  return {scalar_adaptor<T>::constant(last), scalar_adaptor<T>::constant(0.0)};
}
template <class T, class... C>
CONVELOPE_FUNCTION constexpr with_derivative<T> both(const T& x, double c, C... higher) {
  const with_derivative<T> h = both(x, higher...);
  if constexpr (sizeof...(C) == 1) {
    return {T(scalar_adaptor<T>::constant(c) + x * h.p), h.p};
  } else {
    return {T(scalar_adaptor<T>::constant(c) + x * h.p), T(h.p + x * h.d)};
  }
}

// One pass for the value and dp/dx, then once times the slope of x: half the products of carrying
// the slope through.
template <class T, int Size, class... C>
  requires(Size > 0 && sizeof...(C) > 0)
CONVELOPE_FUNCTION constexpr dual<T, Size> polynomial(const dual<T, Size>& x, double c,
                                                      C... higher) {
  const with_derivative<T> y = both(x.value, c, higher...);
  return x.chain(y.p, [&](const T& s) { return T(y.d * s); });
}
}  // namespace detail

/// c0 + c1 x + c2 x^2 + ..., by Horner's rule.
template <class T, class... C>
CONVELOPE_FUNCTION constexpr T polynomial(const T& x, C... c) {
  return detail::polynomial(x, c...);
}

}  // namespace math
}  // namespace v0
}  // namespace convelope

#endif
