#ifndef CONVELOPE_ESTIMATE_ENVELOPE_HPP
#define CONVELOPE_ESTIMATE_ENVELOPE_HPP

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

template <int I, class First, class... Rest>
CONVELOPE_FUNCTION constexpr auto nth(const First& first, const Rest&... rest) {
  if constexpr (I == 0) {
    return first;
  } else {
    return nth<I - 1>(rest...);
  }
}

template <class K>
struct limit_on_input {
  double low;
  double high;
  static constexpr const char* symbol = K::symbol;

  template <class... Ks, class... X>
  CONVELOPE_FUNCTION constexpr auto number(const X&... x) const {
    constexpr int i = among<Ks...> ? index_of_kind<K, Ks...>() : 0;
    return nth<i>(x...);
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
// Limits one after the other. A std::tuple makes a geometry's header a tenth dearer to include.
template <class... Limits>
struct limit_chain {
  template <class Use>
  CONVELOPE_FUNCTION constexpr void each(Use) const {}
};
template <class First, class... Rest>
struct limit_chain<First, Rest...> {
  First first;
  limit_chain<Rest...> rest;
  template <class Use>
  CONVELOPE_FUNCTION constexpr void each(Use use) const {
    use(first);
    rest.each(use);
  }
};
template <class First, class... Rest>
constexpr limit_chain<First, Rest...> chain_of(const First& first, const Rest&... rest) {
  if constexpr (sizeof...(Rest) == 0) {
    return {first, {}};
  } else {
    return {first, chain_of(rest...)};
  }
}
}  // namespace detail

/// The range a formula was fitted in: up to six limits, tested in the caller's own numbers.
template <class... Limits>
struct envelope_of {
  static_assert(sizeof...(Limits) <= detail::word::limits_per_slot, "at most six limits");
  static constexpr int count = static_cast<int>(sizeof...(Limits));
  detail::limit_chain<Limits...> limits;

  /// Verdict bits (in slot 0) for inputs x of kinds Ks, as numbers of type T.
  template <class T, class... Ks, class... X>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const X&... x) const {
    static_assert((Limits::template among<Ks...> && ...),
                  "this limit names a kind that is not an input of the correlation");
    bits_t<T> bits(std::uint64_t{0});
    int i = 0;
    limits.each([&](const auto& l) {
      bits = bits | one<T>(l, i, l.template number<Ks...>(x...));
      ++i;
    });
    return bits;
  }

 private:
  // In positive form: `x >= low` is false for NaN, also where the compiler assumes there is none.
  template <class T, class L, class V>
  CONVELOPE_FUNCTION static constexpr bits_t<T> one(const L& l, int i, const V& v) {
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
};

template <class... Limits>
constexpr envelope_of<Limits...> within(Limits... limits) {
  if constexpr (sizeof...(Limits) == 0) {
    return {};
  } else {
    return {detail::chain_of(limits...)};
  }
}

}  // namespace v0
}  // namespace convelope

#endif
