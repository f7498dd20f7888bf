#ifndef CONVELOPE_FLUIDS_HPP
#define CONVELOPE_FLUIDS_HPP

// Every fluid that needs no memory of its own: fluids/tabulated.hpp allocates its tables and is
// included by name.

#include "convelope/fluids/argon.hpp"
#include "convelope/fluids/carbon_dioxide.hpp"
#include "convelope/fluids/constant_properties.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/fluids/engine_oil.hpp"
#include "convelope/fluids/ethylene_glycol.hpp"
#include "convelope/fluids/fluid.hpp"
#include "convelope/fluids/glycol_water.hpp"
#include "convelope/fluids/helium.hpp"
#include "convelope/fluids/host_fluid.hpp"
#include "convelope/fluids/humid_air.hpp"
#include "convelope/fluids/hydrogen.hpp"
#include "convelope/fluids/liquid_metals.hpp"
#include "convelope/fluids/liquid_water.hpp"
#include "convelope/fluids/liquid_water_fast.hpp"
#include "convelope/fluids/nitrogen.hpp"
#include "convelope/fluids/oxygen.hpp"
#include "convelope/fluids/real_air.hpp"
#include "convelope/fluids/saturated_water.hpp"
#include "convelope/fluids/seawater.hpp"
#include "convelope/fluids/solar_salt.hpp"
#include "convelope/fluids/steam.hpp"

#endif
