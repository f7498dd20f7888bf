#ifndef CONVELOPE_SCALAR_XSIMD_HPP
#define CONVELOPE_SCALAR_XSIMD_HPP

#include <xsimd/xsimd.hpp>

#include "convelope/scalar/dual.hpp"

// Lets every formula run on xsimd batches (double lanes). Optional: nothing else includes it.

#if defined(__clang__) && defined(__FAST_MATH__)
#error "xsimd 8.1 computes exp and log wrongly under clang -ffast-math: leave out one of the three"
#endif

namespace convelope {
inline namespace v0 {

template <class Arch>
struct scalar_adaptor<xsimd::batch<double, Arch>> {
  using pack = xsimd::batch<double, Arch>;
  using plain = pack;
  using working = pack;
  using bits = xsimd::batch<std::uint64_t, Arch>;
  static constexpr int lanes = static_cast<int>(pack::size);

  static const pack& value(const pack& x) { return x; }
  static pack constant(double c) { return pack(c); }
  static pack sqrt(const pack& x) { return xsimd::sqrt(x); }
  static pack cbrt(const pack& x) { return xsimd::cbrt(x); }
  static pack exp(const pack& x) { return xsimd::exp(x); }
  static pack log(const pack& x) { return xsimd::log(x); }
  static pack pow(const pack& x, const pack& y) { return xsimd::pow(x, y); }
  static pack select(const typename pack::batch_bool_type& m, const pack& yes, const pack& no) {
    return xsimd::select(m, yes, no);
  }
  static bits bits_where(const typename pack::batch_bool_type& m, std::uint64_t word) {
    return xsimd::bitwise_cast<bits>(
        xsimd::select(m, pack(std::bit_cast<double>(word)), pack(0.0)));
  }
  static bits bits_where_not_finite(const pack& x, std::uint64_t word) {
    const bits exponent(0x7ff0000000000000ULL);
    return xsimd::select((xsimd::bitwise_cast<bits>(x) & exponent) == exponent, bits(word),
                         bits(std::uint64_t{0}));
  }
};

}  // namespace v0
}  // namespace convelope

#endif
