// Flat plate, laminar: the solver against published numbers and closed limits, then the library's
// correlations against the solver.

#include "blasius_pohlhausen.hpp"

#include <doctest/doctest.h>

#include <boost/math/special_functions/beta.hpp>
#include <cmath>
#include <initializer_list>
#include <numbers>

#include "convelope/correlations/external/flat_plate_laminar.hpp"
#include "convelope/correlations/friction/flat_plate_friction.hpp"
#include "deviation.hpp"

namespace plate = convelope::flat_plate;
using first_principles::blasius_wall_shear;
using first_principles::check_band;
using first_principles::deviations;
using first_principles::plate_layer;
using first_principles::solve_plate_layer;

namespace {

// deviation of a correlation at Re = 1 from `factor` times a result of the solver, per cent
template <class Correlation>
first_principles::interval band(double plate_layer::*exact, double factor,
                                std::initializer_list<double> prandtl) {
  return deviations(prandtl, [=](double Pr) {
    return Correlation::formula(1.0, Pr) / (factor * solve_plate_layer(Pr).*exact);
  });
}

}  // namespace

TEST_SUITE("first principles: flat plate") {
  TEST_CASE("wall shear and displacement of the Blasius layer") {
    // 0.33206 and 1.7208: L. Howarth, Proc. R. Soc. A 164 (1938) 547-579; further digits as given
    // by J. P. Boyd, Exp. Math. 8 (1999) 381-394 (from memory)
    CHECK(blasius_wall_shear() == doctest::Approx(0.332057336215).epsilon(1e-11));
    CHECK(solve_plate_layer(1.0).outer_shift == doctest::Approx(1.72078765752).epsilon(1e-10));
  }

  TEST_CASE("Pohlhausen's table of the mean film coefficient, Nu_L/Re_L^(1/2)") {
    // E. Pohlhausen, ZAMM 1 (1921) 115-121, as tabulated by H. Schlichting, Boundary-Layer Theory,
    // ch. 12 (from memory): three digits, the first entry 0.35 % low
    const double published[][2] = {{0.6, 0.552}, {0.7, 0.585}, {0.8, 0.614},
                                   {0.9, 0.640}, {1.0, 0.664}, {1.1, 0.687},
                                   {7.0, 1.29},  {10.0, 1.46}, {15.0, 1.67}};
    for (const auto& pair : published) {
      const double Pr = pair[0];
      CAPTURE(Pr);
      CHECK(2.0 * solve_plate_layer(Pr).isothermal ==
            doctest::Approx(pair[1]).epsilon(Pr > 0.6 && Pr < 2.0 ? 1e-3 : 4e-3));
    }
  }

  TEST_CASE("Pr = 1: the energy equation is the momentum equation") {
    const auto layer = solve_plate_layer(1.0);
    CHECK(layer.isothermal == doctest::Approx(blasius_wall_shear()).epsilon(1e-11));
    CHECK(layer.recovery == doctest::Approx(1.0).epsilon(1e-10));
  }

  TEST_CASE("recovery factor") {
    // 0.835 at Pr 0.7 and 0.770 at 0.6: Pohlhausen 1921 in Schlichting (from memory)
    CHECK(std::abs(solve_plate_layer(0.7).recovery - 0.835) < 1e-3);
    CHECK(std::abs(solve_plate_layer(0.6).recovery - 0.770) < 4e-3);
  }

  TEST_CASE("high Pr: linear velocity profile at the wall") {
    // isothermal (f''(0)/12)^(1/3)/Gamma(4/3) = 0.33872; isoflux by superposition of unheated
    // starts in the same profile (M. J. Lighthill, Proc. R. Soc. A 202 (1950) 359-377)
    const double shear = blasius_wall_shear();
    const double isothermal = std::cbrt(shear / 12.0) / std::tgamma(4.0 / 3.0);
    const double isoflux = 3.0 * std::tgamma(2.0 / 3.0) * std::cbrt(shear / 12.0) /
                           boost::math::beta(4.0 / 3.0, 1.0 / 3.0);
    CHECK(isothermal == doctest::Approx(0.33872).epsilon(2e-5));
    CHECK(isoflux == doctest::Approx(0.46369).epsilon(5e-5));
    const auto layer = solve_plate_layer(1e5);
    const double scale = std::cbrt(1e5);
    CHECK(layer.isothermal / scale == doctest::Approx(isothermal).epsilon(3e-6));
    CHECK(layer.isoflux / scale == doctest::Approx(isoflux).epsilon(3e-6));
  }

  TEST_CASE("low Pr: slug flow, approached as Pr^(1/2)") {
    // conduction into a uniform stream: 1/sqrt(pi) and sqrt(pi)/2 times Pe^(1/2)
    const auto limit = [](auto member) {
      const double a = solve_plate_layer(1e-4).*member / 1e-2;
      const double b = solve_plate_layer(4e-4).*member / 2e-2;
      return 2.0 * a - b;
    };
    CHECK(limit(&plate_layer::isothermal) ==
          doctest::Approx(std::numbers::inv_sqrtpi).epsilon(5e-4));
    CHECK(limit(&plate_layer::isoflux) ==
          doctest::Approx(1.0 / (2.0 * std::numbers::inv_sqrtpi)).epsilon(5e-4));
  }

  TEST_CASE("the step control is not what limits the digits") {
    for (const double Pr : {1e-3, 0.71, 1e3}) {
      CAPTURE(Pr);
      const auto loose = solve_plate_layer(Pr, 1e-10);
      const auto tight = solve_plate_layer(Pr);
      CHECK(loose.isothermal == doctest::Approx(tight.isothermal).epsilon(1e-8));
      CHECK(loose.isoflux == doctest::Approx(tight.isoflux).epsilon(1e-8));
    }
  }

  TEST_CASE("library: every Prandtl number") {
    const auto all = {1e-3, 3e-3, 0.01, 0.03, 0.1, 0.3, 0.7, 1.0, 10.0, 100.0, 1000.0};
    using local_temperature = plate::churchill_ozoe_1973_isothermal_local;
    check_band(band<local_temperature>(&plate_layer::isothermal, 1.0, all), -1.09, 1.38);
    // h falls as x^(-1/2): the mean is twice the local value
    using mean_temperature = plate::churchill_ozoe_1973_isothermal_average;
    check_band(band<mean_temperature>(&plate_layer::isothermal, 2.0, all), -1.09, 1.38);
    using local_flux = plate::churchill_ozoe_1973_isoflux_local;
    check_band(band<local_flux>(&plate_layer::isoflux, 1.0, all), -0.86, 1.63);
    // the constant of high Pr alone
    check_band(band<local_temperature>(&plate_layer::isothermal, 1.0, {1000.0}), -0.03, -0.03);
    check_band(band<local_flux>(&plate_layer::isoflux, 1.0, {1000.0}), -0.01, -0.01);
  }

  TEST_CASE("library: ordinary fluids") {
    const auto ordinary = {0.6, 0.7, 1.0, 3.0, 10.0, 60.0};
    using local_temperature = plate::laminar_isothermal_local;
    check_band(band<local_temperature>(&plate_layer::isothermal, 1.0, ordinary), -1.95, 1.11);
    using mean_temperature = plate::laminar_isothermal_average;
    check_band(band<mean_temperature>(&plate_layer::isothermal, 2.0, ordinary), -1.95, 1.11);
    using local_flux = plate::laminar_isoflux_local;
    check_band(band<local_flux>(&plate_layer::isoflux, 1.0, ordinary), -2.29, -0.69);
    // q L/k over the mean excess: the excess grows as x^(1/2), its mean is 2/3 of the last
    using mean_flux = plate::laminar_isoflux_average;
    check_band(band<mean_flux>(&plate_layer::isoflux, 1.5, ordinary), -2.21, -0.62);
  }

  TEST_CASE("library: liquid metals") {
    using slug = plate::laminar_low_prandtl_local;
    check_band(band<slug>(&plate_layer::isothermal, 1.0, {1e-3, 0.01, 0.05}), 3.04, 20.03);
  }

  TEST_CASE("library: skin friction") {
    // tau_w/(rho U^2/2) is 2 f''(0)/Re^(1/2), and its mean twice that: both rounded down by 0.02 %
    namespace friction = convelope::flat_plate_friction;
    const double shear = blasius_wall_shear();
    const auto local = [=](double Re) {
      return friction::blasius_local::formula(Re) * std::sqrt(Re) / (2.0 * shear);
    };
    const auto mean = [=](double Re) {
      return friction::blasius_average::formula(Re) * std::sqrt(Re) / (4.0 * shear);
    };
    check_band(deviations({1e3, 5e5}, local), -0.017, -0.017, 0.003);
    check_band(deviations({1e3, 5e5}, mean), -0.017, -0.017, 0.003);
  }
}
