#ifndef CONVELOPE_SCALAR_ELEMENTARY_HPP
#define CONVELOPE_SCALAR_ELEMENTARY_HPP

#include <bit>
#include <cstdint>

#include "convelope/scalar/power.hpp"

#if defined(__SSE2__) && !defined(__CUDACC__)
#include <emmintrin.h>
#endif

// exp, log, cbrt and rational powers without a branch or a table, on double and on packs of it,
// whose own library would go lane by lane. All they need is arithmetic, comparison and bits of the
// whole pack at a time.

namespace convelope {
inline namespace v0 {
namespace detail {

/// Error below 2 units in the last place (cbrt: 1) for all double inputs, subnormal, infinite, NaN;
/// exp is 0 below e^-708.
template <class V>
struct elementary {
  using bits = typename scalar_adaptor<V>::bits;
  static constexpr double largest = 1.7976931348623157e308;
  static constexpr double least_normal = 2.2250738585072014e-308;
  static constexpr std::uint64_t magnitude_mask = 0x7fffffffffffffffULL;

  template <class Mask>
  CONVELOPE_FUNCTION static V select(const Mask& m, const V& yes, const V& no) {
    return scalar_adaptor<V>::select(m, yes, no);
  }
  CONVELOPE_FUNCTION static constexpr V number(double c) { return scalar_adaptor<V>::constant(c); }
  CONVELOPE_FUNCTION static bits bits_of(const V& x) { return std::bit_cast<bits>(x); }
  CONVELOPE_FUNCTION static V from_bits(const bits& b) { return std::bit_cast<V>(b); }
  CONVELOPE_FUNCTION static bits word(std::uint64_t w) { return bits(w); }
  CONVELOPE_FUNCTION static V special(std::uint64_t w) { return from_bits(bits(w)); }

  static constexpr std::uint64_t infinity = 0x7ff0000000000000ULL;
  static constexpr std::uint64_t not_a_number = 0x7ff8000000000000ULL;

  /// x = n log 2 + r with |r| <= log(2)/2; e^r by a polynomial of degree 11 (own minimax fit,
  /// 1.4e-17), times 2^n through the exponent bits.
  CONVELOPE_FUNCTION static V exp(const V& given) {
    const V low = number(-708.0);
    const V high = number(709.78);
    const V x = select(given < low, low, select(given > high, high, given));
    // Adding 1.5 2^52 leaves the nearest integer in the low bits.
    const bits whole = bits_of(V(x * 1.4426950408889634 + 6755399441055744.0));
    const V n = signed_low_bits(whole);
    const V r = V((x - n * 6.93147180369123816490e-01) - n * 1.90821492927058770002e-10);
    const V r2 = V(r * r);
    const V r4 = V(r2 * r2);
    const V a = V((0.5000000000000001031 + r * 0.1666666666666666746) +
                  r2 * (0.04166666666662382053 + r * 0.008333333333330038197));
    const V b = V((0.001388888891736708056 + r * 0.0001984126986317155603) +
                  r2 * (0.0000248015210578682052 + r * 2.755726827690569619e-6));
    const V c = V(2.762020159103154879e-7 + r * 2.5100472505694996e-8);
    const V p = V(1.0 + (r + r2 * (a + r4 * (b + r4 * c))));
    const V y = from_bits(bits(bits_of(p) + (whole << 52)));
    return select(given < low, number(0.0), select(given > high, special(infinity), y));
  }

  /// x = 2^n m with m in [1/sqrt 2, sqrt 2]; log m = 2 atanh(s), s = (m - 1)/(m + 1), by a
  /// polynomial in s^2 (own minimax fit, 2e-18).
  CONVELOPE_FUNCTION static V log(const V& given) {
    const auto tiny = given < number(least_normal);
    const V x = select(tiny, V(given * 18014398509481984.0), given);  // 2^54
    const bits u = bits(bits_of(x) + word(one - root_half));
    const V n =
        V(exponent_of(u) - select(tiny, number(zero_exponent + 54.0), number(zero_exponent)));
    const V f = V(mantissa_of(u) - 1.0);
    const V s = V(f / (f + 2.0));
    const V z = V(s * s);
    const V z2 = V(z * z);
    const V even =
        V(0.6666666666666669708 +
          z2 * (0.2857142862625383761 + z2 * (0.181828924325368712 + z2 * 0.1461780715341732496)));
    const V odd =
        V(0.3999999999989889051 + z2 * (0.2222221108937949621 + z2 * 0.1533161172205500789));
    const V rest = V(z * (even + z * odd));
    const V y =
        V(n * 6.93147180369123816490e-01 + (f - (s * (f - rest) - n * 1.90821492927058770002e-10)));
    const V finite = select(
        given > number(0.0), y,
        select(given < number(0.0), special(not_a_number), special(infinity | ~magnitude_mask)));
    return select_ordinary(given, finite);
  }

  CONVELOPE_FUNCTION static V cbrt(const V& given) {
    const bits sign = bits(bits_of(given) & word(~magnitude_mask));
    const V positive = from_bits(bits(bits_of(given) & word(magnitude_mask)));
    const auto tiny = positive < number(least_normal);
    const V x = select(tiny, V(positive * 18014398509481984.0), positive);  // 2^54
    const V z = inverse_root<3>(x);
    const V y0 = V(x * z * z);
    const V quarter = V(0.25 * x - 0.25 * y0 * y0 * y0);  // a quarter, lest y0^3 overflows
    const V y = V(y0 + quarter * (z * z) * (4.0 / 3.0));
    const V scaled = select(tiny, V(y * 3.814697265625e-06), y);  // 2^-18
    return from_bits(bits(bits_of(select_ordinary(positive, scaled)) | sign));
  }

  /// y = x^(P/Q) and y/x, which the derivative needs.
  struct power_pair {
    V power;
    V per_x;
  };

  /// x^(P/Q), P/Q in lowest terms. 0 counts as in arithmetic; NaN for x < 0; subnormal numbers
  /// count as x^P. Error: see math::power.
  template <int P, int Q>
  CONVELOPE_FUNCTION static constexpr V power(const V& x) {
    return both<P, Q>(x).power;
  }

  /// Both, without a division where the root has it.
  template <int P, int Q>
  CONVELOPE_FUNCTION static constexpr power_pair both(const V& x) {
    using math::detail::whole_power;
    if constexpr (Q == 1 && P > 0) {
      return {whole_power<P>(x), whole_power<P - 1>(x)};
    } else if constexpr (P > Q) {
      const power_pair part = both<P % Q, Q>(x);
      return {V(whole_power<P / Q>(x) * part.power), V(whole_power<P / Q>(x) * part.per_x)};
    } else if constexpr (Q == 1 || Q == 2 || Q == 4 || Q == 8 || Q == 16) {
      const V root = square_root<Q>(x);
      if constexpr (P > 0) {
        return with_quotient(x, whole_power<P>(root));
      } else {
        const V inverse = V(number(1.0) / root);
        const V y = whole_power<-P>(inverse);
        return {y, V(y * whole_power<Q>(inverse))};
      }
    } else if constexpr (Q == 6 || Q == 10 || Q == 12) {
      return with_quotient(x, both<P, Q / 2>(scalar_adaptor<V>::sqrt(x)).power);
    } else if constexpr (Q == 3 || Q == 5) {
      const V z = inverse_root<Q>(x);
      const V per_x = whole_power<Q - P>(z);
      return {ordinary<P>(x, P > 0 ? V(x * per_x) : whole_power<(P < 0 ? -P : 0)>(z)),
              select(x >= number(least_normal), per_x, special(infinity))};
    } else {
      return with_quotient(x, ordinary<P>(x, exp2(V(log2(x) * (static_cast<double>(P) / Q)))));
    }
  }

 private:
  // y/x by 1/x, which other powers of the same x share.
  CONVELOPE_FUNCTION static constexpr power_pair with_quotient(const V& x, const V& y) {
    return {y, V(y * V(number(1.0) / x))};
  }
  template <int Root>
  CONVELOPE_FUNCTION static constexpr V square_root(const V& x) {
    if constexpr (Root == 1) {
      return x;
    } else {
      return square_root<Root / 2>(scalar_adaptor<V>::sqrt(x));
    }
  }

  // y = x^(P/Q) where x is a positive normal number; else x^P for its 0, infinity or NaN.
  template <int P>
  CONVELOPE_FUNCTION static V ordinary(const V& x, const V& y) {
    const V beyond = P > 0 ? x : select(x <= number(largest), special(infinity), number(0.0));
    return select(x >= number(least_normal) && x <= number(largest), y,
                  select(x >= number(0.0), beyond, special(not_a_number)));
  }

  /// x^(-1/Q), x a normal number: from the bits (3.5 % off), twice improved by a step
  /// of fourth or fifth order without a division.
  template <int Q>
  CONVELOPE_FUNCTION static V inverse_root(const V& x) {
    static_assert(Q == 3 || Q == 5);
    constexpr std::uint64_t guess = Q == 3 ? 0x553ee6c0ULL : 0x4cb897c9ULL;
    constexpr std::uint64_t per_Q = (0xffffffffULL + Q) / Q;  // 2^32/Q
    // (1 - e)^(-1/Q) = 1 + c1 e + c2 e^2 + c3 e^3 + ...
    constexpr double c1 = 1.0 / Q;
    constexpr double c2 = c1 * (1.0 + Q) / (2.0 * Q);
    constexpr double c3 = c2 * (1.0 + 2.0 * Q) / (3.0 * Q);
    [[maybe_unused]] constexpr double c4 = c3 * (1.0 + 3.0 * Q) / (4.0 * Q);
    const bits part = bits(((bits_of(x) >> 32) * word(per_Q)) >> 32);
    V z = from_bits(bits((word(guess) - part) << 32));
    for (int i = 0; i < 2; ++i) {
      const V e = V(1.0 - x * z * math::detail::whole_power<Q - 1>(z));
      if constexpr (Q == 3) {
        z = V(z + z * e * (c1 + e * (c2 + e * c3)));
      } else {
        z = V(z + z * e * ((c1 + e * c2) + e * e * (c3 + e * c4)));
      }
    }
    return z;
  }

  /// log2 x, x a positive normal number, and 2^y, |y| < 1022: own minimax fits as in log and exp.
  CONVELOPE_FUNCTION static V log2(const V& x) {
    const bits u = bits(bits_of(x) + word(one - root_half));
    const V n = V(exponent_of(u) - zero_exponent);
    const V f = V(mantissa_of(u) - 1.0);
    const V s = V(f / (f + 2.0));
    const V z = V(s * s);
    const V z2 = V(z * z);
    const V even =
        V(2.885390081777926811 +
          z2 * (0.5770780163454586103 + z2 * (0.3205985334227465268 + z2 * 0.2209109142370261992)));
    const V odd =
        V(0.9617966939259898295 +
          z2 * (0.412198585854862955 + z2 * (0.2623344335728467802 + z2 * 0.2136816390969667428)));
    return V(n + s * (even + z * odd));
  }
  CONVELOPE_FUNCTION static V exp2(const V& y) {
    const bits whole = bits_of(V(y + 6755399441055744.0));
    const V r = V(y - signed_low_bits(whole));
    const V r2 = V(r * r);
    const V r4 = V(r2 * r2);
    const V a = V((0.6931471805599453094 + r * 0.2402265069591009827) +
                  r2 * (0.05550410866482159437 + r * 0.009618129107606853946));
    const V b = V((0.001333355814641691688 + r * 0.0001540353044179413737) +
                  r2 * (0.00001525273382986708058 + r * 1.321544255252229148e-6));
    const V c =
        V((1.017806242697692342e-7 + r * 7.072593027878996569e-9) + r2 * 4.45496437126929679e-10);
    const V p = V(1.0 + r * (a + r4 * (b + r4 * c)));
    return from_bits(bits(bits_of(p) + (whole << 52)));
  }

  static constexpr std::uint64_t root_half = 0x3fe6a09e667f3bcdULL;  // sqrt(1/2)
  static constexpr std::uint64_t one = 0x3ff0000000000000ULL;
  static constexpr double zero_exponent = 4503599627371519.0;  // 2^52 + 1023
  // From u = bits of x + (one - root_half): x = 2^n m, m in [sqrt(1/2), sqrt 2);
  // 2^52 + 1023 + n as a double, and m.
  CONVELOPE_FUNCTION static V exponent_of(const bits& u) {
    return from_bits(bits((u >> 52) | word(0x4330000000000000ULL)));
  }
  CONVELOPE_FUNCTION static V mantissa_of(const bits& u) {
    return from_bits(bits((u & word(0x000fffffffffffffULL)) + word(root_half)));
  }

  // y, but x itself where x is infinite or NaN.
  CONVELOPE_FUNCTION static V select_ordinary(const V& x, const V& y) {
    return select(x <= number(largest), y, x);
  }
  // The integer that x + 1.5 2^52 left in the low bits, as a double. Mask and shift change nothing
  // (the sign bit is 0): they keep -ffast-math from cancelling the sum.
  CONVELOPE_FUNCTION static V signed_low_bits(const bits& b) {
    const bits same = bits((b & word(0x000fffffffffffffULL)) | word(0x4330000000000000ULL));
    const V n = V(from_bits(same) - 6755399441055744.0);
    return from_bits(bits(bits_of(n) ^ (b >> 63)));
  }
};

}  // namespace detail

/// The standard library's sqrt, exp and log are fast one at a time; its cbrt and pow are not.
template <>
struct scalar_adaptor<double> : basic_adaptor<double> {
#if defined(__SSE2__) && !defined(__CUDACC__)
  // std::sqrt sets errno for negative numbers: a branch to a call, around which every register is
  // saved.
  static double sqrt(double x) {
    if (__builtin_constant_p(x)) return std::sqrt(x);  // computed by the compiler
    const __m128d v = _mm_set_sd(x);
    return _mm_cvtsd_f64(_mm_sqrt_sd(v, v));
  }
#endif
  CONVELOPE_FUNCTION static double cbrt(double x) { return detail::elementary<double>::cbrt(x); }
  template <int P, int Q>
  CONVELOPE_FUNCTION static constexpr double power(double x) {
    return detail::elementary<double>::power<P, Q>(x);
  }
  template <int P, int Q>
  CONVELOPE_FUNCTION static constexpr auto power_and_quotient(double x) {
    return detail::elementary<double>::both<P, Q>(x);
  }
};

}  // namespace v0
}  // namespace convelope

#endif
