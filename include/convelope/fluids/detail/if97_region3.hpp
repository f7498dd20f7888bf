#ifndef CONVELOPE_FLUIDS_DETAIL_IF97_REGION3_HPP
#define CONVELOPE_FLUIDS_DETAIL_IF97_REGION3_HPP

#include "convelope/fluids/detail/if97_gibbs.hpp"

// IAPWS R7-97(2012), region 3: the Helmholtz function of water around its critical point,
// f/(R T) = n ln(delta) + sum n delta^i tau^j, delta = rho/322, tau = 647.096 K/T.
// For look-up, not for inner loops: the terms are summed as they stand in the release.

namespace convelope {
inline namespace v0 {
namespace detail::if97 {

// Table 30 of the release, in its order, without the logarithm.
inline constexpr term region3_terms[] = {
    {0, 0, -0.15732845290239e2},   {0, 1, 0.20944396974307e2},    {0, 2, -0.76867707878716e1},
    {0, 7, 0.26185947787954e1},    {0, 10, -0.28080781148620e1},  {0, 12, 0.12053369696517e1},
    {0, 23, -0.84566812812502e-2}, {1, 2, -0.12654315477714e1},   {1, 6, -0.11524407806681e1},
    {1, 15, 0.88521043984318e0},   {1, 17, -0.64207765181607e0},  {2, 0, 0.38493460186671e0},
    {2, 2, -0.85214708824206e0},   {2, 6, 0.48972281541877e1},    {2, 7, -0.30502617256965e1},
    {2, 22, 0.39420536879154e-1},  {2, 26, 0.12558408424308e0},   {3, 0, -0.27999329698710e0},
    {3, 2, 0.13899799569460e1},    {3, 4, -0.20189915023570e1},   {3, 16, -0.82147637173963e-2},
    {3, 26, -0.47596035734923e0},  {4, 0, 0.43984074473500e-1},   {4, 2, -0.44476435428739e0},
    {4, 4, 0.90572070719733e0},    {4, 26, 0.70522450087967e0},   {5, 1, 0.10770512626332e0},
    {5, 3, -0.32913623258954e0},   {5, 26, -0.50871062041158e0},  {6, 0, -0.22175400873096e-1},
    {6, 2, 0.94260751665092e-1},   {6, 26, 0.16436278447961e0},   {7, 2, -0.13503372241348e-1},
    {8, 26, -0.14834345352472e-1}, {9, 2, 0.57922953628084e-3},   {9, 26, 0.32308904703711e-2},
    {10, 0, 0.80964802996215e-4},  {10, 1, -0.16557679795037e-3}, {11, 26, -0.44923899061815e-4}};

/// x^0, x^1, ... by products.
template <std::size_t Count, class T>
CONVELOPE_FUNCTION constexpr std::array<T, Count> powers_of(const T& x) {
  std::array<T, Count> p{T(1.0), x};
  for (std::size_t i = 2; i < p.size(); ++i) p[i] = T(p[i / 2] * p[i - i / 2]);
  return p;
}

template <class T>
struct helmholtz_state {
  T pressure;
  T pressure_slope;  // (dp/drho)_T
  state<T> rest;
};

template <class T>
CONVELOPE_FUNCTION constexpr helmholtz_state<T> region3_state(const T& temperature_K,
                                                              const T& density) {
  constexpr double log_term = 0.10658070028513e1;
  const T delta = T(density * (1.0 / 322.0));
  const T tau = T(647.096 / temperature_K);
  const std::array<T, 12> d = powers_of<12>(delta);
  const std::array<T, 27> t = powers_of<27>(tau);
  // Derivatives times their variables.
  T f = T(log_term * math::log(delta));
  T f_d = T(log_term);
  T f_dd = T(-log_term);
  T f_t = T(0.0);
  T f_tt = T(0.0);
  T f_dt = T(0.0);
  for (const term& k : region3_terms) {
    const T x = T(k.n * d[static_cast<std::size_t>(k.i)] * t[static_cast<std::size_t>(k.j)]);
    f = T(f + x);
    f_d = T(f_d + by_pi::weight(k.i, k.j) * x);
    f_dd = T(f_dd + by_pi_pi::weight(k.i, k.j) * x);
    f_t = T(f_t + by_tau::weight(k.i, k.j) * x);
    f_tt = T(f_tt + by_tau_tau::weight(k.i, k.j) * x);
    f_dt = T(f_dt + by_pi_tau::weight(k.i, k.j) * x);
  }
  const T RT = T(gas_constant * temperature_K);
  const T stiffness = T(2.0 * f_d + f_dd);
  const T thermal = T(f_d - f_dt);
  const T pressure = T(density * RT * f_d);
  return {pressure,
          T(RT * stiffness),
          {T(1.0 / density), T(RT * (f_t + f_d)), T(RT * f_t), T(gas_constant * (f_t - f)),
           T(gas_constant * (thermal * thermal / stiffness - f_tt)), T(-gas_constant * f_tt),
           math::sqrt(T(RT * (stiffness - thermal * thermal / f_tt))),
           T(1.0 / (density * RT * stiffness))}};
}

}  // namespace detail::if97
}  // namespace v0
}  // namespace convelope

#endif
