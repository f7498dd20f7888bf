// The band of component temperatures that the stated scatters allow: the case is solved twice
// more, with all film coefficients at the low end of their scatter and friction at the high end,
// and the other way round. A scatter that the source does
// not state is what the case assumes. All films off in the same direction is the worst case.
#pragma once

#include <Eigen/Core>
#include <vector>

#include "model/equations.hpp"
#include "model/solution.hpp"

namespace chassis {

/// Fills lowest_K and highest_K. Returns false if one of the two solutions did not converge.
bool add_band(const equations& system, const Eigen::VectorXd& x,
              std::vector<component_result>& components);

}  // namespace chassis
