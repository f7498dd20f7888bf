#ifndef CONVELOPE_UNITS_UNITS_HPP
#define CONVELOPE_UNITS_UNITS_HPP

#include <boost/units/absolute.hpp>
#include <boost/units/derived_dimension.hpp>
#include <boost/units/quantity.hpp>
#include <boost/units/systems/si.hpp>

#include "convelope/mark.hpp"

namespace convelope {
inline namespace v0 {

/// The unit types of the trade that Boost.Units has no name for, all SI.
namespace unit_types {
// clang-format off
using film_coefficient     = boost::units::unit<boost::units::derived_dimension<
    boost::units::mass_base_dimension, 1, boost::units::time_base_dimension, -3,
    boost::units::temperature_base_dimension, -1>::type,
    boost::units::si::system>;                               // W/(m2 K)
using heat_flux            = boost::units::unit<boost::units::derived_dimension<
    boost::units::mass_base_dimension, 1, boost::units::time_base_dimension, -3>::type,
    boost::units::si::system>;                               // W/m2
using thermal_conductivity = boost::units::unit<boost::units::derived_dimension<
    boost::units::length_base_dimension, 1, boost::units::mass_base_dimension, 1,
    boost::units::time_base_dimension, -3, boost::units::temperature_base_dimension, -1>::type,
    boost::units::si::system>;                               // W/(m K)
using specific_heat        = boost::units::unit<boost::units::derived_dimension<
    boost::units::length_base_dimension, 2, boost::units::time_base_dimension, -2,
    boost::units::temperature_base_dimension, -1>::type,
    boost::units::si::system>;                               // J/(kg K)
using diffusivity          = boost::units::unit<boost::units::derived_dimension<
    boost::units::length_base_dimension, 2, boost::units::time_base_dimension, -1>::type,
    boost::units::si::system>;                               // m2/s, kinematic viscosity too
using volumetric_expansion = boost::units::unit<boost::units::derived_dimension<
    boost::units::temperature_base_dimension, -1>::type,
    boost::units::si::system>;                               // 1/K
using area_resistance      = boost::units::unit<boost::units::derived_dimension<
    boost::units::mass_base_dimension, -1, boost::units::time_base_dimension, 3,
    boost::units::temperature_base_dimension, 1>::type,
    boost::units::si::system>;                               // m2 K/W
using mass_flux            = boost::units::unit<boost::units::derived_dimension<
    boost::units::length_base_dimension, -2, boost::units::mass_base_dimension, 1,
    boost::units::time_base_dimension, -1>::type,
    boost::units::si::system>;                               // kg/(m2 s)
using mass_flow            = boost::units::unit<boost::units::derived_dimension<
    boost::units::mass_base_dimension, 1, boost::units::time_base_dimension, -1>::type,
    boost::units::si::system>;                               // kg/s
using surface_tension      = boost::units::unit<boost::units::derived_dimension<
    boost::units::mass_base_dimension, 1, boost::units::time_base_dimension, -2>::type,
    boost::units::si::system>;                               // N/m
using absolute_temperature = boost::units::absolute<boost::units::si::temperature>;  // K, a point
// clang-format on
}  // namespace unit_types

/// Unit constants, to multiply a number with: 0.05 * units::metre.
namespace units {
inline constexpr unit_types::film_coefficient watt_per_square_metre_kelvin{};
inline constexpr unit_types::heat_flux watt_per_square_metre{};
inline constexpr unit_types::thermal_conductivity watt_per_metre_kelvin{};
inline constexpr unit_types::specific_heat joule_per_kilogram_kelvin{};
inline constexpr unit_types::diffusivity square_metre_per_second{};
inline constexpr unit_types::volumetric_expansion per_kelvin{};
inline constexpr unit_types::area_resistance square_metre_kelvin_per_watt{};
inline constexpr unit_types::mass_flux kilogram_per_square_metre_second{};
inline constexpr unit_types::mass_flow kilogram_per_second{};
inline constexpr unit_types::surface_tension newton_per_metre{};
inline constexpr boost::units::si::mass_density kilogram_per_cubic_metre{};
inline constexpr boost::units::si::dynamic_viscosity pascal_second{};
inline constexpr boost::units::si::length metre{};
inline constexpr boost::units::si::velocity metre_per_second{};
inline constexpr boost::units::si::pressure pascals{};  // plural: some hosts define pascal
inline constexpr boost::units::si::angular_velocity radian_per_second{};
inline constexpr boost::units::si::temperature kelvin_difference{};
}  // namespace units

/// An absolute temperature from a number in kelvin. Range: T > 0 (checked where it is used).
template <class T>
CONVELOPE_FUNCTION constexpr boost::units::quantity<unit_types::absolute_temperature, T> kelvin(
    const T& T_K) {
  return boost::units::quantity<unit_types::absolute_temperature, T>::from_value(T_K);
}

/// An absolute temperature from a number in degrees Celsius: T/K = t/degC + 273.15 (ITS-90).
template <class T>
CONVELOPE_FUNCTION constexpr boost::units::quantity<unit_types::absolute_temperature, T> celsius(
    const T& t_C) {
  return kelvin(T(t_C + 273.15));
}

}  // namespace v0
}  // namespace convelope

#endif
