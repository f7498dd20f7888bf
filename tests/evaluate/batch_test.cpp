// Batches: a JSON line for every line, good or bad.
#include <doctest/doctest.h>

#include <cmath>
#include <nlohmann/json.hpp>
#include <random>
#include <set>
#include <string>
#include <vector>

#include "../catalogue/expected_rows.hpp"
#include "run_program.hpp"

using evaluate_test::run;
using nlohmann::json;

namespace {

const std::string tube = "cylinder-crossflow/churchill-bernstein-1977";

/// Each output line parsed; checked to have exactly the agreed members.
std::vector<json> batch(const std::string& input) {
  const auto o = run("--batch", input);
  CHECK(o.code == 0);
  CHECK(o.error == "");
  std::vector<json> all;
  for (const std::string& line : o.lines()) {
    CAPTURE(line);
    const json j = json::parse(line, nullptr, false);
    REQUIRE(j.is_object());
    std::set<std::string> members;
    for (const auto& [key, value] : j.items()) members.insert(key);
    CHECK(members == std::set<std::string>{"id", "quantity", "value", "inside", "crossed",
                                           "scatter", "error"});
    const bool ok = j["error"].is_null();
    CHECK(j["id"].is_string());
    CHECK(j["quantity"].is_string());
    CHECK(j["crossed"].is_array());
    CHECK(j["value"].is_number() == ok);
    CHECK(j["inside"].is_boolean() == ok);
    if (ok) CHECK(j["inside"].get<bool>() == j["crossed"].empty());
    CHECK((j["scatter"].is_null() || j["scatter"].is_number()));
    all.push_back(j);
  }
  return all;
}

std::string error_of(const std::string& line) {
  const auto all = batch(line + "\n");
  REQUIRE(all.size() == 1);
  REQUIRE(all[0]["error"].is_string());
  CHECK(all[0]["value"].is_null());
  return all[0]["error"];
}

}  // namespace

TEST_CASE("batch: good lines, bad lines in between, and on") {
  const auto all = batch(tube + " quantity=Nu_D;Re=20000;Pr=0.7\n" +  //
                         "no/such Re=1\n" +                           //
                         tube + " Re=1e9;Pr=0.7\n" +                  //
                         "\n" +                                       //
                         tube + " Re=20000\n" +                       //
                         "annular-gap/aoki-1967 Ta=100;Pr=0.7\r\n" +  //
                         "  " + tube + "  Re = 20000 ; Pr=0.7 ;\n" +  //
                         tube + "\tPr=0.7;Re=20000");
  REQUIRE(all.size() == 7);
  CHECK(all[0]["id"] == tube);
  CHECK(all[0]["quantity"] == "Nu_D");
  CHECK(all[0]["inside"] == true);
  CHECK(all[0]["scatter"] == 0.2);
  CHECK(all[1]["error"].get<std::string>().find("'no/such' is not in the catalogue") !=
        std::string::npos);
  CHECK(all[1]["id"] == "no/such");
  CHECK(all[2]["inside"] == false);
  CHECK(all[2]["crossed"] == json::array({"Re above 1e+07"}));
  CHECK(all[3]["error"] == "Pr: missing; expected Prandtl number");
  CHECK(all[3]["quantity"] == "Nu_D");
  CHECK(all[4]["error"].is_null());
  CHECK(all[4]["scatter"].is_null());         // not stated
  CHECK(all[5]["value"] == all[0]["value"]);  // blanks don't matter
  CHECK(all[6]["value"] == all[0]["value"]);
}

