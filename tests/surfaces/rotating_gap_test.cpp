// A turning inner cylinder before a still outer one.
#include "convelope/surfaces/rotating_gap.hpp"

#include "scan.hpp"

using namespace scan;

namespace {

rotating_inner_cylinder rotor(double R, double b) {
  return {number<kinds::radius>(R), number<kinds::gap>(b)};
}
const auto any_rotor = [](random_numbers& r) {
  const double R = r.log_between(0.01, 1.0);
  return rotor(R, R * r.log_between(0.003, 0.4));
};

// Surface velocity at a Taylor number, in air between walls at 300 and 340 K.
double velocity_at(double Ta, double R, double b) {
  return Ta * dry_air{}.values(320.0, 101325.0).kinematic_viscosity() / (b * std::sqrt(b / R));
}

}  // namespace

TEST_CASE("rotating gap: no step anywhere, right sign, exact slope") {
  everywhere(81, any_rotor, dry_air{}, air_range);
  everywhere(82, any_rotor, dry_air_fast{}, air_range, 100.0, 4);
  everywhere(83, any_rotor, liquid_water{}, water_range, 10.0, 4);
  everywhere(84, any_rotor, oil(), any_range, 10.0, 4);
}

TEST_CASE("rotating gap: no step over its width") {
  for (const double u : {0.0, 1.0, -30.0}) {
    no_steps_over([&](double b) { return point_of(rotor(0.1, b), dry_air{}, u, 300.0, 340.0); },
                  1e-5, 0.05);
  }
}

TEST_CASE("rotating gap: conduction between cylinders below the first vortices, exact") {
  const double R = 0.1;
  for (const double b : {0.5e-3, 5e-3, 0.1}) {
    // Fourier: q at the inner wall = k dT / (R ln(R_o/R_i)).
    const double q =
        dry_air{}.values(320.0, 101325.0).conductivity * 40.0 / (R * std::log1p(b / R));
    for (const double Ta : {0.0, 40.0}) {
      const auto a = ask(rotor(R, b), dry_air{}, velocity_at(Ta, R, b), 300.0, 340.0);
      CHECK(a.flux().si() == doctest::Approx(q).epsilon(1e-9));
      CHECK(a.share(0) == doctest::Approx(1.0));
      CHECK(a.inside());
    }
  }
}

TEST_CASE("rotating gap: the bare correlation above Ta 100, either sense") {
  const double R = 0.1;
  const double b = 1e-3;
  const auto v = dry_air{}.values(320.0, 101325.0);
  for (const double Ta : {102.0, 1000.0, 3000.0}) {
    const double Nu = rotating_inner_cylinder::rotation::formula(Ta, v.prandtl());
    for (const double sense : {1.0, -1.0}) {
      const auto a = ask(rotor(R, b), dry_air{}, sense * velocity_at(Ta, R, b), 300.0, 340.0);
      CHECK(a.coefficient().si() == doctest::Approx(Nu * v.conductivity / (2.0 * b)).epsilon(1e-9));
      CHECK(a.share(1) == doctest::Approx(1.0));
      CHECK(a.inside());
    }
  }
  const auto fast = ask(rotor(R, b), dry_air{}, velocity_at(4000.0, R, b), 300.0, 340.0).verdict();
  CHECK(fast.correlation_crossed(1, 0, side::above));
  CHECK_FALSE(fast.correlation_outside(0));
}

TEST_CASE("rotating gap: the hand-over rises all the way") {
  const double R = 0.1;
  const double b = 1e-3;
  double before = 0.0;
  for (double Ta = 35.0; Ta < 150.0; Ta += 0.5) {
    const double h =
        ask(rotor(R, b), dry_air{}, velocity_at(Ta, R, b), 300.0, 340.0).coefficient().si();
    CHECK(h >= before * (1.0 - 1e-12));
    before = h;
  }
}

TEST_CASE("rotating gap: bad input is told") {
  const auto good = rotor(0.1, 1e-3);
  bad_length_is_told(good, [](auto& g, double x) { g.gap = number<kinds::gap>(x); });
  bad_length_is_told(good, [](auto& g, double x) { g.inner_radius = number<kinds::radius>(x); });
  bad_state_is_told(good);
}
