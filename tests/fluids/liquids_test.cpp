// Liquids: limits from both sides, what the sources state about regions, physical cross-checks.
#include <doctest/doctest.h>

#include <limits>

#include "close_to.hpp"
#include "convelope/fluids/engine_oil.hpp"
#include "convelope/fluids/ethylene_glycol.hpp"
#include "convelope/fluids/glycol_water.hpp"
#include "convelope/fluids/liquid_metals.hpp"
#include "convelope/fluids/liquid_water.hpp"
#include "convelope/fluids/seawater.hpp"
#include "convelope/fluids/solar_salt.hpp"

using namespace convelope;

namespace {
constexpr double not_a_number = std::numeric_limits<double>::quiet_NaN();
using detail::word::of_fluid;

template <class Fluid>
bool only(const Fluid& f, double T, double p, int limit, side s) {
  return f.check(T, p) == of_fluid(limit, s);
}

// Both sides of the limits on T and p where no other limit is near.
template <class Fluid>
void temperature_limits(const Fluid& f, double p) {
  const limit_info& T = f.info()->limits[0];
  CHECK(f.check(T.low, p) == 0);
  CHECK(f.check(T.high, p) == 0);
  CHECK(only(f, T.low * (1.0 - 1e-9), p, 0, side::below));
  CHECK(only(f, T.high * (1.0 + 1e-9), p, 0, side::above));
  CHECK((f.check(not_a_number, p) & detail::word::not_finite) != 0);
  CHECK((f.check(T.low, not_a_number) & detail::word::not_finite) != 0);
}
template <class Fluid>
void pressure_limit(const Fluid& f, double T) {
  const limit_info& p = f.info()->limits[1];
  CHECK(f.check(T, p.high) == 0);
  CHECK(only(f, T, p.high * (1.0 + 1e-9), 1, side::above));
}
template <class Fluid>
void finite_far_outside(const Fluid& f) {
  for (const double T : {150.0, 200.0, 250.0, 400.0, 900.0, 1400.0}) {
    CAPTURE(T);
    const auto v = f.values(T, 1e5);
    for (const double y : {v.density, v.specific_heat, v.conductivity, v.viscosity, v.expansion}) {
      CHECK(scalar_adaptor<double>::bits_where_not_finite(y, 1) == 0);
    }
    const limit_info& limit = f.info()->limits[0];
    CHECK(((T < limit.low || T > limit.high) ==
           ((f.check(T, 1e5) & (of_fluid(0, side::below) | of_fluid(0, side::above))) != 0)));
  }
}
}  // namespace

static_assert(fluid<ethylene_glycol_water> && fluid<propylene_glycol_water> && fluid<seawater>);
static_assert(fluid<engine_oil> && fluid<ethylene_glycol> && fluid<solar_salt>);
static_assert(fluid<sodium> && fluid<nak78> && fluid<lead> && fluid<lead_bismuth> &&
              fluid<mercury>);
static_assert(std::is_trivially_copyable_v<ethylene_glycol_water>);

TEST_CASE("limits on temperature and pressure") {
  temperature_limits(engine_oil{}, 1e5);
  temperature_limits(ethylene_glycol{}, 1e5);
  temperature_limits(solar_salt{}, 1e5);
  temperature_limits(nak78{}, 1e5);
  temperature_limits(mercury{}, 1e5);
  temperature_limits(sodium{}, 9e6);
  temperature_limits(lead{}, 1e5);
  temperature_limits(lead_bismuth{}, 1e5);
  temperature_limits(seawater{salinity(0.035)}, 1.9e6);
  pressure_limit(engine_oil{}, 300.0);
  pressure_limit(ethylene_glycol{}, 300.0);
  pressure_limit(solar_salt{}, 600.0);
  pressure_limit(nak78{}, 400.0);
  pressure_limit(mercury{}, 300.0);
  pressure_limit(sodium{}, 400.0);
  pressure_limit(lead{}, 700.0);
  pressure_limit(lead_bismuth{}, 700.0);
  pressure_limit(seawater{salinity(0.035)}, 300.0);
  pressure_limit(ethylene_glycol_water(mass_fraction(0.3)), 300.0);
  CHECK(only(nak78{}, 400.0, 8e4, 1, side::below));
}

