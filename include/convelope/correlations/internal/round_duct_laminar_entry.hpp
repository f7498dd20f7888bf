#ifndef CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_LAMINAR_ENTRY_HPP
#define CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_LAMINAR_ENTRY_HPP

#include "convelope/correlations/internal/round_duct_choices.hpp"
#include "convelope/groups/property_ratio.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

namespace detail::gnielinski_laminar {
using round_duct::entry;

// [N1^3 + c^3 + (N2 - c)^3 + N3^3]^(1/3): developed, short duct, and both profiles developing; on
// Gz = Re Pr D/L.
template <class T>
CONVELOPE_FUNCTION constexpr T sum(double developed, double c, const T& short_duct,
                                   const T& developing) {
  return math::cbrt(T(math::power<3>(T(short_duct - c)) + math::power<3>(developing) +
                      (developed * developed * developed + c * c * c)));
}
template <class T>
CONVELOPE_FUNCTION constexpr T uwt(double a, double b, const T& Gz, const T& Pr, entry e) {
  const T developing = e == entry::combined
                           ? T(b * math::power<1, 6>(T(2.0 / (1.0 + 22.0 * Pr))) * math::sqrt(Gz))
                           : T(0.0);
  return sum(3.66, 0.7, T(a * math::cbrt(Gz)), developing);
}
template <class T>
CONVELOPE_FUNCTION constexpr T uhf(double c, double a, double b, const T& Gz, const T& Pr,
                                   entry e) {
  // Pr^(1/3) (Re D/x)^(1/2) is Pr^(-1/6) Gz^(1/2).
  const T developing =
      e == entry::combined ? T(b * math::power<-1, 6>(Pr) * math::sqrt(Gz)) : T(0.0);
  return sum(4.364, c, T(a * math::cbrt(Gz)), developing);
}

// Pr matters with both profiles developing only. A whole number, so that packs of float keep to it.
inline constexpr auto prandtl_if_combined = [](auto, entry e, auto Pr) {
  return e == entry::combined ? decltype(Pr)(Pr) : decltype(Pr)(1);
};
}  // namespace detail::gnielinski_laminar

namespace round_duct {

/// Mean, uniform wall temperature, laminar, velocity developed:
/// Nu = [3.66 + 0.0668 Gz/(1 + 0.04 Gz^(2/3))] (mu_b/mu_w)^0.14, Gz = Re Pr D/L.
/// On the log-mean temperature difference; mu_w at the wall, the rest at the bulk temperature.
/// Range: Re < 2300, 0.1 <= Gz <= 1e4; the viscosity ratio as in Sieder and Tate, whose factor it
/// is. Scatter not stated; 4 % above Graetz's solution at Gz 200, 12 % from 2000 on.
/// Source: Hausen 1943, VDI Z. Beih. Verfahrenstechnik 4, 91-102.
struct hausen_1943
    : correlation<hausen_1943, nusselt_of<hydraulic_diameter>, graetz_number, viscosity_ratio> {
  static constexpr const char* id = "round-duct/hausen-1943";
  static constexpr const char* quantity = "Nu_m";
  static constexpr const char* keys[] = {"Gz", "mu_b_over_mu_w"};
  static constexpr input_default otherwise[] = {{"mu_b_over_mu_w", 1.0}};
  static constexpr reference source{"H. Hausen", 1943, "VDI Z. Beih. Verfahrenstechnik 4, 91-102",
                                    known::computed,
                                    "3.65, 3.656 and 3.66 are printed; 3.66 taken"};
  static constexpr auto envelope =
      within(limit<graetz_number>(0.1, 1e4), limit<viscosity_ratio>(0.0044, 9.75));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Gz, const T& mu_b_over_mu_w) {
    const T entrance = T(0.0668 * Gz / (1.0 + 0.04 * power<2, 3>(Gz)));
    return T((3.66 + entrance) * property_ratio::sieder_tate_1936::formula(mu_b_over_mu_w));
  }
};

