// The same film coefficient on bare doubles and on typed numbers.
#include "convelope/groups/film.hpp"

#include "convelope/correlations/external/cylinder_crossflow.hpp"

using namespace convelope;
using law = cylinder_crossflow::churchill_bernstein_1977;

extern "C" [[gnu::flatten]] double raw(double rho, double u, double D, double mu, double k,
                                       double Pr) {
  const double Re = rho * u * D / mu;
  return law::formula(Re, Pr) * k / D;
}

extern "C" [[gnu::flatten]] double typed_numbers(double rho, double u, double D, double mu,
                                                 double k, double Pr) {
  const auto diameter_D = diameter(D * units::metre);
  const auto Re = reynolds(density(rho * units::kilogram_per_cubic_metre),
                           free_stream_velocity(u * units::metre_per_second), diameter_D,
                           viscosity(mu * units::pascal_second));
  const auto Nu = nusselt_of<diameter>(law::formula(Re.si(), prandtl_number(Pr).si()));
  return film_coefficient(Nu, conductivity(k * units::watt_per_metre_kelvin), diameter_D).si();
}
