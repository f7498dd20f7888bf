#include "convelope/estimate/policies.hpp"

#include <doctest/doctest.h>

#include "convelope/scalar/std_simd.hpp"
#include "edges.hpp"
#include "invented.hpp"

using namespace convelope;
using namespace invented;
namespace word = convelope::detail::word;

namespace {

// A host's own: where outside, take minus the value and count.
struct counting {
  static constexpr bool clamps = false;
  int* count;
  template <class E>
  E operator()(const E& e) const {
    if (e.inside()) return e;
    ++*count;
    return -1.0 * e;
  }
};

template <class Policy>
auto evaluated(const Policy& how, double Re, double Pr, double ratio) {
  return everything{}.under(how)(reynolds_of<diameter>(Re), prandtl_number(Pr),
                                 length_ratio(ratio));
}

}  // namespace

TEST_CASE("record: as published, also outside") {
  const auto y = evaluated(policy::record, 50.0, 2.0, 20.0);
  CHECK(y.si() == 27.0);
  CHECK(y.verdict().bits() == word::of_correlation(0, 0, side::below));
}

TEST_CASE("clamp: at the nearest limit of each input, told of the caller's numbers") {
  const auto below = evaluated(policy::clamp, 50.0, 0.1, 20.0);
  CHECK(below.si() == 50.5);  // Re 100, Pr 0.5
  CHECK(below.verdict().correlation_crossed(0, 0, side::below));
  CHECK(below.verdict().correlation_crossed(0, 1, side::below));
  CHECK(evaluated(policy::clamp, 1e6, 1.0, 20.0).si() == 5001.0);
  CHECK(evaluated(policy::clamp, 200.0, 1e6, 20.0).si() == 1000100.0);  // Pr has no upper bound
  // A limit on a group moves nothing.
  const auto group = evaluated(policy::clamp, 1000.0, 30.0, 20.0);
  CHECK(group.si() == 530.0);
  CHECK(group.verdict().bits() == word::of_correlation(0, 3, side::above));
  // Inside, nothing changes.
  CHECK(evaluated(policy::clamp, 1000.0, 2.0, 20.0).si() == 502.0);
  CHECK(evaluated(policy::clamp, 1000.0, 2.0, 20.0).inside());
}

TEST_CASE("clamp: no slope beyond a limit; lane by lane; NaN stays") {
  using D = dual<double>;
  const auto of = everything{}.under(policy::clamp);
  CHECK(of(reynolds_of<diameter>(D::variable(50.0)), Pr_in, ratio_in).si().slope[0] == 0.0);
  CHECK(of(reynolds_of<diameter>(D::variable(500.0)), Pr_in, ratio_in).si().slope[0] == 0.5);
  using pack = std::experimental::fixed_size_simd<double, 2>;
  const auto y = of(reynolds_of<diameter>(pack([](auto i) { return i == 0 ? 50.0 : 500.0; })),
                    Pr_in, ratio_in);
  CHECK(double(y.si()[0]) == 52.0);
  CHECK(double(y.si()[1]) == 252.0);
  CHECK_FALSE(of(reynolds_of<diameter>(hidden_nan()), Pr_in, ratio_in).verdict().finite_input());
}

TEST_CASE("clamp: choices pass untouched") {
  const auto y = with_choice{}.under(policy::clamp)(reynolds_of<diameter>(100.0), rows::staggered,
                                                    viscosity_ratio(1.0));
  CHECK(y.si() == 200.0);
}

TEST_CASE("refuse: NaN and told so; inside untouched") {
  const auto y = evaluated(policy::refuse, 50.0, 2.0, 20.0);
  CHECK(is_nan(y.si()));
  CHECK(y.verdict().refused());
  CHECK_FALSE(y.inside());
  CHECK(y.verdict().correlation_crossed(0, 0, side::below));
  CHECK(y.scatter() == doctest::Approx(0.03));
  CHECK(y.correlation() == &convelope::detail::record_of<everything>);
  const auto inside = evaluated(policy::refuse, 1000.0, 2.0, 20.0);
  CHECK(inside.si() == 502.0);
  CHECK_FALSE(inside.verdict().refused());
  // Not knowing the scatter is no ground.
  const auto Re = reynolds_from_prandtl{}.under(policy::refuse)(Pr_in);
  CHECK(Re.si() == 20.0);
  // An input that was outside its own envelope is.
  const auto doubtful = everything{}.under(policy::refuse)(
      reynolds_from_prandtl{}(prandtl_number(200.0)), Pr_in, ratio_in);
  CHECK(is_nan(doubtful.si()));
}

TEST_CASE("a host's own policy") {
  int count = 0;
  CHECK(evaluated(counting{&count}, 1000.0, 2.0, 20.0).si() == 502.0);
  CHECK(count == 0);
  CHECK(evaluated(counting{&count}, 50.0, 2.0, 20.0).si() == -27.0);
  CHECK(count == 1);
}
