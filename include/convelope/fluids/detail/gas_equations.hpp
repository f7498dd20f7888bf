#ifndef CONVELOPE_FLUIDS_DETAIL_GAS_EQUATIONS_HPP
#define CONVELOPE_FLUIDS_DETAIL_GAS_EQUATIONS_HPP

#include "convelope/fluids/detail/dilute_gas.hpp"
#include "convelope/fluids/detail/helmholtz.hpp"

// The reference equations of state of air, nitrogen, oxygen and argon. Terms n, i, j, l and, near
// the critical point, n, i, j, phi, beta, gamma, in the order of the papers.

namespace convelope {
inline namespace v0 {
namespace detail {

/// Lemmon, Jacobsen, Penoncello, Friend, J. Phys. Chem. Ref. Data 29 (2000) 331-385, as a
/// pseudo-pure fluid.
struct air_equation {
  static constexpr double gas_constant = 8.31451;           // J/(mol K)
  static constexpr double molar_mass = 28.9586e-3;          // kg/mol
  static constexpr double reducing_temperature = 132.6312;  // K
  static constexpr double reducing_density = 10447.7;       // mol/m3
  static constexpr int unit = 100;
  static constexpr helmholtz::term terms[] = {
      {0.118160747229, 1, 0, 0},        {0.713116392079, 1, 0.33, 0},
      {-0.161824192067e1, 1, 1.01, 0},  {0.714140178971e-1, 2, 0, 0},
      {-0.865421396646e-1, 3, 0, 0},    {0.134211176704, 3, 0.15, 0},
      {0.112626704218e-1, 4, 0, 0},     {-0.420533228842e-1, 4, 0.2, 0},
      {0.349008431982e-1, 4, 0.35, 0},  {0.164957183186e-3, 6, 1.35, 0},
      {-0.101365037912, 1, 1.6, 1},     {-0.173813690970, 3, 0.8, 1},
      {-0.472103183731e-1, 5, 0.95, 1}, {-0.122523554253e-1, 6, 1.25, 1},
      {-0.146629609713, 1, 3.6, 2},     {-0.316055879821e-1, 3, 6, 2},
      {0.233594806142e-3, 11, 3.25, 2}, {0.148287891978e-1, 1, 3.5, 3},
      {-0.938782884667e-2, 3, 15, 3}};
  /// cp/R of the ideal gas.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T ideal_heat(const T& t, const T& inverse, const T& root) {
    return T(((-3.115413101e-13 * t + 7.172111248e-9) * t + 2.395525583e-6) * t + 3.490888032 +
             0.223806688 * (root * inverse * inverse) +
             0.791309509 * einstein(T(3364.011 * inverse)) +
             0.212236768 * einstein(T(2242.45 * inverse)) +
             0.197938904 * two_level(T(11580.4 * inverse)));
  }
};

/// Span, Lemmon, Jacobsen, Wagner, Yokozeki, J. Phys. Chem. Ref. Data 29 (2000) 1361-1433.
struct nitrogen_equation {
  static constexpr double gas_constant = 8.31451;          // J/(mol K)
  static constexpr double molar_mass = 28.01348e-3;        // kg/mol
  static constexpr double reducing_temperature = 126.192;  // K
  static constexpr double reducing_density = 11183.9;      // mol/m3
  static constexpr int unit = 8;
  static constexpr helmholtz::term terms[] = {
      {0.924803575275, 1, 0.25, 0},      {-0.492448489428, 1, 0.875, 0},
      {0.661883336938, 2, 0.5, 0},       {-0.192902649201e1, 2, 0.875, 0},
      {-0.622469309629e-1, 3, 0.375, 0}, {0.349943957581, 3, 0.75, 0},
      {0.564857472498, 1, 0.5, 1},       {-0.161720005987e1, 1, 0.75, 1},
      {-0.481395031883, 1, 2, 1},        {0.421150636384, 3, 1.25, 1},
      {-0.161962230825e-1, 3, 3.5, 1},   {0.172100994165, 4, 1, 1},
      {0.735448924933e-2, 6, 0.5, 1},    {0.168077305479e-1, 6, 3, 1},
      {-0.107626664179e-2, 7, 0, 1},     {-0.137318088513e-1, 7, 2.75, 1},
      {0.635466899859e-3, 8, 0.75, 1},   {0.304432279419e-2, 8, 2.5, 1},
      {-0.435762336045e-1, 1, 4, 2},     {-0.723174889316e-1, 2, 6, 2},
      {0.389644315272e-1, 3, 6, 2},      {-0.212201363910e-1, 4, 3, 2},
      {0.408822981509e-2, 5, 3, 2},      {-0.551990017984e-4, 8, 6, 2},
      {-0.462016716479e-1, 4, 16, 3},    {-0.300311716011e-2, 5, 11, 3},
      {0.368825891208e-1, 5, 15, 3},     {-0.255856846220e-2, 8, 12, 3},
      {0.896915264558e-2, 3, 12, 4},     {-0.441513370350e-2, 5, 7, 4},
      {0.133722924858e-2, 6, 4, 4},      {0.264832491957e-3, 9, 16, 4}};
  static constexpr helmholtz::bell bells[] = {{0.196688194015e2, 1, 0, 20, 325, 1.16},
                                              {-0.209115600730e2, 1, 1, 20, 325, 1.16},
                                              {0.167788306989e-1, 3, 2, 15, 300, 1.13},
                                              {0.262767566274e4, 2, 3, 25, 275, 1.25}};
  /// cp/R of the ideal gas.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T ideal_heat(const T& t, const T& inverse, const T&) {
    return T(((-3.987984e-13 * t + 4.701240e-9) * t + 3.066469e-6) * t + 3.5 +
             1.012941 * einstein(T(3364.011 * inverse)));
  }
};

/// Schmidt, Wagner, Fluid Phase Equilib. 19 (1985) 175-200; also in Stewart, Jacobsen, Wagner,
/// J. Phys. Chem. Ref. Data 20 (1991) 917-1021.
struct oxygen_equation {
  static constexpr double gas_constant = 8.31434;          // J/(mol K)
  static constexpr double molar_mass = 31.9988e-3;         // kg/mol
  static constexpr double reducing_temperature = 154.581;  // K
  static constexpr double reducing_density = 13630.0;      // mol/m3
  static constexpr int unit = 2;
  static constexpr helmholtz::term terms[] = {
      {0.3983768749, 1, 0, 0},       {-0.1846157454e1, 1, 1.5, 0},  {0.4183473197, 1, 2.5, 0},
      {0.2370620711e-1, 2, -0.5, 0}, {0.9771730573e-1, 2, 1.5, 0},  {0.3017891294e-1, 2, 2, 0},
      {0.2273353212e-1, 3, 0, 0},    {0.1357254086e-1, 3, 1, 0},    {-0.4052698943e-1, 3, 2.5, 0},
      {0.5454628515e-3, 6, 0, 0},    {0.5113182277e-3, 7, 2, 0},    {0.2953466883e-6, 7, 5, 0},
      {-0.8687645072e-4, 8, 2, 0},   {-0.2127082589, 1, 5, 2},      {0.8735941958e-1, 1, 6, 2},
      {0.1275509190, 2, 3.5, 2},     {-0.9067701064e-1, 2, 5.5, 2}, {-0.3540084206e-1, 3, 3, 2},
      {-0.3623278059e-1, 3, 7, 2},   {0.1327699290e-1, 5, 6, 2},    {-0.3254111865e-3, 6, 8.5, 2},
      {-0.8313582932e-2, 7, 4, 2},   {0.2124570559e-2, 8, 6.5, 2},  {-0.8325206232e-3, 10, 5.5, 2},
      {-0.2626173276e-4, 2, 22, 4},  {0.2599581482e-2, 3, 11, 4},   {0.9984649663e-2, 3, 18, 4},
      {0.2199923153e-2, 4, 11, 4},   {-0.2591350486e-1, 4, 23, 4},  {-0.1259630848, 5, 17, 4},
      {0.1478355637, 5, 18, 4},      {-0.1011251078e-1, 5, 23, 4}};
  /// cp/R of the ideal gas, from the second derivative of the ideal Helmholtz energy.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T ideal_heat(const T& t, const T& inverse, const T& root) {
    constexpr double tc = reducing_temperature;
    return T(3.50042 + (0.75 * 0.740775e-3 * tc * 12.433060765578) * (root * inverse * inverse) +
             (6.0 * 0.664930e-4 / (tc * tc)) * (t * t) +
             1.01258 * einstein(T((14.5066 * tc) * inverse)) +
             0.944365 * two_level(T((74.9148 * tc) * inverse)));
  }
};

