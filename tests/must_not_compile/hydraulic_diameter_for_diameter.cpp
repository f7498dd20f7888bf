// names: diameter, hydraulic_diameter
#include "convelope/correlations/external/cylinder_crossflow.hpp"

using namespace convelope;

#ifdef TWIN
const auto Re = reynolds_of<diameter>(1e4);
#else
const auto Re = reynolds_of<hydraulic_diameter>(1e4);
#endif
const auto Nu = cylinder_crossflow::churchill_bernstein_1977{}(Re, prandtl_number(0.7));
