#ifndef CONVELOPE_KINDS_TYPED_HPP
#define CONVELOPE_KINDS_TYPED_HPP

#include "convelope/scalar.hpp"
#include "convelope/units/units.hpp"

namespace convelope {
inline namespace v0 {

/// What a number means: symbol, words, unit, and whether it is a point on a scale (an absolute
/// temperature) or an amount. See kinds/lengths.hpp and its neighbours for all of them.
template <class K>
concept kind = requires {
  typename K::unit_type;
  { K::symbol } -> std::convertible_to<const char*>;
  { K::words } -> std::convertible_to<const char*>;
  { K::unit } -> std::convertible_to<const char*>;
};

namespace detail {
template <class K>
constexpr bool is_point = std::is_same_v<typename K::unit_type, unit_types::absolute_temperature>;
template <class K>
constexpr bool is_number = std::is_same_v<typename K::unit_type, boost::units::si::dimensionless>;
// A plain constant, because compilers recite every line of a concept that does not hold.
template <class T>
constexpr bool is_scalar = scalar<T>;
template <class T>
using pure_quantity = boost::units::quantity<boost::units::si::dimensionless, T>;
template <class T>
constexpr bool is_scalar<pure_quantity<T>> = scalar<T>;

template <class T>
CONVELOPE_FUNCTION constexpr T number_of(const T& x) {
  return x;
}
template <class T>
CONVELOPE_FUNCTION constexpr T number_of(const pure_quantity<T>& x) {
  return x.value();
}
}  // namespace detail

/// Anything with a kind: a typed number or an estimate.
template <class A>
concept has_kind = requires(const A& a) {
  typename A::kind_type;
  typename A::value_type;
  a.si();
};

template <class K>
struct gate;

/// A number in SI units that knows what it means. Trivial: it holds just the number.
/// Two kinds never mix; a gate (`diameter(0.05 * metre)`) is the only way in, si() or quantity()
/// the way out.
template <class K, class T = double>
class typed {
 public:
  using kind_type = K;
  using value_type = T;

  typed() = default;
  /// The number in the kind's SI unit.
  CONVELOPE_FUNCTION constexpr const T& si() const { return value_; }
  /// The number with its Boost.Units unit.
  CONVELOPE_FUNCTION constexpr boost::units::quantity<typename K::unit_type, T> quantity() const {
    return boost::units::quantity<typename K::unit_type, T>::from_value(value_);
  }
  /// From a number known to be in the kind's SI unit: for code that has checked it.
  CONVELOPE_FUNCTION static constexpr typed from_si(const T& si) {
    typed r;
    r.value_ = si;
    return r;
  }

  CONVELOPE_FUNCTION friend constexpr typed operator+(const typed& a, const typed& b)
    requires(!detail::is_point<K>)
  {
    return from_si(T(a.value_ + b.value_));
  }
  CONVELOPE_FUNCTION friend constexpr typed operator-(const typed& a, const typed& b)
    requires(!detail::is_point<K>)
  {
    return from_si(T(a.value_ - b.value_));
  }
  CONVELOPE_FUNCTION friend constexpr typed operator*(const T& a, const typed& b)
    requires(!detail::is_point<K>)
  {
    return from_si(T(a * b.value_));
  }
  CONVELOPE_FUNCTION friend constexpr auto operator<(const typed& a, const typed& b) {
    return a.value_ < b.value_;
  }
  CONVELOPE_FUNCTION friend constexpr auto operator>(const typed& a, const typed& b) {
    return a.value_ > b.value_;
  }

  // Two kinds don't mix, and absolute temperatures have a difference but no sum. Deleted rather
  // than absent: the compiler's complaint is then short and names both kinds.
  template <has_kind B>
  friend void operator+(const typed& a, const B& b) = delete;
  template <has_kind B>
    requires(!detail::is_point<K> || !detail::is_point<typename B::kind_type>)
  friend void operator-(const typed& a, const B& b) = delete;
  template <has_kind B>
  friend void operator<(const typed& a, const B& b) = delete;
  template <has_kind B>
  friend void operator>(const typed& a, const B& b) = delete;

 private:
  T value_;
};

/// The way in: `diameter(0.05 * metre)`, `wall_temperature(celsius(60.0))`, `prandtl_number(0.7)`.
/// Takes a Boost.Units quantity of the kind's SI unit; a dimensionless kind a bare number too.
template <class K>
struct gate {
  using kind_type = K;

  template <class T>
  CONVELOPE_FUNCTION constexpr typed<K, T> operator()(
      const boost::units::quantity<typename K::unit_type, T>& q) const {
    static_assert(!std::is_integral_v<T>, "write the number with a point: 5.0, not 5");
    return typed<K, T>::from_si(q.value());
  }
};

template <class K>
  requires(detail::is_number<K>)
struct gate<K> {
  using kind_type = K;

  template <class T>
    requires(detail::is_scalar<T>)
  CONVELOPE_FUNCTION constexpr auto operator()(const T& number) const {
    return typed<K, decltype(detail::number_of(number))>::from_si(detail::number_of(number));
  }
  template <class X>
  void operator()(const X&) const = delete;  // not a number; an integer: write 5.0, not 5
};

/// The kind behind a gate object: kind_of<diameter> is kinds::diameter.
template <auto Gate>
using kind_of = typename std::remove_cvref_t<decltype(Gate)>::kind_type;

namespace detail {
template <class A, class K>
constexpr bool is_of_kind = false;
template <has_kind A, class K>
constexpr bool is_of_kind<A, K> = std::is_same_v<typename A::kind_type, K>;
}  // namespace detail

/// The argument measures exactly this kind.
template <class A, class K>
concept measures = detail::is_of_kind<A, K>;

}  // namespace v0
}  // namespace convelope

#endif
