// One formula, every number type: each agrees with double.
#include "fluid_numbers.hpp"

#include "convelope/fluids/dry_air.hpp"
#include "convelope/fluids/liquid_water.hpp"
#include "convelope/scalar/xsimd.hpp"

using namespace convelope;

namespace {

// xsimd 8.1's exp and log give wrong values where clang may reorder their sums.
#if defined(__clang__) && defined(__FAST_MATH__)
constexpr bool xsimd_is_right = false;
#else
constexpr bool xsimd_is_right = true;
#endif

constexpr fluid_numbers::point air_points[] = {{200.0, 1e3}, {250.0, 1e5},  {300.0, 3e5},
                                               {777.0, 2e4}, {1200.0, 1e5}, {2000.0, 1e5},
                                               {150.0, 1e5}, {300.0, 4e5}};
constexpr fluid_numbers::point water_points[] = {{273.15, 1e5}, {277.0, 2e7}, {300.0, 1e5},
                                                 {350.0, 1e8},  {450.0, 2e6}, {623.15, 2e7},
                                                 {270.0, 1e5},  {400.0, 1e5}};

template <class Fluid>
void all_numbers(const Fluid& f, const fluid_numbers::point (&points)[8], double single) {
  fluid_numbers::on_every_number(f, points, single);
  if (xsimd_is_right) fluid_numbers::lanes_as_scalars<xsimd::batch<double>>(f, points);
}

}  // namespace

TEST_CASE("dry air on every number type") { all_numbers(dry_air{}, air_points, 3e-6); }

TEST_CASE("dry air, fast, on every number type") { all_numbers(dry_air_fast{}, air_points, 3e-6); }

TEST_CASE("liquid water on every number type") { all_numbers(liquid_water{}, water_points, 2e-4); }

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
