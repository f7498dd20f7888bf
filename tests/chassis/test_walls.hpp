// Walls with simple exact behaviour, for solutions that can be written down: ideal gas, fully
// developed laminar friction between wide plates (f = 96/Re, the exact Poiseuille solution), and
// film coefficients that are constant, or move linearly with the state where derivatives are
// tested.
#pragma once

#include <cmath>

#include "model/wall_model.hpp"

namespace chassis_test {

class simple_walls : public chassis::wall_model {
 public:
  double h = 12;          // W/(m2 K)
  double per_wall = 0;    // change of h per K of wall above 300 K
  double per_stream = 0;  // per K of stream above 300 K
  double per_flux = 0;    // per kg/(m2 s)
  double outer_h = 5;
  double outer_per_wall = 0;
  double band = 0.2;
  double cp = 1006;
  double viscosity = 1.9e-5;
  double viscosity_slope = 0;

  chassis::film passage_film(const chassis::passage_spot& at) const override {
    chassis::film f;
    f.h = h + per_wall * (at.wall_K - 300) + per_stream * (at.stream_K - 300) +
          per_flux * at.mass_flux;
    f.dh_dwall = per_wall;
    f.dh_dstream = per_stream;
    f.dh_dmass_flux = per_flux;
    f.scatter = band;
    return f;
  }
  chassis::film_words passage_words(const chassis::passage_spot& at) const override {
    return {"constant", "test", {{"G", at.mass_flux}}, true, "a test wall"};
  }
  chassis::film outer_film(const chassis::outer_spot& at) const override {
    chassis::film f;
    f.h = outer_h + outer_per_wall * (at.wall_K - at.air_K);
    f.dh_dwall = outer_per_wall;
    f.scatter = band;
    return f;
  }
  chassis::film_words outer_words(const chassis::outer_spot&) const override {
    return {"constant", "test", {}, true, "a test wall"};
  }
  // dp = f L/Dh G^2/(2 rho), f = 96 mu/(G Dh), Dh = 2 gap: 12 mu L G/(rho gap^2).
  chassis::friction_loss passage_friction(const chassis::passage_run& r) const override {
    const auto rho = density(r.mean_K, r.pressure_Pa);
    const double mu = viscosity + viscosity_slope * (r.mean_K - 300);
    chassis::friction_loss loss;
    const double c = 12 * r.length / (r.gap * r.gap);
    loss.per_mass_flux = c * mu / rho.value;
    loss.pressure_Pa = loss.per_mass_flux * r.mass_flux;
    loss.per_kelvin =
        c * r.mass_flux * (viscosity_slope / rho.value - mu * rho.slope / (rho.value * rho.value));
    loss.scatter = 0.1;
    return loss;
  }
  chassis::film_words friction_words(const chassis::passage_run&) const override {
    return {"laminar", "test", {}, true, "a test passage"};
  }
  chassis::sensitive density(double air_K, double pressure_Pa) const override {
    const double rho = pressure_Pa / (287.05 * air_K);
    return {rho, -rho / air_K};
  }
  double specific_heat(double, double) const override { return cp; }
};

}  // namespace chassis_test
