// names: darcy_friction, fanning_friction
#include "convelope/correlations/friction/smooth_duct.hpp"

using namespace convelope;

constexpr auto Re = reynolds_of<hydraulic_diameter>(1e4);
#ifdef TWIN
const estimate<kinds::darcy_friction> f = friction::blasius_1913{}(Re);
#else
const estimate<kinds::fanning_friction> f = friction::blasius_1913{}(Re);
#endif
