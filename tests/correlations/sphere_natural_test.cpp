// Natural convection on a sphere.

#include "convelope/correlations/natural/sphere_natural.hpp"

#include <doctest/doctest.h>

#include <cmath>

#include "check.hpp"

namespace {

using namespace convelope;
using namespace check;

exact bracket(double Pr) { return 1 + pow(exact(exact("0.469") / Pr), exact(9) / 16); }

struct point {
  double Ra, Pr;
};
constexpr point points[] = {{1.0, 0.71}, {2.5e3, 0.9}, {3.3e6, 7.0}, {1e8, 0.71}, {8e10, 100.0}};

}  // namespace

TEST_SUITE("correlations: sphere, natural") {
  TEST_CASE("values") {
    for (const auto& [Ra, Pr] : points) {
      check_value<sphere::churchill_laminar_1983>(
          2 + exact("0.589") * pow(exact(Ra), exact(1) / 4) / pow(bracket(Pr), exact(4) / 9), Ra,
          Pr);
      const exact P = pow(bracket(Pr), exact(16) / 9);
      check_value<sphere::churchill_1983>(
          2 + exact("0.589") * pow(exact(Ra), exact(1) / 4) / pow(P, exact(1) / 4) *
                  pow(exact(1 + exact("7.44e-8") * Ra / P), exact(1) / 12),
          Ra, Pr);
      check_value<sphere::yuge_1960>(2 + exact("0.43") * pow(exact(Ra), exact(1) / 4), Ra);
    }
  }

  TEST_CASE("number types and derivatives") {
    check_scalars<sphere::churchill_laminar_1983>(3.3e6, 0.8);
    check_scalars<sphere::churchill_1983>(3.3e8, 0.7);
    check_scalars<sphere::yuge_1960>(3.3e3);
  }

  TEST_CASE("no buoyancy leaves pure conduction") {
    // Nu_D = 2: the exact solution of Laplace's equation outside a sphere
    CHECK(sphere::churchill_laminar_1983::formula(0.0, 0.71) == 2.0);
    CHECK(sphere::churchill_1983::formula(0.0, 0.71) == 2.0);
    CHECK(sphere::yuge_1960::formula(0.0) == 2.0);
  }

  TEST_CASE("laminar coefficient from the gravity integral") {
    // A thin laminar layer at Pr -> inf on a surface of revolution, radius sin(phi), gravity
    // g sin(phi) along it: Nu_D = 0.6703 2^(-3/4) B(4/3, 1/2)^(3/4) Ra_D^(1/4); the plate's 0.6703
    // by E. J. LeFevre 1956.
    const double B = std::tgamma(4.0 / 3.0) * std::tgamma(0.5) / std::tgamma(4.0 / 3.0 + 0.5);
    const double theory = 0.6703 * std::pow(0.5 * B, 0.75);
    CHECK(theory == doctest::Approx(0.5888).epsilon(2e-4));
    CHECK((sphere::churchill_laminar_1983::formula(1e8, 1e12) - 2.0) / std::pow(1e8, 0.25) ==
          doctest::Approx(theory).epsilon(1e-3));
  }

  TEST_CASE("where the laminar form must end, air") {
    // the same author's form with the turbulent part
    const auto excess = [](double Ra) {
      return sphere::churchill_1983::formula(Ra, 0.71) /
                 sphere::churchill_laminar_1983::formula(Ra, 0.71) -
             1.0;
    };
    CHECK(excess(1e8) == doctest::Approx(0.106).epsilon(0.01));
    CHECK(excess(1e9) == doctest::Approx(0.31).epsilon(0.02));
    CHECK(excess(1e11) == doctest::Approx(0.92).epsilon(0.01));
    // far into turbulence Raithby and Hollands 1998 have 0.104 Ra^(1/3) in air (from memory)
    CHECK(sphere::churchill_1983::formula(1e11, 0.71) ==
          doctest::Approx(0.104 * std::cbrt(1e11)).epsilon(0.03));
    // air: Yuge's own 2 + 0.392 Gr^(1/4) (from memory)
    CHECK(sphere::yuge_1960::formula(1e4) ==
          doctest::Approx(2.0 + 0.392 * std::pow(1e4 / 0.71, 0.25)).epsilon(0.01));
  }

  TEST_CASE("envelopes") {
    using slow = sphere::churchill_laminar_1983;
    using all = sphere::churchill_1983;
    expect_inside<slow>(0.0, 0.7);
    expect_inside<slow>(1e8, 7.0);
    expect_crossed<slow>(0, side::above, above(1e8), 0.71);
    expect_crossed<slow>(0, side::below, -1e-9, 0.71);
    expect_crossed<slow>(1, side::below, 1e6, below(0.7));
    expect_not_finite<slow>(1e6, 0.71);
    expect_inside<all>(0.0, 0.0);
    expect_inside<all>(1e14, 0.71);
    expect_crossed<all>(0, side::below, -1e-9, 0.71);
    expect_crossed<all>(1, side::below, 1e6, -1e-9);
    expect_not_finite<all>(1e6, 0.71);
    expect_inside<sphere::yuge_1960>(1.0);
    expect_inside<sphere::yuge_1960>(1e5);
    expect_crossed<sphere::yuge_1960>(0, side::below, below(1.0));
    expect_crossed<sphere::yuge_1960>(0, side::above, above(1e5));
    expect_not_finite<sphere::yuge_1960>(1e3);
  }
}
