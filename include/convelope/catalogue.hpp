#ifndef CONVELOPE_CATALOGUE_HPP
#define CONVELOPE_CATALOGUE_HPP

#include "convelope/catalogue/catalogue.hpp"

#endif
