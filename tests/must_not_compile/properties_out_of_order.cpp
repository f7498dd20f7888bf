// names: specific_heat, conductivity
#include "convelope/fluids/constant_properties.hpp"

using namespace convelope;

constexpr auto rho = density(870.0 * units::kilogram_per_cubic_metre);
constexpr auto cp = specific_heat(1900.0 * units::joule_per_kilogram_kelvin);
constexpr auto k = conductivity(0.13 * units::watt_per_metre_kelvin);
constexpr auto mu = viscosity(0.03 * units::pascal_second);
constexpr auto beta = expansion_coefficient(7e-4 * units::per_kelvin);
#ifdef TWIN
const constant_properties oil{rho, cp, k, mu, beta};
#else
const constant_properties oil{rho, k, cp, mu, beta};
#endif
