// Natural convection on horizontal plates, unstable (up) and stable (down) side.

#include <doctest/doctest.h>

#include <cmath>
#include <type_traits>

#include "check.hpp"
#include "convelope/correlations/natural/horizontal_plate_down.hpp"
#include "convelope/correlations/natural/horizontal_plate_up.hpp"

namespace {

using namespace convelope;
using namespace check;
namespace up = horizontal_plate_up;
namespace down = horizontal_plate_down;

exact law(const char* c, double Ra, int root) { return exact(c) * pow(exact(Ra), exact(1) / root); }

struct point {
  double Ra, Pr;
};
constexpr point points[] = {{1.0, 0.71}, {2.5e3, 0.01}, {3.3e6, 7.0}, {1e8, 0.71}, {8e9, 100.0}};

exact laminar_coefficient(double Pr) {
  return exact("0.671") /
         pow(exact(1 + pow(exact(exact("0.492") / Pr), exact(9) / 16)), exact(4) / 9);
}
exact rising(double Ra, double Pr) {
  const exact thin = exact("0.835") * laminar_coefficient(Pr) * pow(exact(Ra), exact(1) / 4);
  const exact slow = exact("1.4") / log(exact(1 + exact("1.4") / thin));
  const exact fast = exact("0.14") * (1 + exact("0.0107") * Pr) / (1 + exact("0.01") * Pr) *
                     pow(exact(Ra), exact(1) / 3);
  return pow(exact(pow(slow, 10) + pow(fast, 10)), exact(1) / 10);
}
exact creeping(double Ra, double Pr) {
  const exact thin = exact("0.527") * pow(exact(Ra), exact(1) / 5) /
                     pow(exact(1 + pow(exact(exact("1.9") / Pr), exact(9) / 10)), exact(2) / 9);
  return exact("2.5") / log(exact(1 + exact("2.5") / thin));
}

template <class C>
void limits(double low, double high) {
  expect_inside<C>(low);
  expect_inside<C>(high);
  expect_crossed<C>(0, side::below, below(low));
  expect_crossed<C>(0, side::below, 0.0);
  expect_crossed<C>(0, side::above, above(high));
  expect_not_finite<C>(0.5 * (low + high));
}
template <class C>
void limits_with_Pr(double low, double high) {
  expect_inside<C>(low, 0.0);
  expect_inside<C>(high, 1e4);
  expect_crossed<C>(0, side::below, below(low), 0.7);
  expect_crossed<C>(0, side::above, above(high), 0.7);
  expect_crossed<C>(1, side::below, low, -1e-9);
  expect_not_finite<C>(0.5 * (low + high), 0.7);
}

}  // namespace

