#ifndef CONVELOPE_FLUIDS_DETAIL_IAPWS_CONDUCTIVITY_HPP
#define CONVELOPE_FLUIDS_DETAIL_IAPWS_CONDUCTIVITY_HPP

#include <cmath>

#include "convelope/fluids/detail/iapws_transport.hpp"
#include "convelope/fluids/detail/if97_region2.hpp"
#include "convelope/fluids/detail/if97_region3.hpp"
#include "convelope/fluids/detail/if97_region5.hpp"

// IAPWS R15-11: conductivity of water with its critical enhancement, on IAPWS-IF97 and with the
// viscosity's own critical factor left at 1, as its Tables 7 to 9 have it. For look-up, in double.

namespace convelope {
inline namespace v0 {
namespace detail::r15_11 {

/// What the enhancement needs of the equation of state.
struct near_critical {
  double density;
  double cp;
  double cv;
  double compressibility;
};
inline near_critical of_state(const if97::state<double>& s) {
  return {1.0 / s.volume, s.cp, s.cv, s.compressibility};
}

/// Table 6: coefficients of the reference compressibility, one row per range of rho/322.
inline constexpr double reference_ranges[] = {0.310559006, 0.776397516, 1.242236025, 1.863354037};
inline constexpr double reference_coefficients[][6] = {
    {6.53786807199516, -5.61149954923348, 3.39624167361325, -2.27492629730878, 10.2631854662709,
     1.97815050331519},
    {6.52717759281799, -6.30816983387575, 8.08379285492595, -9.82240510197603, 12.1358413791395,
     -5.54349664571295},
    {5.35500529896124, -3.96415689925446, 8.91990208918795, -12.0338729505790, 9.19494865194302,
     -2.16866274479712},
    {1.55225959906681, 0.464621290821181, 8.93237374861479, -11.0321960061126, 6.16780999933360,
     -0.965458722086812},
    {1.11999926419994, 0.595748562571649, 9.88952565078920, -10.3255051147040, 4.66861294457414,
     -0.503243546373828}};

inline double reference_compressibility(double r) {
  std::size_t j = 0;
  while (j < 4 && r > reference_ranges[j]) ++j;
  const double(&a)[6] = reference_coefficients[j];
  return 1.0 / (((((a[5] * r + a[4]) * r + a[3]) * r + a[2]) * r + a[1]) * r + a[0]);
}

/// W/(m K), to be added to the background.
inline double enhancement(double temperature_K, const near_critical& s, double viscosity) {
  const double r = s.density / 322.0;
  const double t = temperature_K / 647.096;
  const double zeta = r * s.compressibility * 22.064e6;
  const double excess = r * (zeta - reference_compressibility(r) * 1.5 / t);
  if (!(excess > 0.0)) return 0.0;
  const double y = 0.13 / 0.40 * std::pow(excess / 0.06, 0.630 / 1.239);
  if (y < 1.2e-7) return 0.0;
  const double ratio = s.cv / s.cp;
  const double z = 2.0 / (3.14159265358979324 * y) *
                   ((1.0 - ratio) * std::atan(y) + ratio * y -
                    (1.0 - std::exp(-1.0 / (1.0 / y + y * y / (3.0 * r * r)))));
  return 1e-3 * 177.8514 * r * (s.cp / 461.51805) * t / (1e6 * viscosity) * z;
}

inline double conductivity(double temperature_K, const near_critical& s) {
  const transport_values<double> w = water_transport(temperature_K, 1.0 / temperature_K, s.density);
  return w.conductivity + enhancement(temperature_K, s, w.viscosity);
}

}  // namespace detail::r15_11
}  // namespace v0
}  // namespace convelope

#endif
