// Gases: derivatives against 50-digit differences, and the relations thermodynamics asks for.
#include "convelope/fluids/argon.hpp"
#include "convelope/fluids/carbon_dioxide.hpp"
#include "convelope/fluids/helium.hpp"
#include "convelope/fluids/humid_air.hpp"
#include "convelope/fluids/hydrogen.hpp"
#include "convelope/fluids/nitrogen.hpp"
#include "convelope/fluids/oxygen.hpp"
#include "fluid_slopes.hpp"

using namespace convelope;

namespace {

// Over the envelope the fluid states.
template <class Fluid>
void over_envelope(const Fluid& f, double noise) {
  const limit_info& T = f.info()->limits[0];
  const limit_info& p = f.info()->limits[1];
  for (const double part : {0.0, 0.03, 0.11, 0.37, 0.71, 1.0}) {
    for (const double along : {0.0, 0.3, 1.0}) {
      const double at_T = T.low + part * (T.high - T.low);
      const double at_p = p.low + along * (p.high - p.low);
      fluid_slopes::against_50_digits(f, at_T, at_p, noise);
      fluid_slopes::thermodynamically_consistent(f, at_T, at_p, 1e-12);
    }
  }
}

}  // namespace

TEST_CASE("nitrogen, oxygen, argon: slopes and consistency") {
  over_envelope(nitrogen{}, 2e-14);
  over_envelope(oxygen{}, 2e-14);
  over_envelope(argon{}, 2e-14);
}

TEST_CASE("carbon dioxide: slopes and consistency") { over_envelope(carbon_dioxide{}, 1e-13); }

TEST_CASE("helium, hydrogen: slopes and consistency") {
  over_envelope(helium{}, 2e-14);
  over_envelope(hydrogen{}, 2e-14);
}

TEST_CASE("humid air: slopes; with a humidity ratio it is an ideal gas") {
  over_envelope(humid_air{humidity_ratio(0.01)}, 2e-14);
  for (const double T : {273.15, 290.0, 330.0, 360.0}) {
    for (const double p : {8e4, 101325.0, 1.5e5}) {
      fluid_slopes::against_50_digits(humid_air{relative_humidity(0.4)}, T, p, 2e-13);
    }
  }
}
