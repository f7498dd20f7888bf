#ifndef CONVELOPE_CATALOGUE_ENTRY_HPP
#define CONVELOPE_CATALOGUE_ENTRY_HPP

#include <cstddef>

#include "convelope/estimate/correlation.hpp"

namespace convelope {
inline namespace v0 {
namespace catalogue {

/// What a correlation answers to numbers that come in at run time.
struct answer {
  double value;
  convelope::verdict<> verdict;
  double scatter;  // relative, not_stated if the source has none
};

/// One correlation behind a plain interface.
struct entry {
  const correlation_info* info;
  answer (*evaluate)(const double* inputs);  // one number per input; a choice is its position
};

namespace detail {
template <class K>
constexpr auto input_from(double x) {
  if constexpr (convelope::detail::is_choice<K>) {
    return static_cast<typename K::enumeration>(static_cast<int>(x));
  } else {
    return typed<K>::from_si(x);
  }
}

template <class C>
answer evaluate(const double* inputs) {
  return C::with_input_kinds([&]<class... K>() {
    return [&]<std::size_t... Index>(std::index_sequence<Index...>) {
      const auto e = C{}(input_from<K>(inputs[Index])...);
      return answer{e.si(), e.verdict(), C::scatter};
    }(std::index_sequence_for<K...>{});
  });
}
}  // namespace detail

/// The entry of correlation C.
template <class C>
inline constexpr entry entry_of{&convelope::detail::record_of<C>, &detail::evaluate<C>};

/// A list of correlations, in the order they are listed for people.
template <class... C>
struct list {
  static constexpr int count = static_cast<int>(sizeof...(C));
  static constexpr entry entries[] = {entry_of<C>...};

  /// Calls f.template operator()<C>() for each.
  template <class Use>
  static constexpr void for_each(Use use) {
    (use.template operator()<C>(), ...);
  }
};

/// The most inputs a correlation may have.
inline constexpr int most_inputs = 8;

}  // namespace catalogue
}  // namespace v0
}  // namespace convelope

#endif
