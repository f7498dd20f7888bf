// names: darcy_friction, fanning_friction
#include "convelope/correlations/friction/factors.hpp"

using namespace convelope;

#ifdef TWIN
const auto f = friction::to_darcy(fanning_friction(0.005));
#else
const auto f = friction::to_darcy(darcy_friction(0.005));
#endif
