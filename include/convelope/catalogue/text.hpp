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
}  // namespace detail

/// One correlation as a JSON object.
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
       ",\"properties\":" + json_string(words(c.state_at)) + ",\"source\":" +
       json_string(std::string(c.source->authors) + " " + std::to_string(c.source->year) + ", " +
                   c.source->where) +
       ",\"constants\":" + json_string(words(c.source->constants)) +
       ",\"note\":" + json_string(c.source->note) + "}";
  return s;
}

/// The whole list as a JSON array, one correlation a line.
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
  s += ".\n\n- Range: ";
  for (int i = 0; i < c.limit_count; ++i) {
    s += std::string(i > 0 ? "; " : "") + c.limits[i].symbol + " " +
         convelope::detail::range_text(c.limits[i]);
  }
  if (c.limit_count == 0) s += "none stated";
  s += "\n- Scatter: " + detail::scatter_text(c.scatter) + "\n- Properties: " + words(c.state_at) +
       "\n- Source: " + c.source->authors + " " + std::to_string(c.source->year) + ", " +
       c.source->where + "\n- Constants: " + words(c.source->constants) + "\n";
  if (*c.source->note != 0) s += std::string("- Note: ") + c.source->note + "\n";
  return s + "\n";
}

/// The whole list as Markdown.
inline std::string to_markdown(std::span<const entry> entries) {
  std::string s;
  for (const entry& e : entries) s += to_markdown(*e.info);
  return s;
}

}  // namespace catalogue
}  // namespace v0
}  // namespace convelope

#endif
