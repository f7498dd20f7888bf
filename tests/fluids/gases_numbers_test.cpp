// Gases on every number type.
#include "convelope/fluids/argon.hpp"
#include "convelope/fluids/carbon_dioxide.hpp"
#include "convelope/fluids/helium.hpp"
#include "convelope/fluids/humid_air.hpp"
#include "convelope/fluids/hydrogen.hpp"
#include "convelope/fluids/nitrogen.hpp"
#include "convelope/fluids/oxygen.hpp"
#include "fluid_numbers.hpp"

using namespace convelope;
using fluid_numbers::on_every_number;
using fluid_numbers::point;

namespace {
// The last two lie outside.
constexpr point points[8] = {{220.0, 1e3}, {250.0, 1e5}, {300.0, 3e5}, {350.0, 2e4},
                             {600.0, 1e5}, {990.0, 4e5}, {180.0, 1e5}, {300.0, 3e6}};
constexpr point humid_points[8] = {{273.15, 1e5},  {290.0, 1.2e5}, {300.0, 9e4}, {310.0, 101325.0},
                                   {330.0, 1.5e5}, {345.0, 1e5},   {272.0, 1e5}, {300.0, 2e5}};
}  // namespace

TEST_CASE("gases on every number type") {
  on_every_number(nitrogen{}, points, 3e-6);
  on_every_number(oxygen{}, points, 3e-6);
  on_every_number(argon{}, points, 3e-6);
  on_every_number(carbon_dioxide{}, points, 1e-4);
  on_every_number(helium{}, points, 3e-6);
  on_every_number(hydrogen{}, points, 5e-6);
}

TEST_CASE("humid air on every number type") {
  on_every_number(humid_air{humidity_ratio(0.02)}, humid_points, 3e-6);
  on_every_number(humid_air{relative_humidity(0.6)}, humid_points, 3e-6);
}
