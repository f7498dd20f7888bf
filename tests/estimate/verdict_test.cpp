#include "convelope/estimate/verdict.hpp"

#include <doctest/doctest.h>

#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "convelope/scalar/std_simd.hpp"
#include "edges.hpp"
#include "invented.hpp"

// All of this holds under -ffast-math too.

using namespace convelope;
namespace word = convelope::detail::word;

namespace static_test {

static_assert(std::is_trivially_copyable_v<verdict<>> && sizeof(verdict<>) == 8);
static_assert(std::is_trivially_default_constructible_v<verdict<>>);
static_assert(std::is_nothrow_copy_constructible_v<verdict<>>);
static_assert(!std::is_convertible_v<std::uint64_t, verdict<>>, "no number is a verdict");

// Every message has one bit of its own, and all fit into the word.
constexpr bool bits_are_apart() {
  std::uint64_t seen = 0;
  bool apart = true;
  const auto take = [&](std::uint64_t bit) {
    apart = apart && bit != 0 && (bit & (bit - 1)) == 0 && (seen & bit) == 0;
    seen |= bit;
  };
  for (const side s : {side::below, side::above}) {
    for (int slot = 0; slot < word::slots; ++slot) {
      for (int i = 0; i < word::limits_per_slot; ++i) take(word::of_correlation(slot, i, s));
    }
    for (int i = 0; i < word::fluid_limits; ++i) take(word::of_fluid(i, s));
  }
  for (const std::uint64_t flag : {word::not_finite, word::refused, word::scatter_not_stated,
                                   word::input_outside, word::impossible}) {
    take(flag);
  }
  return apart;
}
static_assert(bits_are_apart());

static_assert(verdict<>(0).inside() && verdict<>(0).finite_input() &&
              verdict<>(0).possible_input());
static_assert(!verdict<>(0).refused() && verdict<>(0).scatter_stated());
static_assert(verdict<>(word::scatter_not_stated).inside(),
              "not knowing the scatter is no crossing");
static_assert((verdict<>(1) | verdict<>(4)) == verdict<>(5));

}  // namespace static_test

TEST_CASE("a crossed limit answers to its own question and to no other") {
  for (int slot = 0; slot < word::slots; ++slot) {
    for (int limit = 0; limit < word::limits_per_slot; ++limit) {
      for (const side s : {side::below, side::above}) {
        const verdict<> v(word::of_correlation(slot, limit, s));
        CHECK_FALSE(v.inside());
        for (int other = 0; other < word::slots; ++other) {
          CHECK(v.correlation_outside(other) == (other == slot));
          for (int i = 0; i < word::limits_per_slot; ++i) {
            for (const side t : {side::below, side::above}) {
              CHECK(v.correlation_crossed(other, i, t) == (other == slot && i == limit && t == s));
            }
          }
        }
        CHECK_FALSE(v.fluid_outside());
        CHECK(v.finite_input());
        CHECK_FALSE(v.input_outside());
      }
    }
  }
  for (int limit = 0; limit < word::fluid_limits; ++limit) {
    for (const side s : {side::below, side::above}) {
      const verdict<> v(word::of_fluid(limit, s));
      CHECK_FALSE(v.inside());
      CHECK(v.fluid_outside());
      for (int i = 0; i < word::fluid_limits; ++i) {
        for (const side t : {side::below, side::above}) {
          CHECK(v.fluid_crossed(i, t) == (i == limit && t == s));
        }
      }
      for (int slot = 0; slot < word::slots; ++slot) CHECK_FALSE(v.correlation_outside(slot));
      CHECK(v.finite_input());
    }
  }
}

TEST_CASE("the flags: each outside, each its own") {
  const verdict<> nan(word::not_finite);
  CHECK_FALSE(nan.inside());
  CHECK_FALSE(nan.finite_input());
  CHECK(nan.possible_input());
  const verdict<> refused(word::refused);
  CHECK_FALSE(refused.inside());
  CHECK(refused.refused());
  CHECK(refused.finite_input());
  const verdict<> input(word::input_outside);
  CHECK_FALSE(input.inside());
  CHECK(input.input_outside());
  CHECK_FALSE(input.correlation_outside());
  const verdict<> impossible(word::impossible);
  CHECK_FALSE(impossible.inside());
  CHECK_FALSE(impossible.possible_input());
  CHECK_FALSE(verdict<>(word::scatter_not_stated).scatter_stated());
}

