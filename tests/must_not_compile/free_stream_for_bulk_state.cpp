// names: free_stream_temperature, another temperature belongs to this correlation
#include "convelope/correlations/internal/round_duct_turbulent.hpp"
#include "convelope/groups/state.hpp"

using namespace convelope;

const auto wall = wall_temperature(celsius(60.0));
#ifdef TWIN
const auto stream = bulk_temperature(celsius(20.0));
#else
const auto stream = free_stream_temperature(celsius(20.0));
#endif
const auto at = state_temperature<round_duct::dittus_boelter_mcadams>(wall, stream);
