#pragma once

// What every correlation is put through.
//   check_value<C>(want, inputs...)          the double, against a 50-digit number, to 1e-13
//   check_scalars<C>(inputs...)              every number type, and derivatives
//   expect_inside<C>(inputs...)              no limit crossed
//   expect_crossed<C>(i, side, inputs...)    limit i crossed on that side, and nothing else
//   expect_also_crossed<C>(i, side, ...)     the same where other limits are crossed too
//   expect_record<C>(id, quantity, ...)      what it says of itself
//   expect_keys<C>("Re", "Pr")               the names of its inputs in a batch line
//   expect_not_finite<C>(inputs...)          NaN or infinity in any input is told
// Inputs are doubles in the order of C's gates, enumerators for choices.

#include <doctest/doctest.h>

#include <boost/throw_exception.hpp>
#include <cstddef>
#include <cstdlib>
#include <limits>
#include <tuple>
#include <type_traits>

#ifdef BOOST_NO_EXCEPTIONS  // Boost asks the program for this one
namespace boost {
inline void throw_exception(const std::exception&) { std::abort(); }
inline void throw_exception(const std::exception&, const source_location&) { std::abort(); }
}  // namespace boost
#endif
#include <boost/multiprecision/cpp_bin_float.hpp>

#include "convelope/estimate/correlation.hpp"
#include "convelope/scalar/std_simd.hpp"

