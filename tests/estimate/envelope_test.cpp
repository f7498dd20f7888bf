#include "convelope/estimate/envelope.hpp"

#include <doctest/doctest.h>

#include "convelope/kinds.hpp"
#include "convelope/scalar/std_simd.hpp"

using namespace convelope;
using convelope::detail::word::of_correlation;

namespace static_test {

constexpr auto nothing = within();
static_assert(nothing.count == 0 && nothing.check<double, kinds::prandtl>(-1e9) == 0);

constexpr auto one = within(limit<prandtl_number>(0.6, 60.0));
static_assert(one.count == 1);
static_assert(one.check<double, kinds::prandtl>(0.6) == 0);
static_assert(one.check<double, kinds::prandtl>(60.0) == 0);
static_assert(one.check<double, kinds::prandtl>(0.59) == of_correlation(0, 0, side::below));
static_assert(one.check<double, kinds::prandtl>(60.1) == of_correlation(0, 0, side::above));

// The kind decides which input a limit is on, not the place.
constexpr auto second = within(limit<graetz_number>(1.0, 2.0));
static_assert(second.check<double, kinds::prandtl, kinds::graetz>(9.0, 1.5) == 0);
static_assert(second.check<double, kinds::prandtl, kinds::graetz>(1.5, 9.0) ==
              of_correlation(0, 0, side::above));

// Six limits, the last on a group of all inputs.
constexpr auto Pr = limit<prandtl_number>(0.0, 1.0);
constexpr auto full =
    within(Pr, Pr, Pr, Pr, Pr, limit_on("Gz/Pr", 10.0, 20.0, [](auto a, auto b) { return b / a; }));
static_assert(full.count == 6);
static_assert(full.check<double, kinds::prandtl, kinds::graetz>(1.0, 20.0) == 0);
static_assert(full.check<double, kinds::prandtl, kinds::graetz>(0.5, 1.0) ==
              of_correlation(0, 5, side::below));

// No bound, no bit.
constexpr auto open =
    within(limit<prandtl_number>(-unbounded, 1.0), limit<graetz_number>(1.0, unbounded));
static_assert(open.check<double, kinds::prandtl, kinds::graetz>(-1e308, 1e308) == 0);
static_assert(open.check<double, kinds::prandtl, kinds::graetz>(2.0, 0.0) ==
              (of_correlation(0, 0, side::above) | of_correlation(0, 1, side::below)));

static_assert(within(Pr).check<float, kinds::prandtl>(1.5F) == of_correlation(0, 0, side::above));
static_assert(within(Pr).check<long double, kinds::prandtl>(-0.5L) ==
              of_correlation(0, 0, side::below));

}  // namespace static_test

TEST_CASE("an envelope in every lane") {
  using pack = std::experimental::native_simd<double>;
  const auto range = within(limit<prandtl_number>(1.0, 2.0));
  const auto bits = range.check<pack, kinds::prandtl>(pack([](auto i) { return 2.0 * i; }));
  CHECK(bits[0] == of_correlation(0, 0, side::below));
  for (std::size_t i = 1; i < pack::size(); ++i) {
    CHECK(bits[i] == (i == 1 ? 0 : of_correlation(0, 0, side::above)));
  }
}
