#ifndef CONVELOPE_SCALES_HPP
#define CONVELOPE_SCALES_HPP

#include "convelope/scales/confinement.hpp"
#include "convelope/scales/passage.hpp"
#include "convelope/scales/section.hpp"

#endif
