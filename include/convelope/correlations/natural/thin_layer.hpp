#ifndef CONVELOPE_CORRELATIONS_NATURAL_THIN_LAYER_HPP
#define CONVELOPE_CORRELATIONS_NATURAL_THIN_LAYER_HPP

#include "convelope/estimate/correlation.hpp"

// Parts that the formulas of natural convection share.

namespace convelope {
inline namespace v0 {
namespace detail::thin_layer {

/// 1 + (c/Pr)^(9/16): Churchill and Usagi's passage from low to high Prandtl numbers.
template <class T>
CONVELOPE_FUNCTION constexpr T prandtl_bracket(double c, const T& Pr) {
  return T(1.0 + math::power<9, 16>(c) * math::power<-9, 16>(Pr));
}

/// C_l of Raithby and Hollands: 0.671 / [1 + (0.492/Pr)^(9/16)]^(4/9).
template <class T>
CONVELOPE_FUNCTION constexpr T laminar_coefficient(const T& Pr) {
  return T(0.671 * math::power<-4, 9>(prandtl_bracket(0.492, Pr)));
}

/// c/ln(1 + c/Nu): a thin-layer value made good for a thick layer.
template <class T>
CONVELOPE_FUNCTION constexpr T thickened(const T& c, const T& Nu) {
  return T(c / math::log(T(1.0 + c / Nu)));
}

}  // namespace detail::thin_layer
}  // namespace v0
}  // namespace convelope

#endif
