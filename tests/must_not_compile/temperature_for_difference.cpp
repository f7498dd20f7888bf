// names: temperature_difference, wall_temperature
#include "convelope/groups/film.hpp"

using namespace convelope;

constexpr auto h = film_coefficient(25.0 * units::watt_per_square_metre_kelvin);
constexpr auto hot = wall_temperature(celsius(60.0));
constexpr auto cold = bulk_temperature(celsius(20.0));
#ifdef TWIN
const auto q = heat_flux_of(h, hot - cold);
#else
const auto q = heat_flux_of(h, hot);
#endif
