#ifndef CONVELOPE_CORRELATIONS_EXTERNAL_FLAT_PLATE_LAMINAR_HPP
#define CONVELOPE_CORRELATIONS_EXTERNAL_FLAT_PLATE_LAMINAR_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// A smooth flat plate along a uniform stream, its leading edge sharp, heated from that edge on.
namespace flat_plate {

/// Local Nusselt number, laminar, uniform wall temperature: Nu_x = 0.332 Re_x^(1/2) Pr^(1/3).
/// Re: on the distance from the edge and the undisturbed velocity. Film temperature.
/// Range: Re 1e3 (boundary-layer theory) .. 5e5, Pr 0.6 .. 60. No scatter stated; against the
/// boundary-layer equations +1.1 % at Pr 0.6, exact at 1, -2.0 % at 60. Pr 0.1: 10 % high.
/// Source: Pohlhausen 1921, on the flow of Blasius 1908.
struct laminar_isothermal_local
    : correlation<laminar_isothermal_local, local_nusselt_of<distance_from_edge>,
                  reynolds_of<distance_from_edge>, prandtl_number> {
  static constexpr const char* id = "flat-plate/laminar-isothermal-local";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{"E. Pohlhausen", 1921, "ZAMM 1, 115-121", known::quoted,
                                    "upper Pr printed as 50, 60 or none"};
  static constexpr auto envelope =
      within(limit<reynolds_of<distance_from_edge>>(1e3, 5e5), limit<prandtl_number>(0.6, 60.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.332 * sqrt(Re) * power<1, 3>(Pr));
  }
};

/// Mean Nusselt number over 0 .. L, the integral of the local law: Nu_L = 0.664 Re_L^(1/2)
/// Pr^(1/3). Range, properties and source as laminar_isothermal_local.
struct laminar_isothermal_average
    : correlation<laminar_isothermal_average, nusselt_of<plate_length>, reynolds_of<plate_length>,
                  prandtl_number> {
  static constexpr const char* id = "flat-plate/laminar-isothermal-average";
  static constexpr const char* quantity = "Nu_L";
  static constexpr reference source = laminar_isothermal_local::source;
  static constexpr auto envelope =
      within(limit<reynolds_of<plate_length>>(1e3, 5e5), limit<prandtl_number>(0.6, 60.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.664 * sqrt(Re) * power<1, 3>(Pr));
  }
};

/// Local Nusselt number, laminar, uniform wall heat flux: Nu_x = 0.453 Re_x^(1/2) Pr^(1/3),
/// on the local wall excess. Film temperature. Range: Re 1e3 .. 5e5, Pr 0.6 .. 60. No scatter
/// stated; against the boundary-layer equations -0.7 % at Pr 0.6, -1.3 % at 1, -2.3 % at 60.
/// Source: the similarity solutions of Levy 1952, constant of the textbooks.
struct laminar_isoflux_local
    : correlation<laminar_isoflux_local, local_nusselt_of<distance_from_edge>,
                  reynolds_of<distance_from_edge>, prandtl_number> {
  static constexpr const char* id = "flat-plate/laminar-isoflux-local";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{"S. Levy", 1952, "J. Aeronaut. Sci. 19, 341-348",
                                    known::recalled,
                                    "0.453 as in the textbooks; exact 0.4590 at Pr 1, 0.4637 for "
                                    "large Pr"};
  static constexpr auto envelope =
      within(limit<reynolds_of<distance_from_edge>>(1e3, 5e5), limit<prandtl_number>(0.6, 60.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.453 * sqrt(Re) * power<1, 3>(Pr));
  }
};

/// Mean Nusselt number at uniform heat flux q on the MEAN wall excess, q L/(k mean(T_w - T_inf)):
/// Nu_L = 0.680 Re_L^(1/2) Pr^(1/3), 3/2 of the local law. The mean of h would be 2 x 0.453.
/// Range, properties and source as laminar_isoflux_local.
struct laminar_isoflux_average : correlation<laminar_isoflux_average, nusselt_of<plate_length>,
                                             reynolds_of<plate_length>, prandtl_number> {
  static constexpr const char* id = "flat-plate/laminar-isoflux-average";
  static constexpr const char* quantity = "Nu_L";
  static constexpr reference source{"S. Levy", 1952, "J. Aeronaut. Sci. 19, 341-348",
                                    known::recalled,
                                    "on the mean wall excess; the mean of h is 0.906"};
  static constexpr auto envelope =
      within(limit<reynolds_of<plate_length>>(1e3, 5e5), limit<prandtl_number>(0.6, 60.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.680 * sqrt(Re) * power<1, 3>(Pr));
  }
};

/// Local Nusselt number, laminar, uniform wall temperature, every Prandtl number.
/// Nu_x = 0.3387 Re_x^(1/2) Pr^(1/3) / [1 + (0.0468/Pr)^(2/3)]^(1/4)
/// Film temperature. Range: Re_x Pr >= 100, laminar (Re_x up to 5e5). No scatter stated; against
/// the boundary-layer equations -1.1 .. +1.4 % over Pr 1e-3 .. 1e3.
/// Source: Churchill and Ozoe 1973, J. Heat Transfer 95, 416-419.
struct churchill_ozoe_1973_isothermal_local
    : correlation<churchill_ozoe_1973_isothermal_local, local_nusselt_of<distance_from_edge>,
                  reynolds_of<distance_from_edge>, prandtl_number> {
  static constexpr const char* id = "flat-plate/churchill-ozoe-1973-isothermal-local";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{"S. W. Churchill, H. Ozoe", 1973,
                                    "J. Heat Transfer 95, 416-419", known::computed};
  static constexpr auto envelope = within(
      limit<reynolds_of<distance_from_edge>>(0.0, 5e5), limit<prandtl_number>(0.0, unbounded),
      limit_on("Re Pr", 100.0, unbounded, [](auto Re, auto Pr) { return Re * Pr; }));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.3387 * sqrt(Re) * power<1, 3>(Pr) /
             power<1, 4>(T(1.0 + power<2, 3>(T(0.0468 / Pr)))));
  }
};

