// What would a user write instead? q and dq/dT_wall of air across a cylinder, per face: the
// textbook spelling (std::pow in every factor, a polynomial for each property, a second call for
// the finite-difference slope) against this library, face by face and with packs; and packs by
// hand.

#include <cmath>

#include "convelope/boundary/surface.hpp"
#include "convelope/faces/widest.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/surfaces/cylinder.hpp"
#include "hand.hpp"
#include "ratios.hpp"

namespace {

using namespace convelope;
constexpr double diameter_m = 0.05;
constexpr double stream_K = 300.0;
constexpr double velocity_m_s = 4.0;

// Third-degree polynomials through the dry-air values at 250, 350, 450 and 550 K.
double polynomial(double T, double a, double b, double c, double d) {
  return a + b * T + c * std::pow(T, 2) + d * std::pow(T, 3);
}

// The law of cylinder_in_crossflow: forced and natural convection joined by fourth powers.
double textbook_flux(double wall) {
  const double T = 0.5 * (wall + stream_K);
  const double rho = 101325.0 / (287.1 * T);
  const double mu = polynomial(T, 1.0e-6, 7.1e-8, -4.6e-11, 1.5e-14);
  const double k = polynomial(T, -2.0e-4, 1.0e-4, -4.8e-8, 1.5e-11);
  const double cp = polynomial(T, 1050.0, -0.37, 9.5e-4, -6.0e-7);
  const double Pr = cp * mu / k;
  const double Re = rho * velocity_m_s * diameter_m / mu;
  const double forced = 0.3 + 0.62 * std::pow(Re, 0.5) * std::pow(Pr, 1.0 / 3.0) /
                                  std::pow(1.0 + std::pow(0.4 / Pr, 2.0 / 3.0), 0.25) *
                                  std::pow(1.0 + std::pow(Re / 282000.0, 5.0 / 8.0), 4.0 / 5.0);
  const double Ra = 9.80665 / stream_K * std::abs(wall - stream_K) * std::pow(diameter_m, 3) *
                    std::pow(rho, 2) * cp / (mu * k);
  const double natural =
      std::pow(0.60 + 0.387 * std::pow(Ra, 1.0 / 6.0) /
                          std::pow(1.0 + std::pow(0.559 / Pr, 9.0 / 16.0), 8.0 / 27.0),
               2);
  const double Nu = std::pow(std::pow(forced, 4) + std::pow(natural, 4) - std::pow(0.3, 4), 0.25);
  return Nu * k / diameter_m * (wall - stream_K);
}

const std::vector<double>& walls() {
  static const auto T = bench::spread(310.0, 420.0, 4096);
  return T;
}

void textbook(benchmark::State& state) {
  std::vector<double> q(walls().size());
  std::vector<double> slope(walls().size());
  for (auto _ : state) {
    for (std::size_t i = 0; i < walls().size(); ++i) {
      const double T = walls()[i];
      constexpr double step = 1e-4;
      q[i] = textbook_flux(T);
      slope[i] = (textbook_flux(T + step) - q[i]) / step;
    }
    benchmark::DoNotOptimize(q.data());
    benchmark::DoNotOptimize(slope.data());
    benchmark::ClobberMemory();
  }
}
BENCHMARK(textbook);

template <class T>
void ours(benchmark::State& state) {
  const auto tube =
      surface(cylinder_in_crossflow{diameter(diameter_m * units::metre)}, dry_air_fast{},
              stream{free_stream_velocity(velocity_m_s * units::metre_per_second),
                     free_stream_temperature(kelvin(stream_K))});
  std::vector<double> q(walls().size());
  std::vector<double> slope(walls().size());
  std::vector<std::uint64_t> verdicts(walls().size());
  for (auto _ : state) {
    const auto done =
        faces::evaluate<T>(tube, {.wall_temperature_K = walls()},
                           {.flux_W_m2 = q, .slope_W_m2K = slope, .verdict = verdicts});
    benchmark::DoNotOptimize(done);
    benchmark::ClobberMemory();
  }
}
void by_hand(benchmark::State& state) {
  using V = faces::widest;
  using access = faces::detail::face_access<V>;
  const hand::tube tube{diameter_m, velocity_m_s, stream_K, 101325.0};
  std::vector<double> q(walls().size());
  std::vector<double> slope(walls().size());
  const faces::column<const double> in(walls());
  const faces::column<double> out(q);
  const faces::column<double> out_slope(slope);
  for (auto _ : state) {
    for (std::size_t i = 0; i < walls().size(); i += std::size_t(scalar_adaptor<V>::lanes)) {
      const auto y = hand::flux(tube, access::load(in, i));
      access::store(y.value, out, i);
      access::store(y.slope, out_slope, i);
    }
    benchmark::ClobberMemory();
  }
}
BENCHMARK(by_hand);
BENCHMARK(ours<double>)->Name("faces_scalar");
BENCHMARK(ours<faces::widest>)->Name("faces_simd");

// All of them the same physics: by hand to rounding, the textbook's polynomials within 2 %.
bool agree() {
  using V = faces::widest;
  const auto tube =
      surface(cylinder_in_crossflow{diameter(diameter_m * units::metre)}, dry_air_fast{},
              stream{free_stream_velocity(velocity_m_s * units::metre_per_second),
                     free_stream_temperature(kelvin(stream_K))});
  bool all = true;
  for (const double wall : {310.0, 365.0, 420.0}) {
    const auto ours = tube.at(wall_temperature(kelvin(wall)));
    const auto by_hand =
        hand::flux(hand::tube{diameter_m, velocity_m_s, stream_K, 101325.0}, V(wall));
    V q = by_hand.value;
    V slope = by_hand.slope;
    double first_q = 0.0;
    double first_slope = 0.0;
    faces::detail::face_access<V>::store(q, faces::column<double>(&first_q, 1, 0), 0);
    faces::detail::face_access<V>::store(slope, faces::column<double>(&first_slope, 1, 0), 0);
    all = all && bench::same("flux by hand", first_q, ours.flux().si(), 1e-11) &&
          bench::same("slope by hand", first_slope, ours.slope().si(), 1e-11) &&
          bench::same("flux of the textbook", textbook_flux(wall), ours.flux().si(), 0.02);
  }
  return all;
}

}  // namespace

int main(int argc, char** argv) {
  if (!agree()) return 1;
  constexpr double n = 4096.0;
  return bench::run(argc, argv,
                    {{"textbook_over_scalar", "textbook", "faces_scalar", n, n},
                     {"textbook_over_faces", "textbook", "faces_simd", n, n},
                     {"faces_over_hand", "faces_simd", "by_hand", n, n},
                     {"faces_scalar_over_simd", "faces_scalar", "faces_simd", n, n}},
                    bench::clock::processor, [](const bench::median_keeper&) {
                      bench::figure("vector_width", double(scalar_adaptor<faces::widest>::lanes));
                      return true;
                    });
}
