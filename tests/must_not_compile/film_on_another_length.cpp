// names: diameter, hydraulic_diameter
#include "convelope/groups/film.hpp"

using namespace convelope;

constexpr auto k = conductivity(0.026 * units::watt_per_metre_kelvin);
constexpr auto Nu = nusselt_of<diameter>(50.0);
#ifdef TWIN
const auto h = film_coefficient(Nu, k, diameter(0.05 * units::metre));
#else
const auto h = film_coefficient(Nu, k, hydraulic_diameter(0.05 * units::metre));
#endif
