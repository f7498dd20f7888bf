#ifndef CONVELOPE_ESTIMATE_ENVELOPE_HPP
#define CONVELOPE_ESTIMATE_ENVELOPE_HPP

#include <tuple>
#include <utility>

#include "convelope/estimate/info.hpp"
#include "convelope/estimate/verdict.hpp"
#include "convelope/kinds/typed.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
template <class K, class... Ks>
constexpr int index_of_kind() {
  int i = 0;
  int found = -1;
  ((found = std::is_same_v<K, Ks> && found < 0 ? i : found, ++i), ...);
  return found;
}

template <class K>
struct limit_on_input {
  double low;
  double high;
  static constexpr const char* symbol = K::symbol;

  template <class... Ks, class... X>
  CONVELOPE_FUNCTION constexpr auto number(const X&... x) const {
    constexpr int i = among<Ks...> ? index_of_kind<K, Ks...>() : 0;
    return std::get<static_cast<std::size_t>(i)>(std::tie(x...));
  }
  template <class... Ks>
  static constexpr bool among = index_of_kind<K, Ks...>() >= 0;
  template <class Kind>
  static constexpr bool bounds = std::is_same_v<K, Kind>;
};

template <class Group>
struct limit_on_group {
  const char* symbol;
  double low;
  double high;
  Group group;

  template <class... Ks, class... X>
  CONVELOPE_FUNCTION constexpr auto number(const X&... x) const {
    return group(x...);
  }
  template <class... Ks>
  static constexpr bool among = true;
  template <class Kind>
  static constexpr bool bounds = false;
};
}  // namespace detail

/// low <= input <= high, e.g. limit<prandtl_number>(0.6, 60.0). `unbounded` for no bound.
template <auto Gate>
constexpr auto limit(double low, double high) {
  return detail::limit_on_input<kind_of<Gate>>{low, high};
}

/// A limit on a group derived from the inputs:
/// limit_on("Re Pr", 0.2, unbounded, [](auto Re, auto Pr) { return Re * Pr; }).
template <class Group>
constexpr auto limit_on(const char* symbol, double low, double high, Group group) {
  return detail::limit_on_group<Group>{symbol, low, high, group};
}

namespace detail {
// In positive form: `x >= low` is false for NaN, also where the compiler assumes there is none.
template <class T, class L, class V>
CONVELOPE_FUNCTION constexpr bits_t<T> crossed(const L& l, int i, const V& v) {
  using adaptor = scalar_adaptor<V>;
  bits_t<T> bits(std::uint64_t{0});
  if (l.low > -unbounded) {
    bits = bits | adaptor::bits_where(!(v >= adaptor::constant(l.low)),
                                      detail::word::of_correlation(0, i, side::below));
  }
  if (l.high < unbounded) {
    bits = bits | adaptor::bits_where(!(v <= adaptor::constant(l.high)),
                                      detail::word::of_correlation(0, i, side::above));
  }
  return bits;
}

template <class K, class L, class X>
CONVELOPE_FUNCTION constexpr X clamped(const L& l, const X& x) {
  if constexpr (L::template bounds<K>) {
    return math::smaller(math::larger(x, scalar_adaptor<X>::constant(l.low)),
                         scalar_adaptor<X>::constant(l.high));
  } else {
    return x;
  }
}

// Limits by number. A std::tuple makes a geometry's header a tenth dearer to include.
template <int Number, class Limit>
struct numbered_limit {
  Limit limit;
};
template <class Numbers, class... Limits>
struct limit_set;
template <int... Number, class... Limits>
struct limit_set<std::integer_sequence<int, Number...>, Limits...>
    : numbered_limit<Number, Limits>... {
  constexpr explicit limit_set(const Limits&... limits)
      : numbered_limit<Number, Limits>{limits}... {}

  constexpr void describe(limit_info* to) const {
    ((to[Number] = {numbered_limit<Number, Limits>::limit.symbol,
                    numbered_limit<Number, Limits>::limit.low,
                    numbered_limit<Number, Limits>::limit.high}),
     ...);
  }
  /// x moved to the nearest limit on its kind K.
  template <class K, class X>
  CONVELOPE_FUNCTION constexpr X clamp(X x) const {
    ((x = clamped<K>(numbered_limit<Number, Limits>::limit, x)), ...);
    return x;
  }
  template <class T, class... Ks, class... X>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const X&... x) const {
    bits_t<T> bits(std::uint64_t{0});
    ((bits = bits | crossed<T>(numbered_limit<Number, Limits>::limit, Number,
                               numbered_limit<Number, Limits>::limit.template number<Ks...>(x...))),
     ...);
    return bits;
  }
};
}  // namespace detail

/// The range a formula was fitted in: up to six limits, tested in the caller's own numbers.
template <class... Limits>
struct envelope_of {
  static_assert(sizeof...(Limits) <= detail::word::limits_per_slot, "at most six limits");
  static constexpr int count = static_cast<int>(sizeof...(Limits));
  detail::limit_set<std::make_integer_sequence<int, count>, Limits...> limits;

  /// Verdict bits (in slot 0) for inputs x of kinds Ks, as numbers of type T.
  template <class T, class... Ks, class... X>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const X&... x) const {
    static_assert((Limits::template among<Ks...> && ...),
                  "this limit names a kind that is not an input of the correlation");
    return limits.template check<T, Ks...>(x...);
  }
};

template <class... Limits>
constexpr envelope_of<Limits...> within(Limits... limits) {
  using set = decltype(envelope_of<Limits...>::limits);
  return {set(limits...)};
}

}  // namespace v0
}  // namespace convelope

#endif
