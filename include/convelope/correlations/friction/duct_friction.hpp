#ifndef CONVELOPE_CORRELATIONS_FRICTION_DUCT_FRICTION_HPP
#define CONVELOPE_CORRELATIONS_FRICTION_DUCT_FRICTION_HPP

#include "convelope/correlations/friction/entrance.hpp"
#include "convelope/correlations/friction/factors.hpp"
#include "convelope/correlations/friction/rough_duct.hpp"
#include "convelope/correlations/friction/smooth_duct.hpp"

#endif
