#ifndef CONVELOPE_CORRELATIONS_HPP
#define CONVELOPE_CORRELATIONS_HPP

#include "convelope/correlations/external/annular_gap.hpp"
#include "convelope/correlations/external/cylinder_crossflow.hpp"
#include "convelope/correlations/external/flat_plate.hpp"
#include "convelope/correlations/external/sphere.hpp"
#include "convelope/correlations/friction/duct_friction.hpp"
#include "convelope/correlations/friction/flat_plate_friction.hpp"
#include "convelope/correlations/internal/parallel_plates.hpp"
#include "convelope/correlations/internal/round_duct.hpp"
#include "convelope/correlations/mixed/blending.hpp"
#include "convelope/correlations/natural/horizontal_cylinder.hpp"
#include "convelope/correlations/natural/horizontal_plate_down.hpp"
#include "convelope/correlations/natural/horizontal_plate_up.hpp"
#include "convelope/correlations/natural/sphere_natural.hpp"
#include "convelope/correlations/natural/vertical_channel.hpp"
#include "convelope/correlations/natural/vertical_channel_isoflux.hpp"
#include "convelope/correlations/natural/vertical_channel_optimum.hpp"
#include "convelope/correlations/natural/vertical_plate.hpp"

#endif
