#include "convelope/groups/natural.hpp"

#include <doctest/doctest.h>

using namespace convelope;
namespace word = convelope::detail::word;

namespace {

using namespace convelope::units;
doctest::Approx near(double x, double relative = 1e-14) {
  return doctest::Approx(x).epsilon(relative);
}
template <class K>
estimate<K> doubtful(const typed<K>& x, std::uint64_t bit) {
  return {x.si(), verdict<>(bit), 0.01, nullptr, nullptr};
}

const auto rho = density(2.0 * kilogram_per_cubic_metre);
const auto beta = expansion_coefficient(3e-3 * per_kelvin);
const auto dT = temperature_difference(20.0 * kelvin_difference);
const auto H = height(0.5 * metre);
const auto mu = viscosity(4e-5 * pascal_second);  // nu = 2e-5

}  // namespace

namespace static_test {

template <class... A>
concept grashof_from = requires(const A&... a) { grashof(a...); };
using rho_t = typed<kinds::density>;
using beta_t = typed<kinds::expansion_coefficient>;
using dT_t = typed<kinds::temperature_difference>;
using H_t = typed<kinds::height>;
using mu_t = typed<kinds::viscosity>;
static_assert(grashof_from<rho_t, beta_t, dT_t, H_t, mu_t>);
static_assert(grashof_from<rho_t, beta_t, dT_t, H_t, mu_t, typed<kinds::gravity>>);
static_assert(!grashof_from<rho_t, beta_t, typed<kinds::wall_temperature>, H_t, mu_t>);
static_assert(!grashof_from<beta_t, rho_t, dT_t, H_t, mu_t>);
static_assert(!grashof_from<rho_t, beta_t, dT_t, H_t, typed<kinds::kinematic_viscosity>>);
static_assert(!grashof_from<rho_t, beta_t, double, H_t, mu_t>);

using Gr_t = typed<kinds::grashof<kinds::height>>;
using Ra_t = typed<kinds::rayleigh<kinds::height>>;
using Pr_t = typed<kinds::prandtl>;
static_assert(measures_a_grashof<Gr_t> && !measures_a_grashof<Ra_t> && !measures_a_grashof<Pr_t>);
static_assert(measures_a_rayleigh<Ra_t> && !measures_a_rayleigh<Gr_t>);
static_assert(!measures_a_grashof<double> && !measures_a_rayleigh<double>);
static_assert(std::is_same_v<decltype(grashof(rho, beta, dT, H, mu)), Gr_t>);
static_assert(std::is_same_v<decltype(rayleigh(Gr_t{}, Pr_t{})), Ra_t>);
template <class... A>
concept rayleigh_from = requires(const A&... a) { rayleigh(a...); };
static_assert(!rayleigh_from<Ra_t, Pr_t> && !rayleigh_from<Pr_t, Gr_t>);

template <class... A>
concept richardson_from = requires(const A&... a) { richardson(a...); };
static_assert(richardson_from<Gr_t, typed<kinds::reynolds<kinds::height>>>);
static_assert(!richardson_from<Gr_t, typed<kinds::reynolds<kinds::plate_length>>>);
static_assert(!richardson_from<Ra_t, typed<kinds::reynolds<kinds::height>>>);
static_assert(std::is_same_v<decltype(richardson(Gr_t{}, typed<kinds::reynolds<kinds::height>>{})),
                             typed<kinds::richardson<kinds::height>>>);
template <class... A>
concept elenbaas_from = requires(const A&... a) { elenbaas(a...); };
using Rab_t = typed<kinds::rayleigh<kinds::gap>>;
using b_t = typed<kinds::gap>;
static_assert(elenbaas_from<Rab_t, b_t, H_t> && !elenbaas_from<Rab_t, H_t, b_t>);
static_assert(!elenbaas_from<Ra_t, b_t, H_t>);

}  // namespace static_test

TEST_CASE("Gr by hand: g beta dT L^3 / nu^2") {
  CHECK(grashof(rho, beta, dT, H, mu).si() == near(9.80665 * 0.06 * 0.125 / 4e-10));
  const auto moon = gravity(1.62 * metre_per_second / boost::units::si::seconds);
  CHECK(grashof(rho, beta, dT, H, mu, moon).si() == near(1.62 * 0.06 * 0.125 / 4e-10));
  // The sign is that of beta dT.
  CHECK(grashof(rho, beta, -1.0 * dT, H, mu).si() == near(-9.80665 * 0.06 * 0.125 / 4e-10));
  CHECK(grashof(rho, expansion_coefficient(-3e-3 * per_kelvin), dT, H, mu).si() < 0.0);
}

TEST_CASE("Ra: a vertical fire screen") {
  // Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, ex. 9.2 (from memory): 0.71 m
  // high, 232 C in air of 23 C; film 400 K: nu 26.41e-6, alpha 38.3e-6, beta 0.0025;
  // Ra = 1.813e9 with g = 9.8.
  const double nu = 26.41e-6;
  const auto Gr = grashof(
      density(1.0 * kilogram_per_cubic_metre), expansion_coefficient(0.0025 * per_kelvin),
      wall_temperature(celsius(232.0)) - ambient_temperature(celsius(23.0)), height(0.71 * metre),
      viscosity(nu * pascal_second), gravity(9.8 * metre_per_second / boost::units::si::seconds));
  CHECK(rayleigh(Gr, prandtl_number(nu / 38.3e-6)).si() == near(1.813e9, 1e-3));
}

TEST_CASE("Ri and El by hand") {
  CHECK(richardson(grashof_of<height>(4e8), reynolds_of<height>(1e4)).si() == near(4.0));
  CHECK(elenbaas(rayleigh_of<gap>(1e4), gap(0.01 * metre), height(0.25 * metre)).si() ==
        near(400.0));
}

TEST_CASE("verdict and scatter are carried") {
  const std::uint64_t a = word::of_fluid(0, side::above);
  const std::uint64_t b = word::of_fluid(1, side::below);
  const auto Gr = grashof(doubtful(rho, a), beta, dT, H, doubtful(mu, b));
  static_assert(std::is_same_v<decltype(Gr), const estimate<kinds::grashof<kinds::height>>>);
  CHECK(Gr.verdict().bits() == (a | b));
  const auto Ra = rayleigh(Gr, prandtl_number(0.7));
  CHECK(Ra.verdict().bits() == (a | b));
  CHECK(richardson(Gr, reynolds_of<height>(1e4)).verdict().bits() == (a | b));
  const auto El =
      elenbaas(doubtful(rayleigh_of<gap>(1e4), a), gap(0.01 * metre), height(0.25 * metre));
  CHECK(El.verdict().bits() == a);
  CHECK(El.scatter() == near(0.1));
}

TEST_CASE("derivatives: Gr is linear in dT") {
  using D = dual<double>;
  const auto wall = wall_temperature(kelvin(D::variable(320.0)));
  const auto Gr = grashof(rho, beta, wall - ambient_temperature(kelvin(D(300.0))), H, mu);
  CHECK(Gr.si().slope[0] == near(Gr.si().value / 20.0));
}
