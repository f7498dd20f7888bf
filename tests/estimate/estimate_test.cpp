#include "convelope/estimate/estimate.hpp"

#include <doctest/doctest.h>

#include "convelope/groups.hpp"
#include "convelope/scalar/std_simd.hpp"
#include "invented.hpp"

using namespace convelope;
namespace word = convelope::detail::word;
using invented::everything;
using invented::oil;
using invented::reynolds_from_prandtl;

namespace static_test {

using h = estimate<kinds::film_coefficient>;
using nested = estimate<kinds::film_coefficient, dual<dual<double>>>;
using pack = std::experimental::simd<double, std::experimental::simd_abi::deduce_t<double, 2>>;
static_assert(std::is_trivially_copyable_v<h> && sizeof(h) == 40);
static_assert(std::is_trivially_copyable_v<nested> && sizeof(nested) <= 128);
static_assert(std::is_trivially_copyable_v<estimate<kinds::film_coefficient, pack>> &&
              sizeof(estimate<kinds::film_coefficient, pack>) <= 128);
static_assert(std::is_trivially_default_constructible_v<h>);
static_assert(std::is_nothrow_copy_constructible_v<h> && std::is_nothrow_move_assignable_v<nested>);
static_assert(has_kind<h> && measures<h, kinds::film_coefficient>);
static_assert(!measures<h, kinds::local_film_coefficient>);

template <class A, class B>
concept add = requires(const A& a, const B& b) { a + b; };
template <class A, class B>
concept subtract = requires(const A& a, const B& b) { a - b; };
using slope = estimate<kinds::flux_slope>;
static_assert(add<h, h> && subtract<h, h>);
static_assert(!add<h, slope> && !subtract<h, slope> && !add<h, double> && !add<double, h>);
static_assert(!add<h, typed<kinds::flux_slope>> && !subtract<typed<kinds::flux_slope>, h>);
static_assert(!std::is_convertible_v<h, double> && !std::is_convertible_v<double, h>);
static_assert(!std::is_convertible_v<h, slope> && !std::is_assignable_v<h&, slope>);

}  // namespace static_test

namespace {

estimate<kinds::film_coefficient> given(double si, std::uint64_t bits, double variance,
                                        const correlation_info* c = nullptr,
                                        const fluid_info* f = nullptr) {
  return {si, verdict<>(bits), variance, c, f};
}
const correlation_info* const a_record = &convelope::detail::record_of<everything>;
const correlation_info* const b_record = &convelope::detail::record_of<reynolds_from_prandtl>;
doctest::Approx near(double x) { return doctest::Approx(x).epsilon(1e-14); }

}  // namespace

TEST_CASE("an estimate gives back what it was made of") {
  const auto h = given(25.0, 5, 0.04, a_record, &oil);
  CHECK(h.si() == 25.0);
  CHECK(h.number().si() == 25.0);
  CHECK(h.quantity().value() == 25.0);
  CHECK(h.verdict().bits() == 5);
  CHECK(h.variance() == 0.04);
  CHECK(h.scatter() == near(0.2));
  CHECK(h.correlation() == a_record);
  CHECK(h.fluid() == &oil);
  CHECK_FALSE(h.inside());
  CHECK(given(25.0, 0, 0.0).inside());
}

TEST_CASE("a multiple keeps everything but the number") {
  const auto h = 2.0 * given(25.0, 5, 0.04, a_record, &oil);
  CHECK(h.si() == 50.0);
  CHECK(h.verdict().bits() == 5);
  CHECK(h.variance() == 0.04);
  CHECK(h.correlation() == a_record);
  CHECK(h.fluid() == &oil);
}

