// What a wall answers: q, h, dq/dT_wall, the equivalent pair, who spoke.
#include "convelope/boundary/surface.hpp"

#include <doctest/doctest.h>

#include <type_traits>

#include "../surfaces/states.hpp"
#include "convelope/estimate/explain.hpp"
#include "convelope/surfaces/cylinder.hpp"
#include "convelope/surfaces/duct.hpp"
#include "convelope/surfaces/vertical_channel.hpp"

using namespace states;

namespace {

const auto tube = surface(cylinder_in_crossflow{diameter(0.05 * units::metre)}, dry_air{},
                          stream{free_stream_velocity(3.0 * units::metre_per_second),
                                 free_stream_temperature(celsius(27.0))});

}  // namespace

TEST_CASE("surface: from typed numbers to estimates") {
  const auto a = tube.at(wall_temperature(kelvin(350.0)));
  CHECK(a.flux().si() > 0.0);
  CHECK(a.flux().si() == doctest::Approx(a.coefficient().si() * 49.85).epsilon(1e-12));
  CHECK(a.reference_temperature_K() == doctest::Approx(300.15));
  static_assert(measures<decltype(a.flux()), kinds::heat_flux>);
  static_assert(measures<decltype(a.slope()), kinds::flux_slope>);
  static_assert(measures<decltype(a.coefficient()), kinds::film_coefficient>);
  static_assert(std::is_trivially_copyable_v<std::remove_const_t<decltype(a)>>);
  static_assert(std::is_trivially_copyable_v<std::remove_const_t<decltype(tube)>>);
  CHECK(a.inside());
  CHECK(a.spoken() == 2);
  CHECK(std::string(a.correlation(0)->id) == "cylinder-crossflow/churchill-bernstein-1977");
  CHECK(std::string(a.correlation(1)->id) == "horizontal-cylinder/churchill-chu-1975");
  CHECK(std::string(a.fluid()->name) == "dry air");
  CHECK(tube.exposure().pressure.si() == 101325.0);
}

TEST_CASE("surface: the same wall before another exposure") {
  const auto faster = stream{free_stream_velocity(6.0 * units::metre_per_second),
                             free_stream_temperature(celsius(27.0))};
  const auto wall = wall_temperature(kelvin(350.0));
  CHECK(tube.at(wall, faster).flux().si() > 1.3 * tube.at(wall).flux().si());
  CHECK(tube.at(wall, faster).flux().si() ==
        surface(tube.geometry(), dry_air{}, faster).at(wall).flux().si());
}

TEST_CASE("surface: the equivalent pair is the tangent, or the secant where q falls") {
  const auto tangent = tube.at(wall_temperature(kelvin(350.0)));
  const auto pair = tangent.equivalent();
  CHECK(pair.coefficient == tangent.slope().si());
  CHECK(pair.coefficient * (350.0 - pair.temperature) ==
        doctest::Approx(tangent.flux().si()).epsilon(1e-13));
  // One Newton step on it is a Newton step on q: a wall with 500 W/m2 behind it.
  double T = 350.0;
  for (int i = 0; i < 6; ++i) {
    const auto r = tube.at(wall_temperature(kelvin(T))).equivalent();
    T = r.temperature + 500.0 / r.coefficient;
  }
  CHECK(tube.at(wall_temperature(kelvin(T))).flux().si() == doctest::Approx(500.0).epsilon(1e-12));

  // A film whose q falls with T_wall.
  const film<dual<double>> falling{
      dual<double>::variable(10.0) * -1.0 + 110.0, dual<double>(90.0), 0, 0.0, {1.0, 0.0, 0.0}};
  const wall_answer<double> answer(100.0, falling, &cylinder_in_crossflow::speaks,
                                   dry_air{}.info());
  CHECK(answer.slope().si() == doctest::Approx(100.0 - 10.0));  // h + dh/dT (T - T_ref)
  const film<dual<double>> steep{
      dual<double>::variable(10.0) * -20.0 + 300.0, dual<double>(90.0), 0, 0.0, {1.0, 0.0, 0.0}};
  const wall_answer<double> down(100.0, steep, &cylinder_in_crossflow::speaks, dry_air{}.info());
  CHECK(down.slope().si() == doctest::Approx(100.0 - 200.0));
  CHECK(down.equivalent().coefficient == 100.0);
  CHECK(down.equivalent().temperature == 90.0);
}

TEST_CASE("surface: at the fluid's own temperature") {
  for (const double u : {0.0, 3.0}) {
    const auto a =
        ask(cylinder_in_crossflow{number<kinds::diameter>(0.05)}, dry_air{}, u, 300.0, 300.0);
    CHECK(a.flux().si() == 0.0);
    CHECK(a.slope().si() == doctest::Approx(a.coefficient().si()).epsilon(1e-12));
    CHECK(a.equivalent().temperature == 300.0);
    CHECK(a.inside() == (u > 0.0));  // still and isothermal: Ra 1e-10 is below Churchill and Chu
  }
}

TEST_CASE("surface: scatter is that of the shares") {
  const auto a = tube.at(wall_temperature(kelvin(350.0)));
  double variance = 0.0;
  for (int i = 0; i < a.spoken(); ++i) {
    const double s = a.correlation(i)->scatter;
    if (s > 0.0) variance += a.share(i) * s * s;
  }
  CHECK(variance > 0.0);
  CHECK(a.scatter() == doctest::Approx(std::sqrt(variance)).epsilon(1e-13));
  CHECK(a.flux().scatter() == a.scatter());
  CHECK(a.flux().verdict() == a.verdict());
}

TEST_CASE("surface: a person is told which law was left") {
  const auto a =
      ask(cylinder_in_crossflow{number<kinds::diameter>(10.0)}, dry_air{}, 200.0, 300.0, 310.0);
  const std::string text = explain(a.flux());
  CHECK(text.find("churchill-bernstein-1977 is outside what it was fitted for: Re is above") !=
        std::string::npos);
  const auto bad =
      ask(cylinder_in_crossflow{number<kinds::diameter>(-1.0)}, dry_air{}, 2.0, 300.0, 310.0);
  CHECK(explain(bad.flux()).find("not positive") != std::string::npos);
  CHECK(explain(bad.flux()).find("Inside") == std::string::npos);
}

TEST_CASE("surface: single precision and long double run too") {
  const auto wall = wall_temperature(kelvin(350.0L));
  const auto exact = tube.at(wall);
  const auto a = tube.at(wall_temperature(kelvin(350.0)));
  CHECK(static_cast<double>(exact.flux().si()) == doctest::Approx(a.flux().si()).epsilon(1e-12));
  CHECK(static_cast<double>(exact.slope().si()) == doctest::Approx(a.slope().si()).epsilon(1e-12));
}
