// Batches of faces by xsimd, where it is installed, against faces one by one.
#if __has_include(<xsimd/xsimd.hpp>) && !(defined(__clang__) && defined(__FAST_MATH__))
#include "convelope/faces/xsimd.hpp"

#include "convelope/surfaces/cylinder.hpp"
#include "many.hpp"

using namespace many;

TEST_CASE("xsimd batches of faces: every remainder, contiguous and in cells") {
  using batch = xsimd::batch<double>;
  const auto tube = surface(cylinder_in_crossflow{number<kinds::diameter>(0.03)}, dry_air_fast{},
                            exposure<cylinder_in_crossflow, double>(2.0, 300.0, 101325.0));
  for (std::size_t n = 0; n <= 2 * batch::size + 1; ++n) {
    CAPTURE(n);
    arrays a(n, 31, 1);
    CHECK(faces::evaluate<batch>(tube, a.in(), a.out()) == faces::status::done);
    expect_as_alone(tube, a);

    struct cell {
      double wall;
      double other;
    };
    std::vector<cell> cells(n);
    for (std::size_t i = 0; i < n; ++i) cells[i] = {a.wall[i + 1], 0.0};
    std::vector<double> q(n);
    CHECK(faces::evaluate<batch>(tube, {faces::member(std::span<const cell>(cells), &cell::wall)},
                                 {.flux_W_m2 = q}) == faces::status::done);
    for (std::size_t i = 0; i < n; ++i) {
      const auto one = tube.at(number<kinds::wall_temperature>(cells[i].wall));
      CHECK(close(q[i], one.flux().si(), one.coefficient().si() * cells[i].wall));
    }
  }
}
#else
#include "convelope/faces/widest.hpp"
#include "convelope/surfaces/cylinder.hpp"
#include "many.hpp"

using namespace many;

TEST_CASE("without xsimd there is a widest pack all the same") {
  const auto tube = surface(cylinder_in_crossflow{number<kinds::diameter>(0.03)}, dry_air_fast{},
                            exposure<cylinder_in_crossflow, double>(2.0, 300.0, 101325.0));
  arrays a(19, 31);
  CHECK(faces::evaluate<faces::widest>(tube, a.in(), a.out()) == faces::status::done);
  expect_as_alone(tube, a);
}
#endif
