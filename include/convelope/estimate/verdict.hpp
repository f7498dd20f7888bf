#ifndef CONVELOPE_ESTIMATE_VERDICT_HPP
#define CONVELOPE_ESTIMATE_VERDICT_HPP

#include "convelope/scalar.hpp"

namespace convelope {
inline namespace v0 {

/// Which side of a limit was left.
enum class side : unsigned char { below, above };

namespace detail::word {
// Layout of a verdict: four correlations with six limits each, one fluid with five, flags.
// A limit takes two bits: below, above.
inline constexpr int slots = 4;
inline constexpr int limits_per_slot = 6;
inline constexpr int slot_width = 2 * limits_per_slot;
inline constexpr int fluid_start = slots * slot_width;
inline constexpr int fluid_limits = 5;
inline constexpr std::uint64_t one = 1;
inline constexpr std::uint64_t slot_mask = (one << slot_width) - 1;
inline constexpr std::uint64_t fluid_mask = ((one << (2 * fluid_limits)) - 1) << fluid_start;
inline constexpr std::uint64_t not_finite = one << 58;
inline constexpr std::uint64_t refused = one << 59;
inline constexpr std::uint64_t scatter_not_stated = one << 60;
inline constexpr std::uint64_t input_outside = one << 61;
inline constexpr std::uint64_t impossible = one << 62;
inline constexpr std::uint64_t correlations_mask = (one << fluid_start) - 1;
// All that makes an answer unsupported; an unstated scatter does not.
inline constexpr std::uint64_t outside =
    correlations_mask | fluid_mask | not_finite | refused | input_outside | impossible;

constexpr std::uint64_t of_correlation(int slot, int limit, side s) {
  return one << (slot * slot_width + 2 * limit + static_cast<int>(s));
}
constexpr std::uint64_t of_fluid(int limit, side s) {
  return one << (fluid_start + 2 * limit + static_cast<int>(s));
}
}  // namespace detail::word

/// What is to be said about the support of one number: which limits its inputs crossed, and on
/// which side, of up to four correlations and of the fluid; and whether an input was NaN or
/// infinite. `Bits` is a 64-bit word, or a pack of them, one per lane.
template <class Bits = std::uint64_t>
class verdict {
 public:
  verdict() = default;
  CONVELOPE_FUNCTION constexpr explicit verdict(const Bits& bits) : bits_(bits) {}

  /// The raw word, e.g. to store per face.
  CONVELOPE_FUNCTION constexpr const Bits& bits() const { return bits_; }

  CONVELOPE_FUNCTION friend constexpr verdict operator|(const verdict& a, const verdict& b) {
    return verdict(Bits(a.bits_ | b.bits_));
  }

 private:
  Bits bits_;
};

/// One lane's verdict, to ask questions of.
template <>
class verdict<std::uint64_t> {
 public:
  verdict() = default;
  CONVELOPE_FUNCTION constexpr explicit verdict(std::uint64_t bits) : bits_(bits) {}

  CONVELOPE_FUNCTION constexpr std::uint64_t bits() const { return bits_; }
  /// No limit crossed, nothing refused, all inputs finite.
  CONVELOPE_FUNCTION constexpr bool inside() const { return (bits_ & detail::word::outside) == 0; }
  CONVELOPE_FUNCTION constexpr bool finite_input() const {
    return (bits_ & detail::word::not_finite) == 0;
  }
  /// A length, velocity or temperature that can't be: zero or negative where it must be positive.
  CONVELOPE_FUNCTION constexpr bool possible_input() const {
    return (bits_ & detail::word::impossible) == 0;
  }
  CONVELOPE_FUNCTION constexpr bool refused() const { return (bits_ & detail::word::refused) != 0; }
  CONVELOPE_FUNCTION constexpr bool scatter_stated() const {
    return (bits_ & detail::word::scatter_not_stated) == 0;
  }
  /// Limit number `limit` of the correlation in slot `slot` was left on side s.
  CONVELOPE_FUNCTION constexpr bool correlation_crossed(int slot, int limit, side s) const {
    return (bits_ & detail::word::of_correlation(slot, limit, s)) != 0;
  }
  /// Any limit of the correlation in that slot was crossed.
  CONVELOPE_FUNCTION constexpr bool correlation_outside(int slot = 0) const {
    return ((bits_ >> (slot * detail::word::slot_width)) & detail::word::slot_mask) != 0;
  }
  CONVELOPE_FUNCTION constexpr bool fluid_crossed(int limit, side s) const {
    return (bits_ & detail::word::of_fluid(limit, s)) != 0;
  }
  CONVELOPE_FUNCTION constexpr bool fluid_outside() const {
    return (bits_ & detail::word::fluid_mask) != 0;
  }
  /// An input was an estimate that was outside an envelope of its own.
  CONVELOPE_FUNCTION constexpr bool input_outside() const {
    return (bits_ & detail::word::input_outside) != 0;
  }

  CONVELOPE_FUNCTION friend constexpr verdict operator|(verdict a, verdict b) {
    return verdict(a.bits_ | b.bits_);
  }
  CONVELOPE_FUNCTION friend constexpr bool operator==(verdict a, verdict b) {
    return a.bits_ == b.bits_;
  }

 private:
  std::uint64_t bits_;
};

}  // namespace v0
}  // namespace convelope

#endif
