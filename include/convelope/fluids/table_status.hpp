#ifndef CONVELOPE_FLUIDS_TABLE_STATUS_HPP
#define CONVELOPE_FLUIDS_TABLE_STATUS_HPP

#include "convelope/kinds.hpp"

// What tabulate(...) is asked, and what it may have to say.

namespace convelope {
inline namespace v0 {

/// Temperatures from .. to, as `temperature_span{kelvin(280.0), kelvin(560.0)}`.
struct temperature_span {
  boost::units::quantity<unit_types::absolute_temperature> low;
  boost::units::quantity<unit_types::absolute_temperature> high;
};
/// Absolute pressures from .. to.
struct pressure_span {
  boost::units::quantity<boost::units::si::pressure> low;
  boost::units::quantity<boost::units::si::pressure> high;
};

/// One row of a host's own data, SI units.
struct data_row {
  double temperature_K;
  double density;
  double specific_heat;
  double conductivity;
  double viscosity;
  double expansion;
};

enum class table_status : unsigned char {
  done,
  bad_range,        // of T or p: not finite, not positive or not rising
  bad_bound,        // the relative error asked for is not between 1e-12 and 0.1
  not_finite_here,  // the fluid gives no finite number at the temperature named as value
  too_large,        // the bound needs more cells than allowed; worst_error says what they reach
  no_room,          // the fluid has five limits and none on T or p that a table could narrow
  too_few_rows,
  row_not_finite,
  row_not_positive,
  row_repeated,
  row_not_rising,
  rows_too_uneven  // the value is the smallest step
};

constexpr const char* words(table_status s) {
  switch (s) {
    case table_status::done:
      return "done";
    case table_status::bad_range:
      return "the range is not finite, not positive or not rising; no table";
    case table_status::bad_bound:
      return "the error bound is not between 1e-12 and 0.1; no table";
    case table_status::not_finite_here:
      return "the fluid gives no finite number at this temperature; no table";
    case table_status::too_large:
      return "the bound needs more cells than a table may have; no table";
    case table_status::no_room:
      return "the fluid has five limits, none left for the table's range; no table";
    case table_status::too_few_rows:
      return "fewer than two rows; no table";
    case table_status::row_not_finite:
      return "this number of this row is not finite; no table";
    case table_status::row_not_positive:
      return "this number of this row is not positive; no table";
    case table_status::row_repeated:
      return "this row has the temperature of the one before it; no table";
    case table_status::row_not_rising:
      return "this row has a temperature below that of the one before it; no table";
    case table_status::rows_too_uneven:
      break;
  }
  return "the smallest step between two rows is below a millionth of their range; no table";
}

}  // namespace v0
}  // namespace convelope

#endif
