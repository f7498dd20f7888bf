#include "convelope/correlations/external/cylinder_crossflow.hpp"

#include <cmath>

#include "check.hpp"

namespace {

using namespace check;
using namespace convelope::cylinder_crossflow;
using convelope::state_rule;
using one_formula = churchill_bernstein_1977;
using midrange = churchill_bernstein_1977_midrange;

exact low_reynolds(double Re, double Pr) {
  return 0.62_exact * raised(Re, 1, 2) * raised(Pr, 1, 3) /
         raised(1 + raised(0.4_exact / Pr, 2, 3), 1, 4);
}

TEST_CASE("cylinder in crossflow: against plain powers in 50 digits") {
  for (const double Re : {1.0, 6071.0, 2.8e5, 1e7}) {
    for (const double Pr : {0.2, 0.71, 7.0, 1000.0}) {
      check_value<one_formula>(
          0.3_exact + low_reynolds(Re, Pr) * raised(1 + raised(exact(Re) / 282000, 5, 8), 4, 5), Re,
          Pr);
      check_value<midrange>(
          0.3_exact + low_reynolds(Re, Pr) * (1 + raised(exact(Re) / 282000, 1, 2)), Re, Pr);
    }
  }
}

// R. Hilpert, Forsch. Ing.-Wes. 4 (1933) 215-224, air, as in the textbooks (from memory):
// Nu = C Re^m Pr^(1/3) with 0.911, 0.385 (4 .. 40), 0.683, 0.466 (40 .. 4e3), 0.193, 0.618
// (4e3 .. 4e4), 0.0266, 0.805 (4e4 .. 4e5).
TEST_CASE("cylinder in crossflow: the measurements of Hilpert in air") {
  const double rows[][3] = {
      {13.0, 0.911, 0.385}, {400.0, 0.683, 0.466}, {1.3e4, 0.193, 0.618}, {1.3e5, 0.0266, 0.805}};
  for (const auto& row : rows) {
    const double Re = row[0];
    CAPTURE(Re);
    const double measured = row[1] * std::pow(Re, row[2]) * std::cbrt(0.7);
    CHECK(one_formula::formula(Re, 0.7) == doctest::Approx(measured).epsilon(one_formula::scatter));
  }
  CHECK(midrange::formula(1.3e5, 0.7) ==
        doctest::Approx(0.0266 * std::pow(1.3e5, 0.805) * std::cbrt(0.7)).epsilon(0.06));
}

TEST_CASE("cylinder in crossflow: how far apart the two forms are") {
  CHECK(midrange::formula(2e4, 0.71) / one_formula::formula(2e4, 0.71) ==
        doctest::Approx(1.10).epsilon(0.005));
  CHECK(midrange::formula(4e5, 0.71) / one_formula::formula(4e5, 0.71) ==
        doctest::Approx(1.15).epsilon(0.005));
}

TEST_CASE("cylinder in crossflow: envelopes") {
  expect_inside<one_formula>(1.0, 0.2);
  expect_inside<one_formula>(1e7, 0.7);
  expect_inside<one_formula>(1e7, 1000.0);
  expect_crossed<one_formula>(0, side::above, above(1e7), 0.7);
  expect_also_crossed<one_formula>(0, side::below, -1.0, 0.7);
  expect_crossed<one_formula>(1, side::below, 1.0, below(0.2));
  expect_crossed<one_formula>(1, side::below, 0.0, 0.7);
  expect_not_finite<one_formula>(1e4, 0.7);

  expect_inside<midrange>(2e4, 0.7);
  expect_inside<midrange>(4e5, 0.7);
  expect_inside<midrange>(2e4, 1.0001e-5);
  expect_crossed<midrange>(0, side::below, below(2e4), 0.7);
  expect_crossed<midrange>(0, side::above, above(4e5), 0.7);
  expect_crossed<midrange>(1, side::below, 2e4, below(1e-5));
  expect_not_finite<midrange>(1e5, 0.7);
}

TEST_CASE("cylinder in crossflow: every number type") {
  check_scalars<one_formula>(6071.0, 0.71);
  check_scalars<one_formula>(3e6, 0.03);
  check_scalars<midrange>(1.3e5, 0.71);
}

TEST_CASE("cylinder in crossflow: at rest the published constant is left") {
  CHECK(one_formula::formula(0.0, 0.7) == 0.3);
  CHECK(midrange::formula(0.0, 0.7) == 0.3);
}

TEST_CASE("cylinder in crossflow: records") {
  expect_record<one_formula>("cylinder-crossflow/churchill-bernstein-1977", "Nu_D", 0.2,
                             state_rule::film);
  expect_record<midrange>("cylinder-crossflow/churchill-bernstein-1977-midrange", "Nu_D", 0.2,
                          state_rule::film);
  expect_keys<one_formula>("Re", "Pr");
  expect_keys<midrange>("Re", "Pr");
}

}  // namespace
