#ifndef CONVELOPE_FLUIDS_HPP
#define CONVELOPE_FLUIDS_HPP

#include "convelope/fluids/constant_properties.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/fluids/fluid.hpp"
#include "convelope/fluids/host_fluid.hpp"
#include "convelope/fluids/liquid_water.hpp"

#endif
