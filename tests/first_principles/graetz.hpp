#pragma once

// Thermal entry of a duct whose velocity profile is already developed: the problem of L. Graetz,
// Ann. Phys. Chem. 18 (1883) 79-94, for the round tube and for parallel plates, with uniform wall
// temperature or uniform wall flux. Legendre-Galerkin in the cross section, exact in the axial
// direction:  M dT/dX + K T = flux at the wall.
//   round tube       s = (r/R)^2,  (1 - s) T_X = 4 (s T_s)_s,   X = 2 x_star
//   parallel plates  y from the middle, (1 - y^2) T_X = T_yy,   X = (32/3) x_star
// with x_star = (x/D_h)/(Re Pr) and D_h = D or twice the gap.

#include <Eigen/Core>
#include <algorithm>
#include <cmath>

#include "spectral.hpp"
#include "symmetric_modes.hpp"

namespace first_principles {

enum class duct { round_tube, parallel_plates };

class thermal_entry {
 public:
  explicit thermal_entry(duct shape, Eigen::Index modes = 48) : shape_(shape) {
    const bool tube = shape == duct::round_tube;
    const Eigen::Index step = tube ? 1 : 2;  // between plates only the even half is needed
    const auto rule = gauss_legendre(step * modes + 4);
    const Eigen::VectorXd point =
        tube ? Eigen::VectorXd((rule.node.array() + 1.0) / 2.0) : rule.node;
    const auto table = legendre_table(step * (modes + 1), rule.node);
    // tube: ds = dxi/2 and d/ds = 2 d/dxi; plates: the half channel is half of the integral
    const Eigen::ArrayXd profile =
        tube ? Eigen::ArrayXd(1.0 - point.array()) : Eigen::ArrayXd(1.0 - point.array().square());
    const Eigen::VectorXd mass_weight = rule.weight.array() * profile * (tube ? 0.25 : 0.5);
    const Eigen::VectorXd stiff_weight =
        tube ? Eigen::VectorXd(rule.weight.array() * point.array() * 4.0)
             : Eigen::VectorXd(rule.weight * 0.5);
    flow_ = mass_weight.sum();

    // uniform flux: all polynomials; uniform temperature: pairs that vanish at the wall
    Eigen::MatrixXd value(point.size(), modes);
    Eigen::MatrixXd slope(point.size(), modes);
    Eigen::VectorXd at_wall(modes);
    Eigen::MatrixXd pinned_value(point.size(), modes);
    Eigen::MatrixXd pinned_slope(point.size(), modes);
    for (Eigen::Index k = 0; k < modes; ++k) {
      const double norm = std::sqrt(2.0 * static_cast<double>(step * k) + 1.0);
      const double next = std::sqrt(2.0 * static_cast<double>(step * (k + 1)) + 1.0);
      value.col(k) = table.value.col(step * k);
      slope.col(k) = table.slope.col(step * k);
      at_wall[k] = norm;
      pinned_value.col(k) =
          table.value.col(step * k) - norm / next * table.value.col(step * (k + 1));
      pinned_slope.col(k) =
          table.slope.col(step * k) - norm / next * table.slope.col(step * (k + 1));
    }
    const auto weighted = [](const Eigen::MatrixXd& a, const Eigen::VectorXd& w) {
      return Eigen::MatrixXd(a.transpose() * w.asDiagonal() * a);
    };
    const auto temperature =
        solve_modes(weighted(pinned_slope, stiff_weight), weighted(pinned_value, mass_weight));
    temperature_rate_ = temperature.value.array();
    temperature_share_ = (temperature.vector.transpose() * (pinned_value.transpose() * mass_weight))
                             .array()
                             .square() /
                         flow_;
    const auto flux = solve_modes(weighted(slope, stiff_weight), weighted(value, mass_weight));
    // the first flux mode is the uniform temperature, which the bulk carries
    flux_rate_ = flux.value.tail(modes - 1).array();
    flux_share_ = (flux.vector.transpose() * at_wall).tail(modes - 1).array().square() / flux_rate_;
  }

  /// lambda_n of exp(-lambda_n^2 X)
  double temperature_eigenvalue(Eigen::Index n) const { return std::sqrt(temperature_rate_[n]); }
  double flux_eigenvalue(Eigen::Index n) const { return std::sqrt(flux_rate_[n]); }
  /// part of the developed excess of wall over bulk that is missing at the inlet, in q R/k or q a/k
  double flux_share(Eigen::Index n) const { return flux_share_[n]; }

