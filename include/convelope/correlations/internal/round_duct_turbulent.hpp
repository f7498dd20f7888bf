#ifndef CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_TURBULENT_HPP
#define CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_TURBULENT_HPP

#include "convelope/correlations/friction/solve.hpp"
#include "convelope/correlations/internal/round_duct_choices.hpp"
#include "convelope/groups/property_ratio.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

// The form of Petukhov and Kirillov, shared with those who followed:
// (f/8) X Pr/[K + 12.7 sqrt(f/8) (Pr^(2/3) - 1)], with f Darcy, X = Re or Re - 1000.
namespace detail::petukhov {
/// sqrt(f/8) of the law f = (a log10 Re - b)^(-2)
template <class T>
CONVELOPE_FUNCTION constexpr T root(double a, double b, const T& Re) {
  constexpr double root_eighth = 0.35355339059327376220;
  return T(root_eighth / (math::log(Re) * (a * friction_law::log10_of_e) - b));
}
template <class T>
CONVELOPE_FUNCTION constexpr T nusselt(double K, const T& root, const T& X, const T& Pr) {
  return T(math::square(root) * X * Pr / (K + 12.7 * root * (math::power<2, 3>(Pr) - 1.0)));
}
/// 1 + (D/L)^(2/3)
template <class T>
CONVELOPE_FUNCTION constexpr T entrance(const T& L_over_D) {
  return T(1.0 + math::power<-2, 3>(L_over_D));
}
}  // namespace detail::petukhov

namespace round_duct {

/// Developed turbulent flow, smooth: Nu = 0.023 Re^0.8 Pr^n, n = 0.4 when the fluid is heated,
/// 0.3 when it is cooled.
/// Bulk properties. Range: 1e4 <= Re <= 1.2e5, 0.6 <= Pr <= 160, L/D >= 10 (60 in McAdams), small
/// wall-to-bulk difference (6 K liquids, 60 K gases). Scatter +-25 %.
/// Source: McAdams 1942, after Dittus and Boelter 1930, Univ. Calif. Publ. Eng. 2, 443-461.
struct dittus_boelter_mcadams
    : correlation<dittus_boelter_mcadams, nusselt_of<hydraulic_diameter>,
                  reynolds_of<hydraulic_diameter>, prandtl_number, choice_of<mode>> {
  static constexpr const char* id = "round-duct/dittus-boelter-mcadams";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{
      "W. H. McAdams, after F. W. Dittus, L. M. K. Boelter", 1942,
      "Heat Transmission, 2nd ed.; Univ. Calif. Publ. Eng. 2 (1930), 443-461", known::quoted,
      "originals 0.0243 heated, 0.0265 cooled; ranges from Pr 0.7 and to Re 1e6 are printed too"};
  static constexpr auto envelope =
      within(limit<reynolds_of<hydraulic_diameter>>(1e4, 1.2e5), limit<prandtl_number>(0.6, 160.0));
  static constexpr double scatter = 0.25;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr, mode m) {
    const double n = m == mode::heating ? 0.4 : 0.3;
    return T(0.023 * exp(T(0.8 * log(Re) + n * log(Pr))));
  }
};

/// Developed turbulent flow, smooth: Nu = (f/8) Re Pr/[1.07 + 12.7 sqrt(f/8) (Pr^(2/3) - 1)],
/// f = (1.82 log10 Re - 1.64)^(-2), Darcy (friction/filonenko-1954).
/// Bulk properties; liquids times (mu_b/mu_w)^0.11 heated, ^0.25 cooled.
/// Range: 1e4 <= Re <= 5e6, 0.5 <= Pr <= 2000. Scatter 5-6 % to Pr 200, 10 % above.
/// Source: Petukhov and Kirillov 1958, Teploenergetika 4, 63; Petukhov 1970.
struct petukhov_kirillov_1958 : correlation<petukhov_kirillov_1958, nusselt_of<hydraulic_diameter>,
                                            reynolds_of<hydraulic_diameter>, prandtl_number> {
  static constexpr const char* id = "round-duct/petukhov-kirillov-1958";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"B. S. Petukhov, V. V. Kirillov", 1958,
                                    "Teploenergetika 4, 63-68; Adv. Heat Transfer 6 (1970)",
                                    known::recalled, "without the viscosity factor"};
  static constexpr auto envelope =
      within(limit<reynolds_of<hydraulic_diameter>>(1e4, 5e6), limit<prandtl_number>(0.5, 2000.0));
  static constexpr double scatter = 0.1;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr) {
    return detail::petukhov::nusselt(1.07, detail::petukhov::root(1.82, 1.64, Re), Re, Pr);
  }
};

