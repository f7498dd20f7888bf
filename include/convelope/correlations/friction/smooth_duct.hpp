#ifndef CONVELOPE_CORRELATIONS_FRICTION_SMOOTH_DUCT_HPP
#define CONVELOPE_CORRELATIONS_FRICTION_SMOOTH_DUCT_HPP

#include "convelope/correlations/friction/solve.hpp"
#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// Friction of developed flow in a straight duct. Re is on the hydraulic diameter and the mean
/// velocity, properties at the bulk temperature. Darcy and Fanning factors are different kinds.
namespace friction {

/// Darcy factor, laminar, round duct: f = 64/Re, exact.
/// Range: Re <= 2300 (2100 in some texts; one number for the whole library).
/// Source: Hagen 1839, Ann. Phys. 46, 423-442; Poiseuille 1840, C. R. Acad. Sci. 11.
struct hagen_poiseuille
    : correlation<hagen_poiseuille, darcy_friction, reynolds_of<hydraulic_diameter>> {
  static constexpr const char* id = "friction/hagen-poiseuille";
  static constexpr const char* quantity = "f_D";
  static constexpr reference source{"G. Hagen; J. L. M. Poiseuille", 1839,
                                    "Ann. Phys. 46, 423-442; C. R. Acad. Sci. 11 (1840)",
                                    known::computed, "exact; the Fanning factor is 16/Re"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(1e-12, 2300.0));
  static constexpr double scatter = 0.0;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    return T(64.0 / Re);
  }
};

/// Darcy factor, smooth, turbulent: f = 0.3164 Re^(-1/4).
/// Range: 4000 <= Re <= 1e5. Scatter not stated; 2.8 % above the smooth-wall law at Re 2e4.
/// Source: Blasius 1913, Forsch. Arb. Ing.-Wes. 131.
struct blasius_1913 : correlation<blasius_1913, darcy_friction, reynolds_of<hydraulic_diameter>> {
  static constexpr const char* id = "friction/blasius-1913";
  static constexpr const char* quantity = "f_D";
  static constexpr reference source{"H. Blasius", 1913, "Forsch. Arb. Ing.-Wes. 131", known::quoted,
                                    "0.316 is printed too; some texts start at Re 3000"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(4000.0, 1e5));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    return T(0.3164 * power<-1, 4>(Re));
  }
};

/// Darcy factor, smooth, turbulent: f = (1.82 log10 Re - 1.64)^(-2).
/// Range: 3000 <= Re <= 5e6. Scatter not stated; 3.7 % above the smooth-wall law at Re 4000, less
/// than 1 % off above 1e5. The law behind Gnielinski 1976.
/// Source: Filonenko 1954, Teploenergetika 1(4), 40-44.
struct filonenko_1954
    : correlation<filonenko_1954, darcy_friction, reynolds_of<hydraulic_diameter>> {
  static constexpr const char* id = "friction/filonenko-1954";
  static constexpr const char* quantity = "f_D";
  static constexpr reference source{"G. K. Filonenko", 1954, "Teploenergetika 1(4), 40-44",
                                    known::quoted, "Petukhov starts at Re 1e4"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(3000.0, 5e6));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    return T(1.0 / square(T(log(Re) * (1.82 * detail::friction_law::log10_of_e) - 1.64)));
  }
};

/// Darcy factor, smooth, turbulent: f = (0.790 ln Re - 1.64)^(-2).
/// Filonenko's law rounded to natural logarithms; up to 0.14 % apart.
/// Range: 3000 <= Re <= 5e6. Scatter not stated.
/// Source: Petukhov 1970, Adv. Heat Transfer 6, 503-564.
struct petukhov_1970 : correlation<petukhov_1970, darcy_friction, reynolds_of<hydraulic_diameter>> {
  static constexpr const char* id = "friction/petukhov-1970";
  static constexpr const char* quantity = "f_D";
  static constexpr reference source{"B. S. Petukhov", 1970, "Adv. Heat Transfer 6, 503-564",
                                    known::quoted, "a public page prints 1e4 < Re < 1e6"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(3000.0, 5e6));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    return T(1.0 / square(T(0.790 * log(Re) - 1.64)));
  }
};

/// Darcy factor, smooth, turbulent: f = (1.8 log10 Re - 1.5)^(-2).
/// Range: 4000 <= Re <= 1e7. Scatter not stated; within 1.2 % of the smooth-wall law to 5e6. The
/// law behind Gnielinski 1995 and 2013.
/// Source: Konakov 1946, Dokl. Akad. Nauk SSSR 51(7), 503-506.
struct konakov_1946 : correlation<konakov_1946, darcy_friction, reynolds_of<hydraulic_diameter>> {
  static constexpr const char* id = "friction/konakov-1946";
  static constexpr const char* quantity = "f_D";
  static constexpr reference source{
      "P. K. Konakov", 1946, "Dokl. Akad. Nauk SSSR 51(7), 503-506", known::computed,
      "also quoted from Re 2300, where no turbulent law holds; 4000 taken"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(4000.0, 1e7));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    return T(1.0 / square(T(log(Re) * (1.8 * detail::friction_law::log10_of_e) - 1.5)));
  }
};

