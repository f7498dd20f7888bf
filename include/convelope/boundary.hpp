#ifndef CONVELOPE_BOUNDARY_HPP
#define CONVELOPE_BOUNDARY_HPP

#include "convelope/boundary/surface.hpp"

#endif
