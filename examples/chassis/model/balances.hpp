// Residuals and their derivatives while they are being collected.
#pragma once

#include <Eigen/Core>
#include <Eigen/SparseCore>
#include <vector>

namespace chassis {

class balances {
 public:
  explicit balances(int unknowns) : residual(Eigen::VectorXd::Zero(unknowns)) {}

  void add(int row, double value) { residual[row] += value; }
  void slope(int row, int column, double value) { slopes.emplace_back(row, column, value); }

  Eigen::VectorXd residual;
  std::vector<Eigen::Triplet<double>> slopes;
};

}  // namespace chassis
