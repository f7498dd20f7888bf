// Liquids against another spelling of their sources' equations, in 40 digits: a coefficient that is
// off in any digit that matters fails.
#include <doctest/doctest.h>

#include <string>
#include <string_view>

#include "close_to.hpp"
#include "convelope/fluids/engine_oil.hpp"
#include "convelope/fluids/ethylene_glycol.hpp"
#include "convelope/fluids/glycol_water.hpp"
#include "convelope/fluids/liquid_metals.hpp"
#include "convelope/fluids/seawater.hpp"
#include "convelope/fluids/solar_salt.hpp"

using namespace convelope;

namespace {
struct pinned {
  std::string_view fluid;  // with mass percent, or g/kg
  double T;
  fluid_values<double> expected;
};
constexpr pinned rows[] = {
    {"ethylene 12",
     270.0,
     {1.016861923585203e+03, 4.002065863302765e+03, 5.106834026849115e-01, 2.787076039219910e-03,
      5.893937225684526e-05}},
    {"propylene 12",
     270.0,
     {1.011523923140688e+03, 4.030674355820901e+03, 5.020571226471605e-01, 3.387747235492241e-03,
      3.677633547557007e-05}},
    {"ethylene 12",
     305.0,
     {1.009751151715513e+03, 4.029204842493640e+03, 5.586951323039875e-01, 1.000185272137003e-03,
      3.355589288767475e-04}},
    {"propylene 12",
     305.0,
     {1.004046037649327e+03, 4.073648906019402e+03, 5.477044711530173e-01, 1.123213620246028e-03,
      3.675958976434483e-04}},
    {"ethylene 12",
     360.0,
     {9.810714349234199e+02, 4.097516615751432e+03, 6.113691665590083e-01, 4.103628771531757e-04,
      6.986090373103515e-04}},
    {"propylene 12",
     360.0,
     {9.749854906306731e+02, 4.162313540476734e+03, 6.007639217733882e-01, 4.326026829250842e-04,
      6.520574747120969e-04}},
    {"ethylene 45",
     270.0,
     {1.068921252858652e+03, 3.302938734670165e+03, 3.907916361097622e-01, 7.780642333421619e-03,
      3.640399480312031e-04}},
    {"propylene 45",
     270.0,
     {1.048536844052353e+03, 3.538961552423689e+03, 3.667662012148802e-01, 1.848748592952708e-02,
      4.519207340153579e-04}},
    {"ethylene 45",
     305.0,
     {1.052190435331150e+03, 3.470116622032695e+03, 4.149684161138402e-01, 2.276437498006897e-03,
      5.318551769488431e-04}},
    {"propylene 45",
     305.0,
     {1.028442005051616e+03, 3.662723835849947e+03, 3.862157359321075e-01, 3.292678021344282e-03,
      6.411902556554094e-04}},
    {"ethylene 45",
     360.0,
     {1.015983274806765e+03, 3.680811003732917e+03, 4.517267377839806e-01, 7.784101254762305e-04,
      7.273498693172039e-04}},
    {"propylene 45",
     360.0,
     {9.881344729543509e+02, 3.853300787607276e+03, 4.194002488874577e-01, 8.635716834414445e-04,
      7.785129588321596e-04}},
    {"seawater 35",
     280.0,
     {1.027374813551608e+03, 3.994361028441228e+03, 5.812176635518296e-01, 1.530670399973816e-03,
      1.198212539864316e-04}},
    {"seawater 35",
     330.0,
     {1.010597670892416e+03, 4.013649605710531e+03, 6.456462439965100e-01, 5.330744076643375e-04,
      5.036320857976850e-04}},
    {"seawater 35",
     430.0,
     {9.379461406610332e+02, 4.148680866021140e+03, 6.801277520758267e-01, 1.896523105996937e-04,
      9.890881059332573e-04}},
    {"seawater 120",
     280.0,
     {1.094445770996459e+03, 3.604613621747563e+03, 5.764029560965332e-01, 1.875824235303744e-03,
      2.503794417484131e-04}},
    {"seawater 120",
     330.0,
     {1.073226701545784e+03, 3.652251531656494e+03, 6.417289618279344e-01, 6.651674230142009e-04,
      5.052274613369501e-04}},
    {"seawater 120",
     430.0,
     {1.004465121790183e+03, 3.757866861742828e+03, 6.785362153439471e-01, 2.418334963848587e-04,
      8.389222830845339e-04}},
    {"engine-oil",
     285.0,
     {8.925119620000000e+02, 1.844733620000000e+03, 1.454151118500000e-01, 1.483309740558861e+00,
      6.634698751522167e-04}},
    {"engine-oil",
     360.0,
     {8.481003520000000e+02, 2.165512520000000e+03, 1.381555251000000e-01, 2.540873224547978e-02,
      6.982131284388384e-04}},
    {"ethylene-glycol",
     285.0,
     {1.122187271500000e+03, 2.346861470000000e+03, 2.465893912250000e-01, 3.193156373287057e-02,
      6.086906502574780e-04}},
    {"ethylene-glycol",
     360.0,
     {1.070957404000000e+03, 2.682888320000000e+03, 2.621752676000000e-01, 2.761662905218212e-03,
      6.378077199417728e-04}},
    {"mercury",
     285.0,
     {1.356647304212014e+04, 1.398844625789500e+02, 8.339250122145000e+00, 1.607537975967423e-03,
      1.800828425985544e-04}},
    {"mercury",
     550.0,
     {1.293409790075590e+04, 1.351951130950000e+02, 1.146103590450000e+01, 9.526120336745315e-04,
      1.801082309552061e-04}},
    {"sodium",
     450.0,
     {9.081661632090298e+02, 1.352062253395062e+03, 8.355966275000000e+01, 4.899392852709820e-04,
      2.452955292925520e-04}},
    {"sodium",
     1300.0,
     {7.060817977706002e+02, 1.306902130769231e+03, 4.403206600000000e+01, 1.433532491680921e-04,
      3.644188737034407e-04}},
    {"sodium",
     1900.0,
     {5.365937532965841e+02, 1.654291124930748e+03, 2.657258200000000e+01, 1.077535099103886e-04,
      5.926681192875025e-04}},
    {"nak78",
     400.0,
     {8.420788539795459e+02, 9.300192667384860e+02, 2.367179470500000e+01, 4.662266769962063e-04,
      2.660952309691981e-04}},
    {"nak78",
     900.0,
     {7.258194999883190e+02, 8.747606242984861e+02, 2.573109470500000e+01, 1.622975854728349e-04,
      3.309960733037016e-04}},
    {"lead",
     650.0,
     {1.060932500000000e+04, 1.471167994082840e+02, 1.635000000000000e+01, 2.356453005266413e-03,
      1.206014520245162e-04}},
    {"lead",
     1050.0,
     {1.009752500000000e+04, 1.401487870748299e+02, 2.075000000000000e+01, 1.259402469675175e-03,
      1.267142195736084e-04}},
    {"lbe",
     650.0,
     {1.022455000000000e+04, 1.433919600591716e+02, 1.282063750000000e+01, 1.576069491980177e-03,
      1.264603332175988e-04}},
    {"lbe",
     1050.0,
     {9.707350000000000e+03, 1.367976445578231e+02, 1.772123750000000e+01, 1.013055198992261e-03,
      1.331980406599123e-04}},
    {"solar-salt",
     560.0,
     {1.907563400000000e+03, 1.492338200000000e+03, 4.975015000000000e-01, 3.581673600810975e-03,
      3.334096261230426e-04}},
    {"solar-salt",
     850.0,
     {1.723123400000000e+03, 1.542218200000000e+03, 5.526015000000000e-01, 1.100158498255975e-03,
      3.690971871196224e-04}},
};

fluid_values<double> values(std::string_view fluid, double T) {
  const double p = 101325.0;
  if (fluid == "ethylene 12") return ethylene_glycol_water(mass_fraction(0.12)).values(T, p);
  if (fluid == "ethylene 45") return ethylene_glycol_water(mass_fraction(0.45)).values(T, p);
  if (fluid == "propylene 12") return propylene_glycol_water(mass_fraction(0.12)).values(T, p);
  if (fluid == "propylene 45") return propylene_glycol_water(mass_fraction(0.45)).values(T, p);
  if (fluid == "seawater 35") return seawater{salinity(0.035)}.values(T, p);
  if (fluid == "seawater 120") return seawater{salinity(0.12)}.values(T, p);
  if (fluid == "engine-oil") return engine_oil{}.values(T, p);
  if (fluid == "ethylene-glycol") return ethylene_glycol{}.values(T, p);
  if (fluid == "mercury") return mercury{}.values(T, p);
  if (fluid == "sodium") return sodium{}.values(T, p);
  if (fluid == "nak78") return nak78{}.values(T, p);
  if (fluid == "lead") return lead{}.values(T, p);
  if (fluid == "lbe") return lead_bismuth{}.values(T, p);
  if (fluid == "solar-salt") return solar_salt{}.values(T, p);
  return {};  // fails
}
}  // namespace

TEST_CASE("liquids: every coefficient") {
  for (const pinned& row : rows) {
    const std::string name(row.fluid);
    CAPTURE(name);
    CAPTURE(row.T);
    const fluid_values<double> v = values(row.fluid, row.T);
    CHECK(close_to(v.density, row.expected.density, 1e-12));
    CHECK(close_to(v.specific_heat, row.expected.specific_heat, 1e-12));
    CHECK(close_to(v.conductivity, row.expected.conductivity, 1e-12));
    CHECK(close_to(v.viscosity, row.expected.viscosity, 2e-12));
    CHECK(close_to(v.expansion, row.expected.expansion, 1e-12));
  }
}
