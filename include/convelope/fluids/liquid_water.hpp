#ifndef CONVELOPE_FLUIDS_LIQUID_WATER_HPP
#define CONVELOPE_FLUIDS_LIQUID_WATER_HPP

#include "convelope/fluids/detail/iapws_transport.hpp"
#include "convelope/fluids/detail/if97_region1.hpp"
#include "convelope/fluids/detail/if97_saturation.hpp"
#include "convelope/fluids/fluid.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference liquid_water_source{
    "IAPWS", 2012,
    "R7-97(2012) region 1 and 4; R12-08 (2008) viscosity; R15-11 (2011) conductivity",
    known::quoted,
    "without the critical enhancement: conductivity low by 0.4 % at 500 K, 2.1 % at 600 K and "
    "4.2 % at 623 K at saturation, nothing below 420 K"};

// The saturation limit has the 0.025 % that the release states for the saturation pressure.
inline constexpr limit_info liquid_water_limits[] = {
    {"T", 273.15, 623.15}, {"p", 0.0, 100e6}, {"p/p_sat", 0.99975, unbounded}};

// The largest inside the envelope (from memory): below 570 K viscosity 1 %, conductivity 2 %.
// Expansion: common practice; no source states one, and a relative one means little near 4 degC.
inline constexpr fluid_info liquid_water_info{"liquid water",
                                              &liquid_water_source,
                                              liquid_water_limits,
                                              3,
                                              {0.0002, 0.003, 0.05, 0.02, 0.01}};
}  // namespace detail

/// Liquid water, 273.15 .. 623.15 K, saturation pressure .. 100 MPa.
/// Density, heat capacity, expansion: IAPWS-IF97 region 1. Viscosity: IAPWS R12-08 with mu2 = 1.
/// Conductivity: IAPWS R15-11 without the critical enhancement, because that sets in with an
/// infinite slope, which no solver wants; what it leaves out is told in info()->source->note.
/// Below about 4 degC the expansion coefficient is negative, as it should be. Above the
/// saturation temperature the values go on smoothly into the superheated liquid, and are flagged.
/// Cost: one square root, two exp, four divisions, about 190 products.
struct liquid_water {
  static constexpr expansion_rule expansion_at = expansion_rule::film;
  /// 1/K2, the slope of the expansion coefficient at the density maximum.
  static constexpr double expansion_slope = 1.6e-5;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    const T inverse = T(1.0 / temperature_K);
    const detail::if97::liquid_state<T> s = detail::if97::region1(inverse, pressure_Pa);
    const detail::transport_values<T> t =
        detail::water_transport(temperature_K, inverse, s.density);
    return {s.density, s.specific_heat, t.conductivity, t.viscosity, s.expansion};
  }

  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    using adaptor = scalar_adaptor<T>;
    constexpr auto limits = detail::constants_of(detail::liquid_water_limits);
    const T cold = adaptor::constant(limits[0].low);
    const T hot = adaptor::constant(limits[0].high);
    // The saturation line ends where the temperature limits do; NaN counts as cold here.
    const T above = math::select(temperature_K >= cold, temperature_K, cold);
    const T within = math::select(above <= hot, above, hot);
    const T least = T(limits[2].low * detail::if97::saturation_pressure(within));
    return bits_t<T>(
        fluid_limit(0, temperature_K, cold, hot) |
        fluid_limit(1, pressure_Pa, adaptor::constant(limits[1].low),
                    adaptor::constant(limits[1].high)) |
        adaptor::bits_where(!(pressure_Pa >= least), detail::word::of_fluid(2, side::below)));
  }

  /// Pa, 273.15 .. 647.096 K: IAPWS-IF97 region 4.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T saturation_pressure(const T& temperature_K) {
    return detail::if97::saturation_pressure(temperature_K);
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::liquid_water_info; }
};

}  // namespace v0
}  // namespace convelope

#endif
