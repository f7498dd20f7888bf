// Dry air against published values.
#include <doctest/doctest.h>

#include "../fluids/close_to.hpp"
#include "convelope/fluids/dry_air.hpp"

using namespace convelope;

TEST_CASE("dilute air, Lemmon and Jacobsen 2004, check values of the paper") {
  // Int. J. Thermophys. 25, 21-69: viscosity uPa s, conductivity mW/(m K) at zero density
  struct row {
    double T, mu, k;
  };
  for (const row& r : {row{100.0, 7.09559, 9.35902}, row{300.0, 18.5230, 26.3529}}) {
    CAPTURE(r.T);
    const auto v = dry_air{}.values(r.T, 101325.0);
    CHECK(close_to(v.viscosity, 1e-6 * r.mu, 3e-6));
    CHECK(close_to(v.conductivity, 1e-3 * r.k, 2e-6));
  }
}

TEST_CASE("air, Lemmon et al. 2000, table of single-phase states at 0.101325 MPa") {
  // J. Phys. Chem. Ref. Data 29, 331-385 (values from memory): the real gas, so the deviation is
  // what an ideal gas leaves out. mol/m3, J/(mol K)
  struct row {
    double T, rho, cp, of_rho, of_cp;
  };
  for (const row& r :
       {row{270.0, 45.164, 29.13, 7e-4, 2.5e-3}, row{400.0, 30.461, 29.38, 3e-4, 1e-3},
        row{2000.0, 6.0899, 36.21, 6e-4, 3e-4}}) {
    CAPTURE(r.T);
    const auto v = dry_air{}.values(r.T, 101325.0);
    CHECK(close_to(v.density / 28.9586e-3, r.rho, r.of_rho));
    CHECK(close_to(v.specific_heat * 28.9586e-3, r.cp, r.of_cp));
  }
}

TEST_CASE("air, U.S. Standard Atmosphere 1976") {
  // Values from memory. Its viscosity is Sutherland's formula, 0.3 % below; its k 0.5 % below.
  const auto sea = dry_air{}.values(288.15, 101325.0);
  CHECK(close_to(sea.density, 1.2250, 5e-4));
  CHECK(close_to(sea.viscosity, 1.7894e-5, 5e-3));
  CHECK(close_to(sea.conductivity, 2.5326e-2, 1e-2));
  const auto stratosphere = dry_air{}.values(216.65, 22632.0);
  CHECK(close_to(stratosphere.density, 0.36392, 5e-4));
  CHECK(close_to(stratosphere.viscosity, 1.4216e-5, 5e-3));
  for (double T = 200.0; T <= 600.0; T += 25.0) {
    CAPTURE(T);
    const auto v = dry_air{}.values(T, 101325.0);
    const double power = T * std::sqrt(T);
    CHECK(close_to(v.viscosity, 1.458e-6 * power / (T + 110.4), 0.02));
    CHECK(close_to(v.conductivity, 2.64638e-3 * power / (T + 245.4 * std::pow(10.0, -12.0 / T)),
                   0.025));
  }
}

TEST_CASE("air at atmospheric pressure, textbook table") {
  // Incropera et al., Table A.4 (from memory); its densities are those at 1 bar.
  // Above 1200 K the table's k and Pr leave every reference equation and are not compared.
  struct row {
    double T, rho, cp, mu, k, Pr, of_mu;
  };
  constexpr row table[] = {{250, 1.3947, 1006, 159.6, 22.3, 0.720, 0.015},
                           {300, 1.1614, 1007, 184.6, 26.3, 0.707, 0.015},
                           {350, 0.9950, 1009, 208.2, 30.0, 0.700, 0.015},
                           {400, 0.8711, 1014, 230.1, 33.8, 0.690, 0.015},
                           {450, 0.7740, 1021, 250.7, 37.3, 0.686, 0.015},
                           {500, 0.6964, 1030, 270.1, 40.7, 0.684, 0.015},
                           {550, 0.6329, 1040, 288.4, 43.9, 0.683, 0.015},
                           {600, 0.5804, 1051, 305.8, 46.9, 0.685, 0.015},
                           {650, 0.5356, 1063, 322.5, 49.7, 0.690, 0.015},
                           {700, 0.4975, 1075, 338.8, 52.4, 0.695, 0.015},
                           {800, 0.4354, 1099, 369.8, 57.3, 0.709, 0.015},
                           {900, 0.3868, 1121, 398.1, 62.0, 0.720, 0.015},
                           {1000, 0.3482, 1141, 424.4, 66.7, 0.726, 0.025},
                           {1100, 0.3166, 1159, 449.0, 71.5, 0.728, 0.035},
                           {1200, 0.2902, 1175, 473.0, 76.3, 0.728, 0.040}};
  const auto compare = [&](const auto& f) {
    for (const row& r : table) {
      CAPTURE(r.T);
      const auto v = f.values(r.T, 1e5);
      CHECK(close_to(v.density, r.rho, 0.0015));
      CHECK(close_to(v.specific_heat, r.cp, 0.004));
      CHECK(close_to(v.viscosity, 1e-7 * r.mu, r.of_mu));
      CHECK(close_to(v.conductivity, 1e-3 * r.k, 0.025));
      CHECK(close_to(v.prandtl(), r.Pr, 0.03));
    }
  };
  compare(dry_air{});
  compare(dry_air_fast{});
}
