// Cold to hot as a colour: dark blue, violet, red, orange, pale yellow. Lightness grows all the
// way, so the order survives in grey print and for colour-blind readers.
#pragma once

#include <string>

namespace chassis {

class colour_scale {
 public:
  colour_scale(double coldest, double hottest);

  std::string colour(double value) const;  // "#rrggbb"
  bool is_dark(double value) const;
  double coldest() const { return coldest_; }
  double hottest() const { return hottest_; }

 private:
  double share(double value) const;
  double coldest_;
  double hottest_;
};

}  // namespace chassis
