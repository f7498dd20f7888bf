#include "case/read_components.hpp"

#include <algorithm>
#include <cctype>
#include <cerrno>
#include <cstdlib>

#include "case/csv_text.hpp"
#include "case/object_reader.hpp"
#include "model/constants.hpp"

namespace chassis {
namespace {

constexpr double mm = 1e-3;

component read_component(const nlohmann::json& value, const std::string& path) {
  const object_reader in(value, path,
                         {"name", "side", "x_mm", "y_mm", "length_mm", "width_mm", "power_W",
                          "to_board_K_W", "limit_C"});
  component part;
  part.name = in.text("name");
  if (in.has("side")) {
    part.side = in.choice<face>("side", {{"front", face::front}, {"back", face::back}});
  }
  part.at.x = mm * in.number("x_mm", not_negative());
  part.at.y = mm * in.number("y_mm", not_negative());
  part.at.length = mm * in.number("length_mm", positive());
  part.at.width = mm * in.number("width_mm", positive());
  part.power_W = in.number("power_W", not_negative());
  part.to_board_K_W = in.number("to_board_K_W", not_negative(), 0);
  if (in.has("limit_C")) {
    part.limit_K = zero_celsius_K + in.number("limit_C", between(-60, 400, "degrees Celsius"));
  }
  return part;
}

bool is_text_column(const std::string& column) { return column == "name" || column == "side"; }

std::string trimmed(const std::string& text) {
  const auto blank = [](char c) { return std::isspace(static_cast<unsigned char>(c)) != 0; };
  const auto from = std::find_if_not(text.begin(), text.end(), blank);
  const auto to = std::find_if_not(text.rbegin(), text.rend(), blank).base();
  return from < to ? std::string(from, to) : "";
}

double number_in(const std::string& text, const std::string& path) {
  char* end = nullptr;
  errno = 0;
  const double value = std::strtod(text.c_str(), &end);
  const bool decimal = text.find_first_not_of("0123456789+-.eE") == std::string::npos;
  if (!decimal || end != text.c_str() + text.size() || errno == ERANGE) {
    throw case_error(path, "\"" + text + "\" is not a number; expected a number such as 2.5");
  }
  return value;
}

std::string mm_text(double metres) { return plain(metres / mm) + " mm"; }

}  // namespace

std::vector<placed_component> components_from_json(const nlohmann::json& list,
                                                   const std::string& path) {
  std::vector<placed_component> parts;
  for (std::size_t i = 0; i < list.size(); ++i) {
    const std::string at = joined(path, std::to_string(i));
    parts.push_back({read_component(list[i], at), at});
  }
  return parts;
}

std::vector<placed_component> components_from_csv(const std::string& text, const std::string& file,
                                                  const std::string& path) {
  const auto place = [&](std::size_t line) {
    return path + " (" + file + ", line " + std::to_string(line) + ")";
  };
  const auto rows = csv_rows(text, path + " (" + file + ")");
  if (rows.empty()) throw case_error(place(1), "the file is empty; expected a header line");
  std::vector<std::string> columns;
  for (const auto& name : rows.front().fields) {
    const auto column = trimmed(name);
    if (std::find(columns.begin(), columns.end(), column) != columns.end()) {
      throw case_error(place(rows.front().line),
                       "column " + column + " stands twice; expected it once");
    }
    columns.push_back(column);
  }

  std::vector<placed_component> parts;
  for (std::size_t r = 1; r < rows.size(); ++r) {
    const auto& row = rows[r];
    const std::string at = place(row.line);
    if (row.fields.size() != columns.size()) {
      throw case_error(at, std::to_string(row.fields.size()) + " fields; expected " +
                               std::to_string(columns.size()) + " as in the header");
    }
    nlohmann::json value = nlohmann::json::object();
    for (std::size_t c = 0; c < columns.size(); ++c) {
      const auto field = trimmed(row.fields[c]);
      if (field.empty()) continue;  // as if the key were missing
      if (is_text_column(columns[c])) {
        value[columns[c]] = field;
      } else {
        value[columns[c]] = number_in(field, joined(at, columns[c]));
      }
    }
    parts.push_back({read_component(value, at), at});
  }
  return parts;
}

void check_placement(const std::vector<placed_component>& parts, double board_length,
                     double board_width) {
  constexpr double touch = 1e-9;  // edges may meet
  for (std::size_t i = 0; i < parts.size(); ++i) {
    const auto& a = parts[i].part;
    const auto off_board = [&](const char* words, double end, double limit) {
      throw case_error(parts[i].path, "component \"" + a.name + "\" ends at " + words + " " +
                                          mm_text(end) +
                                          ", off the board; expected <= " + mm_text(limit));
    };
    if (a.at.x + a.at.length > board_length + touch) {
      off_board("x =", a.at.x + a.at.length, board_length);
    }
    if (a.at.y + a.at.width > board_width + touch) {
      off_board("y =", a.at.y + a.at.width, board_width);
    }
    for (std::size_t j = 0; j < i; ++j) {
      const auto& b = parts[j].part;
      if (a.name == b.name) {
        throw case_error(joined(parts[i].path, "name"),
                         "\"" + a.name + "\" is also the name of " + parts[j].path +
                             "; expected a name of its own on this board");
      }
      const bool apart = a.side != b.side || a.at.x + a.at.length <= b.at.x + touch ||
                         b.at.x + b.at.length <= a.at.x + touch ||
                         a.at.y + a.at.width <= b.at.y + touch ||
                         b.at.y + b.at.width <= a.at.y + touch;
      if (!apart) {
        throw case_error(parts[i].path, "component \"" + a.name + "\" overlaps \"" + b.name +
                                            "\" (" + parts[j].path +
                                            "); expected components apart on each face");
      }
    }
  }
}

}  // namespace chassis
