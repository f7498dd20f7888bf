#include "line.hpp"

#include <algorithm>
#include <array>
#include <charconv>
#include <cmath>
#include <string>

namespace evaluate {
namespace {

namespace cv = convelope;
namespace cat = convelope::catalogue;

std::string shortest(double x) {
  std::array<char, 40> buffer{};
  const auto r = std::to_chars(buffer.data(), buffer.data() + buffer.size(), x);
  return {buffer.data(), r.ptr};
}

constexpr std::string_view blanks = " \t\r";

std::string_view trim(std::string_view s) {
  const std::size_t a = s.find_first_not_of(blanks);
  if (a == std::string_view::npos) return {};
  return s.substr(a, s.find_last_not_of(blanks) - a + 1);
}

bool parse_number(std::string_view text, double& x) {
  const char* begin = text.data();
  const char* end = begin + text.size();
  if (text.size() > 1 && text[0] == '+' && text[1] != '-') ++begin;
  const auto r = std::from_chars(begin, end, x);
  return r.ec == std::errc{} && r.ptr == end && std::isfinite(x);
}

// The keys an id takes, for error messages.
std::string keys_of(const cv::correlation_info& c) {
  std::string s;
  for (int i = 0; i < c.input_count; ++i) {
    s += (i > 0 ? ", " : "") + std::string(c.inputs[i].key);
    if (c.inputs[i].optional) s += " (optional)";
  }
  return s.empty() ? "no inputs" : s;
}

std::string quantities_of(std::string_view id) {
  std::string s;
  cat::filter(catalogue(), id, [&](const cat::entry& e) {
    if (id == e.info->id) s += (s.empty() ? "" : ", ") + std::string(e.info->quantity);
  });
  return s;
}

// The value of one input; returns an error sentence or "".
std::string read_input(const cv::input_info& in, const request& r, double& x) {
  const auto given = std::find_if(r.inputs.begin(), r.inputs.end(),
                                  [&](const pair& p) { return p.key == in.key; });
  if (given == r.inputs.end()) {
    if (!in.optional) return std::string(in.key) + ": missing; expected " + in.words;
    x = in.otherwise;
    return {};
  }
  if (in.choices == nullptr) {
    if (parse_number(given->value, x)) return {};
    return std::string(in.key) + ": '" + given->value + "' is not a finite number";
  }
  std::string words;
  for (int i = 0; in.choices[i] != nullptr; ++i) {
    if (given->value == in.choices[i]) {
      x = i;
      return {};
    }
    words += (i > 0 ? " or " : "") + std::string(in.choices[i]);
  }
  return std::string(in.key) + ": '" + given->value + "' is not a choice; expected " + words;
}

void add_crossed(const cv::limit_info& l, bool below, bool above, std::string& s) {
  if (!below && !above) return;
  const double bound = below ? l.low : l.high;
  s += (s.empty() ? "" : ",") +
       cat::detail::json_string(std::string(l.symbol) + (below ? " below " : " above ") +
                                shortest(bound));
}

}  // namespace

std::string add_pair(std::string_view text, request& r) {
  const std::size_t eq = text.find('=');
  if (eq == std::string_view::npos || eq == 0) {
    return "'" + std::string(text) + "': expected key=value";
  }
  const std::string key(trim(text.substr(0, eq)));
  const std::string value(trim(text.substr(eq + 1)));
  if (key == "quantity") {
    if (!r.quantity.empty()) return "quantity: given twice";
    r.quantity = value;
    return {};
  }
  const bool twice =
      std::any_of(r.inputs.begin(), r.inputs.end(), [&](const pair& p) { return p.key == key; });
  if (twice) return key + ": given twice";
  r.inputs.push_back({key, value});
  return {};
}

std::string parse_line(std::string_view given, request& r) {
  // Ids and keys are ASCII. Other bytes need not be UTF-8, which JSON is: they become '?'.
  std::string ascii(given);
  std::replace_if(
      ascii.begin(), ascii.end(), [](char c) { return (c & 0x80) != 0; }, '?');
  std::string_view line = ascii;
  line = trim(line);
  const std::size_t gap = line.find_first_of(blanks);
  r.id = std::string(line.substr(0, gap));
  std::string_view rest = gap == std::string_view::npos ? std::string_view{} : line.substr(gap);
  while (!(rest = trim(rest)).empty()) {
    const std::size_t semicolon = rest.find(';');
    const std::string_view part = trim(rest.substr(0, semicolon));
    if (!part.empty()) {
      std::string error = add_pair(part, r);
      if (!error.empty()) return error;
    }
    if (semicolon == std::string_view::npos) break;
    rest = rest.substr(semicolon + 1);
  }
  return {};
}

outcome answer(const request& r) {
  outcome o;
  const cat::match m = cat::find(catalogue(), r.id, r.quantity);
  if (m.how == cat::found::no_such_id) {
    o.error = "id: '" + r.id + "' is not in the catalogue; `evaluate --list` shows all";
    return o;
  }
  if (m.how != cat::found::one) {
    const bool none = m.how == cat::found::no_such_quantity;
    o.error = none ? "quantity: '" + r.quantity + "' is not given by " + r.id
                   : "quantity: missing; " + r.id + " gives several";
    o.error += "; expected one of " + quantities_of(r.id);
    return o;
  }
  o.entry = m.which;
  const cv::correlation_info& c = *o.entry->info;
  for (const pair& p : r.inputs) {
    const bool known = std::any_of(c.inputs, c.inputs + c.input_count,
                                   [&](const cv::input_info& in) { return p.key == in.key; });
    if (!known) {
      o.error = p.key + ": not an input of " + r.id + "; expected " + keys_of(c);
      return o;
    }
  }
  std::array<double, cat::most_inputs> x{};
  for (int i = 0; i < c.input_count; ++i) {
    o.error = read_input(c.inputs[i], r, x[static_cast<std::size_t>(i)]);
    if (!o.error.empty()) return o;
  }
  o.answer = o.entry->evaluate(x.data());
  if (!std::isfinite(o.answer.value)) {
    o.error =
        "value: not a finite number for these inputs (" + cv::explain(o.answer.verdict, c) + ")";
  }
  return o;
}

std::string to_json_line(const request& r, const outcome& o) {
  using cat::detail::json_string;
  const bool ok = o.error.empty();
  const std::string quantity = o.entry != nullptr ? o.entry->info->quantity : r.quantity;
  std::string crossed;
  if (o.entry != nullptr && (ok || !std::isfinite(o.answer.value))) {
    const cv::correlation_info& c = *o.entry->info;
    for (int i = 0; i < c.limit_count; ++i) {
      add_crossed(c.limits[i], o.answer.verdict.correlation_crossed(0, i, cv::side::below),
                  o.answer.verdict.correlation_crossed(0, i, cv::side::above), crossed);
    }
  }
  const bool scatter_known = ok && o.answer.scatter >= 0.0;
  return "{\"id\":" + json_string(r.id) + ",\"quantity\":" + json_string(quantity) +
         ",\"value\":" + (ok ? shortest(o.answer.value) : "null") +
         ",\"inside\":" + (ok ? (o.answer.verdict.inside() ? "true" : "false") : "null") +
         ",\"crossed\":[" + crossed + "]" +
         ",\"scatter\":" + (scatter_known ? shortest(o.answer.scatter) : "null") +
         ",\"error\":" + (ok ? "null" : json_string(o.error)) + "}";
}

}  // namespace evaluate
