// Any correlation of the catalogue, from the command line or in batches.

#include <iostream>
#include <string>

#include "line.hpp"

namespace {

constexpr const char* usage =
    "evaluate --list [PART]          the catalogue, a line each (ids that contain PART)\n"
    "evaluate ID key=value ...       one value with its verdict, scatter and source\n"
    "evaluate --batch                lines `ID quantity=Q;key=value;...` in, JSON lines out\n"
    "evaluate --json | --markdown    the catalogue as a document\n";

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

int one(int argc, char** argv) {
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
  std::cout << c.quantity << " = " << o.answer.value << '\n';
  const std::string crossed = convelope::explain(o.answer.verdict, c);
  std::cout << (crossed.empty() ? "Inside every stated range." : crossed) << '\n'
            << "Scatter: " << convelope::catalogue::detail::scatter_text(c.scatter) << '\n'
            << "Properties: " << convelope::words(c.state_at) << '\n'
            << "Source: " << c.source->authors << ' ' << c.source->year << ", " << c.source->where
            << " (constants " << convelope::words(c.source->constants) << ")\n";
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
