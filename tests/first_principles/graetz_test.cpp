// Thermal entry at developed velocity: the solver against published numbers, closed limits and a
// second way to the eigenvalues, then the library's correlations against the solver.

#include "graetz.hpp"

#include <doctest/doctest.h>

#include <cmath>
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
  return deviations(x_star,
                    [&](double x) { return Correlation::formula(x, more...) / (entry.*exact)(x); });
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
    for (const auto& at : {row{0.001, 12.80, 19.29}, row{0.004, 8.03, 12.09}, row{0.01, 6.00, 8.92},
                           row{0.04, 4.17, 5.81}, row{0.10, 3.71, 4.64}, row{0.20, 3.66, 4.15}}) {
      CAPTURE(at.x_plus);
      CHECK(tube().uniform_temperature_local(at.x_plus / 2.0) ==
            doctest::Approx(at.local).epsilon(2.5e-3));
      CHECK(tube().uniform_temperature_mean(at.x_plus / 2.0) ==
            doctest::Approx(at.mean).epsilon(0.012));
    }
    const double flux[][2] = {{0.010, 7.49}, {0.020, 6.14}, {0.040, 5.19}, {0.10, 4.51}};
    for (const auto& pair : flux) {
      const double x_plus = pair[0];
      CAPTURE(x_plus);
      CHECK(tube().uniform_flux_local(x_plus / 2.0) == doctest::Approx(pair[1]).epsilon(2e-3));
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
    CHECK(plane::exact_developed_uhf::formula<double>() == same(plates().uniform_flux_developed()));
  }

  // The fits of Shah 1975 are in pieces: the ends of each.
  TEST_CASE("library: Shah's fits, tube") {
    namespace round = convelope::round_duct;
    using local_temperature = round::shah_1975_uwt_local;
    const std::initializer_list<double> near = {1e-6, 1e-5, 1e-4, 5e-4, 1e-3};
    check_band(band<local_temperature>(tube(), local_T, near), -0.59, 1.01);
    check_band(band<local_temperature>(tube(), local_T, {1.001e-3, 2e-3, 5e-3, 0.02, 0.05, 0.2}),
               -0.19, 0.18);

    using mean_temperature = round::shah_1975_uwt_mean;
    check_band(band<mean_temperature>(tube(), mean_T, {1e-6, 1e-5, 2e-4, 1e-3, 5e-3}), -2.22, 0.87);
    check_band(band<mean_temperature>(tube(), mean_T, {5.001e-3, 0.01, 0.02, 0.02999}), -4.16,
               3.37);
    check_band(band<mean_temperature>(tube(), mean_T, {0.03001, 0.05, 0.1, 1.0}), 0.01, 2.03);

    using local_flux = round::shah_1975_uhf_local;
    check_band(band<local_flux>(tube(), local_H, {1e-6, 1e-5, 5e-5}), -0.49, 0.00);
    check_band(band<local_flux>(tube(), local_H, {5.001e-5}), 0.97, 0.97);
    check_band(band<local_flux>(tube(), local_H, {1e-4, 5e-4, 1.5e-3}), -0.85, 1.01);
    check_band(band<local_flux>(tube(), local_H, {1.501e-3, 3e-3, 0.01, 0.03, 0.07, 0.2}), -0.07,
               0.41);

    using mean_flux = round::shah_1975_uhf_mean;
    check_band(band<mean_flux>(tube(), mean_H, {1e-6, 1e-4, 2e-3, 0.01, 0.02999}), -3.14, 3.42);
    check_band(band<mean_flux>(tube(), mean_H, {0.03001, 0.05, 0.1, 1.0}), 0.01, 4.34);
  }

  TEST_CASE("library: Shah's fits, plates") {
    namespace plane = convelope::parallel_plates;
    using local_temperature = plane::shah_1975_uwt_local;
    const std::initializer_list<double> near = {1e-6, 1e-5, 1e-4, 5e-4, 1e-3};
    check_band(band<local_temperature>(plates(), local_T, near), -0.72, 1.52);
    check_band(band<local_temperature>(plates(), local_T, {1.001e-3, 2e-3, 5e-3, 0.02, 0.1}), -0.65,
               0.78);

    using mean_temperature = plane::shah_1975_uwt_mean;
    check_band(band<mean_temperature>(plates(), mean_T, {1e-6, 2e-5, 2e-4, 4.999e-4}), -0.51, 0.34);
    check_band(band<mean_temperature>(plates(), mean_T, {5.001e-4, 2e-3, 5.999e-3}), -2.76, 2.05);
    check_band(band<mean_temperature>(plates(), mean_T, {6.001e-3, 0.01, 0.05, 1.0}), 0.00, 3.40);

    using local_flux = plane::shah_1975_uhf_local;
    check_band(band<local_flux>(plates(), local_H, {1e-6, 1e-5, 1e-4, 2e-4}), -0.61, 0.22);
    check_band(band<local_flux>(plates(), local_H, {2.001e-4, 5e-4, 1e-3}), -0.82, 0.95);
    check_band(band<local_flux>(plates(), local_H, {1.001e-3, 2e-3, 6e-3, 0.02, 0.1}), -0.66, 1.13);

    using mean_flux = plane::shah_1975_uhf_mean;
    check_band(band<mean_flux>(plates(), mean_H, {1e-6, 2e-5, 2e-4, 1e-3}), -1.30, 0.21);
    check_band(band<mean_flux>(plates(), mean_H, {1.001e-3, 3e-3, 0.01}), -2.60, 2.67);
    check_band(band<mean_flux>(plates(), mean_H, {0.01001, 0.02, 0.1, 1.0}), 0.00, 2.55);
  }

  TEST_CASE("library: formulas in one piece, tube") {
    namespace round = convelope::round_duct;
    // a mean that is right from a long duct to Gz 100 and 12 % high in a short one
    using hausen = round::hausen_1943;
    check_band(band_on_graetz<hausen>(tube(), mean_T, {1.0, 2.0, 10.0, 50.0, 100.0}, 1.0), 0.17,
               1.63);
    check_band(band_on_graetz<hausen>(tube(), mean_T, {200.0, 1000.0, 2000.0, 5000.0, 1e4}, 1.0),
               4.01, 12.31);

    using local_both = round::churchill_ozoe_1973_thermal;
    const std::initializer_list<double> all = {1e-6, 1e-5, 1e-4, 1e-3, 2e-3, 3e-3, 5e-3,
                                               0.01, 0.02, 0.04, 0.05, 0.1,  0.2,  1.0};
    check_band(band<local_both>(tube(), local_T, all, round::wall::uniform_temperature), -4.67,
               9.05);
    check_band(band<local_both>(tube(), local_H, all, round::wall::uniform_flux), -3.40, 4.86);
    // their ends: the Leveque law and the developed value
    check_band(band<local_both>(tube(), local_T, {1e-6, 1.0}, round::wall::uniform_temperature),
               -0.61, 0.76);
    check_band(band<local_both>(tube(), local_H, {1e-6, 1.0}, round::wall::uniform_flux), -0.05,
               0.34);

    constexpr auto thermal = round::entry::thermal;
    check_band(band<round::gnielinski_laminar_uwt_mean>(tube(), mean_T, all, thermal, 0.0), -0.83,
               0.88);
    check_band(band<round::gnielinski_laminar_uwt_local>(tube(), local_T, all, thermal, 0.0), 0.36,
               6.17);
    check_band(band<round::gnielinski_laminar_uhf_mean>(tube(), mean_H, all, thermal, 0.0), -0.85,
               0.62);
    check_band(band<round::gnielinski_laminar_uhf_local>(tube(), local_H, all, thermal, 0.0), -3.90,
               2.96);
  }

  TEST_CASE("library: formulas in one piece, plates") {
    using edwards = convelope::parallel_plates::edwards_1979;
    check_band(band_on_graetz<edwards>(plates(), mean_T, {1.0, 10.0, 25.0, 100.0, 200.0}), -1.76,
               0.89);
    check_band(band_on_graetz<edwards>(plates(), mean_T, {1000.0, 2000.0, 1e4, 2e4, 1e5}), 1.74,
               8.85);
  }
}
