#include "report/svg_map.hpp"

#include <algorithm>
#include <cmath>
#include <sstream>
#include <vector>

#include "report/fixed.hpp"
#include "report/names.hpp"

namespace chassis {
namespace {

constexpr double margin = 24;
constexpr double map_width = 620;
constexpr double list_left = margin + map_width + 130;
constexpr double picture_width = list_left + 290;
constexpr double title_height = 84;
constexpr double flow_height = 34;
constexpr std::size_t most_listed = 22;
constexpr double least_letter = 7.5;

std::string at(double value) { return fixed(value, 2); }

std::string box(double x, double y, double w, double h) {
  return "<rect x=\"" + at(x) + "\" y=\"" + at(y) + "\" width=\"" + at(w) + "\" height=\"" + at(h) +
         "\"";
}

std::string words(double x, double y, double size, const std::string& text,
                  const std::string& more = "") {
  return "<text x=\"" + at(x) + "\" y=\"" + at(y) + "\" font-size=\"" + fixed(size, 1) + "\" " +
         more + ">" + xml_text(text) + "</text>\n";
}

struct drawing {
  const equations& system;
  const Eigen::VectorXd& x;
  const solution& s;
  std::size_t number;
  const colour_scale& scale;

  const board& of() const { return system.of().boards[number]; }
  double per_metre() const { return map_width / of().length; }

  double face_K(std::size_t cell, face side) const {
    return x[system.places().face_of(number, cell, side)];
  }

  // Neighbouring cells of one colour in a row share a rectangle; a hair of overlap hides seams.
  void cells(std::ostream& out, face side, double left, double top) const {
    const auto& mesh = system.places().boards[number].mesh;
    const double w = mesh.dx * per_metre();
    const double h = mesh.dy * per_metre();
    out << "<g shape-rendering=\"crispEdges\">\n";
    for (std::size_t j = 0; j < mesh.across; ++j) {
      std::size_t from = 0;
      for (std::size_t i = 1; i <= mesh.along; ++i) {
        const auto colour = scale.colour(face_K(mesh.cell(from, j), side));
        if (i < mesh.along && scale.colour(face_K(mesh.cell(i, j), side)) == colour) continue;
        out << box(left + static_cast<double>(from) * w, top + static_cast<double>(j) * h,
                   static_cast<double>(i - from) * w + 0.3, h + 0.3)
            << " fill=\"" << colour << "\"/>\n";
        from = i;
      }
    }
    out << "</g>\n";
  }

  // The full name and the temperature if they fit, else the first word, else that above the box.
  static void label(std::ostream& out, const std::string& name, const std::string& temperature,
                    double px, double py, double pw, double ph, const std::string& look) {
    const std::string bold = look + " font-weight=\"bold\"";
    const double cx = px + 0.5 * pw;
    const double cy = py + 0.5 * ph;
    for (const auto& text : {name, name.substr(0, name.find(' '))}) {
      const double letters = static_cast<double>(text.size());
      const double size = (std::min)({13.0, 0.9 * ph, 0.94 * pw / (0.7 * letters)});
      if (size < least_letter) continue;
      if (ph > 2.3 * size) {
        out << words(cx, cy - 0.1 * size, size, text, bold)
            << words(cx, cy + size, 0.9 * size, temperature, look);
      } else {
        out << words(cx, cy + 0.35 * size, size, text, bold);
      }
      return;
    }
    out << words(cx, py - 3, 9, name.substr(0, name.find(' ')), bold);
  }

  void component_outlines(std::ostream& out, face side, double left, double top) const {
    for (const auto& r : s.components) {
      if (r.board != number) continue;
      const auto& part = of().components[r.number];
      if (part.side != side) continue;
      const double px = left + part.at.x * per_metre();
      const double py = top + part.at.y * per_metre();
      const double pw = part.at.length * per_metre();
      const double ph = part.at.width * per_metre();
      const bool dark = scale.is_dark(r.face_K);
      const std::string ink = dark ? "#ffffff" : "#000000";
      const bool hot = part.limit_K && r.highest_K > *part.limit_K;
      out << "<g><title>"
          << xml_text(part.name + ", " + fixed(part.power_W, 2) + " W, " + celsius(r.hottest_K) +
                      " degC")
          << "</title>" << box(px, py, pw, ph) << " fill=\"none\" stroke=\"" << ink
          << "\" stroke-width=\"" << (hot ? "3" : "1.2") << "\"/>\n";
      const std::string look = "text-anchor=\"middle\" fill=\"" + ink + "\"";
      label(out, part.name, celsius(r.hottest_K, 0), px, py, pw, ph, look);
      out << "</g>\n";
    }
  }

