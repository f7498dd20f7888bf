#include <all_reversed.hpp>

int in_reversed_order();
int in_reversed_order() { return CONVELOPE_VERSION; }
