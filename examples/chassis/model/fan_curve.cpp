#include "model/fan_curve.hpp"

#include <algorithm>

namespace chassis {

fan_curve::fan_curve(const fan& f) : points_(f.points) {
  for (auto& p : points_) p.flow_m3_s *= f.count;
  const std::size_t n = points_.size();
  std::vector<double> step(n - 1);
  std::vector<double> secant(n - 1);
  for (std::size_t i = 0; i + 1 < n; ++i) {
    step[i] = points_[i + 1].flow_m3_s - points_[i].flow_m3_s;
    secant[i] = (points_[i + 1].pressure_Pa - points_[i].pressure_Pa) / step[i];
  }
  slopes_.resize(n);
  slopes_.front() = secant.front();
  slopes_.back() = secant.back();
  for (std::size_t i = 1; i + 1 < n; ++i) {
    // Weighted harmonic mean; all secants are negative because the reader demands falling pressure.
    const double w1 = 2 * step[i] + step[i - 1];
    const double w2 = step[i] + 2 * step[i - 1];
    slopes_[i] = (w1 + w2) / (w1 / secant[i - 1] + w2 / secant[i]);
  }
}

sensitive fan_curve::pressure(double flow) const {
  const auto& first = points_.front();
  const auto& last = points_.back();
  if (flow <= first.flow_m3_s) {
    return {first.pressure_Pa + slopes_.front() * (flow - first.flow_m3_s), slopes_.front()};
  }
  if (flow >= last.flow_m3_s) {
    return {last.pressure_Pa + slopes_.back() * (flow - last.flow_m3_s), slopes_.back()};
  }
  const auto after = std::upper_bound(points_.begin(), points_.end(), flow,
                                      [](double q, const fan_point& p) { return q < p.flow_m3_s; });
  const auto i = static_cast<std::size_t>(after - points_.begin()) - 1;
  const double h = points_[i + 1].flow_m3_s - points_[i].flow_m3_s;
  const double s = (flow - points_[i].flow_m3_s) / h;
  const double p0 = points_[i].pressure_Pa;
  const double p1 = points_[i + 1].pressure_Pa;
  const double m0 = slopes_[i] * h;
  const double m1 = slopes_[i + 1] * h;
  // Cubic Hermite polynomial in s.
  const double c2 = 3 * (p1 - p0) - 2 * m0 - m1;
  const double c3 = 2 * (p0 - p1) + m0 + m1;
  return {p0 + s * (m0 + s * (c2 + s * c3)), (m0 + s * (2 * c2 + s * 3 * c3)) / h};
}

}  // namespace chassis
