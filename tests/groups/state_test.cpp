#include "convelope/groups/state.hpp"

#include <doctest/doctest.h>

#include <cmath>

#include "convelope/correlations/external/annular_gap.hpp"
#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "convelope/correlations/external/sphere.hpp"
#include "convelope/correlations/internal/round_duct.hpp"
#include "convelope/correlations/natural/sphere_natural.hpp"

using namespace convelope;

namespace {

// What C would be if it declared this rule.
template <state_rule Rule>
struct declares {
  static constexpr state_rule state_at = Rule;
};

using wall_t = typed<kinds::wall_temperature>;
using stream_t = typed<kinds::free_stream_temperature>;
using adiabatic_t = typed<kinds::adiabatic_wall_temperature>;
const auto wall = wall_temperature(kelvin(360.0));
const auto stream = free_stream_temperature(kelvin(300.0));
const auto ambient = ambient_temperature(kelvin(300.0));
const auto bulk = bulk_temperature(kelvin(300.0));

}  // namespace

namespace static_test {
using film = cylinder_crossflow::churchill_bernstein_1977;
using internal = round_duct::dittus_boelter_mcadams;
static_assert(std::is_same_v<decltype(state_temperature<film>(wall, stream)),
                             typed<kinds::film_temperature>>);
static_assert(std::is_same_v<decltype(state_temperature<internal>(wall, bulk)),
                             typed<kinds::bulk_temperature>>);
static_assert(std::is_same_v<decltype(state_temperature<sphere::whitaker_1972>(wall, ambient)),
                             typed<kinds::ambient_temperature>>);
static_assert(
    std::is_same_v<decltype(state_temperature<declares<state_rule::wall>>(wall, stream)), wall_t>);
static_assert(std::is_same_v<decltype(state_temperature<declares<state_rule::eckert>>(
                                 wall, stream, adiabatic_t{})),
                             typed<kinds::reference_temperature>>);

// One rule for all that are joined, or none.
using convelope::detail::shared_rule;
static_assert(shared_rule<film, film>() == state_rule::film);
static_assert(shared_rule<film, internal>() == state_rule::none);
static_assert(shared_rule<internal, film, internal>() == state_rule::none);
static_assert(shared_rule<annular_gap::becker_kaye_geometry_factor, annular_gap::taylor_gazley>() ==
              state_rule::mean_of_walls);
static_assert(shared_rule<annular_gap::becker_kaye_geometry_factor>() == state_rule::none);

// Which stream a rule means.
using convelope::detail::suits_rule;
static_assert(suits_rule<state_rule::bulk, kinds::bulk_temperature>);
static_assert(!suits_rule<state_rule::bulk, kinds::ambient_temperature>);
static_assert(suits_rule<state_rule::free_stream, kinds::ambient_temperature>);
static_assert(!suits_rule<state_rule::free_stream_with_wall, kinds::bulk_temperature>);
static_assert(suits_rule<state_rule::film, kinds::bulk_temperature>);
static_assert(!suits_rule<state_rule::film, kinds::wall_temperature>);
static_assert(!suits_rule<state_rule::wall, kinds::wall_temperature>);
static_assert(suits_rule<state_rule::mean_of_walls, kinds::wall_temperature>);
static_assert(!suits_rule<state_rule::mean_of_walls, kinds::bulk_temperature>);
}  // namespace static_test

TEST_CASE("a correlation's declaration gives the temperature of its properties") {
  CHECK(state_temperature<cylinder_crossflow::churchill_bernstein_1977>(wall, stream).si() ==
        330.0);
  CHECK(state_temperature<sphere::churchill_1983>(wall, ambient).si() == 330.0);
  CHECK(state_temperature<sphere::whitaker_1972>(wall, stream).si() == 300.0);
  CHECK(state_temperature<round_duct::dittus_boelter_mcadams>(wall, bulk).si() == 300.0);
  CHECK(state_temperature<annular_gap::taylor_gazley>(wall, wall_temperature(kelvin(340.0))).si() ==
        350.0);
  CHECK(state_temperature<declares<state_rule::wall>>(wall, stream).si() == 360.0);
  CHECK(state_temperature<declares<state_rule::free_stream>>(wall, stream).si() == 300.0);
}

