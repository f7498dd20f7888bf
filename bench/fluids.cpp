// What does a state cost? Nanoseconds for all five properties of each fluid, one state at a time
// and with packs, and what a table of water saves over the formulations behind it: over this
// library's own spelling of them (full) and over the sums as the releases print them (textbook).

#include "convelope/fluids.hpp"

#include <array>
#include <cmath>
#include <utility>

#include "convelope/fluids/tabulated.hpp"
#include "convelope/scalar/std_simd.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;

struct range {
  double low;
  double high;
};

// liquid_water as its releases print it: a std::pow for every factor, one property after the other.
namespace textbook {

constexpr double R = 461.526;

// IAPWS R7-97(2012), Table 4, on the coefficients of its Table 2.
template <class Term>
double sum_of_region1(double T, double p, Term term) {
  const double pi = p / 16.53e6;
  const double tau = 1386.0 / T;
  double sum = 0.0;
  for (const auto& [i, j, n] : detail::if97::region1_terms) {
    sum += term(n, i, j, 7.1 - pi, tau - 1.222);
  }
  return sum;
}
double gamma_pi(double T, double p) {
  return sum_of_region1(T, p, [](double n, int i, int j, double a, double b) {
    return -n * i * std::pow(a, i - 1) * std::pow(b, j);
  });
}
double gamma_tautau(double T, double p) {
  return sum_of_region1(T, p, [](double n, int i, int j, double a, double b) {
    return n * std::pow(a, i) * j * (j - 1) * std::pow(b, j - 2);
  });
}
double gamma_pitau(double T, double p) {
  return sum_of_region1(T, p, [](double n, int i, int j, double a, double b) {
    return -n * i * std::pow(a, i - 1) * j * std::pow(b, j - 1);
  });
}

double density(double T, double p) { return 16.53e6 / (R * T * gamma_pi(T, p)); }
double specific_heat(double T, double p) {
  return -R * std::pow(1386.0 / T, 2) * gamma_tautau(T, p);
}
double expansion(double T, double p) {
  return (1.0 - 1386.0 / T * gamma_pitau(T, p) / gamma_pi(T, p)) / T;
}

// IAPWS R12-08, eqs. 10 to 12, Tables 1 and 2.
constexpr double H[6][7] = {
    {5.20094e-1, 2.22531e-1, -2.81378e-1, 1.61913e-1, -3.25372e-2, 0.0, 0.0},
    {8.50895e-2, 9.99115e-1, -9.06851e-1, 2.57399e-1, 0.0, 0.0, 0.0},
    {-1.08374, 1.88797, -7.72479e-1, 0.0, 0.0, 0.0, 0.0},
    {-2.89555e-1, 1.26613, -4.89837e-1, 0.0, 6.98452e-2, 0.0, -4.35673e-3},
    {0.0, 0.0, -2.57040e-1, 0.0, 0.0, 8.72102e-3, 0.0},
    {0.0, 1.20573e-1, 0.0, 0.0, 0.0, 0.0, -5.93264e-4}};
double viscosity(double T, double density) {
  const double t = T / 647.096;
  const double r = density / 322.0;
  constexpr double of_T[] = {1.67752, 2.20462, 0.6366564, -0.241605};
  double below = 0.0;
  for (int i = 0; i < 4; ++i) below += of_T[i] / std::pow(t, i);
  double sum = 0.0;
  for (int i = 0; i < 6; ++i) {
    double row = 0.0;
    for (int j = 0; j < 7; ++j) {
      if (std::fabs(H[i][j]) > 0.0) row += H[i][j] * std::pow(r - 1.0, j);
    }
    sum += std::pow(1.0 / t - 1.0, i) * row;
  }
  return 1e-6 * (100.0 * std::sqrt(t) / below) * std::exp(r * sum);
}

// IAPWS R15-11, eqs. 15 to 17, Tables 1 and 2; without the critical enhancement.
constexpr double L[5][6] = {
    {1.60397357, -0.646013523, 0.111443906, 0.102997357, -0.0504123634, 0.00609859258},
    {2.33771842, -2.78843778, 1.53616167, -0.463045512, 0.0832827019, -0.00719201245},
    {2.19650529, -4.54580785, 3.55777244, -1.40944978, 0.275418278, -0.0205938816},
    {-1.21051378, 1.60812989, -0.621178141, 0.0716373224, 0.0, 0.0},
    {-2.7203370, 4.57586331, -3.18369245, 1.1168348, -0.19268305, 0.012913842}};
double conductivity(double T, double density) {
  const double t = T / 647.096;
  const double r = density / 322.0;
  constexpr double of_T[] = {2.443221e-3, 1.323095e-2, 6.770357e-3, -3.454586e-3, 4.096266e-4};
  double below = 0.0;
  for (int k = 0; k < 5; ++k) below += of_T[k] / std::pow(t, k);
  double sum = 0.0;
  for (int i = 0; i < 5; ++i) {
    double row = 0.0;
    for (int j = 0; j < 6; ++j) {
      if (std::fabs(L[i][j]) > 0.0) row += L[i][j] * std::pow(r - 1.0, j);
    }
    sum += std::pow(1.0 / t - 1.0, i) * row;
  }
  return 1e-3 * (std::sqrt(t) / below) * std::exp(r * sum);
}

struct water {
  fluid_values<double> values(double T, double p) const {
    const double rho = density(T, p);
    return {rho, specific_heat(T, p), conductivity(T, rho), viscosity(T, rho), expansion(T, p)};
  }
};

/// The largest relative difference from `other`; the expansion coefficient passes through zero.
template <class Fluid>
double difference(const Fluid& other, range T_K, range p_Pa) {
  double worst = 0.0;
  for (double T = T_K.low; T <= T_K.high; T += 7.0) {
    for (double p = p_Pa.low; p <= p_Pa.high; p += 1.3e6) {
      const auto a = water{}.values(T, p);
      const auto b = other.values(T, p);
      for (const double d :
           {a.density / b.density - 1.0, a.specific_heat / b.specific_heat - 1.0,
            a.conductivity / b.conductivity - 1.0, a.viscosity / b.viscosity - 1.0,
            (a.expansion - b.expansion) / std::fmax(std::fabs(b.expansion), 2e-4)}) {
        worst = std::fmax(worst, std::fabs(d));
      }
    }
  }
  return worst;
}

}  // namespace textbook

