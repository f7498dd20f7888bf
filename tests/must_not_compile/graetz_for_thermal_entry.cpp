// names: graetz, thermal_entry
#include "convelope/groups/forced.hpp"

using namespace convelope;

constexpr auto Re = reynolds_of<hydraulic_diameter>(1e3);
constexpr auto Pr = prandtl_number(6.0);
constexpr auto d = hydraulic_diameter(0.01 * units::metre);
constexpr auto x = distance_from_inlet(1.0 * units::metre);
#ifdef TWIN
const typed<kinds::thermal_entry> entry = thermal_entry_coordinate(Re, Pr, d, x);
#else
const typed<kinds::thermal_entry> entry = graetz(Re, Pr, d, x);
#endif
