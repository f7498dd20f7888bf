// names: prandtl, int
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
const auto Pr = prandtl_number(1.0);
#else
const auto Pr = prandtl_number(1);
#endif
