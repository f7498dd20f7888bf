// What the gases leave out, measured with the full published equations: densities, heat
// capacities, expansion by the reference equations of state, transport by Lemmon and Jacobsen 2004
// with the critical enhancement.
#include <doctest/doctest.h>

#include <utility>

#include "../fluids/close_to.hpp"
#include "convelope/fluids/argon.hpp"
#include "convelope/fluids/carbon_dioxide.hpp"
#include "convelope/fluids/helium.hpp"
#include "convelope/fluids/hydrogen.hpp"
#include "convelope/fluids/nitrogen.hpp"
#include "convelope/fluids/oxygen.hpp"

using namespace convelope;

namespace {

struct deviation {
  double density, heat, conductivity, viscosity, expansion;
};

template <class Gas, class Fluid>
deviation left_out(const Fluid& f, double T, double p) {
  const double R = Gas::gas_constant;
  const double ideal = Gas::ideal_heat(T, 1.0 / T, std::sqrt(T));
  const auto state = [&](double rho) {
    return detail::helmholtz::state_of<Gas>(rho, T, 1.0 / T, ideal);
  };
  double rho = p / (R * T);
  for (int i = 0; i < 30; ++i) {
    const auto s = state(rho);
    rho -= (s.pressure - p) / (s.stiffness * R * T);
  }
  const auto s = state(rho);
  const auto b = detail::background<Gas>(rho, T, 1.0 / T);
  const double k = b.conductivity + detail::critical_enhancement<Gas>(rho, T, b.viscosity);
  const auto v = f.values(T, p);
  return {v.density / (rho * Gas::molar_mass) - 1.0,
          v.specific_heat / (R / Gas::molar_mass * s.cp_over_R) - 1.0,
          v.conductivity / (1e-3 * k) - 1.0, v.viscosity / (1e-6 * b.viscosity) - 1.0,
          v.expansion / s.expansion - 1.0};
}

// Transport has the uncertainty of its source besides, so only half of the stated one is granted.
template <class Gas, class Fluid>
void as_good_as_it_says(const Fluid& f) {
  const property_uncertainty& u = f.info()->uncertainty;
  for (const double p : {1e3, 1e5, 5e5, 1e6, 2e6}) {
    for (const double T : {200.0, 220.0, 250.0, 300.0, 400.0, 700.0, 1200.0, 2000.0}) {
      CAPTURE(T);
      CAPTURE(p);
      const deviation d = left_out<Gas>(f, T, p);
      CHECK(std::fabs(d.density) < u.density);
      CHECK(std::fabs(d.heat) < 0.6 * u.specific_heat);
      CHECK(std::fabs(d.expansion) < u.expansion);
      CHECK(std::fabs(d.viscosity) < 0.5 * u.viscosity);
      CHECK(std::fabs(d.conductivity) < 0.6 * u.conductivity);
    }
  }
}

}  // namespace

TEST_CASE("nitrogen, oxygen, argon are as good as they say, up to the corners") {
  as_good_as_it_says<detail::nitrogen_transport>(nitrogen{});
  as_good_as_it_says<detail::oxygen_transport>(oxygen{});
  as_good_as_it_says<detail::argon_transport>(argon{});
  // The worst corner, as the headers have it.
  const auto n = left_out<detail::nitrogen_transport>(nitrogen{}, 200.0, 2e6);
  CHECK(n.density == doctest::Approx(0.0033).epsilon(0.02));
  CHECK(n.heat == doctest::Approx(0.0042).epsilon(0.02));
  CHECK(n.expansion == doctest::Approx(0.0106).epsilon(0.02));
  CHECK(n.viscosity == doctest::Approx(-0.0049).epsilon(0.02));
  CHECK(n.conductivity == doctest::Approx(-0.0166).epsilon(0.02));
  const auto a = left_out<detail::argon_transport>(argon{}, 200.0, 2e6);
  CHECK(a.density == doctest::Approx(0.0030).epsilon(0.02));
  CHECK(a.heat == doctest::Approx(0.0055).epsilon(0.02));
  const auto o = left_out<detail::oxygen_transport>(oxygen{}, 200.0, 2e6);
  CHECK(o.density == doctest::Approx(0.0029).epsilon(0.02));
  CHECK(o.conductivity == doctest::Approx(-0.0019).epsilon(0.03));
}

TEST_CASE("nitrogen, oxygen, argon: to first order in density they are the full equations") {
  // Twenty times the pressure would leave out 400 times as much.
  for (const double T : {300.0, 450.0, 900.0}) {
    CAPTURE(T);
    for (const deviation& d : {left_out<detail::nitrogen_transport>(nitrogen{}, T, 2e4),
                               left_out<detail::oxygen_transport>(oxygen{}, T, 2e4),
                               left_out<detail::argon_transport>(argon{}, T, 2e4)}) {
      CHECK(std::fabs(d.density) < 2e-7);
      CHECK(std::fabs(d.heat) < 2e-7);
      CHECK(std::fabs(d.expansion) < 4e-7);
      CHECK(std::fabs(d.viscosity) < 4e-7);
      CHECK(std::fabs(d.conductivity) < 8e-7);
    }
  }
}

