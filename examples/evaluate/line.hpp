#ifndef CONVELOPE_EXAMPLES_EVALUATE_LINE_HPP
#define CONVELOPE_EXAMPLES_EVALUATE_LINE_HPP

#include <span>
#include <string>
#include <string_view>
#include <vector>

#include "convelope/catalogue/text.hpp"

// One request, from words to an answer. Errors are sentences that name the input, its value and
// what was expected.

namespace evaluate {

struct pair {
  std::string key;
  std::string value;
};

struct request {
  std::string id;
  std::string quantity;
  std::vector<pair> inputs;
};

struct outcome {
  const convelope::catalogue::entry* entry = nullptr;
  convelope::catalogue::answer answer{};
  std::string error;  // empty if there is an answer
};

/// The whole catalogue: correlations, then fluids. The one place that reads all their headers.
std::span<const convelope::catalogue::entry> catalogue();

/// "key=value" pairs to a request; returns a sentence on the first bad pair, else "".
std::string add_pair(std::string_view text, request& r);

/// A batch line `ID quantity=Q;key=value;key=value`.
std::string parse_line(std::string_view line, request& r);

/// Looks the entry up and evaluates it.
outcome answer(const request& r);

/// {"id", "quantity", "value", "inside", "crossed", "scatter", "error"} on one line.
std::string to_json_line(const request& r, const outcome& o);

}  // namespace evaluate

#endif
