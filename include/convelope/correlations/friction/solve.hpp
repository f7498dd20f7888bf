#ifndef CONVELOPE_CORRELATIONS_FRICTION_SOLVE_HPP
#define CONVELOPE_CORRELATIONS_FRICTION_SOLVE_HPP

#include <limits>

#include "convelope/scalar.hpp"

// Parts that the friction laws share.

namespace convelope {
inline namespace v0 {
namespace detail::friction_law {

inline constexpr double log10_of_e = 0.43429448190325182765;
inline constexpr double two_logs = 2.0 * log10_of_e;  // 2 log10 x = two_logs ln x

template <class T>
CONVELOPE_FUNCTION constexpr T log10(const T& x) {
  return T(math::log(x) * log10_of_e);
}

/// How many derivatives a scalar carries: dual<dual<T>> two.
template <class T>
constexpr int orders = 0;
template <class T, int Order>
constexpr int orders<dual<T, Order>> = orders<T> + (Order > 0 ? 1 : 0);

/// The root y of an implicit law by a fixed number of Newton steps `next(y, a, b)`: on plain
/// numbers, then one on T for every order of derivatives it carries, which makes them exact.
/// `start` must lie where Newton's method can't leave the domain; see the laws.
template <class T, class Start, class Next>
CONVELOPE_FUNCTION constexpr T root(const T& a, const T& b, Start start, Next next) {
  using P = working_t<plain_t<T>>;
  // Four steps give 1e-16 from a start within 7 %; multiprecision numbers want more.
  constexpr int steps = std::numeric_limits<plain_t<T>>::digits > 64 ? 7 : 4;
  const P plain_a = P(plain(a));
  const P plain_b = P(plain(b));
  P y = start(plain_a, plain_b);
  for (int i = 0; i < steps; ++i) y = next(y, plain_a, plain_b);
  T lifted = T(plain(y));
  for (int i = 0; i < orders<T>; ++i) lifted = next(lifted, a, b);
  return lifted;
}

/// (a^N + b^N)^(1/N) for a, b >= 0, not both 0, where a^N alone would leave the range of T.
template <int Order, class T>
CONVELOPE_FUNCTION constexpr T joined_in_range(const T& a, const T& b) {
  const T most = math::larger(a, b);
  const T ratio = T(math::smaller(a, b) / most);
  return T(most * math::power<1, Order>(T(1.0 + math::power<Order>(ratio))));
}

}  // namespace detail::friction_law
}  // namespace v0
}  // namespace convelope

#endif
