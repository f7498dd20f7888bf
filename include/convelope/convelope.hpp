#ifndef CONVELOPE_CONVELOPE_HPP
#define CONVELOPE_CONVELOPE_HPP

// All of the library but the lists for callers that know names only at run time (catalogue.hpp),
// which instantiate every correlation, and what needs <string> (estimate/explain.hpp,
// throwing.hpp).

#include "convelope/boundary.hpp"
#include "convelope/correlations.hpp"
#include "convelope/estimate.hpp"
#include "convelope/faces.hpp"
#include "convelope/fluids.hpp"
#include "convelope/groups.hpp"
#include "convelope/kinds.hpp"
#include "convelope/scalar.hpp"
#include "convelope/scales.hpp"
#include "convelope/surfaces.hpp"
#include "convelope/units.hpp"
#include "convelope/version.hpp"

#endif
