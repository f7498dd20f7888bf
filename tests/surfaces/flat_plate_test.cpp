// A plate along a stream, laminar to turbulent.
#include "convelope/surfaces/flat_plate.hpp"

#include "scan.hpp"

using namespace scan;

namespace {

plate_along_stream of_length(double L) { return {number<kinds::plate_length>(L)}; }
const auto any_plate = [](random_numbers& r) {
  auto g = of_length(r.log_between(1e-3, 10.0));
  g.transition = number<kinds::transition_reynolds>(r.log_between(1e5, 3e6));
  return g;
};

using laminar = plate_along_stream::layer_laminar;
using turbulent = plate_along_stream::layer_turbulent;

}  // namespace

TEST_CASE("plate along a stream: no step anywhere, right sign, exact slope") {
  everywhere(31, any_plate, dry_air{}, air_range);
  everywhere(32, any_plate, dry_air_fast{}, air_range, 100.0, 4);
  everywhere(33, any_plate, liquid_water{}, water_range, 10.0, 4);
  everywhere(34, any_plate, oil(), any_range, 100.0, 4);
}

TEST_CASE("plate along a stream: no step over its length") {
  no_steps_over([](double L) { return point_of(of_length(L), dry_air{}, 20.0, 300.0, 380.0); },
                1e-6, 100.0);
}

TEST_CASE("plate along a stream: the bare correlations at both ends of the hand-over") {
  const double L = 1.0;
  const auto v = dry_air{}.values(320.0, 101325.0);
  const auto h_at = [&](double Re) {
    return ask(of_length(L), dry_air{}, Re * v.kinematic_viscosity() / L, 300.0, 340.0);
  };
  const double to_h = v.conductivity / L;
  const double Pr = v.prandtl();
  for (const double Re : {1e3, 1e5, 5e5}) {
    CAPTURE(Re);
    const auto a = h_at(Re);
    CHECK(a.coefficient().si() == doctest::Approx(laminar::formula(Re, Pr) * to_h).epsilon(1e-9));
    CHECK(a.share(1) == doctest::Approx(0.0));
    // 5e5 itself may land on either side of the limit.
    if (Re < 5e5) CHECK(a.inside());
  }
  for (const double Re : {1e6, 3e6, 9e7}) {
    CAPTURE(Re);
    const auto a = h_at(Re);
    CHECK(a.coefficient().si() ==
          doctest::Approx(turbulent::formula(Re, Pr, 5e5) * to_h).epsilon(1e-9));
    CHECK(a.share(1) == doctest::Approx(1.0));
    CHECK(a.inside());
  }
  // Half way the two have equal shares.
  CHECK(h_at(7.5e5).share(0) == doctest::Approx(0.5).epsilon(1e-6));
  CHECK(h_at(7.5e5).coefficient().si() ==
        doctest::Approx(0.5 * (laminar::formula(7.5e5, Pr) + turbulent::formula(7.5e5, Pr, 5e5)) *
                        to_h)
            .epsilon(1e-9));
}

TEST_CASE("plate along a stream: at rest nothing is left") {
  const auto a = ask(of_length(1.0), dry_air{}, 0.0, 300.0, 340.0);
  CHECK(a.coefficient().si() < 1e-4);
  CHECK(a.coefficient().si() > 0.0);
  CHECK(is_finite(a.slope().si()));
}

TEST_CASE("plate along a stream: who crossed") {
  const auto at = [](double u, double L) {
    return ask(of_length(L), dry_air{}, u, 300.0, 340.0).verdict();
  };
  CHECK(at(100.0, 50.0).correlation_crossed(1, 0, side::above));  // Re 2.8e8
  CHECK_FALSE(at(100.0, 50.0).correlation_outside(0));
  CHECK(at(1e-3, 0.1).correlation_crossed(0, 2, side::below));  // Re Pr 4
  CHECK_FALSE(at(1e-3, 0.1).correlation_outside(1));
  auto g = of_length(1.0);
  g.transition = number<kinds::transition_reynolds>(5e4);  // nobody has seen it so early
  CHECK(ask(g, dry_air{}, 20.0, 300.0, 340.0).verdict().correlation_crossed(1, 2, side::below));
}

// A worked example of Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, chapter 7
// (from memory): air at 300 degC and 6 kN/m2 over a plate 0.5 m long at 27 degC, 10 m/s.
// There: film 437 K, Re_L 9597, Nu 57.4, h 4.18 W/(m2 K), 570 W per metre of width to the plate.
TEST_CASE("plate along a stream: worked example at low pressure") {
  const auto a = ask(of_length(0.5), dry_air{}, 10.0, 573.15, 300.15, 6000.0);
  CHECK(a.coefficient().si() == doctest::Approx(4.18).epsilon(0.03));
  CHECK(-0.5 * a.flux().si() == doctest::Approx(570.0).epsilon(0.03));
  CHECK(a.inside());
}

TEST_CASE("plate along a stream: bad input is told") {
  const auto good = of_length(0.5);
  bad_length_is_told(good, [](auto& g, double x) { g.length = number<kinds::plate_length>(x); });
  bad_length_is_told(
      good, [](auto& g, double x) { g.transition = number<kinds::transition_reynolds>(x); });
  bad_state_is_told(good);
}
