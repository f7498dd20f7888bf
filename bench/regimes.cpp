// Do faces in different regimes spoil the vector? A vertical wall whose faces are laminar,
// turbulent, forced and natural in turn, against the same faces sorted by regime: the composite has
// no branch, so that grouping them first has nothing to win.

#include <algorithm>

#include "convelope/faces/widest.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/surfaces/vertical_plate.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;
constexpr std::size_t n = 4096;

void walls(benchmark::State& state, bool grouped) {
  const auto wall = surface(vertical_wall{height(1.5 * units::metre)}, dry_air_fast{},
                            stream{free_stream_velocity(0.0 * units::metre_per_second),
                                   free_stream_temperature(kelvin(300.0))});
  std::vector<double> T(n);
  std::vector<double> u(n);
  for (std::size_t i = 0; i < n; ++i) {
    T[i] = i % 2 == 0 ? 300.2 : 380.0;  // Ra 1e8, laminar; 1e10, turbulent
    u[i] = i % 3 == 0 ? 12.0 : 0.01;    // forced; natural
  }
  if (grouped) {
    std::sort(T.begin(), T.end());
    std::sort(u.begin(), u.end());
  }
  std::vector<double> q(n);
  std::vector<double> slope(n);
  std::vector<std::uint64_t> verdicts(n);
  for (auto _ : state) {
    benchmark::DoNotOptimize(faces::evaluate<faces::widest>(
        wall, {.wall_temperature_K = T, .velocity_m_s = u},
        {.flux_W_m2 = q, .slope_W_m2K = slope, .verdict = verdicts}));
    benchmark::ClobberMemory();
  }
}

}  // namespace

int main(int argc, char** argv) {
  benchmark::RegisterBenchmark("mixed", walls, false);
  benchmark::RegisterBenchmark("grouped", walls, true);
  return bench::run(argc, argv, {{"mixed_over_grouped_faces", "mixed", "grouped", n, n}});
}
