// Natural convection between vertical plates.

#include "convelope/correlations/natural/vertical_channel.hpp"

#include <doctest/doctest.h>

#include <cmath>
#include <type_traits>

#include "check.hpp"
#include "convelope/correlations/natural/vertical_channel_isoflux.hpp"

namespace {

using namespace convelope;
using namespace check;
namespace channel = vertical_channel;

constexpr double points[] = {0.1, 12.0, 800.0, 2e4};

exact isothermal(int c, double El) {
  return pow(exact(c / pow(exact(El), 2) + exact("2.873") / pow(exact(El), exact("0.5"))),
             exact("-0.5"));
}
exact isoflux(int c, const char* wide, double El) {
  return pow(exact(c / exact(El) + exact(wide) / pow(exact(El), exact("0.4"))), exact("-0.5"));
}
exact filled(double El, double r) {
  return exact(El) * (4 * exact(r) * r + 7 * exact(r) + 4) / (90 * pow(exact(1 + exact(r)), 2));
}

}  // namespace

TEST_SUITE("correlations: vertical channel") {
  using both_isothermal = channel::bar_cohen_rohsenow_isothermal_symmetric_1984;
  using one_isothermal = channel::bar_cohen_rohsenow_isothermal_one_side_1984;
  using both_exit = channel::bar_cohen_rohsenow_isoflux_symmetric_1984;
  using one_exit = channel::bar_cohen_rohsenow_isoflux_one_side_1984;
  using both_middle = channel::bar_cohen_rohsenow_isoflux_symmetric_midheight_1984;
  using one_middle = channel::bar_cohen_rohsenow_isoflux_one_side_midheight_1984;

  TEST_CASE("values") {
    for (const double El : points) {
      check_value<both_isothermal>(isothermal(576, El), El);
      check_value<one_isothermal>(isothermal(144, El), El);
      check_value<both_exit>(isoflux(48, "2.51", El), El);
      check_value<one_exit>(isoflux(24, "2.51", El), El);
      check_value<both_middle>(isoflux(12, "1.88", El), El);
      check_value<one_middle>(isoflux(6, "1.88", El), El);
    }
    for (const double El : {0.1, 12.0, 800.0}) {  // higher up 1 - exp(-35/El) cancels digits
      check_value<channel::elenbaas_1942>(
          exact(El) / 24 * pow(exact(1 - exp(exact(-35 / exact(El)))), exact("0.75")), El);
    }
    for (const double r : {0.0, 0.3, 1.0, 2.5}) {
      check_value<channel::aung_fully_developed_1972>(filled(0.3, r), 0.3, r);
    }
  }

  TEST_CASE("number types and derivatives") {
    check_scalars<channel::elenbaas_1942>(33.0);
    check_scalars<both_isothermal>(33.0);
    check_scalars<one_isothermal>(33.0);
    check_scalars<both_exit>(33.0);
    check_scalars<one_exit>(33.0);
    check_scalars<both_middle>(33.0);
    check_scalars<one_middle>(33.0);
    check_scalars<channel::aung_fully_developed_1972>(0.33, 0.4);
  }

  TEST_CASE("a filled channel has closed values") {
    // W. Elenbaas, Physica 9 (1942) 1-28: El/24; one side El/12; W. Aung, Int. J. Heat Mass
    // Transfer 15 (1972) 1577-1580: equal walls El/24, wall 2 at the inlet temperature 2 El/45
    // (from memory)
    const double El = 1e-3;
    CHECK(channel::elenbaas_1942::formula(El) == doctest::Approx(El / 24.0).epsilon(1e-9));
    CHECK(both_isothermal::formula(El) == doctest::Approx(El / 24.0).epsilon(1e-6));
    CHECK(one_isothermal::formula(El) == doctest::Approx(El / 12.0).epsilon(1e-6));
    CHECK(channel::aung_fully_developed_1972::formula(El, 1.0) == doctest::Approx(El / 24.0));
    CHECK(channel::aung_fully_developed_1972::formula(El, 0.0) == doctest::Approx(2.0 * El / 45.0));
    // naming the walls the other way round changes nothing
    CHECK(channel::aung_fully_developed_1972::formula(El, 4.0) ==
          doctest::Approx(channel::aung_fully_developed_1972::formula(El, 0.25)));
    // uniform flux: half the exit excess at mid height
    CHECK(both_middle::formula(1e-9) ==
          doctest::Approx(2.0 * both_exit::formula(1e-9)).epsilon(1e-4));
    CHECK(one_middle::formula(1e-9) ==
          doctest::Approx(2.0 * one_exit::formula(1e-9)).epsilon(1e-4));
  }

  TEST_CASE("a wide channel is two single plates") {
    // Elenbaas: 35^(3/4)/24 = 0.600; Bar-Cohen and Rohsenow: 0.59, and 0.63 on the heat flux
    const double El = 1e12;
    CHECK(channel::elenbaas_1942::formula(1e7) / std::pow(1e7, 0.25) ==
          doctest::Approx(std::pow(35.0, 0.75) / 24.0).epsilon(1e-4));
    CHECK(both_isothermal::formula(El) / std::pow(El, 0.25) == doctest::Approx(0.59).epsilon(1e-3));
    CHECK(one_isothermal::formula(El) / std::pow(El, 0.25) == doctest::Approx(0.59).epsilon(1e-3));
    CHECK(both_exit::formula(El) / std::pow(El, 0.2) == doctest::Approx(0.63).epsilon(3e-3));
    // the excess of a plate at mid height is 2^(-1/5) of that at its end
    CHECK(both_middle::formula(El) / both_exit::formula(El) ==
          doctest::Approx(std::pow(2.0, 0.2)).epsilon(6e-3));
  }

  TEST_CASE("El = 0 and far beyond use") {
    const auto at_zero = [](auto formula, double slope) {
      const auto Nu = formula(dual<double>::variable(0.0));
      CHECK(Nu.value == 0.0);
      CHECK(Nu.slope[0] == doctest::Approx(slope));
    };
    at_zero([](auto El) { return channel::elenbaas_1942::formula(El); }, 1.0 / 24.0);
    at_zero([](auto El) { return both_isothermal::formula(El); }, 1.0 / 24.0);
    at_zero([](auto El) { return one_isothermal::formula(El); }, 1.0 / 12.0);
    CHECK(both_exit::formula(0.0) == 0.0);
    CHECK(one_middle::formula(0.0) == 0.0);
    for (const double El : {1e-300, 1e-20, 1e20, 1e200}) {
      CAPTURE(El);
      const double root = both_exit::formula(El);
      CHECK(root > 0.0);
      CHECK(root < 1e41);
      CHECK(both_isothermal::formula(El) > 0.0);
      CHECK(both_isothermal::formula(El) < 1e51);
    }
  }

  TEST_CASE("envelopes") {
    using elenbaas = channel::elenbaas_1942;
    expect_inside<elenbaas>(0.1);
    expect_inside<elenbaas>(1e5);
    expect_crossed<elenbaas>(0, side::below, below(0.1));
    expect_crossed<elenbaas>(0, side::above, above(1e5));
    expect_not_finite<elenbaas>(10.0);
    const auto unlimited = []<class C>(std::type_identity<C>) {
      expect_inside<C>(0.0);
      expect_inside<C>(1e9);
      expect_crossed<C>(0, side::below, -1e-9);
      expect_not_finite<C>(10.0);
    };
    unlimited(std::type_identity<both_isothermal>{});
    unlimited(std::type_identity<one_isothermal>{});
    unlimited(std::type_identity<both_exit>{});
    unlimited(std::type_identity<one_exit>{});
    unlimited(std::type_identity<both_middle>{});
    unlimited(std::type_identity<one_middle>{});
    using aung = channel::aung_fully_developed_1972;
    expect_inside<aung>(0.0, 0.0);
    expect_inside<aung>(1.0, 1.0);
    expect_crossed<aung>(0, side::below, -1e-9, 0.5);
    expect_crossed<aung>(0, side::above, above(1.0), 0.5);
    expect_crossed<aung>(1, side::below, 0.5, -1e-9);
    expect_not_finite<aung>(0.5, 0.5);
  }

  TEST_CASE("the Elenbaas number on the flux is another type") {
    using El = typed<kinds::elenbaas>;
    using El_flux = typed<kinds::flux_elenbaas>;
    CHECK(std::is_invocable_v<both_isothermal, El>);
    CHECK_FALSE(std::is_invocable_v<both_isothermal, El_flux>);
    CHECK(std::is_invocable_v<both_exit, El_flux>);
    CHECK_FALSE(std::is_invocable_v<both_exit, El>);
  }
}
