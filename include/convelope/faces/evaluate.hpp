#ifndef CONVELOPE_FACES_EVALUATE_HPP
#define CONVELOPE_FACES_EVALUATE_HPP

#include <cstdint>
#include <span>

#include "convelope/boundary/surface.hpp"

// Many faces of one wall at once: arrays of raw SI doubles in, arrays out.

namespace convelope {
inline namespace v0 {
namespace faces {

/// One number per face. An empty span means: the same for all, from the surface's own exposure.
struct inputs {
  std::span<const double> wall_temperature_K;
  std::span<const double> velocity_m_s{};
  std::span<const double> stream_temperature_K{};
  std::span<const double> pressure_Pa{};
};

/// One number per face. An empty span is not written.
struct outputs {
  std::span<double> flux_W_m2{};
  std::span<double> slope_W_m2K{};
  std::span<double> coefficient_W_m2K{};
  std::span<std::uint64_t> verdict{};
};

enum class status : unsigned char {
  done,            // also for no faces at all: nothing was written
  lengths_differ,  // nothing was written
  overlapping,     // an output shares memory with another array; nothing was written
  no_velocity      // a velocity per face for a surface in a fluid at rest; nothing was written
};

constexpr const char* words(status s) {
  switch (s) {
    case status::done:
      return "done";
    case status::lengths_differ:
      return "arrays of different lengths; nothing was written";
    case status::overlapping:
      return "an output array overlaps another array; nothing was written";
    case status::no_velocity:
      break;
  }
  return "this surface takes no velocity; nothing was written";
}

namespace detail {
struct stretch {
  const void* begin;
  const void* end;
};
template <class A>
stretch stretch_of(const A& a) {
  return {a.data(), a.data() + a.size()};
}
inline bool overlap(const stretch& a, const stretch& b) {
  const auto at = [](const void* p) { return reinterpret_cast<std::uintptr_t>(p); };
  return a.begin != a.end && b.begin != b.end && at(a.begin) < at(b.end) && at(b.begin) < at(a.end);
}

inline status checked(const inputs& in, const outputs& out) {
  const std::size_t n = in.wall_temperature_K.size();
  const auto fits = [n](const auto& a) { return a.empty() || a.size() == n; };
  if (!fits(in.velocity_m_s) || !fits(in.stream_temperature_K) || !fits(in.pressure_Pa) ||
      !fits(out.flux_W_m2) || !fits(out.slope_W_m2K) || !fits(out.coefficient_W_m2K) ||
      !fits(out.verdict)) {
    return status::lengths_differ;
  }
  const stretch read[] = {stretch_of(in.wall_temperature_K), stretch_of(in.velocity_m_s),
                          stretch_of(in.stream_temperature_K), stretch_of(in.pressure_Pa)};
  const stretch written[] = {stretch_of(out.flux_W_m2), stretch_of(out.slope_W_m2K),
                             stretch_of(out.coefficient_W_m2K), stretch_of(out.verdict)};
  for (int i = 0; i < 4; ++i) {
    for (const stretch& r : read) {
      if (overlap(written[i], r)) return status::overlapping;
    }
    for (int j = 0; j < i; ++j) {
      if (overlap(written[i], written[j])) return status::overlapping;
    }
  }
  return status::done;
}

/// Reads and writes `lanes` neighbouring faces; scalar types have one.
template <class T>
struct face_access {
  static T load(const double* from) { return T(*from); }
  static void store(const T& x, double* to) { *to = static_cast<double>(x); }
  static void store_bits(const bits_t<T>& b, std::uint64_t* to) { *to = b; }
};

template <class T, class Surface>
void block(const Surface& s, const inputs& in, const outputs& out, std::size_t i) {
  using access = face_access<T>;
  auto exposure = s.exposure().template as<T>();
  const auto replace = [i](auto& member, std::span<const double> values) {
    using member_type = std::remove_reference_t<decltype(member)>;
    if (!values.empty()) member = member_type::from_si(access::load(values.data() + i));
  };
  if constexpr (requires { exposure.velocity; }) replace(exposure.velocity, in.velocity_m_s);
  replace(exposure.temperature, in.stream_temperature_K);
  replace(exposure.pressure, in.pressure_Pa);
  const auto wall =
      typed<kinds::wall_temperature, T>::from_si(access::load(in.wall_temperature_K.data() + i));
  const wall_answer<T> a = s.at(wall, exposure);
  if (!out.flux_W_m2.empty()) access::store(a.flux().si(), out.flux_W_m2.data() + i);
  if (!out.slope_W_m2K.empty()) access::store(a.slope().si(), out.slope_W_m2K.data() + i);
  if (!out.coefficient_W_m2K.empty()) {
    access::store(a.coefficient().si(), out.coefficient_W_m2K.data() + i);
  }
  if (!out.verdict.empty()) access::store_bits(a.verdict().bits(), out.verdict.data() + i);
}
}  // namespace detail

/// Asks a surface for every face. T = double goes face by face; a pack type goes lane by lane
/// (include convelope/faces/std_simd.hpp), remainder faces one by one. No allocation; safe to
/// call from many threads on parts of the arrays.
template <class T = double, wall_geometry G, fluid Fluid, class E>
status evaluate(const wall_surface<G, Fluid, E>& s, const inputs& in, const outputs& out) {
  const status found = detail::checked(in, out);
  if (found != status::done) return found;
  if constexpr (!requires(const E& e) { e.velocity; }) {
    if (!in.velocity_m_s.empty()) return status::no_velocity;
  }
  const std::size_t n = in.wall_temperature_K.size();
  constexpr auto lanes = static_cast<std::size_t>(scalar_adaptor<T>::lanes);
  std::size_t i = 0;
  for (; i + lanes <= n; i += lanes) detail::block<T>(s, in, out, i);
  if constexpr (lanes > 1) {
    for (; i < n; ++i) detail::block<double>(s, in, out, i);
  }
  return status::done;
}

}  // namespace faces
}  // namespace v0
}  // namespace convelope

#endif
