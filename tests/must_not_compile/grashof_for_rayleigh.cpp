// names: rayleigh, grashof
#include "convelope/correlations/natural/horizontal_cylinder.hpp"

using namespace convelope;

#ifdef TWIN
const auto Nu = horizontal_cylinder::morgan_1975{}(rayleigh_of<diameter>(1e6));
#else
const auto Nu = horizontal_cylinder::morgan_1975{}(grashof_of<diameter>(1e6));
#endif
