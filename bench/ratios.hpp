#ifndef CONVELOPE_BENCH_RATIOS_HPP
#define CONVELOPE_BENCH_RATIOS_HPP

#include <benchmark/benchmark.h>

#include <cstdio>
#include <map>
#include <string>
#include <vector>

// Both sides of a question in one run, and their ratio.

namespace bench {

/// name = median time of `over` / median time of `under`.
struct ratio {
  const char* name;
  const char* over;
  const char* under;
};

/// Keeps the median of each benchmark while the console shows all.
class median_keeper : public benchmark::ConsoleReporter {
 public:
  median_keeper() : ConsoleReporter(OO_Tabular) {}
  void ReportRuns(const std::vector<Run>& runs) override {
    for (const Run& r : runs) {
      if (r.aggregate_name == "median") medians_[r.run_name.function_name] = r.GetAdjustedCPUTime();
    }
    ConsoleReporter::ReportRuns(runs);
  }
  double median(const std::string& name) const {
    const auto it = medians_.find(name);
    return it == medians_.end() ? 0.0 : it->second;
  }

 private:
  std::map<std::string, double> medians_;
};

/// Runs the registered benchmarks, repetitions interleaved, and prints `name ratio` lines.
inline int run(int argc, char** argv, const std::vector<ratio>& ratios) {
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
  median_keeper keeper;
  benchmark::RunSpecifiedBenchmarks(&keeper);
  bool all_there = true;
  for (const ratio& r : ratios) {
    const double under = keeper.median(r.under);
    const double over = keeper.median(r.over);
    all_there = all_there && under > 0.0 && over > 0.0;
    std::printf("ratio %s %.3f (%s %.2f ns / %s %.2f ns)\n", r.name, over / under, r.over, over,
                r.under, under);
  }
  return all_there ? 0 : 1;
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
