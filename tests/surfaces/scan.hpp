#pragma once

// Scans a geometry for steps, kinks of q, wrong signs and wrong slopes.

#include <doctest/doctest.h>

#include <vector>

#include "states.hpp"

namespace scan {

using namespace states;

/// Counts complaints and keeps the first.
class findings {
 public:
  void expect(bool good, const char* what, double x, double value) {
    ++asked_;
    if (good) return;
    if (count_++ == 0) {
      what_ = what;
      x_ = x;
      value_ = value;
    }
  }
  bool any() const { return count_ > 0; }
  const char* what() const { return what_; }
  double x() const { return x_; }
  double value() const { return value_; }
  long asked() const { return asked_; }

 private:
  const char* what_ = "";
  double x_ = 0.0, value_ = 0.0;
  long count_ = 0, asked_ = 0;
};

// Velocities are scanned as least_u sinh(t): Re is rounded off at 1e-6, at 1e-14 m/s on a large
// plate in mercury.
constexpr double least_u = 1e-14;

/// The numbers that must have no step: h (and with it q), and the derivatives of q in T_wall,
/// T_stream and u; the last times u, to be comparable.
struct point {
  double h, by_wall, by_stream, by_velocity, excess, stream_K;
  static constexpr int count = 4;
  double of(int i) const {
    const double all[count] = {h, by_wall, by_stream, by_velocity};
    return all[i];
  }
  double scale() const { return std::fabs(h) + std::fabs(by_wall) + std::fabs(by_stream); }
  // What rounding of T_wall alone may do.
  double noise() const {
    const double ulp = 1e-15 * stream_K / (std::fabs(excess) + 1e-15 * stream_K);
    return 1e-6 + 4.0 * ulp;
  }
};

// A step stays when the interval around it is halved again and again; all else shrinks. 2^-32 of a
// scan's step is 5e-12 of its coordinate.
template <class At>
void expect_no_step(const At& at, double a, double b, int i, findings& found) {
  point low = at(a);
  point high = at(b);
  for (int k = 0; k < 32; ++k) {
    const double m = 0.5 * (a + b);
    const point mid = at(m);
    const bool left = std::fabs(mid.of(i) - low.of(i)) > std::fabs(high.of(i) - mid.of(i));
    (left ? b : a) = m;
    (left ? high : low) = mid;
  }
  const double jump = std::fabs(high.of(i) - low.of(i)) / low.scale();
  constexpr const char* what[point::count] = {"step in h", "step in dq/dT_wall",
                                              "step in dq/dT_stream", "step in dq/du"};
  found.expect(jump <= low.noise(), what[i], a, jump);
}

/// Along at(x), x from..to: wherever second differences stand out from their neighbours, and at
/// their largest, the step is halved down. Finds steps of 1e-4 of h and more.
template <class At>
void no_steps(const At& at, double from, double to, int steps, findings& found) {
  std::vector<point> line;
  const auto x_of = [&](int k) { return from + (to - from) * k / steps; };
  for (int k = 0; k <= steps; ++k) {
    line.push_back(at(x_of(k)));
    for (int i = 0; i < point::count; ++i) {
      found.expect(is_finite(line.back().of(i)), "finite", x_of(k), line.back().of(i));
    }
  }
  const auto p = [&](int k) -> const point& { return line[static_cast<std::size_t>(k)]; };
  for (int i = 0; i < point::count; ++i) {
    std::vector<double> second(line.size(), 0.0);
    const auto s = [&](int k) -> double& { return second[static_cast<std::size_t>(k)]; };
    int largest = 1;
    for (int k = 1; k < steps; ++k) {
      s(k) = std::fabs(p(k + 1).of(i) - 2.0 * p(k).of(i) + p(k - 1).of(i)) / p(k).scale();
      if (s(k) > s(largest)) largest = k;
    }
    expect_no_step(at, x_of(largest - 1), x_of(largest + 1), i, found);
    for (int k = 4; k < steps - 4; ++k) {
      if (s(k) > 1e-5 && s(k) > 3.0 * s(k - 3) && s(k) > 3.0 * s(k + 3)) {
        expect_no_step(at, x_of(k - 1), x_of(k + 1), i, found);
      }
    }
  }
}

template <class G, class Fluid>
point point_of(const G& g, const Fluid& f, double u, double stream_K, double wall_K,
               double p = 101325.0) {
  using D = dual<double, 3>;
  const D wall = D::variable(wall_K, 0);
  const film<D> x = film_of<D>(g, f, D::variable(u, 2), D::variable(stream_K, 1), wall, D(p));
  const D q = x.coefficient * (wall - x.reference_temperature);
  const double by_velocity = x.coefficient.slope[2] * std::sqrt(u * u + least_u * least_u);
  return {x.coefficient.value, q.slope[0], q.slope[1], by_velocity, wall_K - stream_K, stream_K};
}

/// What must hold at every single state.
template <class G, class Fluid>
void at_one_state(const G& g, const Fluid& f, double u, double stream_K, double wall_K, double p,
                  findings& found) {
  const auto a = ask(g, f, u, stream_K, wall_K, p);
  const double q = a.flux().si();
  const double h = a.coefficient().si();
  const double slope = a.slope().si();
  const double excess = wall_K - stream_K;
  found.expect(is_finite(q) && is_finite(h) && is_finite(slope), "finite", wall_K, q);
  found.expect(h >= 0.0, "h not negative", wall_K, h);
  found.expect(q * excess >= 0.0, "sign of q", wall_K, q);
  found.expect(std::fabs(q - h * excess) <= 1e-12 * std::fabs(q), "q = h dT", wall_K, q);
  const auto pair = a.equivalent();
  const double again = pair.coefficient * (wall_K - pair.temperature);
  found.expect(pair.coefficient > 0.0, "h_eff positive", wall_K, pair.coefficient);
  // T_eff is rounded to the last place of an absolute temperature.
  found.expect(std::fabs(again - q) <= 1e-12 * std::fabs(q) + 4e-16 * stream_K * pair.coefficient +
                                           1e-15 * pair.coefficient * std::fabs(pair.temperature),
               "equivalent pair gives q", wall_K, again - q);
  double sum = 0.0;
  for (int i = 0; i < a.spoken(); ++i) {
    found.expect(a.share(i) >= -1e-9 && a.share(i) <= 1.0 + 1e-9, "share", wall_K, a.share(i));
    sum += a.share(i);
  }
  found.expect(std::fabs(sum - 1.0) <= 1e-12, "shares sum to 1", wall_K, sum);
  found.expect(a.verdict().finite_input() && a.verdict().possible_input(), "good input", wall_K, q);

  // Richardson's fourth-order central difference.
  if (std::fabs(excess) < 1e-2) return;
  const double d = 2e-4 * std::fabs(excess);
  const auto q_at = [&](double T) { return ask(g, f, u, stream_K, T, p).flux().si(); };
  const double wide = (q_at(wall_K + d) - q_at(wall_K - d)) / (2.0 * d);
  const double narrow = (q_at(wall_K + 0.5 * d) - q_at(wall_K - 0.5 * d)) / d;
  const double difference = (4.0 * narrow - wide) / 3.0;
  const double off = std::fabs(difference - slope) / (h + std::fabs(slope));
  found.expect(off <= 1e-6, "slope against differences", wall_K, off);
}

/// T of streams and walls, and p, that a scan may use.
struct range {
  double coldest_K, hottest_K, least_Pa, most_Pa;
};
inline constexpr range air_range{210.0, 1200.0, 1e4, 3e5};
inline constexpr range water_range{273.2, 430.0, 1e6, 2e7};
// On both sides of the density maximum at 277 K.
inline constexpr range cold_water_range{273.2, 285.0, 1e5, 2e6};
inline constexpr range any_range{250.0, 600.0, 1e5, 1e5};

/// `configurations` random geometries and streams; through each a line of wall temperatures and a
/// line of velocities, both signs and zero included.
template <class Make, class Fluid>
void everywhere(unsigned seed, const Make& make, const Fluid& f, const range& r,
                double fastest = 100.0, int configurations = 8, int steps = 2400) {
  random_numbers random(seed);
  findings found;
  for (int c = 0; c < configurations && !found.any(); ++c) {
    const auto g = make(random);
    const double stream = random.between(r.coldest_K, r.hottest_K);
    const double p = random.log_between(r.least_Pa, r.most_Pa);
    const double u = c % 4 == 0 ? 0.0 : random.sign() * random.log_between(1e-4, fastest);
    const auto dot = [&](double velocity, double wall) {
      return point_of(g, f, velocity, stream, wall, p);
    };

    constexpr double least_dT = 1e-5;
    const auto wall_at = [&](double t) { return stream + least_dT * std::sinh(t); };
    const double coldest = std::asinh((r.coldest_K - stream) / least_dT);
    const double hottest = std::asinh((r.hottest_K - stream) / least_dT);
    no_steps([&](double t) { return dot(u, wall_at(t)); }, coldest, hottest, steps, found);

    const double wall = random.between(r.coldest_K, r.hottest_K);
    const double fast = std::asinh(fastest / least_u);
    const auto velocity_at = [&](double t) { return least_u * std::sinh(t); };
    no_steps([&](double t) { return dot(velocity_at(t), wall); }, -fast, fast, steps, found);

    for (int k = 0; k < steps; ++k) {
      const double part = static_cast<double>(k) / steps;
      at_one_state(g, f, u, stream, wall_at(coldest + part * (hottest - coldest)), p, found);
      at_one_state(g, f, velocity_at(fast * (2.0 * part - 1.0)), stream, wall, p, found);
    }
    at_one_state(g, f, u, stream, stream, p, found);
    at_one_state(g, f, 0.0, stream, stream, p, found);
  }
  CAPTURE(found.x());
  CAPTURE(found.value());
  CHECK_MESSAGE(!found.any(), found.what());
  CHECK(found.asked() > 10 * steps);
}

/// Along ln x of any parameter: point_at(x), x = from..to.
template <class At>
void no_steps_over(const At& point_at, double from, double to, int steps = 3000) {
  findings found;
  no_steps([&](double ln_x) { return point_at(std::exp(ln_x)); }, std::log(from), std::log(to),
           steps, found);
  CAPTURE(found.x());
  CAPTURE(found.value());
  CHECK_MESSAGE(!found.any(), found.what());
}

/// A zero, negative, NaN or infinite length, and NaN or infinite states, are told; nothing crashes.
template <class Bend, class G>
void bad_length_is_told(const G& good, const Bend& bend) {
  const double infinity = HUGE_VAL;
  CHECK(ask(good, dry_air{}, 1.0, 300.0, 350.0).verdict().possible_input());
  for (const double x : {0.0, -0.01, infinity, -infinity, std::nan("")}) {
    CAPTURE(x);
    G g = good;
    bend(g, x);
    const auto a = ask(g, dry_air{}, 1.0, 300.0, 350.0);
    CHECK_FALSE(a.verdict().possible_input());
    CHECK_FALSE(a.inside());
    CHECK(is_finite(a.flux().si()));
  }
}
template <class G>
void bad_state_is_told(const G& g) {
  const double infinity = HUGE_VAL;
  for (const double x : {std::nan(""), infinity, -infinity}) {
    CAPTURE(x);
    CHECK_FALSE(ask(g, dry_air{}, 1.0, 300.0, x).verdict().finite_input());
    CHECK_FALSE(ask(g, dry_air{}, 1.0, x, 350.0).verdict().finite_input());
    CHECK_FALSE(ask(g, dry_air{}, 1.0, 300.0, 350.0, x).verdict().finite_input());
    if constexpr (requires(typename G::template exposure<double> e) { e.velocity; }) {
      CHECK_FALSE(ask(g, dry_air{}, x, 300.0, 350.0).verdict().finite_input());
    }
  }
  for (const double x : {0.0, -5.0}) {
    CAPTURE(x);
    // The mean of the two is a possible temperature; the one is not.
    CHECK_FALSE(ask(g, dry_air{}, 1.0, 600.0, x).verdict().possible_input());
    CHECK_FALSE(ask(g, dry_air{}, 1.0, x, 600.0).verdict().possible_input());
  }
}

}  // namespace scan
