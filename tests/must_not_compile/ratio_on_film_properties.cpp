// names: churchill_bernstein_1977, state_at brings in the wall
#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "convelope/groups/property_ratio.hpp"

using namespace convelope;

constexpr auto Re = reynolds_of<diameter>(1e4);
constexpr auto Pr = prandtl_number(7.0);
const auto factor = property_ratio::zukauskas_1972{}(prandtl_ratio(1.5));
#ifdef TWIN
const auto Nu = cylinder_crossflow::churchill_bernstein_1977{}(Re, Pr);
#else
const auto Nu = corrected<cylinder_crossflow::churchill_bernstein_1977>(factor, Re, Pr);
#endif
