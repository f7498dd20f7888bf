#ifndef CONVELOPE_SURFACES_FILM_HPP
#define CONVELOPE_SURFACES_FILM_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/fluids/fluid.hpp"
#include "convelope/scalar/smooth.hpp"
#include "convelope/surfaces/exposure.hpp"

namespace convelope {
inline namespace v0 {

/// What a geometry finds before a wall: q = coefficient (T_wall - reference_temperature).
template <class T>
struct film {
  T coefficient;            // W/(m2 K)
  T reference_temperature;  // K
  bits_t<T> bits;
  plain_t<T> variance;                    // square of the relative scatter
  plain_t<T> share[detail::word::slots];  // what each of the geometry's correlations contributes
};

/// The correlations a geometry joins, in slot order, as data.
struct speakers {
  const correlation_info* correlation[detail::word::slots];
  int count;
};

namespace detail {
template <class... C>
inline constexpr speakers speakers_of{{&record_of<C>...}, static_cast<int>(sizeof...(C))};

// Below this share a correlation is not asked whether it is inside its range.
inline constexpr double heard_from = 1e-3;

// Reynolds numbers this small are rounded off (math::smooth_magnitude), so that roots of them keep
// a finite slope at rest.
inline constexpr double least_reynolds = 1e-6;

template <class C, class T>
CONVELOPE_FUNCTION constexpr plain_t<T> variance_of() {
  return scalar_adaptor<plain_t<T>>::constant(C::scatter < 0.0 ? 0.0 : C::scatter * C::scatter);
}

/// 1 - x on numbers without derivatives.
template <class P>
CONVELOPE_FUNCTION constexpr P complement(const P& x) {
  return P(scalar_adaptor<P>::constant(1.0) - x);
}

template <class P, class X>
CONVELOPE_FUNCTION constexpr auto without_slope(const X& x) {
  if constexpr (std::is_enum_v<X>) {
    return x;
  } else {
    return P(plain(x));
  }
}

/// The verdict of correlation C on its inputs x, moved to `slot`; silent where its share is small.
template <class C, class T, class... X>
CONVELOPE_FUNCTION constexpr bits_t<T> asked(int slot, const plain_t<T>& share, const X&... x) {
  using bits = bits_t<T>;
  using P = plain_t<T>;
  const bits crossed = C::with_input_kinds([&]<class... K>() {
    constexpr auto envelope = C::envelope;  // its own, for device code
    return envelope.template check<P, K...>(without_slope<P>(x)...);
  });
  bits all(crossed << (slot * word::slot_width));
  if (C::scatter < 0.0) all = bits(all | bits(word::scatter_not_stated));
  return bits(all & scalar_adaptor<P>::bits_where(share > scalar_adaptor<P>::constant(heard_from),
                                                  ~std::uint64_t{0}));
}

template <fluid Fluid>
constexpr bool is_gas = Fluid::expansion_at == expansion_rule::ambient;

/// rho |u| L / mu, rounded off at rest.
template <class T>
CONVELOPE_FUNCTION constexpr T rounded_reynolds(const fluid_values<T>& v, const T& u,
                                                double length) {
  return math::smooth_magnitude(T(T(u * length) * T(v.density / v.viscosity)), least_reynolds);
}

/// A length to divide by: itself if positive and finite, else 1 m, with `impossible` in the bits.
struct usable_length {
  double metres;
  std::uint64_t bits;

  CONVELOPE_FUNCTION constexpr explicit usable_length(double given)
      : metres(good(given) ? given : 1.0), bits(good(given) ? 0 : word::impossible) {}

 private:
  CONVELOPE_FUNCTION static constexpr bool good(double x) {
    return x > 0.0 && scalar_adaptor<double>::bits_where_not_finite(x, 1) == 0;
  }
};

/// A transition Reynolds number to divide by: itself if positive and finite, else 5e5.
struct usable_transition {
  double Re;
  std::uint64_t bits;

  CONVELOPE_FUNCTION constexpr explicit usable_transition(
      const typed<kinds::transition_reynolds>& given)
      : Re(5e5), bits(usable_length(given.si()).bits) {
    if (bits == 0) Re = given.si();
  }
};

/// Everything a geometry has found, put together: h = Nu k / L.
template <class T, class... Share>
CONVELOPE_FUNCTION constexpr film<T> film_of(const T& Nu, const T& conductivity, double length,
                                             const T& reference, const bits_t<T>& bits,
                                             const plain_t<T>& variance, const Share&... share) {
  using P = plain_t<T>;
  film<T> f{T(Nu * conductivity * (1.0 / length)), reference, bits, variance, {}};
  for (P& s : f.share) s = scalar_adaptor<P>::constant(0.0);
  int i = 0;
  ((f.share[i++] = P(share)), ...);
  return f;
}

template <class T, class... X>
CONVELOPE_FUNCTION constexpr bits_t<T> finite(const X&... x) {
  bits_t<T> bits(std::uint64_t{0});
  ((bits = bits_t<T>(bits | scalar_adaptor<T>::bits_where_not_finite(T(x), word::not_finite))),
   ...);
  return bits;
}

/// Bits of a state that can't be: a number that is NaN or infinite, a temperature not above 0 K.
template <class T, class... X>
CONVELOPE_FUNCTION constexpr bits_t<T> sound(const T& wall, const T& stream, const X&... others) {
  using adaptor = scalar_adaptor<T>;
  const T zero = adaptor::constant(0.0);
  return bits_t<T>(finite<T>(wall, stream, others...) |
                   adaptor::bits_where(!(wall > zero), word::impossible) |
                   adaptor::bits_where(!(stream > zero), word::impossible));
}
}  // namespace detail

/// A geometry with its recommended composite: film_at(fluid, exposure, T_wall) on any scalar
/// type, the exposure it needs, and who speaks.
template <class G>
concept wall_geometry = requires {
  { G::speaks } -> std::convertible_to<const speakers&>;
  { G::name } -> std::convertible_to<const char*>;
};

}  // namespace v0
}  // namespace convelope

#endif
