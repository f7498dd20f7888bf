#include "convelope/fluids/tabulated.hpp"

#include <doctest/doctest.h>

#include <cstring>
#include <random>

#include "convelope/fluids/dry_air.hpp"
#include "convelope/fluids/glycol_water.hpp"
#include "convelope/fluids/liquid_water.hpp"
#include "fluid_numbers.hpp"

// xsimd 8.1 and clang -ffast-math don't go together.
#if !(defined(__clang__) && defined(__FAST_MATH__))
#define CONVELOPE_TEST_XSIMD 1
#include "convelope/scalar/xsimd.hpp"
#endif

using namespace convelope;
using fluid_numbers::on_every_number;
using fluid_numbers::point;

namespace {
constexpr double not_a_number = std::numeric_limits<double>::quiet_NaN();
constexpr double infinite = std::numeric_limits<double>::infinity();
using detail::word::of_fluid;

pressure_span pascals_between(double low, double high) {
  return {low * units::pascals, high * units::pascals};
}
temperature_span kelvins_between(double low, double high) { return {kelvin(low), kelvin(high)}; }

constexpr reference data_sheet{"data sheet", 2020, "invented for this test", known::recalled};
constexpr limit_info sheet_limits[] = {{"T", 0.0, 1.0}};
constexpr fluid_info sheet_info{
    "sheet", &data_sheet, sheet_limits, 1, {0.01, 0.02, not_stated, 0.1, 0.05}};

template <class V, class Act>
void each(const V& v, Act act) {
  act(0, v.density);
  act(1, v.specific_heat);
  act(2, v.conductivity);
  act(3, v.viscosity);
  act(4, v.expansion);
}

// The largest relative error at random states (a fixed seed); expansion as the table measures it.
template <class Table, class Fluid>
double error_at_random(const Table& table, const Fluid& f, const temperature_span& T,
                       const pressure_span& p) {
  std::mt19937 random(7);
  std::uniform_real_distribution<double> at_T(T.low.value(), T.high.value());
  std::uniform_real_distribution<double> at_p(p.low.value(), p.high.value());
  double largest = 0.0;
  for (int i = 0; i < 4000; ++i) {
    const auto at_edge = f.values(at_T(random), p.high.value());
    largest = std::fmax(largest, std::fabs(at_edge.expansion));
  }
  double worst = 0.0;
  for (int i = 0; i < 20000; ++i) {
    const double t = at_T(random);
    const double pressure_Pa = at_p(random);
    const auto seen = table.values(t, pressure_Pa);
    double got[5];
    each(seen, [&](int j, double y) { got[j] = y; });
    each(f.values(t, pressure_Pa), [&](int j, double y) {
      const double scale = j == 4 ? std::fmax(std::fabs(y), 0.1 * largest) : std::fabs(y);
      worst = std::fmax(worst, std::fabs(got[j] - y) / scale);
    });
  }
  return worst;
}

// Value and slopes on both sides of every cell's edge.
template <class Table>
void no_jumps(const Table& table, double low, double high, int cells, double other, bool along_T) {
  using number = dual<double, 2>;
  for (int i = 1; i < cells; ++i) {
    const double edge = low + (high - low) * i / cells;
    const auto at = [&](double x) {
      return along_T ? table.values(number::variable(x, 0), number::variable(other, 1))
                     : table.values(number::variable(other, 0), number::variable(x, 1));
    };
    const auto before = at(edge - 1e-9 * (high - low));
    const auto after = at(edge + 1e-9 * (high - low));
    number first[5];
    each(before, [&](int j, const number& y) { first[j] = y; });
    each(after, [&](int j, const number& y) {
      CAPTURE(edge);
      CAPTURE(j);
      const double scale = std::fabs(y.value) + (j == 4 ? 1e-4 : 0.0);
      CHECK(close_to(first[j].value, y.value, 0.0, 1e-7 * scale));
      CHECK(close_to(first[j].slope[0], y.slope[0], 1e-5, 1e-9 * scale));
      CHECK(close_to(first[j].slope[1], y.slope[1], 1e-5, 1e-16 * scale));
    });
  }
}

}  // namespace

