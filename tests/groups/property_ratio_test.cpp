#include "convelope/groups/property_ratio.hpp"

#include <boost/multiprecision/cpp_bin_float.hpp>
#include <cmath>
#include <string>

#include "../correlations/check.hpp"
#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "convelope/correlations/external/flat_plate.hpp"
#include "convelope/correlations/external/sphere.hpp"
#include "convelope/correlations/friction/duct_friction.hpp"
#include "convelope/correlations/friction/entrance.hpp"
#include "convelope/correlations/internal/round_duct.hpp"

using namespace convelope;
using namespace check;
namespace r = convelope::property_ratio;

namespace {

exact to(double x, const exact& n) { return exact(pow(exact(x), n)); }

constexpr auto Re = reynolds_of<hydraulic_diameter>(5e4);
constexpr auto Pr = prandtl_number(5.0);
constexpr auto k = conductivity(0.6 * units::watt_per_metre_kelvin);
constexpr auto D = hydraulic_diameter(0.02 * units::metre);

}  // namespace

namespace static_test {
using convelope::detail::corrects_itself;
static_assert(corrects_itself<round_duct::hausen_1943>());
static_assert(corrects_itself<round_duct::gnielinski_1976>());
static_assert(corrects_itself<sphere::whitaker_1972>());
static_assert(!corrects_itself<round_duct::petukhov_kirillov_1958>());
static_assert(!corrects_itself<round_duct::gnielinski_laminar_uwt_mean>());
static_assert(!corrects_itself<flat_plate::petukhov_gnielinski_turbulent_average>());
struct says_so : round_duct::petukhov_kirillov_1958 {
  static constexpr bool wall_enters_formula = true;
};
static_assert(corrects_itself<says_so>());

template <class... A>
concept corrects = requires(const A&... a) { corrected_number(a...); };
using factor = typed<kinds::nusselt_correction>;
using friction_factor = typed<kinds::friction_correction>;
using mean = typed<kinds::nusselt<kinds::hydraulic_diameter>>;
using local = typed<kinds::local_nusselt<kinds::hydraulic_diameter>>;
using darcy = typed<kinds::darcy_friction>;
using fanning = typed<kinds::fanning_friction>;
static_assert(corrects<mean, factor> && corrects<local, factor>);
static_assert(corrects<darcy, friction_factor> && corrects<fanning, friction_factor>);
static_assert(!corrects<mean, friction_factor> && !corrects<darcy, factor>);
static_assert(!corrects<mean, mean> && !corrects<factor, factor> && !corrects<mean, double>);
static_assert(!corrects<typed<kinds::prandtl>, factor>);
// A corrected number takes no second factor.
static_assert(!corrects<typed<kinds::corrected<kinds::nusselt<kinds::diameter>>>, factor>);
static_assert(!corrects<typed<kinds::corrected<kinds::darcy_friction>>, friction_factor>);
static_assert(std::is_same_v<decltype(corrected_number(mean{}, factor{})),
                             typed<kinds::corrected<kinds::nusselt<kinds::hydraulic_diameter>>>>);
static_assert(std::is_same_v<decltype(corrected_number(fanning{}, friction_factor{})),
                             typed<kinds::corrected<kinds::fanning_friction>>>);

// It stands for its plain number where h is made, on its own length only.
template <class... A>
concept film_from = requires(const A&... a) { film_coefficient(a...); };
template <class... A>
concept local_film_from = requires(const A&... a) { local_film_coefficient(a...); };
template <class K>
using twice = typed<kinds::corrected<K>>;
using k_t = typed<kinds::conductivity>;
using d_t = typed<kinds::hydraulic_diameter>;
static_assert(film_from<twice<kinds::nusselt<kinds::hydraulic_diameter>>, k_t, d_t>);
static_assert(!film_from<twice<kinds::nusselt<kinds::diameter>>, k_t, d_t>);
static_assert(!film_from<twice<kinds::local_nusselt<kinds::hydraulic_diameter>>, k_t, d_t>);
static_assert(local_film_from<twice<kinds::local_nusselt<kinds::hydraulic_diameter>>, k_t, d_t>);
}  // namespace static_test

