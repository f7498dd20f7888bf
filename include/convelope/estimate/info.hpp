#ifndef CONVELOPE_ESTIMATE_INFO_HPP
#define CONVELOPE_ESTIMATE_INFO_HPP

namespace convelope {
inline namespace v0 {

namespace detail {
constexpr bool same_text(const char* a, const char* b) {
  while (*a != 0 && *a == *b) {
    ++a;
    ++b;
  }
  return *a == *b;
}
}  // namespace detail

/// How the constants of a formula are known here.
enum class known : unsigned char {
  seen_in_source,  // the primary source, or an official release, was read
  quoted,          // a public text that quotes the source was read
  computed,        // our own first-principles computation supports the constants
  recalled         // from memory only
};

/// Where a formula comes from.
struct reference {
  const char* authors;
  int year;
  const char* where;
  known constants;
  const char* note = "";  // disagreements between prints, and which reading was taken
};

/// No limit on that side. A finite number, because infinity vanishes under -ffast-math.
inline constexpr double unbounded = 1.7976931348623157e308;

/// The source gives no scatter.
inline constexpr double not_stated = -1.0;

/// Which state a formula's fluid properties belong to.
enum class state_rule : unsigned char {
  film,                   // mean of wall and stream
  bulk,                   // mixing-cup mean of the duct flow
  free_stream,            // undisturbed
  free_stream_with_wall,  // undisturbed, the wall entering through a ratio of properties
  wall,                   // at the wall itself
  eckert,                 // 0.28 stream + 0.50 wall + 0.22 adiabatic wall
  mean_of_walls,          // between two walls
  none                    // no properties enter
};

constexpr const char* words(state_rule r) {
  switch (r) {
    case state_rule::film:
      return "film temperature";
    case state_rule::bulk:
      return "bulk temperature";
    case state_rule::free_stream:
      return "free-stream temperature";
    case state_rule::free_stream_with_wall:
      return "free-stream temperature, a property ratio for the wall";
    case state_rule::wall:
      return "wall temperature";
    case state_rule::eckert:
      return "Eckert's reference temperature";
    case state_rule::mean_of_walls:
      return "mean of the two walls";
    case state_rule::none:
      break;
  }
  return "no properties";
}

constexpr const char* words(known k) {
  switch (k) {
    case known::seen_in_source:
      return "seen in the source";
    case known::quoted:
      return "seen in a text that quotes the source";
    case known::computed:
      return "supported by own computation";
    case known::recalled:
      break;
  }
  return "from memory";
}

/// One limit of an envelope, as data.
struct limit_info {
  const char* symbol;
  double low;
  double high;
};

/// One input of a correlation, as data.
struct input_info {
  const char* key;     // in a batch line
  const char* symbol;  // in a formula
  const char* words;
  const char* on;              // the length scale it is based on, or ""
  const char* const* choices;  // the words a choice may take, ending in nullptr; else nullptr
  double otherwise;            // value if left out
  bool optional;
};

/// A correlation as data: what the catalogue lists and explain() reads.
struct correlation_info {
  const char* id;
  const char* quantity;
  const char* gives;
  const reference* source;
  const input_info* inputs;
  int input_count;
  const limit_info* limits;
  int limit_count;
  double scatter;
  state_rule state_at;
};

/// Relative uncertainty the source states for each property (the largest inside the envelope).
struct property_uncertainty {
  double density;
  double specific_heat;
  double conductivity;
  double viscosity;
  double expansion;
};

/// A fluid as data.
struct fluid_info {
  const char* name;
  const reference* source;
  const limit_info* limits;
  int limit_count;
  property_uncertainty uncertainty;
};

}  // namespace v0
}  // namespace convelope

#endif