static_assert(fluid<tabulated_view<liquid_water>> && fluid<tabulated_view<dry_air>>);
static_assert(std::is_trivially_copyable_v<tabulated_view<liquid_water>>);
static_assert(tabulated_view<liquid_water>::expansion_at == expansion_rule::film);
static_assert(tabulated_view<liquid_water>::expansion_slope == liquid_water::expansion_slope);
static_assert(tabulated_view<dry_air>::expansion_at == expansion_rule::ambient);
static_assert(!std::is_copy_constructible_v<tabulated<liquid_water>>);

TEST_CASE("a table of water keeps its bound") {
  const auto T = kelvins_between(280.0, 560.0);
  const auto p = pascals_between(0.1e6, 20e6);
  for (const double bound : {1e-2, 1e-4, 1e-6, 1e-8}) {
    CAPTURE(bound);
    const auto table = tabulate(liquid_water{}, T, p, bound);
    REQUIRE(table.done());
    CHECK(table.worst_error() <= bound);
    CHECK(table.worst_error() > 0.01 * bound);  // no finer than asked
    CHECK(error_at_random(table.view(), liquid_water{}, T, p) <= 1.05 * bound);
    CHECK(table.worst_temperature_K() >= 280.0);
    CHECK(table.worst_pressure_Pa() <= 20e6);
  }
}

TEST_CASE("a table where the expansion passes through zero") {
  const auto T = kelvins_between(273.15, 300.0);
  const auto p = pascals_between(1e5, 1e6);
  const auto table = tabulate(liquid_water{}, T, p, 1e-6);
  REQUIRE(table.done());
  CHECK(error_at_random(table.view(), liquid_water{}, T, p) <= 1.05e-6);
  CHECK(table.view().values(275.0, 1e5).expansion < 0.0);
}

TEST_CASE("a table of air needs one cell in pressure") {
  const auto T = kelvins_between(200.0, 2000.0);
  const auto p = pascals_between(1e3, 3e5);
  const auto table = tabulate(dry_air{}, T, p, 1e-5);
  REQUIRE(table.done());
  CHECK(table.pressure_cells() == 1);
  CHECK(error_at_random(table.view(), dry_air{}, T, p) <= 1.05e-5);
}

TEST_CASE("a table at one pressure") {
  const ethylene_glycol_water f(mass_fraction(0.3));
  const auto table = tabulate(f, kelvins_between(265.0, 360.0), 1e5 * units::pascals, 1e-7);
  REQUIRE(table.done());
  CHECK(error_at_random(table.view(), f, kelvins_between(265.0, 360.0),
                        pascals_between(1e5, 1e5)) <= 1.05e-7);
  const auto view = table.view();
  CHECK(view.check(300.0, 1e5) == 0);
  CHECK(view.check(300.0, double(1e5F)) == 0);
  CHECK(view.check(300.0, 1.00001e5) == of_fluid(1, side::above));
  CHECK(view.check(300.0, 0.99999e5) == of_fluid(1, side::below));
}

TEST_CASE("a table has no jumps in value or slope") {
  const auto water =
      tabulate(liquid_water{}, kelvins_between(280.0, 560.0), pascals_between(0.1e6, 20e6), 1e-4);
  REQUIRE(water.done());
  REQUIRE(water.pressure_cells() > 1);
  no_jumps(water.view(), 280.0, 560.0, water.temperature_cells(), 7.7e6, true);
  no_jumps(water.view(), 0.1e6, 20e6, water.pressure_cells(), 411.0, false);
}

