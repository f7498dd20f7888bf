// Developed flow and heat transfer in ducts: the two solvers against published numbers and each
// other's limits, with the order of convergence, then the library against the solvers.

#include "duct_poisson.hpp"

#include <doctest/doctest.h>

#include <cmath>
#include <initializer_list>
#include <numbers>

#include "convelope/correlations/friction/smooth_duct.hpp"
#include "convelope/correlations/internal/parallel_plates.hpp"
#include "convelope/correlations/internal/round_duct_laminar.hpp"

using first_principles::cross_section;
using first_principles::developed_flow;
using first_principles::finite_volume;
using first_principles::rectangular_duct;

namespace {

// f Re of the rectangle by the double series of J. Boussinesq, J. Math. Pures Appl. 13 (1868) 377
double boussinesq(double aspect) {
  double sum = 0.0;
  for (int n = 199; n >= 1; n -= 2) {
    sum += std::tanh(n * std::numbers::pi / (2.0 * aspect)) / std::pow(n, 5);
  }
  return 24.0 / ((1.0 + aspect) * (1.0 + aspect) *
                 (1.0 - 192.0 * aspect / std::pow(std::numbers::pi, 5) * sum));
}

// the finite volumes with their second-order error taken away
developed_flow extrapolated(cross_section shape) {
  const auto coarse = finite_volume(shape, 80);
  const auto fine = finite_volume(shape, 160);
  const auto at_zero = [&](auto member) {
    return fine.*member + (fine.*member - coarse.*member) / 3.0;
  };
  return {at_zero(&developed_flow::fanning_re), at_zero(&developed_flow::uniform_flux),
          at_zero(&developed_flow::uniform_temperature)};
}

}  // namespace

TEST_SUITE("first principles: developed ducts") {
  TEST_CASE("finite volumes converge with the square of the step to the exact values") {
    struct exact {
      cross_section shape;
      developed_flow value;
    };
    // Shah and London 1978: 16, 48/11, 3.656793; 24, 140/17, 7.540701; one wall heated, the other
    // insulated 70/13, 4.860737
    for (const auto& at :
         {exact{cross_section::round_tube, {16.0, 48.0 / 11.0, 3.656793458}},
          exact{cross_section::plates_both_heated, {24.0, 140.0 / 17.0, 7.540700874}},
          exact{cross_section::plates_one_heated, {24.0, 70.0 / 13.0, 4.860737}}}) {
      CAPTURE(static_cast<int>(at.shape));
      const auto coarse = finite_volume(at.shape, 40);
      const auto medium = finite_volume(at.shape, 80);
      const auto fine = finite_volume(at.shape, 160);
      for (const auto member : {&developed_flow::fanning_re, &developed_flow::uniform_flux,
                                &developed_flow::uniform_temperature}) {
        const double first = medium.*member - coarse.*member;
        const double second = fine.*member - medium.*member;
        CHECK(std::log2(first / second) == doctest::Approx(2.0).epsilon(0.03));
        CHECK(fine.*member + second / 3.0 == doctest::Approx(at.value.*member).epsilon(1.5e-7));
      }
    }
  }

  TEST_CASE("rectangle against the series for friction") {
    for (const double aspect : {1.0, 0.8, 0.5, 0.25, 0.125}) {
      CAPTURE(aspect);
      CHECK(rectangular_duct(aspect).fanning_re ==
            doctest::Approx(boussinesq(aspect)).epsilon(1e-8));
    }
  }

  TEST_CASE("rectangle against the tables of Shah and London 1978") {
    // from memory; their Nu_T, by finite differences, has an error of up to 0.1 %
    struct row {
      double aspect, fanning_re, uniform_flux, uniform_temperature;
    };
    for (const auto& at : {row{1.0, 14.227, 3.608, 2.976}, row{0.5, 15.548, 4.123, 3.391},
                           row{1.0 / 3.0, 17.090, 4.795, 3.956}, row{0.25, 18.233, 5.331, 4.439},
                           row{0.125, 20.585, 6.490, 5.597}}) {
      CAPTURE(at.aspect);
      const auto flow = rectangular_duct(at.aspect);
      CHECK(flow.fanning_re == doctest::Approx(at.fanning_re).epsilon(5e-5));
      CHECK(flow.uniform_flux == doctest::Approx(at.uniform_flux).epsilon(1.5e-4));
      CHECK(flow.uniform_temperature == doctest::Approx(at.uniform_temperature).epsilon(1e-3));
    }
  }

  TEST_CASE("rectangle: convergence in the polynomial degree") {
    // the corners allow algebraic convergence only, but of high order
    for (const auto member : {&developed_flow::fanning_re, &developed_flow::uniform_flux,
                              &developed_flow::uniform_temperature}) {
      const double reference = rectangular_duct(1.0, 20).*member;
      const double four = std::abs(rectangular_duct(1.0, 4).*member / reference - 1.0);
      const double eight = std::abs(rectangular_duct(1.0, 8).*member / reference - 1.0);
      CHECK(four < 1e-5);
      CHECK(eight < four / 16.0);
      CHECK(rectangular_duct(1.0, 12).*member == doctest::Approx(reference).epsilon(2e-9));
    }
  }

  TEST_CASE("a slit tends to parallel plates") {
    // the ends take away in proportion to the aspect ratio
    const auto wide = rectangular_duct(0.1);
    const auto half = rectangular_duct(0.05, 20);
    CHECK(2.0 * half.fanning_re - wide.fanning_re == doctest::Approx(24.0).epsilon(0.012));
    CHECK(2.0 * half.uniform_flux - wide.uniform_flux ==
          doctest::Approx(140.0 / 17.0).epsilon(0.02));
    CHECK(2.0 * half.uniform_temperature - wide.uniform_temperature ==
          doctest::Approx(7.5407).epsilon(0.025));
  }

  TEST_CASE("library: round duct and parallel plates") {
    namespace round = convelope::round_duct;
    namespace plane = convelope::parallel_plates;
    const auto same = [](double exact) { return doctest::Approx(exact).epsilon(2e-7); };
    const auto tube = extrapolated(cross_section::round_tube);
    // Darcy's factor is four times Fanning's
    CHECK(100.0 * convelope::friction::hagen_poiseuille::formula(100.0) ==
          same(4.0 * tube.fanning_re));
    CHECK(round::laminar_developed_uwt::formula<double>() == same(tube.uniform_temperature));
    CHECK(round::laminar_developed_uhf::formula<double>() == same(tube.uniform_flux));
    const auto both = extrapolated(cross_section::plates_both_heated);
    CHECK(plane::exact_developed_uwt::formula<double>() == same(both.uniform_temperature));
    CHECK(plane::exact_developed_uhf::formula<double>() == same(both.uniform_flux));
    const auto one = extrapolated(cross_section::plates_one_heated);
    CHECK(plane::exact_developed_uwt_one_wall::formula<double>() == same(one.uniform_temperature));
    CHECK(plane::exact_developed_uhf_one_wall::formula<double>() == same(one.uniform_flux));
  }
}
