#ifndef CONVELOPE_SURFACES_HPP
#define CONVELOPE_SURFACES_HPP

#include "convelope/surfaces/buoyancy.hpp"
#include "convelope/surfaces/cylinder.hpp"
#include "convelope/surfaces/duct.hpp"
#include "convelope/surfaces/exposure.hpp"
#include "convelope/surfaces/film.hpp"
#include "convelope/surfaces/flat_plate.hpp"
#include "convelope/surfaces/horizontal_plate.hpp"
#include "convelope/surfaces/rotating_gap.hpp"
#include "convelope/surfaces/sphere.hpp"
#include "convelope/surfaces/vertical_channel.hpp"
#include "convelope/surfaces/vertical_plate.hpp"

#endif
