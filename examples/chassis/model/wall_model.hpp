// All that the chassis asks about air and walls. The solver below this line knows no correlation:
// convelope_walls.hpp answers these questions from the library.
#pragma once

#include <optional>
#include <string>
#include <vector>

#include "case/case.hpp"

namespace chassis {

/// A value and its derivative.
struct sensitive {
  double value = 0;
  double slope = 0;
};

/// Film coefficient of one piece of wall and how it moves with the state. The heat flux from the
/// wall is q = h (T_wall - T_stream) with T_stream the mixed (bulk) or far temperature, so h must
/// be finite, with finite derivatives, also at T_wall = T_stream and at zero flow.
struct film {
  double h = 0;                   // W/(m2 K)
  double dh_dwall = 0;            // per kelvin of wall temperature
  double dh_dstream = 0;          // per kelvin of stream temperature
  double dh_dmass_flux = 0;       // per kg/(m2 s)
  bool inside = true;             // every correlation and the fluid inside their envelopes
  std::optional<double> scatter;  // relative band the source states

  double flux(double wall_K, double stream_K) const { return h * (wall_K - stream_K); }
};

struct group_value {
  std::string symbol;
  double value = 0;
};

/// The same evaluation told to a person.
struct film_words {
  std::string regime;
  std::string correlation;  // one id, or several joined with " + "
  std::vector<group_value> groups;
  bool inside = true;
  std::string sentence;  // why it is inside or outside
};

/// A piece of a passage wall, from `begin` to `end` metres behind the inlet.
struct passage_spot {
  double gap = 0;
  double width = 0;
  double begin = 0;
  double end = 0;
  double mass_flux = 0;  // kg/(m2 s), not negative
  double wall_K = 0;
  double stream_K = 0;
  double pressure_Pa = 0;
};

/// An outer wall in the air around the enclosure.
struct outer_spot {
  facing faces = facing::sideways;
  double length = 0;  // along the outer air
  double height = 0;
  double air_speed = 0;
  double wall_K = 0;
  double air_K = 0;
  double pressure_Pa = 0;
};

/// A whole passage for its friction loss.
struct passage_run {
  double gap = 0;
  double width = 0;
  double length = 0;
  double mass_flux = 0;
  double mean_K = 0;
  double pressure_Pa = 0;
};

struct friction_loss {
  double pressure_Pa = 0;
  double per_mass_flux = 0;
  double per_kelvin = 0;  // of the mean air temperature
  bool inside = true;
  std::optional<double> scatter;
};

class wall_model {
 public:
  wall_model() = default;
  wall_model(const wall_model&) = delete;
  wall_model& operator=(const wall_model&) = delete;
  virtual ~wall_model() = default;

  virtual film passage_film(const passage_spot&) const = 0;
  virtual film_words passage_words(const passage_spot&) const = 0;
  virtual film outer_film(const outer_spot&) const = 0;
  virtual film_words outer_words(const outer_spot&) const = 0;
  virtual friction_loss passage_friction(const passage_run&) const = 0;
  virtual film_words friction_words(const passage_run&) const = 0;

  virtual sensitive density(double air_K, double pressure_Pa) const = 0;
  virtual double specific_heat(double air_K, double pressure_Pa) const = 0;
};

}  // namespace chassis
