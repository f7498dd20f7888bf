// Many faces, one by one: arrays in, arrays out, and what is refused.
#include "convelope/faces/evaluate.hpp"

#include <algorithm>
#include <string>
#include <thread>

#include "convelope/surfaces/cylinder.hpp"
#include "convelope/surfaces/vertical_channel.hpp"
#include "many.hpp"

using namespace many;

namespace {

const auto tube = surface(cylinder_in_crossflow{number<kinds::diameter>(0.03)}, dry_air_fast{},
                          exposure<cylinder_in_crossflow, double>(2.0, 300.0, 101325.0));
using faces::status;

}  // namespace

TEST_CASE("faces: each as if alone") {
  arrays a(500, 1);
  CHECK(faces::evaluate(tube, a.in(), a.out()) == status::done);
  expect_as_alone(tube, a);
}

TEST_CASE("faces: what has no array is the same for all, what is not asked for is not written") {
  arrays a(40, 2);
  for (double& x : a.slope) x = -1.0;
  CHECK(faces::evaluate(tube, {.wall_temperature_K = a.wall}, {.flux_W_m2 = a.flux}) ==
        status::done);
  for (std::size_t i = 0; i < 40; ++i) {
    const auto one = tube.at(number<kinds::wall_temperature>(a.wall[i]));
    CHECK(close(a.flux[i], one.flux().si(), std::fabs(one.flux().si())));
    CHECK(a.slope[i] == -1.0);
  }
  CHECK(faces::evaluate(tube, {.wall_temperature_K = a.wall, .velocity_m_s = a.velocity},
                        {.slope_W_m2K = a.slope}) == status::done);
  const auto one = tube.at(number<kinds::wall_temperature>(a.wall[3]),
                           exposure<cylinder_in_crossflow, double>(a.velocity[3], 300.0, 101325.0));
  CHECK(close(a.slope[3], one.slope().si(), one.slope().si()));
}

TEST_CASE("faces: none at all") {
  CHECK(faces::evaluate(tube, {}, {}) == status::done);
  arrays a(0, 3);
  CHECK(faces::evaluate(tube, a.in(), a.out()) == status::done);
}

TEST_CASE("faces: arrays of different lengths are refused, whichever it is") {
  arrays a(20, 4);
  arrays marked(20, 4);
  const auto shorter = [](auto column) { return column.part(0, 19); };
  for (int which = 0; which < 8; ++which) {
    CAPTURE(which);
    faces::inputs in = a.in();
    faces::outputs out = a.out();
    switch (which) {
      case 0:
        in.wall_temperature_K = shorter(in.wall_temperature_K);
        break;
      case 1:
        in.velocity_m_s = shorter(in.velocity_m_s);
        break;
      case 2:
        in.stream_temperature_K = shorter(in.stream_temperature_K);
        break;
      case 3:
        in.pressure_Pa = shorter(in.pressure_Pa);
        break;
      case 4:
        out.flux_W_m2 = shorter(out.flux_W_m2);
        break;
      case 5:
        out.slope_W_m2K = shorter(out.slope_W_m2K);
        break;
      case 6:
        out.coefficient_W_m2K = shorter(out.coefficient_W_m2K);
        break;
      default:
        out.verdict = shorter(out.verdict);
    }
    CHECK(faces::evaluate(tube, in, out) == status::lengths_differ);
    CHECK(a.flux == marked.flux);
    CHECK(a.verdict == marked.verdict);
  }
  // No wall temperatures, but somewhere to write.
  CHECK(faces::evaluate(tube, {}, a.out()) == status::lengths_differ);
}

