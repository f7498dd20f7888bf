#ifndef CONVELOPE_CATALOGUE_FIND_HPP
#define CONVELOPE_CATALOGUE_FIND_HPP

#include <span>
#include <string_view>

#include "convelope/catalogue/entry.hpp"

namespace convelope {
inline namespace v0 {
namespace catalogue {

enum class found : unsigned char { one, no_such_id, no_such_quantity, several_quantities };

/// A look-up's result: the entry if exactly one fits.
struct match {
  found how;
  const entry* which;
};

/// The entry of an id in a list (`find(all::entries, id)`), and of a quantity where the id gives
/// several ("" if it gives just one).
constexpr match find(std::span<const entry> entries, std::string_view id,
                     std::string_view quantity = {}) {
  const entry* first = nullptr;
  bool known_id = false;
  int fitting = 0;
  for (const entry& e : entries) {
    if (id != e.info->id) continue;
    known_id = true;
    if (!quantity.empty() && quantity != e.info->quantity) continue;
    ++fitting;
    if (first == nullptr) first = &e;
  }
  if (!known_id) return {found::no_such_id, nullptr};
  if (fitting == 0) return {found::no_such_quantity, nullptr};
  if (fitting > 1) return {found::several_quantities, nullptr};
  return {found::one, first};
}

/// Calls f(entry) for each entry whose id contains `part`.
template <class Use>
constexpr void filter(std::span<const entry> entries, std::string_view part, Use use) {
  for (const entry& e : entries) {
    if (std::string_view(e.info->id).find(part) != std::string_view::npos) use(e);
  }
}

}  // namespace catalogue
}  // namespace v0
}  // namespace convelope

#endif
