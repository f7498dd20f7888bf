// The command line.
#pragma once

#include <string>
#include <vector>

namespace chassis {

struct options {
  std::string case_file;  // empty: the bundled default case
  std::string folder = "chassis-report";
  bool frozen_films = false;
  std::size_t refine = 1;
  bool help = false;
};

/// Throws case_error, with the argument in the place of the path.
options read_options(const std::vector<std::string>& arguments);

const char* usage();

}  // namespace chassis
