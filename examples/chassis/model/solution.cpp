#include "model/solution.hpp"

#include <algorithm>
#include <array>

namespace chassis {
namespace {

constexpr std::size_t zones = 3;  // patches along each board face

void add_board_patches(const equations& system, const Eigen::VectorXd& x, solution& result) {
  const auto& c = system.of();
  const auto& places = system.places();
  struct gathered {
    patch_result patch;
    std::size_t hottest = 0;  // contact
    std::optional<std::size_t> outside;
    double hottest_K = 0;
    bool scatter_stated = true;
  };
  std::vector<gathered> all(c.boards.size() * 2 * zones);
  const auto number_of = [](std::size_t board, face side, std::size_t zone) {
    return (board * 2 + (side == face::back ? 0 : 1)) * zones + zone;
  };
  for (std::size_t i = 0; i < places.contacts.size(); ++i) {
    const auto& k = places.contacts[i];
    const auto at = system.spot(x, i);
    const double middle = 0.5 * (at.begin + at.end);
    const double share = middle / c.boards[k.board].length;
    const auto zone = (std::min)(static_cast<std::size_t>(share * zones), zones - 1);
    auto& g = all[number_of(k.board, k.side, zone)];
    const auto f = system.contact_film(x, i);
    const double flux = f.flux(at.wall_K, at.stream_K);
    auto& patch = g.patch;
    patch.area += k.area;
    patch.h += k.area * f.h;
    patch.heat_W += k.area * flux;
    patch.wall_K += k.area * at.wall_K;
    patch.stream_K += k.area * at.stream_K;
    if (!f.inside) {
      patch.area_outside += k.area;
      if (!g.outside) g.outside = i;
    }
    if (f.scatter) {
      patch.scatter = (std::max)(patch.scatter.value_or(0), *f.scatter);
    } else {
      g.scatter_stated = false;
      ++result.films_without_stated_scatter;
    }
    if (at.wall_K > g.hottest_K) {
      g.hottest_K = at.wall_K;
      g.hottest = i;
    }
  }
  constexpr std::array<const char*, zones> zone_names{"inlet", "middle", "outlet"};
  for (std::size_t b = 0; b < c.boards.size(); ++b) {
    for (const face side : {face::back, face::front}) {
      for (std::size_t zone = 0; zone < zones; ++zone) {
        auto& g = all[number_of(b, side, zone)];
        auto& patch = g.patch;
        if (!(patch.area > 0)) continue;  // fewer rows than zones
        patch.where =
            c.boards[b].name + (side == face::back ? ", back, " : ", front, ") + zone_names[zone];
        patch.h /= patch.area;
        patch.flux = patch.heat_W / patch.area;
        patch.wall_K /= patch.area;
        patch.stream_K /= patch.area;
        // Words of the first piece outside an envelope if there is one, else of the hottest piece.
        patch.words = system.walls().passage_words(system.spot(x, g.outside.value_or(g.hottest)));
        if (!g.scatter_stated) patch.scatter.reset();
        result.patches.push_back(patch);
      }
    }
  }
}

void add_outer_walls(const equations& system, const Eigen::VectorXd& x, solution& result) {
  const auto& c = system.of();
  for (std::size_t w = 0; w < c.outer_walls.size(); ++w) {
    const auto at = system.outer(x, w);
    const auto f = system.walls().outer_film(at);
    patch_result patch;
    patch.where = "outer wall " + c.outer_walls[w].name;
    patch.words = system.walls().outer_words(at);
    patch.area = c.outer_walls[w].length * c.outer_walls[w].height;
    patch.h = system.outer_factor[w] * f.h;
    patch.flux = patch.h * (at.wall_K - at.air_K);
    patch.heat_W = patch.area * patch.flux;
    patch.radiated_W = patch.area * system.radiated_flux(w, at.wall_K);
    patch.wall_K = at.wall_K;
    patch.stream_K = at.air_K;
    patch.area_outside = f.inside ? 0 : patch.area;
    patch.scatter = f.scatter;
    if (!f.scatter) ++result.films_without_stated_scatter;
    result.energy.by_walls_W += patch.heat_W + patch.radiated_W;
    result.patches.push_back(patch);
  }
}

}  // namespace

std::vector<component_result> component_temperatures(const equations& system,
                                                     const Eigen::VectorXd& x) {
  const auto& c = system.of();
  const auto& places = system.places();
  std::vector<component_result> results;
  for (std::size_t b = 0; b < c.boards.size(); ++b) {
    const auto& mesh = places.boards[b].mesh;
    for (std::size_t n = 0; n < c.boards[b].components.size(); ++n) {
      const auto& part = c.boards[b].components[n];
      double sum = 0;
      for (std::size_t j = 0; j < mesh.across; ++j) {
        for (std::size_t i = 0; i < mesh.along; ++i) {
          const double area = mesh.shared_area(i, j, part.at);
          if (area > 0) sum += area * x[places.face_of(b, mesh.cell(i, j), part.side)];
        }
      }
      component_result one;
      one.board = b;
      one.number = n;
      one.face_K = sum / (part.at.length * part.at.width);
      one.hottest_K = one.face_K + part.power_W * part.to_board_K_W;
      one.lowest_K = one.highest_K = one.hottest_K;
      results.push_back(one);
    }
  }
  return results;
}

solution read_off(const equations& system, const Eigen::VectorXd& x) {
  const auto& c = system.of();
  const auto& places = system.places();
  solution result;
  result.components = component_temperatures(system, x);
  std::stable_sort(result.components.begin(), result.components.end(),
                   [](const auto& a, const auto& b) { return a.hottest_K > b.hottest_K; });
  add_board_patches(system, x, result);
  add_outer_walls(system, x, result);

  const double inlet_density =
      system.walls().density(c.ambient.temperature_K, c.ambient.pressure_Pa).value;
  result.plenum_K = x[places.plenum()];
  result.stack_pressure_Pa = x[places.stack_pressure()];
  for (std::size_t p = 0; p < c.passages.size(); ++p) {
    const auto run = system.run(x, p);
    passage_result one;
    one.flow_kg_s = x[places.flow(p)];
    one.velocity_m_s = run.mass_flux / inlet_density;
    one.out_K = x[places.outgoing(p, places.passages[p].size() - 1)];
    one.friction_Pa = system.loss_factor[p] * system.walls().passage_friction(run).pressure_Pa;
    one.words = system.walls().friction_words(run);
    result.energy.by_air_W +=
        one.flow_kg_s * system.heat_capacity_J_kgK() * (result.plenum_K - c.ambient.temperature_K);
    result.passages.push_back(one);
  }
  for (const auto& b : c.boards) {
    for (const auto& part : b.components) result.energy.in_W += part.power_W;
  }
  return result;
}

}  // namespace chassis
