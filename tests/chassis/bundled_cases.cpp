// The bundled cases, solved with the library's own walls.
#include <doctest/doctest.h>

#include <Eigen/SparseCore>
#include <cmath>
#include <convelope/fluids/dry_air.hpp>

#include "case/read_case.hpp"
#include "model/convelope_walls.hpp"
#include "model/newton.hpp"
#include "model/solution.hpp"
#include "model/start.hpp"
#include "model/uncertainty.hpp"
#include "small_case.hpp"

namespace {

using chassis::equations;
using chassis::wall_derivatives;

chassis::chassis_case bundled(const char* name) {
  return chassis::read_case_file(std::string(CONVELOPE_SOURCE_DIR "/examples/chassis/cases/") +
                                 name);
}

TEST_CASE("the default case is as large as it says") {
  const auto c = bundled("default.json");
  std::size_t parts = 0;
  for (const auto& b : c.boards) parts += b.components.size();
  CHECK(c.boards.size() >= 4);
  CHECK(parts >= 40);
  CHECK(c.fan);
  CHECK_FALSE(bundled("buoyancy.json").fan);
}

TEST_CASE("Newton closes the bundled cases within 8 steps from rest, frozen films need more") {
  const chassis::convelope_walls walls;
  for (const char* name : {"default.json", "buoyancy.json"}) {
    const auto c = bundled(name);
    CAPTURE(name);
    REQUIRE(c.solver.tolerance <= 1e-10);
    const equations system(c, walls);
    const auto start = chassis::uniform_start(system);
    for (int i = 0; i < system.places().flow(0); ++i) {
      REQUIRE(start[i] == c.ambient.temperature_K);
    }
    const auto newton = chassis::solve(system, start, wall_derivatives::exact);
    REQUIRE(newton.converged);
    CHECK(newton.residual <= 1e-10);
    CHECK(newton.iterations <= 8);

    const auto frozen = chassis::solve(system, start, wall_derivatives::off);
    CHECK(frozen.iterations > newton.iterations);

    auto s = chassis::read_off(system, newton.x);
    CHECK(std::abs(s.energy.mismatch()) < 1e-9 * s.energy.in_W);
    REQUIRE(chassis::add_band(system, newton.x, s.components));
    CHECK(s.components[0].lowest_K < s.components[0].hottest_K);
    CHECK(s.components[0].hottest_K < s.components[0].highest_K);
    for (const auto& p : s.patches) {
      CAPTURE(p.where);
      CHECK(p.h > 0);
      CHECK(p.words.correlation != "");
      CHECK(p.words.sentence != "");
      CHECK(p.words.inside == !(p.area_outside > 0));
    }
  }
}

TEST_CASE("with the library's walls every derivative agrees with a central difference") {
  const auto c = chassis_test::small_case();
  const chassis::convelope_walls walls;
  const equations system(c, walls);
  const auto& places = system.places();
  for (const double warmer : {0.0, 15.0}) {  // at rest (no wall differs from its air), and warm
    Eigen::VectorXd x = chassis::uniform_start(system);
    for (int i = 0; i < places.flow(0); ++i) x[i] += warmer * (1.3 + std::sin(1.7 * i));
    x[places.plenum()] += warmer;
    x[places.outer_wall(0)] += 0.5 * warmer;
    const auto sum = system.at(x, wall_derivatives::exact);
    Eigen::SparseMatrix<double> sparse(places.unknowns(), places.unknowns());
    sparse.setFromTriplets(sum.slopes.begin(), sum.slopes.end());
    const Eigen::MatrixXd exact = sparse;
    for (int k = 0; k < places.unknowns(); ++k) {
      const bool is_flow = k >= places.flow(0) && k < places.stack_pressure();
      // Natural convection turns on within 1e-6 K: too small a step would only see rounding.
      const double step = is_flow ? 1e-4 * x[k] : warmer > 0 ? 1e-2 : 1e-3;
      Eigen::VectorXd up = x, down = x;
      up[k] += step;
      down[k] -= step;
      const Eigen::VectorXd difference = (system.at(up, wall_derivatives::exact).residual -
                                          system.at(down, wall_derivatives::exact).residual) /
                                         (up[k] - down[k]);
      const double scale = exact.col(k).lpNorm<Eigen::Infinity>();
      CAPTURE(k);
      REQUIRE(scale > 0);
      if (warmer > 0 || k < places.outer_wall(0)) {
        CHECK((difference - exact.col(k)).lpNorm<Eigen::Infinity>() < 1e-6 * scale);
      }
    }
  }
}

// One warm board of even temperature in a tall box, all losses but friction left out: each passage
// is a vertical channel with one warm and one insulated wall. Its mean Nusselt number on the gap
// and on the difference from the inlet air is (144/El^2 + 2.873/sqrt(El))^(-1/2), Bar-Cohen and
// Rohsenow 1984, J. Heat Transfer 106, 116-123, El = g beta dT b^4/(nu alpha L) at the mean of
// wall and inlet temperature. In the narrow limit El/12 is the exact solution.
TEST_CASE("a buoyant passage agrees with Bar-Cohen and Rohsenow where the flow is developed") {
  auto c = chassis_test::small_case();
  const chassis::convelope_walls walls;
  c.fan.reset();
  c.outer_walls.clear();
  c.enclosure.length = 0.3;
  c.enclosure.width = 0.2;
  c.enclosure.plenum_height = 0;
  c.enclosure.vent_loss = 0;
  c.solver.tolerance = 1e-7;  // milliwatts in a thick plate: rounding is larger than usual
  c.boards.resize(1);
  auto& b = c.boards[0];
  b.length = 0.3;
  b.width = 0.2;
  b.cells_along = 30;
  b.cells_across = 2;
  b.layers = {{"even", 0.02, 1000, 1, 1000}};
  b.components.resize(1);
  b.components[0].at = {0, 0, 0.3, 0.2};
  c.passages.resize(2);
  const auto error_at = [&](double gap, double power) {
    for (auto& p : c.passages) {
      p.gap = gap;
      p.inlet_loss = p.outlet_loss = 0;
    }
    b.components[0].power_W = power;
    const equations system(c, walls);
    const auto run =
        chassis::solve(system, chassis::uniform_start(system), wall_derivatives::exact);
    REQUIRE(run.converged);
    const auto s = chassis::read_off(system, run.x);
    const double wall = s.components[0].face_K;
    const double inlet = c.ambient.temperature_K;
    const double mean = 0.5 * (wall + inlet);
    const auto v = convelope::dry_air{}.values(mean, c.ambient.pressure_Pa);
    const double El = 9.80665 / inlet * (wall - inlet) * std::pow(gap, 4) / 0.3 * v.density *
                      v.density * v.specific_heat / (v.viscosity * v.conductivity);
    const double Nu = power / (2 * 0.3 * 0.2) / (wall - inlet) * gap / v.conductivity;
    const double published = 1 / std::sqrt(144 / (El * El) + 2.873 / std::sqrt(El));
    CAPTURE(El);
    return Nu / published - 1;
  };
  // El 0.03, 0.2, 1.7 and 6.7. Wall and air differ by up to 40 K there, hence the growing distance.
  CHECK(std::abs(error_at(0.003, 0.003)) < 0.01);
  CHECK(std::abs(error_at(0.004, 0.03)) < 0.02);
  CHECK(std::abs(error_at(0.006, 0.3)) < 0.04);
  CHECK(std::abs(error_at(0.008, 1.0)) < 0.04);
}

}  // namespace
