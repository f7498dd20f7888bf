#ifndef CONVELOPE_CATALOGUE_TEXT_HPP
#define CONVELOPE_CATALOGUE_TEXT_HPP

#include <string>

#include "convelope/catalogue/find.hpp"
#include "convelope/estimate/explain.hpp"

// The catalogue as JSON and as Markdown. Not part of convelope.hpp: it needs <string>.

namespace convelope {
inline namespace v0 {
namespace catalogue {

namespace detail {
/// A JSON string (RFC 8259).
inline std::string json_string(std::string_view s) {
  std::string r = "\"";
  for (const char c : s) {
    if (c == '"' || c == '\\') r += '\\';
    if (static_cast<unsigned char>(c) < 0x20) {
      char code[8];
      std::snprintf(code, sizeof code, "\\u%04x", static_cast<unsigned>(c));
      r += code;
    } else {
      r += c;
    }
  }
  return r + "\"";
}
inline std::string bound(double x) {
  return x >= unbounded || x <= -unbounded ? "null" : convelope::detail::short_number(x);
}
inline std::string scatter_text(double s) {
  return s < 0.0 ? "not stated" : "+-" + convelope::detail::short_number(100.0 * s) + " %";
}
/// "authors year, where"; a line fitted here has no year.
inline std::string source_text(const reference& r) {
  return std::string(r.authors) + (r.year > 0 ? " " + std::to_string(r.year) : "") + ", " + r.where;
}

/// A fluid's property, rather than a correlation.
inline bool is_property(const correlation_info& c) {
  return std::string_view(c.id).substr(0, 6) == "fluid/";
}
/// What stands behind the last comma of "density, kg/m3"; "" of a plain number.
inline std::string_view unit_of(const correlation_info& c) {
  const std::string_view gives = c.gives;
  const std::size_t comma = gives.rfind(", ");
  return comma == std::string_view::npos ? std::string_view() : gives.substr(comma + 2);
}

/// Properties that one formulation gives on the same inputs in the same range.
inline bool of_one_kind(const correlation_info& a, const correlation_info& b) {
  using convelope::detail::same_text;
  if (!same_text(a.id, b.id) || a.source != b.source || a.input_count != b.input_count ||
      a.limit_count != b.limit_count) {
    return false;
  }
  for (int i = 0; i < a.input_count; ++i) {
    if (!same_text(a.inputs[i].key, b.inputs[i].key)) return false;
  }
  for (int i = 0; i < a.limit_count; ++i) {
    const limit_info& x = a.limits[i];
    const limit_info& y = b.limits[i];
    if (!same_text(x.symbol, y.symbol) || x.low < y.low || x.low > y.low || x.high < y.high ||
        x.high > y.high) {
      return false;
    }
  }
  return true;
}

inline std::string range_line(const correlation_info& c) {
  std::string s = "- Range: ";
  for (int i = 0; i < c.limit_count; ++i) {
    s += std::string(i > 0 ? "; " : "") + c.limits[i].symbol + " " +
         convelope::detail::range_text(c.limits[i]);
  }
  return s + (c.limit_count == 0 ? "none stated\n" : "\n");
}
inline std::string source_lines(const reference& r) {
  return "- Source: " + source_text(r) + "\n- Constants: " + words(r.constants) + "\n" +
         (*r.note != 0 ? std::string("- Note: ") + r.note + "\n" : "") + "\n";
}

/// Properties of one kind as a section of a Markdown page.
inline std::string properties_to_markdown(std::span<const entry> of_one_kind) {
  const correlation_info& c = *of_one_kind.front().info;
  std::string s = std::string("### ") + c.id + " (";
  for (const entry& e : of_one_kind) {
    s += std::string(&e == &of_one_kind.front() ? "" : ", ") + e.info->quantity;
  }
  s += ")\n\nInputs: ";
  for (int i = 0; i < c.input_count; ++i) {
    const input_info& in = c.inputs[i];
    s += std::string(i > 0 ? "; " : "") + "`" + in.key + "` " + in.words;
    if (in.optional) {
      s += in.otherwise > 0.0
               ? " (" + convelope::detail::short_number(in.otherwise) + " if left out)"
               : " (optional)";
    }
  }
  s += ".\n\n| quantity | | uncertainty |\n|---|---|---|\n";
  for (const entry& e : of_one_kind) {
    s += std::string("| `") + e.info->quantity + "` | " + e.info->gives + " | " +
         scatter_text(e.info->scatter) + " |\n";
  }
  return s + "\n" + range_line(c) + source_lines(*c.source);
}
}  // namespace detail

/// One correlation, or one property of a fluid, as a JSON object.
inline std::string to_json(const correlation_info& c) {
  using detail::json_string;
  std::string s = "{\"id\":" + json_string(c.id) + ",\"quantity\":" + json_string(c.quantity) +
                  ",\"gives\":" + json_string(c.gives) + ",\"inputs\":[";
  for (int i = 0; i < c.input_count; ++i) {
    const input_info& in = c.inputs[i];
    s += std::string(i > 0 ? "," : "") + "{\"key\":" + json_string(in.key) +
         ",\"words\":" + json_string(in.words) + ",\"on\":" + json_string(in.on) +
         ",\"optional\":" + (in.optional ? "true" : "false");
    if (in.choices != nullptr) {
      s += ",\"choices\":[";
      for (int j = 0; in.choices[j] != nullptr; ++j) {
        s += (j > 0 ? "," : "") + json_string(in.choices[j]);
      }
      s += "]";
    }
    s += "}";
  }
  s += "],\"envelope\":[";
  for (int i = 0; i < c.limit_count; ++i) {
    s += std::string(i > 0 ? "," : "") + "{\"of\":" + json_string(c.limits[i].symbol) +
         ",\"low\":" + detail::bound(c.limits[i].low) +
         ",\"high\":" + detail::bound(c.limits[i].high) + "}";
  }
  s += "],\"scatter\":" +
       (c.scatter < 0.0 ? std::string("null") : convelope::detail::short_number(c.scatter)) +
       ",\"properties\":" +
       (detail::is_property(c) ? std::string("null") : json_string(words(c.state_at))) +
       ",\"source\":" + json_string(detail::source_text(*c.source)) +
       ",\"constants\":" + json_string(words(c.source->constants)) +
       ",\"note\":" + json_string(c.source->note) + "}";
  return s;
}

/// The whole list as a JSON array, one entry a line.
inline std::string to_json(std::span<const entry> entries) {
  std::string s = "[\n";
  for (const entry& e : entries) {
    s += to_json(*e.info) + (&e == &entries.back() ? "\n" : ",\n");
  }
  return s + "]\n";
}

/// One correlation as a section of a Markdown page.
inline std::string to_markdown(const correlation_info& c) {
  std::string s = "### " + std::string(c.id) + " (" + c.quantity + ")\n\n" + c.gives + ". Inputs: ";
  for (int i = 0; i < c.input_count; ++i) {
    const input_info& in = c.inputs[i];
    s += std::string(i > 0 ? ", " : "") + "`" + in.key + "` " + in.words;
    if (*in.on != 0) s += std::string(" on ") + in.on;
    if (in.choices != nullptr) {
      s += " (";
      for (int j = 0; in.choices[j] != nullptr; ++j) {
        s += std::string(j > 0 ? ", " : "") + in.choices[j];
      }
      s += ")";
    }
    if (in.optional) s += ", optional";
  }
  if (c.input_count == 0) s += "none";
  return s + ".\n\n" + detail::range_line(c) + "- Scatter: " + detail::scatter_text(c.scatter) +
         "\n- Properties: " + words(c.state_at) + "\n" + detail::source_lines(*c.source);
}

/// The whole list as Markdown; properties that a formulation gives together share a section.
inline std::string to_markdown(std::span<const entry> entries) {
  std::string s;
  for (std::size_t i = 0; i < entries.size();) {
    std::size_t n = 1;
    if (detail::is_property(*entries[i].info)) {
      while (i + n < entries.size() &&
             detail::of_one_kind(*entries[i].info, *entries[i + n].info)) {
        ++n;
      }
      s += detail::properties_to_markdown(entries.subspan(i, n));
    } else {
      s += to_markdown(*entries[i].info);
    }
    i += n;
  }
  return s;
}

}  // namespace catalogue
}  // namespace v0
}  // namespace convelope

#endif
