// names: temperature_difference, absolute
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
const auto dT = temperature_difference(60.0 * units::kelvin_difference);
#else
const auto dT = temperature_difference(kelvin(60.0));
#endif
