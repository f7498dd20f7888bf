#ifndef CONVELOPE_CORRELATIONS_NATURAL_VERTICAL_PLATE_HPP
#define CONVELOPE_CORRELATIONS_NATURAL_VERTICAL_PLATE_HPP

#include "convelope/correlations/natural/thin_layer.hpp"
#include "convelope/correlations/natural/vertical_plate_local.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// A vertical plate in a fluid at rest. Ra and Gr are on the height (or on the distance from the
/// leading edge) and |T_wall - T_ambient|. Film properties; a gas's expansion coefficient at the
/// ambient temperature.
namespace vertical_plate {

/// Mean Nusselt number, isothermal wall, one formula through laminar and turbulent flow.
/// Nu = {0.825 + 0.387 Ra^(1/6) / [1 + (0.492/Pr)^(9/16)]^(8/27)}^2
/// Range: 0.1 <= Ra <= 1e12, all Pr. Scatter not stated. Below 1e9 the laminar form is nearer to
/// theory (in air this one is 18 % above it at 1e8).
/// Source: Churchill and Chu 1975, Int. J. Heat Mass Transfer 18, 1323-1329.
struct churchill_chu_1975
    : correlation<churchill_chu_1975, nusselt_of<height>, rayleigh_of<height>, prandtl_number> {
  static constexpr const char* id = "vertical-plate/churchill-chu-1975";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"S. W. Churchill, H. H. S. Chu", 1975,
                                    "Int. J. Heat Mass Transfer 18, 1323-1329", known::quoted,
                                    "texts use it for all Ra, or only from 1e9 to 1e12"};
  static constexpr auto envelope =
      within(limit<rayleigh_of<height>>(0.1, 1e12), limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    return square(T(0.825 + 0.387 * power<1, 6>(Ra) *
                                power<-8, 27>(detail::thin_layer::prandtl_bracket(0.492, Pr))));
  }
};

/// Mean Nusselt number, isothermal wall, laminar.
/// Nu = 0.68 + 0.670 Ra^(1/4) / [1 + (0.492/Pr)^(9/16)]^(4/9)
/// Range: 0.1 <= Ra <= 1e9, all Pr. Scatter not stated; from 1e7 on within 2.5 % of the
/// similarity solution for Pr >= 0.7.
/// Source: Churchill and Chu 1975, Int. J. Heat Mass Transfer 18, 1323-1329.
struct churchill_chu_laminar_1975 : correlation<churchill_chu_laminar_1975, nusselt_of<height>,
                                                rayleigh_of<height>, prandtl_number> {
  static constexpr const char* id = "vertical-plate/churchill-chu-laminar-1975";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{
      "S. W. Churchill, H. H. S. Chu", 1975, "Int. J. Heat Mass Transfer 18, 1323-1329",
      known::quoted, "0.663 and Ra <= 1e8 are misprints in circulation; theory gives 0.6703"};
  static constexpr auto envelope =
      within(limit<rayleigh_of<height>>(0.1, 1e9), limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    return T(0.68 + 0.670 * power<1, 4>(Ra) *
                        power<-4, 9>(detail::thin_layer::prandtl_bracket(0.492, Pr)));
  }
};

/// Mean Nusselt number, uniform heat flux, laminar and turbulent: Nu = q H/(k dT) with dT, also in
/// Ra, the wall's excess at mid height.
/// Nu = {0.825 + 0.387 Ra^(1/6) / [1 + (0.437/Pr)^(9/16)]^(8/27)}^2
/// Range: 0.1 <= Ra <= 1e12, all Pr. Scatter not stated. Properties at the film temperature of mid
/// height.
/// Source: Churchill and Chu 1975, Int. J. Heat Mass Transfer 18, 1323-1329.
struct churchill_chu_isoflux_1975 : correlation<churchill_chu_isoflux_1975, nusselt_of<height>,
                                                rayleigh_of<height>, prandtl_number> {
  static constexpr const char* id = "vertical-plate/churchill-chu-isoflux-1975";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{
      "S. W. Churchill, H. H. S. Chu", 1975, "Int. J. Heat Mass Transfer 18, 1323-1329",
      known::quoted, "texts also use the isothermal form with the mid-height excess"};
  static constexpr auto envelope =
      within(limit<rayleigh_of<height>>(0.1, 1e12), limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    return square(T(0.825 + 0.387 * power<1, 6>(Ra) *
                                power<-8, 27>(detail::thin_layer::prandtl_bracket(0.437, Pr))));
  }
};

