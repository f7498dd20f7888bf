// What dry air leaves out as an ideal, dilute gas, measured with the full published equations:
// density, heat capacity and expansion by Lemmon et al. 2000 (J. Phys. Chem. Ref. Data 29,
// 331-385), transport by Lemmon and Jacobsen 2004 (Int. J. Thermophys. 25, 21-69).
#include <doctest/doctest.h>

#include "../fluids/close_to.hpp"
#include "convelope/fluids/dry_air.hpp"

using namespace convelope;

namespace {

constexpr double R = 8.31451;
constexpr double molar_mass = 28.9586e-3;
constexpr double critical_T = 132.6312;
constexpr double critical_density = 10447.7;  // mol/m3

struct term {
  double n, i, j, l;
};
constexpr term residual_terms[] = {
    {0.118160747229, 1, 0, 0},        {0.713116392079, 1, 0.33, 0},
    {-0.161824192067e1, 1, 1.01, 0},  {0.714140178971e-1, 2, 0, 0},
    {-0.865421396646e-1, 3, 0, 0},    {0.134211176704, 3, 0.15, 0},
    {0.112626704218e-1, 4, 0, 0},     {-0.420533228842e-1, 4, 0.2, 0},
    {0.349008431982e-1, 4, 0.35, 0},  {0.164957183186e-3, 6, 1.35, 0},
    {-0.101365037912, 1, 1.6, 1},     {-0.173813690970, 3, 0.8, 1},
    {-0.472103183731e-1, 5, 0.95, 1}, {-0.122523554253e-1, 6, 1.25, 1},
    {-0.146629609713, 1, 3.6, 2},     {-0.316055879821e-1, 3, 6, 2},
    {0.233594806142e-3, 11, 3.25, 2}, {0.148287891978e-1, 1, 3.5, 3},
    {-0.938782884667e-2, 3, 15, 3}};

using first = dual<double, 2>;  // d/d delta, d/d tau
using second = dual<first, 2>;

second residual(const second& delta, const second& tau) {
  second sum(0.0);
  for (const term& t : residual_terms) {
    second x = t.n * math::exp(second(t.i * math::log(delta) + t.j * math::log(tau)));
    if (t.l > 0.0) x = x * math::exp(second(-math::exp(second(t.l * math::log(delta)))));
    sum = sum + x;
  }
  return sum;
}

// The ideal part, without log(delta): an independent statement of cp0.
second ideal(const second& tau) {
  const second one(1.0);
  const second root = math::sqrt(tau);
  return second(0.605719400e-7 / (tau * tau * tau) - 0.210274769e-4 / (tau * tau) -
                0.158860716e-3 / tau - 13.841928076 + 17.275266575 * tau -
                0.195363420e-3 * tau * root + 2.490888032 * math::log(tau) +
                0.791309509 * math::log(second(one - math::exp(second(-25.36365 * tau)))) +
                0.212236768 * math::log(second(one - math::exp(second(-16.90741 * tau)))) -
                0.197938904 * math::log(second(2.0 / 3.0 + math::exp(second(87.31279 * tau)))));
}

double ideal_heat(double T) {  // J/(mol K)
  const double tau = critical_T / T;
  const second t = second::variable(first::variable(tau, 1), 1);
  return R * (1.0 - tau * tau * ideal(t).slope[1].slope[1]);
}

struct real_gas {
  double density;  // mol/m3
  double heat;     // J/(mol K), at constant pressure
  double expansion;
};

real_gas at(double T, double p) {
  const double tau = critical_T / T;
  double rho = p / (R * T);
  for (int i = 0;; ++i) {
    const double delta = rho / critical_density;
    const second a = residual(second::variable(first::variable(delta, 0), 0),
                              second::variable(first::variable(tau, 1), 1));
    const double by_d = delta * a.slope[0].value;
    const double by_dd = delta * delta * a.slope[0].slope[0];
    const double by_dt = delta * tau * a.slope[0].slope[1];
    const double by_tt = tau * tau * a.slope[1].slope[1];
    const double stiffness = 1.0 + 2.0 * by_d + by_dd;
    if (i == 30) {
      const double thrust = 1.0 + by_d - by_dt;
      return {rho, ideal_heat(T) - R - R * by_tt + R * thrust * thrust / stiffness,
              thrust / (T * stiffness)};
    }
    rho -= (rho * R * T * (1.0 + by_d) - p) / (R * T * stiffness);
  }
}

// The density terms of viscosity (uPa s) and conductivity (mW/(m K)), no critical enhancement.
struct dense_term {
  double n, t, d, l;
};
double sum_of(std::initializer_list<dense_term> terms, double T, double rho) {
  const double tau = 132.6312 / T;
  const double delta = rho / critical_density;
  double sum = 0.0;
  for (const dense_term& x : terms) {
    const double damping = x.l > 0.0 ? std::exp(-std::pow(delta, x.l)) : 1.0;
    sum += x.n * std::pow(tau, x.t) * std::pow(delta, x.d) * damping;
  }
  return sum;
}
double more_viscosity(double T, double rho) {
  return sum_of({{10.72, 0.2, 1, 0},
                 {1.122, 0.05, 4, 0},
                 {0.002019, 2.4, 9, 0},
                 {-8.876, 0.6, 1, 1},
                 {-0.02916, 3.6, 8, 1}},
                T, rho);
}
double more_conductivity(double T, double rho) {
  return sum_of({{8.743, 0.1, 1, 0},
                 {14.76, 0.0, 2, 0},
                 {-16.62, 0.5, 3, 2},
                 {3.793, 2.7, 7, 2},
                 {-6.142, 0.3, 7, 2},
                 {-0.3778, 1.3, 11, 2}},
                T, rho);
}

}  // namespace

