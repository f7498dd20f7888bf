#include "case/csv_text.hpp"

#include <utility>

#include "case/case_error.hpp"

namespace chassis {

std::vector<csv_row> csv_rows(const std::string& text, const std::string& where) {
  std::vector<csv_row> rows;
  csv_row row{1, {}};
  std::string field;
  std::size_t line = 1;
  std::size_t quote_line = 0;  // 0 outside quotes
  bool was_quoted = false;

  const auto end_field = [&] {
    row.fields.push_back(std::exchange(field, ""));
    was_quoted = false;
  };
  const auto end_row = [&] {
    const bool empty = row.fields.empty() && field.empty() && !was_quoted;
    if (!empty) {
      end_field();
      rows.push_back(std::move(row));
    }
  };

  for (std::size_t i = 0; i < text.size(); ++i) {
    const char c = text[i];
    if (c == '\n') ++line;
    if (quote_line != 0) {
      if (c != '"') {
        field += c;
      } else if (i + 1 < text.size() && text[i + 1] == '"') {
        field += '"';
        ++i;
      } else {
        quote_line = 0;
      }
    } else if (c == '"' && field.empty()) {
      quote_line = line;
      was_quoted = true;
    } else if (c == ',') {
      end_field();
    } else if (c == '\n') {
      end_row();
      row = {line, {}};
    } else if (c != '\r') {
      field += c;
    }
  }
  if (quote_line != 0) {
    throw case_error(where + ", line " + std::to_string(quote_line),
                     "a quote is opened and never closed; expected a closing \"");
  }
  end_row();
  return rows;
}

}  // namespace chassis
