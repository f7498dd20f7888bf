// Liquids against published values and handbook tables, row by row, by their catalogue names.
#include "convelope/catalogue/fluids_liquids.hpp"

#include "fluid_rows.hpp"

TEST_CASE("liquids: published values") {
  fluid_rows::check("fluids_liquids.csv", 326, convelope::catalogue::liquid_entries);
}

TEST_CASE("liquids: a row with a mistake does not pass") {
  fluid_rows::check_reader({"solar-salt", "T=673.15", "rho", "1835.6", "3e-05", "Zavoico 2001"},
                           convelope::catalogue::liquid_entries);
  fluid_rows::check_reader({"sodium", "T=1000", "k", "54.24", "0.0003", "Fink and Leibowitz 1995"},
                           convelope::catalogue::liquid_entries);
}
