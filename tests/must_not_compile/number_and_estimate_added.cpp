// names: film_coefficient, flux_slope
#include "convelope/estimate/estimate.hpp"
#include "convelope/groups/film.hpp"

using namespace convelope;

constexpr auto unit = units::watt_per_square_metre_kelvin;
constexpr estimate<kinds::flux_slope> slope{27.0, verdict<>(0), 0.04, nullptr, nullptr};
#ifdef TWIN
const auto x = film_coefficient(25.0 * unit) - film_coefficient(20.0 * unit);
#else
const auto x = film_coefficient(25.0 * unit) - slope;
#endif
