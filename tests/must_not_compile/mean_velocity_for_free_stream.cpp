// names: free_stream_velocity, mean_velocity
#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "convelope/groups/forced.hpp"

using namespace convelope;

constexpr auto u = 2.0 * units::metre_per_second;
constexpr auto d = diameter(0.05 * units::metre);
constexpr auto nu = kinematic_viscosity(1.5e-5 * units::square_metre_per_second);
#ifdef TWIN
const auto Re = reynolds(free_stream_velocity(u), d, nu);
#else
const auto Re = reynolds(mean_velocity(u), d, nu);
#endif
const auto Nu = cylinder_crossflow::churchill_bernstein_1977{}(Re, prandtl_number(0.7));
