// Gases against published check values and tables, row by row, by their names in the catalogue.
#include "convelope/catalogue/fluids_gases.hpp"

#include "fluid_rows.hpp"

TEST_CASE("gases: published values") {
  fluid_rows::check("fluids_gases.csv", 333, convelope::catalogue::gas_entries);
}

TEST_CASE("gases: a row with a mistake does not pass") {
  fluid_rows::check_reader(
      {"air-us76", "T=288.15", "mu", "1.7894e-5", "3.1e-05", "U.S. Standard Atmosphere 1976"},
      convelope::catalogue::gas_entries);
  fluid_rows::check_reader(
      {"nitrogen-lj", "T=300;rhom=0", "mu", "17.8771e-6", "3.1e-06", "Lemmon and Jacobsen 2004"},
      convelope::catalogue::gas_entries);
}
