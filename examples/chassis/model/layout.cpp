#include "model/layout.hpp"

#include <algorithm>

namespace chassis {
namespace {

// Edges of both boards' cell rows and the end of the passage, without doubles.
std::vector<double> segment_edges(const std::vector<const board*>& walls, double length) {
  std::vector<double> edges{0, length};
  for (const auto* wall : walls) {
    const double dx = wall->length / static_cast<double>(wall->cells_along);
    for (std::size_t i = 0; i <= wall->cells_along; ++i) {
      edges.push_back((std::min)(static_cast<double>(i) * dx, length));
    }
  }
  std::sort(edges.begin(), edges.end());
  const double same = 1e-9 * length;
  std::vector<double> result{0};
  for (const double edge : edges) {
    if (edge > result.back() + same) result.push_back(edge);
  }
  return result;
}

}  // namespace

layout::layout(const chassis_case& c) {
  for (const auto& b : c.boards) {
    board_layout one{board_mesh(b), plate_of(b.layers), {}, {}};
    one.back_power.resize(one.mesh.cells());
    one.front_power.resize(one.mesh.cells());
    for (const auto& part : b.components) {
      auto& power = part.side == face::back ? one.back_power : one.front_power;
      const double per_area = part.power_W / (part.at.length * part.at.width);
      for (std::size_t j = 0; j < one.mesh.across; ++j) {
        for (std::size_t i = 0; i < one.mesh.along; ++i) {
          power[one.mesh.cell(i, j)] += per_area * one.mesh.shared_area(i, j, part.at);
        }
      }
      total_power += part.power_W;
    }
    first_of_board_.push_back(unknowns_);
    unknowns_ += 3 * static_cast<int>(one.mesh.cells());
    boards.push_back(std::move(one));
  }

  for (std::size_t p = 0; p < c.passages.size(); ++p) {
    struct neighbour {
      std::size_t board;
      face side;
    };
    std::vector<neighbour> neighbours;
    if (p > 0) neighbours.push_back({p - 1, face::front});
    if (p < c.boards.size()) neighbours.push_back({p, face::back});
    std::vector<const board*> walls;
    walls.reserve(neighbours.size());
    for (const auto& n : neighbours) walls.push_back(&c.boards[n.board]);

    const auto edges = segment_edges(walls, c.enclosure.length);
    std::vector<segment> segments;
    for (std::size_t s = 0; s + 1 < edges.size(); ++s) {
      segment piece{edges[s], edges[s + 1], {}};
      const double middle = 0.5 * (piece.begin + piece.end);
      for (const auto& n : neighbours) {
        const auto& mesh = boards[n.board].mesh;
        if (middle > c.boards[n.board].length) continue;
        const auto i = (std::min)(static_cast<std::size_t>(middle / mesh.dx), mesh.along - 1);
        for (std::size_t j = 0; j < mesh.across; ++j) {
          piece.contacts.push_back(contacts.size());
          contacts.push_back(
              {n.board, mesh.cell(i, j), n.side, p, s, (piece.end - piece.begin) * mesh.dy});
        }
      }
      segments.push_back(std::move(piece));
    }
    first_of_passage_.push_back(unknowns_);
    unknowns_ += 2 * static_cast<int>(segments.size());
    passages.push_back(std::move(segments));
  }
  first_flow_ = unknowns_;
  unknowns_ += static_cast<int>(c.passages.size());
  stack_pressure_ = unknowns_;
  unknowns_ += 2 + static_cast<int>(c.outer_walls.size());
}

}  // namespace chassis
