// What does single precision gain? The same faces in arrays of double, in arrays of float computed
// in double, and in float throughout.

#include "air_tube.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;
constexpr std::size_t n = 4096;

template <class T, class Number>
void faces_in(benchmark::State& state) {
  const auto tube = bench::air_tube();
  const auto spread = bench::spread(310.0, 420.0, n);
  const std::vector<Number> wall(spread.begin(), spread.end());
  std::vector<Number> q(n);
  std::vector<Number> slope(n);
  std::vector<std::uint64_t> verdicts(n);
  for (auto _ : state) {
    benchmark::DoNotOptimize(
        faces::evaluate<T, Number>(tube, {.wall_temperature_K = wall},
                                   {.flux_W_m2 = q, .slope_W_m2K = slope, .verdict = verdicts}));
    benchmark::ClobberMemory();
  }
}
BENCHMARK(faces_in<double, double>)->Name("double_scalar");
BENCHMARK(faces_in<float, float>)->Name("float_scalar");
BENCHMARK(faces_in<faces::widest, double>)->Name("double_simd");
BENCHMARK(faces_in<faces::widest, float>)->Name("float_arrays_simd");

}  // namespace

int main(int argc, char** argv) {
  return bench::run(argc, argv,
                    {{"double_over_float_scalar", "double_scalar", "float_scalar", n, n},
                     {"double_over_float_arrays_simd", "double_simd", "float_arrays_simd", n, n}});
}
