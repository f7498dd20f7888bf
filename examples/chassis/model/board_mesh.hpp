// Equal rectangular cells on a board; cell (i, j) is number j * along + i.
#pragma once

#include <algorithm>
#include <cstddef>

#include "case/case.hpp"

namespace chassis {

struct board_mesh {
  std::size_t along = 0;  // cells in flow direction
  std::size_t across = 0;
  double dx = 0;
  double dy = 0;

  explicit board_mesh(const board& b)
      : along(b.cells_along),
        across(b.cells_across),
        dx(b.length / static_cast<double>(b.cells_along)),
        dy(b.width / static_cast<double>(b.cells_across)) {}

  std::size_t cells() const { return along * across; }
  std::size_t cell(std::size_t i, std::size_t j) const { return j * along + i; }
  double area() const { return dx * dy; }

  /// Area that cell (i, j) shares with a rectangle on the board.
  double shared_area(std::size_t i, std::size_t j, const rectangle& r) const {
    const auto overlap = [](double a, double a_end, double b, double b_end) {
      return (std::max)(0.0, (std::min)(a_end, b_end) - (std::max)(a, b));
    };
    const double x = static_cast<double>(i) * dx;
    const double y = static_cast<double>(j) * dy;
    return overlap(x, x + dx, r.x, r.x + r.length) * overlap(y, y + dy, r.y, r.y + r.width);
  }
};

}  // namespace chassis
