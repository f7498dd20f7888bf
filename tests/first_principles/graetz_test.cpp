// Thermal entry at developed velocity: the solver against published numbers, closed limits and a
// second way to the eigenvalues, then the library's correlations against the solver.

#include "graetz.hpp"

#include <cmath>
#include <doctest/doctest.h>
#include <initializer_list>

#include "convelope/correlations/internal/parallel_plates.hpp"
#include "convelope/correlations/internal/round_duct_laminar.hpp"
#include "convelope/correlations/internal/round_duct_laminar_entry.hpp"
#include "deviation.hpp"

using first_principles::check_band;
using first_principles::deviations;
using first_principles::duct;
using first_principles::thermal_entry;

namespace {

const thermal_entry& tube() {
  static const thermal_entry solution(duct::round_tube);
  return solution;
}

const thermal_entry& plates() {
  static const thermal_entry solution(duct::parallel_plates);
  return solution;
}

using local_or_mean = double (thermal_entry::*)(double) const;
constexpr local_or_mean local_T = &thermal_entry::uniform_temperature_local;
constexpr local_or_mean mean_T = &thermal_entry::uniform_temperature_mean;
constexpr local_or_mean local_H = &thermal_entry::uniform_flux_local;
constexpr local_or_mean mean_H = &thermal_entry::uniform_flux_mean;

// deviation of a correlation in x_star (and what else it takes), per cent
template <class Correlation, class... More>
first_principles::interval band(const thermal_entry& entry, local_or_mean exact,
                                std::initializer_list<double> x_star, const More&... more) {
  return deviations(x_star, [&](double x) {
    return Correlation::formula(x, more...) / (entry.*exact)(x);
  });
}

// the same for a correlation in Gz
template <class Correlation, class... More>
first_principles::interval band_on_graetz(const thermal_entry& entry, local_or_mean exact,
                                          std::initializer_list<double> graetz,
                                          const More&... more) {
  return deviations(graetz, [&](double Gz) {
    return Correlation::formula(Gz, more...) / (entry.*exact)(1.0 / Gz);
  });
}

}  // namespace

