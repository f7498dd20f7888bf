// What the catalogue says of water outside the published rows: verdicts, and where two entries
// have to agree.
#include <doctest/doctest.h>

#include <limits>

#include "close_to.hpp"
#include "convelope/catalogue/find.hpp"
#include "convelope/catalogue/fluids_water.hpp"
#include "convelope/fluids/detail/iapws_conductivity.hpp"

using namespace convelope;

namespace {
using detail::word::of_correlation;

catalogue::answer ask(const char* id, const char* quantity, double x, double y = 0.0,
                      double z = 0.0) {
  const catalogue::match m = catalogue::find(catalogue::water_entries, id, quantity);
  REQUIRE(m.how == catalogue::found::one);
  const double inputs[catalogue::most_inputs] = {x, y, z};
  return m.which->evaluate(inputs);
}
std::uint64_t limits_crossed(const catalogue::answer& a) {
  return a.verdict.bits() & ~detail::word::scatter_not_stated;
}
constexpr const char* whole_k = "fluid/water-r15-11-if97";
}  // namespace

TEST_CASE("water by name: no entry stands twice") {
  const auto& all = catalogue::water_entries;
  for (std::size_t i = 0; i < all.size(); ++i) {
    CAPTURE(all[i].info->id);
    CAPTURE(all[i].info->quantity);
    CHECK(catalogue::find(all, all[i].info->id, all[i].info->quantity).which == &all[i]);
  }
}

TEST_CASE("water by name: the fluids are those of the library") {
  CHECK(ask("fluid/water", "beta", 275.0, 1e5).value ==
        liquid_water{}.values(275.0, 1e5).expansion);
  CHECK(ask("fluid/water", "beta", 275.0, 1e5).value < 0.0);
  CHECK(ask("fluid/water-fast", "mu", 300.0, 1e5).value ==
        liquid_water_fast{}.values(300.0, 1e5).viscosity);
  CHECK(ask("fluid/water-steam", "Pr", 400.0, 1e5).value == steam{}.values(400.0, 1e5).prandtl());
  CHECK(limits_crossed(ask("fluid/water-steam", "k", 360.0, 101325.0)) ==
        of_correlation(0, 2, side::above));
}

TEST_CASE("water by name: the regions keep to themselves") {
  CHECK(limits_crossed(ask("fluid/water-if97-r1", "h", 380.0, 101325.0)) ==
        of_correlation(0, 2, side::below));
  CHECK(limits_crossed(ask("fluid/water-if97-r2", "h", 360.0, 101325.0)) ==
        of_correlation(0, 2, side::above));
  CHECK(limits_crossed(ask("fluid/water-if97-r2", "cp", 650.0, 25e6)) ==
        of_correlation(0, 3, side::above));
  CHECK(limits_crossed(ask("fluid/water-if97-r5", "s", 1073.0, 1e6)) ==
        of_correlation(0, 0, side::below));
  CHECK(limits_crossed(ask("fluid/water-if97-r5", "s", 1500.0, 51e6)) ==
        of_correlation(0, 1, side::above));
  // Region 3: between the phases, too close to an ideal gas, too dense, and right.
  CHECK(limits_crossed(ask("fluid/water-if97-r3", "p", 640.0, 322.0)) ==
        of_correlation(0, 2, side::below));
  CHECK(limits_crossed(ask("fluid/water-if97-r3", "p", 700.0, 50.0)) ==
        of_correlation(0, 3, side::below));
  CHECK(limits_crossed(ask("fluid/water-if97-r3", "p", 650.0, 900.0)) ==
        of_correlation(0, 1, side::above));
  CHECK(limits_crossed(ask("fluid/water-if97-r3", "p", 640.0, 500.0)) == 0);
  CHECK(limits_crossed(ask("fluid/water-if97-r3", "p", 640.0, 175.0)) == 0);
  CHECK(limits_crossed(ask("fluid/water-if97-r3", "p", 647.2, 322.0)) == 0);
  CHECK_FALSE(ask("fluid/water-if97-r3", "p", 650.0, -1.0).verdict.inside());
  const volatile double nan = std::numeric_limits<double>::quiet_NaN();
  for (const char* id : {"fluid/water-if97-r1", "fluid/water-if97-r2", "fluid/water-if97-r3",
                         "fluid/water-if97-r5"}) {
    CHECK_FALSE(ask(id, "h", nan, 1e5).verdict.finite_input());
    CHECK_FALSE(ask(id, "h", 650.0, nan).verdict.finite_input());
  }
}

