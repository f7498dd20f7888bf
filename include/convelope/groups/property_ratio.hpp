#ifndef CONVELOPE_GROUPS_PROPERTY_RATIO_HPP
#define CONVELOPE_GROUPS_PROPERTY_RATIO_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/groups/film.hpp"
#include "convelope/groups/state.hpp"

// What temperature-dependent properties do to a Nusselt number or a friction factor whose
// correlation has constant ones: a published factor, and one way to apply it, once.

namespace convelope {
inline namespace v0 {

namespace kinds {
/// Nusselt number with the fluid's real properties over that with the stream's everywhere
struct nusselt_correction : pure_number {
  static constexpr const char* symbol = "Nu/Nu_cp";
  static constexpr const char* words = "Nusselt number over that at constant properties";
};
}  // namespace kinds
inline constexpr gate<kinds::nusselt_correction> nusselt_correction{};

/// Absolute temperature of the stream over that of the wall.
template <class T, temperature_kind B>
CONVELOPE_FUNCTION constexpr typed<kinds::temperature_ratio, T> temperature_ratio_between(
    const typed<kinds::wall_temperature, T>& wall, const typed<B, T>& stream) {
  static_assert(!std::is_same_v<B, kinds::wall_temperature>,
                "temperature_ratio_between needs the stream's temperature, not a second wall's");
  return typed<kinds::temperature_ratio, T>::from_si(T(stream.si() / wall.si()));
}

/// Every ratio is the stream's value over the wall's. Which of two exponents holds, for a fluid
/// that is heated or cooled, is read from the ratio: above 1 a liquid is heated, a gas cooled.
namespace property_ratio {

/// Liquids in ducts, laminar and turbulent: Nu/Nu_cp = (mu_b/mu_w)^0.14.
/// Range: 0.0044 <= mu_b/mu_w <= 9.75. Scatter not stated.
/// Source: Sieder and Tate 1936, Ind. Eng. Chem. 28, 1429-1435.
struct sieder_tate_1936 : correlation<sieder_tate_1936, nusselt_correction, viscosity_ratio> {
  static constexpr const char* id = "property-factor/sieder-tate-1936";
  static constexpr const char* quantity = "Nu_over_Nucp";
  static constexpr const char* keys[] = {"mu_b_over_mu_w"};
  static constexpr reference source{"E. N. Sieder, G. E. Tate", 1936,
                                    "Ind. Eng. Chem. 28, 1429-1435", known::recalled};
  static constexpr auto envelope = within(limit<viscosity_ratio>(0.0044, 9.75));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& mu_b_over_mu_w) {
    return power<7, 50>(mu_b_over_mu_w);
  }
};

/// Liquids in turbulent duct flow: Nu/Nu_cp = (mu_b/mu_w)^n, n = 0.11 heated, 0.25 cooled.
/// Range: 0.08 <= mu_w/mu_b <= 40. Scatter not stated.
/// Source: Petukhov 1970, Adv. Heat Transfer 6, 503-564.
struct petukhov_1970 : correlation<petukhov_1970, nusselt_correction, viscosity_ratio> {
  static constexpr const char* id = "property-factor/petukhov-1970";
  static constexpr const char* quantity = "Nu_over_Nucp";
  static constexpr const char* keys[] = {"mu_b_over_mu_w"};
  static constexpr reference source{"B. S. Petukhov", 1970, "Adv. Heat Transfer 6, 503-564",
                                    known::recalled};
  static constexpr auto envelope = within(limit<viscosity_ratio>(1.0 / 40.0, 1.0 / 0.08));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& mu_b_over_mu_w) {
    const T l = log(mu_b_over_mu_w);
    return exp(smaller(T(0.11 * l), T(0.25 * l)));
  }
};

/// Liquids in ducts: Nu/Nu_cp = (Pr_b/Pr_w)^0.11.
/// Range: 0.05 <= Pr_b/Pr_w <= 20. Scatter not stated.
/// Source: Gnielinski 1976, Int. Chem. Eng. 16(2), 359-368, after Hufschmidt and Burck 1968, Int.
/// J. Heat Mass Transfer 11, 1041-1048.
struct gnielinski_1976_liquid
    : correlation<gnielinski_1976_liquid, nusselt_correction, prandtl_ratio> {
  static constexpr const char* id = "property-factor/gnielinski-1976-liquid";
  static constexpr const char* quantity = "Nu_over_Nucp";
  static constexpr reference source{"V. Gnielinski", 1976, "Int. Chem. Eng. 16(2), 359-368",
                                    known::recalled};
  static constexpr auto envelope = within(limit<prandtl_ratio>(0.05, 20.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  static constexpr double exponent = 0.11;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Pr_b_over_Pr_w) {
    constexpr double n = exponent;
    return exp(T(n * log(Pr_b_over_Pr_w)));
  }
};

/// Liquids across cylinders and tube banks: Nu/Nu_cp = (Pr/Pr_w)^0.25, Pr of the free stream.
/// Range: none stated for the ratio. Scatter not stated.
/// Source: Zukauskas 1972, Adv. Heat Transfer 8, 93-160.
struct zukauskas_1972 : correlation<zukauskas_1972, nusselt_correction, prandtl_ratio> {
  static constexpr const char* id = "property-factor/zukauskas-1972";
  static constexpr const char* quantity = "Nu_over_Nucp";
  static constexpr const char* keys[] = {"Pr_over_Pr_w"};
  static constexpr reference source{"A. Zukauskas", 1972, "Adv. Heat Transfer 8, 93-160",
                                    known::recalled, "0.20 is printed for a cooled liquid, too"};
  static constexpr auto envelope = within();
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::free_stream_with_wall;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Pr_over_Pr_w) {
    return power<1, 4>(Pr_over_Pr_w);
  }
};

/// Liquids along plates, across cylinders and past spheres: Nu/Nu_cp = (Pr/Pr_w)^p, p = 0.25
/// heated, 0.11 cooled, Pr of the free stream.
/// Range: 0.1 <= Pr/Pr_w <= 10. Scatter not stated.
/// Source: Gnielinski 1975, Forsch. Ing.-Wes. 41, 145-153.
struct gnielinski_1975_liquid
    : correlation<gnielinski_1975_liquid, nusselt_correction, prandtl_ratio> {
  static constexpr const char* id = "property-factor/gnielinski-1975-liquid";
  static constexpr const char* quantity = "Nu_over_Nucp";
  static constexpr const char* keys[] = {"Pr_over_Pr_w"};
  static constexpr reference source{"V. Gnielinski", 1975, "Forsch. Ing.-Wes. 41, 145-153",
                                    known::recalled};
  static constexpr auto envelope = within(limit<prandtl_ratio>(0.1, 10.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::free_stream_with_wall;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Pr_over_Pr_w) {
    const T l = log(Pr_over_Pr_w);
    return exp(larger(T(0.25 * l), T(0.11 * l)));
  }
};

/// Gases in turbulent duct flow: Nu/Nu_cp = (T_b/T_w)^0.45 heated, 1 cooled.
/// Range: T_b/T_w >= 0.5 heated, to 2 cooled. Scatter not stated.
/// Source: Gnielinski 1976, Int. Chem. Eng. 16(2), 359-368; K = 1 cooled: VDI Heat Atlas G1.
struct gnielinski_1976_gas
    : correlation<gnielinski_1976_gas, nusselt_correction, temperature_ratio> {
  static constexpr const char* id = "property-factor/gnielinski-1976-gas";
  static constexpr const char* quantity = "Nu_over_Nucp";
  static constexpr reference source{"V. Gnielinski", 1976, "Int. Chem. Eng. 16(2), 359-368",
                                    known::recalled, "to T_b/T_w 1.5 with 0.45 is printed, too"};
  static constexpr auto envelope = within(limit<temperature_ratio>(0.5, 2.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  static constexpr double exponent = 0.45;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Tb_over_Tw) {
    constexpr double n = exponent;
    return exp(T(n * log(smaller(Tb_over_Tw, T(1.0)))));
  }
};

/// Gases in turbulent duct flow: Nu/Nu_cp = (T_w/T_b)^n, n = -0.5 heated, 0 cooled.
/// Range: 0.5 <= T_w/T_b <= 5. Scatter not stated.
/// Source: Kays and Crawford, Convective Heat and Mass Transfer, 2nd ed., 1980.
struct kays_crawford_gas : correlation<kays_crawford_gas, nusselt_correction, temperature_ratio> {
  static constexpr const char* id = "property-factor/kays-crawford-gas";
  static constexpr const char* quantity = "Nu_over_Nucp";
  static constexpr reference source{"W. M. Kays, M. E. Crawford", 1980,
                                    "Convective Heat and Mass Transfer, 2nd ed.", known::recalled};
  static constexpr auto envelope = within(limit<temperature_ratio>(0.2, 2.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Tb_over_Tw) {
    return sqrt(smaller(Tb_over_Tw, T(1.0)));
  }
};

/// Gases in turbulent duct flow: Nu/Nu_cp = (T_w/T_b)^n, n = -(0.3 log10(T_w/T_b) + 0.36) heated,
/// -0.36 cooled: cooling raises Nu here, unlike in the other two.
/// Range: 0.37 <= T_w/T_b <= 3.1; Re 1.4e4 .. 5.8e5. Scatter not stated.
/// Source: Petukhov, Kirillov and Maidanik 1966, Proc. 3rd Int. Heat Transfer Conf. 1, 285-292.
struct petukhov_kirillov_maidanik_1966
    : correlation<petukhov_kirillov_maidanik_1966, nusselt_correction, temperature_ratio> {
  static constexpr const char* id = "property-factor/petukhov-kirillov-maidanik-1966";
  static constexpr const char* quantity = "Nu_over_Nucp";
  static constexpr reference source{"B. S. Petukhov, V. V. Kirillov, V. N. Maidanik", 1966,
                                    "Proc. 3rd Int. Heat Transfer Conf. 1, 285-292",
                                    known::recalled};
  static constexpr auto envelope = within(limit<temperature_ratio>(1.0 / 3.1, 1.0 / 0.37));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Tb_over_Tw) {
    constexpr double log10_of_e = 0.43429448190325182765;
    const T l = log(Tb_over_Tw);
    const T heated = smaller(l, T(0.0));
    return exp(T(l * (0.36 - (0.3 * log10_of_e) * heated)));
  }
};

/// Gases along plates, across cylinders and past spheres: Nu/Nu_cp = (T_inf/T_w)^0.12.
/// Range: 0.5 <= T_inf/T_w <= 2. Scatter not stated.
/// Source: Gnielinski 1975, Forsch. Ing.-Wes. 41, 145-153.
struct gnielinski_1975_gas
    : correlation<gnielinski_1975_gas, nusselt_correction, temperature_ratio> {
  static constexpr const char* id = "property-factor/gnielinski-1975-gas";
  static constexpr const char* quantity = "Nu_over_Nucp";
  static constexpr const char* keys[] = {"Tinf_over_Tw"};
  static constexpr reference source{"V. Gnielinski", 1975, "Forsch. Ing.-Wes. 41, 145-153",
                                    known::recalled};
  static constexpr auto envelope = within(limit<temperature_ratio>(0.5, 2.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::free_stream_with_wall;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Tinf_over_Tw) {
    return power<3, 25>(Tinf_over_Tw);
  }
};

/// Heated gases along plates, turbulent: Nu/Nu_cp = (T_w/T_inf)^-0.4.
/// Range: 1 <= T_w/T_inf <= 4; not for cooled gases. Scatter not stated.
/// Source: Kays and Crawford, Convective Heat and Mass Transfer, 2nd ed., 1980.
struct kays_crawford_plate
    : correlation<kays_crawford_plate, nusselt_correction, temperature_ratio> {
  static constexpr const char* id = "property-factor/kays-crawford-plate";
  static constexpr const char* quantity = "Nu_over_Nucp";
  static constexpr const char* keys[] = {"Tinf_over_Tw"};
  static constexpr reference source = kays_crawford_gas::source;
  static constexpr auto envelope = within(limit<temperature_ratio>(0.25, 1.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::free_stream_with_wall;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Tinf_over_Tw) {
    return power<2, 5>(Tinf_over_Tw);
  }
};

/// Friction of liquids in turbulent duct flow: f/f_cp = (7 - mu_b/mu_w)/6 heated,
/// (mu_w/mu_b)^0.24 cooled.
/// Range: 0.35 <= mu_w/mu_b <= 2; Re 1e4 .. 2.3e5, Pr 1.3 .. 10. Scatter not stated.
/// Source: Petukhov 1970, Adv. Heat Transfer 6, 503-564.
struct petukhov_1970_friction
    : correlation<petukhov_1970_friction, friction_correction, viscosity_ratio> {
  static constexpr const char* id = "property-factor/petukhov-1970-friction";
  static constexpr const char* quantity = "f_over_fcp";
  static constexpr const char* keys[] = {"mu_b_over_mu_w"};
  static constexpr reference source = petukhov_1970::source;
  static constexpr auto envelope = within(limit<viscosity_ratio>(0.5, 1.0 / 0.35));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& mu_b_over_mu_w) {
    const T heated = T((7.0 - mu_b_over_mu_w) * (1.0 / 6.0));
    const T cooled = power<-6, 25>(mu_b_over_mu_w);
    return select(mu_b_over_mu_w > T(1.0), heated, cooled);
  }
};

/// Friction of gases in turbulent duct flow: f/f_cp = (T_w/T_b)^-0.1, heated and cooled.
/// Range: 0.5 <= T_w/T_b <= 5. Scatter not stated.
/// Source: Kays and Crawford, Convective Heat and Mass Transfer, 2nd ed., 1980.
struct kays_crawford_gas_friction
    : correlation<kays_crawford_gas_friction, friction_correction, temperature_ratio> {
  static constexpr const char* id = "property-factor/kays-crawford-gas-friction";
  static constexpr const char* quantity = "f_over_fcp";
  static constexpr reference source = kays_crawford_gas::source;
  static constexpr auto envelope = kays_crawford_gas::envelope;
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Tb_over_Tw) {
    return power<1, 10>(Tb_over_Tw);
  }
};

/// Friction of gases in laminar duct flow: f/f_cp = (T_w/T_b)^m, m = 1.00 heated, 0.81 cooled.
/// Their Nusselt number needs no factor.
/// Range: 0.5 <= T_w/T_b <= 3. Scatter not stated.
/// Source: Worsoe-Schmidt 1966, Int. J. Heat Mass Transfer 9, 1291-1295; Kays and Crawford.
struct kays_crawford_laminar_gas_friction
    : correlation<kays_crawford_laminar_gas_friction, friction_correction, temperature_ratio> {
  static constexpr const char* id = "property-factor/kays-crawford-laminar-gas-friction";
  static constexpr const char* quantity = "f_over_fcp";
  static constexpr reference source = kays_crawford_gas::source;
  static constexpr auto envelope = within(limit<temperature_ratio>(1.0 / 3.0, 2.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Tb_over_Tw) {
    const T l = log(Tb_over_Tw);
    return exp(larger(T(-l), T(-0.81 * l)));
  }
};

}  // namespace property_ratio

namespace detail {
/// The kind of factor that corrects a number of kind K; void where there is none.
template <class K>
struct factor_for {
  using type = void;
};
template <class L>
struct factor_for<kinds::nusselt<L>> {
  using type = kinds::nusselt_correction;
};
template <class L>
struct factor_for<kinds::local_nusselt<L>> {
  using type = kinds::nusselt_correction;
};
template <>
struct factor_for<kinds::darcy_friction> {
  using type = kinds::friction_correction;
};
template <>
struct factor_for<kinds::fanning_friction> {
  using type = kinds::friction_correction;
};

template <class... K>
constexpr bool any_ratio_among =
    ((std::is_same_v<K, kinds::viscosity_ratio> || std::is_same_v<K, kinds::prandtl_ratio> ||
      std::is_same_v<K, kinds::temperature_ratio>) ||
     ...);

/// Whether the wall's properties already enter the formula of C: a ratio is among its inputs, or
/// it says so by `static constexpr bool wall_enters_formula = true`.
template <class C>
constexpr bool corrects_itself() {
  if constexpr (requires { C::wall_enters_formula; }) {
    return C::wall_enters_formula;
  } else {
    return C::with_input_kinds([]<class... K>() { return any_ratio_among<K...>; });
  }
}

template <class A, class Factor>
constexpr bool fits_factor = false;
template <has_kind A, class Factor>
constexpr bool fits_factor<A, Factor> =
    is_of_kind<Factor, typename factor_for<typename A::kind_type>::type>;

template <class Number, class Factor>
CONVELOPE_FUNCTION constexpr auto times_factor(const Number& number, const Factor& factor) {
  using T = number_type<Number, Factor>;
  return carried<kinds::corrected<typename Number::kind_type>, T>(T(T(number.si()) * factor.si()),
                                                                  number, factor);
}
}  // namespace detail

/// A Nusselt number or friction factor of the caller's own, times the factor of a property ratio:
/// for one from a correlation see corrected<C>.
template <class Number, class Factor>
  requires(detail::fits_factor<Number, Factor>)
CONVELOPE_FUNCTION constexpr auto corrected_number(const Number& number, const Factor& factor) {
  static_assert(!detail::is_estimate<Number>,
                "for an estimate name its correlation: corrected<C>(factor, inputs...)");
  return detail::times_factor(number, factor);
}

/// Correlation C on its inputs, times the factor of a property ratio:
///   corrected<round_duct::petukhov_kirillov_1958>(property_ratio::petukhov_1970{}(mu_ratio), Re,
///   Pr)
/// Only for a correlation with properties of the bulk or the free stream whose formula has no ratio
/// of its own. The answer is of another kind, kinds::corrected, which film_coefficient takes and no
/// second factor fits.
template <class C, class Factor, class... In>
CONVELOPE_FUNCTION constexpr auto corrected(const Factor& factor, const In&... in) {
  static_assert(!detail::corrects_itself<C>(),
                "a property ratio is in this correlation already: a factor would correct twice");
  static_assert(detail::takes_the_stream<C::state_at>,
                "this correlation's state_at brings in the wall: a factor would correct twice");
  static_assert(
      detail::is_of_kind<Factor, typename detail::factor_for<typename C::result_kind>::type>,
      "this factor corrects something else than the correlation gives");
  return detail::times_factor(C{}(in...), factor);
}

}  // namespace v0
}  // namespace convelope

#endif
