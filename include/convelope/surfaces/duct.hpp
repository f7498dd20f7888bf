#ifndef CONVELOPE_SURFACES_DUCT_HPP
#define CONVELOPE_SURFACES_DUCT_HPP

#include "convelope/correlations/internal/parallel_plates.hpp"
#include "convelope/correlations/internal/round_duct.hpp"
#include "convelope/groups/property_ratio.hpp"
#include "convelope/groups/state.hpp"
#include "convelope/surfaces/film.hpp"

namespace convelope {
inline namespace v0 {

namespace detail {
/// Laminar and turbulent duct flow over a segment from x0 to x1 behind the inlet, handed over
/// between Re 2300 and 4000 (the limits of Gnielinski 2013, Int. J. Heat Mass Transfer 63,
/// 134-140; a quintic instead of his straight line, so that the slope is continuous).
///
/// `Laminar::mean(Re, Pr, L_over_D)` is a mean from the inlet. The segment's own mean is
/// [x1 Nu_m(x1) - x0 Nu_m(x0)] / (x1 - x0): restarting the mean on every segment would count the
/// entrance again and again.
template <class Laminar, fluid Fluid, class T>
CONVELOPE_FUNCTION constexpr film<T> duct_film(const Fluid& f, const duct_flow<T>& s, const T& wall,
                                               double diameter_m, double x0_m, double x1_m) {
  using turbulent = round_duct::gnielinski_1976;
  using laminar = typename Laminar::correlation;
  using P = plain_t<T>;
  using adaptor = scalar_adaptor<T>;
  const usable_length d(diameter_m);
  const usable_length l(x1_m - x0_m);
  const usable_length end(x1_m);
  // Zero is the inlet itself, where the mean times x is 0.
  const std::uint64_t start_bits = x0_m >= 0.0 && x0_m <= 0.0 ? 0 : usable_length(x0_m).bits;
  const double start = start_bits == 0 ? x0_m : 0.0;

  const T& bulk = s.temperature.si();
  const T& p = s.pressure.si();
  const T at = state_of<laminar, turbulent>(wall, bulk);
  const fluid_values<T> v = f.values(at, p);
  const T Pr = v.prandtl();
  const T Re = rounded_reynolds(v, s.velocity.si(), d.metres);
  const T one = adaptor::constant(1.0);

  // One property correction: gases by temperature, liquids by Prandtl number, never both.
  T Pr_ratio = one;
  T T_ratio = one;
  if constexpr (is_gas<Fluid>) {
    T_ratio = math::smaller(T(bulk / wall), one);  // 1 for a cooled gas
  } else {
    Pr_ratio = T(Pr / f.values(wall, p).prandtl());
  }
  static_assert(corrects_itself<turbulent>() && !corrects_itself<laminar>());
  const T laminar_factor =
      is_gas<Fluid> ? one : property_ratio::gnielinski_1976_liquid::formula(Pr_ratio);

  const T w = math::hand_over(Re, 2300.0, 4000.0);
  const T Re_turbulent = math::larger(Re, adaptor::constant(2300.0));
  const auto share_of_segment = [&](const auto& mean_to) {
    const T to_end = T(end.metres * mean_to(adaptor::constant(end.metres / d.metres)));
    if (!(start > 0.0)) return T(to_end * (1.0 / l.metres));
    const T to_start = T(start * mean_to(adaptor::constant(start / d.metres)));
    return T((to_end - to_start) * (1.0 / l.metres));
  };
  const T Nu_laminar = T(laminar_factor * share_of_segment([&](const T& L_over_D) {
                           return Laminar::mean(Re, Pr, L_over_D);
                         }));
  const T Nu_turbulent = share_of_segment([&](const T& L_over_D) {
    return turbulent::formula(Re_turbulent, Pr, L_over_D, Pr_ratio, T_ratio);
  });

  const T L_over_D = adaptor::constant(end.metres / d.metres);
  const P turbulent_share = plain(w);
  const P laminar_share = complement(turbulent_share);
  const bits_t<T> bits(
      bits_t<T>(d.bits | l.bits | end.bits | start_bits) | f.check(at, p) | f.check(wall, p) |
      sound<T>(wall, bulk, p, s.velocity.si()) |
      Laminar::template verdict_bits<T>(0, laminar_share, Re, Pr, L_over_D) |
      asked<turbulent, T>(1, turbulent_share, Re, Pr, L_over_D, Pr_ratio, T_ratio));
  return film_of(
      math::weighted(Nu_laminar, Nu_turbulent, w), v.conductivity, d.metres, bulk, bits,
      P(laminar_share * variance_of<laminar, T>() + turbulent_share * variance_of<turbulent, T>()),
      laminar_share, turbulent_share);
}

struct laminar_round_duct {
  using correlation = round_duct::gnielinski_laminar_uwt_mean;
  template <class T>
  CONVELOPE_FUNCTION static constexpr T mean(const T& Re, const T& Pr, const T& L_over_D) {
    return correlation::formula(T(L_over_D / (Re * Pr)), round_duct::entry::combined, Pr);
  }
  template <class T>
  CONVELOPE_FUNCTION static constexpr bits_t<T> verdict_bits(int slot, const plain_t<T>& share,
                                                             const T& Re, const T& Pr,
                                                             const T& L_over_D) {
    return asked<correlation, T>(slot, share, T(L_over_D / (Re * Pr)), round_duct::entry::combined,
                                 Pr);
  }
};

struct laminar_plate_channel {
  using correlation = parallel_plates::edwards_1979;
  template <class T>
  CONVELOPE_FUNCTION static constexpr T mean(const T& Re, const T& Pr, const T& L_over_D) {
    return correlation::formula(T(Re * Pr / L_over_D));
  }
  template <class T>
  CONVELOPE_FUNCTION static constexpr bits_t<T> verdict_bits(int slot, const plain_t<T>& share,
                                                             const T& Re, const T& Pr,
                                                             const T& L_over_D) {
    return asked<correlation, T>(slot, share, T(Re * Pr / L_over_D));
  }
};
}  // namespace detail

/// A segment of a round duct, from `begin` to `end` behind the inlet, at one wall temperature and
/// one bulk temperature.
///
/// Laminar round-duct/gnielinski-laminar-uwt (both layers developing), turbulent
/// round-duct/gnielinski-1976 with entrance and property factors; see detail::duct_film.
struct round_duct_segment {
  typed<kinds::hydraulic_diameter> diameter;
  typed<kinds::distance_from_inlet> begin;
  typed<kinds::distance_from_inlet> end;

  static constexpr const char* name = "round duct";
  static constexpr const speakers& speaks =
      detail::speakers_of<round_duct::gnielinski_laminar_uwt_mean, round_duct::gnielinski_1976>;
  template <class T>
  using exposure = duct_flow<T>;

  template <fluid Fluid, class T>
  CONVELOPE_FUNCTION constexpr film<T> film_at(const Fluid& f, const duct_flow<T>& s,
                                               const T& wall) const {
    return detail::duct_film<detail::laminar_round_duct>(f, s, wall, diameter.si(), begin.si(),
                                                         end.si());
  }
};

/// A segment of a flat channel between two parallel walls, both at the wall temperature.
///
/// Hydraulic diameter 2 x gap. Laminar parallel-plates/edwards-1979, turbulent
/// round-duct/gnielinski-1976 on the hydraulic diameter (common practice for flat channels).
struct plate_channel_segment {
  typed<kinds::gap> gap;
  typed<kinds::distance_from_inlet> begin;
  typed<kinds::distance_from_inlet> end;

  static constexpr const char* name = "flat channel";
  static constexpr const speakers& speaks =
      detail::speakers_of<parallel_plates::edwards_1979, round_duct::gnielinski_1976>;
  template <class T>
  using exposure = duct_flow<T>;

  template <fluid Fluid, class T>
  CONVELOPE_FUNCTION constexpr film<T> film_at(const Fluid& f, const duct_flow<T>& s,
                                               const T& wall) const {
    return detail::duct_film<detail::laminar_plate_channel>(f, s, wall, 2.0 * gap.si(), begin.si(),
                                                            end.si());
  }
};

}  // namespace v0
}  // namespace convelope

#endif
