#ifndef CONVELOPE_KINDS_HPP
#define CONVELOPE_KINDS_HPP

#include "convelope/kinds/humidity.hpp"
#include "convelope/kinds/lengths.hpp"
#include "convelope/kinds/matter.hpp"
#include "convelope/kinds/mixtures.hpp"
#include "convelope/kinds/numbers.hpp"
#include "convelope/kinds/results.hpp"
#include "convelope/kinds/temperatures.hpp"
#include "convelope/kinds/typed.hpp"
#include "convelope/kinds/velocities.hpp"

#endif
