#ifndef CONVELOPE_CORRELATIONS_NATURAL_VERTICAL_PLATE_LOCAL_HPP
#define CONVELOPE_CORRELATIONS_NATURAL_VERTICAL_PLATE_LOCAL_HPP

#include "convelope/correlations/natural/thin_layer.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

namespace vertical_plate {

/// Local Nusselt number, isothermal wall, laminar. The mean over the height is 4/3 of the value at
/// its end.
/// Nu_x = 0.503 Ra_x^(1/4) / [1 + (0.492/Pr)^(9/16)]^(4/9)
/// Range: Ra_x <= 1e9, all Pr. Within 0.6 % of the similarity solution for Pr 0.01 .. 1000.
/// Source: Churchill and Ozoe 1973, J. Heat Transfer 95, 540-541.
struct churchill_ozoe_local_1973
    : correlation<churchill_ozoe_local_1973, local_nusselt_of<distance_from_edge>,
                  rayleigh_of<distance_from_edge>, prandtl_number> {
  static constexpr const char* id = "vertical-plate/churchill-ozoe-local-1973";
  static constexpr const char* quantity = "Nu_x";
  static constexpr const char* keys[] = {"Ra_x", "Pr"};
  static constexpr reference source{"S. W. Churchill, H. Ozoe", 1973,
                                    "J. Heat Transfer 95, 540-541", known::computed};
  static constexpr auto envelope = within(limit<rayleigh_of<distance_from_edge>>(0.0, 1e9),
                                          limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    return T(0.503 * power<1, 4>(Ra) *
             power<-4, 9>(detail::thin_layer::prandtl_bracket(0.492, Pr)));
  }
};

/// Local Nusselt number, isothermal wall, laminar. Mean = 4/3 of the value at the end.
/// Nu_x = (3/4) [2 Pr^2 / (5 (1 + 2 Pr^(1/2) + 2 Pr))]^(1/4) Gr_x^(1/4)
/// Range: Gr_x Pr <= 1e9, all Pr. Within 0.6 % of the similarity solution for Pr 0.01 .. 1000.
/// Source: Ede 1967, Adv. Heat Transfer 4, 1-64.
struct ede_1967 : correlation<ede_1967, local_nusselt_of<distance_from_edge>,
                              grashof_of<distance_from_edge>, prandtl_number> {
  static constexpr const char* id = "vertical-plate/ede-1967";
  static constexpr const char* quantity = "Nu_x";
  static constexpr const char* keys[] = {"Gr_x", "Pr"};
  static constexpr reference source{"A. J. Ede", 1967, "Adv. Heat Transfer 4, 1-64",
                                    known::computed};
  static constexpr auto envelope =
      within(limit_on("Gr_x Pr", 0.0, 1e9, [](auto Gr, auto Pr) { return Gr * Pr; }),
             limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Gr, const T& Pr) {
    return T(0.75 * power<1, 4>(T(Gr * Pr * Pr * (2.0 / 5.0) / (1.0 + 2.0 * sqrt(Pr) + 2.0 * Pr))));
  }
};

/// Local Nusselt number, isothermal wall, laminar. Mean = 4/3 of the value at the end.
/// Nu_x = 0.75 (Gr_x/4)^(1/4) Pr^(1/2) / (0.609 + 1.221 Pr^(1/2) + 1.238 Pr)^(1/4)
/// Range: Gr_x Pr <= 1e9, all Pr. The source states 0.5 % against the similarity solution.
/// Source: LeFevre 1956, Proc. 9th Int. Congr. Appl. Mech., Brussels, 4, 168-174.
struct lefevre_1956 : correlation<lefevre_1956, local_nusselt_of<distance_from_edge>,
                                  grashof_of<distance_from_edge>, prandtl_number> {
  static constexpr const char* id = "vertical-plate/lefevre-1956";
  static constexpr const char* quantity = "Nu_x";
  static constexpr const char* keys[] = {"Gr_x", "Pr"};
  static constexpr reference source{"E. J. LeFevre", 1956,
                                    "Proc. 9th Int. Congr. Appl. Mech., Brussels, 4, 168-174",
                                    known::computed};
  static constexpr auto envelope =
      within(limit_on("Gr_x Pr", 0.0, 1e9, [](auto Gr, auto Pr) { return Gr * Pr; }),
             limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = 0.005;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Gr, const T& Pr) {
    return T(0.75 * power<1, 4>(T(0.25 * Gr * Pr * Pr / (0.609 + 1.221 * sqrt(Pr) + 1.238 * Pr))));
  }
};

}  // namespace vertical_plate
}  // namespace v0
}  // namespace convelope

#endif
