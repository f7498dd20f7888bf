// Forced and natural convection together.

#include <doctest/doctest.h>

#include <cmath>
#include <type_traits>

#include "check.hpp"
#include "convelope/correlations/mixed/blending.hpp"

namespace {

using namespace convelope;
using namespace check;

using assisting = mixed::churchill_assisting_1977<plate_length, height>;
using opposing = mixed::churchill_opposing_1977<plate_length, height>;
using on_diameter = mixed::churchill_assisting_1977<diameter>;

struct point {
  double F, N, n;
};
constexpr point points[] = {
    {10.0, 1.0, 3.0}, {3.0, 100.0, 3.5}, {40.0, 39.0, 4.0}, {7.0, 7.5, 3.0}};

}  // namespace

TEST_SUITE("correlations: mixed") {
  TEST_CASE("values") {
    for (const auto& [F, N, n] : points) {
      const exact a = pow(exact(F), exact(n));
      const exact b = pow(exact(N), exact(n));
      check_value<assisting>(pow(exact(a + b), exact(1) / n), F, N, n);
      check_value<on_diameter>(pow(exact(a + b), exact(1) / n), F, N, n);
    }
    for (const auto& [F, N, n] :
         {point{10.0, 1.0, 3.0}, point{3.0, 100.0, 3.5}, point{4.0, 2.0, 4.0}}) {
      const exact a = pow(exact(F), exact(n));
      const exact b = pow(exact(N), exact(n));
      check_value<opposing>(pow(exact(abs(exact(a - b))), exact(1) / n), F, N, n);
    }
  }

  TEST_CASE("number types and derivatives") {
    check_scalars<assisting>(10.0, 7.0, 3.0);
    check_scalars<assisting>(7.0, 10.0, 3.5);
    check_scalars<opposing>(10.0, 2.0, 3.0);
    check_scalars<opposing>(2.0, 10.0, 4.0);
  }

  TEST_CASE("whole numbers") {
    // 3^3 + 4^3 + 5^3 = 6^3; 9^3 + 10^3 = 12^3 + 1^3
    const double two = assisting::formula(4.0, 5.0, 3.0);
    CHECK(assisting::formula(3.0, two, 3.0) == doctest::Approx(6.0));
    CHECK(assisting::formula(9.0, 10.0, 3.0) ==
          doctest::Approx(assisting::formula(12.0, 1.0, 3.0)));
    CHECK(opposing::formula(6.0, two, 3.0) == doctest::Approx(3.0));
    CHECK(opposing::formula(two, 6.0, 3.0) == doctest::Approx(3.0));
  }

  TEST_CASE("one mode alone, and equal modes") {
    CHECK(assisting::formula(12.0, 0.0, 3.0) == 12.0);
    CHECK(assisting::formula(0.0, 12.0, 3.0) == 12.0);
    CHECK(opposing::formula(12.0, 0.0, 3.0) == 12.0);
    CHECK(opposing::formula(12.0, 12.0, 3.0) == 0.0);  // as published, and flagged
    CHECK(assisting::formula(12.0, 12.0, 3.0) == doctest::Approx(12.0 * std::cbrt(2.0)));
    CHECK(assisting::formula(0.0, 0.0, 3.0) < 1e-29);
    using D = dual<double>;
    const D N = D::variable(0.0);
    const D Nu = assisting::formula(D(12.0), N, D(3.0));
    CHECK(Nu.value == 12.0);
    CHECK(Nu.slope[0] == 0.0);
  }

  TEST_CASE("envelopes") {
    expect_inside<assisting>(0.0, 0.0, 3.0);
    expect_inside<assisting>(10.0, 10.0, 4.0);
    expect_crossed<assisting>(0, side::below, -1e-9, 10.0, 3.0);
    expect_crossed<assisting>(1, side::below, 10.0, -1e-9, 3.0);
    expect_crossed<assisting>(2, side::below, 10.0, 1.0, below(3.0));
    expect_crossed<assisting>(2, side::above, 10.0, 1.0, above(4.0));
    expect_not_finite<assisting>(10.0, 1.0, 3.0);
    expect_inside<opposing>(10.0, 0.0, 3.0);
    expect_inside<opposing>(0.0, 10.0, 4.0);
    expect_also_crossed<opposing>(0, side::below, -1e-9, 10.0, 3.0);
    expect_also_crossed<opposing>(1, side::below, 10.0, -1e-9, 3.0);
    expect_also_crossed<opposing>(3, side::below, 10.0, -1e-9, 3.0);
    expect_crossed<opposing>(2, side::below, 10.0, 1.0, below(3.0));
    expect_crossed<opposing>(2, side::above, 10.0, 1.0, above(4.0));
    expect_inside<opposing>(3.0, below(1.0), 3.0);
    expect_inside<opposing>(below(1.0), 3.0, 3.0);
    expect_crossed<opposing>(3, side::above, 3.0, above(1.0), 3.0);
    expect_crossed<opposing>(3, side::above, above(1.0), 3.0, 3.0);
    expect_crossed<opposing>(3, side::above, 5.0, 5.0, 3.0);
    expect_not_finite<opposing>(10.0, 1.0, 3.0);
  }

  TEST_CASE("the two Nusselt numbers keep their lengths") {
    using forced = typed<kinds::nusselt<kinds::plate_length>>;
    using natural = typed<kinds::nusselt<kinds::height>>;
    using round = typed<kinds::nusselt<kinds::diameter>>;
    using n = typed<kinds::blending_exponent>;
    CHECK(std::is_invocable_v<assisting, forced, natural, n>);
    CHECK_FALSE(std::is_invocable_v<assisting, natural, forced, n>);
    CHECK_FALSE(std::is_invocable_v<on_diameter, round, natural, n>);
    CHECK(std::is_invocable_v<on_diameter, round, round, n>);
  }

  TEST_CASE("a Nusselt number from outside its range is remembered") {
    using namespace convelope;
    const auto n = blending_exponent(3.0);
    const auto F = nusselt_of<diameter>(20.0);
    CHECK(on_diameter{}(F, nusselt_of<diameter>(5.0), n).inside());
    const auto blended = on_diameter{}(nusselt_of<diameter>(-1.0), F, n);
    CHECK_FALSE(blended.inside());
    const auto again = on_diameter{}(blended, F, n);
    CHECK(again.verdict().input_outside());
  }
}