  void flow_arrow(std::ostream& out, double left, double y) const {
    const std::string middle = at(y - 4);
    const double end = left + map_width;
    out << "<g stroke=\"#1f5fa8\" fill=\"#1f5fa8\">\n";
    const std::string label = system.of().enclosure.direction == flow_direction::upward
                                  ? "air flow (upward)"
                                  : "air flow";
    const double line = left + 8.2 * static_cast<double>(label.size());
    out << "<line x1=\"" << at(line) << "\" y1=\"" << middle << "\" x2=\"" << at(end - 10)
        << "\" y2=\"" << middle << "\" stroke-width=\"2.5\"/>\n<path d=\"M " << at(end - 14) << " "
        << at(y - 10) << " L " << at(end) << " " << middle << " L " << at(end - 14) << " "
        << at(y + 2) << " Z\"/>\n</g>\n"
        << words(left, y, 14, label, "fill=\"#1f5fa8\"");
  }

  void colour_bar(std::ostream& out, double left, double top, double height) const {
    constexpr int bands = 64;
    out << "<g shape-rendering=\"crispEdges\">\n";
    const double span = scale.hottest() - scale.coldest();
    for (int i = 0; i < bands; ++i) {
      const double share = (i + 0.5) / bands;
      out << box(left, top + height * i / bands, 20, height / bands + 0.3) << " fill=\""
          << scale.colour(scale.hottest() - share * span) << "\"/>\n";
    }
    out << "</g>\n" << box(left, top, 20, height) << " fill=\"none\" stroke=\"#444\"/>\n";
    const double raw = span / 6;
    const double decade = std::pow(10.0, std::floor(std::log10(raw)));
    double tick = decade;
    for (const double nice : {1.0, 2.0, 5.0, 10.0}) {
      tick = nice * decade;
      if (tick >= raw) break;
    }
    const double hottest_C = scale.hottest() - zero_celsius_K;
    const double coldest_C = scale.coldest() - zero_celsius_K;
    const int decimals = tick < 1 ? static_cast<int>(std::ceil(-std::log10(tick))) : 0;
    const long last = std::lround(std::floor(hottest_C / tick));
    for (long i = std::lround(std::ceil(coldest_C / tick)); i <= last; ++i) {
      const double t = static_cast<double>(i) * tick;
      const double y = top + height * (hottest_C - t) / span;
      out << "<line x1=\"" << at(left + 20) << "\" y1=\"" << at(y) << "\" x2=\"" << at(left + 26)
          << "\" y2=\"" << at(y) << "\" stroke=\"#444\"/>\n"
          << words(left + 30, y + 4.5, 13, fixed(t + 0.0, decimals));
    }
    out << words(left, top - 8, 13,
                 "\xC2\xB0"
                 "C");
  }

