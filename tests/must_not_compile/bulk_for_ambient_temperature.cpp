// names: bulk_temperature, ambient_temperature
#include "convelope/surfaces/exposure.hpp"

using namespace convelope;

#ifdef TWIN
const still air{ambient_temperature(celsius(20.0))};
#else
const still air{bulk_temperature(celsius(20.0))};
#endif
