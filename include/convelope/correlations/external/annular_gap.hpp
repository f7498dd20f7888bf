#ifndef CONVELOPE_CORRELATIONS_EXTERNAL_ANNULAR_GAP_HPP
#define CONVELOPE_CORRELATIONS_EXTERNAL_ANNULAR_GAP_HPP

#include "convelope/estimate/correlation.hpp"
#include "convelope/kinds.hpp"

namespace convelope {
inline namespace v0 {

/// The gap b between a turning inner cylinder of radius R_i and an outer one at rest; no axial
/// flow, smooth walls. h: heat flux per area of the INNER wall over inner wall minus outer wall
/// temperature. Nu = h 2b/k, on the hydraulic diameter 2b of the gap, so that conduction through a
/// narrow gap has Nu = 2. (Where h is meant from one wall to the gap air, Nu = 2 goes with b.)
/// Properties at the mean of the two walls.
/// Ta = (omega R_i b/nu) (b/R_i)^(1/2); Ta_m is the SQUARED group. Vortices start at Ta 41.17 in a
/// narrow gap (Taylor 1923), Ta^2 = 1695.
namespace annular_gap {

/// Electrical machines: Nu = 2 below Ta 41; 0.202 Ta^0.63 Pr^0.27 up to 100; 0.386 Ta^0.5 Pr^0.27.
/// As published it is not smooth: in air (Pr 0.71) it steps by -4.5 % at Ta 41 and +5.0 % at 100.
/// Range: the source states no upper Ta; it is bounded here where becker_kaye_1962 ends
/// (Ta^2 = 1e7), from which it differs by less than 1 % there. Slots and axial flow are not
/// covered. Source: Taylor 1935 and Gazley 1958, as joined in the texts on electrical machines.
struct taylor_gazley
    : correlation<taylor_gazley, nusselt_of<hydraulic_diameter>, taylor_number, prandtl_number> {
  static constexpr const char* id = "annular-gap/taylor-gazley";
  static constexpr const char* quantity = "Nu_2b";
  static constexpr reference source{"G. I. Taylor; C. Gazley", 1958, "Trans. ASME 80, 79-90",
                                    known::quoted,
                                    "0.212 for 0.202 would meet both neighbours: perhaps an old "
                                    "misprint; all seen texts print 0.202"};
  static constexpr auto envelope =
      within(limit<taylor_number>(0.0, 3162.0), limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::mean_of_walls;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ta, const T& Pr) {
    const T turning = larger(Ta, T(1.0));  // keeps log(0) away
    const T vortices = T(0.202 * power<63, 100>(turning));
    const T turbulent = T(0.386 * sqrt(turning));
    const T flow = T(select(Ta <= 100.0, vortices, turbulent) * power<27, 100>(Pr));
    return select(Ta < 41.0, T(2.0), flow);
  }
};

/// Air: Nu = 2 below Ta_m 1700; 0.128 Ta_m^0.367 up to 1e4; 0.409 Ta_m^0.241 up to 1e7.
/// Ta_m = omega^2 r_m b^3/(nu^2 F_g), r_m the mean radius, F_g of becker_kaye_geometry_factor.
/// As published it steps by -1.9 % at 1700 and +0.1 % at 1e4.
/// Source: Becker and Kaye 1962, J. Heat Transfer 84, 97-105.
struct becker_kaye_1962
    : correlation<becker_kaye_1962, nusselt_of<hydraulic_diameter>, squared_taylor_number> {
  static constexpr const char* id = "annular-gap/becker-kaye-1962";
  static constexpr const char* quantity = "Nu_2b";
  static constexpr reference source{"K. M. Becker, J. Kaye", 1962, "J. Heat Transfer 84, 97-105",
                                    known::recalled};
  static constexpr auto envelope = within(limit<squared_taylor_number>(0.0, 1e7));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::mean_of_walls;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ta_m) {
    const auto lower = Ta_m <= 1e4;
    const T constant = select(lower, T(0.128), T(0.409));
    const T exponent = select(lower, T(0.367), T(0.241));
    const T turning = larger(Ta_m, T(1.0));  // keeps log(0) away
    return select(Ta_m < 1700.0, T(2.0), T(constant * exp(T(exponent * log(turning)))));
  }
};

/// The factor of Ta_m for a gap that is not narrow, x = b/r_m:
/// F_g = (pi^4/1697) (1 - x/2)^-2 / P, P = 0.0571 X + 0.00056/X, X = 1 - 0.652 x/(1 - x/2)
/// Range: R_i/R_o >= 0.7, x up to 0.353. There it puts the onset of vortices (Ta_m 1697) within
/// 4.3 % of the stability solution; at R_i/R_o 0.5 it is 46 % high.
/// Source: Becker and Kaye 1962, J. Heat Transfer 84, 97-105.
struct becker_kaye_geometry_factor
    : correlation<becker_kaye_geometry_factor, gap_geometry_factor, gap_ratio> {
  static constexpr const char* id = "annular-gap/becker-kaye-geometry-factor";
  static constexpr const char* quantity = "F_g";
  static constexpr reference source{"K. M. Becker, J. Kaye", 1962, "J. Heat Transfer 84, 97-105",
                                    known::recalled};
  static constexpr auto envelope = within(limit<gap_ratio>(0.0, 0.353));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::none;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& b_over_rm) {
    constexpr double pi_4_over_1697 = 97.409091034002437236 / 1697.0;
    const T inner = T(1.0 - 0.5 * b_over_rm);  // R_i/r_m
    const T X = T(1.0 - 0.652 * b_over_rm / inner);
    const T P = T(0.0571 * X + 0.00056 / X);
    return T(pi_4_over_1697 / (square(inner) * P));
  }
};

/// Nu = 0.42 (Ta^2 Pr)^(1/4), above the onset of vortices.
/// Range: not known from the source; bounded here by the onset, Ta 41.17, and where
/// becker_kaye_1962 ends, Ta 3162; in air 24 % above that law at the onset, within
/// 10 % from Ta 80 on.
/// Source: Tachibana, Fukui and Mitsumura 1960, Bull. JSME 3, 119-123.
struct tachibana_1960
    : correlation<tachibana_1960, nusselt_of<hydraulic_diameter>, taylor_number, prandtl_number> {
  static constexpr const char* id = "annular-gap/tachibana-1960";
  static constexpr const char* quantity = "Nu_2b";
  static constexpr reference source{"F. Tachibana, S. Fukui, H. Mitsumura", 1960,
                                    "Bull. JSME 3, 119-123", known::recalled,
                                    "also printed as 0.21 with Nu on the gap b: the same law"};
  static constexpr auto envelope =
      within(limit<taylor_number>(41.17, 3162.0), limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::mean_of_walls;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ta, const T& Pr) {
    return T(0.42 * sqrt(Ta) * power<1, 4>(Pr));
  }
};

/// Nu = 0.44 (Ta^2)^(1/4) Pr^0.3. Range: Ta^2 5e3 .. 2e5, that is Ta 70.7 .. 447.2;
/// b/R_i 0.0055 .. 0.14, which the inputs can't show.
/// Source: Aoki, Nohira and Arai 1967, Bull. JSME 10, 523-532.
struct aoki_1967
    : correlation<aoki_1967, nusselt_of<hydraulic_diameter>, taylor_number, prandtl_number> {
  static constexpr const char* id = "annular-gap/aoki-1967";
  static constexpr const char* quantity = "Nu_2b";
  static constexpr reference source{"H. Aoki, H. Nohira, H. Arai", 1967, "Bull. JSME 10, 523-532",
                                    known::recalled,
                                    "also printed as 0.22 with Nu on the gap b: the same law"};
  static constexpr auto envelope =
      within(limit<taylor_number>(70.7, 447.2), limit<prandtl_number>(0.0, unbounded));
  static constexpr double scatter = not_stated;
  static constexpr state_rule state_at = state_rule::mean_of_walls;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& Ta, const T& Pr) {
    return T(0.44 * sqrt(Ta) * power<3, 10>(Pr));
  }
};

