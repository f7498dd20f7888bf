#include "convelope/kinds.hpp"

#include <doctest/doctest.h>

#include <map>
#include <set>
#include <string>

using namespace convelope;
namespace k = convelope::kinds;
namespace si = boost::units::si;

namespace {

template <class... K>
struct list {};
// Every kind; the groups stand on one length.
using all = list<
    k::diameter, k::hydraulic_diameter, k::plate_length, k::distance_from_edge, k::height,
    k::area_over_perimeter, k::plate_side, k::strip_width, k::gap, k::radius, k::duct_length,
    k::distance_from_inlet, k::coil_diameter, k::roughness, k::pressure, k::density,
    k::specific_heat, k::conductivity, k::viscosity, k::kinematic_viscosity, k::thermal_diffusivity,
    k::expansion_coefficient, k::surface_tension, k::gravity, k::reynolds<k::diameter>, k::prandtl,
    k::nusselt<k::diameter>, k::local_nusselt<k::diameter>, k::grashof<k::diameter>,
    k::rayleigh<k::diameter>, k::flux_rayleigh<k::diameter>, k::elenbaas, k::flux_elenbaas,
    k::richardson<k::diameter>, k::peclet<k::diameter>, k::graetz, k::thermal_entry,
    k::stanton<k::diameter>, k::biot<k::diameter>, k::dean, k::taylor, k::squared_taylor,
    k::darcy_friction, k::fanning_friction, k::length_ratio, k::local_skin_friction,
    k::skin_friction, k::gap_ratio, k::gap_geometry_factor, k::radius_ratio, k::relative_roughness,
    k::viscosity_ratio, k::prandtl_ratio, k::temperature_ratio, k::wall_excess_ratio,
    k::gap_over_height, k::blending_exponent, k::entrance_factor, k::local_entrance_factor,
    k::velocity_entry_ratio, k::thermal_entry_ratio, k::friction_correction, k::transition_reynolds,
    k::heat_flux, k::film_coefficient, k::local_film_coefficient, k::flux_slope, k::area_resistance,
    k::mass_flux, k::mass_flow, k::wall_temperature, k::film_temperature, k::bulk_temperature,
    k::free_stream_temperature, k::ambient_temperature, k::saturation_temperature,
    k::adiabatic_wall_temperature, k::temperature_difference, k::free_stream_velocity,
    k::mean_velocity, k::minimum_section_velocity, k::rotor_surface_velocity>;

template <class... K, class F>
void for_each_kind(list<K...>, F f) {
  (f.template operator()<K>(), ...);
}

// The text beside the type.
template <class K>
const char* unit_text() {
  using U = typename K::unit_type;
  const auto is = []<class V>(const V&) { return std::is_same_v<U, V>; };
  using namespace convelope::units;
  if (std::is_same_v<U, unit_types::absolute_temperature>) return "K";
  if (is(si::dimensionless())) return "1";
  if (is(metre)) return "m";
  if (is(metre_per_second)) return "m/s";
  if (is(si::acceleration())) return "m/s2";
  if (is(pascals)) return "Pa";
  if (is(kilogram_per_cubic_metre)) return "kg/m3";
  if (is(joule_per_kilogram_kelvin)) return "J/(kg K)";
  if (is(watt_per_metre_kelvin)) return "W/(m K)";
  if (is(pascal_second)) return "Pa s";
  if (is(square_metre_per_second)) return "m2/s";
  if (is(per_kelvin)) return "1/K";
  if (is(newton_per_metre)) return "N/m";
  if (is(watt_per_square_metre)) return "W/m2";
  if (is(watt_per_square_metre_kelvin)) return "W/(m2 K)";
  if (is(square_metre_kelvin_per_watt)) return "m2 K/W";
  if (is(kilogram_per_square_metre_second)) return "kg/(m2 s)";
  if (is(kilogram_per_second)) return "kg/s";
  if (is(kelvin_difference)) return "K";
  return "no text for this unit";
}

}  // namespace

TEST_CASE("every kind has a symbol, words of its own, and its unit as text") {
  std::set<std::string> words;
  std::map<std::string, std::string> symbols;
  for_each_kind(all{}, [&]<class K>() {
    static_assert(kind<K>);
    CAPTURE(std::string(K::words));
    CHECK(std::string(K::symbol) != "");
    CHECK(std::string(K::words) != "");
    CHECK(words.insert(K::words).second);
    const std::string first_of_symbol = symbols.emplace(K::symbol, K::words).first->second;
    CHECK(first_of_symbol == K::words);
    CHECK(std::string(K::unit) == unit_text<K>());
    // Plain text for tables and case files.
    for (const char c : std::string(K::symbol) + K::words) CHECK((c >= ' ' && c <= '~'));
  });
}

TEST_CASE("every kind is a trivial number of its unit") {
  for_each_kind(all{}, []<class K>() {
    static_assert(sizeof(typed<K>) == sizeof(double));
    static_assert(std::is_trivially_copyable_v<typed<K>>);
    const auto x = typed<K>::from_si(1.5);
    static_assert(
        std::is_same_v<typename decltype(x.quantity())::unit_type, typename K::unit_type>);
    CHECK(gate<K>{}(x.quantity()).si() == 1.5);
  });
}