TEST_SUITE("first principles: thermal entry") {
  TEST_CASE("eigenvalues of the tube") {
    // G. M. Brown, AIChE J. 6 (1960) 179-183; R. Siegel, E. M. Sparrow, T. M. Hallman, Appl. Sci.
    // Res. A 7 (1958) 386-392, as squares (both from memory)
    const double temperature[] = {2.70436442, 6.67903145, 10.67337954, 14.67107846, 18.66987186};
    const double flux_squared[] = {25.6796, 83.8618, 174.167, 296.536, 450.947};
    for (int n = 0; n < 5; ++n) {
      CAPTURE(n);
      CHECK(tube().temperature_eigenvalue(n) == doctest::Approx(temperature[n]).epsilon(2e-9));
      const double rate = tube().flux_eigenvalue(n) * tube().flux_eigenvalue(n);
      CHECK(rate == doctest::Approx(flux_squared[n]).epsilon(3e-6));
    }
  }

  TEST_CASE("eigenvalues of the tube by Kummer's function") {
    for (int n = 0; n < 11; ++n) {
      CAPTURE(n);
      const double lambda = tube().temperature_eigenvalue(n);
      const double below = first_principles::tube_wall_value(lambda * (1.0 - 1e-10));
      const double above = first_principles::tube_wall_value(lambda * (1.0 + 1e-10));
      CHECK(below * above < 0.0);
    }
  }

  TEST_CASE("eigenvalues of the plates") {
    // Brown 1960; R. D. Cess, E. C. Shaffer, Appl. Sci. Res. A 8 (1959) 339-344 (both from memory)
    CHECK(plates().temperature_eigenvalue(0) == doctest::Approx(1.68159532).epsilon(3e-9));
    CHECK(plates().temperature_eigenvalue(1) == doctest::Approx(5.66985735).epsilon(3e-9));
    CHECK(plates().temperature_eigenvalue(2) == doctest::Approx(9.66824246).epsilon(3e-9));
    CHECK(plates().flux_eigenvalue(0) == doctest::Approx(4.287224).epsilon(5e-7));
    CHECK(plates().flux_eigenvalue(1) == doctest::Approx(8.30372).epsilon(2e-6));
  }

  TEST_CASE("bulk coefficients of the tube") {
    // G_n = 0.749, 0.544, 0.463, 0.415, 0.383 with bulk excess 8 sum G_n/lambda_n^2 exp(...): J. R.
    // Sellars, M. Tribus, J. S. Klein, Trans. ASME 78 (1956) 441-448, as in Kays and Crawford
    const double G[] = {0.749, 0.544, 0.463, 0.415, 0.383};
    for (int n = 0; n < 5; ++n) {
      const double lambda = tube().temperature_eigenvalue(n);
      CHECK(tube().bulk_share(n) * lambda * lambda / 8.0 == doctest::Approx(G[n]).epsilon(2e-3));
    }
  }

  TEST_CASE("developed values") {
    // R. K. Shah, A. L. London, Laminar Flow Forced Convection in Ducts, Academic Press 1978
    CHECK(tube().uniform_temperature_developed() == doctest::Approx(3.656793458).epsilon(3e-10));
    CHECK(tube().uniform_flux_developed() == doctest::Approx(48.0 / 11.0).epsilon(3e-10));
    CHECK(plates().uniform_temperature_developed() == doctest::Approx(7.540700874).epsilon(3e-10));
    CHECK(plates().uniform_flux_developed() == doctest::Approx(140.0 / 17.0).epsilon(3e-10));
  }

  TEST_CASE("table of the tube's entry") {
    // W. M. Kays, M. E. Crawford, Convective Heat and Mass Transfer, laminar tube tables on
    // x+ = 2 x_star (from memory); the book's means are a little low at short length
    struct row {
      double x_plus, local, mean;
    };
    for (const auto& [x_plus, local, mean] :
         {row{0.001, 12.80, 19.29}, row{0.004, 8.03, 12.09}, row{0.01, 6.00, 8.92},
          row{0.04, 4.17, 5.81}, row{0.10, 3.71, 4.64}, row{0.20, 3.66, 4.15}}) {
      CAPTURE(x_plus);
      CHECK(tube().uniform_temperature_local(x_plus / 2.0) ==
            doctest::Approx(local).epsilon(2.5e-3));
      CHECK(tube().uniform_temperature_mean(x_plus / 2.0) == doctest::Approx(mean).epsilon(0.012));
    }
    const double flux[][2] = {{0.010, 7.49}, {0.020, 6.14}, {0.040, 5.19}, {0.10, 4.51}};
    for (const auto& [x_plus, local] : flux) {
      CAPTURE(x_plus);
      CHECK(tube().uniform_flux_local(x_plus / 2.0) == doctest::Approx(local).epsilon(2e-3));
    }
  }

  TEST_CASE("Leveque limit next to the inlet") {
    // 1.0767 and 1.302 in the tube, 1.2325 and 1.4904 between plates: Shah and London 1978
    CHECK(tube().uniform_temperature_leveque() == doctest::Approx(1.07673).epsilon(5e-6));
    CHECK(tube().uniform_flux_leveque() == doctest::Approx(1.30198).epsilon(5e-6));
    CHECK(plates().uniform_temperature_leveque() == doctest::Approx(1.2326).epsilon(1e-4));
    CHECK(plates().uniform_flux_leveque() == doctest::Approx(1.4904).epsilon(1e-4));
    // Nu_x x_star^(1/3) is a series in x_star^(1/3), extrapolated twice
    for (const thermal_entry* entry : {&tube(), &plates()}) {
      const auto limit = [](const auto& local) {
        const auto scaled = [&](double t) { return t * local(t * t * t); };
        const double first = 2.0 * scaled(0.0125) - scaled(0.025);
        const double second = 2.0 * scaled(0.025) - scaled(0.05);
        return (4.0 * first - second) / 3.0;
      };
      CHECK(limit([&](double x) { return entry->uniform_temperature_local(x); }) ==
            doctest::Approx(entry->uniform_temperature_leveque()).epsilon(2e-4));
      CHECK(limit([&](double x) { return entry->uniform_flux_local(x); }) ==
            doctest::Approx(entry->uniform_flux_leveque()).epsilon(2e-4));
    }
  }

  TEST_CASE("the mean is the integral of the local value") {
    // the energy balance behind the log-mean difference
    for (const thermal_entry* entry : {&tube(), &plates()}) {
      const double from = 1e-3;
      const double to = 0.05;
      const auto rule = first_principles::gauss_legendre(40);
      double sum = 0.0;
      for (Eigen::Index i = 0; i < 40; ++i) {
        const double x = from + 0.5 * (to - from) * (1.0 + rule.node[i]);
        sum += 0.5 * (to - from) * rule.weight[i] * entry->uniform_temperature_local(x);
      }
      CHECK(sum == doctest::Approx(to * entry->uniform_temperature_mean(to) -
                                   from * entry->uniform_temperature_mean(from))
                       .epsilon(1e-8));
    }
  }

  TEST_CASE("more polynomials change nothing") {
    for (const duct shape : {duct::round_tube, duct::parallel_plates}) {
      const thermal_entry coarse(shape, 36);
      const thermal_entry& fine = shape == duct::round_tube ? tube() : plates();
      for (const double x : {1e-5, 1e-4, 1e-3, 1e-2, 0.1}) {
        CAPTURE(x);
        CHECK(coarse.uniform_temperature_local(x) ==
              doctest::Approx(fine.uniform_temperature_local(x)).epsilon(5e-6));
        CHECK(coarse.uniform_temperature_mean(x) ==
              doctest::Approx(fine.uniform_temperature_mean(x)).epsilon(5e-6));
        CHECK(coarse.uniform_flux_local(x) ==
              doctest::Approx(fine.uniform_flux_local(x)).epsilon(5e-6));
        CHECK(coarse.uniform_flux_mean(x) ==
              doctest::Approx(fine.uniform_flux_mean(x)).epsilon(5e-6));
      }
    }
  }

  TEST_CASE("library: developed values") {
    namespace round = convelope::round_duct;
    namespace plane = convelope::parallel_plates;
    const auto same = [](double exact) { return doctest::Approx(exact).epsilon(3e-10); };
    CHECK(round::laminar_developed_uwt::formula<double>() ==
          same(tube().uniform_temperature_developed()));
    CHECK(round::laminar_developed_uhf::formula<double>() == same(tube().uniform_flux_developed()));
    CHECK(plane::exact_developed_uwt::formula<double>() ==
          same(plates().uniform_temperature_developed()));
    CHECK(plane::exact_developed_uhf::formula<double>() ==
          same(plates().uniform_flux_developed()));
  }

  // The fits of Shah 1975 are in pieces: the ends of each.
  TEST_CASE("library: Shah's fits, tube") {
    namespace round = convelope::round_duct;
    using local_temperature = round::shah_1975_uwt_local;
    const std::initializer_list<double> near = {1e-6, 1e-5, 1e-4, 5e-4, 1e-3};
    check_band(band<local_temperature>(tube(), local_T, near), {-0.64, -0.54}, {0.96, 1.06});
    check_band(band<local_temperature>(tube(), local_T, {1.001e-3, 2e-3, 5e-3, 0.02, 0.05, 0.2}),
               {-0.24, -0.14}, {0.12, 0.22});

    using mean_temperature = round::shah_1975_uwt_mean;
    check_band(band<mean_temperature>(tube(), mean_T, {1e-6, 1e-5, 2e-4, 1e-3, 5e-3}),
               {-2.27, -2.17}, {0.82, 0.92});
    check_band(band<mean_temperature>(tube(), mean_T, {5.001e-3, 0.01, 0.02, 0.02999}),
               {-4.21, -4.11}, {3.32, 3.42});
    check_band(band<mean_temperature>(tube(), mean_T, {0.03001, 0.05, 0.1, 1.0}), {-0.02, 0.03},
               {1.98, 2.08});

    using local_flux = round::shah_1975_uhf_local;
    check_band(band<local_flux>(tube(), local_H, {1e-6, 1e-5, 5e-5}), {-0.54, -0.44},
               {-0.04, 0.04});
    check_band(band<local_flux>(tube(), local_H, {1e-4, 5e-4, 1.5e-3}), {-0.90, -0.80},
               {0.96, 1.06});
    check_band(band<local_flux>(tube(), local_H, {1.501e-3, 3e-3, 0.01, 0.03, 0.07, 0.2}),
               {-0.12, -0.02}, {0.36, 0.46});

    using mean_flux = round::shah_1975_uhf_mean;
    check_band(band<mean_flux>(tube(), mean_H, {1e-6, 1e-4, 2e-3, 0.01, 0.02999}),
               {-3.19, -3.09}, {3.37, 3.47});
    check_band(band<mean_flux>(tube(), mean_H, {0.03001, 0.05, 0.1, 1.0}), {-0.02, 0.03},
               {4.29, 4.39});
  }

  TEST_CASE("library: Shah's fits, plates") {
    namespace plane = convelope::parallel_plates;
    using local_temperature = plane::shah_1975_uwt_local;
    const std::initializer_list<double> near = {1e-6, 1e-5, 1e-4, 5e-4, 1e-3};
    check_band(band<local_temperature>(plates(), local_T, near), {-0.77, -0.67}, {1.47, 1.57});
    check_band(band<local_temperature>(plates(), local_T, {1.001e-3, 2e-3, 5e-3, 0.02, 0.1}),
               {-0.70, -0.60}, {0.73, 0.83});

    using mean_temperature = plane::shah_1975_uwt_mean;
    check_band(band<mean_temperature>(plates(), mean_T, {1e-6, 2e-5, 2e-4, 4.999e-4}),
               {-0.56, -0.46}, {0.29, 0.39});
    check_band(band<mean_temperature>(plates(), mean_T, {5.001e-4, 2e-3, 5.999e-3}),
               {-2.81, -2.71}, {2.00, 2.10});
    check_band(band<mean_temperature>(plates(), mean_T, {6.001e-3, 0.01, 0.05, 1.0}),
               {-0.02, 0.03}, {3.35, 3.45});

    using local_flux = plane::shah_1975_uhf_local;
    check_band(band<local_flux>(plates(), local_H, {1e-6, 1e-5, 1e-4, 2e-4}), {-0.66, -0.56},
               {0.17, 0.27});
    check_band(band<local_flux>(plates(), local_H, {2.001e-4, 5e-4, 1e-3}), {-0.87, -0.77},
               {0.90, 1.00});
    check_band(band<local_flux>(plates(), local_H, {1.001e-3, 2e-3, 6e-3, 0.02, 0.1}),
               {-0.71, -0.61}, {1.08, 1.18});

    using mean_flux = plane::shah_1975_uhf_mean;
    check_band(band<mean_flux>(plates(), mean_H, {1e-6, 2e-5, 2e-4, 1e-3}), {-1.35, -1.25},
               {0.16, 0.26});
    check_band(band<mean_flux>(plates(), mean_H, {1.001e-3, 3e-3, 0.01}), {-2.65, -2.55},
               {2.62, 2.72});
    check_band(band<mean_flux>(plates(), mean_H, {0.01001, 0.02, 0.1, 1.0}), {-0.03, 0.03},
               {2.50, 2.60});
  }

  TEST_CASE("library: formulas in one piece, tube") {
    namespace round = convelope::round_duct;
    // a mean that is right from a long duct to Gz 100 and 12 % high in a short one
    using hausen = round::hausen_1943;
    check_band(band_on_graetz<hausen>(tube(), mean_T, {1.0, 2.0, 10.0, 50.0, 100.0}, 1.0),
               {0.12, 0.22}, {1.58, 1.68});
    check_band(band_on_graetz<hausen>(tube(), mean_T, {200.0, 1000.0, 2000.0, 5000.0, 1e4}, 1.0),
               {3.96, 4.06}, {12.26, 12.36});

    using local_both = round::churchill_ozoe_1973_thermal;
    const std::initializer_list<double> all = {1e-6, 1e-5, 1e-4, 1e-3, 2e-3, 3e-3, 5e-3,
                                               0.01, 0.02, 0.04, 0.05, 0.1,  0.2,  1.0};
    check_band(band<local_both>(tube(), local_T, all, round::wall::uniform_temperature),
               {-4.72, -4.62}, {9.00, 9.10});
    check_band(band<local_both>(tube(), local_H, all, round::wall::uniform_flux), {-3.45, -3.35},
               {4.81, 4.91});
    // their ends: the Leveque law and the developed value
    check_band(band<local_both>(tube(), local_T, {1e-6, 1.0}, round::wall::uniform_temperature),
               {-0.66, -0.56}, {0.71, 0.81});
    check_band(band<local_both>(tube(), local_H, {1e-6, 1.0}, round::wall::uniform_flux),
               {-0.10, 0.0}, {0.29, 0.39});

    constexpr auto thermal = round::entry::thermal;
    check_band(band<round::gnielinski_laminar_uwt_mean>(tube(), mean_T, all, thermal, 0.0),
               {-0.88, -0.78}, {0.85, 0.93});
    check_band(band<round::gnielinski_laminar_uwt_local>(tube(), local_T, all, thermal, 0.0),
               {0.31, 0.41}, {6.12, 6.22});
    check_band(band<round::gnielinski_laminar_uhf_mean>(tube(), mean_H, all, thermal, 0.0),
               {-0.90, -0.80}, {0.57, 0.67});
    check_band(band<round::gnielinski_laminar_uhf_local>(tube(), local_H, all, thermal, 0.0),
               {-3.95, -3.85}, {2.91, 3.01});
  }

  TEST_CASE("library: formulas in one piece, plates") {
    using edwards = convelope::parallel_plates::edwards_1979;
    check_band(band_on_graetz<edwards>(plates(), mean_T, {1.0, 10.0, 25.0, 100.0, 200.0}),
               {-1.81, -1.71}, {0.84, 0.94});
    check_band(band_on_graetz<edwards>(plates(), mean_T, {1000.0, 2000.0, 1e4, 2e4, 1e5}),
               {1.69, 1.79}, {8.80, 8.90});
  }
}
