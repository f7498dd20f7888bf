// One formula, every number type: each agrees with double.
#include <doctest/doctest.h>

#include "close_to.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/fluids/liquid_water.hpp"
#include "convelope/scalar/std_simd.hpp"
#include "convelope/scalar/xsimd.hpp"

using namespace convelope;

namespace {

// xsimd 8.1's exp and log give wrong values where clang may reorder their sums.
#if defined(__clang__) && defined(__FAST_MATH__)
constexpr bool xsimd_is_right = false;
#else
constexpr bool xsimd_is_right = true;
#endif

struct point {
  double T;
  double p;
};
constexpr point air_points[] = {{200.0, 1e3},  {250.0, 1e5},  {300.0, 3e5}, {777.0, 2e4},
                                {1200.0, 1e5}, {2000.0, 1e5}, {150.0, 1e5}, {300.0, 4e5}};
constexpr point water_points[] = {{273.15, 1e5}, {277.0, 2e7},  {300.0, 1e5}, {350.0, 1e8},
                                  {450.0, 2e6},  {623.15, 2e7}, {270.0, 1e5}, {400.0, 1e5}};

template <class Number>
void agree(const fluid_values<Number>& seen, const fluid_values<double>& expected,
           double relative) {
  const auto number = [](const Number& x) { return static_cast<double>(plain(x)); };
  CHECK(close_to(number(seen.density), expected.density, relative));
  CHECK(close_to(number(seen.specific_heat), expected.specific_heat, relative));
  CHECK(close_to(number(seen.conductivity), expected.conductivity, relative));
  CHECK(close_to(number(seen.viscosity), expected.viscosity, relative));
  // The expansion coefficient passes through zero: the scale is 1e-4 1/K.
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

template <class Fluid>
void single_precision(const Fluid& f, const point (&points)[8], double relative) {
  for (const point& at : points) {
    CAPTURE(at.T);
    CAPTURE(at.p);
    const auto T = static_cast<float>(at.T);
    const auto p = static_cast<float>(at.p);
    const fluid_state<float> s = state_of(f, typed<kinds::film_temperature, float>::from_si(T),
                                          typed<kinds::pressure, float>::from_si(p));
    agree(s.values(), f.values(static_cast<double>(T), static_cast<double>(p)), relative);
    agree(f.values(T, p), f.values(static_cast<double>(T), static_cast<double>(p)), relative);
  }
}

template <class Pack, class Lane>
Pack filled(Lane lane) {
  alignas(64) double x[scalar_adaptor<Pack>::lanes];
  for (int i = 0; i < scalar_adaptor<Pack>::lanes; ++i) x[i] = lane(i);
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
  constexpr int lanes = scalar_adaptor<Pack>::lanes;
  for (int first = 0; first < 8; ++first) {
    const auto at = [&](int i) { return points[(first + i) % 8]; };
    const Pack T = filled<Pack>([&](int i) { return at(i).T; });
    const Pack p = filled<Pack>([&](int i) { return at(i).p; });
    const auto v = f.values(T, p);
    const auto bits = f.check(T, p);
    for (int i = 0; i < lanes; ++i) {
      CAPTURE(at(i).T);
      CAPTURE(at(i).p);
      const fluid_values<double> one{lane_of(v.density, i), lane_of(v.specific_heat, i),
                                     lane_of(v.conductivity, i), lane_of(v.viscosity, i),
                                     lane_of(v.expansion, i)};
      agree(one, f.values(at(i).T, at(i).p), 1e-13);
      CHECK(std::uint64_t{lane_of(bits, i)} == f.check(at(i).T, at(i).p));
    }
  }
}

template <class Fluid>
void all_numbers(const Fluid& f, const point (&points)[8], double single) {
  same_as_double<long double>(f, points, 1e-13);
  same_as_double<dual<double, 1>>(f, points, 1e-13);
  same_as_double<dual<double, 3>>(f, points, 1e-13);
  same_as_double<dual<dual<double, 1>, 1>>(f, points, 1e-13);
  single_precision(f, points, single);
  lanes_as_scalars<std::experimental::native_simd<double>>(f, points);
  if (xsimd_is_right) lanes_as_scalars<xsimd::batch<double>>(f, points);
}

// Slopes on packs: a dual of packs against a dual of doubles.
template <class Pack, class Fluid>
void slopes_on_packs(const Fluid& f, const point (&points)[8]) {
  using wide = dual<Pack, 1>;
  using one = dual<double, 1>;
  const Pack T = filled<Pack>([&](int i) { return points[i].T; });
  const Pack p = filled<Pack>([&](int i) { return points[i].p; });
  const auto v = f.values(wide::variable(T), wide(p));
  for (int i = 0; i < scalar_adaptor<Pack>::lanes; ++i) {
    CAPTURE(points[i].T);
    const auto expected = f.values(one::variable(points[i].T), one(points[i].p));
    const auto check = [&](const wide& a, const one& b) {
      CHECK(close_to(lane_of(a.slope[0], i), b.slope[0], 1e-11,
                     1e-14 * std::fabs(b.value) / points[i].T));
    };
    check(v.density, expected.density);
    check(v.specific_heat, expected.specific_heat);
    check(v.conductivity, expected.conductivity);
    check(v.viscosity, expected.viscosity);
  }
}

}  // namespace

TEST_CASE("dry air on every number type") {
  all_numbers(dry_air{}, air_points, 3e-6);
  slopes_on_packs<std::experimental::native_simd<double>>(dry_air{}, air_points);
  if (xsimd_is_right) slopes_on_packs<xsimd::batch<double>>(dry_air{}, air_points);
}

TEST_CASE("dry air, fast, on every number type") {
  all_numbers(dry_air_fast{}, air_points, 3e-6);
  slopes_on_packs<std::experimental::native_simd<double>>(dry_air_fast{}, air_points);
}

TEST_CASE("liquid water on every number type") {
  all_numbers(liquid_water{}, water_points, 2e-4);
  slopes_on_packs<std::experimental::native_simd<double>>(liquid_water{}, water_points);
  if (xsimd_is_right) slopes_on_packs<xsimd::batch<double>>(liquid_water{}, water_points);
}

TEST_CASE("single precision lanes run too") {
  using pack = dual<std::experimental::native_simd<float>, 0>;
  const pack T(std::experimental::native_simd<float>(350.0F));
  const pack p(std::experimental::native_simd<float>(1e5F));
  const auto air = dry_air{}.values(T, p);
  const auto water = liquid_water{}.values(T, p);
  CHECK(close_to(double(float(air.viscosity.value[0])), dry_air{}.values(350.0, 1e5).viscosity,
                 3e-6));
  CHECK(close_to(double(float(water.density.value[0])), liquid_water{}.values(350.0, 1e5).density,
                 3e-6));
  CHECK(std::uint64_t{dry_air{}.check(T, p)[0]} == 0);
  CHECK(std::uint64_t{liquid_water{}.check(T, p)[0]} == 0);
}

TEST_CASE("second derivatives by nested duals") {
  using inner = dual<double, 1>;
  using outer = dual<inner, 1>;
  const outer T = outer::variable(inner::variable(300.0));
  const auto v = dry_air{}.values(T, outer(1e5));
  // rho = p / (R T): second derivative 2 rho / T^2
  CHECK(close_to(v.density.slope[0].slope[0], 2.0 * v.density.value.value / 9e4, 1e-13));
}
