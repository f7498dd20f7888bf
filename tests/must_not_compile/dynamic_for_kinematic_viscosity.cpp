// names: kinematic_viscosity, viscosity
#include "convelope/groups/forced.hpp"

using namespace convelope;

constexpr auto u = free_stream_velocity(2.0 * units::metre_per_second);
constexpr auto d = diameter(0.05 * units::metre);
#ifdef TWIN
const auto Re = reynolds(u, d, kinematic_viscosity(1.5e-5 * units::square_metre_per_second));
#else
const auto Re = reynolds(u, d, viscosity(1.5e-5 * units::pascal_second));
#endif
