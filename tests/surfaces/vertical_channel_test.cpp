// An open vertical channel, driven by buoyancy alone.
#include "convelope/surfaces/vertical_channel.hpp"

#include "scan.hpp"

using namespace scan;

namespace {

open_vertical_channel channel(double b, double H) {
  return {number<kinds::gap>(b), number<kinds::height>(H)};
}
const auto any_channel = [](random_numbers& r) {
  const double H = r.log_between(0.05, 3.0);
  return channel(H * r.log_between(0.003, 0.5), H);
};

using natural = open_vertical_channel::natural;

}  // namespace

TEST_CASE("vertical channel: no step anywhere, right sign, exact slope") {
  everywhere(71, any_channel, dry_air{}, air_range);
  everywhere(72, any_channel, dry_air_fast{}, air_range, 1.0, 4);
  everywhere(73, any_channel, liquid_water{}, water_range, 1.0, 4);
  everywhere(74, any_channel, oil(), any_range, 1.0, 4);
  everywhere(75, any_channel, liquid_water{}, cold_water_range, 1.0);
}

TEST_CASE("vertical channel: no step over its gap") {
  no_steps_over([](double b) { return point_of(channel(b, 1.0), dry_air{}, 0.0, 300.0, 380.0); },
                1e-5, 1.0);
}

TEST_CASE("vertical channel: the bare correlation") {
  const double b = 0.01;
  const double H = 0.5;
  const auto v = dry_air{}.values(320.0, 101325.0);
  const double El =
      9.80665 / 300.0 * 40.0 * b * b * b * b / H / (v.kinematic_viscosity() * v.diffusivity());
  for (const double wall : {340.0, 260.0}) {
    const auto w = dry_air{}.values(0.5 * (300.0 + wall), 101325.0);
    const double ratio =
        v.kinematic_viscosity() * v.diffusivity() / (w.kinematic_viscosity() * w.diffusivity());
    const auto a = ask(channel(b, H), dry_air{}, 0.0, 300.0, wall);
    CHECK(a.coefficient().si() ==
          doctest::Approx(natural::formula(El * ratio) * w.conductivity / b).epsilon(1e-9));
    CHECK(a.share(0) == 1.0);
    CHECK(a.spoken() == 1);
    CHECK(a.inside());
  }
  // Narrow: developed flow, Nu = El/24 exactly, so q grows as dT^2.
  const auto q = [&](double dT) {
    return ask(channel(1e-3, H), dry_air{}, 0.0, 300.0, 300.0 + dT).flux().si();
  };
  CHECK(q(2.0) / q(1.0) == doctest::Approx(4.0).epsilon(0.02));
}

// Bar-Cohen and Rohsenow's optimum for symmetric isothermal plates (1984, J. Heat Transfer 106,
// 116-123): heat per volume is greatest at b = 2.714 (b^4/(El))^(1/4), that is El = 54.3, where
// Nu = 1.31.
TEST_CASE("vertical channel: the optimum gap") {
  double best = 0.0;
  double at_El = 0.0;
  double at_Nu = 0.0;
  for (double b = 2e-3; b < 0.03; b *= 1.001) {
    const auto a = ask(channel(b, 0.3), dry_air{}, 0.0, 300.0, 320.0);
    const double per_width = a.flux().si() / b;  // sheets of zero thickness
    if (per_width <= best) continue;
    best = per_width;
    const auto v = dry_air{}.values(310.0, 101325.0);
    at_Nu = a.coefficient().si() * b / v.conductivity;
    at_El =
        9.80665 / 300.0 * 20.0 * std::pow(b, 4) / 0.3 / (v.kinematic_viscosity() * v.diffusivity());
  }
  CHECK(at_El == doctest::Approx(54.3).epsilon(0.01));
  CHECK(at_Nu == doctest::Approx(1.31).epsilon(0.01));
}

TEST_CASE("vertical channel: bad input is told") {
  const auto good = channel(0.01, 0.5);
  bad_length_is_told(good, [](auto& g, double x) { g.gap = number<kinds::gap>(x); });
  bad_length_is_told(good, [](auto& g, double x) { g.height = number<kinds::height>(x); });
  bad_state_is_told(good);
}
