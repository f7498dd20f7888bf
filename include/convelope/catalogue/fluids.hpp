#ifndef CONVELOPE_CATALOGUE_FLUIDS_HPP
#define CONVELOPE_CATALOGUE_FLUIDS_HPP

#include "convelope/catalogue/fluids_gases.hpp"
#include "convelope/catalogue/fluids_liquids.hpp"
#include "convelope/catalogue/fluids_water.hpp"

// Every fluid by name. Not part of catalogue.hpp: whoever looks up correlations need not read
// every fluid's header.

namespace convelope {
inline namespace v0 {
namespace catalogue {

/// Ids begin with "fluid/", keys are T, p and a mixture's parameter, or what the equation takes.
inline constexpr auto all_fluids = joined(water_entries, gas_entries, liquid_entries);

}  // namespace catalogue
}  // namespace v0
}  // namespace convelope

#endif