TEST_CASE("a table's slopes are those of its values, and near the fluid's") {
  const auto table =
      tabulate(liquid_water{}, kelvins_between(280.0, 560.0), pascals_between(0.1e6, 20e6), 1e-6);
  REQUIRE(table.done());
  using number = dual<double, 2>;
  for (const double T : {281.3, 333.0, 432.1, 555.0}) {
    for (const double p : {0.3e6, 5e6, 19e6}) {
      CAPTURE(T);
      CAPTURE(p);
      const auto view = table.view();
      const auto seen = view.values(number::variable(T, 0), number::variable(p, 1));
      const double h = 1e-5 * T;
      const double hp = 1e-4 * p;
      double up[5], down[5], up_p[5], down_p[5];
      each(view.values(T + h, p), [&](int j, double y) { up[j] = y; });
      each(view.values(T - h, p), [&](int j, double y) { down[j] = y; });
      each(view.values(T, p + hp), [&](int j, double y) { up_p[j] = y; });
      each(view.values(T, p - hp), [&](int j, double y) { down_p[j] = y; });
      number exact[5];
      each(liquid_water{}.values(number::variable(T, 0), number::variable(p, 1)),
           [&](int j, const number& y) { exact[j] = y; });
      each(seen, [&](int j, const number& y) {
        CAPTURE(j);
        const double scale = std::fabs(y.value);
        CHECK(close_to(y.slope[0], (up[j] - down[j]) / (2.0 * h), 1e-5, 1e-7 * scale / T));
        CHECK(close_to(y.slope[1], (up_p[j] - down_p[j]) / (2.0 * hp), 1e-5, 1e-9 * scale / p));
        CHECK(close_to(y.slope[0], exact[j].slope[0], 1e-3, 1e-3 * scale / T));
        CHECK(close_to(y.slope[1], exact[j].slope[1], 1e-3, 1e-4 * scale / p));
      });
    }
  }
}

TEST_CASE("a table on every number type") {
  // The last two lie outside.
  constexpr point points[8] = {{281.0, 1e6}, {300.0, 5e6},  {345.6, 101325.0}, {400.0, 2e7},
                               {500.0, 9e6}, {559.9, 15e6}, {270.0, 1e6},      {600.0, 3e7}};
  const auto table =
      tabulate(liquid_water{}, kelvins_between(280.0, 560.0), pascals_between(0.1e6, 20e6), 1e-5);
  REQUIRE(table.done());
  on_every_number(table.view(), points, 1e-6);
  const auto line =
      tabulate(liquid_water{}, kelvins_between(280.0, 560.0), 2e7 * units::pascals, 1e-5);
  REQUIRE(line.done());
  on_every_number(line.view(), points, 1e-6);
}

TEST_CASE("a table on packs of other kinds") {
  const auto table =
      tabulate(liquid_water{}, kelvins_between(280.0, 560.0), pascals_between(0.1e6, 20e6), 1e-5);
  REQUIRE(table.done());
  const auto view = table.view();
  const auto exact = view.values(333.0, 5e6);
#ifdef CONVELOPE_TEST_XSIMD
  using batch = xsimd::batch<double>;
  const auto of_batch = view.values(batch(333.0), batch(5e6));
  CHECK(close_to(of_batch.viscosity.get(0), exact.viscosity, 1e-14));
  CHECK(close_to(of_batch.expansion.get(0), exact.expansion, 1e-14));
#endif
  using fixed = std::experimental::fixed_size_simd<double, 3>;
  const auto of_fixed = view.values(fixed([](auto i) { return 333.0 + double(i); }), fixed(5e6));
  CHECK(close_to(of_fixed.viscosity[0], exact.viscosity, 1e-14));
  CHECK(close_to(of_fixed.viscosity[2], view.values(335.0, 5e6).viscosity, 1e-14));
  using single = std::experimental::native_simd<float>;
  const auto of_single = view.values(single(333.0F), single(5e6F));
  CHECK(close_to(double(of_single.viscosity[1]), exact.viscosity, 1e-6));
  // Second derivatives on packs, lane by lane.
  using pack = std::experimental::native_simd<double>;
  using twice = dual<dual<pack, 1>, 1>;
  const auto curved = view.values(twice::variable(dual<pack, 1>::variable(pack(333.0))),
                                  twice(dual<pack, 1>(pack(5e6))));
  using twice_double = dual<dual<double, 1>, 1>;
  const auto expected = view.values(twice_double::variable(dual<double, 1>::variable(333.0)),
                                    twice_double(dual<double, 1>(5e6)));
  CHECK(
      close_to(curved.viscosity.slope[0].slope[0][0], expected.viscosity.slope[0].slope[0], 1e-13));
  CHECK(expected.viscosity.slope[0].slope[0] > 0.0);
}

