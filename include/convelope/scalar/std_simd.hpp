#ifndef CONVELOPE_SCALAR_STD_SIMD_HPP
#define CONVELOPE_SCALAR_STD_SIMD_HPP

#include <experimental/simd>

#include "convelope/scalar/dual.hpp"

// Lets every formula run on std::experimental::simd (double or float lanes).

namespace convelope {
inline namespace v0 {

template <class Abi>
struct scalar_adaptor<std::experimental::simd<double, Abi>> {
  using pack = std::experimental::simd<double, Abi>;
  using plain = pack;
  using working = pack;
  using bits = std::experimental::rebind_simd_t<std::uint64_t, pack>;
  static constexpr int lanes = static_cast<int>(pack::size());

  static const pack& value(const pack& x) { return x; }
  static pack constant(double c) { return pack(c); }
  static pack sqrt(const pack& x) { return std::experimental::sqrt(x); }
  static pack cbrt(const pack& x) { return std::experimental::cbrt(x); }
  static pack exp(const pack& x) { return std::experimental::exp(x); }
  static pack log(const pack& x) { return std::experimental::log(x); }
  static pack pow(const pack& x, const pack& y) { return std::experimental::pow(x, y); }
  static pack select(const typename pack::mask_type& m, const pack& yes, const pack& no) {
    pack r = no;
    where(m, r) = yes;
    return r;
  }
  static bits bits_where(const typename pack::mask_type& m, std::uint64_t word) {
    if constexpr (std::is_trivially_copyable_v<pack>) {
      return std::bit_cast<bits>(select(m, pack(std::bit_cast<double>(word)), pack(0.0)));
    } else {  // fixed_size packs
      return bits([&](auto i) { return m[i] ? word : std::uint64_t{0}; });
    }
  }
  static bits bits_where_not_finite(const pack& x, std::uint64_t word) {
    if constexpr (std::is_trivially_copyable_v<pack>) {
      const bits exponent(0x7ff0000000000000ULL);
      bits r(word);
      where((std::bit_cast<bits>(x) & exponent) != exponent, r) = bits(0);
      return r;
    } else {
      return bits([&](auto i) {
        return scalar_adaptor<double>::bits_where_not_finite(static_cast<double>(x[i]), word);
      });
    }
  }
};

// Single precision lanes carry 64-bit verdict words, so theirs go lane by lane.
template <class Abi>
struct scalar_adaptor<std::experimental::simd<float, Abi>> {
  using pack = std::experimental::simd<float, Abi>;
  using plain = pack;
  using working = dual<pack, 0>;
  using bits = std::experimental::fixed_size_simd<std::uint64_t, static_cast<int>(pack::size())>;
  static constexpr int lanes = static_cast<int>(pack::size());

  static const pack& value(const pack& x) { return x; }
  static pack constant(double c) { return pack(static_cast<float>(c)); }
  static pack sqrt(const pack& x) { return std::experimental::sqrt(x); }
  static pack cbrt(const pack& x) { return std::experimental::cbrt(x); }
  static pack exp(const pack& x) { return std::experimental::exp(x); }
  static pack log(const pack& x) { return std::experimental::log(x); }
  static pack pow(const pack& x, const pack& y) { return std::experimental::pow(x, y); }
  static pack select(const typename pack::mask_type& m, const pack& yes, const pack& no) {
    pack r = no;
    where(m, r) = yes;
    return r;
  }
  static bits bits_where(const typename pack::mask_type& m, std::uint64_t word) {
    return bits([&](auto i) { return m[i] ? word : std::uint64_t{0}; });
  }
  static bits bits_where_not_finite(const pack& x, std::uint64_t word) {
    return bits([&](auto i) {
      return scalar_adaptor<float>::bits_where_not_finite(static_cast<float>(x[i]), word);
    });
  }
};

}  // namespace v0
}  // namespace convelope

#endif
