// Bulk temperature, heat and pressure along a duct.
#include "convelope/scales/passage.hpp"

#include <doctest/doctest.h>

#include <vector>

#include "../surfaces/states.hpp"

using namespace states;

namespace {

constexpr double pi = 3.14159265358979324;

round_section tube(double D) { return {number<kinds::hydraulic_diameter>(D)}; }
flat_section slot(double b, double width) {
  return {number<kinds::gap>(b), number<kinds::plate_length>(width)};
}

template <class Section, class Fluid>
passage<Section, Fluid> flow_through(const Section& s, const Fluid& f, double kg_s, double inlet_K,
                                     double p = 101325.0) {
  return {s, f, number<kinds::mass_flow>(kg_s), number<kinds::bulk_temperature>(inlet_K),
          number<kinds::pressure>(p)};
}

}  // namespace

TEST_CASE("passage: what the walls give, the fluid takes") {
  // m cp rise against h_i P_i L (T_i - mean), over short, long and very long segments, hot and
  // cold.
  auto air = flow_through(tube(0.02), dry_air{}, 2e-4, 290.0);
  for (const double length : {1e-9, 1e-4, 0.01, 0.3, 10.0, 1e4}) {
    for (const double other : {280.0, 295.0, 420.0}) {
      const wall_patch<> walls[] = {{0.02, 350.0}, {0.01, other}, {0.03, 300.0}};
      const double inlet = air.bulk_K();
      const auto s = air.advance(length, walls);
      double heat = 0.0;
      double turnover = 0.0;
      for (int i = 0; i < 3; ++i) {
        const double one = s.flux_W_m2[i] * walls[i].perimeter_m * length;
        heat += one;
        turnover += std::fabs(one);
        // q = h (T_wall - mean)
        CHECK(s.flux_W_m2[i] ==
              doctest::Approx(s.coefficient_W_m2K[i] * (walls[i].temperature_K - s.mean_K))
                  .epsilon(1e-12));
      }
      CAPTURE(length);
      CHECK(std::fabs(heat - s.heat_W) <= 1e-13 * turnover);
      CHECK(s.inlet_K == inlet);
      CHECK(s.outlet_K == air.bulk_K());
      const double m_cp =
          2e-4 * dry_air{}.values(0.5 * (s.inlet_K + s.outlet_K), 101325.0).specific_heat;
      // To the rounding of the absolute temperatures; cp at the corrector's mean.
      CHECK(std::fabs(m_cp * (s.outlet_K - s.inlet_K) - s.heat_W) <=
            1e-13 * m_cp * s.inlet_K + 2e-3 * std::fabs(s.heat_W));
    }
  }
}

TEST_CASE("passage: heat is m cp rise to rounding with constant properties") {
  for (const double kg_s : {1e-4, 0.01, 1.0}) {
    auto flow = flow_through(tube(0.02), oil(), kg_s, 330.0);
    for (const double length : {1e-6, 0.01, 1.0, 100.0}) {
      const wall_patch<> wall[] = {{pi * 0.02, 390.0}};
      const auto s = flow.advance(length, wall);
      CHECK(std::fabs(kg_s * 2047.0 * (s.outlet_K - s.inlet_K) - s.heat_W) <=
            4e-16 * kg_s * 2047.0 * s.inlet_K + 1e-13 * std::fabs(s.heat_W));
    }
  }
}

TEST_CASE("passage: wall at one temperature, analytic") {
  // T_out = T_w - (T_w - T_in) exp(-h_m P L/(m cp)), h_m the published mean from the inlet: in one
  // segment or in many, to rounding, as the properties are constant.
  const double D = 0.02;
  const double L = 1.5;
  const auto f = oil();
  const auto v = f.values(300.0, 1e5);
  for (const double Re : {50.0, 1500.0, 3000.0, 2e4}) {
    CAPTURE(Re);
    const double kg_s = Re * pi * D * v.viscosity / 4.0;
    const auto whole =
        film_of<double>(round_duct_segment{number<kinds::hydraulic_diameter>(D),
                                           number<kinds::distance_from_inlet>(0.0),
                                           number<kinds::distance_from_inlet>(L)},
                        f, kg_s / (v.density * 0.25 * pi * D * D), 330.0, 390.0, 101325.0);
    const double ntu = whole.coefficient * pi * D * L / (kg_s * v.specific_heat);
    const double out = 390.0 - 60.0 * std::exp(-ntu);
    const double log_mean = (60.0 - (390.0 - out)) / std::log(60.0 / (390.0 - out));
    for (const int segments : {1, 7, 1000}) {
      CAPTURE(segments);
      auto flow = flow_through(tube(D), f, kg_s, 330.0);
      double heat = 0.0;
      passage_step<double, 1> s{};
      for (int i = 0; i < segments; ++i) {
        const wall_patch<> wall[] = {{pi * D, 390.0}};
        s = flow.advance(L / segments, wall);
        heat += s.heat_W;
      }
      CHECK(flow.bulk_K() - 330.0 == doctest::Approx(out - 330.0).epsilon(1e-10));
      CHECK(heat == doctest::Approx(whole.coefficient * pi * D * L * log_mean).epsilon(1e-10));
      CHECK(flow.distance_from_inlet_m() == doctest::Approx(L).epsilon(1e-12));
      if (segments == 1) {
        CHECK(390.0 - s.mean_K == doctest::Approx(log_mean).epsilon(1e-12));
        CHECK(s.begin_m == 0.0);
        CHECK(s.end_m == L);
      } else {
        CHECK(s.begin_m == doctest::Approx(L * (segments - 1) / segments).epsilon(1e-12));
      }
    }
  }
}

