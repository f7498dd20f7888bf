// Gases: every constant pinned, by values from another spelling of the published equations in 40
// digits. They show that nothing was mistyped since, not that the equations are right: that is the
// business of tests/published.
#include <doctest/doctest.h>

#include "close_to.hpp"
#include "convelope/catalogue/find.hpp"
#include "convelope/catalogue/fluids_gases.hpp"

using namespace convelope;

namespace {
struct pin {
  const char* id;
  const char* quantity;
  double first, second;  // T and p, rho or rhom, as the entry has it
  double value;
};
constexpr pin pins[] = {
    {"fluid/helium", "mu", 100, 1e5, 9.5681501941346144e-06},
    {"fluid/helium", "k", 100, 1e5, 7.3631893354595607e-02},
    {"fluid/helium", "mu", 250, 1e5, 1.7597052234283631e-05},
    {"fluid/helium", "k", 250, 1e5, 1.3745656414301813e-01},
    {"fluid/helium", "mu", 1500, 1e5, 6.1545904196056442e-05},
    {"fluid/helium", "k", 1500, 1e5, 4.7893866597257001e-01},
    {"fluid/hydrogen", "mu", 200, 1e5, 6.7463843771842846e-06},
    {"fluid/hydrogen", "cp", 200, 1e5, 1.3531447510518123e+04},
    {"fluid/hydrogen", "mu", 450, 1e5, 1.1838028160587835e-05},
    {"fluid/hydrogen", "cp", 450, 1e5, 1.4498860274699737e+04},
    {"fluid/hydrogen", "mu", 1000, 1e5, 2.0725966059063029e-05},
    {"fluid/hydrogen", "cp", 1000, 1e5, 1.4991786835197650e+04},
    {"fluid/hydrogen-normal-assael", "k", 60, 70, 1.6379610326491229e-01},
    {"fluid/hydrogen-normal-assael", "k", 300, 40, 2.5180401805005276e-01},
    {"fluid/hydrogen-normal-assael", "k", 900, 20, 4.4814219285212831e-01},
    {"fluid/hydrogen-para-assael", "k", 60, 70, 1.9134010935023071e-01},
    {"fluid/hydrogen-para-assael", "k", 300, 40, 2.5144394150555111e-01},
    {"fluid/hydrogen-para-assael", "k", 900, 20, 4.5708252036437808e-01},
    {"fluid/carbon-dioxide-fenghour", "mu", 230, 1100, 1.8436517882972151e-04},
    {"fluid/carbon-dioxide-huber", "k", 230, 1100, 1.5054005834850362e-01},
    {"fluid/carbon-dioxide-laesecke-muzny", "mu", 230, 1100, 1.8268391146420690e-04},
    {"fluid/carbon-dioxide-eosB", "B", 230, 0, -2.2309155140834108e-04},
    {"fluid/carbon-dioxide-fenghour", "mu", 320, 700, 5.6445231313320067e-05},
    {"fluid/carbon-dioxide-huber", "k", 320, 700, 7.1319567582664528e-02},
    {"fluid/carbon-dioxide-laesecke-muzny", "mu", 320, 700, 5.6679617578128838e-05},
    {"fluid/carbon-dioxide-eosB", "B", 320, 0, -1.0442377852535638e-04},
    {"fluid/carbon-dioxide-fenghour", "mu", 1000, 150, 4.3489787079096908e-05},
    {"fluid/carbon-dioxide-huber", "k", 1000, 150, 7.5714260550125548e-02},
    {"fluid/carbon-dioxide-laesecke-muzny", "mu", 1000, 150, 4.3555420678809603e-05},
    {"fluid/carbon-dioxide-eosB", "B", 1000, 0, 1.6448789707222723e-05},
    {"fluid/humid-air-hw", "psat", 273.15, 0, 6.1121286745118834e+02},
    {"fluid/humid-air-hw", "psat", 373.15, 0, 1.0141871682799202e+05},
    {"fluid/humid-air-hw", "psat", 473.15, 0, 1.5550737456362108e+06},
    {"fluid/nitrogen-lj", "mu", 90, 28000, 1.2763700550679941e-04},
    {"fluid/nitrogen-lj", "mu", 400, 4000, 2.4243116578751493e-05},
    {"fluid/nitrogen-lj", "k", 400, 4000, 3.8052732704198282e-02},
    {"fluid/nitrogen-lj", "mu", 700, 15000, 4.9064415782497560e-05},
    {"fluid/nitrogen-lj", "k", 700, 15000, 8.4896467731916017e-02},
    {"fluid/oxygen-lj", "mu", 90, 28000, 7.4639469490010089e-05},
    {"fluid/oxygen-lj", "mu", 400, 4000, 2.8478594365451727e-05},
    {"fluid/oxygen-lj", "k", 400, 4000, 3.8707964231645124e-02},
    {"fluid/oxygen-lj", "mu", 700, 15000, 5.5470259040536819e-05},
    {"fluid/oxygen-lj", "k", 700, 15000, 8.0755052839314445e-02},
    {"fluid/argon-lj", "mu", 90, 28000, 1.0050246578406684e-04},
    {"fluid/argon-lj", "mu", 400, 4000, 3.1346977651676447e-05},
    {"fluid/argon-lj", "k", 400, 4000, 2.6737549124046214e-02},
    {"fluid/argon-lj", "mu", 700, 15000, 6.3130599759910546e-05},
    {"fluid/argon-lj", "k", 700, 15000, 5.9120741528822754e-02},
    {"fluid/air-lj", "mu", 90, 28000, 1.0943672749382956e-04},
    {"fluid/air-lj", "mu", 400, 4000, 2.5162747096378747e-05},
    {"fluid/air-lj", "k", 400, 4000, 3.8123033678779908e-02},
    {"fluid/air-lj", "mu", 700, 15000, 4.8473282067326739e-05},
    {"fluid/air-lj", "k", 700, 15000, 8.3875544676743991e-02},
};

template <class Equation>
double delta_slope(double tau, double delta) {
  namespace helmholtz = detail::helmholtz;
  return helmholtz::residual(helmholtz::isotherm_of<Equation>(tau, 1.0 / tau), delta).d;
}
}  // namespace

