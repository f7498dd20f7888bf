#include "options.hpp"

#include <algorithm>

#include "case/case_error.hpp"

namespace chassis {

options read_options(const std::vector<std::string>& arguments) {
  options result;
  for (std::size_t i = 0; i < arguments.size(); ++i) {
    const auto& word = arguments[i];
    const auto next = [&](const char* expected) {
      if (i + 1 == arguments.size() || arguments[i + 1].empty()) {
        throw case_error(word, std::string("nothing follows; expected ") + expected);
      }
      return arguments[++i];
    };
    if (word == "--help" || word == "-h") {
      result.help = true;
    } else if (word == "--out") {
      result.folder = next("a folder");
    } else if (word == "--frozen-films") {
      result.frozen_films = true;
    } else if (word == "--refine") {
      const auto text = next("a whole number from 1 to 8");
      if (text.size() != 1 || text[0] < '1' || text[0] > '8') {
        throw case_error(word, "\"" + text +
                                   "\" is not accepted; expected a whole number from 1 "
                                   "to 8");
      }
      result.refine = static_cast<std::size_t>(text[0] - '0');
    } else if (!word.empty() && word[0] == '-') {
      throw case_error(word, "unknown option; expected --out, --frozen-films, --refine or --help");
    } else if (word.empty() || !result.case_file.empty()) {
      throw case_error("\"" + word + "\"", "a second case file; expected one case file");
    } else {
      result.case_file = word;
    }
  }
  return result;
}

const char* usage() {
  return "chassis [CASE.json] [--out FOLDER] [--frozen-films] [--refine N]\n"
         "  CASE.json       the case to solve; the bundled default case if left out\n"
         "  --out FOLDER    where report.json, SVG maps and VTK files go (chassis-report)\n"
         "  --frozen-films  leave the derivatives of the film coefficients out of the Jacobian\n"
         "  --refine N      N times as many cells in both directions, N from 1 to 8\n"
         "Exit code 0: solved. 2: the input is wrong or the balances did not close; the one line\n"
         "on standard error says where and what was expected.\n";
}

}  // namespace chassis
