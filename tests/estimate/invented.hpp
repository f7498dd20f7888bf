#pragma once

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

// Correlations and a fluid made up to be easy to check by hand.

namespace invented {
enum class rows { aligned, staggered };
}

namespace convelope {
inline namespace v0 {
template <>
struct choice_words<invented::rows> {
  static constexpr const char* key = "rows";
  static constexpr const char* about = "how the tubes stand";
  static constexpr const char* words[] = {"aligned", "staggered", nullptr};
};
}  // namespace v0
}  // namespace convelope

namespace invented {
using namespace convelope;

inline constexpr reference source{"A. Nobody, B. Noone", 1999, "J. Invented 1, 1-2",
                                  known::recalled, "made up"};

/// Nu = Re/2 + Pr. Limits: Re both sides, Pr from below, L/D from above, Re Pr both sides.
struct everything : correlation<everything, nusselt_of<diameter>, reynolds_of<diameter>,
                                prandtl_number, length_ratio> {
  static constexpr const char* id = "invented/everything";
  static constexpr const char* quantity = "Nu_D";
  static constexpr const reference& source = invented::source;
  static constexpr auto envelope =
      within(limit<reynolds_of<diameter>>(100.0, 1e4), limit<prandtl_number>(0.5, unbounded),
             limit<length_ratio>(-unbounded, 60.0),
             limit_on("Re Pr", 80.0, 2e4, [](auto Re, auto Pr, auto) { return Re * Pr; }));
  static constexpr double scatter = 0.03;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  static constexpr T formula(const T& Re, const T& Pr, const T&) {
    return T(0.5 * Re + Pr);
  }
};

/// A number that itself rests on another: Re = 10 Pr, for Pr up to 100. Its source is silent on
/// scatter.
struct reynolds_from_prandtl
    : correlation<reynolds_from_prandtl, reynolds_of<diameter>, prandtl_number> {
  static constexpr const char* id = "invented/reynolds-from-prandtl";
  static constexpr const char* quantity = "Re";
  static constexpr reference source{"C. Unknown", 2001, "Invented Lett. 3, 7", known::computed};
  static constexpr auto envelope = within(limit<prandtl_number>(0.0, 100.0));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::none;

  template <scalar T>
  static constexpr T formula(const T& Pr) {
    return T(10.0 * Pr);
  }
};

/// Re sqrt(2) aligned, 2 Re staggered; has a choice, keys of its own and an optional input.
struct with_choice : correlation<with_choice, nusselt_of<diameter>, reynolds_of<diameter>,
                                 choice_of<rows>, viscosity_ratio> {
  static constexpr const char* id = "invented/with-choice";
  static constexpr const char* quantity = "Nu";
  static constexpr const reference& source = invented::source;
  static constexpr const char* keys[] = {"Re_max", "rows", "mu_ratio"};
  static constexpr input_default otherwise[] = {{"mu_ratio", 1.0}};
  static constexpr auto envelope =
      within(limit_on("Re of aligned rows", -unbounded, 50.0, [](auto Re, rows r, auto) {
        return r == rows::aligned ? Re : decltype(Re)(0.0);
      }));
  static constexpr double scatter = 0.15;
  static constexpr state_rule state_at = state_rule::mean_of_walls;

  template <scalar T>
  static constexpr T formula(const T& Re, rows r, const T& ratio) {
    return r == rows::aligned ? T(sqrt(T(2.0)) * Re * ratio) : T(2.0 * Re * ratio);
  }
};

/// An exact value without inputs.
struct developed : correlation<developed, nusselt_of<hydraulic_diameter>> {
  static constexpr const char* id = "invented/developed";
  static constexpr const char* quantity = "Nu";
  static constexpr const reference& source = invented::source;
  static constexpr auto envelope = within();
  static constexpr double scatter = 0.0;
  static constexpr state_rule state_at = state_rule::bulk;

  template <scalar T>
  static constexpr T formula() {
    return T(3.66);
  }
};

inline constexpr limit_info oil_limits[] = {{"T", 280.0, 400.0}, {"p", 1e4, 1e6}};
inline constexpr fluid_info oil{
    "invented oil", &source, oil_limits, 2, {0.01, 0.02, 0.03, 0.04, 0.05}};

inline constexpr auto Re_in = reynolds_of<diameter>(1000.0);
inline constexpr auto Pr_in = prandtl_number(2.0);
inline constexpr auto ratio_in = length_ratio(20.0);

}  // namespace invented
