// External, confined, internal, and the numbers that decide.
#include "convelope/scales/confinement.hpp"

#include <doctest/doctest.h>

#include <cmath>
#include <string>

using namespace convelope;

namespace {

confinement_answer classed(double body, double passage, double x, double Re) {
  return classify(typed<kinds::height>::from_si(body), typed<kinds::gap>::from_si(passage),
                  typed<kinds::distance_from_edge>::from_si(x), Re);
}

}  // namespace

TEST_CASE("confinement: one of each class") {
  const auto a = classed(0.005, 0.2, 0.05, 2e4);
  CHECK(a.which == confinement::external);
  CHECK(a.blockage == doctest::Approx(0.025));
  CHECK(a.layer_over_half == doctest::Approx(4.91 * 0.05 / std::sqrt(2e4) / (0.5 * 0.195)));
  CHECK(classed(0.05, 0.2, 0.05, 2e4).which == confinement::confined);
  const auto c = classed(0.005, 0.02, 0.5, 2e4);
  CHECK(c.which == confinement::internal);
  CHECK(c.layer_over_half > 1.0);
  CHECK(std::string(words(a.which)) == "external");
  CHECK(std::string(words(confinement::confined)) == "confined");
  CHECK(std::string(words(c.which)) == "internal");
}

TEST_CASE("confinement: the boundary between external and confined is the blockage") {
  CHECK(classed(0.0999, 1.0, 0.1, 1e5).which == confinement::external);
  CHECK(classed(0.1, 1.0, 0.1, 1e5).which == confinement::external);
  CHECK(classed(0.1001, 1.0, 0.1, 1e5).which == confinement::confined);
  CHECK(classed(0.1, 1.0, 0.1, 1e5).blockage_limit == 0.1);
}

TEST_CASE("confinement: the boundary to internal is where the layers meet") {
  // 4.91 x/sqrt(Re) = 0.5 (h - b) at Re = 1e4, h - b = 0.0982 x
  const double x = 0.5;
  CHECK(classed(0.0, 0.0982 * x * 1.0001, x, 1e4).which == confinement::external);
  CHECK(classed(0.0, 0.0982 * x * 0.9999, x, 1e4).which == confinement::internal);
  // Internal outranks confined.
  CHECK(classed(0.02, 0.04, 0.5, 1e4).which == confinement::internal);
}

TEST_CASE("confinement: a turbulent layer is thicker") {
  const double laminar = classed(0.0, 1.0, 1.0, 4.999e5).layer_over_half;
  const double turbulent = classed(0.0, 1.0, 1.0, 5.001e5).layer_over_half;
  CHECK(laminar == doctest::Approx(2.0 * 4.91 / std::sqrt(4.999e5)).epsilon(1e-12));
  CHECK(turbulent == doctest::Approx(2.0 * 0.37 * std::pow(5.001e5, -0.2)).epsilon(1e-12));
  CHECK(turbulent > 3.0 * laminar);
}

TEST_CASE("confinement: bad input is told, and no class pretended beyond it") {
  CHECK(classed(0.0, 1.0, 1.0, 1e4).possible);  // a flat wall blocks nothing
  const double infinity = HUGE_VAL;
  for (const double bad : {-1.0, std::nan(""), infinity, -infinity}) {
    CAPTURE(bad);
    CHECK_FALSE(classed(bad, 1.0, 1.0, 1e4).possible);
    CHECK_FALSE(classed(0.1, bad, 1.0, 1e4).possible);
    CHECK_FALSE(classed(0.1, 1.0, bad, 1e4).possible);
    CHECK_FALSE(classed(0.1, 1.0, 1.0, bad).possible);
  }
  CHECK_FALSE(classed(0.1, 0.1, 1.0, 1e4).possible);  // the body fills the passage
  CHECK_FALSE(classed(0.2, 0.1, 1.0, 1e4).possible);
  CHECK_FALSE(classed(0.1, 0.0, 1.0, 1e4).possible);
  CHECK_FALSE(classed(0.1, 1.0, 0.0, 1e4).possible);
  CHECK_FALSE(classed(0.1, 1.0, 1.0, 0.0).possible);
}
