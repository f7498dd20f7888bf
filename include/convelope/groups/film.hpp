#ifndef CONVELOPE_GROUPS_FILM_HPP
#define CONVELOPE_GROUPS_FILM_HPP

#include "convelope/groups/forced.hpp"

// Between film coefficients, Nusselt numbers and heat flux.

namespace convelope {
inline namespace v0 {

namespace detail {
// The gate of a film coefficient, which also makes one from a Nusselt number on the same length.
template <class H, template <class> class Nu>
struct film_gate : gate<H> {
  using gate<H>::operator();

  /// h = Nu k / L.
  template <class Number, measures<kinds::conductivity> K, measures_a_length L>
    requires measures<Number, Nu<typename L::kind_type>>
  CONVELOPE_FUNCTION constexpr auto operator()(const Number& nu, const K& k, const L& l) const {
    using T = number_type<Number, K, L>;
    return carried<H, T>(T(T(nu.si()) * k.si() / l.si()), nu, k, l);
  }
};
}  // namespace detail

/// film_coefficient(25.0 * watt_per_square_metre_kelvin) or film_coefficient(Nu, k, L).
inline constexpr detail::film_gate<kinds::film_coefficient, kinds::nusselt> film_coefficient{};
/// The same at one station along the wall, from a local Nusselt number.
inline constexpr detail::film_gate<kinds::local_film_coefficient, kinds::local_nusselt>
    local_film_coefficient{};

/// Nu = h L / k.
template <measures<kinds::film_coefficient> H, measures_a_length L,
          measures<kinds::conductivity> K>
CONVELOPE_FUNCTION constexpr auto nusselt(const H& h, const L& l, const K& k) {
  using T = detail::number_type<H, L, K>;
  return detail::carried<kinds::nusselt<typename L::kind_type>, T>(
      T(T(h.si()) * l.si() / k.si()), h, l, k);
}

/// St = Nu / (Re Pr), Nu and Re on the same length.
template <has_kind Number, measures_a_reynolds R, measures<kinds::prandtl> P>
  requires measures<Number, kinds::nusselt<detail::length_behind<R>>>
CONVELOPE_FUNCTION constexpr auto stanton(const Number& Nu, const R& Re, const P& Pr) {
  using T = detail::number_type<Number, R, P>;
  return detail::carried<kinds::stanton<detail::length_behind<R>>, T>(
      T(T(Nu.si()) / (T(Re.si()) * Pr.si())), Nu, Re, Pr);
}

/// Bi = h L / k_solid.
template <measures<kinds::film_coefficient> H, measures_a_length L,
          measures<kinds::conductivity> K>
CONVELOPE_FUNCTION constexpr auto biot(const H& h, const L& l, const K& k_solid) {
  using T = detail::number_type<H, L, K>;
  return detail::carried<kinds::biot<typename L::kind_type>, T>(
      T(T(h.si()) * l.si() / k_solid.si()), h, l, k_solid);
}

/// q = h (T_wall - T_stream), mean or local.
template <class H, measures<kinds::temperature_difference> D>
  requires measures<H, kinds::film_coefficient> || measures<H, kinds::local_film_coefficient>
CONVELOPE_FUNCTION constexpr auto heat_flux_of(const H& h, const D& dT) {
  using T = detail::number_type<H, D>;
  return detail::carried<kinds::heat_flux, T>(T(T(h.si()) * dT.si()), h, dT);
}

}  // namespace v0
}  // namespace convelope

#endif