/// Mean over 0 .. L of churchill_ozoe_1973_isothermal_local: twice the local value at L.
struct churchill_ozoe_1973_isothermal_average
    : correlation<churchill_ozoe_1973_isothermal_average, nusselt_of<plate_length>,
                  reynolds_of<plate_length>, prandtl_number> {
  static constexpr const char* id = "flat-plate/churchill-ozoe-1973-isothermal-average";
  static constexpr const char* quantity = "Nu_L";
  static constexpr reference source = churchill_ozoe_1973_isothermal_local::source;
  static constexpr auto envelope =
      within(limit<reynolds_of<plate_length>>(0.0, 5e5), limit<prandtl_number>(0.0, unbounded),
             limit_on("Re Pr", 100.0, unbounded, [](auto Re, auto Pr) { return Re * Pr; }));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(2.0 * churchill_ozoe_1973_isothermal_local::formula(Re, Pr));
  }
};

/// Local Nusselt number, laminar, uniform wall heat flux, every Prandtl number.
/// Nu_x = 0.4637 Re_x^(1/2) Pr^(1/3) / [1 + (0.02052/Pr)^(2/3)]^(1/4)
/// Film temperature. Range: Re_x Pr >= 100, laminar (Re_x up to 5e5). No scatter stated; against
/// the boundary-layer equations -0.9 .. +1.6 % over Pr 1e-3 .. 1e3.
/// Source: Churchill and Ozoe 1973, J. Heat Transfer 95, 78-84.
struct churchill_ozoe_1973_isoflux_local
    : correlation<churchill_ozoe_1973_isoflux_local, local_nusselt_of<distance_from_edge>,
                  reynolds_of<distance_from_edge>, prandtl_number> {
  static constexpr const char* id = "flat-plate/churchill-ozoe-1973-isoflux-local";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{"S. W. Churchill, H. Ozoe", 1973, "J. Heat Transfer 95, 78-84",
                                    known::computed,
                                    "0.0205 and 0.0207 are printed too; 0.02052 has the exact "
                                    "limit sqrt(pi Pe)/2"};
  static constexpr auto envelope = churchill_ozoe_1973_isothermal_local::envelope;
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.4637 * sqrt(Re) * power<1, 3>(Pr) /
             power<1, 4>(T(1.0 + power<2, 3>(T(0.02052 / Pr)))));
  }
};

/// Local Nusselt number, laminar, uniform wall temperature, liquid metals: Nu_x = (Pe_x/pi)^(1/2),
/// conduction into a stream of uniform velocity. Film temperature.
/// Range: Pr <= 0.05, Re_x Pr >= 100, Re_x up to 5e5. An upper bound: against the boundary-layer
/// equations +3.0 % at Pr 1e-3, +9.4 % at 0.01; churchill_ozoe_1973_isothermal_local is closer.
/// Source: the conduction solution; printed with 0.565 in handbooks.
struct laminar_low_prandtl_local
    : correlation<laminar_low_prandtl_local, local_nusselt_of<distance_from_edge>,
                  reynolds_of<distance_from_edge>, prandtl_number> {
  static constexpr const char* id = "flat-plate/laminar-low-prandtl-local";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{"E. Pohlhausen", 1921, "ZAMM 1, 115-121", known::computed,
                                    "the limit of small Pr; one handbook prints Pr >= 0.6 for it"};
  static constexpr auto envelope =
      within(limit<reynolds_of<distance_from_edge>>(0.0, 5e5), limit<prandtl_number>(0.0, 0.05),
             limit_on("Re Pr", 100.0, unbounded, [](auto Re, auto Pr) { return Re * Pr; }));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    constexpr double one_over_root_pi = 0.56418958354775628695;
    return T(one_over_root_pi * sqrt(T(Re * Pr)));
  }
};

}  // namespace flat_plate
}  // namespace v0
}  // namespace convelope

#endif
