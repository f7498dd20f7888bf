// The coupled balances: derivatives, energy, exact passages, Newton against frozen films.
#include <doctest/doctest.h>

#include <Eigen/SparseCore>
#include <cmath>

#include "model/constants.hpp"
#include "model/newton.hpp"
#include "model/segment_mean.hpp"
#include "model/solution.hpp"
#include "model/start.hpp"
#include "model/uncertainty.hpp"
#include "small_case.hpp"
#include "test_walls.hpp"

namespace {

using chassis::equations;
using chassis::face;
using chassis::wall_derivatives;
using chassis_test::simple_walls;
using chassis_test::small_case;

void make_lively(simple_walls& walls) {
  walls.per_wall = 0.12;
  walls.per_stream = -0.05;
  walls.per_flux = 1.5;
  walls.outer_per_wall = 0.08;
  walls.viscosity_slope = 4.5e-8;
}

TEST_CASE("every derivative agrees with a central difference") {
  const auto c = small_case();
  simple_walls walls;
  make_lively(walls);
  const equations system(c, walls);
  Eigen::VectorXd x = chassis::uniform_start(system);
  const auto& places = system.places();
  for (int i = 0; i < places.flow(0); ++i) x[i] += 20 + 15 * std::sin(1.7 * i);
  x[places.plenum()] += 17;
  x[places.outer_wall(0)] += 8;

  const auto sum = system.at(x, wall_derivatives::exact);
  Eigen::SparseMatrix<double> sparse(places.unknowns(), places.unknowns());
  sparse.setFromTriplets(sum.slopes.begin(), sum.slopes.end());
  const Eigen::MatrixXd exact = sparse;
  for (int k = 0; k < places.unknowns(); ++k) {
    const double step = k >= places.flow(0) && k < places.stack_pressure() ? 1e-4 * x[k] : 1e-2;
    Eigen::VectorXd up = x, down = x;
    up[k] += step;
    down[k] -= step;
    const Eigen::VectorXd difference = (system.at(up, wall_derivatives::exact).residual -
                                        system.at(down, wall_derivatives::exact).residual) /
                                       (up[k] - down[k]);
    const double scale = exact.col(k).lpNorm<Eigen::Infinity>();
    const double error = (difference - exact.col(k)).lpNorm<Eigen::Infinity>();
    CAPTURE(k);
    REQUIRE(scale > 0);
    CHECK(error < 1e-6 * scale);
  }
}

TEST_CASE("heat in is heat out") {
  auto c = small_case();
  simple_walls walls;
  make_lively(walls);
  for (const bool with_fan : {true, false}) {
    if (!with_fan) c.fan.reset();
    const equations system(c, walls);
    const auto run =
        chassis::solve(system, chassis::uniform_start(system), wall_derivatives::exact);
    REQUIRE(run.converged);
    CHECK(run.iterations <= 8);
    const auto s = chassis::read_off(system, run.x);
    CHECK(s.energy.in_W == doctest::Approx(10).epsilon(1e-14));
    CHECK(std::abs(s.energy.mismatch()) < 1e-9 * s.energy.in_W);
    double from_faces = 0;
    for (const auto& p : s.patches) {
      if (p.where.rfind("outer", 0) != 0) from_faces += p.heat_W;
    }
    CHECK(std::abs(from_faces - s.energy.in_W) < 1e-9 * s.energy.in_W);
    CHECK(s.energy.by_walls_W > 0);
    CHECK(s.components.front().hottest_K > c.ambient.temperature_K);
  }
}

TEST_CASE("frozen films reach the same answer in more steps") {
  const auto c = small_case();
  simple_walls walls;
  make_lively(walls);
  const equations system(c, walls);
  const auto start = chassis::uniform_start(system);
  for (int i = 0; i < system.places().flow(0); ++i) REQUIRE(start[i] == c.ambient.temperature_K);
  const auto newton = chassis::solve(system, start, wall_derivatives::exact);
  const auto frozen = chassis::solve(system, start, wall_derivatives::off);
  REQUIRE(newton.converged);
  REQUIRE(frozen.converged);
  CHECK(newton.iterations < frozen.iterations);
  CHECK((newton.x - frozen.x).lpNorm<Eigen::Infinity>() < 1e-6);
}

// A board whose faces all have one temperature warms the air by the textbook exponential
// (T_wall - T_out)/(T_wall - T_in) = exp(-h A/(m cp)), however many segments there are.
TEST_CASE("air follows the exponential exactly in one segment and in many") {
  auto c = small_case();
  simple_walls walls;
  for (const std::size_t rows : {2u, 3u, 40u}) {
    for (auto& b : c.boards) {
      b.cells_along = rows;
      b.length = c.enclosure.length;
    }
    const equations system(c, walls);
    const auto& places = system.places();
    Eigen::VectorXd x = chassis::uniform_start(system);
    for (int i = 0; i < places.mean(0, 0); ++i) x[i] = 350;
    // The air balances are linear in the air for constant h: one correction on them alone.
    const std::size_t p = 1;
    const double capacity = x[places.flow(p)] * walls.cp;
    double area = 0;
    for (std::size_t s = 0; s < places.passages[p].size(); ++s) {
      double conductance = 0;
      for (const auto k : places.passages[p][s].contacts) {
        conductance += walls.h * places.contacts[k].area;
      }
      area += conductance / walls.h;
      const double in = s == 0 ? c.ambient.temperature_K : x[places.outgoing(p, s - 1)];
      const double n = conductance / capacity;
      x[places.outgoing(p, s)] = 350 - (350 - in) * std::exp(-n);
      x[places.mean(p, s)] = 350 - (350 - in) * (1 - std::exp(-n)) / n;
    }
    const auto sum = system.at(x, wall_derivatives::exact);
    for (std::size_t s = 0; s < places.passages[p].size(); ++s) {
      CHECK(std::abs(sum.residual[places.mean(p, s)]) < 1e-11);
      CHECK(std::abs(sum.residual[places.outgoing(p, s)]) < 1e-13);
    }
    const double out = x[places.outgoing(p, places.passages[p].size() - 1)];
    CHECK((350 - out) / (350 - c.ambient.temperature_K) ==
          doctest::Approx(std::exp(-walls.h * area / capacity)).epsilon(1e-12));
  }
}

TEST_CASE("the mean of an exponential keeps its digits") {
  // Both branches against each other where they meet, and against the series at small N.
  for (const double n : {0.4999, 0.5001}) {
    const auto psi = chassis::exponential_mean(n);
    CHECK(psi.value == doctest::Approx((n - 1 + std::exp(-n)) / (n * n)).epsilon(1e-14));
    const double step = 1e-5;
    const auto f = [](double v) { return (v - 1 + std::exp(-v)) / (v * v); };
    CHECK(psi.slope == doctest::Approx((f(n + step) - f(n - step)) / (2 * step)).epsilon(1e-8));
  }
  CHECK(chassis::exponential_mean(0).value == 0.5);
  CHECK(chassis::exponential_mean(0).slope == doctest::Approx(-1.0 / 6).epsilon(1e-15));
  CHECK(chassis::exponential_mean(1e-9).value == doctest::Approx(0.5 - 1e-9 / 6).epsilon(1e-15));
  CHECK(chassis::exponential_mean(1e6).value == doctest::Approx(1e-6).epsilon(2e-6));
}

// With laminar friction alone, equal gaps and no heat, the flow has a closed form:
// dp = 12 mu L G/(rho gap^2), and the fan is a straight line.
TEST_CASE("the fan point of laminar passages") {
  auto c = small_case();
  simple_walls walls;
  c.enclosure.vent_loss = 0;
  c.enclosure.direction = chassis::flow_direction::horizontal;
  c.fan->points = {{0, 20}, {0.002, 0}};
  for (auto& p : c.passages) {
    p.gap = 0.005;
    p.inlet_loss = p.outlet_loss = 0;
  }
  for (auto& b : c.boards) {
    for (auto& part : b.components) part.power_W = 0;
  }
  const equations system(c, walls);
  const auto run = chassis::solve(system, chassis::uniform_start(system), wall_derivatives::exact);
  REQUIRE(run.converged);
  const double rho = walls.density(c.ambient.temperature_K, c.ambient.pressure_Pa).value;
  // 20 (1 - Q/0.002) = 12 mu L Q/(3 W gap^3)
  const double resistance =
      12 * walls.viscosity * c.enclosure.length / (3 * c.enclosure.width * std::pow(0.005, 3));
  const double flow = 20 / (resistance + 20 / 0.002);
  for (std::size_t p = 0; p < 3; ++p) {
    CHECK(run.x[system.places().flow(p)] == doctest::Approx(rho * flow / 3).epsilon(1e-9));
  }
}

// Chimney: weight of the missing air against laminar friction, in closed form for a uniform
// air temperature; here checked on the residual of the pressure balance.
TEST_CASE("buoyancy is the weight that the warm column lacks") {
  auto c = small_case();
  simple_walls walls;
  c.fan.reset();
  const equations system(c, walls);
  const auto& places = system.places();
  Eigen::VectorXd x = chassis::uniform_start(system);
  const double warm = c.ambient.temperature_K + 30;
  for (int i = 0; i < places.flow(0); ++i) x[i] = warm;
  x[places.plenum()] = warm;
  const double cold_rho = walls.density(c.ambient.temperature_K, c.ambient.pressure_Pa).value;
  const double rho = walls.density(warm, c.ambient.pressure_Pa).value;
  const double head = 9.80665 * c.enclosure.length * (cold_rho - rho);
  for (std::size_t p = 0; p < 3; ++p) {
    const auto run = system.run(x, p);
    const double flux = run.mass_flux;
    const double expected = walls.passage_friction(run).pressure_Pa +
                            0.5 * flux * flux * (0.5 / cold_rho + 1.0 / rho) - head -
                            x[places.stack_pressure()];
    const double reference = 9.80665 * cold_rho * c.enclosure.length / c.ambient.temperature_K;
    CHECK(system.at(x, wall_derivatives::exact).residual[places.flow(p)] ==
          doctest::Approx(expected / reference).epsilon(1e-9));
  }
}

TEST_CASE("refining the mesh changes the answer by a quarter as much each time") {
  auto c = small_case();
  simple_walls walls;
  c.boards[1].length = 0.12;
  c.boards[1].width = 0.09;
  std::vector<double> hottest;
  for (const std::size_t n : {1u, 2u, 4u}) {
    for (auto& b : c.boards) {
      b.cells_along = 12 * n;  // component edges lie on cell edges on every mesh
      b.cells_across = 9 * n;
    }
    const equations system(c, walls);
    const auto run =
        chassis::solve(system, chassis::uniform_start(system), wall_derivatives::exact);
    REQUIRE(run.converged);
    hottest.push_back(chassis::component_temperatures(system, run.x)[0].face_K);
  }
  const double ratio = (hottest[0] - hottest[1]) / (hottest[1] - hottest[2]);
  CAPTURE(hottest[2]);
  CHECK(std::log2(ratio) > 1.7);
  CHECK(std::log2(ratio) < 2.3);
}

TEST_CASE("the band brackets the answer and shrinks with the scatter") {
  const auto c = small_case();
  simple_walls walls;
  double before = 1e9;
  for (const double band : {0.3, 0.1}) {
    walls.band = band;
    const equations system(c, walls);
    const auto run =
        chassis::solve(system, chassis::uniform_start(system), wall_derivatives::exact);
    REQUIRE(run.converged);
    auto parts = chassis::component_temperatures(system, run.x);
    REQUIRE(chassis::add_band(system, run.x, parts));
    for (const auto& one : parts) {
      CHECK(one.lowest_K < one.hottest_K);
      CHECK(one.hottest_K < one.highest_K);
    }
    const double width = parts[0].highest_K - parts[0].lowest_K;
    CHECK(width < before);
    before = width;
  }
}

TEST_CASE("a run that is stopped too early says so") {
  auto c = small_case();
  simple_walls walls;
  make_lively(walls);
  c.solver.max_iterations = 1;
  const equations system(c, walls);
  const auto run = chassis::solve(system, chassis::uniform_start(system), wall_derivatives::exact);
  CHECK_FALSE(run.converged);
  const auto message = chassis::not_converged(run, c);
  CHECK(message.rfind("the balances did not close: residual ", 0) == 0);
  CHECK(message.find("after 1 iterations (limit 1); expected <= 1e-10") != std::string::npos);
}

TEST_CASE("the fan curve passes through its points, never rises, and has a continuous slope") {
  chassis::fan f;
  f.count = 2;
  f.points = {{0, 42}, {0.003, 35}, {0.006, 34}, {0.012, 0}};
  const chassis::fan_curve curve(f);
  for (const auto& p : f.points) {
    CHECK(curve.pressure(2 * p.flow_m3_s).value == doctest::Approx(p.pressure_Pa).epsilon(1e-12));
  }
  double before = 1e9;
  for (double q = -0.002; q < 0.03; q += 1.3e-5) {
    const auto here = curve.pressure(q);
    CHECK(here.value <= before);
    before = here.value;
    const double step = 1e-8;
    const double slope =
        (curve.pressure(q + step).value - curve.pressure(q - step).value) / (2 * step);
    CHECK(here.slope == doctest::Approx(slope).epsilon(1e-3));
  }
}

TEST_CASE("the vents lose their velocity heads on their free area") {
  const auto c = small_case();
  simple_walls walls;
  const equations system(c, walls);
  const auto& places = system.places();
  const auto run = chassis::solve(system, chassis::uniform_start(system), wall_derivatives::exact);
  REQUIRE(run.converged);
  double flow = 0;
  for (std::size_t p = 0; p < 3; ++p) flow += run.x[places.flow(p)];
  const double rho = walls.density(c.ambient.temperature_K, c.ambient.pressure_Pa).value;
  const double warm_rho = walls.density(run.x[places.plenum()], c.ambient.pressure_Pa).value;
  const double speed = flow / (rho * 2000e-6);
  const double fan_Pa = system.fan()->pressure(flow / rho).value;
  const double head_Pa = 9.80665 * 0.03 * (rho - warm_rho);
  CHECK(run.x[places.stack_pressure()] ==
        doctest::Approx(fan_Pa + head_Pa - 2 * 0.5 * rho * speed * speed).epsilon(1e-8));
}

TEST_CASE("the start balances all pressures, and all heat but the power") {
  const auto c = small_case();
  simple_walls walls;
  const equations system(c, walls);
  const auto& places = system.places();
  const auto x = chassis::uniform_start(system);
  const auto sum = system.at(x, wall_derivatives::exact);
  for (int i = places.flow(0); i <= places.stack_pressure(); ++i) {
    CHECK(std::abs(sum.residual[i]) < 1e-9);
  }
  CHECK(sum.residual.head(places.flow(0)).lpNorm<1>() == doctest::Approx(1).epsilon(1e-9));
}

TEST_CASE("power enters the face its component sits on") {
  const auto c = small_case();
  const chassis::layout places(c);
  double back = 0, front = 0;
  for (const double w : places.boards[0].back_power) back += w;
  for (const double w : places.boards[0].front_power) front += w;
  CHECK(front == doctest::Approx(5).epsilon(1e-13));
  CHECK(back == doctest::Approx(2).epsilon(1e-13));
  CHECK(places.total_power == 10);
}

TEST_CASE("a component is warmer than its face by its power times its resistance") {
  auto c = small_case();
  simple_walls walls;
  c.boards[0].components[0].to_board_K_W = 1.5;
  const equations system(c, walls);
  Eigen::VectorXd x = chassis::uniform_start(system);
  x.setConstant(320);
  const auto parts = chassis::component_temperatures(system, x);
  REQUIRE(parts.size() == 3);
  CHECK(parts[0].face_K == doctest::Approx(320).epsilon(1e-13));
  CHECK(parts[0].hottest_K == doctest::Approx(327.5).epsilon(1e-13));
}

// The same two runs made by hand: films times (1 -+ 0.2), friction times (1 +- 0.1).
TEST_CASE("the band is that of poor films with high friction and good films with low friction") {
  const auto c = small_case();
  simple_walls walls;
  const equations system(c, walls);
  const auto start = chassis::uniform_start(system);
  const auto run = chassis::solve(system, start, wall_derivatives::exact);
  auto parts = chassis::component_temperatures(system, run.x);
  REQUIRE(chassis::add_band(system, run.x, parts));
  const auto temperature_with = [&](double films, double friction) {
    equations shifted = system;
    shifted.film_factor.assign(shifted.film_factor.size(), films);
    shifted.outer_factor.assign(shifted.outer_factor.size(), films);
    shifted.loss_factor.assign(shifted.loss_factor.size(), friction);
    const auto result = chassis::solve(shifted, start, wall_derivatives::exact);
    return chassis::component_temperatures(shifted, result.x)[0].hottest_K;
  };
  CHECK(parts[0].highest_K == doctest::Approx(temperature_with(0.8, 1.1)).epsilon(1e-9));
  CHECK(parts[0].lowest_K == doctest::Approx(temperature_with(1.2, 0.9)).epsilon(1e-9));
}

}  // namespace
