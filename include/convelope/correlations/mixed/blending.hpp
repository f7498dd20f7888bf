#ifndef CONVELOPE_CORRELATIONS_MIXED_BLENDING_HPP
#define CONVELOPE_CORRELATIONS_MIXED_BLENDING_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// Forced and natural convection together. Both Nusselt numbers belong to the same wall, the same
/// length and the same |T_wall - T_stream|. A flat plate along gravity calls that length
/// plate_length in one and height in the other: name the two kinds, <plate_length, height>. For
/// other bodies name it once: <diameter>.
namespace mixed {

namespace parts {
/// (a^n +- b^n)^(1/n) from the larger of the two, so that 0 keeps a slope and nothing overflows.
template <class T>
CONVELOPE_FUNCTION constexpr T blend(const T& a, const T& b, const T& n, double sign) {
  const T tiny = T(1e-30);
  const T large = math::larger(math::larger(a, b), tiny);
  const T ratio = math::larger(T(math::smaller(a, b) / large), tiny);
  const T sum = T(1.0 + sign * math::pow(ratio, n));
  return T(large * math::pow(math::larger(sum, T(0.0)), T(1.0 / n)));
}
}  // namespace parts

/// Mean Nusselt number with buoyancy along the forced flow, or across it.
/// Nu = (Nu_F^n + Nu_N^n)^(1/n); n = 3 on a vertical plate, 7/2 on a horizontal plate, 4 on a
/// cylinder or sphere across the stream, where the part of pure conduction must be taken off first.
/// Range: all Richardson numbers. Scatter not stated; n = 3 is within 3 % of the boundary-layer
/// solution of a vertical plate for Ri 0.1 .. 1, Pr 0.72 and 7.
/// Source: Churchill 1977, AIChE J. 23, 10-16.
template <auto Forced = plate_length, auto Natural = Forced>
struct churchill_assisting_1977
    : correlation<churchill_assisting_1977<Forced, Natural>, nusselt_of<Forced>, nusselt_of<Forced>,
                  nusselt_of<Natural>, blending_exponent> {
  static constexpr const char* id = "mixed/churchill-assisting-1977";
  static constexpr const char* quantity = "Nu";
  static constexpr const char* keys[3] = {"NuF", "NuN", "n"};
  static constexpr reference source{"S. W. Churchill", 1977, "AIChE J. 23, 10-16", known::quoted,
                                    "7/2 and 4 are remembered; a textbook says 3 to 4"};
  static constexpr auto envelope =
      within(limit_on("Nu_F", 0.0, unbounded, [](auto forced, auto, auto) { return forced; }),
             limit_on("Nu_N", 0.0, unbounded, [](auto, auto natural, auto) { return natural; }),
             limit<blending_exponent>(3.0, 4.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::none;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Nu_F, const T& Nu_N, const T& n) {
    return parts::blend(Nu_F, Nu_N, n, 1.0);
  }
};

/// Mean Nusselt number with buoyancy against the forced flow.
/// Nu = |Nu_F^n - Nu_N^n|^(1/n), n as in churchill_assisting_1977
/// Range: one of the two at least 3 times the other. Where they are equal the formula gives 0,
/// which no wall does: the flow separates instead. Scatter not stated. Source: Churchill 1977,
/// AIChE J. 23, 10-16.
template <auto Forced = plate_length, auto Natural = Forced>
struct churchill_opposing_1977
    : correlation<churchill_opposing_1977<Forced, Natural>, nusselt_of<Forced>, nusselt_of<Forced>,
                  nusselt_of<Natural>, blending_exponent> {
  static constexpr const char* id = "mixed/churchill-opposing-1977";
  static constexpr const char* quantity = "Nu";
  static constexpr const char* keys[3] = {"NuF", "NuN", "n"};
  static constexpr reference source{"S. W. Churchill", 1977, "AIChE J. 23, 10-16", known::quoted,
                                    "stated for Ri below 0.1 or above 10"};
  static constexpr auto envelope = within(
      limit_on("Nu_F", 0.0, unbounded, [](auto forced, auto, auto) { return forced; }),
      limit_on("Nu_N", 0.0, unbounded, [](auto, auto natural, auto) { return natural; }),
      limit<blending_exponent>(3.0, 4.0),
      limit_on("smaller over larger Nu", 0.0, 1.0 / 3.0, [](auto forced, auto natural, auto) {
        return math::smaller(forced, natural) / math::larger(forced, natural);
      }));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::none;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Nu_F, const T& Nu_N, const T& n) {
    return parts::blend(Nu_F, Nu_N, n, -1.0);
  }
};

}  // namespace mixed
}  // namespace v0
}  // namespace convelope

#endif
