#include "report/colour_scale.hpp"

#include <algorithm>
#include <array>
#include <cmath>
#include <cstdio>

namespace chassis {
namespace {

using rgb = std::array<double, 3>;
constexpr std::array<rgb, 6> stops{
    {{18, 28, 84}, {72, 40, 140}, {158, 44, 124}, {224, 76, 60}, {248, 156, 48}, {255, 240, 176}}};

}  // namespace

colour_scale::colour_scale(double coldest, double hottest)
    : coldest_(coldest), hottest_((std::max)(hottest, coldest + 1e-6)) {}

double colour_scale::share(double value) const {
  return std::clamp((value - coldest_) / (hottest_ - coldest_), 0.0, 1.0);
}

std::string colour_scale::colour(double value) const {
  const double at = share(value) * static_cast<double>(stops.size() - 1);
  const auto i = (std::min)(static_cast<std::size_t>(at), stops.size() - 2);
  const double part = at - static_cast<double>(i);
  std::array<int, 3> mixed{};
  for (std::size_t k = 0; k < 3; ++k) {
    mixed[k] = static_cast<int>(std::lround(stops[i][k] + part * (stops[i + 1][k] - stops[i][k])));
  }
  std::array<char, 16> text{};
  std::snprintf(text.data(), text.size(), "#%02x%02x%02x", mixed[0] & 255, mixed[1] & 255,
                mixed[2] & 255);
  return text.data();
}

bool colour_scale::is_dark(double value) const { return share(value) < 0.66; }

}  // namespace chassis
