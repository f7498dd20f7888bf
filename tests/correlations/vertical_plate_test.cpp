// Natural convection on a vertical plate, mean values.

#include "convelope/correlations/natural/vertical_plate.hpp"

#include <doctest/doctest.h>

#include <cmath>
#include <type_traits>

#include "check.hpp"
#include "convelope/correlations/natural/thin_layer.hpp"

namespace {

using namespace convelope;
using namespace check;

struct point {
  double Ra, Pr;
};
constexpr point points[] = {{0.1, 0.71}, {2.5e3, 0.01}, {3.3e6, 7.0}, {1e9, 0.71}, {8e11, 100.0}};

exact bracket(const char* c, double Pr) { return 1 + pow(exact(exact(c) / Pr), exact(9) / 16); }
exact all_range(const char* c, double Ra, double Pr) {
  return pow(exact(exact("0.825") + exact("0.387") * pow(exact(Ra), exact(1) / 6) /
                                        pow(bracket(c, Pr), exact(8) / 27)),
             2);
}
exact laminar(const char* c, double Ra, double Pr) {
  return exact("0.68") +
         exact("0.670") * pow(exact(Ra), exact(1) / 4) / pow(bracket(c, Pr), exact(4) / 9);
}
exact raithby_hollands(double Ra, double Pr) {
  const exact thin =
      exact("0.671") / pow(bracket("0.492", Pr), exact(4) / 9) * pow(exact(Ra), exact(1) / 4);
  const exact slow = 2 / log(exact(1 + 2 / thin));
  const exact C = exact("0.13") * pow(exact(Pr), exact("0.22")) /
                  pow(exact(1 + exact("0.61") * pow(exact(Pr), exact("0.81"))), exact("0.42"));
  const exact fast = C * pow(exact(Ra), exact(1) / 3) / (1 + exact("1.4e9") * Pr / Ra);
  return pow(exact(pow(slow, 6) + pow(fast, 6)), exact(1) / 6);
}

}  // namespace