  void hottest_list(std::ostream& out, double top) const {
    std::vector<const component_result*> here;
    for (const auto& r : s.components) {
      if (r.board == number) here.push_back(&r);
    }
    out << words(list_left, top, 14, "Hottest first", "font-weight=\"bold\"")
        << words(list_left + 150, top, 12, "W", "text-anchor=\"end\"")
        << words(list_left + 200, top, 12,
                 "\xC2\xB0"
                 "C",
                 "text-anchor=\"end\"")
        << words(list_left + 280, top, 12, "band", "text-anchor=\"end\"");
    double y = top;
    for (std::size_t i = 0; i < (std::min)(here.size(), most_listed); ++i) {
      const auto& r = *here[i];
      const auto& part = of().components[r.number];
      const bool hot = part.limit_K && r.highest_K > *part.limit_K;
      y += 19;
      std::string name = part.name.substr(0, 14);
      if (part.side == face::back) name += " (back)";
      const std::string ink = hot ? "fill=\"#b00000\"" : "fill=\"#222\"";
      const std::string right = "text-anchor=\"end\" " + ink;
      out << words(list_left, y, 12.5, name, ink + (hot ? " font-weight=\"bold\"" : ""))
          << words(list_left + 150, y, 12.5, fixed(part.power_W, 2), right)
          << words(list_left + 200, y, 12.5, celsius(r.hottest_K), right)
          << words(list_left + 280, y, 12.5,
                   celsius(r.lowest_K, 0) + " to " + celsius(r.highest_K, 0), right);
    }
    if (here.size() > most_listed) {
      out << words(list_left, y + 19, 12.5,
                   "and " + std::to_string(here.size() - most_listed) + " cooler ones");
    }
  }
};

}  // namespace

colour_scale common_scale(const equations& system, const Eigen::VectorXd& x) {
  const auto& places = system.places();
  double coldest = x[places.middle(0, 0)];
  double hottest = coldest;
  for (std::size_t b = 0; b < places.boards.size(); ++b) {
    for (std::size_t cell = 0; cell < places.boards[b].mesh.cells(); ++cell) {
      for (const face side : {face::back, face::front}) {
        coldest = (std::min)(coldest, x[places.face_of(b, cell, side)]);
        hottest = (std::max)(hottest, x[places.face_of(b, cell, side)]);
      }
    }
  }
  return {coldest, hottest};
}

std::string svg_map(const equations& system, const Eigen::VectorXd& x, const solution& s,
                    std::size_t number, const colour_scale& scale) {
  const drawing d{system, x, s, number, scale};
  const auto& b = d.of();
  const double height = b.width * d.per_metre();
  const bool on_back = std::any_of(b.components.begin(), b.components.end(),
                                   [](const auto& part) { return part.side == face::back; });
  std::vector<face> faces{face::front};
  if (on_back) faces.push_back(face::back);

  double power_W = 0;
  for (const auto& part : b.components) power_W += part.power_W;
  const double panel = height + 30 + flow_height;
  const double list_height = 60 + 19.0 * static_cast<double>(most_listed + 1);
  const double picture_height =
      title_height + (std::max)(panel * static_cast<double>(faces.size()), list_height) + margin;

  std::ostringstream out;
  out << "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<svg xmlns=\"http://www.w3.org/2000/svg\" "
      << "width=\"" << at(picture_width) << "\" height=\"" << at(picture_height)
      << "\" viewBox=\"0 0 " << at(picture_width) << " " << at(picture_height)
      << "\" font-family=\"sans-serif\" fill=\"#222\">\n<title>"
      << xml_text("Temperature of board " + b.name) << "</title>\n"
      << box(0, 0, picture_width, picture_height) << " fill=\"#ffffff\"/>\n"
      << words(margin, 34, 22, b.name, "font-weight=\"bold\"")
      << words(margin, 56, 13.5,
               fixed(1e3 * b.length, 0) + " x " + fixed(1e3 * b.width, 0) + " mm, " +
                   fixed(power_W, 1) + " W, ambient " + celsius(system.of().ambient.temperature_K) +
                   " \xC2\xB0"
                   "C. One colour scale for all boards of this case.");
  double top = title_height;
  for (const face side : faces) {
    out << words(margin, top + 12, 14,
                 side == face::front ? "Front face" : "Back face (seen through the board)",
                 "font-weight=\"bold\"");
    d.cells(out, side, margin, top + 20);
    out << box(margin, top + 20, map_width, height) << " fill=\"none\" stroke=\"#222\"/>\n";
    d.component_outlines(out, side, margin, top + 20);
    d.flow_arrow(out, margin, top + 20 + height + 22);
    top += panel;
  }
  d.colour_bar(out, margin + map_width + 26, title_height + 20, (std::max)(height, 200.0));
  d.hottest_list(out, title_height + 12);
  out << words(list_left, picture_height - margin - 15, 11.5,
               "Red: limit reached within the uncertainty band.")
      << words(list_left, picture_height - margin, 11.5, "Estimates; confirm by measurement.")
      << "</svg>\n";
  return out.str();
}

}  // namespace chassis
