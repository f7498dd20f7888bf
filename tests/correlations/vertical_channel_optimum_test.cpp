// The gap between vertical plates at which a stack gives off most heat.

#include "convelope/correlations/natural/vertical_channel_optimum.hpp"

#include <doctest/doctest.h>

#include <algorithm>
#include <cmath>
#include <initializer_list>

#include "check.hpp"
#include "convelope/correlations/natural/vertical_channel.hpp"

namespace {

using namespace convelope;
using namespace check;
namespace channel = vertical_channel;
using channel::excess_taken;
using channel::heated_walls;

// The gap s (over the height) where Nu(El(s))/s^2 is largest, by golden section.
template <class Heat>
double best(const Heat& heat, double low, double high) {
  const double shrink = 0.5 * (std::sqrt(5.0) - 1.0);
  for (int i = 0; i < 80; ++i) {
    const double a = high - shrink * (high - low);
    const double b = low + shrink * (high - low);
    (heat(a) > heat(b) ? high : low) = heat(a) > heat(b) ? b : a;
  }
  return 0.5 * (low + high);
}

}  // namespace

TEST_SUITE("correlations: vertical channel, optimum") {
  using isothermal = channel::optimum_spacing_isothermal;
  using isoflux = channel::optimum_spacing_isoflux;

  TEST_CASE("values") {
    for (const double Ra : {1e3, 3.3e6, 2e11}) {
      const exact fourth = pow(exact(Ra), exact("-0.25"));
      const exact fifth = pow(exact(Ra), exact("-0.2"));
      check_value<isothermal>(exact("2.714") * fourth, Ra, heated_walls::both);
      check_value<isothermal>(exact("2.154") * fourth, Ra, heated_walls::one);
      check_value<isoflux>(exact("2.12") * fifth, Ra, heated_walls::both, excess_taken::at_exit);
      check_value<isoflux>(exact("1.69") * fifth, Ra, heated_walls::one, excess_taken::at_exit);
      check_value<isoflux>(exact("1.472") * fifth, Ra, heated_walls::both,
                           excess_taken::at_mid_height);
      check_value<isoflux>(exact("1.169") * fifth, Ra, heated_walls::one,
                           excess_taken::at_mid_height);
    }
    check_scalars<isothermal>(3.3e6, heated_walls::both);
    check_scalars<isoflux>(3.3e6, heated_walls::one, excess_taken::at_exit);
  }

  TEST_CASE("the printed constants maximise the heat of the stack") {
    // heat per width of the stack ~ Nu/b^2; El = Ra_H (b/H)^4, El* = Ra*_H (b/H)^5; here Ra = 1.
    // Where the exit constants are printed to three digits they are right to half a per cent.
    const auto stack = [](auto Nu, double power) {
      return best([=](double s) { return Nu(std::pow(s, power)) / (s * s); }, 0.5, 6.0);
    };
    CHECK(isothermal::formula(1.0, heated_walls::both) ==
          doctest::Approx(
              stack(
                  [](double El) {
                    return channel::bar_cohen_rohsenow_isothermal_symmetric_1984::formula(El);
                  },
                  4.0))
              .epsilon(1e-3));
    CHECK(isothermal::formula(1.0, heated_walls::one) ==
          doctest::Approx(
              stack(
                  [](double El) {
                    return channel::bar_cohen_rohsenow_isothermal_one_side_1984::formula(El);
                  },
                  4.0))
              .epsilon(1e-3));
    CHECK(isoflux::formula(1.0, heated_walls::both, excess_taken::at_exit) ==
          doctest::Approx(stack(
                              [](double El) {
                                return channel::bar_cohen_rohsenow_isoflux_symmetric_1984::formula(
                                    El);
                              },
                              5.0))
              .epsilon(2e-3));
    CHECK(isoflux::formula(1.0, heated_walls::one, excess_taken::at_exit) ==
          doctest::Approx(stack(
                              [](double El) {
                                return channel::bar_cohen_rohsenow_isoflux_one_side_1984::formula(
                                    El);
                              },
                              5.0))
              .epsilon(4e-3));
    CHECK(isoflux::formula(1.0, heated_walls::both, excess_taken::at_mid_height) ==
          doctest::Approx(
              stack(
                  [](double El) {
                    return channel::bar_cohen_rohsenow_isoflux_symmetric_midheight_1984::formula(
                        El);
                  },
                  5.0))
              .epsilon(1e-3));
    CHECK(isoflux::formula(1.0, heated_walls::one, excess_taken::at_mid_height) ==
          doctest::Approx(
              stack(
                  [](double El) {
                    return channel::bar_cohen_rohsenow_isoflux_one_side_midheight_1984::formula(El);
                  },
                  5.0))
              .epsilon(1e-3));
  }

  TEST_CASE("Nusselt number at the optimum") {
    // 1.307 and 1.04: Bar-Cohen and Rohsenow 1984, as textbooks quote them
    CHECK(channel::bar_cohen_rohsenow_isothermal_symmetric_1984::formula(std::pow(2.714, 4.0)) ==
          doctest::Approx(1.307).epsilon(1e-3));
    CHECK(channel::bar_cohen_rohsenow_isothermal_one_side_1984::formula(std::pow(2.154, 4.0)) ==
          doctest::Approx(1.04).epsilon(3e-3));
  }

  TEST_CASE("envelopes") {
    for (const auto walls : {heated_walls::both, heated_walls::one}) {
      expect_inside<isothermal>(54.3, walls);
      expect_crossed<isothermal>(0, side::below, below(54.3), walls);
      expect_not_finite<isothermal>(1e6, walls);
      for (const auto excess : {excess_taken::at_exit, excess_taken::at_mid_height}) {
        expect_inside<isoflux>(42.8, walls, excess);
        expect_crossed<isoflux>(0, side::below, below(42.8), walls, excess);
        expect_not_finite<isoflux>(1e6, walls, excess);
      }
    }
    // the limits are where the gap of two heated walls reaches the height
    CHECK(isothermal::formula(54.3, heated_walls::both) == doctest::Approx(1.0).epsilon(1e-3));
    CHECK(isoflux::formula(42.8, heated_walls::both, excess_taken::at_exit) ==
          doctest::Approx(1.0).epsilon(1e-3));
  }
}
