// Liquids on every number type.
#include "convelope/fluids/engine_oil.hpp"
#include "convelope/fluids/ethylene_glycol.hpp"
#include "convelope/fluids/glycol_water.hpp"
#include "convelope/fluids/liquid_metals.hpp"
#include "convelope/fluids/seawater.hpp"
#include "convelope/fluids/solar_salt.hpp"
#include "fluid_numbers.hpp"

using namespace convelope;
using fluid_numbers::on_every_number;
using fluid_numbers::point;

namespace {
// The last two lie outside.
constexpr point cool[8] = {{274.0, 1e5}, {280.0, 5e5}, {293.0, 101325.0}, {310.0, 2e5},
                           {333.0, 1e5}, {365.0, 3e5}, {230.0, 1e5},      {480.0, 3e6}};
constexpr point hot[8] = {{610.0, 1e5}, {650.0, 5e5},  {673.15, 101325.0}, {680.0, 2e5},
                          {800.0, 2e6}, {1000.0, 3e5}, {300.0, 1e5},       {1500.0, 3e7}};
}  // namespace

TEST_CASE("cool liquids on every number type") {
  on_every_number(ethylene_glycol_water(mass_fraction(0.3)), cool, 1e-5);
  on_every_number(propylene_glycol_water(mass_fraction(0.55)), cool, 1e-5);
  on_every_number(seawater{salinity(0.035)}, cool, 1e-5);
  on_every_number(engine_oil{}, cool, 2e-5);
  on_every_number(ethylene_glycol{}, cool, 1e-5);
  on_every_number(mercury{}, cool, 1e-5);
}

TEST_CASE("hot liquids on every number type") {
  on_every_number(sodium{}, hot, 1e-5);
  on_every_number(nak78{}, hot, 1e-5);
  on_every_number(lead{}, hot, 1e-5);
  on_every_number(lead_bismuth{}, hot, 1e-5);
  on_every_number(solar_salt{}, hot, 1e-4);
}
