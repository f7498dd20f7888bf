#ifndef CONVELOPE_GROUPS_HPP
#define CONVELOPE_GROUPS_HPP

#include "convelope/groups/film.hpp"
#include "convelope/groups/forced.hpp"
#include "convelope/groups/natural.hpp"
#include "convelope/groups/property_ratio.hpp"
#include "convelope/groups/state.hpp"

#endif
