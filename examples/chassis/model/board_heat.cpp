#include "model/board_heat.hpp"

namespace chassis {

void add_board_heat(const board_layout& board, int first, double heat_scale,
                    const Eigen::VectorXd& x, balances& sum) {
  const auto& mesh = board.mesh;
  const auto& plate = board.plate;
  const double sheet = plate.in_plane * plate.thickness / heat_scale;
  const double to_face = mesh.area() * plate.through / (0.5 * plate.thickness) / heat_scale;
  const auto middle = [first](std::size_t cell) { return first + 3 * static_cast<int>(cell); };
  const auto exchange = [&](int one, int other, double conductance) {
    const double heat = conductance * (x[one] - x[other]);
    sum.add(one, heat);
    sum.add(other, -heat);
    sum.slope(one, one, conductance);
    sum.slope(one, other, -conductance);
    sum.slope(other, other, conductance);
    sum.slope(other, one, -conductance);
  };
  for (std::size_t j = 0; j < mesh.across; ++j) {
    for (std::size_t i = 0; i < mesh.along; ++i) {
      const auto cell = mesh.cell(i, j);
      const int here = middle(cell);
      if (i + 1 < mesh.along) {
        exchange(here, middle(mesh.cell(i + 1, j)), sheet * mesh.dy / mesh.dx);
      }
      if (j + 1 < mesh.across) {
        exchange(here, middle(mesh.cell(i, j + 1)), sheet * mesh.dx / mesh.dy);
      }
      exchange(here, here + 1, to_face);
      exchange(here, here + 2, to_face);
      sum.add(here + 1, -board.back_power[cell] / heat_scale);
      sum.add(here + 2, -board.front_power[cell] / heat_scale);
    }
  }
}

}  // namespace chassis
