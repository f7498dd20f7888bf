#ifndef CONVELOPE_CATALOGUE_FLUIDS_LIQUIDS_HPP
#define CONVELOPE_CATALOGUE_FLUIDS_LIQUIDS_HPP

#include "convelope/catalogue/fluid_entry.hpp"
#include "convelope/fluids/engine_oil.hpp"
#include "convelope/fluids/ethylene_glycol.hpp"
#include "convelope/fluids/glycol_water.hpp"
#include "convelope/fluids/liquid_metals.hpp"
#include "convelope/fluids/seawater.hpp"
#include "convelope/fluids/solar_salt.hpp"

// Liquids other than water, by name. Concentrations come in percent and salinities in g/kg here,
// as the tables of the trade have them.

namespace convelope {
inline namespace v0 {
namespace catalogue {

namespace detail {
inline constexpr input_info mass_percent_input{
    "x", "x", "solute, percent of the solution's mass", "", nullptr, 0.0, false};
inline constexpr input_info salinity_input{
    "S", "S", "salinity, g of salt per kg of seawater", "", nullptr, 0.0, false};
inline constexpr input_info specific_gravity_input{
    "d", "d", "specific gravity at 15.6 degC", "", nullptr, 0.0, false};

inline constexpr limit_info glycol_percent_limits[] = {{"T", 173.15, 373.15},
                                                       {"p", 0.0, 2e6},
                                                       {"x", 0.0, 60.0},
                                                       {"T/T_freeze", 1.0, unbounded},
                                                       {"p/p_boil", 1.0, unbounded}};
inline constexpr limit_info salinity_gram_limits[] = {
    {"T", 273.15, 453.15}, {"p", 0.0, 2e6}, {"S", 0.0, 150.0}, {"p/p_sat", 0.999, unbounded}};

constexpr fluid_info with_limits(const fluid_info& given, const limit_info* limits) {
  fluid_info changed = given;
  changed.limits = limits;
  return changed;
}
inline constexpr fluid_info ethylene_glycol_percent_info =
    with_limits(convelope::detail::ethylene_glycol_melinder::info, glycol_percent_limits);
inline constexpr fluid_info propylene_glycol_percent_info =
    with_limits(convelope::detail::propylene_glycol_melinder::info, glycol_percent_limits);
inline constexpr fluid_info seawater_gram_info =
    with_limits(convelope::detail::seawater_info, salinity_gram_limits);
}  // namespace detail

struct served_ethylene_glycol_water {
  static constexpr const char* id = "fluid/ethylene-glycol-water";
  static constexpr const fluid_info& info = detail::ethylene_glycol_percent_info;
  static constexpr input_info extra_inputs[] = {detail::mass_percent_input};
  static constexpr ethylene_glycol_water make(const double* x) {
    return ethylene_glycol_water(mass_fraction(0.01 * x[0]));
  }
};
struct served_propylene_glycol_water {
  static constexpr const char* id = "fluid/propylene-glycol-water";
  static constexpr const fluid_info& info = detail::propylene_glycol_percent_info;
  static constexpr input_info extra_inputs[] = {detail::mass_percent_input};
  static constexpr propylene_glycol_water make(const double* x) {
    return propylene_glycol_water(mass_fraction(0.01 * x[0]));
  }
};
struct served_seawater {
  static constexpr const char* id = "fluid/seawater";
  static constexpr const fluid_info& info = detail::seawater_gram_info;
  static constexpr input_info extra_inputs[] = {detail::salinity_input};
  static constexpr seawater make(const double* x) { return {salinity(0.001 * x[0])}; }
};
struct served_engine_oil {
  static constexpr const char* id = "fluid/engine-oil";
  static constexpr const fluid_info& info = convelope::detail::engine_oil_info;
  static constexpr engine_oil make(const double*) { return {}; }
};
struct served_ethylene_glycol {
  static constexpr const char* id = "fluid/ethylene-glycol";
  static constexpr const fluid_info& info = convelope::detail::ethylene_glycol_info;
  static constexpr ethylene_glycol make(const double*) { return {}; }
};
struct served_sodium {
  static constexpr const char* id = "fluid/sodium";
  static constexpr const fluid_info& info = convelope::detail::sodium_info;
  static constexpr sodium make(const double*) { return {}; }
};
struct served_nak78 {
  static constexpr const char* id = "fluid/nak78";
  static constexpr const fluid_info& info = convelope::detail::nak_info;
  static constexpr nak78 make(const double*) { return {}; }
};
struct served_lead {
  static constexpr const char* id = "fluid/lead";
  static constexpr const fluid_info& info = convelope::detail::lead_info;
  static constexpr lead make(const double*) { return {}; }
};
struct served_lead_bismuth {
  static constexpr const char* id = "fluid/lbe";
  static constexpr const fluid_info& info = convelope::detail::lead_bismuth_info;
  static constexpr lead_bismuth make(const double*) { return {}; }
};
struct served_mercury {
  static constexpr const char* id = "fluid/mercury";
  static constexpr const fluid_info& info = convelope::detail::mercury_info;
  static constexpr mercury make(const double*) { return {}; }
};
struct served_solar_salt {
  static constexpr const char* id = "fluid/solar-salt";
  static constexpr const fluid_info& info = convelope::detail::solar_salt_info;
  static constexpr solar_salt make(const double*) { return {}; }
};

namespace detail {
inline constexpr std::array<input_info, 4> only_T{temperature_input};
inline constexpr std::array<input_info, 4> T_and_x{temperature_input, mass_percent_input};
inline constexpr std::array<input_info, 4> T_and_S{temperature_input, salinity_input};
inline constexpr std::array<input_info, 4> T_and_d{temperature_input, specific_gravity_input};
inline constexpr std::array<limit_info, 4> glycol_range{{{"T", 173.15, 373.15}, {"x", 0.0, 60.0}}};

inline constexpr property ethylene_glycol_freezing{
    served_ethylene_glycol_water::id,
    "T_freeze",
    "freezing point, K",
    &convelope::detail::ethylene_glycol_melinder::source,
    T_and_x,
    2,
    glycol_range,
    2,
    not_stated,
    [](const double* x) { return served_ethylene_glycol_water::make(x + 1).freezing_point(x[0]); }};
inline constexpr property propylene_glycol_freezing{
    served_propylene_glycol_water::id,
    "T_freeze",
    "freezing point, K",
    &convelope::detail::propylene_glycol_melinder::source,
    T_and_x,
    2,
    glycol_range,
    2,
    not_stated,
    [](const double* x) {
      return served_propylene_glycol_water::make(x + 1).freezing_point(x[0]);
    }};
inline constexpr property seawater_saturation{
    served_seawater::id,
    "psat",
    "saturation pressure, Pa",
    &convelope::detail::seawater_source,
    T_and_S,
    2,
    {{{"T", 273.15, 453.15}, {"S", 0.0, 160.0}}},
    2,
    not_stated,
    [](const double* x) { return served_seawater::make(x + 1).saturation_pressure(x[0]); }};
inline constexpr property seawater_latent_heat{
    served_seawater::id,
    "h_fg",
    "latent heat, J/kg",
    &convelope::detail::seawater_source,
    T_and_S,
    2,
    {{{"T", 273.15, 473.15}, {"S", 0.0, 240.0}}},
    2,
    not_stated,
    [](const double* x) { return served_seawater::make(x + 1).latent_heat(x[0]); }};
inline constexpr property petroleum_heat{
    "fluid/petroleum-cragoe",
    "cp",
    basic_words[1],
    &convelope::detail::cragoe_source,
    T_and_d,
    2,
    {{petroleum_oil::limits[0], petroleum_oil::limits[1]}},
    2,
    0.04,
    [](const double* x) { return petroleum_oil::specific_heat(x[0], specific_gravity(x[1])); }};
inline constexpr property petroleum_conductivity{
    "fluid/petroleum-cragoe",
    "k",
    basic_words[2],
    &convelope::detail::cragoe_source,
    T_and_d,
    2,
    {{petroleum_oil::limits[0], petroleum_oil::limits[1]}},
    2,
    0.1,
    [](const double* x) { return petroleum_oil::conductivity(x[0], specific_gravity(x[1])); }};
inline constexpr property sodium_saturation{
    served_sodium::id,
    "psat",
    "saturation pressure, Pa",
    &convelope::detail::sodium_source,
    only_T,
    1,
    {{{"T", 864.0, 2503.7}}},
    1,
    not_stated,
    [](const double* x) { return sodium::saturation_pressure(x[0]); }};
inline constexpr property sodium_latent_heat{
    served_sodium::id,
    "h_fg",
    "latent heat, J/kg",
    &convelope::detail::sodium_source,
    only_T,
    1,
    {{{"T", 370.98, 2503.0}}},
    1,
    not_stated,
    [](const double* x) { return sodium::latent_heat(x[0]); }};
inline constexpr property sodium_tension{
    served_sodium::id,
    "sigma",
    "surface tension, N/m",
    &convelope::detail::sodium_source,
    only_T,
    1,
    {{{"T", 370.98, 2503.0}}},
    1,
    not_stated,
    [](const double* x) { return sodium::surface_tension(x[0]); }};
inline constexpr reference nak_line{
    "fitted here", 0,
    "to 849.0, 775.3, 690.4 kg/m3 at 366, 672, 1033 K, Incropera et al., table "
    "A.7",
    known::computed};
inline constexpr property nak_density_line{
    served_nak78::id,
    "rho_linear",
    "density by a straight line, kg/m3",
    &nak_line,
    only_T,
    1,
    {{{"T", 366.0, 1033.0}}},
    1,
    0.003,
    [](const double* x) { return 871.0 - 0.24 * (x[0] - 273.15); }};
}  // namespace detail

inline constexpr auto liquid_entries =
    joined(fluid_entries<served_ethylene_glycol_water>,
           std::array{entry_of_property<detail::ethylene_glycol_freezing>},
           fluid_entries<served_propylene_glycol_water>,
           std::array{entry_of_property<detail::propylene_glycol_freezing>},
           fluid_entries<served_seawater>,
           std::array{entry_of_property<detail::seawater_saturation>,
                      entry_of_property<detail::seawater_latent_heat>},
           fluid_entries<served_engine_oil>,
           std::array{entry_of_property<detail::petroleum_heat>,
                      entry_of_property<detail::petroleum_conductivity>},
           fluid_entries<served_ethylene_glycol>, fluid_entries<served_sodium>,
           std::array{entry_of_property<detail::sodium_saturation>,
                      entry_of_property<detail::sodium_latent_heat>,
                      entry_of_property<detail::sodium_tension>},
           fluid_entries<served_nak78>, std::array{entry_of_property<detail::nak_density_line>},
           fluid_entries<served_lead>, fluid_entries<served_lead_bismuth>,
           fluid_entries<served_mercury>, fluid_entries<served_solar_salt>);

}  // namespace catalogue
}  // namespace v0
}  // namespace convelope

#endif
