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

// Function objects, so that argument-dependent lookup can't prefer a slower or ambiguous overload.
namespace math {
namespace detail {
struct sqrt_function {
  template <class T>
  CONVELOPE_FUNCTION constexpr T operator()(const T& x) const {
    return scalar_adaptor<T>::sqrt(x);
  }
};
struct cbrt_function {
  template <class T>
  CONVELOPE_FUNCTION constexpr T operator()(const T& x) const {
    return scalar_adaptor<T>::cbrt(x);
  }
};
struct exp_function {
  template <class T>
  CONVELOPE_FUNCTION constexpr T operator()(const T& x) const {
    return scalar_adaptor<T>::exp(x);
  }
};
struct log_function {
  template <class T>
  CONVELOPE_FUNCTION constexpr T operator()(const T& x) const {
    return scalar_adaptor<T>::log(x);
  }
};
struct pow_function {
  template <class T>
  CONVELOPE_FUNCTION constexpr T operator()(const T& x, const T& y) const {
    return scalar_adaptor<T>::pow(x, y);
  }
};
struct select_function {
  template <class Mask, class T>
  CONVELOPE_FUNCTION constexpr T operator()(const Mask& m, const T& yes, const T& no) const {
    return scalar_adaptor<T>::select(m, yes, no);
  }
};
struct smaller_function {
  template <class T>
  CONVELOPE_FUNCTION constexpr T operator()(const T& a, const T& b) const {
    return scalar_adaptor<T>::select(b < a, b, a);
  }
};
struct larger_function {
  template <class T>
  CONVELOPE_FUNCTION constexpr T operator()(const T& a, const T& b) const {
    return scalar_adaptor<T>::select(a < b, b, a);
  }
};
struct square_function {
  template <class T>
  CONVELOPE_FUNCTION constexpr T operator()(const T& x) const {
    return T(x * x);
  }
};
}  // namespace detail

inline constexpr detail::sqrt_function sqrt{};
inline constexpr detail::cbrt_function cbrt{};
inline constexpr detail::exp_function exp{};
inline constexpr detail::log_function log{};
inline constexpr detail::pow_function pow{};
inline constexpr detail::select_function select{};
inline constexpr detail::smaller_function smaller{};
inline constexpr detail::larger_function larger{};
inline constexpr detail::square_function square{};
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
