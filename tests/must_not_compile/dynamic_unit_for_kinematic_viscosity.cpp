// names: kinematic_viscosity, mass_base_dimension
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
const auto nu = kinematic_viscosity(1.5e-5 * units::square_metre_per_second);
#else
const auto nu = kinematic_viscosity(1.5e-5 * units::pascal_second);
#endif
