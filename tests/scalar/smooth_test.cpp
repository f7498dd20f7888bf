#include "convelope/scalar/smooth.hpp"

#include <doctest/doctest.h>

#include <limits>

#include "convelope/scalar/dual.hpp"
#include "convelope/scalar/std_simd.hpp"

using namespace convelope;
using D = dual<double>;
using DD = dual<D>;
using pack = std::experimental::native_simd<double>;

namespace {

struct bend {
  double value, slope, curvature;
};
bend hand_over_at(double x, double from, double to) {
  const DD y = math::hand_over(DD::variable(D::variable(x)), from, to);
  return {y.value.value, y.slope[0].value, y.slope[0].slope[0]};
}
doctest::Approx near(double x) { return doctest::Approx(x).epsilon(1e-13); }

}  // namespace

TEST_CASE("hand_over: 0 and 1 outside, half way in the middle") {
  for (const double x : {-1e9, 0.0, 2.0}) CHECK(math::hand_over(x, 2.0, 6.0) == 0.0);
  for (const double x : {6.0, 7.0, 1e9}) CHECK(math::hand_over(x, 2.0, 6.0) == 1.0);
  const bend middle = hand_over_at(4.0, 2.0, 6.0);
  CHECK(middle.value == near(0.5));
  CHECK(middle.slope == near(15.0 / 8.0 / 4.0));  // s'(1/2) = 15/8 of 6 s^5 - 15 s^4 + 10 s^3
  CHECK(std::fabs(middle.curvature) < 1e-14);
  CHECK(math::hand_over(3.0, 2.0, 6.0) == near(6.0 / 1024 - 15.0 / 256 + 10.0 / 64));
}

TEST_CASE("hand_over: value, slope and curvature meet at both ends") {
  for (const double end : {2.0, 6.0}) {
    for (const double aside : {-1e-6, 0.0, 1e-6}) {
      const bend b = hand_over_at(end + aside, 2.0, 6.0);
      CHECK(std::fabs(b.value - (end == 2.0 ? 0.0 : 1.0)) < 1e-15);
      CHECK(std::fabs(b.slope) < 1e-11);
      CHECK(std::fabs(b.curvature) < 1e-5);
    }
    CHECK(hand_over_at(end, 2.0, 6.0).slope == 0.0);
    CHECK(hand_over_at(end, 2.0, 6.0).curvature == 0.0);
  }
}

TEST_CASE("hand_over: never falls, stays between 0 and 1") {
  double before = 0.0;
  for (double x = 1.9; x < 6.1; x += 0.01) {
    const double y = math::hand_over(x, 2.0, 6.0);
    CHECK(y >= before);
    CHECK(y <= 1.0);
    before = y;
  }
}

TEST_CASE("hand_over: NaN in, NaN out; lane by lane") {
  const double nan = std::numeric_limits<double>::quiet_NaN();
  CHECK(std::isnan(math::hand_over(nan, 2.0, 6.0)));
  const pack y = math::hand_over(pack([](auto i) { return i == 0 ? 3.0 : 9.0; }), 2.0, 6.0);
  CHECK(y[0] == math::hand_over(3.0, 2.0, 6.0));
  for (std::size_t i = 1; i < pack::size(); ++i) CHECK(y[i] == 1.0);
}

TEST_CASE("smooth_magnitude and smooth_sign: |x| and sign far off, finite slopes at zero") {
  CHECK(math::smooth_magnitude(4.0, 3.0) == 5.0);
  CHECK(math::smooth_magnitude(-4.0, 3.0) == 5.0);
  CHECK(math::smooth_magnitude(-1e6, 1e-3) == near(1e6));
  const D zero = math::smooth_magnitude(D::variable(0.0), 1e-6);
  CHECK(zero.value == near(1e-6));
  CHECK(zero.slope[0] == 0.0);
  CHECK(math::smooth_magnitude(D::variable(4.0), 3.0).slope[0] == near(0.8));

  CHECK(math::smooth_sign(4.0, 3.0) == near(0.8));
  CHECK(math::smooth_sign(-1e9, 1e-3) == near(-1.0));
  const D sign = math::smooth_sign(D::variable(0.0), 0.5);
  CHECK(sign.value == 0.0);
  CHECK(sign.slope[0] == near(2.0));  // 1/r
}

TEST_CASE("weighted: the ends exactly, the slopes of both") {
  CHECK(math::weighted(3.0, 7.0, 0.0) == 3.0);
  CHECK(math::weighted(3.0, 7.0, 1.0) == 7.0);
  CHECK(math::weighted(3.0, 7.0, 0.25) == 4.0);
  CHECK(math::weighted(D::variable(3.0), D(7.0), D(0.25)).slope[0] == 0.75);
}

TEST_CASE("joined: the larger alone where the other vanishes, symmetric, 2^(1/n) where equal") {
  CHECK(math::joined<4>(3.0, 0.0) == near(3.0));
  CHECK(math::joined<10>(0.0, 3.0) == near(3.0));
  CHECK(math::joined<3>(2.0, 5.0) == near(std::cbrt(133.0)));
  CHECK(math::joined<3>(5.0, 2.0) == math::joined<3>(2.0, 5.0));
  CHECK(math::joined<2>(3.0, 4.0) == near(5.0));
  CHECK(math::joined<6>(7.0, 7.0) == near(7.0 * std::pow(2.0, 1.0 / 6.0)));
  CHECK(math::joined<10>(7.0, 7.0) == near(7.0 * std::pow(2.0, 0.1)));
  // d/da = (a/y)^(n-1)
  CHECK(math::joined<2>(D::variable(3.0), D(4.0)).slope[0] == near(0.6));
}