TEST_CASE("carbon dioxide: saturated vapour, Span and Wagner 1996, table of saturation") {
  // From memory: density of the saturated vapour. 0.6 MPa is already outside the envelope.
  struct row {
    double T, p, rho;
  };
  for (const row& r : {row{216.592, 0.51795e6, 13.761}, row{220.0, 0.59913e6, 15.817}}) {
    CAPTURE(r.T);
    CHECK(close_to(carbon_dioxide{}.values(r.T, r.p).density, r.rho, 1e-3));
  }
}

TEST_CASE("ideal-gas heat capacities, NIST-JANAF Thermochemical Tables") {
  // 4th edition, 1998, cp in J/(mol K) at 0.1 MPa, ideal gas; from memory.
  struct row {
    double T, n2, o2, co2, h2;
  };
  for (const row& r :
       {row{300.0, 29.125, 29.385, 37.221, 28.849}, row{500.0, 29.580, 31.091, 44.627, 29.260},
        row{1000.0, 32.697, 34.870, 54.308, 30.205}}) {
    CAPTURE(r.T);
    const double p = 1e3;
    CHECK(close_to(nitrogen{}.values(r.T, p).specific_heat * 28.01348e-3, r.n2, 5e-4));
    CHECK(close_to(oxygen{}.values(r.T, p).specific_heat * 31.9988e-3, r.o2, 5e-4));
    CHECK(close_to(carbon_dioxide{}.values(r.T, p).specific_heat * 44.0098e-3, r.co2, 5e-4));
    CHECK(close_to(hydrogen{}.values(r.T, p).specific_heat * 2.01588e-3, r.h2, 8e-4));
    CHECK(close_to(argon{}.values(r.T, p).specific_heat * 39.948e-3, 20.786, 2e-4));
    CHECK(close_to(helium{}.values(r.T, p).specific_heat * 4.002602e-3, 20.786, 2e-4));
  }
  CHECK(close_to(nitrogen{}.values(2000.0, 1e3).specific_heat * 28.01348e-3, 35.971, 1e-3));
  CHECK(close_to(oxygen{}.values(2000.0, 1e3).specific_heat * 31.9988e-3, 37.741, 2e-3));
}

TEST_CASE("second virial coefficients, Dymond and Smith") {
  // The Virial Coefficients of Pure Gases and Mixtures, 1980, recommended values in cm3/mol, from
  // memory; the tables claim 1 to 4 cm3/mol.
  struct row {
    double T, co2, n2, o2, ar;
  };
  const auto of = [](auto equation, double T) {
    using E = decltype(equation);
    const double tau = E::reducing_temperature / T;
    return 1e6 / E::reducing_density *
           detail::helmholtz::virial<E::terms, E::unit>(tau, 1.0 / tau).b;
  };
  for (const row& r :
       {row{300.0, -122.0, -4.2, -16.0, -15.5}, row{400.0, -60.0, 9.0, -1.0, -1.0}}) {
    CAPTURE(r.T);
    CHECK(close_to(1e6 * detail::co2::virial(r.T, 1.0 / r.T).b, r.co2, 0.0, 2.0));
    CHECK(close_to(of(detail::nitrogen_equation{}, r.T), r.n2, 0.0, 1.0));
    CHECK(close_to(of(detail::oxygen_equation{}, r.T), r.o2, 0.0, 1.0));
    CHECK(close_to(of(detail::argon_equation{}, r.T), r.ar, 0.0, 1.0));
  }
  for (const auto& [T, B] : {std::pair{220.0, -248.0},
                             {240.0, -202.0},
                             {260.0, -168.0},
                             {280.0, -142.0},
                             {1000.0, 16.0}}) {
    const double at_K = T;  // clang 14 can't capture a structured binding
    CAPTURE(at_K);
    CHECK(close_to(1e6 * detail::co2::virial(T, 1.0 / T).b, B, 0.0, 2.0));
  }
}

TEST_CASE("noble gases: Pr near 2/3, as kinetic theory has it") {
  // Chapman-Enskog, first order: k = (15/4) R mu / M, so Pr = 2/3; higher orders change 1 %.
  for (const double T : {200.0, 300.0, 600.0, 1200.0}) {
    CAPTURE(T);
    CHECK(close_to(argon{}.values(T, 1e4).prandtl(), 2.0 / 3.0, 0.015));
    CHECK(close_to(helium{}.values(T, 1e4).prandtl(), 2.0 / 3.0, 0.03));
  }
}
