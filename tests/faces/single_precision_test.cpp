// Single precision: arrays of float computed in double, and float throughout, against double.
#include "convelope/faces/widest.hpp"
#include "convelope/fluids/liquid_water.hpp"
#include "convelope/surfaces/cylinder.hpp"
#include "convelope/surfaces/flat_plate.hpp"
#include "convelope/surfaces/sphere.hpp"
#include "convelope/surfaces/vertical_plate.hpp"
#include "many.hpp"

using namespace many;

namespace {

constexpr std::size_t n = 3001;

struct singles {
  std::vector<float> wall, velocity, flux, slope, coefficient;
  std::vector<std::uint64_t> verdict;

  singles() : flux(n), slope(n), coefficient(n), verdict(n) {
    random_numbers random(77);
    for (std::size_t i = 0; i < n; ++i) {
      wall.push_back(static_cast<float>(random.between(275.0, 400.0)));
      velocity.push_back(static_cast<float>(random.sign() * random.log_between(1e-3, 100.0)));
    }
  }
  faces::inputs_of<float> in() const { return {wall, velocity}; }
  faces::outputs_of<float> out() { return {flux, slope, coefficient, verdict}; }
};

struct worst {
  double flux = 0.0;
  double slope = 0.0;
  double coefficient = 0.0;
  int verdicts = 0;
};

template <class T, class Surface>
worst against_double(const Surface& s) {
  singles single;
  CHECK(faces::evaluate<T, float>(s, single.in(), single.out()) == faces::status::done);
  const std::vector<double> wall(single.wall.begin(), single.wall.end());
  const std::vector<double> velocity(single.velocity.begin(), single.velocity.end());
  std::vector<double> q(n);
  std::vector<double> slope(n);
  std::vector<double> h(n);
  std::vector<std::uint64_t> verdict(n);
  CHECK(faces::evaluate(s, {wall, velocity}, {q, slope, h, verdict}) == faces::status::done);
  worst w;
  const auto more = [](double& most, double off) {
    if (!(off <= most)) most = off;
  };
  for (std::size_t i = 0; i < n; ++i) {
    more(w.coefficient, std::fabs(double(single.coefficient[i]) - h[i]) / h[i]);
    more(w.slope, std::fabs(double(single.slope[i]) - slope[i]) / (std::fabs(slope[i]) + h[i]));
    more(w.flux, std::fabs(double(single.flux[i]) - q[i]) / (h[i] * std::fabs(wall[i] - 300.0)));
    if (single.verdict[i] != verdict[i]) ++w.verdicts;
  }
  return w;
}

template <class T, class Surface>
void expect_within(const Surface& s, double bound) {
  const worst w = against_double<T>(s);
  CHECK(w.coefficient < bound);
  CHECK(w.slope < bound);
  CHECK(w.flux < bound);
  CHECK(w.verdicts == 0);
}

template <class G, class Fluid>
auto wall_of(const G& g, const Fluid& f) {
  return surface(g, f, exposure<G, double>(2.0, 300.0, 101325.0));
}

template <class T>
void expect_of_air(double bound) {
  expect_within<T>(wall_of(cylinder_in_crossflow{number<kinds::diameter>(0.05)}, dry_air_fast{}),
                   bound);
  expect_within<T>(wall_of(vertical_wall{number<kinds::height>(0.5)}, dry_air{}), bound);
  expect_within<T>(wall_of(sphere_in_stream{number<kinds::diameter>(0.05)}, dry_air{}), bound);
  expect_within<T>(wall_of(plate_along_stream{number<kinds::plate_length>(0.5)}, dry_air_fast{}),
                   bound);
}

}  // namespace

TEST_CASE("single precision: arrays of float, computed in double") {
  expect_of_air<double>(6e-8);
  expect_of_air<faces::widest>(6e-8);
}

TEST_CASE("single precision: float throughout, as far as stated") {
  expect_of_air<float>(5e-6);
  expect_within<float>(
      wall_of(cylinder_in_crossflow{number<kinds::diameter>(0.05)}, liquid_water{}), 5e-5);
}
