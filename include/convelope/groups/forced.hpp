#ifndef CONVELOPE_GROUPS_FORCED_HPP
#define CONVELOPE_GROUPS_FORCED_HPP

#include "convelope/estimate/estimate.hpp"
#include "convelope/kinds/kinds.hpp"

// Groups of forced flow. Arguments are typed numbers or estimates; the result's kind follows from
// theirs, and an estimate in gives an estimate out.

namespace convelope {
inline namespace v0 {

/// Re = rho u L / mu, on the length and the velocity station handed in.
template <measures<kinds::density> R, measures_a_velocity U, measures_a_length L,
          measures<kinds::viscosity> M>
CONVELOPE_FUNCTION constexpr auto reynolds(const R& rho, const U& u, const L& l, const M& mu) {
  using T = detail::number_type<R, U, L, M>;
  using K = kinds::reynolds<typename L::kind_type, typename U::kind_type>;
  return detail::carried<K, T>(T(T(rho.si()) * u.si() * l.si() / mu.si()), rho, u, l, mu);
}
/// Re = u L / nu.
template <measures_a_velocity U, measures_a_length L, measures<kinds::kinematic_viscosity> Nu>
CONVELOPE_FUNCTION constexpr auto reynolds(const U& u, const L& l, const Nu& nu) {
  using T = detail::number_type<U, L, Nu>;
  using K = kinds::reynolds<typename L::kind_type, typename U::kind_type>;
  return detail::carried<K, T>(T(T(u.si()) * l.si() / nu.si()), u, l, nu);
}

/// Pr = cp mu / k.
template <measures<kinds::specific_heat> C, measures<kinds::viscosity> M,
          measures<kinds::conductivity> K>
CONVELOPE_FUNCTION constexpr auto prandtl(const C& cp, const M& mu, const K& k) {
  using T = detail::number_type<C, M, K>;
  return detail::carried<kinds::prandtl, T>(T(T(cp.si()) * mu.si() / k.si()), cp, mu, k);
}

namespace detail {
template <class A>
constexpr bool is_reynolds = false;
template <class L, class V>
constexpr bool is_reynolds<kinds::reynolds<L, V>> = true;
template <class K>
struct length_of;
template <class L, class V>
struct length_of<kinds::reynolds<L, V>> {
  using type = L;
};
template <template <class> class G, class L>
struct length_of<G<L>> {
  using type = L;
};
template <class A>
using length_behind = typename length_of<typename A::kind_type>::type;
}  // namespace detail

template <class A>
concept measures_a_reynolds = has_kind<A> && detail::is_reynolds<typename A::kind_type>;

/// Pe = Re Pr.
template <measures_a_reynolds R, measures<kinds::prandtl> P>
CONVELOPE_FUNCTION constexpr auto peclet(const R& Re, const P& Pr) {
  using T = detail::number_type<R, P>;
  return detail::carried<kinds::peclet<detail::length_behind<R>>, T>(T(T(Re.si()) * Pr.si()), Re,
                                                                     Pr);
}

/// A Reynolds number of duct flow.
template <class A>
concept measures_a_duct_reynolds =
    measures<A, kinds::reynolds<kinds::hydraulic_diameter, kinds::mean_velocity>>;
/// A length along a duct from the start of heating.
template <class A>
concept measures_a_duct_distance =
    measures<A, kinds::distance_from_inlet> || measures<A, kinds::duct_length>;

/// x_star = (x/Dh) / (Re Pr).
template <measures_a_duct_reynolds R, measures<kinds::prandtl> P,
          measures<kinds::hydraulic_diameter> D, measures_a_duct_distance X>
CONVELOPE_FUNCTION constexpr auto thermal_entry_coordinate(const R& Re, const P& Pr, const D& d,
                                                           const X& x) {
  using T = detail::number_type<R, P, D, X>;
  return detail::carried<kinds::thermal_entry, T>(
      T(T(x.si()) / (T(d.si()) * Re.si() * Pr.si())), Re, Pr, d, x);
}
/// Gz = Re Pr Dh/x, without pi/4.
template <measures_a_duct_reynolds R, measures<kinds::prandtl> P,
          measures<kinds::hydraulic_diameter> D, measures_a_duct_distance X>
CONVELOPE_FUNCTION constexpr auto graetz(const R& Re, const P& Pr, const D& d, const X& x) {
  using T = detail::number_type<R, P, D, X>;
  return detail::carried<kinds::graetz, T>(T(T(Re.si()) * Pr.si() * d.si() / x.si()), Re, Pr, d,
                                           x);
}

/// De = Re sqrt(d/Dc) of a coiled tube.
template <measures_a_duct_reynolds R, measures<kinds::hydraulic_diameter> D,
          measures<kinds::coil_diameter> C>
CONVELOPE_FUNCTION constexpr auto dean(const R& Re, const D& d, const C& coil) {
  using T = detail::number_type<R, D, C>;
  return detail::carried<kinds::dean, T>(T(T(Re.si()) * math::sqrt(T(T(d.si()) / coil.si()))), Re,
                                         d, coil);
}

/// Ta = Re sqrt(b/R) with Re on the gap and the rotor's surface velocity; not squared.
template <class R, measures<kinds::gap> B, measures<kinds::radius> A>
  requires measures<R, kinds::reynolds<kinds::gap, kinds::rotor_surface_velocity>>
CONVELOPE_FUNCTION constexpr auto taylor(const R& Re, const B& b, const A& inner_radius) {
  using T = detail::number_type<R, B, A>;
  return detail::carried<kinds::taylor, T>(
      T(T(Re.si()) * math::sqrt(T(T(b.si()) / inner_radius.si()))), Re, b, inner_radius);
}

}  // namespace v0
}  // namespace convelope

#endif
