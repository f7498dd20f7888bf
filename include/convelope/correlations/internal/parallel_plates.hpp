#ifndef CONVELOPE_CORRELATIONS_INTERNAL_PARALLEL_PLATES_HPP
#define CONVELOPE_CORRELATIONS_INTERNAL_PARALLEL_PLATES_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// Laminar flow between wide parallel plates, on the hydraulic diameter (twice the gap, also with
/// one plate heated), the mean velocity and the difference between wall and bulk.
/// x_star = (x/Dh)/(Re Pr), Gz = 1/x_star. Properties at the bulk temperature.
namespace parallel_plates {

/// Developed, both walls at one temperature: exact, Nu = 7.5407009.
/// Range: laminar, Re Pr > 100. Source: Shah and London 1978.
struct exact_developed_uwt : correlation<exact_developed_uwt, nusselt_of<hydraulic_diameter>> {
  static constexpr const char* id = "parallel-plates/exact-developed";
  static constexpr const char* quantity = "Nu_T";
  static constexpr reference source{"R. K. Shah, A. L. London", 1978,
                                    "Laminar Flow Forced Convection in Ducts, Academic Press",
                                    known::computed, "exact"};
  static constexpr auto envelope = within();
  static constexpr double scatter = 0.0;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula() {
    return T(7.5407008740694379);
  }
};

/// Developed, the same uniform heat flux from both walls: exact, Nu = 140/17.
struct exact_developed_uhf : correlation<exact_developed_uhf, nusselt_of<hydraulic_diameter>> {
  static constexpr const char* id = "parallel-plates/exact-developed";
  static constexpr const char* quantity = "Nu_H";
  static constexpr reference source = exact_developed_uwt::source;
  static constexpr auto envelope = within();
  static constexpr double scatter = 0.0;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula() {
    return T(140.0 / 17.0);
  }
};

/// Developed, uniform heat flux from one wall, the other insulated: exact, Nu = 70/13.
struct exact_developed_uhf_one_wall
    : correlation<exact_developed_uhf_one_wall, nusselt_of<hydraulic_diameter>> {
  static constexpr const char* id = "parallel-plates/exact-developed";
  static constexpr const char* quantity = "Nu_H_one";
  static constexpr reference source = exact_developed_uwt::source;
  static constexpr auto envelope = within();
  static constexpr double scatter = 0.0;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula() {
    return T(70.0 / 13.0);
  }
};

/// Developed, one wall at uniform temperature, the other insulated: exact, Nu = 4.8607368.
struct exact_developed_uwt_one_wall
    : correlation<exact_developed_uwt_one_wall, nusselt_of<hydraulic_diameter>> {
  static constexpr const char* id = "parallel-plates/exact-developed";
  static constexpr const char* quantity = "Nu_T_one";
  static constexpr reference source = exact_developed_uwt::source;
  static constexpr auto envelope = within();
  static constexpr double scatter = 0.0;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula() {
    return T(4.8607367789413918);
  }
};

/// Local, both walls at one temperature, velocity developed: fit of the exact solution.
/// x <= 0.001: 1.233 x^(-1/3) + 0.4; above: 7.541 + 6.874 (1000 x)^(-0.488) exp(-245 x), x =
/// x_star. Range: x_star >= 1e-6, laminar. Scatter +-3 % of the solution. Source: Shah 1975, 3rd
/// Natl. Heat Mass Transfer Conf., HMT-11-75; Shah and London 1978.
struct shah_1975_uwt_local
    : correlation<shah_1975_uwt_local, local_nusselt_of<hydraulic_diameter>, thermal_entry> {
  static constexpr const char* id = "parallel-plates/shah-1975-uwt";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{"R. K. Shah", 1975,
                                    "3rd Natl. Heat Mass Transfer Conf., IIT Bombay, HMT-11-75",
                                    known::computed};
  static constexpr auto envelope = within(limit<thermal_entry>(1e-6, unbounded));
  static constexpr double scatter = 0.03;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star) {
    const T at_inlet = T(1.233 * power<-1, 3>(x_star) + 0.4);
    const T downstream =
        T(7.541 + 6.874 * exp(T(-0.488 * log(T(1000.0 * x_star)) - 245.0 * x_star)));
    return select(x_star <= T(0.001), at_inlet, downstream);
  }
};

