// names: estimate, name its correlation
#include "convelope/correlations/internal/round_duct_turbulent.hpp"

using namespace convelope;

constexpr auto Re = reynolds_of<hydraulic_diameter>(5e4);
constexpr auto Pr = prandtl_number(7.0);
const auto factor = property_ratio::petukhov_1970{}(viscosity_ratio(2.0));
#ifdef TWIN
const auto Nu = corrected<round_duct::petukhov_kirillov_1958>(factor, Re, Pr);
#else
const auto Nu = corrected_number(round_duct::petukhov_kirillov_1958{}(Re, Pr), factor);
#endif
