#ifndef CONVELOPE_ESTIMATE_POLICIES_HPP
#define CONVELOPE_ESTIMATE_POLICIES_HPP

#include "convelope/estimate/estimate.hpp"

namespace convelope {
inline namespace v0 {

/// What crossing a limit means to the host: `correlation{}.under(policy::clamp)(Re, Pr)`.
namespace policy {

/// Default: evaluate as published, also outside, and record what was crossed.
struct recording {
  static constexpr bool clamps = false;
  template <class E>
  CONVELOPE_FUNCTION constexpr E operator()(const E& e) const {
    return e;
  }
};

/// Evaluate at the nearest limit of each input instead; the verdict still tells of the caller's
/// numbers. Limits on derived groups can't be clamped and are recorded only.
struct clamping {
  static constexpr bool clamps = true;
  template <class E>
  CONVELOPE_FUNCTION constexpr E operator()(const E& e) const {
    return e;
  }
};

/// Outside the envelope the value becomes NaN and the verdict says `refused`.
struct refusing {
  static constexpr bool clamps = false;
  template <class K, class T>
  CONVELOPE_FUNCTION constexpr estimate<K, T> operator()(const estimate<K, T>& e) const {
    static_assert(scalar_adaptor<T>::lanes == 1, "refuse lane by lane: one face at a time");
    if (e.inside()) return e;
    const verdict<std::uint64_t> v(e.verdict().bits() | detail::word::refused);
    return estimate<K, T>(scalar_adaptor<T>::constant(__builtin_nan("")), v, e.variance(),
                          e.correlation(), e.fluid());
  }
};

inline constexpr recording record{};
inline constexpr clamping clamp{};
inline constexpr refusing refuse{};

}  // namespace policy
}  // namespace v0
}  // namespace convelope

#endif
