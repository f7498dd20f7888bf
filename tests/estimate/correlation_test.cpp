#include "convelope/estimate/correlation.hpp"

#include <doctest/doctest.h>

#include <string_view>

#include "../scalar/host_number.hpp"
#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "convelope/scalar/std_simd.hpp"
#include "edges.hpp"
#include "invented.hpp"

using namespace convelope;
using namespace invented;
namespace word = convelope::detail::word;
using published = cylinder_crossflow::churchill_bernstein_1977;
using std::string_view;

namespace static_test {

template <class C, class... In>
concept accepts = requires(const In&... in) { C{}(in...); };
template <class C, class... In>
concept accepts_clamped = requires(const In&... in) { C{}.under(policy::clamp)(in...); };

using Re = typed<kinds::reynolds<kinds::diameter>>;
using Pr = typed<kinds::prandtl>;
static_assert(accepts<published, Re, Pr> && accepts_clamped<published, Re, Pr>);
static_assert(accepts<published, typed<Re::kind_type, float>, Pr>);
static_assert(accepts<published, estimate<Re::kind_type>, estimate<kinds::prandtl>>);
static_assert(!accepts<published, Pr, Re> && !accepts_clamped<published, Pr, Re>);
static_assert(!accepts<published, double, double> && !accepts<published, Re, double>);
static_assert(!accepts<published, Re, int> && !accepts<published, Re>);
static_assert(!accepts<published, Re, Pr, Pr> && !accepts<published>);
static_assert(!accepts<published, typed<kinds::reynolds<kinds::hydraulic_diameter>>, Pr>);
static_assert(!accepts<published, typed<kinds::reynolds<kinds::plate_length>>, Pr>);
static_assert(
    !accepts<published, typed<kinds::reynolds<kinds::diameter, kinds::mean_velocity>>, Pr>);
static_assert(
    !accepts<published, typed<kinds::reynolds<kinds::diameter, kinds::minimum_section_velocity>>,
             Pr>);
static_assert(!accepts<published, estimate<kinds::nusselt<kinds::diameter>>, Pr>);
static_assert(accepts<with_choice, Re, rows, typed<kinds::viscosity_ratio>>);
static_assert(!accepts<with_choice, Re, int, typed<kinds::viscosity_ratio>>);
static_assert(accepts<developed> && !accepts<developed, Re>);

static_assert(
    std::is_same_v<decltype(published{}(Re{}, Pr{})), estimate<kinds::nusselt<kinds::diameter>>>);
static_assert(std::is_empty_v<published>);
// In constant expressions, where the formula is.
static_assert(everything{}(Re_in, Pr_in, ratio_in).si() == 502.0);
static_assert(everything{}(Re_in, Pr_in, ratio_in).inside());

}  // namespace static_test

TEST_CASE("the call gives the formula's number, its record and its scatter") {
  const auto Nu = everything{}(Re_in, Pr_in, ratio_in);
  CHECK(Nu.si() == 502.0);
  CHECK(Nu.scatter() == doctest::Approx(0.03).epsilon(1e-15));
  CHECK(Nu.correlation() == &convelope::detail::record_of<everything>);
  CHECK(Nu.fluid() == nullptr);
  CHECK(Nu.verdict().scatter_stated());
  const auto Re = reynolds_from_prandtl{}(Pr_in);
  CHECK(Re.si() == 20.0);
  CHECK(Re.scatter() == 0.0);
  CHECK_FALSE(Re.verdict().scatter_stated());
  CHECK(Re.inside());
}

TEST_CASE("mixed number types: the answer holds all of them") {
  using D = dual<double>;
  const auto y = everything{}(reynolds_of<diameter>(D::variable(1000.0)), Pr_in, ratio_in);
  static_assert(std::is_same_v<decltype(y)::value_type, D>);
  static_assert(std::is_same_v<std::remove_cvref_t<decltype(y.variance())>, double>);
  CHECK(y.si().value == 502.0);
  CHECK(y.si().slope[0] == 0.5);
  CHECK(y.inside());
  const auto f =
      everything{}(reynolds_of<diameter>(1000.0F), prandtl_number(2.0F), length_ratio(20.0F));
  static_assert(std::is_same_v<decltype(f)::value_type, float>);
  CHECK(f.si() == 502.0F);
  const auto wide = everything{}(reynolds_of<diameter>(1000.0F), Pr_in, length_ratio(20.0L));
  static_assert(std::is_same_v<decltype(wide)::value_type, long double>);
  CHECK(wide.si() == 502.0L);
  using pack = std::experimental::native_simd<double>;
  const auto p =
      everything{}(reynolds_of<diameter>(dual<pack>::variable(pack(1000.0))), Pr_in, ratio_in);
  for (std::size_t i = 0; i < pack::size(); ++i) {
    CHECK(double(p.si().value[i]) == 502.0);
    CHECK(double(p.si().slope[0][i]) == 0.5);
  }
}

