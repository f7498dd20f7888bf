#ifndef CONVELOPE_FLUIDS_HUMID_AIR_HPP
#define CONVELOPE_FLUIDS_HUMID_AIR_HPP

#include "convelope/fluids/detail/humid_air.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/kinds/humidity.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference humid_air_source{
    "R. W. Hyland, A. Wexler", 1983,
    "ASHRAE Trans. 89 (1983) 500-519 (saturation pressure); Wilke, J. Chem. Phys. 18 (1950) "
    "517-519 (viscosity); Mason, Saxena, Phys. Fluids 1 (1958) 361-369 (conductivity)",
    known::quoted,
    "ideal mixture of dry air and dilute steam; CIPM-2007 gives a better density, but only "
    "between 15 and 27 degC and near 0.1 MPa"};

// x_v: the mole fraction of the vapour.
inline constexpr limit_info humid_air_limits[] = {
    {"T", 273.15, 473.15}, {"p", 1e4, 1.5e5}, {"phi", 0.0, 1.0}, {"x_v", 0.0, 0.3}};

// Of the ideal mixture at x_v = 0.3, estimated: steam at 45 kPa has 4.5 % more heat capacity near
// saturation and is 0.8 % denser. Transport: 1 to 2 % of the mixture rules (from memory) next to
// 2 % of the pure gases. Expansion: at constant composition.
inline constexpr fluid_info humid_air_info{
    "humid air", &humid_air_source, humid_air_limits, 4, {0.005, 0.02, 0.035, 0.03, 0.02}};
}  // namespace detail

/// Humid air, 273.15 .. 473.15 K, 10 .. 150 kPa, up to saturation and a vapour mole fraction of
/// 0.3: `humid_air{relative_humidity(0.5)}` or `humid_air{humidity_ratio(0.01)}`.
/// An ideal mixture of dry air (dry_air_fast) and steam as a dilute gas; viscosity by Wilke,
/// conductivity with the same weights by Mason and Saxena; saturation by Hyland and Wexler.
/// A relative humidity is held at every temperature asked for. Air that is only heated or cooled
/// keeps its humidity ratio instead: see ratio(). The expansion coefficient is 1/T, at constant
/// composition; buoyancy by differences of humidity is left out.
/// Cost: three square roots; one exp and one log more for a relative humidity and in check().
template <class Humidity>
  requires(std::is_same_v<Humidity, kinds::relative_humidity> ||
           std::is_same_v<Humidity, kinds::humidity_ratio>)
struct humid_air {
  static constexpr expansion_rule expansion_at = expansion_rule::ambient;
  static constexpr double air_mass = 28.9586e-3;      // kg/mol, as dry_air
  static constexpr double vapour_mass = 18.01528e-3;  // kg/mol

  typed<Humidity> humidity;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K,
                                                      const T& pressure_Pa) const {
    const T one = scalar_adaptor<T>::constant(1.0);
    const T wet = math::smaller(vapour_fraction(temperature_K, pressure_Pa), one);
    const T dry = T(1.0 - wet);
    const fluid_values<T> air = dry_air_fast{}.values(temperature_K, pressure_Pa);
    const detail::vapour_values<T> vapour = detail::dilute_vapour(
        T((temperature_K - 600.0) / (temperature_K + 600.0)), math::sqrt(temperature_K));

    // Wilke's weights of the other gas
    const T ratio = T(air.viscosity / vapour.viscosity);
    const T sum = T(1.0 + math::sqrt(ratio) * (1.0 / fourth_root));
    const T on_air = T(sum * sum * air_weight);
    const T on_vapour = T(on_air * (air_mass / vapour_mass) / ratio);
    const T air_share = T(dry / (dry + wet * on_air));
    const T vapour_share = T(wet / (wet + dry * on_vapour));

    const T air_part = T(dry * air_mass);
    const T vapour_part = T(wet * vapour_mass);
    const T mass = T(air_part + vapour_part);
    return {T(air.density * mass * (1.0 / air_mass)),
            T((air_part * air.specific_heat + vapour_part * vapour.specific_heat) / mass),
            T(air_share * air.conductivity + vapour_share * vapour.conductivity),
            T(air_share * air.viscosity + vapour_share * vapour.viscosity), air.expansion};
  }

  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    constexpr auto limits = detail::constants_of(detail::humid_air_limits);
    const auto within = [](int i, const limit_info& l, const T& x) {
      return fluid_limit(i, x, scalar_adaptor<T>::constant(l.low),
                         scalar_adaptor<T>::constant(l.high));
    };
    const T x = vapour_fraction(temperature_K, pressure_Pa);
    T relative = scalar_adaptor<T>::constant(humidity.si());
    if constexpr (by_ratio) {
      relative = T(x * pressure_Pa / saturation_pressure(temperature_K));
    }
    return bits_t<T>(within(0, limits[0], temperature_K) | within(1, limits[1], pressure_Pa) |
                     within(2, limits[2], relative) | within(3, limits[3], x));
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::humid_air_info; }

  /// Pa, 273.15 .. 473.15 K: Hyland and Wexler 1983.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T saturation_pressure(const T& temperature_K) {
    return detail::hyland_wexler(temperature_K);
  }
  /// Mole fraction of the vapour.
  template <class T>
  CONVELOPE_FUNCTION constexpr T vapour_fraction(const T& temperature_K,
                                                 const T& pressure_Pa) const {
    if constexpr (by_ratio) {
      const double w = humidity.si();
      return scalar_adaptor<T>::constant(w / (vapour_mass / air_mass + w));
    } else {
      return T(humidity.si() * saturation_pressure(temperature_K) / pressure_Pa);
    }
  }
  /// The humidity ratio at a temperature and a pressure, kg vapour per kg dry air.
  template <class T>
  CONVELOPE_FUNCTION constexpr T ratio(const T& temperature_K, const T& pressure_Pa) const {
    const T x = vapour_fraction(temperature_K, pressure_Pa);
    return T((vapour_mass / air_mass) * x / (1.0 - x));
  }

 private:
  static constexpr bool by_ratio = std::is_same_v<Humidity, kinds::humidity_ratio>;
  static constexpr double fourth_root = 1.1259889703927712;  // of air_mass/vapour_mass
  static constexpr double air_weight = 0.21895118385779172;  // 1/sqrt(8 (1 + air_mass/vapour_mass))
};

template <class Humidity>
humid_air(typed<Humidity>) -> humid_air<Humidity>;

}  // namespace v0
}  // namespace convelope

#endif
