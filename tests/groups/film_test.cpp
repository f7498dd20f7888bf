#include "convelope/groups/film.hpp"

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

const auto k = conductivity(0.6 * watt_per_metre_kelvin);
const auto d = diameter(0.02 * metre);
const auto Nu = nusselt_of<diameter>(100.0);
const auto h = film_coefficient(3000.0 * watt_per_square_metre_kelvin);
const auto dT = temperature_difference(20.0 * kelvin_difference);
const std::uint64_t a = word::of_fluid(0, side::above);
const std::uint64_t b = word::of_fluid(1, side::below);

}  // namespace

namespace static_test {

using k_t = typed<kinds::conductivity>;
using d_t = typed<kinds::diameter>;
using h_t = typed<kinds::film_coefficient>;
using hx_t = typed<kinds::local_film_coefficient>;
using mean_t = typed<kinds::nusselt<kinds::diameter>>;
using local_t = typed<kinds::local_nusselt<kinds::diameter>>;
template <class... A>
concept film_from = requires(const A&... x) { film_coefficient(x...); };
template <class... A>
concept local_film_from = requires(const A&... x) { local_film_coefficient(x...); };
static_assert(film_from<mean_t, k_t, d_t> && !film_from<local_t, k_t, d_t>);
static_assert(local_film_from<local_t, k_t, d_t> && !local_film_from<mean_t, k_t, d_t>);
static_assert(!film_from<mean_t, k_t, typed<kinds::hydraulic_diameter>>);
static_assert(!film_from<mean_t, d_t, k_t> && !film_from<mean_t, k_t> && !film_from<>);
static_assert(!film_from<double> && !film_from<typed<kinds::biot<kinds::diameter>>, k_t, d_t>);
static_assert(std::is_same_v<decltype(film_coefficient(Nu, k, d)), h_t>);
static_assert(std::is_same_v<decltype(local_film_coefficient(local_t{}, k, d)), hx_t>);
static_assert(std::is_same_v<decltype(nusselt(h, d, k)), mean_t>);
static_assert(std::is_same_v<decltype(biot(h, d, k)), typed<kinds::biot<kinds::diameter>>>);
static_assert(std::is_same_v<decltype(heat_flux_of(h, dT)), typed<kinds::heat_flux>>);

template <class... A>
concept nusselt_from = requires(const A&... x) { nusselt(x...); };
static_assert(!nusselt_from<hx_t, d_t, k_t> && !nusselt_from<typed<kinds::heat_flux>, d_t, k_t>);
template <class... A>
concept flux_from = requires(const A&... x) { heat_flux_of(x...); };
using dT_t = typed<kinds::temperature_difference>;
static_assert(flux_from<h_t, dT_t> && flux_from<hx_t, dT_t>);
static_assert(!flux_from<typed<kinds::flux_slope>, dT_t> && !flux_from<mean_t, dT_t>);
static_assert(!flux_from<hx_t, typed<kinds::wall_temperature>> && !flux_from<hx_t, double>);
static_assert(!flux_from<h_t, typed<kinds::wall_temperature>>);
template <class... A>
concept stanton_from = requires(const A&... x) { stanton(x...); };
using Re_t = typed<kinds::reynolds<kinds::diameter>>;
using Pr_t = typed<kinds::prandtl>;
static_assert(stanton_from<mean_t, Re_t, Pr_t> && !stanton_from<local_t, Re_t, Pr_t>);
static_assert(!stanton_from<mean_t, typed<kinds::reynolds<kinds::hydraulic_diameter>>, Pr_t>);
static_assert(!stanton_from<Re_t, mean_t, Pr_t> && !stanton_from<double, Re_t, Pr_t>);

}  // namespace static_test

TEST_CASE("h = Nu k / L and back") {
  CHECK(film_coefficient(Nu, k, d).si() == near(3000.0));
  CHECK(nusselt(film_coefficient(Nu, k, d), d, k).si() == near(100.0));
  CHECK(local_film_coefficient(local_nusselt_of<distance_from_edge>(50.0), k,
                               distance_from_edge(0.3 * metre))
            .si() == near(100.0));
  CHECK(film_coefficient(25.0F * watt_per_square_metre_kelvin).si() == 25.0F);
  // Incropera and DeWitt, Fundamentals of Heat and Mass Transfer, ex. 7.4 (from memory): Nu 40.6
  // on 12.7 mm, k = 0.030 gives 96 W/(m2 K).
  CHECK(film_coefficient(nusselt_of<diameter>(40.6), conductivity(0.030 * watt_per_metre_kelvin),
                         diameter(0.0127 * metre))
            .si() == near(96.0, 2e-3));
}

TEST_CASE("q = h dT, St and Bi by hand") {
  CHECK(heat_flux_of(h, dT).si() == near(6e4));
  CHECK(heat_flux_of(local_film_coefficient(10.0 * watt_per_square_metre_kelvin), dT).si() ==
        near(200.0));
  CHECK(stanton(Nu, reynolds_of<diameter>(1e4), prandtl_number(5.0)).si() == near(0.002));
  // A copper ball: h 20, L = r/3 = 4 mm, k 400.
  CHECK(biot(film_coefficient(20.0 * watt_per_square_metre_kelvin), radius(0.004 * metre),
             conductivity(400.0 * watt_per_metre_kelvin))
            .si() == near(2e-4));
}

TEST_CASE("verdict and scatter are carried") {
  const auto from_nu = film_coefficient(doubtful(Nu, a), doubtful(k, b), d);
  static_assert(std::is_same_v<decltype(from_nu), const estimate<kinds::film_coefficient>>);
  CHECK(from_nu.verdict().bits() == (a | b));
  CHECK(from_nu.scatter() == near(std::sqrt(0.02)));
  CHECK(nusselt(doubtful(h, a), d, k).verdict().bits() == a);
  CHECK(biot(doubtful(h, a), d, k).scatter() == near(0.1));
  CHECK(stanton(doubtful(Nu, a), reynolds_of<diameter>(1e4), doubtful(prandtl_number(5.0), b))
            .verdict()
            .bits() == (a | b));
  const auto q = heat_flux_of(doubtful(h, b), dT);
  static_assert(std::is_same_v<decltype(q), const estimate<kinds::heat_flux>>);
  CHECK(q.verdict().bits() == b);
}

TEST_CASE("derivatives: dq/dT_wall = h for a constant h") {
  using D = dual<double>;
  const auto wall = wall_temperature(kelvin(D::variable(320.0)));
  const auto q = heat_flux_of(h, wall - bulk_temperature(kelvin(D(300.0))));
  CHECK(q.si().value == near(6e4));
  CHECK(q.si().slope[0] == near(3000.0));
}
