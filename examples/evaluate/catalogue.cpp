#include "convelope/catalogue/catalogue.hpp"

#include "convelope/catalogue/fluids.hpp"
#include "line.hpp"

namespace cat = convelope::catalogue;

std::span<const cat::entry> evaluate::catalogue() {
  static constexpr auto everything = cat::joined(std::to_array(cat::all::entries), cat::all_fluids);
  return everything;
}
