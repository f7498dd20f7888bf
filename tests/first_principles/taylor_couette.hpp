#pragma once

// Onset of Taylor vortices between concentric cylinders, inner one turning, outer one at rest
// (G. I. Taylor, Phil. Trans. R. Soc. A 223 (1923) 289-343; S. Chandrasekhar, Hydrodynamic and
// Hydromagnetic Stability, Oxford 1961, ch. VII). Marginal, stationary, axisymmetric; lengths in
// gaps b, velocities in omega R_i, Re = omega R_i b/nu, wave number k:
//   L^2 u = 2 k^2 Omega Re v,   L v = (D* V) Re u,   L = D D* - k^2,   u = u' = v = 0 at the walls.
// Chebyshev collocation. With both signs settled the product operator maps positive fields to
// positive fields, so its largest eigenvalue 1/Re^2 is simple and comes out of the power method.

#include <Eigen/LU>
#include <boost/math/tools/minima.hpp>
#include <cmath>

#include "spectral.hpp"

namespace first_principles {

struct onset {
  double wave_number;  // per gap
  double critical;     // Re, or the squared group of the narrow gap
};

namespace detail {

/// Largest eigenvalue of fourth^-1 source second^-1 feed, with u = u' = v = 0 at both ends.
inline double largest_eigenvalue(const collocation& grid, Eigen::MatrixXd fourth,
                                 const Eigen::VectorXd& source, Eigen::MatrixXd second,
                                 const Eigen::VectorXd& feed) {
  const Eigen::Index last = grid.node.size() - 1;
  for (const Eigen::Index end : {Eigen::Index{0}, last}) {
    fourth.row(end).setZero();
    fourth(end, end) = 1.0;
    const Eigen::Index inside = end == 0 ? 1 : last - 1;
    fourth.row(inside) = grid.derive.row(end);
    second.row(end).setZero();
    second(end, end) = 1.0;
  }
  const Eigen::PartialPivLU<Eigen::MatrixXd> radial(fourth);
  const Eigen::PartialPivLU<Eigen::MatrixXd> azimuthal(second);
  Eigen::VectorXd u = (1.0 - grid.node.array().square()).square();
  double value = 0.0;
  for (int pass = 0; pass < 200; ++pass) {
    Eigen::VectorXd right = feed.cwiseProduct(u);
    right[0] = right[last] = 0.0;
    right = source.cwiseProduct(Eigen::VectorXd(azimuthal.solve(right)));
    right[0] = right[1] = right[last - 1] = right[last] = 0.0;
    const Eigen::VectorXd next = radial.solve(right);
    const double before = value;
    value = next.dot(u) / u.squaredNorm();
    u = next / next.norm();
    if (std::abs(value - before) < 1e-14 * std::abs(value)) break;
  }
  return value;
}

template <class Critical>
onset least_over_wave_number(const Critical& critical, double low, double high) {
  const auto best = boost::math::tools::brent_find_minima(critical, low, high, 40);
  return {best.first, best.second};
}

}  // namespace detail

/// Re_c = omega R_i b/nu at the radius ratio R_i/R_o.
inline double taylor_couette_marginal(double radius_ratio, double k, Eigen::Index points) {
  const auto grid = chebyshev(points);
  const double inner = radius_ratio / (1.0 - radius_ratio);
  const Eigen::ArrayXd r = inner + 0.5 * (1.0 + grid.node.array());
  // V = A r + B/r, 1 at the inner and 0 at the outer wall
  const double A = -inner / (2.0 * inner + 1.0);
  const double B = -A * (inner + 1.0) * (inner + 1.0);
  const Eigen::VectorXd turning = A + B / r.square();
  const Eigen::MatrixXd d = 2.0 * grid.derive;
  Eigen::MatrixXd divergence = d;
  divergence.diagonal() += (1.0 / r).matrix();
  Eigen::MatrixXd L = d * divergence;
  L.diagonal().array() -= k * k;
  const double value = detail::largest_eigenvalue(grid, L * L, 2.0 * k * k * turning, L,
                                                  Eigen::VectorXd::Constant(r.size(), 2.0 * A));
  return 1.0 / std::sqrt(value);
}

inline onset taylor_couette(double radius_ratio, Eigen::Index points = 24) {
  return detail::least_over_wave_number(
      [=](double k) { return taylor_couette_marginal(radius_ratio, k, points); }, 2.0, 4.5);
}

/// Narrow gap, angular velocity falling linearly from omega at the inner to `outer` omega at the
/// outer wall. The group is (1 - outer^2) omega^2 R b^3/nu^2, that is the mean angular velocity
/// times the difference: outer = 0 is the outer cylinder at rest, outer -> 1 has the critical
/// number of a fluid layer heated from below.
inline onset narrow_gap(double outer, Eigen::Index points = 24) {
  const auto grid = chebyshev(points);
  const Eigen::MatrixXd d = 2.0 * grid.derive;
  const Eigen::VectorXd turning = (1.0 - (1.0 - outer) * 0.5 * (1.0 + grid.node.array())).matrix();
  return detail::least_over_wave_number(
      [&](double k) {
        Eigen::MatrixXd L = d * d;
        L.diagonal().array() -= k * k;
        const double value =
            detail::largest_eigenvalue(grid, L * L, 2.0 * k * k * turning, L,
                                       Eigen::VectorXd::Constant(grid.node.size(), -1.0));
        return (1.0 + outer) / value;
      },
      2.0, 4.5);
}

}  // namespace first_principles
