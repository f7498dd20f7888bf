#pragma once

// K v = mu M v for symmetric K and positive definite M of moderate size: Cholesky, then cyclic
// Jacobi rotations (G. H. Golub, C. F. Van Loan, Matrix Computations, ch. 8). Jacobi keeps the
// small eigenvalues accurate, and compiles in a fraction of the time of a blocked solver.

#include <Eigen/Core>
#include <algorithm>
#include <cmath>
#include <numeric>
#include <vector>

namespace first_principles {

struct symmetric_modes {
  Eigen::VectorXd value;   // ascending
  Eigen::MatrixXd vector;  // columns, v^T M v = 1
};

inline symmetric_modes solve_modes(Eigen::MatrixXd K, Eigen::MatrixXd M) {
  const Eigen::Index n = K.rows();
  // M = C C^T; then K becomes C^-1 K C^-T, and `basis` collects C^-T and the rotations
  for (Eigen::Index j = 0; j < n; ++j) {
    M(j, j) = std::sqrt(M(j, j) - M.row(j).head(j).squaredNorm());
    for (Eigen::Index i = j + 1; i < n; ++i) {
      M(i, j) = (M(i, j) - M.row(i).head(j).dot(M.row(j).head(j))) / M(j, j);
    }
  }
  const auto forward = [&](Eigen::MatrixXd& a) {
    for (Eigen::Index i = 0; i < n; ++i) {
      for (Eigen::Index j = 0; j < i; ++j) a.row(i) -= M(i, j) * a.row(j);
      a.row(i) /= M(i, i);
    }
  };
  forward(K);
  K.transposeInPlace();
  forward(K);
  Eigen::MatrixXd basis = Eigen::MatrixXd::Identity(n, n);
  forward(basis);  // C^-1; a rotation of its rows turns the columns of C^-T
  for (int sweep = 0; sweep < 40; ++sweep) {
    double off = 0.0;
    for (Eigen::Index p = 0; p < n; ++p) {
      for (Eigen::Index q = p + 1; q < n; ++q) {
        const double ratio = std::abs(K(p, q)) / std::sqrt(std::abs(K(p, p) * K(q, q)) + 1e-300);
        off = (std::max)(off, ratio);
        if (ratio < 1e-17) continue;
        const double theta = (K(q, q) - K(p, p)) / (2.0 * K(p, q));
        const double t = (theta >= 0.0 ? 1.0 : -1.0) / (std::abs(theta) + std::hypot(theta, 1.0));
        const double c = 1.0 / std::hypot(t, 1.0);
        const double s = t * c;
        for (Eigen::Index k = 0; k < n; ++k) {
          const double a = K(k, p);
          const double b = K(k, q);
          K(k, p) = c * a - s * b;
          K(k, q) = s * a + c * b;
        }
        for (Eigen::Index k = 0; k < n; ++k) {
          const double a = K(p, k);
          const double b = K(q, k);
          K(p, k) = c * a - s * b;
          K(q, k) = s * a + c * b;
          const double e = basis(p, k);
          const double f = basis(q, k);
          basis(p, k) = c * e - s * f;
          basis(q, k) = s * e + c * f;
        }
      }
    }
    if (off < 1e-14) break;
  }
  std::vector<Eigen::Index> order(static_cast<std::size_t>(n));
  std::iota(order.begin(), order.end(), Eigen::Index{0});
  std::sort(order.begin(), order.end(),
            [&](Eigen::Index a, Eigen::Index b) { return K(a, a) < K(b, b); });
  symmetric_modes modes{Eigen::VectorXd(n), Eigen::MatrixXd(n, n)};
  for (Eigen::Index i = 0; i < n; ++i) {
    const Eigen::Index from = order[static_cast<std::size_t>(i)];
    modes.value[i] = K(from, from);
    modes.vector.col(i) = basis.row(from).transpose();
  }
  return modes;
}

}  // namespace first_principles
