// The balance equations of the whole chassis: their residuals and exact derivatives.
//
// Row r of the Jacobian belongs to the balance of unknown r. Heat balances are divided by the
// total power, air temperatures by 1 K and pressures by a pressure of the case, so that residuals
// of all kinds can be judged by one tolerance.
#pragma once

#include <Eigen/Core>
#include <optional>
#include <vector>

#include "case/case.hpp"
#include "model/balances.hpp"
#include "model/fan_curve.hpp"
#include "model/layout.hpp"
#include "model/wall_model.hpp"

namespace chassis {

enum class wall_derivatives { exact, off };

class equations {
 public:
  equations(const chassis_case& c, const wall_model& walls);

  balances at(const Eigen::VectorXd& x, wall_derivatives derivatives) const;

  /// The largest of: heat residual of one balance and the sum of them all, over the total power;
  /// air temperature residual in K; pressure residual over the reference pressure.
  double size_of(const Eigen::VectorXd& residual) const;

  film contact_film(const Eigen::VectorXd& x, std::size_t contact) const;
  passage_spot spot(const Eigen::VectorXd& x, std::size_t contact) const;
  outer_spot outer(const Eigen::VectorXd& x, std::size_t wall) const;
  passage_run run(const Eigen::VectorXd& x, std::size_t passage) const;
  double radiated_flux(std::size_t wall, double wall_K) const;
  double flow_area(std::size_t passage) const;
  double heat_capacity_J_kgK() const { return cp_; }

  const chassis_case& of() const { return case_; }
  const chassis::layout& places() const { return layout_; }
  const wall_model& walls() const { return walls_; }
  const std::optional<fan_curve>& fan() const { return fan_; }

  /// Multipliers on what the wall model says; the uncertainty band is made with them.
  std::vector<double> film_factor;   // per contact
  std::vector<double> outer_factor;  // per outer wall
  std::vector<double> loss_factor;   // per passage

 private:
  void add_passage_heat(std::size_t passage, const Eigen::VectorXd& x, wall_derivatives d,
                        balances& sum) const;
  void add_passage_pressure(std::size_t passage, const Eigen::VectorXd& x, balances& sum) const;
  void add_stack_pressure(const Eigen::VectorXd& x, balances& sum) const;
  void add_plenum_and_walls(const Eigen::VectorXd& x, wall_derivatives d, balances& sum) const;

  const chassis_case& case_;
  const wall_model& walls_;
  chassis::layout layout_;
  std::optional<fan_curve> fan_;
  double cp_ = 0;
  double inlet_density_ = 0;
  double heat_scale_ = 1;
  double pressure_scale_ = 1;
};

}  // namespace chassis