TEST_CASE("far outside everything stays finite and is flagged") {
  finite_far_outside(engine_oil{});
  finite_far_outside(ethylene_glycol{});
  finite_far_outside(solar_salt{});
  finite_far_outside(sodium{});
  finite_far_outside(nak78{});
  finite_far_outside(lead{});
  finite_far_outside(lead_bismuth{});
  finite_far_outside(mercury{});
}

TEST_CASE("glycol and water: freezing, boiling, concentration") {
  const ethylene_glycol_water f(mass_fraction(0.3));
  // The polynomial's own freezing point, to rounding.
  double freezing = 258.0;
  for (int i = 0; i < 20; ++i) freezing = f.freezing_point(freezing);
  CHECK(f.check(freezing + 1e-9, 101325.0) == 0);
  CHECK(only(f, freezing - 1e-9, 101325.0, 3, side::below));
  CHECK(f.check(373.15, 101325.0) == 0);
  CHECK(only(f, 373.15 + 1e-9, 101325.0, 0, side::above));
  // Raoult with water alone: 0.889 of the water's pressure.
  const double boiling =
      liquid_water::saturation_pressure(360.0) * (0.7 / 18.01528) / (0.7 / 18.01528 + 0.3 / 62.068);
  CHECK(f.check(360.0, boiling * (1.0 + 1e-9)) == 0);
  CHECK(only(f, 360.0, boiling * (1.0 - 1e-9), 4, side::below));

  const auto at = [](double x) { return ethylene_glycol_water(mass_fraction(x)); };
  CHECK(at(0.6).check(300.0, 1e5) == 0);
  CHECK(only(at(0.6 + 1e-9), 300.0, 1e5, 2, side::above));
  CHECK(at(0.0).check(300.0, 1e5) == 0);
  CHECK(at(-1e-9).check(300.0, 1e5) == (of_fluid(2, side::below) | detail::word::impossible));
  // A percentage given for a fraction.
  CHECK((at(30.0).check(300.0, 1e5) & detail::word::impossible) != 0);
  CHECK((at(not_a_number).check(300.0, 1e5) & detail::word::not_finite) != 0);
  CHECK((f.check(not_a_number, 1e5) & detail::word::not_finite) != 0);
}

TEST_CASE("glycol and water: no glycol is water, within what the source states") {
  // IAPWS formulations; the fits are off by at most 0.1, 0.25, 1.1 and 1.9 %, found here.
  for (const double t : {0.5, 20.0, 40.0, 60.0, 80.0, 99.0}) {
    CAPTURE(t);
    const auto water = liquid_water{}.values(273.15 + t, 2e5);
    const auto check = [&](const fluid_values<double>& v) {
      CHECK(close_to(v.density, water.density, 0.0011));
      CHECK(close_to(v.specific_heat, water.specific_heat, 0.0025));
      CHECK(close_to(v.conductivity, water.conductivity, 0.011));
      CHECK(close_to(v.viscosity, water.viscosity, 0.019));
    };
    check(ethylene_glycol_water(mass_fraction(0.0)).values(273.15 + t, 2e5));
    check(propylene_glycol_water(mass_fraction(0.0)).values(273.15 + t, 2e5));
  }
  // 0 degC, both sides.
  CHECK(close_to(ethylene_glycol_water(mass_fraction(0.0)).freezing_point(273.15), 273.15, 2e-4));
  CHECK(close_to(propylene_glycol_water(mass_fraction(0.0)).freezing_point(273.15), 273.15, 2e-4));
}

TEST_CASE("glycol and water: freezing points of the CRC Handbook (from memory)") {
  // Ethylene glycol, mass percent and degC: 10 -3.4, 20 -7.9, 30 -14, 40 -22.3, 50 -33.8 (0.3 to
  // 1.5 K between handbooks).
  const struct {
    double x;
    double t;
  } known[] = {{0.1, -3.4}, {0.2, -7.9}, {0.3, -14.1}, {0.4, -22.3}, {0.5, -34.5}};
  for (const auto& k : known) {
    CAPTURE(k.x);
    const ethylene_glycol_water f{mass_fraction(k.x)};
    CHECK(std::fabs(f.freezing_point(273.15 + k.t) - (273.15 + k.t)) < 1.6);
  }
}

