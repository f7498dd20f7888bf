#ifndef CONVELOPE_CORRELATIONS_NATURAL_VERTICAL_CHANNEL_OPTIMUM_HPP
#define CONVELOPE_CORRELATIONS_NATURAL_VERTICAL_CHANNEL_OPTIMUM_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

namespace vertical_channel {
enum class heated_walls { both, one };
enum class excess_taken { at_exit, at_mid_height };
}  // namespace vertical_channel

template <>
struct choice_words<vertical_channel::heated_walls> {
  static constexpr const char* key = "heated";
  static constexpr const char* about = "heated walls of the channel";
  static constexpr const char* words[] = {"both", "one", nullptr};
};
template <>
struct choice_words<vertical_channel::excess_taken> {
  static constexpr const char* key = "excess_at";
  static constexpr const char* about = "where the wall's excess temperature is taken";
  static constexpr const char* words[] = {"exit", "mid-height", nullptr};
};

namespace vertical_channel {

/// The gap, over the height, at which thin isothermal plates stacked side by side give off most
/// heat per width of the stack: the maximum of Nu/b^2. b/H = 2.714 Ra_H^(-1/4) both walls
/// heated, 2.154 Ra_H^(-1/4) one wall heated Range: plates much thinner than the gap; Ra_H >= 54.3,
/// where the gap is as wide as the channel is high. At the optimum Nu = 1.307 or 1.04 on the gap.
/// Source: Bar-Cohen and Rohsenow 1984, J. Heat Transfer 106, 116-123.
struct optimum_spacing_isothermal : correlation<optimum_spacing_isothermal, gap_over_height,
                                                rayleigh_of<height>, choice_of<heated_walls>> {
  static constexpr const char* id = "vertical-channel/optimum-spacing-isothermal";
  static constexpr const char* quantity = "S_over_L";
  static constexpr reference source{"A. Bar-Cohen, W. M. Rohsenow", 1984,
                                    "J. Heat Transfer 106, 116-123", known::quoted,
                                    "the maximum itself lies at 2.7155 and 2.1553"};
  static constexpr auto envelope = within(limit<rayleigh_of<height>>(54.3, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, heated_walls heated) {
    return T((heated == heated_walls::both ? 2.714 : 2.154) * power<-1, 4>(Ra));
  }
};

/// The same for uniform heat flux, on Ra* = g beta q H^4/(k nu alpha), with the constants of the
/// exit excess or of the mid-height excess. b/H = c Ra*^(-1/5), c = 2.12 (both walls) or 1.69 (one)
/// at the exit, 1.472 or 1.169 at mid height Range: plates much thinner than the gap; Ra* >= 42.8,
/// where the gap is as wide as the channel is high. Source: Bar-Cohen and Rohsenow 1984, J. Heat
/// Transfer 106, 116-123.
struct optimum_spacing_isoflux
    : correlation<optimum_spacing_isoflux, gap_over_height, flux_rayleigh_of<height>,
                  choice_of<heated_walls>, choice_of<excess_taken>> {
  static constexpr const char* id = "vertical-channel/optimum-spacing-isoflux";
  static constexpr const char* quantity = "S_over_L";
  static constexpr reference source{
      "A. Bar-Cohen, W. M. Rohsenow", 1984, "J. Heat Transfer 106, 116-123", known::quoted,
      "2.12 and 1.472 are both in print, for different excess temperatures; the maxima lie at "
      "2.1225, 1.6846, 1.4723 and 1.1686"};
  static constexpr auto envelope = within(limit<flux_rayleigh_of<height>>(42.8, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ra, heated_walls heated,
                                                excess_taken excess) {
    const bool both = heated == heated_walls::both;
    const double c =
        excess == excess_taken::at_exit ? (both ? 2.12 : 1.69) : (both ? 1.472 : 1.169);
    return T(c * power<-1, 5>(Ra));
  }
};

}  // namespace vertical_channel
}  // namespace v0
}  // namespace convelope

#endif
