// names: wall_temperature, double
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
const auto t = wall_temperature(celsius(60.0));
#else
const auto t = wall_temperature(60.0);
#endif
