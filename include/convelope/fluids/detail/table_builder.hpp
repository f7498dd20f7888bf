#ifndef CONVELOPE_FLUIDS_DETAIL_TABLE_BUILDER_HPP
#define CONVELOPE_FLUIDS_DETAIL_TABLE_BUILDER_HPP

#include <cmath>
#include <limits>
#include <memory>
#include <span>
#include <vector>

#include "convelope/fluids/detail/table_look_up.hpp"
#include "convelope/fluids/host_fluid.hpp"
#include "convelope/fluids/table_status.hpp"

// Making a table: from a fluid to an error bound, or from a host's rows.

namespace convelope {
inline namespace v0 {
namespace detail {

/// The limits of the source, those on T and p narrowed to the table's range.
struct table_limits {
  std::array<limit_info, word::fluid_limits> all{};
  int count = 0;
  int T = -1;
  int p = -1;
};

/// Everything a table owns. It stays where it is, so that views and the info outlive a move.
struct table_storage {
  std::vector<double> coefficients;
  std::vector<std::uint32_t> first;
  std::vector<double> nodes;
  std::vector<double> scales;
  table_lines table;
  table_limits limits;
  fluid_info info{};
  std::uint64_t always = word::refused;  // bits of every check: of a table that was not built

  table_storage() = default;
  table_storage(const table_storage&) = delete;
  table_storage& operator=(const table_storage&) = delete;

  /// Zeros that begin on a cache line.
  double* make_room(std::size_t doubles) {
    coefficients.assign(doubles + 7, 0.0);
    const auto address = reinterpret_cast<std::uintptr_t>(coefficients.data());
    double* const start = coefficients.data() + (64 - address % 64) % 64 / sizeof(double);
    table.coefficients = start;
    return start;
  }
};

/// How it went.
struct table_outcome {
  table_status status = table_status::done;
  std::size_t row = 0;
  double value = 0.0;
  double worst_error = 0.0;
  double worst_T = 0.0;
  double worst_p = 0.0;
};

struct table_range {
  double low;
  double high;

  double at(std::uint32_t i, std::uint32_t of) const {
    return i == of ? high : low + (high - low) * (double(i) / double(of));
  }
};

inline bool finite_number(double x) {
  return scalar_adaptor<double>::bits_where_not_finite(x, 1) == 0;
}

inline double& property_of(fluid_values<double>& v, int j) {
  double* const all[] = {&v.density, &v.specific_heat, &v.conductivity, &v.viscosity, &v.expansion};
  return *all[j];
}

/// A cubic in 0 .. 1 from values and slopes (per local unit) at both ends.
inline void hermite(double f0, double m0, double f1, double m1, double (&c)[4]) {
  c[0] = f0;
  c[1] = m0;
  c[2] = 3.0 * (f1 - f0) - 2.0 * m0 - m1;
  c[3] = 2.0 * (f0 - f1) + m0 + m1;
}

/// Slopes at the nodes that keep the cubics monotone wherever the data are:
/// F. N. Fritsch, R. E. Carlson, SIAM J. Numer. Anal. 17 (1980) 238-246.
inline void monotone_slopes(std::span<const double> x, std::span<const double> y,
                            std::span<double> m) {
  const std::size_t n = x.size();
  const auto secant = [&](std::size_t k) { return (y[k + 1] - y[k]) / (x[k + 1] - x[k]); };
  m[0] = secant(0);
  m[n - 1] = secant(n - 2);
  for (std::size_t k = 1; k + 1 < n; ++k) {
    const double before = secant(k - 1);
    const double after = secant(k);
    const double a = x[k] - x[k - 1];
    const double b = x[k + 1] - x[k];
    m[k] = before * after > 0.0 ? (b * before + a * after) / (a + b) : 0.0;
  }
  for (std::size_t k = 0; k + 1 < n; ++k) {
    const double d = secant(k);
    if (!(d * d > 0.0)) {
      m[k] = 0.0;
      m[k + 1] = 0.0;
      continue;
    }
    const double u = m[k] / d;
    const double v = m[k + 1] / d;
    const double square = u * u + v * v;
    if (square > 9.0) {
      const double shorter = 3.0 / std::sqrt(square);
      m[k] = shorter * u * d;
      m[k + 1] = shorter * v * d;
    }
  }
}

inline table_outcome refuse(table_storage& to, table_status why, std::size_t row = 0,
                            double value = 0.0) {
  to.table = table_lines{};
  double* const c = to.make_room(table_lines::doubles_of_T_cell);
  for (std::size_t i = 0; i < table_lines::doubles_of_T_cell; ++i) {
    c[i] = std::numeric_limits<double>::quiet_NaN();
  }
  to.limits = table_limits{};
  to.limits.all[0] = {"T", 0.0, unbounded};
  to.limits.all[1] = {"p", 0.0, unbounded};
  to.limits.count = 2;
  to.limits.T = 0;
  to.limits.p = 1;
  to.info.limits = to.limits.all.data();
  to.info.limit_count = to.limits.count;
  to.always = word::refused;
  return {why, row, value};
}

inline bool take_info(table_storage& to, const fluid_info& from, std::span<const limit_info> given,
                      const table_range& T, const table_range& p, double bound) {
  to.info = from;
  table_limits& l = to.limits;
  l = table_limits{};
  for (const limit_info& one : given) {
    if (l.count < word::fluid_limits) l.all[static_cast<std::size_t>(l.count++)] = one;
  }
  const auto narrow = [&l](tested_number which, const char* symbol, const table_range& range) {
    for (int i = 0; i < l.count; ++i) {
      limit_info& one = l.all[static_cast<std::size_t>(i)];
      if (number_of_limit(one) != which) continue;
      one.low = one.low > range.low ? one.low : range.low;
      one.high = one.high < range.high ? one.high : range.high;
      return i;
    }
    if (l.count == word::fluid_limits) return -1;
    l.all[static_cast<std::size_t>(l.count)] = {symbol, range.low, range.high};
    return l.count++;
  };
  l.T = narrow(tested_number::temperature, "T", T);
  l.p = narrow(tested_number::pressure, "p", p);
  to.info.limits = l.all.data();
  to.info.limit_count = l.count;
  property_uncertainty& u = to.info.uncertainty;
  for (double* one : {&u.density, &u.specific_heat, &u.conductivity, &u.viscosity, &u.expansion}) {
    if (*one >= 0.0) *one += bound;
  }
  return l.T >= 0 && l.p >= 0;
}

inline table_axis equal_axis(const table_range& range, std::uint32_t cells) {
  table_axis a;
  a.low = range.low;
  a.high = range.high;
  a.per_unit = double(cells) / (range.high - range.low);
  a.cells = cells;
  a.buckets = cells;
  return a;
}

/// Values, slopes and cross slopes of the fluid at the nodes, then the cubics of each cell.
template <class Source>
void fill_table(const Source& source, table_storage& to, const table_range& T, const table_range& p,
                std::uint32_t n_T, std::uint32_t n_p) {
  using inner = dual<double, 1>;
  using outer = dual<inner, 1>;
  const bool two = to.table.with_pressure;
  const double width_T = (T.high - T.low) / double(n_T);
  const double width_p = two ? (p.high - p.low) / double(n_p) : 0.0;
  const std::size_t along_p = two ? n_p + std::size_t{1} : 1;
  struct node_data {
    double of[table_properties][4];  // f, f_T, f_p, f_Tp per cell width
  };
  std::vector<node_data> nodes((n_T + std::size_t{1}) * along_p);
  for (std::uint32_t i = 0; i <= n_T; ++i) {
    for (std::uint32_t k = 0; k < along_p; ++k) {
      const fluid_values<outer> v = source.values(
          outer::variable(inner(T.at(i, n_T))), outer(inner::variable(two ? p.at(k, n_p) : p.low)));
      const outer* const all[] = {&v.density, &v.specific_heat, &v.conductivity, &v.viscosity,
                                  &v.expansion};
      for (int j = 0; j < table_properties; ++j) {
        const outer& y = *all[j];
        double(&f)[4] = nodes[i * along_p + k].of[j];
        f[0] = y.value.value;
        f[1] = y.slope[0].value * width_T;
        f[2] = y.value.slope[0] * width_p;
        f[3] = y.slope[0].slope[0] * width_T * width_p;
      }
    }
  }
  const std::size_t per_cell =
      two ? table_lines::doubles_of_Tp_cell : table_lines::doubles_of_T_cell;
  double* cell = to.make_room(std::size_t{n_T} * n_p * per_cell);
  for (std::uint32_t i = 0; i < n_T; ++i) {
    for (std::uint32_t k = 0; k < n_p; ++k, cell += per_cell) {
      for (int j = 0; j < table_properties; ++j) {
        const auto& low = nodes[i * along_p + k].of[j];
        const auto& high = nodes[(i + 1) * along_p + k].of[j];
        double value[4], slope[4], next_value[4], next_slope[4];
        hermite(low[0], low[1], high[0], high[1], value);
        if (!two) {
          for (int a = 0; a < 4; ++a) cell[place_of_coefficient(a, j)] = value[a];
          continue;
        }
        const auto& next_low = nodes[i * along_p + k + 1].of[j];
        const auto& next_high = nodes[(i + 1) * along_p + k + 1].of[j];
        hermite(low[2], low[3], high[2], high[3], slope);
        hermite(next_low[0], next_low[1], next_high[0], next_high[1], next_value);
        hermite(next_low[2], next_low[3], next_high[2], next_high[3], next_slope);
        for (int a = 0; a < 4; ++a) {
          double by_s[4];
          hermite(value[a], slope[a], next_value[a], next_slope[a], by_s);
          for (int b = 0; b < 4; ++b) cell[place_of_coefficient(a, b, j)] = by_s[b];
        }
      }
    }
  }
  to.table.T = equal_axis(T, n_T);
  if (two) to.table.p = equal_axis(p, n_p);
}

struct table_error {
  double worst = 0.0;
  double T = 0.0;
  double p = 0.0;
  double along_T = 0.0;  // where only T lies between nodes
  double along_p = 0.0;
};

/// On a grid ten times finer than the nodes. The expansion coefficient may pass through zero: its
/// error is relative to a tenth of its largest magnitude where it is smaller than that.
template <class Source>
table_error measure_table(const Source& source, const table_storage& to, const table_range& T,
                          const table_range& p, std::uint32_t n_T, std::uint32_t n_p,
                          double largest_expansion) {
  table_error found;
  const bool two = to.table.with_pressure;
  const std::uint32_t last_k = two ? 10 * n_p : 0;
  for (std::uint32_t i = 0; i <= 10 * n_T; ++i) {
    const double at_T = T.at(i, 10 * n_T);
    for (std::uint32_t k = 0; k <= last_k; ++k) {
      const double at_p = two ? p.at(k, 10 * n_p) : p.low;
      fluid_values<double> exact = source.values(at_T, at_p);
      const auto seen = look_up<table_values<double>>(to.table, at_T, at_p);
      for (int j = 0; j < table_properties; ++j) {
        const double y = property_of(exact, j);
        double scale = std::fabs(y);
        if (j == 4 && !(scale >= 0.1 * largest_expansion)) scale = 0.1 * largest_expansion;
        const double off = std::fabs(seen.of[j] - y);
        if (!finite_number(off)) return {off, at_T, at_p, off, off};
        const double e = scale > 0.0 ? off / scale : off;
        if (e > found.worst) {
          found.worst = e;
          found.T = at_T;
          found.p = at_p;
        }
        if (k % 10 == 0 && e > found.along_T) found.along_T = e;
        if (i % 10 == 0 && e > found.along_p) found.along_p = e;
      }
    }
  }
  return found;
}

inline constexpr std::uint32_t most_table_cells = 1U << 16;
inline constexpr std::uint32_t most_table_buckets = 1U << 20;

/// The error falls with the fourth power of the cell's width.
inline std::uint32_t finer(std::uint32_t cells, double error, double aim) {
  if (!(error > aim)) return cells;
  const double factor = std::sqrt(std::sqrt(error / aim));
  return static_cast<std::uint32_t>(double(cells) * (factor < 4.0 ? factor : 4.0)) + 1;
}

template <class Source>
table_outcome build_from_fluid(const Source& source, table_storage& to, const table_range& T,
                               const table_range& p, bool two, double bound) {
  const fluid_info& from = *source.info();
  to.info = from;
  const auto positive = [](const table_range& r) {
    return finite_number(r.low) && finite_number(r.high) && r.low > 0.0;
  };
  if (!positive(T) || !(T.high > T.low) || !positive(p) || (two && !(p.high > p.low))) {
    return refuse(to, table_status::bad_range);
  }
  if (!(bound >= 1e-12 && bound <= 0.1)) return refuse(to, table_status::bad_bound, 0, bound);
  to.table.with_pressure = two;
  // One pressure: any that differs from it by the rounding of a float.
  const table_range allowed = two ? p : table_range{p.low * (1.0 - 1e-6), p.low * (1.0 + 1e-6)};
  if (!take_info(to, from, {from.limits, static_cast<std::size_t>(from.limit_count)}, T, allowed,
                 bound)) {
    return refuse(to, table_status::no_room);
  }
  double largest_expansion = 0.0;
  for (std::uint32_t i = 0; i <= 64; ++i) {
    for (const double at_p : {p.low, p.high}) {
      const double beta = std::fabs(source.values(T.at(i, 64), at_p).expansion);
      if (beta > largest_expansion) largest_expansion = beta;
    }
  }
  table_outcome out;
  std::uint32_t n_T = 8;
  std::uint32_t n_p = 1;
  while (true) {
    if (std::uint64_t{n_T} * n_p > most_table_cells) {
      const table_outcome why = refuse(to, table_status::too_large);
      out.status = why.status;
      return out;
    }
    fill_table(source, to, T, p, n_T, n_p);
    const table_error e = measure_table(source, to, T, p, n_T, n_p, largest_expansion);
    if (!finite_number(e.worst)) return refuse(to, table_status::not_finite_here, 0, e.T);
    out.worst_error = e.worst;
    out.worst_T = e.T;
    out.worst_p = e.p;
    if (e.worst <= bound) break;
    // Where both directions add up, each may use 60 % of the bound.
    const double aim = two ? 0.6 * bound : bound;
    const std::uint32_t more_T = finer(n_T, e.along_T, aim);
    const std::uint32_t more_p = two ? finer(n_p, e.along_p, aim) : n_p;
    const bool stuck = more_T == n_T && more_p == n_p;
    n_T = stuck ? n_T + 1 + n_T / 8 : more_T;
    n_p = stuck && two ? n_p + 1 : more_p;
  }
  to.always = 0;
  return out;
}

inline table_outcome build_from_rows(std::span<const data_row> rows, table_storage& to,
                                     const table_range& p, const fluid_info& from) {
  to.info = from;
  if (!finite_number(p.low) || !finite_number(p.high) || !(p.low >= 0.0) || !(p.high >= p.low)) {
    return refuse(to, table_status::bad_range);
  }
  const std::size_t n = rows.size();
  if (n < 2) return refuse(to, table_status::too_few_rows, n);
  std::vector<double> temperatures;
  std::vector<double> columns[table_properties];
  double closest = unbounded;
  for (std::size_t i = 0; i < n; ++i) {
    const data_row& r = rows[i];
    const double all[] = {r.density, r.specific_heat, r.conductivity, r.viscosity, r.expansion};
    if (!finite_number(r.temperature_K)) {
      return refuse(to, table_status::row_not_finite, i, r.temperature_K);
    }
    if (!(r.temperature_K > 0.0)) {
      return refuse(to, table_status::row_not_positive, i, r.temperature_K);
    }
    for (int j = 0; j < table_properties; ++j) {
      if (!finite_number(all[j])) return refuse(to, table_status::row_not_finite, i, all[j]);
      if (j < 4 && !(all[j] > 0.0)) {
        return refuse(to, table_status::row_not_positive, i, all[j]);
      }
      columns[j].push_back(all[j]);
    }
    temperatures.push_back(r.temperature_K);
    if (i == 0) continue;
    const double step = r.temperature_K - rows[i - 1].temperature_K;
    if (!(step >= 0.0)) return refuse(to, table_status::row_not_rising, i, r.temperature_K);
    if (!(step > 0.0)) return refuse(to, table_status::row_repeated, i, r.temperature_K);
    closest = step < closest ? step : closest;
  }
  const table_range T{temperatures.front(), temperatures.back()};
  const double buckets = (T.high - T.low) / closest + 2.0;
  if (!(buckets <= double(most_table_buckets))) {
    return refuse(to, table_status::rows_too_uneven, 0, closest);
  }
  take_info(to, from, {}, T, p, 0.0);  // two limits always find room

  to.nodes = temperatures;
  double* const c = to.make_room(table_lines::doubles_of_T_cell * (n - 1));
  std::vector<double> slopes(n);
  for (int j = 0; j < table_properties; ++j) {
    const std::vector<double>& y = columns[j];
    monotone_slopes(to.nodes, y, slopes);
    for (std::size_t i = 0; i + 1 < n; ++i) {
      const double width = to.nodes[i + 1] - to.nodes[i];
      double cell[4];
      hermite(y[i], slopes[i] * width, y[i + 1], slopes[i + 1] * width, cell);
      for (int a = 0; a < 4; ++a) {
        c[i * table_lines::doubles_of_T_cell + std::size_t(place_of_coefficient(a, j))] = cell[a];
      }
    }
  }
  table_axis a = equal_axis(T, static_cast<std::uint32_t>(buckets));
  a.cells = static_cast<std::uint32_t>(n - 1);
  for (std::size_t i = 0; i + 1 < n; ++i) {
    to.scales.push_back(1.0 / (to.nodes[i + 1] - to.nodes[i]));
  }
  std::uint32_t cell = 0;
  for (std::uint32_t b = 0; b < a.buckets; ++b) {
    const double start = T.low + double(b) / a.per_unit;
    while (cell + 1 < a.cells && to.nodes[cell + 1] <= start) ++cell;
    to.first.push_back(cell);
  }
  a.first = to.first.data();
  a.nodes = to.nodes.data();
  a.scales = to.scales.data();
  to.table.T = a;
  to.always = 0;
  return {};
}

}  // namespace detail
}  // namespace v0
}  // namespace convelope

#endif
