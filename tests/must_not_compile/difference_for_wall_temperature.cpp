// names: wall_temperature, temperature_base_dimension
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
const auto t = wall_temperature(kelvin(60.0));
#else
const auto t = wall_temperature(60.0 * units::kelvin_difference);
#endif
