#ifndef CONVELOPE_SCALAR_DUAL_HPP
#define CONVELOPE_SCALAR_DUAL_HPP

#include "convelope/scalar/elementary.hpp"

namespace convelope {
inline namespace v0 {

template <class T, int Size = 1>
class dual;

namespace detail {
template <class S>
constexpr bool is_dual = false;
template <class T, int Size>
constexpr bool is_dual<dual<T, Size>> = true;

// A number that has no derivative where a dual<T, N> is expected.
template <class S, class T>
concept constant_beside =
    std::is_same_v<S, T> || std::is_arithmetic_v<S> ||
    (!is_dual<S> && std::is_constructible_v<T, S> && !std::is_constructible_v<S, T>);

// A slope that the compiler knows to be 0, of a number that does not vary with the variable: its
// products can be left out, which IEEE 754 does not let a compiler do by itself.
template <class T>
CONVELOPE_FUNCTION constexpr bool no_slope([[maybe_unused]] const T& slope) {
#if defined(__GNUC__) && !defined(__CUDACC__)
  if constexpr (std::is_same_v<T, double>)
    return __builtin_constant_p(slope == 0.0) && slope == 0.0;
#endif
  return false;
}

template <class T, class S>
CONVELOPE_FUNCTION constexpr decltype(auto) as(const S& s) {
  if constexpr (std::is_same_v<S, T>) {
    return (s);
  } else if constexpr (std::is_arithmetic_v<S>) {
    return scalar_adaptor<T>::constant(static_cast<double>(s));
  } else {
    return T(s);
  }
}
}  // namespace detail

/// A value and N first derivatives, carried forward (forward-mode differentiation).
/// Nestable: dual<dual<double>> gives second derivatives. Comparisons look at the value.
/// dual<T, 0> carries none; float formulas run on it so that literals stay single precision.
template <class T, int Size>
class dual {
 public:
  using value_type = T;
  static constexpr int size = Size;

  T value;
  T slope[static_cast<std::size_t>(Size + (Size == 0))];  // no array is empty

  dual() = default;
  CONVELOPE_FUNCTION constexpr dual(const T& v) : value(v), slope{} {  // NOLINT: literals convert
    clear();
  }
  template <class S>
    requires(!std::is_same_v<S, T> && detail::constant_beside<S, T>)
  CONVELOPE_FUNCTION constexpr dual(S v) : dual(T(detail::as<T>(v))) {}  // NOLINT

  /// The variable itself: derivative 1 in direction k, 0 in the others.
  CONVELOPE_FUNCTION static constexpr dual variable(const T& v, int k = 0) {
    dual x(v);
    if constexpr (Size > 0) x.slope[k] = scalar_adaptor<T>::constant(1.0);
    return x;
  }

  CONVELOPE_FUNCTION friend constexpr dual operator+(const dual& a, const dual& b) {
    return map(a, b, T(a.value + b.value), [](const T& x, const T& y) {
      return detail::no_slope(x) ? y : detail::no_slope(y) ? x : T(x + y);
    });
  }
  CONVELOPE_FUNCTION friend constexpr dual operator-(const dual& a, const dual& b) {
    return map(a, b, T(a.value - b.value),
               [](const T& x, const T& y) { return detail::no_slope(y) ? x : T(x - y); });
  }
  CONVELOPE_FUNCTION friend constexpr dual operator*(const dual& a, const dual& b) {
    return map(a, b, T(a.value * b.value), [&](const T& x, const T& y) {
      return detail::no_slope(y)   ? T(x * b.value)
             : detail::no_slope(x) ? T(a.value * y)
                                   : T(x * b.value + a.value * y);
    });
  }
  CONVELOPE_FUNCTION friend constexpr dual operator/(const dual& a, const dual& b) {
    const T r = T(detail::as<T>(1.0) / b.value);
    const T q = T(a.value * r);
    return map(a, b, q, [&](const T& x, const T& y) { return T((x - q * y) * r); });
  }
  CONVELOPE_FUNCTION friend constexpr dual operator-(const dual& a) {
    return a.chain(T(-a.value), [](const T& x) { return T(-x); });
  }

  // Constants have no slope: these save the products with zero. By value, so that device code may
  // use static constants.
  template <detail::constant_beside<T> S>
  CONVELOPE_FUNCTION friend constexpr dual operator+(const dual& a, S b) {
    dual r = a;
    r.value = T(a.value + detail::as<T>(b));
    return r;
  }
  template <detail::constant_beside<T> S>
  CONVELOPE_FUNCTION friend constexpr dual operator+(S a, const dual& b) {
    return b + a;
  }
  template <detail::constant_beside<T> S>
  CONVELOPE_FUNCTION friend constexpr dual operator-(const dual& a, S b) {
    dual r = a;
    r.value = T(a.value - detail::as<T>(b));
    return r;
  }
  template <detail::constant_beside<T> S>
  CONVELOPE_FUNCTION friend constexpr dual operator-(S a, const dual& b) {
    return b.chain(T(detail::as<T>(a) - b.value), [](const T& x) { return T(-x); });
  }
  template <detail::constant_beside<T> S>
  CONVELOPE_FUNCTION friend constexpr dual operator*(const dual& a, S b) {
    const T& c = detail::as<T>(b);
    return a.chain(T(a.value * c), [&](const T& x) { return detail::no_slope(x) ? x : T(x * c); });
  }
  template <detail::constant_beside<T> S>
  CONVELOPE_FUNCTION friend constexpr dual operator*(S a, const dual& b) {
    return b * a;
  }
  template <detail::constant_beside<T> S>
  CONVELOPE_FUNCTION friend constexpr dual operator/(const dual& a, S b) {
    return a * T(detail::as<T>(1.0) / detail::as<T>(b));
  }
  template <detail::constant_beside<T> S>
  CONVELOPE_FUNCTION friend constexpr dual operator/(S a, const dual& b) {
    const T r = T(detail::as<T>(1.0) / b.value);
    const T q = T(detail::as<T>(a) * r);
    const T k = T(-q * r);
    return b.chain(q, [&](const T& x) { return T(k * x); });
  }
  CONVELOPE_FUNCTION constexpr dual& operator+=(const dual& b) { return *this = *this + b; }
  CONVELOPE_FUNCTION constexpr dual& operator-=(const dual& b) { return *this = *this - b; }
  CONVELOPE_FUNCTION constexpr dual& operator*=(const dual& b) { return *this = *this * b; }
  CONVELOPE_FUNCTION constexpr dual& operator/=(const dual& b) { return *this = *this / b; }

  CONVELOPE_FUNCTION friend constexpr auto operator<(const dual& a, const dual& b) {
    return a.value < b.value;
  }
  CONVELOPE_FUNCTION friend constexpr auto operator>(const dual& a, const dual& b) {
    return a.value > b.value;
  }
  CONVELOPE_FUNCTION friend constexpr auto operator<=(const dual& a, const dual& b) {
    return a.value <= b.value;
  }
  CONVELOPE_FUNCTION friend constexpr auto operator>=(const dual& a, const dual& b) {
    return a.value >= b.value;
  }

  /// f(x) with the given value, each derivative passed through `rule`.
  template <class Rule>
  CONVELOPE_FUNCTION constexpr dual chain(const T& v, Rule rule) const {
    dual r(v);
    for (int i = 0; i < Size; ++i) r.slope[i] = rule(slope[i]);
    return r;
  }

 private:
  CONVELOPE_FUNCTION constexpr void clear() {
    for (T& s : slope) s = scalar_adaptor<T>::constant(0.0);
  }
  template <class Rule>
  CONVELOPE_FUNCTION static constexpr dual map(const dual& a, const dual& b, const T& v,
                                               Rule rule) {
    dual r(v);
    for (int i = 0; i < Size; ++i) r.slope[i] = rule(a.slope[i], b.slope[i]);
    return r;
  }
};

template <class T, int Size>
struct scalar_adaptor<dual<T, Size>> {
  using D = dual<T, Size>;
  using plain = plain_t<T>;
  using working = D;
  using bits = bits_t<T>;
  static constexpr int lanes = scalar_adaptor<T>::lanes;

  CONVELOPE_FUNCTION static constexpr decltype(auto) value(const D& x) {
    return scalar_adaptor<T>::value(x.value);
  }
  CONVELOPE_FUNCTION static D sqrt(const D& x) {
    const T v = scalar_adaptor<T>::sqrt(x.value);
    // 1/v, which powers of the root share
    return scaled(x, v, [&] { return T(detail::as<T>(0.5) * T(detail::as<T>(1.0) / v)); });
  }
  CONVELOPE_FUNCTION static D cbrt(const D& x) {
    const T v = scalar_adaptor<T>::cbrt(x.value);
    return scaled(x, v, [&] { return T(math::detail::ratio<T>(1, 3) / (v * v)); });
  }
  CONVELOPE_FUNCTION static D exp(const D& x) {
    const T v = scalar_adaptor<T>::exp(x.value);
    return scaled(x, v, [&] { return v; });
  }
  CONVELOPE_FUNCTION static D log(const D& x) {
    return scaled(x, scalar_adaptor<T>::log(x.value),
                  [&] { return T(detail::as<T>(1.0) / x.value); });
  }
  CONVELOPE_FUNCTION static D pow(const D& x, const D& y) { return exp(D(y * log(x))); }
  CONVELOPE_FUNCTION static constexpr D constant(double c) {
    return D(scalar_adaptor<T>::constant(c));
  }
  template <int P, int Q>
    requires(Size > 0)
  CONVELOPE_FUNCTION static D power(const D& x) {
    if constexpr (Q == 1 && P >= 1) {  // no division: right at x = 0 too
      return scaled(x, math::power<P>(x.value),
                    [&] { return T(math::power<P - 1>(x.value) * detail::as<T>(double(P))); });
    } else if constexpr (requires {
                           scalar_adaptor<T>::template power_and_quotient<P, Q>(x.value);
                         }) {
      const auto both = scalar_adaptor<T>::template power_and_quotient<P, Q>(x.value);
      return scaled(x, both.power, [&] { return T(both.per_x * math::detail::ratio<T>(P, Q)); });
    } else {
      const T v = math::power<P, Q>(x.value);
      return scaled(x, v, [&] { return T(v / x.value * math::detail::ratio<T>(P, Q)); });
    }
  }
  template <class Mask>
  CONVELOPE_FUNCTION static constexpr D select(const Mask& m, const D& yes, const D& no) {
    D r(scalar_adaptor<T>::select(m, yes.value, no.value));
    for (int i = 0; i < Size; ++i) {
      r.slope[i] = scalar_adaptor<T>::select(m, yes.slope[i], no.slope[i]);
    }
    return r;
  }
  template <class Mask>
  CONVELOPE_FUNCTION static constexpr bits bits_where(const Mask& m, std::uint64_t word) {
    return scalar_adaptor<T>::bits_where(m, word);
  }
  CONVELOPE_FUNCTION static constexpr bits bits_where_not_finite(const D& x, std::uint64_t word) {
    return scalar_adaptor<T>::bits_where_not_finite(x.value, word);
  }

 private:
  template <class Slope>
  CONVELOPE_FUNCTION static constexpr D scaled(const D& x, const T& v, Slope slope_at) {
    if constexpr (Size == 0) {
      return D(v);
    } else {
      const T k = slope_at();
      return x.chain(v, [&](const T& s) { return T(k * s); });
    }
  }
};

// Single precision runs as dual<float, 0>: the literals of a formula are doubles, and this keeps
// every product in float.
template <>
struct scalar_adaptor<float> {
  using plain = float;
  using working = dual<float, 0>;
  using bits = std::uint64_t;
  static constexpr int lanes = 1;
  CONVELOPE_FUNCTION static constexpr const float& value(const float& x) { return x; }
  CONVELOPE_FUNCTION static constexpr float constant(double c) { return static_cast<float>(c); }
  CONVELOPE_FUNCTION static float sqrt(float x) { return std::sqrt(x); }
  CONVELOPE_FUNCTION static float cbrt(float x) { return std::cbrt(x); }
  CONVELOPE_FUNCTION static float exp(float x) { return std::exp(x); }
  CONVELOPE_FUNCTION static float log(float x) { return std::log(x); }
  CONVELOPE_FUNCTION static float pow(float x, float y) { return std::pow(x, y); }
  CONVELOPE_FUNCTION static constexpr float select(bool m, float yes, float no) {
    return m ? yes : no;
  }
  CONVELOPE_FUNCTION static constexpr bits bits_where(bool m, std::uint64_t word) {
    return m ? word : std::uint64_t{0};
  }
  CONVELOPE_FUNCTION static constexpr bits bits_where_not_finite(float x, std::uint64_t word) {
    constexpr std::uint32_t exponent = 0x7f800000U;
    return (std::bit_cast<std::uint32_t>(x) & exponent) == exponent ? word : std::uint64_t{0};
  }
};

/// The type a formula runs on for arguments of type T: T itself except for single precision.
template <class T>
using working_t = typename scalar_adaptor<T>::working;

namespace detail {
/// A formula's result back in the caller's type.
template <class T, class W>
CONVELOPE_FUNCTION constexpr T as_result(const W& y) {
  if constexpr (std::is_same_v<T, W>) {
    return y;
  } else {
    return y.value;
  }
}
}  // namespace detail

}  // namespace v0
}  // namespace convelope

#endif