TEST_CASE("liquids: against plain powers in 50 digits") {
  for (const double x : {0.0044, 0.3, 0.999, 1.0, 1.001, 2.5, 9.75}) {
    const bool hot = x > 1.0;  // a heated liquid is thinner at the wall
    check_value<r::sieder_tate_1936>(to(x, 0.14_exact), x);
    check_value<r::petukhov_1970>(to(x, hot ? 0.11_exact : 0.25_exact), x);
    check_value<r::gnielinski_1976_liquid>(to(x, 0.11_exact), x);
    check_value<r::zukauskas_1972>(to(x, 0.25_exact), x);
    check_value<r::gnielinski_1975_liquid>(to(x, hot ? 0.25_exact : 0.11_exact), x);
  }
  for (const double x : {1.001, 1.5, 2.857}) {
    check_value<r::petukhov_1970_friction>((7 - exact(x)) / 6, x);
  }
  for (const double x : {0.5, 0.8, 0.999, 1.0}) {
    check_value<r::petukhov_1970_friction>(to(1.0, 1) / to(x, 0.24_exact), x);
  }
}

TEST_CASE("gases: against plain powers in 50 digits") {
  for (const double x : {0.2, 0.4, 0.7, 0.999, 1.0, 1.001, 1.3, 2.0, 2.6}) {
    const bool hot = x < 1.0;  // a heated gas is hotter at the wall
    const exact wall_over_bulk = 1 / exact(x);
    check_value<r::gnielinski_1976_gas>(hot ? to(x, 0.45_exact) : exact(1), x);
    check_value<r::kays_crawford_gas>(hot ? to(x, 0.5_exact) : exact(1), x);
    const exact more = hot ? exact(0.3_exact * log10(wall_over_bulk)) : exact(0);
    check_value<r::petukhov_kirillov_maidanik_1966>(
        exact(pow(wall_over_bulk, -(more + 0.36_exact))), x);
    check_value<r::gnielinski_1975_gas>(to(x, 0.12_exact), x);
    check_value<r::kays_crawford_plate>(to(x, 0.4_exact), x);
    check_value<r::kays_crawford_gas_friction>(exact(pow(wall_over_bulk, -0.1_exact)), x);
    check_value<r::kays_crawford_laminar_gas_friction>(
        exact(pow(wall_over_bulk, hot ? exact(1) : 0.81_exact)), x);
  }
}

TEST_CASE("on every number type, on both sides of 1") {
  for (const double x : {0.6, 1.7}) {
    check_scalars<r::sieder_tate_1936>(x);
    check_scalars<r::petukhov_1970>(x);
    check_scalars<r::gnielinski_1976_liquid>(x);
    check_scalars<r::zukauskas_1972>(x);
    check_scalars<r::gnielinski_1975_liquid>(x);
    check_scalars<r::gnielinski_1976_gas>(x);
    check_scalars<r::kays_crawford_gas>(x);
    check_scalars<r::petukhov_kirillov_maidanik_1966>(x);
    check_scalars<r::gnielinski_1975_gas>(x);
    check_scalars<r::kays_crawford_plate>(x);
    check_scalars<r::petukhov_1970_friction>(x);
    check_scalars<r::kays_crawford_gas_friction>(x);
    check_scalars<r::kays_crawford_laminar_gas_friction>(x);
  }
}

namespace {
template <class C>
void limits(double low, double high) {
  expect_inside<C>(low);
  expect_inside<C>(high);
  expect_crossed<C>(0, side::below, below(low));
  expect_crossed<C>(0, side::above, above(high));
  expect_not_finite<C>(1.0);
}
}  // namespace

TEST_CASE("envelopes and records") {
  limits<r::sieder_tate_1936>(0.0044, 9.75);
  limits<r::petukhov_1970>(0.025, 12.5);  // mu_w/mu_b 40 .. 0.08
  limits<r::gnielinski_1976_liquid>(0.05, 20.0);
  limits<r::gnielinski_1975_liquid>(0.1, 10.0);
  limits<r::gnielinski_1976_gas>(0.5, 2.0);
  limits<r::kays_crawford_gas>(0.2, 2.0);
  limits<r::petukhov_kirillov_maidanik_1966>(0.32258064516129031, 2.7027027027027026);
  limits<r::gnielinski_1975_gas>(0.5, 2.0);
  limits<r::kays_crawford_plate>(0.25, 1.0);
  limits<r::petukhov_1970_friction>(0.5, 2.8571428571428572);  // mu_w/mu_b 2 .. 0.35
  limits<r::kays_crawford_gas_friction>(0.2, 2.0);
  limits<r::kays_crawford_laminar_gas_friction>(0.33333333333333331, 2.0);
  expect_not_finite<r::zukauskas_1972>(1.0);

  const auto wall = state_rule::free_stream_with_wall;
  expect_record<r::sieder_tate_1936>("property-factor/sieder-tate-1936", "Nu_over_Nucp", not_stated,
                                     state_rule::bulk);
  expect_record<r::petukhov_1970_friction>("property-factor/petukhov-1970-friction", "f_over_fcp",
                                           not_stated, state_rule::bulk);
  expect_record<r::gnielinski_1975_gas>("property-factor/gnielinski-1975-gas", "Nu_over_Nucp",
                                        not_stated, wall);
  expect_keys<r::sieder_tate_1936>("mu_b_over_mu_w");
  expect_keys<r::gnielinski_1976_liquid>("Pr_b_over_Pr_w");
  expect_keys<r::gnielinski_1975_liquid>("Pr_over_Pr_w");
  expect_keys<r::gnielinski_1976_gas>("Tb_over_Tw");
  expect_keys<r::gnielinski_1975_gas>("Tinf_over_Tw");
}

