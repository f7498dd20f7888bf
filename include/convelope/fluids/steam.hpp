#ifndef CONVELOPE_FLUIDS_STEAM_HPP
#define CONVELOPE_FLUIDS_STEAM_HPP

#include "convelope/fluids/detail/iapws_transport.hpp"
#include "convelope/fluids/detail/if97_region2.hpp"
#include "convelope/fluids/detail/if97_saturation.hpp"
#include "convelope/fluids/fluid.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference steam_source{
    "IAPWS", 2012,
    "R7-97(2012) regions 2 and 4; R12-08 (2008) viscosity; R15-11 (2011) conductivity",
    known::quoted,
    "without the critical enhancement: conductivity low at saturation by 0.5 % at 500 K, 2.3 % at "
    "550 K, 11 % at 600 K and 24 % at 623 K, at most by 0.1 % to 1 MPa, 1.6 % to 5 MPa, 7 % to 10 "
    "MPa"};

// Below 100 Pa the mean free path passes 0.05 mm at 300 K: common practice, not from the release.
// The saturation limit has the 0.025 % that the release states for the saturation pressure.
inline constexpr limit_info steam_limits[] = {
    {"T", 273.15, 1073.15}, {"p", 100.0, 100e6}, {"p/p_sat", 0.0, 1.00025}, {"p/p_B23", 0.0, 1.0}};

// The largest inside the envelope (from memory): density 0.3 %, heat capacity 2 %, viscosity 3 %.
// Conductivity: what is left out at 623 K. Expansion: common practice; no source states one.
inline constexpr fluid_info steam_info{
    "steam", &steam_source, steam_limits, 4, {0.003, 0.02, 0.25, 0.03, 0.05}};
}  // namespace detail

/// Steam, 273.15 .. 1073.15 K, up to the saturation pressure (below 623.15 K), the line B23 (to
/// 863.15 K) or 100 MPa; the states beyond that line, around the critical point, are flagged.
/// Density, heat capacity, expansion: IAPWS-IF97 region 2. Viscosity: IAPWS R12-08 with mu2 = 1.
/// Conductivity: IAPWS R15-11 without the critical enhancement, for the reason given with
/// liquid_water; what it leaves out is told in info()->source->note.
/// Steam is no ideal gas: at 1 atm T times the expansion coefficient is 1.08 at saturation and
/// 1.02 at 500 K. Below saturation the values go on smoothly into the subcooled vapour.
/// Cost: one square root, two exp, three divisions, about 270 products.
struct steam {
  /// Like a gas: at 1 atm, ambients from saturation to 400 K and walls up to 700 K,
  /// rho_inf/rho_wall - 1 is within 5 % of the ambient's beta times the temperature difference; the
  /// film's beta is up to 32 % low. In saturated steam of 10 MPa neither holds.
  static constexpr expansion_rule expansion_at = expansion_rule::ambient;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    const T inverse = T(1.0 / temperature_K);
    const detail::if97::steam_state<T> s =
        detail::if97::region2(temperature_K, inverse, pressure_Pa);
    const detail::transport_values<T> t =
        detail::water_transport(temperature_K, inverse, s.density);
    return {s.density, s.specific_heat, t.conductivity, t.viscosity, s.expansion};
  }

  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    using adaptor = scalar_adaptor<T>;
    constexpr auto limits = detail::constants_of(detail::steam_limits);
    const T cold = adaptor::constant(limits[0].low);
    const T hot = adaptor::constant(limits[0].high);
    const T corner = adaptor::constant(623.15);
    const T never = adaptor::constant(1e30);
    // NaN counts as cold for the one line and as not beyond the other.
    const T above = math::select(temperature_K >= cold, temperature_K, cold);
    const T within = math::select(above <= corner, above, corner);
    const T saturated =
        math::select(temperature_K <= corner,
                     T(limits[2].high * detail::if97::saturation_pressure(within)), never);
    const T line =
        math::select(temperature_K > corner, detail::if97::b23_pressure(temperature_K), never);
    return bits_t<T>(
        fluid_limit(0, temperature_K, cold, hot) |
        fluid_limit(1, pressure_Pa, adaptor::constant(limits[1].low),
                    adaptor::constant(limits[1].high)) |
        adaptor::bits_where(!(pressure_Pa <= saturated), detail::word::of_fluid(2, side::above)) |
        adaptor::bits_where(!(pressure_Pa <= line), detail::word::of_fluid(3, side::above)));
  }

  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::steam_info; }
};

}  // namespace v0
}  // namespace convelope

#endif
