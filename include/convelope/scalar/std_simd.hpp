#ifndef CONVELOPE_SCALAR_STD_SIMD_HPP
#define CONVELOPE_SCALAR_STD_SIMD_HPP

#include <experimental/simd>

#include "convelope/scalar/dual.hpp"

// Lets every formula run on std::experimental::simd (double or float lanes).

namespace convelope {
inline namespace v0 {

namespace detail {
// libstdc++ 12 computes packs of a size without a register wrongly under clang with AVX-512.
#if defined(__clang__) && defined(__AVX512F__)
inline constexpr bool sized_packs_work = false;
#else
inline constexpr bool sized_packs_work = true;
#endif

/// yes where m, else no.
template <class Pack>
Pack blend(const typename Pack::mask_type& m, const Pack& yes, const Pack& no) {
#if defined(__clang__) && defined(__AVX512VL__)
  // libstdc++ 12 takes one lane's choice for all lanes here.
  if constexpr (std::is_trivially_copyable_v<Pack> && sizeof(m) <= 2) {
    constexpr bool wide = sizeof(typename Pack::value_type) == 8;
    if constexpr (sizeof(Pack) == 64) {
      const auto a = std::bit_cast<__m512i>(yes);
      const auto b = std::bit_cast<__m512i>(no);
      if constexpr (wide) {
        return std::bit_cast<Pack>(_mm512_mask_blend_epi64(std::bit_cast<__mmask8>(m), b, a));
      } else {
        return std::bit_cast<Pack>(_mm512_mask_blend_epi32(std::bit_cast<__mmask16>(m), b, a));
      }
    } else if constexpr (sizeof(Pack) == 32) {
      const auto a = std::bit_cast<__m256i>(yes);
      const auto b = std::bit_cast<__m256i>(no);
      const auto k = std::bit_cast<__mmask8>(m);
      return std::bit_cast<Pack>(wide ? _mm256_mask_blend_epi64(k, b, a)
                                      : _mm256_mask_blend_epi32(k, b, a));
    } else if constexpr (sizeof(Pack) == 16) {
      const auto a = std::bit_cast<__m128i>(yes);
      const auto b = std::bit_cast<__m128i>(no);
      const auto k = std::bit_cast<__mmask8>(m);
      return std::bit_cast<Pack>(wide ? _mm_mask_blend_epi64(k, b, a)
                                      : _mm_mask_blend_epi32(k, b, a));
    }
  }
#endif
  Pack r = no;
  where(m, r) = yes;
  return r;
}
}  // namespace detail

template <class Abi>
struct scalar_adaptor<std::experimental::simd<double, Abi>> {
  using pack = std::experimental::simd<double, Abi>;
  using plain = pack;
  using working = pack;
  using bits = std::experimental::rebind_simd_t<std::uint64_t, pack>;
  static constexpr int lanes = static_cast<int>(pack::size());
  /// Of a size that the machine has registers for.
  static constexpr bool is_native = std::is_trivially_copyable_v<pack>;
  static_assert(is_native || detail::sized_packs_work,
                "under clang with AVX-512 only native packs compute rightly");

  static const pack& value(const pack& x) { return x; }
  static pack constant(double c) { return pack(c); }
  static pack sqrt(const pack& x) { return std::experimental::sqrt(x); }
  static pack cbrt(const pack& x) {
    return each([]<class V>(const V& v) { return detail::elementary<V>::cbrt(v); }, x);
  }
  static pack exp(const pack& x) {
    return each([]<class V>(const V& v) { return detail::elementary<V>::exp(v); }, x);
  }
  static pack log(const pack& x) {
    return each([]<class V>(const V& v) { return detail::elementary<V>::log(v); }, x);
  }
  static pack pow(const pack& x, const pack& y) { return exp(pack(y * log(x))); }
  template <int P, int Q>
  static pack power(const pack& x) {
    return each([]<class V>(const V& v) { return detail::elementary<V>::template power<P, Q>(v); },
                x);
  }
  template <int P, int Q>
    requires is_native
  static auto power_and_quotient(const pack& x) {
    return detail::elementary<pack>::template both<P, Q>(x);
  }
  static pack select(const typename pack::mask_type& m, const pack& yes, const pack& no) {
    return detail::blend(m, yes, no);
  }
  static bits bits_where(const typename pack::mask_type& m, std::uint64_t word) {
    if constexpr (is_native) {
      return std::bit_cast<bits>(select(m, pack(std::bit_cast<double>(word)), pack(0.0)));
    } else {  // fixed_size packs
      return bits([&](auto i) { return m[i] ? word : std::uint64_t{0}; });
    }
  }
  static bits bits_where_not_finite(const pack& x, std::uint64_t word) {
    if constexpr (is_native) {
      const bits exponent(0x7ff0000000000000ULL);
      return detail::blend((std::bit_cast<bits>(x) & exponent) == exponent, bits(word), bits(0));
    } else {
      return bits([&](auto i) {
        return scalar_adaptor<double>::bits_where_not_finite(static_cast<double>(x[i]), word);
      });
    }
  }

 private:
  template <class Function>
  static pack each(Function f, const pack& x) {
    if constexpr (is_native) {
      return f(x);
    } else {
      return pack([&](auto i) { return f(static_cast<double>(x[i])); });
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
  static_assert(
      detail::sized_packs_work || lanes == 0,
      "under clang with AVX-512 packs of float compute wrongly: use float or double packs");

  static const pack& value(const pack& x) { return x; }
  static pack constant(double c) { return pack(static_cast<float>(c)); }
  static pack sqrt(const pack& x) { return std::experimental::sqrt(x); }
  static pack cbrt(const pack& x) {
    return in_double(x, [](const auto& v) { return math::cbrt(v); });
  }
  static pack exp(const pack& x) {
    return in_double(x, [](const auto& v) { return math::exp(v); });
  }
  static pack log(const pack& x) {
    return in_double(x, [](const auto& v) { return math::log(v); });
  }
  static pack pow(const pack& x, const pack& y) { return exp(pack(y * log(x))); }
  template <int P, int Q>
  static pack power(const pack& x) {
    return in_double(x, [](const auto& v) { return math::power<P, Q>(v); });
  }
  static pack select(const typename pack::mask_type& m, const pack& yes, const pack& no) {
    return detail::blend(m, yes, no);
  }
  static bits bits_where(const typename pack::mask_type& m, std::uint64_t word) {
    return bits([&](auto i) { return m[i] ? word : std::uint64_t{0}; });
  }
  static bits bits_where_not_finite(const pack& x, std::uint64_t word) {
    return bits([&](auto i) {
      return scalar_adaptor<float>::bits_where_not_finite(static_cast<float>(x[i]), word);
    });
  }

 private:
  // By packs of double, as many as it takes.
  template <class Function>
  static pack in_double(const pack& x, Function f) {
    using wide = std::experimental::native_simd<double>;
    float x_i[pack::size()];
    x.copy_to(x_i, std::experimental::element_aligned);
    std::size_t i = 0;
    for (; i + wide::size() <= pack::size(); i += wide::size()) {
      f(wide(x_i + i, std::experimental::element_aligned))
          .copy_to(x_i + i, std::experimental::element_aligned);
    }
    for (; i < pack::size(); ++i) x_i[i] = static_cast<float>(f(static_cast<double>(x_i[i])));
    return pack(x_i, std::experimental::element_aligned);
  }
};

}  // namespace v0
}  // namespace convelope

#endif
