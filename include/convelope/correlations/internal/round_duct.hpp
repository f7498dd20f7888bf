#ifndef CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_HPP
#define CONVELOPE_CORRELATIONS_INTERNAL_ROUND_DUCT_HPP

#include "convelope/correlations/internal/round_duct_laminar.hpp"
#include "convelope/correlations/internal/round_duct_laminar_entry.hpp"
#include "convelope/correlations/internal/round_duct_transition.hpp"
#include "convelope/correlations/internal/round_duct_turbulent.hpp"

#endif
