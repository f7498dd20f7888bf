#ifndef CONVELOPE_FACES_EVALUATE_HPP
#define CONVELOPE_FACES_EVALUATE_HPP

#include "convelope/boundary/surface.hpp"
#include "convelope/faces/column.hpp"

// Many faces of one wall, or of many walls of one make: arrays in, arrays out. No allocation, no
// lock; safe to call from many threads on parts of the arrays.

namespace convelope {
inline namespace v0 {
namespace faces {

/// One number per face. An empty column means: the same for all, from the surface's own exposure.
template <class Number>
struct inputs_of {
  column<const Number> wall_temperature_K;
  column<const Number> velocity_m_s{};
  column<const Number> stream_temperature_K{};
  column<const Number> pressure_Pa{};

  /// `count` faces from face `from` on.
  constexpr inputs_of part(std::size_t from, std::size_t count) const {
    return {wall_temperature_K.part(from, count), velocity_m_s.part(from, count),
            stream_temperature_K.part(from, count), pressure_Pa.part(from, count)};
  }
};

/// One number per face. An empty column is not written.
template <class Number>
struct outputs_of {
  column<Number> flux_W_m2{};
  column<Number> slope_W_m2K{};
  column<Number> coefficient_W_m2K{};
  column<std::uint64_t> verdict{};

  constexpr outputs_of part(std::size_t from, std::size_t count) const {
    return {flux_W_m2.part(from, count), slope_W_m2K.part(from, count),
            coefficient_W_m2K.part(from, count), verdict.part(from, count)};
  }
};

using inputs = inputs_of<double>;
using outputs = outputs_of<double>;

enum class status : unsigned char {
  done,            // also for no faces at all: nothing was written
  lengths_differ,  // nothing was written
  overlapping,     // an output shares memory with another array; nothing was written
  no_velocity,     // a velocity per face for a surface in a fluid at rest; nothing was written
  patches_differ   // patch boundaries that don't cover the faces in order; nothing was written
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
      return "this surface takes no velocity; nothing was written";
    case status::patches_differ:
      break;
  }
  return "patches: expected one more boundary than surfaces, from 0, ascending, to the number of "
         "faces; nothing was written";
}

/// Neighbouring faces [from, from + count).
struct range {
  std::size_t from;
  std::size_t count;
};

/// The share of part `part` of `parts` in n faces, for a host's threads: all but the last a
/// multiple of 64 faces, so that two threads seldom write to one cache line.
constexpr range share_of(std::size_t n, std::size_t parts, std::size_t part) {
  constexpr std::size_t grain = 64;
  const std::size_t grains = (n + grain - 1) / grain;
  const auto boundary = [&](std::size_t i) {
    const std::size_t at = (grains / parts * i + grains % parts * i / parts) * grain;
    return at < n ? at : n;
  };
  const std::size_t from = boundary(part);
  return {from, boundary(part + 1) - from};
}

namespace detail {
/// The number type of the arrays that pack or scalar T works on.
template <class T>
struct array_number {
  using type = double;
};
template <>
struct array_number<float> {
  using type = float;
};
template <class T>
using array_number_t = typename array_number<T>::type;

/// Where a column's numbers lie, to find shared memory.
struct stretch {
  std::uintptr_t begin = 0;
  std::uintptr_t end = 0;
  std::size_t step = 0;
  std::size_t width = 0;

  template <class Number>
  explicit stretch(const column<Number>& c) {
    if (c.empty()) return;
    width = sizeof(Number);
    step = c.step() * width;
    begin = reinterpret_cast<std::uintptr_t>(c.at(0));
    end = begin + (c.size() - 1) * step + width;
  }
};

inline bool overlap(const stretch& a, const stretch& b) {
  if (a.begin == a.end || b.begin == b.end || a.end <= b.begin || b.end <= a.begin) return false;
  if (a.step != b.step) return true;  // without a closer look
  // Members of the same cells lie between each other without touching.
  const std::size_t shift = a.begin < b.begin ? (b.begin - a.begin) % a.step
                                              : (a.step - (a.begin - b.begin) % a.step) % a.step;
  return shift < a.width || shift + b.width > a.step;
}

template <class Number>
status checked(std::size_t n, const inputs_of<Number>& in, const outputs_of<Number>& out) {
  const auto fits = [n](const auto& a) { return a.empty() || a.size() == n; };
  if (!fits(in.wall_temperature_K) || !fits(in.velocity_m_s) || !fits(in.stream_temperature_K) ||
      !fits(in.pressure_Pa) || !fits(out.flux_W_m2) || !fits(out.slope_W_m2K) ||
      !fits(out.coefficient_W_m2K) || !fits(out.verdict)) {
    return status::lengths_differ;
  }
  const stretch read[] = {stretch(in.wall_temperature_K), stretch(in.velocity_m_s),
                          stretch(in.stream_temperature_K), stretch(in.pressure_Pa)};
  const stretch written[] = {stretch(out.flux_W_m2), stretch(out.slope_W_m2K),
                             stretch(out.coefficient_W_m2K), stretch(out.verdict)};
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
  template <class Number>
  static T load(const column<const Number>& c, std::size_t i) {
    return T(*c.at(i));
  }
  template <class Number>
  static void store(const T& x, const column<Number>& c, std::size_t i) {
    *c.at(i) = static_cast<Number>(x);
  }
  static void store_bits(const bits_t<T>& b, const column<std::uint64_t>& c, std::size_t i) {
    *c.at(i) = b;
  }
};

template <class T, class Number, class Answer>
void write(const Answer& a, const outputs_of<Number>& out, std::size_t i) {
  using access = face_access<T>;
  if (!out.flux_W_m2.empty()) access::store(a.flux().si(), out.flux_W_m2, i);
  if (!out.slope_W_m2K.empty()) access::store(a.slope().si(), out.slope_W_m2K, i);
  if (!out.coefficient_W_m2K.empty()) {
    access::store(a.coefficient().si(), out.coefficient_W_m2K, i);
  }
  if (!out.verdict.empty()) access::store_bits(a.verdict().bits(), out.verdict, i);
}

template <class T, class Surface, class Number>
void block(const Surface& s, const inputs_of<Number>& in, const outputs_of<Number>& out,
           std::size_t i) {
  using access = face_access<T>;
  auto exposure = s.exposure().template as<T>();
  const auto replace = [i](auto& member, const column<const Number>& values) {
    using member_type = std::remove_reference_t<decltype(member)>;
    if (!values.empty()) member = member_type::from_si(access::load(values, i));
  };
  if constexpr (requires { exposure.velocity; }) replace(exposure.velocity, in.velocity_m_s);
  replace(exposure.temperature, in.stream_temperature_K);
  replace(exposure.pressure, in.pressure_Pa);
  const auto wall =
      typed<kinds::wall_temperature, T>::from_si(access::load(in.wall_temperature_K, i));
  write<T>(s.at(wall, exposure), out, i);
}

// `flatten`: a pack lives in registers only as long as nothing is called.
#if defined(__GNUC__)
#define CONVELOPE_FLATTEN [[gnu::flatten]]
#else
#define CONVELOPE_FLATTEN
#endif

// A copy of what is the same for all faces: writing to the arrays can't change it, so that it stays
// in registers too.
template <class T, class Surface, class Number>
CONVELOPE_FLATTEN void each(const Surface& given, const inputs_of<Number>& in_given,
                            const outputs_of<Number>& out_given) {
  const inputs_of<Number> in = in_given;
  const outputs_of<Number> out = out_given;
  const auto go = [&](const auto& s) {
    const std::size_t n = in.wall_temperature_K.size();
    constexpr auto lanes = static_cast<std::size_t>(scalar_adaptor<T>::lanes);
    std::size_t i = 0;
    for (; i + lanes <= n; i += lanes) block<T>(s, in, out, i);
    if constexpr (lanes > 1) {
      using one = std::conditional_t<std::is_same_v<array_number_t<T>, Number>, Number, double>;
      for (; i < n; ++i) block<one>(s, in, out, i);
    }
  };
  if constexpr (std::is_trivially_copyable_v<Surface>) {
    const Surface own = given;
    go(own);
  } else {
    go(given);
  }
}
#undef CONVELOPE_FLATTEN

template <class E>
constexpr bool takes_velocity = requires(const E& e) { e.velocity; };
}  // namespace detail

/// Asks a surface for every face. T = double goes face by face; a pack (faces::widest of
/// convelope/faces/widest.hpp) as many at a time as it has lanes, remainder faces one by one: the
/// same numbers to 1e-13 relative.
///
/// Single precision: `evaluate<faces::widest, float>` reads and writes arrays of float and computes
/// in double, so that q, h and slope are right to the rounding of float (6e-8); `evaluate<float>`
/// computes in float too, within 5e-6 in air and 5e-5 in water, relative to h for h and slope and
/// to h |T_wall - T_stream| for q.
template <class T = double, class Number = detail::array_number_t<T>, wall_geometry G, fluid Fluid,
          class E>
status evaluate(const wall_surface<G, Fluid, E>& s,
                const std::type_identity_t<inputs_of<Number>>& in,
                const std::type_identity_t<outputs_of<Number>>& out) {
  const status found = detail::checked(in.wall_temperature_K.size(), in, out);
  if (found != status::done) return found;
  if (!detail::takes_velocity<E> && !in.velocity_m_s.empty()) return status::no_velocity;
  detail::each<T>(s, in, out);
  return status::done;
}

/// The same for many surfaces of one type: surface j has the faces from boundary[j] up to
/// boundary[j + 1].
template <class T = double, class Number = detail::array_number_t<T>, wall_geometry G, fluid Fluid,
          class E>
status evaluate_patches(std::span<const wall_surface<G, Fluid, E>> surfaces,
                        std::span<const std::size_t> boundary,
                        const std::type_identity_t<inputs_of<Number>>& in,
                        const std::type_identity_t<outputs_of<Number>>& out) {
  const status found = detail::checked(in.wall_temperature_K.size(), in, out);
  if (found != status::done) return found;
  if (!detail::takes_velocity<E> && !in.velocity_m_s.empty()) return status::no_velocity;
  if (boundary.size() != surfaces.size() + 1 || boundary.front() != 0 ||
      boundary.back() != in.wall_temperature_K.size()) {
    return status::patches_differ;
  }
  for (std::size_t j = 0; j < surfaces.size(); ++j) {
    if (boundary[j + 1] < boundary[j]) return status::patches_differ;
  }
  for (std::size_t j = 0; j < surfaces.size(); ++j) {
    const std::size_t count = boundary[j + 1] - boundary[j];
    if (count > 0) {
      detail::each<T>(surfaces[j], in.part(boundary[j], count), out.part(boundary[j], count));
    }
  }
  return status::done;
}

namespace detail {
template <class K, class E>
constexpr int place_of() {
  if constexpr (std::is_same_v<K, kinds::wall_temperature>) {
    return 0;
  } else if constexpr (std::is_same_v<K, typename decltype(E::temperature)::kind_type>) {
    return 2;
  } else if constexpr (std::is_same_v<K, kinds::pressure>) {
    return 3;
  } else if constexpr (takes_velocity<E>) {
    return std::is_same_v<K, typename decltype(E::velocity)::kind_type> ? 1 : -1;
  } else {
    return -1;
  }
}
}  // namespace detail

/// Arrays of typed numbers in: `evaluate_typed(tube, out, walls, speeds)`, in any order; the kinds
/// say which is which. One that the surface's exposure does not have is a compile error.
template <class T = double, wall_geometry G, fluid Fluid, class E, class... Arrays>
status evaluate_typed(const wall_surface<G, Fluid, E>& s,
                      const std::type_identity_t<outputs_of<detail::array_number_t<T>>>& out,
                      const Arrays&... arrays) {
  using number = detail::array_number_t<T>;
  inputs_of<number> in{};
  const auto place = [&](const auto& array) {
    using element = std::remove_cvref_t<decltype(*std::data(array))>;
    using K = typename element::kind_type;
    constexpr int where = detail::place_of<K, E>();
    static_assert(where >= 0,
                  "no number of this kind per face: neither T_wall nor a member of this "
                  "surface's exposure");
    static_assert(std::is_same_v<typename element::value_type, number>);
    const column<const number> c(detail::numbers_at<const number>(std::data(array)),
                                 std::size(array), 1);
    (where == 0   ? in.wall_temperature_K
     : where == 1 ? in.velocity_m_s
     : where == 2 ? in.stream_temperature_K
                  : in.pressure_Pa) = c;
  };
  (place(arrays), ...);
  return evaluate<T>(s, in, out);
}

/// What a host's function gives for one face: the wall's temperature and what it is exposed to.
template <class E>
struct face {
  typed<kinds::wall_temperature> wall;
  E exposure;
};
template <class E>
face(typed<kinds::wall_temperature>, E) -> face<E>;

/// No arrays in: `face_at(i)` gives face i (a `face{wall, exposure}`), from wherever the host has
/// it.
template <class T = double, wall_geometry G, fluid Fluid, class E, class FaceAt>
status evaluate_each(const wall_surface<G, Fluid, E>& s, std::size_t count, const FaceAt& face_at,
                     const outputs& out) {
  static_assert(std::is_same_v<detail::array_number_t<T>, double>);
  constexpr std::size_t most = 64;  // faces gathered at a time
  double wall[most];
  double velocity[most];
  double temperature[most];
  double pressure[most];
  const status found = detail::checked(count, inputs{}, out);
  if (found != status::done) return found;
  for (std::size_t from = 0; from < count; from += most) {
    const std::size_t n = count - from < most ? count - from : most;
    for (std::size_t i = 0; i < n; ++i) {
      const face<E> f = face_at(from + i);
      wall[i] = f.wall.si();
      if constexpr (detail::takes_velocity<E>) velocity[i] = f.exposure.velocity.si();
      temperature[i] = f.exposure.temperature.si();
      pressure[i] = f.exposure.pressure.si();
    }
    inputs in{std::span(wall, n), {}, std::span(temperature, n), std::span(pressure, n)};
    if constexpr (detail::takes_velocity<E>) in.velocity_m_s = std::span(velocity, n);
    detail::each<T>(s, in, out.part(from, n));
  }
  return status::done;
}

}  // namespace faces
}  // namespace v0
}  // namespace convelope

#endif
