#include "convelope/fluids/humid_air.hpp"

#include <doctest/doctest.h>

#include <limits>

#include "close_to.hpp"
#include "convelope/fluids/detail/iapws_transport.hpp"

using namespace convelope;
using detail::word::of_fluid;

static_assert(fluid<humid_air<kinds::relative_humidity>>);
static_assert(fluid<humid_air<kinds::humidity_ratio>>);

TEST_CASE("humid air without water is dry air") {
  for (const double T : {273.15, 300.0, 473.15}) {
    const auto dry = dry_air_fast{}.values(T, 1e5);
    for (const auto& v : {humid_air{relative_humidity(0.0)}.values(T, 1e5),
                          humid_air{humidity_ratio(0.0)}.values(T, 1e5)}) {
      CHECK(close_to(v.density, dry.density, 1e-15));
      CHECK(close_to(v.specific_heat, dry.specific_heat, 1e-15));
      CHECK(close_to(v.conductivity, dry.conductivity, 1e-15));
      CHECK(close_to(v.viscosity, dry.viscosity, 1e-15));
      CHECK(close_to(v.expansion, 1.0 / T, 1e-15));
    }
  }
}

TEST_CASE("humid air: relative humidity and humidity ratio are two names of one state") {
  for (const double phi : {0.1, 0.5, 1.0}) {
    const humid_air relative{relative_humidity(phi)};
    const humid_air absolute{humidity_ratio(relative.ratio(310.0, 9e4))};
    const auto a = relative.values(310.0, 9e4);
    const auto b = absolute.values(310.0, 9e4);
    CHECK(close_to(a.density, b.density, 1e-14));
    CHECK(close_to(a.viscosity, b.viscosity, 1e-14));
    CHECK(close_to(absolute.ratio(310.0, 9e4), absolute.humidity.si(), 1e-14));
    CHECK(close_to(absolute.vapour_fraction(310.0, 9e4), relative.vapour_fraction(310.0, 9e4),
                   1e-14));
  }
}

TEST_CASE("humid air: each limit is flagged on its side, and no other") {
  const humid_air half{relative_humidity(0.5)};
  for (const double T : {273.15, 300.0, 350.0}) {
    for (const double p : {1e5, 1.5e5}) CHECK(half.check(T, p) == 0);
  }
  CHECK(humid_air{relative_humidity(0.0)}.check(473.15, 1e4) == 0);
  CHECK(humid_air{relative_humidity(1.0)}.check(300.0, 1e5) == 0);
  CHECK(half.check(273.1, 1e5) == of_fluid(0, side::below));
  CHECK(humid_air{relative_humidity(0.001)}.check(473.2, 1e5) == of_fluid(0, side::above));
  CHECK(half.check(280.0, 9.9e3) == of_fluid(1, side::below));
  CHECK(half.check(300.0, 1.501e5) == of_fluid(1, side::above));
  CHECK(humid_air{relative_humidity(1.001)}.check(300.0, 1e5) == of_fluid(2, side::above));
  CHECK(humid_air{relative_humidity(-0.001)}.check(300.0, 1e5) ==
        (of_fluid(2, side::below) | of_fluid(3, side::below)));
  CHECK(half.check(365.0, 1e5) == of_fluid(3, side::above));
  // x_v would pass 1
  CHECK(half.check(420.0, 1e5) == of_fluid(3, side::above));
  CHECK(std::isfinite(half.values(420.0, 1e5).viscosity));

  const humid_air wet{humidity_ratio(0.02)};
  CHECK(wet.check(300.0, 1e5) == 0);
  CHECK(wet.check(290.0, 1e5) == of_fluid(2, side::above));  // fog
  CHECK(humid_air{humidity_ratio(-0.001)}.check(300.0, 1e5) ==
        (of_fluid(2, side::below) | of_fluid(3, side::below)));
  CHECK(humid_air{humidity_ratio(0.27)}.check(400.0, 1e5) == of_fluid(3, side::above));
}

TEST_CASE("humid air: what is not finite is flagged and never crashes") {
  const volatile double nan = std::numeric_limits<double>::quiet_NaN();
  const auto seen = [](std::uint64_t bits) {
    CHECK_FALSE(verdict<std::uint64_t>(bits).finite_input());
    CHECK_FALSE(verdict<std::uint64_t>(bits).inside());
  };
  seen(humid_air{relative_humidity(0.5)}.check(double(nan), 1e5));
  seen(humid_air{relative_humidity(0.5)}.check(300.0, double(nan)));
  seen(humid_air{relative_humidity(double(nan))}.check(300.0, 1e5));
  seen(humid_air{humidity_ratio(double(nan))}.check(300.0, 1e5));
}

TEST_CASE("humid air: its steam is the dilute gas of the IAPWS releases") {
  // R7-97(2012) Table 10: J, n of the ideal part of region 2
  constexpr double n[][2] = {
      {0, -0.96927686500217e1},  {1, 0.10086655968018e2}, {-5, -0.56087911283020e-2},
      {-4, 0.71452738081455e-1}, {-3, -0.40710498223928}, {-2, 0.14240819171444e1},
      {-1, -0.43839511319450e1}, {2, -0.28408632460772},  {3, 0.21268463753307e-1}};
  for (double T = 273.15; T <= 473.2; T += 10.0) {
    CAPTURE(T);
    const double tau = 540.0 / T;
    double cp = 0.0;
    for (const auto& term : n) cp -= term[0] * (term[0] - 1.0) * term[1] * std::pow(tau, term[0]);
    const auto v = detail::dilute_vapour((T - 600.0) / (T + 600.0), std::sqrt(T));
    CHECK(close_to(v.specific_heat, 461.526 * cp, 4.3e-5));
    const auto transport = detail::water_transport(T, 1.0 / T, 0.0);
    CHECK(close_to(v.viscosity, transport.viscosity, 5.5e-5));
    CHECK(close_to(v.conductivity, transport.conductivity, 5.5e-6));
  }
}

TEST_CASE("humid air: Wilke and Mason-Saxena, written out") {
  const double T = 345.0;
  const double x[] = {0.75, 0.25};
  const double mass[] = {28.9586, 18.01528};
  const auto air = dry_air_fast{}.values(T, 1e5);
  const auto steam = detail::dilute_vapour((T - 600.0) / (T + 600.0), std::sqrt(T));
  const double mu[] = {air.viscosity, steam.viscosity};
  const double k[] = {air.conductivity, steam.conductivity};
  double mixed_mu = 0.0;
  double mixed_k = 0.0;
  for (int i = 0; i < 2; ++i) {
    double below = 0.0;
    for (int j = 0; j < 2; ++j) {
      const double sum = 1.0 + std::sqrt(mu[i] / mu[j]) * std::pow(mass[j] / mass[i], 0.25);
      below += x[j] * sum * sum / std::sqrt(8.0 * (1.0 + mass[i] / mass[j]));
    }
    mixed_mu += x[i] * mu[i] / below;
    mixed_k += x[i] * k[i] / below;
  }
  const auto v = humid_air{humidity_ratio(mass[1] / mass[0] / 3.0)}.values(T, 1e5);
  CHECK(close_to(v.viscosity, mixed_mu, 1e-13));
  CHECK(close_to(v.conductivity, mixed_k, 1e-13));
}
