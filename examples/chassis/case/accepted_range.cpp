#include "case/accepted_range.hpp"

#include <array>
#include <cstdio>
#include <utility>

#include "case/case_error.hpp"

namespace chassis {

bool accepted_range::holds(double value) const {
  const bool above = lowest_excluded ? value > lowest : value >= lowest;
  return above && value <= highest;  // a value that is not a number fails both
}

std::string accepted_range::words() const {
  const accepted_range any;
  std::string text;
  if (highest < any.highest) {
    text = plain(lowest) + " to " + plain(highest);
  } else if (lowest > any.lowest) {
    text = (lowest_excluded ? "> " : ">= ") + plain(lowest);
  } else {
    text = "a number";
  }
  return hint.empty() ? text : text + " (" + hint + ")";
}

double accepted_range::checked(double value, const std::string& path) const {
  if (holds(value)) return value;
  std::string fault = " is too large";
  if (value != value) {
    fault = " is not a number";
  } else if (value <= lowest) {
    fault = lowest < 0 ? " is too small" : value < 0 ? " is negative" : " is too small";
    if (value == 0 && lowest == 0) fault = " is not positive";
  }
  throw case_error(path, plain(value) + fault + "; expected " + words());
}

accepted_range positive() {
  accepted_range range;
  range.lowest = 0;
  range.lowest_excluded = true;
  return range;
}

accepted_range not_negative() {
  accepted_range range;
  range.lowest = 0;
  return range;
}

accepted_range between(double lowest, double highest, std::string hint) {
  accepted_range range;
  range.lowest = lowest;
  range.highest = highest;
  range.hint = std::move(hint);
  return range;
}

std::string plain(double value) {
  std::array<char, 32> text{};
  std::snprintf(text.data(), text.size(), "%.6g", value);
  return text.data();
}

}  // namespace chassis