TEST_CASE("limits are inclusive and told by side") {
  using namespace invented;
  const auto seen = [](double Re, double Pr, double ratio) {
    return everything{}(reynolds_of<diameter>(Re), prandtl_number(Pr), length_ratio(ratio))
        .verdict();
  };
  using word::of_correlation;
  CHECK(seen(1000.0, 2.0, 20.0).bits() == 0);
  CHECK(seen(100.0, 0.8, 60.0).bits() == 0);
  CHECK(seen(1e4, 2.0, -60.0).bits() == 0);
  CHECK(seen(160.0, 0.5, 20.0).bits() == 0);
  CHECK(seen(1.0000001e4, 1.9, 20.0).bits() == of_correlation(0, 0, side::above));
  CHECK(seen(99.9999, 1.0, 20.0).bits() == of_correlation(0, 0, side::below));
  CHECK(seen(1000.0, 0.4999999, 20.0).bits() == of_correlation(0, 1, side::below));
  CHECK(seen(1000.0, 2.0, 60.00001).bits() == of_correlation(0, 2, side::above));
  CHECK(seen(150.0, 0.53, 20.0).bits() == of_correlation(0, 3, side::below));
  CHECK(seen(1000.0, 20.001, 20.0).bits() == of_correlation(0, 3, side::above));
  CHECK(seen(99.0, 0.1, 70.0).bits() ==
        (of_correlation(0, 0, side::below) | of_correlation(0, 1, side::below) |
         of_correlation(0, 2, side::above) | of_correlation(0, 3, side::below)));
  CHECK(seen(1000.0, 2.0, -1e308).bits() == 0);
}

TEST_CASE("NaN or infinity in any input is told, and by no other input") {
  using namespace invented;
  for (const double bad : {hidden_nan(), hidden_infinity(), hidden_minus_infinity()}) {
    const verdict<> first = everything{}(reynolds_of<diameter>(bad), Pr_in, ratio_in).verdict();
    const verdict<> second = everything{}(Re_in, prandtl_number(bad), ratio_in).verdict();
    const verdict<> third = everything{}(Re_in, Pr_in, length_ratio(bad)).verdict();
    for (const verdict<>& v : {first, second, third}) {
      CHECK_FALSE(v.finite_input());
      CHECK_FALSE(v.inside());
    }
    CHECK_FALSE(first.correlation_crossed(0, 1, side::below));
    CHECK_FALSE(second.correlation_crossed(0, 0, side::below));
    CHECK_FALSE(second.correlation_crossed(0, 0, side::above));
    CHECK_FALSE(third.correlation_crossed(0, 3, side::above));

    constexpr cylinder_crossflow::churchill_bernstein_1977 published{};
    CHECK_FALSE(
        published(reynolds_of<diameter>(bad), prandtl_number(0.7)).verdict().finite_input());
    CHECK_FALSE(
        published(reynolds_of<diameter>(1e4), prandtl_number(bad)).verdict().finite_input());
  }
  const float bad = static_cast<float>(hidden_infinity());
  const auto single =
      everything{}(reynolds_of<diameter>(bad), prandtl_number(2.0F), length_ratio(20.0F));
  CHECK_FALSE(single.verdict().finite_input());
}

TEST_CASE("a published correlation: limits, also far outside") {
  const auto seen = [](double Re, double Pr) {
    return cylinder_crossflow::churchill_bernstein_1977{}(reynolds_of<diameter>(Re),
                                                          prandtl_number(Pr))
        .verdict();
  };
  CHECK(seen(1e7, 0.7).inside());
  CHECK(seen(1.0, 0.2).inside());
  CHECK(seen(1.00001e7, 0.7).bits() == word::of_correlation(0, 0, side::above));
  CHECK(seen(0.28, 0.7).bits() == word::of_correlation(0, 1, side::below));
  CHECK(seen(-1.0, 0.7).bits() ==
        (word::of_correlation(0, 0, side::below) | word::of_correlation(0, 1, side::below)));
  CHECK(seen(1e300, 0.7).bits() == word::of_correlation(0, 0, side::above));
}

TEST_CASE("every lane of a pack has its own verdict") {
  using pack = std::experimental::fixed_size_simd<double, 4>;
  using namespace invented;
  const double Re[] = {1000.0, 50.0, hidden_nan(), 2e4};
  const double Pr[] = {2.0, 2.0, 2.0, 0.1};
  const auto answer = everything{}(reynolds_of<diameter>(pack([&](auto i) { return Re[i]; })),
                                   prandtl_number(pack([&](auto i) { return Pr[i]; })), ratio_in);
  const auto alone = [&](std::size_t i) {
    return everything{}(reynolds_of<diameter>(Re[i]), prandtl_number(Pr[i]), ratio_in).verdict();
  };
  for (std::size_t i : {0U, 1U, 3U}) CHECK(answer.verdict().bits()[i] == alone(i).bits());
  CHECK(answer.verdict().bits()[0] == 0);
  CHECK(answer.verdict().bits()[1] == word::of_correlation(0, 0, side::below));
  CHECK_FALSE(verdict<>(answer.verdict().bits()[2]).finite_input());
  CHECK(answer.verdict().bits()[3] ==
        (word::of_correlation(0, 0, side::above) | word::of_correlation(0, 1, side::below)));
  const auto both = answer.verdict() | verdict<bits_t<pack>>(bits_t<pack>(word::refused));
  for (std::size_t i = 0; i < pack::size(); ++i) CHECK(verdict<>(both.bits()[i]).refused());
}
