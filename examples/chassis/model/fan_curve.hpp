// Pressure of the fans over flow, with a continuous slope: monotone piecewise cubic through the
// given points (Fritsch & Butland 1984), continued in a straight line beyond them.
#pragma once

#include <vector>

#include "case/case.hpp"
#include "model/wall_model.hpp"

namespace chassis {

class fan_curve {
 public:
  explicit fan_curve(const fan& f);

  /// Pressure in Pa at a total flow in m3/s, and its derivative.
  sensitive pressure(double flow_m3_s) const;
  double shut_off_pressure() const { return points_.front().pressure_Pa; }

 private:
  std::vector<fan_point> points_;  // of all fans together
  std::vector<double> slopes_;
};

}  // namespace chassis
