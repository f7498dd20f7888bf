// A board as a picture: temperature of both faces, component outlines and names, flow direction,
// a colour bar in degrees Celsius and the list of components, hottest first.
#pragma once

#include <Eigen/Core>
#include <string>

#include "model/equations.hpp"
#include "model/solution.hpp"
#include "report/colour_scale.hpp"

namespace chassis {

/// One scale for all boards, so that their pictures can be compared.
colour_scale common_scale(const equations& system, const Eigen::VectorXd& x);

std::string svg_map(const equations& system, const Eigen::VectorXd& x, const solution& s,
                    std::size_t board, const colour_scale& scale);

}  // namespace chassis
