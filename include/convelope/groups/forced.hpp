#ifndef CONVELOPE_GROUPS_FORCED_HPP
#define CONVELOPE_GROUPS_FORCED_HPP

#include "convelope/estimate/estimate.hpp"
#include "convelope/kinds.hpp"

// Groups of forced flow. Arguments are typed numbers or estimates; the result's kind follows from
// theirs, and an estimate in gives an estimate out. Plain constants constrain them, not concepts:
// a compiler then says in one line which argument measures the wrong thing.

namespace convelope {
inline namespace v0 {

/// Re = rho u L / mu, on the length and the velocity station handed in.
template <class R, class U, class L, class M>
  requires(detail::is_of_kind<R, kinds::density> && detail::is_velocity<U> &&
           detail::is_length<L> && detail::is_of_kind<M, kinds::viscosity>)
CONVELOPE_FUNCTION constexpr auto reynolds(const R& rho, const U& u, const L& l, const M& mu) {
  using T = detail::number_type<R, U, L, M>;
  using K = kinds::reynolds<typename L::kind_type, typename U::kind_type>;
  return detail::carried<K, T>(T(T(rho.si()) * u.si() * l.si() / mu.si()), rho, u, l, mu);
}
/// Re = u L / nu.
template <class U, class L, class Nu>
  requires(detail::is_velocity<U> && detail::is_length<L> &&
           detail::is_of_kind<Nu, kinds::kinematic_viscosity>)
CONVELOPE_FUNCTION constexpr auto reynolds(const U& u, const L& l, const Nu& nu) {
  using T = detail::number_type<U, L, Nu>;
  using K = kinds::reynolds<typename L::kind_type, typename U::kind_type>;
  return detail::carried<K, T>(T(T(u.si()) * l.si() / nu.si()), u, l, nu);
}
// For arguments of other kinds: one short complaint, in place of one about each of the two above.
template <class... A>
void reynolds(const A&...) = delete;  // density, velocity, length, viscosity or kinematic_viscosity

/// Pr = cp mu / k.
template <class C, class M, class K>
  requires(detail::is_of_kind<C, kinds::specific_heat> && detail::is_of_kind<M, kinds::viscosity> &&
           detail::is_of_kind<K, kinds::conductivity>)
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
template <class L>
struct length_of<kinds::grashof<L>> {
  using type = L;
};
template <class A>
using length_behind = typename length_of<typename A::kind_type>::type;
template <class A>
constexpr bool is_a_reynolds = false;
template <has_kind A>
constexpr bool is_a_reynolds<A> = is_reynolds<typename A::kind_type>;
}  // namespace detail

template <class A>
concept measures_a_reynolds = detail::is_a_reynolds<A>;

/// Pe = Re Pr.
template <class R, class P>
  requires(detail::is_a_reynolds<R> && detail::is_of_kind<P, kinds::prandtl>)
CONVELOPE_FUNCTION constexpr auto peclet(const R& Re, const P& Pr) {
  using T = detail::number_type<R, P>;
  return detail::carried<kinds::peclet<detail::length_behind<R>>, T>(T(T(Re.si()) * Pr.si()), Re,
                                                                     Pr);
}

namespace detail {
template <class A>
constexpr bool is_duct_reynolds =
    is_of_kind<A, kinds::reynolds<kinds::hydraulic_diameter, kinds::mean_velocity>>;
template <class A>
constexpr bool is_duct_distance =
    is_of_kind<A, kinds::distance_from_inlet> || is_of_kind<A, kinds::duct_length>;
}  // namespace detail

/// A Reynolds number of duct flow.
template <class A>
concept measures_a_duct_reynolds = detail::is_duct_reynolds<A>;
/// A length along a duct from the start of heating.
template <class A>
concept measures_a_duct_distance = detail::is_duct_distance<A>;

/// x_star = (x/Dh) / (Re Pr).
template <class R, class P, class D, class X>
  requires(detail::is_duct_reynolds<R> && detail::is_of_kind<P, kinds::prandtl> &&
           detail::is_of_kind<D, kinds::hydraulic_diameter> && detail::is_duct_distance<X>)
CONVELOPE_FUNCTION constexpr auto thermal_entry_coordinate(const R& Re, const P& Pr, const D& d,
                                                           const X& x) {
  using T = detail::number_type<R, P, D, X>;
  return detail::carried<kinds::thermal_entry, T>(T(T(x.si()) / (T(d.si()) * Re.si() * Pr.si())),
                                                  Re, Pr, d, x);
}
/// Gz = Re Pr Dh/x, without pi/4.
template <class R, class P, class D, class X>
  requires(detail::is_duct_reynolds<R> && detail::is_of_kind<P, kinds::prandtl> &&
           detail::is_of_kind<D, kinds::hydraulic_diameter> && detail::is_duct_distance<X>)
CONVELOPE_FUNCTION constexpr auto graetz(const R& Re, const P& Pr, const D& d, const X& x) {
  using T = detail::number_type<R, P, D, X>;
  return detail::carried<kinds::graetz, T>(T(T(Re.si()) * Pr.si() * d.si() / x.si()), Re, Pr, d, x);
}

/// De = Re sqrt(d/Dc) of a coiled tube.
template <class R, class D, class C>
  requires(detail::is_duct_reynolds<R> && detail::is_of_kind<D, kinds::hydraulic_diameter> &&
           detail::is_of_kind<C, kinds::coil_diameter>)
CONVELOPE_FUNCTION constexpr auto dean(const R& Re, const D& d, const C& coil) {
  using T = detail::number_type<R, D, C>;
  return detail::carried<kinds::dean, T>(T(T(Re.si()) * math::sqrt(T(T(d.si()) / coil.si()))), Re,
                                         d, coil);
}

/// Ta = Re sqrt(b/R) with Re on the gap and the rotor's surface velocity; not squared.
template <class R, class B, class A>
  requires(detail::is_of_kind<B, kinds::gap> && detail::is_of_kind<A, kinds::radius> &&
           detail::is_of_kind<R, kinds::reynolds<kinds::gap, kinds::rotor_surface_velocity>>)
CONVELOPE_FUNCTION constexpr auto taylor(const R& Re, const B& b, const A& inner_radius) {
  using T = detail::number_type<R, B, A>;
  return detail::carried<kinds::taylor, T>(
      T(T(Re.si()) * math::sqrt(T(T(b.si()) / inner_radius.si()))), Re, b, inner_radius);
}

}  // namespace v0
}  // namespace convelope

#endif
