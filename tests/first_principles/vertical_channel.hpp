#pragma once

// Natural convection between vertical plates, gap S, height L, open to the ambient at both ends,
// inertia-free (Pr -> inf). Lengths S across and L along, velocity g beta dT S^2/nu, dT the wall
// excess, or q S/k for uniform flux; El = g beta dT S^4/(nu alpha L):
//   u_yy + th = P',   u_x + v_y = 0,   El (u th_x + v th_y) = th_yy,   P(0) = P(1) = 0.
// Finite volumes across, implicit steps along, and the flow rate from the draught balance
// int P' dx = 0. Small El has closed forms: the draught of a filled channel, W. Elenbaas, Physica 9
// (1942) 1-28; A. Bar-Cohen, W. M. Rohsenow, J. Heat Transfer 106 (1984) 116-123.

#include <Eigen/Core>
#include <boost/math/tools/toms748_solve.hpp>
#include <cmath>
#include <cstdint>
#include <numbers>

#include "spectral.hpp"

namespace first_principles {

enum class channel_wall { isothermal, isoflux };
enum class heated_sides { both, one };

struct channel_draught {
  double flow;        // int u dy
  double nusselt;     // isothermal: mean h S/k; isoflux: 1/th_wall at x = L
  double mid_height;  // isoflux: 1/th_wall at x = L/2
};

class vertical_channel {
 public:
  vertical_channel(channel_wall wall, heated_sides sides, Eigen::Index cells = 40,
                   Eigen::Index steps = 200)
      : wall_(wall), sides_(sides), cells_(cells), steps_(steps) {
    face_ = (1.0 - (Eigen::ArrayXd::LinSpaced(cells + 1, 0.0, std::numbers::pi)).cos()) / 2.0;
    width_ = face_.tail(cells) - face_.head(cells);
    const Eigen::ArrayXd centre = (face_.tail(cells) + face_.head(cells)) / 2.0;
    link_.resize(cells + 1);
    link_[0] = 1.0 / centre[0];
    for (Eigen::Index j = 1; j < cells; ++j) link_[j] = 1.0 / (centre[j] - centre[j - 1]);
    link_[cells] = 1.0 / (1.0 - centre[cells - 1]);
    poiseuille_ = velocity_of(Eigen::ArrayXd::Ones(cells));
  }

  channel_draught solve(double elenbaas) const {
    const double heated = sides_ == heated_sides::both ? 2.0 : 1.0;
    // the draught of a filled channel, at most that of the isothermal wall temperature
    const double filled =
        wall_ == channel_wall::isothermal ? 1.0 / 12.0 : std::sqrt(heated / (24.0 * elenbaas));
    channel_draught result{};
    const auto imbalance = [&](double flow) { return march(elenbaas, flow, result); };
    // down from the filled channel: far too small a flow would turn back inside the channel
    double high = 1.1 * filled;
    double low = 0.9 * high;
    double at_high = imbalance(high);
    double at_low = imbalance(low);
    while (at_low < 0.0) {
      high = low;
      at_high = at_low;
      low *= 0.8;
      at_low = imbalance(low);
    }
    std::uintmax_t passes = 60;
    const auto bracket =
        boost::math::tools::toms748_solve(imbalance, low, high, at_low, at_high,
                                          boost::math::tools::eps_tolerance<double>(40), passes);
    march(elenbaas, 0.5 * (bracket.first + bracket.second), result);
    return result;
  }

 private:
  // u_yy = -source, no slip
  Eigen::ArrayXd velocity_of(const Eigen::ArrayXd& source) const {
    return tridiagonal(Eigen::ArrayXd::Zero(cells_), Eigen::ArrayXd::Zero(cells_ + 1),
                       source * width_, true, true);
  }

  // conduction plus `own` on the diagonal and the cross flow `cross` through the faces
  Eigen::ArrayXd tridiagonal(const Eigen::ArrayXd& own, const Eigen::ArrayXd& cross,
                             const Eigen::ArrayXd& right, bool left_fixed, bool right_fixed) const {
    const Eigen::Index n = cells_;
    Eigen::ArrayXd diagonal = own;
    Eigen::ArrayXd value = right;
    Eigen::ArrayXd below = Eigen::ArrayXd::Zero(n);
    Eigen::ArrayXd above = Eigen::ArrayXd::Zero(n);
    for (Eigen::Index j = 1; j < n; ++j) {  // inner face j parts cells j - 1 and j
      diagonal[j - 1] += link_[j] + 0.5 * cross[j];
      above[j - 1] = -link_[j] + 0.5 * cross[j];
      diagonal[j] += link_[j] - 0.5 * cross[j];
      below[j] = -link_[j] - 0.5 * cross[j];
    }
    if (left_fixed) diagonal[0] += link_[0];
    if (right_fixed) diagonal[n - 1] += link_[n];
    for (Eigen::Index j = 1; j < n; ++j) {
      const double factor = below[j] / diagonal[j - 1];
      diagonal[j] -= factor * above[j - 1];
      value[j] -= factor * value[j - 1];
    }
    value[n - 1] /= diagonal[n - 1];
    for (Eigen::Index j = n - 2; j >= 0; --j) {
      value[j] = (value[j] - above[j] * value[j + 1]) / diagonal[j];
    }
    return value;
  }

