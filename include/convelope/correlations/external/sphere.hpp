#ifndef CONVELOPE_CORRELATIONS_EXTERNAL_SPHERE_HPP
#define CONVELOPE_CORRELATIONS_EXTERNAL_SPHERE_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// A sphere in an unbounded stream. Mean Nusselt number on the diameter; Re: on the diameter and
/// the undisturbed velocity. At rest Nu = 2, conduction into the still fluid.
namespace sphere {

/// Nu = 2 + (0.4 Re^(1/2) + 0.06 Re^(2/3)) Pr^0.4 (mu/mu_w)^(1/4)
/// Properties of the free stream, mu_w at the wall temperature; without the ratio, 1.
/// Range: Re 3.5 .. 7.6e4, Pr 0.71 .. 380, mu/mu_w 1.0 .. 3.2: a wall hotter than a gas is outside.
/// Source: Whitaker 1972, AIChE J. 18, 361-371.
struct whitaker_1972 : correlation<whitaker_1972, nusselt_of<diameter>, reynolds_of<diameter>,
                                   prandtl_number, viscosity_ratio> {
  static constexpr const char* id = "sphere/whitaker-1972";
  static constexpr const char* quantity = "Nu_D";
  static constexpr input_default otherwise[] = {{"mu_ratio", 1.0}};
  static constexpr reference source{"S. Whitaker", 1972, "AIChE J. 18, 361-371", known::quoted,
                                    "one handbook misprints 4.0 for 0.4; upper Re 7.6e4 or 8e4; "
                                    "scatter: texts say 30 %"};
  static constexpr auto envelope =
      within(limit<reynolds_of<diameter>>(3.5, 7.6e4), limit<prandtl_number>(0.71, 380.0),
             limit<viscosity_ratio>(1.0, 3.2));
  static constexpr double scatter = 0.3;
  static constexpr state_rule state_at = state_rule::free_stream_with_wall;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr, const T& mu_ratio) {
    const T flow = T(0.4 * sqrt(Re) + 0.06 * power<2, 3>(Re));
    return T(2.0 + flow * power<2, 5>(Pr) * power<1, 4>(mu_ratio));
  }
};

/// Nu = 2 + 0.6 Re^(1/2) Pr^(1/3), found with evaporating drops; evaporation itself lowers h.
/// Film temperature. Range: Re 0 .. 200 (the drops), Pr 0.6 .. 380; used by others up to Re 5e4.
/// Source: Ranz and Marshall 1952, Chem. Eng. Prog. 48, 141-146 and 173-180.
struct ranz_marshall_1952
    : correlation<ranz_marshall_1952, nusselt_of<diameter>, reynolds_of<diameter>, prandtl_number> {
  static constexpr const char* id = "sphere/ranz-marshall-1952";
  static constexpr const char* quantity = "Nu_D";
  static constexpr reference source{"W. E. Ranz, W. R. Marshall", 1952,
                                    "Chem. Eng. Prog. 48, 141-146, 173-180", known::quoted,
                                    "upper Re 200 (drops) .. 5e4 and lower Pr 0.6 or 0.7 are "
                                    "printed"};
  static constexpr auto envelope =
      within(limit<reynolds_of<diameter>>(0.0, 200.0), limit<prandtl_number>(0.6, 380.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(2.0 + 0.6 * sqrt(Re) * power<1, 3>(Pr));
  }
};

}  // namespace sphere
}  // namespace v0
}  // namespace convelope

#endif
