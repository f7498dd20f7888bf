// Any correlation of the catalogue and any property of its fluids, from the command line or in
// batches.

#include <iostream>
#include <string>

#include "line.hpp"

namespace {

constexpr const char* usage =
    "evaluate --list [PART]          the catalogue, a line each (ids that contain PART)\n"
    "evaluate ID key=value ...       one value with its verdict, scatter and source\n"
    "evaluate --batch                lines `ID quantity=Q;key=value;...` in, JSON lines out\n"
    "evaluate --json | --markdown    the catalogue as a document\n"
    "Ids of fluids begin with fluid/: evaluate fluid/water quantity=mu T=300 p=3e6\n";

void list(const std::string& part) {
  namespace cat = convelope::catalogue;
  cat::filter(evaluate::catalogue(), part, [](const cat::entry& e) {
    const convelope::correlation_info& c = *e.info;
    std::cout << c.id << "  quantity=" << c.quantity;
    for (int i = 0; i < c.input_count; ++i) {
      std::cout << (i == 0 ? "  " : ";") << c.inputs[i].key;
      if (c.inputs[i].optional) std::cout << '?';
    }
    std::cout << "  [" << convelope::words(c.source->constants) << "]\n";
  });
}

int batch() {
  std::string line;
  while (std::getline(std::cin, line)) {
    if (line.find_first_not_of(" \t\r") == std::string::npos) continue;
    evaluate::request r;
    evaluate::outcome o;
    o.error = evaluate::parse_line(line, r);
    if (o.error.empty()) o = evaluate::answer(r);
    std::cout << evaluate::to_json_line(r, o) << '\n';
  }
  return 0;
}

int complain(const std::string& error) {
  std::cerr << "evaluate: " << error << '\n';
  return 2;
}

std::string verdict_words(const evaluate::outcome& o) {
  std::string crossed = convelope::explain(o.answer.verdict, *o.entry->info);
  if (!crossed.empty()) return crossed;
  return o.answer.verdict.inside() ? "Inside every stated range." : "An input is not possible.";
}

int one(int argc, char** argv) {
  namespace cat = convelope::catalogue;
  evaluate::request r;
  r.id = argv[1];
  for (int i = 2; i < argc; ++i) {
    const std::string error = evaluate::add_pair(argv[i], r);
    if (!error.empty()) return complain(error);
  }
  const evaluate::outcome o = evaluate::answer(r);
  if (!o.error.empty()) return complain(o.error);
  const convelope::correlation_info& c = *o.entry->info;
  std::cout.precision(12);
  const bool property = cat::detail::is_property(c);
  std::cout << c.quantity << " = " << o.answer.value;
  if (property) {
    const std::string_view unit = cat::detail::unit_of(c);
    const std::string_view words = c.gives;
    std::cout << (unit.empty() ? "" : " ") << unit << "  ("
              << words.substr(0, words.size() - (unit.empty() ? 0 : unit.size() + 2)) << ')';
  }
  std::cout << '\n' << verdict_words(o) << '\n';
  std::cout << (property ? "Uncertainty: " : "Scatter: ") << cat::detail::scatter_text(c.scatter)
            << '\n';
  if (!property) std::cout << "Properties: " << convelope::words(c.state_at) << '\n';
  std::cout << "Source: " << cat::detail::source_text(*c.source) << " (constants "
            << convelope::words(c.source->constants) << ")\n";
  if (*c.source->note != 0) std::cout << "Note: " << c.source->note << '\n';
  return 0;
}

}  // namespace

int main(int argc, char** argv) {
  namespace cat = convelope::catalogue;
  std::ios::sync_with_stdio(false);
  const std::string first = argc > 1 ? argv[1] : "--help";
  if (first == "--list" && argc <= 3) {
    list(argc == 3 ? argv[2] : "");
    return 0;
  }
  if (first == "--batch" && argc == 2) return batch();
  if (first == "--json" && argc == 2) {
    std::cout << cat::to_json(evaluate::catalogue());
    return 0;
  }
  if (first == "--markdown" && argc == 2) {
    std::cout
        << "# Catalogue\n\nWritten by `evaluate --markdown`; a test keeps it current. Keys in "
           "`code` are what a batch line takes.\n\n"
        << cat::to_markdown(evaluate::catalogue());
    return 0;
  }
  if (first == "--help") {
    std::cout << usage;
    return 0;
  }
  if (first.starts_with("--")) return complain("'" + first + "' is not an option\n" + usage);
  return one(argc, argv);
}