/// Mean over a length L, turbulent, smooth:
/// Nu = (f/8) (Re - 1000) Pr/[1 + 12.7 sqrt(f/8) (Pr^(2/3) - 1)] [1 + (D/L)^(2/3)] K,
/// f = (1.82 log10 Re - 1.64)^(-2), Darcy. K = (Pr_b/Pr_w)^0.11 for a liquid, (T_b/T_w)^0.45 for a
/// gas, never both: hand in 1 for the other. A very large L/D gives developed flow.
/// Bulk properties. Range: 3000 <= Re <= 5e6, 0.5 <= Pr <= 2000, L/D >= 1,
/// 0.05 <= Pr_b/Pr_w <= 20, 0.5 <= T_b/T_w <= 1.5. Scatter: nearly all of some 800 data in 20 %.
/// Source: Gnielinski 1976, Int. Chem. Eng. 16(2), 359-368.
struct gnielinski_1976
    : correlation<gnielinski_1976, nusselt_of<hydraulic_diameter>, reynolds_of<hydraulic_diameter>,
                  prandtl_number, length_ratio, prandtl_ratio, temperature_ratio> {
  static constexpr const char* id = "round-duct/gnielinski-1976";
  static constexpr const char* quantity = "Nu";
  static constexpr input_default otherwise[] = {
      {"L_over_D", 1e300}, {"Pr_b_over_Pr_w", 1.0}, {"Tb_over_Tw", 1.0}};
  static constexpr reference source{
      "V. Gnielinski", 1976, "Int. Chem. Eng. 16(2), 359-368", known::quoted,
      "from Re 2300 or 3000 (taken), to 1e6 or 5e6; for cooled gases later versions take K = 1"};
  static constexpr auto envelope =
      within(limit<reynolds_of<hydraulic_diameter>>(3000.0, 5e6),
             limit<prandtl_number>(0.5, 2000.0), limit<length_ratio>(1.0, unbounded),
             limit<prandtl_ratio>(0.05, 20.0), limit<temperature_ratio>(0.5, 1.5),
             limit_on("(Pr_b/Pr_w - 1)(T_b/T_w - 1)", 0.0, 0.0,
                      [](auto, auto, auto, auto Pr_ratio, auto T_ratio) {
                        return decltype(Pr_ratio)((Pr_ratio - 1) * (T_ratio - 1));
                      }));
  static constexpr double scatter = 0.2;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& Pr, const T& L_over_D,
                                                const T& Pr_b_over_Pr_w, const T& Tb_over_Tw) {
    const T developed =
        detail::petukhov::nusselt(1.0, detail::petukhov::root(1.82, 1.64, Re), T(Re - 1000.0), Pr);
    constexpr double of_liquid = property_ratio::gnielinski_1976_liquid::exponent;
    constexpr double of_gas = property_ratio::gnielinski_1976_gas::exponent;
    const T K = exp(T(of_liquid * log(Pr_b_over_Pr_w) + of_gas * log(Tb_over_Tw)));
    return T(developed * detail::petukhov::entrance(L_over_D) * K);
  }
};

/// Entrance factor of turbulent flow, mean over the length: Nu_m/Nu = 1 + (D/L)^(2/3).
/// Range: L/D >= 1. Scatter not stated.
/// Source: Hausen 1943, VDI Z. Beih. Verfahrenstechnik 4, 91-102; VDI Heat Atlas G1.
struct gnielinski_local_entrance_mean
    : correlation<gnielinski_local_entrance_mean, entrance_factor, length_ratio> {
  static constexpr const char* id = "round-duct/gnielinski-local-entrance";
  static constexpr const char* quantity = "ratio_m";
  static constexpr reference source{"H. Hausen; V. Gnielinski", 1943,
                                    "VDI Z. Beih. Verfahrenstechnik 4, 91-102; VDI Heat Atlas G1",
                                    known::recalled};
  static constexpr auto envelope = within(limit<length_ratio>(1.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::none;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& L_over_D) {
    return detail::petukhov::entrance(L_over_D);
  }
};

/// Entrance factor of turbulent flow at one station: Nu_x/Nu = 1 + (1/3) (D/x)^(2/3), the
/// derivative of x times the mean. The input is x/D.
/// Range: x/D >= 1. Scatter not stated.
/// Source: VDI Heat Atlas G1, after Hausen 1943.
struct gnielinski_local_entrance_local
    : correlation<gnielinski_local_entrance_local, local_entrance_factor, length_ratio> {
  static constexpr const char* id = "round-duct/gnielinski-local-entrance";
  static constexpr const char* quantity = "ratio_x";
  static constexpr reference source = gnielinski_local_entrance_mean::source;
  static constexpr auto envelope = within(limit<length_ratio>(1.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::none;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& L_over_D) {
    return T(1.0 + (1.0 / 3.0) * power<-2, 3>(L_over_D));
  }
};

}  // namespace round_duct
}  // namespace v0
}  // namespace convelope

#endif
