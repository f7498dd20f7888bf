// names: is_duct_reynolds, plate_length
#include "convelope/groups/forced.hpp"

using namespace convelope;

constexpr auto Pr = prandtl_number(6.0);
constexpr auto d = hydraulic_diameter(0.01 * units::metre);
constexpr auto x = distance_from_inlet(1.0 * units::metre);
#ifdef TWIN
const auto Gz = graetz(reynolds_of<hydraulic_diameter>(1e3), Pr, d, x);
#else
const auto Gz = graetz(reynolds_of<plate_length>(1e3), Pr, d, x);
#endif
