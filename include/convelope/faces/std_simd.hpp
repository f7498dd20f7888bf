#ifndef CONVELOPE_FACES_STD_SIMD_HPP
#define CONVELOPE_FACES_STD_SIMD_HPP

#include "convelope/faces/evaluate.hpp"
#include "convelope/scalar/std_simd.hpp"

// Lets faces::evaluate go by packs of std::experimental::simd.

namespace convelope {
inline namespace v0 {
namespace faces {
namespace detail {

template <class Abi>
struct array_number<std::experimental::simd<float, Abi>> {
  using type = float;
};

// Arrays of another precision are converted as they are read and written.
template <class Lane, class Abi>
struct face_access<std::experimental::simd<Lane, Abi>> {
  using pack = std::experimental::simd<Lane, Abi>;
  template <class Number>
  static pack load(const column<const Number>& c, std::size_t i) {
    if (c.step() == 1) return pack(c.at(i), std::experimental::element_aligned);
    return pack([&](auto lane) { return static_cast<Lane>(*c.at(i + lane)); });
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
    if (c.step() == 1) {
      x.copy_to(c.at(i), std::experimental::element_aligned);
    } else {
      for (std::size_t lane = 0; lane < Pack::size(); ++lane)
        *c.at(i + lane) = static_cast<Element>(x[lane]);
    }
  }
};

}  // namespace detail
}  // namespace faces
}  // namespace v0
}  // namespace convelope

#endif
