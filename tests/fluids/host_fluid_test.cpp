#include "convelope/fluids/host_fluid.hpp"

#include <doctest/doctest.h>

#include <limits>

#include "close_to.hpp"

using namespace convelope;

namespace {
// An invented heat-transfer oil.
constexpr reference maker{"data sheet", 2020, "invented for this test", known::recalled};
constexpr limit_info oil_limits[] = {{"T", 260.0, 550.0}, {"p", -unbounded, 1e6}};
constexpr fluid_info oil_info{"test oil", &maker, oil_limits, 2, {0.01, 0.02, 0.05, 0.1, 0.05}};

constexpr auto rho = [](const auto& T, const auto&) { return 1060.0 - 0.65 * T; };
constexpr auto cp = [](const auto& T, const auto&) { return 800.0 + 3.6 * T; };
constexpr auto k = [](const auto& T, const auto&) { return 0.16 - 1.0e-4 * T; };
constexpr auto mu = [](const auto& T, const auto& p) {
  using number = std::remove_cvref_t<decltype(T)>;
  return number((1.0 + 1e-8 * p) * 1e-5 * math::exp(number(1800.0 / T)));
};
constexpr auto beta = [](const auto&, const auto&) { return 7e-4; };

constexpr auto oil = fluid_from(rho, cp, k, mu, beta, oil_info, expansion_at_film);
using oil_type = std::remove_const_t<decltype(oil)>;
static_assert(fluid<oil_type>);
static_assert(oil_type::expansion_at == expansion_rule::film);
static_assert(sizeof(oil_type) <= 2 * sizeof(void*));
static_assert(std::is_trivially_copyable_v<oil_type>);
static_assert(oil.check(300.0, 1e5) == 0);
static_assert(oil.check(250.0, 1e5) == detail::word::of_fluid(0, side::below));
static_assert(rho(300.0, 0.0) == 865.0);

double water_density(double, double) { return 998.0; }
float water_heat(double, double) { return 4182.0F; }
double water_k(double, double) { return 0.6; }
double water_mu(double, double) { return 1e-3; }
double water_beta(double, double) { return 2e-4; }

// The concept alone: a host's own struct.
struct brine {
  static constexpr expansion_rule expansion_at = expansion_rule::film;
  template <class T>
  fluid_values<T> values(const T& t, const T&) const {
    return {T(1100.0 - 0.3 * t), T(3600.0), T(0.5), T(2e-3), T(3e-4)};
  }
  template <class T>
  bits_t<T> check(const T& t, const T&) const {
    return fluid_limit(0, t, scalar_adaptor<T>::constant(260.0),
                       scalar_adaptor<T>::constant(320.0));
  }
  const fluid_info* info() const { return &oil_info; }
};
static_assert(fluid<brine>);

template <class Info>
concept accepted_info = requires(Info&& info) {
  fluid_from(rho, cp, k, mu, beta, static_cast<Info&&>(info), expansion_at_film);
};
static_assert(accepted_info<const fluid_info&>);
static_assert(!accepted_info<fluid_info>, "a temporary would dangle");
static_assert(!property_rule<int> && !property_rule<double (*)(double)>);

verdict<std::uint64_t> seen(double T, double p) { return verdict<std::uint64_t>(oil.check(T, p)); }
}  // namespace

TEST_CASE("host fluid: values are the host's own") {
  const auto v = oil.values(350.0, 2e5);
  CHECK(v.density == 1060.0 - 0.65 * 350.0);
  CHECK(v.specific_heat == 800.0 + 3.6 * 350.0);
  CHECK(v.conductivity == 0.16 - 1.0e-4 * 350.0);
  CHECK(close_to(v.viscosity, 1.002e-5 * std::exp(1800.0 / 350.0), 1e-14));
  CHECK(v.expansion == 7e-4);
}

