// Board layers to one anisotropic plate: conductivities add in parallel in the plane and in series
// through the thickness. A patterned layer counts with its area-weighted mean, which is common
// practice and an upper bound in the plane.
#pragma once

#include <vector>

#include "case/case.hpp"

namespace chassis {

struct plate {
  double thickness = 0;
  double in_plane = 0;  // W/(m K)
  double through = 0;   // W/(m K)
};

inline plate plate_of(const std::vector<layer>& layers) {
  plate result;
  double sheet = 0;       // sum of k t
  double resistance = 0;  // sum of t / k
  for (const auto& one : layers) {
    const double k = one.coverage * one.conductivity + (1 - one.coverage) * one.fill_conductivity;
    result.thickness += one.thickness;
    sheet += k * one.thickness;
    resistance += one.thickness / k;
  }
  result.in_plane = sheet / result.thickness;
  result.through = result.thickness / resistance;
  return result;
}

}  // namespace chassis
