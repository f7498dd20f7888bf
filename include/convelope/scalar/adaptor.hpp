#ifndef CONVELOPE_SCALAR_ADAPTOR_HPP
#define CONVELOPE_SCALAR_ADAPTOR_HPP

#include <bit>
#include <cmath>
#include <concepts>
#include <cstddef>
#include <cstdint>
#include <type_traits>

#include "convelope/mark.hpp"

namespace convelope {
inline namespace v0 {

/// For a type that behaves like a number: finds the elementary functions by ADL.
template <class T>
struct basic_adaptor {
  using plain = T;             // the number without its derivatives
  using working = T;           // the type formulas run on
  using bits = std::uint64_t;  // one verdict word per lane
  static constexpr int lanes = 1;

  CONVELOPE_FUNCTION static constexpr const plain& value(const T& x) { return x; }
  CONVELOPE_FUNCTION static constexpr T constant(double c) { return T(c); }
  CONVELOPE_FUNCTION static T sqrt(const T& x) {
    using std::sqrt;
    return sqrt(x);
  }
  CONVELOPE_FUNCTION static T cbrt(const T& x) {
    using std::cbrt;
    return cbrt(x);
  }
  CONVELOPE_FUNCTION static T exp(const T& x) {
    using std::exp;
    return exp(x);
  }
  CONVELOPE_FUNCTION static T log(const T& x) {
    using std::log;
    return log(x);
  }
  CONVELOPE_FUNCTION static T pow(const T& x, const T& y) {
    using std::pow;
    return pow(x, y);
  }
  template <class Mask>
  CONVELOPE_FUNCTION static constexpr T select(const Mask& m, const T& yes, const T& no) {
    return m ? yes : no;
  }
  /// `word` where the condition holds, else 0.
  CONVELOPE_FUNCTION static constexpr bits bits_where(bool m, std::uint64_t word) {
    return m ? word : std::uint64_t{0};
  }
  /// `word` where x is NaN or infinite as a double (a wider number beyond 1.8e308 counts). Looks at
  /// the exponent bits, so -ffast-math can't fold it: when all are set, one more carries into the
  /// sign bit.
  CONVELOPE_FUNCTION static constexpr bits bits_where_not_finite(const T& x, std::uint64_t word) {
    constexpr std::uint64_t exponent = 0x7ff0000000000000ULL;
    constexpr std::uint64_t one = 0x0010000000000000ULL;
    const auto raw = std::bit_cast<std::uint64_t>(static_cast<double>(x));
    const auto carried = static_cast<std::int64_t>((raw & exponent) + one);
    return static_cast<std::uint64_t>(carried >> 63) & word;
  }
};

/// What the library asks of a number type. A pack or an automatic-differentiation type that needs
/// more specialises this template (see scalar/dual.hpp, scalar/std_simd.hpp, scalar/xsimd.hpp).
template <class T>
struct scalar_adaptor : basic_adaptor<T> {};

template <class T>
using plain_t = typename scalar_adaptor<T>::plain;
template <class T>
using bits_t = typename scalar_adaptor<T>::bits;

}  // namespace v0
}  // namespace convelope

#endif