TEST_CASE("the equations of this test reproduce their papers") {
  // Lemmon et al. 2000, table of single-phase states (from memory): density, cp
  struct state {
    double T, p, rho, cp;
  };
  for (const state& s :
       {state{140, 0.101325e6, 87.718, 29.38}, state{270, 0.101325e6, 45.164, 29.13},
        state{400, 0.101325e6, 30.461, 29.38}, state{270, 10e6, 4606.4, 35.28},
        state{400, 10e6, 2920.2, 31.50}, state{2000, 10e6, 590.94, 36.25}}) {
    CAPTURE(s.T);
    CAPTURE(s.p);
    CHECK(close_to(at(s.T, s.p).density, s.rho, 5e-5));
    CHECK(close_to(at(s.T, s.p).heat, s.cp, 3e-4));
  }
  // Lemmon and Jacobsen 2004, check values; conductivity only where its critical enhancement,
  // which is not written here, is zero (above 265 K)
  const auto dilute = [](double T) { return dry_air{}.values(T, 1e5); };
  CHECK(close_to(1e6 * dilute(100).viscosity + more_viscosity(100, 28000), 107.923, 6e-6));
  CHECK(close_to(1e6 * dilute(200).viscosity + more_viscosity(200, 10000), 21.1392, 3e-6));
  CHECK(close_to(1e6 * dilute(300).viscosity + more_viscosity(300, 5000), 21.3241, 3e-6));
  CHECK(close_to(1e3 * dilute(300).conductivity + more_conductivity(300, 5000), 32.6062, 2e-6));
}

TEST_CASE("dry air's heat capacity is the second derivative of the ideal Helmholtz energy") {
  for (double T = 200.0; T <= 2000.0; T += 50.0) {
    CAPTURE(T);
    CHECK(close_to(dry_air{}.values(T, 1e5).specific_heat, ideal_heat(T) / molar_mass, 2e-7));
  }
}

TEST_CASE("dry air is as good as it says, up to the corners of its envelope") {
  const property_uncertainty& u = dry_air{}.info()->uncertainty;
  for (const double p : {1e3, 1e5, 2e5, 3e5}) {
    for (const double T : {200.0, 225.0, 250.0, 300.0, 400.0, 600.0, 1000.0, 2000.0}) {
      CAPTURE(T);
      CAPTURE(p);
      const auto v = dry_air{}.values(T, p);
      const real_gas real = at(T, p);
      CHECK(close_to(v.density, real.density * molar_mass, u.density));
      CHECK(close_to(v.specific_heat, real.heat / molar_mass, u.specific_heat));
      CHECK(close_to(v.expansion, real.expansion, u.expansion));
      CHECK(more_viscosity(T, real.density) < 0.4e-2 * 1e6 * v.viscosity);
      CHECK(more_conductivity(T, real.density) < 0.82e-2 * 1e3 * v.conductivity);
    }
  }
  // The worst corner, as the header has it.
  const auto v = dry_air{}.values(200.0, 3e5);
  const real_gas real = at(200.0, 3e5);
  CHECK(1.0 - v.density / (real.density * molar_mass) == doctest::Approx(0.0071).epsilon(0.02));
  CHECK(1.0 - v.specific_heat / (real.heat / molar_mass) == doctest::Approx(0.013).epsilon(0.02));
  CHECK(1.0 - v.expansion / real.expansion == doctest::Approx(0.0252).epsilon(0.02));
}
