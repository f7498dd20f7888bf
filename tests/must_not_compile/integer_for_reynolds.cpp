// names: reynolds, diameter, int
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
const auto Re = reynolds_of<diameter>(10000.0);
#else
const auto Re = reynolds_of<diameter>(10000);
#endif
