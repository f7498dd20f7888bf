// CSV text (RFC 4180) to rows that know their line.
#pragma once

#include <cstddef>
#include <string>
#include <vector>

namespace chassis {

struct csv_row {
  std::size_t line = 0;
  std::vector<std::string> fields;
};

/// Empty lines are skipped. `where` leads every message.
std::vector<csv_row> csv_rows(const std::string& text, const std::string& where);

}  // namespace chassis
