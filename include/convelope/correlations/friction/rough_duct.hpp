#ifndef CONVELOPE_CORRELATIONS_FRICTION_ROUGH_DUCT_HPP
#define CONVELOPE_CORRELATIONS_FRICTION_ROUGH_DUCT_HPP

#include "convelope/correlations/friction/solve.hpp"
#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {
namespace friction {

/// Darcy factor, rough or smooth, turbulent, implicit:
/// 1/sqrt(f) = -2 log10[(eps/D)/3.7 + 2.51/(Re sqrt(f))], eps the equivalent sand-grain roughness.
/// Range: 4000 <= Re <= 1e8, eps/D <= 0.05. Scatter: +-5 % smooth, +-10 % rough (Moody).
/// Solved in y = 1/sqrt(f) by a fixed number of Newton steps. Far outside it is held at its value
/// at Re = 100, eps/D = 0 or eps/D = 1 so that it stays finite.
/// Source: Colebrook 1939, J. Inst. Civ. Eng. 11, 133-156.
struct colebrook_1939 : correlation<colebrook_1939, darcy_friction, reynolds_of<hydraulic_diameter>,
                                    relative_roughness> {
  static constexpr const char* id = "friction/colebrook-1939";
  static constexpr const char* quantity = "f_D";
  static constexpr reference source{"C. F. Colebrook", 1939, "J. Inst. Civ. Eng. 11, 133-156",
                                    known::quoted,
                                    "3.7, 3.71 and 3.715 are printed; scatter: Moody 1944"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(4000.0, 1e8),
                                          limit<relative_roughness>(0.0, 0.05));
  static constexpr double scatter = 0.1;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& eps_over_D) {
    using detail::friction_law::two_logs;
    const T rough = T(smaller(larger(eps_over_D, T(0.0)), T(1.0)) * (1.0 / 3.7));
    const T smooth = T(2.51 / larger(Re, T(100.0)));
    // y is 4.8 in the smooth term; concave in y, and never so far right that a step leaves y > 0.
    const auto start = [](const auto& a, const auto& b) {
      using P = std::remove_cvref_t<decltype(a)>;
      return P(-two_logs * log(P(a + 4.8 * b)));
    };
    const auto next = [](const auto& y, const auto& a, const auto& b) {
      using Y = std::remove_cvref_t<decltype(y)>;
      const Y s = Y(a + b * y);
      return Y(y - s * (y + two_logs * log(s)) / (s + two_logs * b));
    };
    return T(1.0 / square(detail::friction_law::root(rough, smooth, start, next)));
  }
};

/// Darcy factor, rough, turbulent, explicit:
/// 1/sqrt(f) = -1.8 log10[((eps/D)/3.7)^1.11 + 6.9/Re].
/// Range: 4000 <= Re <= 1e8, eps/D <= 0.05. Within about 2 % of Colebrook's law (the source;
/// 1.4 % measured), whose scatter of +-10 % it shares.
/// Source: Haaland 1983, J. Fluids Eng. 105, 89-90.
struct haaland_1983 : correlation<haaland_1983, darcy_friction, reynolds_of<hydraulic_diameter>,
                                  relative_roughness> {
  static constexpr const char* id = "friction/haaland-1983";
  static constexpr const char* quantity = "f_D";
  static constexpr reference source{"S. E. Haaland", 1983, "J. Fluids Eng. 105, 89-90",
                                    known::quoted, "scatter: that of Colebrook's law"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(4000.0, 1e8),
                                          limit<relative_roughness>(0.0, 0.05));
  static constexpr double scatter = 0.1;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& eps_over_D) {
    // The floor changes nothing to 1e-16 and keeps the derivatives finite at eps/D = 0.
    const T rough = power<111, 100>(T(larger(eps_over_D, T(1e-30)) * (1.0 / 3.7)));
    const T inverse_root = T(-1.8 * detail::friction_law::log10(T(rough + 6.9 / Re)));
    return T(1.0 / square(inverse_root));
  }
};

/// Darcy factor, one formula for all regimes and roughness:
/// f = 8 [(8/Re)^12 + (A + B)^(-3/2)]^(1/12), B = (37530/Re)^16,
/// A = {2.457 ln(1/[(7/Re)^0.9 + 0.27 eps/D])}^16.
/// Range: all Re > 0, eps/D <= 0.05. Scatter not stated; up to 3.1 % from Colebrook's law
/// (Re 4000, eps/D 0.01), 0.14 % above 64/Re at Re 2000.
/// Source: Churchill 1977, Chem. Eng. 84(24), 91-92.
struct churchill_1977 : correlation<churchill_1977, darcy_friction, reynolds_of<hydraulic_diameter>,
                                    relative_roughness> {
  static constexpr const char* id = "friction/churchill-1977";
  static constexpr const char* quantity = "f_D";
  static constexpr reference source{"S. W. Churchill", 1977, "Chem. Eng. 84(24), 91-92",
                                    known::quoted,
                                    "misprints in circulation: exponent 3.2 for 3/2, 15 for 1.5, "
                                    "37.530; a 2 for the 8 is Fanning"};
  static constexpr auto envelope = within(limit<reynolds_of<hydraulic_diameter>>(1e-12, unbounded),
                                          limit<relative_roughness>(0.0, 0.05));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Re, const T& eps_over_D) {
    using detail::friction_law::joined_in_range;
    // The 8th roots of A and B are joined: (A + B)^(3/2) leaves the doubles below Re ~ 6e-9.
    const T wall = T(power<9, 10>(T(7.0 / Re)) + 0.27 * eps_over_D);
    const T turbulent = joined_in_range<8>(square(T(2.457 * log(wall))), square(T(37530.0 / Re)));
    return T(8.0 * joined_in_range<12>(T(8.0 / Re), T(1.0 / turbulent)));
  }
};

}  // namespace friction
}  // namespace v0
}  // namespace convelope

#endif
