#include "report/text_report.hpp"

#include <algorithm>
#include <cmath>
#include <ostream>
#include <string>
#include <vector>

#include "case/accepted_range.hpp"
#include "report/fixed.hpp"

namespace chassis {
namespace {

// Columns as wide as their longest entry; the first column to the left, numbers to the right.
class table {
 public:
  explicit table(std::vector<std::string> header) { add(std::move(header)); }
  void add(std::vector<std::string> row) { rows_.push_back(std::move(row)); }

  void print(std::ostream& out, std::size_t left_columns) const {
    std::vector<std::size_t> width(rows_.front().size());
    for (const auto& row : rows_) {
      for (std::size_t i = 0; i < row.size(); ++i) width[i] = (std::max)(width[i], row[i].size());
    }
    for (const auto& row : rows_) {
      std::string line = " ";
      for (std::size_t i = 0; i < row.size(); ++i) {
        const std::string pad(width[i] - row[i].size(), ' ');
        // Appended piece by piece: g++ 12 warns falsely of literal + temporary string.
        line.append(" ").append(i < left_columns ? row[i] : pad);
        line.append(i < left_columns ? pad : row[i]).append(" ");
      }
      line.erase(line.find_last_not_of(' ') + 1);
      out << line << "\n";
    }
  }

 private:
  std::vector<std::vector<std::string>> rows_;
};

std::string per_cent(const std::optional<double>& scatter) {
  return scatter ? "+-" + fixed(100 * *scatter, 0) + " %" : "not stated";
}

std::string groups_text(const std::vector<group_value>& groups) {
  std::string text;
  for (const auto& g : groups) {
    text += (text.empty() ? "" : ", ") + g.symbol + " = " + plain(std::stod(plain(g.value)));
  }
  return text;
}

void print_patches(std::ostream& out, const solution& s) {
  out << "Patches of wall (thirds of each board face along the flow, then outer walls)\n";
  table t({"patch", "regime", "h W/m2K", "q W/m2", "wall C", "air C", "scatter", "envelope"});
  for (const auto& p : s.patches) {
    const double outside = p.area_outside / p.area;
    t.add({p.where, p.words.regime, fixed(p.h, 2), fixed(p.flux, 1), celsius(p.wall_K),
           celsius(p.stream_K), per_cent(p.scatter),
           outside > 0 ? "outside on " + fixed(100 * outside, 0) + " %" : "inside"});
  }
  t.print(out, 2);
  out << "\nWhat was used on each patch\n";
  for (const auto& p : s.patches) {
    out << "  " << p.where << ": " << p.words.correlation << "\n    " << groups_text(p.words.groups)
        << "\n";
    if (p.area_outside > 0) out << "    " << p.words.sentence << "\n";
  }
}

void print_passages(std::ostream& out, const chassis_case& c, const solution& s) {
  out << "Passages\n";
  table t({"passage", "gap mm", "flow g/s", "velocity m/s", "air out C", "friction Pa"});
  for (std::size_t p = 0; p < s.passages.size(); ++p) {
    const auto& one = s.passages[p];
    t.add({c.passages[p].name, fixed(1e3 * c.passages[p].gap, 1), fixed(1e3 * one.flow_kg_s, 3),
           fixed(one.velocity_m_s, 2), celsius(one.out_K), fixed(one.friction_Pa, 3)});
  }
  t.print(out, 1);
  for (std::size_t p = 0; p < s.passages.size(); ++p) {
    const auto& words = s.passages[p].words;
    if (!words.inside) out << "  " << c.passages[p].name << ": " << words.sentence << "\n";
  }
}

void print_components(std::ostream& out, const chassis_case& c, const solution& s) {
  constexpr std::size_t shown = 10;
  out << "Hottest components (band from the stated scatters, all films off the same way)\n";
  table t({"component", "board", "power W", "temperature C", "band C", "limit C"});
  for (std::size_t i = 0; i < (std::min)(shown, s.components.size()); ++i) {
    const auto& one = s.components[i];
    const auto& part = c.boards[one.board].components[one.number];
    t.add({part.name, c.boards[one.board].name, fixed(part.power_W, 2), celsius(one.hottest_K),
           celsius(one.lowest_K) + " to " + celsius(one.highest_K),
           part.limit_K ? celsius(*part.limit_K, 0) : "-"});
  }
  t.print(out, 2);
  for (const auto& one : s.components) {
    const auto& part = c.boards[one.board].components[one.number];
    if (!part.limit_K || one.highest_K <= *part.limit_K) continue;
    out << "  WARNING: " << part.name << " on " << c.boards[one.board].name
        << (one.hottest_K > *part.limit_K ? " is above its limit of "
                                          : " may be above its limit, within the band, of ")
        << celsius(*part.limit_K, 0) << " C\n";
  }
}

void print_energy(std::ostream& out, const solution& s) {
  const auto& e = s.energy;
  out << "Energy\n"
      << "  in, power of all components   " << fixed(e.in_W, 9) << " W\n"
      << "  out with the air              " << fixed(e.by_air_W, 9) << " W\n"
      << "  out through the outer walls   " << fixed(e.by_walls_W, 9) << " W\n"
      << "  out minus in                  " << plain(e.mismatch()) << " W\n";
}

}  // namespace

const char* cautions() {
  return "Cautions\n"
         "  These are estimates from published correlations, each with the scatter its source\n"
         "  states; local hot spots, gaps, obstructions, dust, ageing fans and recirculated air\n"
         "  are not in the model. Surfaces above about 45 to 60 C can burn skin, depending on\n"
         "  material and contact time (see ISO 13732-1). Overheated parts and batteries can fail\n"
         "  dangerously. Confirm with measurements on the real unit before relying on a margin,\n"
         "  and follow local codes, product safety standards and the advice of licensed\n"
         "  professionals.\n";
}

void print_report(std::ostream& out, const chassis_case& c, const solution& s,
                  const newton_result& run) {
  out << "\n"
      << c.name << ": solved in " << run.iterations << " iterations, residual "
      << plain(run.residual) << "\n\n";
  print_patches(out, s);
  out << "\n";
  print_passages(out, c, s);
  out << "  mixed air leaves at " << celsius(s.plenum_K) << " C\n\n";
  print_energy(out, s);
  out << "\n";
  print_components(out, c, s);
  if (!s.components.empty()) {
    const auto& one = s.components.front();
    out << "\nHottest component: " << c.boards[one.board].components[one.number].name << " on "
        << c.boards[one.board].name << ", " << celsius(one.hottest_K) << " C, band "
        << celsius(one.lowest_K) << " to " << celsius(one.highest_K) << " C\n";
  }
  if (s.films_without_stated_scatter > 0) {
    out << "  " << s.films_without_stated_scatter
        << " pieces of wall use a correlation whose source states no scatter; there the band "
        << (c.scatter_where_not_stated > 0
                ? "takes +-" + fixed(100 * c.scatter_where_not_stated, 0) +
                      " %, which the case assumes.\n"
                : std::string("takes none and is too narrow.\n"));
  }
  out << "\n" << cautions();
}

}  // namespace chassis
