// names: darcy_friction, fanning_friction
#include "convelope/correlations/friction/factors.hpp"

using namespace convelope;

#ifdef TWIN
const auto f = friction::to_fanning(darcy_friction(0.02));
#else
const auto f = friction::to_fanning(fanning_friction(0.02));
#endif
