#ifndef CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_TRANSITION_HPP
#define CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_TRANSITION_HPP

#include "convelope/correlations/internal/round_duct_laminar_entry.hpp"
#include "convelope/correlations/internal/round_duct_turbulent.hpp"

namespace convelope {
inline namespace v0 {

namespace detail::gnielinski_line {
/// Laminar to Re 2300, turbulent from `turbulent_from` on, between them a straight line in Re from
/// one end value to the other. `lost` is what the turbulent branch takes off Re.
template <class T>
CONVELOPE_FUNCTION constexpr T value(double turbulent_from, double lost, const T& Re, const T& Pr,
                                     const T& L_over_D, round_duct::wall bc) {
  constexpr auto combined = round_duct::entry::combined;
  const T Gz = T(math::smaller(Re, T(2300.0)) * Pr / L_over_D);
  const T laminar = bc == round_duct::wall::uniform_temperature
                        ? gnielinski_laminar::uwt(1.615, 1.0, Gz, Pr, combined)
                        : gnielinski_laminar::uhf(0.6, 1.953, 0.924, Gz, Pr, combined);
  const T fast = math::larger(Re, T(turbulent_from));
  const T turbulent = T(petukhov::nusselt(1.0, petukhov::root(1.8, 1.5, fast), T(fast - lost), Pr) *
                        petukhov::entrance(L_over_D));
  const T along = T((Re - 2300.0) * (1.0 / (turbulent_from - 2300.0)));
  const T share = math::smaller(math::larger(along, T(0.0)), T(1.0));
  return T(laminar + share * (turbulent - laminar));
}
}  // namespace detail::gnielinski_line

namespace round_duct {

/// Mean over a length, all regimes, smooth, both profiles developing in laminar flow.
/// Re <= 2300: round-duct/gnielinski-laminar-uwt or -uhf; Re >= 1e4: (f/8) Re Pr/[1 + 12.7
/// sqrt(f/8) (Pr^(2/3) - 1)] [1 + (D/L)^(2/3)], f = (1.8 log10 Re - 1.5)^(-2), Darcy; between them
/// linear in Re. Continuous; the slope steps at 2300 and 1e4, as published.
/// Bulk properties; liquids times (Pr_b/Pr_w)^0.11, heated gases times (T_b/T_w)^0.45 (turbulent).
/// Range: Re <= 1e6, 0.6 <= Pr <= 1000, L/D >= 1. Scatter not stated.
/// Source: Gnielinski 1995, Forsch. Ing.-Wes. 61, 240-248; VDI Heat Atlas G1.
struct gnielinski_1995
    : correlation<gnielinski_1995, nusselt_of<hydraulic_diameter>, reynolds_of<hydraulic_diameter>,
                  prandtl_number, length_ratio, choice_of<wall>> {
  static constexpr const char* id = "round-duct/gnielinski-1995";
  static constexpr const char* quantity = "Nu_m";
  static constexpr reference source{"V. Gnielinski", 1995,
                                    "Forsch. Ing.-Wes. 61, 240-248; VDI Heat Atlas G1",
                                    known::recalled, "its turbulent branch has Re, not Re - 1000"};
  static constexpr auto envelope =
      within(limit<reynolds_of<hydraulic_diameter>>(0.0, 1e6), limit<prandtl_number>(0.6, 1000.0),
             limit<length_ratio>(1.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr, const T& L_over_D,
                                                wall bc) {
    return detail::gnielinski_line::value(1e4, 0.0, Re, Pr, L_over_D, bc);
  }
};

/// As gnielinski_1995 with the line from 2300 to 4000 and Re - 1000 in the turbulent branch.
/// The two differ: at Pr 7, L/D 100, Re 4000 by 19 %, at Re 1e4 by -10 %.
/// Range: Re <= 1e6, 0.6 <= Pr <= 1000, L/D >= 1. Scatter not stated.
/// Source: Gnielinski 2013, Int. J. Heat Mass Transfer 63, 134-140.
struct gnielinski_2013
    : correlation<gnielinski_2013, nusselt_of<hydraulic_diameter>, reynolds_of<hydraulic_diameter>,
                  prandtl_number, length_ratio, choice_of<wall>> {
  static constexpr const char* id = "round-duct/gnielinski-2013";
  static constexpr const char* quantity = "Nu_m";
  static constexpr reference source{
      "V. Gnielinski", 2013, "Int. J. Heat Mass Transfer 63, 134-140", known::recalled,
      "interval 2300-4000 seen in the abstract; an update to the article exists, not seen"};
  static constexpr auto envelope = gnielinski_1995::envelope;
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr, const T& L_over_D,
                                                wall bc) {
    return detail::gnielinski_line::value(4000.0, 1000.0, Re, Pr, L_over_D, bc);
  }
};

}  // namespace round_duct
}  // namespace v0
}  // namespace convelope

#endif