// J. P. Holman, Heat Transfer, example "heating of water in laminar tube flow" (from memory): water
// enters a tube of 25.4 mm by 3 m at 60 degC, wall 80 degC: Re 1062, Pr 3.020, mu 4.71e-4,
// mu_w 3.55e-4; Nu = 1.86 (Re Pr D/L)^(1/3) (mu/mu_w)^0.14 = 5.816 (Sieder and Tate 1936).
TEST_CASE("worked example: water heated in a tube, laminar") {
  const double without = 1.86 * std::cbrt(1062.0 * 3.020 * 0.0254 / 3.0);
  const auto K = r::sieder_tate_1936{}(viscosity_ratio(4.71 / 3.55));
  CHECK(K.inside());
  const auto Nu = corrected_number(nusselt_of<hydraulic_diameter>(without), K);
  CHECK(Nu.si() == doctest::Approx(5.816).epsilon(2e-4));
  CHECK(without < 0.97 * 5.816);
}

// Laws of different authors for the same fluids.
TEST_CASE("authors agree where their ranges meet") {
  const double g = r::gnielinski_1976_gas::formula(0.5);
  CHECK(r::petukhov_kirillov_maidanik_1966::formula(0.5) == doctest::Approx(g).epsilon(0.001));
  CHECK(r::kays_crawford_gas::formula(0.5) == doctest::Approx(g).epsilon(0.04));
  // A liquid's Prandtl number follows its viscosity.
  for (const double x : {0.3, 3.0, 10.0}) {
    const double p = r::petukhov_1970::formula(x);
    CHECK(r::sieder_tate_1936::formula(x) == doctest::Approx(p).epsilon(0.16));
    CHECK(r::gnielinski_1976_liquid::formula(x) == doctest::Approx(p).epsilon(0.19));
  }
  // Friction of liquids: Petukhov and Deissler.
  using deissler = friction::property_correction_liquid;
  for (const double x : {0.5, 0.8, 1.25, 2.0}) {
    CHECK(r::petukhov_1970_friction::formula(x) ==
          doctest::Approx(deissler::formula(x, friction::regime::turbulent,
                                            x > 1.0 ? friction::direction::heating
                                                    : friction::direction::cooling))
              .epsilon(0.04));
  }
}

TEST_CASE("the laws that hold a ratio hold the same one") {
  for (const double x : {0.6, 1.7}) {
    CHECK(round_duct::hausen_1943::formula(100.0, x) ==
          doctest::Approx(round_duct::hausen_1943::formula(100.0, 1.0) *
                          r::sieder_tate_1936::formula(x))
              .epsilon(1e-14));
    const auto gnielinski = [](double by_Pr, double by_T) {
      return round_duct::gnielinski_1976::formula(1e5, 5.0, 50.0, by_Pr, by_T);
    };
    CHECK(gnielinski(x, 1.0) ==
          doctest::Approx(gnielinski(1.0, 1.0) * r::gnielinski_1976_liquid::formula(x))
              .epsilon(1e-14));
  }
  CHECK(round_duct::gnielinski_1976::formula(1e5, 0.7, 50.0, 1.0, 0.6) ==
        doctest::Approx(round_duct::gnielinski_1976::formula(1e5, 0.7, 50.0, 1.0, 1.0) *
                        r::gnielinski_1976_gas::formula(0.6))
            .epsilon(1e-14));
}

