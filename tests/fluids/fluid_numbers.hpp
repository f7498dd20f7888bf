#ifndef CONVELOPE_TESTS_FLUIDS_FLUID_NUMBERS_HPP
#define CONVELOPE_TESTS_FLUIDS_FLUID_NUMBERS_HPP

#include <doctest/doctest.h>

#include "close_to.hpp"
#include "convelope/fluids/fluid.hpp"
#include "convelope/scalar/std_simd.hpp"

// One formula, every number type: values and verdicts of a fluid agree with those in double.

namespace fluid_numbers {

struct point {
  double T;
  double p;
};

template <class Number>
void agree(const convelope::fluid_values<Number>& seen,
           const convelope::fluid_values<double>& expected, double relative) {
  const auto number = [](const Number& x) { return static_cast<double>(convelope::plain(x)); };
  CHECK(close_to(number(seen.density), expected.density, relative));
  CHECK(close_to(number(seen.specific_heat), expected.specific_heat, relative));
  CHECK(close_to(number(seen.conductivity), expected.conductivity, relative));
  CHECK(close_to(number(seen.viscosity), expected.viscosity, relative));
  // The expansion coefficient may pass through zero: the scale is 1e-4 1/K.
  CHECK(close_to(number(seen.expansion), expected.expansion, relative, relative * 1e-4));
}

template <class Number, class Fluid>
void same_as_double(const Fluid& f, const point (&points)[8], double relative) {
  for (const point& at : points) {
    CAPTURE(at.T);
    CAPTURE(at.p);
    const Number T(at.T);
    const Number p(at.p);
    agree(f.values(T, p), f.values(at.T, at.p), relative);
    CHECK(f.check(T, p) == f.check(at.T, at.p));
  }
}

template <class Pack, class Lane>
Pack filled(Lane lane) {
  alignas(64) double x[convelope::scalar_adaptor<Pack>::lanes];
  for (int i = 0; i < convelope::scalar_adaptor<Pack>::lanes; ++i) x[i] = lane(i);
  if constexpr (requires { Pack::load_unaligned(x); }) {
    return Pack::load_unaligned(x);
  } else {
    return Pack(x, std::experimental::element_aligned);
  }
}
template <class Pack>
auto lane_of(const Pack& pack, int i) {
  if constexpr (requires { pack.get(0); }) {
    return pack.get(static_cast<std::size_t>(i));
  } else {
    return pack[static_cast<std::size_t>(i)];
  }
}

template <class Pack, class Fluid>
void lanes_as_scalars(const Fluid& f, const point (&points)[8]) {
  using wide = convelope::dual<Pack, 1>;
  using one = convelope::dual<double, 1>;
  for (int first = 0; first < 8; ++first) {
    const auto at = [&](int i) { return points[(first + i) % 8]; };
    const Pack T = filled<Pack>([&](int i) { return at(i).T; });
    const Pack p = filled<Pack>([&](int i) { return at(i).p; });
    const auto v = f.values(T, p);
    const auto slopes = f.values(wide::variable(T), wide(p));
    const auto bits = f.check(T, p);
    for (int i = 0; i < convelope::scalar_adaptor<Pack>::lanes; ++i) {
      CAPTURE(at(i).T);
      CAPTURE(at(i).p);
      const convelope::fluid_values<double> of_lane{
          lane_of(v.density, i), lane_of(v.specific_heat, i), lane_of(v.conductivity, i),
          lane_of(v.viscosity, i), lane_of(v.expansion, i)};
      agree(of_lane, f.values(at(i).T, at(i).p), 1e-13);
      CHECK(std::uint64_t{lane_of(bits, i)} == f.check(at(i).T, at(i).p));
      const auto expected = f.values(one::variable(at(i).T), one(at(i).p));
      const auto check = [&](const wide& a, const one& b) {
        CHECK(close_to(lane_of(a.slope[0], i), b.slope[0], 1e-11,
                       1e-13 * std::fabs(b.value) / at(i).T));
      };
      check(slopes.density, expected.density);
      check(slopes.specific_heat, expected.specific_heat);
      check(slopes.conductivity, expected.conductivity);
      check(slopes.viscosity, expected.viscosity);
    }
  }
}

/// `single`: relative error in single precision, by state_of, which works in double, and raw.
template <class Fluid>
void on_every_number(const Fluid& f, const point (&points)[8], double single) {
  using namespace convelope;
  same_as_double<long double>(f, points, 1e-13);
  same_as_double<dual<double, 1>>(f, points, 1e-13);
  same_as_double<dual<double, 3>>(f, points, 1e-13);
  same_as_double<dual<dual<double, 1>, 1>>(f, points, 1e-13);
  lanes_as_scalars<std::experimental::native_simd<double>>(f, points);
  for (const point& at : points) {
    CAPTURE(at.T);
    CAPTURE(at.p);
    const auto T = static_cast<float>(at.T);
    const auto p = static_cast<float>(at.p);
    const auto expected = f.values(static_cast<double>(T), static_cast<double>(p));
    agree(f.values(T, p), expected, single);
    agree(f.values(dual<float, 0>(T), dual<float, 0>(p)), expected, single);
    const fluid_state<float> s = state_of(f, typed<kinds::film_temperature, float>::from_si(T),
                                          typed<kinds::pressure, float>::from_si(p));
    agree(s.values(), expected, single);
  }
}

}  // namespace fluid_numbers

#endif