// A thousand states, so that a time in microseconds is one of nanoseconds per state.
constexpr std::size_t count = 1000;
using pack = std::experimental::native_simd<double>;

template <class T>
T load(const double* from) {
  if constexpr (std::is_same_v<T, double>) {
    return *from;
  } else {
    return T(from, std::experimental::element_aligned);
  }
}
template <class T>
void store(const T& x, double* to) {
  if constexpr (std::is_same_v<T, double>) {
    *to = x;
  } else {
    x.copy_to(to, std::experimental::element_aligned);
  }
}

template <class T, class Fluid>
void states(benchmark::State& state, const Fluid& f, const range& T_K, const range& p_Pa) {
  constexpr std::size_t lanes = scalar_adaptor<T>::lanes;
  static_assert(count % lanes == 0);
  const auto at_T = bench::spread(T_K.low, T_K.high, count);
  auto at_p = bench::spread(p_Pa.low, p_Pa.high, count);
  for (std::size_t i = 0; i < count; ++i) std::swap(at_p[i], at_p[(i * 271) % count]);
  std::vector<double> y[5];
  for (auto& one : y) one.resize(count);
  for (auto _ : state) {
    for (std::size_t i = 0; i < count; i += lanes) {
      const fluid_values<T> v = f.values(load<T>(&at_T[i]), load<T>(&at_p[i]));
      store(v.density, &y[0][i]);
      store(v.specific_heat, &y[1][i]);
      store(v.conductivity, &y[2][i]);
      store(v.viscosity, &y[3][i]);
      store(v.expansion, &y[4][i]);
    }
    benchmark::ClobberMemory();
  }
}

template <class Fluid>
void scalar_only(const std::string& name, const Fluid& f, range T_K, range p_Pa) {
  benchmark::RegisterBenchmark(name.c_str(), [=](benchmark::State& s) {
    states<double>(s, f, T_K, p_Pa);
  })->Unit(benchmark::kMicrosecond);
}
template <class Fluid>
void both(const std::string& name, const Fluid& f, range T_K, range p_Pa) {
  scalar_only(name, f, T_K, p_Pa);
  benchmark::RegisterBenchmark((name + "_simd").c_str(), [=](benchmark::State& s) {
    states<pack>(s, f, T_K, p_Pa);
  })->Unit(benchmark::kMicrosecond);
}

}  // namespace

