// exp, log, cbrt and rational powers on double and packs, against long double (64-bit significand)
// of the standard library, over seeded random numbers of every size.
#include "convelope/scalar/elementary.hpp"

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <limits>
#include <random>

#include "convelope/scalar/std_simd.hpp"

using namespace convelope;

namespace {

using pack = std::experimental::native_simd<double>;
using odd_pack [[maybe_unused]] = std::experimental::fixed_size_simd<double, 3>;

// Distance in units in the last place of `want`.
double units_off(double got, long double want) {
  const auto near_want = static_cast<double>(want);
  const double unit = std::nextafter(std::fabs(near_want), INFINITY) - std::fabs(near_want);
  return static_cast<double>(std::fabs(static_cast<long double>(got) - want) / unit);
}

template <class T, class F, class Wanted, class X>
double worst(F f, Wanted wanted, X next) {
  double most = 0.0;
  for (int i = 0; i < 20000; ++i) {
    const double x = next();
    double got = 0.0;
    if constexpr (std::is_same_v<T, double>) {
      got = f(x);
    } else {
      got = f(T(x))[T::size() - 1];
    }
    const double off = units_off(got, wanted(static_cast<long double>(x)));
    if (!(off <= most)) most = off;
  }
  return most;
}

struct numbers {
  std::mt19937_64 engine{20261201};
  double from;
  double to;
  bool powers_of_ten;
  double operator()() {
    const double u = std::uniform_real_distribution<double>(from, to)(engine);
    return powers_of_ten ? std::pow(10.0, u) : u;
  }
};
numbers even(double from, double to) { return {.from = from, .to = to, .powers_of_ten = false}; }
numbers decades(double from, double to) { return {.from = from, .to = to, .powers_of_ten = true}; }

template <class T>
using fast = detail::elementary<T>;

template <class T>
void check_functions() {
  const auto exp_l = [](long double x) { return std::exp(x); };
  const auto log_l = [](long double x) { return std::log(x); };
  const auto cbrt_l = [](long double x) { return std::cbrt(x); };
  const auto exp_f = [](const T& x) { return fast<T>::exp(x); };
  const auto log_f = [](const T& x) { return fast<T>::log(x); };
  const auto cbrt_f = [](const T& x) { return fast<T>::cbrt(x); };
  CHECK(worst<T>(exp_f, exp_l, even(-707.9, 709.7)) < 2.0);
  CHECK(worst<T>(exp_f, exp_l, even(-1.0, 1.0)) < 2.0);
  CHECK(worst<T>(log_f, log_l, decades(-307.0, 308.0)) < 2.0);
  CHECK(worst<T>(log_f, log_l, even(0.5, 2.0)) < 2.0);
  CHECK(worst<T>(log_f, log_l, decades(-322.0, -308.0)) < 2.0);
  CHECK(worst<T>(cbrt_f, cbrt_l, decades(-307.0, 308.0)) < 1.0);
  CHECK(worst<T>(cbrt_f, cbrt_l, decades(-322.0, -308.0)) < 1.0);
  CHECK(worst<T>(cbrt_f, cbrt_l, even(-10.0, 10.0)) < 1.0);
}

template <class T, int P, int Q>
void check_power(double bound) {
  CAPTURE(P);
  CAPTURE(Q);
  const auto f = [](const T& x) { return math::power<P, Q>(x); };
  const auto wanted = [](long double x) {
    return std::pow(x, static_cast<long double>(P) / static_cast<long double>(Q));
  };
  CHECK(worst<T>(f, wanted, decades(-20.0, 20.0)) < bound);
}

template <class T>
void check_powers() {
  const auto by_roots = [](int P) { return 2.0 * std::abs(P) + 8.0; };
  check_power<T, 1, 2>(by_roots(1));
  check_power<T, -1, 2>(by_roots(1));
  check_power<T, 1, 3>(by_roots(1));
  check_power<T, -2, 3>(by_roots(2));
  check_power<T, 5, 3>(by_roots(5));
  check_power<T, 1, 4>(by_roots(1));
  check_power<T, -1, 4>(by_roots(1));
  check_power<T, 1, 5>(by_roots(1));
  check_power<T, 4, 5>(by_roots(4));
  check_power<T, -3, 5>(by_roots(3));
  check_power<T, 1, 6>(by_roots(1));
  check_power<T, 5, 8>(by_roots(5));
  check_power<T, 3, 10>(by_roots(3));
  check_power<T, 7, 12>(by_roots(7));
  check_power<T, -9, 16>(by_roots(9));
  // |log2 x| <= 66.5
  check_power<T, -8, 27>(2.0 * (1.0 + 66.5 * 8.0 / 27.0));
  check_power<T, 4, 9>(2.0 * (1.0 + 66.5 * 4.0 / 9.0));
  check_power<T, 1, 7>(2.0 * (1.0 + 66.5 / 7.0));
}

#ifndef __FAST_MATH__
bool same(double a, double b) { return (std::isnan(a) && std::isnan(b)) || a == b; }

constexpr double inf = std::numeric_limits<double>::infinity();
constexpr double nan = std::numeric_limits<double>::quiet_NaN();

template <class T>
double lane(const T& x) {
  if constexpr (std::is_same_v<T, double>) {
    return x;
  } else {
    return x[0];
  }
}

template <class T>
void check_ends() {
  for (const double x : {0.0, -0.0, inf, -inf, nan, 1.0, -8.0, 1.7e308, 5e-324}) {
    CAPTURE(x);
    CHECK(same(lane(fast<T>::log(T(x))), std::log(x)));
    CHECK(units_off(lane(fast<T>::cbrt(T(1.7e308))), std::cbrt(1.7e308L)) < 1.0);
    if (!(std::fabs(x) < 1e-300 && x != 0.0)) CHECK(same(lane(fast<T>::cbrt(T(x))), std::cbrt(x)));
  }
  for (const double x : {0.0, inf, -inf, nan, 710.0, -746.0, 1e300, -1e300}) {
    CAPTURE(x);
    CHECK(same(lane(fast<T>::exp(T(x))), std::exp(x)));
  }
  CHECK(lane(fast<T>::exp(T(-708.5))) == 0.0);  // as the comment says
  for (const double x : {0.0, inf, -1.0, -inf, nan}) {
    CAPTURE(x);
    CHECK(same(lane(math::power<1, 3>(T(x))), x < 0.0 ? nan : x));
    CHECK(same(lane(math::power<4, 5>(T(x))), x < 0.0 ? nan : x));
    CHECK(same(lane(math::power<4, 9>(T(x))), x < 0.0 ? nan : x));
    CHECK(same(lane(math::power<5, 8>(T(x))), x < 0.0 ? nan : x));
    const double inverse = x < 0.0 || std::isnan(x) ? nan : 1.0 / x;
    CHECK(same(lane(math::power<-2, 3>(T(x))), inverse));
    CHECK(same(lane(math::power<-1, 4>(T(x))), inverse));
    CHECK(same(lane(math::power<-8, 27>(T(x))), inverse));
  }
}

TEST_CASE("elementary functions: zero, infinity, NaN, overflow") {
  check_ends<double>();
  check_ends<pack>();
}
#endif

}  // namespace

