// names: velocity, wall_temperature
#include "convelope/groups/forced.hpp"

using namespace convelope;

constexpr auto rho = density(1.2 * units::kilogram_per_cubic_metre);
constexpr auto d = diameter(0.05 * units::metre);
constexpr auto mu = viscosity(1.8e-5 * units::pascal_second);
#ifdef TWIN
const auto Re = reynolds(rho, free_stream_velocity(2.0 * units::metre_per_second), d, mu);
#else
const auto Re = reynolds(rho, wall_temperature(kelvin(300.0)), d, mu);
#endif