TEST_CASE("batch: each error names the input, its value and what was expected") {
  CHECK(error_of(tube + " Re=1;Pr=x") == "Pr: 'x' is not a finite number");
  CHECK(error_of(tube + " Re=1;Pr=1e999") == "Pr: '1e999' is not a finite number");
  CHECK(error_of(tube + " Re=1;Pr=1;Pr=1") == "Pr: given twice");
  CHECK(error_of(tube + " quantity=Nu_D;quantity=Nu_D;Re=1;Pr=1") == "quantity: given twice");
  CHECK(error_of(tube + " Re=1;Pr=1;Ra=1") == "Ra: not an input of " + tube + "; expected Re, Pr");
  CHECK(error_of(tube + " Re") == "'Re': expected key=value");
  CHECK(error_of(tube + " quantity=Nu_x;Re=1;Pr=1") ==
        "quantity: 'Nu_x' is not given by " + tube + "; expected one of Nu_D");
  CHECK(error_of("round-duct/churchill-ozoe-1973-thermal x_star=0.01;bc=Q").rfind("bc: 'Q'", 0) ==
        0);
  CHECK(error_of("round-duct/gnielinski-laminar-uhf x_star=0.01;entry=thermal").find("several") !=
        std::string::npos);
  // A value that is not finite is an error, never a number.
  CHECK(error_of("round-duct/churchill-ozoe-1973-thermal x_star=0;bc=T").find("not a finite") !=
        std::string::npos);
}

TEST_CASE("batch: fluids") {
  const auto all = batch(
      "fluid/water quantity=mu;T=300;p=3e6\n"
      "fluid/water quantity=mu;T=300\n"
      "fluid/water quantity=mu;T=700;p=1e5\n"
      "fluid/water-if97-r4 quantity=psat;T=300\n"
      "fluid/humid-air quantity=mu;T=300;phi=-0.1\n");
  REQUIRE(all.size() == 5);
  CHECK(all[0]["inside"] == true);
  CHECK(all[0]["quantity"] == "mu");
  CHECK(all[1]["value"] != all[0]["value"]);
  CHECK(all[2]["inside"] == false);
  CHECK(all[2]["crossed"] == json::array({"T above 623.15", "p/p_sat below 0.99975"}));
  // IAPWS R7-97(2012), Table 35
  CHECK(all[3]["value"].get<double>() == doctest::Approx(3536.58941).epsilon(3e-9));
  CHECK(all[3]["scatter"] == 0.00025);
  CHECK(all[4]["crossed"][0] == "phi below 0");
  CHECK(error_of("fluid/air quantity=mu;T=nan") == "T: 'nan' is not a finite number");
  CHECK(error_of("fluid/air quantity=mu;p=1e5") == "T: missing; expected temperature, K");
}

TEST_CASE("batch: the example of every row") {
  std::string input;
  for (const expected::row& row : expected::rows) {
    input += std::string(row.id) + " quantity=" + row.quantity;
    if (*row.example != 0) input += std::string(";") + row.example;
    input += "\n";
  }
  const auto all = batch(input);
  REQUIRE(all.size() == std::size(expected::rows));
  std::size_t i = 0;
  for (const expected::row& row : expected::rows) {
    const json& j = all[i++];
    CAPTURE(j.dump());
    CHECK(j["id"] == row.id);
    CHECK(j["quantity"] == row.quantity);
    CHECK(j["error"].is_null());
  }
}

TEST_CASE("batch: numbers come back to the last bit") {
  const auto all = batch("annular-gap/aoki-1967 Ta=100;Pr=1\n");
  CHECK(all[0]["value"].get<double>() == doctest::Approx(4.4).epsilon(1e-15));
}

TEST_CASE("batch: whatever the lines hold, as many answers as lines") {
  std::mt19937 random(7);
  std::string input;
  constexpr int lines = 400;
  for (int i = 0; i < lines; ++i) {
    std::string line = random() % 3 == 0 ? tube + " " : "x";
    const auto length = random() % 40;
    for (unsigned k = 0; k < length; ++k) {
      const char c = static_cast<char>(random() % 256);
      if (c != '\n') line += c;
    }
    input += line + "\n";
  }
  CHECK(batch(input).size() == lines);
}

TEST_CASE("batch: no lines, and one without an end") {
  CHECK(batch("").empty());
  CHECK(batch("\n\n \t\r\n").empty());
  CHECK(batch(tube + " Re=1;Pr=1").size() == 1);
}
