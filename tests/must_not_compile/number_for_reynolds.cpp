// names: reynolds, double
#include "convelope/correlations/external/cylinder_crossflow.hpp"

using namespace convelope;

constexpr auto Pr = prandtl_number(0.7);
constexpr cylinder_crossflow::churchill_bernstein_1977 of{};
#ifdef TWIN
const auto Nu = of(reynolds_of<diameter>(1e4), Pr);
#else
const auto Nu = of(1e4, Pr);
#endif
