// What a case file says, in SI units and kelvin, after every check has passed.
#pragma once

#include <cstddef>
#include <optional>
#include <string>
#include <vector>

namespace chassis {

enum class face { back, front };
enum class flow_direction { horizontal, upward };
enum class facing { sideways, up, down };

struct rectangle {
  double x = 0;       // along the flow, from the inlet edge
  double y = 0;       // across the flow
  double length = 0;  // along the flow
  double width = 0;   // across the flow
};

struct component {
  std::string name;
  face side = face::front;
  rectangle at;
  double power_W = 0;
  double to_board_K_W = 0;  // from the hottest point inside to the face it sits on
  std::optional<double> limit_K;
};

struct layer {
  std::string name;
  double thickness = 0;
  double conductivity = 0;
  double coverage = 1;           // fraction of the area that has this conductivity
  double fill_conductivity = 0;  // the rest of the area
};

struct board {
  std::string name;
  double length = 0;
  double width = 0;
  std::size_t cells_along = 0;
  std::size_t cells_across = 0;
  std::vector<layer> layers;
  std::vector<component> components;
};

struct passage {
  std::string name;
  double gap = 0;
  double inlet_loss = 0;   // velocity heads lost where air enters
  double outlet_loss = 0;  // velocity heads lost where air leaves
};

struct fan_point {
  double flow_m3_s = 0;
  double pressure_Pa = 0;
};

struct fan {
  double count = 1;  // equal fans side by side
  std::vector<fan_point> points;
};

struct outer_wall {
  std::string name;
  facing faces = facing::sideways;
  double length = 0;  // in the direction of the outer air
  double height = 0;  // for an up or down facing wall: its other side
  double emissivity = 0;
  double inside_film_W_m2K = 0;
};

struct ambient {
  double temperature_K = 0;
  double pressure_Pa = 0;
  double outer_air_speed_m_s = 0;
};

struct enclosure {
  flow_direction direction = flow_direction::horizontal;
  double length = 0;  // of every passage
  double width = 0;   // of every passage
  double plenum_height = 0;
  double vent_area = 0;
  double vent_loss = 0;  // velocity heads on the vent area, inlet and outlet grilles together
};

struct solver_settings {
  double tolerance = 1e-10;
  int max_iterations = 40;
};

struct chassis_case {
  std::string name;
  chassis::ambient ambient;
  chassis::enclosure enclosure;
  std::optional<chassis::fan> fan;
  std::vector<passage> passages;  // passage i is behind board i, passage i + 1 in front of it
  std::vector<board> boards;
  std::vector<outer_wall> outer_walls;
  solver_settings solver;
  double scatter_where_not_stated = 0;  // the user's own assumption, as a fraction
};

}  // namespace chassis
