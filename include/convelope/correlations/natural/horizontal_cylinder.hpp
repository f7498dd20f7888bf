#ifndef CONVELOPE_CORRELATIONS_NATURAL_HORIZONTAL_CYLINDER_HPP
#define CONVELOPE_CORRELATIONS_NATURAL_HORIZONTAL_CYLINDER_HPP

#include "convelope/correlations/natural/thin_layer.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// A long horizontal cylinder or wire in a fluid at rest. Ra on the diameter and
/// |T_wall - T_ambient|. Film properties; a gas's expansion coefficient at the ambient temperature.
namespace horizontal_cylinder {

/// Mean Nusselt number, isothermal, one formula through laminar and turbulent flow.
/// Nu = {0.60 + 0.387 Ra^(1/6) / [1 + (0.559/Pr)^(9/16)]^(8/27)}^2
/// Range: 1e-5 <= Ra <= 1e12, all Pr. Scatter not stated.
/// Source: Churchill and Chu 1975, Int. J. Heat Mass Transfer 18, 1049-1053.
struct churchill_chu_1975
    : correlation<churchill_chu_1975, nusselt_of<diameter>, rayleigh_of<diameter>, prandtl_number> {
  static constexpr const char* id = "horizontal-cylinder/churchill-chu-1975";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"S. W. Churchill, H. H. S. Chu", 1975,
                                    "Int. J. Heat Mass Transfer 18, 1049-1053", known::quoted,
                                    "printed ranges: 1e-6 .. 1e13, 1e-5 .. 1e12, up to 1e12"};
  static constexpr auto envelope =
      within(limit<rayleigh_of<diameter>>(1e-5, 1e12), limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    return square(T(0.60 + 0.387 * power<1, 6>(Ra) *
                               power<-8, 27>(detail::thin_layer::prandtl_bracket(0.559, Pr))));
  }
};

/// Mean Nusselt number, isothermal, laminar.
/// Nu = 0.36 + 0.518 Ra^(1/4) / [1 + (0.559/Pr)^(9/16)]^(4/9)
/// Range: 1e-6 <= Ra <= 1e9, all Pr. Scatter not stated; in air 26 % below raithby_hollands_1998 at
/// Ra 1, 20 % above it at 1e-6.
/// Source: Churchill and Chu 1975, Int. J. Heat Mass Transfer 18, 1049-1053.
struct churchill_chu_laminar_1975 : correlation<churchill_chu_laminar_1975, nusselt_of<diameter>,
                                                rayleigh_of<diameter>, prandtl_number> {
  static constexpr const char* id = "horizontal-cylinder/churchill-chu-laminar-1975";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"S. W. Churchill, H. H. S. Chu", 1975,
                                    "Int. J. Heat Mass Transfer 18, 1049-1053", known::computed,
                                    "thin-layer theory gives 0.5176 for 0.518"};
  static constexpr auto envelope =
      within(limit<rayleigh_of<diameter>>(1e-6, 1e9), limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    return T(0.36 + 0.518 * power<1, 4>(Ra) *
                        power<-4, 9>(detail::thin_layer::prandtl_bracket(0.559, Pr)));
  }
};

/// Mean Nusselt number, isothermal, five power laws as published: Nu = C Ra^n with
///   1e-10 .. 1e-2  C 0.675  n 0.058
///   1e-2  .. 1e2   C 1.02   n 0.148
///   1e2   .. 1e4   C 0.850  n 0.188
///   1e4   .. 1e7   C 0.480  n 1/4
///   1e7   .. 1e12  C 0.125  n 1/3
/// It steps by up to 0.23 % where two of them meet; the upper one holds at the joint itself.
/// Scatter: the source claims 5 %.
/// Source: Morgan 1975, Adv. Heat Transfer 11, 199-264.
struct morgan_1975 : correlation<morgan_1975, nusselt_of<diameter>, rayleigh_of<diameter>> {
  static constexpr const char* id = "horizontal-cylinder/morgan-1975";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"V. T. Morgan", 1975, "Adv. Heat Transfer 11, 199-264",
                                    known::recalled, "the last exponent is also printed 0.333"};
  static constexpr auto envelope = within(limit<rayleigh_of<diameter>>(1e-10, 1e12));
  static constexpr double scatter = 0.05;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra) {
    const auto in_range = [&](double a, double b, double c, double d, double e) {
      T r = select(Ra < T(1e7), T(d), T(e));
      r = select(Ra < T(1e4), T(c), r);
      r = select(Ra < T(1e2), T(b), r);
      return select(Ra < T(1e-2), T(a), r);
    };
    const T n = in_range(0.058, 0.148, 0.188, 0.25, 1.0 / 3.0);
    return T(in_range(0.675, 1.02, 0.850, 0.480, 0.125) * exp(T(n * log(Ra))));
  }
};

