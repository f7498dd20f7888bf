// The program as a user meets it: exit codes, one message on standard error, files.
#include <doctest/doctest.h>
#include <sys/wait.h>

#include <cstdlib>
#include <filesystem>
#include <fstream>
#include <iterator>
#include <nlohmann/json.hpp>
#include <string>

#include "small_case.hpp"

namespace {

namespace fs = std::filesystem;

struct outcome {
  int code = -1;
  std::string out;
  std::string error;
};

std::string contents(const fs::path& file) {
  std::ifstream in(file, std::ios::binary);
  return {std::istreambuf_iterator<char>(in), {}};
}

class scratch {
 public:
  scratch() {
    std::string name = (fs::temp_directory_path() / "chassis-test-XXXXXX").string();
    REQUIRE(mkdtemp(name.data()) != nullptr);
    folder = name;
  }
  ~scratch() { fs::remove_all(folder); }
  scratch(const scratch&) = delete;
  scratch& operator=(const scratch&) = delete;

  outcome run(const std::string& arguments) const {
    const auto out = folder / "stdout";
    const auto error = folder / "stderr";
    const std::string command = "cd '" + folder.string() + "' && '" CONVELOPE_PROGRAM "' " +
                                arguments + " >stdout 2>stderr";
    const int status = std::system(command.c_str());
    return {WIFEXITED(status) ? WEXITSTATUS(status) : -1, contents(out), contents(error)};
  }

  void write(const std::string& name, const std::string& text) const {
    std::ofstream(folder / name, std::ios::binary) << text;
  }

  fs::path folder;
};

TEST_CASE("a good case ends with 0 and leaves all its files") {
  const scratch here;
  here.write("box.json", chassis_test::small_case_text);
  const auto result = here.run("box.json --out report");
  CAPTURE(result.error);
  CHECK(result.code == 0);
  CHECK(result.error == "");
  CHECK(result.out.find("Hottest component: ") != std::string::npos);
  for (const char* name : {"report.json", "A.svg", "A.vtk", "B.svg", "B.vtk"}) {
    CHECK(fs::file_size(here.folder / "report" / name) > 500);
  }
}

TEST_CASE("a bad case ends with 2 and one line") {
  const scratch here;
  const auto expect = [&here](const std::string& arguments, const std::string& message) {
    const auto result = here.run(arguments);
    CHECK(result.code == 2);
    CHECK(result.error.rfind(message, 0) == 0);
    CHECK(result.error.find('\n') == result.error.size() - 1);
  };
  expect("no-such.json", "no-such.json: cannot be read; expected a case file (JSON)");
  expect("--fast", "--fast: unknown option; ");
  expect(".", ".: cannot be read; ");

  here.write("broken.json", "{\n  \"name\": \n}");
  expect("broken.json", "broken.json, line 3, column 1: not valid JSON; ");

  auto root = nlohmann::json::parse(chassis_test::small_case_text);
  root["solver"]["max_iterations"] = 1;
  here.write("short.json", root.dump());
  expect("short.json", "/solver/max_iterations: the balances did not close: residual ");

  root = nlohmann::json::parse(chassis_test::small_case_text);
  root["boards"][0]["components_csv"] = "parts.csv";
  here.write("csv.json", root.dump());
  here.write("parts.csv", "name,x_mm,y_mm,length_mm,width_mm,power_W\nU9,90,1,5,5,-1\n");
  expect("csv.json",
         "/boards/0/components_csv (parts.csv, line 2)/power_W: -1 is negative; expected >= 0");

  here.write("box.json", chassis_test::small_case_text);
  here.write("taken", "a file, not a folder");
  expect("box.json --out taken", "taken: cannot be made; expected a writable folder");
}

}  // namespace
