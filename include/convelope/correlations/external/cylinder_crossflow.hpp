#ifndef CONVELOPE_CORRELATIONS_EXTERNAL_CYLINDER_CROSSFLOW_HPP
#define CONVELOPE_CORRELATIONS_EXTERNAL_CYLINDER_CROSSFLOW_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
/// The laminar part, 0.62 Re^(1/2) Pr^(1/3) / [1 + (0.4/Pr)^(2/3)]^(1/4).
template <class T>
CONVELOPE_FUNCTION constexpr T crossflow_low(const T& Re, const T& Pr) {
  return T(0.62 * math::power<1, 2>(Re) * math::power<1, 3>(Pr) *
           math::power<-1, 4>(T(1.0 + 0.5428835233189813143 * math::power<-2, 3>(Pr))));
}
}  // namespace detail

/// A long circular cylinder, its axis across an unbounded stream.
namespace cylinder_crossflow {

/// Mean Nusselt number on the diameter, one formula for all regimes.
/// Nu = 0.3 + 0.62 Re^(1/2) Pr^(1/3) / [1 + (0.4/Pr)^(2/3)]^(1/4) [1 + (Re/282000)^(5/8)]^(4/5)
/// Re: on D and the undisturbed velocity. Properties at the film temperature.
/// Range: Re Pr >= 0.2, Re up to 1e7 (the data). The source calls it a lower bound; up to 20 % low
/// for Re 2e4 .. 4e5.
/// Source: Churchill and Bernstein 1977, J. Heat Transfer 99, 300-306.
struct churchill_bernstein_1977 : correlation<churchill_bernstein_1977, nusselt_of<diameter>,
                                              reynolds_of<diameter>, prandtl_number> {
  static constexpr const char* id = "cylinder-crossflow/churchill-bernstein-1977";
  static constexpr const char* quantity = "Nu_D";
  static constexpr reference source{"S. W. Churchill, M. Bernstein", 1977,
                                    "J. Heat Transfer 99, 300-306", known::quoted,
                                    "scatter: texts say 20 % typical, 30 % at worst"};
  static constexpr auto envelope =
      within(limit<reynolds_of<diameter>>(0.0, 1e7),
             limit_on("Re Pr", 0.2, unbounded, [](auto Re, auto Pr) { return Re * Pr; }));
  static constexpr double scatter = 0.2;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.3 + detail::crossflow_low(Re, Pr) *
                       power<4, 5>(T(1.0 + 3.922783205509214561e-04 * power<5, 8>(Re))));
  }
};

/// The same between Re 2e4 and 4e5, where the one formula is up to 20 % low.
/// Nu = 0.3 + 0.62 Re^(1/2) Pr^(1/3) / [1 + (0.4/Pr)^(2/3)]^(1/4) [1 + (Re/282000)^(1/2)]
/// Re: on D and the undisturbed velocity. Film temperature. Range: Re 2e4 .. 4e5, Re Pr >= 0.2.
/// It doesn't join the other at the ends: in air 10 % above it at 2e4, 15 % at 4e5.
/// Source: Churchill and Bernstein 1977, J. Heat Transfer 99, 300-306.
struct churchill_bernstein_1977_midrange
    : correlation<churchill_bernstein_1977_midrange, nusselt_of<diameter>, reynolds_of<diameter>,
                  prandtl_number> {
  static constexpr const char* id = "cylinder-crossflow/churchill-bernstein-1977-midrange";
  static constexpr const char* quantity = "Nu_D";
  static constexpr reference source{"S. W. Churchill, M. Bernstein", 1977,
                                    "J. Heat Transfer 99, 300-306", known::recalled,
                                    "scatter: texts say 20 % typical, 30 % at worst"};
  static constexpr auto envelope =
      within(limit<reynolds_of<diameter>>(2e4, 4e5),
             limit_on("Re Pr", 0.2, unbounded, [](auto Re, auto Pr) { return Re * Pr; }));
  static constexpr double scatter = 0.2;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.3 +
             detail::crossflow_low(Re, Pr) * (1.0 + 1.88310894288677357e-03 * power<1, 2>(Re)));
  }
};

}  // namespace cylinder_crossflow
}  // namespace v0
}  // namespace convelope

#endif
