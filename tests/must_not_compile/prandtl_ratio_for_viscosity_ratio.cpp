// names: prandtl_ratio, viscosity_ratio
#include "convelope/groups/property_ratio.hpp"

using namespace convelope;

#ifdef TWIN
const auto factor = property_ratio::sieder_tate_1936{}(viscosity_ratio(2.0));
#else
const auto factor = property_ratio::sieder_tate_1936{}(prandtl_ratio(2.0));
#endif
