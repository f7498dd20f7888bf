// What does each correlation cost? Nanoseconds of one evaluation: in the textbook spelling
// (std::pow for every power and root), by this library one at a time, and in packs. Writes
// docs/cost.md.

#include <algorithm>
#include <chrono>
#include <cmath>
#include <cstdio>
#include <fstream>
#include <string>
#include <vector>

#include "convelope/catalogue/catalogue.hpp"
#include "convelope/faces/widest.hpp"

namespace {

/// A double whose powers and roots all go through std::pow.
struct spelled {
  double v;
  spelled() = default;
  spelled(double x) : v(x) {}  // NOLINT: literals convert
  friend spelled operator+(spelled a, spelled b) { return a.v + b.v; }
  friend spelled operator-(spelled a, spelled b) { return a.v - b.v; }
  friend spelled operator*(spelled a, spelled b) { return a.v * b.v; }
  friend spelled operator/(spelled a, spelled b) { return a.v / b.v; }
  friend spelled operator-(spelled a) { return -a.v; }
  friend bool operator<(spelled a, spelled b) { return a.v < b.v; }
  friend bool operator>(spelled a, spelled b) { return a.v > b.v; }
  friend bool operator<=(spelled a, spelled b) { return a.v <= b.v; }
  friend bool operator>=(spelled a, spelled b) { return a.v >= b.v; }
};

}  // namespace

template <>
struct convelope::scalar_adaptor<spelled> {
  using plain = spelled;
  using working = spelled;
  using bits = std::uint64_t;
  static constexpr int lanes = 1;
  static const spelled& value(const spelled& x) { return x; }
  static spelled constant(double c) { return c; }
  static spelled sqrt(spelled x) { return std::pow(x.v, 0.5); }
  static spelled cbrt(spelled x) { return std::pow(x.v, 1.0 / 3.0); }
  static spelled exp(spelled x) { return std::exp(x.v); }
  static spelled log(spelled x) { return std::log(x.v); }
  static spelled pow(spelled x, spelled y) { return std::pow(x.v, y.v); }
  template <int P, int Q>
  static spelled power(const spelled& x) {
    return std::pow(x.v, static_cast<double>(P) / Q);
  }
  static spelled select(bool m, spelled yes, spelled no) { return m ? yes : no; }
  static bits bits_where(bool m, std::uint64_t word) { return m ? word : 0; }
  static bits bits_where_not_finite(spelled, std::uint64_t) { return 0; }
};

namespace {

using namespace convelope;
constexpr std::size_t count = 512;
constexpr int repetitions = 5;

/// Numbers inside the correlation's own limits, a factor of 3 apart at most.
std::vector<double> samples(const correlation_info& c, int input) {
  double low = 1.0;
  double high = 2.0;
  const std::string symbol = c.inputs[input].symbol;
  if (symbol == "Pr") {
    low = 0.7;
    high = 2.0;
  } else if (symbol.starts_with("Re")) {
    low = 1e4;
    high = 3e4;
  }
  for (int i = 0; i < c.limit_count; ++i) {
    if (symbol != c.limits[i].symbol) continue;
    const double least = c.limits[i].low > 0.0 ? c.limits[i].low : 0.0;
    const double most = c.limits[i].high;
    low = std::max(low, least);
    high = 3.0 * low;
    if (most < unbounded && high > most) {
      high = most;
      low = std::max(least, high / 3.0);
    }
  }
  std::vector<double> x(count);
  for (std::size_t i = 0; i < count; ++i) {
    const double part = static_cast<double>((i * 7919) % count) / static_cast<double>(count);
    x[i] = low * std::pow(high / low, part);
  }
  return x;
}

template <class K, class T>
auto argument(const double* x) {
  if constexpr (convelope::detail::is_choice<K>) {
    return static_cast<typename K::enumeration>(0);
  } else if constexpr (scalar_adaptor<T>::lanes > 1) {
    return faces::detail::face_access<T>::load(faces::column<const double>(x, count, 1), 0);
  } else {
    return T(*x);
  }
}

template <class C, class T>
[[gnu::flatten]] double once(const std::vector<std::vector<double>>& x, T& sum) {
  return C::with_input_kinds([&]<class... K>() {
    return [&]<std::size_t... Index>(std::index_sequence<Index...>) {
      for (std::size_t i = 0; i < count; i += static_cast<std::size_t>(scalar_adaptor<T>::lanes)) {
        sum = T(sum + C::formula(argument<K, T>(x[Index].data() + i)...));
      }
      return 0.0;
    }(std::index_sequence_for<K...>{});
  });
}

/// Median of several repetitions, ns per evaluation.
template <class C, class T>
double nanoseconds(const std::vector<std::vector<double>>& x) {
  using clock = std::chrono::steady_clock;
  std::vector<double> taken;
  T sum = scalar_adaptor<T>::constant(0.0);
  for (int r = 0; r <= repetitions; ++r) {
    constexpr int rounds = 60;
    const auto start = clock::now();
    for (int i = 0; i < rounds; ++i) {
      once<C, T>(x, sum);
      asm volatile("" : : "r"(&sum) : "memory");
    }
    const std::chrono::duration<double, std::nano> spent = clock::now() - start;
    if (r > 0) taken.push_back(spent.count() / (rounds * static_cast<double>(count)));
  }
  std::nth_element(taken.begin(), taken.begin() + repetitions / 2, taken.end());
  return taken[repetitions / 2];
}

template <class C>
void row() {
  const correlation_info& c = convelope::detail::record_of<C>;
  if constexpr (C::input_count == 0) {
    return;
  } else {
    std::vector<std::vector<double>> x;
    for (int i = 0; i < c.input_count; ++i) x.push_back(samples(c, i));
    const double textbook = nanoseconds<C, spelled>(x);
    const double scalar = nanoseconds<C, double>(x);
    const double packs = nanoseconds<C, faces::widest>(x);
    std::printf("| %s | %s | %.1f | %.1f | %.2f | %.1f | %.1f |\n", c.id, c.quantity, textbook,
                scalar, packs, textbook / scalar, textbook / packs);
  }
}

std::string processor() {
  std::ifstream info("/proc/cpuinfo");
  std::string line;
  while (std::getline(info, line)) {
    if (line.starts_with("model name")) return line.substr(line.find(':') + 2);
  }
  return "a processor without a name";
}

}  // namespace

int main() {
  std::printf(
      "# What each correlation costs\n\nWritten by `bench/run --cost-table`. Nanoseconds of one "
      "evaluation of the formula: in the\ntextbook spelling (`std::pow` for every power and root, "
      "on the same restructured formula),\nby this library one at a time, and per lane in packs of "
      "%d; and the textbook's time over ours.\nThroughput over independent states inside each "
      "correlation's range, median of %d repetitions,\n%s, %s.\n\n"
      "| id | quantity | textbook ns | scalar ns | packs ns | textbook / scalar | textbook / packs "
      "|\n|---|---|---|---|---|---|---|\n",
      scalar_adaptor<faces::widest>::lanes, repetitions, processor().c_str(), CONVELOPE_BENCH_WITH);
  catalogue::all::for_each([]<class C>() { row<C>(); });
}