TEST_CASE("on bare numbers, with derivatives") {
  using D = dual<double>;
  using film = cylinder_crossflow::churchill_bernstein_1977;
  const D hot = D::variable(360.0);
  const D cold(300.0);
  CHECK(convelope::detail::state_of<film>(hot, cold).value == 330.0);
  CHECK(convelope::detail::state_of<film>(hot, cold).slope[0] == 0.5);
  CHECK(convelope::detail::state_of<sphere::whitaker_1972>(hot, cold).slope[0] == 0.0);
  CHECK(convelope::detail::state_of<declares<state_rule::wall>>(hot, cold).slope[0] == 1.0);
}

TEST_CASE("Eckert's reference temperature") {
  const auto at = [](double T_w, double T_inf, double T_aw) {
    return eckert_reference(wall_temperature(kelvin(T_w)), free_stream_temperature(kelvin(T_inf)),
                            adiabatic_wall_temperature(kelvin(T_aw)))
        .si();
  };
  // Each weight alone, and as the source writes it.
  CHECK(at(1.0, 1e-300, 1e-300) == doctest::Approx(0.50).epsilon(1e-14));
  CHECK(at(1e-300, 1.0, 1e-300) == doctest::Approx(0.28).epsilon(1e-14));
  CHECK(at(1e-300, 1e-300, 1.0) == doctest::Approx(0.22).epsilon(1e-14));
  CHECK(at(411.0, 233.0, 584.0) ==
        doctest::Approx(233.0 + 0.50 * (411.0 - 233.0) + 0.22 * (584.0 - 233.0)).epsilon(1e-14));
  CHECK(state_temperature<declares<state_rule::eckert>>(wall_t(wall), stream_t(stream),
                                                        adiabatic_wall_temperature(kelvin(320.0)))
            .si() == doctest::Approx(0.28 * 300.0 + 0.50 * 360.0 + 0.22 * 320.0).epsilon(1e-14));
  // A slow stream: T_aw is T_inf, and the film temperature is left.
  CHECK(at(360.0, 300.0, 300.0) == doctest::Approx(330.0).epsilon(1e-14));

  // J. P. Holman, Heat Transfer, example "high-speed heat transfer for a flat plate" (from
  // memory): Mach 3, -40 degC, plate at 35 degC; T_aw 584 K and T* 347.8 K laminar, T_aw 605 K and
  // T* 352.5 K turbulent, in whole kelvins.
  CHECK(at(308.0, 233.0, 584.0) == doctest::Approx(347.8).epsilon(0.002));
  CHECK(at(308.0, 233.0, 605.0) == doctest::Approx(352.5).epsilon(0.002));

  // F. M. White, Viscous Fluid Flow (from memory), for air with r between Pr^(1/2) and Pr^(1/3):
  // T*/T_e = 0.5 + 0.039 Ma^2 + 0.5 T_w/T_e.
  for (const double Ma : {0.5, 2.0, 5.0}) {
    for (const double hot : {0.5, 1.0, 4.0}) {
      const double printed = 0.5 + 0.039 * Ma * Ma + 0.5 * hot;
      const double laminar = 1.0 + std::sqrt(0.71) * 0.2 * Ma * Ma;
      const double turbulent = 1.0 + std::cbrt(0.71) * 0.2 * Ma * Ma;
      const double rounding = 0.0005 * Ma * Ma;
      CHECK(at(hot, 1.0, laminar) <= printed);
      CHECK(at(hot, 1.0, turbulent) >= printed - rounding);
      CHECK(at(hot, 1.0, turbulent) <= printed + rounding);
    }
  }
}