#ifndef __FAST_MATH__
TEST_CASE("elementary functions: error bounds, one at a time and in packs") {
  check_functions<double>();
  check_functions<pack>();
}

TEST_CASE("rational powers: error bounds, one at a time and in packs") {
  check_powers<double>();
  check_powers<pack>();
}

#else
TEST_CASE("elementary functions: close even where sums may be rearranged") {
  const auto exp_l = [](long double x) { return std::exp(x); };
  const auto log_l = [](long double x) { return std::log(x); };
  CHECK(worst<pack>([](const pack& x) { return math::exp(x); }, exp_l, even(-600.0, 700.0)) < 1e3);
  CHECK(worst<pack>([](const pack& x) { return math::log(x); }, log_l, decades(-300.0, 300.0)) <
        10.0);
  check_power<pack, 1, 3>(100.0);
  check_power<pack, 4, 5>(100.0);
  check_power<pack, -9, 16>(100.0);
  check_power<pack, -8, 27>(1e3);
}
#endif

#if !(defined(__clang__) && defined(__AVX512F__))  // see std_simd.hpp
TEST_CASE("packs of a size the machine does not have: as lane by lane") {
  const auto close = [](double y) { return doctest::Approx(y).epsilon(1e-13); };
  const odd_pack x([](auto i) { return 0.3 + 700.0 * static_cast<int>(i); });
  const odd_pack log = math::log(x);
  const odd_pack exp = math::exp(odd_pack(-x));
  const odd_pack cbrt = math::cbrt(x);
  const odd_pack power = math::power<-2, 9>(x);
  const dual<odd_pack> slope = math::power<4, 5>(dual<odd_pack>::variable(x));
  for (std::size_t i = 0; i < 3; ++i) {
    const double one = x[i];
    CHECK(static_cast<double>(log[i]) == close(fast<double>::log(one)));
    CHECK(static_cast<double>(exp[i]) == close(fast<double>::exp(-one)));
    CHECK(static_cast<double>(cbrt[i]) == close(fast<double>::cbrt(one)));
    CHECK(static_cast<double>(power[i]) == close(math::power<-2, 9>(one)));
    CHECK(static_cast<double>(slope.slope[0][i]) == close(0.8 * math::power<-1, 5>(one)));
  }
}
#endif

TEST_CASE("rational powers: the quotient y/x that derivatives use") {
  const auto both = [](double x) { return detail::elementary<double>::both<2, 5>(x); };
  for (const double x : {1e-9, 0.3, 1.0, 7.0, 1e12}) {
    CHECK(both(x).per_x == doctest::Approx(both(x).power / x).epsilon(4e-15));
    const auto inverse = detail::elementary<double>::both<-3, 4>(x);
    CHECK(inverse.per_x == doctest::Approx(inverse.power / x).epsilon(4e-15));
  }
}
