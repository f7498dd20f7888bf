#pragma once

// Developed laminar flow and heat transfer in ducts, constant properties, all numbers on the
// hydraulic diameter 4 A/P of the wetted perimeter:
//   -lap w = 1                         f Re = D_h^2 / (2 w_m)            (Fanning)
//   -lap t = w/w_m                     Nu_H1 = D_h^2 / (4 t_bulk)
//   -lap p = lambda (w/w_m) p          Nu_T  = lambda D_h^2 / 4
// all with w, t, p zero on the wall. Two methods: second-order finite volumes in one dimension
// (tube, plates) and Legendre-Galerkin in the quarter of a rectangle.

#include <Eigen/Core>
#include <cmath>

#include "spectral.hpp"
#include "symmetric_modes.hpp"

namespace first_principles {

struct developed_flow {
  double fanning_re;
  double uniform_flux;
  double uniform_temperature;
};

enum class cross_section { round_tube, plates_both_heated, plates_one_heated };

/// n cells over the radius of a tube, or over the gap between plates, both of unit length.
inline developed_flow finite_volume(cross_section shape, Eigen::Index n) {
  const bool tube = shape == cross_section::round_tube;
  const double step = 1.0 / static_cast<double>(n);
  Eigen::ArrayXd volume(n);
  Eigen::ArrayXd face(n + 1);
  for (Eigen::Index i = 0; i <= n; ++i) {
    face[i] = tube ? step * static_cast<double>(i) : 1.0;
  }
  for (Eigen::Index i = 0; i < n; ++i)
    volume[i] = step * (tube ? 0.5 * (face[i] + face[i + 1]) : 1.0);

  // symmetric tridiagonal operator; a wall stands half a cell from the first or last centre
  const auto solve = [&](const Eigen::ArrayXd& source, bool left_wall, bool right_wall) {
    Eigen::ArrayXd diagonal(n);
    for (Eigen::Index i = 0; i < n; ++i) {
      const double left = i > 0 ? face[i] / step : (left_wall ? 2.0 * face[0] / step : 0.0);
      const double right =
          i + 1 < n ? face[i + 1] / step : (right_wall ? 2.0 * face[n] / step : 0.0);
      diagonal[i] = left + right;
    }
    Eigen::ArrayXd value = source * volume;
    for (Eigen::Index i = 1; i < n; ++i) {
      const double link = face[i] / step / diagonal[i - 1];
      diagonal[i] -= link * face[i] / step;
      value[i] += link * value[i - 1];
    }
    value[n - 1] /= diagonal[n - 1];
    for (Eigen::Index i = n - 2; i >= 0; --i) {
      value[i] = (value[i] + face[i + 1] / step * value[i + 1]) / diagonal[i];
    }
    return value;
  };

  const double area = volume.sum();
  const double hydraulic_diameter = 2.0;  // 2 R, or twice the gap
  const double heated = tube ? 1.0 : (shape == cross_section::plates_both_heated ? 2.0 : 1.0);
  const bool left_heated = shape == cross_section::plates_both_heated;
  const Eigen::ArrayXd velocity = solve(Eigen::ArrayXd::Ones(n), !tube, true);
  const double mean = (velocity * volume).sum() / area;
  const Eigen::ArrayXd profile = velocity / mean;

  const Eigen::ArrayXd excess = solve(profile, left_heated, true);
  const double bulk = (excess * profile * volume).sum() / area;

  Eigen::ArrayXd mode = excess;
  double rate = 0.0;
  for (int pass = 0; pass < 60; ++pass) {  // inverse iteration, Rayleigh quotient
    const Eigen::ArrayXd next = solve(profile * mode, left_heated, true);
    rate = (next * profile * mode * volume).sum() / (next * profile * next * volume).sum();
    mode = next / next.maxCoeff();
  }
  // q per heated perimeter: area/heated stands for D_h/4 of a duct heated all round
  const double length2 = hydraulic_diameter * area / heated;
  return {hydraulic_diameter * hydraulic_diameter / (2.0 * mean), length2 / bulk, rate * length2};
}

/// Rectangle of sides 2 and 2 aspect, 0 < aspect <= 1, all four walls heated.
inline developed_flow rectangular_duct(double aspect, Eigen::Index modes = 16) {
  // one-dimensional modes: even polynomials that vanish at +-1, diagonal in both inner products;
  // the triple product of the last integral has degree 6 modes, and one half of the points will do
  const Eigen::Index points = 2 * modes;
  const auto rule = gauss_legendre(2 * points);
  const Eigen::VectorXd weight = rule.weight.tail(points);
  const auto table = legendre_table(2 * modes + 1, rule.node.tail(points));
  Eigen::MatrixXd value(points, modes);
  Eigen::MatrixXd slope(points, modes);
  for (Eigen::Index k = 0; k < modes; ++k) {
    const double ratio =
        std::sqrt((4.0 * static_cast<double>(k) + 1.0) / (4.0 * static_cast<double>(k) + 5.0));
    value.col(k) = table.value.col(2 * k) - ratio * table.value.col(2 * k + 2);
    slope.col(k) = table.slope.col(2 * k) - ratio * table.slope.col(2 * k + 2);
  }
  const auto line = solve_modes(slope.transpose() * weight.asDiagonal() * slope,
                                value.transpose() * weight.asDiagonal() * value);
  const Eigen::MatrixXd shape = value * line.vector;  // orthonormal modes at the points
  const Eigen::MatrixXd test = shape.transpose() * weight.asDiagonal();

  const auto solve = [&](const Eigen::MatrixXd& source) {  // values to values
    Eigen::MatrixXd part = test * source * test.transpose();
    for (Eigen::Index i = 0; i < modes; ++i) {
      for (Eigen::Index j = 0; j < modes; ++j) {
        part(i, j) /= line.value[i] + line.value[j] / (aspect * aspect);
      }
    }
    return Eigen::MatrixXd(shape * part * shape.transpose());
  };
  const auto mean = [&](const Eigen::MatrixXd& f) { return weight.dot(f * weight); };
  const double hydraulic_diameter = 4.0 * aspect / (1.0 + aspect);
  const double length2 = hydraulic_diameter * hydraulic_diameter;
  const Eigen::MatrixXd velocity = solve(Eigen::MatrixXd::Ones(points, points));
  const double velocity_mean = mean(velocity);
  const Eigen::MatrixXd profile = velocity / velocity_mean;

  const Eigen::MatrixXd excess = solve(profile);
  const double bulk = mean(excess.cwiseProduct(profile));

  Eigen::MatrixXd mode = excess;
  double rate = 0.0;
  for (int pass = 0; pass < 2000; ++pass) {  // slow in a long slit: the next mode lies close
    const Eigen::MatrixXd source = profile.cwiseProduct(mode);
    const Eigen::MatrixXd next = solve(source);
    const double before = rate;
    rate = mean(next.cwiseProduct(source)) / mean(next.cwiseProduct(profile).cwiseProduct(next));
    mode = next / next.maxCoeff();
    if (std::abs(rate - before) < 1e-13 * rate) break;
  }
  return {length2 / (2.0 * velocity_mean), length2 / (4.0 * bulk), rate * length2 / 4.0};
}

}  // namespace first_principles