TEST_CASE("corrected<C>: the product, of another kind, and h from it") {
  const auto K = r::petukhov_1970{}(viscosity_ratio(2.0));
  const auto plain_Nu = round_duct::petukhov_kirillov_1958{}(Re, Pr);
  const auto Nu = corrected<round_duct::petukhov_kirillov_1958>(K, Re, Pr);
  static_assert(
      std::is_same_v<decltype(Nu),
                     const estimate<kinds::corrected<kinds::nusselt<kinds::hydraulic_diameter>>>>);
  CHECK(Nu.si() == doctest::Approx(plain_Nu.si() * std::pow(2.0, 0.11)).epsilon(1e-13));
  const auto h = film_coefficient(Nu, k, D);
  static_assert(std::is_same_v<decltype(h), const estimate<kinds::film_coefficient>>);
  CHECK(h.si() == doctest::Approx(Nu.si() * 0.6 / 0.02).epsilon(1e-14));
  CHECK(stanton(Nu, Re, Pr).si() == doctest::Approx(Nu.si() / 2.5e5).epsilon(1e-14));

  // A plate in a free stream, the wall by a factor.
  const auto plate = corrected<flat_plate::petukhov_gnielinski_turbulent_average>(
      r::gnielinski_1975_gas{}(temperature_ratio(0.75)), reynolds_of<plate_length>(1e6),
      prandtl_number(0.7));
  CHECK(plate.si() ==
        doctest::Approx(flat_plate::petukhov_gnielinski_turbulent_average::formula(1e6, 0.7) *
                        std::pow(0.75, 0.12))
            .epsilon(1e-13));
  // Friction, by a factor from either header.
  const auto f_0 = friction::filonenko_1954{}(Re);
  const auto f_1 =
      corrected<friction::filonenko_1954>(r::petukhov_1970_friction{}(viscosity_ratio(2.0)), Re);
  static_assert(
      std::is_same_v<decltype(f_1), const estimate<kinds::corrected<kinds::darcy_friction>>>);
  CHECK(f_1.si() == doctest::Approx(f_0.si() * 5.0 / 6.0).epsilon(1e-14));
  const auto f_2 = corrected<friction::filonenko_1954>(
      friction::property_correction_liquid{}(viscosity_ratio(2.0), friction::regime::turbulent,
                                             friction::direction::heating),
      Re);
  CHECK(f_2.si() == doctest::Approx(f_0.si() * std::pow(2.0, -0.25)).epsilon(1e-13));
}

TEST_CASE("corrected<C>: what either crosses is told") {
  using law = round_duct::petukhov_kirillov_1958;
  const auto inside = corrected<law>(r::petukhov_1970{}(viscosity_ratio(2.0)), Re, Pr);
  CHECK(inside.inside());
  CHECK(inside.scatter() == doctest::Approx(0.1));
  CHECK_FALSE(inside.verdict().scatter_stated());  // the factor's is not
  REQUIRE(inside.correlation() != nullptr);
  CHECK(std::string(inside.correlation()->id) == law::id);

  const auto thick = corrected<law>(r::petukhov_1970{}(viscosity_ratio(20.0)), Re, Pr);
  CHECK_FALSE(thick.inside());
  CHECK_FALSE(thick.verdict().correlation_outside(0));  // not the law's own limit
  const auto slow = corrected<law>(r::petukhov_1970{}(viscosity_ratio(2.0)),
                                   reynolds_of<hydraulic_diameter>(5e3), Pr);
  CHECK(slow.verdict().correlation_crossed(0, 0, side::below));
}

TEST_CASE("temperature ratio of a stream and a wall, floats and derivatives") {
  const auto wall = wall_temperature(kelvin(400.0));
  CHECK(temperature_ratio_between(wall, bulk_temperature(kelvin(300.0))).si() == 0.75);
  using S = dual<double>;
  const auto hot = wall_temperature(kelvin(S::variable(400.0)));
  const auto K =
      r::kays_crawford_gas{}(temperature_ratio_between(hot, bulk_temperature(kelvin(S(300.0)))));
  CHECK(K.si().slope[0] == doctest::Approx(-0.5 * std::sqrt(0.75) / 400.0).epsilon(1e-13));
  const auto as_float = corrected<round_duct::petukhov_kirillov_1958>(
      r::petukhov_1970{}(viscosity_ratio(2.0F)), reynolds_of<hydraulic_diameter>(5e4F),
      prandtl_number(5.0F));
  static_assert(std::is_same_v<decltype(as_float)::value_type, float>);
  CHECK(static_cast<double>(as_float.si()) ==
        doctest::Approx(round_duct::petukhov_kirillov_1958::formula(5e4, 5.0) * std::pow(2.0, 0.11))
            .epsilon(1e-5));
}
