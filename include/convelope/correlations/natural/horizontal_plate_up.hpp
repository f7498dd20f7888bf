#ifndef CONVELOPE_CORRELATIONS_NATURAL_HORIZONTAL_PLATE_UP_HPP
#define CONVELOPE_CORRELATIONS_NATURAL_HORIZONTAL_PLATE_UP_HPP

#include "convelope/correlations/natural/thin_layer.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// A horizontal plate on its unstable side: heated face up, or cooled face down. Ra on area over
/// perimeter unless an entry says otherwise, and on |T_wall - T_ambient|. Film properties; a gas's
/// expansion coefficient at the ambient temperature.
namespace horizontal_plate_up {

/// Mean Nusselt number, low Ra.
/// Nu = 0.96 Ra^(1/6)
/// Range: 1 <= Ra <= 200. Sublimation data, Sc = 2.5. Scatter not stated.
/// Source: Goldstein, Sparrow and Jones 1973, Int. J. Heat Mass Transfer 16, 1025-1035.
struct goldstein_sparrow_jones_low_1973
    : correlation<goldstein_sparrow_jones_low_1973, nusselt_of<area_over_perimeter>,
                  rayleigh_of<area_over_perimeter>> {
  static constexpr const char* id = "horizontal-plate-up/goldstein-sparrow-jones-low-1973";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{
      "R. J. Goldstein, E. M. Sparrow, D. C. Jones", 1973,
      "Int. J. Heat Mass Transfer 16, 1025-1035", known::quoted,
      "4.6 % above goldstein-sparrow-jones-1973 where they meet, at Ra 200"};
  static constexpr auto envelope = within(limit<rayleigh_of<area_over_perimeter>>(1.0, 200.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    return T(0.96 * power<1, 6>(Ra));
  }
};

/// Mean Nusselt number.
/// Nu = 0.59 Ra^(1/4)
/// Range: 200 <= Ra <= 1e4. Sublimation data, Sc = 2.5. Scatter not stated.
/// Source: Goldstein, Sparrow and Jones 1973, Int. J. Heat Mass Transfer 16, 1025-1035.
struct goldstein_sparrow_jones_1973
    : correlation<goldstein_sparrow_jones_1973, nusselt_of<area_over_perimeter>,
                  rayleigh_of<area_over_perimeter>> {
  static constexpr const char* id = "horizontal-plate-up/goldstein-sparrow-jones-1973";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"R. J. Goldstein, E. M. Sparrow, D. C. Jones", 1973,
                                    "Int. J. Heat Mass Transfer 16, 1025-1035", known::quoted};
  static constexpr auto envelope = within(limit<rayleigh_of<area_over_perimeter>>(200.0, 1e4));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    return T(0.59 * power<1, 4>(Ra));
  }
};

/// Mean Nusselt number, laminar.
/// Nu = 0.54 Ra^(1/4)
/// Range: 2.2e4 <= Ra <= 8e6 (the data; electrochemical, Sc near 2200). Scatter not stated.
/// Source: Lloyd and Moran 1974, J. Heat Transfer 96, 443-447.
struct lloyd_moran_laminar_1974
    : correlation<lloyd_moran_laminar_1974, nusselt_of<area_over_perimeter>,
                  rayleigh_of<area_over_perimeter>> {
  static constexpr const char* id = "horizontal-plate-up/lloyd-moran-laminar-1974";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"J. R. Lloyd, W. R. Moran", 1974,
                                    "J. Heat Transfer 96, 443-447", known::quoted,
                                    "textbooks extend it to 1e4 .. 1e7, Pr >= 0.7"};
  static constexpr auto envelope = within(limit<rayleigh_of<area_over_perimeter>>(2.2e4, 8e6));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    return T(0.54 * power<1, 4>(Ra));
  }
};

/// Mean Nusselt number, turbulent.
/// Nu = 0.15 Ra^(1/3)
/// Range: 8e6 <= Ra <= 1.6e9 (the data; electrochemical, Sc near 2200). Scatter not stated.
/// Source: Lloyd and Moran 1974, J. Heat Transfer 96, 443-447.
struct lloyd_moran_turbulent_1974
    : correlation<lloyd_moran_turbulent_1974, nusselt_of<area_over_perimeter>,
                  rayleigh_of<area_over_perimeter>> {
  static constexpr const char* id = "horizontal-plate-up/lloyd-moran-turbulent-1974";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"J. R. Lloyd, W. R. Moran", 1974,
                                    "J. Heat Transfer 96, 443-447", known::quoted,
                                    "upper limit 1.5e9 in a handbook, 1e11 in textbooks"};
  static constexpr auto envelope = within(limit<rayleigh_of<area_over_perimeter>>(8e6, 1.6e9));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    return T(0.15 * cbrt(Ra));
  }
};

/// Mean Nusselt number, turbulent, on the SIDE of a square (mean of the two sides of a rectangle,
/// 0.9 D of a disc), not on area over perimeter.
/// Nu = 0.14 Ra^(1/3)
/// Range: 2e7 <= Ra <= 3e10. Scatter not stated.
/// Source: McAdams 1954, Heat Transmission, 3rd ed., after Fishenden and Saunders 1950.
struct mcadams_turbulent_1954
    : correlation<mcadams_turbulent_1954, nusselt_of<plate_side>, rayleigh_of<plate_side>> {
  static constexpr const char* id = "horizontal-plate-up/mcadams-turbulent-1954";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"W. H. McAdams", 1954, "Heat Transmission, 3rd ed.",
                                    known::recalled};
  static constexpr auto envelope = within(limit<rayleigh_of<plate_side>>(2e7, 3e10));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    return T(0.14 * cbrt(Ra));
  }
};

/// Mean Nusselt number, laminar and turbulent, with a thick layer at low Ra.
/// Nu_T = 0.835 C_l Ra^(1/4), C_l = 0.671 / [1 + (0.492/Pr)^(9/16)]^(4/9);
/// Nu_l = 1.4/ln(1 + 1.4/Nu_T); Nu_t = 0.14 (1 + 0.0107 Pr)/(1 + 0.01 Pr) Ra^(1/3);
/// Nu = (Nu_l^10 + Nu_t^10)^(1/10)
/// Range: 1 <= Ra <= 1e10, all Pr. Scatter not stated.
/// Source: Raithby and Hollands 1998, in Rohsenow, Hartnett, Cho (eds), Handbook of Heat Transfer,
/// 3rd ed., ch. 4.
struct raithby_hollands_1998 : correlation<raithby_hollands_1998, nusselt_of<area_over_perimeter>,
                                           rayleigh_of<area_over_perimeter>, prandtl_number> {
  static constexpr const char* id = "horizontal-plate-up/raithby-hollands-1998";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"G. D. Raithby, K. G. T. Hollands", 1998,
                                    "Handbook of Heat Transfer, 3rd ed., ch. 4", known::recalled,
                                    "the 2nd edition leads with 0.15 in place of 0.14"};
  static constexpr auto envelope = within(limit<rayleigh_of<area_over_perimeter>>(1.0, 1e10),
                                          limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    const T thin = T(0.835 * detail::thin_layer::laminar_coefficient(Pr) * power<1, 4>(Ra));
    const T laminar = detail::thin_layer::thickened(T(1.4), thin);
    const T turbulent = T(0.14 * (1.0 + 0.0107 * Pr) / (1.0 + 0.01 * Pr) * cbrt(Ra));
    return joined<10>(laminar, turbulent);
  }
};

}  // namespace horizontal_plate_up
}  // namespace v0
}  // namespace convelope

#endif
