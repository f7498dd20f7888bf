#ifndef CONVELOPE_FLUIDS_LIQUID_WATER_FAST_HPP
#define CONVELOPE_FLUIDS_LIQUID_WATER_FAST_HPP

#include "convelope/fluids/detail/iapws_sr6_08.hpp"
#include "convelope/fluids/detail/if97_saturation.hpp"
#include "convelope/fluids/fluid.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference liquid_water_fast_source{
    "IAPWS", 2011, "SR6-08(2011); J. Patek et al., J. Phys. Chem. Ref. Data 38 (2009) 21-29",
    known::quoted,
    "heat capacity, viscosity and conductivity are those of 0.1 MPa: to 0.3 MPa the heat capacity "
    "falls by 0.02 %"};

// The conductivity begins at 273.15 K, the rest at 253.15 K. The saturation limit has the 0.025 %
// that R7-97(2012) states for the saturation pressure.
inline constexpr limit_info liquid_water_fast_limits[] = {
    {"T", 273.15, 383.15}, {"p", 0.0, 3e5}, {"p/p_sat", 0.99975, unbounded}};

// Density at 0.1 MPa 1e-6; the straight line in pressure takes 1e-5. Expansion: common practice,
// as with liquid_water.
inline constexpr fluid_info liquid_water_fast_info{"liquid water, fast",
                                                   &liquid_water_fast_source,
                                                   liquid_water_fast_limits,
                                                   3,
                                                   {1e-5, 0.001, 0.015, 0.01, 0.01}};
}  // namespace detail

/// Liquid water near atmospheric pressure, 273.15 .. 383.15 K, saturation pressure .. 0.3 MPa:
/// IAPWS SR6-08(2011), which agrees with liquid_water:
/// density 2e-5, heat capacity 7e-4, conductivity and viscosity 3e-4, expansion 6e-7 1/K.
/// Below about 4 degC the expansion coefficient is negative, as it should be. Above the
/// saturation temperature the values go on smoothly into the superheated liquid, and are flagged.
/// Cost: one log, one exp, four divisions, about 100 products.
struct liquid_water_fast {
  static constexpr expansion_rule expansion_at = expansion_rule::film;
  /// 1/K2, the slope of the expansion coefficient at the density maximum.
  static constexpr double expansion_slope = 1.6e-5;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    namespace water = detail::sr6_08;
    const water::poles<T> x(temperature_K);
    const water::transport<T> t = water::transport_at(temperature_K);
    const T above = T(pressure_Pa - water::unit_pressure);
    const T rho = T(1.0 / (water::volume(x) + above * water::volume_p(x)));
    return {rho, water::specific_heat(temperature_K, x), t.conductivity, t.viscosity,
            T((water::volume_T(x) + above * water::volume_pT(x)) * rho)};
  }

  /// The expansion coefficient alone.
  template <class T>
  CONVELOPE_FUNCTION constexpr T expansion(const T& temperature_K, const T& pressure_Pa) const {
    namespace water = detail::sr6_08;
    const water::poles<T> x(temperature_K);
    const T above = T(pressure_Pa - water::unit_pressure);
    return T((water::volume_T(x) + above * water::volume_pT(x)) /
             (water::volume(x) + above * water::volume_p(x)));
  }

  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    using adaptor = scalar_adaptor<T>;
    constexpr auto limits = detail::constants_of(detail::liquid_water_fast_limits);
    const T cold = adaptor::constant(limits[0].low);
    const T hot = adaptor::constant(limits[0].high);
    const T above = math::select(temperature_K >= cold, temperature_K, cold);
    const T within = math::select(above <= hot, above, hot);
    const T least = T(limits[2].low * detail::if97::saturation_pressure(within));
    return bits_t<T>(
        fluid_limit(0, temperature_K, cold, hot) |
        fluid_limit(1, pressure_Pa, adaptor::constant(limits[1].low),
                    adaptor::constant(limits[1].high)) |
        adaptor::bits_where(!(pressure_Pa >= least), detail::word::of_fluid(2, side::below)));
  }

  CONVELOPE_FUNCTION constexpr const fluid_info* info() const {
    return &detail::liquid_water_fast_info;
  }
};

}  // namespace v0
}  // namespace convelope

#endif
