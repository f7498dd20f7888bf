// Liquid water against official check values and handbook tables.
#include <doctest/doctest.h>

#include "../fluids/close_to.hpp"
#include "convelope/fluids/liquid_water.hpp"

using namespace convelope;

namespace {
detail::transport_values<double> transport(double T, double rho) {
  return detail::water_transport(T, 1.0 / T, rho);
}
fluid_values<double> saturated(double T) {
  return liquid_water{}.values(T, liquid_water::saturation_pressure(T));
}
}  // namespace

TEST_CASE("IAPWS R7-97(2012) Table 5: region 1") {
  struct row {
    double T, p, v, cp, w;
  };
  for (const row& r : {row{300, 3e6, 0.100215168e-2, 4173.01218, 1507.73921},
                       row{300, 80e6, 0.971180894e-3, 4010.08987, 1634.69054},
                       row{500, 3e6, 0.120241800e-2, 4655.80682, 1240.71337}}) {
    CAPTURE(r.T);
    CAPTURE(r.p);
    using number = dual<double, 1>;
    const auto x = liquid_water{}.values(number(r.T), number::variable(r.p));
    const double v = 1.0 / x.density.value;
    const double cp = x.specific_heat.value;
    CHECK(close_to(v, r.v, 5.2e-9));
    CHECK(close_to(cp, r.cp, 1.3e-9));
    // The speed of sound tests the expansion coefficient and the slope on pressure.
    const double v_T = v * x.expansion.value;
    const double v_p = -v * v * x.density.slope[0];
    CHECK(close_to(v / std::sqrt(-v_p - r.T * v_T * v_T / cp), r.w, 4.2e-9));
  }
}

TEST_CASE("IAPWS R7-97(2012) Tables 35 and 36: region 4") {
  CHECK(close_to(liquid_water::saturation_pressure(300.0), 0.353658941e4, 1.5e-9));
  CHECK(close_to(liquid_water::saturation_pressure(500.0), 0.263889776e7, 2e-9));
  CHECK(close_to(liquid_water::saturation_pressure(600.0), 0.123443146e8, 4.4e-9));
  // Saturation temperatures at 0.1, 1, 10 MPa, printed to 1e-6 K
  CHECK(close_to(liquid_water::saturation_pressure(372.755919), 1e5, 3e-8));
  CHECK(close_to(liquid_water::saturation_pressure(453.035632), 1e6, 3e-8));
  CHECK(close_to(liquid_water::saturation_pressure(584.149488), 1e7, 3e-8));
}

TEST_CASE("IAPWS R12-08 Table 4: viscosity without critical enhancement") {
  struct row {
    double T, rho, mu;  // uPa s
  };
  for (const row& r :
       {row{298.15, 998, 889.735100}, row{298.15, 1200, 1437.649467}, row{373.15, 1000, 307.883622},
        row{433.15, 1, 14.538324}, row{433.15, 1000, 217.685358}, row{873.15, 1, 32.619287},
        row{873.15, 100, 35.802262}, row{873.15, 600, 77.430195}, row{1173.15, 1, 44.217245},
        row{1173.15, 100, 47.640433}, row{1173.15, 400, 64.154608}}) {
    CAPTURE(r.T);
    CAPTURE(r.rho);
    CHECK(close_to(transport(r.T, r.rho).viscosity, 1e-6 * r.mu, 0.0, 0.52e-12));
  }
}

TEST_CASE("IAPWS R15-11 Table 4: conductivity without critical enhancement") {
  struct row {
    double T, rho, k;  // mW/(m K)
  };
  for (const row& r : {row{298.15, 0, 18.4341883}, row{298.15, 998, 607.712868},
                       row{298.15, 1200, 799.038144}, row{873.15, 0, 79.1034659}}) {
    CAPTURE(r.T);
    CAPTURE(r.rho);
    CHECK(close_to(transport(r.T, r.rho).conductivity, 1e-3 * r.k, 3e-9));
  }
}

TEST_CASE("IAPWS R15-11 Table 7: what leaving out the critical enhancement costs") {
  const double uncertainty = liquid_water{}.info()->uncertainty.conductivity;
  const double at_20_MPa = liquid_water{}.values(620.0, 20e6).conductivity / 481.485195e-3;
  const double at_50_MPa = liquid_water{}.values(620.0, 50e6).conductivity / 545.038940e-3;
  CHECK(1.0 - at_20_MPa == doctest::Approx(0.0263).epsilon(0.01));
  CHECK(1.0 - at_50_MPa == doctest::Approx(0.0106).epsilon(0.01));
  CHECK(1.0 - at_20_MPa < uncertainty);
}

TEST_CASE("IAPWS SR6-08(2011) Table 8: liquid water at 0.1 MPa, an independent formulation") {
  struct row {
    double T, rho, cp, mu, k, v_T;
  };
  for (const row& r :
       {row{298.15, 997.047013, 4181.44618, 889.996774e-6, 0.606502308, 2.58054178e-7},
        row{375.0, 957.009710, 4217.74697, 276.207245e-6, 0.677913788, 7.94706623e-7}}) {
    CAPTURE(r.T);
    const auto v = liquid_water{}.values(r.T, 1e5);
    CHECK(close_to(v.density, r.rho, 2e-5));
    CHECK(close_to(v.specific_heat, r.cp, 5e-4));
    CHECK(close_to(v.viscosity, r.mu, 5e-5));
    CHECK(close_to(v.conductivity, r.k, 5e-5));
    CHECK(close_to(v.expansion, r.v_T * r.rho, 3e-3));
  }
}

