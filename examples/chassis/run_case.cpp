#include "run_case.hpp"

#include <filesystem>
#include <fstream>
#include <ostream>
#include <set>

#include "case/accepted_range.hpp"
#include "case/case_error.hpp"
#include "case/read_case.hpp"
#include "model/newton.hpp"
#include "model/solution.hpp"
#include "model/start.hpp"
#include "model/uncertainty.hpp"
#include "report/fixed.hpp"
#include "report/json_report.hpp"
#include "report/names.hpp"
#include "report/svg_map.hpp"
#include "report/text_report.hpp"
#include "report/vtk_file.hpp"

namespace chassis {
namespace {

void write(const std::filesystem::path& file, const std::string& text) {
  std::ofstream out(file, std::ios::binary);
  out << text;
  out.close();
  if (!out) throw case_error(file.string(), "cannot be written; expected a writable folder");
}

void make_folder(const std::string& folder) {
  std::error_code fault;
  std::filesystem::create_directories(folder, fault);
  if (fault || !std::filesystem::is_directory(folder, fault)) {
    throw case_error(folder, "cannot be made; expected a writable folder");
  }
}

void print_size(const chassis_case& c, const equations& system, std::ostream& out) {
  std::size_t cells = 0;
  for (const auto& b : system.places().boards) cells += b.mesh.cells();
  std::size_t parts = 0;
  for (const auto& b : c.boards) parts += b.components.size();
  out << c.name << ": " << c.boards.size() << " boards, " << parts << " components, " << cells
      << " cells, " << system.places().contacts.size() << " wall pieces, "
      << system.places().unknowns() << " unknowns\n"
      << "air moved by "
      << (!c.fan                                            ? "buoyancy only"
          : c.enclosure.direction == flow_direction::upward ? "fan and buoyancy"
                                                            : "fan")
      << "; every temperature starts at " << celsius(c.ambient.temperature_K) << " C\n";
}

void write_files(const options& o, const equations& system, const newton_result& run,
                 const solution& s, std::ostream& out) {
  const std::filesystem::path folder(o.folder);
  write(folder / "report.json", json_report(system.of(), s, run).dump(2) + "\n");
  out << "wrote " << (folder / "report.json").string() << "\n";
  const auto scale = common_scale(system, run.x);
  std::set<std::string> taken;
  for (std::size_t b = 0; b < system.of().boards.size(); ++b) {
    auto name = file_name_of(system.of().boards[b].name);
    while (!taken.insert(name).second) name.append("-").append(std::to_string(b));
    write(folder / (name + ".svg"), svg_map(system, run.x, s, b, scale));
    write(folder / (name + ".vtk"), vtk_file(system, run.x, b));
    out << "wrote " << (folder / (name + ".svg")).string() << " and .vtk\n";
  }
}

}  // namespace

void run_case(const options& o, const wall_model& walls, std::ostream& out) {
  auto c = read_case_file(o.case_file);
  for (auto& b : c.boards) {
    b.cells_along *= o.refine;
    b.cells_across *= o.refine;
  }
  make_folder(o.folder);
  const equations system(c, walls);
  print_size(c, system, out);

  const auto derivatives = o.frozen_films ? wall_derivatives::off : wall_derivatives::exact;
  const auto run = solve(system, uniform_start(system), derivatives, [&out](const auto& step) {
    out << "  iteration " << step.number << ": residual " << plain(step.residual);
    if (step.number > 0 && step.fraction < 1)
      out << " (step cut to " << plain(step.fraction) << ")";
    out << "\n" << std::flush;
  });
  if (!run.converged) throw case_error("/solver/max_iterations", not_converged(run, c));

  auto s = read_off(system, run.x);
  out << "solving twice more for the uncertainty band\n" << std::flush;
  if (!add_band(system, run.x, s.components)) {
    throw case_error("/solver/max_iterations",
                     "the balances did not close with all films at one end of their scatter; "
                     "expected <= " +
                         plain(c.solver.tolerance));
  }
  print_report(out, c, s, run);
  out << "\n";
  write_files(o, system, run, s, out);
}

}  // namespace chassis
