#ifndef CONVELOPE_FACES_WIDEST_HPP
#define CONVELOPE_FACES_WIDEST_HPP

#include "convelope/faces/evaluate.hpp"

// faces::evaluate<faces::widest>(...): as many faces at a time as the machine flags of this
// translation unit allow, through std::experimental::simd where the standard library has it, else
// xsimd where that is found, else one by one.

#if __has_include(<experimental/simd>) && defined(__GLIBCXX__)
#include "convelope/faces/std_simd.hpp"
namespace convelope {
inline namespace v0 {
namespace faces {
using widest = std::experimental::native_simd<double>;
}  // namespace faces
}  // namespace v0
}  // namespace convelope
#else
#if __has_include(<xsimd/xsimd.hpp>) && !(defined(__clang__) && defined(__FAST_MATH__))
#include "convelope/faces/xsimd.hpp"
#define CONVELOPE_WIDEST xsimd::batch<double>
#else
#define CONVELOPE_WIDEST double
#endif
namespace convelope {
inline namespace v0 {
namespace faces {
using widest = CONVELOPE_WIDEST;
}  // namespace faces
}  // namespace v0
}  // namespace convelope
#undef CONVELOPE_WIDEST
#endif

#endif
