// names: film_coefficient, flux_slope
#include "convelope/estimate/estimate.hpp"
#include "convelope/groups/film.hpp"

using namespace convelope;

constexpr estimate<kinds::film_coefficient> h{25.0, verdict<>(0), 0.04, nullptr, nullptr};
constexpr estimate<kinds::flux_slope> slope{27.0, verdict<>(0), 0.04, nullptr, nullptr};
#ifdef TWIN
const auto x = h + h;
#else
const auto x = h + slope;
#endif
