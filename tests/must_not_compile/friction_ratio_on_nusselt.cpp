// names: friction_correction, petukhov_kirillov_1958, corrects something else
#include "convelope/correlations/internal/round_duct_turbulent.hpp"

using namespace convelope;

constexpr auto Re = reynolds_of<hydraulic_diameter>(5e4);
constexpr auto Pr = prandtl_number(7.0);
#ifdef TWIN
const auto factor = property_ratio::petukhov_1970{}(viscosity_ratio(2.0));
#else
const auto factor = property_ratio::petukhov_1970_friction{}(viscosity_ratio(2.0));
#endif
const auto Nu = corrected<round_duct::petukhov_kirillov_1958>(factor, Re, Pr);
