// One board as a legacy ASCII VTK file (structured points with cell data), an open format that
// viewers read.
#pragma once

#include <Eigen/Core>
#include <string>

#include "model/equations.hpp"

namespace chassis {

std::string vtk_file(const equations& system, const Eigen::VectorXd& x, std::size_t board);

}  // namespace chassis
