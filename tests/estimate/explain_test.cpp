#include "convelope/estimate/explain.hpp"

#include <doctest/doctest.h>

#include "convelope/scalar/std_simd.hpp"
#include "invented.hpp"

using namespace convelope;
using namespace invented;
namespace word = convelope::detail::word;

namespace {

const std::string source_text =
    " Source: A. Nobody, B. Noone 1999, J. Invented 1, 1-2 (constants from memory).";

estimate<kinds::film_coefficient> h(std::uint64_t bits, double variance = 0.01,
                                    const correlation_info* c = nullptr,
                                    const fluid_info* f = nullptr) {
  return {25.0, verdict<>(bits), variance, c, f};
}
const correlation_info& record = convelope::detail::record_of<everything>;

}  // namespace

TEST_CASE("explain: inside") {
  CHECK(explain(everything{}(Re_in, Pr_in, ratio_in)) ==
        "mean Nusselt number Nu = 502. Inside every stated range. Stated scatter +-3 %." +
            source_text);
  CHECK(explain(h(0)) ==
        "mean film coefficient h = 25 W/(m2 K). Inside every stated range. Stated scatter +-10 %.");
}

TEST_CASE("explain: outside, each side, several limits, open ranges") {
  CHECK(explain(everything{}(reynolds_of<diameter>(50.0), Pr_in, ratio_in)) ==
        "mean Nusselt number Nu = 27. invented/everything is outside what it was fitted for: Re is "
        "below its range (100 to 10000). Stated scatter +-3 %." +
            source_text);
  CHECK(
      explain(everything{}(reynolds_of<diameter>(2e4), prandtl_number(0.25), length_ratio(61.5))) ==
      "mean Nusselt number Nu = 10000.2. invented/everything is outside what it was fitted for: "
      "Re is above its range (100 to 10000), Pr is below its range (at least 0.5), L/D is above "
      "its range (at most 60). Stated scatter +-3 %." +
          source_text);
  const verdict<> both(word::of_correlation(1, 3, side::below) |
                       word::of_correlation(1, 3, side::above));
  CHECK(explain(both, record, 1) ==
        "invented/everything is outside what it was fitted for: Re Pr is not comparable with its "
        "range (80 to 20000).");
  CHECK(explain(both, record) == "");
}

TEST_CASE("explain: the fluid") {
  CHECK(explain(verdict<>(word::of_fluid(1, side::above)), oil) ==
        "invented oil is outside its property range: p is above its range (10000 to 1e+06).");
  CHECK(explain(verdict<>(0), oil) == "");
  CHECK(explain(h(word::of_fluid(0, side::below), 0.01, nullptr, &oil)) ==
        "mean film coefficient h = 25 W/(m2 K). invented oil is outside its property range: T is "
        "below its range (280 to 400). Stated scatter +-10 %.");
}

TEST_CASE("explain: the flags") {
  const std::string start = "mean film coefficient h = 25 W/(m2 K).";
  const std::string end = " Stated scatter +-10 %.";
  CHECK(explain(h(word::not_finite)) ==
        start + " An input was NaN or infinite; the value means nothing." + end);
  CHECK(explain(h(word::impossible)) ==
        start +
            " A length or an absolute temperature was not positive and finite; the value means "
            "nothing." +
            end);
  CHECK(explain(h(word::refused)) == start + " The value was refused." + end);
  CHECK(explain(h(word::input_outside)) ==
        start + " An input was itself outside the envelope it came from." + end);
  const std::string another =
      " Another correlation that takes part in it is outside what it was fitted for.";
  CHECK(explain(h(word::of_correlation(1, 0, side::below), 0.01, &record)) ==
        start + another + end + source_text);
  CHECK(explain(h(word::of_correlation(word::slots - 1, 0, side::above), 0.01, &record)) ==
        start + another + end + source_text);
  CHECK(explain(h(word::of_correlation(0, 0, side::below))) == start + another + end);
}

TEST_CASE("explain: what is known of the scatter") {
  const std::string start = "mean film coefficient h = 25 W/(m2 K). Inside every stated range.";
  CHECK(explain(h(word::scatter_not_stated, 0.0)) == start + " The source states no scatter.");
  CHECK(explain(h(word::scatter_not_stated, 0.0004)) ==
        start + " Stated scatter +-2 %, where stated.");
  CHECK(explain(reynolds_from_prandtl{}(Pr_in)) ==
        "Reynolds number Re = 20. Inside every stated range. The source states no scatter. Source: "
        "C. Unknown 2001, Invented Lett. 3, 7 (constants supported by own computation).");
}

TEST_CASE("explain: one lane of a pack") {
  using pack = std::experimental::fixed_size_simd<double, 2>;
  const auto y = everything{}(
      reynolds_of<diameter>(pack([](auto i) { return i == 0 ? 1000.0 : 50.0; })), Pr_in, ratio_in);
  CHECK(explain(y, 0) == explain(everything{}(Re_in, Pr_in, ratio_in)));
  CHECK(explain(y, 1) == explain(everything{}(reynolds_of<diameter>(50.0), Pr_in, ratio_in)));
}
