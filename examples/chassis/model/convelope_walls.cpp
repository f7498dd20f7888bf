#include "model/convelope_walls.hpp"

#include <array>
#include <cmath>
#include <convelope/estimate/explain.hpp>
#include <convelope/fluids/dry_air.hpp>
#include <convelope/scales/section.hpp>
#include <convelope/surfaces/horizontal_plate.hpp>
#include <convelope/surfaces/vertical_plate.hpp>
#include <cstddef>

#include "model/constants.hpp"

namespace chassis {
namespace {

namespace cv = convelope;
namespace kinds = convelope::kinds;

constexpr cv::dry_air air;

// A state with derivatives for wall temperature, stream temperature and mass flux.
using number = cv::dual<double, 3>;

template <class Kind, class T>
cv::typed<Kind, T> as(const T& si) {
  return cv::typed<Kind, T>::from_si(si);
}

film film_from(const cv::film<number>& f) {
  const auto& h = f.coefficient;
  const cv::verdict<> verdict(f.bits);
  film result;
  result.h = h.value;
  result.dh_dwall = h.slope[0];
  result.dh_dstream = h.slope[1];
  result.dh_dmass_flux = h.slope[2];
  result.inside = verdict.inside();
  if (verdict.scatter_stated()) result.scatter = std::sqrt(f.variance);
  return result;
}

// Which correlations contribute, and what the verdict has to say of each and of the air.
template <class Geometry>
void tell(film_words& words, const cv::film<number>& f) {
  constexpr double least_share = 1e-3;
  const cv::verdict<> verdict(f.bits);
  words.inside = verdict.inside();
  const auto add = [&words](const std::string& sentence) {
    if (!sentence.empty()) words.sentence += (words.sentence.empty() ? "" : " ") + sentence;
  };
  std::string ranges;
  for (int i = 0; i < Geometry::speaks.count; ++i) {
    const auto& c = *Geometry::speaks.correlation[i];
    if (f.share[i] <= least_share) continue;
    const long per_cent = std::lround(100 * f.share[i]);
    words.correlation += (words.correlation.empty() ? "" : " + ") + std::string(c.id);
    if (per_cent < 100) words.correlation += " (" + std::to_string(per_cent) + " %)";
    add(cv::explain(verdict, c, i));
  }
  add(cv::explain(verdict, *air.info()));
  if (words.inside) add("Inside every range that the sources state.");
  if (!verdict.scatter_stated()) add("A source states no scatter.");
}

cv::film<number> channel_film(const passage_spot& at) {
  const auto wall = number::variable(at.wall_K, 0);
  const auto stream = number::variable(at.stream_K, 1);
  const auto flux = number::variable(at.mass_flux, 2);
  const number pressure(at.pressure_Pa);
  const auto density = air.values(stream, pressure).density;
  const cv::duct_flow<number> flow{as<kinds::mean_velocity>(number(flux / density)),
                                   as<kinds::bulk_temperature>(stream),
                                   as<kinds::pressure>(pressure)};
  const cv::plate_channel_segment channel{as<kinds::gap>(at.gap),
                                          as<kinds::distance_from_inlet>(at.begin),
                                          as<kinds::distance_from_inlet>(at.end)};
  return channel.film_at(air, flow, wall);
}

cv::stream<number> outer_air(const outer_spot& at) {
  return {as<kinds::free_stream_velocity>(number(at.air_speed)),
          as<kinds::free_stream_temperature>(number::variable(at.air_K, 1)),
          as<kinds::pressure>(number(at.pressure_Pa))};
}

// The outer air passes a sideways wall horizontally, along its length.
cv::vertical_wall upright(const outer_spot& at) {
  cv::vertical_wall wall{as<kinds::height>(at.height)};
  wall.direction = cv::stream_direction::horizontal;
  wall.length = as<kinds::plate_length>(at.length);
  return wall;
}

cv::horizontal_wall lying(const outer_spot& at) {
  const double perimeter = 2 * (at.length + at.height);
  cv::horizontal_wall wall{as<kinds::area_over_perimeter>(at.length * at.height / perimeter),
                           as<kinds::plate_length>(at.length)};
  wall.face = at.faces == facing::up ? cv::facing::up : cv::facing::down;
  return wall;
}

cv::film<number> outer(const outer_spot& at) {
  const auto wall = number::variable(at.wall_K, 0);
  if (at.faces == facing::sideways) return upright(at).film_at(air, outer_air(at), wall);
  return lying(at).film_at(air, outer_air(at), wall);
}

// Of the passages the library takes 2300 and 4000 as the ends of transition.
std::string duct_regime(double reynolds) {
  if (reynolds <= 2300) return "laminar";
  return reynolds < 4000 ? "transition" : "turbulent";
}

}  // namespace

film convelope_walls::passage_film(const passage_spot& at) const {
  return film_from(channel_film(at));
}

film_words convelope_walls::passage_words(const passage_spot& at) const {
  const auto f = channel_film(at);
  const auto v = air.values(at.stream_K, at.pressure_Pa);
  const double diameter = 2 * at.gap;
  const double reynolds = at.mass_flux * diameter / v.viscosity;
  film_words words;
  words.regime = duct_regime(reynolds) + " channel";
  words.groups = {{"Re", reynolds},
                  {"Pr", v.prandtl()},
                  {"x/Dh", at.end / diameter},
                  {"Nu", f.coefficient.value * diameter / v.conductivity},
                  {"T_wall/T_air", at.wall_K / at.stream_K}};
  tell<cv::plate_channel_segment>(words, f);
  return words;
}

film convelope_walls::outer_film(const outer_spot& at) const { return film_from(outer(at)); }

film_words convelope_walls::outer_words(const outer_spot& at) const {
  const auto f = outer(at);
  const bool sideways = at.faces == facing::sideways;
  const auto v = air.values(0.5 * (at.wall_K + at.air_K), at.pressure_Pa);
  const double scale = sideways ? at.height : at.length * at.height / (2 * (at.length + at.height));
  const double along = at.length;
  const double grashof_by_dT = standard_gravity * v.density * v.density * scale * scale * scale /
                               (at.air_K * v.viscosity * v.viscosity);
  film_words words;
  const double forced = f.share[2] + f.share[3];
  words.regime = forced > 0.9 ? "forced" : forced > 0.1 ? "mixed" : "natural";
  words.regime += sideways ? ", upright wall" : ", lying wall";
  words.groups = {{"Ra", grashof_by_dT * std::abs(at.wall_K - at.air_K) * v.prandtl()},
                  {"Re", v.density * at.air_speed * along / v.viscosity},
                  {"Pr", v.prandtl()},
                  {"Nu", f.coefficient.value * scale / v.conductivity}};
  if (sideways) {
    tell<cv::vertical_wall>(words, f);
  } else {
    tell<cv::horizontal_wall>(words, f);
  }
  return words;
}

friction_loss convelope_walls::passage_friction(const passage_run& run) const {
  // Directions: 0 mean temperature, 1 mass flux.
  using two = cv::dual<double, 2>;
  const auto temperature = two::variable(run.mean_K, 0);
  const auto flux = two::variable(run.mass_flux, 1);
  const auto v = air.values(temperature, two(run.pressure_Pa));
  const double diameter = 2 * run.gap;
  const auto reynolds = two(flux * diameter / v.viscosity);
  const auto darcy = cv::flat_section::darcy(reynolds);
  const auto loss = two(darcy * flux * flux / v.density * (0.5 * run.length / diameter));
  return {loss.value, loss.slope[1], loss.slope[0], true, std::nullopt};
}

film_words convelope_walls::friction_words(const passage_run& run) const {
  const auto v = air.values(run.mean_K, run.pressure_Pa);
  const double reynolds = run.mass_flux * 2 * run.gap / v.viscosity;
  film_words words;
  words.regime = duct_regime(reynolds);
  words.correlation = "96/Re" + std::string(reynolds > 2300 ? " + friction/konakov-1946" : "");
  words.groups = {{"Re", reynolds}, {"L/Dh", run.length / (2 * run.gap)}};
  words.sentence = "Developed friction.";
  return words;
}

sensitive convelope_walls::density(double air_K, double pressure_Pa) const {
  using one = cv::dual<double>;
  const auto rho = air.values(one::variable(air_K), one(pressure_Pa)).density;
  return {rho.value, rho.slope[0]};
}

double convelope_walls::specific_heat(double air_K, double pressure_Pa) const {
  return air.values(air_K, pressure_Pa).specific_heat;
}

}  // namespace chassis