  // marches from the inlet with the given flow rate; returns int P' dx
  double march(double elenbaas, double flow, channel_draught& result) const {
    const bool isothermal = wall_ == channel_wall::isothermal;
    const bool both = sides_ == heated_sides::both;
    const double resistance = (poiseuille_ * width_).sum();
    Eigen::ArrayXd th = Eigen::ArrayXd::Zero(cells_);
    Eigen::ArrayXd u = poiseuille_ * flow / resistance;
    double gradient = -flow / resistance;
    double pressure = 0.0;
    double x = 0.0;
    result = {flow, 0.0, 0.0};
    for (Eigen::Index i = 1; i <= steps_; ++i) {
      // steps fine at the inlet, and one of them ends at mid height
      const double s = static_cast<double>(i) / static_cast<double>(steps_);
      const double split = 0.75;
      const double x_new =
          s <= split ? 0.5 * std::pow(s / split, 3) : 0.5 + 0.5 * (s - split) / (1.0 - split);
      const double step = x_new - x;
      const Eigen::ArrayXd th_old = th;
      const Eigen::ArrayXd u_old = u;
      double gradient_new = gradient;
      for (int pass = 0; pass < 4; ++pass) {
        const Eigen::ArrayXd buoyant = velocity_of(th);
        gradient_new = ((buoyant * width_).sum() - flow) / resistance;
        u = buoyant - gradient_new * poiseuille_;
        Eigen::ArrayXd cross = Eigen::ArrayXd::Zero(cells_ + 1);
        for (Eigen::Index j = 0; j < cells_; ++j) {
          cross[j + 1] = cross[j] - elenbaas * (u[j] - u_old[j]) * width_[j] / step;
        }
        Eigen::ArrayXd right = elenbaas / step * u_old * th_old * width_;
        if (isothermal) {
          right[cells_ - 1] += link_[cells_];
          if (both) right[0] += link_[0];
        } else {
          right[cells_ - 1] += 1.0;
          if (both) right[0] += 1.0;
        }
        th =
            tridiagonal(elenbaas / step * u * width_, cross, right, isothermal && both, isothermal);
      }
      pressure += 0.5 * (gradient + gradient_new) * step;
      gradient = gradient_new;
      x = x_new;
      if (!isothermal && std::abs(x - 0.5) < 1e-12) {
        result.mid_height = 1.0 / (th[cells_ - 1] + 1.0 / link_[cells_]);
      }
    }
    result.nusselt = isothermal ? elenbaas * (u * th * width_).sum() / (both ? 2.0 : 1.0)
                                : 1.0 / (th[cells_ - 1] + 1.0 / link_[cells_]);
    return pressure;
  }

  channel_wall wall_;
  heated_sides sides_;
  Eigen::Index cells_;
  Eigen::Index steps_;
  Eigen::ArrayXd face_, width_, link_, poiseuille_;
};

/// Small El with wall excesses 1 and `ratio`: the temperature is linear across, the velocity is the
/// integral of Green's function, and the heat leaves with the stream. Gives Nu/El, both on the mean
/// excess (W. Aung, Int. J. Heat Mass Transfer 15 (1972) 1577-1580).
inline double filled_channel(double ratio) {
  const auto rule = gauss_legendre(4);  // exact for the polynomials here
  const auto integral = [&rule](const auto& f, double from, double to) {
    double sum = 0.0;
    for (Eigen::Index i = 0; i < rule.node.size(); ++i) {
      sum +=
          0.5 * (to - from) * rule.weight[i] * f(from + 0.5 * (to - from) * (1.0 + rule.node[i]));
    }
    return sum;
  };
  const auto excess = [ratio](double y) { return 1.0 + (ratio - 1.0) * y; };
  const auto velocity = [&](double y) {
    return integral([&](double s) { return s * (1.0 - y) * excess(s); }, 0.0, y) +
           integral([&](double s) { return y * (1.0 - s) * excess(s); }, y, 1.0);
  };
  const double mean = 0.5 * (1.0 + ratio);
  return integral([&](double y) { return velocity(y) * excess(y); }, 0.0, 1.0) /
         (2.0 * mean * mean);
}

}  // namespace first_principles
