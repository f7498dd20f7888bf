// names: corrected, nusselt_correction
#include "convelope/groups/property_ratio.hpp"

using namespace convelope;

constexpr auto Nu = nusselt_of<hydraulic_diameter>(100.0);
constexpr auto factor = nusselt_correction(1.1);
#ifdef TWIN
const auto once = corrected_number(Nu, factor);
#else
const auto twice = corrected_number(corrected_number(Nu, factor), factor);
#endif
