#ifndef CONVELOPE_CORRELATIONS_FRICTION_ENTRANCE_HPP
#define CONVELOPE_CORRELATIONS_FRICTION_ENTRANCE_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {
namespace friction {

/// Entrance length of the laminar velocity profile over the diameter (99 % of the developed
/// centre-line velocity): L_h/D = 0.60/(1 + 0.035 Re) + 0.056 Re.
/// Pr has no part in it; it is taken so that both laminar lengths are asked alike.
/// Range: Re <= 2300. Scatter not stated.
/// Source: Chen 1973, J. Appl. Mech. 40, 1153-1158.
struct entrance_length_laminar_velocity
    : correlation<entrance_length_laminar_velocity, velocity_entry_ratio,
                  reynolds_of<hydraulic_diameter>, prandtl_number> {
  static constexpr const char* id = "friction/entrance-length";
  static constexpr const char* quantity = "Lh_over_D_laminar";
  static constexpr input_default otherwise[] = {{"Pr", 1.0}};
  static constexpr reference source{"R. Y. Chen", 1973, "J. Appl. Mech. 40, 1153-1158",
                                    known::quoted, "slopes of 0.05, 0.056 and 0.06 are printed"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(0.0, 2300.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T&) {
    return T(0.60 / (1.0 + 0.035 * Re) + 0.056 * Re);
  }
};

/// Entrance length of the laminar temperature profile over the diameter: L_t/D = 0.05 Re Pr.
/// Common practice. By a 5 % criterion the exact slope is 0.033 (uniform wall temperature) or
/// 0.043 (uniform flux).
/// Range: Re <= 2300, Pr > 0. Scatter not stated.
/// Source: Kays and Crawford, Convective Heat and Mass Transfer.
struct entrance_length_laminar_temperature
    : correlation<entrance_length_laminar_temperature, thermal_entry_ratio,
                  reynolds_of<hydraulic_diameter>, prandtl_number> {
  static constexpr const char* id = "friction/entrance-length";
  static constexpr const char* quantity = "Lt_over_D_laminar";
  static constexpr reference source{"W. M. Kays, M. E. Crawford", 1993,
                                    "Convective Heat and Mass Transfer, McGraw-Hill, 3rd ed.",
                                    known::quoted, "common practice"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(0.0, 2300.0),
                                          limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.05 * Re * Pr);
  }
};

/// Entrance length of the turbulent velocity profile over the diameter: L_h/D = 1.359 Re^(1/4).
/// (The temperature profile takes about 10 diameters: common practice.)
/// Range: Re >= 1e4. Scatter not stated.
/// Source: Zhi-qing 1982, Appl. Math. Mech. 3, 433-446.
struct entrance_length_turbulent_velocity
    : correlation<entrance_length_turbulent_velocity, velocity_entry_ratio,
                  reynolds_of<hydraulic_diameter>> {
  static constexpr const char* id = "friction/entrance-length";
  static constexpr const char* quantity = "Lh_over_D_turbulent";
  static constexpr reference source{"W. Zhi-qing", 1982, "Appl. Math. Mech. 3, 433-446",
                                    known::quoted, "lower bound from memory"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(1e4, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    return T(1.359 * power<1, 4>(Re));
  }
};

enum class regime { laminar, turbulent };
enum class direction { heating, cooling };

}  // namespace friction

template <>
struct choice_words<friction::regime> {
  static constexpr const char* key = "regime";
  static constexpr const char* about = "flow regime";
  static constexpr const char* words[] = {"laminar", "turbulent", nullptr};
};
template <>
struct choice_words<friction::direction> {
  static constexpr const char* key = "direction";
  static constexpr const char* about = "what happens to the fluid";
  static constexpr const char* words[] = {"heating", "cooling", nullptr};
};

namespace friction {

/// Friction factor of a liquid over that with all properties at the bulk temperature:
/// f/f_b = (mu_w/mu_b)^m, m = 0.58 (laminar, heated), 0.50 (laminar, cooled), 0.25 (turbulent).
/// The exponent acts on mu_w/mu_b; the input is mu_b/mu_w, as in the heat-transfer factors.
/// Range: 0.1 <= mu_w/mu_b <= 10 laminar, 0.3 .. 2 turbulent. Scatter not stated.
/// Source: Deissler 1951, NACA TN 2410; Kays and Crawford.
struct property_correction_liquid
    : correlation<property_correction_liquid, friction_correction, viscosity_ratio,
                  choice_of<regime>, choice_of<direction>> {
  static constexpr const char* id = "friction/property-correction-liquid";
  static constexpr const char* quantity = "f_over_fcp";
  static constexpr const char* keys[] = {"mu_b_over_mu_w", "regime", "direction"};
  static constexpr reference source{"R. G. Deissler; W. M. Kays, M. E. Crawford", 1951,
                                    "NACA TN 2410", known::recalled,
                                    "laminar cooling 0.50 or 0.54, turbulent cooling 0.24 or 0.25 "
                                    "are printed; first values taken"};
  // Whole numbers, so that packs of float keep to float.
  static constexpr auto envelope =
      within(limit_on("mu_w/mu_b (laminar)", 0.1, 10.0,
                      [](auto r, regime f, direction) {
                        return f == regime::laminar ? decltype(r)(1 / r) : decltype(r)(1);
                      }),
             limit_on("mu_w/mu_b (turbulent)", 0.3, 2.0, [](auto r, regime f, direction) {
               return f == regime::turbulent ? decltype(r)(1 / r) : decltype(r)(1);
             }));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& mu_b_over_mu_w, regime flow,
                                                direction heat) {
    const double m = flow == regime::turbulent ? 0.25 : heat == direction::heating ? 0.58 : 0.50;
    return exp(T(log(mu_b_over_mu_w) * -m));
  }
};

}  // namespace friction
}  // namespace v0
}  // namespace convelope

#endif
