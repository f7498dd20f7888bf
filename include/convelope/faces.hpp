#ifndef CONVELOPE_FACES_HPP
#define CONVELOPE_FACES_HPP

#include "convelope/faces/evaluate.hpp"

#endif
