// Newton's method on the balances, with a sparse direct solver.
#pragma once

#include <Eigen/Core>
#include <functional>
#include <string>

#include "model/equations.hpp"

namespace chassis {

struct newton_step {
  int number = 0;       // 0 is the start
  double residual = 0;  // equations::size_of
  double fraction = 0;  // of the Newton step that was taken
};

struct newton_result {
  Eigen::VectorXd x;
  int iterations = 0;
  double residual = 0;
  bool converged = false;
};

using progress_report = std::function<void(const newton_step&)>;

/// With derivatives off, the film coefficients stay frozen within each step (Picard's method).
newton_result solve(const equations& system, Eigen::VectorXd start, wall_derivatives derivatives,
                    const progress_report& report = {});

/// The message of a run that did not converge.
std::string not_converged(const newton_result& result, const chassis_case& c);

}  // namespace chassis
