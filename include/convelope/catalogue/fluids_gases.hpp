#ifndef CONVELOPE_CATALOGUE_FLUIDS_GASES_HPP
#define CONVELOPE_CATALOGUE_FLUIDS_GASES_HPP

#include <cmath>

#include "convelope/catalogue/fluid_entry.hpp"
#include "convelope/fluids/argon.hpp"
#include "convelope/fluids/carbon_dioxide.hpp"
#include "convelope/fluids/detail/lemmon_jacobsen.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/fluids/helium.hpp"
#include "convelope/fluids/humid_air.hpp"
#include "convelope/fluids/hydrogen.hpp"
#include "convelope/fluids/nitrogen.hpp"
#include "convelope/fluids/oxygen.hpp"
#include "convelope/fluids/real_air.hpp"

// Gases by name: fluids of temperature and pressure, and the published equations behind them as
// functions of temperature and density.

namespace convelope {
inline namespace v0 {
namespace catalogue {

struct served_air {
  static constexpr const char* id = "fluid/air";
  static constexpr const fluid_info& info = convelope::detail::dry_air_info;
  static constexpr dry_air make(const double*) { return {}; }
};
struct served_nitrogen {
  static constexpr const char* id = "fluid/nitrogen";
  static constexpr const fluid_info& info = convelope::detail::nitrogen_info;
  static constexpr nitrogen make(const double*) { return {}; }
};
struct served_oxygen {
  static constexpr const char* id = "fluid/oxygen";
  static constexpr const fluid_info& info = convelope::detail::oxygen_info;
  static constexpr oxygen make(const double*) { return {}; }
};
struct served_argon {
  static constexpr const char* id = "fluid/argon";
  static constexpr const fluid_info& info = convelope::detail::argon_info;
  static constexpr argon make(const double*) { return {}; }
};
struct served_carbon_dioxide {
  static constexpr const char* id = "fluid/carbon-dioxide";
  static constexpr const fluid_info& info = convelope::detail::carbon_dioxide_info;
  static constexpr carbon_dioxide make(const double*) { return {}; }
};
struct served_helium {
  static constexpr const char* id = "fluid/helium";
  static constexpr const fluid_info& info = convelope::detail::helium_info;
  static constexpr helium make(const double*) { return {}; }
};
struct served_hydrogen {
  static constexpr const char* id = "fluid/hydrogen";
  static constexpr const fluid_info& info = convelope::detail::hydrogen_info;
  static constexpr hydrogen make(const double*) { return {}; }
};
struct served_real_air {
  static constexpr const char* id = "fluid/real-air";
  static constexpr const fluid_info& info = convelope::detail::real_air_info;
  static constexpr real_air make(const double*) { return {}; }
};
struct served_humid_air {
  static constexpr const char* id = "fluid/humid-air";
  static constexpr const fluid_info& info = convelope::detail::humid_air_info;
  static constexpr input_info extra_inputs[] = {
      {"phi", "phi", "relative humidity, 0 .. 1", "", nullptr, 0.0, false}};
  static constexpr humid_air<kinds::relative_humidity> make(const double* x) {
    return {relative_humidity(x[0])};
  }
};

namespace detail {
inline constexpr input_info molar_density_input{
    "rhom", "rhom", "molar density, mol/m3", "", nullptr, 0.0, false};
inline constexpr input_info density_input{"rho", "rho", "density, kg/m3", "", nullptr, 0.0, false};

inline constexpr reference air_equation_source{
    "E. W. Lemmon, R. T Jacobsen, S. G. Penoncello, D. G. Friend", 2000,
    "J. Phys. Chem. Ref. Data 29 (2000) 331-385", known::quoted,
    "one phase only: between bubble and dew line the numbers mean nothing, and are flagged where "
    "the equation is unstable"};
inline constexpr reference lemmon_jacobsen_source{
    "E. W. Lemmon, R. T Jacobsen", 2004,
    "Int. J. Thermophys. 25 (2004) 21-69, with the critical enhancement by Lemmon et al. 2000 "
    "(air), "
    "Span et al. 2000 (nitrogen), Schmidt, Wagner 1985 (oxygen), Tegeler et al. 1999 (argon)",
    known::quoted, "one phase only; near the critical point the conductivity is less certain"};
inline constexpr reference standard_atmosphere_source{
    "U.S. Committee on Extension to the Standard Atmosphere", 1976,
    "U.S. Standard Atmosphere, 1976, eqs. 51 and 53", known::recalled,
    "compared with Lemmon and Jacobsen 2004 viscosity is 2 % low at 600 K and 9 % at 2000 K"};
inline constexpr reference fenghour_source{"A. Fenghour, W. A. Wakeham, V. Vesovic", 1998,
                                           "J. Phys. Chem. Ref. Data 27 (1998) 31-44",
                                           known::quoted, "without the critical enhancement"};
inline constexpr reference laesecke_muzny_source{
    "A. Laesecke, C. D. Muzny", 2017, "J. Phys. Chem. Ref. Data 46 (2017) 013107", known::quoted,
    "above zero density fitted between 220 and 700 K"};
inline constexpr reference huber_source{"M. L. Huber, E. A. Sykioti, M. J. Assael, R. A. Perkins",
                                        2016, "J. Phys. Chem. Ref. Data 45 (2016) 013102",
                                        known::quoted, "without the critical enhancement"};
inline constexpr reference span_wagner_source{
    "R. Span, W. Wagner", 1996, "J. Phys. Chem. Ref. Data 25 (1996) 1509-1596", known::recalled};
inline constexpr reference assael_source{
    "M. J. Assael, J.-A. M. Assael, M. L. Huber, R. A. Perkins, Y. Takata", 2011,
    "J. Phys. Chem. Ref. Data 40 (2011) 033101", known::quoted, "without the critical enhancement"};
inline constexpr reference hyland_wexler_source{"R. W. Hyland, A. Wexler", 1983,
                                                "ASHRAE Trans. 89 (1983) 500-519", known::quoted,
                                                "over liquid water"};

/// Of the inputs T, rhom.
inline convelope::detail::helmholtz::state<double> air_state(const double* x) {
  using convelope::detail::air_equation;
  const double inverse = 1.0 / x[0];
  return convelope::detail::helmholtz::state_of<air_equation>(
      x[1], x[0], inverse, air_equation::ideal_heat(x[0], inverse, std::sqrt(x[0])));
}
template <class Gas>
double lemmon_jacobsen_viscosity(const double* x) {
  return 1e-6 * convelope::detail::background<Gas>(x[1], x[0], 1.0 / x[0]).viscosity;
}
template <class Gas>
double lemmon_jacobsen_conductivity(const double* x) {
  const auto b = convelope::detail::background<Gas>(x[1], x[0], 1.0 / x[0]);
  return 1e-3 *
         (b.conductivity + convelope::detail::critical_enhancement<Gas>(x[1], x[0], b.viscosity));
}
}  // namespace detail

namespace detail {
inline constexpr limit_info air_equation_limits[] = {
    {"T", 59.75, 2000.0}, {"rhom", 0.0, 33.1e3}, {"dp/drho", 0.0, unbounded}};
constexpr property of_air_equation(const char* quantity, const char* gives, double uncertainty,
                                   double (*value)(const double*)) {
  return {"fluid/air-eos",
          quantity,
          gives,
          &air_equation_source,
          {temperature_input, molar_density_input},
          2,
          {{air_equation_limits[0], air_equation_limits[1], air_equation_limits[2]}},
          3,
          uncertainty,
          value};
}
/// With the third limit, which no single input has.
template <const property& P>
answer evaluate_air_equation(const double* x) {
  namespace word = convelope::detail::word;
  const answer a = evaluate_property<P>(x);
  const bool stable = air_state(x).stiffness > 0.0;
  return {a.value,
          verdict<>(a.verdict.bits() | (stable ? 0 : word::of_correlation(0, 2, side::below))),
          a.scatter};
}
template <const property& P>
inline constexpr entry air_equation_entry{&property_record<P>, &evaluate_air_equation<P>};
}  // namespace detail

inline constexpr property air_eos_pressure = detail::of_air_equation(
    "p", "pressure, Pa", 0.001, [](const double* x) { return detail::air_state(x).pressure; });
inline constexpr property air_eos_cv = detail::of_air_equation(
    "cv", "heat capacity at constant volume, J/(mol K)", 0.01, [](const double* x) {
      return convelope::detail::air_equation::gas_constant * detail::air_state(x).cv_over_R;
    });
inline constexpr property air_eos_cp = detail::of_air_equation(
    "cp", "heat capacity at constant pressure, J/(mol K)", 0.01, [](const double* x) {
      return convelope::detail::air_equation::gas_constant * detail::air_state(x).cp_over_R;
    });
inline constexpr property air_eos_sound =
    detail::of_air_equation("w", "speed of sound, m/s", 0.002, [](const double* x) {
      using convelope::detail::air_equation;
      const auto s = detail::air_state(x);
      return std::sqrt(s.stiffness * s.cp_over_R / s.cv_over_R * air_equation::gas_constant * x[0] /
                       air_equation::molar_mass);
    });
inline constexpr property air_lj_viscosity{
    "fluid/air-lj",
    "mu",
    "dynamic viscosity, Pa s",
    &detail::lemmon_jacobsen_source,
    {temperature_input, detail::molar_density_input},
    2,
    {{{"T", 59.75, 2000.0}, {"rhom", 0.0, 33.1e3}}},
    2,
    0.02,
    &detail::lemmon_jacobsen_viscosity<convelope::detail::air_transport>};
inline constexpr property air_lj_conductivity{
    "fluid/air-lj",
    "k",
    "conductivity, W/(m K)",
    &detail::lemmon_jacobsen_source,
    {temperature_input, detail::molar_density_input},
    2,
    {{{"T", 59.75, 2000.0}, {"rhom", 0.0, 33.1e3}}},
    2,
    0.02,
    &detail::lemmon_jacobsen_conductivity<convelope::detail::air_transport>};
inline constexpr property nitrogen_lj_viscosity{
    "fluid/nitrogen-lj",
    "mu",
    "dynamic viscosity, Pa s",
    &detail::lemmon_jacobsen_source,
    {temperature_input, detail::molar_density_input},
    2,
    {{{"T", 63.151, 1000.0}, {"rhom", 0.0, 31.0e3}}},
    2,
    0.02,
    &detail::lemmon_jacobsen_viscosity<convelope::detail::nitrogen_transport>};
inline constexpr property nitrogen_lj_conductivity{
    "fluid/nitrogen-lj",
    "k",
    "conductivity, W/(m K)",
    &detail::lemmon_jacobsen_source,
    {temperature_input, detail::molar_density_input},
    2,
    {{{"T", 63.151, 1000.0}, {"rhom", 0.0, 31.0e3}}},
    2,
    0.02,
    &detail::lemmon_jacobsen_conductivity<convelope::detail::nitrogen_transport>};
inline constexpr property oxygen_lj_viscosity{
    "fluid/oxygen-lj",
    "mu",
    "dynamic viscosity, Pa s",
    &detail::lemmon_jacobsen_source,
    {temperature_input, detail::molar_density_input},
    2,
    {{{"T", 54.361, 1000.0}, {"rhom", 0.0, 40.9e3}}},
    2,
    0.05,
    &detail::lemmon_jacobsen_viscosity<convelope::detail::oxygen_transport>};
inline constexpr property oxygen_lj_conductivity{
    "fluid/oxygen-lj",
    "k",
    "conductivity, W/(m K)",
    &detail::lemmon_jacobsen_source,
    {temperature_input, detail::molar_density_input},
    2,
    {{{"T", 54.361, 1000.0}, {"rhom", 0.0, 40.9e3}}},
    2,
    0.05,
    &detail::lemmon_jacobsen_conductivity<convelope::detail::oxygen_transport>};
inline constexpr property argon_lj_viscosity{
    "fluid/argon-lj",
    "mu",
    "dynamic viscosity, Pa s",
    &detail::lemmon_jacobsen_source,
    {temperature_input, detail::molar_density_input},
    2,
    {{{"T", 83.8058, 1000.0}, {"rhom", 0.0, 35.5e3}}},
    2,
    0.02,
    &detail::lemmon_jacobsen_viscosity<convelope::detail::argon_transport>};
inline constexpr property argon_lj_conductivity{
    "fluid/argon-lj",
    "k",
    "conductivity, W/(m K)",
    &detail::lemmon_jacobsen_source,
    {temperature_input, detail::molar_density_input},
    2,
    {{{"T", 83.8058, 1000.0}, {"rhom", 0.0, 35.5e3}}},
    2,
    0.02,
    &detail::lemmon_jacobsen_conductivity<convelope::detail::argon_transport>};
inline constexpr property air_us76_viscosity{
    "fluid/air-us76",
    "mu",
    "dynamic viscosity, Pa s",
    &detail::standard_atmosphere_source,
    {temperature_input},
    1,
    {{{"T", 200.0, 600.0}}},
    1,
    not_stated,
    [](const double* x) { return 1.458e-6 * x[0] * std::sqrt(x[0]) / (x[0] + 110.4); }};
inline constexpr property air_us76_conductivity{
    "fluid/air-us76",
    "k",
    "conductivity, W/(m K)",
    &detail::standard_atmosphere_source,
    {temperature_input},
    1,
    {{{"T", 200.0, 600.0}}},
    1,
    not_stated,
    [](const double* x) {
      return 2.64638e-3 * x[0] * std::sqrt(x[0]) / (x[0] + 245.4 * std::pow(10.0, -12.0 / x[0]));
    }};
inline constexpr property co2_fenghour_viscosity{
    "fluid/carbon-dioxide-fenghour",
    "mu",
    "dynamic viscosity, Pa s",
    &detail::fenghour_source,
    {temperature_input, detail::density_input},
    2,
    {{{"T", 200.0, 1500.0}, {"rho", 0.0, 1400.0}}},
    2,
    0.05,
    [](const double* x) { return 1e-6 * convelope::detail::co2::viscosity_1998(x[1], x[0]); }};
inline constexpr property co2_laesecke_muzny_viscosity{
    "fluid/carbon-dioxide-laesecke-muzny",
    "mu",
    "dynamic viscosity, Pa s",
    &detail::laesecke_muzny_source,
    {temperature_input, detail::density_input},
    2,
    {{{"T", 100.0, 2000.0}, {"rho", 0.0, 1420.0}}},
    2,
    0.04,
    [](const double* x) {
      namespace co2 = convelope::detail::co2;
      return 1e-6 * (co2::dilute_viscosity(std::sqrt(x[0])) *
                         (1.0 + co2::viscosity_virial(1.0 / x[0]) * x[1]) +
                     co2::dense_viscosity(x[1], x[0]));
    }};
inline constexpr property co2_huber_conductivity{"fluid/carbon-dioxide-huber",
                                                 "k",
                                                 "conductivity, W/(m K)",
                                                 &detail::huber_source,
                                                 {temperature_input, detail::density_input},
                                                 2,
                                                 {{{"T", 216.592, 1100.0}, {"rho", 0.0, 1350.0}}},
                                                 2,
                                                 0.05,
                                                 [](const double* x) {
                                                   return convelope::detail::co2::conductivity(
                                                       x[1], x[0], 1.0 / x[0], std::sqrt(x[0]));
                                                 }};
inline constexpr property co2_virial_coefficient{
    "fluid/carbon-dioxide-eosB",
    "B",
    "second virial coefficient, m3/mol",
    &detail::span_wagner_source,
    {temperature_input},
    1,
    {{{"T", 220.0, 1100.0}}},
    1,
    not_stated,
    [](const double* x) { return convelope::detail::co2::virial(x[0], 1.0 / x[0]).b; }};
inline constexpr property hydrogen_normal_conductivity{
    "fluid/hydrogen-normal-assael",
    "k",
    "conductivity, W/(m K)",
    &detail::assael_source,
    {temperature_input, detail::density_input},
    2,
    {{{"T", 13.957, 1000.0}, {"rho", 0.0, 90.0}}},
    2,
    0.04,
    [](const double* x) { return convelope::detail::hydrogen::normal_conductivity(x[1], x[0]); }};
inline constexpr property hydrogen_para_conductivity{
    "fluid/hydrogen-para-assael",
    "k",
    "conductivity, W/(m K)",
    &detail::assael_source,
    {temperature_input, detail::density_input},
    2,
    {{{"T", 13.8033, 1000.0}, {"rho", 0.0, 90.0}}},
    2,
    0.04,
    [](const double* x) { return convelope::detail::hydrogen::para_conductivity(x[1], x[0]); }};
inline constexpr property humid_air_saturation{
    "fluid/humid-air-hw",
    "psat",
    "saturation pressure over water, Pa",
    &detail::hyland_wexler_source,
    {temperature_input},
    1,
    {{{"T", 273.15, 473.15}}},
    1,
    0.002,
    [](const double* x) { return convelope::detail::hyland_wexler(x[0]); }};

inline constexpr auto gas_entries = joined(
    fluid_entries<served_air>, fluid_entries<served_nitrogen>, fluid_entries<served_oxygen>,
    fluid_entries<served_argon>, fluid_entries<served_carbon_dioxide>, fluid_entries<served_helium>,
    fluid_entries<served_hydrogen>, fluid_entries<served_real_air>, fluid_entries<served_humid_air>,
    std::array{detail::air_equation_entry<air_eos_pressure>,
               detail::air_equation_entry<air_eos_cv>,
               detail::air_equation_entry<air_eos_cp>,
               detail::air_equation_entry<air_eos_sound>,
               entry_of_property<air_lj_viscosity>,
               entry_of_property<air_lj_conductivity>,
               entry_of_property<nitrogen_lj_viscosity>,
               entry_of_property<nitrogen_lj_conductivity>,
               entry_of_property<oxygen_lj_viscosity>,
               entry_of_property<oxygen_lj_conductivity>,
               entry_of_property<argon_lj_viscosity>,
               entry_of_property<argon_lj_conductivity>,
               entry_of_property<air_us76_viscosity>,
               entry_of_property<air_us76_conductivity>,
               entry_of_property<co2_fenghour_viscosity>,
               entry_of_property<co2_laesecke_muzny_viscosity>,
               entry_of_property<co2_huber_conductivity>,
               entry_of_property<co2_virial_coefficient>,
               entry_of_property<hydrogen_normal_conductivity>,
               entry_of_property<hydrogen_para_conductivity>,
               entry_of_property<humid_air_saturation>});

}  // namespace catalogue
}  // namespace v0
}  // namespace convelope

#endif
