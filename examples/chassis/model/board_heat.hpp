// Heat in one board by finite volumes: conduction in the plane between the middles of cells, from
// each middle through half the thickness to the back and front face, and component power into the
// faces. Edges are adiabatic. What the faces give to the air is added elsewhere.
#pragma once

#include <Eigen/Core>

#include "model/balances.hpp"
#include "model/layout.hpp"

namespace chassis {

/// `first` is the place of cell 0's middle; its back and front follow, then the next cell.
/// Heat in W is divided by `heat_scale`.
void add_board_heat(const board_layout& board, int first, double heat_scale,
                    const Eigen::VectorXd& x, balances& sum);

}  // namespace chassis
