// A horizontal cylinder from rest to a fast stream.
#include "convelope/surfaces/cylinder.hpp"

#include "scan.hpp"

using namespace scan;

namespace {

cylinder_in_crossflow of_diameter(double D) { return {number<kinds::diameter>(D)}; }
const auto any_cylinder = [](random_numbers& r) { return of_diameter(r.log_between(1e-4, 1.0)); };

using forced = cylinder_in_crossflow::forced;
using natural = cylinder_in_crossflow::natural;

}  // namespace

TEST_CASE("cylinder: no step anywhere, right sign, exact slope") {
  everywhere(11, any_cylinder, dry_air{}, air_range);
  everywhere(12, any_cylinder, dry_air_fast{}, air_range, 100.0, 4);
  everywhere(13, any_cylinder, liquid_water{}, water_range, 10.0, 4);
  everywhere(14, any_cylinder, oil(), any_range, 10.0, 4);
  everywhere(15, any_cylinder, mercury(), any_range, 10.0, 4);
  everywhere(16, any_cylinder, liquid_water{}, cold_water_range, 1.0);
}

TEST_CASE("cylinder: no step over its diameter") {
  for (const double u : {0.0, 0.3, -20.0}) {
    no_steps_over([&](double D) { return point_of(of_diameter(D), dry_air{}, u, 300.0, 380.0); },
                  1e-6, 10.0);
  }
}

TEST_CASE("cylinder: the bare correlations at both ends") {
  const double D = 0.02;
  const auto v = dry_air{}.values(340.0, 101325.0);
  const double Pr = v.prandtl();
  const double nu = v.kinematic_viscosity();
  const double to_h = v.conductivity / D;

  // Beta of a gas at the ambient temperature.
  const double Ra = 9.80665 / 300.0 * 80.0 * D * D * D / (nu * v.diffusivity());
  const double h_rest = ask(of_diameter(D), dry_air{}, 0.0, 300.0, 380.0).coefficient().si();
  CHECK(h_rest == doctest::Approx(natural::formula(Ra, Pr) * to_h).epsilon(1e-5));

  for (const double u : {50.0, -50.0}) {
    const auto fast = ask(of_diameter(D), dry_air{}, u, 300.0, 380.0);
    CHECK(fast.coefficient().si() ==
          doctest::Approx(forced::formula(50.0 * D / nu, Pr) * to_h).epsilon(1e-5));
    CHECK(fast.share(0) > 0.9999);
  }
  // Conduction into still fluid is counted once: 0.36, the natural law at Ra = 0.
  CHECK(ask(of_diameter(D), dry_air{}, 0.0, 300.0, 300.0).coefficient().si() * D /
            dry_air{}.values(300.0, 101325.0).conductivity ==
        doctest::Approx(0.36).epsilon(0.01));
}

TEST_CASE("cylinder: joined with exponent 4 where both matter") {
  const double D = 0.05;
  const auto v = dry_air{}.values(340.0, 101325.0);
  const double u = 0.3;
  const double F = forced::formula(u * D / v.kinematic_viscosity(), v.prandtl());
  const double N = natural::formula(
      9.80665 / 300.0 * 80.0 * D * D * D / (v.kinematic_viscosity() * v.diffusivity()),
      v.prandtl());
  const auto a = ask(of_diameter(D), dry_air{}, u, 300.0, 380.0);
  const double joined = std::pow(std::pow(F, 4) + std::pow(N, 4) - std::pow(0.3, 4), 0.25);
  CHECK(a.coefficient().si() == doctest::Approx(joined * v.conductivity / D).epsilon(1e-12));
  const double share = (std::pow(F, 4) - std::pow(0.3, 4)) / std::pow(joined, 4);
  CHECK(share > 0.1);
  CHECK(share < 0.99);
  CHECK(a.share(0) == doctest::Approx(share).epsilon(1e-12));
}

TEST_CASE("cylinder: who crossed, and who is not asked") {
  // Re about 1e8: the forced law alone is beyond its data.
  const auto fast = ask(of_diameter(10.0), dry_air{}, 200.0, 300.0, 310.0).verdict();
  CHECK(fast.correlation_crossed(0, 0, side::above));
  CHECK_FALSE(fast.correlation_outside(1));
  CHECK_FALSE(fast.inside());
  // At rest Re Pr is far below 0.2, and nobody minds.
  const auto still = ask(of_diameter(0.05), dry_air{}, 0.0, 300.0, 350.0);
  CHECK(still.share(0) < 1e-3);
  CHECK(still.inside());
  // A tall pipe in hot still water: Ra above 1e12.
  const auto big = ask(of_diameter(3.0), liquid_water{}, 0.0, 300.0, 350.0, 1e6).verdict();
  CHECK_FALSE(big.correlation_outside(0));
  CHECK(big.correlation_outside(1));
  // Fluid outside: 190 K mean.
  const auto cold = ask(of_diameter(0.05), dry_air{}, 1.0, 190.0, 190.0).verdict();
  CHECK(cold.fluid_crossed(0, side::below));
  CHECK_FALSE(cold.correlation_outside(0));
}

TEST_CASE("cylinder: scatter of what spoke") {
  const auto fast = ask(of_diameter(0.05), dry_air{}, 50.0, 300.0, 350.0);
  CHECK(fast.scatter() == doctest::Approx(forced::scatter).epsilon(1e-4));
  CHECK(fast.verdict().scatter_stated());
  // The natural law states none, which is told.
  const auto still = ask(of_diameter(0.05), dry_air{}, 0.0, 300.0, 350.0);
  CHECK(natural::scatter < 0.0);
  CHECK_FALSE(still.verdict().scatter_stated());
  CHECK(still.scatter() < 0.02);
}

TEST_CASE("cylinder: bad input is told") {
  const auto good = of_diameter(0.05);
  bad_length_is_told(good, [](auto& g, double x) { g.diameter = number<kinds::diameter>(x); });
  bad_state_is_told(good);
  auto g = good;
  g.gravity = number<kinds::gravity>(std::nan(""));
  CHECK_FALSE(ask(g, dry_air{}, 1.0, 300.0, 350.0).verdict().finite_input());
}