TEST_CASE("a table flags what lies outside, stays finite, and keeps the fluid's own limits") {
  const auto table =
      tabulate(liquid_water{}, kelvins_between(300.0, 500.0), pascals_between(0.1e6, 20e6), 1e-4);
  REQUIRE(table.done());
  const auto view = table.view();
  CHECK(view.check(300.0, 1e6) == 0);
  CHECK(view.check(500.0, 20e6) == 0);
  CHECK(view.check(299.999, 1e6) == of_fluid(0, side::below));
  CHECK(view.check(500.001, 2e7) == of_fluid(0, side::above));
  CHECK(view.check(310.0, 0.099e6) == of_fluid(1, side::below));
  CHECK(view.check(310.0, 20.01e6) == of_fluid(1, side::above));
  CHECK(view.check(450.0, 0.2e6) == of_fluid(2, side::below));  // above saturation
  CHECK((view.check(not_a_number, 1e6) & detail::word::not_finite) != 0);
  CHECK((view.check(300.0, not_a_number) & detail::word::not_finite) != 0);
  CHECK(view.values(250.0, 1e6).density == view.values(300.0, 1e6).density);
  CHECK(view.values(900.0, 1e9).viscosity == view.values(500.0, 20e6).viscosity);
  CHECK(view.values(dual<double, 1>::variable(250.0), dual<double, 1>(1e6)).density.slope[0] ==
        0.0);
  for (const double x : {not_a_number, infinite, -infinite, -1e300, 1e300, 0.0}) {
    each(view.values(x, 1e6),
         [](int, double y) { CHECK(scalar_adaptor<double>::bits_where_not_finite(y, 1) == 0); });
    each(view.values(300.0, x),
         [](int, double y) { CHECK(scalar_adaptor<double>::bits_where_not_finite(y, 1) == 0); });
  }
  const fluid_info& info = *view.info();
  CHECK(std::strcmp(info.name, "liquid water") == 0);
  CHECK(info.limit_count == 3);
  CHECK(info.limits[0].low == 300.0);
  CHECK(info.limits[0].high == 500.0);
  CHECK(info.limits[1].high == 20e6);
  CHECK(close_to(info.uncertainty.density, 0.0002 + 1e-4, 1e-12));
}

TEST_CASE("a table outlives a move") {
  auto table = tabulate(dry_air{}, kelvins_between(250.0, 400.0), 1e5 * units::pascals, 1e-5);
  const auto view = table.view();
  const double before = view.values(300.0, 1e5).viscosity;
  const auto moved = std::move(table);
  CHECK(view.values(300.0, 1e5).viscosity == before);
  CHECK(moved.view().info() == view.info());
}

