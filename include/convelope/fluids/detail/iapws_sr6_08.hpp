#ifndef CONVELOPE_FLUIDS_DETAIL_IAPWS_SR6_08_HPP
#define CONVELOPE_FLUIDS_DETAIL_IAPWS_SR6_08_HPP

#include "convelope/scalar.hpp"

// IAPWS SR6-08(2011), after Patek et al., J. Phys. Chem. Ref. Data 38 (2009) 21-29: liquid water at
// 0.1 MPa. a = 10 K/(593 K - T), b = 10 K/(T - 232 K).

namespace convelope {
inline namespace v0 {
namespace detail::sr6_08 {

inline constexpr double gas_constant = 461.51805;  // J/(kg K), of the release
inline constexpr double unit_temperature = 10.0;
inline constexpr double unit_pressure = 1e5;

template <class T>
struct poles {
  T a, b;
  CONVELOPE_FUNCTION constexpr explicit poles(const T& temperature_K)
      : a(T(10.0 / (593.0 - temperature_K))), b(T(10.0 / (temperature_K - 232.0))) {}
};

// Each sum with weights n (n+1) ... of its derivative by temperature; Order 0, 1 or 2.
template <int Order>
CONVELOPE_FUNCTION constexpr double rising(int n) {
  return Order == 0 ? 1.0 : Order == 1 ? n : n * (n + 1);
}
/// x^Order
template <int Order, class T>
CONVELOPE_FUNCTION constexpr T raised(const T& x) {
  if constexpr (Order == 0) {
    return T(1.0);
  } else if constexpr (Order == 1) {
    return x;
  } else {
    return T(x * x);
  }
}

/// a and b sums of the Gibbs function at 0.1 MPa.
template <int Order, class T>
CONVELOPE_FUNCTION constexpr T gibbs_a(const T& a) {
  const T a2 = T(a * a);
  return T(raised<Order>(a) * (a2 * a2) *
           ((rising<Order>(7) * -1.557191544e8 * a2 + rising<Order>(5) * 2.708781640e6) * a +
            rising<Order>(4) * -1.661470539e5));
}
template <int Order, class T>
CONVELOPE_FUNCTION constexpr T gibbs_b(const T& b) {
  return T(raised<Order>(b) * (b * b) *
           (((rising<Order>(5) * 8.546361348e-1 * b + rising<Order>(4) * -2.017597384) * b +
             rising<Order>(3) * 1.908956353) *
                b +
            rising<Order>(2) * -8.237426256e-1));
}
/// a and b sums of the volume at 0.1 MPa.
template <int Order, class T>
CONVELOPE_FUNCTION constexpr T volume_a(const T& a) {
  const T a2 = T(a * a);
  return T(raised<Order>(a) * (a2 * a2) *
           ((((rising<Order>(9) * 8.32299658e9 * a + rising<Order>(8) * -1.63552118e9) * a +
              rising<Order>(7) * 1.00231247e8) *
                 a2 +
             rising<Order>(5) * -2.22521604e5) *
                a +
            rising<Order>(4) * 6.74458446e3));
}
template <int Order, class T>
CONVELOPE_FUNCTION constexpr T volume_b(const T& b) {
  return T(raised<Order>(b) * b *
           (((((rising<Order>(6) * -1.19946761e-2 * b + rising<Order>(5) * 3.38713507e-2) * b +
               rising<Order>(4) * -4.23546241e-2) *
                  b +
              rising<Order>(3) * 3.11337859e-2) *
                 b +
             rising<Order>(2) * -1.53195665e-2) *
                b +
            rising<Order>(1) * 5.78545292e-3));
}
/// a and b sums of the volume's slope on pressure.
template <int Order, class T>
CONVELOPE_FUNCTION constexpr T slope_a(const T& a) {
  const T a2 = T(a * a);
  return T(raised<Order>(a) * a *
           ((((rising<Order>(7) * 1.2037414e3 * a + rising<Order>(6) * -2.0457795e2) * a +
              rising<Order>(5) * 1.0627293e1) *
                 a2 +
             rising<Order>(3) * -1.3767418e-2) *
                a2 +
            rising<Order>(1) * -7.5245878e-6));
}
template <int Order, class T>
CONVELOPE_FUNCTION constexpr T slope_b(const T& b) {
  const T b2 = T(b * b);
  return T(raised<Order>(b) * b *
           ((((((rising<Order>(9) * -4.8510101e-5 * b2 + rising<Order>(7) * 2.3403117e-4) * b +
                rising<Order>(6) * -3.9034594e-4) *
                   b +
               rising<Order>(5) * 3.0410453e-4) *
                  b +
              rising<Order>(4) * -1.3112763e-4) *
                 b +
             rising<Order>(3) * 2.8964919e-5) *
                b2 +
            rising<Order>(1) * -3.1091470e-6));
}

inline constexpr double volume_unit = gas_constant * unit_temperature / unit_pressure;

template <class T>
CONVELOPE_FUNCTION constexpr T volume(const poles<T>& x) {
  return T(volume_unit * (1.93763157e-2 + volume_a<0>(x.a) + volume_b<0>(x.b)));
}
template <class T>
CONVELOPE_FUNCTION constexpr T volume_T(const poles<T>& x) {
  return T((volume_unit / unit_temperature) * (volume_a<1>(x.a) - volume_b<1>(x.b)));
}
template <class T>
CONVELOPE_FUNCTION constexpr T volume_TT(const poles<T>& x) {
  return T((volume_unit / (unit_temperature * unit_temperature)) *
           (volume_a<2>(x.a) + volume_b<2>(x.b)));
}
template <class T>
CONVELOPE_FUNCTION constexpr T volume_p(const poles<T>& x) {
  return T((volume_unit / unit_pressure) * (slope_a<0>(x.a) + slope_b<0>(x.b)));
}
template <class T>
CONVELOPE_FUNCTION constexpr T volume_pT(const poles<T>& x) {
  return T((volume_unit / (unit_pressure * unit_temperature)) *
           (slope_a<1>(x.a) - slope_b<1>(x.b)));
}

inline constexpr double gibbs_1 = -2.452093414e2;
inline constexpr double gibbs_2 = 3.869269598e1;
inline constexpr double gibbs_3 = -8.983025854;

template <class T>
CONVELOPE_FUNCTION constexpr T specific_heat(const T& temperature_K, const poles<T>& x) {
  return T(-gas_constant * (gibbs_3 + (1.0 / unit_temperature) * temperature_K *
                                          (gibbs_a<2>(x.a) + gibbs_b<2>(x.b))));
}
/// J/kg
template <class T>
CONVELOPE_FUNCTION constexpr T gibbs_energy(const T& temperature_K) {
  const poles<T> x(temperature_K);
  const T tau = T((1.0 / unit_temperature) * temperature_K);
  return T(
      gas_constant * unit_temperature *
      (gibbs_1 + tau * (gibbs_2 + gibbs_3 * math::log(tau)) + gibbs_a<0>(x.a) + gibbs_b<0>(x.b)));
}
template <class T>
CONVELOPE_FUNCTION constexpr T entropy(const T& temperature_K) {
  const poles<T> x(temperature_K);
  const T tau = T((1.0 / unit_temperature) * temperature_K);
  return T(-gas_constant *
           (gibbs_2 + gibbs_3 * (1.0 + math::log(tau)) + gibbs_a<1>(x.a) - gibbs_b<1>(x.b)));
}
template <class T>
CONVELOPE_FUNCTION constexpr T sound_speed(const T& temperature_K) {
  const poles<T> x(temperature_K);
  const T v_T = volume_T(x);
  return T(volume(x) * math::sqrt(T(-1.0 / (volume_p(x) + temperature_K * v_T * v_T /
                                                              specific_heat(temperature_K, x)))));
}

template <class T>
struct transport {
  T viscosity;     // Pa s, 253.15 .. 383.15 K
  T conductivity;  // W/(m K), 273.15 .. 383.15 K
};

/// Equations of powers of T/300 K, all made of one log, one exp and products.
template <class T>
CONVELOPE_FUNCTION constexpr transport<T> transport_at(const T& temperature_K) {
  const T y = math::exp(T(-0.05 * math::log(T(temperature_K * (1.0 / 300.0)))));
  const T y2 = T(y * y);
  const T y4 = T(y2 * y2);
  const T y8 = T(y4 * y4);
  const T r = T(300.0 / temperature_K);
  const T r3 = T(r * r * r);
  const T r6 = T(r3 * r3);
  const T r7 = T(r6 * r);
  const T r19 = T(r6 * r6 * r7);
  const T y12 = T(y8 * y4);
  const T power_7_6 = T(r7 * y12);
  return {T(1e-6 * (280.68 * r * y8 * y8 * y2 + 511.45 * power_7_6 * y2 + 61.131 * r19 * y12 +
                    0.45903 * r19 * r19 * r * r)),
          T(1.6630 * r * y2 * y - 1.7781 * r3 * y8 + 1.1567 * r6 - 0.432115 * power_7_6)};
}

}  // namespace detail::sr6_08
}  // namespace v0
}  // namespace convelope

#endif
