#include "convelope/correlations/friction/flat_plate_friction.hpp"

#include "check.hpp"

namespace {

using namespace check;
using namespace convelope::flat_plate_friction;
using convelope::not_stated;
using convelope::state_rule;

TEST_CASE("plate friction: against plain powers in 50 digits") {
  for (const double Re : {1e3, 7.3e4, 5e5, 1e7}) {
    check_value<blasius_local>(0.664_exact * raised(Re, -1, 2), Re);
    check_value<blasius_average>(1.328_exact * raised(Re, -1, 2), Re);
    check_value<power_law_local>(0.0592_exact * raised(Re, -1, 5), Re);
    check_value<power_law_average>(0.074_exact * raised(Re, -1, 5), Re);
  }
}

// L. Howarth, Proc. R. Soc. A 164 (1938) 547-579: f''(0) = 0.33206, so cf = 2 f''(0) Re^(-1/2).
TEST_CASE("plate friction: the published solution of the Blasius equation") {
  CHECK(blasius_local::formula(1e4) == doctest::Approx(2.0 * 0.33206 / 100.0).epsilon(5e-4));
  CHECK(blasius_average::formula(1e4) == doctest::Approx(4.0 * 0.33206 / 100.0).epsilon(5e-4));
}

// C_f = (1/L) integral of cf dx.
TEST_CASE("plate friction: means are the integrals of the local laws") {
  CHECK(blasius_average::formula(3e5) ==
        doctest::Approx(2.0 * blasius_local::formula(3e5)).epsilon(1e-12));
  CHECK(power_law_average::formula(3e6) ==
        doctest::Approx(1.25 * power_law_local::formula(3e6)).epsilon(1e-12));
}

TEST_CASE("plate friction: envelopes") {
  const auto between = []<class C>(C, double low, double high) {
    expect_inside<C>(low);
    expect_inside<C>(high);
    expect_crossed<C>(0, side::below, below(low));
    expect_crossed<C>(0, side::above, above(high));
    expect_not_finite<C>(low);
  };
  between(blasius_local{}, 1e3, 5e5);
  between(blasius_average{}, 1e3, 5e5);
  between(power_law_local{}, 5e5, 1e7);
  between(power_law_average{}, 5e5, 1e7);
}

TEST_CASE("plate friction: every number type") {
  check_scalars<blasius_local>(7.3e4);
  check_scalars<blasius_average>(7.3e4);
  check_scalars<power_law_local>(2.1e6);
  check_scalars<power_law_average>(2.1e6);
}

TEST_CASE("plate friction: records") {
  constexpr auto film = state_rule::film;
  expect_record<blasius_local>("flat-plate-friction/blasius-local", "cf_x", not_stated, film);
  expect_record<blasius_average>("flat-plate-friction/blasius-average", "Cf_L", not_stated, film);
  expect_record<power_law_local>("flat-plate-friction/power-law-local", "cf_x", not_stated, film);
  expect_record<power_law_average>("flat-plate-friction/power-law-average", "Cf_L", not_stated,
                                   film);
  expect_keys<blasius_local>("Re");
  expect_keys<blasius_average>("Re");
}

}  // namespace
