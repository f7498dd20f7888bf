#ifndef CONVELOPE_CORRELATIONS_NATURAL_VERTICAL_CHANNEL_HPP
#define CONVELOPE_CORRELATIONS_NATURAL_VERTICAL_CHANNEL_HPP

#include "convelope/correlations/natural/vertical_channel_isoflux.hpp"
#include "convelope/correlations/natural/vertical_channel_optimum.hpp"
#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// Two vertical plates, gap b, height H, open to the ambient at both ends: boards in a rack, fins
/// on a base. El = (g beta dT b^3/(nu alpha)) b/H, Nu = h b/k, and dT of the wall over the INLET
/// (ambient) temperature, not over the bulk.
namespace vertical_channel {

/// Mean Nusselt number, both walls isothermal at the same temperature.
/// Nu = (El/24) [1 - exp(-35/El)]^(3/4)
/// Range: 0.1 <= El <= 1e5, air. Scatter not stated. The source takes properties at the wall; film
/// is the custom now.
/// Source: Elenbaas 1942, Physica 9, 1-28.
struct elenbaas_1942 : correlation<elenbaas_1942, nusselt_of<gap>, elenbaas_number> {
  static constexpr const char* id = "vertical-channel/elenbaas-1942";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"W. Elenbaas", 1942, "Physica 9, 1-28", known::computed,
                                    "1/24 is exact for El -> 0"};
  static constexpr auto envelope = within(limit<elenbaas_number>(0.1, 1e5));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& El) {
    const T not_zero = larger(El, T(0.01));  // exp(-3500) is 0: only the division is spared
    return T(El * (1.0 / 24.0) * power<3, 4>(T(1.0 - exp(T(-35.0 / not_zero)))));
  }
};

namespace parts {
/// El/sqrt(c + 2.873 El^(3/2)), which is [c/El^2 + 2.873/El^(1/2)]^(-1/2) with a slope at El = 0.
template <class T>
CONVELOPE_FUNCTION constexpr T isothermal(double c, const T& El) {
  const T not_zero = math::larger(El, T(1e-20));  // no change to the sum; keeps its slope finite
  return T(El / math::sqrt(T(c + 2.873 * not_zero * math::sqrt(not_zero))));
}
}  // namespace parts

/// Mean Nusselt number, both walls isothermal at the same temperature.
/// Nu = [576/El^2 + 2.873/El^(1/2)]^(-1/2)
/// Range: all El. Scatter not stated. 2.873 = 0.59^-2.
/// Source: Bar-Cohen and Rohsenow 1984, J. Heat Transfer 106, 116-123.
struct bar_cohen_rohsenow_isothermal_symmetric_1984
    : correlation<bar_cohen_rohsenow_isothermal_symmetric_1984, nusselt_of<gap>, elenbaas_number> {
  static constexpr const char* id = "vertical-channel/bar-cohen-rohsenow-isothermal-symmetric-1984";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"A. Bar-Cohen, W. M. Rohsenow", 1984,
                                    "J. Heat Transfer 106, 116-123", known::quoted,
                                    "a textbook prints 2.87"};
  static constexpr auto envelope = within(limit<elenbaas_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& El) {
    return parts::isothermal(576.0, El);
  }
};

/// Mean Nusselt number of the heated wall: one wall isothermal, the other adiabatic.
/// Nu = [144/El^2 + 2.873/El^(1/2)]^(-1/2)
/// Range: all El. Scatter not stated.
/// Source: Bar-Cohen and Rohsenow 1984, J. Heat Transfer 106, 116-123.
struct bar_cohen_rohsenow_isothermal_one_side_1984
    : correlation<bar_cohen_rohsenow_isothermal_one_side_1984, nusselt_of<gap>, elenbaas_number> {
  static constexpr const char* id = "vertical-channel/bar-cohen-rohsenow-isothermal-one-side-1984";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"A. Bar-Cohen, W. M. Rohsenow", 1984,
                                    "J. Heat Transfer 106, 116-123", known::computed,
                                    "1/12 is exact for El -> 0"};
  static constexpr auto envelope = within(limit<elenbaas_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& El) {
    return parts::isothermal(144.0, El);
  }
};

/// Mean Nusselt number of the two walls, each isothermal, fully developed flow. El and Nu both on
/// the MEAN excess of the walls; r_T = (T_2 - T_inlet)/(T_1 - T_inlet).
/// Nu = El (4 r_T^2 + 7 r_T + 4) / (90 (1 + r_T)^2)
/// Exact for constant properties as El -> 0. Range: the source says El << 1; El <= 1 taken, where
/// it is 0.9 % high (Pr -> inf, equal walls). r_T >= 0. Source: Aung 1972, Int. J. Heat Mass
/// Transfer 15, 1577-1580.
struct aung_fully_developed_1972
    : correlation<aung_fully_developed_1972, nusselt_of<gap>, elenbaas_number, wall_excess_ratio> {
  static constexpr const char* id = "vertical-channel/aung-fully-developed-1972";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"W. Aung", 1972, "Int. J. Heat Mass Transfer 15, 1577-1580",
                                    known::computed,
                                    "the source says El << 1; El <= 1 taken, 0.9 % there"};
  static constexpr auto envelope =
      within(limit<elenbaas_number>(0.0, 1.0), limit<wall_excess_ratio>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& El, const T& r_T) {
    return T(El * (4.0 + r_T * (7.0 + 4.0 * r_T)) / (90.0 * square(T(1.0 + r_T))));
  }
};

}  // namespace vertical_channel
}  // namespace v0
}  // namespace convelope

#endif
