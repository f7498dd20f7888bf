#include "convelope/kinds/humidity.hpp"

#include <doctest/doctest.h>

#include <type_traits>

using namespace convelope;

template <class A>
concept enters = requires(A a) { relative_humidity(a); };
static_assert(enters<double>);
static_assert(!enters<int>, "50 would be a percentage: relative humidity is 0 .. 1");
static_assert(!std::is_same_v<decltype(relative_humidity(0.5)), decltype(humidity_ratio(0.5))>);

TEST_CASE("humidities are pure numbers") {
  CHECK(relative_humidity(0.5).si() == 0.5);
  CHECK(humidity_ratio(0.01).si() == 0.01);
}
