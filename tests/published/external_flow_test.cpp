// Worked examples of external forced convection from textbooks, from properties to heat flow. All
// recalled from memory; the books round on the way, so per cents are the tolerance.

#include <doctest/doctest.h>

#include <cmath>

#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "convelope/correlations/external/flat_plate.hpp"
#include "convelope/correlations/external/sphere.hpp"
#include "convelope/correlations/friction/flat_plate_friction.hpp"
#include "convelope/groups/film.hpp"

namespace {

using namespace convelope;
using convelope::units::metre;
using convelope::units::metre_per_second;
using convelope::units::square_metre_per_second;
using convelope::units::watt_per_metre_kelvin;

/// What the books look up, and the stream.
struct flow {
  double u, nu, k, Pr;

  template <class Length>
  auto reynolds_on(const Length& l) const {
    return reynolds(free_stream_velocity(u * metre_per_second), l,
                    kinematic_viscosity(nu * square_metre_per_second));
  }
  auto prandtl() const { return prandtl_number(Pr); }
  auto conductivity_of() const { return conductivity(k * watt_per_metre_kelvin); }
};

auto near(double x, double relative) { return doctest::Approx(x).epsilon(relative); }

}  // namespace

TEST_SUITE("published: external flow") {
  TEST_CASE("Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, 5th ed., example 7.1") {
    // air of 6 kPa and 300 C over a plate of 27 C, 0.5 m long, 10 m/s; per metre of width
    const flow air{10.0, 5.21e-4, 0.0364, 0.687};
    const auto L = plate_length(0.5 * metre);
    const auto Re = air.reynolds_on(L);
    CHECK(Re.si() == near(9597.0, 1e-3));
    const auto Nu = flat_plate::laminar_isothermal_average{}(Re, air.prandtl());
    CHECK(Nu.inside());
    CHECK(Nu.si() == near(57.4, 2e-3));
    const auto h = film_coefficient(Nu, air.conductivity_of(), L);
    CHECK(h.si() == near(4.18, 2e-3));
    CHECK(h.si() * 0.5 * (300.0 - 27.0) == near(570.0, 2e-3));  // W/m
  }

  TEST_CASE("Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, 5th ed., example 7.2") {
    // strip heaters of 50 mm in a row, 230 C, air of 25 C and 60 m/s, 1 m wide; film 400 K
    const flow air{60.0, 26.41e-6, 0.0338, 0.690};
    const auto first = plate_length(0.05 * metre);
    const auto h1 = film_coefficient(
        flat_plate::laminar_isothermal_average{}(air.reynolds_on(first), air.prandtl()),
        air.conductivity_of(), first);
    CHECK(h1.si() == near(134.0, 3e-3));
    CHECK(h1.si() * 0.05 * 205.0 == near(1370.0, 3e-3));  // W

    // the sixth: what leaves six strips less what leaves five
    const auto leaving = [&](double length) {
      const auto L = plate_length(length * metre);
      const auto Nu =
          flat_plate::mixed_average{}(air.reynolds_on(L), air.prandtl(), transition_reynolds(5e5));
      CHECK(Nu.inside());
      return film_coefficient(Nu, air.conductivity_of(), L).si() * length * 205.0;
    };
    CHECK(leaving(0.30) - leaving(0.25) == near(1440.0, 0.01));  // W
  }

  TEST_CASE("Cengel, Heat Transfer: A Practical Approach, 2nd ed., example 7-1") {
    // engine oil of 60 C over a plate of 20 C, 5 m long, 2 m/s; per metre of width. In the books'
    // numbers Pr is 50 times what the formula was made for: the verdict says so.
    const flow oil{2.0, 242e-6, 0.144, 2870.0};
    const auto L = plate_length(5.0 * metre);
    const auto Re = oil.reynolds_on(L);
    CHECK(Re.si() == near(4.13e4, 1e-3));
    const auto Nu = flat_plate::laminar_isothermal_average{}(Re, oil.prandtl());
    CHECK(Nu.verdict().correlation_crossed(0, 1, side::above));
    CHECK(Nu.si() == near(1918.0, 2e-3));
    const auto h = film_coefficient(Nu, oil.conductivity_of(), L);
    CHECK_FALSE(h.inside());
    CHECK(h.si() == near(55.2, 2e-3));
    CHECK(h.si() * 5.0 * (60.0 - 20.0) == near(11040.0, 2e-3));  // W
    // drag: C_f = 1.328 Re^-0.5 = 0.00653, density 876 kg/m3
    const auto Cf = flat_plate_friction::blasius_average{}(Re);
    CHECK(Cf.inside());
    CHECK(Cf.si() == near(0.00653, 2e-3));
    CHECK(Cf.si() * 5.0 * 876.0 * 2.0 * 2.0 / 2.0 == near(57.2, 3e-3));  // N
  }

  TEST_CASE("Cengel, Heat and Mass Transfer: A Practical Approach, 3rd ed., example 7-2") {
    // air of 83.4 kPa, 20 C and 8 m/s over a hot plate of 140 C, 1.5 m by 6 m; film 80 C
    const flow air{8.0, 2.548e-5, 0.02953, 0.7154};
    const auto along = plate_length(6.0 * metre);
    const auto Re = air.reynolds_on(along);
    CHECK(Re.si() == near(1.884e6, 1e-3));
    const auto mixed = flat_plate::mixed_average{}(Re, air.prandtl(), transition_reynolds(5e5));
    CHECK(mixed.inside());
    CHECK(mixed.si() == near(2687.0, 2e-3));
    const auto h = film_coefficient(mixed, air.conductivity_of(), along);
    CHECK(h.si() == near(13.2, 3e-3));
    CHECK(h.si() * 9.0 * 120.0 == near(14300.0, 3e-3));  // W

    const auto across = plate_length(1.5 * metre);
    const auto laminar =
        flat_plate::laminar_isothermal_average{}(air.reynolds_on(across), air.prandtl());
    CHECK(laminar.inside());
    CHECK(laminar.si() == near(408.0, 2e-3));
    CHECK(film_coefficient(laminar, air.conductivity_of(), across).si() * 9.0 * 120.0 ==
          near(8670.0, 3e-3));  // W
  }

  TEST_CASE("Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, 5th ed., example 7.4") {
    // cylinder of 12.7 mm, 128.4 C, in air of 26.2 C and 10 m/s; film properties
    const flow air{10.0, 20.92e-6, 0.030, 0.700};
    const auto D = diameter(0.0127 * metre);
    const auto Re = air.reynolds_on(D);
    CHECK(Re.si() == near(6071.0, 1e-3));
    const auto Nu = cylinder_crossflow::churchill_bernstein_1977{}(Re, air.prandtl());
    CHECK(Nu.inside());
    CHECK(Nu.si() == near(40.6, 2e-3));
    const auto h = film_coefficient(Nu, air.conductivity_of(), D);
    CHECK(h.si() == near(96.0, 3e-3));
    CHECK(h.si() == near(102.0, 0.1));  // as measured, W/(m2 K)
  }

  TEST_CASE("Cengel, Heat and Mass Transfer: A Practical Approach, 3rd ed., example 7-5") {
    // steam pipe of 0.1 m, 110 C, in wind of 10 C and 8 m/s; per metre of length
    const flow air{8.0, 1.896e-5, 0.02808, 0.7202};
    const auto D = diameter(0.1 * metre);
    const auto Re = air.reynolds_on(D);
    CHECK(Re.si() == near(4.219e4, 1e-3));
    const auto Nu = cylinder_crossflow::churchill_bernstein_1977{}(Re, air.prandtl());
    CHECK(Nu.inside());
    CHECK(Nu.si() == near(124.0, 4e-3));
    const auto h = film_coefficient(Nu, air.conductivity_of(), D);
    CHECK(h.si() == near(34.8, 5e-3));
    CHECK(h.si() * 3.14159265 * 0.1 * 100.0 == near(1093.0, 5e-3));  // W
  }

  TEST_CASE("Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, 5th ed., example 7.6") {
    // copper ball of 10 mm, 75 to 35 C, in air of 23 C and 10 m/s; viscosity at 55 C on the wall.
    // The wall is hotter than the gas, which the source's range leaves out: the verdict says so.
    const flow air{10.0, 15.36e-6, 0.0258, 0.709};
    const auto D = diameter(0.010 * metre);
    const auto Re = air.reynolds_on(D);
    CHECK(Re.si() == near(6510.0, 1e-3));
    const auto Nu = sphere::whitaker_1972{}(Re, air.prandtl(), viscosity_ratio(181.6 / 197.8));
    CHECK(Nu.verdict().correlation_crossed(0, 2, side::below));
    CHECK(Nu.si() == near(47.4, 2e-3));
    const auto h = film_coefficient(Nu, air.conductivity_of(), D);
    CHECK(h.si() == near(122.0, 3e-3));
    // 69.2 s to cool down, copper 8933 kg/m3, 387 J/(kg K)
    CHECK(8933.0 * 387.0 * 0.010 / (6.0 * h.si()) * std::log((75.0 - 23.0) / (35.0 - 23.0)) ==
          near(69.2, 5e-3));
  }

  TEST_CASE("Cengel, Heat and Mass Transfer: A Practical Approach, 3rd ed., example 7-6") {
    // steel ball of 0.25 m, on average 250 C, in air of 25 C and 3 m/s
    const flow air{3.0, 1.562e-5, 0.02551, 0.7296};
    const auto D = diameter(0.25 * metre);
    const auto Re = air.reynolds_on(D);
    CHECK(Re.si() == near(4.802e4, 1e-3));
    const auto Nu = sphere::whitaker_1972{}(Re, air.prandtl(), viscosity_ratio(1.849e-5 / 2.76e-5));
    CHECK(Nu.si() == near(135.0, 2e-3));
    const auto h = film_coefficient(Nu, air.conductivity_of(), D);
    CHECK(h.si() == near(13.8, 3e-3));
    CHECK(h.si() * 3.14159265 * 0.0625 * 225.0 == near(610.0, 5e-3));  // W
  }
}