TEST_CASE("water by name: the critical enhancement of the conductivity") {
  const std::uint64_t not_in_region = of_correlation(0, 2, side::below);
  CHECK(ask(whole_k, "k", 620.0, 20e6).verdict.bits() == 0);
  CHECK(ask(whole_k, "k", 300.0, 1e5).verdict.bits() == 0);
  CHECK(ask(whole_k, "k", 400.0, 1e5).verdict.bits() == 0);
  CHECK(ask(whole_k, "k", 1100.0, 1e6).verdict.bits() == 0);
  CHECK(ask(whole_k, "k", 647.35, 0.0, 322.0).verdict.bits() == 0);
  CHECK(ask(whole_k, "k", 650.0, 25e6).verdict.bits() == not_in_region);
  CHECK(ask(whole_k, "k", 400.0, 0.0, 1.0).verdict.bits() != 0);
  CHECK(ask(whole_k, "k", 647.35, 22e6, 322.0).verdict.bits() == not_in_region);
  CHECK(ask(whole_k, "k", 647.35).verdict.bits() != 0);
  const volatile double nan = std::numeric_limits<double>::quiet_NaN();
  CHECK_FALSE(ask(whole_k, "k", nan, 1e5).verdict.finite_input());
  CHECK_FALSE(ask(whole_k, "k", 400.0, nan).verdict.finite_input());
  CHECK_FALSE(ask(whole_k, "k", 400.0, 1e5, nan).verdict.finite_input());
  // Never below the background, and nothing far from the critical point.
  for (double T = 280.0; T < 1073.0; T += 20.0) {
    CAPTURE(T);
    const double whole = ask(whole_k, "k", T, 1e5).value;
    const double background = T < 372.0 ? liquid_water{}.values(T, 1e5).conductivity
                                        : steam{}.values(T, 1e5).conductivity;
    CHECK(whole >= background * (1.0 - 1e-9));
    CHECK(close_to(whole, background, 2e-4));
  }
  // What steam's note says it leaves out at saturation.
  struct row {
    double T, part;
  };
  for (const row& r :
       {row{500.0, 0.0051}, row{550.0, 0.0229}, row{600.0, 0.110}, row{623.15, 0.240}}) {
    CAPTURE(r.T);
    const double whole = ask("fluid/water-sat-vapour", "k", r.T).value;
    CHECK(1.0 - saturated_water::vapour(r.T).conductivity / whole ==
          doctest::Approx(r.part).epsilon(0.02));
    CHECK(r.part < steam{}.info()->uncertainty.conductivity);
  }
}

TEST_CASE(
    "IAPWS R15-11: the reference compressibility is that of water at 1.5 critical temperatures") {
  namespace r15_11 = detail::r15_11;
  // Fitted to another equation of state than IF97, hence the band.
  const double T = 1.5 * 647.096;
  for (const double p : {1e5, 1e6, 5e6, 1e7, 2e7, 4e7, 6e7, 8e7, 1e8}) {
    CAPTURE(p);
    const auto s = detail::if97::region2_state(T, p);
    const double r = 1.0 / (322.0 * s.volume);
    CHECK(close_to(r15_11::reference_compressibility(r), r * s.compressibility * 22.064e6, 2e-3));
  }
  // Its five ranges meet, as far as the fit goes.
  for (const double r : r15_11::reference_ranges) {
    CAPTURE(r);
    CHECK(close_to(r15_11::reference_compressibility(r * (1.0 - 1e-9)),
                   r15_11::reference_compressibility(r * (1.0 + 1e-9)), 2e-3));
  }
}

TEST_CASE("water by name: the saturation line's two sides") {
  for (const double T : {273.15, 373.15, 500.0, 623.15}) {
    CAPTURE(T);
    const double p = ask("fluid/water-if97-r4", "psat", T).value;
    CHECK(ask("fluid/water-sat-liquid", "psat", T).value == p);
    CHECK(close_to(ask("fluid/water-sat-liquid", "v", T).value,
                   ask("fluid/water-if97-r1", "v", T, p).value, 1e-12));
    CHECK(close_to(ask("fluid/water-sat-vapour", "v", T).value,
                   ask("fluid/water-if97-r2", "v", T, p).value, 1e-12));
    CHECK(close_to(ask("fluid/water-sat-vapour", "cp", T).value,
                   ask("fluid/water-if97-r2", "cp", T, p).value, 1e-12));
    CHECK(ask("fluid/water-sat-liquid", "sigma", T).verdict.inside());
  }
  CHECK(limits_crossed(ask("fluid/water-sat-liquid", "rho", 624.0)) ==
        of_correlation(0, 0, side::above));
}
