#include "convelope/scalar/dual.hpp"

#include <doctest/doctest.h>

#include <cmath>
#include <concepts>

using namespace convelope;
using D = dual<double>;
using D2 = dual<double, 2>;
using DD = dual<D>;

namespace static_test {

static_assert(std::is_trivially_copyable_v<D> && std::is_trivially_default_constructible_v<D>);
static_assert(sizeof(D) == 2 * sizeof(double) && sizeof(D2) == 3 * sizeof(double));
static_assert(std::is_nothrow_copy_constructible_v<DD> && std::is_nothrow_destructible_v<DD>);
static_assert(std::convertible_to<double, D> && std::convertible_to<int, D>);
static_assert(std::convertible_to<D, DD> && std::convertible_to<double, DD>);
static_assert(!std::convertible_to<D, double>, "a derivative is never dropped by accident");
static_assert(!std::convertible_to<DD, D>);

constexpr D two = D::variable(2.0);
static_assert((3.0 * two + 1.0).value == 7.0 && (3.0 * two + 1.0).slope[0] == 3.0);
static_assert((two * two).slope[0] == 4.0);
static_assert((1.0 / two).slope[0] == -0.25);
static_assert((-two).slope[0] == -1.0);
static_assert(two < 3.0 && two > 1.0 && two <= 2.0 && two >= 2.0);

}  // namespace static_test

namespace {

doctest::Approx near(double x) { return doctest::Approx(x).epsilon(1e-14); }

// f on a dual against its exact derivative, first and second.
template <class F>
void check(F f, double x, double value, double slope, double curvature) {
  const D y = f(D::variable(x));
  CHECK(y.value == near(value));
  CHECK(y.slope[0] == near(slope));
  const DD z = f(DD::variable(D::variable(x)));
  CHECK(z.value.value == near(value));
  CHECK(z.value.slope[0] == near(slope));
  CHECK(z.slope[0].value == near(slope));
  CHECK(z.slope[0].slope[0] == near(curvature));
}

}  // namespace

TEST_CASE("elementary functions: value, slope, curvature") {
  const double x = 1.7;
  check([](const auto& a) { return math::sqrt(a); }, x, std::sqrt(x), 0.5 / std::sqrt(x),
        -0.25 / (x * std::sqrt(x)));
  check([](const auto& a) { return math::cbrt(a); }, x, std::cbrt(x),
        1.0 / (3.0 * std::cbrt(x) * std::cbrt(x)), -2.0 / (9.0 * x * std::cbrt(x) * std::cbrt(x)));
  check([](const auto& a) { return math::exp(a); }, x, std::exp(x), std::exp(x), std::exp(x));
  check([](const auto& a) { return math::log(a); }, x, std::log(x), 1.0 / x, -1.0 / (x * x));
  check([]<class T>(const T& a) { return math::pow(a, a); }, x, std::pow(x, x),
        std::pow(x, x) * (1.0 + std::log(x)),
        std::pow(x, x) * ((1.0 + std::log(x)) * (1.0 + std::log(x)) + 1.0 / x));
}

TEST_CASE("arithmetic with constants on either side, and with another dual") {
  const double x = 1.7;
  check([](const auto& a) { return 3.0 - a; }, x, 1.3, -1.0, 0.0);
  check([](const auto& a) { return a - 3.0; }, x, -1.3, 1.0, 0.0);
  check([](const auto& a) { return a / 4.0; }, x, 0.425, 0.25, 0.0);
  check([](const auto& a) { return 2.0 / a; }, x, 2.0 / x, -2.0 / (x * x), 4.0 / (x * x * x));
  check([]<class T>(const T& a) { return T((a + 1.0) / (a * a)); }, x, 2.7 / (x * x),
        -1.0 / (x * x) - 2.0 / (x * x * x), 2.0 / (x * x * x) + 6.0 / (x * x * x * x));
  check(
      []<class T>(const T& a) {
        T b = a;
        b += a;
        b *= a;
        b -= T(1.0);
        b /= T(2.0);
        return b;  // (2 a^2 - 1) / 2
      },
      x, x * x - 0.5, 2.0 * x, 2.0);
}

TEST_CASE("two directions keep apart") {
  const D2 x = D2::variable(3.0, 0);
  const D2 y = D2::variable(4.0, 1);
  const D2 z = math::sqrt(D2(x * x + y * y));
  CHECK(z.value == near(5.0));
  CHECK(z.slope[0] == near(0.6));
  CHECK(z.slope[1] == near(0.8));
  CHECK((x / y).slope[0] == near(0.25));
  CHECK((x / y).slope[1] == near(-3.0 / 16.0));
}

TEST_CASE("single precision stays single: literals do not widen it") {
  using F = dual<float, 0>;
  static_assert(std::is_same_v<decltype(0.62 * F(2.0F)), F>);
  CHECK((0.1 * F(3.0F)).value == 0.1F * 3.0F);
  const dual<float> y = math::log(dual<float>::variable(2.0F));
  CHECK(y.slope[0] == 0.5F);
}
