// names: specific_heat, mass_base_dimension
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
const auto cp = specific_heat(1007.0 * units::joule_per_kilogram_kelvin);
#else
const auto cp = specific_heat(1007.0 * units::watt_per_metre_kelvin);
#endif
