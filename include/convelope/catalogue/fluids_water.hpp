#ifndef CONVELOPE_CATALOGUE_FLUIDS_WATER_HPP
#define CONVELOPE_CATALOGUE_FLUIDS_WATER_HPP

#include "convelope/catalogue/fluid_entry.hpp"
#include "convelope/fluids/detail/iapws_conductivity.hpp"
#include "convelope/fluids/liquid_water_fast.hpp"
#include "convelope/fluids/saturated_water.hpp"

// Water by name: three fluids of temperature and pressure (water, water-steam, water-fast), the
// two sides of the saturation line, and the published equations behind them.

namespace convelope {
inline namespace v0 {
namespace catalogue {

struct served_water {
  static constexpr const char* id = "fluid/water";
  static constexpr const fluid_info& info = convelope::detail::liquid_water_info;
  static constexpr liquid_water make(const double*) { return {}; }
};
struct served_steam {
  static constexpr const char* id = "fluid/water-steam";
  static constexpr const fluid_info& info = convelope::detail::steam_info;
  static constexpr steam make(const double*) { return {}; }
};
struct served_water_fast {
  static constexpr const char* id = "fluid/water-fast";
  static constexpr const fluid_info& info = convelope::detail::liquid_water_fast_info;
  static constexpr liquid_water_fast make(const double*) { return {}; }
};

namespace water {
namespace if97 = convelope::detail::if97;
namespace sr1_86 = convelope::detail::sr1_86;
namespace sr6_08 = convelope::detail::sr6_08;
namespace r15_11 = convelope::detail::r15_11;

inline constexpr input_info density_input{"rho", "rho", "density, kg/m3", "", nullptr, 0.0, false};
inline constexpr input_info enthalpy_input{"h", "h",  "specific enthalpy, J/kg", "", nullptr,
                                           0.0, false};
inline constexpr input_info required_pressure{"p", "p",  "absolute pressure, Pa", "", nullptr,
                                              0.0, false};
inline constexpr input_info pressure_or_density{
    "p", "p", "absolute pressure, Pa, outside region 3", "", nullptr, 0.0, true};
inline constexpr input_info density_in_region3{
    "rho", "rho", "density, kg/m3, in region 3 instead of p", "", nullptr, 0.0, true};

inline constexpr reference if97_source{"IAPWS", 2012, "R7-97(2012)", known::quoted};
inline constexpr reference sr1_86_source{
    "IAPWS", 1992, "SR1-86(1992); W. Wagner, A. Pruss, J. Phys. Chem. Ref. Data 22 (1993) 783-787",
    known::quoted};
inline constexpr reference sr6_08_source{
    "IAPWS", 2011, "SR6-08(2011); J. Patek et al., J. Phys. Chem. Ref. Data 38 (2009) 21-29",
    known::quoted, "at 0.1 MPa; metastable below 273.15 K and above 372.76 K"};
inline constexpr reference r12_08_source{
    "IAPWS", 2008, "R12-08; M. L. Huber et al., J. Phys. Chem. Ref. Data 38 (2009) 101-125",
    known::quoted,
    "mu2 = 1: more than 2 % off only for 645.91 .. 650.77 K with 245.8 .. 405.3 kg/m3"};
inline constexpr reference r15_11_source{
    "IAPWS", 2011, "R15-11; M. L. Huber et al., J. Phys. Chem. Ref. Data 41 (2012) 033102",
    known::quoted};
inline constexpr reference r1_76_source{"IAPWS", 2014, "R1-76(2014)", known::quoted};
inline constexpr reference saturation_source{
    "IAPWS", 2012,
    "R7-97(2012) regions 1, 2, 4; R12-08 (2008); R15-11 (2011); R1-76(2014); SR1-86(1992)",
    known::quoted, "conductivity with the critical enhancement, which the fluids leave out"};

/// Of temperature alone.
constexpr property of_temperature(const char* id, const char* quantity, const char* gives,
                                  const reference& source, double low, double high,
                                  double uncertainty, double (*value)(const double*)) {
  return {id, quantity,    gives, &source, {temperature_input}, 1, {{{"T", low, high}}},
          1,  uncertainty, value};
}
/// Of temperature and density.
constexpr property of_density(const char* id, const char* quantity, const char* gives,
                              const reference& source, double low, double high, double densest,
                              double uncertainty, double (*value)(const double*)) {
  return {id,
          quantity,
          gives,
          &source,
          {temperature_input, density_input},
          2,
          {{{"T", low, high}, {"rho", 0.0, densest}}},
          2,
          uncertainty,
          value};
}

// The regions of IAPWS-IF97, six quantities each.

enum class quantity : unsigned char { v, h, u, s, cp, w, p };
inline constexpr const char* quantity_names[] = {"v", "h", "u", "s", "cp", "w", "p"};
inline constexpr const char* quantity_words[] = {"specific volume, m3/kg",
                                                 "specific enthalpy, J/kg",
                                                 "specific internal energy, J/kg",
                                                 "specific entropy, J/(kg K)",
                                                 "specific heat at constant pressure, J/(kg K)",
                                                 "speed of sound, m/s",
                                                 "pressure, Pa"};

constexpr double pick(quantity q, const if97::state<double>& s) {
  switch (q) {
    case quantity::v:
      return s.volume;
    case quantity::h:
      return s.enthalpy;
    case quantity::u:
      return s.energy;
    case quantity::s:
      return s.entropy;
    case quantity::cp:
      return s.cp;
    case quantity::w:
    case quantity::p:
      break;
  }
  return s.sound_speed;
}

/// A fluid's verdict where a correlation's would stand.
constexpr std::uint64_t as_correlation(std::uint64_t bits) {
  namespace word = convelope::detail::word;
  return ((bits & word::fluid_mask) >> word::fluid_start) |
         (bits & (word::not_finite | word::impossible));
}
constexpr std::uint64_t limit_bits(int i, double x, const limit_info& limit) {
  return as_correlation(fluid_limit(i, x, limit.low, limit.high));
}

// Largest uncertainties of a region (from memory): specific volume, cp, speed of sound.
struct region1 {
  static constexpr const char* id = "fluid/water-if97-r1";
  static constexpr input_info inputs[] = {temperature_input, pressure_input};
  static constexpr const limit_info (&limits)[3] = convelope::detail::liquid_water_limits;
  static constexpr double of_v = 0.0002, of_cp = 0.003, of_w = 0.01;
  static double value(quantity q, const double* x) {
    return pick(q, if97::region1_state(x[0], x[1]));
  }
  static std::uint64_t bits(const double* x) {
    return as_correlation(liquid_water{}.check(x[0], x[1]));
  }
};
struct region2 {
  static constexpr const char* id = "fluid/water-if97-r2";
  static constexpr input_info inputs[] = {temperature_input, pressure_input};
  static constexpr const limit_info (&limits)[4] = convelope::detail::steam_limits;
  static constexpr double of_v = 0.003, of_cp = 0.02, of_w = 0.01;
  static double value(quantity q, const double* x) {
    return pick(q, if97::region2_state(x[0], x[1]));
  }
  static std::uint64_t bits(const double* x) { return as_correlation(steam{}.check(x[0], x[1])); }
};
/// Between the phases the equation goes on into states that do not exist; the third limit, the
/// distance from the middle of the two saturation densities in halves of their difference, tells.
struct region3 {
  static constexpr const char* id = "fluid/water-if97-r3";
  static constexpr input_info inputs[] = {temperature_input, density_input};
  static constexpr limit_info limits[] = {{"T", 623.15, 863.15},
                                          {"p", 0.0, 100e6},
                                          {"distance from two phases", 1.0, unbounded},
                                          {"p/p_B23", 1.0, unbounded}};
  static constexpr double of_v = 0.002, of_cp = 0.06, of_w = 0.02;
  static double value(quantity q, const double* x) {
    const auto s = if97::region3_state(x[0], x[1]);
    return q == quantity::p ? s.pressure : pick(q, s.rest);
  }
  static std::uint64_t bits(const double* x) {
    const double T = x[0];
    const double rho = x[1];
    std::uint64_t b = limit_bits(0, T, limits[0]);
    if (!(rho > 0.0)) return b | limit_bits(1, -1.0, limits[1]) | limit_bits(1, rho, limits[1]);
    const double p = if97::region3_state(T, rho).pressure;
    b |= limit_bits(1, p, limits[1]);
    if (T < sr1_86::critical_temperature) {
      const double liquid = sr1_86::liquid_density(T);
      const double vapour = sr1_86::vapour_density(T);
      const double off = 2.0 * rho - liquid - vapour;
      b |= limit_bits(2, (off < 0.0 ? -off : off) / (liquid - vapour), limits[2]);
    }
    return b | limit_bits(3, p / if97::b23_pressure(T), limits[3]);
  }
};
struct region5 {
  static constexpr const char* id = "fluid/water-if97-r5";
  static constexpr input_info inputs[] = {temperature_input, pressure_input};
  static constexpr limit_info limits[] = {{"T", 1073.15, 2273.15}, {"p", 0.0, 50e6}};
  static constexpr double of_v = 0.003, of_cp = 0.02, of_w = not_stated;
  static double value(quantity q, const double* x) {
    return pick(q, if97::region5_state(x[0], x[1]));
  }
  static std::uint64_t bits(const double* x) {
    return limit_bits(0, x[0], limits[0]) | limit_bits(1, x[1], limits[1]);
  }
};

template <class Region, quantity Q>
constexpr double region_uncertainty() {
  return Q == quantity::v || Q == quantity::p ? Region::of_v
         : Q == quantity::cp                  ? Region::of_cp
         : Q == quantity::w                   ? Region::of_w
                                              : not_stated;
}
template <class Region, quantity Q>
answer evaluate_region(const double* x) {
  constexpr double u = region_uncertainty<Region, Q>();
  return {Region::value(Q, x),
          verdict<>(Region::bits(x) | (u < 0.0 ? convelope::detail::word::scatter_not_stated : 0)),
          u};
}
template <class Region, quantity Q>
inline constexpr correlation_info region_record{Region::id,
                                                quantity_names[static_cast<int>(Q)],
                                                quantity_words[static_cast<int>(Q)],
                                                &if97_source,
                                                Region::inputs,
                                                2,
                                                Region::limits,
                                                static_cast<int>(std::size(Region::limits)),
                                                region_uncertainty<Region, Q>(),
                                                state_rule::none};
template <class Region, quantity Q>
inline constexpr entry region_entry{&region_record<Region, Q>, &evaluate_region<Region, Q>};

/// v (in region 3: p), h, u, s, cp, w.
template <class Region, quantity First = quantity::v>
inline constexpr std::array<entry, 6> region_entries{
    region_entry<Region, First>,        region_entry<Region, quantity::h>,
    region_entry<Region, quantity::u>,  region_entry<Region, quantity::s>,
    region_entry<Region, quantity::cp>, region_entry<Region, quantity::w>};

inline constexpr property region1_temperature{
    "fluid/water-if97-r1",
    "T",
    "temperature, K",
    &if97_source,
    {required_pressure, enthalpy_input},
    2,
    {{{"p", 0.0, 100e6}, {"h", -42.0, 1670.9e3}}},
    2,
    0.0001,
    [](const double* x) { return if97::region1_temperature(x[0], x[1]); }};

inline constexpr property region4_pressure = of_temperature(
    "fluid/water-if97-r4", "psat", "saturation pressure, Pa", if97_source, 273.15, 647.096, 0.00025,
    [](const double* x) { return if97::saturation_pressure(x[0]); });
inline constexpr property region4_temperature{
    "fluid/water-if97-r4",
    "Tsat",
    "saturation temperature, K",
    &if97_source,
    {required_pressure},
    1,
    {{{"p", 611.213, 22.064e6}}},
    1,
    not_stated,
    [](const double* x) { return if97::saturation_temperature(x[0]); }};
inline constexpr property b23_pressure = of_temperature(
    "fluid/water-if97-b23", "p", "pressure between regions 2 and 3, Pa", if97_source, 623.15,
    863.15, not_stated, [](const double* x) { return if97::b23_pressure(x[0]); });
inline constexpr property b23_temperature{
    "fluid/water-if97-b23",
    "T",
    "temperature between regions 2 and 3, K",
    &if97_source,
    {required_pressure},
    1,
    {{{"p", 16.5291e6, 100e6}}},
    1,
    not_stated,
    [](const double* x) { return if97::b23_temperature(x[0]); }};

inline constexpr property viscosity =
    of_density("fluid/water-r12-08", "mu", "dynamic viscosity, Pa s", r12_08_source, 273.15,
               1173.15, 1300.0, 0.03, [](const double* x) {
                 return convelope::detail::water_transport(x[0], 1.0 / x[0], x[1]).viscosity;
               });
inline constexpr property background = of_density(
    "fluid/water-r15-11-background", "k", "conductivity without the critical enhancement, W/(m K)",
    r15_11_source, 273.15, 1173.15, 1300.0, not_stated, [](const double* x) {
      return convelope::detail::water_transport(x[0], 1.0 / x[0], x[1]).conductivity;
    });

// The whole conductivity, at (T, p) in regions 1, 2 and 5 and at (T, rho) in region 3. A state
// that is in none of them, or given twice or not at all, is flagged.
inline constexpr input_info conductivity_inputs[] = {temperature_input, pressure_or_density,
                                                     density_in_region3};
inline constexpr limit_info conductivity_limits[] = {
    {"T", 273.15, 1173.15}, {"p", 0.0, 100e6}, {"in its region", 1.0, 1.0}};
inline constexpr correlation_info conductivity_record{
    "fluid/water-r15-11-if97",
    "k",
    "conductivity with the critical enhancement, W/(m K)",
    &r15_11_source,
    conductivity_inputs,
    3,
    conductivity_limits,
    3,
    0.06,
    state_rule::none};
inline answer evaluate_conductivity(const double* x) {
  namespace word = convelope::detail::word;
  const double T = x[0];
  const double p = x[1];
  const double rho = x[2];
  std::uint64_t bits = limit_bits(0, T, conductivity_limits[0]);
  bool inside = false;
  r15_11::near_critical s{};
  if (rho > 0.0) {
    const double point[] = {T, rho};
    const auto state = if97::region3_state(T, rho);
    s = r15_11::of_state(state.rest);
    bits |= limit_bits(1, state.pressure, conductivity_limits[1]);
    inside = region3::bits(point) == 0;
  } else {
    bits |= limit_bits(1, p, conductivity_limits[1]);
    const double point[] = {T, p};
    if (T > 1073.15) {
      s = r15_11::of_state(if97::region5_state(T, p));
      inside = region5::bits(point) == 0;
    } else if (T <= 623.15 && p > if97::saturation_pressure(T)) {
      s = r15_11::of_state(if97::region1_state(T, p));
      inside = region1::bits(point) == 0;
    } else {
      s = r15_11::of_state(if97::region2_state(T, p));
      inside = region2::bits(point) == 0;
    }
  }
  const bool one_given = (p > 0.0) != (rho > 0.0);
  if (!(inside && one_given)) bits |= word::of_correlation(0, 2, side::below);
  bits |= scalar_adaptor<double>::bits_where_not_finite(p + rho, word::not_finite);
  return {r15_11::conductivity(T, s), verdict<>(bits), 0.06};
}
inline constexpr entry conductivity_entry{&conductivity_record, &evaluate_conductivity};

inline constexpr property surface_tension =
    of_temperature("fluid/water-r1-76", "sigma", "surface tension, N/m", r1_76_source, 273.16,
                   647.096, 0.005, [](const double* x) { return sr1_86::surface_tension(x[0]); });

// The explicit equations of the saturation line.

inline constexpr property sr1_86_psat =
    of_temperature("fluid/water-sr1-86", "psat", "saturation pressure, Pa", sr1_86_source, 273.16,
                   647.096, not_stated, [](const double* x) { return sr1_86::pressure(x[0]); });
inline constexpr property sr1_86_dpsat_dT = of_temperature(
    "fluid/water-sr1-86", "dpsat_dT", "slope of the saturation pressure, Pa/K", sr1_86_source,
    273.16, 647.096, not_stated, [](const double* x) { return sr1_86::pressure_slope(x[0]); });
inline constexpr property sr1_86_rho_l = of_temperature(
    "fluid/water-sr1-86", "rho_l", "density of the saturated liquid, kg/m3", sr1_86_source, 273.16,
    647.096, not_stated, [](const double* x) { return sr1_86::liquid_density(x[0]); });
inline constexpr property sr1_86_rho_v = of_temperature(
    "fluid/water-sr1-86", "rho_v", "density of the saturated vapour, kg/m3", sr1_86_source, 273.16,
    647.096, not_stated, [](const double* x) { return sr1_86::vapour_density(x[0]); });
inline constexpr property sr1_86_h_l = of_temperature(
    "fluid/water-sr1-86", "h_l", "specific enthalpy of the saturated liquid, J/kg", sr1_86_source,
    273.16, 647.096, not_stated, [](const double* x) { return sr1_86::liquid_enthalpy(x[0]); });
inline constexpr property sr1_86_h_v = of_temperature(
    "fluid/water-sr1-86", "h_v", "specific enthalpy of the saturated vapour, J/kg", sr1_86_source,
    273.16, 647.096, not_stated, [](const double* x) { return sr1_86::vapour_enthalpy(x[0]); });
inline constexpr property sr1_86_h_fg =
    of_temperature("fluid/water-sr1-86", "h_fg", "latent heat, J/kg", sr1_86_source, 273.16,
                   647.096, not_stated, [](const double* x) { return sr1_86::latent_heat(x[0]); });

// Liquid water at 0.1 MPa.

inline constexpr property sr6_08_g =
    of_temperature("fluid/water-sr6-08", "g", "specific Gibbs energy, J/kg", sr6_08_source, 253.15,
                   383.15, not_stated, [](const double* x) { return sr6_08::gibbs_energy(x[0]); });
inline constexpr property sr6_08_s =
    of_temperature("fluid/water-sr6-08", "s", "specific entropy, J/(kg K)", sr6_08_source, 253.15,
                   383.15, not_stated, [](const double* x) { return sr6_08::entropy(x[0]); });
inline constexpr property sr6_08_cp = of_temperature(
    "fluid/water-sr6-08", "cp", "specific heat at constant pressure, J/(kg K)", sr6_08_source,
    253.15, 383.15, 0.001,
    [](const double* x) { return sr6_08::specific_heat(x[0], sr6_08::poles<double>(x[0])); });
inline constexpr property sr6_08_rho = of_temperature(
    "fluid/water-sr6-08", "rho", "density, kg/m3", sr6_08_source, 253.15, 383.15, 1e-6,
    [](const double* x) { return 1.0 / sr6_08::volume(sr6_08::poles<double>(x[0])); });
inline constexpr property sr6_08_v_T = of_temperature(
    "fluid/water-sr6-08", "v_T", "slope of the specific volume on temperature, m3/(kg K)",
    sr6_08_source, 253.15, 383.15, not_stated,
    [](const double* x) { return sr6_08::volume_T(sr6_08::poles<double>(x[0])); });
inline constexpr property sr6_08_v_TT = of_temperature(
    "fluid/water-sr6-08", "v_TT", "curvature of the specific volume on temperature, m3/(kg K2)",
    sr6_08_source, 253.15, 383.15, not_stated,
    [](const double* x) { return sr6_08::volume_TT(sr6_08::poles<double>(x[0])); });
inline constexpr property sr6_08_v_p = of_temperature(
    "fluid/water-sr6-08", "v_p", "slope of the specific volume on pressure, m3/(kg Pa)",
    sr6_08_source, 253.15, 383.15, not_stated,
    [](const double* x) { return sr6_08::volume_p(sr6_08::poles<double>(x[0])); });
inline constexpr property sr6_08_v_pT =
    of_temperature("fluid/water-sr6-08", "v_pT", "mixed slope of the specific volume, m3/(kg Pa K)",
                   sr6_08_source, 253.15, 383.15, not_stated,
                   [](const double* x) { return sr6_08::volume_pT(sr6_08::poles<double>(x[0])); });
inline constexpr property sr6_08_beta = of_temperature(
    "fluid/water-sr6-08", "beta", "expansion coefficient, 1/K", sr6_08_source, 253.15, 383.15,
    not_stated,
    [](const double* x) { return liquid_water_fast{}.expansion(x[0], sr6_08::unit_pressure); });
inline constexpr property sr6_08_w =
    of_temperature("fluid/water-sr6-08", "w", "speed of sound, m/s", sr6_08_source, 253.15, 383.15,
                   not_stated, [](const double* x) { return sr6_08::sound_speed(x[0]); });
inline constexpr property sr6_08_mu = of_temperature(
    "fluid/water-sr6-08", "mu", "dynamic viscosity, Pa s", sr6_08_source, 253.15, 383.15, 0.01,
    [](const double* x) { return sr6_08::transport_at(x[0]).viscosity; });
inline constexpr property sr6_08_k = of_temperature(
    "fluid/water-sr6-08", "k", "conductivity, W/(m K)", sr6_08_source, 273.15, 383.15, 0.015,
    [](const double* x) { return sr6_08::transport_at(x[0]).conductivity; });

// The two sides of the saturation line.

inline double conductivity_of_liquid(double T) {
  return r15_11::conductivity(
      T, r15_11::of_state(if97::region1_state(T, if97::saturation_pressure(T))));
}
inline double prandtl_of_liquid(double T) {
  const fluid_values<double> f = saturated_water::liquid(T);
  return f.specific_heat * f.viscosity / conductivity_of_liquid(T);
}

inline double conductivity_of_vapour(double T) {
  return r15_11::conductivity(
      T, r15_11::of_state(if97::region2_state(T, if97::saturation_pressure(T))));
}
inline double prandtl_of_vapour(double T) {
  const fluid_values<double> f = saturated_water::vapour(T);
  return f.specific_heat * f.viscosity / conductivity_of_vapour(T);
}

inline constexpr property saturated_liquid_psat = of_temperature(
    "fluid/water-sat-liquid", "psat", "saturation pressure, Pa", saturation_source, 273.15, 623.15,
    0.00025, [](const double* x) { return saturated_water::saturation_pressure(x[0]); });
inline constexpr property saturated_liquid_rho =
    of_temperature("fluid/water-sat-liquid", "rho", "density, kg/m3", saturation_source, 273.15,
                   623.15, convelope::detail::liquid_water_info.uncertainty.density,
                   [](const double* x) { return saturated_water::liquid(x[0]).density; });
inline constexpr property saturated_liquid_v =
    of_temperature("fluid/water-sat-liquid", "v", "specific volume, m3/kg", saturation_source,
                   273.15, 623.15, convelope::detail::liquid_water_info.uncertainty.density,
                   [](const double* x) { return 1.0 / saturated_water::liquid(x[0]).density; });
inline constexpr property saturated_liquid_cp =
    of_temperature("fluid/water-sat-liquid", "cp", "specific heat at constant pressure, J/(kg K)",
                   saturation_source, 273.15, 623.15,
                   convelope::detail::liquid_water_info.uncertainty.specific_heat,
                   [](const double* x) { return saturated_water::liquid(x[0]).specific_heat; });
inline constexpr property saturated_liquid_k = of_temperature(
    "fluid/water-sat-liquid", "k", "conductivity, W/(m K)", saturation_source, 273.15, 623.15, 0.06,
    [](const double* x) { return conductivity_of_liquid(x[0]); });
inline constexpr property saturated_liquid_mu =
    of_temperature("fluid/water-sat-liquid", "mu", "dynamic viscosity, Pa s", saturation_source,
                   273.15, 623.15, convelope::detail::liquid_water_info.uncertainty.viscosity,
                   [](const double* x) { return saturated_water::liquid(x[0]).viscosity; });
inline constexpr property saturated_liquid_beta = of_temperature(
    "fluid/water-sat-liquid", "beta", "expansion coefficient, 1/K", saturation_source, 273.15,
    623.15, convelope::detail::liquid_water_info.uncertainty.expansion,
    [](const double* x) { return saturated_water::liquid(x[0]).expansion; });
inline constexpr property saturated_liquid_Pr =
    of_temperature("fluid/water-sat-liquid", "Pr", "Prandtl number", saturation_source, 273.15,
                   623.15, not_stated, [](const double* x) { return prandtl_of_liquid(x[0]); });
inline constexpr property saturated_liquid_h_fg = of_temperature(
    "fluid/water-sat-liquid", "h_fg", "latent heat, J/kg", saturation_source, 273.15, 623.15,
    not_stated, [](const double* x) { return saturated_water::latent_heat(x[0]); });
inline constexpr property saturated_liquid_sigma = of_temperature(
    "fluid/water-sat-liquid", "sigma", "surface tension, N/m", saturation_source, 273.15, 623.15,
    0.005, [](const double* x) { return saturated_water::surface_tension(x[0]); });
inline constexpr property saturated_vapour_psat = of_temperature(
    "fluid/water-sat-vapour", "psat", "saturation pressure, Pa", saturation_source, 273.15, 623.15,
    0.00025, [](const double* x) { return saturated_water::saturation_pressure(x[0]); });
inline constexpr property saturated_vapour_rho =
    of_temperature("fluid/water-sat-vapour", "rho", "density, kg/m3", saturation_source, 273.15,
                   623.15, convelope::detail::steam_info.uncertainty.density,
                   [](const double* x) { return saturated_water::vapour(x[0]).density; });
inline constexpr property saturated_vapour_v =
    of_temperature("fluid/water-sat-vapour", "v", "specific volume, m3/kg", saturation_source,
                   273.15, 623.15, convelope::detail::steam_info.uncertainty.density,
                   [](const double* x) { return 1.0 / saturated_water::vapour(x[0]).density; });
inline constexpr property saturated_vapour_cp = of_temperature(
    "fluid/water-sat-vapour", "cp", "specific heat at constant pressure, J/(kg K)",
    saturation_source, 273.15, 623.15, convelope::detail::steam_info.uncertainty.specific_heat,
    [](const double* x) { return saturated_water::vapour(x[0]).specific_heat; });
inline constexpr property saturated_vapour_k = of_temperature(
    "fluid/water-sat-vapour", "k", "conductivity, W/(m K)", saturation_source, 273.15, 623.15, 0.06,
    [](const double* x) { return conductivity_of_vapour(x[0]); });
inline constexpr property saturated_vapour_mu =
    of_temperature("fluid/water-sat-vapour", "mu", "dynamic viscosity, Pa s", saturation_source,
                   273.15, 623.15, convelope::detail::steam_info.uncertainty.viscosity,
                   [](const double* x) { return saturated_water::vapour(x[0]).viscosity; });
inline constexpr property saturated_vapour_beta = of_temperature(
    "fluid/water-sat-vapour", "beta", "expansion coefficient, 1/K", saturation_source, 273.15,
    623.15, convelope::detail::steam_info.uncertainty.expansion,
    [](const double* x) { return saturated_water::vapour(x[0]).expansion; });
inline constexpr property saturated_vapour_Pr =
    of_temperature("fluid/water-sat-vapour", "Pr", "Prandtl number", saturation_source, 273.15,
                   623.15, not_stated, [](const double* x) { return prandtl_of_vapour(x[0]); });
inline constexpr property saturated_vapour_h_fg = of_temperature(
    "fluid/water-sat-vapour", "h_fg", "latent heat, J/kg", saturation_source, 273.15, 623.15,
    not_stated, [](const double* x) { return saturated_water::latent_heat(x[0]); });

}  // namespace water

inline constexpr auto water_entries = joined(
    fluid_entries<served_water>, fluid_entries<served_steam>, fluid_entries<served_water_fast>,
    water::region_entries<water::region1>, water::region_entries<water::region2>,
    water::region_entries<water::region3, water::quantity::p>,
    water::region_entries<water::region5>,
    std::array{entry_of_property<water::region1_temperature>,
               entry_of_property<water::region4_pressure>,
               entry_of_property<water::region4_temperature>,
               entry_of_property<water::b23_pressure>,
               entry_of_property<water::b23_temperature>,
               entry_of_property<water::viscosity>,
               entry_of_property<water::background>,
               water::conductivity_entry,
               entry_of_property<water::surface_tension>,
               entry_of_property<water::sr1_86_psat>,
               entry_of_property<water::sr1_86_dpsat_dT>,
               entry_of_property<water::sr1_86_rho_l>,
               entry_of_property<water::sr1_86_rho_v>,
               entry_of_property<water::sr1_86_h_l>,
               entry_of_property<water::sr1_86_h_v>,
               entry_of_property<water::sr1_86_h_fg>,
               entry_of_property<water::sr6_08_g>,
               entry_of_property<water::sr6_08_s>,
               entry_of_property<water::sr6_08_cp>,
               entry_of_property<water::sr6_08_rho>,
               entry_of_property<water::sr6_08_v_T>,
               entry_of_property<water::sr6_08_v_TT>,
               entry_of_property<water::sr6_08_v_p>,
               entry_of_property<water::sr6_08_v_pT>,
               entry_of_property<water::sr6_08_beta>,
               entry_of_property<water::sr6_08_w>,
               entry_of_property<water::sr6_08_mu>,
               entry_of_property<water::sr6_08_k>,
               entry_of_property<water::saturated_liquid_psat>,
               entry_of_property<water::saturated_liquid_rho>,
               entry_of_property<water::saturated_liquid_v>,
               entry_of_property<water::saturated_liquid_cp>,
               entry_of_property<water::saturated_liquid_k>,
               entry_of_property<water::saturated_liquid_mu>,
               entry_of_property<water::saturated_liquid_beta>,
               entry_of_property<water::saturated_liquid_Pr>,
               entry_of_property<water::saturated_liquid_h_fg>,
               entry_of_property<water::saturated_liquid_sigma>,
               entry_of_property<water::saturated_vapour_psat>,
               entry_of_property<water::saturated_vapour_rho>,
               entry_of_property<water::saturated_vapour_v>,
               entry_of_property<water::saturated_vapour_cp>,
               entry_of_property<water::saturated_vapour_k>,
               entry_of_property<water::saturated_vapour_mu>,
               entry_of_property<water::saturated_vapour_beta>,
               entry_of_property<water::saturated_vapour_Pr>,
               entry_of_property<water::saturated_vapour_h_fg>});

}  // namespace catalogue
}  // namespace v0
}  // namespace convelope

#endif
