// Natural convection on a horizontal cylinder.

#include "convelope/correlations/natural/horizontal_cylinder.hpp"

#include <doctest/doctest.h>

#include <cmath>
#include <iterator>
#include <numbers>

#include "check.hpp"

namespace {

using namespace convelope;
using namespace check;
namespace tube = horizontal_cylinder;

struct point {
  double Ra, Pr;
};
constexpr point points[] = {{1e-5, 0.71}, {2.5, 0.012}, {3.3e6, 7.0}, {1e9, 0.71}, {8e11, 1100.0}};

exact bracket(const char* c, double Pr) { return 1 + pow(exact(exact(c) / Pr), exact(9) / 16); }

// linear in ln Pr between the entries of the handbook's table
exact turbulent(double Pr) {
  const char* const at[] = {"0.01", "0.022", "0.1", "0.71", "2", "6", "50", "100", "2000"};
  const char* const C[] = {"0.077", "0.081", "0.090", "0.103", "0.108",
                           "0.109", "0.100", "0.097", "0.088"};
  for (std::size_t i = 1; i < std::size(at); ++i) {
    if (exact(Pr) <= exact(at[i])) {
      const exact part =
          (log(exact(Pr)) - log(exact(at[i - 1]))) / (log(exact(at[i])) - log(exact(at[i - 1])));
      return exact(C[i - 1]) + (exact(C[i]) - exact(C[i - 1])) * part;
    }
  }
  return exact(C[std::size(at) - 1]);
}
exact raithby_hollands(double Ra, double Pr) {
  const exact thin = exact("0.772") * exact("0.671") / pow(bracket("0.492", Pr), exact(4) / 9) *
                     pow(exact(Ra), exact(1) / 4);
  const exact f = 1 - exact("0.13") / pow(thin, exact("0.16"));
  const exact slow = 2 * f / log(exact(1 + 2 * f / thin));
  const exact fast = turbulent(Pr) * pow(exact(Ra), exact(1) / 3);
  return pow(exact(pow(slow, 10) + pow(fast, 10)), exact(1) / 10);
}

}  // namespace