TEST_CASE("passage: order in the segment's length where properties vary") {
  // Air from 300 K before a wall at 800 K: 8, 16, 32, 64 segments against 4096.
  const auto outlet = [](int segments, double kg_s, double unheated_m) {
    auto flow = flow_through(tube(0.02), dry_air{}, kg_s, 300.0);
    const wall_patch<> none[] = {{0.0, 800.0}};
    if (unheated_m > 0.0) flow.advance(unheated_m, none);
    for (int i = 0; i < segments; ++i) {
      const wall_patch<> wall[] = {{pi * 0.02, 800.0}};
      flow.advance(1.0 / segments, wall);
    }
    return flow.bulk_K();
  };
  const auto order_between = [&](double kg_s, double unheated_m, double least, double most) {
    CAPTURE(kg_s);
    CAPTURE(unheated_m);
    const double exact = outlet(4096, kg_s, unheated_m);
    double before = std::fabs(outlet(8, kg_s, unheated_m) - exact);
    for (const int segments : {16, 32, 64}) {
      const double off = std::fabs(outlet(segments, kg_s, unheated_m) - exact);
      const double order = std::log2(before / off);
      CAPTURE(segments);
      CHECK(order > least);
      CHECK(order < most);
      before = off;
    }
    // One segment for the whole.
    CHECK(std::fabs(outlet(1, kg_s, unheated_m) - exact) < 0.04 * (exact - 300.0));
  };
  order_between(3e-4, 0.5, 1.8, 2.2);  // laminar, behind the entrance
  order_between(5e-3, 0.5, 1.8, 2.2);  // turbulent
  // From the inlet on, where laminar h grows as x^(-1/2).
  order_between(3e-4, 0.0, 1.4, 1.6);
  order_between(5e-3, 0.0, 1.6, 2.2);
}

TEST_CASE("passage: a very long segment ends at its walls, weighted by their conductance") {
  auto flow = flow_through(slot(0.01, 0.3), dry_air{}, 1e-3, 290.0);
  const wall_patch<> walls[] = {{0.3, 360.0}, {0.3, 310.0}};
  const auto s = flow.advance(1e4, walls);
  const double a = s.coefficient_W_m2K[0];
  const double b = s.coefficient_W_m2K[1];
  CHECK(s.outlet_K == doctest::Approx((a * 360.0 + b * 310.0) / (a + b)).epsilon(1e-12));
  CHECK(s.flux_W_m2[0] > 0.0);
  CHECK(s.flux_W_m2[1] < 0.0);  // the cold wall takes what the hot one gives
}

TEST_CASE("passage: without flow") {
  auto flow = flow_through(tube(0.02), dry_air{}, 0.0, 290.0);
  const wall_patch<> walls[] = {{0.03, 360.0}, {0.03, 310.0}};
  const auto s = flow.advance(0.1, walls);
  CHECK(s.outlet_K == doctest::Approx(335.0).epsilon(1e-6));
  CHECK(std::fabs(s.heat_W) < 1e-6);
  CHECK(s.pressure_drop_Pa < 1e-9);
  CHECK(s.pressure_drop_Pa >= 0.0);
  CHECK(is_finite(s.pressure_drop_Pa));
  CHECK(s.reynolds < 1e-3);
}

TEST_CASE("passage: a negative flow marches the same way") {
  auto forth = flow_through(tube(0.02), dry_air{}, 1e-3, 290.0);
  auto back = flow_through(tube(0.02), dry_air{}, -1e-3, 290.0);
  const wall_patch<> wall[] = {{pi * 0.02, 360.0}};
  const auto a = forth.advance(0.5, wall);
  const auto b = back.advance(0.5, wall);
  CHECK(a.outlet_K == b.outlet_K);
  CHECK(a.heat_W == b.heat_W);
  CHECK(a.pressure_drop_Pa == b.pressure_drop_Pa);
}

TEST_CASE("passage: a cold wall cools") {
  auto flow = flow_through(tube(0.02), liquid_water{}, 0.05, 350.0, 1e6);
  const wall_patch<> wall[] = {{pi * 0.02, 290.0}};
  const auto s = flow.advance(1.0, wall);
  CHECK(s.outlet_K < 350.0);
  CHECK(s.outlet_K > 290.0);
  CHECK(s.heat_W < 0.0);
  CHECK(s.flux_W_m2[0] < 0.0);
  CHECK(s.mean_K < 350.0);
  CHECK(s.mean_K > s.outlet_K);
}

