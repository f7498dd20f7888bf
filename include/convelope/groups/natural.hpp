#ifndef CONVELOPE_GROUPS_NATURAL_HPP
#define CONVELOPE_GROUPS_NATURAL_HPP

#include "convelope/groups/forced.hpp"

// Groups of buoyant flow.

namespace convelope {
inline namespace v0 {

/// Gr = g beta dT L^3 rho^2 / mu^2. The sign is the sign of beta dT: formulas want it positive,
/// surfaces decide the side from it.
template <measures<kinds::density> R, measures<kinds::expansion_coefficient> B,
          measures<kinds::temperature_difference> D, measures_a_length L,
          measures<kinds::viscosity> M>
CONVELOPE_FUNCTION constexpr auto grashof(const R& rho, const B& beta, const D& dT, const L& l,
                                          const M& mu,
                                          typed<kinds::gravity> g = standard_gravity) {
  using T = detail::number_type<R, B, D, L, M>;
  const T nu = T(T(mu.si()) / rho.si());
  const T length = T(l.si());
  return detail::carried<kinds::grashof<typename L::kind_type>, T>(
      T(g.si() * T(beta.si()) * dT.si() * length * length * length / (nu * nu)), rho, beta, dT, l,
      mu);
}

template <class A>
concept measures_a_grashof =
    has_kind<A> && std::is_same_v<typename A::kind_type, kinds::grashof<detail::length_behind<A>>>;
template <class A>
concept measures_a_rayleigh =
    has_kind<A> &&
    std::is_same_v<typename A::kind_type, kinds::rayleigh<detail::length_behind<A>>>;

/// Ra = Gr Pr.
template <measures_a_grashof G, measures<kinds::prandtl> P>
CONVELOPE_FUNCTION constexpr auto rayleigh(const G& Gr, const P& Pr) {
  using T = detail::number_type<G, P>;
  return detail::carried<kinds::rayleigh<detail::length_behind<G>>, T>(T(T(Gr.si()) * Pr.si()), Gr,
                                                                       Pr);
}

/// Ri = Gr / Re^2, both on the same length.
template <measures_a_grashof G, measures_a_reynolds R>
  requires std::is_same_v<detail::length_behind<G>, detail::length_behind<R>>
CONVELOPE_FUNCTION constexpr auto richardson(const G& Gr, const R& Re) {
  using T = detail::number_type<G, R>;
  return detail::carried<kinds::richardson<detail::length_behind<G>>, T>(
      T(T(Gr.si()) / (T(Re.si()) * Re.si())), Gr, Re);
}

/// El = Ra_b b/H of a vertical channel.
template <class A, measures<kinds::gap> B, measures<kinds::height> H>
  requires measures<A, kinds::rayleigh<kinds::gap>>
CONVELOPE_FUNCTION constexpr auto elenbaas(const A& Ra, const B& b, const H& h) {
  using T = detail::number_type<A, B, H>;
  return detail::carried<kinds::elenbaas, T>(T(T(Ra.si()) * b.si() / h.si()), Ra, b, h);
}

}  // namespace v0
}  // namespace convelope

#endif
