// Who touches whom, and which place in the vector of unknowns belongs to whom.
//
// Unknowns: for every board cell the temperature of its middle, back face and front face; for
// every segment of a passage the mean and the outgoing air temperature; for every passage its mass
// flow; the pressure between plenum and inlet that all passages share; the temperature of the
// mixed air in the plenum; the temperature of every outer wall.
#pragma once

#include <cstddef>
#include <vector>

#include "case/case.hpp"
#include "model/board_mesh.hpp"
#include "model/layers.hpp"

namespace chassis {

/// A piece of a board face that sees one segment of a passage.
struct contact {
  std::size_t board = 0;
  std::size_t cell = 0;
  face side = face::front;
  std::size_t passage = 0;
  std::size_t segment = 0;
  double area = 0;
};

struct segment {
  double begin = 0;
  double end = 0;
  std::vector<std::size_t> contacts;  // numbers of contacts
};

struct board_layout {
  board_mesh mesh;
  chassis::plate plate;
  std::vector<double> back_power;   // W into the back face of every cell
  std::vector<double> front_power;  // W into the front face of every cell
};

class layout {
 public:
  explicit layout(const chassis_case& c);

  int middle(std::size_t board, std::size_t cell) const {
    return first_of_board_[board] + 3 * static_cast<int>(cell);
  }
  int face_of(std::size_t board, std::size_t cell, face side) const {
    return middle(board, cell) + (side == face::back ? 1 : 2);
  }
  int mean(std::size_t passage, std::size_t segment) const {
    return first_of_passage_[passage] + 2 * static_cast<int>(segment);
  }
  int outgoing(std::size_t passage, std::size_t segment) const {
    return mean(passage, segment) + 1;
  }
  int flow(std::size_t passage) const { return first_flow_ + static_cast<int>(passage); }
  int stack_pressure() const { return stack_pressure_; }
  int plenum() const { return stack_pressure_ + 1; }
  int outer_wall(std::size_t wall) const { return stack_pressure_ + 2 + static_cast<int>(wall); }
  int unknowns() const { return unknowns_; }

  std::vector<board_layout> boards;
  std::vector<std::vector<segment>> passages;
  std::vector<contact> contacts;
  double total_power = 0;

 private:
  std::vector<int> first_of_board_;
  std::vector<int> first_of_passage_;
  int first_flow_ = 0;
  int stack_pressure_ = 0;
  int unknowns_ = 0;
};

}  // namespace chassis