/// Mean Nusselt number, uniform heat flux, laminar; dT at mid height.
/// Nu = 0.68 + 0.670 Ra^(1/4) / [1 + (0.437/Pr)^(9/16)]^(4/9)
/// Range: 0.1 <= Ra <= 1e9, all Pr. Scatter not stated. Properties at the film temperature of mid
/// height. Theory for Pr -> inf gives 0.6697 in place of 0.670.
/// Source: Churchill and Chu 1975, Int. J. Heat Mass Transfer 18, 1323-1329.
struct churchill_chu_isoflux_laminar_1975
    : correlation<churchill_chu_isoflux_laminar_1975, nusselt_of<height>, rayleigh_of<height>,
                  prandtl_number> {
  static constexpr const char* id = "vertical-plate/churchill-chu-isoflux-laminar-1975";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"S. W. Churchill, H. H. S. Chu", 1975,
                                    "Int. J. Heat Mass Transfer 18, 1323-1329", known::computed,
                                    "the pairing of 0.68 and 0.670 with 0.437 is remembered"};
  static constexpr auto envelope =
      within(limit<rayleigh_of<height>>(0.1, 1e9), limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    return T(0.68 + 0.670 * power<1, 4>(Ra) *
                        power<-4, 9>(detail::thin_layer::prandtl_bracket(0.437, Pr)));
  }
};

/// Mean Nusselt number, isothermal wall, laminar; gases and ordinary liquids.
/// Nu = 0.59 Ra^(1/4)
/// Range: 1e4 <= Ra <= 1e9. No Pr in it: 15 % above laminar theory at Pr 0.71, 3.5 % below at
/// Pr 7.
/// Source: McAdams 1954, Heat Transmission, 3rd ed.
struct mcadams_laminar_1954
    : correlation<mcadams_laminar_1954, nusselt_of<height>, rayleigh_of<height>> {
  static constexpr const char* id = "vertical-plate/mcadams-laminar-1954";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"W. H. McAdams", 1954, "Heat Transmission, 3rd ed.",
                                    known::quoted};
  static constexpr auto envelope = within(limit<rayleigh_of<height>>(1e4, 1e9));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    return T(0.59 * power<1, 4>(Ra));
  }
};

/// Mean Nusselt number, isothermal wall, turbulent; gases and ordinary liquids.
/// Nu = 0.13 Ra^(1/3)
/// Range: 1e9 <= Ra <= 1e12. Scatter not stated; the same place is taken by 0.10 elsewhere, 30 %
/// lower. churchill_chu_1975 tends to 0.105 in air and 0.133 in water.
/// Source: McAdams 1954, Heat Transmission, 3rd ed.
struct mcadams_turbulent_1954
    : correlation<mcadams_turbulent_1954, nusselt_of<height>, rayleigh_of<height>> {
  static constexpr const char* id = "vertical-plate/mcadams-turbulent-1954";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"W. H. McAdams", 1954, "Heat Transmission, 3rd ed.",
                                    known::recalled,
                                    "upper limit printed 1e12 or 1e13, 1e12 taken; 1e13 goes with "
                                    "Bayley's 0.10"};
  static constexpr auto envelope = within(limit<rayleigh_of<height>>(1e9, 1e12));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    return T(0.13 * cbrt(Ra));
  }
};

/// Mean Nusselt number, isothermal wall, laminar and turbulent, with a thick layer at low Ra.
/// Nu_T = C_l Ra^(1/4), C_l = 0.671 / [1 + (0.492/Pr)^(9/16)]^(4/9);
/// Nu_l = 2.0/ln(1 + 2.0/Nu_T);
/// Nu_t = C_t Ra^(1/3) / (1 + 1.4e9 Pr/Ra), C_t = 0.13 Pr^0.22 / (1 + 0.61 Pr^0.81)^0.42;
/// Nu = (Nu_l^6 + Nu_t^6)^(1/6)
/// Range: 0.1 <= Ra <= 1e12, all Pr. Scatter not stated.
/// Source: Raithby and Hollands 1998, in Rohsenow, Hartnett, Cho (eds), Handbook of Heat Transfer,
/// 3rd ed., ch. 4.
struct raithby_hollands_1998
    : correlation<raithby_hollands_1998, nusselt_of<height>, rayleigh_of<height>, prandtl_number> {
  static constexpr const char* id = "vertical-plate/raithby-hollands-1998";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"G. D. Raithby, K. G. T. Hollands", 1998,
                                    "Handbook of Heat Transfer, 3rd ed., ch. 4", known::recalled};
  static constexpr auto envelope =
      within(limit<rayleigh_of<height>>(0.1, 1e12), limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    const T thin = T(detail::thin_layer::laminar_coefficient(Pr) * power<1, 4>(Ra));
    const T laminar = detail::thin_layer::thickened(T(2.0), thin);
    const T C_t = T(0.13 * power<11, 50>(Pr) * power<-21, 50>(T(1.0 + 0.61 * power<81, 100>(Pr))));
    const T turbulent = T(C_t * cbrt(Ra) * Ra / (Ra + 1.4e9 * Pr));
    return joined<6>(laminar, turbulent);
  }
};

}  // namespace vertical_plate
}  // namespace v0
}  // namespace convelope

#endif
