#ifndef CONVELOPE_FLUIDS_SEAWATER_HPP
#define CONVELOPE_FLUIDS_SEAWATER_HPP

#include "convelope/fluids/detail/if97_saturation.hpp"
#include "convelope/fluids/fluid.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
inline constexpr reference seawater_source{"M. H. Sharqawy, J. H. Lienhard V, S. M. Zubair", 2010,
                                           "Desalin. Water Treat. 16, 354-380", known::quoted,
                                           "conductivity with 647.3 and the exponent 1/3; the "
                                           "paper prints 647 and 0.333, which moves it by "
                                           "less than 1e-4"};

// A density at 2 MPa is 0.1 % higher than at 0.1 MPa: the uncertainty of the source.
inline constexpr limit_info seawater_limits[] = {
    {"T", 273.15, 453.15}, {"p", 0.0, 2e6}, {"S", 0.0, 0.15}, {"p/p_sat", 0.999, unbounded}};
inline constexpr fluid_info seawater_info{
    "seawater", &seawater_source, seawater_limits, 4, {0.001, 0.0028, 0.03, 0.015, not_stated}};
}  // namespace detail

/// Seawater, 0 .. 180 degC, 0 .. 150 g/kg, up to 2 MPa: `seawater{salinity(0.035)}`.
/// Sharqawy et al. 2010: density (its eq. 8), heat capacity (Jamieson et al. 1969), conductivity
/// (Jamieson and Tudhope 1970), viscosity (eq. 22). Expansion: from the slope of the density.
/// Without salt its density maximum lies at 1.7 degC instead of 4: below 10 degC and 20 g/kg the
/// expansion coefficient is rough.
/// Stated: density 0.1 %, heat capacity 0.28 %, conductivity 3 %, viscosity 1.5 %.
/// Cost: one exp, one cbrt, five divisions.
struct seawater {
  static constexpr expansion_rule expansion_at = expansion_rule::film;
  /// 1/K2, of the density formula near its maximum without salt.
  static constexpr double expansion_slope = 1.2e-5;

  typed<kinds::salinity> salt;

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K, const T&) const {
    const double s = salt.si();
    const double S = s * 1000.0;
    const double S_P = S * (1.0 / 1.00472);  // practical salinity
    const T t = T(temperature_K - 273.15);
    const T T68 = T(273.15 + 1.00024 * t);

    const double r1 = 2.034e-2 - 2.001 * s;
    const double r2 = -6.162e-3 + s * (1.677e-2 - 1.613e-5 * s);
    const double r3 = 2.261e-5 - 3.060e-5 * s;
    const T rho = T((999.9 + 802.0 * s) + t * (r1 + t * (r2 + t * (r3 - 4.657e-8 * t))));
    const T slope = T(r1 + t * (2.0 * r2 + t * (3.0 * r3 - 4.0 * 4.657e-8 * t)));

    const double c0 = 5.328 + S_P * (-9.76e-2 + 4.04e-4 * S_P);
    const double c1 = -6.913e-3 + S_P * (7.351e-4 - 3.15e-6 * S_P);
    const double c2 = 9.6e-6 + S_P * (-1.927e-6 + 8.23e-9 * S_P);
    const double c3 = 2.5e-9 + S_P * (1.666e-9 - 7.125e-12 * S_P);
    const T cp = T(1000.0 * (c0 + T68 * (c1 + T68 * (c2 + T68 * c3))));

    // log10 k = log10(240 + 0.0002 S_P) + 0.434 (..)(..)^(1/3), k in mW/(m K)
    const T near_critical = T(1.0 - T68 * (1.0 / (647.3 + 0.03 * S_P)));
    const T power_of_ten = T((2.3 - (343.5 + 0.037 * S_P) / T68) * math::cbrt(near_critical));
    const T k = T((1e-3 * (240.0 + 0.0002 * S_P)) *
                  math::exp(T((0.434 * 2.302585092994045684) * power_of_ten)));

    const T of_water = T(4.2844e-5 + 1.0 / (0.157 * ((t + 64.993) * (t + 64.993)) - 91.296));
    const T a = T(1.541 + t * (1.998e-2 - 9.52e-5 * t));
    const T b = T(7.974 + t * (-7.561e-2 + 4.724e-4 * t));
    const T mu = T(of_water * (1.0 + s * (a + s * b)));

    return {rho, cp, k, mu, T(-slope / rho)};
  }

  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    using adaptor = scalar_adaptor<T>;
    namespace word = detail::word;
    constexpr auto l = detail::constants_of(detail::seawater_limits);
    const double s = salt.si();
    std::uint64_t of_salt = fluid_limit(2, s, l[2].low, l[2].high);
    if (!(s >= 0.0 && s <= 1.0)) of_salt |= word::impossible;
    const T cold = adaptor::constant(l[0].low);
    const T hot = adaptor::constant(l[0].high);
    const T above = math::select(temperature_K >= cold, temperature_K, cold);
    const T within = math::select(above <= hot, above, hot);
    return bits_t<T>(
        fluid_limit(0, temperature_K, cold, hot) |
        fluid_limit(1, pressure_Pa, adaptor::constant(l[1].low), adaptor::constant(l[1].high)) |
        bits_t<T>(of_salt) |
        adaptor::bits_where(!(pressure_Pa >= T(l[3].low * saturation_pressure(within))),
                            word::of_fluid(3, side::below)));
  }

  /// Pa: that of water (IAPWS-IF97) lowered by the salt, Sharqawy et al. 2010.
  template <class T>
  CONVELOPE_FUNCTION constexpr T saturation_pressure(const T& temperature_K) const {
    const double s = salt.si();
    return T((1.0 / (1.0 + 0.57357 * s / (1.0 - s))) *
             detail::if97::saturation_pressure(temperature_K));
  }
  /// J/kg, 0 .. 200 degC, 0 .. 240 g/kg: Sharqawy et al. 2010.
  template <class T>
  CONVELOPE_FUNCTION constexpr T latent_heat(const T& temperature_K) const {
    const T t = T(temperature_K - 273.15);
    return T((1.0 - salt.si()) *
             (2.501e6 + t * (-2.369e3 + t * (2.678e-1 + t * (-8.103e-3 - 2.079e-5 * t)))));
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &detail::seawater_info; }
};

}  // namespace v0
}  // namespace convelope

#endif
