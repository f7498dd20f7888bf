// names: temperature_difference, wall_temperature
#include "convelope/groups/natural.hpp"

using namespace convelope;

constexpr auto rho = density(1.2 * units::kilogram_per_cubic_metre);
constexpr auto beta = expansion_coefficient(3.3e-3 * units::per_kelvin);
constexpr auto mu = viscosity(1.8e-5 * units::pascal_second);
constexpr auto h = height(0.2 * units::metre);
constexpr auto t = wall_temperature(kelvin(310.0));
#ifdef TWIN
const auto Gr = grashof(rho, beta, t - ambient_temperature(kelvin(300.0)), h, mu);
#else
const auto Gr = grashof(rho, beta, t, h, mu);
#endif