TEST_CASE("a table is refused with a reason") {
  const auto T = kelvins_between(280.0, 560.0);
  const auto p = pascals_between(0.1e6, 20e6);
  const auto status = [](const auto& T_K, const auto& p_Pa, double bound) {
    const auto table = tabulate(liquid_water{}, T_K, p_Pa, bound);
    const auto view = table.view();
    if (!table.done()) {
      CHECK((view.check(300.0, 1e6) & detail::word::refused) != 0);
      CHECK(scalar_adaptor<double>::bits_where_not_finite(view.values(300.0, 1e6).density, 1) != 0);
    }
    CHECK(std::strlen(words(table.status())) > 3);
    return table.status();
  };
  CHECK(status(T, p, 1e-3) == table_status::done);
  CHECK(status(T, p, 0.0) == table_status::bad_bound);
  CHECK(status(T, p, 0.2) == table_status::bad_bound);
  CHECK(status(T, p, not_a_number) == table_status::bad_bound);
  CHECK(status(kelvins_between(300.0, 300.0), p, 1e-3) == table_status::bad_range);
  CHECK(status(kelvins_between(310.0, 300.0), p, 1e-3) == table_status::bad_range);
  CHECK(status(kelvins_between(-10.0, 300.0), p, 1e-3) == table_status::bad_range);
  CHECK(status(kelvins_between(280.0, infinite), p, 1e-3) == table_status::bad_range);
  CHECK(status(kelvins_between(not_a_number, 300.0), p, 1e-3) == table_status::bad_range);
  CHECK(status(T, pascals_between(1e6, 1e5), 1e-3) == table_status::bad_range);
  CHECK(status(T, pascals_between(0.0, 1e5), 1e-3) == table_status::bad_range);
  CHECK(status(T, not_a_number * units::pascals, 1e-3) == table_status::bad_range);

  // Air's slope in pressure is exact, but no table of cubics reaches 1e-12 on 2000 K.
  const auto fine = tabulate(liquid_water{}, T, p, 1e-12);
  CHECK(fine.status() == table_status::too_large);
  CHECK(fine.worst_error() > 1e-12);
  CHECK(fine.worst_error() < 1e-8);
}

TEST_CASE("a fluid with no room for a limit, and one that has no number") {
  static constexpr limit_info five[] = {
      {"a", 0.0, 1.0}, {"b", 0.0, 1.0}, {"c", 0.0, 1.0}, {"d", 0.0, 1.0}, {"e", 0.0, 1.0}};
  static constexpr fluid_info full{"full", &data_sheet, five, 5, sheet_info.uncertainty};
  const auto one = [](const auto& T, const auto&) { return 1.0 + 0.0 * T; };
  const auto f = fluid_from(one, one, one, one, one, full, expansion_at_film);
  CHECK(tabulate(f, kelvins_between(280.0, 300.0), pascals_between(1e5, 2e5), 1e-3).status() ==
        table_status::no_room);

  static constexpr limit_info wide[] = {{"T", 0.0, 1000.0}};
  static constexpr fluid_info info{"root", &data_sheet, wide, 1, sheet_info.uncertainty};
  const auto root = [](const auto& T, const auto&) {
    using number = std::remove_cvref_t<decltype(T)>;
    return math::log(number(T - 290.1));
  };
  const auto g = fluid_from(root, one, one, one, one, info, expansion_at_film);
  const auto refused = tabulate(g, kelvins_between(280.0, 300.0), pascals_between(1e5, 2e5), 1e-3);
  CHECK(refused.status() == table_status::not_finite_here);
  CHECK(refused.value() <= 290.1);
  CHECK(refused.value() >= 280.0);
}

namespace {
// Of a falling viscosity with a sharp bend, and steps from 1 to 40 K.
const std::vector<data_row>& sheet_rows() {
  static const std::vector<data_row> rows = {
      {280.0, 1100.0, 2300.0, 0.240, 5e-2, 6e-4},   {281.0, 1099.0, 2301.0, 0.241, 1e-2, 6e-4},
      {290.0, 1092.0, 2320.0, 0.250, 9.9e-3, 7e-4}, {310.0, 1080.0, 2400.0, 0.250, 9.8e-3, 8e-4},
      {350.0, 1050.0, 2500.0, 0.245, 1e-3, 9e-4},   {351.5, 1049.0, 2501.0, 0.244, 9e-4, 9.5e-4},
  };
  return rows;
}
double property_at(const fluid_values<double>& v, int wanted) {
  double y = 0.0;
  each(v, [&](int j, double x) {
    if (j == wanted) y = x;
  });
  return y;
}
double of_row(const data_row& r, int j) {
  const double all[] = {r.density, r.specific_heat, r.conductivity, r.viscosity, r.expansion};
  return all[j];
}
}  // namespace

