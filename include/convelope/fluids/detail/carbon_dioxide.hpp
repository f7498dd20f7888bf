#ifndef CONVELOPE_FLUIDS_DETAIL_CARBON_DIOXIDE_HPP
#define CONVELOPE_FLUIDS_DETAIL_CARBON_DIOXIDE_HPP

#include "convelope/fluids/detail/dilute_gas.hpp"
#include "convelope/fluids/detail/helmholtz.hpp"

namespace convelope {
inline namespace v0 {

namespace detail::co2 {

inline constexpr double molar_mass = 44.0098e-3;  // kg/mol
inline constexpr double gas_constant = 8.31451;   // J/(mol K)

/// cp/R of the ideal gas: Span, Wagner, J. Phys. Chem. Ref. Data 25 (1996) 1509-1596, eq. 2.4.
template <class T>
CONVELOPE_FUNCTION constexpr T ideal_heat(const T& inverse) {
  const T tau = T(304.1282 * inverse);
  return T(3.5 + 1.99427042 * einstein(T(3.15163 * tau)) + 0.62105248 * einstein(T(6.11190 * tau)) +
           0.41195293 * einstein(T(6.77708 * tau)) + 1.04028922 * einstein(T(11.32384 * tau)) +
           0.08327678 * einstein(T(27.08792 * tau)));
}

// The same paper, the terms of table 31 that are linear in density.
inline constexpr helmholtz::term linear_terms[] = {
    {0.38856823203161, 1, 0, 0},  {2.9385475942740, 1, 0.75, 0}, {-5.5867188534934, 1, 1, 0},
    {-0.76753199592477, 1, 2, 0}, {2.1658961543220, 1, 1.5, 1},  {-0.37055685270086, 1, 3, 2},
    {-0.016775879700426, 1, 6, 2}};

/// m3/mol. The terms near the critical point are left out: at zero density they are below 1e-5.
template <class T>
CONVELOPE_FUNCTION constexpr helmholtz::second_virial<T> virial(const T& temperature_K,
                                                                const T& inverse) {
  const helmholtz::second_virial<T> v = helmholtz::virial<linear_terms, 4>(
      T(304.1282 * inverse), T(temperature_K * (1.0 / 304.1282)));
  constexpr double volume = molar_mass / 467.6;
  return {T(volume * v.b), T(volume * v.b1), T(volume * v.b2)};
}

/// Laesecke, Muzny, J. Phys. Chem. Ref. Data 46 (2017) 013107: uPa s at zero density.
template <class T>
CONVELOPE_FUNCTION constexpr T dilute_viscosity(const T& root) {
  const T sixth = math::cbrt(root);
  const T third = T(sixth * sixth);
  const T below = T(1749.354893188350 - 369.069300007128 * sixth +
                    5423856.34887691 * math::exp(T(-2.21283852168356 * third)) +
                    (73145.021531826 * third - 269503.247933569) * math::exp(T(-third)) +
                    5.34368649509278 * root);
  return T(1005.5 * root / below);
}

/// The same paper: the factor of viscosity in 1 + B rho, m3/kg.
template <class T>
CONVELOPE_FUNCTION constexpr T viscosity_virial(const T& inverse) {
  constexpr double volume = 6.02214129e23 * 0.378421e-9 * 0.378421e-9 * 0.378421e-9 / 44.0095e-3;
  const T x = T(200.760 * inverse);
  const T q = math::sqrt(math::sqrt(x));
  const T low =
      T((((((-787.26086 * q + 2491.6597) * q - 3375.1717) * q + 2471.0125) * q - 1015.3226) * q +
         219.73999) *
            q -
        19.572881);
  const T x2 = T(x * x);
  const T q10 = T(x2 * q * q);
  return T(volume * (low + q10 * (14.085455 - 0.34664158 * (x2 * x))));
}

/// The same paper: the part of higher order in density, uPa s; from the liquid, so at small
/// densities it hardly counts.
template <class T>
CONVELOPE_FUNCTION constexpr T dense_viscosity(const T& rho, const T& temperature_K) {
  const T t = T(temperature_K * (1.0 / 216.592));
  const T r = T(rho * (1.0 / 1178.53));
  const T r2 = T(r * r);
  // log(0) must not arise at zero density
  const T least = scalar_adaptor<T>::constant(1e-30);
  const T steep = math::exp(T(8.06282737481277 * math::log(math::larger(r, least))));
  return T(94.36 * (0.360603235428487 * t * r2 * r + (r2 + steep) / (t - 0.121550806591497)));
}

/// Fenghour, Wakeham, Vesovic, J. Phys. Chem. Ref. Data 27 (1998) 31-44: uPa s, without the
/// critical enhancement.
template <class T>
CONVELOPE_FUNCTION constexpr T viscosity_1998(const T& rho, const T& temperature_K) {
  const T t = T(temperature_K * (1.0 / 251.196));
  const T x = math::log(t);
  const T collision =
      T((((-1.537102e-2 * x + 5.347906e-2) * x + 5.211155e-2) * x - 0.491266) * x + 0.235156);
  const T r2 = T(rho * rho);
  const T r6 = T(r2 * r2 * r2);
  const T inverse = T(1.0 / t);
  return T(1.00697 * math::sqrt(temperature_K) * math::exp(T(-collision)) + 0.4071119e-2 * rho +
           0.7198037e-4 * r2 + 0.2411697e-16 * r6 * (inverse * inverse * inverse) +
           r6 * r2 * (0.2971072e-22 - 0.1627888e-22 * inverse));
}

/// Huber, Sykioti, Assael, Perkins, J. Phys. Chem. Ref. Data 45 (2016) 013102: W/(m K), without
/// the critical enhancement.
template <class T>
CONVELOPE_FUNCTION constexpr T conductivity(const T& rho, const T& temperature_K, const T& inverse,
                                            const T& root) {
  const T t = T(temperature_K * (1.0 / 304.1282));
  const T x = T(304.1282 * inverse);
  const T below = T(((-7.41624210e-3 * x + 2.28564190e-2) * x + 2.80674040e-2) * x + 1.51874307e-2);
  const T r = T(rho * (1.0 / 467.6));
  const T c1 = T(4.30829e-3 * t + 1.00128e-2);
  const T c2 = T(-3.58563e-2 * t + 5.60488e-2);
  const T c3 = T(6.71480e-2 * t - 8.11620e-2);
  const T c4 = T(-5.22855e-2 * t + 6.24337e-2);
  const T c5 = T(1.74571e-2 * t - 2.06336e-2);
  const T c6 = T(-1.96414e-3 * t + 2.53248e-3);
  return T((1e-3 / 17.439271773786885) * root / below +
           (((((c6 * r + c5) * r + c4) * r + c3) * r + c2) * r + c1) * r);
}

}  // namespace detail::co2

}  // namespace v0
}  // namespace convelope

#endif
