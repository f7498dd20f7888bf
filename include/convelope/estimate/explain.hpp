#ifndef CONVELOPE_ESTIMATE_EXPLAIN_HPP
#define CONVELOPE_ESTIMATE_EXPLAIN_HPP

#include <cstdio>
#include <string>

#include "convelope/estimate/estimate.hpp"

// Text for people. Not part of convelope.hpp: it needs <string>.

namespace convelope {
inline namespace v0 {

namespace detail {
inline std::string short_number(double x) {
  char buffer[32];
  std::snprintf(buffer, sizeof buffer, "%.6g", x);
  return buffer;
}

inline std::string unit_text(const char* unit) {
  return same_text(unit, "1") ? std::string() : std::string(" ") + unit;
}

inline std::string range_text(const limit_info& l) {
  if (l.low <= -unbounded) return "at most " + short_number(l.high);
  if (l.high >= unbounded) return "at least " + short_number(l.low);
  return short_number(l.low) + " to " + short_number(l.high);
}

// "Re is above its range (100 to 1e7)", joined by commas.
template <class Crossed>
std::string crossings(const limit_info* limits, int count, Crossed crossed) {
  std::string text;
  for (int i = 0; i < count; ++i) {
    const bool below = crossed(i, side::below);
    const bool above = crossed(i, side::above);
    if (!below && !above) continue;
    if (!text.empty()) text += ", ";
    text += limits[i].symbol;
    text += below && above ? " is not comparable with" : below ? " is below" : " is above";
    text += " its range (" + range_text(limits[i]) + ")";
  }
  return text;
}
}  // namespace detail

/// One sentence for each thing a verdict has to say of the correlation in a slot; "" if inside.
inline std::string explain(verdict<> v, const correlation_info& c, int slot = 0) {
  const std::string text = detail::crossings(
      c.limits, c.limit_count, [&](int i, side s) { return v.correlation_crossed(slot, i, s); });
  return text.empty() ? text
                      : std::string(c.id) + " is outside what it was fitted for: " + text + ".";
}

/// The same for the fluid.
inline std::string explain(verdict<> v, const fluid_info& f) {
  const std::string text = detail::crossings(f.limits, f.limit_count,
                                             [&](int i, side s) { return v.fluid_crossed(i, s); });
  return text.empty() ? text
                      : std::string(f.name) + " is outside its property range: " + text + ".";
}

/// What a person should know of an estimate, in sentences: crossings, non-finite inputs, scatter,
/// source and how certain its constants are.
template <class K>
std::string explain(const estimate<K, double>& e) {
  const verdict<> v = e.verdict();
  std::string text = std::string(K::words) + " " + K::symbol + " = " +
                     detail::short_number(e.si()) + detail::unit_text(K::unit) + ".";
  const auto add = [&](const std::string& sentence) {
    if (!sentence.empty()) text += " " + sentence;
  };
  if (!v.finite_input()) add("An input was NaN or infinite; the value means nothing.");
  if (!v.possible_input()) {
    add("A length or an absolute temperature was not positive and finite; the value means "
        "nothing.");
  }
  if (v.refused()) add("The value was refused.");
  if (e.correlation() != nullptr) add(explain(v, *e.correlation()));
  for (int slot = e.correlation() == nullptr ? 0 : 1; slot < detail::word::slots; ++slot) {
    if (!v.correlation_outside(slot)) continue;
    add("Another correlation that takes part in it is outside what it was fitted for.");
    break;
  }
  if (e.fluid() != nullptr) add(explain(v, *e.fluid()));
  if (v.input_outside()) add("An input was itself outside the envelope it came from.");
  if (v.inside()) add("Inside every stated range.");
  if (v.scatter_stated() || e.variance() > 0.0) {
    add("Stated scatter +-" + detail::short_number(100.0 * e.scatter()) + " %" +
        (v.scatter_stated() ? "." : ", where stated."));
  } else {
    add("The source states no scatter.");
  }
  if (e.correlation() != nullptr) {
    const reference& r = *e.correlation()->source;
    add(std::string("Source: ") + r.authors + " " + std::to_string(r.year) + ", " + r.where +
        " (constants " + words(r.constants) + ").");
  }
  return text;
}

/// One lane of a pack.
template <class K, class T>
  requires(scalar_adaptor<T>::lanes > 1)
std::string explain(const estimate<K, T>& e, int lane) {
  const auto i = static_cast<std::size_t>(lane);
  return explain(
      estimate<K, double>(static_cast<double>(e.si()[i]), verdict<>(e.verdict().bits()[i]),
                          static_cast<double>(e.variance()[i]), e.correlation(), e.fluid()));
}

}  // namespace v0
}  // namespace convelope

#endif
