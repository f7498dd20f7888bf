// Water against the check values of the releases and handbook tables, row by row, by their names.
#include "convelope/catalogue/fluids_water.hpp"
#include "fluid_rows.hpp"

TEST_CASE("water: published values") {
  fluid_rows::check("fluids_water.csv", 369, convelope::catalogue::water_entries);
}

TEST_CASE("water: a row with a mistake does not pass") {
  fluid_rows::check_reader({"water-if97-r2", "T=700;p=3e7", "v", "5.42946619e-3", "9.6e-10",
                            "IAPWS R7-97(2012) Table 15"},
                           convelope::catalogue::water_entries);
  fluid_rows::check_reader(
      {"water-sr1-86", "T=373.1243", "rho_v", "0.597586", "9.1e-07", "IAPWS SR1-86(1992) Table 1"},
      convelope::catalogue::water_entries);
}
