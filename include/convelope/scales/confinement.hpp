#ifndef CONVELOPE_SCALES_CONFINEMENT_HPP
#define CONVELOPE_SCALES_CONFINEMENT_HPP

#include "convelope/estimate/info.hpp"
#include "convelope/kinds.hpp"
#include "convelope/scalar.hpp"

namespace convelope {
inline namespace v0 {

enum class confinement : unsigned char {
  external,  // the passage walls are too far to matter
  confined,  // the body blocks enough of the passage to speed the stream up
  internal   // boundary layers of both walls have met: a duct flow
};

constexpr const char* words(confinement c) {
  switch (c) {
    case confinement::external:
      return "external";
    case confinement::confined:
      return "confined";
    case confinement::internal:
      break;
  }
  return "internal";
}

/// The class together with the numbers that decided it.
struct confinement_answer {
  confinement which;
  double blockage;         // body height over passage height
  double layer_over_half;  // boundary-layer thickness at the body's end over half the free gap
  double blockage_limit;
  double layer_limit;
  bool possible;  // false: a length was not positive, the answer means nothing
};

/// External, confined or internal, from the blockage and from whether the boundary layers meet.
///
/// Layer thickness at distance x: laminar 4.91 x/sqrt(Re_x) (Blasius, 99 % of the stream), behind
/// Re_x 5e5 turbulent 0.37 x/Re_x^0.2 (Schlichting, Boundary-Layer Theory, from memory).
/// Internal: the layer fills half the free gap. Confined: blockage above 0.1 (common practice).
inline confinement_answer classify(const typed<kinds::height>& body,
                                   const typed<kinds::gap>& passage_height,
                                   const typed<kinds::distance_from_edge>& x,
                                   double reynolds_at_x) {
  confinement_answer a{confinement::external, 0.0, 0.0, 0.1, 1.0, true};
  const double b = body.si();
  const double h = passage_height.si();
  // Written so that NaN fails.
  a.possible = b >= 0.0 && h > b && x.si() > 0.0 && reynolds_at_x > 0.0 && h < unbounded &&
               x.si() < unbounded && reynolds_at_x < unbounded;
  if (!a.possible) return a;
  const double layer = reynolds_at_x < 5e5 ? 4.91 * x.si() / math::sqrt(reynolds_at_x)
                                           : 0.37 * x.si() * math::power<-1, 5>(reynolds_at_x);
  a.blockage = b / h;
  a.layer_over_half = layer / (0.5 * (h - b));
  if (a.layer_over_half >= a.layer_limit) {
    a.which = confinement::internal;
  } else if (a.blockage > a.blockage_limit) {
    a.which = confinement::confined;
  }
  return a;
}

}  // namespace v0
}  // namespace convelope

#endif
