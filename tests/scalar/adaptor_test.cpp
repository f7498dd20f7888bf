#include "convelope/scalar/adaptor.hpp"

#include <doctest/doctest.h>

#include "convelope/scalar.hpp"
#include "host_number.hpp"
#include "special_numbers.hpp"

using namespace convelope;
using host_lib::number;

namespace static_test {

static_assert(scalar_adaptor<double>::lanes == 1);
static_assert(std::is_same_v<plain_t<double>, double>);
static_assert(std::is_same_v<plain_t<dual<dual<float, 2>>>, float>);
static_assert(std::is_same_v<plain_t<number>, number>);
static_assert(std::is_same_v<bits_t<long double>, std::uint64_t>);
static_assert(std::is_same_v<bits_t<number>, std::uint64_t>);
static_assert(std::is_same_v<working_t<double>, double>);
static_assert(std::is_same_v<working_t<float>, dual<float, 0>>, "literals are doubles");
static_assert(std::is_same_v<working_t<number>, number>);

static_assert(scalar_adaptor<float>::constant(0.1) == 0.1F);
static_assert(scalar_adaptor<double>::bits_where(true, 5) == 5);
static_assert(scalar_adaptor<double>::bits_where(false, 5) == 0);
static_assert(scalar_adaptor<float>::select(false, 1.0F, 2.0F) == 2.0F);

}  // namespace static_test

TEST_CASE_TEMPLATE("what is not finite is known by its bits", T, float, double, long double,
                   dual<double>, dual<dual<double>>, dual<float, 3>) {
  using P = plain_t<T>;
  using edges = special<std::conditional_t<std::is_same_v<P, long double>, double, P>>;
  for (const auto x : edges::finite) {
    CHECK(scalar_adaptor<T>::bits_where_not_finite(T(P(x)), 6) == 0);
  }
  for (const auto x : edges::not_finite) {
    CHECK(scalar_adaptor<T>::bits_where_not_finite(T(P(x)), 6) == 6);
  }
}

TEST_CASE("a host's number: its functions are found beside it") {
  using adaptor = scalar_adaptor<number>;
  const auto as_double = [](const number& x) { return static_cast<double>(x); };
  CHECK(as_double(math::sqrt(number(9.0))) == 3.0);
  CHECK(as_double(math::cbrt(number(27.0))) == doctest::Approx(3.0).epsilon(1e-15));
  CHECK(as_double(math::log(math::exp(number(2.0)))) == doctest::Approx(2.0).epsilon(1e-15));
  CHECK(as_double(math::pow(number(2.0), number(10.0))) == doctest::Approx(1024.0));
  CHECK(as_double(math::select(number(1.0) < number(2.0), number(3.0), number(4.0))) == 3.0);
  CHECK(as_double(math::power<4, 5>(number(32.0))) == doctest::Approx(16.0).epsilon(1e-15));
  CHECK(as_double(math::joined<4>(number(2.0), number(2.0))) ==
        doctest::Approx(2.0 * std::sqrt(std::sqrt(2.0))));
  for (const double x : special<double>::finite) {
    CHECK(adaptor::bits_where_not_finite(number(x), 6) == 0);
  }
  for (const volatile double& x : special<double>::not_finite) {
    CHECK(adaptor::bits_where_not_finite(number(double(x)), 6) == 6);
  }
}

TEST_CASE("a host's number: derivatives on top of it") {
  using D = dual<number>;
  const D y = math::power<1, 2>(D::variable(number(16.0)));
  CHECK(static_cast<double>(y.value) == 4.0);
  CHECK(static_cast<double>(y.slope[0]) == 0.125);
}
