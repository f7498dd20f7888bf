#ifndef CONVELOPE_BENCH_RATIOS_HPP
#define CONVELOPE_BENCH_RATIOS_HPP

#include <benchmark/benchmark.h>

#include <cmath>
#include <cstdio>
#include <map>
#include <string>
#include <vector>

// Both sides of a question in one run, and their ratio.

namespace bench {

/// name = median time of `over` / median time of `under`, each per item.
struct ratio {
  const char* name;
  const char* over;
  const char* under;
  double over_items = 1.0;
  double under_items = 1.0;
};

enum class clock { processor, wall };

/// Keeps the median of each benchmark while the console shows all.
class median_keeper : public benchmark::ConsoleReporter {
 public:
  explicit median_keeper(clock which) : ConsoleReporter(OO_Tabular), which_(which) {}
  void ReportRuns(const std::vector<Run>& runs) override {
    for (const Run& r : runs) {
      if (r.aggregate_name == "median") {
        medians_[r.run_name.function_name] =
            which_ == clock::processor ? r.GetAdjustedCPUTime() : r.GetAdjustedRealTime();
      }
    }
    ConsoleReporter::ReportRuns(runs);
  }
  double median(const std::string& name) const {
    const auto it = medians_.find(name);
    return it == medians_.end() ? 0.0 : it->second;
  }

 private:
  clock which_;
  std::map<std::string, double> medians_;
};

/// A figure for the table that is no ratio of two benchmarks.
inline void figure(const char* name, double value) { std::printf("ratio %s %.4g\n", name, value); }

/// Two sides that should give the same: tells and fails if they are further apart than `allowed`.
inline bool same(const char* what, double a, double b, double allowed) {
  const double off = std::fabs(a - b) / std::fabs(b);
  if (off <= allowed) return true;
  std::fprintf(stderr, "%s: %.17g against %.17g, %.2g apart, expected %.2g at most\n", what, a, b,
               off, allowed);
  return false;
}

/// Runs the registered benchmarks, repetitions interleaved, and prints `ratio NAME VALUE` lines;
/// `rest(keeper)` may print more and tell whether all is well.
template <class Rest>
int run(int argc, char** argv, const std::vector<ratio>& ratios, clock which, Rest rest) {
  std::vector<char*> arguments(argv, argv + argc);
  std::string repetitions = "--benchmark_repetitions=9";
  std::string interleaved = "--benchmark_enable_random_interleaving=true";
  std::string aggregates = "--benchmark_report_aggregates_only=true";
  // Before the caller's own, so that those win.
  arguments.insert(arguments.begin() + 1,
                   {repetitions.data(), interleaved.data(), aggregates.data()});
  int count = static_cast<int>(arguments.size());
  benchmark::Initialize(&count, arguments.data());
  if (benchmark::ReportUnrecognizedArguments(count, arguments.data())) return 2;
  median_keeper keeper(which);
  benchmark::RunSpecifiedBenchmarks(&keeper);
  bool all_there = true;
  for (const ratio& r : ratios) {
    const double under = keeper.median(r.under) / r.under_items;
    const double over = keeper.median(r.over) / r.over_items;
    all_there = all_there && under > 0.0 && over > 0.0;
    std::printf("ratio %s %.3f (%s %.4g ns / %s %.4g ns)\n", r.name, over / under, r.over, over,
                r.under, under);
  }
  return rest(keeper) && all_there ? 0 : 1;
}
inline int run(int argc, char** argv, const std::vector<ratio>& ratios) {
  return run(argc, argv, ratios, clock::processor, [](const median_keeper&) { return true; });
}

/// States the compiler can't foresee.
inline std::vector<double> spread(double from, double to, std::size_t n) {
  std::vector<double> x(n);
  volatile double start = from;
  const double step = (to - start) / static_cast<double>(n);
  for (std::size_t i = 0; i < n; ++i) {
    // A fixed shuffle, so that neighbours are not alike.
    x[i] = start + step * static_cast<double>((i * 7919) % n);
  }
  return x;
}

}  // namespace bench

#endif
