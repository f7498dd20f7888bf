#ifndef CONVELOPE_CATALOGUE_FLUID_ENTRY_HPP
#define CONVELOPE_CATALOGUE_FLUID_ENTRY_HPP

#include <array>

#include "convelope/catalogue/entry.hpp"
#include "convelope/fluids/fluid.hpp"

// Fluid properties as catalogue entries, for callers that know names only at run time. The limits
// of the fluid stand where those of a correlation would.

namespace convelope {
inline namespace v0 {
namespace catalogue {

inline constexpr input_info temperature_input{"T", "T", "temperature, K", "", nullptr, 0.0, false};
/// Standard pressure where it is left out.
inline constexpr input_info pressure_input{"p",      "p", "absolute pressure, Pa", "", nullptr,
                                           101325.0, true};

/// One property that is not one of the six a fluid gives: a saturation pressure, say. Limit i
/// bounds the input whose key is its symbol.
struct property {
  const char* id;        // "fluid/water-if97-r4"
  const char* quantity;  // "psat"
  const char* gives;     // "saturation pressure, Pa"
  const reference* source;
  std::array<input_info, 4> inputs;
  int input_count;
  std::array<limit_info, 4> limits;
  int limit_count;
  double uncertainty;  // relative, or not_stated
  double (*value)(const double* inputs);
};

namespace detail {
template <const property& P>
answer evaluate_property(const double* x) {
  namespace word = convelope::detail::word;
  std::uint64_t bits = P.uncertainty < 0.0 ? word::scatter_not_stated : 0;
  for (int i = 0; i < P.input_count; ++i) {
    bits |= scalar_adaptor<double>::bits_where_not_finite(x[i], word::not_finite);
    for (int j = 0; j < P.limit_count; ++j) {
      const limit_info& l = P.limits[static_cast<std::size_t>(j)];
      if (!convelope::detail::same_text(P.inputs[static_cast<std::size_t>(i)].key, l.symbol)) {
        continue;
      }
      if (!(x[i] >= l.low)) bits |= word::of_correlation(0, j, side::below);
      if (!(x[i] <= l.high)) bits |= word::of_correlation(0, j, side::above);
    }
  }
  return {P.value(x), verdict<>(bits), P.uncertainty};
}

template <const property& P>
inline constexpr correlation_info property_record{
    P.id,          P.quantity,      P.gives,       P.source,      P.inputs.data(),
    P.input_count, P.limits.data(), P.limit_count, P.uncertainty, state_rule::none};

enum class basic : unsigned char { rho, cp, k, mu, beta, Pr };

inline constexpr const char* basic_names[] = {"rho", "cp", "k", "mu", "beta", "Pr"};
inline constexpr const char* basic_words[] = {"density, kg/m3",
                                              "specific heat at constant pressure, J/(kg K)",
                                              "conductivity, W/(m K)",
                                              "dynamic viscosity, Pa s",
                                              "expansion coefficient, 1/K",
                                              "Prandtl number"};

template <basic B, class T>
constexpr T basic_of(const fluid_values<T>& v) {
  switch (B) {
    case basic::rho:
      return v.density;
    case basic::cp:
      return v.specific_heat;
    case basic::k:
      return v.conductivity;
    case basic::mu:
      return v.viscosity;
    case basic::beta:
      return v.expansion;
    case basic::Pr:
      break;
  }
  return v.prandtl();
}

constexpr double basic_uncertainty(basic b, const property_uncertainty& u) {
  switch (b) {
    case basic::rho:
      return u.density;
    case basic::cp:
      return u.specific_heat;
    case basic::k:
      return u.conductivity;
    case basic::mu:
      return u.viscosity;
    case basic::beta:
      return u.expansion;
    case basic::Pr:
      break;
  }
  if (u.specific_heat < 0.0 || u.conductivity < 0.0 || u.viscosity < 0.0) return not_stated;
  // As fluid_state: the root of the sum of squares, by Newton, since std::sqrt is not constexpr.
  const double sum = u.specific_heat * u.specific_heat + u.conductivity * u.conductivity +
                     u.viscosity * u.viscosity;
  double root = u.specific_heat + u.conductivity + u.viscosity;
  for (int i = 0; i < 8 && root > 0.0; ++i) root = 0.5 * (root + sum / root);
  return root;
}

template <class Served>
inline constexpr auto served_inputs = [] {
  std::array<input_info, 4> keys{temperature_input, pressure_input};
  if constexpr (requires { Served::extra_inputs; }) {
    std::size_t i = 2;
    for (const input_info& in : Served::extra_inputs) keys[i++] = in;
  }
  return keys;
}();

template <class Served>
constexpr int served_input_count() {
  if constexpr (requires { Served::extra_inputs; }) {
    return 2 + static_cast<int>(std::size(Served::extra_inputs));
  } else {
    return 2;
  }
}

template <class Served, basic B>
answer evaluate_basic(const double* x) {
  namespace word = convelope::detail::word;
  const auto f = Served::make(x + 2);
  const std::uint64_t given = f.check(x[0], x[1]);
  std::uint64_t bits = (given & word::fluid_mask) >> word::fluid_start;
  bits |= given & (word::not_finite | word::impossible);
  const double u = basic_uncertainty(B, f.info()->uncertainty);
  if (u < 0.0) bits |= word::scatter_not_stated;
  return {basic_of<B>(f.values(x[0], x[1])), verdict<>(bits), u};
}

template <class Served, basic B>
inline constexpr correlation_info basic_record{Served::id,
                                               basic_names[static_cast<int>(B)],
                                               basic_words[static_cast<int>(B)],
                                               Served::info.source,
                                               served_inputs<Served>.data(),
                                               served_input_count<Served>(),
                                               Served::info.limits,
                                               Served::info.limit_count,
                                               basic_uncertainty(B, Served::info.uncertainty),
                                               state_rule::none};
}  // namespace detail

/// The entry of a property.
template <const property& P>
inline constexpr entry entry_of_property{&detail::property_record<P>,
                                         &detail::evaluate_property<P>};

/// The six entries of a fluid: rho, cp, k, mu, beta, Pr. Served states `id`, `info` (a reference to
/// the fluid_info), `make(extra)` and, where a fluid has parameters, `extra_inputs`.
template <class Served>
inline constexpr std::array<entry, 6> fluid_entries{
    entry{&detail::basic_record<Served, detail::basic::rho>,
          &detail::evaluate_basic<Served, detail::basic::rho>},
    entry{&detail::basic_record<Served, detail::basic::cp>,
          &detail::evaluate_basic<Served, detail::basic::cp>},
    entry{&detail::basic_record<Served, detail::basic::k>,
          &detail::evaluate_basic<Served, detail::basic::k>},
    entry{&detail::basic_record<Served, detail::basic::mu>,
          &detail::evaluate_basic<Served, detail::basic::mu>},
    entry{&detail::basic_record<Served, detail::basic::beta>,
          &detail::evaluate_basic<Served, detail::basic::beta>},
    entry{&detail::basic_record<Served, detail::basic::Pr>,
          &detail::evaluate_basic<Served, detail::basic::Pr>}};

/// Lists put one behind the other.
template <std::size_t... Size>
constexpr auto joined(const std::array<entry, Size>&... lists) {
  std::array<entry, (Size + ... + 0)> longer{};
  std::size_t i = 0;
  const auto append = [&](const auto& one) {
    for (const entry& e : one) longer[i++] = e;
  };
  (append(lists), ...);
  return longer;
}

}  // namespace catalogue
}  // namespace v0
}  // namespace convelope

#endif
