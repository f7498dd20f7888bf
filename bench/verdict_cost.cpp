// What does a verdict cost? The typed call with verdict, scatter and source against the bare
// formula on the same numbers.

#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;
using correlation_type = cylinder_crossflow::churchill_bernstein_1977;

void off(benchmark::State& state) {
  const auto Re = bench::spread(10.0, 1e6, 1024);
  for (auto _ : state) {
    double sum = 0.0;
    for (const double x : Re) sum += correlation_type::formula(x, 0.71);
    benchmark::DoNotOptimize(sum);
  }
}
BENCHMARK(off);

void on(benchmark::State& state) {
  const auto Re = bench::spread(10.0, 1e6, 1024);
  for (auto _ : state) {
    double sum = 0.0;
    std::uint64_t crossed = 0;
    for (const double x : Re) {
      const auto Nu = correlation_type{}(reynolds_of<diameter>(x), prandtl_number(0.71));
      sum += Nu.si();
      crossed |= Nu.verdict().bits();
    }
    benchmark::DoNotOptimize(sum);
    benchmark::DoNotOptimize(crossed);
  }
}
BENCHMARK(on);

}  // namespace

int main(int argc, char** argv) {
  return bench::run(argc, argv, {{"verdict_on_over_off", "on", "off"}});
}
