// The list of all correlations: complete, named by rule, every entry at work.
#include "convelope/catalogue/catalogue.hpp"

#include <doctest/doctest.h>

#include <algorithm>
#include <filesystem>
#include <fstream>
#include <iterator>
#include <regex>
#include <set>
#include <string>
#include <utility>
#include <vector>

#include "expected_rows.hpp"

using namespace convelope;
using catalogue::all;

namespace {

template <class C>
std::string name_of_type() {
  return __PRETTY_FUNCTION__;
}

std::vector<std::string> split(const std::string& text, char at) {
  std::vector<std::string> parts;
  std::string part;
  for (const char c : text) {
    if (c == at) {
      parts.push_back(part);
      part.clear();
    } else {
      part += c;
    }
  }
  if (!part.empty()) parts.push_back(part);
  return parts;
}

std::set<std::string> keys_of(const correlation_info& c, bool optional) {
  std::set<std::string> keys;
  for (int i = 0; i < c.input_count; ++i) {
    if (c.inputs[i].optional == optional) keys.insert(c.inputs[i].key);
  }
  return keys;
}
std::set<std::string> as_set(const std::string& semicolons) {
  const auto parts = split(semicolons, ';');
  return {parts.begin(), parts.end()};
}

bool all_of(const std::set<std::string>& these, const std::set<std::string>& in) {
  return std::includes(in.begin(), in.end(), these.begin(), these.end());
}

/// The entry's inputs from "key=value;key=value"; what is left out takes its default.
std::vector<double> inputs_from(const correlation_info& c, const std::string& example) {
  std::vector<double> x;
  for (int i = 0; i < c.input_count; ++i) {
    const input_info& in = c.inputs[i];
    double value = in.otherwise;
    for (const std::string& pair : split(example, ';')) {
      const auto eq = pair.find('=');
      if (pair.substr(0, eq) != in.key) continue;
      const std::string text = pair.substr(eq + 1);
      if (in.choices == nullptr) {
        value = std::stod(text);
        continue;
      }
      value = -1.0;
      for (int k = 0; in.choices[k] != nullptr; ++k) {
        if (text == in.choices[k]) value = k;
      }
      CHECK(value >= 0.0);
    }
    x.push_back(value);
  }
  x.resize(catalogue::most_inputs);
  return x;
}

bool is_finite(double x) { return scalar_adaptor<double>::bits_where_not_finite(x, 1) == 0; }

}  // namespace

TEST_CASE("catalogue: an id and a quantity name one correlation") {
  std::set<std::pair<std::string, std::string>> seen;
  for (const catalogue::entry& e : all::entries) {
    CAPTURE(std::string(e.info->id));
    CHECK(seen.emplace(e.info->id, e.info->quantity).second);
  }
  CHECK(seen.size() == static_cast<std::size_t>(all::count));
}

TEST_CASE("catalogue: the id is the qualified name") {
  const std::regex rule("[a-z0-9]+(-[a-z0-9]+)*/[a-z0-9]+(-[a-z0-9]+)*");
  all::for_each([&]<class C>() {
    std::string id = C::id;
    CAPTURE(id);
    CHECK(std::regex_match(id, rule));
    std::replace(id.begin(), id.end(), '-', '_');
    id.replace(id.find('/'), 1, "::");
    CHECK(name_of_type<C>().find("::" + id) != std::string::npos);
  });
}

TEST_CASE("catalogue: every correlation of the headers is listed") {
  const std::regex declared("struct\\s+(\\w+)\\s*:\\s*(public\\s+)?correlation<");
  std::string names;
  all::for_each([&]<class C>() { names += name_of_type<C>() + "\n"; });
  int found = 0;
  const auto folder =
      std::filesystem::path(CONVELOPE_SOURCE_DIR) / "include/convelope/correlations";
  for (const auto& file : std::filesystem::recursive_directory_iterator(folder)) {
    if (!file.is_regular_file()) continue;
    std::ifstream in(file.path());
    const std::string text{std::istreambuf_iterator<char>(in), {}};
    for (std::sregex_iterator i(text.begin(), text.end(), declared), end; i != end; ++i) {
      const std::string name = (*i)[1];
      CAPTURE(name);
      CHECK(names.find("::" + name) != std::string::npos);
      ++found;
    }
  }
  CHECK(found == all::count);
}

TEST_CASE("catalogue: what is said of each correlation") {
  for (const catalogue::entry& e : all::entries) {
    const correlation_info& c = *e.info;
    CAPTURE(std::string(c.id));
    CAPTURE(std::string(c.quantity));
    CHECK(std::string(c.gives) != "");
    CHECK(std::string(c.source->authors) != "");
    CHECK(std::string(c.source->where) != "");
    CHECK(c.source->year >= 1700);
    CHECK(c.source->year <= 2030);
    CHECK((c.scatter == not_stated || (c.scatter >= 0.0 && c.scatter < 1.0)));
    CHECK(c.input_count <= catalogue::most_inputs);
    CHECK(keys_of(c, false).size() + keys_of(c, true).size() ==
          static_cast<std::size_t>(c.input_count));  // no key twice
    for (int i = 0; i < c.limit_count; ++i) {
      CHECK(c.limits[i].low <= c.limits[i].high);
      CHECK(std::string(c.limits[i].symbol) != "");
    }
  }
}

TEST_CASE("catalogue: ids, quantities and keys are the agreed ones, and the examples run") {
  for (const expected::row& row : expected::rows) {
    CAPTURE(std::string(row.id));
    CAPTURE(std::string(row.quantity));
    const catalogue::match m = catalogue::find(all::entries, row.id, row.quantity);
    REQUIRE(m.how == catalogue::found::one);
    const correlation_info& c = *m.which->info;
    // No other keys, none that may be left out missing; a required one may be optional here.
    const auto required = keys_of(c, false);
    const auto optional = keys_of(c, true);
    const auto agreed = as_set(row.keys);
    const auto agreed_optional = as_set(row.optional);
    CHECK(all_of(required, agreed));
    CHECK(all_of(agreed_optional, optional));
    CHECK(required.size() + optional.size() == agreed.size() + agreed_optional.size());
    CHECK(all_of(optional, as_set(std::string(row.keys) + ";" + row.optional)));
    const auto answer = m.which->evaluate(inputs_from(c, row.example).data());
    CHECK(is_finite(answer.value));
    CHECK(answer.verdict.finite_input());
    CHECK(answer.scatter == c.scatter);
  }
}

TEST_CASE("catalogue: an entry answers as the correlation itself") {
  const auto m = catalogue::find(all::entries, "cylinder-crossflow/churchill-bernstein-1977");
  REQUIRE(m.how == catalogue::found::one);
  const double x[catalogue::most_inputs] = {2e4, 0.7};
  const auto a = m.which->evaluate(x);
  const auto b = cylinder_crossflow::churchill_bernstein_1977{}(reynolds_of<diameter>(2e4),
                                                                prandtl_number(0.7));
  CHECK(a.value == b.si());
  CHECK(a.verdict == b.verdict());
  const double outside[catalogue::most_inputs] = {2e7, 0.7};
  CHECK(m.which->evaluate(outside).verdict.correlation_crossed(0, 0, side::above));
}
