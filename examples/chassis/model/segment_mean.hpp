// Along a segment with constant film coefficients the air temperature follows an exponential:
//   T_mean - T_in = psi(N) * sum(h A (T_wall - T_in)) / C,   N = sum(h A) / C,  C = m cp
// with psi(N) = (N - 1 + exp(-N)) / N^2, from integrating the exponential over the segment.
#pragma once

#include <cmath>

#include "model/wall_model.hpp"

namespace chassis {

/// psi(N) and its derivative, for N >= 0, without loss of digits at small N.
inline sensitive exponential_mean(double n) {
  if (n < 0.5) {  // psi = sum (-N)^k / (k + 2)!
    double value = 0;
    double slope = 0;
    double term = 0.5;  // (-N)^k / (k + 2)!
    double before = 0;  // (-N)^(k-1) / (k + 2)!, with its sign
    for (int k = 0; k < 16; ++k) {
      value += term;
      slope -= k * before;
      before = term / (k + 3);
      term *= -n / (k + 3);
    }
    return {value, slope};
  }
  const double one_minus_exp = -std::expm1(-n);
  const double value = (n - one_minus_exp) / (n * n);
  return {value, (one_minus_exp / n - 2 * value) / n};
}

}  // namespace chassis
