#include "convelope/kinds/temperatures.hpp"

#include <doctest/doctest.h>

#include "convelope/kinds/lengths.hpp"

using namespace convelope;

namespace static_test {

static_assert(temperature_kind<kinds::wall_temperature> &&
              temperature_kind<kinds::adiabatic_wall_temperature>);
static_assert(!temperature_kind<kinds::temperature_difference>, "a difference is no station");
static_assert(!temperature_kind<kinds::diameter>);
static_assert(measures_a_temperature<typed<kinds::ambient_temperature>>);
static_assert(!measures_a_temperature<typed<kinds::temperature_difference>>);
static_assert(!measures_a_temperature<double>);

using wall = typed<kinds::wall_temperature>;
using stream = typed<kinds::free_stream_temperature>;
template <class A, class B>
concept film = requires(const A& a, const B& b) { film_between(a, b); };
static_assert(film<wall, stream> && film<wall, typed<kinds::bulk_temperature>>);
static_assert(!film<stream, wall> && !film<stream, stream> && !film<wall, double>);
static_assert(!film<wall, typed<kinds::temperature_difference>>);
static_assert(
    std::is_same_v<decltype(film_between(wall{}, stream{})), typed<kinds::film_temperature>>);

}  // namespace static_test

TEST_CASE("the difference of any two stations") {
  const auto hot = wall_temperature(celsius(60.0));
  CHECK((hot - ambient_temperature(celsius(20.0))).si() == doctest::Approx(40.0));
  CHECK((hot - saturation_temperature(celsius(100.0))).si() == doctest::Approx(-40.0));
  CHECK((hot - hot).si() == 0.0);
  const auto dT = temperature_difference(40.0 * units::kelvin_difference);
  CHECK((dT - dT).si() == 0.0);
  CHECK((0.5 * dT).si() == 20.0);
}

TEST_CASE("the film temperature lies half way") {
  CHECK(
      film_between(wall_temperature(kelvin(350.0)), free_stream_temperature(kelvin(300.0))).si() ==
      325.0);
  using D = dual<double>;
  const auto t = film_between(wall_temperature(kelvin(D::variable(350.0))),
                              ambient_temperature(kelvin(D(300.0))));
  CHECK(t.si().slope[0] == 0.5);
}
