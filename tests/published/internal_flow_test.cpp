// Worked examples and tables on duct flow, end to end with the properties the books print.
// All numbers of the books are from memory.

#include <doctest/doctest.h>

#include <cmath>

#include "convelope/correlations/friction/duct_friction.hpp"
#include "convelope/correlations/internal/parallel_plates.hpp"
#include "convelope/correlations/internal/round_duct.hpp"
#include "convelope/groups.hpp"

using namespace convelope;
using namespace convelope::units;

namespace {

constexpr double pi = 3.14159265358979323846;

struct book_fluid {
  double density;
  double viscosity;
  double conductivity;
  double specific_heat;

  auto reynolds(double velocity, double diameter) const {
    return convelope::reynolds(convelope::density(density * kilogram_per_cubic_metre),
                               mean_velocity(velocity * metre_per_second),
                               hydraulic_diameter(diameter * metre),
                               convelope::viscosity(viscosity * pascal_second));
  }
  auto prandtl() const { return prandtl_number(specific_heat * viscosity / conductivity); }
  template <class N>
  auto film(const N& Nu, double diameter) const {
    return film_coefficient(Nu, convelope::conductivity(conductivity * watt_per_metre_kelvin),
                            hydraulic_diameter(diameter * metre));
  }
  /// Mean velocity that carries a mass flow through a round duct.
  double velocity(double mass_flow, double diameter) const {
    return mass_flow / (density * pi / 4.0 * diameter * diameter);
  }
  template <class F>
  double pressure_drop(const F& f_D, double velocity, double diameter, double length) const {
    static_assert(measures<F, kinds::darcy_friction>);
    return f_D.si() * length / diameter * density * velocity * velocity / 2.0;
  }
};

/// Uniform wall temperature: T_out = T_w - (T_w - T_in) exp(-h A/(m cp)).
double outlet(double wall, double inlet, double transfer_units) {
  return wall - (wall - inlet) * std::exp(-transfer_units);
}

}  // namespace

