// Onset of Taylor vortices: the solver against published critical numbers, then what the library
// says about the onset against the solver. (Minimises with boost/math, which needs exceptions.)

#include "taylor_couette.hpp"

#include <doctest/doctest.h>

#include <cmath>
#include <initializer_list>

#include "convelope/correlations/external/annular_gap.hpp"
#include "deviation.hpp"

namespace gap = convelope::annular_gap;
using first_principles::check_band;
using first_principles::deviations;
using first_principles::narrow_gap;
using first_principles::taylor_couette;

TEST_SUITE("first principles: Taylor vortices") {
  TEST_CASE("narrow gap") {
    // S. Chandrasekhar, Hydrodynamic and Hydromagnetic Stability, Oxford 1961, ch. VII: T = 3390
    // for the outer cylinder at rest, T being twice this group, wave number 3.12 (from memory)
    const auto still = narrow_gap(0.0);
    CHECK(still.critical == doctest::Approx(1694.95).epsilon(1e-6));
    CHECK(2.0 * still.critical == doctest::Approx(3390.0).epsilon(2e-4));
    CHECK(still.wave_number == doctest::Approx(3.1266).epsilon(2e-5));
    // equal angular velocities: the fluid layer heated from below, 1707.762 at 3.117 (W. H. Reid,
    // D. L. Harris, Phys. Fluids 1 (1958) 102-110)
    const auto rigid = narrow_gap(1.0);
    CHECK(rigid.critical == doctest::Approx(1707.762).epsilon(1e-6));
    CHECK(rigid.wave_number == doctest::Approx(3.117).epsilon(3e-4));
  }

  TEST_CASE("finite gap, outer cylinder at rest") {
    // R. C. DiPrima, H. L. Swinney, in Hydrodynamic Instabilities and the Transition to Turbulence,
    // Springer 1981, ch. 6 (from memory), to their digits
    struct row {
      double ratio, reynolds, wave_number;
    };
    for (const auto& at :
         {row{0.5, 68.19, 3.16}, row{0.6, 71.72, 3.15}, row{0.7, 79.49, 3.14},
          row{0.8, 94.73, 3.13}, row{0.9, 131.61, 3.13}, row{0.95, 184.99, 3.13}}) {
      CAPTURE(at.ratio);
      const auto critical = taylor_couette(at.ratio);
      CHECK(critical.critical == doctest::Approx(at.reynolds).epsilon(8e-5));
      CHECK(critical.wave_number == doctest::Approx(at.wave_number).epsilon(1.2e-3));
    }
    // Chandrasekhar 1961, ch. VII: T = (64/9)(omega R_i^2/nu)^2 = 3.310e4 at R_o = 2 R_i (from
    // memory)
    const double re = taylor_couette(0.5).critical;
    CHECK(64.0 / 9.0 * re * re == doctest::Approx(3.310e4).epsilon(2e-3));
  }

  TEST_CASE("the finite gap tends to the narrow one") {
    // Re^2 b/R_i is the narrow-gap group; the difference falls with the gap
    const auto group = [](double gap_ratio) {  // b/R_i
      const double re = taylor_couette(1.0 / (1.0 + gap_ratio)).critical;
      return re * re * gap_ratio;
    };
    CHECK(2.0 * group(0.005) - group(0.01) == doctest::Approx(1694.95).epsilon(1e-4));
  }

  TEST_CASE("more points change nothing") {
    for (const double ratio : {0.5, 0.95}) {
      CHECK(taylor_couette(ratio, 18).critical ==
            doctest::Approx(taylor_couette(ratio, 28).critical).epsilon(2e-8));
    }
  }

  TEST_CASE("library: conduction gives way to vortices at the critical number") {
    // half a per cent to each side of it; air
    const double squared = narrow_gap(0.0).critical;
    const double plain = std::sqrt(squared);
    CHECK(gap::taylor_gazley::formula(0.995 * plain, 0.71) == 2.0);
    CHECK(gap::taylor_gazley::formula(1.005 * plain, 0.71) != 2.0);
    CHECK(gap::becker_kaye_1962::formula(0.995 * squared) == 2.0);
    CHECK(gap::becker_kaye_1962::formula(1.005 * squared) != 2.0);
    // At the onset the vortices carry nothing yet, so that Nu = 2 there; the published laws start a
    // little below it.
    const auto start = [](double Nu) { return deviations({Nu}, [](double v) { return v / 2.0; }); };
    check_band(start(gap::taylor_gazley::formula(1.005 * plain, 0.71)), -3.90, -3.90);
    check_band(start(gap::becker_kaye_1962::formula(1.005 * squared)), -1.81, -1.81);
  }

  TEST_CASE("library: geometry factor of a gap that is not narrow") {
    // omega^2 r_m b^3/nu^2 at the onset is 1697 F_g in the source
    const auto ratio = [](double radius_ratio) {
      const double re = taylor_couette(radius_ratio).critical;
      const double mean_radius = 0.5 * (1.0 + radius_ratio);
      const double width = 1.0 - radius_ratio;
      const double onset = re * re * mean_radius * width / (radius_ratio * radius_ratio);
      return 1697.0 * gap::becker_kaye_geometry_factor::formula(width / mean_radius) / onset;
    };
    check_band(deviations({0.7, 0.8, 0.9, 0.95, 0.99}, ratio), -0.38, 4.19);
    check_band(deviations({0.5}, ratio), 46.31, 46.31);  // outside its range
  }

  TEST_CASE("library: conduction through a gap of any width") {
    // 2 b q_i/(k dT) on the inner area from the integral of dr/r
    const auto rule = first_principles::gauss_legendre(40);
    const auto exact = [&](double radius_ratio) {
      double resistance = 0.0;
      for (Eigen::Index i = 0; i < rule.node.size(); ++i) {
        const double half = 0.5 * (1.0 - radius_ratio);
        resistance += half * rule.weight[i] / (radius_ratio + half * (1.0 + rule.node[i]));
      }
      return 2.0 * (1.0 - radius_ratio) / (radius_ratio * resistance);
    };
    for (const double radius_ratio : {0.3, 0.5, 0.7, 0.9, 0.99, 0.99901}) {
      CAPTURE(radius_ratio);
      CHECK(gap::conduction_limit::formula(radius_ratio) ==
            doctest::Approx(exact(radius_ratio)).epsilon(2e-13));
    }
  }
}
