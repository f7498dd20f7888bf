// One face of a horizontal plate: driving or holding back, still or in a stream.
#include "convelope/surfaces/horizontal_plate.hpp"

#include "scan.hpp"

using namespace scan;

namespace {

// A square plate of side L has A/P = L/4.
horizontal_wall square_of(double L, facing f) {
  return {number<kinds::area_over_perimeter>(0.25 * L), number<kinds::plate_length>(L), f};
}
template <facing Face>
horizontal_wall any_plate(random_numbers& r) {
  auto g = square_of(r.log_between(5e-3, 3.0), Face);
  g.transition = number<kinds::transition_reynolds>(r.log_between(1e5, 3e6));
  return g;
}

using driving = horizontal_wall::driving;
using holding = horizontal_wall::holding;

}  // namespace

TEST_CASE("horizontal wall: no step anywhere, right sign, exact slope") {
  everywhere(51, any_plate<facing::up>, dry_air{}, air_range);
  everywhere(52, any_plate<facing::down>, dry_air{}, air_range, 100.0, 4);
  everywhere(53, any_plate<facing::up>, dry_air_fast{}, air_range, 100.0, 4);
  everywhere(54, any_plate<facing::up>, liquid_water{}, water_range, 10.0, 4);
  everywhere(55, any_plate<facing::down>, oil(), any_range, 10.0, 4);
  everywhere(56, any_plate<facing::up>, liquid_water{}, cold_water_range, 1.0);
}

TEST_CASE("horizontal wall: no step over its size") {
  for (const double u : {0.0, 0.5, -3.0}) {
    no_steps_over(
        [&](double L) { return point_of(square_of(L, facing::up), dry_air{}, u, 300.0, 380.0); },
        1e-4, 30.0);
  }
}

TEST_CASE("horizontal wall: the driving and the holding law at rest") {
  const double L = 0.4;
  const double b = 0.1;
  for (const double wall : {260.0, 340.0}) {
    const auto v = dry_air{}.values(0.5 * (300.0 + wall), 101325.0);
    const double Ra = 9.80665 / 300.0 * std::fabs(wall - 300.0) * b * b * b /
                      (v.kinematic_viscosity() * v.diffusivity());
    const auto h = [&](facing f) {
      return ask(square_of(L, f), dry_air{}, 0.0, 300.0, wall).coefficient().si();
    };
    const bool hot = wall > 300.0;
    const double strong = driving::formula(Ra, v.prandtl()) * v.conductivity / b;
    const double weak = holding::formula(Ra, v.prandtl()) * v.conductivity / b;
    CHECK(h(hot ? facing::up : facing::down) == doctest::Approx(strong).epsilon(1e-6));
    CHECK(h(hot ? facing::down : facing::up) == doctest::Approx(weak).epsilon(1e-6));
    CHECK(strong > 1.5 * weak);
  }
}

TEST_CASE("horizontal wall: cold water turns the sides round") {
  // Water at 2 degC before a wall at 1 degC: the film lies below the density maximum, so the
  // colder face is the lighter one and drives on the upper side.
  const auto h = [](facing f, double stream, double wall) {
    return ask(square_of(0.4, f), liquid_water{}, 0.0, stream, wall).coefficient().si();
  };
  CHECK(h(facing::up, 275.15, 274.15) > 1.2 * h(facing::down, 275.15, 274.15));
  CHECK(h(facing::up, 295.15, 294.15) < h(facing::down, 295.15, 294.15) / 1.2);
}

TEST_CASE("horizontal wall: a fast stream leaves the boundary layer alone") {
  const double L = 0.4;
  const auto v = dry_air{}.values(320.0, 101325.0);
  const double Nu =
      horizontal_wall::forced::formula(10.0 * L / v.kinematic_viscosity(), v.prandtl());
  for (const auto f : {facing::up, facing::down}) {
    const auto a = ask(square_of(L, f), dry_air{}, -10.0, 300.0, 340.0);
    CHECK(a.coefficient().si() == doctest::Approx(Nu * v.conductivity / L).epsilon(5e-3));
    CHECK(a.share(2) > 0.98);
  }
}

TEST_CASE("horizontal wall: joined with exponent 7/2 on A/P") {
  const double L = 0.4;
  const double b = 0.1;
  const auto v = dry_air{}.values(320.0, 101325.0);
  const double Ra =
      9.80665 / 300.0 * 40.0 * b * b * b / (v.kinematic_viscosity() * v.diffusivity());
  const double F =
      horizontal_wall::forced::formula(1.5 * L / v.kinematic_viscosity(), v.prandtl()) * b / L;
  const double N = driving::formula(Ra, v.prandtl());
  const double joined = std::pow(std::pow(F, 3.5) + std::pow(N, 3.5), 2.0 / 7.0);
  const auto a = ask(square_of(L, facing::up), dry_air{}, 1.5, 300.0, 340.0);
  CHECK(a.coefficient().si() == doctest::Approx(joined * v.conductivity / b).epsilon(1e-9));
  CHECK(a.share(2) > 0.05);
  CHECK(a.share(2) < 0.95);
}

TEST_CASE("horizontal wall: who crossed") {
  // Ra on A/P 4e10, still: the driving law ends at 1e10.
  const auto big = ask(square_of(10.0, facing::up), dry_air{}, 0.0, 300.0, 340.0).verdict();
  CHECK(big.correlation_crossed(0, 0, side::above));
  CHECK_FALSE(big.correlation_outside(1));
  CHECK_FALSE(big.correlation_outside(2));
  const auto under = ask(square_of(10.0, facing::down), dry_air{}, 0.0, 300.0, 340.0).verdict();
  CHECK(under.correlation_crossed(1, 0, side::above));
  CHECK_FALSE(under.correlation_outside(0));
  // Ra 40: the holding law begins at 1e3, the driving one at 1.
  CHECK(ask(square_of(0.01, facing::down), dry_air{}, 0.0, 300.0, 340.0)
            .verdict()
            .correlation_crossed(1, 0, side::below));
  CHECK(ask(square_of(0.01, facing::up), dry_air{}, 0.0, 300.0, 340.0).inside());
}

TEST_CASE("horizontal wall: a turbulent stream is the turbulent law's affair") {
  const auto a = ask(square_of(3.0, facing::up), dry_air{}, 20.0, 300.0, 340.0);
  CHECK(a.share(3) > 0.9);
  CHECK_FALSE(a.verdict().correlation_outside(2));
  CHECK_FALSE(a.verdict().correlation_outside(3));
}

TEST_CASE("horizontal wall: bad input is told") {
  const auto good = square_of(0.4, facing::up);
  bad_length_is_told(good, [](auto& g, double x) { g.length = number<kinds::plate_length>(x); });
  bad_length_is_told(good, [](auto& g, double x) {
    g.area_over_perimeter = number<kinds::area_over_perimeter>(x);
  });
  bad_length_is_told(
      good, [](auto& g, double x) { g.transition = number<kinds::transition_reynolds>(x); });
  bad_state_is_told(good);
}
