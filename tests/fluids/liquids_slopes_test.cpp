// Liquids: slopes against 50-digit differences, and the expansion coefficient against the density.
#include "convelope/fluids/engine_oil.hpp"
#include "convelope/fluids/ethylene_glycol.hpp"
#include "convelope/fluids/glycol_water.hpp"
#include "convelope/fluids/liquid_metals.hpp"
#include "convelope/fluids/seawater.hpp"
#include "convelope/fluids/solar_salt.hpp"
#include "fluid_slopes.hpp"

using namespace convelope;
using fluid_slopes::precise;

namespace {
template <class Fluid>
void check(const Fluid& f, std::initializer_list<double> temperatures) {
  for (const double T : temperatures) {
    fluid_slopes::against_50_digits(f, T, 1.3e5, 1e-13);
    const precise t(T);
    const auto slope = fluid_slopes::slope(f, t, precise(1.3e5), false);
    const auto value = f.values(t, precise(1.3e5));
    const double expected = static_cast<double>(-slope.density / value.density);
    CHECK(close_to(f.values(T, 1.3e5).expansion, expected, 1e-12, 1e-16));
  }
}

template <class Property>
void check_property(Property f, std::initializer_list<double> temperatures) {
  for (const double T : temperatures) {
    CAPTURE(T);
    const auto seen = f(dual<double, 1>::variable(T));
    const precise h = precise(T) * precise(1e-12);
    const precise up = f(precise(T + h));
    const precise down = f(precise(T - h));
    CHECK(close_to(seen.value, static_cast<double>((up + down) / 2), 1e-12));
    CHECK(close_to(seen.slope[0], static_cast<double>((up - down) / (2 * h)), 1e-11));
  }
}
}  // namespace

TEST_CASE("glycols: slopes") {
  for (const double x : {0.0, 0.1, 0.35, 0.6}) {
    check(ethylene_glycol_water(mass_fraction(x)), {230.0, 260.0, 274.0, 300.0, 340.0, 373.0});
    check(propylene_glycol_water(mass_fraction(x)), {230.0, 260.0, 274.0, 300.0, 340.0, 373.0});
  }
}

TEST_CASE("seawater: slopes") {
  for (const double S : {0.0, 0.01, 0.035, 0.15}) {
    check(seawater{salinity(S)}, {273.15, 277.0, 300.0, 350.0, 400.0, 453.0});
  }
  const seawater s{salinity(0.035)};
  check_property([&](const auto& T) { return s.saturation_pressure(T); }, {275.0, 330.0, 450.0});
  check_property([&](const auto& T) { return s.latent_heat(T); }, {275.0, 330.0, 450.0});
}

TEST_CASE("oil, ethylene glycol, salt: slopes") {
  check(engine_oil{}, {273.0, 285.0, 300.0, 350.0, 430.0});
  check(ethylene_glycol{}, {273.0, 285.0, 300.0, 350.0, 373.0});
  check(solar_salt{}, {533.0, 600.0, 700.0, 873.0});
}

TEST_CASE("metals: slopes") {
  check(sodium{}, {371.0, 400.0, 600.0, 1000.0, 1500.0, 2000.0});
  check(nak78{}, {324.0, 500.0, 664.0, 673.15, 681.0, 800.0, 1057.0});
  check(lead{}, {601.0, 800.0, 1000.0, 1300.0});
  check(lead_bismuth{}, {398.0, 500.0, 800.0, 1100.0});
  check(mercury{}, {273.0, 300.0, 400.0, 600.0});
  check_property([](const auto& T) { return sodium::saturation_pressure(T); }, {400.0, 1154.7});
  check_property([](const auto& T) { return sodium::latent_heat(T); }, {400.0, 1154.7, 2400.0});
  check_property([](const auto& T) { return sodium::surface_tension(T); }, {400.0, 1154.7});
  check_property([](const auto& T) { return lead::saturation_pressure(T); }, {700.0, 1200.0});
  check_property([](const auto& T) { return lead_bismuth::saturation_pressure(T); }, {700.0});
}
