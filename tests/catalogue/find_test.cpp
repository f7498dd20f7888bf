// Look-up by id and quantity, and filtering.
#include "convelope/catalogue/find.hpp"

#include <doctest/doctest.h>

#include <string>

#include "convelope/catalogue/catalogue.hpp"

using namespace convelope;
using catalogue::all;
using catalogue::found;

TEST_CASE("find: one, none, several") {
  const auto one = catalogue::find(all::entries, "cylinder-crossflow/churchill-bernstein-1977");
  CHECK(one.how == found::one);
  CHECK(std::string(one.which->info->quantity) == "Nu_D");
  CHECK(
      catalogue::find(all::entries, "cylinder-crossflow/churchill-bernstein-1977", "Nu_D").which ==
      one.which);

  const auto several = catalogue::find(all::entries, "round-duct/gnielinski-laminar-uwt");
  CHECK(several.how == found::several_quantities);
  CHECK(several.which == nullptr);
  const auto local = catalogue::find(all::entries, "round-duct/gnielinski-laminar-uwt", "Nu_x");
  CHECK(local.how == found::one);
  CHECK(local.which !=
        catalogue::find(all::entries, "round-duct/gnielinski-laminar-uwt", "Nu_m").which);

  CHECK(catalogue::find(all::entries, "cylinder-crossflow/churchill-bernstein-1977", "Nu").how ==
        found::no_such_quantity);
  for (const char* id : {"", "cylinder-crossflow", "cylinder-crossflow/churchill-bernstein-197",
                         "Cylinder-crossflow/churchill-bernstein-1977"}) {
    CHECK(catalogue::find(all::entries, id).how == found::no_such_id);
    CHECK(catalogue::find(all::entries, id, "Nu_D").which == nullptr);
  }
}

TEST_CASE("find: every entry finds itself, also at compile time") {
  for (const catalogue::entry& e : all::entries) {
    CHECK(catalogue::find(all::entries, e.info->id, e.info->quantity).which == &e);
  }
  static_assert(catalogue::find(all::entries, "sphere/whitaker-1972").how == found::one);
}

TEST_CASE("filter: by a part of the id") {
  int spheres = 0;
  catalogue::filter(all::entries, "sphere/", [&](const catalogue::entry& e) {
    CHECK(std::string(e.info->id).rfind("sphere/", 0) == 0);
    ++spheres;
  });
  CHECK(spheres >= 5);
  int everything = 0;
  catalogue::filter(all::entries, "", [&](const catalogue::entry&) { ++everything; });
  CHECK(everything == all::count);
  catalogue::filter(all::entries, "no such thing",
                    [&](const catalogue::entry&) { FAIL("found one"); });
}
