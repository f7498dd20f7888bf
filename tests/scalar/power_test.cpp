#include "convelope/scalar/power.hpp"

#include <doctest/doctest.h>

#include <boost/multiprecision/cpp_bin_float.hpp>
#include <numeric>

#include "convelope/scalar/std_simd.hpp"

using namespace convelope;
using exact = boost::multiprecision::cpp_bin_float_50;

namespace {

// The exponents that formulas use, and neighbours. By roots:
template <int P, int Q>
struct exponent {
  static constexpr int p = P;
  static constexpr int q = Q;
};
template <class... E>
struct exponents {};
using by_roots =
    exponents<exponent<1, 1>, exponent<2, 1>, exponent<3, 1>, exponent<4, 1>, exponent<6, 1>,
              exponent<10, 1>, exponent<1, 2>, exponent<3, 2>, exponent<7, 2>, exponent<1, 3>,
              exponent<2, 3>, exponent<4, 3>, exponent<1, 4>, exponent<3, 4>, exponent<5, 4>,
              exponent<1, 6>, exponent<5, 6>, exponent<1, 8>, exponent<5, 8>, exponent<1, 12>,
              exponent<5, 12>, exponent<11, 12>, exponent<9, 16>, exponent<15, 16>, exponent<-1, 1>,
              exponent<-3, 1>, exponent<-1, 2>, exponent<-1, 3>, exponent<-2, 3>, exponent<-1, 4>,
              exponent<4, 8>, exponent<10, 4>>;
using by_logarithm =
    exponents<exponent<1, 5>, exponent<3, 5>, exponent<4, 5>, exponent<-1, 5>, exponent<8, 5>,
              exponent<2, 9>, exponent<-2, 9>, exponent<-4, 9>, exponent<-16, 9>, exponent<8, 27>,
              exponent<-8, 27>, exponent<2, 7>, exponent<1, 7>, exponent<1, 10>, exponent<9, 10>,
              exponent<11, 50>, exponent<-21, 50>, exponent<-4, 25>, exponent<-8, 25>,
              exponent<81, 100>, exponent<111, 100>, exponent<6, 10>>;

/// Bounds of the comment on power, in units in the last place of T.
template <class E>
double by_roots_bound(double) {
  return 2.0 * std::abs(E::p) / std::gcd(E::p, E::q);
}
template <class E>
double by_logarithm_bound(double x) {
  return 1.5 * (1.0 + std::fabs(std::log(x)) * std::abs(E::p) / E::q);
}

template <class T>
double units_off(const T& got, const exact& want) {
  const exact error = abs(exact(got) - want) / abs(want);
  return static_cast<double>(error) / static_cast<double>(std::numeric_limits<T>::epsilon());
}

template <class E>
exact wanted(double x) {
  return pow(exact(x), exact(E::p) / E::q);
}

template <class E, class Bound>
void check_value(double x, Bound bound) {
  const exact want = wanted<E>(x);
  CAPTURE(E::p);
  CAPTURE(E::q);
  CAPTURE(x);
  const double limit = bound(x);
  const auto power = []<class T>(const T& y) { return math::power<E::p, E::q>(y); };
  CHECK(units_off<double>(power(x), want) < limit);
  CHECK(units_off<long double>(power(static_cast<long double>(x)), want) < limit);
  CHECK(units_off<double>(power(dual<double>(x)).value, want) < limit);
  CHECK(units_off<double>(power(dual<dual<double>>(x)).value.value, want) < limit);
  using pack = std::experimental::native_simd<double>;
  const pack lanes = power(pack(x));
  for (std::size_t i = 0; i < pack::size(); ++i) {
    CHECK(units_off<double>(lanes[i], want) < limit);
  }
  // Single precision: x as float, where the result is a normal number.
  const float f = static_cast<float>(x);
  const exact want_f = wanted<E>(f);
  if (want_f < 1e37 && want_f > 1e-36) {
    CHECK(units_off<float>(power(dual<float, 0>(f)).value, want_f) < limit);
  }
}

/// x d/dx x^n = n x^n, and once more.
template <class E, class Bound>
void check_slopes(double x, Bound bound) {
  const exact n = exact(E::p) / E::q;
  const exact want = wanted<E>(x);
  const double limit = bound(x) + 4.0;
  CAPTURE(E::p);
  CAPTURE(E::q);
  CAPTURE(x);
  using D = dual<double>;
  const D y = math::power<E::p, E::q>(D::variable(x));
  CHECK(units_off<double>(y.slope[0], n * want / x) < limit);
  const dual<D> z = math::power<E::p, E::q>(dual<D>::variable(D::variable(x)));
  CHECK(units_off<double>(z.slope[0].value, n * want / x) < limit);
  const exact second = n * (n - 1) * want / (exact(x) * x);
  if (second != 0) {
    CHECK(units_off<double>(z.slope[0].slope[0], second) < 20.0 * limit);
  } else {
    CHECK(z.slope[0].slope[0] == 0.0);
  }
}

template <class... E, class F>
void for_each_exponent(exponents<E...>, F f) {
  (f.template operator()<E>(), ...);
}

template <class F>
void over_the_range(F f) {
  for (double e = -12.0; e < 14.0; e += 1.37) f(std::pow(10.0, e));
  f(1.0);
}

}  // namespace

namespace static_test {
static_assert(math::power<0>(7.0) == 1.0);
static_assert(math::power<1>(7.0) == 7.0);
static_assert(math::power<5>(2.0) == 32.0);
static_assert(math::power<-2>(2.0) == 0.25);
static_assert(math::power<6, 3>(3.0) == 9.0, "lowest terms first");
}  // namespace static_test

TEST_CASE("powers by roots: within the stated error on every number type") {
  for_each_exponent(by_roots{}, []<class E>() {
    over_the_range([](double x) { check_value<E>(x, by_roots_bound<E>); });
  });
}

TEST_CASE("powers by the exp/log pair: within the stated error on every number type") {
  for_each_exponent(by_logarithm{}, []<class E>() {
    over_the_range([](double x) { check_value<E>(x, by_logarithm_bound<E>); });
  });
}

TEST_CASE("powers: first and second derivatives") {
  for_each_exponent(by_roots{}, []<class E>() {
    for (const double x : {3e-7, 0.4, 2.5e5}) check_slopes<E>(x, by_roots_bound<E>);
  });
  for_each_exponent(by_logarithm{}, []<class E>() {
    for (const double x : {3e-7, 0.4, 2.5e5}) check_slopes<E>(x, by_logarithm_bound<E>);
  });
}

TEST_CASE("powers at zero") {
  CHECK(math::power<1, 3>(0.0) == 0.0);
  CHECK(math::power<5, 8>(0.0) == 0.0);
  CHECK(math::power<7, 2>(0.0) == 0.0);
  using D = dual<double>;
  CHECK(math::power<1>(D::variable(0.0)).slope[0] == 1.0);
  CHECK(math::power<2>(D::variable(0.0)).slope[0] == 0.0);
  CHECK(math::power<4>(D::variable(0.0)).slope[0] == 0.0);
}
