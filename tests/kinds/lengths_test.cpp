#include "convelope/kinds/lengths.hpp"

#include <doctest/doctest.h>

#include "convelope/kinds/matter.hpp"

using namespace convelope;

namespace static_test {

static_assert(length_kind<kinds::diameter> && length_kind<kinds::roughness>);
static_assert(!length_kind<kinds::pressure> && !length_kind<kinds::mean_velocity>);
static_assert(measures_a_length<typed<kinds::gap>> && !measures_a_length<typed<kinds::density>>);
static_assert(!measures_a_length<double>);

// What a Reynolds number on each length takes by default.
template <class L, class V>
constexpr bool flows_at = std::is_same_v<typename L::velocity, V>;
static_assert(flows_at<kinds::diameter, kinds::free_stream_velocity>);
static_assert(flows_at<kinds::plate_length, kinds::free_stream_velocity>);
static_assert(flows_at<kinds::distance_from_edge, kinds::free_stream_velocity>);
static_assert(flows_at<kinds::height, kinds::free_stream_velocity>);
static_assert(flows_at<kinds::hydraulic_diameter, kinds::mean_velocity>);
static_assert(flows_at<kinds::duct_length, kinds::mean_velocity>);
static_assert(flows_at<kinds::distance_from_inlet, kinds::mean_velocity>);
static_assert(flows_at<kinds::roughness, kinds::mean_velocity>);
static_assert(flows_at<kinds::gap, kinds::rotor_surface_velocity>);

}  // namespace static_test

TEST_CASE("each length through its own gate") {
  const auto x = 0.3 * units::metre;
  CHECK(diameter(x).si() == 0.3);
  static_assert(std::is_same_v<decltype(plate_side(x)), typed<kinds::plate_side>>);
  static_assert(std::is_same_v<decltype(strip_width(x)), typed<kinds::strip_width>>);
  static_assert(std::is_same_v<decltype(coil_diameter(x)), typed<kinds::coil_diameter>>);
  static_assert(std::is_same_v<decltype(radius(x)), typed<kinds::radius>>);
}
