#ifndef CONVELOPE_BENCH_AIR_TUBE_HPP
#define CONVELOPE_BENCH_AIR_TUBE_HPP

#include "convelope/faces/widest.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/surfaces/cylinder.hpp"

namespace bench {

/// Air at 300 K and 4 m/s across a cylinder of 50 mm.
inline auto air_tube() {
  using namespace convelope;
  return surface(cylinder_in_crossflow{diameter(0.05 * units::metre)}, dry_air_fast{},
                 stream{free_stream_velocity(4.0 * units::metre_per_second),
                        free_stream_temperature(kelvin(300.0))});
}

}  // namespace bench

#endif
