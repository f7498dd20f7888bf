// names: diameter, int
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
const auto d = diameter(1.0 * units::metre);
#else
const auto d = diameter(1 * units::metre);
#endif
