#ifndef CONVELOPE_FLUIDS_FLUID_HPP
#define CONVELOPE_FLUIDS_FLUID_HPP

#include <array>

#include "convelope/estimate/estimate.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// All a convection formula needs to know of a fluid at one state, in SI units.
template <class T>
struct fluid_values {
  T density;        // kg/m3
  T specific_heat;  // J/(kg K), at constant pressure
  T conductivity;   // W/(m K)
  T viscosity;      // Pa s
  T expansion;      // 1/K, -(1/rho)(d rho/d T)_p, negative for cold water

  CONVELOPE_FUNCTION constexpr T prandtl() const {
    return T(specific_heat * viscosity / conductivity);
  }
  CONVELOPE_FUNCTION constexpr T kinematic_viscosity() const { return T(viscosity / density); }
  CONVELOPE_FUNCTION constexpr T diffusivity() const {
    return T(conductivity / (density * specific_heat));
  }
};

/// Where natural convection takes the expansion coefficient.
enum class expansion_rule : unsigned char {
  ambient,  // gases: 1/T_inf of an ideal gas
  film      // liquids
};

/// A fluid: values(T, p) on any scalar type, check(T, p) with the bits of the limits it leaves,
/// info() for people, and where its expansion coefficient is taken. A host's own struct will do.
template <class Fluid>
concept fluid = requires(const Fluid& f, const double& x) {
  { f.values(x, x) } -> std::same_as<fluid_values<double>>;
  { f.check(x, x) } -> std::same_as<std::uint64_t>;
  { f.info() } -> std::convertible_to<const fluid_info*>;
  { Fluid::expansion_at } -> std::convertible_to<expansion_rule>;
};

namespace detail {
/// A fluid's list of limits as constants of the function that asks: device code has no others.
template <std::size_t Count>
CONVELOPE_FUNCTION constexpr std::array<limit_info, Count> constants_of(
    const limit_info (&list)[Count]) {
  return std::to_array(list);
}
}  // namespace detail

/// The verdict bits of limit number i of a fluid: low <= x <= high.
template <class T>
CONVELOPE_FUNCTION constexpr bits_t<T> fluid_limit(int i, const T& x,
                                                   const std::type_identity_t<T>& low,
                                                   const std::type_identity_t<T>& high) {
  using adaptor = scalar_adaptor<T>;
  return bits_t<T>(adaptor::bits_where(!(x >= low), detail::word::of_fluid(i, side::below)) |
                   adaptor::bits_where(!(x <= high), detail::word::of_fluid(i, side::above)) |
                   adaptor::bits_where_not_finite(x, detail::word::not_finite));
}

/// A fluid at one state: every property as an estimate that carries the fluid's verdict.
template <class T>
class fluid_state {
 public:
  CONVELOPE_FUNCTION constexpr fluid_state(const fluid_values<T>& values, const bits_t<T>& bits,
                                           const fluid_info* info)
      : values_(values), bits_(bits), info_(info) {}

  /// Raw SI numbers.
  CONVELOPE_FUNCTION constexpr const fluid_values<T>& values() const { return values_; }
  CONVELOPE_FUNCTION constexpr verdict<bits_t<T>> verdict_bits() const {
    return verdict<bits_t<T>>(bits_);
  }

  CONVELOPE_FUNCTION constexpr auto density() const {
    return given<kinds::density>(values_.density, info_->uncertainty.density);
  }
  CONVELOPE_FUNCTION constexpr auto specific_heat() const {
    return given<kinds::specific_heat>(values_.specific_heat, info_->uncertainty.specific_heat);
  }
  CONVELOPE_FUNCTION constexpr auto conductivity() const {
    return given<kinds::conductivity>(values_.conductivity, info_->uncertainty.conductivity);
  }
  CONVELOPE_FUNCTION constexpr auto viscosity() const {
    return given<kinds::viscosity>(values_.viscosity, info_->uncertainty.viscosity);
  }
  CONVELOPE_FUNCTION constexpr auto expansion_coefficient() const {
    return given<kinds::expansion_coefficient>(values_.expansion, info_->uncertainty.expansion);
  }
  CONVELOPE_FUNCTION constexpr auto prandtl_number() const {
    const property_uncertainty& u = info_->uncertainty;
    return of_variance<kinds::prandtl>(
        values_.prandtl(),
        squared(u.specific_heat) + squared(u.viscosity) + squared(u.conductivity),
        u.specific_heat < 0.0 || u.viscosity < 0.0 || u.conductivity < 0.0);
  }

 private:
  CONVELOPE_FUNCTION static constexpr double squared(double relative) {
    return relative < 0.0 ? 0.0 : relative * relative;  // not_stated counts as nothing
  }
  template <class K>
  CONVELOPE_FUNCTION constexpr estimate<K, T> given(const T& x, double relative) const {
    return of_variance<K>(x, squared(relative), relative < 0.0);
  }
  template <class K>
  CONVELOPE_FUNCTION constexpr estimate<K, T> of_variance(const T& x, double variance,
                                                          bool partly_unstated) const {
    const std::uint64_t flag = partly_unstated ? detail::word::scatter_not_stated : 0;
    return estimate<K, T>(x, verdict<bits_t<T>>(bits_t<T>(bits_ | bits_t<T>(flag))),
                          scalar_adaptor<plain_t<T>>::constant(variance), nullptr, info_);
  }

  fluid_values<T> values_;
  bits_t<T> bits_;
  const fluid_info* info_;
};

/// The fluid's state at a temperature (of any station) and an absolute pressure, which may stay a
/// double where the temperature is a dual or a pack.
template <fluid Fluid, class K, class T, class P>
  requires(detail::is_point<K> && (std::is_same_v<P, T> || std::is_same_v<P, double>))
CONVELOPE_FUNCTION constexpr fluid_state<T> state_of(const Fluid& f, const typed<K, T>& temperature,
                                                     const typed<kinds::pressure, P>& at_pressure) {
  using W = working_t<T>;
  const W t = W(temperature.si());
  const W p = [&] {
    if constexpr (std::is_same_v<P, T>) {
      return W(at_pressure.si());
    } else {
      return scalar_adaptor<W>::constant(at_pressure.si());
    }
  }();
  const auto raw = f.values(t, p);
  const auto number = [](const W& x) { return detail::as_result<T>(x); };
  return fluid_state<T>({number(raw.density), number(raw.specific_heat), number(raw.conductivity),
                         number(raw.viscosity), number(raw.expansion)},
                        bits_t<T>(f.check(t, p)), f.info());
}

}  // namespace v0
}  // namespace convelope

#endif