TEST_SUITE("correlations: horizontal cylinder") {
  TEST_CASE("values") {
    for (const auto& [Ra, Pr] : points) {
      check_value<tube::churchill_chu_1975>(
          pow(exact(exact("0.60") + exact("0.387") * pow(exact(Ra), exact(1) / 6) /
                                        pow(bracket("0.559", Pr), exact(8) / 27)),
              2),
          Ra, Pr);
      check_value<tube::churchill_chu_laminar_1975>(
          exact("0.36") + exact("0.518") * pow(exact(Ra), exact(1) / 4) /
                              pow(bracket("0.559", Pr), exact(4) / 9),
          Ra, Pr);
      check_value<tube::raithby_hollands_1998>(raithby_hollands(Ra, Pr), Ra, Pr);
    }
    // every entry of the table, and between them
    for (const double Pr : {0.01, 0.015, 0.022, 0.05, 0.1, 0.3, 0.71, 1.2, 2.0, 3.5, 6.0, 20.0,
                            50.0, 70.0, 100.0, 400.0, 2000.0}) {
      CAPTURE(Pr);
      check_value<tube::raithby_hollands_1998>(raithby_hollands(1e11, Pr), 1e11, Pr);
    }
    // held constant beyond its ends
    CHECK(tube::raithby_hollands_1998::turbulent_coefficient(0.001) == doctest::Approx(0.077));
    CHECK(tube::raithby_hollands_1998::turbulent_coefficient(1e5) == doctest::Approx(0.088));
  }

  TEST_CASE("Morgan's five laws, steps and all") {
    struct law {
      double Ra;
      const char* C;
      exact n;
    };
    const exact third = exact(1) / 3;
    const law laws[] = {{1e-10, "0.675", exact("0.058")},
                        {below(1e-2), "0.675", exact("0.058")},
                        {1e-2, "1.02", exact("0.148")},
                        {below(1e2), "1.02", exact("0.148")},
                        {1e2, "0.850", exact("0.188")},
                        {below(1e4), "0.850", exact("0.188")},
                        {1e4, "0.480", exact("0.25")},
                        {below(1e7), "0.480", exact("0.25")},
                        {1e7, "0.125", third},
                        {1e12, "0.125", third}};
    for (const auto& [Ra, C, n] : laws) {
      check_value<tube::morgan_1975>(exact(C) * pow(exact(Ra), n), Ra);
    }
    for (const double Ra : {1e-2, 1e2, 1e4, 1e7}) {
      CAPTURE(Ra);
      const double step =
          tube::morgan_1975::formula(Ra) / tube::morgan_1975::formula(below(Ra)) - 1.0;
      CHECK(std::abs(step) > 4e-4);
      CHECK(std::abs(step) < 2.3e-3);
    }
    CHECK(tube::morgan_1975{}(rayleigh_of<diameter>(1e5)).scatter() == doctest::Approx(0.05));
  }

  TEST_CASE("number types and derivatives") {
    check_scalars<tube::churchill_chu_1975>(3.3e6, 0.7);
    check_scalars<tube::churchill_chu_laminar_1975>(3.3e6, 7.0);
    check_scalars<tube::raithby_hollands_1998>(3.3e8, 3.0);
    for (const double Ra : {1e-4, 3.0, 3.3e3, 3.3e5, 3.3e9}) {
      check_scalars<tube::morgan_1975>(Ra);
    }
  }

  TEST_CASE("laminar coefficient from the gravity integral") {
    // A thin laminar layer at Pr -> inf on a contour of length pi D/2 with gravity g sin(phi) along
    // it: Nu_D = 0.6703 (2/pi)^(1/4) I^(3/4) Ra_D^(1/4), I the mean of sin(phi)^(1/3), by beta
    // functions; the plate's 0.6703 by E. J. LeFevre 1956.
    const double I =
        std::tgamma(2.0 / 3.0) * std::tgamma(0.5) / std::tgamma(7.0 / 6.0) * std::numbers::inv_pi;
    const double shape = std::pow(2.0 * std::numbers::inv_pi, 0.25) * std::pow(I, 0.75);
    CHECK(shape == doctest::Approx(0.772).epsilon(5e-4));
    const double root = std::pow(1e9, 0.25);
    CHECK((tube::churchill_chu_laminar_1975::formula(1e9, 1e12) - 0.36) / root ==
          doctest::Approx(0.6703 * shape).epsilon(1e-3));
  }

  TEST_CASE("formulas side by side, air") {
    // 15 % to 25 %: common practice between correlations of one body
    for (const double Ra : {1e-2, 1.0, 1e3, 1e5, 1e7}) {
      CAPTURE(Ra);
      const double joined = tube::raithby_hollands_1998::formula(Ra, 0.71);
      CHECK(tube::morgan_1975::formula(Ra) == doctest::Approx(joined).epsilon(0.15));
      CHECK(tube::churchill_chu_1975::formula(Ra, 0.71) == doctest::Approx(joined).epsilon(0.25));
    }
    // turbulent: 0.103 and 0.125 Ra^(1/3) are that far apart
    CHECK(tube::morgan_1975::formula(1e11) / tube::raithby_hollands_1998::formula(1e11, 0.71) ==
          doctest::Approx(0.125 / 0.103).epsilon(0.01));
    // what the laminar form's comment says of it
    const auto laminar = [](double Ra) {
      return tube::churchill_chu_laminar_1975::formula(Ra, 0.71) /
             tube::raithby_hollands_1998::formula(Ra, 0.71);
    };
    CHECK(laminar(1.0) == doctest::Approx(0.74).epsilon(0.01));
    CHECK(laminar(1e-6) == doctest::Approx(1.20).epsilon(0.01));
  }

  TEST_CASE("envelopes") {
    using all = tube::churchill_chu_1975;
    using slow = tube::churchill_chu_laminar_1975;
    using joined = tube::raithby_hollands_1998;
    expect_inside<all>(1e-5, 0.0);
    expect_inside<all>(1e12, 0.71);
    expect_crossed<all>(0, side::below, below(1e-5), 0.71);
    expect_crossed<all>(0, side::above, above(1e12), 0.71);
    expect_crossed<all>(1, side::below, 1.0, -1e-9);
    expect_not_finite<all>(1e6, 0.71);
    expect_inside<slow>(1e-6, 0.0);
    expect_inside<slow>(1e9, 0.71);
    expect_crossed<slow>(0, side::below, below(1e-6), 0.71);
    expect_crossed<slow>(0, side::above, above(1e9), 0.71);
    expect_crossed<slow>(1, side::below, 1.0, -1e-9);
    expect_not_finite<slow>(1e6, 0.71);
    expect_inside<joined>(1e-10, 0.01);
    expect_inside<joined>(1e12, 2000.0);
    expect_crossed<joined>(0, side::below, below(1e-10), 0.71);
    expect_crossed<joined>(0, side::above, above(1e12), 0.71);
    expect_crossed<joined>(1, side::below, 1.0, below(0.01));
    expect_crossed<joined>(1, side::above, 1.0, above(2000.0));
    expect_not_finite<joined>(1e6, 0.71);
    expect_inside<tube::morgan_1975>(1e-10);
    expect_inside<tube::morgan_1975>(1e12);
    expect_crossed<tube::morgan_1975>(0, side::below, below(1e-10));
    expect_crossed<tube::morgan_1975>(0, side::below, -1e-9);
    expect_crossed<tube::morgan_1975>(0, side::above, above(1e12));
    expect_not_finite<tube::morgan_1975>(1e6);
  }
}