TEST_CASE("a host's number goes through a published correlation and its verdict") {
  using host_lib::number;
  const auto Re = reynolds_of<diameter>(number(1e4));
  const auto y = published{}(Re, prandtl_number(number(0.7)));
  const double same = published{}(reynolds_of<diameter>(1e4), prandtl_number(0.7)).si();
  CHECK(static_cast<double>(y.si()) == doctest::Approx(same).epsilon(1e-14));
  CHECK(y.inside());
  CHECK_FALSE(published{}(reynolds_of<diameter>(number(1e8)), prandtl_number(0.7)).inside());
  CHECK_FALSE(published{}(Re, prandtl_number(number(hidden_nan()))).verdict().finite_input());
}

TEST_CASE("choices: by enumerator, in formula and envelope") {
  const auto Re = reynolds_of<diameter>(100.0);
  const auto one = viscosity_ratio(1.0);
  const auto staggered = with_choice{}(Re, rows::staggered, one);
  CHECK(staggered.si() == 200.0);
  CHECK(staggered.inside());
  const auto aligned = with_choice{}(Re, rows::aligned, one);
  CHECK(aligned.si() == doctest::Approx(141.4213562373095));
  CHECK(aligned.verdict().bits() == word::of_correlation(0, 0, side::above));
}

TEST_CASE("a value without inputs") {
  const auto Nu = developed{}();
  CHECK(Nu.si() == 3.66);
  CHECK(Nu.inside());
  CHECK(Nu.verdict().scatter_stated());
  CHECK(Nu.scatter() == 0.0);
}

TEST_CASE("inherited: the fluid's bits as they are, another correlation's as input_outside") {
  const std::uint64_t of_oil = word::of_fluid(0, side::above);
  const estimate<kinds::prandtl> Pr(2.0, verdict<>(of_oil), 0.0016, nullptr, &oil);
  const auto Nu = everything{}(Re_in, Pr, ratio_in);
  CHECK(Nu.verdict().bits() == of_oil);
  CHECK(Nu.fluid() == &oil);
  CHECK(Nu.scatter() == doctest::Approx(0.05));  // 3 and 4 %
  CHECK(Nu.correlation() == &convelope::detail::record_of<everything>);

  const auto Re = reynolds_from_prandtl{}(prandtl_number(200.0));
  CHECK(Re.verdict().correlation_crossed(0, 0, side::above));
  const auto on_it = everything{}(Re, Pr_in, ratio_in);
  CHECK(on_it.verdict().bits() == (word::input_outside | word::scatter_not_stated));
  CHECK_FALSE(on_it.inside());
  // And what was not finite or refused stays so.
  const estimate<kinds::prandtl> bad(
      2.0, verdict<>(word::not_finite | word::refused | word::impossible | word::input_outside),
      0.0, nullptr, nullptr);
  CHECK(everything{}(Re_in, bad, ratio_in).verdict().bits() == bad.verdict().bits());
}

TEST_CASE("inherited in every lane by itself") {
  using pack = std::experimental::fixed_size_simd<double, 2>;
  const auto Re =
      reynolds_from_prandtl{}(prandtl_number(pack([](auto i) { return i == 0 ? 50.0 : 200.0; })));
  const auto Nu = everything{}(Re, Pr_in, ratio_in);
  CHECK(Nu.verdict().bits()[0] == word::scatter_not_stated);
  CHECK(Nu.verdict().bits()[1] == (word::scatter_not_stated | word::input_outside));
}

TEST_CASE("the record: everything a list of correlations shows") {
  const correlation_info& c = convelope::detail::record_of<everything>;
  CHECK(string_view(c.id) == "invented/everything");
  CHECK(string_view(c.quantity) == "Nu_D");
  CHECK(string_view(c.gives) == "mean Nusselt number");
  CHECK(c.source == &invented::source);
  CHECK(c.scatter == 0.03);
  CHECK(c.state_at == state_rule::film);
  REQUIRE(c.input_count == 3);
  CHECK(string_view(c.inputs[0].key) == "Re");
  CHECK(string_view(c.inputs[0].on) == "diameter");
  CHECK(string_view(c.inputs[1].words) == "Prandtl number");
  CHECK(string_view(c.inputs[1].on) == "");
  CHECK(string_view(c.inputs[2].key) == "L_over_D");
  CHECK(string_view(c.inputs[2].symbol) == "L/D");
  CHECK_FALSE(c.inputs[2].optional);
  CHECK(c.inputs[2].choices == nullptr);
  REQUIRE(c.limit_count == 4);
  CHECK(string_view(c.limits[0].symbol) == "Re");
  CHECK(c.limits[0].low == 100.0);
  CHECK(c.limits[0].high == 1e4);
  CHECK(string_view(c.limits[3].symbol) == "Re Pr");
  CHECK(c.limits[3].high == 2e4);

  const correlation_info& w = convelope::detail::record_of<with_choice>;
  REQUIRE(w.input_count == 3);
  CHECK(string_view(w.inputs[0].key) == "Re_max");
  CHECK(string_view(w.inputs[1].key) == "rows");
  REQUIRE(w.inputs[1].choices != nullptr);
  CHECK(string_view(w.inputs[1].choices[1]) == "staggered");
  CHECK(w.inputs[1].choices[2] == nullptr);
  CHECK(w.inputs[2].optional);
  CHECK(w.inputs[2].otherwise == 1.0);
  CHECK_FALSE(w.inputs[0].optional);

  const correlation_info& none = convelope::detail::record_of<developed>;
  CHECK(none.input_count == 0);
  CHECK(none.limit_count == 0);
}
