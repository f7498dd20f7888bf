#ifndef CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_LAMINAR_HPP
#define CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_LAMINAR_HPP

#include "convelope/correlations/internal/round_duct_choices.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// Flow in a straight round duct, on the inside diameter, the mean velocity and the difference
/// between wall and bulk. x_star = (x/D)/(Re Pr), Gz = 1/x_star. A mean for uniform wall
/// temperature belongs to the log-mean temperature difference; one for uniform flux is the mean
/// of Nu_x. Properties at the bulk temperature.
namespace round_duct {

/// Developed laminar flow, uniform wall temperature: exact, Nu = 3.656793458.
/// Range: Re <= 2300, Re Pr > 100 (no conduction along the stream).
/// Source: Graetz 1883, Ann. Phys. Chem. 18, 79-94.
struct laminar_developed_uwt : correlation<laminar_developed_uwt, nusselt_of<hydraulic_diameter>> {
  static constexpr const char* id = "round-duct/laminar-developed";
  static constexpr const char* quantity = "Nu_T";
  static constexpr reference source{"L. Graetz", 1883, "Ann. Phys. Chem. 18, 79-94",
                                    known::computed, "exact; Re <= 2300"};
  static constexpr auto envelope = within();
  static constexpr double scatter = 0.0;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula() {
    return T(3.6567934577632924);
  }
};

/// Developed laminar flow, uniform heat flux: exact, Nu = 48/11.
/// Range: Re <= 2300, Re Pr > 100.
/// Source: Shah and London 1978, Laminar Flow Forced Convection in Ducts.
struct laminar_developed_uhf : correlation<laminar_developed_uhf, nusselt_of<hydraulic_diameter>> {
  static constexpr const char* id = "round-duct/laminar-developed";
  static constexpr const char* quantity = "Nu_H";
  static constexpr reference source{"R. K. Shah, A. L. London", 1978,
                                    "Laminar Flow Forced Convection in Ducts, Academic Press",
                                    known::computed, "exact; Re <= 2300"};
  static constexpr auto envelope = within();
  static constexpr double scatter = 0.0;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula() {
    return T(48.0 / 11.0);
  }
};

/// Local, uniform wall temperature, velocity developed: fit of Graetz's solution.
/// x <= 0.001: 1.077 x^(-1/3) - 0.7; above: 3.657 + 6.874 (1000 x)^(-0.488) exp(-57.2 x), x =
/// x_star. Steps by +0.8 % at 0.001. Range: x_star >= 1e-6, Re <= 2300. Scatter +-3 % of the
/// solution. Source: Shah 1975, 3rd Natl. Heat Mass Transfer Conf., HMT-11-75; Shah and London
/// 1978.
struct shah_1975_uwt_local
    : correlation<shah_1975_uwt_local, local_nusselt_of<hydraulic_diameter>, thermal_entry> {
  static constexpr const char* id = "round-duct/shah-1975-uwt";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{
      "R. K. Shah", 1975, "3rd Natl. Heat Mass Transfer Conf., IIT Bombay, HMT-11-75",
      known::computed,
      "the break is commonly printed as 0.01, where it is 12 % low; both pieces meet at 0.001"};
  static constexpr auto envelope = within(limit<thermal_entry>(1e-6, unbounded));
  static constexpr double scatter = 0.03;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star) {
    const T at_inlet = T(1.077 * power<-1, 3>(x_star) - 0.7);
    const T downstream =
        T(3.657 + 6.874 * exp(T(-0.488 * log(T(1000.0 * x_star)) - 57.2 * x_star)));
    return select(x_star <= T(0.001), at_inlet, downstream);
  }
};