int main(int argc, char** argv) {
  const range water_T{280.0, 560.0};
  const range water_p{0.1e6, 20e6};
  const range liquid_T{280.0, 360.0};
  const range near_atmospheric{0.9e5, 1.1e5};

  const auto table = tabulate(liquid_water{}, {kelvin(water_T.low), kelvin(water_T.high)},
                              {water_p.low * units::pascals, water_p.high * units::pascals}, 1e-6);
  const auto line = tabulate(liquid_water{}, {kelvin(water_T.low), kelvin(water_T.high)},
                             10e6 * units::pascals, 1e-6);
  if (!table.done() || !line.done()) {
    std::fprintf(stderr, "%s; %s\n", words(table.status()), words(line.status()));
    return 1;
  }
  std::printf("table of water: %d x %d cells, relative error %.2g\n", table.temperature_cells(),
              table.pressure_cells(), table.worst_error());

  const double apart = textbook::difference(liquid_water{}, water_T, water_p);
  const double from_table = textbook::difference(table.view(), water_T, water_p);
  std::printf("textbook spelling: within %.2g of liquid_water, %.2g of the table\n", apart,
              from_table);
  if (!(apart < 1e-9 && from_table < 2e-6)) {
    std::fprintf(stderr, "the three do not give the same\n");
    return 1;
  }

  scalar_only("textbook", textbook::water{}, water_T, water_p);
  both("liquid_water", liquid_water{}, water_T, water_p);
  both("table", table.view(), water_T, water_p);
  both("table_one_p", line.view(), water_T, {10e6, 10e6});
  both("liquid_water_fast", liquid_water_fast{}, liquid_T, near_atmospheric);
  both("steam", steam{}, {480.0, 900.0}, {1e5, 1.5e6});
  const range gas_T{250.0, 900.0};
  both("dry_air", dry_air{}, gas_T, near_atmospheric);
  both("dry_air_fast", dry_air_fast{}, gas_T, near_atmospheric);
  both("real_air", real_air{}, gas_T, {1e5, 15e6});
  both("nitrogen", nitrogen{}, gas_T, near_atmospheric);
  both("oxygen", oxygen{}, gas_T, near_atmospheric);
  both("argon", argon{}, gas_T, near_atmospheric);
  both("carbon_dioxide", carbon_dioxide{}, gas_T, near_atmospheric);
  both("helium", helium{}, gas_T, near_atmospheric);
  both("hydrogen", hydrogen{}, gas_T, near_atmospheric);
  both("humid_air", humid_air{relative_humidity(0.5)}, {280.0, 340.0}, near_atmospheric);
  both("ethylene_glycol_water", ethylene_glycol_water(mass_fraction(0.3)), liquid_T,
       near_atmospheric);
  both("propylene_glycol_water", propylene_glycol_water(mass_fraction(0.3)), liquid_T,
       near_atmospheric);
  both("seawater", seawater{salinity(0.035)}, liquid_T, near_atmospheric);
  both("engine_oil", engine_oil{}, liquid_T, near_atmospheric);
  both("ethylene_glycol", ethylene_glycol{}, liquid_T, near_atmospheric);
  both("mercury", mercury{}, liquid_T, near_atmospheric);
  const range molten_T{610.0, 870.0};
  both("sodium", sodium{}, molten_T, near_atmospheric);
  both("nak78", nak78{}, molten_T, near_atmospheric);
  both("lead", lead{}, molten_T, near_atmospheric);
  both("lead_bismuth", lead_bismuth{}, molten_T, near_atmospheric);
  both("solar_salt", solar_salt{}, molten_T, near_atmospheric);

  return bench::run(argc, argv,
                    {{"textbook_over_table", "textbook", "table"},
                     {"textbook_over_full", "textbook", "liquid_water"},
                     {"full_over_table", "liquid_water", "table"},
                     {"full_over_table_simd", "liquid_water_simd", "table_simd"},
                     {"full_over_table_one_p", "liquid_water", "table_one_p"},
                     {"full_over_table_one_p_simd", "liquid_water_simd", "table_one_p_simd"},
                     {"full_over_fast_water", "liquid_water", "liquid_water_fast"},
                     {"air_over_fast_air", "dry_air", "dry_air_fast"},
                     {"real_air_over_air", "real_air", "dry_air"}});
}
