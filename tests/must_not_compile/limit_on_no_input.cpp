// names: grashof, reynolds, prandtl, this limit names a kind that is not an input
#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

using namespace convelope;

#ifdef TWIN
constexpr auto limited = reynolds_of<height>;
#else
constexpr auto limited = grashof_of<height>;
#endif

struct chimney : correlation<chimney, nusselt_of<height>, reynolds_of<height>, prandtl_number> {
  static constexpr const char* id = "chimney/invented";
  static constexpr const char* quantity = "Nu";
  static constexpr reference source{"nobody", 2000, "nowhere", known::recalled};
  static constexpr auto envelope = within(limit<limited>(1.0, 1e5));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::film;
  template <scalar T>
  static constexpr T formula(const T& Re, const T& Pr) {
    return T(Re * Pr);
  }
};
const auto Nu = chimney{}(reynolds_of<height>(1e4), prandtl_number(0.7));
