// A good case arrives in SI units and kelvin.
#include <doctest/doctest.h>

#include "small_case.hpp"

namespace {

using doctest::Approx;

TEST_CASE("every number of the small case, in SI units") {
  const auto c = chassis_test::small_case();
  CHECK(c.name == "Small box");
  CHECK(c.ambient.temperature_K == Approx(298.15));
  CHECK(c.ambient.pressure_Pa == 101325);
  CHECK(c.ambient.outer_air_speed_m_s == 0.2);
  CHECK(c.enclosure.direction == chassis::flow_direction::upward);
  CHECK(c.enclosure.length == Approx(0.12));
  CHECK(c.enclosure.width == Approx(0.09));
  CHECK(c.enclosure.plenum_height == Approx(0.03));
  CHECK(c.enclosure.vent_area == Approx(0.002));
  CHECK(c.enclosure.vent_loss == 2);

  REQUIRE(c.fan);
  CHECK(c.fan->count == 1);
  REQUIRE(c.fan->points.size() == 3);
  CHECK(c.fan->points[1].flow_m3_s == Approx(8 / 3600.0));
  CHECK(c.fan->points[1].pressure_Pa == 14);

  REQUIRE(c.passages.size() == 3);
  CHECK(c.passages[1].gap == Approx(0.01));
  CHECK(c.passages[1].inlet_loss == 0.5);  // what docs/case-file.md promises if left out
  CHECK(c.passages[1].outlet_loss == 1.0);

  REQUIRE(c.boards.size() == 2);
  const auto& a = c.boards[0];
  CHECK(a.length == Approx(0.12));
  CHECK(a.width == Approx(0.09));
  CHECK(a.cells_along == 6);
  CHECK(a.cells_across == 4);
  REQUIRE(a.components.size() == 2);
  CHECK(a.components[0].side == chassis::face::front);
  CHECK(a.components[1].side == chassis::face::back);
  CHECK(a.components[0].at.x == Approx(0.02));
  CHECK(a.components[1].at.y == Approx(0.03));
  CHECK(a.components[0].at.length == Approx(0.03));
  CHECK(a.components[1].at.width == Approx(0.02));
  CHECK(a.components[0].power_W == 5);
  CHECK(a.components[0].to_board_K_W == 1);
  CHECK(*a.components[0].limit_K == Approx(368.15));
  CHECK_FALSE(a.components[1].limit_K);

  const auto& layers = c.boards[1].layers;
  REQUIRE(layers.size() == 2);
  CHECK(layers[0].thickness == Approx(7e-5));
  CHECK(layers[0].conductivity == 390);
  CHECK(layers[0].coverage == 0.5);
  CHECK(layers[0].fill_conductivity == 0.3);
  CHECK(layers[1].coverage == 1);

  REQUIRE(c.outer_walls.size() == 1);
  CHECK(c.outer_walls[0].faces == chassis::facing::sideways);
  CHECK(c.outer_walls[0].length == Approx(0.15));
  CHECK(c.outer_walls[0].height == Approx(0.12));
  CHECK(c.outer_walls[0].emissivity == 0.9);
  CHECK(c.outer_walls[0].inside_film_W_m2K == 6);
  CHECK(c.solver.tolerance == 1e-10);
  CHECK(c.solver.max_iterations == 30);
}

}  // namespace
