// Constants of nature and of convention.
#pragma once

namespace chassis {

inline constexpr double zero_celsius_K = 273.15;
inline constexpr double standard_gravity = 9.80665;         // m/s2, ISO 80000-3
inline constexpr double stefan_boltzmann = 5.670374419e-8;  // W/(m2 K4), CODATA 2018

}  // namespace chassis
