#ifndef CONVELOPE_FLUIDS_DETAIL_LEMMON_JACOBSEN_HPP
#define CONVELOPE_FLUIDS_DETAIL_LEMMON_JACOBSEN_HPP

#include <cmath>

#include "convelope/fluids/detail/gas_equations.hpp"

// Viscosity and conductivity of nitrogen, oxygen, argon and air from the dilute gas to the liquid:
// Lemmon, Jacobsen, Int. J. Thermophys. 25 (2004) 21-69. Terms n, d, t, l of
// n tau^t delta^d exp(-delta^l), tables III and IV of the paper.

namespace convelope {
inline namespace v0 {
namespace detail {

struct nitrogen_transport : nitrogen_equation {
  static constexpr double energy_K = 98.94;  // eps/k of the collision integral
  static constexpr double dilute_viscosity = 0.0266958 * 5.292776209136374 / (0.3656 * 0.3656);
  static constexpr helmholtz::term viscosity_terms[] = {{10.72, 2, 0.1, 0},
                                                        {0.03989, 10, 0.25, 1},
                                                        {0.001208, 12, 3.2, 1},
                                                        {-7.402, 2, 0.9, 2},
                                                        {4.620, 1, 0.3, 3}};
  static constexpr helmholtz::term conductivity_terms[] = {
      {8.862, 1, 0.0, 0}, {31.11, 2, 0.03, 0},  {-73.13, 3, 0.2, 1},
      {20.03, 4, 0.8, 2}, {-0.7096, 8, 0.6, 2}, {0.2672, 10, 1.9, 2}};
  static constexpr double of_viscosity = 1.511;
  static constexpr helmholtz::term dilute_terms[] = {{2.117, 0, -1.0, 0}, {-3.332, 0, -0.7, 0}};
  static constexpr double critical_pressure = 3.3958e6;
  static constexpr double amplitude_nm = 0.17;
  static constexpr double cutoff_nm = 0.40;
};
struct oxygen_transport : oxygen_equation {
  static constexpr double energy_K = 118.5;  // eps/k of the collision integral
  static constexpr double dilute_viscosity = 0.0266958 * 5.656748182480815 / (0.3428 * 0.3428);
  static constexpr helmholtz::term viscosity_terms[] = {{17.67, 1, 0.05, 0},
                                                        {0.4042, 5, 0.0, 0},
                                                        {0.0001077, 12, 2.10, 0},
                                                        {0.3510, 8, 0.0, 1},
                                                        {-13.67, 1, 0.5, 2}};
  static constexpr helmholtz::term conductivity_terms[] = {
      {15.31, 1, 0.0, 0}, {8.898, 3, 0.0, 0},  {-0.7336, 4, 0.3, 0},
      {6.728, 5, 4.3, 2}, {-4.374, 7, 0.5, 2}, {-0.4747, 10, 1.8, 2}};
  static constexpr double of_viscosity = 1.036;
  static constexpr helmholtz::term dilute_terms[] = {{6.283, 0, -0.9, 0}, {-4.262, 0, -0.6, 0}};
  static constexpr double critical_pressure = 5.043e6;
  static constexpr double amplitude_nm = 0.24;
  static constexpr double cutoff_nm = 0.51;
};
struct argon_transport : argon_equation {
  static constexpr double energy_K = 143.2;  // eps/k of the collision integral
  static constexpr double dilute_viscosity = 0.0266958 * 6.320443022447082 / (0.335 * 0.335);
  static constexpr helmholtz::term viscosity_terms[] = {
      {12.19, 1, 0.42, 0}, {13.99, 2, 0.0, 0},  {0.005027, 10, 0.95, 0},
      {-18.93, 5, 0.5, 2}, {-6.698, 1, 0.9, 4}, {-3.827, 2, 0.8, 4}};
  static constexpr helmholtz::term conductivity_terms[] = {
      {13.73, 1, 0.0, 0}, {10.07, 2, 0.0, 0},  {0.7375, 4, 0.0, 0}, {-33.96, 5, 0.8, 2},
      {20.47, 6, 1.2, 2}, {-2.274, 9, 0.8, 2}, {-3.973, 1, 0.5, 4}};
  static constexpr double of_viscosity = 0.8158;
  static constexpr helmholtz::term dilute_terms[] = {{-0.4320, 0, -0.77, 0}};
  static constexpr double critical_pressure = 4.863e6;
  static constexpr double amplitude_nm = 0.13;
  static constexpr double cutoff_nm = 0.32;
};
struct air_transport : air_equation {
  static constexpr double energy_K = 103.3;  // eps/k of the collision integral
  static constexpr double dilute_viscosity = 0.0266958 * 5.381319540781796 / (0.360 * 0.360);
  static constexpr helmholtz::term viscosity_terms[] = {{10.72, 1, 0.2, 0},
                                                        {1.122, 4, 0.05, 0},
                                                        {0.002019, 9, 2.4, 0},
                                                        {-8.876, 1, 0.6, 1},
                                                        {-0.02916, 8, 3.6, 1}};
  static constexpr helmholtz::term conductivity_terms[] = {
      {8.743, 1, 0.1, 0}, {14.76, 2, 0.0, 0},  {-16.62, 3, 0.5, 2},
      {3.793, 7, 2.7, 2}, {-6.142, 7, 0.3, 2}, {-0.3778, 11, 1.3, 2}};
  static constexpr double of_viscosity = 1.308;
  static constexpr helmholtz::term dilute_terms[] = {{1.405, 0, -1.1, 0}, {-1.036, 0, -0.3, 0}};
  static constexpr double critical_pressure = 3.78502e6;
  static constexpr double amplitude_nm = 0.11;
  static constexpr double cutoff_nm = 0.31;
};

/// Viscosity in uPa s and conductivity in mW/(m K), without the critical enhancement.
template <class T>
struct background_transport {
  T viscosity;
  T conductivity;
};

namespace lemmon_jacobsen {
template <const auto& Terms, class T>
CONVELOPE_FUNCTION constexpr T sum(const T& delta, const helmholtz::powers<100, T>& tau,
                                   const helmholtz::dampings<T>& damped) {
  T total = scalar_adaptor<T>::constant(0.0);
  const auto one = [&]<std::size_t K>(std::integral_constant<std::size_t, K>) {
    T x = helmholtz::monomial<Terms, K>(delta, tau);
    if constexpr (Terms[K].l > 0) x = T(x * damped.factor[Terms[K].l - 1]);
    total = T(total + x);
  };
  [&]<std::size_t... K>(std::index_sequence<K...>) {
    (one(std::integral_constant<std::size_t, K>{}), ...);
  }(std::make_index_sequence<std::size(Terms)>{});
  return total;
}
}  // namespace lemmon_jacobsen

/// Density in mol/m3.
template <class Gas, class T>
CONVELOPE_FUNCTION constexpr background_transport<T> background(const T& rho,
                                                                const T& temperature_K,
                                                                const T& inverse) {
  const T delta = T(rho * (1.0 / Gas::reducing_density));
  const helmholtz::powers<100, T> tau(T(Gas::reducing_temperature * inverse),
                                      T(temperature_K * (1.0 / Gas::reducing_temperature)));
  const helmholtz::dampings<T> damped =
      helmholtz::dampings_of<Gas::viscosity_terms, Gas::conductivity_terms>(delta);
  const T dilute = T(Gas::dilute_viscosity *
                     root_over_collision(math::sqrt(temperature_K),
                                         math::log(T(temperature_K * (1.0 / Gas::energy_K)))));
  using lemmon_jacobsen::sum;
  return {T(dilute + sum<Gas::viscosity_terms>(delta, tau, damped)),
          T(Gas::of_viscosity * dilute + sum<Gas::dilute_terms>(delta, tau, damped) +
            sum<Gas::conductivity_terms>(delta, tau, damped))};
}

/// What density fluctuations add near the critical point, mW/(m K); viscosity in uPa s.
/// In double only: it sets in with an infinite slope, which no solver wants.
template <class Gas>
double critical_enhancement(double rho, double temperature_K, double mu) {
  constexpr double pi = 3.14159265358979323846;
  constexpr double boltzmann = 1.380658e-23;  // of the years of these equations
  const auto at = [&](double t) {
    const double inverse = 1.0 / t;
    return helmholtz::state_of<Gas>(rho, t, inverse, Gas::ideal_heat(t, inverse, std::sqrt(t)));
  };
  const double delta = rho / Gas::reducing_density;
  const double reference_K = 2.0 * Gas::reducing_temperature;
  // (pc rho/rhoc^2) (d rho/dp) at T, less that at twice the critical temperature
  const auto susceptibility = [&](double t) {
    return Gas::critical_pressure * delta /
           (Gas::reducing_density * Gas::gas_constant * t * at(t).stiffness);
  };
  const double excess =
      susceptibility(temperature_K) - susceptibility(reference_K) * reference_K / temperature_K;
  if (!(excess > 0.0)) return 0.0;
  const auto here = at(temperature_K);
  const double length = Gas::amplitude_nm * std::pow(excess / 0.055, 0.63 / 1.2415);
  const double x = length / Gas::cutoff_nm;
  const double cv_over_cp = here.cv_over_R / here.cp_over_R;
  const double omega = (1.0 - cv_over_cp) * std::atan(x) + cv_over_cp * x;
  const double omega_0 = 1.0 - std::exp(-1.0 / (1.0 / x + x * x / (3.0 * delta * delta)));
  return 1e3 * rho * Gas::gas_constant * here.cp_over_R * boltzmann * 1.01 * temperature_K /
         (6.0 * pi * length * 1e-9 * mu * 1e-6) * (2.0 / pi) * (omega - omega_0);
}

}  // namespace detail
}  // namespace v0
}  // namespace convelope

#endif
