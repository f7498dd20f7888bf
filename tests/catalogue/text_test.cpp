// The catalogue as JSON and as Markdown.
#include "convelope/catalogue/text.hpp"

#include <doctest/doctest.h>

#include <cstdlib>
#include <nlohmann/json.hpp>
#include <sstream>
#include <string>

#include "convelope/catalogue/catalogue.hpp"
#include "convelope/catalogue/fluids.hpp"

using namespace convelope;
using catalogue::all;
using nlohmann::json;

TEST_CASE("json: parses, and says of each entry what the entry says") {
  const json list = json::parse(catalogue::to_json(all::entries), nullptr, false);
  REQUIRE(list.is_array());
  REQUIRE(list.size() == static_cast<std::size_t>(all::count));
  for (std::size_t i = 0; i < list.size(); ++i) {
    const correlation_info& c = *all::entries[i].info;
    const json& j = list[i];
    CAPTURE(std::string(c.id));
    CHECK(j["id"] == c.id);
    CHECK(j["quantity"] == c.quantity);
    CHECK(j["gives"] == c.gives);
    CHECK(j["note"] == c.source->note);
    CHECK(j["properties"] == words(c.state_at));
    CHECK(j["constants"] == words(c.source->constants));
    CHECK(j["source"].get<std::string>().find(c.source->where) != std::string::npos);
    CHECK(j["scatter"].is_null() == (c.scatter < 0.0));
    if (c.scatter >= 0.0) CHECK(j["scatter"].get<double>() == doctest::Approx(c.scatter));

    REQUIRE(j["inputs"].size() == static_cast<std::size_t>(c.input_count));
    for (int k = 0; k < c.input_count; ++k) {
      const json& in = j["inputs"][static_cast<std::size_t>(k)];
      CHECK(in["key"] == c.inputs[k].key);
      CHECK(in["optional"] == c.inputs[k].optional);
      CHECK(in.contains("choices") == (c.inputs[k].choices != nullptr));
      if (c.inputs[k].choices != nullptr) CHECK(in["choices"][0] == c.inputs[k].choices[0]);
    }
    REQUIRE(j["envelope"].size() == static_cast<std::size_t>(c.limit_count));
    for (int k = 0; k < c.limit_count; ++k) {
      const json& l = j["envelope"][static_cast<std::size_t>(k)];
      CHECK(l["of"] == c.limits[k].symbol);
      CHECK(l["low"].is_null() == (c.limits[k].low == -unbounded));
      CHECK(l["high"].is_null() == (c.limits[k].high == unbounded));
      if (!l["high"].is_null()) {
        CHECK(l["high"].get<double>() == doctest::Approx(c.limits[k].high).epsilon(1e-5));
      }
    }
  }
}

TEST_CASE("json: text with quotes, backslashes and control characters") {
  for (const std::string& text :
       {std::string("a \"b\" \\ c"), std::string("tab\tline\nend\x01"), std::string("Ž 50 °C")}) {
    const json j = json::parse(catalogue::detail::json_string(text), nullptr, false);
    REQUIRE(j.is_string());
    CHECK(j.get<std::string>() == text);
  }
}

TEST_CASE("markdown: a section per entry") {
  const std::string page = catalogue::to_markdown(all::entries);
  std::istringstream lines(page);
  int sections = 0;
  for (std::string line; std::getline(lines, line);) {
    if (line.rfind("### ", 0) == 0) ++sections;
  }
  CHECK(sections == all::count);
  for (const catalogue::entry& e : all::entries) {
    const correlation_info& c = *e.info;
    CAPTURE(std::string(c.id));
    const std::string heading = "### " + std::string(c.id) + " (" + c.quantity + ")\n";
    const auto begin = page.find(heading);
    REQUIRE(begin != std::string::npos);
    CHECK(page.find(heading, begin + 1) == std::string::npos);
    const std::string section = page.substr(begin, page.find("\n### ", begin) - begin);
    for (int k = 0; k < c.input_count; ++k) {
      CHECK(section.find("`" + std::string(c.inputs[k].key) + "`") != std::string::npos);
    }
    for (int k = 0; k < c.limit_count; ++k) {
      CHECK(section.find(c.limits[k].symbol) != std::string::npos);
    }
    CHECK(section.find(c.source->where) != std::string::npos);
    CHECK(section.find(words(c.source->constants)) != std::string::npos);
    CHECK((section.find("Scatter: not stated") != std::string::npos) == (c.scatter < 0.0));
    CHECK((section.find("- Note: ") != std::string::npos) == (*c.source->note != 0));
  }
}

TEST_CASE("fluids as JSON: what the entry says, and no word on where properties are taken") {
  using catalogue::all_fluids;
  const json list = json::parse(catalogue::to_json(all_fluids), nullptr, false);
  REQUIRE(list.is_array());
  REQUIRE(list.size() == all_fluids.size());
  for (std::size_t i = 0; i < list.size(); ++i) {
    const correlation_info& c = *all_fluids[i].info;
    const json& j = list[i];
    CAPTURE(std::string(c.id));
    CHECK(j["id"] == c.id);
    CHECK(j["quantity"] == c.quantity);
    CHECK(j["gives"] == c.gives);
    CHECK(j["properties"].is_null());
    CHECK(j["inputs"].size() == static_cast<std::size_t>(c.input_count));
    CHECK(j["envelope"].size() == static_cast<std::size_t>(c.limit_count));
    CHECK(j["source"].get<std::string>().find(" 0,") == std::string::npos);
  }
}

TEST_CASE("fluids as Markdown: each property once, in a section of its formulation") {
  using catalogue::all_fluids;
  const std::string page = catalogue::to_markdown(all_fluids);
  std::size_t rows = 0;
  for (std::size_t at = page.find("| `"); at != std::string::npos; at = page.find("| `", at + 1)) {
    ++rows;
  }
  CHECK(rows == all_fluids.size());
  for (const catalogue::entry& e : all_fluids) {
    const correlation_info& c = *e.info;
    const std::string row = std::string("| `") + c.quantity + "` | " + c.gives + " | ";
    CAPTURE(std::string(c.id));
    CAPTURE(row);
    // Of the sections of this id, one holds the row with the inputs, limits and source.
    int found = 0;
    const std::string heading = std::string("### ") + c.id + " (";
    for (std::size_t at = page.find(heading); at != std::string::npos;
         at = page.find(heading, at + 1)) {
      const std::string section = page.substr(at, page.find("\n### ", at) - at);
      if (section.find(row) == std::string::npos) continue;
      ++found;
      CHECK(section.find(c.source->where) != std::string::npos);
      for (int k = 0; k < c.input_count; ++k) {
        CHECK(section.find("`" + std::string(c.inputs[k].key) + "` ") != std::string::npos);
      }
      for (int k = 0; k < c.limit_count; ++k) {
        CHECK(section.find(std::string(c.limits[k].symbol) + " " +
                           detail::range_text(c.limits[k])) != std::string::npos);
      }
    }
    CHECK(found == 1);
  }
}
