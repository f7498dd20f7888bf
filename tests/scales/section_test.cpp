// Areas, perimeters and friction of passages.
#include "convelope/scales/section.hpp"

#include <doctest/doctest.h>

#include "../surfaces/states.hpp"
#include "convelope/scales/passage.hpp"

using namespace states;

namespace {

constexpr double pi = 3.14159265358979324;
const round_section tube{number<kinds::hydraulic_diameter>(0.02)};
const flat_section slot{number<kinds::gap>(0.01), number<kinds::plate_length>(0.4)};

}  // namespace

TEST_CASE("section: round and flat") {
  CHECK(tube.area_m2() == doctest::Approx(pi * 1e-4).epsilon(1e-15));
  CHECK(tube.perimeter_m() == doctest::Approx(pi * 0.02).epsilon(1e-15));
  CHECK(tube.hydraulic_diameter_m() == 0.02);
  CHECK(slot.area_m2() == doctest::Approx(4e-3));
  CHECK(slot.perimeter_m() == doctest::Approx(0.8));
  CHECK(slot.hydraulic_diameter_m() == doctest::Approx(4.0 * slot.area_m2() / slot.perimeter_m()));
  const round_duct_segment s = tube.segment(0.1, 0.3);
  CHECK(s.diameter.si() == 0.02);
  CHECK(s.begin.si() == 0.1);
  CHECK(s.end.si() == 0.3);
}

TEST_CASE("section: Hagen-Poiseuille and the flat channel, exactly, up to Re 2300") {
  for (const double Re : {1e-6, 1.0, 100.0, 2300.0}) {
    CHECK(round_section::darcy(Re) == doctest::Approx(64.0 / Re).epsilon(1e-15));
    CHECK(flat_section::darcy(Re) == doctest::Approx(96.0 / Re).epsilon(1e-15));
  }
}

TEST_CASE("section: turbulent friction against the published chart") {
  // Smooth pipe, Darcy factor by the law of Prandtl, Karman and Nikuradse:
  // Schlichting, Boundary-Layer Theory, and Moody 1944 (from memory): 0.0309, 0.0180, 0.0116.
  CHECK(round_section::darcy(1e4) == doctest::Approx(0.0309).epsilon(0.02));
  CHECK(round_section::darcy(1e5) == doctest::Approx(0.0180).epsilon(0.02));
  CHECK(round_section::darcy(1e6) == doctest::Approx(0.0116).epsilon(0.02));
  CHECK(flat_section::darcy(1e5) == round_section::darcy(1e5));
}

TEST_CASE("section: no step in the friction factor or in its slope") {
  using D = dual<double>;
  double before = 0.0;
  double slope_before = 0.0;
  for (double Re = 2000.0; Re < 4400.0; Re += 0.1) {
    const D f = round_section::darcy(D::variable(Re));
    if (before > 0.0) {
      CHECK(std::fabs(f.value - before) < 1e-5);
      CHECK(std::fabs(f.slope[0] - slope_before) < 1e-7);
    }
    before = f.value;
    slope_before = f.slope[0];
  }
}

TEST_CASE("section: pressure drop of laminar flow is that of Hagen and Poiseuille") {
  // dp = 128 mu L Q/(pi D^4) in a tube; 12 mu L Q/(w b^3) between plates.
  const auto f = oil();
  const double mu = 0.0725;
  const double kg_s = 0.02;
  const double m3_s = kg_s / 864.0;
  const auto drop = [&](const auto& section) {
    passage<std::remove_cvref_t<decltype(section)>, constant_properties> flow(
        section, f, number<kinds::mass_flow>(kg_s), number<kinds::bulk_temperature>(330.0));
    const wall_patch<> wall[] = {{section.perimeter_m(), 330.0}};
    return flow.advance(2.0, wall).pressure_drop_Pa;
  };
  CHECK(drop(tube) ==
        doctest::Approx(128.0 * mu * 2.0 * m3_s / (pi * std::pow(0.02, 4))).epsilon(1e-12));
  CHECK(drop(slot) == doctest::Approx(12.0 * mu * 2.0 * m3_s / (0.4 * 1e-6)).epsilon(1e-12));
}