/// Mean, uniform wall temperature, velocity developed: fit of Graetz's solution.
/// x <= 0.005: 1.615 x^(-1/3) - 0.7; to 0.03: 1.615 x^(-1/3) - 0.2; from 0.03: 3.657 + 0.0499/x.
/// Steps by +5.7 % at 0.005 and by +6.4 % at 0.03, as published.
/// Range: x_star >= 1e-6, Re <= 2300. Scatter +-3 % by the source; 4.2 % at worst next to 0.03.
/// Source: Shah 1975, 3rd Natl. Heat Mass Transfer Conf., HMT-11-75; Shah and London 1978.
struct shah_1975_uwt_mean
    : correlation<shah_1975_uwt_mean, nusselt_of<hydraulic_diameter>, thermal_entry> {
  static constexpr const char* id = "round-duct/shah-1975-uwt";
  static constexpr const char* quantity = "Nu_m";
  static constexpr reference source{"R. K. Shah", 1975,
                                    "3rd Natl. Heat Mass Transfer Conf., IIT Bombay, HMT-11-75",
                                    known::computed, "on the log-mean temperature difference"};
  static constexpr auto envelope = within(limit<thermal_entry>(1e-6, unbounded));
  static constexpr double scatter = 0.03;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star) {
    const T layer = T(1.615 * power<-1, 3>(x_star));
    const T downstream = T(3.657 + 0.0499 / x_star);
    return select(x_star <= T(0.005), T(layer - 0.7),
                  select(x_star < T(0.03), T(layer - 0.2), downstream));
  }
};

/// Local, uniform heat flux, velocity developed: fit of the exact solution.
/// x <= 5e-5: 1.302 x^(-1/3) - 1; to 0.0015: 1.302 x^(-1/3) - 0.5;
/// above: 4.364 + 8.68 (1000 x)^(-0.506) exp(-41 x), x = x_star.
/// Steps by +1.5 % at 5e-5 and by +1.0 % at 0.0015. Range: x_star >= 1e-6, Re <= 2300. Scatter +-3
/// %. Source: Shah 1975, 3rd Natl. Heat Mass Transfer Conf., HMT-11-75; Shah and London 1978.
struct shah_1975_uhf_local
    : correlation<shah_1975_uhf_local, local_nusselt_of<hydraulic_diameter>, thermal_entry> {
  static constexpr const char* id = "round-duct/shah-1975-uhf";
  static constexpr const char* quantity = "Nu_x";
  static constexpr reference source{"R. K. Shah", 1975,
                                    "3rd Natl. Heat Mass Transfer Conf., IIT Bombay, HMT-11-75",
                                    known::computed};
  static constexpr auto envelope = within(limit<thermal_entry>(1e-6, unbounded));
  static constexpr double scatter = 0.03;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star) {
    const T layer = T(1.302 * power<-1, 3>(x_star));
    const T downstream = T(4.364 + 8.68 * exp(T(-0.506 * log(T(1000.0 * x_star)) - 41.0 * x_star)));
    return select(x_star <= T(5e-5), T(layer - 1.0),
                  select(x_star <= T(0.0015), T(layer - 0.5), downstream));
  }
};

/// Mean of Nu_x, uniform heat flux, velocity developed: fit of the exact solution.
/// x <= 0.03: 1.953 x^(-1/3); above: 4.364 + 0.0722/x. Steps by +7.7 % at 0.03, as published.
/// Range: x_star >= 1e-6, Re <= 2300. Scatter +-3 % by the source; 4.3 % at worst next to 0.03.
/// Source: Shah 1975, 3rd Natl. Heat Mass Transfer Conf., HMT-11-75; Shah and London 1978.
struct shah_1975_uhf_mean
    : correlation<shah_1975_uhf_mean, nusselt_of<hydraulic_diameter>, thermal_entry> {
  static constexpr const char* id = "round-duct/shah-1975-uhf";
  static constexpr const char* quantity = "Nu_m";
  static constexpr reference source{"R. K. Shah", 1975,
                                    "3rd Natl. Heat Mass Transfer Conf., IIT Bombay, HMT-11-75",
                                    known::computed};
  static constexpr auto envelope = within(limit<thermal_entry>(1e-6, unbounded));
  static constexpr double scatter = 0.03;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& x_star) {
    return select(x_star <= T(0.03), T(1.953 * power<-1, 3>(x_star)), T(4.364 + 0.0722 / x_star));
  }
};

}  // namespace round_duct
}  // namespace v0
}  // namespace convelope

#endif