/// Mean Nusselt number, isothermal, laminar and turbulent, with a thick layer at low Ra.
/// Nu_T = 0.772 C_l Ra^(1/4), C_l = 0.671 / [1 + (0.492/Pr)^(9/16)]^(4/9);
/// f = 1 - 0.13/Nu_T^0.16; Nu_l = 2 f/ln(1 + 2 f/Nu_T); Nu_t = C_t(Pr) Ra^(1/3);
/// Nu = (Nu_l^10 + Nu_t^10)^(1/10)
/// C_t is tabulated, linear in ln Pr between the entries.
/// Range: 1e-10 <= Ra <= 1e12, 0.01 <= Pr <= 2000. Scatter not stated.
/// Source: Raithby and Hollands 1998, in Rohsenow, Hartnett, Cho (eds), Handbook of Heat Transfer,
/// 3rd ed., ch. 4.
struct raithby_hollands_1998 : correlation<raithby_hollands_1998, nusselt_of<diameter>,
                                           rayleigh_of<diameter>, prandtl_number> {
  static constexpr const char* id = "horizontal-cylinder/raithby-hollands-1998";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{
      "G. D. Raithby, K. G. T. Hollands", 1998, "Handbook of Heat Transfer, 3rd ed., ch. 4",
      known::computed,
      "C_t at Pr 0.1 is recalled as 0.092 or 0.090; averaging the plate coefficients over the "
      "surface gives 0.0896, 0.090 taken"};
  static constexpr auto envelope =
      within(limit<rayleigh_of<diameter>>(1e-10, 1e12), limit<prandtl_number>(0.01, 2000.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  // Pr 0.01, 0.022, 0.1, 0.71, 2, 6, 50, 100, 2000
  static constexpr int entries = 9;
  static constexpr double table_ln_Pr[entries] = {
      -4.605170185988091, -3.816712825623821, -2.3025850929940455,
      -0.342490308946776, 0.6931471805599453, 1.791759469228055,
      3.912023005428146,  4.605170185988092,  7.600902459542082};
  static constexpr double table_C_t[entries] = {0.077, 0.081, 0.090, 0.103, 0.108,
                                                0.109, 0.100, 0.097, 0.088};

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T turbulent_coefficient(const T& Pr) {
    const T ln_Pr = log(Pr);
    T C_t = T(table_C_t[0]);
    for (int i = 1; i < entries; ++i) {
      const double step = table_ln_Pr[i] - table_ln_Pr[i - 1];
      const T part = T((ln_Pr - table_ln_Pr[i - 1]) * (1.0 / step));
      C_t = T(C_t + (table_C_t[i] - table_C_t[i - 1]) * smaller(larger(part, T(0.0)), T(1.0)));
    }
    return C_t;
  }

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, const T& Pr) {
    const T thin = T(0.772 * detail::thin_layer::laminar_coefficient(Pr) * power<1, 4>(Ra));
    const T f = T(1.0 - 0.13 * power<-4, 25>(thin));
    const T laminar = detail::thin_layer::thickened(T(2.0 * f), thin);
    return joined<10>(laminar, T(turbulent_coefficient(Pr) * cbrt(Ra)));
  }
};

}  // namespace horizontal_cylinder
}  // namespace v0
}  // namespace convelope

#endif
