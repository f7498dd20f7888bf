#include "report/json_report.hpp"

#include "model/constants.hpp"
#include "report/text_report.hpp"

namespace chassis {
namespace {

using json = nlohmann::ordered_json;

double celsius_of(double kelvin) { return kelvin - zero_celsius_K; }

json scatter_json(const std::optional<double>& scatter) {
  return scatter ? json(*scatter) : json(nullptr);
}

json words_json(const film_words& words) {
  json groups = json::object();
  for (const auto& g : words.groups) groups[g.symbol] = g.value;
  return {{"regime", words.regime},
          {"correlation", words.correlation},
          {"groups", groups},
          {"inside", words.inside},
          {"sentence", words.sentence}};
}

json patch_json(const patch_result& p) {
  json one = {{"patch", p.where}};
  one.update(words_json(p.words));
  one["inside"] = !(p.area_outside > 0);
  one["outside_area_fraction"] = p.area_outside / p.area;
  one["film_coefficient_W_m2K"] = p.h;
  one["heat_flux_W_m2"] = p.flux;
  one["convected_W"] = p.heat_W;
  one["radiated_W"] = p.radiated_W;
  one["wall_temperature_C"] = celsius_of(p.wall_K);
  one["air_temperature_C"] = celsius_of(p.stream_K);
  one["area_m2"] = p.area;
  one["scatter"] = scatter_json(p.scatter);
  return one;
}

json component_json(const chassis_case& c, const component_result& r) {
  const auto& part = c.boards[r.board].components[r.number];
  json one = {{"component", part.name},
              {"board", c.boards[r.board].name},
              {"power_W", part.power_W},
              {"face_temperature_C", celsius_of(r.face_K)},
              {"temperature_C", celsius_of(r.hottest_K)},
              {"lowest_C", celsius_of(r.lowest_K)},
              {"highest_C", celsius_of(r.highest_K)}};
  one["limit_C"] = part.limit_K ? json(celsius_of(*part.limit_K)) : json(nullptr);
  return one;
}

}  // namespace

nlohmann::ordered_json json_report(const chassis_case& c, const solution& s,
                                   const newton_result& run) {
  json report = {{"case", c.name},
                 {"iterations", run.iterations},
                 {"residual", run.residual},
                 {"plenum_temperature_C", celsius_of(s.plenum_K)},
                 {"stack_pressure_Pa", s.stack_pressure_Pa}};
  report["energy"] = {{"in_W", s.energy.in_W},
                      {"out_with_air_W", s.energy.by_air_W},
                      {"out_through_walls_W", s.energy.by_walls_W},
                      {"out_minus_in_W", s.energy.mismatch()}};
  report["components"] = json::array();
  for (const auto& one : s.components) report["components"].push_back(component_json(c, one));
  report["pieces_without_stated_scatter"] = s.films_without_stated_scatter;
  report["scatter_where_not_stated"] = c.scatter_where_not_stated;
  report["patches"] = json::array();
  for (const auto& p : s.patches) report["patches"].push_back(patch_json(p));
  report["passages"] = json::array();
  for (std::size_t p = 0; p < s.passages.size(); ++p) {
    const auto& one = s.passages[p];
    report["passages"].push_back({{"passage", c.passages[p].name},
                                  {"flow_kg_s", one.flow_kg_s},
                                  {"velocity_m_s", one.velocity_m_s},
                                  {"out_temperature_C", celsius_of(one.out_K)},
                                  {"friction_Pa", one.friction_Pa},
                                  {"friction", words_json(one.words)}});
  }
  report["cautions"] = cautions();
  return report;
}

}  // namespace chassis
