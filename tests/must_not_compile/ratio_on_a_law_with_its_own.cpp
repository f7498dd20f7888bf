// names: hausen_1943, a property ratio is in this correlation already
#include "convelope/correlations/internal/round_duct_laminar_entry.hpp"
#include "convelope/groups/property_ratio.hpp"

using namespace convelope;

constexpr auto mu_ratio = viscosity_ratio(2.0);
const auto factor = property_ratio::sieder_tate_1936{}(mu_ratio);
#ifdef TWIN
const auto Nu = round_duct::hausen_1943{}(graetz_number(100.0), mu_ratio);
#else
const auto Nu = corrected<round_duct::hausen_1943>(factor, graetz_number(100.0), mu_ratio);
#endif
