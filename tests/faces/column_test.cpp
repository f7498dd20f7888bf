// Where a host keeps its numbers: cells with members, typed arrays, a function per face, patches.
#include "convelope/faces/column.hpp"

#include <array>
#include <string>

#include "convelope/faces/widest.hpp"
#include "convelope/surfaces/cylinder.hpp"
#include "convelope/surfaces/vertical_channel.hpp"
#include "many.hpp"

using namespace many;

namespace {

const auto tube = surface(cylinder_in_crossflow{number<kinds::diameter>(0.03)}, dry_air_fast{},
                          exposure<cylinder_in_crossflow, double>(2.0, 300.0, 101325.0));
using faces::status;

struct cell {
  double wall_K;
  double flux;
  double slope;
  std::uint64_t crossed;
  int id;
};

std::vector<cell> cells_of(const arrays& a) {
  std::vector<cell> cells;
  for (const double T : a.wall) cells.push_back({T, -1.0, -1.0, 0, static_cast<int>(cells.size())});
  return cells;
}

template <class T>
void through_members() {
  arrays a(37, 21);
  const faces::inputs in{.wall_temperature_K = a.wall};
  REQUIRE(faces::evaluate<T>(tube, in,
                             {.flux_W_m2 = a.flux, .slope_W_m2K = a.slope, .verdict = a.verdict}) ==
          status::done);
  std::vector<cell> cells = cells_of(a);
  const std::span<cell> all(cells);
  CHECK(faces::evaluate<T>(
            tube,
            {.wall_temperature_K = faces::member(std::span<const cell>(cells), &cell::wall_K)},
            {.flux_W_m2 = faces::member(all, &cell::flux),
             .slope_W_m2K = faces::member(all, &cell::slope),
             .verdict = faces::member(all, &cell::crossed)}) == status::done);
  for (std::size_t i = 0; i < cells.size(); ++i) {
    CHECK(cells[i].wall_K == a.wall[i]);
    CHECK(cells[i].flux == a.flux[i]);
    CHECK(cells[i].slope == a.slope[i]);
    CHECK(cells[i].crossed == a.verdict[i]);
    CHECK(cells[i].id == static_cast<int>(i));
  }
}

}  // namespace

TEST_CASE("columns: members of cells, which lie between each other without touching") {
  through_members<double>();
  through_members<faces::widest>();
}

TEST_CASE("columns: a member that is both read and written is an overlap") {
  std::vector<cell> cells = cells_of(arrays(9, 22));
  const std::span<cell> all(cells);
  const auto wall = faces::member(all, &cell::wall_K);
  const auto read = faces::member(std::span<const cell>(cells), &cell::wall_K);
  CHECK(faces::evaluate(tube, {.wall_temperature_K = read}, {.flux_W_m2 = wall}) ==
        status::overlapping);
  CHECK(faces::evaluate(tube, {.wall_temperature_K = read},
                        {.flux_W_m2 = faces::member(all, &cell::flux),
                         .slope_W_m2K = faces::member(all, &cell::flux)}) == status::overlapping);
  // The same member of other cells of the same array: the last cell is shared.
  CHECK(faces::evaluate(tube, {.wall_temperature_K = read.part(0, 5)},
                        {.flux_W_m2 = wall.part(4, 5)}) == status::overlapping);
  CHECK(faces::evaluate(tube, {.wall_temperature_K = read.part(0, 4)},
                        {.flux_W_m2 = wall.part(4, 4)}) == status::done);
  // Another step over the same memory is refused without a closer look.
  const faces::column<double> dense(&cells[0].flux, 9, 1);
  CHECK(faces::evaluate(tube, {.wall_temperature_K = read}, {.flux_W_m2 = dense}) ==
        status::overlapping);
  CHECK(cells[0].flux == -1.0);
}

TEST_CASE("columns: typed members and parts") {
  struct typed_cell {
    typed<kinds::wall_temperature> wall;
    float other[2];
  };
  const std::array<typed_cell, 3> cells{{{number<kinds::wall_temperature>(310.0), {}},
                                         {number<kinds::wall_temperature>(320.0), {}},
                                         {number<kinds::wall_temperature>(330.0), {}}}};
  const auto wall = faces::member(std::span(cells), &typed_cell::wall);
  CHECK(wall.size() == 3);
  CHECK(*wall.at(2) == 330.0);
  CHECK(*wall.part(1, 2).at(0) == 320.0);
  CHECK(faces::column<const double>().part(3, 4).empty());
  CHECK(faces::member(std::span<const typed_cell>(), &typed_cell::wall).empty());
}

