// names: envelope_of, at most six limits
#include "convelope/estimate/envelope.hpp"
#include "convelope/kinds.hpp"

using namespace convelope;

constexpr auto Pr = limit<prandtl_number>(0.6, 60.0);
#ifdef TWIN
const auto range = within(Pr, Pr, Pr, Pr, Pr, Pr);
#else
const auto range = within(Pr, Pr, Pr, Pr, Pr, Pr, Pr);
#endif
