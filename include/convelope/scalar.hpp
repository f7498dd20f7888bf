#ifndef CONVELOPE_SCALAR_HPP
#define CONVELOPE_SCALAR_HPP

#include "convelope/scalar/adaptor.hpp"
#include "convelope/scalar/dual.hpp"
#include "convelope/scalar/elementary.hpp"
#include "convelope/scalar/functions.hpp"
#include "convelope/scalar/polynomial.hpp"
#include "convelope/scalar/power.hpp"
#include "convelope/scalar/smooth.hpp"

#endif
