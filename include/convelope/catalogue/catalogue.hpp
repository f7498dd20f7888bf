#ifndef CONVELOPE_CATALOGUE_CATALOGUE_HPP
#define CONVELOPE_CATALOGUE_CATALOGUE_HPP

#include "convelope/catalogue/entry.hpp"
#include "convelope/catalogue/find.hpp"
#include "convelope/correlations.hpp"

namespace convelope {
inline namespace v0 {
namespace catalogue {

/// Every correlation of the library, one line each.
using all = list<
    // clang-format off
    // flat plate
    flat_plate::laminar_isothermal_local,
    flat_plate::laminar_isothermal_average,
    flat_plate::laminar_isoflux_local,
    flat_plate::laminar_isoflux_average,
    flat_plate::churchill_ozoe_1973_isothermal_local,
    flat_plate::churchill_ozoe_1973_isothermal_average,
    flat_plate::churchill_ozoe_1973_isoflux_local,
    flat_plate::laminar_low_prandtl_local,
    flat_plate::turbulent_colburn_local,
    flat_plate::turbulent_colburn_average,
    flat_plate::turbulent_isoflux_local,
    flat_plate::turbulent_white_local,
    flat_plate::mixed_average,
    flat_plate::petukhov_gnielinski_turbulent_average,
    flat_plate::gnielinski_1975_combined_average,
    // flat-plate friction
    flat_plate_friction::blasius_local,
    flat_plate_friction::blasius_average,
    flat_plate_friction::power_law_local,
    flat_plate_friction::power_law_average,
    // cylinder across a stream
    cylinder_crossflow::churchill_bernstein_1977,
    cylinder_crossflow::churchill_bernstein_1977_midrange,
    // sphere, forced and natural
    sphere::whitaker_1972,
    sphere::ranz_marshall_1952,
    sphere::churchill_laminar_1983,
    sphere::churchill_1983,
    sphere::yuge_1960,
    // annular gap, inner cylinder turning
    annular_gap::taylor_gazley,
    annular_gap::becker_kaye_1962,
    annular_gap::becker_kaye_geometry_factor,
    annular_gap::tachibana_1960,
    annular_gap::aoki_1967,
    annular_gap::conduction_limit,
    // round duct
    round_duct::laminar_developed_uwt,
    round_duct::laminar_developed_uhf,
    round_duct::shah_1975_uwt_local,
    round_duct::shah_1975_uwt_mean,
    round_duct::shah_1975_uhf_local,
    round_duct::shah_1975_uhf_mean,
    round_duct::hausen_1943,
    round_duct::churchill_ozoe_1973_thermal,
    round_duct::gnielinski_laminar_uwt_local,
    round_duct::gnielinski_laminar_uwt_mean,
    round_duct::gnielinski_laminar_uhf_local,
    round_duct::gnielinski_laminar_uhf_mean,
    round_duct::dittus_boelter_mcadams,
    round_duct::petukhov_kirillov_1958,
    round_duct::gnielinski_1976,
    round_duct::gnielinski_local_entrance_local,
    round_duct::gnielinski_local_entrance_mean,
    round_duct::gnielinski_1995,
    round_duct::gnielinski_2013,
    // parallel plates
    parallel_plates::exact_developed_uwt,
    parallel_plates::exact_developed_uhf,
    parallel_plates::exact_developed_uhf_one_wall,
    parallel_plates::exact_developed_uwt_one_wall,
    parallel_plates::shah_1975_uwt_local,
    parallel_plates::shah_1975_uwt_mean,
    parallel_plates::shah_1975_uhf_local,
    parallel_plates::shah_1975_uhf_mean,
    parallel_plates::edwards_1979,
    // duct friction
    friction::hagen_poiseuille,
    friction::blasius_1913,
    friction::prandtl_karman_nikuradse,
    friction::filonenko_1954,
    friction::petukhov_1970,
    friction::konakov_1946,
    friction::drew_koo_mcadams_1932,
    friction::bhatti_shah_1987,
    friction::colebrook_1939,
    friction::haaland_1983,
    friction::churchill_1977,
    friction::entrance_length_laminar_velocity,
    friction::entrance_length_laminar_temperature,
    friction::entrance_length_turbulent_velocity,
    friction::property_correction_liquid,
    // vertical plate
    vertical_plate::churchill_chu_1975,
    vertical_plate::churchill_chu_laminar_1975,
    vertical_plate::churchill_chu_isoflux_1975,
    vertical_plate::churchill_chu_isoflux_laminar_1975,
    vertical_plate::churchill_ozoe_local_1973,
    vertical_plate::ede_1967,
    vertical_plate::lefevre_1956,
    vertical_plate::mcadams_laminar_1954,
    vertical_plate::mcadams_turbulent_1954,
    vertical_plate::raithby_hollands_1998,
    // horizontal plate, hot face up
    horizontal_plate_up::goldstein_sparrow_jones_low_1973,
    horizontal_plate_up::goldstein_sparrow_jones_1973,
    horizontal_plate_up::lloyd_moran_laminar_1974,
    horizontal_plate_up::lloyd_moran_turbulent_1974,
    horizontal_plate_up::mcadams_turbulent_1954,
    horizontal_plate_up::raithby_hollands_1998,
    // horizontal plate, hot face down
    horizontal_plate_down::mcadams_1954,
    horizontal_plate_down::radziemska_lewandowski_2001,
    horizontal_plate_down::fujii_imura_1972,
    horizontal_plate_down::raithby_hollands_1998,
    // horizontal cylinder
    horizontal_cylinder::churchill_chu_1975,
    horizontal_cylinder::churchill_chu_laminar_1975,
    horizontal_cylinder::morgan_1975,
    horizontal_cylinder::raithby_hollands_1998,
    // vertical channel
    vertical_channel::elenbaas_1942,
    vertical_channel::bar_cohen_rohsenow_isothermal_symmetric_1984,
    vertical_channel::bar_cohen_rohsenow_isothermal_one_side_1984,
    vertical_channel::bar_cohen_rohsenow_isoflux_symmetric_1984,
    vertical_channel::bar_cohen_rohsenow_isoflux_one_side_1984,
    vertical_channel::bar_cohen_rohsenow_isoflux_symmetric_midheight_1984,
    vertical_channel::bar_cohen_rohsenow_isoflux_one_side_midheight_1984,
    vertical_channel::aung_fully_developed_1972,
    vertical_channel::optimum_spacing_isothermal,
    vertical_channel::optimum_spacing_isoflux,
    // forced and natural together
    mixed::churchill_assisting_1977<>,
    mixed::churchill_opposing_1977<>>;
// clang-format on

}  // namespace catalogue
}  // namespace v0
}  // namespace convelope

#endif
