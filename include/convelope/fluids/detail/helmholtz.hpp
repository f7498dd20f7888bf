#ifndef CONVELOPE_FLUIDS_DETAIL_HELMHOLTZ_HPP
#define CONVELOPE_FLUIDS_DETAIL_HELMHOLTZ_HPP

#include <array>
#include <utility>

#include "convelope/scalar.hpp"

// Equations of state in the reduced residual Helmholtz energy,
// alpha = sum n delta^i tau^j exp(-delta^l), without the exponential where l = 0, and a few terms
// n delta^i tau^j exp(-phi (delta - 1)^2 - beta (tau - gamma)^2) near the critical point.

namespace convelope {
inline namespace v0 {
namespace detail::helmholtz {

// NOLINTNEXTLINE(clang-analyzer-optin.performance.Padding): in the order of the papers
struct term {
  double n;
  int i;
  double j;
  int l;
};
struct bell {
  double n;
  int i;
  int j;
  double phi;
  double beta;
  double gamma;
};

/// tau, 1/tau and tau^(1/Unit): from them every tau^(k/Unit) is products.
template <int Unit, class T>
struct powers {
  T tau;
  T inverse;
  T part;

  CONVELOPE_FUNCTION constexpr powers(const T& of, const T& one_over)
      : tau(of), inverse(one_over), part(root(of)) {}

  template <int Steps>
  CONVELOPE_FUNCTION constexpr T times(const T& factor) const {
    constexpr int whole = Steps >= 0 ? Steps / Unit : -((Unit - 1 - Steps) / Unit);
    constexpr int rest = Steps - whole * Unit;
    if constexpr (rest > 0) {
      return raised<whole>(T(factor * math::detail::whole_power<rest>(part)));
    } else {
      return raised<whole>(factor);
    }
  }

 private:
  template <int Whole>
  CONVELOPE_FUNCTION constexpr T raised(const T& factor) const {
    if constexpr (Whole > 0) {
      return T(factor * math::detail::whole_power<Whole>(tau));
    } else if constexpr (Whole < 0) {
      return T(factor * math::detail::whole_power<-Whole>(inverse));
    } else {
      return factor;
    }
  }
  CONVELOPE_FUNCTION static constexpr T root(const T& x) {
    if constexpr (Unit == 2) {
      return math::sqrt(x);
    } else if constexpr (Unit == 4) {
      return math::sqrt(math::sqrt(x));
    } else if constexpr (Unit == 8) {
      return math::sqrt(math::sqrt(math::sqrt(x)));
    } else {
      return math::exp(T(math::log(x) * (1.0 / Unit)));
    }
  }
};

template <int Unit>
constexpr int steps(double exponent) {
  return static_cast<int>(exponent * Unit + (exponent < 0.0 ? -0.5 : 0.5));
}

/// n delta^i tau^j of term K of a table.
template <const auto& Terms, std::size_t K, int Unit, class T>
CONVELOPE_FUNCTION constexpr T monomial(const T& delta, const powers<Unit, T>& tau) {
  constexpr int i = Terms[K].i;
  const T n = scalar_adaptor<T>::constant(Terms[K].n);
  if constexpr (i == 0) {
    return tau.template times<steps<Unit>(Terms[K].j)>(n);
  } else {
    return tau.template times<steps<Unit>(Terms[K].j)>(T(n * math::detail::whole_power<i>(delta)));
  }
}

/// n tau^j of every term: what an equation of state needs of the temperature, once.
template <class Equation, class T>
struct isotherm {
  static constexpr std::size_t count = std::size(Equation::terms);
  T tau;
  std::array<T, count> weights;
};
template <class Equation, class T>
CONVELOPE_FUNCTION constexpr isotherm<Equation, T> isotherm_of(const T& tau,
                                                               const T& one_over_tau) {
  const powers<Equation::unit, T> by_tau(tau, one_over_tau);
  return [&]<std::size_t... K>(std::index_sequence<K...>) {
    return isotherm<Equation, T>{
        tau,
        {by_tau.template times<steps<Equation::unit>(Equation::terms[K].j)>(
            scalar_adaptor<T>::constant(Equation::terms[K].n))...}};
  }(std::make_index_sequence<isotherm<Equation, T>::count>{});
}

template <int L, const auto&... Terms>
constexpr bool damps = [] {
  bool found = false;
  const auto look = [&](const auto& terms) {
    for (const term& t : terms) found = found || t.l == L;
  };
  (look(Terms), ...);
  return found;
}();

/// delta^l and exp(-delta^l), l = 1 .. 4; the exponentials only where the tables have them.
template <class T>
struct dampings {
  T power[4];
  T factor[4];
};
template <const auto&... Terms, class T>
CONVELOPE_FUNCTION constexpr dampings<T> dampings_of(const T& delta) {
  const T square = T(delta * delta);
  const T cube = T(square * delta);
  const T fourth = T(square * square);
  const auto factor = [](auto used, const T& power) {
    if constexpr (used.value) {
      return math::exp(T(-power));
    } else {
      return power;
    }
  };
  return {{delta, square, cube, fourth},
          {factor(std::bool_constant<damps<1, Terms...>>{}, delta),
           factor(std::bool_constant<damps<2, Terms...>>{}, square),
           factor(std::bool_constant<damps<3, Terms...>>{}, cube),
           factor(std::bool_constant<damps<4, Terms...>>{}, fourth)}};
}

/// Derivatives of alpha, each times the delta and tau it was taken by.
template <class T>
struct derivatives {
  T d;
  T dd;
  T dt;
  T tt;

  CONVELOPE_FUNCTION constexpr void add(const T& value, const T& of_d, const T& of_dd,
                                        const T& of_t, const T& of_tt) {
    d = T(d + value * of_d);
    dd = T(dd + value * of_dd);
    dt = T(dt + value * of_d * of_t);
    tt = T(tt + value * of_tt);
  }
};

/// delta = density/reducing_density.
template <class Equation, class T>
CONVELOPE_FUNCTION constexpr derivatives<T> residual(const isotherm<Equation, T>& at,
                                                     const T& delta) {
  const auto constant = [](double c) { return scalar_adaptor<T>::constant(c); };
  const dampings<T> damped = dampings_of<Equation::terms>(delta);
  derivatives<T> sum{constant(0.0), constant(0.0), constant(0.0), constant(0.0)};
  const auto one = [&]<std::size_t K>(std::integral_constant<std::size_t, K>) {
    constexpr term t = Equation::terms[K];
    const T bare = T(at.weights[K] * math::detail::whole_power<t.i>(delta));
    if constexpr (t.l == 0) {
      sum.add(bare, constant(t.i), constant(t.i * (t.i - 1)), constant(t.j),
              constant(t.j * (t.j - 1.0)));
    } else {
      const T& power = damped.power[t.l - 1];
      const T slope = T(t.i - t.l * power);
      sum.add(T(bare * damped.factor[t.l - 1]), slope,
              T(slope * (slope - 1.0) - (t.l * t.l) * power), constant(t.j),
              constant(t.j * (t.j - 1.0)));
    }
  };
  [&]<std::size_t... K>(std::index_sequence<K...>) {
    (one(std::integral_constant<std::size_t, K>{}), ...);
  }(std::make_index_sequence<std::size(Equation::terms)>{});
  if constexpr (requires { Equation::bells; }) {
    const auto one_bell = [&]<std::size_t K>(std::integral_constant<std::size_t, K>) {
      constexpr bell b = Equation::bells[K];
      const T off = T(delta - 1.0);
      const T away = T(at.tau - b.gamma);
      T value = T(b.n * math::exp(T(-b.phi * (off * off) - b.beta * (away * away))) *
                  math::detail::whole_power<b.i>(delta));
      if constexpr (b.j > 0) value = T(value * math::detail::whole_power<b.j>(at.tau));
      const T slope = T(b.i - 2.0 * b.phi * delta * off);
      const T tilt = T(b.j - 2.0 * b.beta * at.tau * away);
      sum.add(value, slope, T(slope * (slope - 1.0) - 2.0 * b.phi * delta * (2.0 * delta - 1.0)),
              tilt, T(tilt * (tilt - 1.0) - 2.0 * b.beta * at.tau * (2.0 * at.tau - b.gamma)));
    };
    [&]<std::size_t... K>(std::index_sequence<K...>) {
      (one_bell(std::integral_constant<std::size_t, K>{}), ...);
    }(std::make_index_sequence<std::size(Equation::bells)>{});
  }
  return sum;
}

/// What follows from an equation of state at a molar density and a temperature; SI, per mole.
template <class T>
struct state {
  T pressure;
  T stiffness;  // (dp/drho)_T / (R T)
  T cv_over_R;
  T cp_over_R;
  T expansion;
};

/// ideal_heat = cp/R of the ideal gas at T.
template <class Equation, class T>
CONVELOPE_FUNCTION constexpr state<T> state_of(const isotherm<Equation, T>& at, const T& rho,
                                               const T& temperature_K, const T& inverse,
                                               const T& ideal_heat) {
  const derivatives<T> a = residual(at, T(rho * (1.0 / Equation::reducing_density)));
  const T stiffness = T(1.0 + 2.0 * a.d + a.dd);
  const T thrust = T(1.0 + a.d - a.dt);
  const T ratio = T(thrust / stiffness);
  const T cv = T(ideal_heat - 1.0 - a.tt);
  return {T(rho * (1.0 + a.d) * (Equation::gas_constant * temperature_K)), stiffness, cv,
          T(cv + thrust * ratio), T(ratio * inverse)};
}

template <class Equation, class T>
CONVELOPE_FUNCTION constexpr state<T> state_of(const T& rho, const T& temperature_K,
                                               const T& inverse, const T& ideal_heat) {
  const isotherm<Equation, T> at =
      isotherm_of<Equation>(T(Equation::reducing_temperature * inverse),
                            T(temperature_K * (1.0 / Equation::reducing_temperature)));
  return state_of(at, rho, temperature_K, inverse, ideal_heat);
}

/// The next guess of the density at a pressure, by Newton, and no more than a factor of two away,
/// so that a state outside every envelope stays finite.
template <class Equation, class T>
CONVELOPE_FUNCTION constexpr T closer_density(const isotherm<Equation, T>& at, const T& rho,
                                              const T& p_over_RT) {
  const derivatives<T> a = residual(at, T(rho * (1.0 / Equation::reducing_density)));
  const T next = T(rho - (rho * (1.0 + a.d) - p_over_RT) / (1.0 + 2.0 * a.d + a.dd));
  return math::larger(T(0.5 * rho), math::smaller(next, T(2.0 * rho)));
}

/// The second virial coefficient and its slopes: B, T B', T^2 B'', from the terms linear in
/// density. The bells are left out: at zero density they are below exp(-20).
template <class T>
struct second_virial {
  T b;
  T b1;
  T b2;
};

/// In units of 1/reducing_density.
template <const auto& Terms, int Unit, class T>
CONVELOPE_FUNCTION constexpr second_virial<T> virial(const T& tau, const T& one_over_tau) {
  const T zero = scalar_adaptor<T>::constant(0.0);
  const powers<Unit, T> by_tau(tau, one_over_tau);
  second_virial<T> sum{zero, zero, zero};
  const auto one = [&]<std::size_t K>(std::integral_constant<std::size_t, K>) {
    constexpr term t = Terms[K];
    if constexpr (t.i == 1) {
      const T x = by_tau.template times<steps<Unit>(t.j)>(scalar_adaptor<T>::constant(t.n));
      sum.b = T(sum.b + x);
      if constexpr (steps<Unit>(t.j) != 0) {
        sum.b1 = T(sum.b1 - t.j * x);
        sum.b2 = T(sum.b2 + t.j * (t.j + 1.0) * x);
      }
    }
  };
  [&]<std::size_t... K>(std::index_sequence<K...>) {
    (one(std::integral_constant<std::size_t, K>{}), ...);
  }(std::make_index_sequence<std::size(Terms)>{});
  return sum;
}

/// A gas whose equation of state ends with the second virial coefficient,
/// p = rho R T (1 + B rho), solved for the density. B in m3/mol; density in mol/m3.
template <class T>
struct virial_gas {
  T density;
  T cp_over_R;
  T expansion;
};

template <class T>
CONVELOPE_FUNCTION constexpr virial_gas<T> gas_of(const second_virial<T>& v, const T& inverse,
                                                  const T& p_over_RT, const T& ideal_heat) {
  // Where the root turns negative, far outside every envelope, the density stays finite.
  const T least = scalar_adaptor<T>::constant(0.01);
  const T root = math::sqrt(math::larger(T(1.0 + 4.0 * v.b * p_over_RT), least));
  const T rho = T(2.0 * p_over_RT / (1.0 + root));
  const T thrust = T(0.5 + 0.5 * root + v.b1 * rho);
  const T ratio = T(thrust / root);
  return {rho, T(ideal_heat - 1.0 - rho * (v.b2 + 2.0 * v.b1) + thrust * ratio),
          T(ratio * inverse)};
}

}  // namespace detail::helmholtz
}  // namespace v0
}  // namespace convelope

#endif
