// names: diameter, gap
#include "convelope/kinds.hpp"

using namespace convelope;

const auto d = diameter(0.05 * units::metre);
#ifdef TWIN
const auto x = d + diameter(0.01 * units::metre);
#else
const auto x = d + gap(0.01 * units::metre);
#endif
