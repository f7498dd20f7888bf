#ifndef CONVELOPE_BOUNDARY_SURFACE_HPP
#define CONVELOPE_BOUNDARY_SURFACE_HPP

#include "convelope/surfaces/film.hpp"

namespace convelope {
inline namespace v0 {

/// A wall's flux law as a pair a host's matrix can take: q = coefficient (T_wall - temperature).
template <class T>
struct robin {
  T coefficient;  // W/(m2 K)
  T temperature;  // K
};

/// The answer for one wall temperature: flux, slope and all that is known about them.
/// T is double, or a pack with one wall per lane. An answer made in device code has all numbers
/// and the verdict, but no documents: spoken(), correlation() and fluid() need a host.
template <class T>
class wall_answer {
 public:
  CONVELOPE_FUNCTION constexpr wall_answer(const T& wall, const film<dual<T>>& f,
                                           const speakers* who, const fluid_info* fluid)
      : wall_(wall),
        coefficient_(f.coefficient.value),
        reference_(f.reference_temperature.value),
        bits_(f.bits),
        variance_(f.variance),
        speakers_(who),
        fluid_(fluid) {
    for (int i = 0; i < detail::word::slots; ++i) share_[i] = f.share[i];
    const dual<T> q = f.coefficient * (dual<T>::variable(wall) - f.reference_temperature);
    flux_ = q.value;
    slope_ = q.slope[0];
  }

  /// q in W/m2, positive from the wall to the fluid.
  CONVELOPE_FUNCTION constexpr auto flux() const { return given<kinds::heat_flux>(flux_); }
  /// dq/dT_wall in W/(m2 K), exact: through properties, groups and correlations.
  CONVELOPE_FUNCTION constexpr auto slope() const { return given<kinds::flux_slope>(slope_); }
  /// h in W/(m2 K), based on reference_temperature_K().
  CONVELOPE_FUNCTION constexpr auto coefficient() const {
    return given<kinds::film_coefficient>(coefficient_);
  }
  CONVELOPE_FUNCTION constexpr const T& reference_temperature_K() const { return reference_; }

  /// The tangent at this wall temperature as a Robin pair; where the slope is not positive, the
  /// secant (h, reference temperature). Either way q = h_eff (T_wall - T_eff) holds here.
  CONVELOPE_FUNCTION constexpr robin<T> equivalent() const {
    const auto rising = slope_ > scalar_adaptor<T>::constant(0.0);
    const T h = math::select(rising, slope_, coefficient_);
    const T offset = math::select(rising, T(flux_ / h), T(wall_ - reference_));
    return {h, T(wall_ - offset)};
  }

  CONVELOPE_FUNCTION constexpr convelope::verdict<bits_t<T>> verdict() const {
    return convelope::verdict<bits_t<T>>(bits_);
  }
  CONVELOPE_FUNCTION constexpr bool inside() const
    requires std::is_same_v<bits_t<T>, std::uint64_t>
  {
    return verdict().inside();
  }
  /// Relative half-width of the stated scatter of what spoke.
  CONVELOPE_FUNCTION plain_t<T> scatter() const { return math::sqrt(variance_); }

  /// How many correlations the geometry joins, which they are, and what each contributed (0..1).
  CONVELOPE_FUNCTION constexpr int spoken() const { return speakers_->count; }
  CONVELOPE_FUNCTION constexpr const correlation_info* correlation(int i) const {
    return speakers_->correlation[i];
  }
  CONVELOPE_FUNCTION constexpr const plain_t<T>& share(int i) const { return share_[i]; }
  CONVELOPE_FUNCTION constexpr const fluid_info* fluid() const { return fluid_; }

 private:
  template <class K>
  CONVELOPE_FUNCTION constexpr estimate<K, T> given(const T& x) const {
    const correlation_info* first = speakers_ == nullptr ? nullptr : speakers_->correlation[0];
    return estimate<K, T>(x, verdict(), variance_, first, fluid_);
  }

  T wall_;
  T flux_;
  T slope_;
  T coefficient_;
  T reference_;
  bits_t<T> bits_;
  plain_t<T> variance_;
  plain_t<T> share_[detail::word::slots];
  const speakers* speakers_;
  const fluid_info* fluid_;
};

/// Geometry, fluid and exposure of one wall, ready to be asked.
template <wall_geometry G, fluid Fluid, class E>
class wall_surface {
 public:
  CONVELOPE_FUNCTION constexpr wall_surface(const G& geometry, const Fluid& fluid,
                                            const E& exposure)
      : geometry_(geometry), fluid_(fluid), exposure_(exposure) {}

  /// The answer at a wall temperature: `tube.at(wall_temperature(kelvin(350.0)))`.
  template <class T>
  CONVELOPE_FUNCTION constexpr wall_answer<T> at(
      const typed<kinds::wall_temperature, T>& wall) const {
    return answer(wall.si(), exposure_);
  }
  /// The same before another exposure, e.g. one per face.
  template <class T, class Other>
  CONVELOPE_FUNCTION constexpr wall_answer<T> at(const typed<kinds::wall_temperature, T>& wall,
                                                 const Other& exposure) const {
    return answer(wall.si(), exposure);
  }

  CONVELOPE_FUNCTION constexpr const G& geometry() const { return geometry_; }
  CONVELOPE_FUNCTION constexpr const Fluid& fluid_at_wall() const { return fluid_; }
  CONVELOPE_FUNCTION constexpr const E& exposure() const { return exposure_; }

 private:
  template <class T, class Exposure>
  CONVELOPE_FUNCTION constexpr wall_answer<T> answer(const T& wall, const Exposure& e) const {
    using D = dual<T>;
    const film<D> f = geometry_.film_at(fluid_, e.template as<D>(), D::variable(wall));
#if defined(__CUDA_ARCH__) || defined(__HIP_DEVICE_COMPILE__)
    return wall_answer<T>(wall, f, nullptr, nullptr);
#else
    return wall_answer<T>(wall, f, &G::speaks, fluid_.info());
#endif
  }

  G geometry_;
  Fluid fluid_;
  E exposure_;
};

/// surface(cylinder_in_crossflow{diameter(0.05 * metre)}, dry_air{}, stream{...})
template <wall_geometry G, fluid Fluid, class E>
CONVELOPE_FUNCTION constexpr wall_surface<G, Fluid, E> surface(const G& geometry,
                                                               const Fluid& fluid,
                                                               const E& exposure) {
  return wall_surface<G, Fluid, E>(geometry, fluid, exposure);
}

}  // namespace v0
}  // namespace convelope

#endif