TEST_SUITE("correlations: vertical plate") {
  namespace plate = vertical_plate;

  TEST_CASE("values") {
    for (const auto& [Ra, Pr] : points) {
      check_value<plate::churchill_chu_1975>(all_range("0.492", Ra, Pr), Ra, Pr);
      check_value<plate::churchill_chu_isoflux_1975>(all_range("0.437", Ra, Pr), Ra, Pr);
      check_value<plate::churchill_chu_laminar_1975>(laminar("0.492", Ra, Pr), Ra, Pr);
      check_value<plate::churchill_chu_isoflux_laminar_1975>(laminar("0.437", Ra, Pr), Ra, Pr);
      check_value<plate::raithby_hollands_1998>(raithby_hollands(Ra, Pr), Ra, Pr);
      check_value<plate::mcadams_laminar_1954>(exact("0.59") * pow(exact(Ra), exact(1) / 4), Ra);
      check_value<plate::mcadams_turbulent_1954>(exact("0.13") * pow(exact(Ra), exact(1) / 3), Ra);
    }
  }

  TEST_CASE("number types and derivatives") {
    check_scalars<plate::churchill_chu_1975>(3.3e6, 7.0);
    check_scalars<plate::churchill_chu_isoflux_1975>(3.3e10, 0.7);
    check_scalars<plate::churchill_chu_laminar_1975>(3.3e6, 0.7);
    check_scalars<plate::churchill_chu_isoflux_laminar_1975>(3.3e6, 0.01);
    check_scalars<plate::raithby_hollands_1998>(3.3e9, 0.7);
    check_scalars<plate::mcadams_laminar_1954>(3.3e6);
    check_scalars<plate::mcadams_turbulent_1954>(3.3e10);
  }

  TEST_CASE("laminar forms against the boundary layer at high Pr") {
    // mean Nu/Ra^(1/4) = 0.6703 for Pr -> inf: E. J. LeFevre, Proc. 9th Int. Congr. Appl. Mech. 4
    // (1956) 168-174. On the mid-height excess of a uniform flux 2 x 0.5631 x 8^(-1/4) = 0.6697,
    // with the local 0.5631 of S. W. Churchill, H. Ozoe, J. Heat Transfer 95 (1973) 540-541 (from
    // memory).
    const double root = std::pow(1e9, 0.25);
    const double isothermal = plate::churchill_chu_laminar_1975::formula(1e9, 1e9);
    CHECK((isothermal - 0.68) / root == doctest::Approx(0.6703).epsilon(1e-3));
    const double isoflux = plate::churchill_chu_isoflux_laminar_1975::formula(1e9, 1e9);
    CHECK((isoflux - 0.68) / root == doctest::Approx(0.6697).epsilon(1e-3));
    // and as Ra grows without turbulence, the laminar part of the other form
    CHECK(plate::raithby_hollands_1998::formula(1e9, 1e9) / root ==
          doctest::Approx(0.6703).epsilon(0.01));
  }

  TEST_CASE("laminar form against the similarity solution in air") {
    // -theta'(0) = 0.5046 at Pr 0.72: S. Ostrach, NACA Rep. 1111 (1953) (from memory);
    // mean = 4/3 x 0.5046 (Gr/4)^(1/4)
    for (const double Ra : {1e7, 1e8, 1e9}) {
      CAPTURE(Ra);
      const double theory = 4.0 / 3.0 * 0.5046 * std::pow(Ra / 0.72 / 4.0, 0.25);
      CHECK(plate::churchill_chu_laminar_1975::formula(Ra, 0.72) ==
            doctest::Approx(theory).epsilon(0.025));
    }
    // how far the one formula for all Ra is above it
    const double theory = 4.0 / 3.0 * 0.5046 * std::pow(1e8 / 0.72 / 4.0, 0.25);
    CHECK(plate::churchill_chu_1975::formula(1e8, 0.72) / theory ==
          doctest::Approx(1.18).epsilon(0.01));
  }

  TEST_CASE("turbulent constants side by side") {
    // common practice puts Nu/Ra^(1/3) of a vertical plate between 0.10 and 0.13 in air
    const double third = std::cbrt(1e12);
    for (const double c : {plate::churchill_chu_1975::formula(1e12, 0.71) / third,
                           plate::raithby_hollands_1998::formula(1e12, 0.71) / third,
                           plate::mcadams_turbulent_1954::formula(1e12) / third}) {
      CHECK(c > 0.10);
      CHECK(c < 0.135);
    }
  }

  TEST_CASE("envelopes") {
    using all = plate::churchill_chu_1975;
    using all_flux = plate::churchill_chu_isoflux_1975;
    using slow = plate::churchill_chu_laminar_1975;
    using slow_flux = plate::churchill_chu_isoflux_laminar_1975;
    using joined = plate::raithby_hollands_1998;
    const auto limits = []<class C>(std::type_identity<C>, double top) {
      expect_inside<C>(0.1, 0.71);
      expect_inside<C>(top, 0.0);
      expect_crossed<C>(0, side::below, below(0.1), 0.71);
      expect_crossed<C>(0, side::below, -1e6, 0.71);
      expect_crossed<C>(0, side::above, above(top), 0.71);
      expect_crossed<C>(1, side::below, 1e6, -1e-9);
      expect_not_finite<C>(1e6, 0.71);
      expect_crossed<C>(0, side::below, 0.0, 0.71);
    };
    limits(std::type_identity<all>{}, 1e12);
    limits(std::type_identity<all_flux>{}, 1e12);
    limits(std::type_identity<slow>{}, 1e9);
    limits(std::type_identity<slow_flux>{}, 1e9);
    limits(std::type_identity<joined>{}, 1e12);

    expect_inside<plate::mcadams_laminar_1954>(1e4);
    expect_inside<plate::mcadams_laminar_1954>(1e9);
    expect_crossed<plate::mcadams_laminar_1954>(0, side::below, below(1e4));
    expect_crossed<plate::mcadams_laminar_1954>(0, side::above, above(1e9));
    expect_not_finite<plate::mcadams_laminar_1954>(1e6);
    expect_inside<plate::mcadams_turbulent_1954>(1e9);
    expect_inside<plate::mcadams_turbulent_1954>(1e12);
    expect_crossed<plate::mcadams_turbulent_1954>(0, side::below, below(1e9));
    expect_crossed<plate::mcadams_turbulent_1954>(0, side::above, above(1e12));
    expect_not_finite<plate::mcadams_turbulent_1954>(1e10);
  }

  TEST_CASE("no buoyancy leaves the constants of conduction") {
    CHECK(plate::churchill_chu_1975::formula(0.0, 0.71) == doctest::Approx(0.825 * 0.825));
    CHECK(plate::churchill_chu_laminar_1975::formula(0.0, 0.71) == 0.68);
    CHECK(plate::raithby_hollands_1998::formula(0.0, 0.71) == 0.0);
    CHECK(plate::mcadams_laminar_1954::formula(0.0) == 0.0);
  }

  TEST_CASE("a Rayleigh number on another length does not fit") {
    using on_height = typed<kinds::rayleigh<kinds::height>>;
    using on_diameter = typed<kinds::rayleigh<kinds::diameter>>;
    using Pr = typed<kinds::prandtl>;
    CHECK(std::is_invocable_v<plate::churchill_chu_1975, on_height, Pr>);
    CHECK_FALSE(std::is_invocable_v<plate::churchill_chu_1975, on_diameter, Pr>);
    CHECK_FALSE(
        std::is_invocable_v<plate::mcadams_laminar_1954, typed<kinds::grashof<kinds::height>>>);
  }
}