TEST_CASE("host data: met at every row, and never overshot between") {
  const auto& rows = sheet_rows();
  const auto table = tabulate(rows, pascals_between(0.0, 1e6), sheet_info, expansion_at_film);
  REQUIRE(table.done());
  CHECK(table.worst_error() == 0.0);
  const auto view = table.view();
  static_assert(fluid<std::remove_const_t<decltype(view)>>);
  for (int j = 0; j < 5; ++j) {
    CAPTURE(j);
    for (const data_row& r : rows) {
      CHECK(close_to(property_at(view.values(r.temperature_K, 1e5), j), of_row(r, j), 1e-12));
    }
    for (std::size_t i = 0; i + 1 < rows.size(); ++i) {
      const double a = of_row(rows[i], j);
      const double b = of_row(rows[i + 1], j);
      const double sign = b > a ? 1.0 : -1.0;
      double before = a;
      for (int k = 1; k <= 50; ++k) {
        const double T =
            rows[i].temperature_K + (rows[i + 1].temperature_K - rows[i].temperature_K) * k / 50.0;
        const double y = property_at(view.values(T, 1e5), j);
        CAPTURE(T);
        CHECK(sign * (y - before) >= -1e-13 * std::fabs(y));
        before = y;
      }
    }
  }
}

TEST_CASE("host data: no jumps in value or slope at the rows") {
  const auto& rows = sheet_rows();
  const auto table = tabulate(rows, pascals_between(0.0, 1e6), sheet_info, expansion_at_film);
  using number = dual<double, 1>;
  for (std::size_t i = 1; i + 1 < rows.size(); ++i) {
    const double T = rows[i].temperature_K;
    number before[5];
    each(table.view().values(number::variable(T - 1e-9), number(1e5)),
         [&](int j, const number& y) { before[j] = y; });
    each(table.view().values(number::variable(T + 1e-9), number(1e5)), [&](int j, const number& y) {
      CAPTURE(T);
      CAPTURE(j);
      CHECK(close_to(before[j].value, y.value, 1e-5));
      CHECK(close_to(before[j].slope[0], y.slope[0], 1e-4, 1e-6 * std::fabs(y.value)));
    });
  }
}

TEST_CASE("host data: a cubic's rows give the cubic back between them") {
  // Straight lines exactly; a smooth curve to the second order at least.
  std::vector<data_row> rows;
  for (int i = 0; i <= 40; ++i) {
    const double T = 280.0 + 2.5 * i;
    rows.push_back({T, 1300.0 - T, 2.0 * T, 0.1 + 1e-3 * T, std::exp(-0.02 * T), 1e-3});
  }
  const auto table = tabulate(rows, pascals_between(1e5, 1e5), sheet_info, expansion_at_ambient);
  REQUIRE(table.done());
  CHECK(decltype(table.view())::expansion_at == expansion_rule::ambient);
  for (const double T : {280.3, 301.1, 333.9, 379.6}) {
    const auto v = table.view().values(T, 1e5);
    CHECK(close_to(v.density, 1300.0 - T, 1e-13));
    CHECK(close_to(v.specific_heat, 2.0 * T, 1e-13));
    CHECK(close_to(v.conductivity, 0.1 + 1e-3 * T, 1e-13));
    CHECK(close_to(v.viscosity, std::exp(-0.02 * T), 5e-4));
    CHECK(close_to(v.expansion, 1e-3, 1e-13));
  }
}

