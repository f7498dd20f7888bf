#pragma once

#include <bit>
#include <cstdint>

// Numbers that -ffast-math would assume away, hidden from the compiler.

inline double from_bits(std::uint64_t bits) {
  const volatile std::uint64_t hidden = bits;
  return std::bit_cast<double>(static_cast<std::uint64_t>(hidden));
}
inline double hidden_nan() { return from_bits(0x7ff8000000000000ULL); }
inline double hidden_infinity() { return from_bits(0x7ff0000000000000ULL); }
inline double hidden_minus_infinity() { return from_bits(0xfff0000000000000ULL); }

/// By the bits: x != x is false under -ffast-math.
inline bool is_nan(double x) {
  const std::uint64_t bits = std::bit_cast<std::uint64_t>(x) & 0x7fffffffffffffffULL;
  return bits > 0x7ff0000000000000ULL;
}
