// The files the chassis writes are well formed and say what was solved.
#include <doctest/doctest.h>

#include <boost/property_tree/ptree.hpp>
#include <boost/property_tree/xml_parser.hpp>
#include <map>
#include <nlohmann/json.hpp>
#include <sstream>

#include "model/newton.hpp"
#include "model/start.hpp"
#include "report/json_report.hpp"
#include "report/names.hpp"
#include "report/svg_map.hpp"
#include "report/text_report.hpp"
#include "report/vtk_file.hpp"
#include "small_case.hpp"
#include "test_walls.hpp"

namespace {

using chassis::face;

struct solved {
  chassis::chassis_case c;
  chassis_test::simple_walls walls;
  chassis::equations system;
  chassis::newton_result run;
  chassis::solution s;

  explicit solved(chassis::chassis_case given)
      : c(std::move(given)),
        system(c, walls),
        run(chassis::solve(system, chassis::uniform_start(system),
                           chassis::wall_derivatives::exact)),
        s(chassis::read_off(system, run.x)) {}
};

chassis::chassis_case awkward_case() {
  auto c = chassis_test::small_case();
  c.boards[0].name = "A <\"&'> b";
  c.boards[0].components[0].name = "U1 & co\x01";
  return c;
}

void count_elements(const boost::property_tree::ptree& tree, std::map<std::string, int>& counts) {
  for (const auto& child : tree) {
    ++counts[child.first];
    count_elements(child.second, counts);
  }
}

TEST_CASE("the map of a board is XML and shows cells, outlines, names, scale and flow") {
  const solved d(awkward_case());
  const auto scale = chassis::common_scale(d.system, d.run.x);
  for (std::size_t b = 0; b < 2; ++b) {
    const auto svg = chassis::svg_map(d.system, d.run.x, d.s, b, scale);
    std::istringstream in(svg);
    boost::property_tree::ptree tree;
    REQUIRE_NOTHROW(boost::property_tree::read_xml(in, tree));
    std::map<std::string, int> counts;
    count_elements(tree, counts);
    CHECK(counts["svg"] == 1);
    CHECK(counts["rect"] > 70);
    CHECK(counts["path"] == (b == 0 ? 2 : 1));  // one flow arrow for every face shown
    CHECK(svg.find("air flow (upward)") != std::string::npos);
    CHECK(svg.find("\xC2\xB0"
                   "C") != std::string::npos);
    CHECK(svg.find("nan") == std::string::npos);
    CHECK(svg.find("inf") == std::string::npos);
  }
  const auto svg = chassis::svg_map(d.system, d.run.x, d.s, 0, scale);
  CHECK(svg.find("A &lt;&quot;&amp;'&gt; b") != std::string::npos);
  CHECK(svg.find("U1 &amp; co ") != std::string::npos);
  CHECK(svg.find("Back face") != std::string::npos);
}

TEST_CASE("the scale runs from cold to hot with growing lightness") {
  const chassis::colour_scale scale(300, 360);
  CHECK(scale.colour(200) == scale.colour(300));
  CHECK(scale.colour(500) == scale.colour(360));
  double before = 0;
  for (double t = 300; t <= 360; t += 1) {
    const auto c = scale.colour(t);
    REQUIRE(c.size() == 7);
    const auto part = [&](std::size_t i) { return std::stoi(c.substr(i, 2), nullptr, 16); };
    const double light = 0.2126 * part(1) + 0.7152 * part(3) + 0.0722 * part(5);
    CHECK(light >= before - 0.5);
    before = light;
  }
}

TEST_CASE("the VTK file has the size and the numbers it promises") {
  const solved d(chassis_test::small_case());
  std::istringstream in(chassis::vtk_file(d.system, d.run.x, 1));
  std::string line;
  std::getline(in, line);
  CHECK(line == "# vtk DataFile Version 3.0");
  std::getline(in, line);
  CHECK(line == "B");
  std::getline(in, line);
  CHECK(line == "ASCII");
  std::getline(in, line);
  CHECK(line == "DATASET STRUCTURED_POINTS");
  std::getline(in, line);
  CHECK(line == "DIMENSIONS 8 4 1");
  std::getline(in, line);
  CHECK(line == "ORIGIN 0 0 0");
  std::getline(in, line);
  CHECK(line.rfind("SPACING ", 0) == 0);
  std::getline(in, line);
  CHECK(line == "CELL_DATA 21");
  int fields = 0;
  std::string word, name, type;
  int parts = 0;
  while (in >> word >> name >> type >> parts) {
    REQUIRE(word == "SCALARS");
    CHECK(type == "double");
    CHECK(parts == 1);
    in >> word >> type;
    CHECK(word == "LOOKUP_TABLE");
    for (int i = 0; i < 21; ++i) {
      double value = -1;
      REQUIRE(static_cast<bool>(in >> value));
      if (name.find("temperature") != std::string::npos) {
        CHECK(value > 290);
        CHECK(value < 450);
      }
    }
    ++fields;
  }
  CHECK(in.eof());
  CHECK(fields == 9);
}

TEST_CASE("the JSON report can be read back and its energy adds up") {
  const solved d(awkward_case());
  const auto report = nlohmann::json::parse(chassis::json_report(d.c, d.s, d.run).dump(2));
  const auto& e = report["energy"];
  CHECK(e["out_with_air_W"].get<double>() + e["out_through_walls_W"].get<double>() ==
        doctest::Approx(e["in_W"].get<double>()).epsilon(1e-9));
  CHECK(report["components"].size() == 3);
  CHECK(report["components"][0]["component"] == "U1 & co\x01");
  CHECK(report["components"][1]["limit_C"].is_null());
  CHECK(report["patches"].size() == 13);
  CHECK(report["passages"].size() == 3);
  for (const auto& p : report["patches"]) {
    CHECK(p["film_coefficient_W_m2K"].get<double>() > 0);
    CHECK(p["sentence"] == "a test wall");
  }
}

TEST_CASE("the text report names the hottest component, the energy and the cautions") {
  const solved d(chassis_test::small_case());
  std::ostringstream out;
  chassis::print_report(out, d.c, d.s, d.run);
  const auto text = out.str();
  CHECK(text.find("Hottest component: U1 on A, ") != std::string::npos);
  CHECK(text.find("out minus in") != std::string::npos);
  CHECK(text.find("licensed") != std::string::npos);
  CHECK(text.find("A, front, outlet") != std::string::npos);
}

TEST_CASE("file names are plain") {
  CHECK(chassis::file_name_of("A <b>/../c") == "A-b-c");
  CHECK(chassis::file_name_of("..") == "unnamed");
}

}  // namespace
