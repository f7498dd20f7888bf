#include "convelope/groups/forced.hpp"

#include <doctest/doctest.h>

#include "convelope/scalar/std_simd.hpp"

using namespace convelope;
namespace word = convelope::detail::word;

namespace {

using namespace convelope::units;
doctest::Approx near(double x, double relative = 1e-14) {
  return doctest::Approx(x).epsilon(relative);
}
// An estimate of 10 % scatter with a bit of its own.
template <class K>
estimate<K> doubtful(const typed<K>& x, std::uint64_t bit) {
  return {x.si(), verdict<>(bit), 0.01, nullptr, nullptr};
}

const auto rho = density(1.2 * kilogram_per_cubic_metre);
const auto u = free_stream_velocity(3.0 * metre_per_second);
const auto d = diameter(0.05 * metre);
const auto mu = viscosity(1.8e-5 * pascal_second);
const auto nu = kinematic_viscosity(1.5e-5 * square_metre_per_second);
const auto Re_duct = reynolds_of<hydraulic_diameter>(1200.0);
const auto Dh = hydraulic_diameter(0.02 * metre);

}  // namespace

namespace static_test {

template <class... A>
concept reynolds_from = requires(const A&... a) { reynolds(a...); };
using rho_t = typed<kinds::density>;
using u_t = typed<kinds::free_stream_velocity>;
using d_t = typed<kinds::diameter>;
using mu_t = typed<kinds::viscosity>;
using nu_t = typed<kinds::kinematic_viscosity>;
static_assert(reynolds_from<rho_t, u_t, d_t, mu_t> && reynolds_from<u_t, d_t, nu_t>);
static_assert(!reynolds_from<u_t, d_t, mu_t> && !reynolds_from<rho_t, u_t, d_t, nu_t>);
static_assert(!reynolds_from<u_t, d_t, typed<kinds::thermal_diffusivity>>);
static_assert(!reynolds_from<rho_t, d_t, u_t, mu_t> && !reynolds_from<u_t, d_t>);
static_assert(!reynolds_from<rho_t, u_t, d_t, double> && !reynolds_from<double, double, double>);
template <class... A>
concept prandtl_from = requires(const A&... a) { prandtl(a...); };
using cp_t = typed<kinds::specific_heat>;
using k_t = typed<kinds::conductivity>;
static_assert(prandtl_from<cp_t, mu_t, k_t> && !prandtl_from<k_t, mu_t, cp_t>);
static_assert(!prandtl_from<cp_t, nu_t, k_t>);

// The result's kind follows from the arguments.
static_assert(std::is_same_v<decltype(reynolds(rho, u, d, mu)),
                             typed<kinds::reynolds<kinds::diameter, kinds::free_stream_velocity>>>);
static_assert(
    std::is_same_v<decltype(reynolds(typed<kinds::mean_velocity>{},
                                     typed<kinds::hydraulic_diameter>{}, nu)),
                   typed<kinds::reynolds<kinds::hydraulic_diameter, kinds::mean_velocity>>>);
static_assert(std::is_same_v<decltype(reynolds(typed<kinds::mean_velocity>{}, d, nu)),
                             typed<kinds::reynolds<kinds::diameter, kinds::mean_velocity>>>);
static_assert(std::is_same_v<decltype(peclet(reynolds(u, d, nu), prandtl_number(1.0))),
                             typed<kinds::peclet<kinds::diameter>>>);
static_assert(
    std::is_same_v<decltype(dean(Re_duct, Dh, typed<kinds::coil_diameter>{})), typed<kinds::dean>>);
template <class... A>
concept graetz_from = requires(const A&... a) {
  graetz(a...);
  thermal_entry_coordinate(a...);
};
using Pr_t = typed<kinds::prandtl>;
using Re_t = typed<kinds::reynolds<kinds::hydraulic_diameter>>;
using Dh_t = typed<kinds::hydraulic_diameter>;
using x_t = typed<kinds::distance_from_inlet>;
static_assert(graetz_from<Re_t, Pr_t, Dh_t, x_t>);
static_assert(graetz_from<Re_t, Pr_t, Dh_t, typed<kinds::duct_length>>);
static_assert(!graetz_from<Re_t, Pr_t, Dh_t, typed<kinds::distance_from_edge>>);
static_assert(!graetz_from<Re_t, Pr_t, d_t, x_t> && !graetz_from<Re_t, Pr_t, x_t, Dh_t>);
static_assert(!graetz_from<typed<kinds::reynolds<kinds::diameter>>, Pr_t, Dh_t, x_t>);
template <class... A>
concept taylor_from = requires(const A&... a) { taylor(a...); };
using gap_t = typed<kinds::gap>;
using radius_t = typed<kinds::radius>;
static_assert(taylor_from<typed<kinds::reynolds<kinds::gap>>, gap_t, radius_t>);
static_assert(!taylor_from<typed<kinds::reynolds<kinds::gap>>, radius_t, gap_t>);
static_assert(
    !taylor_from<typed<kinds::reynolds<kinds::gap, kinds::mean_velocity>>, gap_t, radius_t>);

}  // namespace static_test

