// names: Eckert's reference temperature needs, adiabatic-wall temperature
#include "convelope/groups/state.hpp"

using namespace convelope;

struct fast_plate {
  static constexpr state_rule state_at = state_rule::eckert;
};
const auto wall = wall_temperature(kelvin(308.0));
const auto stream = free_stream_temperature(kelvin(233.0));
#ifdef TWIN
const auto adiabatic = adiabatic_wall_temperature(kelvin(584.0));
const auto at = state_temperature<fast_plate>(wall, stream, adiabatic);
#else
const auto at = state_temperature<fast_plate>(wall, stream);
#endif