/// Local, laminar, velocity developed, one smooth formula; with G = (pi/4)/x_star
/// T: Nu_x + 1.7 = 5.357 [1 + (G/97)^(8/9)]^(3/8); H: Nu_x + 1 = 5.364 [1 + (G/55)^(10/9)]^(3/10).
/// G is the Graetz number m cp/(k x), with the factor pi/4.
/// Range: all x_star > 0, Re < 2100. Scatter about 6 %; 9.1 % above the exact solution at
/// worst (T, x_star 0.04).
/// Source: Churchill and Ozoe 1973, J. Heat Transfer 95, 416-419 (T) and 78-84 (H).
struct churchill_ozoe_1973_thermal
    : correlation<churchill_ozoe_1973_thermal, local_nusselt_of<hydraulic_diameter>, thermal_entry,
                  choice_of<wall>> {
  static constexpr const char* id = "round-duct/churchill-ozoe-1973-thermal";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{"S. W. Churchill, H. Ozoe", 1973,
                                    "J. Heat Transfer 95, 416-419 and 78-84", known::computed,
                                    "its Graetz number has the factor pi/4"};
  static constexpr auto envelope = within(limit<thermal_entry>(1e-12, unbounded));
  static constexpr double scatter = 0.06;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star, wall bc) {
    constexpr double quarter_pi = 0.78539816339744830962;
    if (bc == wall::uniform_temperature) {
      const T bracket = T(1.0 + power<8, 9>(T((quarter_pi / 97.0) / x_star)));
      return T(5.357 * power<3, 8>(bracket) - 1.7);
    }
    const T bracket = T(1.0 + power<10, 9>(T((quarter_pi / 55.0) / x_star)));
    return T(5.364 * power<3, 10>(bracket) - 1.0);
  }
};

/// Mean, uniform wall temperature, laminar; entry = thermal (velocity developed) or combined.
/// Nu = [N1^3 + 0.7^3 + (N2 - 0.7)^3 + N3^3]^(1/3), N1 = 3.66, N2 = 1.615 Gz^(1/3),
/// N3 = [2/(1 + 22 Pr)]^(1/6) Gz^(1/2), left out for thermal.
/// On the log-mean temperature difference, bulk properties; liquids times (Pr_b/Pr_w)^0.11.
/// Range: Re <= 2300, L/D > 0.1, combined: 0.1 <= Pr <= 1000; a combined entry needs Pr, a thermal
/// one ignores it. Scatter not stated; the thermal entry is within 1 % of the exact solution.
/// Source: Gnielinski 2013, Int. J. Heat Mass Transfer 63, 134-140; VDI Heat Atlas G1.
struct gnielinski_laminar_uwt_mean
    : correlation<gnielinski_laminar_uwt_mean, nusselt_of<hydraulic_diameter>, thermal_entry,
                  choice_of<entry>, prandtl_number> {
  static constexpr const char* id = "round-duct/gnielinski-laminar-uwt";
  static constexpr const char* quantity = "Nu_m";
  static constexpr input_default otherwise[] = {{"Pr", 0.0}};
  static constexpr reference source{"V. Gnielinski", 2013,
                                    "Int. J. Heat Mass Transfer 63, 134-140; VDI Heat Atlas G1",
                                    known::computed, "least x_star from L/D 0.1, Re 2300, Pr 1000"};
  static constexpr auto envelope =
      within(limit<thermal_entry>(4e-8, unbounded),
             limit_on("Pr (combined entry)", 0.1, 1000.0,
                      detail::gnielinski_laminar::prandtl_if_combined));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star, entry e, const T& Pr) {
    return detail::gnielinski_laminar::uwt(1.615, 1.0, T(1.0 / x_star), Pr, e);
  }
};