  /// (T_w - T_bulk)/(T_w - T_in), uniform wall temperature
  double bulk_excess(double x_star) const { return (temperature_share_ * decay(x_star)).sum(); }
  /// coefficient of mode n in the bulk excess
  double bulk_share(Eigen::Index n) const { return temperature_share_[n]; }

  double uniform_temperature_local(double x_star) const {
    const Eigen::ArrayXd term = temperature_share_ * decay(x_star);
    return 0.25 * scale() * (term * temperature_rate_).sum() / term.sum();
  }
  /// on the log-mean temperature difference
  double uniform_temperature_mean(double x_star) const {
    return -std::log(bulk_excess(x_star)) / (4.0 * x_star);
  }
  double uniform_flux_local(double x_star) const {
    const Eigen::ArrayXd grown =
        -(-flux_rate_ * scale() * x_star).unaryExpr([](double e) { return std::expm1(e); });
    return (shape_ == duct::round_tube ? 2.0 : 4.0) / (flux_share_ * grown).sum();
  }
  /// mean of the local film coefficient. Next to the inlet Nu_x = leveque x_star^(-1/3) + constant,
  /// which a finite number of modes can't follow to x = 0; from there on by quadrature in x^(1/3).
  double uniform_flux_mean(double x_star) const {
    static const auto rule = gauss_legendre(40);
    const double start = (std::min)(x_star, 1e-5);
    const double rest = uniform_flux_local(start) - uniform_flux_leveque() / std::cbrt(start);
    double sum = 1.5 * uniform_flux_leveque() * std::cbrt(start * start) + rest * start;
    const double half = 0.5 * (std::cbrt(x_star) - std::cbrt(start));
    for (Eigen::Index i = 0; i < rule.node.size(); ++i) {
      const double t = std::cbrt(start) + half * (1.0 + rule.node[i]);
      sum += half * rule.weight[i] * 3.0 * t * t * uniform_flux_local(t * t * t);
    }
    return sum / x_star;
  }

  /// M. A. Leveque, Ann. Mines 13 (1928): Nu_x x_star^(1/3) next to the inlet, from the wall slope
  /// of the velocity: 8 u_m/D in the tube, 12 u_m/D_h between plates.
  double uniform_temperature_leveque() const {
    return std::cbrt(wall_slope() / 9.0) / std::tgamma(4.0 / 3.0);
  }
  double uniform_flux_leveque() const {
    return std::cbrt(wall_slope() / 9.0) * std::tgamma(2.0 / 3.0);
  }

  double uniform_temperature_developed() const { return 0.25 * scale() * temperature_rate_[0]; }
  double uniform_flux_developed() const {
    return (shape_ == duct::round_tube ? 2.0 : 4.0) / flux_share_.sum();
  }

 private:
  double wall_slope() const { return shape_ == duct::round_tube ? 8.0 : 12.0; }
  double scale() const { return shape_ == duct::round_tube ? 2.0 : 32.0 / 3.0; }
  Eigen::ArrayXd decay(double x_star) const {
    return (-temperature_rate_ * scale() * x_star).exp();
  }

  duct shape_;
  double flow_ = 0.0;
  Eigen::ArrayXd temperature_rate_;
  Eigen::ArrayXd temperature_share_;
  Eigen::ArrayXd flux_rate_;
  Eigen::ArrayXd flux_share_;
};

/// R(1) of the tube's radial equation by Kummer's series, R = exp(-lambda r^2/2)
/// M(1/2 - lambda/4, 1, lambda r^2): zero at the eigenvalues of the uniform wall temperature.
/// A second way to them, independent of the polynomials above.
inline double tube_wall_value(double lambda) {
  const long double a = 0.5L - static_cast<long double>(lambda) / 4.0L;
  const long double z = lambda;
  long double term = 1.0L;
  long double sum = 1.0L;
  for (int k = 0; k < 400; ++k) {
    term *= (a + k) * z / ((1.0L + k) * (1.0L + k));
    sum += term;
  }
  return static_cast<double>(std::exp(-z / 2.0L) * sum);
}

}  // namespace first_principles
