#ifndef CONVELOPE_ESTIMATE_HPP
#define CONVELOPE_ESTIMATE_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/estimate/envelope.hpp"
#include "convelope/estimate/estimate.hpp"
#include "convelope/estimate/info.hpp"
#include "convelope/estimate/policies.hpp"
#include "convelope/estimate/verdict.hpp"

#endif
