// What a user's first program may look like: one wall, one answer.
#include <convelope/convelope.hpp>
#include <cstdio>

int main() {
  using namespace convelope;
  const auto tube = surface(cylinder_in_crossflow{diameter(0.05 * units::metre)}, dry_air{},
                            stream{free_stream_velocity(4.0 * units::metre_per_second),
                                   free_stream_temperature(celsius(20.0))});
  const auto answer = tube.at(wall_temperature(celsius(60.0)));
  std::printf("convelope %d.%d.%d\n", CONVELOPE_VERSION_MAJOR, CONVELOPE_VERSION_MINOR,
              CONVELOPE_VERSION_PATCH);
  return answer.inside() && answer.flux().si() > 0.0 ? 0 : 1;
}
