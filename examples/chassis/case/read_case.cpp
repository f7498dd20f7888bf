#include "case/read_case.hpp"

#include <filesystem>
#include <fstream>
#include <iterator>
#include <optional>

#include "case/json_text.hpp"
#include "case/object_reader.hpp"
#include "case/read_components.hpp"
#include "model/constants.hpp"

namespace chassis {
namespace {

constexpr double mm = 1e-3;
constexpr double mm2 = 1e-6;
constexpr double m3_h = 1.0 / 3600.0;

std::optional<std::string> file_text(const std::string& file) {
  std::error_code ignored;
  if (std::filesystem::is_directory(file, ignored)) return std::nullopt;
  std::ifstream in(file, std::ios::binary);
  if (!in) return std::nullopt;
  return std::string(std::istreambuf_iterator<char>(in), {});
}

ambient read_ambient(const nlohmann::json& value, const std::string& path) {
  const object_reader in(value, path, {"temperature_C", "pressure_Pa", "outer_air_speed_m_s"});
  const double celsius = in.number("temperature_C", accepted_range{});
  if (celsius < -zero_celsius_K) {
    throw case_error(in.path_of("temperature_C"),
                     plain(celsius) +
                         " is below absolute zero; expected -60 to 100 "
                         "(degrees Celsius)");
  }
  ambient air;
  air.temperature_K = zero_celsius_K + between(-60, 100, "degrees Celsius, not kelvin")
                                           .checked(celsius, in.path_of("temperature_C"));
  air.pressure_Pa = in.number("pressure_Pa", between(1e4, 2e5, "pascal, not bar"));
  air.outer_air_speed_m_s = in.number("outer_air_speed_m_s", between(0, 50));
  return air;
}

enclosure read_enclosure(const nlohmann::json& value, const std::string& path) {
  const object_reader in(value, path,
                         {"flow_direction", "length_mm", "width_mm", "plenum_height_mm",
                          "vent_area_mm2", "vent_loss"});
  enclosure box;
  box.direction = in.choice<flow_direction>(
      "flow_direction",
      {{"horizontal", flow_direction::horizontal}, {"upward", flow_direction::upward}});
  const auto size = between(5, 5000, "millimetres, not metres");
  box.length = mm * in.number("length_mm", size);
  box.width = mm * in.number("width_mm", size);
  box.plenum_height = mm * in.number("plenum_height_mm", between(0, 5000), 0);
  box.vent_area = mm2 * in.number("vent_area_mm2", positive());
  box.vent_loss = in.number("vent_loss", not_negative());
  return box;
}

fan read_fan(const nlohmann::json& value, const std::string& path) {
  const object_reader in(value, path, {"count", "points"});
  fan result;
  result.count =
      in.has("count") ? static_cast<double>(in.whole_number("count", between(1, 100))) : 1.0;
  const auto& points = in.list("points", 2);
  for (std::size_t i = 0; i < points.size(); ++i) {
    const std::string at = joined(in.path_of("points"), std::to_string(i));
    const object_reader point(points[i], at, {"flow_m3_h", "pressure_Pa"});
    const fan_point next{m3_h * point.number("flow_m3_h", not_negative()),
                         point.number("pressure_Pa", not_negative())};
    if (i == 0 && next.flow_m3_s > 0) {
      throw case_error(point.path_of("flow_m3_h"), plain(next.flow_m3_s / m3_h) +
                                                       " starts the curve; expected 0, the "
                                                       "pressure at no flow");
    }
    if (i > 0 && !(next.flow_m3_s > result.points.back().flow_m3_s)) {
      throw case_error(point.path_of("flow_m3_h"),
                       plain(next.flow_m3_s / m3_h) + " does not grow; expected > " +
                           plain(result.points.back().flow_m3_s / m3_h));
    }
    if (i > 0 && !(next.pressure_Pa < result.points.back().pressure_Pa)) {
      throw case_error(point.path_of("pressure_Pa"), plain(next.pressure_Pa) +
                                                         " does not fall; expected < " +
                                                         plain(result.points.back().pressure_Pa));
    }
    result.points.push_back(next);
  }
  return result;
}

passage read_passage(const nlohmann::json& value, const std::string& path) {
  const object_reader in(value, path, {"name", "gap_mm", "inlet_loss", "outlet_loss"});
  passage result;
  result.name = in.text("name");
  result.gap = mm * in.number("gap_mm", between(0.5, 500, "millimetres, not metres"));
  result.inlet_loss = in.number("inlet_loss", not_negative(), 0.5);
  result.outlet_loss = in.number("outlet_loss", not_negative(), 1.0);
  return result;
}

layer read_layer(const nlohmann::json& value, const std::string& path) {
  const object_reader in(
      value, path,
      {"name", "thickness_mm", "conductivity_W_mK", "coverage", "fill_conductivity_W_mK"});
  layer result;
  result.name = in.text("name");
  result.thickness = mm * in.number("thickness_mm", between(0.001, 20, "millimetres"));
  const auto conductivity = between(0.01, 5000, "W/(m K)");
  result.conductivity = in.number("conductivity_W_mK", conductivity);
  result.coverage = in.number("coverage", between(0, 1, "a fraction, not per cent"), 1.0);
  result.fill_conductivity =
      result.coverage < 1 ? in.number("fill_conductivity_W_mK", conductivity) : result.conductivity;
  return result;
}

board read_board(const nlohmann::json& value, const std::string& path, const enclosure& box,
                 const std::string& folder) {
  const object_reader in(
      value, path,
      {"name", "length_mm", "width_mm", "mesh", "layers", "components", "components_csv"});
  board result;
  result.name = in.text("name");
  result.length =
      mm * in.number("length_mm", between(5, box.length / mm, "within /enclosure/length_mm"));
  result.width =
      mm * in.number("width_mm", between(5, box.width / mm, "within /enclosure/width_mm"));

  const object_reader mesh(in.object("mesh"), in.path_of("mesh"), {"along", "across"});
  result.cells_along = mesh.whole_number("along", between(2, 400, "cells"));
  result.cells_across = mesh.whole_number("across", between(2, 400, "cells"));

  const auto& layers = in.list("layers", 1);
  for (std::size_t i = 0; i < layers.size(); ++i) {
    result.layers.push_back(read_layer(layers[i], joined(in.path_of("layers"), std::to_string(i))));
  }

  std::vector<placed_component> parts;
  if (in.has("components")) {
    parts = components_from_json(in.list("components", 0), in.path_of("components"));
  }
  if (in.has("components_csv")) {
    const std::string at = in.path_of("components_csv");
    const std::string name = in.text("components_csv");
    const auto text = file_text((std::filesystem::path(folder) / name).string());
    if (!text) {
      throw case_error(at, "\"" + name + "\" cannot be read; expected a CSV file beside the case");
    }
    const auto more = components_from_csv(*text, name, at);
    parts.insert(parts.end(), more.begin(), more.end());
  }
  if (!in.has("components") && !in.has("components_csv")) {
    throw case_error(in.path_of("components"),
                     "missing; expected a list, or a file named in components_csv");
  }
  check_placement(parts, result.length, result.width);
  for (const auto& part : parts) result.components.push_back(part.part);
  return result;
}

outer_wall read_outer_wall(const nlohmann::json& value, const std::string& path) {
  const object_reader in(
      value, path, {"name", "faces", "length_mm", "height_mm", "emissivity", "inside_film_W_m2K"});
  outer_wall result;
  result.name = in.text("name");
  result.faces = in.choice<facing>(
      "faces", {{"sideways", facing::sideways}, {"up", facing::up}, {"down", facing::down}});
  const auto size = between(5, 5000, "millimetres, not metres");
  result.length = mm * in.number("length_mm", size);
  result.height = mm * in.number("height_mm", size);
  result.emissivity = in.number("emissivity", between(0, 1, "a fraction"));
  result.inside_film_W_m2K = in.number("inside_film_W_m2K", positive());
  return result;
}

solver_settings read_solver(const nlohmann::json& value, const std::string& path) {
  const object_reader in(value, path, {"tolerance", "max_iterations"});
  solver_settings settings;
  settings.tolerance = in.number("tolerance", between(1e-12, 1e-3), settings.tolerance);
  if (in.has("max_iterations")) {
    settings.max_iterations = static_cast<int>(in.whole_number("max_iterations", between(1, 1000)));
  }
  return settings;
}

void check_air_moves(const chassis_case& result) {
  if (result.fan) return;
  if (result.enclosure.direction != flow_direction::upward) {
    throw case_error("/fan",
                     "missing, and horizontal passages have no buoyancy to move the air; expected "
                     "a fan curve, or /enclosure/flow_direction \"upward\"");
  }
  double power_W = 0;
  for (const auto& b : result.boards) {
    for (const auto& part : b.components) power_W += part.power_W;
  }
  if (!(power_W > 0)) {
    throw case_error("/boards",
                     "all power is 0 W and there is no fan, so no air moves; expected "
                     "some power_W > 0 or a fan");
  }
}

}  // namespace

chassis_case read_case_text(const std::string& text, const std::string& file,
                            const std::string& folder) {
  const auto root = parsed_json(text, file);
  const object_reader in(root, "",
                         {"name", "ambient", "enclosure", "fan", "passages", "boards",
                          "outer_walls", "solver", "uncertainty"});
  chassis_case result;
  result.name = in.text("name");
  result.ambient = read_ambient(in.object("ambient"), "/ambient");
  result.enclosure = read_enclosure(in.object("enclosure"), "/enclosure");
  if (in.has("fan")) result.fan = read_fan(in.object("fan"), "/fan");

  const auto& boards = in.list("boards", 1);
  for (std::size_t i = 0; i < boards.size(); ++i) {
    result.boards.push_back(
        read_board(boards[i], joined("/boards", std::to_string(i)), result.enclosure, folder));
    for (std::size_t j = 0; j < i; ++j) {
      if (result.boards[j].name == result.boards[i].name) {
        throw case_error("/boards/" + std::to_string(i) + "/name",
                         "\"" + result.boards[i].name + "\" is also the name of /boards/" +
                             std::to_string(j) + "; expected a name of its own");
      }
    }
  }
  const auto& passages = in.list("passages", 2);
  for (std::size_t i = 0; i < passages.size(); ++i) {
    result.passages.push_back(read_passage(passages[i], joined("/passages", std::to_string(i))));
  }
  if (result.passages.size() != result.boards.size() + 1) {
    throw case_error("/passages", std::to_string(result.passages.size()) + " passages for " +
                                      std::to_string(result.boards.size()) + " boards; expected " +
                                      std::to_string(result.boards.size() + 1) +
                                      ", one behind, between and in front of the boards");
  }
  const auto& walls = in.list("outer_walls", 0);
  for (std::size_t i = 0; i < walls.size(); ++i) {
    result.outer_walls.push_back(
        read_outer_wall(walls[i], joined("/outer_walls", std::to_string(i))));
  }
  if (in.has("uncertainty")) {
    const object_reader more(in.object("uncertainty"), "/uncertainty",
                             {"scatter_where_not_stated"});
    result.scatter_where_not_stated =
        more.number("scatter_where_not_stated", between(0, 0.9, "a fraction, not per cent"));
  }
  if (in.has("solver")) result.solver = read_solver(in.object("solver"), "/solver");
  check_air_moves(result);
  return result;
}

chassis_case read_case_file(const std::string& file) {
  const auto text = file_text(file);
  if (!text) throw case_error(file, "cannot be read; expected a case file (JSON)");
  const auto folder = std::filesystem::path(file).parent_path().string();
  return read_case_text(*text, file, folder.empty() ? "." : folder);
}

}  // namespace chassis