/// Mean, both walls at one temperature, velocity developed: fit of the exact solution.
/// x <= 0.0005: 1.849 x^(-1/3); to 0.006: 1.849 x^(-1/3) + 0.6; above: 7.541 + 0.0235/x.
/// Steps by +2.6 % at 0.0005 and by +6.3 % at 0.006, as published. On the log-mean difference.
/// Range: x_star >= 1e-6, laminar. Scatter +-3 % by the source; 3.3 % at worst.
/// Source: Shah 1975, 3rd Natl. Heat Mass Transfer Conf., HMT-11-75; Shah and London 1978.
struct shah_1975_uwt_mean
    : correlation<shah_1975_uwt_mean, nusselt_of<hydraulic_diameter>, thermal_entry> {
  static constexpr const char* id = "parallel-plates/shah-1975-uwt";
  static constexpr const char* quantity = "Nu_m";
  static constexpr reference source = shah_1975_uwt_local::source;
  static constexpr auto envelope = within(limit<thermal_entry>(1e-6, unbounded));
  static constexpr double scatter = 0.03;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star) {
    const T layer = T(1.849 * power<-1, 3>(x_star));
    const T downstream = T(7.541 + 0.0235 / x_star);
    return select(x_star <= T(0.0005), layer,
                  select(x_star <= T(0.006), T(layer + 0.6), downstream));
  }
};

/// Local, the same uniform flux from both walls, velocity developed: fit of the exact solution.
/// x <= 0.0002: 1.490 x^(-1/3); to 0.001: 1.490 x^(-1/3) + 0.4;
/// above: 8.235 + 8.68 (1000 x)^(-0.506) exp(-164 x), x = x_star.
/// Range: x_star >= 1e-6, laminar. Scatter +-3 % of the solution.
/// Source: Shah 1975, 3rd Natl. Heat Mass Transfer Conf., HMT-11-75; Shah and London 1978.
struct shah_1975_uhf_local
    : correlation<shah_1975_uhf_local, local_nusselt_of<hydraulic_diameter>, thermal_entry> {
  static constexpr const char* id = "parallel-plates/shah-1975-uhf";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{
      "R. K. Shah", 1975, "3rd Natl. Heat Mass Transfer Conf., IIT Bombay, HMT-11-75",
      known::computed,
      "reprints have - 0.4 in the middle piece, 6 % low; the solution wants + 0.4"};
  static constexpr auto envelope = within(limit<thermal_entry>(1e-6, unbounded));
  static constexpr double scatter = 0.03;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star) {
    const T layer = T(1.490 * power<-1, 3>(x_star));
    const T downstream =
        T(8.235 + 8.68 * exp(T(-0.506 * log(T(1000.0 * x_star)) - 164.0 * x_star)));
    return select(x_star <= T(0.0002), layer,
                  select(x_star <= T(0.001), T(layer + 0.4), downstream));
  }
};

/// Mean of Nu_x, the same uniform flux from both walls, velocity developed.
/// x <= 0.001: 2.236 x^(-1/3); to 0.01: 2.236 x^(-1/3) + 0.9; above: 8.235 + 0.0364/x.
/// Steps by +4.0 % at 0.001 and by +5.3 % at 0.01, as published.
/// Range: x_star >= 1e-6, laminar. Scatter +-3 % of the solution.
/// Source: Shah 1975, 3rd Natl. Heat Mass Transfer Conf., HMT-11-75; Shah and London 1978.
struct shah_1975_uhf_mean
    : correlation<shah_1975_uhf_mean, nusselt_of<hydraulic_diameter>, thermal_entry> {
  static constexpr const char* id = "parallel-plates/shah-1975-uhf";
  static constexpr const char* quantity = "Nu_m";
  static constexpr reference source = shah_1975_uwt_local::source;
  static constexpr auto envelope = within(limit<thermal_entry>(1e-6, unbounded));
  static constexpr double scatter = 0.03;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star) {
    const T layer = T(2.236 * power<-1, 3>(x_star));
    const T downstream = T(8.235 + 0.0364 / x_star);
    return select(x_star <= T(0.001), layer, select(x_star <= T(0.01), T(layer + 0.9), downstream));
  }
};

/// Mean, both walls at one temperature, velocity developed:
/// Nu = 7.54 + 0.03 Gz/(1 + 0.016 Gz^(2/3)), Gz = Re Pr Dh/L. On the log-mean difference.
/// Range: Re <= 2800. Scatter not stated; 8.6 % above the exact solution at Gz 1e4.
/// Source: Edwards, Denny and Mills 1979, Transfer Processes.
struct edwards_1979 : correlation<edwards_1979, nusselt_of<hydraulic_diameter>, graetz_number> {
  static constexpr const char* id = "parallel-plates/edwards-1979";
  static constexpr const char* quantity = "Nu_m";
  static constexpr reference source{"D. K. Edwards, V. E. Denny, A. F. Mills", 1979,
                                    "Transfer Processes, 2nd ed., McGraw-Hill", known::recalled,
                                    "no bound on Gz is printed"};
  static constexpr auto envelope = within(limit<graetz_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Gz) {
    return T(7.54 + 0.03 * Gz / (1.0 + 0.016 * power<2, 3>(Gz)));
  }
};

}  // namespace parallel_plates
}  // namespace v0
}  // namespace convelope

#endif
