#include "report/vtk_file.hpp"

#include <sstream>
#include <vector>

namespace chassis {
namespace {

void add_field(std::ostream& out, const char* name, const std::vector<double>& values) {
  out << "SCALARS " << name << " double 1\nLOOKUP_TABLE default\n";
  for (const double v : values) out << v << "\n";
}

// Area-weighted mean over the contacts of each cell of a face.
struct face_fields {
  std::vector<double> film, flux, outside;
};

face_fields fields_of(const equations& system, const Eigen::VectorXd& x, std::size_t board,
                      face side) {
  const auto& places = system.places();
  const auto& mesh = places.boards[board].mesh;
  face_fields f;
  f.film.resize(mesh.cells());
  f.flux.resize(mesh.cells());
  f.outside.resize(mesh.cells());
  for (std::size_t i = 0; i < places.contacts.size(); ++i) {
    const auto& k = places.contacts[i];
    if (k.board != board || k.side != side) continue;
    const auto at = system.spot(x, i);
    const auto film = system.contact_film(x, i);
    const double share = k.area / mesh.area();
    f.film[k.cell] += share * film.h;
    f.flux[k.cell] += share * film.flux(at.wall_K, at.stream_K);
    if (!film.inside) f.outside[k.cell] = 1;
  }
  return f;
}

}  // namespace

std::string vtk_file(const equations& system, const Eigen::VectorXd& x, std::size_t b) {
  const auto& places = system.places();
  const auto& mesh = places.boards[b].mesh;
  std::string title = system.of().boards[b].name;
  for (auto& c : title) {
    if (c == '\n' || c == '\r') c = ' ';
  }
  std::ostringstream out;
  out.precision(12);
  out << "# vtk DataFile Version 3.0\n"
      << title.substr(0, 200) << "\nASCII\nDATASET STRUCTURED_POINTS\n"
      << "DIMENSIONS " << mesh.along + 1 << " " << mesh.across + 1 << " 1\n"
      << "ORIGIN 0 0 0\nSPACING " << mesh.dx << " " << mesh.dy << " "
      << places.boards[b].plate.thickness << "\nCELL_DATA " << mesh.cells() << "\n";

  std::vector<double> middle, back, front;
  for (std::size_t cell = 0; cell < mesh.cells(); ++cell) {
    middle.push_back(x[places.middle(b, cell)]);
    back.push_back(x[places.face_of(b, cell, face::back)]);
    front.push_back(x[places.face_of(b, cell, face::front)]);
  }
  add_field(out, "middle_temperature_K", middle);
  add_field(out, "back_temperature_K", back);
  add_field(out, "front_temperature_K", front);
  const auto on_back = fields_of(system, x, b, face::back);
  const auto on_front = fields_of(system, x, b, face::front);
  add_field(out, "back_film_coefficient_W_m2K", on_back.film);
  add_field(out, "front_film_coefficient_W_m2K", on_front.film);
  add_field(out, "back_heat_flux_W_m2", on_back.flux);
  add_field(out, "front_heat_flux_W_m2", on_front.flux);
  add_field(out, "back_outside_envelope", on_back.outside);
  add_field(out, "front_outside_envelope", on_front.outside);
  return out.str();
}

}  // namespace chassis
