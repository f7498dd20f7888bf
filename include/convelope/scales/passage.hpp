#ifndef CONVELOPE_SCALES_PASSAGE_HPP
#define CONVELOPE_SCALES_PASSAGE_HPP

#include "convelope/scales/section.hpp"

namespace convelope {
inline namespace v0 {

/// A part of a segment's wetted perimeter with its own temperature.
template <class T = double>
struct wall_patch {
  double perimeter_m;
  T temperature_K;
};

/// What one segment of a passage did. N patches.
template <class T, std::size_t Patches>
struct passage_step {
  T inlet_K;           // bulk
  T outlet_K;          // bulk
  T mean_K;            // bulk mean that the fluxes belong to: q = h (T_wall - mean)
  T heat_W;            // from the walls to the fluid
  T pressure_drop_Pa;  // friction
  T reynolds;          // on the hydraulic diameter
  double begin_m;      // behind the inlet
  double end_m;
  T thermal_entry_m;             // behind which the temperature profile counts as developed
  T flux_W_m2[Patches];          // from each patch
  T coefficient_W_m2K[Patches];  // of each patch
  bits_t<T> bits[Patches];
  plain_t<T> variance[Patches];
  plain_t<T> turbulent_share;
};

/// Bulk flow through a duct, marched from the inlet segment by segment. A value: copy it to look
/// ahead. T may be dual, to carry derivatives from wall temperatures down the passage.
///
/// Each segment: m cp dT_b/dx = sum h_i P_i (T_i - T_b) with h constant along it, solved exactly
/// (exponential), so a long segment is stable and heat_W = m cp (T_out - T_in) to rounding.
/// Properties and h are taken at the segment's mean bulk temperature, found in one
/// predictor-corrector step: second order in the segment length where properties vary, order 1.5
/// in a laminar entrance; with constant properties the length makes no difference. The sign of the
/// mass flow does not matter: march from the end where the fluid enters.
template <class Section, fluid Fluid, class T = double>
class passage {
 public:
  CONVELOPE_FUNCTION constexpr passage(const Section& section, const Fluid& f,
                                       const typed<kinds::mass_flow, T>& flow,
                                       const typed<kinds::bulk_temperature, T>& inlet,
                                       const typed<kinds::pressure>& p = standard_pressure)
      : section_(section),
        fluid_(f),
        mass_flow_(flow.si()),
        bulk_(inlet.si()),
        pressure_(scalar_adaptor<T>::constant(p.si())),
        from_inlet_(0.0) {}

  CONVELOPE_FUNCTION constexpr double distance_from_inlet_m() const { return from_inlet_; }
  CONVELOPE_FUNCTION constexpr const T& bulk_K() const { return bulk_; }

  /// Goes on by one segment of the given length past N wall patches.
  template <std::size_t Patches>
  CONVELOPE_FUNCTION constexpr passage_step<T, Patches> advance(
      double length_m, const wall_patch<T> (&walls)[Patches]) {
    passage_step<T, Patches> step = over(length_m, walls, bulk_);
    step = over(length_m, walls, T(0.5 * (step.inlet_K + step.outlet_K)));
    bulk_ = step.outlet_K;
    from_inlet_ += length_m;
    return step;
  }

 private:
  // One segment with properties at temperature `at`.
  template <std::size_t Patches>
  CONVELOPE_FUNCTION constexpr passage_step<T, Patches> over(double length_m,
                                                             const wall_patch<T> (&walls)[Patches],
                                                             const T& at) const {
    passage_step<T, Patches> s{};
    const fluid_values<T> v = fluid_.values(at, pressure_);
    const double D = section_.hydraulic_diameter_m();
    // |m| rounded off at rest: a passage without flow takes its walls' temperature.
    const T m = math::smooth_magnitude(mass_flow_, 1e-12);
    const T u = T(m / (v.density * section_.area_m2()));
    const duct_flow<T> in_duct{typed<kinds::mean_velocity, T>::from_si(u),
                               typed<kinds::bulk_temperature, T>::from_si(at),
                               typed<kinds::pressure, T>::from_si(pressure_)};
    const auto geometry = section_.segment(from_inlet_, from_inlet_ + length_m);

    T conductance = scalar_adaptor<T>::constant(0.0);  // W/K of all patches
    T weighted_wall = scalar_adaptor<T>::constant(0.0);
    for (std::size_t i = 0; i < Patches; ++i) {
      const film<T> f = geometry.film_at(fluid_, in_duct, walls[i].temperature_K);
      s.coefficient_W_m2K[i] = f.coefficient;
      s.bits[i] = bits_t<T>(f.bits | bits_t<T>(perimeter_bits(walls[i].perimeter_m)));
      s.variance[i] = f.variance;
      s.turbulent_share = f.share[1];
      const T c = T(f.coefficient * (walls[i].perimeter_m * length_m));
      conductance = T(conductance + c);
      // Differences from the inlet, not absolute temperatures: no cancellation.
      weighted_wall = T(weighted_wall + c * (walls[i].temperature_K - bulk_));
    }
    const T capacity = T(m * v.specific_heat);
    const T ntu = T(conductance / capacity);
    const T mean_factor = exponential_mean(ntu);
    // T_out - T_in = (1 - e^-NTU) (T_w,eq - T_in), T_w,eq the conductance-weighted wall.
    const T rise = T(mean_factor * weighted_wall / capacity);
    s.inlet_K = bulk_;
    s.outlet_K = T(bulk_ + rise);
    s.heat_W = T(capacity * rise);
    // From sum c_i (T_i - mean) = heat, written so that no conductance is no division by zero.
    s.mean_K = T(bulk_ + weighted_wall / capacity * remainder(ntu, mean_factor));
    for (std::size_t i = 0; i < Patches; ++i) {
      s.flux_W_m2[i] = T(s.coefficient_W_m2K[i] * (walls[i].temperature_K - s.mean_K));
    }
    s.reynolds = T(u * D * v.density / v.viscosity);
    s.begin_m = from_inlet_;
    s.end_m = from_inlet_ + length_m;
    // Laminar 0.05 Re Pr Dh, turbulent 10 Dh (common practice for the latter).
    s.thermal_entry_m = T(
        D * math::weighted(
                friction::entrance_length_laminar_temperature::formula(s.reynolds, v.prandtl()),
                T(scalar_adaptor<T>::constant(10.0)), math::hand_over(s.reynolds, 2300.0, 4000.0)));
    s.pressure_drop_Pa = T(Section::darcy(s.reynolds) * (0.5 * length_m / D) * v.density * u * u);
    return s;
  }

  /// (1 - e^-x) / x, right at x = 0 too.
  CONVELOPE_FUNCTION static constexpr T exponential_mean(const T& x) {
    const T series =
        T(1.0 - x * (0.5 - x * (1.0 / 6.0 - x * (1.0 / 24.0 - x * (1.0 / 120.0 - x / 720.0)))));
    const T safe = math::larger(x, T(scalar_adaptor<T>::constant(1e-2)));
    return math::select(x < T(scalar_adaptor<T>::constant(1e-2)), series,
                        T((1.0 - math::exp(T(-safe))) / safe));
  }

  /// (1 - m) / x for m = (1 - e^-x) / x.
  CONVELOPE_FUNCTION static constexpr T remainder(const T& x, const T& m) {
    const T series =
        T(0.5 - x * (1.0 / 6.0 - x * (1.0 / 24.0 - x * (1.0 / 120.0 - x * (1.0 / 720.0)))));
    const T safe = math::larger(x, T(scalar_adaptor<T>::constant(1e-2)));
    return math::select(x < T(scalar_adaptor<T>::constant(1e-2)), series, T((1.0 - m) / safe));
  }
  // A patch may have no perimeter (it takes no part), but not a negative or infinite one.
  CONVELOPE_FUNCTION static constexpr std::uint64_t perimeter_bits(double perimeter_m) {
    return perimeter_m >= 0.0 && perimeter_m <= 0.0 ? 0 : detail::usable_length(perimeter_m).bits;
  }

  Section section_;
  Fluid fluid_;
  T mass_flow_;
  T bulk_;
  T pressure_;
  double from_inlet_;
};

}  // namespace v0
}  // namespace convelope

#endif
