// Ra and side from the fluid's own expansion coefficient, through a density maximum.
#include "convelope/surfaces/buoyancy.hpp"

#include <doctest/doctest.h>

#include "states.hpp"

using namespace states;

namespace {

template <class Fluid>
detail::buoyancy<double> at(const Fluid& f, double wall, double stream, double length = 0.1) {
  const double p = 101325.0;
  return detail::buoyancy<double>(f, f.values(0.5 * (wall + stream), p), wall, stream, p, length,
                                  9.80665);
}
template <class Fluid>
double plain_rayleigh(const Fluid& f, double beta, double dT, double film_K, double length = 0.1) {
  const auto v = f.values(film_K, 101325.0);
  return 9.80665 * beta * dT * std::pow(length, 3) / (v.kinematic_viscosity() * v.diffusivity());
}

}  // namespace

TEST_CASE("buoyancy: gases take beta at the ambient, liquids at the film") {
  CHECK(at(dry_air{}, 400.0, 300.0).Ra ==
        doctest::Approx(plain_rayleigh(dry_air{}, 1.0 / 300.0, 100.0, 350.0)).epsilon(1e-13));
  CHECK(at(oil(), 340.0, 330.0).Ra ==
        doctest::Approx(plain_rayleigh(oil(), 7e-4, 10.0, 335.0)).epsilon(1e-13));
  const liquid_water water;
  const double beta = water.values(310.0, 101325.0).expansion;
  CHECK(at(water, 320.0, 300.0).Ra ==
        doctest::Approx(plain_rayleigh(water, beta, 20.0, 310.0)).epsilon(1e-4));
}

TEST_CASE("buoyancy: side is the sign of beta dT") {
  CHECK(at(dry_air{}, 301.0, 300.0).side == doctest::Approx(1.0));
  CHECK(at(dry_air{}, 299.0, 300.0).side == doctest::Approx(-1.0));
  CHECK(at(dry_air{}, 300.0, 300.0).side == 0.0);
  CHECK(at(liquid_water{}, 276.0, 275.0).side < -0.9);  // heavier when warmed
  CHECK(at(liquid_water{}, 275.0, 276.0).side > 0.9);
  CHECK(at(liquid_water{}, 291.0, 290.0).side == doctest::Approx(1.0).epsilon(1e-6));
}

TEST_CASE("buoyancy: at rest a small, finite Ra") {
  CHECK(at(dry_air{}, 300.0, 300.0).Ra == doctest::Approx(1e-10));
  CHECK(at(liquid_water{}, 300.0, 300.0).Ra == doctest::Approx(1e-10));
  using D = dual<double>;
  const auto f = dry_air{};
  const D wall = D::variable(300.0);
  const D stream = D(300.0);
  const D p = D(101325.0);
  const detail::buoyancy<D> b(f, f.values(stream, p), wall, stream, p, 1.0, 9.80665);
  CHECK(is_finite(b.Ra.slope[0]));
  CHECK(is_finite(b.side.slope[0]));
}

TEST_CASE("buoyancy: water through its density maximum") {
  // IAPWS-IF97: the stated slope of beta, within 3 %.
  const liquid_water water;
  const auto beta = [&](double T) { return water.values(T, 101325.0).expansion; };
  CHECK((beta(277.63) - beta(276.63)) / 1.0 ==
        doctest::Approx(liquid_water::expansion_slope).epsilon(0.03));
  // 0 and 8 degC: beta of the film is about 0, but the layer at 4 degC is the densest. Its excess
  // over both sides, 1.6e-5/8 * 64 = 1.28e-4, agrees with the tabulated densities
  // 999.84, 999.97, 999.85 kg/m3 at 0, 4, 8 degC (Kell 1975, J. Chem. Eng. Data 20, 97-105, from
  // memory).
  const double excess = 1.6e-5 / 8.0 * 64.0;
  CHECK(excess == doctest::Approx((999.97 - 0.5 * (999.84 + 999.85)) / 999.97).epsilon(0.05));
  const auto b = at(water, 281.15, 273.15);
  CHECK(b.Ra == doctest::Approx(plain_rayleigh(water, excess / 8.0, 8.0, 277.15)).epsilon(0.01));
  CHECK(std::fabs(b.side) < 0.3);
}
