// What the solved unknowns mean: temperatures of components, patches of wall, the energy balance.
#pragma once

#include <Eigen/Core>
#include <optional>
#include <string>
#include <vector>

#include "model/equations.hpp"

namespace chassis {

struct component_result {
  std::size_t board = 0;
  std::size_t number = 0;
  double face_K = 0;     // mean of the face under it
  double hottest_K = 0;  // face plus power times its own resistance
  double lowest_K = 0;   // uncertainty band of hottest_K
  double highest_K = 0;
};

/// A third of a board face, or an outer wall.
struct patch_result {
  std::string where;
  film_words words;   // at the mean state of the patch
  double h = 0;       // mean over the area
  double flux = 0;    // convected, mean over the area, W/m2
  double heat_W = 0;  // convected
  double radiated_W = 0;
  double wall_K = 0;
  double stream_K = 0;
  double area = 0;
  double area_outside = 0;  // where some envelope is left
  std::optional<double> scatter;
};

struct passage_result {
  double flow_kg_s = 0;
  double velocity_m_s = 0;  // at inlet density
  double out_K = 0;
  double friction_Pa = 0;
  film_words words;
};

struct energy_balance {
  double in_W = 0;        // power of all components
  double by_air_W = 0;    // carried out through the vents
  double by_walls_W = 0;  // convected and radiated by the outer walls
  double mismatch() const { return by_air_W + by_walls_W - in_W; }
};

struct solution {
  std::vector<component_result> components;  // hottest first
  std::vector<patch_result> patches;
  std::vector<passage_result> passages;
  energy_balance energy;
  double plenum_K = 0;
  double stack_pressure_Pa = 0;
  std::size_t films_without_stated_scatter = 0;
};

solution read_off(const equations& system, const Eigen::VectorXd& x);

/// Temperature of every component, in the order of the case.
std::vector<component_result> component_temperatures(const equations& system,
                                                     const Eigen::VectorXd& x);

}  // namespace chassis
