// names: wall_temperature, bulk_temperature
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
const bool hot = wall_temperature(kelvin(350.0)) > wall_temperature(kelvin(300.0));
#else
const bool hot = wall_temperature(kelvin(350.0)) > bulk_temperature(kelvin(300.0));
#endif