TEST_CASE("passage: a patch without perimeter, and no patch that has any") {
  auto flow = flow_through(tube(0.02), dry_air{}, 1e-3, 290.0);
  const wall_patch<> none[] = {{0.0, 400.0}};
  const auto s = flow.advance(0.5, none);
  CHECK(s.outlet_K == 290.0);
  CHECK(s.mean_K == 290.0);
  CHECK(s.heat_W == 0.0);
  CHECK(verdict<>(s.bits[0]).possible_input());
  const wall_patch<> one[] = {{0.0, 400.0}, {0.05, 350.0}};
  const wall_patch<> alone[] = {{0.05, 350.0}};
  auto copy = flow;
  CHECK(flow.advance(0.5, one).heat_W == copy.advance(0.5, alone).heat_W);
}

TEST_CASE("passage: derivatives by dual<double, 4> against differences") {
  using D = dual<double, 4>;
  const auto march = []<class T>(const T& a, const T& b, const T& kg_s, const T& inlet) {
    passage<flat_section, dry_air, T> flow(slot(0.008, 0.25), dry_air{},
                                           typed<kinds::mass_flow, T>::from_si(kg_s),
                                           typed<kinds::bulk_temperature, T>::from_si(inlet));
    T heat = scalar_adaptor<T>::constant(0.0);
    T drop = heat;
    for (int i = 0; i < 5; ++i) {
      const wall_patch<T> walls[] = {{0.25, a}, {0.25, b}};
      const auto s = flow.advance(0.06, walls);
      heat = T(heat + s.heat_W);
      drop = T(drop + s.pressure_drop_Pa);
    }
    return std::array<T, 3>{flow.bulk_K(), heat, drop};
  };
  for (const double kg_s : {2e-3, 0.0143, 0.05}) {  // laminar, in the hand-over, turbulent
    const double x[] = {350.0, 320.0, kg_s, 295.0};
    const auto exact = march(D::variable(x[0], 0), D::variable(x[1], 1), D::variable(x[2], 2),
                             D::variable(x[3], 3));
    for (int i = 0; i < 4; ++i) {
      const double d = 1e-5 * x[i];
      const auto shifted = [&](double by) {
        double y[] = {x[0], x[1], x[2], x[3]};
        y[i] += by;
        return march(y[0], y[1], y[2], y[3]);
      };
      const auto up = shifted(d);
      const auto down = shifted(-d);
      for (std::size_t k = 0; k < 3; ++k) {
        const double difference = (up[k] - down[k]) / (2.0 * d);
        CAPTURE(kg_s);
        CAPTURE(i);
        CAPTURE(k);
        const double scale = std::fabs(exact[k].value) / x[i];
        CHECK(std::fabs(exact[k].slope[i] - difference) <=
              1e-6 * (std::fabs(difference) + 0.1 * scale));
      }
    }
  }
}

TEST_CASE("passage: where the thermal entrance ends") {
  auto slow = flow_through(tube(0.02), dry_air{}, 1e-4, 300.0);
  const wall_patch<> wall[] = {{pi * 0.02, 300.0}};
  const auto a = slow.advance(0.1, wall);
  const double Pr = dry_air{}.values(300.0, 101325.0).prandtl();
  CHECK(a.thermal_entry_m == doctest::Approx(0.05 * a.reynolds * Pr * 0.02).epsilon(1e-12));
  auto fast = flow_through(tube(0.02), dry_air{}, 1e-2, 300.0);
  CHECK(fast.advance(0.1, wall).thermal_entry_m == doctest::Approx(0.2).epsilon(1e-12));
}

TEST_CASE("passage: bad input is told") {
  const double infinity = HUGE_VAL;
  const auto bits = [](double D, double kg_s, double inlet, double length, double perimeter,
                       double wall, double p = 101325.0) {
    auto flow = flow_through(tube(D), dry_air{}, kg_s, inlet, p);
    const wall_patch<> walls[] = {{perimeter, wall}};
    return verdict<>(flow.advance(length, walls).bits[0]);
  };
  CHECK(bits(0.02, 1e-3, 290.0, 0.5, 0.06, 350.0).inside());
  for (const double x : {-1.0, 0.0, std::nan(""), infinity}) {
    CAPTURE(x);
    CHECK_FALSE(bits(x, 1e-3, 290.0, 0.5, 0.06, 350.0).inside());
    CHECK_FALSE(bits(0.02, 1e-3, 290.0, x, 0.06, 350.0).possible_input());
    CHECK_FALSE(bits(0.02, 1e-3, x, 0.5, 0.06, 350.0).inside());
    CHECK_FALSE(bits(0.02, 1e-3, 290.0, 0.5, 0.06, x).inside());
    CHECK_FALSE(bits(0.02, 1e-3, 290.0, 0.5, 0.06, 350.0, x).inside());
    if (x == 0.0) continue;
    CHECK_FALSE(bits(0.02, 1e-3, 290.0, 0.5, x, 350.0).possible_input());
    if (x < 0.0) continue;
    CHECK_FALSE(bits(0.02, x, 290.0, 0.5, 0.06, 350.0).finite_input());
  }
}