TEST_CASE("faces: an output over another array is refused") {
  arrays a(20, 5);
  const arrays before(20, 5);
  const std::span<double> wall(a.wall);
  CHECK(faces::evaluate(tube, {.wall_temperature_K = wall}, {.flux_W_m2 = wall}) ==
        status::overlapping);
  // By one number only.
  CHECK(faces::evaluate(tube, {.wall_temperature_K = wall.first(10)},
                        {.slope_W_m2K = wall.subspan(9, 10)}) == status::overlapping);
  CHECK(a.wall == before.wall);
  const std::span<double> flux(a.flux);
  CHECK(faces::evaluate(tube, {.wall_temperature_K = a.wall},
                        {.flux_W_m2 = flux, .coefficient_W_m2K = flux}) == status::overlapping);
  CHECK(a.flux == before.flux);
  // Neighbours are no overlap, and inputs may share.
  CHECK(faces::evaluate(tube, {.wall_temperature_K = wall.first(10)},
                        {.slope_W_m2K = wall.subspan(10, 10)}) == status::done);
  CHECK(faces::evaluate(tube, {.wall_temperature_K = wall, .stream_temperature_K = wall},
                        {.flux_W_m2 = a.flux}) == status::done);
  // An empty array somewhere inside another is not there.
  CHECK(faces::evaluate(tube, {.wall_temperature_K = a.wall},
                        {.flux_W_m2 = a.flux, .slope_W_m2K = flux.subspan(5, 0)}) == status::done);
}

TEST_CASE("faces: a velocity for a surface that takes none is refused, not ignored") {
  const auto channel =
      surface(open_vertical_channel{number<kinds::gap>(0.01), number<kinds::height>(0.3)},
              dry_air_fast{}, exposure<open_vertical_channel, double>(0.0, 300.0, 101325.0));
  arrays a(5, 6);
  CHECK(faces::evaluate(channel, a.in(), a.out()) == status::no_velocity);
  faces::inputs in = a.in();
  in.velocity_m_s = {};
  CHECK(faces::evaluate(channel, in, a.out()) == status::done);
  expect_as_alone(channel, a);
}

TEST_CASE("faces: bad faces are told, their neighbours are untouched") {
  arrays a(9, 7);
  arrays good(9, 7);
  a.wall[1] = not_a_number;
  a.velocity[3] = infinity;
  a.stream[5] = -4.0;
  a.pressure[7] = -infinity;
  CHECK(faces::evaluate(tube, a.in(), a.out()) == status::done);
  CHECK(faces::evaluate(tube, good.in(), good.out()) == status::done);
  CHECK_FALSE(verdict<>(a.verdict[1]).finite_input());
  CHECK_FALSE(verdict<>(a.verdict[3]).finite_input());
  CHECK_FALSE(verdict<>(a.verdict[5]).possible_input());
  CHECK_FALSE(verdict<>(a.verdict[7]).finite_input());
  for (const std::size_t i : {0U, 2U, 4U, 6U, 8U}) {
    CHECK(a.flux[i] == good.flux[i]);
    CHECK(a.verdict[i] == good.verdict[i]);
  }
}

TEST_CASE("faces: words for every status") {
  CHECK(std::string(words(status::done)) == "done");
  CHECK(std::string(words(status::lengths_differ)).find("length") != std::string::npos);
  CHECK(std::string(words(status::overlapping)).find("overlap") != std::string::npos);
  CHECK(std::string(words(status::no_velocity)).find("velocity") != std::string::npos);
}

TEST_CASE("faces: many threads on parts of the same arrays") {
  constexpr std::size_t n = 4000;
  arrays together(n, 8);
  arrays alone(n, 8);
  CHECK(faces::evaluate(tube, alone.in(), alone.out()) == status::done);
  constexpr std::size_t parts = 8;
  std::vector<std::thread> threads;
  std::vector<status> found(parts, status::lengths_differ);
  for (std::size_t t = 0; t < parts; ++t) {
    threads.emplace_back([&, t] {
      const auto part = [&](auto& a) { return std::span(a).subspan(t * n / parts, n / parts); };
      const faces::inputs in{part(together.wall), part(together.velocity), part(together.stream),
                             part(together.pressure)};
      found[t] = faces::evaluate(tube, in,
                                 {part(together.flux), part(together.slope),
                                  part(together.coefficient), part(together.verdict)});
    });
  }
  for (std::thread& t : threads) t.join();
  CHECK(std::count(found.begin(), found.end(), status::done) == static_cast<long>(parts));
  CHECK(together.flux == alone.flux);
  CHECK(together.slope == alone.slope);
  CHECK(together.verdict == alone.verdict);
}
