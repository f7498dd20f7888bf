#pragma once

// Runs the built program with arguments and text on its standard input.

#include <doctest/doctest.h>
#include <sys/wait.h>

#include <cstdlib>
#include <filesystem>
#include <fstream>
#include <iterator>
#include <sstream>
#include <string>
#include <vector>

namespace evaluate_test {

struct outcome {
  int code = -1;
  std::string out;
  std::string error;

  std::vector<std::string> lines() const {
    std::vector<std::string> all;
    std::istringstream in(out);
    for (std::string line; std::getline(in, line);) all.push_back(line);
    return all;
  }
};

inline outcome run(const std::string& arguments, const std::string& input = {}) {
  namespace fs = std::filesystem;
  std::string name = (fs::temp_directory_path() / "evaluate-test-XXXXXX").string();
  REQUIRE(mkdtemp(name.data()) != nullptr);
  const fs::path folder = name;
  std::ofstream(folder / "in", std::ios::binary) << input;
  const std::string command =
      "cd '" + name + "' && '" CONVELOPE_PROGRAM "' " + arguments + " <in >out 2>error";
  const int status = std::system(command.c_str());
  const auto text = [&](const char* file) {
    std::ifstream in(folder / file, std::ios::binary);
    return std::string{std::istreambuf_iterator<char>(in), {}};
  };
  outcome o{WIFEXITED(status) ? WEXITSTATUS(status) : -1, text("out"), text("error")};
  fs::remove_all(folder);
  return o;
}

}  // namespace evaluate_test