TEST_CASE("a sum: absolute bands add in squares") {
  const auto sum = given(30.0, 1, 0.01) + given(40.0, 4, 0.0225);
  CHECK(sum.si() == 70.0);
  CHECK(sum.scatter() == near(std::sqrt(3.0 * 3.0 + 6.0 * 6.0) / 70.0));
  const auto difference = given(40.0, 0, 0.0225) - given(30.0, 0, 0.01);
  CHECK(difference.si() == 10.0);
  CHECK(difference.scatter() == near(std::sqrt(3.0 * 3.0 + 6.0 * 6.0) / 10.0));
}

TEST_CASE("a sum of one correlation's answers keeps its limits; of two, says that inputs crossed") {
  const auto one = given(1.0, 1, 0.0, a_record, &oil) + given(1.0, 4, 0.0, a_record, &oil);
  CHECK(one.verdict().bits() == 5);
  CHECK(one.correlation() == a_record);
  CHECK(one.fluid() == &oil);
  const std::uint64_t of_oil = word::of_fluid(1, side::above);
  const auto two = given(1.0, 1 | of_oil, 0.0, a_record, &oil) + given(1.0, 0, 0.0, b_record);
  CHECK(two.verdict().bits() == (word::input_outside | of_oil));
  CHECK(two.correlation() == nullptr);
  CHECK(two.fluid() == nullptr);
  const auto inside = given(1.0, 0, 0.0, a_record) - given(1.0, 0, 0.0, b_record);
  CHECK(inside.verdict().bits() == 0);
}

TEST_CASE("products and quotients: every verdict inherited, scatters combined") {
  const auto d = diameter(0.1 * units::metre);
  const estimate<kinds::conductivity> k(0.5, verdict<>(word::of_fluid(0, side::below)), 0.0009,
                                        nullptr, &oil);
  const auto Nu = everything{}(reynolds_of<diameter>(50.0), invented::Pr_in, invented::ratio_in);
  const auto h = film_coefficient(Nu, k, d);
  static_assert(std::is_same_v<decltype(h), const estimate<kinds::film_coefficient>>);
  CHECK(h.si() == near(27.0 * 0.5 / 0.1));
  CHECK(h.verdict().bits() ==
        (word::of_correlation(0, 0, side::below) | word::of_fluid(0, side::below)));
  CHECK(h.scatter() == near(std::sqrt(0.03 * 0.03 + 0.03 * 0.03)));
  CHECK(h.correlation() == a_record);
  CHECK(h.fluid() == &oil);
  // Typed numbers alone stay typed.
  const auto plain = film_coefficient(nusselt_of<diameter>(27.0),
                                      conductivity(0.5 * units::watt_per_metre_kelvin), d);
  static_assert(std::is_same_v<decltype(plain), const typed<kinds::film_coefficient>>);
}

TEST_CASE("a product of two correlations' answers: the limits told are those of the first") {
  const auto Re = reynolds_from_prandtl{}(prandtl_number(200.0));  // above its range
  const auto Nu = everything{}(invented::Re_in, invented::Pr_in, invented::ratio_in);
  const auto St = stanton(Nu, Re, invented::Pr_in);
  CHECK(St.correlation() == a_record);
  CHECK_FALSE(St.verdict().correlation_outside(0));
  CHECK(St.verdict().input_outside());
  CHECK_FALSE(St.inside());
}

TEST_CASE("sums in single precision and in packs") {
  const estimate<kinds::heat_flux, float> q(3.0F, verdict<>(0), 0.01F, nullptr, nullptr);
  CHECK((q + q).scatter() == doctest::Approx(0.1 / std::sqrt(2.0)));
  using pack = std::experimental::native_simd<float>;
  const estimate<kinds::heat_flux, pack> p(pack(3.0F), verdict<bits_t<pack>>(bits_t<pack>(0)),
                                           pack(0.01F), nullptr, nullptr);
  const pack s = (p + p).scatter();
  for (std::size_t i = 0; i < pack::size(); ++i) {
    CHECK(float(s[i]) == doctest::Approx(0.1 / std::sqrt(2.0)));
  }
}
