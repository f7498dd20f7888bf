#ifndef CONVELOPE_CORRELATIONS_EXTERNAL_FLAT_PLATE_TURBULENT_HPP
#define CONVELOPE_CORRELATIONS_EXTERNAL_FLAT_PLATE_TURBULENT_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

namespace flat_plate {

/// Local Nusselt number, turbulent, uniform wall temperature: Nu_x = 0.0296 Re_x^(4/5) Pr^(1/3).
/// Film temperature. Range: Re_x 5e5 .. 1e8 (the older texts: 1e7), Pr 0.6 .. 60. In air about
/// 10 % high; in liquids low: 28 % at Pr 7, 37 % at Pr 100, against petukhov_gnielinski.
/// Source: Colburn 1933, with the plate friction 0.0592 Re_x^(-1/5) of Schlichting.
struct turbulent_colburn_local
    : correlation<turbulent_colburn_local, local_nusselt_of<distance_from_edge>,
                  reynolds_of<distance_from_edge>, prandtl_number> {
  static constexpr const char* id = "flat-plate/turbulent-colburn-local";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{"A. P. Colburn", 1933, "Trans. AIChE 29, 174-210",
                                    known::quoted,
                                    "0.0292 is printed too; upper Re 1e7 or 1e8; scatter: texts "
                                    "say 15 to 25 %"};
  static constexpr auto envelope =
      within(limit<reynolds_of<distance_from_edge>>(5e5, 1e8), limit<prandtl_number>(0.6, 60.0));
  static constexpr double scatter = 0.25;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.0296 * power<4, 5>(Re) * power<1, 3>(Pr));
  }
};

/// Mean over 0 .. L of a layer turbulent from the edge on (tripped): Nu_L = 0.037 Re_L^(4/5)
/// Pr^(1/3), the integral of the local law. Range, properties and source as
/// turbulent_colburn_local.
struct turbulent_colburn_average : correlation<turbulent_colburn_average, nusselt_of<plate_length>,
                                               reynolds_of<plate_length>, prandtl_number> {
  static constexpr const char* id = "flat-plate/turbulent-colburn-average";
  static constexpr const char* quantity = "Nu_L";
  static constexpr reference source{"A. P. Colburn", 1933, "Trans. AIChE 29, 174-210",
                                    known::quoted,
                                    "0.036 is printed too; upper Re 1e7 or 1e8; scatter: texts "
                                    "say 15 to 25 %"};
  static constexpr auto envelope =
      within(limit<reynolds_of<plate_length>>(5e5, 1e8), limit<prandtl_number>(0.6, 60.0));
  static constexpr double scatter = 0.25;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.037 * power<4, 5>(Re) * power<1, 3>(Pr));
  }
};

/// Local Nusselt number, turbulent, uniform wall heat flux: Nu_x = 0.0308 Re_x^(4/5) Pr^(1/3),
/// on the local wall excess. Film temperature. Range: Re_x 5e5 .. 1e8, Pr 0.6 .. 60.
/// Source: Kays and Crawford, Convective Heat and Mass Transfer, as in the textbooks.
struct turbulent_isoflux_local
    : correlation<turbulent_isoflux_local, local_nusselt_of<distance_from_edge>,
                  reynolds_of<distance_from_edge>, prandtl_number> {
  static constexpr const char* id = "flat-plate/turbulent-isoflux-local";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{"W. M. Kays, M. E. Crawford", 1980,
                                    "Convective Heat and Mass Transfer", known::recalled,
                                    "scatter: texts say 15 to 25 % for this family"};
  static constexpr auto envelope = turbulent_colburn_local::envelope;
  static constexpr double scatter = 0.25;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return T(0.0308 * power<4, 5>(Re) * power<1, 3>(Pr));
  }
};

/// Local Nusselt number, turbulent, gases and liquids.
/// Nu_x = Re_x Pr (cf/2) / [1 + 12.7 (cf/2)^(1/2) (Pr^(2/3) - 1)], cf/2 = 0.2275 / ln(0.06 Re_x)^2
/// Film temperature. Range: Re_x 5e5 .. 1e7 (data to 4.3e6), Pr >= 0.5 (data to 257). Below
/// Re_x 17 the logarithm turns: meaningless there.
/// Source: White, Viscous Fluid Flow; structure of Petukhov and Popov 1963.
struct turbulent_white_local
    : correlation<turbulent_white_local, local_nusselt_of<distance_from_edge>,
                  reynolds_of<distance_from_edge>, prandtl_number> {
  static constexpr const char* id = "flat-plate/turbulent-white-local";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{"F. M. White", 1974, "Viscous Fluid Flow, McGraw-Hill",
                                    known::recalled,
                                    "12.8 is printed with Pr^0.68; scatter: 11 % in air, about "
                                    "15 % by texts"};
  static constexpr auto envelope = within(limit<reynolds_of<distance_from_edge>>(5e5, 1e7),
                                          limit<prandtl_number>(0.5, unbounded));
  static constexpr double scatter = 0.15;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    constexpr double root_of_constant = 0.47696960070847283;  // 0.2275^(1/2)
    const T u = T(root_of_constant / log(T(0.06 * Re)));      // (cf/2)^(1/2)
    return T(Re * Pr * square(u) / (1.0 + 12.7 * u * (power<2, 3>(Pr) - 1.0)));
  }
};

