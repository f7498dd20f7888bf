#ifndef CONVELOPE_SCALES_SECTION_HPP
#define CONVELOPE_SCALES_SECTION_HPP

#include "convelope/correlations/friction/duct_friction.hpp"
#include "convelope/surfaces/duct.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
/// Darcy factor laminar to turbulent for a duct whose developed laminar factor is C/Re: handed
/// over to friction/konakov-1946 between Re 2300 and 4000, like the film coefficient.
template <class T>
CONVELOPE_FUNCTION constexpr T darcy_factor(const T& Re, double laminar_constant) {
  const T w = math::hand_over(Re, 2300.0, 4000.0);
  const T high = math::larger(Re, T(scalar_adaptor<T>::constant(2300.0)));
  return math::weighted(T(laminar_constant / Re), friction::konakov_1946::formula(high), w);
}
}  // namespace detail

/// The cross-section of a round duct.
struct round_section {
  typed<kinds::hydraulic_diameter> diameter;

  CONVELOPE_FUNCTION constexpr double area_m2() const {
    return 0.78539816339744831 * diameter.si() * diameter.si();
  }
  CONVELOPE_FUNCTION constexpr double perimeter_m() const {
    return 3.14159265358979324 * diameter.si();
  }
  CONVELOPE_FUNCTION constexpr double hydraulic_diameter_m() const { return diameter.si(); }
  CONVELOPE_FUNCTION constexpr round_duct_segment segment(double begin_m, double end_m) const {
    return {diameter, typed<kinds::distance_from_inlet>::from_si(begin_m),
            typed<kinds::distance_from_inlet>::from_si(end_m)};
  }
  /// 64/Re, then friction/konakov-1946.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T darcy(const T& Re) {
    return detail::darcy_factor(Re, 64.0);
  }
};

/// The cross-section of a flat channel: two walls of one width, a gap apart; its edges are ignored.
struct flat_section {
  typed<kinds::gap> gap;
  typed<kinds::plate_length> width;  // across the flow

  CONVELOPE_FUNCTION constexpr double area_m2() const { return gap.si() * width.si(); }
  CONVELOPE_FUNCTION constexpr double perimeter_m() const { return 2.0 * width.si(); }
  CONVELOPE_FUNCTION constexpr double hydraulic_diameter_m() const { return 2.0 * gap.si(); }
  CONVELOPE_FUNCTION constexpr plate_channel_segment segment(double begin_m, double end_m) const {
    return {gap, typed<kinds::distance_from_inlet>::from_si(begin_m),
            typed<kinds::distance_from_inlet>::from_si(end_m)};
  }
  /// 96/Re, then friction/konakov-1946 on the hydraulic diameter.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T darcy(const T& Re) {
    return detail::darcy_factor(Re, 96.0);
  }
};

}  // namespace v0
}  // namespace convelope

#endif