TEST_CASE("columns: arrays of typed numbers find their places by kind") {
  arrays a(33, 23);
  std::vector<typed<kinds::wall_temperature>> walls;
  std::vector<typed<kinds::free_stream_velocity>> speeds;
  std::vector<typed<kinds::free_stream_temperature>> streams;
  std::vector<typed<kinds::pressure>> pressures;
  for (std::size_t i = 0; i < 33; ++i) {
    walls.push_back(number<kinds::wall_temperature>(a.wall[i]));
    speeds.push_back(number<kinds::free_stream_velocity>(a.velocity[i]));
    streams.push_back(number<kinds::free_stream_temperature>(a.stream[i]));
    pressures.push_back(number<kinds::pressure>(a.pressure[i]));
  }
  CHECK(faces::evaluate_typed(tube, a.out(), speeds, pressures, walls, streams) == status::done);
  expect_as_alone(tube, a);
  speeds.pop_back();
  CHECK(faces::evaluate_typed<faces::widest>(tube, a.out(), walls, speeds) ==
        status::lengths_differ);
}

TEST_CASE("columns: a function per face") {
  for (const std::size_t n : {0U, 1U, 63U, 64U, 65U, 200U}) {
    CAPTURE(n);
    arrays a(n, 24);
    const auto face_at = [&](std::size_t i) {
      return faces::face{
          number<kinds::wall_temperature>(a.wall[i]),
          exposure<cylinder_in_crossflow, double>(a.velocity[i], a.stream[i], a.pressure[i])};
    };
    CHECK(faces::evaluate_each<faces::widest>(tube, n, face_at, a.out()) == status::done);
    expect_as_alone(tube, a);
    if (n > 0) {
      CHECK(faces::evaluate_each(tube, n - 1, face_at, a.out()) == status::lengths_differ);
    }
  }
  arrays a(5, 25);
  const auto same = [&](std::size_t) {
    return faces::face{number<kinds::wall_temperature>(350.0),
                       exposure<cylinder_in_crossflow, double>(2.0, 300.0, 101325.0)};
  };
  CHECK(faces::evaluate_each(tube, 5, same, {.flux_W_m2 = a.flux, .slope_W_m2K = a.flux}) ==
        status::overlapping);
  // A fluid at rest has no velocity to give.
  const auto channel =
      surface(open_vertical_channel{number<kinds::gap>(0.01), number<kinds::height>(0.3)},
              dry_air_fast{}, exposure<open_vertical_channel, double>(0.0, 300.0, 101325.0));
  const auto rest = [&](std::size_t i) {
    return faces::face{number<kinds::wall_temperature>(a.wall[i]),
                       exposure<open_vertical_channel, double>(0.0, a.stream[i], a.pressure[i])};
  };
  CHECK(faces::evaluate_each(channel, 5, rest, a.out()) == status::done);
  expect_as_alone(channel, a);
}

TEST_CASE("columns: many patches") {
  using wall =
      decltype(surface(cylinder_in_crossflow{number<kinds::diameter>(0.03)}, dry_air_fast{},
                       exposure<cylinder_in_crossflow, double>(2.0, 300.0, 101325.0)));
  std::vector<wall> tubes;
  for (const double d : {0.01, 0.02, 0.05}) {
    tubes.push_back(surface(cylinder_in_crossflow{number<kinds::diameter>(d)}, dry_air_fast{},
                            exposure<cylinder_in_crossflow, double>(2.0, 300.0, 101325.0)));
  }
  const std::span<const wall> all(tubes);
  arrays a(50, 26);
  arrays b(50, 26);
  const std::vector<std::size_t> boundary{0, 11, 11, 50};
  REQUIRE(faces::evaluate_patches<faces::widest>(all, boundary, a.in(), a.out()) == status::done);
  REQUIRE(faces::evaluate(tubes[0], b.in().part(0, 11), b.out().part(0, 11)) == status::done);
  REQUIRE(faces::evaluate(tubes[2], b.in().part(11, 39), b.out().part(11, 39)) == status::done);
  for (std::size_t i = 0; i < 50; ++i) {
    CHECK(close(a.coefficient[i], b.coefficient[i], b.coefficient[i]));
    CHECK(a.verdict[i] == b.verdict[i]);
  }
  for (const std::vector<std::size_t>& bad :
       {std::vector<std::size_t>{0, 11, 50}, std::vector<std::size_t>{1, 11, 20, 50},
        std::vector<std::size_t>{0, 20, 11, 50}, std::vector<std::size_t>{0, 11, 20, 49},
        std::vector<std::size_t>{}}) {
    CHECK(faces::evaluate_patches(all, bad, a.in(), a.out()) == status::patches_differ);
  }
  CHECK(std::string(words(status::patches_differ)).find("boundary") != std::string::npos);
}

TEST_CASE("columns: shares for threads cover all faces once") {
  for (const std::size_t n : {0U, 1U, 64U, 1000U, 100003U}) {
    for (const std::size_t parts : {1U, 2U, 7U, 64U}) {
      std::size_t next = 0;
      for (std::size_t i = 0; i < parts; ++i) {
        const faces::range r = faces::share_of(n, parts, i);
        CHECK(r.from == next);
        CHECK((r.from % 64 == 0 || r.from == n));
        next = r.from + r.count;
      }
      CHECK(next == n);
    }
  }
  CHECK(faces::share_of(64000, 2, 0).count == 32000);
}
