#ifndef CONVELOPE_FLUIDS_GLYCOL_WATER_HPP
#define CONVELOPE_FLUIDS_GLYCOL_WATER_HPP

#include <array>

#include "convelope/fluids/detail/if97_saturation.hpp"
#include "convelope/fluids/fluid.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
/// C_ij of sum C_ij X^i Y^j, X = mass percent - x_m, Y = t/degC - t_m.
struct melinder_terms {
  double c[6][4];

  /// The cubic in Y that is left at one X.
  constexpr std::array<double, 4> at(double X) const {
    std::array<double, 4> a{};
    for (int i = 5; i >= 0; --i) {
      for (std::size_t j = 0; j < 4; ++j) a[j] = a[j] * X + c[i][j];
    }
    return a;
  }
};

// A density at 2 MPa is 0.1 % higher than at 0.1 MPa: within the uncertainty of the source.
inline constexpr limit_info glycol_water_limits[] = {{"T", 173.15, 373.15},
                                                     {"p", 0.0, 2e6},
                                                     {"x", 0.0, 0.6},
                                                     {"T/T_freeze", 1.0, unbounded},
                                                     {"p/p_boil", 1.0, unbounded}};
// From memory; none is stated for the expansion coefficient.
inline constexpr property_uncertainty glycol_water_uncertainty{0.003, 0.01, 0.02, 0.05, not_stated};

struct ethylene_glycol_melinder {
  static constexpr double x_mean = 30.8462;
  static constexpr double t_mean = 31.728;
  static constexpr double molar_mass = 62.068;  // g/mol
  static constexpr reference source{
      "A. Melinder", 2010,
      "Properties of Secondary Working Fluids for Indirect Systems, IIR, Paris", known::quoted,
      "copies disagree on the sign of the viscosity terms 1.086e-6 and 1.051e-8: plus, because "
      "with "
      "minus the viscosity of pure water at 100 degC comes out 22 % low; other disagreements move "
      "no property by 0.1 %"};
  static constexpr fluid_info info{"ethylene glycol and water", &source, glycol_water_limits, 5,
                                   glycol_water_uncertainty};
  static constexpr melinder_terms density = {{{1034.0, -0.4781, -0.002692, 4.725e-06},
                                              {1.311, -0.006876, 4.805e-05, 1.69e-08},
                                              {7.49e-05, 7.855e-05, -3.995e-07, 4.982e-09},
                                              {-0.0001062, 1.229e-06, -1.153e-08, 0.0},
                                              {-9.623e-07, -7.211e-08, 0.0, 0.0},
                                              {4.891e-08, 0.0, 0.0, 0.0}}};
  static constexpr melinder_terms specific_heat = {{{3737.0, 2.93, -0.004675, -1.389e-05},
                                                    {-17.99, 0.1046, -0.0004147, 1.847e-07},
                                                    {-0.09933, 0.0003516, 5.109e-06, -7.138e-08},
                                                    {0.00261, -1.189e-06, -1.643e-07, 0.0},
                                                    {1.537e-05, -4.272e-07, 0.0, 0.0},
                                                    {-1.618e-06, 0.0, 0.0, 0.0}}};
  static constexpr melinder_terms conductivity = {{{0.472, 0.0008903, -1.058e-06, -2.789e-09},
                                                   {-0.004286, -1.473e-05, 1.059e-07, -1.142e-10},
                                                   {1.747e-05, 6.814e-08, -3.612e-09, 2.365e-12},
                                                   {3.017e-08, -2.412e-09, 4.004e-11, 0.0},
                                                   {-1.322e-09, 2.555e-11, 0.0, 0.0},
                                                   {2.678e-11, 0.0, 0.0, 0.0}}};
  static constexpr melinder_terms log_viscosity = {{{0.4705, -0.0255, 0.0001782, -7.669e-07},
                                                    {0.02471, -0.0001171, 1.052e-06, -1.634e-08},
                                                    {3.328e-06, 1.086e-06, 1.051e-08, -6.475e-10},
                                                    {1.695e-06, 3.157e-09, 4.063e-10, 0.0},
                                                    {3.089e-08, 1.831e-10, 0.0, 0.0},
                                                    {-1.865e-09, 0.0, 0.0, 0.0}}};
  static constexpr melinder_terms freezing = {{{-15.25, -1.566e-06, -2.278e-07, 2.169e-09},
                                               {-0.808, -1.339e-06, 2.047e-08, -2.717e-11},
                                               {-0.01334, 6.322e-08, 2.373e-10, -2.183e-12},
                                               {-7.293e-05, -1.764e-09, -2.442e-11, 0.0},
                                               {1.006e-06, -7.662e-11, 0.0, 0.0},
                                               {1.14e-09, 0.0, 0.0, 0.0}}};
};

