#include "convelope/correlations/external/annular_gap.hpp"

#include "check.hpp"

namespace {

using namespace check;
using namespace convelope::annular_gap;
using convelope::not_stated;
using convelope::state_rule;
using geometry = becker_kaye_geometry_factor;

TEST_CASE("annular gap: vortex laws against plain powers in 50 digits") {
  for (const double Pr : {0.71, 7.0, 130.0}) {
    for (const double Ta : {0.0, 20.0, below(41.0)}) {
      check_value<taylor_gazley>(exact(2), Ta, Pr);
    }
    for (const double Ta : {41.0, 63.0, 100.0}) {
      check_value<taylor_gazley>(0.202_exact * raised(Ta, 63, 100) * raised(Pr, 27, 100), Ta, Pr);
    }
    for (const double Ta : {above(100.0), 320.0, 3162.0}) {
      check_value<taylor_gazley>(0.386_exact * raised(Ta, 1, 2) * raised(Pr, 27, 100), Ta, Pr);
      const exact square = exact(Ta) * Ta;
      check_value<tachibana_1960>(0.42_exact * raised(square * Pr, 1, 4), Ta, Pr);
      check_value<aoki_1967>(0.44_exact * raised(square, 1, 4) * raised(Pr, 3, 10), Ta, Pr);
    }
  }
  for (const double Ta_m : {0.0, 1000.0, below(1700.0)}) {
    check_value<becker_kaye_1962>(exact(2), Ta_m);
  }
  for (const double Ta_m : {1700.0, 5e3, 1e4}) {
    check_value<becker_kaye_1962>(0.128_exact * raised(Ta_m, 367, 1000), Ta_m);
  }
  for (const double Ta_m : {above(1e4), 3e5, 1e7}) {
    check_value<becker_kaye_1962>(0.409_exact * raised(Ta_m, 241, 1000), Ta_m);
  }
}

TEST_CASE("annular gap: geometry factor and conduction against 50 digits") {
  const exact pi = acos(exact(-1));
  for (const double b_over_rm : {1e-6, 0.1, 0.2, 0.353}) {
    const exact half = 1 - exact(b_over_rm) / 2;
    const exact X = 1 - 0.652_exact * b_over_rm / half;
    const exact P = 0.0571_exact * X + 0.00056_exact / X;
    check_value<geometry>(raised(pi, 4) / 1697 * raised(half, -2) / P, b_over_rm);
  }
  for (const double eta : {1e-6, 0.5, 0.9, 0.9989, 0.9991, 0.99999}) {
    check_value<conduction_limit>(2 * (1 - exact(eta)) / (exact(eta) * log(1 / exact(eta))), eta);
  }
  check_value<conduction_limit>(exact(2), 1.0);
}

// d/((1 - d) ln(1/(1 - d))) = 1 + d/2 + 5 d^2/12 + ..., the coefficients of the Adams-Bashforth
// method (E. Hairer, S. P. Norsett, G. Wanner, Solving Ordinary Differential Equations I, table
// III.1.1, from memory). Beyond eta = 1 nothing but the series speaks, so each one shows there.
TEST_CASE("annular gap: the series of the narrow gap") {
  const exact d = -0.5_exact;
  const exact gamma[] = {exact(95) / 288, exact(251) / 720, exact(3) / 8,
                         exact(5) / 12,   exact(1) / 2,     exact(1)};
  exact sum = 0;
  for (const exact& g : gamma) sum = sum * d + g;
  check_value<conduction_limit>(2 * sum, 1.5);
}

// As published the laws step; the numbers the documentation names.
TEST_CASE("annular gap: the published steps") {
  const auto gazley = [](double Ta) { return taylor_gazley::formula(Ta, 0.71); };
  CHECK(gazley(41.0) / gazley(below(41.0)) == doctest::Approx(1.0 - 0.045).epsilon(0.001));
  CHECK(gazley(above(100.0)) / gazley(100.0) == doctest::Approx(1.0 + 0.050).epsilon(0.001));
  const auto kaye = [](double Ta_m) { return becker_kaye_1962::formula(Ta_m); };
  CHECK(kaye(1700.0) / kaye(below(1700.0)) == doctest::Approx(1.0 - 0.019).epsilon(0.001));
  CHECK(kaye(above(1e4)) / kaye(1e4) == doctest::Approx(1.0 + 0.001).epsilon(0.001));
}

TEST_CASE("annular gap: four sources in air, where their ranges meet") {
  const double Ta = 300.0;
  const double kaye = becker_kaye_1962::formula(Ta * Ta);
  CHECK(taylor_gazley::formula(Ta, 0.71) == doctest::Approx(kaye).epsilon(0.05));
  CHECK(tachibana_1960::formula(Ta, 0.71) == doctest::Approx(kaye).epsilon(0.05));
  CHECK(aoki_1967::formula(Ta, 0.71) == doctest::Approx(kaye).epsilon(0.08));
  CHECK(taylor_gazley::formula(3162.0, 0.71) ==
        doctest::Approx(becker_kaye_1962::formula(1e7)).epsilon(0.01));
}

TEST_CASE("annular gap: envelopes") {
  expect_inside<taylor_gazley>(0.0, 1e-3);
  expect_inside<taylor_gazley>(3162.0, 0.7);
  expect_crossed<taylor_gazley>(0, side::below, -1.0, 0.7);
  expect_crossed<taylor_gazley>(0, side::above, above(3162.0), 0.7);
  expect_crossed<taylor_gazley>(1, side::below, 50.0, -0.7);
  expect_not_finite<taylor_gazley>(50.0, 0.7);

  expect_inside<becker_kaye_1962>(0.0);
  expect_inside<becker_kaye_1962>(1e7);
  expect_crossed<becker_kaye_1962>(0, side::below, -1.0);
  expect_crossed<becker_kaye_1962>(0, side::above, above(1e7));
  expect_not_finite<becker_kaye_1962>(5e3);

  expect_inside<geometry>(0.0);
  expect_inside<geometry>(0.353);
  expect_crossed<geometry>(0, side::below, -1e-9);
  expect_crossed<geometry>(0, side::above, above(0.353));
  expect_not_finite<geometry>(0.1);

  expect_inside<tachibana_1960>(41.17, 1e-3);
  expect_inside<tachibana_1960>(3162.0, 0.7);
  expect_crossed<tachibana_1960>(0, side::below, below(41.17), 0.7);
  expect_crossed<tachibana_1960>(0, side::above, above(3162.0), 0.7);
  expect_crossed<tachibana_1960>(1, side::below, 100.0, -0.7);
  expect_not_finite<tachibana_1960>(100.0, 0.7);

  expect_inside<aoki_1967>(70.7, 1e-3);
  expect_inside<aoki_1967>(447.2, 0.7);
  expect_crossed<aoki_1967>(0, side::below, below(70.7), 0.7);
  expect_crossed<aoki_1967>(0, side::above, above(447.2), 0.7);
  expect_crossed<aoki_1967>(1, side::below, 100.0, -0.7);
  expect_not_finite<aoki_1967>(100.0, 0.7);

  expect_inside<conduction_limit>(1e-6);
  expect_inside<conduction_limit>(1.0);
  expect_crossed<conduction_limit>(0, side::below, 0.0);
  expect_crossed<conduction_limit>(0, side::above, above(1.0));
  expect_not_finite<conduction_limit>(0.9);
}

TEST_CASE("annular gap: every number type, in every band") {
  for (const double Ta : {20.0, 63.0, 320.0}) check_scalars<taylor_gazley>(Ta, 0.71);
  for (const double Ta_m : {1000.0, 5e3, 3e5}) check_scalars<becker_kaye_1962>(Ta_m);
  check_scalars<taylor_gazley>(0.0, 0.71);
  check_scalars<becker_kaye_1962>(0.0);
  check_scalars<geometry>(0.1);
  check_scalars<tachibana_1960>(320.0, 0.71);
  check_scalars<aoki_1967>(320.0, 0.71);
  for (const double eta : {0.2, 0.9, 0.9995}) check_scalars<conduction_limit>(eta);
}

TEST_CASE("annular gap: records") {
  constexpr auto walls = state_rule::mean_of_walls;
  expect_record<taylor_gazley>("annular-gap/taylor-gazley", "Nu_2b", not_stated, walls);
  expect_record<becker_kaye_1962>("annular-gap/becker-kaye-1962", "Nu_2b", not_stated, walls);
  expect_record<geometry>("annular-gap/becker-kaye-geometry-factor", "F_g", not_stated,
                          state_rule::none);
  expect_record<tachibana_1960>("annular-gap/tachibana-1960", "Nu_2b", not_stated, walls);
  expect_record<aoki_1967>("annular-gap/aoki-1967", "Nu_2b", not_stated, walls);
  expect_record<conduction_limit>("annular-gap/conduction-limit", "Nu_2b", 0.0, walls);
  expect_keys<taylor_gazley>("Ta", "Pr");
  expect_keys<becker_kaye_1962>("Ta_m");
  expect_keys<geometry>("b_over_rm");
  expect_keys<conduction_limit>("eta");
}

}  // namespace
