// names: local_nusselt, nusselt
#include "convelope/groups/film.hpp"

using namespace convelope;

constexpr auto k = conductivity(0.026 * units::watt_per_metre_kelvin);
constexpr auto l = plate_length(0.5 * units::metre);
#ifdef TWIN
const auto h = film_coefficient(nusselt_of<plate_length>(50.0), k, l);
#else
const auto h = film_coefficient(local_nusselt_of<plate_length>(50.0), k, l);
#endif
