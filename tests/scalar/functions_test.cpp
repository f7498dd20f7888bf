#include "convelope/scalar/functions.hpp"

#include <doctest/doctest.h>

#include <complex>
#include <string>

#include "convelope/scalar/std_simd.hpp"
#include "host_number.hpp"

using namespace convelope;

namespace static_test {

using pack = std::experimental::native_simd<double>;
using D = dual<double>;

static_assert(scalar<double> && scalar<float> && scalar<long double>);
static_assert(scalar<D> && scalar<dual<D>> && scalar<dual<float, 0>> && scalar<dual<double, 7>>);
static_assert(scalar<pack> && scalar<dual<pack>> && scalar<host_lib::number>);
static_assert(!scalar<int> && !scalar<bool> && !scalar<unsigned long> && !scalar<char>);
static_assert(!scalar<const char*> && !scalar<std::string> && !scalar<std::complex<double>>);
static_assert(!scalar<host_lib::unordered>);

static_assert(std::is_same_v<common_scalar_t<>, double>);
static_assert(std::is_same_v<common_scalar_t<float>, float>);
static_assert(std::is_same_v<common_scalar_t<float, float>, float>);
static_assert(std::is_same_v<common_scalar_t<float, double>, double>);
static_assert(std::is_same_v<common_scalar_t<double, float>, double>);
static_assert(std::is_same_v<common_scalar_t<float, double, long double>, long double>);
static_assert(std::is_same_v<common_scalar_t<double, D>, D>);
static_assert(std::is_same_v<common_scalar_t<D, double>, D>);
static_assert(std::is_same_v<common_scalar_t<D, dual<D>>, dual<D>>);
static_assert(std::is_same_v<common_scalar_t<dual<D>, double, D>, dual<D>>);
static_assert(std::is_same_v<common_scalar_t<double, pack, double>, pack>);
static_assert(std::is_same_v<common_scalar_t<pack, dual<pack>>, dual<pack>>);
static_assert(std::is_same_v<common_scalar_t<dual<pack>, double>, dual<pack>>);
static_assert(std::is_same_v<common_scalar_t<double, host_lib::number>, host_lib::number>);
// void: a choice, which is no number.
static_assert(std::is_same_v<common_scalar_t<void>, double>);
static_assert(std::is_same_v<common_scalar_t<void, float>, float>);
static_assert(std::is_same_v<common_scalar_t<D, void, double, void>, D>);

static_assert(math::select(true, 1.0, 2.0) == 1.0);
static_assert(math::smaller(1.0, 2.0) == 1.0 && math::smaller(2.0, 1.0) == 1.0);
static_assert(math::larger(1.0, 2.0) == 2.0 && math::larger(2.0, 1.0) == 2.0);
static_assert(math::square(-3.0) == 9.0);
static_assert(plain(dual<D>(3.0)) == 3.0);

}  // namespace static_test

TEST_CASE("elementary functions, each by an identity") {
  CHECK(math::sqrt(2.25) == 1.5);
  CHECK(math::cbrt(3.375) == doctest::Approx(1.5).epsilon(1e-15));
  CHECK(math::cbrt(-8.0) == doctest::Approx(-2.0).epsilon(1e-15));
  CHECK(math::exp(1.0) == doctest::Approx(2.718281828459045).epsilon(1e-15));
  CHECK(math::log(2.718281828459045) == doctest::Approx(1.0).epsilon(1e-15));
  CHECK(math::pow(2.0, 0.5) == doctest::Approx(1.4142135623730951).epsilon(1e-15));
  CHECK(math::sqrt(2.25F) == 1.5F);
  CHECK(math::pow(4.0F, 1.5F) == doctest::Approx(8.0F));
}

TEST_CASE("the smaller and the larger keep the slopes of what they chose") {
  using D = dual<double>;
  const D a = D::variable(2.0);
  const D b(3.0);
  CHECK(math::smaller(a, b).slope[0] == 1.0);
  CHECK(math::smaller(b, a).slope[0] == 1.0);
  CHECK(math::larger(a, b).slope[0] == 0.0);
  CHECK(math::larger(b, a).value == 3.0);
  CHECK(math::select(a < b, D(a * a), b).slope[0] == 4.0);
  CHECK(math::select(a > b, D(a * a), b).value == 3.0);
}
