// names: nusselt, local_nusselt
#include "convelope/groups/film.hpp"

using namespace convelope;

constexpr auto k = conductivity(0.026 * units::watt_per_metre_kelvin);
constexpr auto x = distance_from_edge(0.5 * units::metre);
#ifdef TWIN
const auto h = local_film_coefficient(local_nusselt_of<distance_from_edge>(50.0), k, x);
#else
const auto h = local_film_coefficient(nusselt_of<distance_from_edge>(50.0), k, x);
#endif
