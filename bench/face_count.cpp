// Does the cost of a face depend on how many there are? 1e3 to 1e7 of them, from the first cache to
// main memory.

#include <algorithm>
#include <string>

#include "air_tube.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;
constexpr std::size_t counts[] = {1'000, 10'000, 100'000, 1'000'000, 10'000'000};

std::string name_of(std::size_t n) { return "faces_" + std::to_string(n); }

void many(benchmark::State& state, std::size_t n) {
  const auto tube = bench::air_tube();
  const auto wall = bench::spread(310.0, 420.0, n);
  std::vector<double> q(n);
  std::vector<double> slope(n);
  std::vector<std::uint64_t> verdicts(n);
  for (auto _ : state) {
    benchmark::DoNotOptimize(faces::evaluate<faces::widest>(
        tube, {.wall_temperature_K = wall},
        {.flux_W_m2 = q, .slope_W_m2K = slope, .verdict = verdicts}));
    benchmark::ClobberMemory();
  }
}

}  // namespace

int main(int argc, char** argv) {
  for (const std::size_t n : counts) {
    benchmark::RegisterBenchmark(name_of(n).c_str(), many, n);
  }
  return bench::run(argc, argv, {}, bench::clock::processor,
                    [](const bench::median_keeper& keeper) {
                      double least = 1e300;
                      double most = 0.0;
                      for (const std::size_t n : counts) {
                        const double ns = keeper.median(name_of(n)) / static_cast<double>(n);
                        bench::figure(("ns_per_face_of_" + std::to_string(n)).c_str(), ns);
                        least = std::min(least, ns);
                        most = std::max(most, ns);
                      }
                      bench::figure("largest_over_smallest_face_cost", most / least);
                      return least > 0.0;
                    });
}
