// chassis: a vented enclosure full of boards, solved with convection boundary conditions.
#include <exception>
#include <iostream>
#include <string>
#include <vector>

#include "case/case_error.hpp"
#include "model/convelope_walls.hpp"
#include "options.hpp"
#include "run_case.hpp"

int main(int argc, char** argv) {
  try {
    auto o = chassis::read_options(std::vector<std::string>(argv + 1, argv + argc));
    if (o.help) {
      std::cout << chassis::usage();
      return 0;
    }
    if (o.case_file.empty()) o.case_file = CONVELOPE_CHASSIS_CASES "/default.json";
    const chassis::convelope_walls walls;
    chassis::run_case(o, walls, std::cout);
    return 0;
  } catch (const chassis::case_error& fault) {
    std::cerr << fault.what() << "\n";
  } catch (const std::exception& fault) {
    std::cerr << "chassis: " << fault.what() << "\n";
  }
  return 2;
}
