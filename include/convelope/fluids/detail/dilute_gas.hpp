#ifndef CONVELOPE_FLUIDS_DETAIL_DILUTE_GAS_HPP
#define CONVELOPE_FLUIDS_DETAIL_DILUTE_GAS_HPP

#include "convelope/fluids/fluid.hpp"

namespace convelope {
inline namespace v0 {
namespace detail {

/// Einstein's u^2 e^u / (e^u - 1)^2, with e^-u so that a cold gas can't overflow it.
template <class T>
CONVELOPE_FUNCTION constexpr T einstein(const T& u) {
  const T e = math::exp(T(-u));
  const T ratio = T(u / (1.0 - e));
  return T(ratio * ratio * e);
}

/// Two electronic states w apart, the upper with 2/3 of the lower's weight (of O2):
/// w^2 e / (1 + e)^2, e = (2/3) e^-w.
template <class T>
CONVELOPE_FUNCTION constexpr T two_level(const T& w) {
  const T e = T((2.0 / 3.0) * math::exp(T(-w)));
  const T ratio = T(w / (e + 1.0));
  return T(ratio * ratio * e);
}

/// sqrt(T)/Omega of Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21-69; x = log T*.
/// The dilute gas has 0.0266958 sqrt(M)/sigma^2 uPa s of it, M in g/mol, sigma in nm.
template <class T>
CONVELOPE_FUNCTION constexpr T root_over_collision(const T& root, const T& x) {
  const T collision = T(((((0.00331 * x - 0.005341) * x - 0.08406) * x + 0.4623) * x) - 0.431);
  return T(root * math::exp(collision));
}

/// What gases share: their two limits are T and p.
template <const fluid_info& Info>
struct gas {
  static constexpr expansion_rule expansion_at = expansion_rule::ambient;

  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    constexpr limit_info on_T = Info.limits[0];
    constexpr limit_info on_p = Info.limits[1];
    return bits_t<T>(fluid_limit(0, temperature_K, scalar_adaptor<T>::constant(on_T.low),
                                 scalar_adaptor<T>::constant(on_T.high)) |
                     fluid_limit(1, pressure_Pa, scalar_adaptor<T>::constant(on_p.low),
                                 scalar_adaptor<T>::constant(on_p.high)));
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &Info; }
};

}  // namespace detail
}  // namespace v0
}  // namespace convelope

#endif