/// Darcy factor, smooth, turbulent, implicit: 1/sqrt(f) = 2 log10(Re sqrt(f)) - 0.8.
/// Range: 4000 <= Re <= 3.4e6. Scatter about 2 %.
/// Solved in y = 1/sqrt(f): y + c ln y = c ln Re - 0.8 with c = 2/ln 10, by a fixed number of
/// Newton steps; below Re = 1, far outside, held at its value there so that it stays finite.
/// Source: Prandtl 1935; Nikuradse 1932, VDI-Forschungsheft 356.
struct prandtl_karman_nikuradse
    : correlation<prandtl_karman_nikuradse, darcy_friction, reynolds_of<hydraulic_diameter>> {
  static constexpr const char* id = "friction/prandtl-karman-nikuradse";
  static constexpr const char* quantity = "f_D";
  static constexpr reference source{"L. Prandtl; T. von Karman; J. Nikuradse", 1932,
                                    "VDI-Forschungsheft 356", known::quoted,
                                    "used to Re 1e7; Fanning form 4 log10(Re sqrt(f_F)) - 0.4"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(4000.0, 3.4e6));
  static constexpr double scatter = 0.02;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    using detail::friction_law::two_logs;
    const T log_Re = log(larger(Re, T(1.0)));
    const T rest = T(two_logs * log_Re - 0.8);
    // Left of the root, from where Newton's method on a concave function climbs without overshoot;
    // or Konakov's law, within 2 % of it.
    const auto start = [](const auto& l, const auto&) {
      using P = std::remove_cvref_t<decltype(l)>;
      const P low = P(0.398 * exp(l));
      return larger(P(low * two_logs / (low + two_logs)), P(0.9 * two_logs * l - 1.5));
    };
    const auto next = [](const auto& y, const auto&, const auto& r) {
      using Y = std::remove_cvref_t<decltype(y)>;
      return Y(y * (r + two_logs - two_logs * log(y)) / (y + two_logs));
    };
    return T(1.0 / square(detail::friction_law::root(log_Re, rest, start, next)));
  }
};

/// Fanning factor, smooth, turbulent: f_F = 0.00140 + 0.125 Re^(-0.32).
/// Range: 4000 <= Re <= 5e6. Scatter +-5 %.
/// Source: Drew, Koo and McAdams 1932, Trans. AIChE 28, 56-72.
struct drew_koo_mcadams_1932
    : correlation<drew_koo_mcadams_1932, fanning_friction, reynolds_of<hydraulic_diameter>> {
  static constexpr const char* id = "friction/drew-koo-mcadams-1932";
  static constexpr const char* quantity = "f_F";
  static constexpr reference source{"T. B. Drew, E. C. Koo, W. H. McAdams", 1932,
                                    "Trans. AIChE 28, 56-72", known::computed,
                                    "a Fanning factor; scatter from memory"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(4000.0, 5e6));
  static constexpr double scatter = 0.05;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    return T(0.00140 + 0.125 * power<-8, 25>(Re));
  }
};

/// Fanning factor, smooth, laminar to turbulent in three pieces A + B Re^(-1/m):
/// 16/Re to 2100; 0.0054 + 2.3e-8 Re^(3/2) to 4000; 0.00128 + 0.1143 Re^(-1/3.2154) above.
/// Steps by -0.07 % at 2100 and by -11.4 % at 4000, as published.
/// Range: Re <= 1e7. Scatter +-2 % (turbulent); 2.6 % below the smooth-wall law at 1e6.
/// Source: Bhatti and Shah 1987, ch. 4 of Handbook of Single-Phase Convective Heat Transfer.
struct bhatti_shah_1987
    : correlation<bhatti_shah_1987, fanning_friction, reynolds_of<hydraulic_diameter>> {
  static constexpr const char* id = "friction/bhatti-shah-1987";
  static constexpr const char* quantity = "f_F";
  static constexpr reference source{
      "M. S. Bhatti, R. K. Shah", 1987,
      "Handbook of Single-Phase Convective Heat Transfer, Wiley, ch. 4", known::computed,
      "a Fanning factor; the middle piece ends 12 % above the smooth-wall law"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(1e-12, 1e7));
  static constexpr double scatter = 0.02;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re) {
    const T laminar = T(16.0 / Re);
    const T middle = T(0.0054 + 2.3e-8 * power<3, 2>(Re));
    const T turbulent = T(0.00128 + 0.1143 * exp(T(log(Re) * (-1.0 / 3.2154))));
    return select(Re <= T(2100.0), laminar, select(Re <= T(4000.0), middle, turbulent));
  }
};

}  // namespace friction
}  // namespace v0
}  // namespace convelope

#endif
