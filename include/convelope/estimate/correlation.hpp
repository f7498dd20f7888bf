#ifndef CONVELOPE_ESTIMATE_CORRELATION_HPP
#define CONVELOPE_ESTIMATE_CORRELATION_HPP

#include <array>

#include "convelope/estimate/envelope.hpp"
#include "convelope/estimate/estimate.hpp"
#include "convelope/estimate/policies.hpp"

namespace convelope {
inline namespace v0 {

/// The value an input takes when a batch line leaves it out.
struct input_default {
  const char* key;
  double value;
};

/// Specialise for an enumeration that a formula takes as a choice: its key in a batch line and
/// the words for its values, in order, ending in nullptr.
template <class E>
struct choice_words;

namespace kinds {
template <class E>
struct choice {
  using unit_type = boost::units::si::dimensionless;
  using enumeration = E;
  static constexpr const char* symbol = choice_words<E>::key;
  static constexpr const char* words = choice_words<E>::about;
  static constexpr const char* unit = "";
};
}  // namespace kinds
/// As an input of a correlation: the caller passes the enumerator itself.
template <class E>
inline constexpr gate<kinds::choice<E>> choice_of{};

namespace detail {
template <class K>
constexpr bool is_choice = false;
template <class E>
constexpr bool is_choice<kinds::choice<E>> = true;

template <class In>
struct number_in {
  using type = void;
};
template <has_kind In>
struct number_in<In> {
  using type = typename In::value_type;
};

/// `In` may stand where a correlation expects an input of kind K. One plain constant, not a
/// concept, so that a compiler's complaint stays short and names both kinds.
template <class In, class K>
constexpr bool stands_for = measures<In, K>;
template <class In, class E>
constexpr bool stands_for<In, kinds::choice<E>> = std::is_convertible_v<In, E>;

/// A correlation's input number as its formula wants it.
template <class W, class K, class In>
CONVELOPE_FUNCTION constexpr auto argument(const In& in) {
  if constexpr (is_choice<K>) {
    return static_cast<typename K::enumeration>(in);
  } else {
    return W(in.si());
  }
}
// As the envelope wants it: without derivatives.
template <class T, class K, class In>
CONVELOPE_FUNCTION constexpr auto tested(const In& in) {
  if constexpr (is_choice<K>) {
    return static_cast<typename K::enumeration>(in);
  } else {
    return plain_t<T>(plain(in.si()));
  }
}

template <class K, class Envelope, class X>
CONVELOPE_FUNCTION constexpr X held_inside(const Envelope& envelope, const X& x) {
  if constexpr (is_choice<K>) {
    return x;
  } else {
    return envelope.limits.template clamp<K>(x);
  }
}
}  // namespace detail

namespace detail {
template <class K>
constexpr const char* key_of() {
  if constexpr (requires { K::key; }) {
    return K::key;
  } else {
    return K::symbol;
  }
}
template <class K>
constexpr const char* on_of() {
  if constexpr (requires { K::on_length; }) {
    return K::on_length;
  } else {
    return "";
  }
}
template <class K>
constexpr const char* const* choices_of() {
  if constexpr (is_choice<K>) {
    return choice_words<typename K::enumeration>::words;
  } else {
    return nullptr;
  }
}

template <class C>
constexpr void rename_keys(input_info* table, std::size_t n) {
  if constexpr (requires { C::keys; }) {
    for (std::size_t i = 0; i < n; ++i) table[i].key = C::keys[i];
  }
}
template <class C>
constexpr void set_defaults(input_info* table, std::size_t n) {
  if constexpr (requires { C::otherwise; }) {
    for (std::size_t i = 0; i < n; ++i) {
      for (const input_default& d : C::otherwise) {
        if (same_text(d.key, table[i].key)) {
          table[i].optional = true;
          table[i].otherwise = d.value;
        }
      }
    }
  }
}

/// A correlation's inputs as data: keys from its own list if it has one, else from the kinds.
template <class C>
inline constexpr auto input_table = C::with_input_kinds([]<class... K>() {
  constexpr std::size_t n = sizeof...(K);
  std::array<input_info, (n == 0 ? 1 : n)> table{
      {input_info{key_of<K>(), K::symbol, K::words, on_of<K>(), choices_of<K>(), 0.0, false}...}};
  rename_keys<C>(table.data(), n);
  set_defaults<C>(table.data(), n);
  return table;
});

template <class C>
inline constexpr auto limit_table = [] {
  std::array<limit_info, (C::envelope.count == 0 ? 1 : C::envelope.count)> table{};
  C::envelope.limits.describe(table.data());
  return table;
}();

template <class C>
inline constexpr correlation_info record_of{
    C::id,          C::quantity,           C::result_kind::words, &C::source, input_table<C>.data(),
    C::input_count, limit_table<C>.data(), C::envelope.count,     C::scatter, C::state_at};
}  // namespace detail

/// Base of every correlation: `struct name : correlation<name, Result, Inputs...>`, where Result
/// and Inputs are gates. The derived struct states id, quantity, source, envelope, scatter,
/// state_at and one static formula on plain numbers; this adds the typed call, the verdict and
/// mixed number types.
template <class Self, auto Result, auto... Inputs>
struct correlation;

namespace detail {
/// What a formula is written with, in reach of every correlation without widening the namespace.
struct formula_functions {
  template <class T>
  CONVELOPE_FUNCTION static constexpr T sqrt(const T& x) {
    return math::sqrt(x);
  }
  template <class T>
  CONVELOPE_FUNCTION static constexpr T cbrt(const T& x) {
    return math::cbrt(x);
  }
  template <class T>
  CONVELOPE_FUNCTION static constexpr T exp(const T& x) {
    return math::exp(x);
  }
  template <class T>
  CONVELOPE_FUNCTION static constexpr T log(const T& x) {
    return math::log(x);
  }
  template <class T>
  CONVELOPE_FUNCTION static constexpr T square(const T& x) {
    return math::square(x);
  }
  template <class T>
  CONVELOPE_FUNCTION static constexpr T pow(const T& x, const T& y) {
    return math::pow(x, y);
  }
  template <class T>
  CONVELOPE_FUNCTION static constexpr T smaller(const T& a, const T& b) {
    return math::smaller(a, b);
  }
  template <class T>
  CONVELOPE_FUNCTION static constexpr T larger(const T& a, const T& b) {
    return math::larger(a, b);
  }
  template <class Mask, class T>
  CONVELOPE_FUNCTION static constexpr T select(const Mask& m, const T& yes, const T& no) {
    return math::select(m, yes, no);
  }
  template <int P, int Q = 1, class T>
  CONVELOPE_FUNCTION static constexpr T power(const T& x) {
    return math::power<P, Q>(x);
  }
  template <int Exponent, class T>
  CONVELOPE_FUNCTION static constexpr T joined(const T& a, const T& b) {
    return math::joined<Exponent>(a, b);
  }
};

// On the kinds behind the gates: clang 14 can't expand packs of gates in constraints.
template <class Self, kind Result, kind... Inputs>
struct correlation_on : formula_functions {
  using result_kind = Result;
  static constexpr int input_count = static_cast<int>(sizeof...(Inputs));

  /// Typed numbers or estimates in, an estimate out; crossings are recorded.
  template <class... In>
    requires(stands_for<In, Inputs> && ...)
  CONVELOPE_FUNCTION constexpr auto operator()(const In&... in) const {
    return evaluate(policy::record, in...);
  }

  /// The same correlation under another policy: clamp, refuse, throwing<E>, or a host's own.
  template <class Policy>
  CONVELOPE_FUNCTION constexpr auto under(const Policy& how) const {
    return [how]<class... In>(const In&... in)
      requires(stands_for<In, Inputs> && ...)
    {
      return evaluate(how, in...);
    };
  }

  /// Calls f.template operator()<Kind...>() with the input kinds: for the catalogue.
  template <class Use>
  static constexpr decltype(auto) with_input_kinds(Use use) {
    return use.template operator()<Inputs...>();
  }

 private:
  template <class Policy, class... In>
  CONVELOPE_FUNCTION static constexpr auto evaluate(const Policy& how, const In&... in) {
    namespace word = detail::word;
    using T = common_scalar_t<typename detail::number_in<In>::type...>;
    using W = working_t<T>;
    using P = plain_t<T>;
    using bits = bits_t<T>;

    constexpr auto envelope = Self::envelope;  // its own, for device code
    bits seen = envelope.template check<T, Inputs...>(detail::tested<T, Inputs>(in)...);
    ((seen = bits(seen | finite_bits<T, Inputs>(in))), ...);
    ((seen = bits(seen | inherited<T>(in))), ...);
    if (Self::scatter < 0.0) seen = bits(seen | bits(word::scatter_not_stated));

    constexpr double own = Self::scatter < 0.0 ? 0.0 : Self::scatter * Self::scatter;
    P variance = scalar_adaptor<P>::constant(own);
    ((variance = P(variance + detail::variance_from<T>(in))), ...);

    const W y = [&] {
      if constexpr (sizeof...(Inputs) == 0) {
        return Self::template formula<W>();
      } else if constexpr (Policy::clamps) {
        return W(Self::formula(
            detail::held_inside<Inputs>(envelope, detail::argument<W, Inputs>(in))...));
      } else {
        return W(Self::formula(detail::argument<W, Inputs>(in)...));
      }
    }();
    const fluid_info* fluid = detail::first_given<fluid_info>(detail::fluid_from(in)...);
    return how(estimate<result_kind, T>(detail::as_result<T>(y), verdict<bits>(seen), variance,
                                        &detail::record_of<Self>, fluid));
  }

  template <class T, class K, class In>
  CONVELOPE_FUNCTION static constexpr bits_t<T> finite_bits(const In& in) {
    if constexpr (detail::is_choice<K>) {
      return bits_t<T>(std::uint64_t{0});
    } else {
      using P = plain_t<T>;
      return scalar_adaptor<P>::bits_where_not_finite(P(plain(in.si())), detail::word::not_finite);
    }
  }
  // What an input estimate brings along; its correlation slots belong to another correlation.
  template <class T, class In>
  CONVELOPE_FUNCTION static constexpr bits_t<T> inherited(const In& in) {
    if constexpr (detail::is_estimate<In>) {
      return detail::as_input_bits<T>(detail::bits_from<T>(in));
    } else {
      return bits_t<T>(std::uint64_t{0});
    }
  }
};
}  // namespace detail

template <class Self, auto Result, auto... Inputs>
struct correlation : detail::correlation_on<Self, kind_of<Result>, kind_of<Inputs>...> {};

}  // namespace v0
}  // namespace convelope

#endif
