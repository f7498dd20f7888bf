#ifndef CONVELOPE_ESTIMATE_THROWING_HPP
#define CONVELOPE_ESTIMATE_THROWING_HPP

#include "convelope/estimate/explain.hpp"

// The throwing policy: not part of convelope.hpp, which builds with -fno-exceptions.

namespace convelope {
inline namespace v0 {
namespace policy {

/// Outside the envelope, throw the host's own exception type, made from explain()'s sentence.
template <class Exception>
struct throwing_as {
  static constexpr bool clamps = false;
  template <class K, class T>
  estimate<K, T> operator()(const estimate<K, T>& e) const {
    static_assert(scalar_adaptor<T>::lanes == 1, "throw lane by lane: one face at a time");
    if (!e.inside()) throw Exception(explain(e));
    return e;
  }
};

template <class Exception>
inline constexpr throwing_as<Exception> throwing{};

}  // namespace policy
}  // namespace v0
}  // namespace convelope

#endif
