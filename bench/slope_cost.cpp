// What does an exact derivative cost? Value with slope (dual) against the value alone, one number
// at a time and a pack at a time.

#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "convelope/scalar/std_simd.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;
using correlation_type = cylinder_crossflow::churchill_bernstein_1977;
using pack = std::experimental::native_simd<double>;

template <class T>
T load(const double* x) {
  if constexpr (std::is_same_v<T, pack>) {
    return pack(x, std::experimental::element_aligned);
  } else {
    return *x;
  }
}

// As behind a wall temperature: both numbers vary with it.
template <class T>
dual<T> both(const T& x, double slope) {
  dual<T> d(x);
  d.slope[0] = T(slope);
  return d;
}

template <class T>
void value(benchmark::State& state) {
  const auto Re = bench::spread(10.0, 1e6, 1024);
  const auto Pr = bench::spread(0.7, 12.0, 1024);
  for (auto _ : state) {
    T sum(0.0);
    for (std::size_t i = 0; i < Re.size(); i += std::size_t(scalar_adaptor<T>::lanes)) {
      sum += correlation_type::formula(load<T>(&Re[i]), load<T>(&Pr[i]));
    }
    benchmark::DoNotOptimize(sum);
  }
}

template <class T>
void with_slope(benchmark::State& state) {
  const auto Re = bench::spread(10.0, 1e6, 1024);
  const auto Pr = bench::spread(0.7, 12.0, 1024);
  for (auto _ : state) {
    T sum(0.0);
    T slopes(0.0);
    for (std::size_t i = 0; i < Re.size(); i += std::size_t(scalar_adaptor<T>::lanes)) {
      const auto y =
          correlation_type::formula(both(load<T>(&Re[i]), 3.0), both(load<T>(&Pr[i]), 0.1));
      sum += y.value;
      slopes += y.slope[0];
    }
    benchmark::DoNotOptimize(sum);
    benchmark::DoNotOptimize(slopes);
  }
}
BENCHMARK(value<double>)->Name("value_scalar");
BENCHMARK(with_slope<double>)->Name("slope_scalar");
BENCHMARK(value<pack>)->Name("value_simd");
BENCHMARK(with_slope<pack>)->Name("slope_simd");

}  // namespace

int main(int argc, char** argv) {
  return bench::run(argc, argv,
                    {{"slope_over_value_scalar", "slope_scalar", "value_scalar"},
                     {"slope_over_value_simd", "slope_simd", "value_simd"},
                     {"scalar_over_simd", "value_scalar", "value_simd"}});
}