struct propylene_glycol_melinder {
  static constexpr double x_mean = 30.7031;
  static constexpr double t_mean = 32.7083;
  static constexpr double molar_mass = 76.095;  // g/mol
  static constexpr reference source{ethylene_glycol_melinder::source.authors,
                                    ethylene_glycol_melinder::source.year,
                                    ethylene_glycol_melinder::source.where, known::quoted};
  static constexpr fluid_info info{"propylene glycol and water", &source, glycol_water_limits, 5,
                                   glycol_water_uncertainty};
  static constexpr melinder_terms density = {{{1018.0, -0.5406, -0.002666, 1.347e-05},
                                              {0.7604, -0.00945, 5.541e-05, -1.343e-07},
                                              {-0.002498, 2.7e-05, -4.018e-07, 3.376e-09},
                                              {-0.000155, 2.829e-06, -7.175e-09, 0.0},
                                              {-1.131e-06, -2.221e-08, 0.0, 0.0},
                                              {2.342e-08, 0.0, 0.0, 0.0}}};
  static constexpr melinder_terms specific_heat = {{{3882.0, 2.699, -0.001659, -1.032e-05},
                                                    {-13.04, 0.0507, -4.752e-05, 1.522e-06},
                                                    {-0.1598, 9.534e-05, 1.167e-05, -4.87e-08},
                                                    {0.0003539, 3.102e-05, -2.95e-07, 0.0},
                                                    {5e-05, -7.135e-07, 0.0, 0.0},
                                                    {-4.959e-07, 0.0, 0.0, 0.0}}};
  static constexpr melinder_terms conductivity = {{{0.4513, 0.0007955, 3.482e-08, -5.966e-09},
                                                   {-0.004795, -1.678e-05, 8.941e-08, 1.493e-10},
                                                   {2.076e-05, 1.563e-07, -4.615e-09, 9.897e-12},
                                                   {-9.083e-08, -2.518e-09, 6.543e-11, 0.0},
                                                   {-5.952e-10, -3.605e-11, 0.0, 0.0},
                                                   {2.104e-11, 0.0, 0.0, 0.0}}};
  static constexpr melinder_terms log_viscosity = {{{0.6837, -0.03045, 0.0002525, -1.399e-06},
                                                    {0.03328, -0.0003984, 4.332e-06, -1.86e-08},
                                                    {5.453e-05, -8.6e-08, -1.593e-08, -4.465e-11},
                                                    {-3.9e-06, 1.054e-07, -1.589e-09, 0.0},
                                                    {-1.587e-08, 4.475e-10, 0.0, 0.0},
                                                    {3.564e-09, 0.0, 0.0, 0.0}}};
  static constexpr melinder_terms freezing = {{{-13.25, -3.82e-05, 7.865e-07, -1.733e-09},
                                               {-0.6631, 6.774e-06, -6.242e-08, -7.819e-10},
                                               {-0.01094, 5.332e-08, -4.169e-09, 3.288e-11},
                                               {-0.0002283, -1.131e-08, 1.918e-10, 0.0},
                                               {-3.409e-06, 8.035e-11, 0.0, 0.0},
                                               {1.465e-08, 0.0, 0.0, 0.0}}};
};

/// What both glycols share; the concentration's part of the polynomials is done once, here.
template <class Glycol>
class glycol_water {
 public:
  static constexpr expansion_rule expansion_at = expansion_rule::film;

  constexpr explicit glycol_water(const typed<kinds::mass_fraction>& glycol)
      : fraction_(glycol.si()),
        density_(Glycol::density.at(100.0 * fraction_ - Glycol::x_mean)),
        specific_heat_(Glycol::specific_heat.at(100.0 * fraction_ - Glycol::x_mean)),
        conductivity_(Glycol::conductivity.at(100.0 * fraction_ - Glycol::x_mean)),
        log_viscosity_(Glycol::log_viscosity.at(100.0 * fraction_ - Glycol::x_mean)),
        freezing_(Glycol::freezing.at(100.0 * fraction_ - Glycol::x_mean)) {}

