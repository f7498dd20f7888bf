// What does a state cost? Nanoseconds for all five properties of each fluid, one state at a time
// and with packs, and what a table of water saves over the formulations behind it.

#include "convelope/fluids.hpp"

#include "convelope/fluids/argon.hpp"
#include "convelope/fluids/carbon_dioxide.hpp"
#include "convelope/fluids/engine_oil.hpp"
#include "convelope/fluids/ethylene_glycol.hpp"
#include "convelope/fluids/glycol_water.hpp"
#include "convelope/fluids/helium.hpp"
#include "convelope/fluids/humid_air.hpp"
#include "convelope/fluids/hydrogen.hpp"
#include "convelope/fluids/liquid_metals.hpp"
#include "convelope/fluids/nitrogen.hpp"
#include "convelope/fluids/oxygen.hpp"
#include "convelope/fluids/seawater.hpp"
#include "convelope/fluids/solar_salt.hpp"
#include "convelope/fluids/tabulated.hpp"
#include "convelope/scalar/std_simd.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;

struct range {
  double low;
  double high;
};

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
void both(const std::string& name, const Fluid& f, range T_K, range p_Pa) {
  benchmark::RegisterBenchmark(name.c_str(), [=](benchmark::State& s) {
    states<double>(s, f, T_K, p_Pa);
  })->Unit(benchmark::kMicrosecond);
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

  both("liquid_water", liquid_water{}, water_T, water_p);
  both("table", table.view(), water_T, water_p);
  both("table_one_p", line.view(), water_T, {10e6, 10e6});
  const range gas_T{250.0, 900.0};
  both("dry_air", dry_air{}, gas_T, near_atmospheric);
  both("dry_air_fast", dry_air_fast{}, gas_T, near_atmospheric);
  both("nitrogen", nitrogen{}, gas_T, near_atmospheric);
  both("oxygen", oxygen{}, gas_T, near_atmospheric);
  both("argon", argon{}, gas_T, near_atmospheric);
  both("carbon_dioxide", carbon_dioxide{}, gas_T, near_atmospheric);
  both("helium", helium{}, gas_T, near_atmospheric);
  both("hydrogen", hydrogen{}, gas_T, near_atmospheric);
  both("humid_air", humid_air{relative_humidity(0.5)}, {280.0, 340.0}, near_atmospheric);
  both("ethylene_glycol_water", ethylene_glycol_water(mass_fraction(0.3)), liquid_T,
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
                    {{"full_over_table", "liquid_water", "table"},
                     {"full_over_table_simd", "liquid_water_simd", "table_simd"},
                     {"full_over_table_one_p", "liquid_water", "table_one_p"},
                     {"full_over_table_one_p_simd", "liquid_water_simd", "table_one_p_simd"},
                     {"air_over_fast_air", "dry_air", "dry_air_fast"}});
}
