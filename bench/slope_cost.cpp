// What does an exact derivative cost? q with dq/dT_wall (dual numbers) against q alone, air across
// a cylinder, one wall at a time and a pack at a time.

#include "convelope/faces/widest.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/surfaces/cylinder.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;

const auto tube = cylinder_in_crossflow{diameter(0.05 * units::metre)};
const auto wind = stream{free_stream_velocity(4.0 * units::metre_per_second),
                         free_stream_temperature(kelvin(300.0))};

template <class T, class Ask>
[[gnu::flatten]] void each(benchmark::State& state, Ask ask) {
  using access = faces::detail::face_access<T>;
  const auto wall = bench::spread(310.0, 420.0, 4096);
  std::vector<double> q(wall.size());
  std::vector<double> slope(wall.size());
  std::vector<std::uint64_t> crossed(wall.size());
  const faces::column<const double> in(wall);
  const faces::column<double> out(q);
  const faces::column<double> out_slope(slope);
  const faces::column<std::uint64_t> out_verdict(crossed);
  for (auto _ : state) {
    for (std::size_t i = 0; i < wall.size(); i += std::size_t(scalar_adaptor<T>::lanes)) {
      const auto answer = ask(access::load(in, i));
      access::store(answer.q, out, i);
      if constexpr (requires { answer.slope; }) access::store(answer.slope, out_slope, i);
      access::store_bits(answer.bits, out_verdict, i);
    }
    benchmark::ClobberMemory();
  }
}

template <class T>
struct without {
  T q;
  bits_t<T> bits;
};
template <class T>
struct with {
  T q;
  T slope;
  bits_t<T> bits;
};

template <class T>
void value(benchmark::State& state) {
  each<T>(state, [](const T& wall) {
    const film<T> f = tube.film_at(dry_air_fast{}, wind.as<T>(), wall);
    return without<T>{T(f.coefficient * (wall - f.reference_temperature)), f.bits};
  });
}

template <class T>
void with_slope(benchmark::State& state) {
  each<T>(state, [](const T& wall) {
    using D = dual<T>;
    const D w = D::variable(wall);
    const film<D> f = tube.film_at(dry_air_fast{}, wind.as<D>(), w);
    const D q = f.coefficient * (w - f.reference_temperature);
    return with<T>{q.value, q.slope[0], f.bits};
  });
}
BENCHMARK(value<double>)->Name("value_scalar");
BENCHMARK(with_slope<double>)->Name("slope_scalar");
BENCHMARK(value<faces::widest>)->Name("value_simd");
BENCHMARK(with_slope<faces::widest>)->Name("slope_simd");

}  // namespace

int main(int argc, char** argv) {
  return bench::run(argc, argv,
                    {{"slope_over_value_scalar", "slope_scalar", "value_scalar"},
                     {"slope_over_value_simd", "slope_simd", "value_simd"},
                     {"scalar_over_simd", "value_scalar", "value_simd"}});
}
