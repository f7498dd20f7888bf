// One correlation from the command line, and the lists.
#include <doctest/doctest.h>

#include <fstream>
#include <iterator>
#include <nlohmann/json.hpp>
#include <string>

#include "convelope/catalogue/catalogue.hpp"
#include "convelope/catalogue/fluids.hpp"
#include "run_program.hpp"

using convelope::catalogue::all;
using convelope::catalogue::all_fluids;
using evaluate_test::run;

namespace {

const std::string tube = "cylinder-crossflow/churchill-bernstein-1977";
constexpr std::size_t everything = static_cast<std::size_t>(all::count) + all_fluids.size();

bool has(const std::string& text, const std::string& part) {
  return text.find(part) != std::string::npos;
}

void complains(const std::string& arguments, const std::string& message) {
  CAPTURE(arguments);
  const auto o = run(arguments);
  CAPTURE(o.error);
  CHECK(o.code == 2);
  CHECK(o.out == "");
  CHECK(o.error.rfind("evaluate: " + message, 0) == 0);
}

}  // namespace

TEST_CASE("evaluate: one value with its verdict, scatter and source") {
  const auto o = run(tube + " Re=20000 Pr=0.7");
  CHECK(o.code == 0);
  CHECK(o.error == "");
  // Churchill and Bernstein by hand: 0.3 + 0.62 sqrt(2e4) 0.7^(1/3)/(1.1288...)(...)
  const double low =
      0.62 * std::sqrt(2e4) * std::cbrt(0.7) / std::pow(1.0 + std::pow(0.4 / 0.7, 2.0 / 3.0), 0.25);
  const double Nu = 0.3 + low * std::pow(1.0 + std::pow(2e4 / 282000.0, 0.625), 0.8);
  REQUIRE(o.out.rfind("Nu_D = ", 0) == 0);
  CHECK(std::stod(o.out.substr(7)) == doctest::Approx(Nu).epsilon(1e-10));
  CHECK(has(o.out, "Inside every stated range."));
  CHECK(has(o.out, "Scatter: +-20 %"));
  CHECK(has(o.out, "film temperature"));
  CHECK(has(o.out, "J. Heat Transfer 99, 300-306"));

  const auto outside = run(tube + " Re=2e8 Pr=0.7");
  CHECK(outside.code == 0);
  CHECK(has(outside.out, "Re is above its range"));
  CHECK_FALSE(has(outside.out, "Inside"));
}

TEST_CASE("evaluate: quantity where an id gives several, choices, defaults") {
  const auto o = run("round-duct/gnielinski-laminar-uwt quantity=Nu_m x_star=0.01 entry=thermal");
  CHECK(o.code == 0);
  CHECK(o.out.rfind("Nu_m = ", 0) == 0);
  complains("round-duct/gnielinski-laminar-uwt x_star=0.01 entry=thermal",
            "quantity: missing; round-duct/gnielinski-laminar-uwt gives several; expected one of "
            "Nu_x, Nu_m");
  complains("round-duct/gnielinski-laminar-uwt quantity=Nu x_star=0.01 entry=thermal",
            "quantity: 'Nu' is not given by round-duct/gnielinski-laminar-uwt; expected one of "
            "Nu_x, Nu_m");
  complains("round-duct/gnielinski-laminar-uwt quantity=Nu_m x_star=0.01 entry=thermic",
            "entry: 'thermic' is not a choice; expected thermal or combined");
}

