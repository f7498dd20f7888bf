// Packs of faces against faces one by one.
#include "convelope/faces/widest.hpp"
#include "convelope/surfaces/cylinder.hpp"
#include "convelope/surfaces/duct.hpp"
#include "convelope/surfaces/vertical_plate.hpp"
#include "many.hpp"

using namespace many;

namespace {

template <class G, class Fluid>
auto wall_of(const G& g, const Fluid& f) {
  return surface(g, f, exposure<G, double>(2.0, 300.0, 101325.0));
}
const auto tube = wall_of(cylinder_in_crossflow{number<kinds::diameter>(0.03)}, dry_air_fast{});

using four [[maybe_unused]] = std::experimental::fixed_size_simd<double, 4>;

}  // namespace

TEST_CASE("packs of faces: every remainder, aligned or not") {
  for (std::size_t n = 0; n <= 33; ++n) {
    for (const std::size_t offset : {0U, 1U, 3U}) {
      CAPTURE(n);
      CAPTURE(offset);
      arrays a(n, static_cast<unsigned>(n), offset);
      CHECK(faces::evaluate<faces::widest>(tube, a.in(), a.out()) == faces::status::done);
      expect_as_alone(tube, a);
      // Nothing before the first face is touched.
      for (std::size_t i = 0; i < offset; ++i) {
        CHECK(a.flux[i] == 0.0);
        CHECK(a.verdict[i] == 0);
      }
    }
  }
}

#if !(defined(__clang__) && defined(__AVX512F__))  // see std_simd.hpp
TEST_CASE("packs of faces: a wider pack than the machine's") {
  arrays a(103, 50);
  CHECK(faces::evaluate<four>(tube, a.in(), a.out()) == faces::status::done);
  expect_as_alone(tube, a);
}
#endif

TEST_CASE("packs of faces: other walls and fluids") {
  arrays a(201, 51);
  const auto wall = wall_of(vertical_wall{number<kinds::height>(0.4)}, dry_air{});
  CHECK(faces::evaluate<faces::widest>(wall, a.in(), a.out()) == faces::status::done);
  expect_as_alone(wall, a);
  const auto duct = wall_of(round_duct_segment{number<kinds::hydraulic_diameter>(0.02),
                                               number<kinds::distance_from_inlet>(0.1),
                                               number<kinds::distance_from_inlet>(0.4)},
                            dry_air{});
  CHECK(faces::evaluate<faces::widest>(duct, a.in(), a.out()) == faces::status::done);
  expect_as_alone(duct, a);

  // Water, at temperatures and pressures inside and outside its range.
  for (double& p : a.pressure) p *= 50.0;
  for (double& T : a.wall) T = 260.0 + 0.4 * (T - 210.0);
  for (double& T : a.stream) T = 262.0 + 0.4 * (T - 180.0);
  const auto wet = wall_of(vertical_wall{number<kinds::height>(0.4)}, liquid_water{});
  CHECK(faces::evaluate<faces::widest>(wet, a.in(), a.out()) == faces::status::done);
  expect_as_alone(wet, a);
}

TEST_CASE("packs of faces: a bad lane is told, its neighbours are untouched") {
  arrays a(17, 52);
  arrays good(17, 52);
  a.wall[1] = not_a_number;
  a.velocity[4] = infinity;
  a.stream[6] = 0.0;
  a.pressure[11] = not_a_number;
  CHECK(faces::evaluate<faces::widest>(tube, a.in(), a.out()) == faces::status::done);
  CHECK(faces::evaluate<faces::widest>(tube, good.in(), good.out()) == faces::status::done);
  CHECK_FALSE(verdict<>(a.verdict[1]).finite_input());
  CHECK_FALSE(verdict<>(a.verdict[4]).finite_input());
  CHECK_FALSE(verdict<>(a.verdict[6]).possible_input());
  CHECK_FALSE(verdict<>(a.verdict[11]).finite_input());
  for (std::size_t i = 0; i < 17; ++i) {
    if (i == 1 || i == 4 || i == 6 || i == 11) continue;
    CAPTURE(i);
    CHECK(a.flux[i] == good.flux[i]);
    CHECK(a.verdict[i] == good.verdict[i]);
  }
}

TEST_CASE("packs of faces: refused like single ones") {
  arrays a(20, 53);
  const std::span<double> wall(a.wall);
  CHECK(faces::evaluate<faces::widest>(tube, {.wall_temperature_K = wall}, {.flux_W_m2 = wall}) ==
        faces::status::overlapping);
  CHECK(faces::evaluate<faces::widest>(tube, {.wall_temperature_K = wall},
                                       {.flux_W_m2 = std::span(a.flux).first(19)}) ==
        faces::status::lengths_differ);
}
