#ifndef CONVELOPE_GROUPS_FILM_HPP
#define CONVELOPE_GROUPS_FILM_HPP

#include "convelope/groups/forced.hpp"

// Between film coefficients, Nusselt numbers and heat flux.

namespace convelope {
inline namespace v0 {

namespace kinds {
/// A Nusselt number or friction factor that a property ratio has brought from constant properties
/// to those before a hot or cold wall: groups/property_ratio.hpp. Another kind, so that no second
/// ratio fits.
template <class K>
struct corrected : K {
  using uncorrected = K;
};
}  // namespace kinds

namespace detail {
template <class A, class Number>
constexpr bool is_plain_or_corrected =
    is_of_kind<A, Number> || is_of_kind<A, kinds::corrected<Number>>;

// What a film coefficient of kind H is made from: a quantity, or a Nusselt number, a conductivity
// and the length the Nusselt number is based on.
template <class H, template <class> class Nu, class... A>
constexpr bool makes_film = false;
template <class H, template <class> class Nu, class T>
constexpr bool makes_film<H, Nu, boost::units::quantity<typename H::unit_type, T>> = true;
template <class H, template <class> class Nu, class Number, class K, class L>
  requires(is_length<L>)
constexpr bool makes_film<H, Nu, Number, K, L> =
    is_plain_or_corrected<Number, Nu<typename L::kind_type>> && is_of_kind<K, kinds::conductivity>;

// One call operator, so that a compiler's complaint lists one candidate.
template <class H, template <class> class Nu>
struct film_gate {
  using kind_type = H;

  template <class... A>
    requires(makes_film<H, Nu, A...>)
  CONVELOPE_FUNCTION constexpr auto operator()(const A&... a) const {
    if constexpr (sizeof...(A) == 1) {
      return gate<H>{}(a...);
    } else {
      return from_nusselt(a...);
    }
  }

 private:
  template <class Number, class K, class L>
  CONVELOPE_FUNCTION static constexpr auto from_nusselt(const Number& nu, const K& k, const L& l) {
    using T = number_type<Number, K, L>;
    return carried<H, T>(T(T(nu.si()) * k.si() / l.si()), nu, k, l);  // h = Nu k / L
  }
};
}  // namespace detail

/// film_coefficient(25.0 * watt_per_square_metre_kelvin) or film_coefficient(Nu, k, L).
inline constexpr detail::film_gate<kinds::film_coefficient, kinds::nusselt> film_coefficient{};
/// The same at one station along the wall, from a local Nusselt number.
inline constexpr detail::film_gate<kinds::local_film_coefficient, kinds::local_nusselt>
    local_film_coefficient{};

/// Nu = h L / k.
template <class H, class L, class K>
  requires(detail::is_of_kind<H, kinds::film_coefficient> && detail::is_length<L> &&
           detail::is_of_kind<K, kinds::conductivity>)
CONVELOPE_FUNCTION constexpr auto nusselt(const H& h, const L& l, const K& k) {
  using T = detail::number_type<H, L, K>;
  return detail::carried<kinds::nusselt<typename L::kind_type>, T>(T(T(h.si()) * l.si() / k.si()),
                                                                   h, l, k);
}

/// St = Nu / (Re Pr), Nu and Re on the same length.
template <class Number, class R, class P>
  requires(detail::is_a_reynolds<R> && detail::is_of_kind<P, kinds::prandtl> &&
           detail::is_plain_or_corrected<Number, kinds::nusselt<detail::length_behind<R>>>)
CONVELOPE_FUNCTION constexpr auto stanton(const Number& Nu, const R& Re, const P& Pr) {
  using T = detail::number_type<Number, R, P>;
  return detail::carried<kinds::stanton<detail::length_behind<R>>, T>(
      T(T(Nu.si()) / (T(Re.si()) * Pr.si())), Nu, Re, Pr);
}

/// Bi = h L / k_solid.
template <class H, class L, class K>
  requires(detail::is_of_kind<H, kinds::film_coefficient> && detail::is_length<L> &&
           detail::is_of_kind<K, kinds::conductivity>)
CONVELOPE_FUNCTION constexpr auto biot(const H& h, const L& l, const K& k_solid) {
  using T = detail::number_type<H, L, K>;
  return detail::carried<kinds::biot<typename L::kind_type>, T>(
      T(T(h.si()) * l.si() / k_solid.si()), h, l, k_solid);
}

namespace detail {
template <class A>
constexpr bool is_film =
    is_of_kind<A, kinds::film_coefficient> || is_of_kind<A, kinds::local_film_coefficient>;
}  // namespace detail

/// q = h (T_wall - T_stream), mean or local.
template <class H, class D>
  requires(detail::is_film<H> && detail::is_of_kind<D, kinds::temperature_difference>)
CONVELOPE_FUNCTION constexpr auto heat_flux_of(const H& h, const D& dT) {
  using T = detail::number_type<H, D>;
  return detail::carried<kinds::heat_flux, T>(T(T(h.si()) * dT.si()), h, dT);
}

}  // namespace v0
}  // namespace convelope

#endif
