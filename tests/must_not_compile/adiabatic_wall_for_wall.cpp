// names: adiabatic_wall_temperature, wall_temperature
#include "convelope/groups/state.hpp"

using namespace convelope;

const auto wall = wall_temperature(kelvin(308.0));
const auto stream = free_stream_temperature(kelvin(233.0));
const auto adiabatic = adiabatic_wall_temperature(kelvin(584.0));
#ifdef TWIN
const auto at = eckert_reference(wall, stream, adiabatic);
#else
const auto at = eckert_reference(adiabatic, stream, wall);
#endif
