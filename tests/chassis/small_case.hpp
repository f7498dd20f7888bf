// A small valid case that tests change one key at a time.
#pragma once

#include <string>

#include "case/read_case.hpp"

namespace chassis_test {

inline const char* const small_case_text = R"({
  "name": "Small box",
  "ambient": {"temperature_C": 25, "pressure_Pa": 101325, "outer_air_speed_m_s": 0.2},
  "enclosure": {"flow_direction": "upward", "length_mm": 120, "width_mm": 90,
                "plenum_height_mm": 30, "vent_area_mm2": 2000, "vent_loss": 2},
  "fan": {"points": [{"flow_m3_h": 0, "pressure_Pa": 20}, {"flow_m3_h": 8, "pressure_Pa": 14},
                     {"flow_m3_h": 20, "pressure_Pa": 0}]},
  "passages": [{"name": "left", "gap_mm": 8}, {"name": "middle", "gap_mm": 10},
               {"name": "right", "gap_mm": 7}],
  "boards": [
    {"name": "A", "length_mm": 120, "width_mm": 90, "mesh": {"along": 6, "across": 4},
     "layers": [{"name": "board", "thickness_mm": 1.6, "conductivity_W_mK": 12}],
     "components": [
       {"name": "U1", "x_mm": 20, "y_mm": 20, "length_mm": 30, "width_mm": 30, "power_W": 5,
        "to_board_K_W": 1, "limit_C": 95},
       {"name": "U2", "side": "back", "x_mm": 70, "y_mm": 30, "length_mm": 20, "width_mm": 20,
        "power_W": 2}]},
    {"name": "B", "length_mm": 100, "width_mm": 80, "mesh": {"along": 7, "across": 3},
     "layers": [{"name": "copper", "thickness_mm": 0.07, "conductivity_W_mK": 390,
                 "coverage": 0.5, "fill_conductivity_W_mK": 0.3},
                {"name": "laminate", "thickness_mm": 1.5, "conductivity_W_mK": 0.35}],
     "components": [
       {"name": "U1", "x_mm": 10, "y_mm": 10, "length_mm": 40, "width_mm": 40, "power_W": 3}]}
  ],
  "outer_walls": [
    {"name": "side", "faces": "sideways", "length_mm": 150, "height_mm": 120, "emissivity": 0.9,
     "inside_film_W_m2K": 6}],
  "solver": {"tolerance": 1e-10, "max_iterations": 30}
})";

inline chassis::chassis_case small_case() {
  return chassis::read_case_text(small_case_text, "small.json", ".");
}

}  // namespace chassis_test
