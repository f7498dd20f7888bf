#ifndef CONVELOPE_FLUIDS_DETAIL_WITHIN_LIMITS_HPP
#define CONVELOPE_FLUIDS_DETAIL_WITHIN_LIMITS_HPP

#include "convelope/fluids/fluid.hpp"

namespace convelope {
inline namespace v0 {
namespace detail {

/// The bits of a fluid's first two limits, on T and on p.
template <const auto& Limits, class T>
CONVELOPE_FUNCTION constexpr bits_t<T> within_limits(const T& temperature_K, const T& pressure_Pa) {
  using adaptor = scalar_adaptor<T>;
  constexpr auto limits = constants_of(Limits);
  return bits_t<T>(fluid_limit(0, temperature_K, adaptor::constant(limits[0].low),
                               adaptor::constant(limits[0].high)) |
                   fluid_limit(1, pressure_Pa, adaptor::constant(limits[1].low),
                               adaptor::constant(limits[1].high)));
}

/// x itself between low and high, else the nearer of them; NaN becomes low.
template <class T>
CONVELOPE_FUNCTION constexpr T held_between(const T& x, double low, double high) {
  const T least = scalar_adaptor<T>::constant(low);
  const T most = scalar_adaptor<T>::constant(high);
  const T above = math::select(x >= least, x, least);
  return math::select(above <= most, above, most);
}

}  // namespace detail
}  // namespace v0
}  // namespace convelope

#endif
