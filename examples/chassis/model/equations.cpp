#include "model/equations.hpp"

#include <algorithm>
#include <cmath>
#include <limits>

#include "model/board_heat.hpp"
#include "model/constants.hpp"

namespace chassis {

equations::equations(const chassis_case& c, const wall_model& walls)
    : case_(c), walls_(walls), layout_(c) {
  if (c.fan) fan_.emplace(*c.fan);
  const auto& air = c.ambient;
  cp_ = walls.specific_heat(air.temperature_K, air.pressure_Pa);
  inlet_density_ = walls.density(air.temperature_K, air.pressure_Pa).value;
  heat_scale_ = layout_.total_power > 0 ? layout_.total_power : 1.0;
  // Without a fan: the head of air 1 K warmer than outside.
  pressure_scale_ =
      fan_ ? fan_->shut_off_pressure()
           : standard_gravity * inlet_density_ * c.enclosure.length / air.temperature_K;
  film_factor.assign(layout_.contacts.size(), 1.0);
  outer_factor.assign(c.outer_walls.size(), 1.0);
  loss_factor.assign(c.passages.size(), 1.0);
}

double equations::flow_area(std::size_t p) const {
  return case_.passages[p].gap * case_.enclosure.width;
}

passage_spot equations::spot(const Eigen::VectorXd& x, std::size_t number) const {
  const auto& k = layout_.contacts[number];
  const auto& piece = layout_.passages[k.passage][k.segment];
  passage_spot at;
  at.gap = case_.passages[k.passage].gap;
  at.width = case_.enclosure.width;
  at.begin = piece.begin;
  at.end = piece.end;
  at.mass_flux = x[layout_.flow(k.passage)] / flow_area(k.passage);
  at.wall_K = x[layout_.face_of(k.board, k.cell, k.side)];
  at.stream_K = x[layout_.mean(k.passage, k.segment)];
  at.pressure_Pa = case_.ambient.pressure_Pa;
  return at;
}

film equations::contact_film(const Eigen::VectorXd& x, std::size_t number) const {
  film f = walls_.passage_film(spot(x, number));
  const double factor = film_factor[number];
  f.h *= factor;
  f.dh_dwall *= factor;
  f.dh_dstream *= factor;
  f.dh_dmass_flux *= factor;
  return f;
}

balances equations::at(const Eigen::VectorXd& x, wall_derivatives derivatives) const {
  balances sum(layout_.unknowns());
  for (std::size_t b = 0; b < layout_.boards.size(); ++b) {
    add_board_heat(layout_.boards[b], layout_.middle(b, 0), heat_scale_, x, sum);
  }
  for (std::size_t p = 0; p < layout_.passages.size(); ++p) {
    add_passage_heat(p, x, derivatives, sum);
    add_passage_pressure(p, x, sum);
  }
  add_stack_pressure(x, sum);
  add_plenum_and_walls(x, derivatives, sum);
  return sum;
}

double equations::size_of(const Eigen::VectorXd& residual) const {
  double worst = 0;    // heat of one row
  double balance = 0;  // of all rows: heat in less heat out
  double air = 0;
  double pressure = 0;
  const auto heat = [&](int row) {
    worst = (std::max)(worst, std::abs(residual[row]));
    balance += residual[row];
  };
  for (int row = 0; row < layout_.mean(0, 0); ++row) heat(row);
  for (std::size_t p = 0; p < layout_.passages.size(); ++p) {
    for (std::size_t s = 0; s < layout_.passages[p].size(); ++s) {
      air = (std::max)(air, std::abs(residual[layout_.mean(p, s)]));
      heat(layout_.outgoing(p, s));
    }
    pressure = (std::max)(pressure, std::abs(residual[layout_.flow(p)]));
  }
  pressure = (std::max)(pressure, std::abs(residual[layout_.stack_pressure()]));
  heat(layout_.plenum());
  for (std::size_t w = 0; w < case_.outer_walls.size(); ++w) heat(layout_.outer_wall(w));
  const double size = (std::max)({worst, std::abs(balance), air, pressure});
  return size == size ? size : (std::numeric_limits<double>::max)();
}

}  // namespace chassis
