#pragma once

// Arrays of seeded random faces, and what a surface says of each one alone.

#include <doctest/doctest.h>

#include <bit>
#include <cstdint>
#include <vector>

#include "../surfaces/states.hpp"
#include "convelope/faces/evaluate.hpp"

namespace many {

using namespace states;

// By their bits: -ffast-math may not believe in them otherwise.
inline const double not_a_number = std::bit_cast<double>(std::uint64_t{0x7ff8000000000000});
inline const double infinity = std::bit_cast<double>(std::uint64_t{0x7ff0000000000000});

struct arrays {
  std::vector<double> wall, velocity, stream, pressure;
  std::vector<double> flux, slope, coefficient;
  std::vector<std::uint64_t> verdict;

  /// A gap of `offset` numbers at the start of each array shifts its alignment.
  arrays(std::size_t n, unsigned seed, std::size_t offset = 0) : offset_(offset), n_(n) {
    random_numbers random(seed);
    for (std::size_t i = 0; i < n + offset; ++i) {
      wall.push_back(random.between(210.0, 900.0));
      velocity.push_back(random.sign() * random.log_between(1e-3, 200.0));
      stream.push_back(i % 7 == 0 ? wall.back() : random.between(180.0, 500.0));
      pressure.push_back(random.log_between(5e3, 2e5));
    }
    flux.resize(n + offset);
    slope.resize(n + offset);
    coefficient.resize(n + offset);
    verdict.resize(n + offset);
  }
  template <class A>
  auto part(A& a) const {
    return std::span(a).subspan(offset_, n_);
  }
  faces::inputs in() const { return {part(wall), part(velocity), part(stream), part(pressure)}; }
  faces::outputs out() { return {part(flux), part(slope), part(coefficient), part(verdict)}; }
  std::size_t first() const { return offset_; }
  std::size_t end() const { return offset_ + n_; }

 private:
  std::size_t offset_, n_;
};

inline bool close(double a, double b, double scale) {
  return is_finite(a) && is_finite(b) && std::fabs(a - b) <= 1e-13 * scale;
}

/// Every face against the same wall asked alone.
template <class Surface>
void expect_as_alone(const Surface& s, const arrays& a) {
  using G = std::remove_cvref_t<decltype(s.geometry())>;
  int off = 0;
  for (std::size_t i = a.first(); i < a.end(); ++i) {
    const auto one = s.at(number<kinds::wall_temperature>(a.wall[i]),
                          exposure<G, double>(a.velocity[i], a.stream[i], a.pressure[i]));
    const double h = one.coefficient().si();
    const double slope = one.slope().si();
    const bool good = close(a.coefficient[i], h, h) &&
                      close(a.slope[i], slope, std::fabs(slope) + h) &&
                      close(a.flux[i], one.flux().si(), h * (a.wall[i] + a.stream[i])) &&
                      a.verdict[i] == one.verdict().bits();
    if (!good) ++off;
  }
  CHECK(off == 0);
}

}  // namespace many