TEST_CASE("seawater: no salt is water") {
  const seawater fresh{salinity(0.0)};
  for (const double t : {1.0, 20.0, 40.0, 60.0, 80.0, 99.0}) {
    CAPTURE(t);
    const auto water = liquid_water{}.values(273.15 + t, 101325.0);
    const auto v = fresh.values(273.15 + t, 101325.0);
    CHECK(close_to(v.density, water.density, 7e-4));
    CHECK(close_to(v.specific_heat, water.specific_heat, 5e-3));
    CHECK(close_to(v.conductivity, water.conductivity, 0.03));
    CHECK(close_to(v.viscosity, water.viscosity, 3e-3));
    CHECK(close_to(v.expansion, water.expansion, 0.05, 5e-5));
    CHECK(fresh.saturation_pressure(273.15 + t) == liquid_water::saturation_pressure(273.15 + t));
  }
  // Latent heat at 100 degC: 2256.5 kJ/kg (IAPWS steam tables).
  CHECK(close_to(fresh.latent_heat(373.15), 2256.5e3, 1e-3));
  // Salt of 31.404 g/mol (Millero et al. 2008) by Raoult's law; measured 1.84 % at 35 g/kg, from
  // memory. The latent heat falls by the salt's share.
  const seawater ocean{salinity(0.035)};
  CHECK(close_to(ocean.saturation_pressure(298.15) / fresh.saturation_pressure(298.15), 0.9816,
                 2.5e-3));
  const double moles = 35.0 / 31.404 / (965.0 / 18.01528);
  CHECK(close_to(ocean.saturation_pressure(298.15),
                 fresh.saturation_pressure(298.15) / (1.0 + moles), 1e-5));
  CHECK(close_to(ocean.latent_heat(330.0), 0.965 * fresh.latent_heat(330.0), 1e-14));
}

TEST_CASE("seawater: the density maximum") {
  // Without salt the published polynomial has it at 1.7 degC, not at 4; none above freezing at
  // 35 g/kg (UNESCO 1981: it meets the freezing point at 24.7 g/kg).
  const seawater fresh{salinity(0.0)};
  CHECK(fresh.values(274.5, 1e5).expansion < 0.0);
  CHECK(fresh.values(275.2, 1e5).expansion > 0.0);
  CHECK(seawater{salinity(0.035)}.values(273.15, 1e5).expansion > 3e-5);
  const double slope =
      fresh.values(dual<double, 1>::variable(274.8), dual<double, 1>(1e5)).expansion.slope[0];
  CHECK(close_to(slope, seawater::expansion_slope, 0.05));
}

TEST_CASE("seawater: limits of salt and saturation") {
  const auto at = [](double S) { return seawater{salinity(S)}; };
  CHECK(at(0.15).check(300.0, 1e5) == 0);
  CHECK(only(at(0.15 + 1e-9), 300.0, 1e5, 2, side::above));
  CHECK(at(-1e-9).check(300.0, 1e5) == (of_fluid(2, side::below) | detail::word::impossible));
  CHECK((at(35.0).check(300.0, 1e5) & detail::word::impossible) != 0);
  CHECK((at(not_a_number).check(300.0, 1e5) & detail::word::not_finite) != 0);
  const seawater f = at(0.035);
  const double least = 0.999 * f.saturation_pressure(400.0);
  CHECK(f.check(400.0, least * (1.0 + 1e-9)) == 0);
  CHECK(only(f, 400.0, least * (1.0 - 1e-9), 3, side::below));
}

TEST_CASE("engine oil: the viscosity keeps falling, and stays below 262 K") {
  const engine_oil f;
  double before = f.values(262.0, 1e5).viscosity;
  CHECK(f.values(200.0, 1e5).viscosity == before);
  for (double T = 262.5; T <= 430.0; T += 0.5) {
    const double mu = f.values(T, 1e5).viscosity;
    CHECK(mu < before);
    before = mu;
  }
}

