#ifndef CONVELOPE_VERSION_HPP
#define CONVELOPE_VERSION_HPP

// CMake reads these three lines; nothing else states the version.
#define CONVELOPE_VERSION_MAJOR 0
#define CONVELOPE_VERSION_MINOR 1
#define CONVELOPE_VERSION_PATCH 0

#define CONVELOPE_VERSION \
  (CONVELOPE_VERSION_MAJOR * 10000 + CONVELOPE_VERSION_MINOR * 100 + CONVELOPE_VERSION_PATCH)
#define CONVELOPE_VERSION_AT_LEAST(major, minor, patch) \
  (CONVELOPE_VERSION >= (major)*10000 + (minor)*100 + (patch))

#endif
