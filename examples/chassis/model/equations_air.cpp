// Air: heat picked up along the passages, and pressures.
#include <cmath>

#include "model/constants.hpp"
#include "model/equations.hpp"
#include "model/segment_mean.hpp"

namespace chassis {

void equations::add_passage_heat(std::size_t p, const Eigen::VectorXd& x, wall_derivatives d,
                                 balances& sum) const {
  const int flow = layout_.flow(p);
  const double capacity = x[flow] * cp_;  // W/K
  const double per_flow = 1.0 / flow_area(p);
  for (std::size_t s = 0; s < layout_.passages[p].size(); ++s) {
    const auto& piece = layout_.passages[p][s];
    const int mean = layout_.mean(p, s);
    const int outgoing = layout_.outgoing(p, s);
    const bool first = s == 0;
    const int incoming = first ? -1 : layout_.outgoing(p, s - 1);  // the inlet is no unknown
    const double in_K = first ? case_.ambient.temperature_K : x[incoming];

    double conductance = 0;        // H = sum h A
    double conductance_dmean = 0;  // dH/dT_mean
    double conductance_dflow = 0;
    double excess = 0;  // E = sum h A (T_wall - T_in)
    double excess_dmean = 0;
    double excess_dflow = 0;
    double heat = 0;  // Q = sum h A (T_wall - T_mean)
    double heat_dmean = 0;
    double heat_dflow = 0;
    struct wall_part {
      int column;
      double conductance_d, excess_d, heat_d;
    };
    std::vector<wall_part> parts;
    parts.reserve(piece.contacts.size());

    for (const auto number : piece.contacts) {
      const auto& k = layout_.contacts[number];
      film f = contact_film(x, number);
      if (d == wall_derivatives::off) f.dh_dwall = f.dh_dstream = f.dh_dmass_flux = 0;
      const int wall = layout_.face_of(k.board, k.cell, k.side);
      const double over_in = x[wall] - in_K;
      const double over_mean = x[wall] - x[mean];
      const double a = k.area;
      const double q_dwall = a * (f.h + f.dh_dwall * over_mean);
      const double q_dmean = a * (f.dh_dstream * over_mean - f.h);
      const double q_dflow = a * f.dh_dmass_flux * per_flow * over_mean;

      sum.add(wall, a * f.h * over_mean / heat_scale_);
      sum.slope(wall, wall, q_dwall / heat_scale_);
      sum.slope(wall, mean, q_dmean / heat_scale_);
      sum.slope(wall, flow, q_dflow / heat_scale_);

      conductance += a * f.h;
      conductance_dmean += a * f.dh_dstream;
      conductance_dflow += a * f.dh_dmass_flux * per_flow;
      excess += a * f.h * over_in;
      excess_dmean += a * f.dh_dstream * over_in;
      excess_dflow += a * f.dh_dmass_flux * per_flow * over_in;
      heat += a * f.h * over_mean;
      heat_dmean += q_dmean;
      heat_dflow += q_dflow;
      parts.push_back({wall, a * f.dh_dwall, a * (f.h + f.dh_dwall * over_in), q_dwall});
    }

    // C (T_out - T_in) = Q: the energy balance of the segment.
    sum.add(outgoing, (capacity * (x[outgoing] - in_K) - heat) / heat_scale_);
    sum.slope(outgoing, outgoing, capacity / heat_scale_);
    sum.slope(outgoing, mean, -heat_dmean / heat_scale_);
    sum.slope(outgoing, flow, (cp_ * (x[outgoing] - in_K) - heat_dflow) / heat_scale_);
    if (!first) sum.slope(outgoing, incoming, -capacity / heat_scale_);

    // T_mean - T_in = psi(H / C) E / C: the exponential of the segment.
    const double n = conductance / capacity;
    const auto psi = exponential_mean(n);
    const double ratio = excess / capacity;
    const double by_n = psi.slope * ratio;  // d(psi E / C)/dN
    const double by_e = psi.value / capacity;
    sum.add(mean, x[mean] - in_K - psi.value * ratio);
    sum.slope(mean, mean, 1.0 - by_n * conductance_dmean / capacity - by_e * excess_dmean);
    sum.slope(
        mean, flow,
        -by_n * (conductance_dflow - n * cp_) / capacity - by_e * (excess_dflow - ratio * cp_));
    if (!first) sum.slope(mean, incoming, -1.0 + by_e * conductance);
    for (const auto& part : parts) {
      sum.slope(outgoing, part.column, -part.heat_d / heat_scale_);
      sum.slope(mean, part.column, -by_n * part.conductance_d / capacity - by_e * part.excess_d);
    }
  }
}

passage_run equations::run(const Eigen::VectorXd& x, std::size_t p) const {
  double mean_K = 0;
  for (std::size_t s = 0; s < layout_.passages[p].size(); ++s) {
    const auto& piece = layout_.passages[p][s];
    mean_K += x[layout_.mean(p, s)] * (piece.end - piece.begin) / case_.enclosure.length;
  }
  passage_run r;
  r.gap = case_.passages[p].gap;
  r.width = case_.enclosure.width;
  r.length = case_.enclosure.length;
  r.mass_flux = x[layout_.flow(p)] / flow_area(p);
  r.mean_K = mean_K;
  r.pressure_Pa = case_.ambient.pressure_Pa;
  return r;
}

// Friction + inlet loss + outlet loss - buoyancy = pressure over the stack.
void equations::add_passage_pressure(std::size_t p, const Eigen::VectorXd& x, balances& sum) const {
  const int row = layout_.flow(p);
  const double pressure_Pa = case_.ambient.pressure_Pa;
  const double area = flow_area(p);
  const auto& segments = layout_.passages[p];
  const auto state = run(x, p);
  auto loss = walls_.passage_friction(state);
  loss.pressure_Pa *= loss_factor[p];
  loss.per_mass_flux *= loss_factor[p];
  loss.per_kelvin *= loss_factor[p];

  const int last = layout_.outgoing(p, segments.size() - 1);
  const auto out = walls_.density(x[last], pressure_Pa);
  const double flux = state.mass_flux;
  const double in_part = 0.5 * case_.passages[p].inlet_loss / inlet_density_;
  const double out_part = 0.5 * case_.passages[p].outlet_loss / out.value;
  double value =
      loss.pressure_Pa + (in_part + out_part) * flux * flux - x[layout_.stack_pressure()];
  sum.slope(row, row,
            (loss.per_mass_flux + 2 * (in_part + out_part) * flux) / area / pressure_scale_);
  sum.slope(row, last, -out_part * flux * flux * out.slope / out.value / pressure_scale_);
  sum.slope(row, layout_.stack_pressure(), -1.0 / pressure_scale_);

  for (std::size_t s = 0; s < segments.size(); ++s) {
    const int mean = layout_.mean(p, s);
    const double share = (segments[s].end - segments[s].begin) / state.length;
    double slope = loss.per_kelvin * share;
    if (case_.enclosure.direction == flow_direction::upward) {
      const double rise = segments[s].end - segments[s].begin;
      const auto density = walls_.density(x[mean], pressure_Pa);
      value -= standard_gravity * rise * (inlet_density_ - density.value);
      slope += standard_gravity * rise * density.slope;
    }
    sum.slope(row, mean, slope / pressure_scale_);
  }
  sum.add(row, value / pressure_scale_);
}

// Stack pressure + vent loss - buoyancy of the plenum = fan pressure.
void equations::add_stack_pressure(const Eigen::VectorXd& x, balances& sum) const {
  const int row = layout_.stack_pressure();
  const auto& box = case_.enclosure;
  double total = 0;
  for (std::size_t p = 0; p < case_.passages.size(); ++p) total += x[layout_.flow(p)];
  const double vent = 0.5 * box.vent_loss / (inlet_density_ * box.vent_area * box.vent_area);
  double value = x[row] + vent * total * std::abs(total);
  double slope = 2 * vent * std::abs(total);
  if (fan_) {
    const auto fan = fan_->pressure(total / inlet_density_);
    value -= fan.value;
    slope -= fan.slope / inlet_density_;
  }
  if (box.direction == flow_direction::upward) {
    const auto density = walls_.density(x[layout_.plenum()], case_.ambient.pressure_Pa);
    value -= standard_gravity * box.plenum_height * (inlet_density_ - density.value);
    sum.slope(row, layout_.plenum(),
              standard_gravity * box.plenum_height * density.slope / pressure_scale_);
  }
  sum.add(row, value / pressure_scale_);
  sum.slope(row, row, 1.0 / pressure_scale_);
  for (std::size_t p = 0; p < case_.passages.size(); ++p) {
    sum.slope(row, layout_.flow(p), slope / pressure_scale_);
  }
}

}  // namespace chassis