TEST_CASE("Re by hand, both ways") {
  CHECK(reynolds(rho, u, d, mu).si() == near(1e4));
  CHECK(reynolds(u, d, nu).si() == near(1e4));
  // Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, ex. 7.4 (from memory): 10 m/s of
  // air, nu = 15.89e-6 m2/s, past 12.7 mm gives Re = 7992.
  CHECK(reynolds(free_stream_velocity(10.0 * metre_per_second), diameter(0.0127 * metre),
                 kinematic_viscosity(15.89e-6 * square_metre_per_second))
            .si() == near(7992.0, 1e-4));
}

TEST_CASE("Pr by hand") {
  // Water at 300 K in the same book's table A.6 (from memory): cp 4179, mu 855e-6, k 0.613,
  // Pr 5.83.
  CHECK(prandtl(specific_heat(4179.0 * joule_per_kilogram_kelvin),
                viscosity(855e-6 * pascal_second), conductivity(0.613 * watt_per_metre_kelvin))
            .si() == near(5.83, 1e-3));
}

TEST_CASE("Pe, x_star and Gz by hand; x_star Gz = 1") {
  const auto Pr = prandtl_number(5.0);
  const auto x = distance_from_inlet(3.0 * metre);
  CHECK(peclet(Re_duct, Pr).si() == near(6000.0));
  CHECK(thermal_entry_coordinate(Re_duct, Pr, Dh, x).si() == near(150.0 / 6000.0));
  CHECK(graetz(Re_duct, Pr, Dh, x).si() == near(40.0));
  CHECK(graetz(Re_duct, Pr, Dh, duct_length(6.0 * metre)).si() == near(20.0));
}

TEST_CASE("De and Ta by hand; Ta is not squared") {
  CHECK(dean(Re_duct, Dh, coil_diameter(0.5 * metre)).si() == near(1200.0 * 0.2));
  // Taylor 1923: a narrow gap turns over at Re sqrt(b/R) = 41.3; here b/R = 0.01.
  CHECK(taylor(reynolds_of<gap>(413.0), gap(1e-3 * metre), radius(0.1 * metre)).si() == near(41.3));
}

TEST_CASE("an estimate in, an estimate out: verdicts and scatter carried") {
  const std::uint64_t a = word::of_fluid(0, side::above);
  const std::uint64_t b = word::of_fluid(1, side::below);
  const auto Re = reynolds(doubtful(rho, a), u, d, doubtful(mu, b));
  static_assert(std::is_same_v<decltype(Re), const estimate<kinds::reynolds<kinds::diameter>>>);
  CHECK(Re.si() == near(1e4));
  CHECK(Re.verdict().bits() == (a | b));
  CHECK(Re.scatter() == near(std::sqrt(0.02)));
  CHECK(reynolds(u, d, doubtful(nu, a)).verdict().bits() == a);
  const auto Pr = doubtful(prandtl_number(5.0), b);
  const auto x = distance_from_inlet(3.0 * metre);
  CHECK(peclet(Re, Pr).verdict().bits() == (a | b));
  CHECK(graetz(Re_duct, Pr, Dh, x).verdict().bits() == b);
  CHECK(thermal_entry_coordinate(Re_duct, Pr, Dh, x).scatter() == near(0.1));
  CHECK(dean(doubtful(Re_duct, a), Dh, coil_diameter(0.5 * metre)).verdict().bits() == a);
  CHECK(taylor(doubtful(reynolds_of<gap>(413.0), a), gap(1e-3 * metre), radius(0.1 * metre))
            .verdict()
            .bits() == a);
}

TEST_CASE("derivatives and lanes go through a group") {
  using D = dual<double>;
  const auto speed = free_stream_velocity(D::variable(3.0) * metre_per_second);
  const auto Re = reynolds(rho, speed, d, mu);
  CHECK(Re.si().value == near(1e4));
  CHECK(Re.si().slope[0] == near(1e4 / 3.0));
  using pack = std::experimental::native_simd<double>;
  const auto lanes = reynolds(
      typed<kinds::free_stream_velocity, pack>::from_si(pack([](auto i) { return 3.0 * (i + 1); })),
      d, nu);
  for (std::size_t i = 0; i < pack::size(); ++i) {
    CHECK(double(lanes.si()[i]) == near(1e4 * static_cast<double>(i + 1)));
  }
}