TEST_CASE("petroleum oils: Cragoe's units") {
  // 0.403 cal/(g degC) and 0.1172 W/(m K) at 0 degC and specific gravity 1; 4.1868 J per calorie.
  const auto one = specific_gravity(1.0);
  CHECK(close_to(petroleum_oil::specific_heat(273.15, one), 0.403 * 4186.8, 1e-14));
  CHECK(close_to(petroleum_oil::conductivity(273.15, one), 0.1172, 1e-14));
  const auto oil = specific_gravity(0.81);
  CHECK(close_to(petroleum_oil::specific_heat(373.15, oil), (0.403 + 0.081) * 4186.8 / 0.9, 1e-14));
  CHECK(close_to(petroleum_oil::conductivity(373.15, oil), 0.1172 * (1.0 - 0.054) / 0.81, 1e-14));
}

TEST_CASE("sodium: melting, boiling, critical point") {
  // Fink and Leibowitz 1995: 927 kg/m3 at the melting point, 219 at the critical (from memory).
  CHECK(close_to(sodium{}.values(371.0, 1e5).density, 925.6, 2e-3));
  CHECK(close_to(sodium::saturation_pressure(2503.7), 25.64e6, 5e-3));
  CHECK(close_to(sodium::saturation_pressure(1154.7), 101325.0, 6e-3));
  // Clapeyron: d ln p/d(1/T) R = -(latent heat per mole) of the vapour, which at 900 K
  // is some 7 % heavier than Na for its dimers.
  const double T = 900.0;
  const auto p = sodium::saturation_pressure(dual<double, 1>::variable(T));
  const double per_mole = p.slope[0] / p.value * T * T * 8.314462618;
  CHECK(close_to(per_mole, 0.02298977 * sodium::latent_heat(T) * 1.07, 0.02));
  CHECK(sodium::surface_tension(2503.0) < 1e-4);
  const sodium f;
  const double least = sodium::saturation_pressure(1200.0);
  CHECK(f.check(1200.0, least * (1.0 + 1e-9)) == 0);
  CHECK(only(f, 1200.0, least * (1.0 - 1e-9), 2, side::below));
}

TEST_CASE("NaK: the two viscosity equations are joined smoothly") {
  // 1 % apart at 400 degC; on either side each is the source's.
  const auto published = [](double A, double B, double T) {
    const double rho = 1e-3 * nak78{}.values(T, 1e5).density;
    return 1e-3 * A * std::cbrt(rho) * std::exp(B * rho / T);
  };
  CHECK(close_to(nak78{}.values(660.0, 1e5).viscosity, published(0.116, 688.0, 660.0), 1e-12));
  CHECK(close_to(nak78{}.values(690.0, 1e5).viscosity, published(0.082, 979.0, 690.0), 1e-12));
  CHECK(close_to(published(0.116, 688.0, 673.15), published(0.082, 979.0, 673.15), 0.015));
  double before = nak78{}.values(655.0, 1e5).viscosity;
  for (double T = 655.5; T < 695.0; T += 0.5) {
    const double mu = nak78{}.values(T, 1e5).viscosity;
    CHECK(mu < before);
    before = mu;
  }
}

TEST_CASE("lead and lead-bismuth: melting and boiling of the handbook") {
  // Boiling at 2021 and 1927 K (OECD/NEA 2015); the pressure equations are correlations, 5 .. 15 %.
  CHECK(close_to(lead::saturation_pressure(2021.0), 101325.0, 0.05));
  CHECK(close_to(lead_bismuth::saturation_pressure(1927.0), 101325.0, 0.05));
  // Densities at melting: 10 673 and 10 551 kg/m3 (from memory).
  CHECK(close_to(lead{}.values(600.6, 1e5).density, 10673.0, 1e-3));
  CHECK(close_to(lead_bismuth{}.values(398.0, 1e5).density, 10551.0, 1e-3));
  CHECK(close_to(lead::surface_tension(600.6), 0.458, 5e-3));
  CHECK(close_to(lead_bismuth::surface_tension(398.0), 0.4167, 5e-3));
}

TEST_CASE("mercury: viscosity of another source") {
  // Assael et al. 2012, J. Phys. Chem. Ref. Data 41, 033101 (from memory), stated within 7.3 %.
  for (const double T : {273.15, 300.0, 400.0, 500.0, 600.0}) {
    CAPTURE(T);
    CHECK(close_to(mercury{}.values(T, 1e5).viscosity, 1e-3 * std::pow(10.0, -0.2561 + 132.29 / T),
                   0.02));
  }
}
