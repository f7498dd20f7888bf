#include "convelope/estimate/throwing.hpp"

#include <doctest/doctest.h>

#include <stdexcept>

#include "edges.hpp"
#include "invented.hpp"

using namespace convelope;
using namespace invented;

namespace {
struct outside_envelope : std::runtime_error {
  using std::runtime_error::runtime_error;
};
}  // namespace

TEST_CASE("throwing: the host's exception, made from the sentence") {
  const auto of = everything{}.under(policy::throwing<outside_envelope>);
  CHECK(of(Re_in, Pr_in, ratio_in).si() == 502.0);
  CHECK_THROWS_AS(of(reynolds_of<diameter>(50.0), Pr_in, ratio_in), outside_envelope);
  const auto recorded = everything{}(reynolds_of<diameter>(50.0), Pr_in, ratio_in);
  CHECK_THROWS_WITH(of(reynolds_of<diameter>(50.0), Pr_in, ratio_in), explain(recorded).c_str());
  CHECK_THROWS_AS(of(Re_in, prandtl_number(hidden_nan()), ratio_in), outside_envelope);
}

TEST_CASE("throwing: not for a scatter that was not stated") {
  const auto of = reynolds_from_prandtl{}.under(policy::throwing<outside_envelope>);
  CHECK_NOTHROW(of(Pr_in));
  CHECK_THROWS_AS(of(prandtl_number(101.0)), outside_envelope);
}
