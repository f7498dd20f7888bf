#ifndef CONVELOPE_CORRELATIONS_NATURAL_VERTICAL_CHANNEL_ISOFLUX_HPP
#define CONVELOPE_CORRELATIONS_NATURAL_VERTICAL_CHANNEL_ISOFLUX_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

// Uniform heat flux q: El* = (g beta q b^4/(k nu alpha)) b/H, Nu = q b/(k dT) with the wall's dT
// over the inlet at the exit or at mid height. 2.51 = 0.63^-2 belongs to Pr -> inf; at wide gaps
// these are some 20 % high in air.
namespace vertical_channel {

namespace parts {
/// [c/El + w/El^(2/5)]^(-1/2), written so that El = 0 gives 0.
template <class T>
CONVELOPE_FUNCTION constexpr T isoflux(double c, double w, const T& El) {
  const T not_zero = math::larger(El, T(1e-30));  // no change to the sum; keeps its slope finite
  return math::sqrt(T(El / (c + w * math::power<3, 5>(not_zero))));
}
}  // namespace parts

/// Local Nusselt number at the exit, both walls heated.
/// Nu_L = [48/El* + 2.51/El*^(2/5)]^(-1/2)
/// Range: all El*. Scatter not stated. Properties at the film temperature of the exit.
/// Source: Bar-Cohen and Rohsenow 1984, J. Heat Transfer 106, 116-123.
struct bar_cohen_rohsenow_isoflux_symmetric_1984
    : correlation<bar_cohen_rohsenow_isoflux_symmetric_1984, local_nusselt_of<gap>,
                  flux_elenbaas_number> {
  static constexpr const char* id = "vertical-channel/bar-cohen-rohsenow-isoflux-symmetric-1984";
  static constexpr const char* quantity = "Nu_L";
  static constexpr const char* keys[] = {"El"};
  static constexpr reference source{"A. Bar-Cohen, W. M. Rohsenow", 1984,
                                    "J. Heat Transfer 106, 116-123", known::computed,
                                    "48 is exact for El* -> 0"};
  static constexpr auto envelope = within(limit<flux_elenbaas_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& El) {
    return parts::isoflux(48.0, 2.51, El);
  }
};

/// Local Nusselt number of the heated wall at the exit, the other wall adiabatic.
/// Nu_L = [24/El* + 2.51/El*^(2/5)]^(-1/2)
/// Range: all El*. Scatter not stated. Properties at the film temperature of the exit.
/// Source: Bar-Cohen and Rohsenow 1984, J. Heat Transfer 106, 116-123.
struct bar_cohen_rohsenow_isoflux_one_side_1984
    : correlation<bar_cohen_rohsenow_isoflux_one_side_1984, local_nusselt_of<gap>,
                  flux_elenbaas_number> {
  static constexpr const char* id = "vertical-channel/bar-cohen-rohsenow-isoflux-one-side-1984";
  static constexpr const char* quantity = "Nu_L";
  static constexpr const char* keys[] = {"El"};
  static constexpr reference source{"A. Bar-Cohen, W. M. Rohsenow", 1984,
                                    "J. Heat Transfer 106, 116-123", known::computed,
                                    "24 is exact for El* -> 0"};
  static constexpr auto envelope = within(limit<flux_elenbaas_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& El) {
    return parts::isoflux(24.0, 2.51, El);
  }
};

/// Local Nusselt number at mid height, both walls heated.
/// Nu_half = [12/El* + 1.88/El*^(2/5)]^(-1/2)
/// Range: all El*. Scatter not stated. Properties at the film temperature of mid height.
/// Source: Bar-Cohen and Rohsenow 1984, J. Heat Transfer 106, 116-123.
struct bar_cohen_rohsenow_isoflux_symmetric_midheight_1984
    : correlation<bar_cohen_rohsenow_isoflux_symmetric_midheight_1984, local_nusselt_of<gap>,
                  flux_elenbaas_number> {
  static constexpr const char* id =
      "vertical-channel/bar-cohen-rohsenow-isoflux-symmetric-midheight-1984";
  static constexpr const char* quantity = "Nu_half";
  static constexpr const char* keys[] = {"El"};
  static constexpr reference source{"A. Bar-Cohen, W. M. Rohsenow", 1984,
                                    "J. Heat Transfer 106, 116-123", known::computed,
                                    "12 is exact for El* -> 0; 1.88 is remembered"};
  static constexpr auto envelope = within(limit<flux_elenbaas_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& El) {
    return parts::isoflux(12.0, 1.88, El);
  }
};

/// Local Nusselt number of the heated wall at mid height, the other wall adiabatic.
/// Nu_half = [6/El* + 1.88/El*^(2/5)]^(-1/2)
/// Range: all El*. Scatter not stated. Properties at the film temperature of mid height.
/// Source: Bar-Cohen and Rohsenow 1984, J. Heat Transfer 106, 116-123.
struct bar_cohen_rohsenow_isoflux_one_side_midheight_1984
    : correlation<bar_cohen_rohsenow_isoflux_one_side_midheight_1984, local_nusselt_of<gap>,
                  flux_elenbaas_number> {
  static constexpr const char* id =
      "vertical-channel/bar-cohen-rohsenow-isoflux-one-side-midheight-1984";
  static constexpr const char* quantity = "Nu_half";
  static constexpr const char* keys[] = {"El"};
  static constexpr reference source{"A. Bar-Cohen, W. M. Rohsenow", 1984,
                                    "J. Heat Transfer 106, 116-123", known::computed,
                                    "6 is exact for El* -> 0; 1.88 is remembered"};
  static constexpr auto envelope = within(limit<flux_elenbaas_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& El) {
    return parts::isoflux(6.0, 1.88, El);
  }
};

}  // namespace vertical_channel
}  // namespace v0
}  // namespace convelope

#endif