TEST_CASE("density of water at 1 atm, Tanaka et al. 2001") {
  // Metrologia 38, 301-309 (from memory): the recommended table
  struct row {
    double t, rho;
  };
  for (const row& r : {row{0, 999.8428}, row{4, 999.9749}, row{10, 999.7025}, row{20, 998.2067},
                       row{30, 995.6488}, row{40, 992.2152}}) {
    CAPTURE(r.t);
    CHECK(close_to(liquid_water{}.values(273.15 + r.t, 101325.0).density, r.rho, 1e-5));
  }
}

TEST_CASE("saturated liquid, handbook table") {
  // Perry's Chemical Engineers' Handbook, 9th ed., Table 2-135, from molar units with 18.015268
  // g/mol. Its conductivity is the older international formulation, up to 0.5 % above R15-11.
  struct row {
    double T, p, rho, cp, k, mu;
  };
  for (const row& r : {row{280, 992, 999.865, 4201.33, 574.04, 1433.7},
                       row{290, 1920, 998.766, 4186.95, 592.73, 1084},
                       row{300, 3537, 996.515, 4180.90, 610.28, 853.84},
                       row{310, 6231, 993.344, 4179.45, 626.05, 693.54},
                       row{320, 10546, 989.381, 4180.73, 639.71, 577.02},
                       row{330, 17213, 984.751, 4183.84, 651.18, 489.49},
                       row{340, 27188, 979.508, 4188.45, 660.55, 421.97},
                       row{350, 41682, 973.707, 4194.61, 668.00, 368.77},
                       row{360, 62194, 967.384, 4202.44, 673.76, 326.10},
                       row{370, 90535, 960.592, 4212.15, 678.02, 291.36},
                       row{380, 128850, 953.332, 4224.08, 681.00, 262.69},
                       row{390, 179640, 945.621, 4238.46, 682.83, 238.77}}) {
    CAPTURE(r.T);
    const auto v = saturated(r.T);
    CHECK(close_to(liquid_water::saturation_pressure(r.T), r.p, 1e-4, 0.6));
    CHECK(close_to(v.density, r.rho, 5e-5));
    CHECK(close_to(v.specific_heat, r.cp, 8e-4));
    CHECK(close_to(v.conductivity, 1e-3 * r.k, 6.5e-3));
    CHECK(close_to(v.viscosity, 1e-6 * r.mu, 1e-3));
  }
}

TEST_CASE("saturated liquid, textbook table") {
  // Incropera et al., Table A.6 (from memory); older formulations, hence the wide bands where
  // the table itself is off (k at 280 K, viscosity and Pr at 600 K).
  struct row {
    double T, p, v, cp, mu, k, Pr, beta, of_mu, of_k, of_Pr, of_beta;
  };
  for (const row& r :
       {row{280, 990, 1.000, 4198, 1422, 582, 10.26, 46.04, 0.015, 0.025, 0.035, 0.065},
        row{300, 3531, 1.003, 4179, 855, 613, 5.83, 276.1, 0.015, 0.012, 0.022, 0.03},
        row{320, 10530, 1.011, 4180, 577, 640, 3.77, 436.7, 0.015, 0.012, 0.022, 0.03},
        row{350, 41630, 1.027, 4195, 365, 668, 2.29, 624.2, 0.015, 0.012, 0.022, 0.03},
        row{373.15, 101330, 1.044, 4217, 279, 680, 1.76, 750.1, 0.015, 0.012, 0.022, 0.03},
        row{400, 245500, 1.067, 4256, 217, 688, 1.34, 896, 0.015, 0.012, 0.022, 0.03},
        row{500, 2.64e6, 1.203, 4660, 118, 642, 0.86, 0, 0.025, 0.025, 0.04, 0},
        row{600, 12.35e6, 1.541, 7000, 81, 497, 1.14, 0, 0.085, 0.025, 0.15, 0}}) {
    CAPTURE(r.T);
    const auto v = saturated(r.T);
    CHECK(close_to(liquid_water::saturation_pressure(r.T), r.p, 3e-3));
    CHECK(close_to(1.0 / v.density, 1e-3 * r.v, 1e-3));
    CHECK(close_to(v.specific_heat, r.cp, r.T < 550.0 ? 2e-3 : 8e-3));
    CHECK(close_to(v.viscosity, 1e-6 * r.mu, r.of_mu));
    CHECK(close_to(v.conductivity, 1e-3 * r.k, r.of_k));
    CHECK(close_to(v.prandtl(), r.Pr, r.of_Pr));
    if (r.beta > 0.0) CHECK(close_to(v.expansion, 1e-6 * r.beta, r.of_beta));
  }
}
