// names: height, plate_length
#include "convelope/groups/natural.hpp"

using namespace convelope;

constexpr auto Gr = grashof_of<height>(1e6);
#ifdef TWIN
const auto Ri = richardson(Gr, reynolds_of<height>(1e4));
#else
const auto Ri = richardson(Gr, reynolds_of<plate_length>(1e4));
#endif
