#pragma once

// Laminar natural convection on a vertical plate, boundary-layer similarity, constant properties:
//   isothermal wall, eta = (y/x) (Gr_x/4)^(1/4)
//     f''' + 3 f f'' - 2 f'^2 + th = 0,  th'' + 3 Pr f th' = 0,            th(0) = 1
//   isoflux wall, eta = (y/x) (Gr*_x/5)^(1/5)
//     f''' + 4 f f'' - 3 f'^2 + th = 0,  th'' + Pr (4 f th' - f' th) = 0,  th'(0) = -1
// f(0) = f'(0) = 0, f'(inf) = th(inf) = 0. E. Pohlhausen in E. Schmidt and W. Beckmann, Tech. Mech.
// Thermodyn. 1 (1930); S. Ostrach, NACA Rep. 1111 (1953); E. M. Sparrow, J. L. Gregg, Trans. ASME
// 78 (1956) 435-440. Chebyshev collocation on a half line mapped to (-1, 1), Newton iteration, and
// steps in Pr from 1.

#include <Eigen/LU>
#include <cmath>

#include "spectral.hpp"

namespace first_principles {

enum class plate_wall { isothermal, isoflux };

struct plume_solution {
  double wall_value;  // th(0)
  double wall_slope;  // th'(0)
  double wall_shear;  // f''(0)
  int corrections;    // Newton steps of the last Pr
  bool converged;
};

/// The pair of equations with the weights that keep every limit finite:
///   viscous f''' + inertial (m f f'' - (m - 1) f'^2) + th = 0
///   th'' + diffusive (m f th' - (m - 3) f' th) = 0
/// (m = 3 isothermal, 4 isoflux). With a stretched coordinate Pr -> inf is inertial = 0 and Pr -> 0
/// is viscous = 0.
class plume {
 public:
  /// Half of the points lie within `stretch`; infinity stands at `far`.
  plume(plate_wall wall, double stretch, double far, Eigen::Index points = 64)
      : wall_(wall), size_(points + 1), field_(2 * size_) {
    const auto grid = chebyshev(points);
    const double small = 2.0 * stretch / far;
    const Eigen::ArrayXd xi = -grid.node.array();  // from the wall outwards
    const Eigen::ArrayXd eta = stretch * (1.0 + xi) / (1.0 - xi + small);
    const Eigen::ArrayXd rate = (1.0 - xi + small).square() / (stretch * (2.0 + small));
    first_ = -(rate.matrix().asDiagonal() * grid.derive);
    second_ = first_ * first_;
    third_ = first_ * second_;
    // a start of the right shape, with slip at the wall: the first correction takes it away
    field_.head(size_) = (0.8 * (1.0 - (-0.9 * eta).exp())).matrix();
    field_.tail(size_) = (-0.6 * eta).exp().matrix();
  }

