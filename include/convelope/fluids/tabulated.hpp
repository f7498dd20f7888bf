#ifndef CONVELOPE_FLUIDS_TABULATED_HPP
#define CONVELOPE_FLUIDS_TABULATED_HPP

#include "convelope/fluids/detail/table_builder.hpp"

// A fluid read from a table: a costly formulation made cheap, or a host's own data made a fluid.
// Only tabulate(...) allocates.

namespace convelope {
inline namespace v0 {

namespace detail {
template <class Source>
struct table_expansion_slope {};
template <class Source>
  requires requires { Source::expansion_slope; }
struct table_expansion_slope<Source> {
  static constexpr double expansion_slope = Source::expansion_slope;
};

/// The fluid behind a host's rows. All its limits are the table's.
template <expansion_rule Rule>
struct host_rows {
  static constexpr expansion_rule expansion_at = Rule;
  template <class T>
  bits_t<T> check(const T&, const T&) const {
    return bits_t<T>(std::uint64_t{0});
  }
};
}  // namespace detail

/// A fluid read from a table that a `tabulated` owns: copy it freely, keep the table.
/// Outside the table's range every property is that of the nearest edge, without a slope, and
/// flagged. What the source fluid flags is flagged too, at the price of its check().
/// Cost: some 80 products, no division; one state reads ten cache lines, three where the table is
/// for one pressure. Worth it for formulations dearer than that: bench/fluids.cpp has the ratios.
template <class Source>
class tabulated_view : public detail::table_expansion_slope<Source> {
 public:
  static constexpr expansion_rule expansion_at = Source::expansion_at;

  tabulated_view(const Source& source, const detail::table_storage& s)
      : table_(s.table), owner_(&s), source_(source) {}

  template <class T>
  fluid_values<T> values(const T& temperature_K, const T& pressure_Pa) const {
    return detail::table_fluid_values(table_, temperature_K, pressure_Pa);
  }

  template <class T>
  bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    const auto within = [this](int i, const T& x) {
      const limit_info& l = owner_->limits.all[static_cast<std::size_t>(i)];
      return fluid_limit(i, x, scalar_adaptor<T>::constant(l.low),
                         scalar_adaptor<T>::constant(l.high));
    };
    return bits_t<T>(source_.check(temperature_K, pressure_Pa) |
                     within(owner_->limits.T, temperature_K) |
                     within(owner_->limits.p, pressure_Pa) | bits_t<T>(owner_->always));
  }
  const fluid_info* info() const { return &owner_->info; }

 private:
  detail::table_lines table_;
  const detail::table_storage* owner_;
  [[no_unique_address]] Source source_;
};

/// A table, or why there is none; made by `tabulate(...)`. Owns the memory behind its views.
template <class Source>
class tabulated {
 public:
  tabulated(const Source& source, std::unique_ptr<const detail::table_storage> storage,
            const detail::table_outcome& outcome)
      : source_(source), storage_(std::move(storage)), outcome_(outcome) {}

  bool done() const { return outcome_.status == table_status::done; }
  table_status status() const { return outcome_.status; }
  /// The refused row of a host's data, from 0, and the number refused.
  std::size_t row() const { return outcome_.row; }
  double value() const { return outcome_.value; }
  /// The largest relative error found on a grid ten times finer than the table; 0 for a host's
  /// data, which are met. Where the bound could not be kept: what the largest table reached.
  double worst_error() const { return outcome_.worst_error; }
  double worst_temperature_K() const { return outcome_.worst_T; }
  double worst_pressure_Pa() const { return outcome_.worst_p; }
  int temperature_cells() const { return static_cast<int>(storage_->table.T.cells); }
  /// 1 where the table is for one pressure.
  int pressure_cells() const { return static_cast<int>(storage_->table.p.cells); }

  /// Where there is no table: a fluid of NaN whose every check says refused.
  tabulated_view<Source> view() const { return tabulated_view<Source>(source_, *storage_); }

 private:
  Source source_;
  std::unique_ptr<const detail::table_storage> storage_;
  detail::table_outcome outcome_;
};

namespace detail {
template <class Source, class Build>
tabulated<Source> built(const Source& source, Build build) {
  auto storage = std::make_unique<table_storage>();
  const table_outcome outcome = build(*storage);
  return tabulated<Source>(source, std::move(storage), outcome);
}
inline table_range range_of(const temperature_span& s) { return {s.low.value(), s.high.value()}; }
inline table_range range_of(const pressure_span& s) { return {s.low.value(), s.high.value()}; }
}  // namespace detail

/// A table of a fluid over a range of T and p, with as many cells of equal width as it takes for
/// every property to be within `bound` (relative, 1e-12 .. 0.1) of the fluid's own on a grid ten
/// times finer; the bound is added to the fluid's uncertainties. Values and slopes are continuous:
/// bicubic, from the fluid's values, slopes and cross slopes at the nodes, for which the fluid has
/// to run on dual numbers. Its info() must outlive the table.
template <fluid Fluid>
tabulated<Fluid> tabulate(const Fluid& f, const temperature_span& T, const pressure_span& p,
                          double bound) {
  return detail::built(f, [&](detail::table_storage& to) {
    return detail::build_from_fluid(f, to, detail::range_of(T), detail::range_of(p), true, bound);
  });
}
/// The same at one pressure; any other is flagged.
template <fluid Fluid>
tabulated<Fluid> tabulate(const Fluid& f, const temperature_span& T,
                          const boost::units::quantity<boost::units::si::pressure>& p,
                          double bound) {
  return detail::built(f, [&](detail::table_storage& to) {
    return detail::build_from_fluid(f, to, detail::range_of(T), {p.value(), p.value()}, false,
                                    bound);
  });
}

/// A host's own rows as a fluid, from the first row's temperature to the last's, at the pressures
/// said. Each property passes through its numbers with a continuous slope and does not overshoot
/// them (Fritsch and Carlson 1980). The rows are copied. Name, source and uncertainties are the
/// info's, which must outlive the table; its limits are not looked at.
template <expansion_rule Rule>
tabulated<detail::host_rows<Rule>> tabulate(std::span<const data_row> rows, const pressure_span& p,
                                            const fluid_info& info, expansion_tag<Rule>) {
  return detail::built(detail::host_rows<Rule>{}, [&](detail::table_storage& to) {
    return detail::build_from_rows(rows, to, detail::range_of(p), info);
  });
}

}  // namespace v0
}  // namespace convelope

#endif
