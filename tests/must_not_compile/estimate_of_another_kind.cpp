// names: nusselt, local_nusselt
#include "convelope/correlations/external/cylinder_crossflow.hpp"

using namespace convelope;

constexpr auto Re = reynolds_of<diameter>(1e4);
constexpr auto Pr = prandtl_number(0.7);
constexpr cylinder_crossflow::churchill_bernstein_1977 of{};
#ifdef TWIN
const estimate<kinds::nusselt<kinds::diameter>> Nu = of(Re, Pr);
#else
const estimate<kinds::local_nusselt<kinds::diameter>> Nu = of(Re, Pr);
#endif