  plume_solution solve(double viscous, double inertial, double diffusive) {
    const double m = wall_ == plate_wall::isothermal ? 3.0 : 4.0;
    const Eigen::Index n = size_;
    const Eigen::Index last = n - 1;
    const bool creeping = inertial == 0.0;
    int pass = 0;
    bool converged = false;
    for (; pass < 60 && !converged; ++pass) {
      const Eigen::VectorXd f = field_.head(n);
      const Eigen::VectorXd th = field_.tail(n);
      const Eigen::VectorXd df = first_ * f;
      const Eigen::VectorXd ddf = second_ * f;
      const Eigen::VectorXd dth = first_ * th;
      Eigen::MatrixXd slope = Eigen::MatrixXd::Zero(2 * n, 2 * n);
      Eigen::VectorXd rest(2 * n);
      rest.head(n) = viscous * (third_ * f) +
                     inertial * (m * f.cwiseProduct(ddf) - (m - 1.0) * df.cwiseProduct(df)) + th;
      rest.tail(n) =
          second_ * th + diffusive * (m * f.cwiseProduct(dth) - (m - 3.0) * df.cwiseProduct(th));
      slope.topLeftCorner(n, n) =
          viscous * third_ + inertial * (m * (f.asDiagonal() * second_) -
                                         2.0 * (m - 1.0) * (df.asDiagonal() * first_));
      slope.topLeftCorner(n, n).diagonal() += inertial * m * ddf;
      slope.topRightCorner(n, n).setIdentity();
      slope.bottomLeftCorner(n, n) = -diffusive * (m - 3.0) * (th.asDiagonal() * first_);
      slope.bottomLeftCorner(n, n).diagonal() += diffusive * m * dth;
      slope.bottomRightCorner(n, n) = second_ + diffusive * m * (f.asDiagonal() * first_);
      slope.bottomRightCorner(n, n).diagonal() -= diffusive * (m - 3.0) * df;

      const auto condition = [&](Eigen::Index row, const Eigen::MatrixXd& left, Eigen::Index at,
                                 Eigen::Index offset, double value) {
        slope.row(row).setZero();
        slope.row(row).segment(offset, n) = left.row(at);
        rest[row] = left.row(at).dot(field_.segment(offset, n)) - value;
      };
      const Eigen::MatrixXd identity = Eigen::MatrixXd::Identity(n, n);
      condition(0, identity, 0, 0, 0.0);
      if (viscous != 0.0) {
        condition(1, first_, 0, 0, 0.0);
      } else {  // slip, regular at the wall: (m - 1) f'(0)^2 = th(0)
        slope.row(1).setZero();
        slope.row(1).head(n) = -2.0 * (m - 1.0) * df[0] * first_.row(0);
        slope(1, n) = 1.0;
        rest[1] = th[0] - (m - 1.0) * df[0] * df[0];
      }
      // without inertia the outer fluid is dragged along
      condition(last, creeping ? second_ : first_, last, 0, 0.0);
      if (wall_ == plate_wall::isothermal) {
        condition(n, identity, 0, n, 1.0);
      } else {
        condition(n, first_, 0, n, -1.0);
      }
      condition(2 * n - 1, identity, last, n, 0.0);

      const Eigen::VectorXd change = slope.partialPivLu().solve(rest);
      field_ -= change;
      converged = change.tail(n).lpNorm<Eigen::Infinity>() < 1e-10;
    }
    const Eigen::VectorXd th = field_.tail(n);
    return {th[0], first_.row(0).dot(th), second_.row(0).dot(field_.head(n)), pass, converged};
  }

 private:
  plate_wall wall_;
  Eigen::Index size_;
  Eigen::MatrixXd first_, second_, third_;
  Eigen::VectorXd field_;
};

/// 0.001 <= Pr <= 10000, reached from Pr = 1 in steps of at most a decade.
inline plume_solution vertical_plate(plate_wall wall, double Pr, Eigen::Index points = 64) {
  plume layer(wall, Pr > 1.0 ? 1.5 : 6.0, Pr > 1.0 ? 600.0 : 2400.0, points);
  plume_solution solution = layer.solve(1.0, 1.0, 1.0);
  const double decades = std::log10(Pr);
  const int steps = static_cast<int>(std::ceil(std::abs(decades)));
  for (int i = 1; i <= steps; ++i) {
    solution = layer.solve(1.0, 1.0, std::pow(10.0, decades * i / steps));
  }
  return solution;
}

/// Pr -> inf in the thermal layer, eta stretched by Pr^(1/4) (isothermal) or Pr^(1/5) (isoflux).
inline plume_solution vertical_plate_high_prandtl(plate_wall wall, Eigen::Index points = 48) {
  plume layer(wall, 4.0, 15.0, points);
  layer.solve(1.0, 1.0, 1.0);
  return layer.solve(1.0, 0.0, 1.0);
}

/// Pr -> 0 outside the viscous sublayer, eta shrunk by Pr^(1/2) or Pr^(2/5).
inline plume_solution vertical_plate_low_prandtl(plate_wall wall, Eigen::Index points = 48) {
  return plume(wall, 2.0, 400.0, points).solve(0.0, 1.0, 1.0);
}

}  // namespace first_principles
