// The list of all fluids: complete, named by rule, and never a number without a flag outside what
// the number was made for.
#include "convelope/catalogue/fluids.hpp"

#include <doctest/doctest.h>

#include <cmath>
#include <filesystem>
#include <fstream>
#include <iterator>
#include <limits>
#include <regex>
#include <set>
#include <string>
#include <utility>
#include <vector>

#include "convelope/catalogue/catalogue.hpp"
#include "convelope/catalogue/fluid_entry.hpp"
#include "convelope/catalogue/text.hpp"

using namespace convelope;
using catalogue::all_fluids;

namespace {

using inputs = std::vector<double>;

const limit_info* limit_on(const correlation_info& c, const std::string& key) {
  for (int i = 0; i < c.limit_count; ++i) {
    if (key == c.limits[i].symbol) return &c.limits[i];
  }
  return nullptr;
}

bool is_finite(double x) { return scalar_adaptor<double>::bits_where_not_finite(x, 1) == 0; }

/// Numbers for an input: across its limit and well beyond, and for p and rho those of gases
/// and liquids.
inputs numbers_for(const correlation_info& c, const input_info& in) {
  const std::string key = in.key;
  inputs x{in.otherwise};
  if (key == "p") x.insert(x.end(), {1.0, 500.0, 2e4, 101325.0, 1e6, 5e6, 2e7, 9e7});
  if (key == "rho") x.insert(x.end(), {1.0, 50.0, 322.0, 500.0, 900.0});
  if (const limit_info* l = limit_on(c, key)) {
    const double high = l->high >= unbounded ? 2.0 * std::fabs(l->low) + 1.0 : l->high;
    for (const double part : {-0.3, 0.01, 0.05, 0.2, 0.4, 0.6, 0.8, 0.99, 1.4}) {
      x.push_back(l->low + part * (high - l->low));
    }
  }
  return x;
}

/// Calls act(inputs) for each combination.
template <class Act>
void each_state(const correlation_info& c, Act act) {
  std::vector<inputs> choices;
  for (int i = 0; i < c.input_count; ++i) choices.push_back(numbers_for(c, c.inputs[i]));
  std::vector<std::size_t> at(choices.size(), 0);
  for (;;) {
    inputs x;
    for (std::size_t i = 0; i < at.size(); ++i) x.push_back(choices[i][at[i]]);
    x.resize(catalogue::most_inputs, 0.0);
    act(x);
    std::size_t i = 0;
    while (i < at.size() && ++at[i] == choices[i].size()) at[i++] = 0;
    if (i == at.size()) return;
  }
}

std::string name(const catalogue::entry& e) {
  return std::string(e.info->id) + " " + e.info->quantity;
}

}  // namespace

TEST_CASE("fluids by name: an id and a quantity name one property, and no correlation") {
  std::set<std::pair<std::string, std::string>> seen;
  const std::regex rule("fluid/[a-zA-Z0-9]+(-[a-zA-Z0-9]+)*");
  for (const catalogue::entry& e : all_fluids) {
    CAPTURE(name(e));
    CHECK(seen.emplace(e.info->id, e.info->quantity).second);
    CHECK(std::regex_match(e.info->id, rule));
    CHECK(catalogue::detail::is_property(*e.info));
    CHECK(catalogue::find(all_fluids, e.info->id, e.info->quantity).which == &e);
  }
  for (const catalogue::entry& e : catalogue::all::entries) {
    CHECK_FALSE(catalogue::detail::is_property(*e.info));
  }
}

TEST_CASE("fluids by name: every fluid of the headers is served") {
  // Those that are made of a host's numbers have no name to be served by.
  const std::set<std::string> of_a_host{"constant_properties.hpp", "host_fluid.hpp",
                                        "tabulated.hpp", "fluid.hpp", "table_status.hpp"};
  std::string read;
  const auto folder = std::filesystem::path(CONVELOPE_SOURCE_DIR) / "include/convelope";
  for (const char* part : {"gases", "liquids", "water"}) {
    std::ifstream in(folder / "catalogue" / (std::string("fluids_") + part + ".hpp"));
    read.append(std::istreambuf_iterator<char>(in), {});
  }
  std::ifstream in(folder / "fluids.hpp");
  const std::string umbrella{std::istreambuf_iterator<char>(in), {}};
  // saturated_water.hpp brings steam.hpp and liquid_water.hpp along.
  read += "\"convelope/fluids/steam.hpp\" \"convelope/fluids/liquid_water.hpp\"";
  int found = 0;
  for (const auto& file : std::filesystem::directory_iterator(folder / "fluids")) {
    if (!file.is_regular_file()) continue;
    const std::string header = file.path().filename().string();
    CAPTURE(header);
    const std::string quoted = "\"convelope/fluids/" + header + "\"";
    if (of_a_host.count(header) == 0) {
      CHECK(read.find(quoted) != std::string::npos);
      ++found;
    }
    const bool allocates = header == "tabulated.hpp" || header == "table_status.hpp";
    CHECK((umbrella.find(quoted) != std::string::npos) == !allocates);
  }
  CHECK(found >= 19);
}