TEST_SUITE("published: duct flow") {
  TEST_CASE("water in a solar collector tube, uniform flux") {
    // Incropera, DeWitt, Fundamentals of Heat and Mass Transfer, 6th ed., Example 8.2: 0.01 kg/s of
    // water from 20 to 80 degC at 2000 W/m2 in a tube of 60 mm; mu and k at the outlet
    const book_fluid water{971.8, 352e-6, 0.670, 4178.0};
    const double m = 0.01;
    const double q = 2000.0;
    CHECK(m * water.specific_heat * 60.0 / (pi * 0.06 * q) == doctest::Approx(6.65).epsilon(1e-3));
    const auto Re = water.reynolds(water.velocity(m, 0.06), 0.06);
    CHECK(Re.si() == doctest::Approx(603.0).epsilon(1e-3));
    const auto h = water.film(round_duct::laminar_developed_uhf{}(), 0.06);
    CHECK(h.si() == doctest::Approx(48.7).epsilon(2e-3));
    CHECK(80.0 + q / h.si() == doctest::Approx(121.0).epsilon(2e-3));
    CHECK(h.inside());
  }

  TEST_CASE("hot air in a sheet-metal duct through a cold space") {
    // Incropera, DeWitt, 6th ed., Example 8.6: 0.05 kg/s cool from 103 to 77 degC over 5 m of a
    // duct of 0.15 m; outside 6 W/(m2 K) at 0 degC; mu, k, Pr at the outlet
    const book_fluid air{0.995, 208.2e-7, 0.030, 0.70 * 0.030 / 208.2e-7};
    const double m = 0.05;
    CHECK(m * 1010.0 * (77.0 - 103.0) == doctest::Approx(-1313.0).epsilon(1e-3));
    const auto Re = air.reynolds(air.velocity(m, 0.15), 0.15);
    CHECK(Re.si() == doctest::Approx(20384.0).epsilon(1e-3));
    const auto Nu =
        round_duct::dittus_boelter_mcadams{}(Re, air.prandtl(), round_duct::mode::cooling);
    CHECK(Nu.si() == doctest::Approx(57.9).epsilon(2e-3));
    const auto h = air.film(Nu, 0.15);
    CHECK(h.si() == doctest::Approx(11.6).epsilon(3e-3));
    CHECK(h.inside());
    const double q = 77.0 / (1.0 / h.si() + 1.0 / 6.0);
    CHECK(q == doctest::Approx(304.5).epsilon(2e-3));
    CHECK(77.0 - q / h.si() == doctest::Approx(50.7).epsilon(2e-3));
  }

  TEST_CASE("water heated by resistance heaters") {
    // Cengel, Heat Transfer: A Practical Approach, 2nd ed., Example 8-5: 10 L/min from 15 to 65
    // degC in 5 m of a tube of 3 cm, uniform flux; properties at 40 degC
    const book_fluid water{992.1, 992.1 * 0.658e-6, 0.631, 4179.0};
    const double D = 0.03;
    const double u = 0.01 / 60.0 / (pi / 4.0 * D * D);
    CHECK(u == doctest::Approx(0.236).epsilon(2e-3));
    const double heat = 992.1 * 0.01 / 60.0 * 4179.0 * 50.0;
    CHECK(heat == doctest::Approx(34.6e3).epsilon(2e-3));
    const auto Re = water.reynolds(u, D);
    CHECK(Re.si() == doctest::Approx(10760.0).epsilon(2e-3));
    CHECK(water.prandtl().si() == doctest::Approx(4.32).epsilon(2e-3));
    const auto Nu =
        round_duct::dittus_boelter_mcadams{}(Re, water.prandtl(), round_duct::mode::heating);
    CHECK(Nu.si() == doctest::Approx(69.5).epsilon(3e-3));
    const auto h = water.film(Nu, D);
    CHECK(h.si() == doctest::Approx(1462.0).epsilon(3e-3));
    const double flux = heat / (pi * D * 5.0);
    CHECK(flux == doctest::Approx(73.46e3).epsilon(2e-3));
    CHECK(65.0 + flux / h.si() == doctest::Approx(115.0).epsilon(3e-3));
    CHECK(h.inside());
    // Gnielinski on the same case, inside the +-25 % of the older formula
    const auto other = round_duct::gnielinski_1976{}(Re, water.prandtl(), length_ratio(5.0 / D),
                                                     prandtl_ratio(1.0), temperature_ratio(1.0));
    CHECK(other.inside());
    CHECK(other.si() == doctest::Approx(Nu.si()).epsilon(0.25));
  }

  TEST_CASE("heat loss from the duct of a heating system") {
    // Cengel, 2nd ed., Example 8-6: 0.15 m3/s of air at 80 degC in 8 m of a square duct of 0.2 m
    // with walls at 60 degC; properties at 80 degC
    const book_fluid air{0.9994, 0.9994 * 2.097e-5, 0.02953, 1008.0};
    const double D = 0.2;  // 4 A/P of the square
    const double u = 0.15 / (D * D);
    const auto Re = air.reynolds(u, D);
    CHECK(Re.si() == doctest::Approx(35765.0).epsilon(1e-3));
    CHECK(air.prandtl().si() == doctest::Approx(0.7154).epsilon(1e-3));
    const auto Nu =
        round_duct::dittus_boelter_mcadams{}(Re, air.prandtl(), round_duct::mode::cooling);
    CHECK(Nu.si() == doctest::Approx(91.4).epsilon(2e-3));
    const auto h = air.film(Nu, D);
    CHECK(h.si() == doctest::Approx(13.5).epsilon(3e-3));
    const double m = 0.9994 * 0.15;
    const double out = outlet(60.0, 80.0, h.si() * 4.0 * D * 8.0 / (m * 1008.0));
    CHECK(out == doctest::Approx(71.3).epsilon(1e-3));
    const double mean_difference = (out - 80.0) / std::log((80.0 - 60.0) / (out - 60.0));
    CHECK(mean_difference == doctest::Approx(-15.2).epsilon(3e-3));
    CHECK(h.si() * 4.0 * D * 8.0 * mean_difference == doctest::Approx(-1313.0).epsilon(4e-3));
  }

  TEST_CASE("air at 2 atm and 200 degC in a heated tube") {
    // Holman, Heat Transfer, 8th ed., Example 6-1: 10 m/s in a tube of 2.54 cm, wall 20 K above the
    // bulk all along
    const double density = 2.0 * 1.0132e5 / (287.0 * 473.0);
    CHECK(density == doctest::Approx(1.493).epsilon(1e-3));
    const book_fluid air{density, 2.57e-5, 0.0386, 0.681 * 0.0386 / 2.57e-5};
    const double D = 0.0254;
    const auto Re = air.reynolds(10.0, D);
    CHECK(Re.si() == doctest::Approx(14756.0).epsilon(1e-3));
    const auto Nu =
        round_duct::dittus_boelter_mcadams{}(Re, air.prandtl(), round_duct::mode::heating);
    CHECK(Nu.si() == doctest::Approx(42.67).epsilon(2e-3));
    const auto h = air.film(Nu, D);
    CHECK(h.si() == doctest::Approx(64.85).epsilon(2e-3));
    const double per_metre = h.si() * pi * D * 20.0;
    CHECK(per_metre == doctest::Approx(103.5).epsilon(2e-3));
    const double m = density * pi / 4.0 * D * D * 10.0;
    CHECK(3.0 * per_metre / (m * 1025.0) == doctest::Approx(40.04).epsilon(3e-3));
  }

  TEST_CASE("oil in a pipeline through an icy lake") {
    // Cengel, 2nd ed., Example 8-3: 2 m/s of oil at 20 degC in 200 m of a pipe of 30 cm with walls
    // at 0 degC. The book has 0.065 for Hausen's 0.0668: the tolerance on Nu is their ratio.
    const book_fluid oil{888.0, 888.0 * 901e-6, 0.145, 1880.0};
    const double D = 0.3;
    const auto Re = oil.reynolds(2.0, D);
    CHECK(Re.si() == doctest::Approx(666.0).epsilon(1e-3));
    const auto Pr = prandtl_number(10400.0);
    CHECK(friction::entrance_length_laminar_temperature{}(Re, Pr).si() * D ==
          doctest::Approx(104000.0).epsilon(2e-3));
    const auto Gz = graetz(Re, Pr, hydraulic_diameter(D * metre), duct_length(200.0 * metre));
    const auto Nu = round_duct::hausen_1943{}(Gz, viscosity_ratio(1.0));
    CHECK(Nu.si() == doctest::Approx(37.3).epsilon(0.0668 / 0.065 - 1.0));
    CHECK(Nu.si() - 3.66 == doctest::Approx((37.3 - 3.66) * 0.0668 / 0.065).epsilon(2e-3));
    const double m = 888.0 * pi / 4.0 * D * D * 2.0;
    CHECK(outlet(0.0, 20.0, oil.film(Nu, D).si() * pi * D * 200.0 / (m * 1880.0)) ==
          doctest::Approx(19.71).epsilon(1e-3));
    const auto f = friction::hagen_poiseuille{}(Re);
    CHECK(f.si() == doctest::Approx(0.0961).epsilon(1e-3));
    const double dp = oil.pressure_drop(f, 2.0, D, 200.0);
    CHECK(dp == doctest::Approx(1.14e5).epsilon(5e-3));
    CHECK(dp * pi / 4.0 * D * D * 2.0 == doctest::Approx(16.1e3).epsilon(5e-3));
  }

  TEST_CASE("pressure drop of water in a stainless pipe") {
    // Cengel, 2nd ed., Example 8-4: 0.2 ft3/s at 60 degF in 200 ft of a 2 in pipe, roughness
    // 0.000007 ft: Re 126 400, f 0.0174 by Colebrook, 1700 lbf/ft2
    const double foot = 0.3048;
    const double pound = 0.45359237;
    const book_fluid water{62.36 * pound / (foot * foot * foot), 7.536e-4 * pound / foot, 0.6,
                           4186.0};
    const double D = 2.0 / 12.0 * foot;
    const double u = 0.2 * foot * foot * foot / (pi / 4.0 * D * D);
    const auto Re = water.reynolds(u, D);
    CHECK(Re.si() == doctest::Approx(126400.0).epsilon(1e-3));
    const auto roughness = relative_roughness(0.000042);
    const auto f = friction::colebrook_1939{}(Re, roughness);
    CHECK(f.si() == doctest::Approx(0.0174).epsilon(3e-3));
    CHECK(f.inside());
    const double pound_per_square_foot = pound * 9.80665 / (foot * foot);
    CHECK(water.pressure_drop(f, u, D, 200.0 * foot) / pound_per_square_foot ==
          doctest::Approx(1700.0).epsilon(5e-3));
    CHECK(friction::haaland_1983{}(Re, roughness).si() == doctest::Approx(0.0174).epsilon(0.02));
    CHECK(friction::churchill_1977{}(Re, roughness).si() == doctest::Approx(0.0174).epsilon(0.03));
  }

  TEST_CASE("thermal entry of a tube: tables of Kays and Crawford") {
    // Kays and Crawford, Convective Heat and Mass Transfer, 3rd ed., uniform temperature and
    // uniform flux, on x+ = 2 x_star
    struct row {
      double x_plus, local, mean;
    };
    for (const row& r : {row{0.001, 12.80, 19.29}, row{0.004, 8.03, 12.09}, row{0.01, 6.00, 8.92},
                         row{0.04, 4.17, 5.81}, row{0.08, 3.77, 4.86}, row{0.10, 3.71, 4.64},
                         row{0.20, 3.66, 4.15}}) {
      CAPTURE(r.x_plus);
      const auto x = thermal_entry(r.x_plus / 2.0);
      CHECK(round_duct::shah_1975_uwt_local{}(x).si() == doctest::Approx(r.local).epsilon(0.015));
      CHECK(round_duct::shah_1975_uwt_mean{}(x).si() == doctest::Approx(r.mean).epsilon(0.05));
      CHECK(round_duct::gnielinski_laminar_uwt_mean{}(x, round_duct::entry::thermal,
                                                      prandtl_number(0.7))
                .si() == doctest::Approx(r.mean).epsilon(0.03));
    }
    // The book's series is 4 % below the exact 12.5 in the first row.
    struct flux_row {
      double x_plus, local, tolerance;
    };
    for (const flux_row& r : {flux_row{0.002, 12.00, 0.045}, flux_row{0.004, 9.93, 0.015},
                              flux_row{0.010, 7.49, 0.015}, flux_row{0.020, 6.14, 0.015},
                              flux_row{0.040, 5.19, 0.015}, flux_row{0.100, 4.51, 0.015}}) {
      CAPTURE(r.x_plus);
      const auto x = thermal_entry(r.x_plus / 2.0);
      CHECK(round_duct::shah_1975_uhf_local{}(x).si() ==
            doctest::Approx(r.local).epsilon(r.tolerance));
    }
  }

  TEST_CASE("Nusselt numbers of developed laminar flow") {
    // Shah and London 1978, and the tables of most textbooks: circle 3.66, 4.36; plates 7.54, 8.23;
    // one plate insulated 4.86, 5.39
    CHECK(round_duct::laminar_developed_uwt{}().si() == doctest::Approx(3.66).epsilon(1e-3));
    CHECK(round_duct::laminar_developed_uhf{}().si() == doctest::Approx(4.36).epsilon(1e-3));
    CHECK(parallel_plates::exact_developed_uwt{}().si() == doctest::Approx(7.54).epsilon(1e-3));
    CHECK(parallel_plates::exact_developed_uhf{}().si() == doctest::Approx(8.23).epsilon(1e-3));
    CHECK(parallel_plates::exact_developed_uwt_one_wall{}().si() ==
          doctest::Approx(4.86).epsilon(1e-3));
    CHECK(parallel_plates::exact_developed_uhf_one_wall{}().si() ==
          doctest::Approx(5.39).epsilon(1.1e-3));
  }
}