TEST_CASE("gases: pinned values") {
  for (const pin& p : pins) {
    CAPTURE(p.id);
    CAPTURE(p.quantity);
    CAPTURE(p.first);
    const catalogue::match m = catalogue::find(catalogue::gas_entries, p.id, p.quantity);
    REQUIRE(m.which != nullptr);
    const double x[] = {p.first, p.second, 0.0, 0.0};
    CHECK(close_to(m.which->evaluate(x).value, p.value, 2e-12));
  }
}

TEST_CASE("equations of state: pinned values of delta d(alpha)/d(delta)") {
  struct row {
    double tau, delta, value;
  };
  for (const row& r :
       {row{0.88, 1.02, -5.0513727955976273e-01}, row{0.91, 0.98, -5.3816110425026742e-01},
        row{1.1, 0.7, -6.7715914355054607e-01}, row{0.5, 2.2, 1.0482024529703062e+00}}) {
    CAPTURE(r.tau);
    CHECK(close_to(delta_slope<detail::air_equation>(r.tau, r.delta), r.value, 2e-12));
  }
  for (const row& r :
       {row{0.88, 1.02, -5.3120602889774771e-01}, row{0.91, 0.98, -5.6952437439909864e-01},
        row{1.1, 0.7, 2.7885093951681350e+00}, row{0.5, 2.2, 1.6103669717478117e+00}}) {
    CAPTURE(r.tau);
    CHECK(close_to(delta_slope<detail::nitrogen_equation>(r.tau, r.delta), r.value, 2e-12));
  }
  for (const row& r :
       {row{0.88, 1.02, -5.3572415667153883e-01}, row{0.91, 0.98, -5.7326305325847815e-01},
        row{1.1, 0.7, -7.6737356127870515e-01}, row{0.5, 2.2, 1.5509812314784341e+00}}) {
    CAPTURE(r.tau);
    CHECK(close_to(delta_slope<detail::oxygen_equation>(r.tau, r.delta), r.value, 2e-12));
  }
  for (const row& r :
       {row{0.88, 1.02, -5.3834592995638486e-01}, row{0.91, 0.98, -5.7466056555870049e-01},
        row{1.1, 0.7, -8.8872931760456597e-01}, row{0.5, 2.2, 1.4710563357135775e+00}}) {
    CAPTURE(r.tau);
    CHECK(close_to(delta_slope<detail::argon_equation>(r.tau, r.delta), r.value, 2e-12));
  }
}
