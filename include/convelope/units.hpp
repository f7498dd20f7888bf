#ifndef CONVELOPE_UNITS_HPP
#define CONVELOPE_UNITS_HPP

#include "convelope/units/units.hpp"

#endif
