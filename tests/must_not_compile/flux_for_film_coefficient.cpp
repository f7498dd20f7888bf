// names: film_coefficient, heat_flux
#include "convelope/groups/film.hpp"

using namespace convelope;

constexpr auto k = conductivity(0.026 * units::watt_per_metre_kelvin);
constexpr auto d = diameter(0.05 * units::metre);
#ifdef TWIN
const auto Nu = nusselt(film_coefficient(25.0 * units::watt_per_square_metre_kelvin), d, k);
#else
const auto Nu = nusselt(heat_flux(25.0 * units::watt_per_square_metre), d, k);
#endif
