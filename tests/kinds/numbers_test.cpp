#include "convelope/kinds/numbers.hpp"

#include <doctest/doctest.h>

#include <string_view>

using namespace convelope;
using std::string_view;

namespace static_test {

template <class A, class B>
constexpr bool apart = !std::is_same_v<A, B> && !std::is_convertible_v<typed<A>, typed<B>> &&
                       !std::is_assignable_v<typed<A>&, typed<B>>;
using namespace convelope::kinds;
// qualified: the global gates have the same names
using D = convelope::kinds::diameter;
using H = convelope::kinds::height;
static_assert(apart<reynolds<D>, reynolds<H>>);
static_assert(apart<reynolds<D>, reynolds<D, convelope::kinds::mean_velocity>>);
static_assert(apart<nusselt<D>, local_nusselt<D>> && apart<nusselt<D>, nusselt<H>>);
static_assert(apart<rayleigh<D>, rayleigh<H>> && apart<rayleigh<D>, grashof<D>>);
static_assert(apart<rayleigh<D>, flux_rayleigh<D>> && apart<elenbaas, flux_elenbaas>);
static_assert(apart<convelope::kinds::darcy_friction, convelope::kinds::fanning_friction>);
static_assert(apart<graetz, convelope::kinds::thermal_entry>);
static_assert(apart<taylor, squared_taylor> && apart<richardson<D>, richardson<H>>);
static_assert(apart<biot<D>, nusselt<D>> && apart<stanton<D>, peclet<D>>);

// The gates by length, and by length and station.
static_assert(std::is_same_v<kind_of<reynolds_of<convelope::diameter>>,
                             reynolds<D, convelope::kinds::free_stream_velocity>>);
static_assert(std::is_same_v<
              kind_of<reynolds_of<convelope::hydraulic_diameter>>,
              reynolds<convelope::kinds::hydraulic_diameter, convelope::kinds::mean_velocity>>);
static_assert(
    std::is_same_v<kind_of<reynolds_of<convelope::diameter, convelope::minimum_section_velocity>>,
                   reynolds<D, convelope::kinds::minimum_section_velocity>>);
static_assert(std::is_same_v<kind_of<nusselt_of<convelope::height>>, nusselt<H>>);
static_assert(std::is_same_v<kind_of<local_nusselt_of<convelope::height>>, local_nusselt<H>>);
static_assert(std::is_same_v<kind_of<grashof_of<convelope::height>>, grashof<H>>);
static_assert(std::is_same_v<kind_of<rayleigh_of<convelope::height>>, rayleigh<H>>);
static_assert(std::is_same_v<kind_of<flux_rayleigh_of<convelope::height>>, flux_rayleigh<H>>);
static_assert(std::is_same_v<kind_of<richardson_of<convelope::height>>, richardson<H>>);
static_assert(std::is_same_v<kind_of<peclet_of<convelope::height>>, peclet<H>>);
static_assert(std::is_same_v<kind_of<stanton_of<convelope::height>>, stanton<H>>);
static_assert(std::is_same_v<kind_of<biot_of<convelope::height>>, biot<H>>);

}  // namespace static_test

TEST_CASE("a number on a length says which") {
  CHECK(string_view(kinds::reynolds<kinds::gap>::on_length) == "gap between the walls");
  CHECK(string_view(kinds::reynolds<kinds::gap>::at_velocity) == "rotor surface velocity");
  CHECK(string_view(kinds::nusselt<kinds::height>::on_length) == "height");
  CHECK(string_view(kinds::local_nusselt<kinds::distance_from_edge>::on_length) ==
        "distance from the leading edge");
}

TEST_CASE("numbers through their gates") {
  CHECK(reynolds_of<diameter>(1e4).si() == 1e4);
  CHECK(darcy_friction(0.02).si() == 0.02);
  CHECK((darcy_friction(0.02) + darcy_friction(0.01)).si() == doctest::Approx(0.03));
}
