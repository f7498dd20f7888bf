#include "model/start.hpp"

#include <cmath>

#include "model/constants.hpp"

namespace chassis {
namespace {

// Root of a growing function between two positive bounds, by halving their ratio.
template <class Function>
double positive_root(Function f, double low, double high) {
  for (int i = 0; i < 60; ++i) {
    const double middle = std::sqrt(low * high);
    (f(middle) < 0 ? low : high) = middle;
  }
  return std::sqrt(low * high);
}

constexpr double least_flow = 1e-9;  // kg/s
constexpr double most_flow = 1e3;

// Flow of a passage under a driving pressure, all its air at one temperature.
double passage_flow(const equations& system, std::size_t p, double driving_Pa, double air_K) {
  const auto& c = system.of();
  const double area = system.flow_area(p);
  const double density = system.walls().density(air_K, c.ambient.pressure_Pa).value;
  const auto loss = [&](double flow) {
    passage_run r;
    r.gap = c.passages[p].gap;
    r.width = c.enclosure.width;
    r.length = c.enclosure.length;
    r.mass_flux = flow / area;
    r.mean_K = air_K;
    r.pressure_Pa = c.ambient.pressure_Pa;
    const double heads = c.passages[p].inlet_loss + c.passages[p].outlet_loss;
    return system.walls().passage_friction(r).pressure_Pa +
           0.5 * heads * r.mass_flux * r.mass_flux / density - driving_Pa;
  };
  return positive_root(loss, least_flow, most_flow);
}

}  // namespace

Eigen::VectorXd uniform_start(const equations& system) {
  const auto& c = system.of();
  const auto& places = system.places();
  const double ambient_K = c.ambient.temperature_K;
  const double outside = system.walls().density(ambient_K, c.ambient.pressure_Pa).value;
  const double area2 = c.enclosure.vent_area * c.enclosure.vent_area;

  Eigen::VectorXd x = Eigen::VectorXd::Constant(places.unknowns(), ambient_K);
  const auto flows_at = [&](double stack_Pa, double head_Pa, double air_K) {
    double total = 0;
    for (std::size_t p = 0; p < c.passages.size(); ++p) {
      x[places.flow(p)] = passage_flow(system, p, stack_Pa + head_Pa, air_K);
      total += x[places.flow(p)];
    }
    return total;
  };
  // A stack pressure of either sign is looked for as a driving pressure, which is positive.
  const auto driven_by = [&](double head_Pa, double plenum_Pa, double air_K) {
    const auto unbalance = [&](double driving_Pa) {
      const double total = flows_at(driving_Pa - head_Pa, head_Pa, air_K);
      const double vent = 0.5 * c.enclosure.vent_loss * total * total / (outside * area2);
      const double fan = system.fan() ? system.fan()->pressure(total / outside).value : 0.0;
      return driving_Pa - head_Pa + vent - plenum_Pa - fan;
    };
    const double driving_Pa = positive_root(unbalance, 1e-9, 1e6);
    x[places.stack_pressure()] = driving_Pa - head_Pa;
    return flows_at(driving_Pa - head_Pa, head_Pa, air_K);
  };

  if (system.fan()) {
    driven_by(0, 0, ambient_K);
    return x;
  }
  // Only buoyancy: the flow for which all the power heats the air by as much as moves that flow.
  const auto too_much = [&](double total) {
    const double rise = places.total_power / (total * system.heat_capacity_J_kgK());
    if (rise > 500) return -1.0;
    const double half = system.walls().density(ambient_K + 0.5 * rise, c.ambient.pressure_Pa).value;
    const double full = system.walls().density(ambient_K + rise, c.ambient.pressure_Pa).value;
    return total - driven_by(standard_gravity * c.enclosure.length * (outside - half),
                             standard_gravity * c.enclosure.plenum_height * (outside - full),
                             ambient_K + 0.5 * rise);
  };
  const double total = positive_root(too_much, least_flow, most_flow);
  too_much(total);
  return x;
}

}  // namespace chassis
