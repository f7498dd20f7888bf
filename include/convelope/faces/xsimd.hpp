#ifndef CONVELOPE_FACES_XSIMD_HPP
#define CONVELOPE_FACES_XSIMD_HPP

#include "convelope/faces/evaluate.hpp"
#include "convelope/scalar/xsimd.hpp"

// Lets faces::evaluate go by xsimd batches.

namespace convelope {
inline namespace v0 {
namespace faces {
namespace detail {

template <class Arch>
struct face_access<xsimd::batch<double, Arch>> {
  using pack = xsimd::batch<double, Arch>;
  template <class Number>
  static pack load(const column<const Number>& c, std::size_t i) {
    if constexpr (std::is_same_v<Number, double>) {
      if (c.step() == 1) return pack::load_unaligned(c.at(i));
    }
    double lanes[pack::size];
    for (std::size_t lane = 0; lane < pack::size; ++lane) {
      lanes[lane] = static_cast<double>(*c.at(i + lane));
    }
    return pack::load_unaligned(lanes);
  }
  template <class Number>
  static void store(const pack& x, const column<Number>& c, std::size_t i) {
    put(x, c, i);
  }
  static void store_bits(const bits_t<pack>& b, const column<std::uint64_t>& c, std::size_t i) {
    put(b, c, i);
  }

 private:
  template <class Pack, class Element>
  static void put(const Pack& x, const column<Element>& c, std::size_t i) {
    using lane_type = typename Pack::value_type;
    if constexpr (std::is_same_v<lane_type, Element>) {
      if (c.step() == 1) {
        x.store_unaligned(c.at(i));
        return;
      }
    }
    lane_type lanes[Pack::size];
    x.store_unaligned(lanes);
    for (std::size_t lane = 0; lane < Pack::size; ++lane) {
      *c.at(i + lane) = static_cast<Element>(lanes[lane]);
    }
  }
};

}  // namespace detail
}  // namespace faces
}  // namespace v0
}  // namespace convelope

#endif
