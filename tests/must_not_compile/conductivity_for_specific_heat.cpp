// names: specific_heat, conductivity
#include "convelope/groups/forced.hpp"

using namespace convelope;

constexpr auto cp = specific_heat(1007.0 * units::joule_per_kilogram_kelvin);
constexpr auto mu = viscosity(1.8e-5 * units::pascal_second);
constexpr auto k = conductivity(0.026 * units::watt_per_metre_kelvin);
#ifdef TWIN
const auto Pr = prandtl(cp, mu, k);
#else
const auto Pr = prandtl(k, mu, k);
#endif
