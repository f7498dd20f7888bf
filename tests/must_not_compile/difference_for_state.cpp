// names: temperature_difference, is_point
#include "convelope/fluids/constant_properties.hpp"

using namespace convelope;

constexpr constant_properties oil{density(870.0 * units::kilogram_per_cubic_metre),
                                  specific_heat(1900.0 * units::joule_per_kilogram_kelvin),
                                  conductivity(0.13 * units::watt_per_metre_kelvin),
                                  viscosity(0.03 * units::pascal_second),
                                  expansion_coefficient(7e-4 * units::per_kelvin)};
constexpr auto p = pressure(101325.0 * units::pascals);
constexpr auto hot = wall_temperature(celsius(60.0));
#ifdef TWIN
const auto at = state_of(oil, hot, p);
#else
const auto at = state_of(oil, hot - bulk_temperature(celsius(20.0)), p);
#endif
