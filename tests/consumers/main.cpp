#include <convelope/convelope.hpp>
#include <cstdio>

int main() {
  std::printf("convelope %d.%d.%d\n", CONVELOPE_VERSION_MAJOR, CONVELOPE_VERSION_MINOR,
              CONVELOPE_VERSION_PATCH);
}
