#include "convelope/kinds/typed.hpp"

#include <doctest/doctest.h>

#include "convelope/kinds.hpp"
#include "convelope/scalar/std_simd.hpp"

using namespace convelope;
namespace si = boost::units::si;

namespace static_test {

using D = typed<kinds::diameter>;
using Dh = typed<kinds::hydraulic_diameter>;
using Tw = typed<kinds::wall_temperature>;
using Tb = typed<kinds::bulk_temperature>;
using dT = typed<kinds::temperature_difference>;
using Pr = typed<kinds::prandtl>;

// It holds just the number.
static_assert(sizeof(D) == sizeof(double) && alignof(D) == alignof(double));
static_assert(std::is_trivially_copyable_v<D> && std::is_trivially_default_constructible_v<D>);
static_assert(std::is_standard_layout_v<D>);
static_assert(std::is_trivially_copyable_v<typed<kinds::diameter, dual<dual<double>>>>);
static_assert(std::is_nothrow_copy_constructible_v<D> && std::is_nothrow_copy_assignable_v<D>);
static_assert(std::is_nothrow_default_constructible_v<D> && std::is_nothrow_destructible_v<D>);

// No way in but the gate, no way from kind to kind.
static_assert(!std::is_constructible_v<D, double> && !std::is_constructible_v<D, Dh>);
static_assert(!std::is_constructible_v<D, boost::units::quantity<si::length>>);
static_assert(!std::is_convertible_v<D, double> && !std::is_convertible_v<Tw, Tb>);
static_assert(!std::is_assignable_v<Tw&, Tb> && !std::is_assignable_v<D&, double>);
static_assert(!std::is_convertible_v<D, typed<kinds::diameter, float>>, "no silent narrowing");

template <auto Gate, class X>
concept lets_in = requires(const X& x) { Gate(x); };
static_assert(lets_in<diameter, boost::units::quantity<si::length>>);
static_assert(lets_in<diameter, boost::units::quantity<si::length, float>>);
static_assert(!lets_in<diameter, double> && !lets_in<diameter, int> && !lets_in<diameter, Dh>);
static_assert(!lets_in<diameter, boost::units::quantity<si::velocity>>);
static_assert(!lets_in<wall_temperature, double>);
static_assert(!lets_in<wall_temperature, boost::units::quantity<si::temperature>>);
static_assert(
    !lets_in<temperature_difference, boost::units::quantity<unit_types::absolute_temperature>>);
static_assert(!lets_in<conductivity, boost::units::quantity<unit_types::film_coefficient>>);
static_assert(!lets_in<specific_heat, boost::units::quantity<unit_types::thermal_conductivity>>);
static_assert(!lets_in<kinematic_viscosity, boost::units::quantity<si::dynamic_viscosity>>);
static_assert(!lets_in<viscosity, boost::units::quantity<unit_types::diffusivity>>);
static_assert(!lets_in<heat_flux, boost::units::quantity<unit_types::film_coefficient>>);
static_assert(lets_in<prandtl_number, double> && lets_in<prandtl_number, float>);
static_assert(lets_in<prandtl_number, dual<double>> && lets_in<prandtl_number, long double>);
static_assert(!lets_in<prandtl_number, int> && !lets_in<prandtl_number, bool>);
static_assert(!lets_in<prandtl_number, Pr> && !lets_in<prandtl_number, const char*>);
static_assert(!lets_in<prandtl_number, boost::units::quantity<si::length>>);

template <class A, class B>
concept add = requires(const A& a, const B& b) { a + b; };
template <class A, class B>
concept subtract = requires(const A& a, const B& b) { a - b; };
template <class A, class B>
concept multiply = requires(const A& a, const B& b) { a* b; };
template <class A, class B>
concept compare = requires(const A& a, const B& b) {
  a < b;
  a > b;
};
static_assert(add<D, D> && subtract<D, D> && compare<D, D> && multiply<double, D>);
static_assert(!add<D, Dh> && !subtract<D, Dh> && !compare<D, Dh>);
static_assert(!add<D, double> && !add<double, D> && !compare<D, double> && !multiply<D, D>);
static_assert(!add<Tw, Tw> && !add<Tw, Tb> && !add<Tb, Tw> && !add<Tw, dT> &&
              !multiply<double, Tw>);
static_assert(subtract<Tw, Tw> && subtract<Tw, Tb> && !subtract<Tw, dT> && !subtract<dT, Tw>);
static_assert(!subtract<Tw, D> && !subtract<D, Tw>);
static_assert(compare<Tw, Tw> && !compare<Tw, Tb> && !compare<Tw, dT>);
static_assert(add<dT, dT> && subtract<dT, dT> && compare<dT, dT>);
static_assert(std::is_same_v<decltype(Tw{} - Tb{}), dT>);

static_assert(kind<kinds::diameter> && !kind<double> && !kind<kinds::length_scale>);
static_assert(has_kind<D> && !has_kind<double> && !has_kind<gate<kinds::diameter>>);
static_assert(measures<D, kinds::diameter> && !measures<D, kinds::hydraulic_diameter>);
static_assert(!measures<double, kinds::diameter>);
static_assert(std::is_same_v<kind_of<diameter>, kinds::diameter>);

constexpr D d = diameter(0.05 * units::metre);
static_assert(d.si() == 0.05 && (d + d).si() == 0.1 && (2.0 * d).si() == 0.1);
static_assert(d < 2.0 * d && 2.0 * d > d && !(d < d));

}  // namespace static_test

TEST_CASE("in through the gate and out again, number and unit") {
  const auto d = diameter(0.05 * units::metre);
  CHECK(d.si() == 0.05);
  CHECK(d.quantity() == 0.05 * si::meter);
  CHECK(diameter(d.quantity()).si() == 0.05);
  CHECK(wall_temperature(celsius(60.0)).quantity() == celsius(60.0));
  CHECK(prandtl_number(0.7).quantity().value() == 0.7);
  CHECK(typed<kinds::diameter>::from_si(0.05).si() == 0.05);
}

TEST_CASE("a dimensionless gate takes what Boost.Units made dimensionless") {
  const auto Pr =
      prandtl_number((1000.0 * units::joule_per_kilogram_kelvin) * (2e-5 * units::pascal_second) /
                     (0.025 * units::watt_per_metre_kelvin));
  static_assert(std::is_same_v<decltype(Pr), const typed<kinds::prandtl>>);
  CHECK(Pr.si() == doctest::Approx(0.8).epsilon(1e-15));
}

TEST_CASE("every number type through a gate") {
  const auto f = diameter(0.05F * units::metre);
  static_assert(std::is_same_v<decltype(f)::value_type, float>);
  CHECK(f.si() == 0.05F);
  using dual_length = boost::units::quantity<si::length, dual<double>>;
  const auto d = diameter(dual_length::from_value(dual<double>::variable(0.05)));
  CHECK((2.0 * d).si().slope[0] == 2.0);
  using pack = std::experimental::native_simd<double>;
  const auto p = wall_temperature(kelvin(pack(300.0))) - bulk_temperature(kelvin(pack(280.0)));
  for (std::size_t i = 0; i < pack::size(); ++i) CHECK(double(p.si()[i]) == 20.0);
  const auto Re = reynolds_of<diameter>(pack(3.0));
  CHECK(double((Re + Re).si()[0]) == 6.0);
}