TEST_CASE("evaluate: a property of a fluid, with its unit and without talk of correlations") {
  const auto o = run("fluid/water-if97-r1 quantity=cp T=300 p=3e6");
  CHECK(o.code == 0);
  CHECK(o.error == "");
  // IAPWS R7-97(2012), Table 5
  REQUIRE(o.out.rfind("cp = ", 0) == 0);
  CHECK(std::stod(o.out.substr(5)) == doctest::Approx(4173.01218).epsilon(1e-9));
  CHECK(has(o.lines()[0], " J/(kg K)  (specific heat at constant pressure)"));
  CHECK(has(o.out, "Inside every stated range."));
  CHECK(has(o.out, "Uncertainty: +-0.3 %"));
  CHECK(has(o.out, "R7-97(2012)"));
  CHECK_FALSE(has(o.out, "Scatter"));
  CHECK_FALSE(has(o.out, "Properties"));

  CHECK(has(run("fluid/water quantity=Pr T=300").lines()[0], "  (Prandtl number)"));
  const auto fitted = run("fluid/nak78 quantity=rho_linear T=400");
  CHECK(has(fitted.out, "Source: fitted here, to"));

  const auto hot = run("fluid/water quantity=rho T=400 p=1e5");
  CHECK(hot.code == 0);
  CHECK(has(hot.out, "p/p_sat is below its range"));
  CHECK_FALSE(has(hot.out, "Inside"));
  // The pressure may be left out, a mixture's parameter may not.
  CHECK(run("fluid/air quantity=mu T=300").out == run("fluid/air quantity=mu T=300 p=101325").out);
  complains("fluid/seawater quantity=mu T=300",
            "S: missing; expected salinity, g of salt per kg of seawater");
  complains("fluid/air T=300",
            "quantity: missing; fluid/air gives several; expected one of rho, cp, k, mu, beta, Pr");
  complains("fluid/air quantity=psat T=300",
            "quantity: 'psat' is not given by fluid/air; expected one of rho, cp, k, mu, beta, Pr");
  complains("fluid/air quantity=mu T=300 S=1",
            "S: not an input of fluid/air; expected T, p (optional)");
  complains("fluid/watr quantity=mu T=300", "id: 'fluid/watr' is not in the catalogue");
  complains("fluid/air quantity=mu T=hot", "T: 'hot' is not a finite number");
}

TEST_CASE("evaluate: bad arguments end with 2 and one line that says which") {
  complains("no/such Re=1", "id: 'no/such' is not in the catalogue");
  complains(tube + " Re=1", "Pr: missing; expected Prandtl number");
  complains(tube + " Re=1 Pr=0.7 x=3", "x: not an input of " + tube + "; expected Re, Pr");
  complains(tube + " Re=1 Pr=0.7 Re=2", "Re: given twice");
  for (const std::string bad :
       {"abc", "1,5", "0.7x", "nan", "inf", "-inf", "1e999", "+-1", "", "+", "0x10", "1e"}) {
    complains(tube + " Re=1 Pr=" + bad, "Pr: '" + bad + "' is not a finite number");
  }
  complains(tube + " Re=1 Pr", "'Pr': expected key=value");
  complains(tube + " Re=1 =0.7", "'=0.7': expected key=value");
  complains("--lst", "'--lst' is not an option");
  complains("--batch now", "'--batch' is not an option");
  CHECK(run(tube + " Re=+1e4 Pr=.7").code == 0);
}

TEST_CASE("evaluate: lists") {
  const auto whole = run("--list");
  CHECK(whole.code == 0);
  CHECK(whole.lines().size() == everything);
  const auto spheres = run("--list sphere/");
  CHECK(spheres.lines().size() >= 5);
  for (const std::string& line : spheres.lines()) {
    CHECK(line.rfind("sphere/", 0) == 0);
    CHECK(has(line, "  quantity="));
  }
  CHECK(has(spheres.out, "sphere/whitaker-1972  quantity=Nu_D  Re;Pr;mu_ratio?"));
  const auto fluids = run("--list fluid/");
  CHECK(fluids.lines().size() == all_fluids.size());
  for (const std::string& line : fluids.lines()) CHECK(line.rfind("fluid/", 0) == 0);
  CHECK(has(fluids.out, "fluid/humid-air  quantity=mu  T;p?;phi"));
  CHECK(run("--list no-such-part").out == "");
  CHECK(has(run("").out, "--batch"));
  CHECK(has(run("--help").out, "--batch"));
}

TEST_CASE("evaluate: the catalogue as documents") {
  const auto list = nlohmann::json::parse(run("--json").out, nullptr, false);
  REQUIRE(list.is_array());
  CHECK(list.size() == everything);
  const auto page = run("--markdown");
  CHECK(page.code == 0);
  CHECK(has(page.out, "### " + tube + " (Nu_D)"));
  CHECK(has(page.out, "### fluid/water (rho, cp, k, mu, beta, Pr)"));
  CHECK(has(page.out, "### fluid/sodium (psat)"));
}

TEST_CASE("evaluate: docs/catalogue.md is what the program writes") {
  std::ifstream file(CONVELOPE_SOURCE_DIR "/docs/catalogue.md");
  const std::string stored((std::istreambuf_iterator<char>(file)), {});
  CHECK_MESSAGE(stored == run("--markdown").out,
                "write it anew: evaluate --markdown > docs/catalogue.md");
}
