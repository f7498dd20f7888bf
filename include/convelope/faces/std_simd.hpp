#ifndef CONVELOPE_FACES_STD_SIMD_HPP
#define CONVELOPE_FACES_STD_SIMD_HPP

#include "convelope/faces/evaluate.hpp"
#include "convelope/scalar/std_simd.hpp"

// faces::evaluate<faces::widest>(...): as many faces at a time as the machine flags of this
// translation unit allow.

namespace convelope {
inline namespace v0 {
namespace faces {

using widest = std::experimental::native_simd<double>;

namespace detail {
template <class Abi>
struct face_access<std::experimental::simd<double, Abi>> {
  using pack = std::experimental::simd<double, Abi>;
  static pack load(const double* from) { return pack(from, std::experimental::element_aligned); }
  static void store(const pack& x, double* to) {
    x.copy_to(to, std::experimental::element_aligned);
  }
  static void store_bits(const bits_t<pack>& b, std::uint64_t* to) {
    b.copy_to(to, std::experimental::element_aligned);
  }
};
}  // namespace detail

}  // namespace faces
}  // namespace v0
}  // namespace convelope

#endif