/// Local, uniform wall temperature, laminar: as the mean with N2 = 1.077 Gz_x^(1/3) and
/// N3 = (1/2) [2/(1 + 22 Pr)]^(1/6) Gz_x^(1/2).
/// Range as the mean. Scatter not stated; the thermal entry is up to 6.2 % above the exact
/// solution (x_star 0.04).
/// Source: Gnielinski 2013, Int. J. Heat Mass Transfer 63, 134-140; VDI Heat Atlas G1.
struct gnielinski_laminar_uwt_local
    : correlation<gnielinski_laminar_uwt_local, local_nusselt_of<hydraulic_diameter>, thermal_entry,
                  choice_of<entry>, prandtl_number> {
  static constexpr const char* id = "round-duct/gnielinski-laminar-uwt";
  static constexpr const char* quantity = "Nu_x";
  static constexpr input_default otherwise[] = {{"Pr", 0.0}};
  static constexpr reference source = gnielinski_laminar_uwt_mean::source;
  static constexpr auto envelope = gnielinski_laminar_uwt_mean::envelope;
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star, entry e, const T& Pr) {
    return detail::gnielinski_laminar::uwt(1.077, 0.5, T(1.0 / x_star), Pr, e);
  }
};

/// Mean of Nu_x, uniform heat flux, laminar; entry = thermal or combined.
/// Nu = [4.364^3 + 0.6^3 + (1.953 Gz^(1/3) - 0.6)^3 + N3^3]^(1/3),
/// N3 = 0.924 Pr^(1/3) (Re D/L)^(1/2), left out for thermal.
/// Bulk properties; liquids times (Pr_b/Pr_w)^0.11.
/// Range: Re <= 2300, L/D > 0.1, combined: 0.7 <= Pr <= 1000. Scatter not stated; the
/// thermal entry is within 1 % of the exact solution.
/// Source: Gnielinski 2013, Int. J. Heat Mass Transfer 63, 134-140; VDI Heat Atlas G1.
struct gnielinski_laminar_uhf_mean
    : correlation<gnielinski_laminar_uhf_mean, nusselt_of<hydraulic_diameter>, thermal_entry,
                  choice_of<entry>, prandtl_number> {
  static constexpr const char* id = "round-duct/gnielinski-laminar-uhf";
  static constexpr const char* quantity = "Nu_m";
  static constexpr input_default otherwise[] = {{"Pr", 0.0}};
  static constexpr reference source{
      "V. Gnielinski", 2013, "Int. J. Heat Mass Transfer 63, 134-140; VDI Heat Atlas G1",
      known::computed, "4.354 is printed for 4.364; least x_star as for uwt"};
  static constexpr auto envelope =
      within(limit<thermal_entry>(4e-8, unbounded),
             limit_on("Pr (combined entry)", 0.7, 1000.0,
                      detail::gnielinski_laminar::prandtl_if_combined));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star, entry e, const T& Pr) {
    return detail::gnielinski_laminar::uhf(0.6, 1.953, 0.924, T(1.0 / x_star), Pr, e);
  }
};

/// Local, uniform heat flux, laminar:
/// Nu = [4.364^3 + 1 + (1.302 Gz_x^(1/3) - 1)^3 + N3^3]^(1/3),
/// N3 = 0.462 Pr^(1/3) (Re D/x)^(1/2), left out for thermal.
/// Range as the mean. Scatter not stated; the thermal entry is within 4 % of the exact solution.
/// Source: Gnielinski 2013, Int. J. Heat Mass Transfer 63, 134-140; VDI Heat Atlas G1.
struct gnielinski_laminar_uhf_local
    : correlation<gnielinski_laminar_uhf_local, local_nusselt_of<hydraulic_diameter>, thermal_entry,
                  choice_of<entry>, prandtl_number> {
  static constexpr const char* id = "round-duct/gnielinski-laminar-uhf";
  static constexpr const char* quantity = "Nu_x";
  static constexpr input_default otherwise[] = {{"Pr", 0.0}};
  static constexpr reference source = gnielinski_laminar_uhf_mean::source;
  static constexpr auto envelope = gnielinski_laminar_uhf_mean::envelope;
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star, entry e, const T& Pr) {
    return detail::gnielinski_laminar::uhf(1.0, 1.302, 0.462, T(1.0 / x_star), Pr, e);
  }
};

}  // namespace round_duct
}  // namespace v0
}  // namespace convelope

#endif
