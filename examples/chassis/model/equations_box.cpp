// The box: air mixed in the plenum, and outer walls between plenum and surroundings.
#include "model/constants.hpp"
#include "model/equations.hpp"

namespace chassis {

outer_spot equations::outer(const Eigen::VectorXd& x, std::size_t w) const {
  const auto& wall = case_.outer_walls[w];
  outer_spot at;
  at.faces = wall.faces;
  at.length = wall.length;
  at.height = wall.height;
  at.air_speed = case_.ambient.outer_air_speed_m_s;
  at.wall_K = x[layout_.outer_wall(w)];
  at.air_K = case_.ambient.temperature_K;
  at.pressure_Pa = case_.ambient.pressure_Pa;
  return at;
}

double equations::radiated_flux(std::size_t w, double wall_K) const {
  const double air_K = case_.ambient.temperature_K;
  // Factored so that it is exactly zero, and accurate, near equal temperatures.
  return case_.outer_walls[w].emissivity * stefan_boltzmann * (wall_K * wall_K + air_K * air_K) *
         (wall_K + air_K) * (wall_K - air_K);
}

void equations::add_plenum_and_walls(const Eigen::VectorXd& x, wall_derivatives d,
                                     balances& sum) const {
  const int plenum = layout_.plenum();
  // All passages deliver their air; the mixture leaves at plenum temperature.
  for (std::size_t p = 0; p < case_.passages.size(); ++p) {
    const int flow = layout_.flow(p);
    const int last = layout_.outgoing(p, layout_.passages[p].size() - 1);
    const double capacity = x[flow] * cp_ / heat_scale_;
    sum.add(plenum, capacity * (x[plenum] - x[last]));
    sum.slope(plenum, plenum, capacity);
    sum.slope(plenum, last, -capacity);
    sum.slope(plenum, flow, cp_ / heat_scale_ * (x[plenum] - x[last]));
  }
  for (std::size_t w = 0; w < case_.outer_walls.size(); ++w) {
    const auto& wall = case_.outer_walls[w];
    const int row = layout_.outer_wall(w);
    const double area = wall.length * wall.height / heat_scale_;
    const double inside = area * wall.inside_film_W_m2K;
    const double from_plenum = inside * (x[plenum] - x[row]);
    sum.add(plenum, from_plenum);
    sum.slope(plenum, plenum, inside);
    sum.slope(plenum, row, -inside);

    const auto at = outer(x, w);
    auto f = walls_.outer_film(at);
    if (d == wall_derivatives::off) f.dh_dwall = 0;
    const double factor = outer_factor[w];
    const double over = at.wall_K - at.air_K;
    const double radiated_slope =
        4 * wall.emissivity * stefan_boltzmann * at.wall_K * at.wall_K * at.wall_K;
    sum.add(row, area * (factor * f.h * over + radiated_flux(w, at.wall_K)) - from_plenum);
    sum.slope(row, row, inside + area * (factor * (f.h + f.dh_dwall * over) + radiated_slope));
    sum.slope(row, plenum, -inside);
  }
}

}  // namespace chassis
