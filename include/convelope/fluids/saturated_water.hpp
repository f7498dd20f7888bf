#ifndef CONVELOPE_FLUIDS_SATURATED_WATER_HPP
#define CONVELOPE_FLUIDS_SATURATED_WATER_HPP

#include "convelope/fluids/detail/iapws_saturation.hpp"
#include "convelope/fluids/detail/if97_saturation.hpp"
#include "convelope/fluids/liquid_water.hpp"
#include "convelope/fluids/steam.hpp"

namespace convelope {
inline namespace v0 {

/// Water and its vapour in equilibrium, as functions of temperature on any number type. The two
/// columns hold for 273.15 .. 623.15 K (IAPWS-IF97), the rest for 273.16 .. 647.096 K. The
/// conductivities are those of the fluids, without the critical enhancement. Nothing is checked
/// here.
struct saturated_water {
  template <class T>
  CONVELOPE_FUNCTION static constexpr fluid_values<T> liquid(const T& temperature_K) {
    return liquid_water{}.values(temperature_K, saturation_pressure(temperature_K));
  }
  template <class T>
  CONVELOPE_FUNCTION static constexpr fluid_values<T> vapour(const T& temperature_K) {
    return steam{}.values(temperature_K, saturation_pressure(temperature_K));
  }
  /// Pa, IAPWS R7-97(2012) region 4, within 0.025 %.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T saturation_pressure(const T& temperature_K) {
    return detail::if97::saturation_pressure(temperature_K);
  }
  /// K, from Pa: its inverse.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T saturation_temperature(const T& pressure_Pa) {
    return detail::if97::saturation_temperature(pressure_Pa);
  }
  /// J/kg, IAPWS SR1-86(1992).
  template <class T>
  CONVELOPE_FUNCTION static constexpr T latent_heat(const T& temperature_K) {
    return detail::sr1_86::latent_heat(temperature_K);
  }
  /// N/m, IAPWS R1-76(2014), within 0.5 %.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T surface_tension(const T& temperature_K) {
    return detail::sr1_86::surface_tension(temperature_K);
  }
};

}  // namespace v0
}  // namespace convelope

#endif
