// How much do a host's threads gain? 4e6 faces by one thread and by as many as the machine has,
// each with its share; wall clock.

#include <thread>

#include "air_tube.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;
constexpr std::size_t n = 4'000'000;

void faces_by(benchmark::State& state, unsigned threads) {
  const auto tube = bench::air_tube();
  const auto wall = bench::spread(310.0, 420.0, n);
  std::vector<double> q(n);
  std::vector<double> slope(n);
  std::vector<std::uint64_t> verdicts(n);
  const faces::inputs in{.wall_temperature_K = wall};
  const faces::outputs out{.flux_W_m2 = q, .slope_W_m2K = slope, .verdict = verdicts};
  for (auto _ : state) {
    std::vector<std::jthread> team;
    for (unsigned i = 0; i < threads; ++i) {
      team.emplace_back([&, i] {
        const faces::range r = faces::share_of(n, threads, i);
        faces::evaluate<faces::widest>(tube, in.part(r.from, r.count), out.part(r.from, r.count));
      });
    }
  }
}

}  // namespace

int main(int argc, char** argv) {
  const unsigned all = std::max(1U, std::thread::hardware_concurrency());
  benchmark::RegisterBenchmark("one_thread", faces_by, 1U)->UseRealTime();
  benchmark::RegisterBenchmark("all_threads", faces_by, all)->UseRealTime();
  return bench::run(argc, argv, {{"one_over_all_threads", "one_thread", "all_threads"}},
                    bench::clock::wall, [&](const bench::median_keeper&) {
                      bench::figure("threads", all);
                      return true;
                    });
}
