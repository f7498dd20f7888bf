#ifndef CONVELOPE_FLUIDS_DETAIL_IF97_GIBBS_HPP
#define CONVELOPE_FLUIDS_DETAIL_IF97_GIBBS_HPP

#include "convelope/fluids/detail/if97_region1.hpp"
#include "convelope/scalar.hpp"

// IAPWS R7-97(2012): what the regions in pressure and temperature share, all quantities of
// region 1, and its backward equation T(p, h).

namespace convelope {
inline namespace v0 {
namespace detail::if97 {

/// A Gibbs function g/(R T) and its derivatives, each times the variables it is taken by.
template <class T>
struct gibbs {
  T g;
  T p;   // pi gamma_pi
  T t;   // tau gamma_tau
  T pp;  // pi^2 gamma_pipi
  T pt;  // pi tau gamma_pitau
  T tt;  // tau^2 gamma_tautau
};

/// SI units.
template <class T>
struct state {
  T volume;
  T enthalpy;
  T energy;
  T entropy;
  T cp;
  T cv;
  T sound_speed;
  T compressibility;  // -(1/v)(dv/dp)_T
};

/// Tables 3 and 12 of the release.
template <class T>
CONVELOPE_FUNCTION constexpr state<T> state_of_gibbs(const gibbs<T>& f, const T& temperature_K,
                                                     const T& pressure_Pa) {
  const T RT = T(gas_constant * temperature_K);
  const T thermal = T(f.p - f.pt);
  return {T(RT * f.p / pressure_Pa),
          T(RT * f.t),
          T(RT * (f.t - f.p)),
          T(gas_constant * (f.t - f.g)),
          T(-gas_constant * f.tt),
          T(gas_constant * (thermal * thermal / f.pp - f.tt)),
          math::sqrt(T(RT * f.p * f.p / (thermal * thermal / f.tt - f.pp))),
          T(-f.pp / (f.p * pressure_Pa))};
}

struct plain_sum {
  static constexpr double weight(int, int) { return 1.0; }
};
struct by_pi_pi {
  static constexpr double weight(int i, int) { return i * (i - 1); }
};
struct by_tau {
  static constexpr double weight(int, int j) { return j; }
};

/// sum of weight n b^j over the terms with i = 0.
template <class Derivative, class T>
CONVELOPE_FUNCTION constexpr T region1_first(const region1_powers<T>& w) {
  constexpr const auto& k = region1_coefficients<Derivative>;
  return T(k[1] * w.c2 + k[2] * w.c + k[3] + k[4] * w.b + k[5] * w.b2 + k[6] * w.b3 +
           (k[7] + k[8] * w.b) * (w.b2 * w.b2));
}

template <class T>
CONVELOPE_FUNCTION constexpr state<T> region1_state(const T& temperature_K, const T& pressure_Pa) {
  const T tau = T(1386.0 / temperature_K);
  const T pi = T(pressure_Pa * (1.0 / 16.53e6));
  const region1_powers<T> w(pi, tau);
  const T ratio = T(tau * w.c);
  const T by_a = T(pi / w.a);
  return state_of_gibbs<T>(
      {T(region1_first<plain_sum>(w) + w.a * region1_sum<plain_sum>(w)),
       T(-pi * region1_sum<by_pi>(w)),
       T(ratio * (region1_first<by_tau>(w) + w.a * region1_sum<by_tau>(w))),
       T(pi * by_a * region1_sum<by_pi_pi>(w)), T(-pi * ratio * region1_sum<by_pi_tau>(w)),
       T(ratio * ratio * region1_tau_tau(w))},
      temperature_K, pressure_Pa);
}

/// Temperature of the liquid from pressure and enthalpy: Table 6, within 25 mK of region 1.
template <class T>
CONVELOPE_FUNCTION constexpr T region1_temperature(const T& pressure_Pa, const T& enthalpy_J_kg) {
  const T p = T(1e-6 * pressure_Pa);
  const T x = T(enthalpy_J_kg * (1.0 / 2500e3) + 1.0);
  const T x2 = T(x * x);
  const T x4 = T(x2 * x2);
  const T x6 = T(x4 * x2);
  const T x10 = T(x6 * x4);
  const T x22 = T(x10 * x10 * x2);
  const T x32 = T(x22 * x10);
  const T of0 = T(-0.23872489924521e3 + 0.40421188637945e3 * x + 0.11349746881718e3 * x2 -
                  0.58457616048039e1 * x6 - 0.15285482413140e-3 * x22 - 0.10866707695377e-5 * x32);
  const T of1 = T((((-0.65964749423638e1 * x + 0.30535892203916e2) * x - 0.54010067170506e2) * x +
                   0.43211039183559e2) *
                      x -
                  0.13391744872602e2 + 0.93965400878363e-2 * x10 + 0.11573647505340e-6 * x32);
  const T of2 = T(-0.25858641282073e-4 * x10 - 0.40644363084799e-8 * x32);
  const T of3 = T(0.66456186191635e-7 * x10 + 0.80670734103027e-10 * x32);
  const T above =
      T(((-0.15020185953503e-16 * p + 0.58265442020601e-14) * p - 0.93477771213947e-12) * x32);
  return T((((above * p + of3) * p + of2) * p + of1) * p + of0);
}

}  // namespace detail::if97
}  // namespace v0
}  // namespace convelope

#endif
