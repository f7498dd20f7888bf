#ifndef CONVELOPE_GROUPS_NATURAL_HPP
#define CONVELOPE_GROUPS_NATURAL_HPP

#include "convelope/groups/forced.hpp"

// Groups of buoyant flow.

namespace convelope {
inline namespace v0 {

/// Gr = g beta dT L^3 rho^2 / mu^2. The sign is the sign of beta dT: formulas want it positive,
/// surfaces decide the side from it.
template <class R, class B, class D, class L, class M>
  requires(detail::is_of_kind<R, kinds::density> &&
           detail::is_of_kind<B, kinds::expansion_coefficient> &&
           detail::is_of_kind<D, kinds::temperature_difference> && detail::is_length<L> &&
           detail::is_of_kind<M, kinds::viscosity>)
CONVELOPE_FUNCTION constexpr auto grashof(const R& rho, const B& beta, const D& dT, const L& l,
                                          const M& mu, typed<kinds::gravity> g = standard_gravity) {
  using T = detail::number_type<R, B, D, L, M>;
  const T nu = T(T(mu.si()) / rho.si());
  const T length = T(l.si());
  return detail::carried<kinds::grashof<typename L::kind_type>, T>(
      T(g.si() * T(beta.si()) * dT.si() * length * length * length / (nu * nu)), rho, beta, dT, l,
      mu);
}

namespace detail {
template <class K>
constexpr bool is_grashof = false;
template <class L>
constexpr bool is_grashof<kinds::grashof<L>> = true;
template <class K>
constexpr bool is_rayleigh = false;
template <class L>
constexpr bool is_rayleigh<kinds::rayleigh<L>> = true;
template <class A>
constexpr bool is_a_grashof = false;
template <has_kind A>
constexpr bool is_a_grashof<A> = is_grashof<typename A::kind_type>;
template <class A>
constexpr bool is_a_rayleigh = false;
template <has_kind A>
constexpr bool is_a_rayleigh<A> = is_rayleigh<typename A::kind_type>;
}  // namespace detail

template <class A>
concept measures_a_grashof = detail::is_a_grashof<A>;
template <class A>
concept measures_a_rayleigh = detail::is_a_rayleigh<A>;

/// Ra = Gr Pr.
template <class G, class P>
  requires(detail::is_a_grashof<G> && detail::is_of_kind<P, kinds::prandtl>)
CONVELOPE_FUNCTION constexpr auto rayleigh(const G& Gr, const P& Pr) {
  using T = detail::number_type<G, P>;
  return detail::carried<kinds::rayleigh<detail::length_behind<G>>, T>(T(T(Gr.si()) * Pr.si()), Gr,
                                                                       Pr);
}

/// Ri = Gr / Re^2, both on the same length.
template <class G, class R>
  requires(detail::is_a_grashof<G> && detail::is_a_reynolds<R> &&
           std::is_same_v<detail::length_behind<G>, detail::length_behind<R>>)
CONVELOPE_FUNCTION constexpr auto richardson(const G& Gr, const R& Re) {
  using T = detail::number_type<G, R>;
  return detail::carried<kinds::richardson<detail::length_behind<G>>, T>(
      T(T(Gr.si()) / (T(Re.si()) * Re.si())), Gr, Re);
}

/// El = Ra_b b/H of a vertical channel.
template <class A, class B, class H>
  requires(detail::is_of_kind<B, kinds::gap> && detail::is_of_kind<H, kinds::height> &&
           detail::is_of_kind<A, kinds::rayleigh<kinds::gap>>)
CONVELOPE_FUNCTION constexpr auto elenbaas(const A& Ra, const B& b, const H& h) {
  using T = detail::number_type<A, B, H>;
  return detail::carried<kinds::elenbaas, T>(T(T(Ra.si()) * b.si() / h.si()), Ra, b, h);
}

}  // namespace v0
}  // namespace convelope

#endif