TEST_CASE("host fluid: derivatives pass through generic functions") {
  using number = dual<double, 2>;
  const auto v = oil.values(number::variable(350.0, 0), number::variable(2e5, 1));
  CHECK(v.density.slope[0] == -0.65);
  CHECK(close_to(v.viscosity.slope[0], -1800.0 / (350.0 * 350.0) * v.viscosity.value, 1e-13));
  CHECK(close_to(v.viscosity.slope[1], 1e-8 / 1.002 * v.viscosity.value, 1e-13));
  CHECK(v.expansion.slope[0] == 0.0);
}

TEST_CASE("host fluid: plain functions will do, and single precision runs") {
  const auto water = fluid_from(water_density, water_heat, &water_k, water_mu, water_beta, oil_info,
                                expansion_at_ambient);
  CHECK(water.values(300.0, 1e5).specific_heat == 4182.0);
  CHECK(water.values(300.0, 1e5).conductivity == 0.6);
  CHECK(decltype(water)::expansion_at == expansion_rule::ambient);
  const auto state = state_of(oil, typed<kinds::film_temperature, float>::from_si(350.0F),
                              typed<kinds::pressure, float>::from_si(2e5F));
  CHECK(close_to(double(state.values().density), 832.5, 1e-6));
  CHECK(state.verdict_bits().inside());
}

TEST_CASE("host fluid: its limits are tested, open sides are not") {
  CHECK(seen(300.0, 1e5).bits() == 0);
  CHECK(seen(300.0, -1e9).bits() == 0);
  CHECK(seen(259.0, 1e5).bits() == detail::word::of_fluid(0, side::below));
  CHECK(seen(551.0, 1e5).bits() == detail::word::of_fluid(0, side::above));
  CHECK(seen(300.0, 1.1e6).bits() == detail::word::of_fluid(1, side::above));
  const volatile double nan = std::numeric_limits<double>::quiet_NaN();
  CHECK_FALSE(seen(nan, 1e5).finite_input());
  CHECK(seen(nan, 1e5).fluid_outside());
  CHECK_FALSE(seen(300.0, nan).finite_input());
}

TEST_CASE("host fluid: a limit that can't be tested is never silent") {
  static constexpr limit_info strange[] = {{"T", 260.0, 550.0}, {"salinity", 0.0, 0.1}};
  static constexpr fluid_info info{"brine", &maker, strange, 2, {0.0, 0.0, 0.0, 0.0, 0.0}};
  constexpr auto f = fluid_from(rho, cp, k, mu, beta, info, expansion_at_film);
  const verdict<std::uint64_t> v(f.check(300.0, 1e5));
  CHECK(v.fluid_crossed(1, side::below));
  CHECK(v.fluid_crossed(1, side::above));
  CHECK_FALSE(v.fluid_crossed(0, side::below));
  CHECK(v.finite_input());
  CHECK_FALSE(v.refused());

  static constexpr limit_info nine[] = {{"T", 0.0, 1e4}, {"T", 0.0, 1e4}, {"T", 0.0, 1e4},
                                        {"T", 0.0, 1e4}, {"T", 0.0, 1e4}, {"T", 0.0, 1e4},
                                        {"T", 0.0, 1e4}, {"T", 0.0, 1e4}, {"T", 0.0, 1e4}};
  static constexpr fluid_info many{"many", &maker, nine, 9, {0.0, 0.0, 0.0, 0.0, 0.0}};
  constexpr auto g = fluid_from(rho, cp, k, mu, beta, many, expansion_at_film);
  CHECK(g.check(300.0, 1e5) ==
        (detail::word::of_fluid(4, side::below) | detail::word::of_fluid(4, side::above)));
}

TEST_CASE("host fluid: a state carries the host's uncertainty and info") {
  const auto state = state_of(oil, typed<kinds::film_temperature>::from_si(350.0),
                              typed<kinds::pressure>::from_si(1e5));
  CHECK(state.viscosity().scatter() == doctest::Approx(0.1));
  CHECK(state.viscosity().fluid() == &oil_info);
  CHECK(state.viscosity().inside());
  CHECK_FALSE(state_of(brine{}, typed<kinds::film_temperature>::from_si(350.0),
                       typed<kinds::pressure>::from_si(1e5))
                  .density()
                  .inside());
}
