#ifndef CONVELOPE_CORRELATIONS_EXTERNAL_FLAT_PLATE_HPP
#define CONVELOPE_CORRELATIONS_EXTERNAL_FLAT_PLATE_HPP

#include "convelope/correlations/external/flat_plate_laminar.hpp"
#include "convelope/correlations/external/flat_plate_turbulent.hpp"

#endif
