#ifndef CONVELOPE_SCALAR_FUNCTIONS_HPP
#define CONVELOPE_SCALAR_FUNCTIONS_HPP

#include "convelope/scalar/adaptor.hpp"

namespace convelope {
inline namespace v0 {

/// A number type formulas can run on: double, float, long double, dual, a SIMD pack, a
/// multiprecision number, or a host's own type. Integers are not: 1/3 would be 0.
template <class T>
concept scalar = !std::is_integral_v<T> && std::is_constructible_v<T, double> &&
                 requires(const T& a, const T& b) {
                   a + b;
                   a - b;
                   a* b;
                   a / b;
                   -a;
                   a < b;
                   scalar_adaptor<T>::sqrt(a);
                 };

// Call them qualified, or as members of a correlation's base: argument-dependent lookup could
// prefer a slower or ambiguous overload.
namespace math {
template <class T>
CONVELOPE_FUNCTION constexpr T sqrt(const T& x) {
  return scalar_adaptor<T>::sqrt(x);
}
template <class T>
CONVELOPE_FUNCTION constexpr T cbrt(const T& x) {
  return scalar_adaptor<T>::cbrt(x);
}
template <class T>
CONVELOPE_FUNCTION constexpr T exp(const T& x) {
  return scalar_adaptor<T>::exp(x);
}
template <class T>
CONVELOPE_FUNCTION constexpr T log(const T& x) {
  return scalar_adaptor<T>::log(x);
}
template <class T>
CONVELOPE_FUNCTION constexpr T pow(const T& x, const T& y) {
  return scalar_adaptor<T>::pow(x, y);
}
template <class Mask, class T>
CONVELOPE_FUNCTION constexpr T select(const Mask& m, const T& yes, const T& no) {
  return scalar_adaptor<T>::select(m, yes, no);
}
template <class T>
CONVELOPE_FUNCTION constexpr T smaller(const T& a, const T& b) {
  return scalar_adaptor<T>::select(b < a, b, a);
}
template <class T>
CONVELOPE_FUNCTION constexpr T larger(const T& a, const T& b) {
  return scalar_adaptor<T>::select(a < b, b, a);
}
template <class T>
CONVELOPE_FUNCTION constexpr T square(const T& x) {
  return T(x * x);
}
}  // namespace math

/// The number without its derivatives (a pack keeps its lanes).
template <class T>
CONVELOPE_FUNCTION constexpr plain_t<T> plain(const T& x) {
  return scalar_adaptor<T>::value(x);
}

namespace detail {
// double next to dual gives dual, double next to a pack gives the pack.
template <class... A>
struct common_scalar {
  using type = double;
};
template <class A>
  requires(!std::is_void_v<A>)
struct common_scalar<A> {
  using type = A;
};
template <class... Rest>  // void: an argument that is a choice, not a number
struct common_scalar<void, Rest...> : common_scalar<Rest...> {};
template <class A, class... Rest>
  requires(!std::is_void_v<A>)
struct common_scalar<A, void, Rest...> : common_scalar<A, Rest...> {};
template <class A, class B>
constexpr bool second_holds_first =
    std::is_floating_point_v<A> ? !std::is_floating_point_v<B> || (sizeof(A) < sizeof(B))
                                : !std::is_floating_point_v<B> && std::is_constructible_v<B, A> &&
                                      !std::is_constructible_v<A, B>;
template <class A, class B, class... Rest>
  requires(!std::is_void_v<A> && !std::is_void_v<B>)
struct common_scalar<A, B, Rest...> {
  using pair = std::conditional_t<second_holds_first<A, B>, B, A>;
  using type = typename common_scalar<pair, Rest...>::type;
};
}  // namespace detail

/// The scalar type that can hold all of A...
template <class... A>
using common_scalar_t = typename detail::common_scalar<A...>::type;

}  // namespace v0
}  // namespace convelope

#endif
