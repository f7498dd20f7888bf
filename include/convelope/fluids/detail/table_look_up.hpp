#ifndef CONVELOPE_FLUIDS_DETAIL_TABLE_LOOK_UP_HPP
#define CONVELOPE_FLUIDS_DETAIL_TABLE_LOOK_UP_HPP

#include <array>
#include <cstdint>

#include "convelope/fluids/fluid.hpp"

// Reading a table of piecewise cubics, on every number type.

namespace convelope {
inline namespace v0 {
namespace detail {

template <class T, bool Packed>
struct lane_of {
  using type = T;
};
template <class T>
struct lane_of<T, true> {
  using type = typename T::value_type;
};

/// The lanes of a number: of a pack, of a dual of packs; a scalar is its own lane.
template <class T>
struct lanes_of {
  static constexpr std::size_t count = static_cast<std::size_t>(scalar_adaptor<T>::lanes);
  static constexpr bool packed = count > 1;
  using lane = typename lane_of<T, packed>::type;
  using array = std::array<lane, count>;

  static array split(const T& x) {
    if constexpr (!packed) {
      return {x};
    } else if constexpr (std::is_trivially_copyable_v<T>) {
      return std::bit_cast<array>(x);
    } else {
      array a;
      for (std::size_t i = 0; i < count; ++i) a[i] = x[i];
      return a;
    }
  }
  static T joined(const array& a) {
    if constexpr (!packed) {
      return a[0];
    } else if constexpr (std::is_trivially_copyable_v<T>) {
      return std::bit_cast<T>(a);
    } else {
      return T([&](auto i) { return a[i]; });
    }
  }
};
template <class V, int Size>
struct lanes_of<dual<V, Size>> {
  using inner = lanes_of<V>;
  static constexpr std::size_t count = inner::count;
  static constexpr bool packed = inner::packed;
  using lane = dual<typename inner::lane, Size>;
  using array = std::array<lane, count>;

  static array split(const dual<V, Size>& x) {
    array a;
    const auto value = inner::split(x.value);
    for (std::size_t i = 0; i < count; ++i) a[i] = lane(value[i]);
    for (int k = 0; k < Size; ++k) {
      const auto slope = inner::split(x.slope[k]);
      for (std::size_t i = 0; i < count; ++i) a[i].slope[k] = slope[i];
    }
    return a;
  }
  static dual<V, Size> joined(const array& a) {
    typename inner::array part;
    for (std::size_t i = 0; i < count; ++i) part[i] = a[i].value;
    dual<V, Size> x(inner::joined(part));
    for (int k = 0; k < Size; ++k) {
      for (std::size_t i = 0; i < count; ++i) part[i] = a[i].slope[k];
      x.slope[k] = inner::joined(part);
    }
    return x;
  }
};

/// One direction of a table: cells of equal width, or a host's own nodes behind buckets of equal
/// width that hold one node at most, so that a look-up is one product and one comparison.
struct table_axis {
  double low = 0.0;
  double high = 0.0;
  double per_unit = 0.0;  // cells or buckets per K or Pa
  std::uint32_t cells = 1;
  std::uint32_t buckets = 1;
  const std::uint32_t* first = nullptr;  // the cell a bucket begins in; null: buckets are cells
  const double* nodes = nullptr;
  const double* scales = nullptr;  // 1 over the width of each cell
};

/// Where a number lies: cell, and the local coordinate x scale - shift in 0 .. 1.
struct table_place {
  std::uint64_t cell;
  double shift;
  double scale;
};

// Rounded down (up from 1e-6 below the next), 0 .. count - 1 whatever u is: a conversion of a NaN
// to an integer would be undefined. The sum lies amid the numbers that share an exponent, where
// -ffast-math may round it as it likes.
inline std::uint64_t whole_part(double u, std::uint64_t count) {
  const auto bits = std::bit_cast<std::uint64_t>(u + 12884901888.0);  // 1.5 2^33
  const auto i = static_cast<std::int64_t>((bits >> 19) & 0x1ffffffffULL) - 0x100000000LL;
  const auto last = static_cast<std::int64_t>(count) - 1;
  const std::int64_t above = i > 0 ? i : 0;
  return static_cast<std::uint64_t>(above < last ? above : last);
}

inline double inside(const table_axis& a, double x) {
  const double above = x >= a.low ? x : a.low;
  return above <= a.high ? above : a.high;
}

inline table_place equal_place(const table_axis& a, double x) {
  const double start = a.low * a.per_unit;
  const std::uint64_t i = whole_part(x * a.per_unit - start, a.buckets);
  return {i, start + static_cast<double>(i), a.per_unit};
}

inline table_place place_in(const table_axis& a, double x) {
  const table_place bucket = equal_place(a, x);
  if (a.first == nullptr) return bucket;
  std::uint64_t cell = a.first[bucket.cell];
  if (cell + 1 < a.cells && x >= a.nodes[cell + 1]) ++cell;
  return {cell, a.nodes[cell] * a.scales[cell], a.scales[cell]};
}

inline constexpr int table_properties = 5;

/// What a look-up reads. The cubics of four properties lie side by side, ready for a register of
/// four doubles, those of the fifth with their own powers side by side:
/// t^a s^b of property j < 4 at (4 b + a) 4 + j, of property 4 at 64 + 4 b + a; without a pressure
/// axis t^a at 4 a + j and 16 + a. t, s: local coordinates of T and p.
struct table_lines {
  const double* coefficients = nullptr;
  table_axis T;
  table_axis p;
  bool with_pressure = false;

  static constexpr std::uint64_t doubles_of_T_cell = 24;  // three cache lines, the last half used
  static constexpr std::uint64_t doubles_of_Tp_cell = 80;

  const double* cell(std::uint64_t i) const { return coefficients + i * doubles_of_T_cell; }
  const double* cell(std::uint64_t i, std::uint64_t k) const {
    return coefficients + (i * p.cells + k) * doubles_of_Tp_cell;
  }
};

constexpr int place_of_coefficient(int a, int j) { return j < 4 ? 4 * a + j : 16 + a; }
constexpr int place_of_coefficient(int a, int b, int j) {
  return j < 4 ? (4 * b + a) * 4 + j : 64 + 4 * b + a;
}

template <class V>
struct table_values {
  V of[table_properties];
};
template <class V>
struct table_jet {
  table_values<V> value;
  table_values<V> by_T;
  table_values<V> by_p;
};

template <class V>
V cubic(const V& c0, const V& c1, const V& c2, const V& c3, const V& x) {
  return V(c0 + x * (c1 + x * (c2 + x * c3)));
}
// Coefficients `step` apart.
template <class V>
V cubic(const double* c, std::ptrdiff_t step, const V& x) {
  return V(c[0] + x * (c[step] + x * (c[2 * step] + x * c[3 * step])));
}
template <class V>
V cubic_slope(const double* c, std::ptrdiff_t step, const V& x) {
  return V(c[step] + x * (2.0 * c[2 * step] + x * (3.0 * c[3 * step])));
}

template <class V>
void evaluate_cell(const double* c, const V& t, table_values<V>& y) {
  for (int j = 0; j < 4; ++j) y.of[j] = cubic(c + j, 4, t);
  y.of[4] = cubic(c + 16, 1, t);
}

template <class V>
void evaluate_cell(const double* c, const V& t, const V& s, table_values<V>& y) {
  V x[4][4];
  for (std::ptrdiff_t a = 0; a < 4; ++a) {
    for (std::ptrdiff_t j = 0; j < 4; ++j) x[a][j] = cubic(c + 4 * a + j, 16, s);
  }
  V fifth[4];
  for (int a = 0; a < 4; ++a) fifth[a] = cubic(c + 64 + a, 4, s);
  for (int j = 0; j < 4; ++j) y.of[j] = cubic(x[0][j], x[1][j], x[2][j], x[3][j], t);
  y.of[4] = cubic(fifth[0], fifth[1], fifth[2], fifth[3], t);
}

#if defined(__GNUC__) && defined(__AVX__)
// Left to itself neither GCC 12 nor clang 14 puts four properties into one register. A type twice
// as wide as the machine's registers GCC 12 takes apart at three times the cost.
using four_doubles [[gnu::vector_size(32), gnu::aligned(8), gnu::may_alias]] = double;

[[gnu::always_inline]] inline void evaluate_cell(const double* c, const double& t,
                                                 table_values<double>& y) {
  const auto* q = reinterpret_cast<const four_doubles*>(c);
  const four_doubles x = q[0] + t * (q[1] + t * (q[2] + t * q[3]));
  for (int j = 0; j < 4; ++j) y.of[j] = x[j];
  y.of[4] = c[16] + t * (c[17] + t * (c[18] + t * c[19]));
}
[[gnu::always_inline]] inline void evaluate_cell(const double* c, const double& t, const double& s,
                                                 table_values<double>& y) {
  const double t2 = t * t;
  const auto* q = reinterpret_cast<const four_doubles*>(c);
#if defined(__AVX512F__)
  using eight_doubles [[gnu::vector_size(64), gnu::aligned(8), gnu::may_alias]] = double;
  const auto* r = reinterpret_cast<const eight_doubles*>(c);
  const eight_doubles low = r[0] + s * (r[2] + s * (r[4] + s * r[6]));   // t^0 and t^1
  const eight_doubles high = r[1] + s * (r[3] + s * (r[5] + s * r[7]));  // t^2 and t^3
  const eight_doubles both = low + t2 * high;
  const four_doubles x = __builtin_shufflevector(both, both, 0, 1, 2, 3) +
                         t * __builtin_shufflevector(both, both, 4, 5, 6, 7);
#else
  const four_doubles x0 = q[0] + s * (q[4] + s * (q[8] + s * q[12]));
  const four_doubles x1 = q[1] + s * (q[5] + s * (q[9] + s * q[13]));
  const four_doubles x2 = q[2] + s * (q[6] + s * (q[10] + s * q[14]));
  const four_doubles x3 = q[3] + s * (q[7] + s * (q[11] + s * q[15]));
  const four_doubles x = (x0 + t * x1) + t2 * (x2 + t * x3);
#endif
  const four_doubles fifth = q[16] + s * (q[17] + s * (q[18] + s * q[19]));
  for (int j = 0; j < 4; ++j) y.of[j] = x[j];
  y.of[4] = (fifth[0] + t * fifth[1]) + t2 * (fifth[2] + t * fifth[3]);
}
#endif

// Slopes by t and s.
template <class V>
void evaluate_cell(const double* c, const V& t, table_jet<V>& y) {
  for (int j = 0; j < table_properties; ++j) {
    const double* first = c + place_of_coefficient(0, j);
    const int step = j < 4 ? 4 : 1;
    y.value.of[j] = cubic(first, step, t);
    y.by_T.of[j] = cubic_slope(first, step, t);
    y.by_p.of[j] = V(0.0);
  }
}

template <class V>
void evaluate_cell(const double* c, const V& t, const V& s, table_jet<V>& y) {
  for (int j = 0; j < table_properties; ++j) {
    V x[4];
    V by_s[4];
    for (int a = 0; a < 4; ++a) {
      const double* first = c + place_of_coefficient(a, 0, j);
      const int step = j < 4 ? 16 : 4;
      x[a] = cubic(first, step, s);
      by_s[a] = cubic_slope(first, step, s);
    }
    y.value.of[j] = cubic(x[0], x[1], x[2], x[3], t);
    y.by_T.of[j] = V(x[1] + t * (2.0 * x[2] + t * (3.0 * x[3])));
    y.by_p.of[j] = cubic(by_s[0], by_s[1], by_s[2], by_s[3], t);
  }
}

/// The number, held inside the axis; NaN stays NaN only if V is not double.
template <class V>
V held(const table_axis& a, const V& x) {
  if constexpr (std::is_same_v<V, double>) {
    return inside(a, x);
  } else {
    const V low(a.low);
    const V high(a.high);
    const V above = math::select(x >= low, x, low);
    return math::select(above <= high, above, high);
  }
}

/// Answer is table_values or table_jet; V is double, or a type with derivatives or more digits.
template <class Answer, class V>
Answer look_up(const table_lines& table, const V& temperature_K, const V& pressure_Pa) {
  const auto slope_scale = [](const table_axis& a, const V& x, const table_place& place) {
    const double at = static_cast<double>(plain(x));
    return at >= a.low && at <= a.high ? place.scale : 0.0;
  };
  constexpr bool slopes = std::is_same_v<Answer, table_jet<V>>;
  Answer y;
  const V T = held(table.T, temperature_K);
  const table_place i = place_in(table.T, static_cast<double>(plain(T)));
  const V t = V(T * i.scale - i.shift);
  if (table.with_pressure) {
    const V p = held(table.p, pressure_Pa);
    const table_place k = equal_place(table.p, static_cast<double>(plain(p)));
    evaluate_cell(table.cell(i.cell, k.cell), t, V(p * k.scale - k.shift), y);
    if constexpr (slopes) {
      const double per_p = slope_scale(table.p, pressure_Pa, k);
      for (V& slope : y.by_p.of) slope = V(slope * per_p);
    }
  } else {
    evaluate_cell(table.cell(i.cell), t, y);
  }
  if constexpr (slopes) {
    const double per_T = slope_scale(table.T, temperature_K, i);
    for (V& slope : y.by_T.of) slope = V(slope * per_T);
  }
  return y;
}

template <class V, class From, class Change>
table_values<V> changed(const From& y, Change change) {
  table_values<V> r;
  for (int j = 0; j < table_properties; ++j) r.of[j] = change(y, j);
  return r;
}

/// Eight doubles at a time and the like: places side by side, then cell by cell, because the
/// numbers of one cell lie together.
template <class V>
table_values<V> look_up_pack(const table_lines& table, const V& temperature_K,
                             const V& pressure_Pa) {
  using lanes = lanes_of<V>;
  constexpr std::size_t n = lanes::count;
  table_values<double> y[n];
  alignas(64) double t[n];
  alignas(64) double s[n];
  alignas(64) std::uint64_t cell[n];
  const auto T_of = lanes::split(temperature_K);
  const auto p_of = lanes::split(pressure_Pa);
  const table_axis T = table.T;
  const table_axis p = table.p;
  if (T.first == nullptr) {
    for (std::size_t i = 0; i < n; ++i) {
      const double x = inside(T, T_of[i]);
      const table_place at = equal_place(T, x);
      cell[i] = at.cell;
      t[i] = x * at.scale - at.shift;
    }
  } else {
    for (std::size_t i = 0; i < n; ++i) {
      const double x = inside(T, T_of[i]);
      const table_place at = place_in(T, x);
      cell[i] = at.cell;
      t[i] = x * at.scale - at.shift;
    }
  }
  if (table.with_pressure) {
    for (std::size_t i = 0; i < n; ++i) {
      const double x = inside(p, p_of[i]);
      const table_place at = equal_place(p, x);
      cell[i] = cell[i] * p.cells + at.cell;
      s[i] = x * at.scale - at.shift;
    }
    for (std::size_t i = 0; i < n; ++i) {
      evaluate_cell(table.coefficients + cell[i] * table_lines::doubles_of_Tp_cell, t[i], s[i],
                    y[i]);
    }
  } else {
    for (std::size_t i = 0; i < n; ++i) {
      evaluate_cell(table.cell(cell[i]), t[i], y[i]);
    }
  }
  return changed<V>(y, [](const auto& from, int j) {
    typename lanes::array column;
    for (std::size_t i = 0; i < n; ++i) column[i] = from[i].of[j];
    return lanes::joined(column);
  });
}

/// Values of any number type.
template <class V>
table_values<V> table_at(const table_lines& table, const V& T, const V& p) {
  using lanes = lanes_of<V>;
  if constexpr (std::is_same_v<V, float>) {
    return changed<V>(look_up<table_values<double>, double>(table, T, p),
                      [](const auto& y, int j) { return static_cast<float>(y.of[j]); });
  } else if constexpr (!lanes::packed) {
    return look_up<table_values<V>>(table, T, p);
  } else if constexpr (std::is_same_v<typename lanes::lane, double>) {
    return look_up_pack(table, T, p);
  } else {
    const auto T_of = lanes::split(T);
    const auto p_of = lanes::split(p);
    typename lanes::array y[table_properties];
    for (std::size_t i = 0; i < lanes::count; ++i) {
      const auto one = table_at(table, T_of[i], p_of[i]);
      for (int j = 0; j < table_properties; ++j) y[j][i] = one.of[j];
    }
    return changed<V>(y, [](const auto& from, int j) { return lanes::joined(from[j]); });
  }
}

/// Values with their slopes by T and p.
template <class V>
table_jet<V> table_jet_at(const table_lines& table, const V& T, const V& p) {
  using lanes = lanes_of<V>;
  if constexpr (std::is_same_v<V, float>) {
    const auto y = look_up<table_jet<double>, double>(table, T, p);
    const auto single = [](const auto& from, int j) { return static_cast<float>(from.of[j]); };
    return {changed<V>(y.value, single), changed<V>(y.by_T, single), changed<V>(y.by_p, single)};
  } else if constexpr (!lanes::packed) {
    return look_up<table_jet<V>>(table, T, p);
  } else {
    const auto T_of = lanes::split(T);
    const auto p_of = lanes::split(p);
    typename lanes::array y[3][table_properties];
    for (std::size_t i = 0; i < lanes::count; ++i) {
      const auto one = table_jet_at(table, T_of[i], p_of[i]);
      for (int j = 0; j < table_properties; ++j) {
        y[0][j][i] = one.value.of[j];
        y[1][j][i] = one.by_T.of[j];
        y[2][j][i] = one.by_p.of[j];
      }
    }
    const auto join = [](const auto& from, int j) { return lanes::joined(from[j]); };
    return {changed<V>(y[0], join), changed<V>(y[1], join), changed<V>(y[2], join)};
  }
}

/// A fluid's values on T, by the chain rule where T carries derivatives.
template <class T>
fluid_values<T> table_fluid_values(const table_lines& table, const T& temperature_K,
                                   const T& pressure_Pa) {
  table_values<T> y;
  if constexpr (!is_dual<T>) {
    y = table_at(table, temperature_K, pressure_Pa);
  } else if constexpr (T::size == 0) {
    const auto v = table_at(table, temperature_K.value, pressure_Pa.value);
    for (int j = 0; j < table_properties; ++j) y.of[j] = T(v.of[j]);
  } else {
    using V = typename T::value_type;
    const auto v = table_jet_at(table, temperature_K.value, pressure_Pa.value);
    for (int j = 0; j < table_properties; ++j) {
      y.of[j] = T(v.value.of[j]);
      for (int k = 0; k < T::size; ++k) {
        y.of[j].slope[k] =
            V(v.by_T.of[j] * temperature_K.slope[k] + v.by_p.of[j] * pressure_Pa.slope[k]);
      }
    }
  }
  return {y.of[0], y.of[1], y.of[2], y.of[3], y.of[4]};
}

}  // namespace detail
}  // namespace v0
}  // namespace convelope

#endif
