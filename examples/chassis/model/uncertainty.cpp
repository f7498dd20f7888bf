#include "model/uncertainty.hpp"

#include <algorithm>

#include "model/newton.hpp"

namespace chassis {
namespace {

// A film with the given scatter at its low (-1) or high (+1) end. A scatter of 100 % or more would
// stop all cooling, so nine tenths is the most that counts.
double factor(const std::optional<double>& scatter, double if_not_stated, int end) {
  return 1.0 + end * (std::min)(scatter.value_or(if_not_stated), 0.9);
}

}  // namespace

bool add_band(const equations& system, const Eigen::VectorXd& x,
              std::vector<component_result>& components) {
  const double assumed = system.of().scatter_where_not_stated;
  for (const int end : {-1, +1}) {
    equations shifted = system;
    for (std::size_t i = 0; i < shifted.film_factor.size(); ++i) {
      shifted.film_factor[i] = factor(system.contact_film(x, i).scatter, assumed, end);
    }
    for (std::size_t w = 0; w < shifted.outer_factor.size(); ++w) {
      shifted.outer_factor[w] =
          factor(system.walls().outer_film(system.outer(x, w)).scatter, assumed, end);
    }
    for (std::size_t p = 0; p < shifted.loss_factor.size(); ++p) {
      shifted.loss_factor[p] =
          factor(system.walls().passage_friction(system.run(x, p)).scatter, assumed, -end);
    }
    const auto result = solve(shifted, x, wall_derivatives::exact);
    if (!result.converged) return false;
    const auto temperatures = component_temperatures(shifted, result.x);
    for (auto& one : components) {
      for (const auto& t : temperatures) {
        if (t.board != one.board || t.number != one.number) continue;
        one.lowest_K = (std::min)(one.lowest_K, t.hottest_K);
        one.highest_K = (std::max)(one.highest_K, t.hottest_K);
      }
    }
  }
  return true;
}

}  // namespace chassis
