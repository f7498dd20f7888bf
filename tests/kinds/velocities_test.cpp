#include "convelope/kinds/velocities.hpp"

#include <doctest/doctest.h>

#include "convelope/kinds/lengths.hpp"

using namespace convelope;

namespace static_test {
static_assert(velocity_kind<kinds::mean_velocity> && velocity_kind<kinds::rotor_surface_velocity>);
static_assert(!velocity_kind<kinds::diameter>);
static_assert(measures_a_velocity<typed<kinds::free_stream_velocity>>);
static_assert(!measures_a_velocity<typed<kinds::diameter>> && !measures_a_velocity<double>);
using mean = typed<kinds::mean_velocity>;
using stream = typed<kinds::free_stream_velocity>;
static_assert(!std::is_convertible_v<mean, stream> && !std::is_constructible_v<mean, stream>);
}  // namespace static_test

TEST_CASE("velocities of either sign") {
  const auto u = free_stream_velocity(-2.0 * units::metre_per_second);
  CHECK(u.si() == -2.0);
  CHECK((u + u).si() == -4.0);
  CHECK(minimum_section_velocity(3.0 * units::metre_per_second).si() == 3.0);
}
