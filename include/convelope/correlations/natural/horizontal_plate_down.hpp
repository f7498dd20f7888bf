#ifndef CONVELOPE_CORRELATIONS_NATURAL_HORIZONTAL_PLATE_DOWN_HPP
#define CONVELOPE_CORRELATIONS_NATURAL_HORIZONTAL_PLATE_DOWN_HPP

#include "convelope/correlations/natural/thin_layer.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// A horizontal plate on its stable side: heated face down, or cooled face up. The fluid leaves
/// over the edges, so extensions of the plate lower the film coefficient. Ra on area over perimeter
/// unless an entry says otherwise, and on |T_wall - T_ambient|. Film properties; a gas's expansion
/// coefficient at the ambient temperature.
namespace horizontal_plate_down {

/// Mean Nusselt number, as handbooks print it.
/// Nu = 0.27 Ra^(1/4)
/// Range: 1e5 <= Ra <= 1e10. Scatter not stated. Boundary-layer theory has the exponent 1/5:
/// radziemska_lewandowski_2001.
/// Source: McAdams 1954, Heat Transmission, 3rd ed.
struct mcadams_1954
    : correlation<mcadams_1954, nusselt_of<area_over_perimeter>, rayleigh_of<area_over_perimeter>> {
  static constexpr const char* id = "horizontal-plate-down/mcadams-1954";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{
      "W. H. McAdams", 1954, "Heat Transmission, 3rd ed.", known::quoted,
      "the 1954 book takes the side and 3e5 .. 3e10; later handbooks area over perimeter"};
  static constexpr auto envelope = within(limit<rayleigh_of<area_over_perimeter>>(1e5, 1e10));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    return T(0.27 * power<1, 4>(Ra));
  }
};

/// Mean Nusselt number.
/// Nu = 0.52 Ra^(1/5)
/// Range: 1e4 <= Ra <= 1e9, Pr >= 0.7. Scatter not stated.
/// Source: Radziemska and Lewandowski 2001, Appl. Energy 68, 347-366.
struct radziemska_lewandowski_2001
    : correlation<radziemska_lewandowski_2001, nusselt_of<area_over_perimeter>,
                  rayleigh_of<area_over_perimeter>> {
  static constexpr const char* id = "horizontal-plate-down/radziemska-lewandowski-2001";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"E. Radziemska, W. M. Lewandowski", 2001,
                                    "Appl. Energy 68, 347-366", known::quoted,
                                    "a text quotes it for 1e5 .. 1e10"};
  static constexpr auto envelope = within(limit<rayleigh_of<area_over_perimeter>>(1e4, 1e9));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    return T(0.52 * power<1, 5>(Ra));
  }
};

/// Mean Nusselt number of a long strip with uniform heat flux, on its WIDTH; water.
/// Nu = 0.58 Ra^(1/5)
/// Range: 1e6 <= Ra <= 1e11. Scatter not stated. Properties at T_wall - (T_wall - T_ambient)/4, the
/// expansion coefficient at the film temperature.
/// Source: Fujii and Imura 1972, Int. J. Heat Mass Transfer 15, 755-767.
struct fujii_imura_1972
    : correlation<fujii_imura_1972, nusselt_of<strip_width>, rayleigh_of<strip_width>> {
  static constexpr const char* id = "horizontal-plate-down/fujii-imura-1972";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"T. Fujii, H. Imura", 1972,
                                    "Int. J. Heat Mass Transfer 15, 755-767", known::recalled,
                                    "its property state is three quarters of the way to the wall"};
  static constexpr auto envelope = within(limit<rayleigh_of<strip_width>>(1e6, 1e11));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    return T(0.58 * power<1, 5>(Ra));
  }
};

/// Mean Nusselt number, with a thick layer at low Ra; no extensions beyond the plate's edges.
/// Nu_T = 0.527 Ra^(1/5) / [1 + (1.9/Pr)^(9/10)]^(2/9); Nu = 2.5/ln(1 + 2.5/Nu_T)
/// Range: 1e3 <= Ra <= 1e10. Scatter not stated.
/// Source: Raithby and Hollands 1998, in Rohsenow, Hartnett, Cho (eds), Handbook of Heat Transfer,
/// 3rd ed., ch. 4.
struct raithby_hollands_1998 : correlation<raithby_hollands_1998, nusselt_of<area_over_perimeter>,
                                           rayleigh_of<area_over_perimeter>, prandtl_number> {
  static constexpr const char* id = "horizontal-plate-down/raithby-hollands-1998";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"G. D. Raithby, K. G. T. Hollands", 1998,
                                    "Handbook of Heat Transfer, 3rd ed., ch. 4", known::recalled};
  static constexpr auto envelope = within(limit<rayleigh_of<area_over_perimeter>>(1e3, 1e10),
                                          limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    const T thin = T(0.527 * power<1, 5>(Ra) * power<-2, 9>(T(1.0 + power<9, 10>(T(1.9 / Pr)))));
    return detail::thin_layer::thickened(T(2.5), thin);
  }
};

}  // namespace horizontal_plate_down
}  // namespace v0
}  // namespace convelope

#endif