TEST_CASE("fluids by name: what is said of each property") {
  const std::set<std::string> plain_numbers{"Pr"};
  for (const catalogue::entry& e : all_fluids) {
    const correlation_info& c = *e.info;
    CAPTURE(name(e));
    CHECK(std::string(c.source->authors) != "");
    CHECK(std::string(c.source->where) != "");
    CHECK((c.scatter == not_stated || (c.scatter > 0.0 && c.scatter < 0.5)));
    CHECK(c.input_count >= 1);
    CHECK(c.limit_count >= 1);
    CHECK(catalogue::detail::unit_of(c).empty() == (plain_numbers.count(c.quantity) == 1));
    std::set<std::string> keys;
    for (int i = 0; i < c.input_count; ++i) CHECK(keys.insert(c.inputs[i].key).second);
    for (int i = 0; i < c.limit_count; ++i) CHECK(c.limits[i].low <= c.limits[i].high);
  }
}

TEST_CASE("fluids by name: outside the envelope, and for what is no number, a raised verdict") {
  const volatile double nan = std::numeric_limits<double>::quiet_NaN();
  const volatile double infinity = std::numeric_limits<double>::infinity();
  int states = 0;
  for (const catalogue::entry& e : all_fluids) {
    const correlation_info& c = *e.info;
    CAPTURE(name(e));
    inputs good;
    std::vector<bool> crossed(static_cast<std::size_t>(c.limit_count), false);
    bool silent = false;
    each_state(c, [&](const inputs& x) {
      const catalogue::answer a = e.evaluate(x.data());
      ++states;
      bool beyond = false;
      for (int i = 0; i < c.input_count; ++i) {
        const limit_info* l = limit_on(c, c.inputs[i].key);
        const double at = x[static_cast<std::size_t>(i)];
        beyond = beyond || (l != nullptr && !(at >= l->low && at <= l->high));
      }
      for (int i = 0; i < c.limit_count; ++i) {
        if (a.verdict.correlation_crossed(0, i, side::below) ||
            a.verdict.correlation_crossed(0, i, side::above)) {
          crossed[static_cast<std::size_t>(i)] = true;
        }
      }
      silent = silent || (a.verdict.inside() && (beyond || !is_finite(a.value)));
      if (good.empty() && a.verdict.inside() && is_finite(a.value)) good = x;
    });
    CHECK_FALSE(silent);
    REQUIRE_FALSE(good.empty());
    for (int i = 0; i < c.limit_count; ++i) {
      CAPTURE(c.limits[i].symbol);
      CHECK(crossed[static_cast<std::size_t>(i)]);
    }
    CHECK(e.evaluate(good.data()).scatter == c.scatter);
    // From a good state, one input at a time.
    for (int i = 0; i < c.input_count; ++i) {
      const auto at = static_cast<std::size_t>(i);
      CAPTURE(c.inputs[i].key);
      const auto with = [&](double value) {
        inputs x = good;
        x[at] = value;
        return e.evaluate(x.data()).verdict;
      };
      CHECK_FALSE(with(nan).inside());
      CHECK_FALSE(with(nan).finite_input());
      CHECK_FALSE(with(infinity).inside());
      CHECK_FALSE(with(-infinity).inside());
      CHECK_FALSE(with(1e13).inside());
      if (good[at] > 0.0 || !c.inputs[i].optional) CHECK_FALSE(with(-1e13).inside());
      const limit_info* l = limit_on(c, c.inputs[i].key);
      if (l == nullptr) continue;
      CHECK_FALSE(with(l->low - 1e-9 * (std::fabs(l->low) + 1.0)).inside());
      CHECK_FALSE(with(l->high + 1e-9 * (std::fabs(l->high) + 1.0)).inside());
    }
  }
  CHECK(states > 5000);
}
