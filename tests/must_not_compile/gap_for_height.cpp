// names: gap, height
#include "convelope/groups/natural.hpp"

using namespace convelope;

constexpr auto Ra = rayleigh_of<gap>(1e4);
constexpr auto b = gap(0.01 * units::metre);
constexpr auto h = height(0.2 * units::metre);
#ifdef TWIN
const auto El = elenbaas(Ra, b, h);
#else
const auto El = elenbaas(Ra, h, b);
#endif
