#include "convelope/scalar/xsimd.hpp"

#include <doctest/doctest.h>

#include <array>

#include "convelope/scalar.hpp"
#include "special_numbers.hpp"

using namespace convelope;
using pack = xsimd::batch<double>;

namespace static_test {
static_assert(scalar<pack> && scalar<dual<pack>>);
static_assert(scalar_adaptor<pack>::lanes == static_cast<int>(pack::size));
static_assert(std::is_same_v<common_scalar_t<double, pack>, pack>);
}  // namespace static_test

namespace {

template <class B>
auto lanes_of(const B& b) {
  std::array<typename B::value_type, B::size> a;
  b.store_unaligned(a.data());
  return a;
}
template <class F>
pack filled(F f) {
  std::array<double, pack::size> a;
  for (std::size_t i = 0; i < a.size(); ++i) a[i] = f(i);
  return pack::load_unaligned(a.data());
}

}  // namespace

TEST_CASE("xsimd: bits_where gives the whole word, lane by lane") {
  for (const std::uint64_t word : {std::uint64_t{1}, std::uint64_t{1} << 58,
                                   std::uint64_t{0x7ff0000000000001}, ~std::uint64_t{0}}) {
    for (std::size_t on = 0; on < pack::size; ++on) {
      const pack x = filled([&](std::size_t i) { return i == on ? 1.0 : 0.0; });
      const auto bits = lanes_of(scalar_adaptor<pack>::bits_where(x > pack(0.0), word));
      for (std::size_t i = 0; i < pack::size; ++i) CHECK(bits[i] == (i == on ? word : 0));
    }
  }
}

TEST_CASE("xsimd: each special number in each lane") {
  const auto check = [](double special_one, bool finite) {
    for (std::size_t on = 0; on < pack::size; ++on) {
      const pack x = filled([&](std::size_t i) { return i == on ? special_one : 2.0; });
      const auto bits = lanes_of(scalar_adaptor<pack>::bits_where_not_finite(x, 6));
      for (std::size_t i = 0; i < pack::size; ++i) CHECK(bits[i] == (i == on && !finite ? 6 : 0));
    }
  };
  for (const volatile double& x : special<double>::finite) check(x, true);
  for (const volatile double& x : special<double>::not_finite) check(x, false);
}

TEST_CASE("xsimd: functions, choice and slopes, every lane as the scalar") {
  const pack x = filled([](std::size_t i) { return 0.3 + 1.7 * static_cast<double>(i); });
  const auto in = lanes_of(x);
  const auto near = [](double v) { return doctest::Approx(v).epsilon(1e-15); };
  const auto root = lanes_of(math::sqrt(x));
  const auto cube_root = lanes_of(math::cbrt(x));
  const auto e = lanes_of(math::exp(x));
  const auto l = lanes_of(math::log(x));
  const auto to = lanes_of(math::pow(x, pack(1.25)));
  const auto low = lanes_of(math::smaller(x, pack(1.25)));
  const dual<pack> fifth = math::power<4, 5>(dual<pack>::variable(x));
  const auto fifth_value = lanes_of(fifth.value);
  const auto fifth_slope = lanes_of(fifth.slope[0]);
  for (std::size_t i = 0; i < pack::size; ++i) {
    CHECK(root[i] == near(std::sqrt(in[i])));
    CHECK(cube_root[i] == near(std::cbrt(in[i])));
    CHECK(e[i] == near(std::exp(in[i])));
    CHECK(l[i] == near(std::log(in[i])));
    CHECK(to[i] == near(std::pow(in[i], 1.25)));
    CHECK(low[i] == std::min(in[i], 1.25));
    CHECK(fifth_value[i] == near(std::pow(in[i], 0.8)));
    CHECK(fifth_slope[i] == near(0.8 * std::pow(in[i], -0.2)));
  }
}
