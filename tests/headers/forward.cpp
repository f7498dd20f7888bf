#include <all_forward.hpp>

int in_forward_order();
int in_forward_order() { return CONVELOPE_VERSION; }
