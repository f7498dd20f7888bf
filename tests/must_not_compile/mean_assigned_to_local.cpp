// names: film_coefficient, local_film_coefficient
#include "convelope/groups/film.hpp"

using namespace convelope;

constexpr auto unit = units::watt_per_square_metre_kelvin;
#ifdef TWIN
const typed<kinds::local_film_coefficient> h = local_film_coefficient(25.0 * unit);
#else
const typed<kinds::local_film_coefficient> h = film_coefficient(25.0 * unit);
#endif
