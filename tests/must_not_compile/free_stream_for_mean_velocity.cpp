// names: free_stream_velocity, mean_velocity
#include "convelope/surfaces/exposure.hpp"

using namespace convelope;

constexpr auto u = 2.0 * units::metre_per_second;
#ifdef TWIN
const duct_flow flow{mean_velocity(u), bulk_temperature(celsius(20.0))};
#else
const duct_flow flow{free_stream_velocity(u), bulk_temperature(celsius(20.0))};
#endif
