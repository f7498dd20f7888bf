#ifndef CONVELOPE_CORRELATIONS_FRICTION_FLAT_PLATE_FRICTION_HPP
#define CONVELOPE_CORRELATIONS_FRICTION_FLAT_PLATE_FRICTION_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// Friction of a smooth flat plate along a uniform stream. Local: tau_w / (rho u^2/2). Mean: the
/// drag of ONE side over (A rho u^2/2); some lists give both sides, twice this.
namespace flat_plate_friction {

/// cf = 0.664 Re_x^(-1/2), laminar. Re_x 1e3 .. 5e5. The solution of the boundary-layer equations.
/// Source: Blasius 1908.
struct blasius_local
    : correlation<blasius_local, local_skin_friction, reynolds_of<distance_from_edge>> {
  static constexpr const char* id = "flat-plate-friction/blasius-local";
  static constexpr const char* quantity = "cf_x";
  static constexpr reference source{"H. Blasius", 1908, "Z. Math. Phys. 56, 1-37", known::quoted};
  static constexpr auto envelope = within(limit<reynolds_of<distance_from_edge>>(1e3, 5e5));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    return T(0.664 / sqrt(Re));
  }
};

/// C_f = 1.328 Re_L^(-1/2), the mean of blasius_local over 0 .. L. Re_L 1e3 .. 5e5.
struct blasius_average : correlation<blasius_average, skin_friction, reynolds_of<plate_length>> {
  static constexpr const char* id = "flat-plate-friction/blasius-average";
  static constexpr const char* quantity = "Cf_L";
  static constexpr reference source{"H. Blasius", 1908, "Z. Math. Phys. 56, 1-37", known::quoted,
                                    "rounded to 1.33 in some texts"};
  static constexpr auto envelope = within(limit<reynolds_of<plate_length>>(1e3, 5e5));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    return T(1.328 / sqrt(Re));
  }
};

/// cf = 0.0592 Re_x^(-1/5), turbulent from the edge on. Re_x 5e5 .. 1e7.
/// Source: Prandtl's one-seventh-power profile, constant of Schlichting.
struct power_law_local
    : correlation<power_law_local, local_skin_friction, reynolds_of<distance_from_edge>> {
  static constexpr const char* id = "flat-plate-friction/power-law-local";
  static constexpr const char* quantity = "cf_x";
  static constexpr reference source{"H. Schlichting", 1979,
                                    "Boundary-Layer Theory, 7th ed., ch. 21", known::quoted,
                                    "0.0576 is printed too"};
  static constexpr auto envelope = within(limit<reynolds_of<distance_from_edge>>(5e5, 1e7));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    return T(0.0592 * power<-1, 5>(Re));
  }
};

/// C_f = 0.074 Re_L^(-1/5), the mean of power_law_local over 0 .. L. Re_L 5e5 .. 1e7.
struct power_law_average
    : correlation<power_law_average, skin_friction, reynolds_of<plate_length>> {
  static constexpr const char* id = "flat-plate-friction/power-law-average";
  static constexpr const char* quantity = "Cf_L";
  static constexpr reference source{"H. Schlichting", 1979,
                                    "Boundary-Layer Theory, 7th ed., ch. 21", known::quoted,
                                    "0.072 belongs to 0.0576"};
  static constexpr auto envelope = within(limit<reynolds_of<plate_length>>(5e5, 1e7));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    return T(0.074 * power<-1, 5>(Re));
  }
};

}  // namespace flat_plate_friction
}  // namespace v0
}  // namespace convelope

#endif