  template <class T>
  CONVELOPE_FUNCTION constexpr fluid_values<T> values(const T& temperature_K, const T&) const {
    const T y = T(temperature_K - (273.15 + Glycol::t_mean));
    const T rho = cubic(density_, y);
    const T slope = T(density_[1] + y * (2.0 * density_[2] + y * (3.0 * density_[3])));
    return {rho, cubic(specific_heat_, y), cubic(conductivity_, y),
            T(1e-3 * math::exp(cubic(log_viscosity_, y))), T(-slope / rho)};
  }

  template <class T>
  CONVELOPE_FUNCTION constexpr bits_t<T> check(const T& temperature_K, const T& pressure_Pa) const {
    using adaptor = scalar_adaptor<T>;
    constexpr auto l = constants_of(glycol_water_limits);
    std::uint64_t of_mixture = fluid_limit(2, fraction_, l[2].low, l[2].high);
    if (!(fraction_ >= 0.0 && fraction_ <= 1.0)) of_mixture |= word::impossible;
    return bits_t<T>(
        fluid_limit(0, temperature_K, adaptor::constant(l[0].low), adaptor::constant(l[0].high)) |
        fluid_limit(1, pressure_Pa, adaptor::constant(l[1].low), adaptor::constant(l[1].high)) |
        bits_t<T>(of_mixture) |
        adaptor::bits_where(!(temperature_K >= freezing_point(temperature_K)),
                            word::of_fluid(3, side::below)) |
        adaptor::bits_where(!(pressure_Pa >= boiling_pressure(temperature_K)),
                            word::of_fluid(4, side::below)));
  }

  /// K. The published polynomial has terms in the temperature too, worth at most 0.1 K.
  template <class T>
  CONVELOPE_FUNCTION constexpr T freezing_point(const T& temperature_K) const {
    return T(273.15 + cubic(freezing_, T(temperature_K - (273.15 + Glycol::t_mean))));
  }
  CONVELOPE_FUNCTION constexpr const fluid_info* info() const { return &Glycol::info; }

 private:
  template <class T>
  CONVELOPE_FUNCTION static constexpr T cubic(const std::array<double, 4>& a, const T& y) {
    return T(a[0] + y * (a[1] + y * (a[2] + y * a[3])));
  }
  // Raoult's law with the water alone; no source, it only guards the liquid.
  template <class T>
  CONVELOPE_FUNCTION constexpr T boiling_pressure(const T& temperature_K) const {
    const double water = (1.0 - fraction_) * (1.0 / 18.01528);
    const double mole_fraction = water / (water + fraction_ * (1.0 / Glycol::molar_mass));
    const T cold = scalar_adaptor<T>::constant(273.15);
    const T hot = scalar_adaptor<T>::constant(373.15);
    const T above = math::select(temperature_K >= cold, temperature_K, cold);
    return T(mole_fraction * if97::saturation_pressure(T(math::smaller(above, hot))));
  }

  double fraction_;
  std::array<double, 4> density_;
  std::array<double, 4> specific_heat_;
  std::array<double, 4> conductivity_;
  std::array<double, 4> log_viscosity_;
  std::array<double, 4> freezing_;
};
}  // namespace detail

/// Ethylene glycol and water, 0 .. 60 % glycol by mass (not by volume), freezing point .. 100 degC,
/// near atmospheric pressure, without inhibitors: `ethylene_glycol_water(mass_fraction(0.3))`.
/// All properties: Melinder 2010. Expansion: from the slope of the density polynomial.
/// Stated (from memory): density 0.3 %, heat capacity 1 %, conductivity 2 %, viscosity 5 %.
/// Cost: one exp, one division.
struct ethylene_glycol_water : detail::glycol_water<detail::ethylene_glycol_melinder> {
  using glycol_water::glycol_water;
};

/// Propylene glycol and water, as ethylene_glycol_water.
struct propylene_glycol_water : detail::glycol_water<detail::propylene_glycol_melinder> {
  using glycol_water::glycol_water;
};

}  // namespace v0
}  // namespace convelope

#endif
