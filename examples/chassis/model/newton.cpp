#include "model/newton.hpp"

#include <Eigen/SparseLU>
#include <algorithm>
#include <cmath>
#include <limits>

#include "case/accepted_range.hpp"

namespace chassis {
namespace {

// The largest fraction of a step that keeps air flowing forward and temperatures physical.
double safe_fraction(const equations& system, const Eigen::VectorXd& x,
                     const Eigen::VectorXd& step) {
  double fraction = 1;
  const auto keep_above = [&](int i, double least) {
    if (x[i] + fraction * step[i] < least) fraction = (x[i] - least) / -step[i];
  };
  const auto& places = system.places();
  for (int i = 0; i < places.unknowns(); ++i) {
    if (i < places.flow(0) || i > places.stack_pressure()) keep_above(i, 0.5 * x[i]);
  }
  for (std::size_t p = 0; p < places.passages.size(); ++p) {
    keep_above(places.flow(p), 0.1 * x[places.flow(p)]);
  }
  return fraction;
}

}  // namespace

newton_result solve(const equations& system, Eigen::VectorXd start, wall_derivatives derivatives,
                    const progress_report& report) {
  constexpr int most_halvings = 6;
  constexpr int most_vain_steps = 5;
  int vain_steps = 0;  // in a row, that did not bring the residual down
  const auto& settings = system.of().solver;
  newton_result result;
  result.x = std::move(start);
  auto sum = system.at(result.x, derivatives);
  result.residual = system.size_of(sum.residual);
  if (report) report({0, result.residual, 0});

  Eigen::SparseMatrix<double> jacobian(system.places().unknowns(), system.places().unknowns());
  Eigen::SparseLU<Eigen::SparseMatrix<double>> lu;
  bool analysed = false;
  while (!(result.residual <= settings.tolerance) && result.iterations < settings.max_iterations &&
         vain_steps < most_vain_steps) {
    jacobian.setFromTriplets(sum.slopes.begin(), sum.slopes.end());
    if (!analysed) lu.analyzePattern(jacobian);  // the pattern never changes
    analysed = true;
    lu.factorize(jacobian);
    if (lu.info() != Eigen::Success) break;
    const Eigen::VectorXd step = -lu.solve(sum.residual);
    if (!(step.squaredNorm() <= (std::numeric_limits<double>::max)())) break;

    double fraction = safe_fraction(system, result.x, step);
    const double before = sum.residual.norm();
    for (int halving = 0;; ++halving) {
      const Eigen::VectorXd x = result.x + fraction * step;
      auto next = system.at(x, derivatives);
      if (next.residual.norm() < before || halving == most_halvings) {
        vain_steps = next.residual.norm() < before ? 0 : vain_steps + 1;
        result.x = x;
        sum = std::move(next);
        break;
      }
      fraction *= 0.5;
    }
    ++result.iterations;
    result.residual = system.size_of(sum.residual);
    if (report) report({result.iterations, result.residual, fraction});
  }
  result.converged = result.residual <= settings.tolerance;
  return result;
}

std::string not_converged(const newton_result& result, const chassis_case& c) {
  return "the balances did not close: residual " + plain(result.residual) + " after " +
         std::to_string(result.iterations) + " iterations (limit " +
         std::to_string(c.solver.max_iterations) + "); expected <= " + plain(c.solver.tolerance);
}

}  // namespace chassis
