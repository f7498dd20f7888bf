// Where Newton starts: every temperature is the ambient temperature, so no wall differs from its
// air; the flows are those that balance the pressures of air of one temperature.
#pragma once

#include <Eigen/Core>

#include "model/equations.hpp"

namespace chassis {

Eigen::VectorXd uniform_start(const equations& system);

}  // namespace chassis