/// Tegeler, Span, Wagner, J. Phys. Chem. Ref. Data 28 (1999) 779-850.
struct argon_equation {
  static constexpr double gas_constant = 8.31451;          // J/(mol K)
  static constexpr double molar_mass = 39.948e-3;          // kg/mol
  static constexpr double reducing_temperature = 150.687;  // K
  static constexpr double reducing_density = 13407.43;     // mol/m3
  static constexpr int unit = 4;
  static constexpr helmholtz::term terms[] = {
      {0.88722304990011e-1, 1, 0, 0},   {0.70514805167298, 1, 0.25, 0},
      {-0.16820115654090e+1, 1, 1, 0},  {-0.14909014431486, 1, 2.75, 0},
      {-0.12024804600940, 1, 4, 0},     {-0.12164978798599, 2, 0, 0},
      {0.40035933626752, 2, 0.25, 0},   {-0.27136062699129, 2, 0.75, 0},
      {0.24211924579645, 2, 2.75, 0},   {0.57889583185570e-2, 3, 0, 0},
      {-0.41097335615341e-1, 3, 2, 0},  {0.24710761541614e-1, 4, 0.75, 0},
      {-0.32181391750702, 1, 3, 1},     {0.33230017695794, 1, 3.5, 1},
      {0.31019986287345e-1, 3, 1, 1},   {-0.30777086002437e-1, 4, 2, 1},
      {0.93891137419581e-1, 4, 4, 1},   {-0.90643210682031e-1, 5, 3, 1},
      {-0.45778349276654e-3, 7, 0, 1},  {-0.82659729025197e-4, 10, 0.5, 1},
      {0.13013415603147e-3, 10, 1, 1},  {-0.11397840001996e-1, 2, 1, 2},
      {-0.24455169960535e-1, 2, 7, 2},  {-0.64324067175955e-1, 4, 5, 2},
      {0.58889471093674e-1, 4, 6, 2},   {-0.64933552112965e-3, 8, 6, 2},
      {-0.13889862158435e-1, 3, 10, 3}, {0.40489839296910, 5, 13, 3},
      {-0.38612519594749, 5, 14, 3},    {-0.18817142332233, 6, 11, 3},
      {0.15977647596482, 6, 14, 3},     {0.53985518513856e-1, 7, 8, 3},
      {-0.28953417958014e-1, 7, 14, 3}, {-0.13025413381384e-1, 8, 6, 3},
      {0.28948696775778e-2, 9, 7, 3},   {-0.22647134304796e-2, 5, 24, 4},
      {0.17616456196368e-2, 6, 22, 4}};
  static constexpr helmholtz::bell bells[] = {{0.58552454482774e-2, 2, 3, 20, 250, 1.11},
                                              {-0.69251908270028, 1, 1, 20, 375, 1.14},
                                              {0.15315490030516e+1, 2, 0, 20, 300, 1.17},
                                              {-0.27380447449783e-2, 3, 0, 20, 225, 1.11}};
  /// cp/R of the ideal gas.
  template <class T>
  CONVELOPE_FUNCTION static constexpr T ideal_heat(const T&, const T&, const T&) {
    return scalar_adaptor<T>::constant(2.5);
  }
};

/// A gas by its second virial coefficient; tau = reducing_temperature/T.
template <class Equation, class T>
CONVELOPE_FUNCTION constexpr helmholtz::virial_gas<T> gas_by_virial(const T& temperature_K,
                                                                    const T& inverse, const T& root,
                                                                    const T& tau,
                                                                    const T& one_over_tau,
                                                                    const T& pressure_Pa) {
  const helmholtz::second_virial<T> v =
      helmholtz::virial<Equation::terms, Equation::unit>(tau, one_over_tau);
  constexpr double volume = 1.0 / Equation::reducing_density;
  return helmholtz::gas_of(
      helmholtz::second_virial<T>{T(volume * v.b), T(volume * v.b1), T(volume * v.b2)}, inverse,
      T(pressure_Pa * inverse * (1.0 / Equation::gas_constant)),
      Equation::ideal_heat(temperature_K, inverse, root));
}

}  // namespace detail
}  // namespace v0
}  // namespace convelope

#endif
