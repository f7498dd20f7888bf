// Every fault of a case file gives one message: the place, what stands there, what was expected.
#include <doctest/doctest.h>

#include <nlohmann/json.hpp>
#include <string>

#include "case/case_error.hpp"
#include "case/csv_text.hpp"
#include "case/json_text.hpp"
#include "case/read_components.hpp"
#include "options.hpp"
#include "small_case.hpp"

namespace {

using nlohmann::json;

std::string message_of(const std::string& text) {
  try {
    chassis::read_case_text(text, "box.json", ".");
  } catch (const chassis::case_error& fault) {
    return fault.what();
  }
  return "";
}

// The small case with one value set (or, without a value, taken away).
std::string changed(const std::string& place, const json& value) {
  auto root = json::parse(chassis_test::small_case_text);
  root[json::json_pointer(place)] = value;
  return message_of(root.dump());
}

std::string without(const std::string& place, const std::string& key) {
  auto root = json::parse(chassis_test::small_case_text);
  root[json::json_pointer(place)].erase(key);
  return message_of(root.dump());
}

std::string csv_message(const std::string& text) {
  try {
    chassis::components_from_csv(text, "parts.csv", "/boards/0/components_csv");
  } catch (const chassis::case_error& fault) {
    return fault.what();
  }
  return "";
}

TEST_CASE("the small case itself is accepted") {
  CHECK(message_of(chassis_test::small_case_text) == "");
}

TEST_CASE("missing keys") {
  CHECK(without("", "ambient") == "/ambient: missing; expected an object");
  CHECK(without("/ambient", "pressure_Pa") ==
        "/ambient/pressure_Pa: missing; expected 10000 to 200000 (pascal, not bar)");
  CHECK(without("/boards/1/components/0", "power_W") ==
        "/boards/1/components/0/power_W: missing; expected >= 0");
  CHECK(without("/boards/0", "components") ==
        "/boards/0/components: missing; expected a list, or a file named in components_csv");
  CHECK(without("/boards/1/layers/0", "fill_conductivity_W_mK") ==
        "/boards/1/layers/0/fill_conductivity_W_mK: missing; expected 0.01 to 5000 (W/(m K))");
}

TEST_CASE("unknown keys") {
  CHECK(changed("/ambient/temprature_C", 20) ==
        "/ambient/temprature_C: unknown key; expected one of temperature_C, pressure_Pa, "
        "outer_air_speed_m_s");
  CHECK(changed("/fan/a~1b", 1) == "/fan/a~1b: unknown key; expected one of count, points");
}

TEST_CASE("numbers outside what makes sense") {
  CHECK(changed("/boards/0/components/1/power_W", -3) ==
        "/boards/0/components/1/power_W: -3 is negative; expected >= 0");
  CHECK(changed("/boards/0/components/1/width_mm", -8) ==
        "/boards/0/components/1/width_mm: -8 is negative; expected > 0");
  CHECK(changed("/boards/0/components/1/width_mm", 0) ==
        "/boards/0/components/1/width_mm: 0 is not positive; expected > 0");
  CHECK(changed("/enclosure/length_mm", -120) ==
        "/enclosure/length_mm: -120 is negative; expected 5 to 5000 (millimetres, not metres)");
  CHECK(changed("/enclosure/length_mm", 0.12) ==
        "/enclosure/length_mm: 0.12 is too small; expected 5 to 5000 (millimetres, not metres)");
  CHECK(changed("/boards/0/mesh/along", 6.5) ==
        "/boards/0/mesh/along: 6.5 is not a whole number; expected 2 to 400 (cells)");
  CHECK(changed("/boards/0/mesh/along", 100000) ==
        "/boards/0/mesh/along: 100000 is too large; expected 2 to 400 (cells)");
  CHECK(changed("/outer_walls/0/emissivity", 90) ==
        "/outer_walls/0/emissivity: 90 is too large; expected 0 to 1 (a fraction)");
}

TEST_CASE("unit mistakes") {
  CHECK(changed("/ambient/temperature_C", -300) ==
        "/ambient/temperature_C: -300 is below absolute zero; expected -60 to 100 (degrees "
        "Celsius)");
  CHECK(changed("/ambient/temperature_C", 298.15) ==
        "/ambient/temperature_C: 298.15 is too large; expected -60 to 100 (degrees Celsius, not "
        "kelvin)");
  CHECK(changed("/ambient/pressure_Pa", 1.013) ==
        "/ambient/pressure_Pa: 1.013 is too small; expected 10000 to 200000 (pascal, not bar)");
}

TEST_CASE("values of the wrong sort") {
  CHECK(changed("/boards/0/components/0/power_W", "5 W") ==
        "/boards/0/components/0/power_W: \"5 W\" is not a number; expected >= 0");
  CHECK(changed("/boards/0/name", 7) ==
        "/boards/0/name: 7 is not a text; expected a text in quotes");
  CHECK(changed("/boards", 7) == "/boards: 7 is not a list; expected a list of at least 1 item");
  CHECK(changed("/boards", json::array()) ==
        "/boards: the list has 0 items; expected a list of at least 1 item");
  CHECK(changed("/fan", 3) == "/fan: 3 stands here; expected an object");
  CHECK(changed("/enclosure/flow_direction", "down") ==
        "/enclosure/flow_direction: \"down\" is unknown; expected \"horizontal\" or \"upward\"");
  CHECK(message_of("[]") == "/: a list stands here; expected an object");
}

TEST_CASE("components in the wrong place") {
  CHECK(changed("/boards/0/components/1/x_mm", 110) ==
        "/boards/0/components/1: component \"U2\" ends at x = 130 mm, off the board; expected <= "
        "120 mm");
  CHECK(changed("/boards/0/components/0/y_mm", 61) ==
        "/boards/0/components/0: component \"U1\" ends at y = 91 mm, off the board; expected <= "
        "90 mm");
  auto root = json::parse(chassis_test::small_case_text);
  root["/boards/0/components/1/side"_json_pointer] = "front";
  root["/boards/0/components/1/x_mm"_json_pointer] = 49;
  CHECK(message_of(root.dump()) ==
        "/boards/0/components/1: component \"U2\" overlaps \"U1\" (/boards/0/components/0); "
        "expected components apart on each face");
  root["/boards/0/components/1/x_mm"_json_pointer] = 50;  // edges may touch
  CHECK(message_of(root.dump()) == "");
  CHECK(changed("/boards/0/components/1/name", "U1") ==
        "/boards/0/components/1/name: \"U1\" is also the name of /boards/0/components/0; expected "
        "a name of its own on this board");
}

TEST_CASE("things that do not fit together") {
  CHECK(changed("/boards/1/length_mm", 150) ==
        "/boards/1/length_mm: 150 is too large; expected 5 to 120 (within "
        "/enclosure/length_mm)");
  CHECK(changed("/boards/1/name", "A") ==
        "/boards/1/name: \"A\" is also the name of /boards/0; expected a name of its own");
  auto root = json::parse(chassis_test::small_case_text);
  root["passages"].erase(2);
  CHECK(message_of(root.dump()) ==
        "/passages: 2 passages for 2 boards; expected 3, one behind, between and in front of the "
        "boards");
}

TEST_CASE("nothing that moves the air") {
  auto root = json::parse(chassis_test::small_case_text);
  root.erase("fan");
  CHECK(message_of(root.dump()) == "");  // buoyancy moves it
  root["/enclosure/flow_direction"_json_pointer] = "horizontal";
  CHECK(message_of(root.dump()) ==
        "/fan: missing, and horizontal passages have no buoyancy to move the air; expected a fan "
        "curve, or /enclosure/flow_direction \"upward\"");
  root["/enclosure/flow_direction"_json_pointer] = "upward";
  for (auto& b : root["boards"]) {
    for (auto& part : b["components"]) part["power_W"] = 0;
  }
  CHECK(message_of(root.dump()) ==
        "/boards: all power is 0 W and there is no fan, so no air moves; expected some power_W > "
        "0 or a fan");
}

TEST_CASE("fan curves") {
  CHECK(changed("/fan/points/0/flow_m3_h", 1) ==
        "/fan/points/0/flow_m3_h: 1 starts the curve; expected 0, the pressure at no flow");
  CHECK(changed("/fan/points/2/flow_m3_h", 8) ==
        "/fan/points/2/flow_m3_h: 8 does not grow; expected > 8");
  CHECK(changed("/fan/points/2/pressure_Pa", 15) ==
        "/fan/points/2/pressure_Pa: 15 does not fall; expected < 14");
  CHECK(changed("/fan/points", json::array({{{"flow_m3_h", 0}, {"pressure_Pa", 5}}})) ==
        "/fan/points: the list has 1 item; expected a list of at least 2 items");
}

TEST_CASE("text that is not JSON") {
  CHECK(message_of("{\n  \"name\": \"x\",\n  oops\n}")
            .rfind("box.json, line 3, column 3: not valid JSON; ", 0) == 0);
  CHECK(message_of("").rfind("box.json, line 1, column 1: not valid JSON; ", 0) == 0);
  CHECK(message_of("{\"name\": 1e999}").rfind("box.json: not valid JSON; ", 0) == 0);
  CHECK(message_of("{\"name\": \"a\", \"fan\": {\"count\": 1, \"points\": [1, {\"p\": 2, \"p\": "
                   "3}]}}") == "/fan/points/1/p: this key stands twice; expected it once");
  for (const char* text : {"", "{", "{\n\n\"a\": }", "nul", "{\"name\": 1e999}"}) {
    CHECK(message_of(text).find('\n') == std::string::npos);
  }
}

TEST_CASE("component lists as CSV") {
  const std::string header = "name,x_mm,y_mm,length_mm,width_mm,power_W,limit_C\n";
  const auto parts = chassis::components_from_csv(
      header + "\n\"U1, big\",1,2,3,4,0.5,90\r\nU2,10,2,3,4,1,\n", "parts.csv", "/here");
  REQUIRE(parts.size() == 2);
  CHECK(parts[0].part.name == "U1, big");
  CHECK(parts[0].part.at.width == doctest::Approx(0.004));
  CHECK(*parts[0].part.limit_K == doctest::Approx(363.15));
  CHECK_FALSE(parts[1].part.limit_K);

  CHECK(csv_message(header + "U1,1,2,3,4,-3,90\n") ==
        "/boards/0/components_csv (parts.csv, line 2)/power_W: -3 is negative; expected >= 0");
  CHECK(csv_message(header + "U1,1,2,3,4,0.5,90\nU2,1,2,3,4,much,90\n") ==
        "/boards/0/components_csv (parts.csv, line 3)/power_W: \"much\" is not a number; expected "
        "a number such as 2.5");
  for (const char* odd : {"nan", "inf", "0x10", "1e999"}) {
    CHECK(csv_message(header + "U1,1,2,3,4," + odd + ",90\n") ==
          "/boards/0/components_csv (parts.csv, line 2)/power_W: \"" + std::string(odd) +
              "\" is not a number; expected a number such as 2.5");
  }
  CHECK(csv_message(header + "U1,1,2,3,4\n") ==
        "/boards/0/components_csv (parts.csv, line 2): 5 fields; expected 7 as in the header");
  CHECK(csv_message(header + "U1,1,2,3,4,,90\n") ==
        "/boards/0/components_csv (parts.csv, line 2)/power_W: missing; expected >= 0");
  CHECK(csv_message("name,power\nU1,2\n")
            .rfind("/boards/0/components_csv (parts.csv, line 2)/power: unknown key; ", 0) == 0);
  CHECK(csv_message("name,name\n") ==
        "/boards/0/components_csv (parts.csv, line 1): column name stands twice; expected it once");
  CHECK(csv_message("") ==
        "/boards/0/components_csv (parts.csv, line 1): the file is empty; expected a header line");
  CHECK(csv_message(header + "\"U1,1,2\n") ==
        "/boards/0/components_csv (parts.csv), line 2: a quote is opened and never closed; "
        "expected a closing \"");
  auto root = json::parse(chassis_test::small_case_text);
  root["/boards/0/components_csv"_json_pointer] = "no-such.csv";
  CHECK(message_of(root.dump()) ==
        "/boards/0/components_csv: \"no-such.csv\" cannot be read; expected a CSV file beside the "
        "case");
}

TEST_CASE("the command line") {
  const auto fault_of = [](const std::vector<std::string>& words) -> std::string {
    try {
      chassis::read_options(words);
    } catch (const chassis::case_error& fault) {
      return fault.what();
    }
    return "";
  };
  CHECK(fault_of({"a.json", "--out", "there", "--frozen-films", "--refine", "2"}) == "");
  CHECK(fault_of({"--fast"}) ==
        "--fast: unknown option; expected --out, --frozen-films, --refine or --help");
  CHECK(fault_of({"--out"}) == "--out: nothing follows; expected a folder");
  CHECK(fault_of({"--refine", "0"}) ==
        "--refine: \"0\" is not accepted; expected a whole number from 1 to 8");
  CHECK(fault_of({"a.json", "b.json"}) == "\"b.json\": a second case file; expected one case file");
}

}  // namespace
