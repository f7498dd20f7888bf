// Onset of Taylor vortices: the solver against published critical numbers.

#include "taylor_couette.hpp"

#include <doctest/doctest.h>
#include <initializer_list>

using first_principles::narrow_gap;
using first_principles::taylor_couette;

TEST_SUITE("first principles: Taylor vortices") {
  TEST_CASE("narrow gap") {
    // S. Chandrasekhar, Hydrodynamic and Hydromagnetic Stability, Oxford 1961, ch. VII: T = 3390 for
    // the outer cylinder at rest, T being twice this group, wave number 3.12 (from memory)
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
    // R. C. DiPrima, P. M. Eagles, B. S. Ng, Phys. Fluids 27 (1984) 2403-2411 (from memory)
    struct row {
      double ratio, reynolds, wave_number;
    };
    for (const auto& [ratio, reynolds, wave_number] :
         {row{0.5, 68.186, 3.162}, row{0.6, 71.715, 3.148}, row{0.7, 79.490, 3.139},
          row{0.8, 94.734, 3.133}, row{0.9, 131.61, 3.129}, row{0.95, 184.99, 3.128}}) {
      CAPTURE(ratio);
      const auto critical = taylor_couette(ratio);
      CHECK(critical.critical == doctest::Approx(reynolds).epsilon(5e-5));
      CHECK(critical.wave_number == doctest::Approx(wave_number).epsilon(3e-4));
    }
    // Chandrasekhar 1961, ch. VII: T = (64/9)(omega R_i^2/nu)^2 = 3.310e4 at R_o = 2 R_i (from memory)
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
}
