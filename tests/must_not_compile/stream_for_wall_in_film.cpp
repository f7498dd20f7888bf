// names: wall_temperature, free_stream_temperature
#include "convelope/kinds.hpp"

using namespace convelope;

constexpr auto cold = free_stream_temperature(celsius(20.0));
constexpr auto hot = wall_temperature(celsius(60.0));
#ifdef TWIN
const auto t = film_between(hot, cold);
#else
const auto t = film_between(cold, hot);
#endif
