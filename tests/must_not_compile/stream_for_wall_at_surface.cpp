// names: wall_temperature, free_stream_temperature
#include "convelope/boundary/surface.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/surfaces/cylinder.hpp"

using namespace convelope;

constexpr stream air{free_stream_velocity(2.0 * units::metre_per_second),
                     free_stream_temperature(celsius(20.0))};
const auto tube = surface(cylinder_in_crossflow{diameter(0.05 * units::metre)}, dry_air{}, air);
#ifdef TWIN
const auto answer = tube.at(wall_temperature(celsius(60.0)));
#else
const auto answer = tube.at(free_stream_temperature(celsius(60.0)));
#endif
