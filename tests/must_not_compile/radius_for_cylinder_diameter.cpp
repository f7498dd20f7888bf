// names: radius, diameter
#include "convelope/surfaces/cylinder.hpp"

using namespace convelope;

#ifdef TWIN
const cylinder_in_crossflow tube{diameter(0.05 * units::metre)};
#else
const cylinder_in_crossflow tube{radius(0.05 * units::metre)};
#endif
