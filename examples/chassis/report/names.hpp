// Names for files and for markup.
#pragma once

#include <string>

namespace chassis {

/// Letters, digits and dashes only; everything else becomes a dash.
inline std::string file_name_of(const std::string& name) {
  std::string result;
  for (const char c : name) {
    const bool kept = (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || (c >= '0' && c <= '9');
    if (kept) {
      result += c;
    } else if (!result.empty() && result.back() != '-') {
      result += '-';
    }
  }
  while (!result.empty() && result.back() == '-') result.pop_back();
  return result.empty() ? "unnamed" : result;
}

/// Text as it may stand in XML.
inline std::string xml_text(const std::string& text) {
  std::string result;
  for (const char c : text) {
    switch (c) {
      case '&':
        result += "&amp;";
        break;
      case '<':
        result += "&lt;";
        break;
      case '>':
        result += "&gt;";
        break;
      case '"':
        result += "&quot;";
        break;
      default:
        // Control characters are not allowed in XML 1.0 at all.
        result += static_cast<unsigned char>(c) < 0x20 ? ' ' : c;
    }
  }
  return result;
}

}  // namespace chassis
