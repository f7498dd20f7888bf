// dq/dT_wall against 50-digit central differences, and derivatives in the other directions.
#include <doctest/doctest.h>

#include <boost/multiprecision/cpp_bin_float.hpp>
#include <string>

#include "../surfaces/states.hpp"
#include "convelope/surfaces.hpp"

using namespace states;

namespace {

using exact = boost::multiprecision::cpp_bin_float_50;

struct state {
  double u, stream_K, wall_K, p;
};

template <class G, class Fluid>
exact flux(const G& g, const Fluid& f, const exact& u, const exact& stream, const exact& wall,
           const exact& p) {
  const film<exact> x = film_of<exact>(g, f, u, stream, wall, p);
  return exact(x.coefficient * (wall - x.reference_temperature));
}

/// All four derivatives of q, by dual<double, 4>, relative to the state's own scale.
template <class G, class Fluid>
void against_50_digits(const G& g, const Fluid& f, const state& s) {
  CAPTURE(std::string(G::name));
  CAPTURE(s.u);
  CAPTURE(s.stream_K);
  CAPTURE(s.wall_K);
  using D = dual<double, 4>;
  const film<D> x = film_of<D>(g, f, D::variable(s.u, 0), D::variable(s.stream_K, 1),
                               D::variable(s.wall_K, 2), D::variable(s.p, 3));
  const D q = x.coefficient * (D::variable(s.wall_K, 2) - x.reference_temperature);

  const double at[] = {s.u, s.stream_K, s.wall_K, s.p};
  // A difference of temperatures is to be small against their own difference.
  const double dT = std::fabs(s.wall_K - s.stream_K);
  const double step[] = {std::fabs(s.u) > 0.0 ? 1e-10 * std::fabs(s.u) : 1e-20, 1e-11 * dT,
                         1e-11 * dT, 1e-10 * s.p};
  const exact value = flux(g, f, s.u, s.stream_K, s.wall_K, s.p);
  CHECK(q.value == doctest::Approx(static_cast<double>(value)).epsilon(1e-11));
  for (int i = 0; i < 4; ++i) {
    CAPTURE(i);
    exact up[4], down[4];
    for (int j = 0; j < 4; ++j) {
      up[j] = exact(at[j]) + (i == j ? exact(step[i]) : exact(0));
      down[j] = exact(at[j]) - (i == j ? exact(step[i]) : exact(0));
    }
    const exact slope =
        (flux(g, f, up[0], up[1], up[2], up[3]) - flux(g, f, down[0], down[1], down[2], down[3])) /
        (2 * exact(step[i]));
    const double want = static_cast<double>(slope);
    const double size = std::fabs(static_cast<double>(value)) / (i == 1 || i == 2 ? dT
                                                                 : i == 0 ? std::fabs(s.u) + 1e-9
                                                                          : s.p);
    // Sums that cancel (a density from 34 terms, a segment's end less its start) cost digits.
    CHECK(std::fabs(q.slope[i] - want) <= 1e-9 * (std::fabs(want) + size));
  }
  // The boundary's own slope is the derivative in the wall's direction.
  CHECK(ask(g, f, s.u, s.stream_K, s.wall_K, s.p).slope().si() ==
        doctest::Approx(q.slope[2]).epsilon(1e-13));
}

template <class G>
void in_air_and_water(const G& g) {
  for (const double u : {-7.0, -0.2, 0.0, 0.05, 0.9, 20.0}) {
    for (const double wall : {250.0, 299.0, 300.5, 340.0, 480.0}) {
      against_50_digits(g, dry_air{}, {u, 300.0, wall, 1.2e5});
    }
    for (const double wall : {275.0, 281.0, 310.0}) {
      against_50_digits(g, liquid_water{}, {u, 277.5, wall, 5e5});
    }
  }
}

}  // namespace

TEST_CASE("slopes: cylinder, 50 digits") {
  in_air_and_water(cylinder_in_crossflow{number<kinds::diameter>(0.03)});
}
TEST_CASE("slopes: sphere, 50 digits") {
  in_air_and_water(sphere_in_stream{number<kinds::diameter>(0.03)});
}
TEST_CASE("slopes: plate along a stream, 50 digits") {
  in_air_and_water(plate_along_stream{number<kinds::plate_length>(0.6)});
}
TEST_CASE("slopes: vertical wall, 50 digits") {
  in_air_and_water(vertical_wall{number<kinds::height>(0.6)});
  in_air_and_water(vertical_wall{number<kinds::height>(0.6), stream_direction::horizontal,
                                 number<kinds::plate_length>(0.9)});
}
TEST_CASE("slopes: horizontal wall, 50 digits") {
  in_air_and_water(
      horizontal_wall{number<kinds::area_over_perimeter>(0.1), number<kinds::plate_length>(0.4)});
}
TEST_CASE("slopes: ducts, 50 digits") {
  in_air_and_water(round_duct_segment{number<kinds::hydraulic_diameter>(0.04),
                                      number<kinds::distance_from_inlet>(0.1),
                                      number<kinds::distance_from_inlet>(0.3)});
  in_air_and_water(plate_channel_segment{number<kinds::gap>(0.02),
                                         number<kinds::distance_from_inlet>(0.0),
                                         number<kinds::distance_from_inlet>(0.3)});
}
TEST_CASE("slopes: vertical channel, 50 digits") {
  in_air_and_water(open_vertical_channel{number<kinds::gap>(0.01), number<kinds::height>(0.4)});
}
TEST_CASE("slopes: rotating gap, 50 digits") {
  in_air_and_water(rotating_inner_cylinder{number<kinds::radius>(0.1), number<kinds::gap>(1e-3)});
}
