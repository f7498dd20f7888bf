#ifndef CONVELOPE_FLUIDS_DETAIL_IF97_REGION5_HPP
#define CONVELOPE_FLUIDS_DETAIL_IF97_REGION5_HPP

#include "convelope/fluids/detail/if97_gibbs.hpp"

// IAPWS R7-97(2012), region 5: the Gibbs function of steam, 1073.15 .. 2273.15 K, up to 50 MPa,
// g/(R T) = ln(pi) + sum n0 tau^j0 + sum n pi^i tau^j, pi = p/1 MPa, tau = 1000 K/T.

namespace convelope {
inline namespace v0 {
namespace detail::if97 {

// Tables 37 and 38 of the release; the terms without pi are the ideal-gas part.
inline constexpr term region5_terms[] = {
    {0, 0, -0.13179983674201e2}, {0, 1, 0.68540841634434e1},   {0, -3, -0.24805148933466e-1},
    {0, -2, 0.36901534980333e0}, {0, -1, -0.31161318213925e1}, {0, 2, -0.32961626538917e0},
    {1, 1, 0.15736404855259e-2}, {1, 2, 0.90153761673944e-3},  {1, 3, -0.50270077677648e-2},
    {2, 3, 0.22440037409485e-5}, {2, 9, -0.41163275453471e-5}, {3, 7, 0.37919454822955e-7}};

template <class T>
CONVELOPE_FUNCTION constexpr state<T> region5_state(const T& temperature_K, const T& pressure_Pa) {
  const T pi = T(1e-6 * pressure_Pa);
  const T tau = T(1000.0 / temperature_K);
  const T tau2 = T(tau * tau);
  const T tau3 = T(tau2 * tau);
  const T tau4 = T(tau2 * tau2);
  const T c = T(1e-3 * temperature_K);
  const T pi2 = T(pi * pi);
  const T x[] = {T(1.0),
                 tau,
                 T(c * c * c),
                 T(c * c),
                 c,
                 tau2,
                 T(pi * tau),
                 T(pi * tau2),
                 T(pi * tau3),
                 T(pi2 * tau3),
                 T(pi2 * (tau4 * tau4 * tau)),
                 T(pi2 * pi * (tau4 * tau3))};
  gibbs<T> f{math::log(pi), T(1.0), T(0.0), T(-1.0), T(0.0), T(0.0)};
  for (std::size_t m = 0; m < 12; ++m) {
    const term& k = region5_terms[m];
    const T y = T(k.n * x[m]);
    f.g = T(f.g + y);
    f.p = T(f.p + by_pi::weight(k.i, k.j) * y);
    f.t = T(f.t + by_tau::weight(k.i, k.j) * y);
    f.pp = T(f.pp + by_pi_pi::weight(k.i, k.j) * y);
    f.pt = T(f.pt + by_pi_tau::weight(k.i, k.j) * y);
    f.tt = T(f.tt + by_tau_tau::weight(k.i, k.j) * y);
  }
  return state_of_gibbs<T>(f, temperature_K, pressure_Pa);
}

}  // namespace detail::if97
}  // namespace v0
}  // namespace convelope

#endif
