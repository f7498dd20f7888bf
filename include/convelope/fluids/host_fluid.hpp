#ifndef CONVELOPE_FLUIDS_HOST_FLUID_HPP
#define CONVELOPE_FLUIDS_HOST_FLUID_HPP

#include "convelope/fluids/fluid.hpp"

namespace convelope {
inline namespace v0 {

/// A property as a host knows it: a function or function object of (T in K, p in Pa) that gives
/// the number in SI units. Generic (auto) if it is to run on other number types than double.
template <class P>
concept property_rule = requires(const P& f, const double& x) {
  { f(x, x) } -> std::convertible_to<double>;
};

/// Says at compile time where natural convection takes the expansion coefficient.
template <expansion_rule Rule>
struct expansion_tag {};
inline constexpr expansion_tag<expansion_rule::ambient> expansion_at_ambient{};
inline constexpr expansion_tag<expansion_rule::film> expansion_at_film{};

namespace detail {
enum class tested_number : unsigned char { temperature, pressure, unknown };

constexpr tested_number number_of_limit(const limit_info& limit) {
  const char* s = limit.symbol;
  if (s == nullptr || s[0] == 0 || s[1] != 0) return tested_number::unknown;
  return s[0] == 'T'   ? tested_number::temperature
         : s[0] == 'p' ? tested_number::pressure
                       : tested_number::unknown;
}

template <class T, class P>
CONVELOPE_FUNCTION constexpr T property(const P& f, const T& temperature_K, const T& pressure_Pa) {
  static_assert(std::is_invocable_v<const P&, const T&, const T&>,
                "a property of this host fluid does not take this number type: make it generic, "
                "[](const auto& T, const auto& p) { ... }");
  const auto y = f(temperature_K, pressure_Pa);
  if constexpr (std::is_arithmetic_v<std::remove_const_t<decltype(y)>>) {
    return scalar_adaptor<T>::constant(static_cast<double>(y));
  } else {
    return T(y);
  }
}
}  // namespace detail

/// A fluid made of a host's own five property functions: see fluid_from().
template <expansion_rule Rule, property_rule Density, property_rule SpecificHeat,
          property_rule Conductivity, property_rule Viscosity, property_rule Expansion>
class host_fluid {
 public:
  static constexpr expansion_rule expansion_at = Rule;

  constexpr host_fluid(const Density& rho, const SpecificHeat& cp, const Conductivity& k,
                       const Viscosity& mu, const Expansion& beta, const fluid_info* info)
      : density_(rho),
        specific_heat_(cp),
        conductivity_(k),
        viscosity_(mu),
        expansion_(beta),
        info_(info) {}

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    return {detail::property<T>(density_, temperature_K, pressure_Pa),
            detail::property<T>(specific_heat_, temperature_K, pressure_Pa),
            detail::property<T>(conductivity_, temperature_K, pressure_Pa),
            detail::property<T>(viscosity_, temperature_K, pressure_Pa),
            detail::property<T>(expansion_, temperature_K, pressure_Pa)};
  }

  /// Tests the limits on "T" and "p". One on anything else, or one more than a verdict has room
  /// for, can't be tested and counts as left on both sides: silence would be worse.
  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    namespace word = detail::word;
    using adaptor = scalar_adaptor<T>;
    using bits = bits_t<T>;
    bits seen = bits(adaptor::bits_where_not_finite(temperature_K, word::not_finite) |
                     adaptor::bits_where_not_finite(pressure_Pa, word::not_finite));
    for (int i = 0; i < info_->limit_count; ++i) {
      const limit_info& limit = info_->limits[i];
      const detail::tested_number which = detail::number_of_limit(limit);
      if (i >= word::fluid_limits || which == detail::tested_number::unknown) {
        const int bit = i < word::fluid_limits ? i : word::fluid_limits - 1;
        seen =
            bits(seen | bits(word::of_fluid(bit, side::below) | word::of_fluid(bit, side::above)));
        continue;
      }
      const T& x = which == detail::tested_number::temperature ? temperature_K : pressure_Pa;
      if (!(limit.low <= -unbounded)) {
        seen = bits(seen | adaptor::bits_where(!(x >= adaptor::constant(limit.low)),
                                               word::of_fluid(i, side::below)));
      }
      if (!(limit.high >= unbounded)) {
        seen = bits(seen | adaptor::bits_where(!(x <= adaptor::constant(limit.high)),
                                               word::of_fluid(i, side::above)));
      }
    }
    return seen;
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return info_; }

 private:
  [[no_unique_address]] Density density_;
  [[no_unique_address]] SpecificHeat specific_heat_;
  [[no_unique_address]] Conductivity conductivity_;
  [[no_unique_address]] Viscosity viscosity_;
  [[no_unique_address]] Expansion expansion_;
  const fluid_info* info_;
};

/// A fluid from five functions (T, p) -> SI number and what is known about it:
/// fluid_from(rho, cp, k, mu, beta, info, expansion_at_film).
/// The info (name, source, limits on "T" and "p", uncertainties) must outlive the fluid and every
/// estimate made with it: keep it static. Nothing is allocated, the functions are copied.
template <property_rule Density, property_rule SpecificHeat, property_rule Conductivity,
          property_rule Viscosity, property_rule Expansion, expansion_rule Rule>
constexpr auto fluid_from(Density rho, SpecificHeat cp, Conductivity k, Viscosity mu,
                          Expansion beta, const fluid_info& info, expansion_tag<Rule>) {
  return host_fluid<Rule, Density, SpecificHeat, Conductivity, Viscosity, Expansion>(rho, cp, k, mu,
                                                                                     beta, &info);
}
/// A temporary info would be gone before the fluid is used.
template <property_rule Density, property_rule SpecificHeat, property_rule Conductivity,
          property_rule Viscosity, property_rule Expansion, expansion_rule Rule>
void fluid_from(Density, SpecificHeat, Conductivity, Viscosity, Expansion, const fluid_info&&,
                expansion_tag<Rule>) = delete;

}  // namespace v0
}  // namespace convelope

#endif
