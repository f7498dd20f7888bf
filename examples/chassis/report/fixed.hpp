// Numbers for tables: a fixed count of decimals.
#pragma once

#include <array>
#include <cstdio>
#include <string>

#include "model/constants.hpp"

namespace chassis {

inline std::string fixed(double value, int decimals) {
  std::array<char, 352> text{};  // the longest double has 309 digits before the point
  std::snprintf(text.data(), text.size(), "%.*f", decimals, value);
  return text.data();
}

inline std::string celsius(double kelvin, int decimals = 1) {
  return fixed(kelvin - zero_celsius_K, decimals);
}

}  // namespace chassis
