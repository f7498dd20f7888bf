#include "convelope/scalar/std_simd.hpp"

#include <doctest/doctest.h>

#include "convelope/scalar.hpp"
#include "special_numbers.hpp"

using namespace convelope;
namespace stdx = std::experimental;

namespace static_test {
using pack = stdx::native_simd<double>;
static_assert(scalar<pack> && scalar<dual<pack>>);
static_assert(scalar_adaptor<dual<pack>>::lanes == static_cast<int>(pack::size()));
static_assert(std::is_same_v<plain_t<dual<pack>>, pack>);
static_assert(bits_t<stdx::native_simd<float>>::size() == stdx::native_simd<float>::size());
static_assert(std::is_same_v<typename bits_t<stdx::native_simd<float>>::value_type, std::uint64_t>);
}  // namespace static_test

#define PACKS                                                                            \
  stdx::native_simd<double>, stdx::fixed_size_simd<double, 3>, stdx::native_simd<float>, \
      stdx::fixed_size_simd<float, 5>

TEST_CASE_TEMPLATE("bits_where: the whole word, lane by lane", P, PACKS) {
  using adaptor = scalar_adaptor<P>;
  using V = typename P::value_type;
  // Among them words that are NaN or denormal when read as a double.
  for (const std::uint64_t word : {std::uint64_t{1}, std::uint64_t{1} << 58,
                                   std::uint64_t{0x7ff0000000000001}, ~std::uint64_t{0}}) {
    for (std::size_t on = 0; on < P::size(); ++on) {
      const P x([&](auto i) { return i == on ? V(1) : V(0); });
      const auto bits = adaptor::bits_where(x > P(V(0)), word);
      for (std::size_t i = 0; i < P::size(); ++i) CHECK(bits[i] == (i == on ? word : 0));
    }
  }
}

TEST_CASE_TEMPLATE("bits_where_not_finite: each special number in each lane", P, PACKS) {
  using adaptor = scalar_adaptor<P>;
  using V = typename P::value_type;
  const std::uint64_t word = (std::uint64_t{1} << 62) | 5;
  const auto check = [&](V special_one, bool finite) {
    for (std::size_t on = 0; on < P::size(); ++on) {
      const P x([&](auto i) { return i == on ? special_one : V(2); });
      const auto bits = adaptor::bits_where_not_finite(x, word);
      const auto through_dual = scalar_adaptor<dual<P>>::bits_where_not_finite(dual<P>(x), word);
      for (std::size_t i = 0; i < P::size(); ++i) {
        CHECK(bits[i] == (i == on && !finite ? word : 0));
        CHECK(through_dual[i] == bits[i]);
      }
    }
  };
  for (const volatile V& x : special<V>::finite) check(x, true);
  for (const volatile V& x : special<V>::not_finite) check(x, false);
}

TEST_CASE_TEMPLATE("functions and choice: every lane as the scalar", P, PACKS) {
  using V = typename P::value_type;
  const P x([](auto i) { return V(0.3) + V(1.7) * V(static_cast<int>(i)); });
  const P y(V(1.25));
  const P root = math::sqrt(x);
  const P cube_root = math::cbrt(x);
  const P e = math::exp(x);
  const P l = math::log(x);
  const P to_y = math::pow(x, y);
  const P low = math::smaller(x, y);
  const P high = math::larger(x, y);
  const auto near = [](V v) {
    return doctest::Approx(v).epsilon(4.0 * static_cast<double>(std::numeric_limits<V>::epsilon()));
  };
  for (std::size_t i = 0; i < P::size(); ++i) {
    const V v = x[i];
    CHECK(V(root[i]) == near(std::sqrt(v)));
    CHECK(V(cube_root[i]) == near(std::cbrt(v)));
    CHECK(V(e[i]) == near(std::exp(v)));
    CHECK(V(l[i]) == near(std::log(v)));
    CHECK(V(to_y[i]) == near(std::pow(v, V(1.25))));
    CHECK(V(low[i]) == std::min(v, V(1.25)));
    CHECK(V(high[i]) == std::max(v, V(1.25)));
  }
}

TEST_CASE("slopes in every lane") {
  using pack = stdx::native_simd<double>;
  using D = dual<pack>;
  const pack x([](auto i) { return 2.0 + static_cast<int>(i); });
  const D y = math::joined<4>(math::power<2>(D::variable(x)), D(pack(3.0)));
  for (std::size_t i = 0; i < pack::size(); ++i) {
    const dual<double> alone =
        math::joined<4>(math::power<2>(dual<double>::variable(x[i])), dual<double>(3.0));
    CHECK(double(y.value[i]) == alone.value);
    CHECK(double(y.slope[0][i]) == alone.slope[0]);
  }
}