/// Mean Nusselt number of a plate whose layer turns turbulent at once where Re_x = Re_c.
/// Nu_L = (0.037 Re_L^(4/5) - A) Pr^(1/3), A = 0.037 Re_c^(4/5) - 0.664 Re_c^(1/2); 871 at Re_c 5e5
/// Film temperature. Range: Re_c <= Re_L <= 1e8, Re_c 1e5 .. 3e6, Pr 0.6 .. 60. For Re_L < Re_c the
/// plate is laminar: the formula falls below that law and then below 0.
/// Source: laminar_isothermal_local and turbulent_colburn_local, integrated.
struct mixed_average : correlation<mixed_average, nusselt_of<plate_length>,
                                   reynolds_of<plate_length>, prandtl_number, transition_reynolds> {
  static constexpr const char* id = "flat-plate/mixed-average";
  static constexpr const char* quantity = "Nu_L";
  static constexpr reference source{"A. P. Colburn", 1933, "Trans. AIChE 29, 174-210",
                                    known::computed,
                                    "integral of both local laws; others print 0.036 and 836 or "
                                    "828; scatter: texts say 15 to 25 %"};
  static constexpr auto envelope = within(
      limit<reynolds_of<plate_length>>(0.0, 1e8), limit<prandtl_number>(0.6, 60.0),
      limit<transition_reynolds>(1e5, 3e6),
      limit_on("Re/Re_c", 1.0, unbounded, [](auto Re, auto, auto Re_c) { return Re / Re_c; }));
  static constexpr double scatter = 0.25;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr, const T& Re_c) {
    const T A = T(0.037 * power<4, 5>(Re_c) - 0.664 * sqrt(Re_c));
    return T((0.037 * power<4, 5>(Re) - A) * power<1, 3>(Pr));
  }
};

/// Mean Nusselt number, turbulent from the edge on, gases and liquids.
/// Nu_L = 0.037 Re_L^0.8 Pr / [1 + 2.443 Re_L^-0.1 (Pr^(2/3) - 1)]
/// Properties of the free stream, the wall entering through a factor on Nu: (Pr/Pr_w)^0.25 for
/// liquids, (T_inf/T_w)^0.12 for gases. With film properties that factor would count twice.
/// Range: Re_L 5e5 .. 1e7, Pr 0.6 .. 2000. No scatter stated.
/// Source: Gnielinski 1975, after Petukhov and Popov 1963.
struct petukhov_gnielinski_turbulent_average
    : correlation<petukhov_gnielinski_turbulent_average, nusselt_of<plate_length>,
                  reynolds_of<plate_length>, prandtl_number> {
  static constexpr const char* id = "flat-plate/petukhov-gnielinski-turbulent-average";
  static constexpr const char* quantity = "Nu_L";
  static constexpr reference source{"V. Gnielinski", 1975, "Forsch. Ing.-Wes. 41, 145-153",
                                    known::recalled,
                                    "2.44 is printed too; film properties are also quoted: "
                                    "free stream taken"};
  static constexpr auto envelope =
      within(limit<reynolds_of<plate_length>>(5e5, 1e7), limit<prandtl_number>(0.6, 2000.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::free_stream_with_wall;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    const T s = power<1, 10>(Re);  // one logarithm for both powers
    return T(0.037 * power<9>(s) * Pr / (s + 2.443 * (power<2, 3>(Pr) - 1.0)));
  }
};

/// Mean Nusselt number through all regimes in a stream of ordinary turbulence, without a transition
/// Reynolds number: Nu_L = (Nu_lam^2 + Nu_turb^2)^(1/2), Nu_lam = 0.664 Re^(1/2) Pr^(1/3), Nu_turb
/// of petukhov_gnielinski_turbulent_average, whose properties and wall factor it shares. Range:
/// Re_L 10 .. 1e7, Pr 0.6 .. 2000. No scatter stated; a stream of low turbulence stays on the
/// laminar law up to Re 5e5, and this is then high.
/// Source: Gnielinski 1975, Forsch. Ing.-Wes. 41, 145-153.
struct gnielinski_1975_combined_average
    : correlation<gnielinski_1975_combined_average, nusselt_of<plate_length>,
                  reynolds_of<plate_length>, prandtl_number> {
  static constexpr const char* id = "flat-plate/gnielinski-1975-combined-average";
  static constexpr const char* quantity = "Nu_L";
  static constexpr reference source = petukhov_gnielinski_turbulent_average::source;
  static constexpr auto envelope =
      within(limit<reynolds_of<plate_length>>(10.0, 1e7), limit<prandtl_number>(0.6, 2000.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::free_stream_with_wall;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    const T laminar = T(0.664 * sqrt(Re) * power<1, 3>(Pr));
    return joined<2>(laminar, petukhov_gnielinski_turbulent_average::formula(Re, Pr));
  }
};

}  // namespace flat_plate
}  // namespace v0
}  // namespace convelope

#endif
