#include "convelope/correlations/external/sphere.hpp"

#include <cmath>

#include "check.hpp"

namespace {

using namespace check;
using namespace convelope::sphere;
using convelope::not_stated;
using convelope::state_rule;

TEST_CASE("sphere: against plain powers in 50 digits") {
  for (const double Re : {3.5, 170.0, 6510.0, 7.6e4}) {
    for (const double Pr : {0.71, 7.0, 380.0}) {
      const exact flow = 0.4_exact * raised(Re, 1, 2) + 0.06_exact * raised(Re, 2, 3);
      for (const double mu_ratio : {1.0, 0.918, 3.2}) {
        check_value<whitaker_1972>(2 + flow * raised(Pr, 2, 5) * raised(mu_ratio, 1, 4), Re, Pr,
                                   mu_ratio);
      }
      check_value<ranz_marshall_1952>(2 + 0.6_exact * raised(Re, 1, 2) * raised(Pr, 1, 3), Re, Pr);
    }
  }
}

// Conduction from a sphere into a still medium without end: h = k/R (Fourier).
TEST_CASE("sphere: at rest only conduction is left") {
  CHECK(whitaker_1972::formula(0.0, 0.7, 1.0) == 2.0);
  CHECK(ranz_marshall_1952::formula(0.0, 0.7) == 2.0);
  expect_inside<ranz_marshall_1952>(0.0, 0.7);
  expect_crossed<whitaker_1972>(0, side::below, 0.0, 0.72, 1.0);
}

// H. Kramers, Physica 12 (1946) 61-80 (abstract): Nu = 2 + 1.3 Pr^0.15 + 0.66 Pr^0.31 Re^0.5.
TEST_CASE("sphere: the measurements of Kramers in air and water") {
  for (const double Pr : {0.71, 10.7}) {
    CAPTURE(Pr);
    const double Re = 1000.0;
    const double measured =
        2.0 + 1.3 * std::pow(Pr, 0.15) + 0.66 * std::pow(Pr, 0.31) * std::sqrt(Re);
    CHECK(whitaker_1972::formula(Re, Pr, 1.0) == doctest::Approx(measured).epsilon(0.3));
    CHECK(ranz_marshall_1952::formula(Re, Pr) == doctest::Approx(measured).epsilon(0.2));
  }
}

TEST_CASE("sphere: envelopes") {
  expect_inside<whitaker_1972>(3.5, 0.71, 1.0);
  expect_inside<whitaker_1972>(7.6e4, 380.0, 3.2);
  expect_crossed<whitaker_1972>(0, side::below, below(3.5), 1.0, 1.0);
  expect_crossed<whitaker_1972>(0, side::above, above(7.6e4), 1.0, 1.0);
  expect_crossed<whitaker_1972>(1, side::below, 100.0, below(0.71), 1.0);
  expect_crossed<whitaker_1972>(1, side::above, 100.0, above(380.0), 1.0);
  expect_crossed<whitaker_1972>(2, side::below, 100.0, 1.0, below(1.0));
  expect_crossed<whitaker_1972>(2, side::above, 100.0, 1.0, above(3.2));
  expect_not_finite<whitaker_1972>(100.0, 1.0, 1.0);

  expect_inside<ranz_marshall_1952>(200.0, 380.0);
  expect_inside<ranz_marshall_1952>(200.0, 0.6);
  expect_crossed<ranz_marshall_1952>(0, side::below, -1e-9, 1.0);
  expect_crossed<ranz_marshall_1952>(0, side::above, above(200.0), 1.0);
  expect_crossed<ranz_marshall_1952>(1, side::below, 100.0, below(0.6));
  expect_crossed<ranz_marshall_1952>(1, side::above, 100.0, above(380.0));
  expect_not_finite<ranz_marshall_1952>(100.0, 1.0);
}

TEST_CASE("sphere: every number type") {
  check_scalars<whitaker_1972>(6510.0, 0.71, 1.3);
  check_scalars<ranz_marshall_1952>(110.0, 0.71);
}

TEST_CASE("sphere: records") {
  expect_record<whitaker_1972>("sphere/whitaker-1972", "Nu_D", 0.3,
                               state_rule::free_stream_with_wall);
  expect_record<ranz_marshall_1952>("sphere/ranz-marshall-1952", "Nu_D", not_stated,
                                    state_rule::film);
  // mu_ratio may be left out, and then is 1
  const auto& inputs = convelope::detail::input_table<whitaker_1972>;
  CHECK_FALSE(inputs[1].optional);
  CHECK(inputs[2].optional);
  CHECK(inputs[2].otherwise == 1.0);
  expect_keys<whitaker_1972>("Re", "Pr", "mu_ratio");
  expect_keys<ranz_marshall_1952>("Re", "Pr");
}

}  // namespace
