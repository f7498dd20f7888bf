#pragma once

// Polynomial tools shared by the first-principles solvers: Gauss-Legendre quadrature, tables of
// normalised Legendre polynomials, and the Chebyshev collocation matrix.

#include <Eigen/Core>
#include <cmath>
#include <numbers>

namespace first_principles {

struct quadrature_rule {
  Eigen::VectorXd node;    // on (-1, 1)
  Eigen::VectorXd weight;  // sums to 2
};

/// Gauss-Legendre rule by Newton iteration on the three-term recurrence; exact to degree 2 n - 1.
inline quadrature_rule gauss_legendre(Eigen::Index n) {
  quadrature_rule rule{Eigen::VectorXd(n), Eigen::VectorXd(n)};
  const double count = static_cast<double>(n);
  for (Eigen::Index i = 0; i < n; ++i) {
    double x = -std::cos(std::numbers::pi * (static_cast<double>(i) + 0.75) / (count + 0.5));
    double slope = 0.0;
    for (int pass = 0; pass < 8; ++pass) {
      double before = 1.0;
      double here = x;
      for (Eigen::Index k = 2; k <= n; ++k) {
        const double degree = static_cast<double>(k);
        const double next = ((2.0 * degree - 1.0) * x * here - (degree - 1.0) * before) / degree;
        before = here;
        here = next;
      }
      slope = count * (x * here - before) / (x * x - 1.0);
      x -= here / slope;
    }
    rule.node[i] = x;
    rule.weight[i] = 2.0 / ((1.0 - x * x) * slope * slope);
  }
  return rule;
}

struct basis_table {
  Eigen::MatrixXd value;  // one row per point, one column per degree
  Eigen::MatrixXd slope;
};

/// sqrt(2 k + 1) P_k and derivatives at the given points, k = 0 .. degrees - 1.
inline basis_table legendre_table(Eigen::Index degrees, const Eigen::VectorXd& x) {
  basis_table table{Eigen::MatrixXd(x.size(), degrees), Eigen::MatrixXd(x.size(), degrees)};
  for (Eigen::Index i = 0; i < x.size(); ++i) {
    double p = 1.0;        // P_k
    double p_next = x[i];  // P_(k+1)
    double d = 0.0;        // P_k'
    double d_next = 1.0;   // P_(k+1)'
    for (Eigen::Index k = 0; k < degrees; ++k) {
      const double degree = static_cast<double>(k);
      const double norm = std::sqrt(2.0 * degree + 1.0);
      table.value(i, k) = norm * p;
      table.slope(i, k) = norm * d;
      const double p_new =
          ((2.0 * degree + 3.0) * x[i] * p_next - (degree + 1.0) * p) / (degree + 2.0);
      const double d_new = d + (2.0 * degree + 3.0) * p_next;
      p = p_next;
      p_next = p_new;
      d = d_next;
      d_next = d_new;
    }
  }
  return table;
}

struct collocation {
  Eigen::VectorXd node;    // x_0 = 1 .. x_n = -1
  Eigen::MatrixXd derive;  // derivative at the nodes from the values at the nodes
};

/// Chebyshev-Gauss-Lobatto collocation with n + 1 points; the diagonal from the row sums, which
/// keeps the derivative of a constant zero to rounding.
inline collocation chebyshev(Eigen::Index n) {
  collocation grid{Eigen::VectorXd(n + 1), Eigen::MatrixXd::Zero(n + 1, n + 1)};
  for (Eigen::Index i = 0; i <= n; ++i) {
    // the sine form is exactly antisymmetric
    grid.node[i] = std::sin(std::numbers::pi * static_cast<double>(n - 2 * i) /
                            (2.0 * static_cast<double>(n)));
  }
  const auto edge = [n](Eigen::Index i) {
    return (i == 0 || i == n ? 2.0 : 1.0) * (i % 2 == 0 ? 1.0 : -1.0);
  };
  for (Eigen::Index i = 0; i <= n; ++i) {
    double sum = 0.0;
    for (Eigen::Index j = 0; j <= n; ++j) {
      if (i == j) continue;
      grid.derive(i, j) = edge(i) / (edge(j) * (grid.node[i] - grid.node[j]));
      sum += grid.derive(i, j);
    }
    grid.derive(i, i) = -sum;
  }
  return grid;
}

}  // namespace first_principles
