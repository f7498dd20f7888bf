#ifndef CONVELOPE_CORRELATIONS_NATURAL_SPHERE_NATURAL_HPP
#define CONVELOPE_CORRELATIONS_NATURAL_SPHERE_NATURAL_HPP

#include "convelope/correlations/natural/thin_layer.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// A sphere. Here: isothermal, in a fluid at rest, Ra on the diameter and |T_wall - T_ambient|.
/// Film properties; a gas's expansion coefficient at the ambient temperature.
namespace sphere {

/// Mean Nusselt number, laminar.
/// Nu = 2 + 0.589 Ra^(1/4) / [1 + (0.469/Pr)^(9/16)]^(4/9)
/// Range: Ra <= 1e8, Pr >= 0.7. Scatter not stated. The author's all-range form, churchill_1983, is
/// 31 % above it at Ra 1e9 in air and 92 % at 1e11.
/// Source: Churchill 1983, Heat Exchanger Design Handbook, sec. 2.5.7.
struct churchill_laminar_1983 : correlation<churchill_laminar_1983, nusselt_of<diameter>,
                                            rayleigh_of<diameter>, prandtl_number> {
  static constexpr const char* id = "sphere/churchill-laminar-1983";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{
      "S. W. Churchill", 1983, "Heat Exchanger Design Handbook, sec. 2.5.7", known::quoted,
      "textbooks print Ra <= 1e11; 1e8 taken, where the turbulent form begins to matter"};
  static constexpr auto envelope =
      within(limit<rayleigh_of<diameter>>(0.0, 1e8), limit<prandtl_number>(0.7, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    return T(2.0 + 0.589 * power<1, 4>(Ra) *
                       power<-4, 9>(detail::thin_layer::prandtl_bracket(0.469, Pr)));
  }
};

/// Mean Nusselt number, laminar and turbulent.
/// Nu = 2 + 0.589 (Ra/P)^(1/4) (1 + 7.44e-8 Ra/P)^(1/12), P = [1 + (0.469/Pr)^(9/16)]^(16/9)
/// Range: all Ra and Pr. Scatter not stated; within 2.2 % of Raithby and Hollands' form in air from
/// Ra 1e9 to 1e11.
/// Source: Churchill 1983, Heat Exchanger Design Handbook, sec. 2.5.7.
struct churchill_1983
    : correlation<churchill_1983, nusselt_of<diameter>, rayleigh_of<diameter>, prandtl_number> {
  static constexpr const char* id = "sphere/churchill-1983";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"S. W. Churchill", 1983,
                                    "Heat Exchanger Design Handbook, sec. 2.5.7", known::recalled};
  static constexpr auto envelope =
      within(limit<rayleigh_of<diameter>>(0.0, unbounded), limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    const T scaled = T(Ra * power<-16, 9>(detail::thin_layer::prandtl_bracket(0.469, Pr)));
    return T(2.0 + 0.589 * power<1, 4>(scaled) * power<1, 12>(T(1.0 + 7.44e-8 * scaled)));
  }
};

/// Mean Nusselt number, laminar, Pr near 1.
/// Nu = 2 + 0.43 Ra^(1/4)
/// Range: 1 <= Ra <= 1e5. Scatter not stated.
/// Source: Yuge 1960, J. Heat Transfer 82, 214-220.
struct yuge_1960 : correlation<yuge_1960, nusselt_of<diameter>, rayleigh_of<diameter>> {
  static constexpr const char* id = "sphere/yuge-1960";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{
      "T. Yuge", 1960, "J. Heat Transfer 82, 214-220", known::recalled,
      "the source has 2 + 0.392 Gr^(1/4) in air, which is 0.427 Ra^(1/4) at Pr 0.71"};
  static constexpr auto envelope = within(limit<rayleigh_of<diameter>>(1.0, 1e5));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    return T(2.0 + 0.43 * power<1, 4>(Ra));
  }
};

}  // namespace sphere
}  // namespace v0
}  // namespace convelope

#endif
