// names: diameter, double
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
const auto d = diameter(0.05 * units::metre);
#else
const auto d = diameter(0.05);
#endif
