// names: wall_temperature, free_stream_temperature
#include "convelope/surfaces/exposure.hpp"

using namespace convelope;

constexpr auto u = 2.0 * units::metre_per_second;
#ifdef TWIN
const stream s{free_stream_velocity(u), free_stream_temperature(celsius(20.0))};
#else
const stream s{free_stream_velocity(u), wall_temperature(celsius(20.0))};
#endif