TEST_CASE("host data: on every number type") {
  const auto table =
      tabulate(sheet_rows(), pascals_between(0.0, 1e6), sheet_info, expansion_at_film);
  constexpr point points[8] = {{280.4, 1e5}, {285.0, 2e5}, {300.0, 1e5}, {310.1, 1e5},
                               {349.9, 1e5}, {351.0, 9e5}, {270.0, 1e5}, {400.0, 2e6}};
  on_every_number(table.view(), points, 2e-4);
}

TEST_CASE("host data: limits are the rows' and the pressures said") {
  const auto table =
      tabulate(sheet_rows(), pascals_between(1e5, 1e6), sheet_info, expansion_at_film);
  const auto view = table.view();
  CHECK(view.check(280.0, 1e5) == 0);
  CHECK(view.check(351.5, 1e6) == 0);
  CHECK(view.check(279.99, 1e5) == of_fluid(0, side::below));
  CHECK(view.check(351.51, 1e5) == of_fluid(0, side::above));
  CHECK(view.check(300.0, 0.99e5) == of_fluid(1, side::below));
  CHECK(view.check(300.0, 1.01e6) == of_fluid(1, side::above));
  CHECK(view.info()->limit_count == 2);
  CHECK(view.info()->uncertainty.density == 0.01);
  CHECK(view.info()->uncertainty.conductivity == not_stated);
  CHECK(view.values(100.0, 1e5).density == 1100.0);
}

TEST_CASE("host data: a bad row is refused by number and value") {
  const auto refused = [](std::size_t row, auto change, table_status expected, double value) {
    std::vector<data_row> rows = sheet_rows();
    change(rows[row]);
    const auto table = tabulate(rows, pascals_between(0.0, 1e6), sheet_info, expansion_at_film);
    CHECK(table.status() == expected);
    CHECK(table.row() == row);
    if (value == value) CHECK(table.value() == value);
    CHECK((table.view().check(300.0, 1e5) & detail::word::refused) != 0);
  };
  for (const std::size_t row : {std::size_t{1}, std::size_t{3}, std::size_t{5}}) {
    refused(
        row, [](data_row& r) { r.temperature_K = 100.0; }, table_status::row_not_rising, 100.0);
    refused(
        row, [](data_row& r) { r.density = infinite; }, table_status::row_not_finite, infinite);
    refused(
        row, [](data_row& r) { r.temperature_K = not_a_number; }, table_status::row_not_finite,
        not_a_number);
    refused(
        row, [](data_row& r) { r.expansion = not_a_number; }, table_status::row_not_finite,
        not_a_number);
    refused(
        row, [](data_row& r) { r.viscosity = 0.0; }, table_status::row_not_positive, 0.0);
    refused(
        row, [](data_row& r) { r.conductivity = -1.0; }, table_status::row_not_positive, -1.0);
    refused(
        row, [](data_row& r) { r.specific_heat = -1.0; }, table_status::row_not_positive, -1.0);
  }
  refused(
      0, [](data_row& r) { r.temperature_K = -5.0; }, table_status::row_not_positive, -5.0);
  refused(
      3, [](data_row& r) { r.temperature_K = 290.0; }, table_status::row_repeated, 290.0);

  const auto status = [](std::span<const data_row> rows, const pressure_span& p) {
    return tabulate(rows, p, sheet_info, expansion_at_film).status();
  };
  const std::span<const data_row> rows = sheet_rows();
  CHECK(status({}, pascals_between(0.0, 1e6)) == table_status::too_few_rows);
  CHECK(status(rows.first(1), pascals_between(0.0, 1e6)) == table_status::too_few_rows);
  CHECK(status(rows.first(2), pascals_between(0.0, 1e6)) == table_status::done);
  CHECK(status(rows, pascals_between(2e6, 1e6)) == table_status::bad_range);
  CHECK(status(rows, pascals_between(0.0, not_a_number)) == table_status::bad_range);
  std::vector<data_row> close(rows.begin(), rows.end());
  close[1].temperature_K = 280.0 + 1e-6;
  CHECK(status(close, pascals_between(0.0, 1e6)) == table_status::rows_too_uneven);
}
