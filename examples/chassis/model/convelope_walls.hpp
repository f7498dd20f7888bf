// The wall model answered by Convelope: dry air in flat channels between boards, and vertical or
// horizontal outer walls in still or moving air.
#pragma once

#include "model/wall_model.hpp"

namespace chassis {

class convelope_walls final : public wall_model {
 public:
  film passage_film(const passage_spot& at) const override;
  film_words passage_words(const passage_spot& at) const override;
  film outer_film(const outer_spot& at) const override;
  film_words outer_words(const outer_spot& at) const override;
  friction_loss passage_friction(const passage_run& run) const override;
  film_words friction_words(const passage_run& run) const override;

  sensitive density(double air_K, double pressure_Pa) const override;
  double specific_heat(double air_K, double pressure_Pa) const override;
};

}  // namespace chassis