TEST_SUITE("correlations: horizontal plate") {
  TEST_CASE("values") {
    for (const auto& [Ra, Pr] : points) {
      check_value<up::goldstein_sparrow_jones_low_1973>(law("0.96", Ra, 6), Ra);
      check_value<up::goldstein_sparrow_jones_1973>(law("0.59", Ra, 4), Ra);
      check_value<up::lloyd_moran_laminar_1974>(law("0.54", Ra, 4), Ra);
      check_value<up::lloyd_moran_turbulent_1974>(law("0.15", Ra, 3), Ra);
      check_value<up::mcadams_turbulent_1954>(law("0.14", Ra, 3), Ra);
      check_value<up::raithby_hollands_1998>(rising(Ra, Pr), Ra, Pr);
      check_value<down::mcadams_1954>(law("0.27", Ra, 4), Ra);
      check_value<down::radziemska_lewandowski_2001>(law("0.52", Ra, 5), Ra);
      check_value<down::fujii_imura_1972>(law("0.58", Ra, 5), Ra);
      check_value<down::raithby_hollands_1998>(creeping(Ra, Pr), Ra, Pr);
    }
  }

  TEST_CASE("number types and derivatives") {
    check_scalars<up::goldstein_sparrow_jones_low_1973>(33.0);
    check_scalars<up::goldstein_sparrow_jones_1973>(3.3e3);
    check_scalars<up::lloyd_moran_laminar_1974>(3.3e5);
    check_scalars<up::lloyd_moran_turbulent_1974>(3.3e8);
    check_scalars<up::mcadams_turbulent_1954>(3.3e9);
    check_scalars<up::raithby_hollands_1998>(3.3e6, 7.0);
    check_scalars<down::mcadams_1954>(3.3e7);
    check_scalars<down::radziemska_lewandowski_2001>(3.3e7);
    check_scalars<down::fujii_imura_1972>(3.3e7);
    check_scalars<down::raithby_hollands_1998>(3.3e7, 0.7);
  }

  TEST_CASE("neighbours meet as their sources print them") {
    // Goldstein et al. step down by 4.4 % at Ra 200; Lloyd and Moran's laws are equal at
    // (0.54/0.15)^12 and step up by 4.5 % at 8e6, where they hand over
    CHECK(up::goldstein_sparrow_jones_1973::formula(200.0) /
              up::goldstein_sparrow_jones_low_1973::formula(200.0) ==
          doctest::Approx(0.956).epsilon(1e-3));
    const double equal = std::pow(0.54 / 0.15, 12.0);
    CHECK(up::lloyd_moran_turbulent_1974::formula(equal) ==
          doctest::Approx(up::lloyd_moran_laminar_1974::formula(equal)));
    CHECK(up::lloyd_moran_turbulent_1974::formula(8e6) /
              up::lloyd_moran_laminar_1974::formula(8e6) ==
          doctest::Approx(1.045).epsilon(1e-3));
  }

  TEST_CASE("the form for all Ra stays near the data's laws") {
    // 20 %: common practice for horizontal plates
    for (const double Ra : {1e3, 1e5, 1e6, 1e7, 1e9}) {
      CAPTURE(Ra);
      const double smooth = up::raithby_hollands_1998::formula(Ra, 7.0);
      const double law = Ra < 1e4   ? up::goldstein_sparrow_jones_1973::formula(Ra)
                         : Ra < 8e6 ? up::lloyd_moran_laminar_1974::formula(Ra)
                                    : up::lloyd_moran_turbulent_1974::formula(Ra);
      CHECK(smooth == doctest::Approx(law).epsilon(0.2));
    }
    for (const double Ra : {1e5, 1e7, 1e9}) {
      CAPTURE(Ra);
      CHECK(down::raithby_hollands_1998::formula(Ra, 7.0) ==
            doctest::Approx(down::radziemska_lewandowski_2001::formula(Ra)).epsilon(0.2));
    }
  }

  TEST_CASE("a strip on its stable side, boundary-layer theory") {
    // T. Schulenberg, Int. J. Heat Mass Transfer 28 (1985) 467-477, infinite strip of half width R:
    // Nu_R = 0.544 Ra_R^(1/5) / [1 + (0.785/Pr)^(3/5)]^(1/3) (quoted; a strip has A/P = R)
    for (const double Pr : {0.7, 7.0, 100.0}) {
      CAPTURE(Pr);
      const double theory = 0.544 * std::pow(1e8, 0.2) / std::cbrt(1.0 + std::pow(0.785 / Pr, 0.6));
      const double thick = 2.5 / std::log(1.0 + 2.5 / theory);
      CHECK(down::raithby_hollands_1998::formula(1e8, Pr) == doctest::Approx(thick).epsilon(0.08));
    }
  }

  TEST_CASE("envelopes") {
    limits<up::goldstein_sparrow_jones_low_1973>(1.0, 200.0);
    limits<up::goldstein_sparrow_jones_1973>(200.0, 1e4);
    limits<up::lloyd_moran_laminar_1974>(2.2e4, 8e6);
    limits<up::lloyd_moran_turbulent_1974>(8e6, 1.6e9);
    limits<up::mcadams_turbulent_1954>(2e7, 3e10);
    limits<down::mcadams_1954>(1e5, 1e10);
    limits<down::radziemska_lewandowski_2001>(1e4, 1e9);
    limits<down::fujii_imura_1972>(1e6, 1e11);
    limits_with_Pr<up::raithby_hollands_1998>(1.0, 1e10);
    limits_with_Pr<down::raithby_hollands_1998>(1e3, 1e10);
  }

  TEST_CASE("side, width and area over perimeter are different types") {
    using on_area = typed<kinds::rayleigh<kinds::area_over_perimeter>>;
    using on_side = typed<kinds::rayleigh<kinds::plate_side>>;
    using on_width = typed<kinds::rayleigh<kinds::strip_width>>;
    CHECK(std::is_invocable_v<up::lloyd_moran_laminar_1974, on_area>);
    CHECK_FALSE(std::is_invocable_v<up::lloyd_moran_laminar_1974, on_side>);
    CHECK(std::is_invocable_v<up::mcadams_turbulent_1954, on_side>);
    CHECK_FALSE(std::is_invocable_v<up::mcadams_turbulent_1954, on_area>);
    CHECK(std::is_invocable_v<down::fujii_imura_1972, on_width>);
    CHECK_FALSE(std::is_invocable_v<down::fujii_imura_1972, on_area>);
  }
}
