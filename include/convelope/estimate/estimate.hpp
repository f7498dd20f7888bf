#ifndef CONVELOPE_ESTIMATE_ESTIMATE_HPP
#define CONVELOPE_ESTIMATE_ESTIMATE_HPP

#include "convelope/estimate/info.hpp"
#include "convelope/estimate/verdict.hpp"
#include "convelope/kinds/typed.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
// The bits of an answer by another correlation: what its limits say is said by `input_outside`,
// because the slots will be read as those of the correlation that speaks.
template <class T>
CONVELOPE_FUNCTION constexpr bits_t<T> as_input_bits(const bits_t<T>& b) {
  using bits = bits_t<T>;
  const bits crossed = bits(b & bits(word::correlations_mask));
  const bits any = bits((crossed | bits(bits(std::uint64_t{0}) - crossed)) >> 63);
  return bits((b & bits(~word::correlations_mask)) | bits(any * bits(word::input_outside)));
}
}  // namespace detail

/// A number of kind K together with what is known about it: its verdict, the relative scatter
/// its sources state, which correlation gave it and which fluid it was for.
/// Trivially copyable, no heap.
template <class K, class T = double>
class estimate {
 public:
  using kind_type = K;
  using value_type = T;
  using verdict_type = convelope::verdict<bits_t<T>>;

  estimate() = default;
  CONVELOPE_FUNCTION constexpr estimate(const T& si, const verdict_type& verdict,
                                        const plain_t<T>& variance,
                                        const correlation_info* correlation,
                                        const fluid_info* fluid)
      : si_(si), variance_(variance), verdict_(verdict), correlation_(correlation), fluid_(fluid) {}

  /// The number in the kind's SI unit.
  CONVELOPE_FUNCTION constexpr const T& si() const { return si_; }
  CONVELOPE_FUNCTION constexpr typed<K, T> number() const { return typed<K, T>::from_si(si_); }
  CONVELOPE_FUNCTION constexpr boost::units::quantity<typename K::unit_type, T> quantity() const {
    return number().quantity();
  }

  CONVELOPE_FUNCTION constexpr const verdict_type& verdict() const { return verdict_; }
  /// No limit crossed and every input finite. Scalar estimates only; a pack asks lane by lane.
  CONVELOPE_FUNCTION constexpr bool inside() const
    requires std::is_same_v<bits_t<T>, std::uint64_t>
  {
    return verdict_.inside();
  }
  /// Relative half-width of the band the sources state (0.2 = +-20 %), combined as independent.
  /// What was not stated counts as 0: see verdict().scatter_stated().
  CONVELOPE_FUNCTION plain_t<T> scatter() const { return math::sqrt(variance_); }
  CONVELOPE_FUNCTION constexpr const plain_t<T>& variance() const { return variance_; }

  /// The correlation in slot 0 of the verdict, or nullptr.
  CONVELOPE_FUNCTION constexpr const correlation_info* correlation() const { return correlation_; }
  CONVELOPE_FUNCTION constexpr const fluid_info* fluid() const { return fluid_; }

  CONVELOPE_FUNCTION friend constexpr estimate operator*(const T& a, const estimate& b) {
    return estimate(T(a * b.si_), b.verdict_, b.variance_, b.correlation_, b.fluid_);
  }
  /// The sum of two independent estimates.
  CONVELOPE_FUNCTION friend constexpr estimate operator+(const estimate& a, const estimate& b) {
    return joined(a, b, T(a.si_ + b.si_));
  }
  CONVELOPE_FUNCTION friend constexpr estimate operator-(const estimate& a, const estimate& b) {
    return joined(a, b, T(a.si_ - b.si_));
  }
  template <has_kind B>
  friend void operator+(const estimate& a, const B& b) = delete;  // two kinds don't mix
  template <has_kind B>
  friend void operator-(const estimate& a, const B& b) = delete;

 private:
  CONVELOPE_FUNCTION static constexpr estimate joined(const estimate& a, const estimate& b,
                                                      const T& si) {
    const plain_t<T> x = plain(a.si_);
    const plain_t<T> y = plain(b.si_);
    const plain_t<T> s = plain(si);
    const bool one_source = a.correlation_ == b.correlation_;
    const bits_t<T> seen(a.verdict_.bits() | b.verdict_.bits());
    const plain_t<T> tiny = scalar_adaptor<plain_t<T>>::constant(1e-36);
    return estimate(si, verdict_type(one_source ? seen : detail::as_input_bits<T>(seen)),
                    plain_t<T>((x * x * a.variance_ + y * y * b.variance_) / (s * s + tiny)),
                    one_source ? a.correlation_ : nullptr,
                    a.fluid_ == b.fluid_ ? a.fluid_ : nullptr);
  }

  T si_;
  plain_t<T> variance_;
  verdict_type verdict_;
  const correlation_info* correlation_;
  const fluid_info* fluid_;
};

namespace detail {
template <class A>
constexpr bool is_estimate = false;
template <class K, class T>
constexpr bool is_estimate<estimate<K, T>> = true;

// What arguments bring to a result: nothing for a typed number.
template <class T, class A>
CONVELOPE_FUNCTION constexpr bits_t<T> bits_from(const A& a) {
  if constexpr (is_estimate<A>) {
    return bits_t<T>(a.verdict().bits());
  } else {
    return bits_t<T>(std::uint64_t{0});
  }
}
template <class T, class A>
CONVELOPE_FUNCTION constexpr plain_t<T> variance_from(const A& a) {
  if constexpr (is_estimate<A>) {
    return plain_t<T>(a.variance());
  } else {
    return scalar_adaptor<plain_t<T>>::constant(0.0);
  }
}
template <class A>
CONVELOPE_FUNCTION constexpr const correlation_info* correlation_from(const A& a) {
  if constexpr (is_estimate<A>) {
    return a.correlation();
  } else {
    return nullptr;
  }
}
template <class A>
CONVELOPE_FUNCTION constexpr const fluid_info* fluid_from(const A& a) {
  if constexpr (is_estimate<A>) {
    return a.fluid();
  } else {
    return nullptr;
  }
}
template <class Info>
CONVELOPE_FUNCTION constexpr const Info* first_given() {
  return nullptr;
}
template <class Info, class... P>
CONVELOPE_FUNCTION constexpr const Info* first_given(const Info* a, P... rest) {
  return a != nullptr ? a : first_given<Info>(rest...);
}

template <class... A>
using number_type = common_scalar_t<typename A::value_type...>;

/// A product or quotient of the arguments, as a typed number if all are typed, else as an
/// estimate that inherits every verdict and combines every scatter.
template <kind K, class T, class... A>
CONVELOPE_FUNCTION constexpr auto carried(const T& si, const A&... a) {
  if constexpr ((is_estimate<A> || ...)) {
    const correlation_info* speaks = first_given<correlation_info>(correlation_from(a)...);
    const auto bits = [&](const auto& x) {
      const bits_t<T> b = bits_from<T>(x);
      return correlation_from(x) == speaks ? b : as_input_bits<T>(b);
    };
    return estimate<K, T>(si, verdict<bits_t<T>>(bits_t<T>((bits(a) | ...))),
                          plain_t<T>((variance_from<T>(a) + ...)), speaks,
                          first_given<fluid_info>(fluid_from(a)...));
  } else {
    return typed<K, T>::from_si(si);
  }
}
}  // namespace detail

}  // namespace v0
}  // namespace convelope

#endif
