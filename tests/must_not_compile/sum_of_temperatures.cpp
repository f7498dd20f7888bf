// names: wall_temperature, bulk_temperature
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
const auto x = wall_temperature(kelvin(350.0)) - bulk_temperature(kelvin(300.0));
#else
const auto x = wall_temperature(kelvin(350.0)) + bulk_temperature(kelvin(300.0));
#endif
