// Values, slopes and the expansion coefficient against 50-digit differences, over the envelopes.
#include "fluid_slopes.hpp"

#include "convelope/fluids/dry_air.hpp"
#include "convelope/fluids/liquid_water.hpp"

using namespace convelope;
using fluid_slopes::precise;

namespace {
template <class Fluid>
void slopes_and_expansion(const Fluid& f, double T, double p, double noise) {
  fluid_slopes::against_50_digits(f, T, p, noise);
  fluid_slopes::expansion_is_of_density(f, T, p, noise);
}
}  // namespace

TEST_CASE("dry air: slopes and expansion against 50 digits") {
  for (const double T : {200.0, 233.0, 300.0, 421.5, 600.0, 987.0, 1500.0, 2000.0}) {
    for (const double p : {1e3, 101325.0, 3e5}) {
      slopes_and_expansion(dry_air{}, T, p, 1e-14);
      slopes_and_expansion(dry_air_fast{}, T, p, 1e-14);
    }
  }
}

TEST_CASE("liquid water: slopes and expansion against 50 digits") {
  for (const double T : {273.15, 276.0, 277.13, 280.0, 300.0, 350.0, 420.0, 500.0, 573.0, 623.15}) {
    const double p_sat = liquid_water::saturation_pressure(T);
    for (const double p : {p_sat, 1.7e7, 5e7, 1e8})
      slopes_and_expansion(liquid_water{}, T, p, 2e-13);
  }
}

TEST_CASE("liquid water: saturation pressure and its slope against 50 digits") {
  for (const double T : {273.15, 300.0, 373.124, 450.0, 550.0, 623.15, 647.0}) {
    CAPTURE(T);
    const auto seen = liquid_water::saturation_pressure(dual<double, 1>::variable(T));
    const precise h = precise(T) * precise(1e-12);
    const precise up = liquid_water::saturation_pressure(precise(T + h));
    const precise down = liquid_water::saturation_pressure(precise(T - h));
    CHECK(close_to(seen.value, static_cast<double>((up + down) / 2), 1e-12));
    CHECK(close_to(seen.slope[0], static_cast<double>((up - down) / (2 * h)), 1e-11));
  }
}
