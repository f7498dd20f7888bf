// names: reynolds, prandtl
#include "convelope/correlations/external/cylinder_crossflow.hpp"

using namespace convelope;

constexpr auto Re = reynolds_of<diameter>(1e4);
constexpr auto Pr = prandtl_number(0.7);
constexpr cylinder_crossflow::churchill_bernstein_1977 of{};
#ifdef TWIN
const auto Nu = of(Re, Pr);
#else
const auto Nu = of(Pr, Re);
#endif
