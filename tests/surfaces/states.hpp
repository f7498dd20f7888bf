#pragma once

// Walls to ask, from raw numbers, for any geometry; and seeded random numbers.

#include <cmath>
#include <random>

#include "convelope/boundary/surface.hpp"
#include "convelope/fluids/constant_properties.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/fluids/liquid_water.hpp"

namespace states {

using namespace convelope;

template <class K>
constexpr typed<K> number(double si) {
  return typed<K>::from_si(si);
}

/// What the geometry is exposed to; a wall in a fluid at rest has no use for u.
template <class G, class T>
typename G::template exposure<T> exposure(const T& u, const T& stream_K, const T& p) {
  typename G::template exposure<T> e{};
  if constexpr (requires { e.velocity; }) e.velocity = decltype(e.velocity)::from_si(u);
  e.temperature = decltype(e.temperature)::from_si(stream_K);
  e.pressure = decltype(e.pressure)::from_si(p);
  return e;
}

template <class G, class Fluid>
wall_answer<double> ask(const G& g, const Fluid& f, double u, double stream_K, double wall_K,
                        double p = 101325.0) {
  return surface(g, f, exposure<G, double>(u, stream_K, p))
      .at(number<kinds::wall_temperature>(wall_K));
}

/// film_at on any scalar type.
template <class T, class G, class Fluid>
film<T> film_of(const G& g, const Fluid& f, const T& u, const T& stream_K, const T& wall_K,
                const T& p) {
  return g.film_at(f, exposure<G, T>(u, stream_K, p), wall_K);
}

class random_numbers {
 public:
  explicit random_numbers(unsigned seed) : engine_(seed) {}
  double between(double a, double b) {
    return a + (b - a) * (static_cast<double>(engine_()) / 4294967295.0);
  }
  double log_between(double a, double b) { return std::exp(between(std::log(a), std::log(b))); }
  double sign() { return engine_() % 2 == 0 ? 1.0 : -1.0; }

 private:
  std::mt19937 engine_;
};

inline bool is_finite(double x) {
  return convelope::scalar_adaptor<double>::bits_where_not_finite(x, 1) == 0;
}

inline constant_properties oil() {  // an engine oil near 60 degC, round numbers
  return {number<kinds::density>(864.0), number<kinds::specific_heat>(2047.0),
          number<kinds::conductivity>(0.14), number<kinds::viscosity>(0.0725),
          number<kinds::expansion_coefficient>(7e-4)};
}
inline constant_properties mercury() {  // near 300 K, round numbers
  return {number<kinds::density>(13529.0), number<kinds::specific_heat>(139.3),
          number<kinds::conductivity>(8.54), number<kinds::viscosity>(1.523e-3),
          number<kinds::expansion_coefficient>(1.81e-4)};
}

}  // namespace states
