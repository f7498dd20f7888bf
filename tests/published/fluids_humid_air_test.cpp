// Humid air against published values.
#include <doctest/doctest.h>

#include "../fluids/close_to.hpp"
#include "convelope/fluids/detail/if97_saturation.hpp"
#include "convelope/fluids/humid_air.hpp"

using namespace convelope;

namespace {
// CIPM-2007: Picard, Davis, Glaeser, Fujii, Metrologia 45 (2008) 149-155, 0.04 % CO2.
double cipm_density(double T, double p, double phi) {
  const double t = T - 273.15;
  const double saturation =
      std::exp(1.2378847e-5 * T * T - 1.9121316e-2 * T + 33.93711047 - 6.3431645e3 / T);
  const double x = phi * (1.00062 + 3.14e-8 * p + 5.6e-7 * t * t) * saturation / p;
  const double Z = 1.0 -
                   p / T *
                       (1.58123e-6 + (-2.9331e-8 + 1.1043e-10 * t) * t +
                        (5.707e-6 - 2.051e-8 * t) * x + (1.9898e-4 - 2.376e-6 * t) * x * x) +
                   p * p / (T * T) * (1.83e-11 - 0.765e-8 * x * x);
  return p * 28.96546e-3 / (Z * 8.314472 * T) * (1.0 - x * (1.0 - 18.01528e-3 / 28.96546e-3));
}
}  // namespace

TEST_CASE("humid air's density: CIPM-2007 in its range") {
  // The worked value of a common case, from memory: 1.1992 kg/m3 at 20 degC, 101325 Pa, 50 %
  CHECK(close_to(cipm_density(293.15, 101325.0, 0.5), 1.1992, 2e-4));
  for (const double t : {15.0, 20.0, 27.0}) {
    for (const double p : {6e4, 8e4, 1.1e5}) {
      for (const double phi : {0.0, 0.5, 1.0}) {
        CAPTURE(t);
        CAPTURE(p);
        CAPTURE(phi);
        const double T = 273.15 + t;
        CHECK(close_to(humid_air{relative_humidity(phi)}.values(T, p).density,
                       cipm_density(T, p, phi), 1e-3));
      }
    }
  }
}

TEST_CASE("humid air: ASHRAE Handbook, saturated moist air at 101325 Pa") {
  // Humidity ratio (from memory). The table has real gases: up to 0.5 % more water.
  struct row {
    double t, W;
  };
  for (const row& r : {row{0.0, 0.003790}, row{10.0, 0.007661}, row{20.0, 0.014758},
                       row{30.0, 0.027329}, row{40.0, 0.049141}}) {
    CAPTURE(r.t);
    const humid_air saturated{relative_humidity(1.0)};
    CHECK(close_to(saturated.ratio(273.15 + r.t, 101325.0), r.W, 6e-3));
  }
}

TEST_CASE("humid air: two standards of the saturation pressure") {
  // Hyland, Wexler 1983 against IAPWS-IF97 region 4
  for (double T = 273.15; T <= 473.15; T += 10.0) {
    CAPTURE(T);
    CHECK(close_to(humid_air<kinds::relative_humidity>::saturation_pressure(T),
                   detail::if97::saturation_pressure(T), 1.3e-3));
  }
}
