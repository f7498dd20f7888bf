// Enthalpy and entropy of IAPWS R7-97(2012) Table 5, between the table's states: integrals of the
// heat capacity on temperature, and of density and expansion on pressure.
#include <doctest/doctest.h>

#include <boost/math/quadrature/gauss.hpp>

#include "../fluids/close_to.hpp"
#include "convelope/fluids/liquid_water.hpp"

using namespace convelope;

namespace {
constexpr liquid_water water{};
template <class Rule>
double integral(Rule rule, double from, double to) {
  return boost::math::quadrature::gauss<double, 30>::integrate(rule, from, to);
}
}  // namespace

TEST_CASE("heat capacity adds up to the enthalpy and entropy of the release") {
  const double h = integral([](double T) { return water.values(T, 3e6).specific_heat; }, 300, 500);
  const double s =
      integral([](double T) { return water.values(T, 3e6).specific_heat / T; }, 300, 500);
  CHECK(close_to(h, 0.975542239e6 - 0.115331273e6, 0.0, 1.1e-3));
  CHECK(close_to(s, 0.258041912e4 - 0.392294792e3, 0.0, 6e-6));
}

TEST_CASE("density and expansion add up to the enthalpy and entropy of the release") {
  const double h = integral(
      [](double p) {
        const auto v = water.values(300.0, p);
        return (1.0 - 300.0 * v.expansion) / v.density;
      },
      3e6, 80e6);
  const double s = integral(
      [](double p) {
        const auto v = water.values(300.0, p);
        return -v.expansion / v.density;
      },
      3e6, 80e6);
  CHECK(close_to(h, 0.184142828e6 - 0.115331273e6, 0.0, 1.1e-3));
  CHECK(close_to(s, 0.368563852e3 - 0.392294792e3, 0.0, 1.1e-6));
}
