#ifndef CONVELOPE_TESTS_PUBLISHED_FLUID_ROWS_HPP
#define CONVELOPE_TESTS_PUBLISHED_FLUID_ROWS_HPP

#include <doctest/doctest.h>

#include <cstdlib>
#include <fstream>
#include <span>
#include <string>
#include <vector>

#include "../fluids/close_to.hpp"
#include "convelope/catalogue/find.hpp"

// Published check values of fluids, one a line:
// fluid,inputs,quantity,expected,rel_tol,origin with inputs as in T=300;p=1e5.

namespace fluid_rows {

struct row {
  std::string fluid;
  std::string inputs;
  std::string quantity;
  std::string expected;
  std::string rel_tol;
  std::string origin;
};

/// What stands before `mark`, taken off the front of `text`.
inline std::string take(std::string& text, char mark) {
  const std::size_t end = text.find(mark);
  std::string head = text.substr(0, end);
  text = end == std::string::npos ? "" : text.substr(end + 1);
  return head;
}

inline row row_of(std::string line) {
  row r;
  r.fluid = take(line, ',');
  r.inputs = take(line, ',');
  r.quantity = take(line, ',');
  r.expected = take(line, ',');
  r.rel_tol = take(line, ',');
  r.origin = line;
  return r;
}

/// A file of tests/published; none if it can't be read or its head is another.
inline std::vector<row> read(const std::string& name) {
  std::vector<row> rows;
  std::ifstream file(CONVELOPE_SOURCE_DIR "/tests/published/" + name);
  std::string line;
  if (!std::getline(file, line) || line != "fluid,inputs,quantity,expected,rel_tol,origin") {
    return rows;
  }
  while (std::getline(file, line)) {
    if (!line.empty()) rows.push_back(row_of(line));
  }
  return rows;
}

inline bool is_number(const std::string& text, double& value) {
  char* end = nullptr;
  value = std::strtod(text.c_str(), &end);
  return !text.empty() && *end == 0;
}

/// What is wrong with a row, or "".
inline std::string complaint(const row& r, std::span<const convelope::catalogue::entry> entries) {
  using namespace convelope;
  const catalogue::match m = catalogue::find(entries, "fluid/" + r.fluid, r.quantity);
  if (m.how == catalogue::found::no_such_id) return "no such fluid: " + r.fluid;
  if (m.how != catalogue::found::one) return "not one quantity: " + r.quantity;
  const correlation_info& info = *m.which->info;
  std::vector<double> x(catalogue::most_inputs, 0.0);
  std::vector<bool> given(catalogue::most_inputs, false);
  std::string rest = r.inputs;
  while (!rest.empty()) {
    std::string value = take(rest, ';');
    const std::string key = take(value, '=');
    int i = 0;
    while (i < info.input_count && key != info.inputs[i].key) ++i;
    if (i == info.input_count) return "no such input: " + key;
    const auto at = static_cast<std::size_t>(i);
    if (given[at] || !is_number(value, x[at])) return "not one number: " + key;
    given[at] = true;
  }
  for (int i = 0; i < info.input_count; ++i) {
    const auto at = static_cast<std::size_t>(i);
    if (given[at]) continue;
    if (!info.inputs[i].optional) return std::string("input left out: ") + info.inputs[i].key;
    x[at] = info.inputs[i].otherwise;
  }
  double expected = 0.0;
  double tolerance = 0.0;
  if (!is_number(r.expected, expected)) return "not a number: " + r.expected;
  if (!is_number(r.rel_tol, tolerance) || !(tolerance > 0.0 && tolerance < 0.5)) {
    return "not a tolerance: " + r.rel_tol;
  }
  if (r.origin.empty()) return "no origin";
  const double seen = m.which->evaluate(x.data()).value;
  if (!close_to(seen, expected, tolerance)) {
    return "off by " + std::to_string(100.0 * (seen / expected - 1.0)) + " %";
  }
  return "";
}

/// Every row of the file holds, and there are `count` of them.
inline void check(const std::string& name, std::size_t count,
                  std::span<const convelope::catalogue::entry> entries) {
  const std::vector<row> rows = read(name);
  CHECK(rows.size() == count);
  for (const row& r : rows) {
    CAPTURE(r.fluid);
    CAPTURE(r.inputs);
    CAPTURE(r.quantity);
    CAPTURE(r.origin);
    CHECK(complaint(r, entries) == "");
  }
}

/// The reader itself: a good row (its expected value true) passes, and each mistake is seen.
inline void check_reader(const row& good, std::span<const convelope::catalogue::entry> entries) {
  CHECK(complaint(good, entries) == "");
  const auto bad = [&](auto change) {
    row r = good;
    change(r);
    CHECK(complaint(r, entries) != "");
  };
  bad([](row& r) { r.fluid = "no-such-fluid"; });
  bad([](row& r) { r.quantity = "no-such-quantity"; });
  bad([](row& r) { r.inputs += ";no-such-key=1"; });
  bad([](row& r) { r.inputs = ""; });
  bad([](row& r) { r.inputs += "x"; });
  bad([](row& r) { r.expected = "1e300"; });
  bad([](row& r) { r.expected = ""; });
  bad([](row& r) { r.rel_tol = "0"; });
  bad([](row& r) { r.origin = ""; });
  CHECK(read("no_such_file.csv").empty());
}

}  // namespace fluid_rows

#endif
