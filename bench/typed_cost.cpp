// What do the types cost? Film coefficient of a cylinder in crossflow, typed against bare doubles,
// the same formula on both sides.

#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "convelope/groups/film.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;
using formula = cylinder_crossflow::churchill_bernstein_1977;

constexpr double density_kg_m3 = 1.1;
constexpr double viscosity_Pa_s = 1.95e-5;
constexpr double conductivity_W_mK = 0.0275;
constexpr double diameter_m = 0.05;

double raw(double velocity) {
  const double Re = density_kg_m3 * velocity * diameter_m / viscosity_Pa_s;
  return formula::formula(Re, 0.71) * conductivity_W_mK / diameter_m;
}

double typed_numbers(double velocity) {
  const auto rho = density(density_kg_m3 * units::kilogram_per_cubic_metre);
  const auto mu = viscosity(viscosity_Pa_s * units::pascal_second);
  const auto k = conductivity(conductivity_W_mK * units::watt_per_metre_kelvin);
  const auto D = diameter(diameter_m * units::metre);
  const auto Re = reynolds(rho, free_stream_velocity(velocity * units::metre_per_second), D, mu);
  const auto Nu = nusselt_of<diameter>(formula::formula(Re.si(), prandtl_number(0.71).si()));
  return film_coefficient(Nu, k, D).si();
}

template <double (*f)(double)>
void each(benchmark::State& state) {
  const auto u = bench::spread(0.1, 20.0, 1024);
  for (auto _ : state) {
    double sum = 0.0;
    for (const double x : u) sum += f(x);
    benchmark::DoNotOptimize(sum);
  }
}
BENCHMARK(each<raw>)->Name("raw");
BENCHMARK(each<typed_numbers>)->Name("typed");

}  // namespace

int main(int argc, char** argv) {
  return bench::run(argc, argv, {{"typed_over_raw", "typed", "raw"}});
}
