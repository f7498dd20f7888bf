// A sphere from rest to a fast stream.
#include "convelope/surfaces/sphere.hpp"

#include "scan.hpp"

using namespace scan;

namespace {

sphere_in_stream of_diameter(double D) { return {number<kinds::diameter>(D)}; }
const auto any_sphere = [](random_numbers& r) { return of_diameter(r.log_between(1e-4, 1.0)); };

using forced = sphere_in_stream::forced;
using natural = sphere_in_stream::natural;

}  // namespace

TEST_CASE("sphere: no step anywhere, right sign, exact slope") {
  everywhere(21, any_sphere, dry_air{}, air_range);
  everywhere(22, any_sphere, dry_air_fast{}, air_range, 100.0, 4);
  everywhere(23, any_sphere, liquid_water{}, water_range, 10.0, 4);
  everywhere(24, any_sphere, oil(), any_range, 10.0, 4);
  everywhere(25, any_sphere, mercury(), any_range, 10.0, 4);
  everywhere(26, any_sphere, liquid_water{}, cold_water_range, 1.0);
}

TEST_CASE("sphere: no step over its diameter") {
  for (const double u : {0.0, 0.3, -20.0}) {
    no_steps_over([&](double D) { return point_of(of_diameter(D), dry_air{}, u, 300.0, 380.0); },
                  1e-6, 10.0);
  }
}

TEST_CASE("sphere: the bare correlations at both ends") {
  const double D = 0.02;
  const auto film = dry_air{}.values(340.0, 101325.0);
  const auto stream = dry_air{}.values(300.0, 101325.0);
  const auto wall = dry_air{}.values(380.0, 101325.0);

  const double Ra =
      9.80665 / 300.0 * 80.0 * D * D * D / (film.kinematic_viscosity() * film.diffusivity());
  CHECK(
      ask(of_diameter(D), dry_air{}, 0.0, 300.0, 380.0).coefficient().si() ==
      doctest::Approx(natural::formula(Ra, film.prandtl()) * film.conductivity / D).epsilon(1e-4));

  // Whitaker's properties are those of the stream, and so is his conductivity.
  const double F = forced::formula(50.0 * D / stream.kinematic_viscosity(), stream.prandtl(),
                                   stream.viscosity / wall.viscosity);
  const auto fast = ask(of_diameter(D), dry_air{}, -50.0, 300.0, 380.0);
  CHECK(fast.coefficient().si() == doctest::Approx(F * stream.conductivity / D).epsilon(1e-4));
  CHECK(fast.share(0) > 0.999);

  // Still and at the fluid's temperature: conduction alone, Nu = 2 (exact).
  CHECK(ask(of_diameter(D), dry_air{}, 0.0, 300.0, 300.0).coefficient().si() ==
        doctest::Approx(2.0 * stream.conductivity / D).epsilon(2e-3));
}

TEST_CASE("sphere: who crossed, and who is not asked") {
  // Re about 4e5: above Whitaker's 7.6e4; a wall colder than the air keeps mu/mu_w above 1.
  const auto fast = ask(of_diameter(0.1), dry_air{}, 60.0, 300.0, 290.0).verdict();
  CHECK(fast.correlation_crossed(0, 0, side::above));
  CHECK_FALSE(fast.correlation_outside(1));
  // A hot wall in air has mu/mu_w below 1, outside Whitaker's data.
  const auto hot = ask(of_diameter(0.02), dry_air{}, 5.0, 300.0, 400.0).verdict();
  CHECK(hot.correlation_crossed(0, 2, side::below));
  CHECK_FALSE(hot.correlation_crossed(0, 0, side::above));
  // In water, wall colder than the stream, all is inside... but for its own mu/mu_w.
  const auto water = ask(of_diameter(0.01), liquid_water{}, 1.0, 300.0, 310.0, 1e6);
  CHECK(water.inside());
  // At rest Whitaker is not asked.
  const auto still = ask(of_diameter(0.1), dry_air{}, 0.0, 300.0, 400.0);
  CHECK(still.share(0) < 1e-3);
  CHECK(still.inside());
}

TEST_CASE("sphere: scatter of what spoke") {
  CHECK(ask(of_diameter(0.05), dry_air{}, 20.0, 300.0, 350.0).scatter() ==
        doctest::Approx(forced::scatter < 0.0 ? 0.0 : forced::scatter).epsilon(1e-2));
}

TEST_CASE("sphere: bad input is told") {
  const auto good = of_diameter(0.05);
  bad_length_is_told(good, [](auto& g, double x) { g.diameter = number<kinds::diameter>(x); });
  bad_state_is_told(good);
}
