#include "convelope/estimate/info.hpp"

#include <doctest/doctest.h>

#include <limits>
#include <set>
#include <string_view>

using namespace convelope;

namespace static_test {
// A finite marker: infinity would vanish under -ffast-math.
static_assert(unbounded == std::numeric_limits<double>::max());
static_assert(not_stated < 0.0);
static_assert(reference{"a", 1, "b", known::quoted}.note[0] == 0);
}  // namespace static_test

TEST_CASE("every rule and every degree of knowing has words of its own") {
  std::set<std::string_view> seen;
  for (const state_rule r : {state_rule::film, state_rule::bulk, state_rule::free_stream,
                             state_rule::free_stream_with_wall, state_rule::wall,
                             state_rule::eckert, state_rule::mean_of_walls, state_rule::none}) {
    seen.insert(words(r));
  }
  CHECK(seen.size() == 8);
  CHECK(seen.count("film temperature") == 1);
  CHECK(seen.count("no properties") == 1);
  seen.clear();
  for (const known k : {known::seen_in_source, known::quoted, known::computed, known::recalled}) {
    seen.insert(words(k));
  }
  CHECK(seen.size() == 4);
  CHECK(seen.count("from memory") == 1);
}
