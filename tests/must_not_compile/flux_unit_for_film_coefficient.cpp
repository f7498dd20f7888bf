// names: film_coefficient, mass_base_dimension
#include "convelope/groups/film.hpp"

using namespace convelope;

#ifdef TWIN
const auto h = film_coefficient(25.0 * units::watt_per_square_metre_kelvin);
#else
const auto h = film_coefficient(25.0 * units::watt_per_square_metre);
#endif
