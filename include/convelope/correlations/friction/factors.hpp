#ifndef CONVELOPE_CORRELATIONS_FRICTION_FACTORS_HPP
#define CONVELOPE_CORRELATIONS_FRICTION_FACTORS_HPP

#include "convelope/estimate/estimate.hpp"
#include "convelope/kinds/numbers.hpp"

namespace convelope {
inline namespace v0 {
namespace friction {

// Darcy: dp = f_D (L/Dh) rho u^2/2. Fanning: f_F = tau_w/(rho u^2/2) = f_D/4. The two kinds don't
// mix; these are the only way across. Typed numbers or estimates; an estimate keeps its verdict.

template <measures<kinds::fanning_friction> Factor>
CONVELOPE_FUNCTION constexpr auto to_darcy(const Factor& f) {
  using T = typename Factor::value_type;
  return detail::carried<kinds::darcy_friction, T>(T(f.si() * scalar_adaptor<T>::constant(4.0)), f);
}

template <measures<kinds::darcy_friction> Factor>
CONVELOPE_FUNCTION constexpr auto to_fanning(const Factor& f) {
  using T = typename Factor::value_type;
  return detail::carried<kinds::fanning_friction, T>(T(f.si() * scalar_adaptor<T>::constant(0.25)),
                                                     f);
}

}  // namespace friction
}  // namespace v0
}  // namespace convelope

#endif