namespace check {

using exact = boost::multiprecision::cpp_bin_float_50;
using convelope::dual;
using convelope::side;
using pack = std::experimental::native_simd<double>;

/// The decimal number itself: 0.62_exact is not the double nearest to it.
inline exact operator""_exact(const char* digits) { return exact(digits); }
/// x^(p/q), the plain way.
inline exact raised(const exact& x, int p, int q = 1) { return exact(pow(x, exact(p) / q)); }

/// Just under and just over a limit at x.
constexpr double below(double x) { return x < 0.0 ? x * (1.0 + 1e-9) : x * (1.0 - 1e-9); }
constexpr double above(double x) { return x < 0.0 ? x * (1.0 - 1e-9) : x * (1.0 + 1e-9); }

namespace detail {

// doctest prints a plain const char* as an address
inline doctest::String text(const char* s) { return doctest::String(s); }

/// |got - want| <= tolerance. Finiteness is read from the bits: NaN compares as anything under
/// -ffast-math.
template <class T>
void close(const char* id, const char* what, const T& got, const exact& want, double tolerance) {
  const double as_double = static_cast<double>(got);
  const double wanted = static_cast<double>(want);
  const bool finite = convelope::scalar_adaptor<double>::bits_where_not_finite(as_double, 1) == 0 &&
                      convelope::scalar_adaptor<double>::bits_where_not_finite(wanted, 1) == 0;
  INFO(text(id));
  INFO(text(what));
  CAPTURE(as_double);
  CAPTURE(wanted);
  REQUIRE(finite);
  CHECK(static_cast<double>(abs(exact(got) - want)) <= tolerance);
}

/// C's formula on numbers of type T, with make(x, T) in place of the input number `at`.
template <class C, class T, class Make, class... X>
T formula_with([[maybe_unused]] std::size_t at, [[maybe_unused]] const Make& make, const X&... x) {
  if constexpr (sizeof...(X) == 0) {
    return C::template formula<T>();
  } else {
    std::size_t i = 0;
    const auto input = [&]<class V>(const V& v) {
      const bool chosen = i++ == at;
      if constexpr (std::is_enum_v<V>) {
        return v;
      } else {
        return chosen ? T(make(v)) : T(v);
      }
    };
    const std::tuple inputs{input(x)...};  // braces: left to right
    return std::apply([](const auto&... a) { return T(C::formula(a...)); }, inputs);
  }
}

template <class C, class T, class... X>
T formula_on(const X&... x) {
  return formula_with<C, T>(
      sizeof...(X), [](double v) { return T(v); }, x...);
}

/// The formula and its first two derivatives in one input, from 50-digit central differences
/// (their own error is below 1e-20). Not across a kink: choose inputs away from band edges.
struct derivatives {
  exact value, first, second;
};
template <class C, class... X>
derivatives by_differences(std::size_t at, double x_at, const X&... x) {
  const exact h = abs(exact(x_at)) * exact(1e-12);
  const auto shifted = [&](int steps) {
    return formula_with<C, exact>(
        at, [&](double v) { return exact(exact(v) + steps * h); }, x...);
  };
  const exact up = shifted(1);
  const exact here = shifted(0);
  const exact down = shifted(-1);
  return {here, exact((up - down) / (2 * h)), exact((up - 2 * here + down) / (h * h))};
}

/// Slopes are compared relative to themselves, or where they nearly vanish relative to y/x^order.
inline double slope_tolerance(const exact& slope, const exact& y, double x, int order) {
  exact scale = abs(y);
  for (int i = 0; i < order; ++i) scale /= abs(exact(x));
  const exact least = scale * exact(1e-3);
  return 1e-10 * static_cast<double>(abs(slope) > least ? exact(abs(slope)) : least);
}

template <class C, class... X>
void check_input(std::size_t at, double x_at, const X&... x) {
  if (x_at == 0.0) return;  // one-sided: the values alone are compared there
  const derivatives want = by_differences<C>(at, x_at, x...);
  const double first = slope_tolerance(want.first, want.value, x_at, 1);
  const double second = slope_tolerance(want.second, want.value, x_at, 2);

  using D = dual<double>;
  const D y = formula_with<C, D>(
      at, [](double v) { return D::variable(v); }, x...);
  close(C::id, "slope of dual<double>", y.slope[0], want.first, first);

  using DD = dual<D>;
  const DD yy = formula_with<C, DD>(
      at, [](double v) { return DD::variable(D::variable(v)); }, x...);
  close(C::id, "slope of dual<dual<double>>", yy.slope[0].value, want.first, first);
  close(C::id, "second slope", yy.slope[0].slope[0], want.second, 10.0 * second);

  using DP = dual<pack>;
  const DP yp = formula_with<C, DP>(
      at, [](double v) { return DP::variable(pack(v)); }, x...);
  for (std::size_t lane = 0; lane < pack::size(); ++lane) {
    close(C::id, "slope of dual<simd>", static_cast<double>(yp.slope[0][lane]), want.first, first);
  }
}

/// C called as a user does: typed inputs, an estimate out.
template <class C, class... X>
auto typed_call(const X&... x) {
  return C::with_input_kinds([&]<class... K>() {
    [[maybe_unused]] const auto input = []<class Kind, class V>(std::type_identity<Kind>,
                                                                const V& v) {
      if constexpr (std::is_enum_v<V>) {
        return v;
      } else {
        return convelope::typed<Kind, double>::from_si(v);
      }
    };
    return C{}(input(std::type_identity<K>{}, x)...);
  });
}

inline constexpr std::uint64_t outside_mask = convelope::detail::word::outside;

}  // namespace detail

/// The double result against an independent 50-digit one; bare and through the typed call.
template <class C, class... X>
void check_value(const exact& want, const X&... x) {
  const double tolerance = 1e-13 * static_cast<double>(abs(want));
  detail::close(C::id, "double", detail::formula_on<C, double>(x...), want, tolerance);
  detail::close(C::id, "typed call", detail::typed_call<C>(x...).si(), want, tolerance);
}

/// One formula line on every number type, against itself in 50 digits.
template <class C, class... X>
void check_scalars(const X&... x) {
  static_assert(((std::is_same_v<X, double> || std::is_enum_v<X>)&&...), "5.0, not 5");
  using detail::close;
  using detail::formula_on;
  const exact want = formula_on<C, exact>(x...);
  const double size = static_cast<double>(abs(want));

  close(C::id, "double", formula_on<C, double>(x...), want, 1e-13 * size);
  const double wide = 1e4 * static_cast<double>(std::numeric_limits<long double>::epsilon());
  close(C::id, "long double", formula_on<C, long double>(x...), want, wide * size);
  close(C::id, "dual<double>", formula_on<C, dual<double>>(x...).value, want, 1e-13 * size);
  close(C::id, "dual<dual<double>>", formula_on<C, dual<dual<double>>>(x...).value.value, want,
        1e-13 * size);

  // Rounding the inputs to float costs x f'/f each.
  double sensitivity = 1.0;
  std::size_t i = 0;
  [[maybe_unused]] const auto add = [&]<class V>(std::size_t at, const V& v) {
    if constexpr (!std::is_enum_v<V>) {
      if (v == 0.0) return;
      const exact slope = detail::by_differences<C>(at, v, x...).first;
      sensitivity += static_cast<double>(abs(exact(v) * slope / want));
      detail::check_input<C>(at, v, x...);
    }
  };
  (add(i++, x), ...);
  close(C::id, "float", formula_on<C, convelope::working_t<float>>(x...).value, want,
        1e-5 * sensitivity * size);

  // Each lane a little lower than the one before, against the same in one lane.
  const auto in_lane = [](double v, std::size_t lane) {
    return v * (1.0 - 1e-3 * static_cast<double>(lane));
  };
  [[maybe_unused]] const auto lanes = [&]<class V>(const V& v) {
    if constexpr (std::is_enum_v<V>) {
      return v;
    } else {
      return pack([&](std::size_t lane) { return in_lane(v, lane); });
    }
  };
  [[maybe_unused]] const auto single = [&]<class V>(const V& v, std::size_t lane) {
    if constexpr (std::is_enum_v<V>) {
      return v;
    } else {
      return in_lane(v, lane);
    }
  };
  pack y{};
  if constexpr (sizeof...(X) == 0) {
    y = C::template formula<pack>();
  } else {
    y = C::formula(lanes(x)...);
  }
  for (std::size_t lane = 0; lane < pack::size(); ++lane) {
    const double alone = formula_on<C, double>(single(x, lane)...);
    close(C::id, "simd lane", static_cast<double>(y[lane]), exact(alone),
          1e-13 * (alone < 0.0 ? -alone : alone));
  }
}

/// What the correlation says of itself, word for word.
template <class C>
void expect_record(const char* id, const char* quantity, double scatter,
                   convelope::state_rule state_at) {
  INFO(detail::text(id));
  CHECK(convelope::detail::same_text(C::id, id));
  CHECK(convelope::detail::same_text(C::quantity, quantity));
  CHECK(C::scatter == scatter);
  CHECK(C::state_at == state_at);
}

/// The names a batch line gives the inputs, in order.
template <class C, class... Key>
void expect_keys(const Key*... keys) {
  INFO(detail::text(C::id));
  REQUIRE(C::input_count == static_cast<int>(sizeof...(Key)));
  std::size_t i = 0;
  const auto one = [&](const char* key) {
    INFO(detail::text(key));
    CHECK(convelope::detail::same_text(convelope::detail::input_table<C>[i++].key, key));
  };
  (one(keys), ...);
}

/// Nothing is said against the answer for these inputs.
template <class C, class... X>
void expect_inside(const X&... x) {
  INFO(detail::text(C::id));
  const auto answer = detail::typed_call<C>(x...);
  CHECK(answer.inside());
  CHECK((answer.verdict().bits() & detail::outside_mask) == 0);
}

/// Limit number `limit` is crossed on side s, whatever else is.
template <class C, class... X>
void expect_also_crossed(int limit, side s, const X&... x) {
  INFO(detail::text(C::id));
  CAPTURE(limit);
  const auto verdict = detail::typed_call<C>(x...).verdict();
  CHECK_FALSE(verdict.inside());
  CHECK(verdict.correlation_crossed(0, limit, s));
  const side other = s == side::below ? side::above : side::below;
  CHECK_FALSE(verdict.correlation_crossed(0, limit, other));
}

/// Limit number `limit` is crossed on side s, and nothing else is wrong.
template <class C, class... X>
void expect_crossed(int limit, side s, const X&... x) {
  expect_also_crossed<C>(limit, s, x...);
  INFO(detail::text(C::id));
  CAPTURE(limit);
  const auto bits = detail::typed_call<C>(x...).verdict().bits();
  CHECK((bits & detail::outside_mask) == convelope::detail::word::of_correlation(0, limit, s));
}

/// From a point that is inside: NaN or an infinity in place of any one number is told.
template <class C, class... X>
void expect_not_finite(const X&... x) {
  expect_inside<C>(x...);
  INFO(detail::text(C::id));
  const double infinity = std::numeric_limits<double>::infinity();
  const double bad[] = {std::numeric_limits<double>::quiet_NaN(), infinity, -infinity};
  std::size_t at = 0;
  const auto one = [&]<class V>(std::size_t chosen, const V&) {
    if constexpr (!std::is_enum_v<V>) {
      for (const double value : bad) {
        std::size_t i = 0;
        const auto spoiled = [&]<class U>(const U& u) {
          const bool here = i++ == chosen;
          if constexpr (std::is_enum_v<U>) {
            return u;
          } else {
            return here ? value : u;
          }
        };
        const std::tuple inputs{spoiled(x)...};
        const auto verdict = std::apply(
            [](const auto&... a) { return detail::typed_call<C>(a...).verdict(); }, inputs);
        CHECK_FALSE(verdict.inside());
        CHECK_FALSE(verdict.finite_input());
      }
    }
  };
  (one(at++, x), ...);
}

}  // namespace check
