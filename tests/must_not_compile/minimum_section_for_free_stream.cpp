// names: free_stream_velocity, minimum_section_velocity
#include "convelope/correlations/external/cylinder_crossflow.hpp"

using namespace convelope;

#ifdef TWIN
const auto Re = reynolds_of<diameter, free_stream_velocity>(1e4);
#else
const auto Re = reynolds_of<diameter, minimum_section_velocity>(1e4);
#endif
const auto Nu = cylinder_crossflow::churchill_bernstein_1977{}(Re, prandtl_number(0.7));