/// Conduction alone, exact: Nu = 2 (1 - eta)/(eta ln(1/eta)), eta = R_i/R_o; 2 only in the limit
/// of a narrow gap. Smooth there too: within 1e-3 of eta = 1 it is a series.
struct conduction_limit
    : correlation<conduction_limit, nusselt_of<hydraulic_diameter>, radius_ratio> {
  static constexpr const char* id = "annular-gap/conduction-limit";
  static constexpr const char* quantity = "Nu_2b";
  static constexpr const char* keys[] = {"eta"};
  static constexpr reference source{"J. Fourier", 1822, "Theorie analytique de la chaleur",
                                    known::computed, "the solution for concentric cylinders"};
  static constexpr auto envelope = within(limit<radius_ratio>(1e-6, 1.0));  // infinite at 0
  static constexpr double scatter = 0.0;
  static constexpr state_rule state_at = state_rule::mean_of_walls;

  template <scalar T>
  CONVELOPE_FUNCTION static constexpr T formula(const T& eta) {
    const T d = T(1.0 - eta);
    const T series = T(
        2.0 + d * (1.0 + d * (5.0 / 6.0 + d * (0.75 + d * (251.0 / 360.0 + d * (95.0 / 144.0))))));
    const T wide = smaller(eta, T(0.9999));  // keeps 0/0 away
    return select(d < 1e-3, series, T(2.0 * (wide - 1.0) / (wide * log(wide))));
  }
};

}  // namespace annular_gap
}  // namespace v0
}  // namespace convelope

#endif
