// What does a verdict cost? The typed call with verdict, scatter and source against the bare
// formula on the same numbers.

#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;
using correlation_type = cylinder_crossflow::churchill_bernstein_1977;

void off(benchmark::State& state) {
  const auto Re = bench::spread(10.0, 1e6, 1024);
  const auto Pr = bench::spread(0.7, 12.0, 1024);
  for (auto _ : state) {
    double sum = 0.0;
    for (std::size_t i = 0; i < Re.size(); ++i) sum += correlation_type::formula(Re[i], Pr[i]);
    benchmark::DoNotOptimize(sum);
  }
}
BENCHMARK(off);

void on(benchmark::State& state) {
  const auto Re = bench::spread(10.0, 1e6, 1024);
  const auto Pr = bench::spread(0.7, 12.0, 1024);
  for (auto _ : state) {
    double sum = 0.0;
    std::uint64_t crossed = 0;
    for (std::size_t i = 0; i < Re.size(); ++i) {
      const auto Nu = correlation_type{}(reynolds_of<diameter>(Re[i]), prandtl_number(Pr[i]));
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
