// names: wall_temperature, film_temperature
#include "convelope/fluids/constant_properties.hpp"

using namespace convelope;

constexpr auto wall = wall_temperature(celsius(60.0));
#ifdef TWIN
const typed<kinds::film_temperature> t = film_between(wall, bulk_temperature(celsius(20.0)));
#else
const typed<kinds::film_temperature> t = wall;
#endif
