#ifndef CONVELOPE_KINDS_NUMBERS_HPP
#define CONVELOPE_KINDS_NUMBERS_HPP

#include "convelope/kinds/lengths.hpp"
#include "convelope/kinds/velocities.hpp"

namespace convelope {
inline namespace v0 {

// Dimensionless groups, each on its length scale (and, for Reynolds, its velocity station).
// `key` is how a batch line or a case file names the group.
namespace kinds {
struct pure_number {
  using unit_type = boost::units::si::dimensionless;
  static constexpr const char* unit = "1";
};
/// rho u L / mu
template <length_kind L, velocity_kind V = typename L::velocity>
struct reynolds : pure_number {
  static constexpr const char* symbol = "Re";
  static constexpr const char* words = "Reynolds number";
  static constexpr const char* on_length = L::words;
  static constexpr const char* at_velocity = V::words;
};
/// cp mu / k
struct prandtl : pure_number {
  static constexpr const char* symbol = "Pr";
  static constexpr const char* words = "Prandtl number";
};
/// h L / k, mean over the wall
template <length_kind L>
struct nusselt : pure_number {
  static constexpr const char* symbol = "Nu";
  static constexpr const char* words = "mean Nusselt number";
  static constexpr const char* on_length = L::words;
};
/// h_x L / k at one station
template <length_kind L>
struct local_nusselt : pure_number {
  static constexpr const char* symbol = "Nu_x";
  static constexpr const char* words = "local Nusselt number";
  static constexpr const char* on_length = L::words;
};
/// g beta dT L^3 / nu^2
template <length_kind L>
struct grashof : pure_number {
  static constexpr const char* symbol = "Gr";
  static constexpr const char* words = "Grashof number";
  static constexpr const char* on_length = L::words;
};
/// Gr Pr
template <length_kind L>
struct rayleigh : pure_number {
  static constexpr const char* symbol = "Ra";
  static constexpr const char* words = "Rayleigh number";
  static constexpr const char* on_length = L::words;
};
/// g beta q L^4 / (k nu alpha): the Rayleigh number with q L/k for the temperature difference
template <length_kind L>
struct flux_rayleigh : pure_number {
  static constexpr const char* symbol = "Ra*";
  static constexpr const char* words = "Rayleigh number on the heat flux";
  static constexpr const char* key = "RaStar";
  static constexpr const char* on_length = L::words;
};
/// Rayleigh number on the gap times gap over height: Ra_b b/H
struct elenbaas : pure_number {
  static constexpr const char* symbol = "El";
  static constexpr const char* words = "Elenbaas number";
};
/// The same with q b/k for the temperature difference
struct flux_elenbaas : pure_number {
  static constexpr const char* symbol = "El*";
  static constexpr const char* words = "Elenbaas number on the heat flux";
};
/// Gr / Re^2
template <length_kind L>
struct richardson : pure_number {
  static constexpr const char* symbol = "Ri";
  static constexpr const char* words = "Richardson number";
  static constexpr const char* on_length = L::words;
};
/// Re Pr
template <length_kind L>
struct peclet : pure_number {
  static constexpr const char* symbol = "Pe";
  static constexpr const char* words = "Peclet number";
  static constexpr const char* on_length = L::words;
};
/// Re Pr Dh / x, without the factor pi/4
struct graetz : pure_number {
  static constexpr const char* symbol = "Gz";
  static constexpr const char* words = "Graetz number Re Pr Dh/x";
};
/// (x/Dh) / (Re Pr), the inverse of the Graetz number
struct thermal_entry : pure_number {
  static constexpr const char* symbol = "x_star";
  static constexpr const char* words = "thermal entry coordinate";
};
/// Nu / (Re Pr)
template <length_kind L>
struct stanton : pure_number {
  static constexpr const char* symbol = "St";
  static constexpr const char* words = "Stanton number";
  static constexpr const char* on_length = L::words;
};
/// h L / k of the solid
template <length_kind L>
struct biot : pure_number {
  static constexpr const char* symbol = "Bi";
  static constexpr const char* words = "Biot number";
  static constexpr const char* on_length = L::words;
};
/// Re sqrt(d/Dc) of a coil
struct dean : pure_number {
  static constexpr const char* symbol = "De";
  static constexpr const char* words = "Dean number";
};
/// Re_gap sqrt(b/R), not squared
struct taylor : pure_number {
  static constexpr const char* symbol = "Ta";
  static constexpr const char* words = "Taylor number";
};
/// The square of the Taylor number, with or without a geometry factor
struct squared_taylor : pure_number {
  static constexpr const char* symbol = "Ta_m";
  static constexpr const char* words = "squared Taylor number";
};
/// dp = f (L/Dh) rho u^2/2
struct darcy_friction : pure_number {
  static constexpr const char* symbol = "f_D";
  static constexpr const char* words = "Darcy friction factor";
};
/// tau_w / (rho u^2/2) = f_D/4
struct fanning_friction : pure_number {
  static constexpr const char* symbol = "f_F";
  static constexpr const char* words = "Fanning friction factor";
};
/// Duct length over hydraulic diameter
struct length_ratio : pure_number {
  static constexpr const char* symbol = "L/D";
  static constexpr const char* words = "length over diameter";
  static constexpr const char* key = "L_over_D";
};
/// tau_w / (rho u^2/2) at one station of a wall in a free stream
struct local_skin_friction : pure_number {
  static constexpr const char* symbol = "cf_x";
  static constexpr const char* words = "local skin-friction coefficient";
};
/// Drag of one side / (A rho u^2/2)
struct skin_friction : pure_number {
  static constexpr const char* symbol = "Cf";
  static constexpr const char* words = "mean skin-friction coefficient";
};
/// Gap between two cylinders over their mean radius
struct gap_ratio : pure_number {
  static constexpr const char* symbol = "b/r_m";
  static constexpr const char* words = "gap over mean radius";
  static constexpr const char* key = "b_over_rm";
};
/// What the squared Taylor number is divided by in a gap that is not narrow
struct gap_geometry_factor : pure_number {
  static constexpr const char* symbol = "F_g";
  static constexpr const char* words = "geometry factor of the squared Taylor number";
};
/// Radius of the inner over the outer cylinder
struct radius_ratio : pure_number {
  static constexpr const char* symbol = "eta";
  static constexpr const char* words = "inner over outer radius";
};
/// Sand-grain roughness over diameter
struct relative_roughness : pure_number {
  static constexpr const char* symbol = "eps/D";
  static constexpr const char* words = "roughness over diameter";
  static constexpr const char* key = "eps_over_D";
};
/// Viscosity in the stream over viscosity at the wall
struct viscosity_ratio : pure_number {
  static constexpr const char* symbol = "mu/mu_w";
  static constexpr const char* words = "viscosity of the stream over that at the wall";
  static constexpr const char* key = "mu_ratio";
};
/// Prandtl number in the bulk over that at the wall
struct prandtl_ratio : pure_number {
  static constexpr const char* symbol = "Pr_b/Pr_w";
  static constexpr const char* words = "bulk over wall Prandtl number";
  static constexpr const char* key = "Pr_b_over_Pr_w";
};
/// Absolute bulk over absolute wall temperature
struct temperature_ratio : pure_number {
  static constexpr const char* symbol = "T_b/T_w";
  static constexpr const char* words = "absolute bulk over wall temperature";
  static constexpr const char* key = "Tb_over_Tw";
};
/// (T_2 - T_inlet)/(T_1 - T_inlet) of the two walls of a channel
struct wall_excess_ratio : pure_number {
  static constexpr const char* symbol = "r_T";
  static constexpr const char* words = "excess of wall 2 over that of wall 1";
  static constexpr const char* key = "rT";
};
/// Gap between the walls over the height of the channel
struct gap_over_height : pure_number {
  static constexpr const char* symbol = "b/H";
  static constexpr const char* words = "gap over height";
};
/// n in (a^n + b^n)^(1/n)
struct blending_exponent : pure_number {
  static constexpr const char* symbol = "n";
  static constexpr const char* words = "exponent of the blend";
};
/// Mean Nusselt number of a duct with its entrance over the developed one
struct entrance_factor : pure_number {
  static constexpr const char* symbol = "Nu_m/Nu";
  static constexpr const char* words = "mean over developed Nusselt number";
};
/// Nusselt number at one station behind the entrance over the developed one
struct local_entrance_factor : pure_number {
  static constexpr const char* symbol = "Nu_x/Nu";
  static constexpr const char* words = "local over developed Nusselt number";
};
/// Length in which the velocity profile develops, over the hydraulic diameter
struct velocity_entry_ratio : pure_number {
  static constexpr const char* symbol = "L_h/D";
  static constexpr const char* words = "hydrodynamic entrance length over diameter";
};
/// Length in which the temperature profile develops, over the hydraulic diameter
struct thermal_entry_ratio : pure_number {
  static constexpr const char* symbol = "L_t/D";
  static constexpr const char* words = "thermal entrance length over diameter";
};
/// Friction factor with the fluid's real viscosity over that at the bulk viscosity
struct friction_correction : pure_number {
  static constexpr const char* symbol = "f/f_b";
  static constexpr const char* words = "friction factor over that at bulk viscosity";
};
/// Reynolds number at which a boundary layer turns turbulent
struct transition_reynolds : pure_number {
  static constexpr const char* symbol = "Re_c";
  static constexpr const char* words = "transition Reynolds number";
};
}  // namespace kinds

inline constexpr gate<kinds::prandtl> prandtl_number{};
inline constexpr gate<kinds::elenbaas> elenbaas_number{};
inline constexpr gate<kinds::flux_elenbaas> flux_elenbaas_number{};
inline constexpr gate<kinds::graetz> graetz_number{};
inline constexpr gate<kinds::thermal_entry> thermal_entry{};
inline constexpr gate<kinds::dean> dean_number{};
inline constexpr gate<kinds::taylor> taylor_number{};
inline constexpr gate<kinds::squared_taylor> squared_taylor_number{};
inline constexpr gate<kinds::darcy_friction> darcy_friction{};
inline constexpr gate<kinds::fanning_friction> fanning_friction{};
inline constexpr gate<kinds::length_ratio> length_ratio{};
inline constexpr gate<kinds::local_skin_friction> local_skin_friction{};
inline constexpr gate<kinds::skin_friction> skin_friction{};
inline constexpr gate<kinds::gap_ratio> gap_ratio{};
inline constexpr gate<kinds::gap_geometry_factor> gap_geometry_factor{};
inline constexpr gate<kinds::radius_ratio> radius_ratio{};
inline constexpr gate<kinds::relative_roughness> relative_roughness{};
inline constexpr gate<kinds::viscosity_ratio> viscosity_ratio{};
inline constexpr gate<kinds::prandtl_ratio> prandtl_ratio{};
inline constexpr gate<kinds::temperature_ratio> temperature_ratio{};
inline constexpr gate<kinds::wall_excess_ratio> wall_excess_ratio{};
inline constexpr gate<kinds::gap_over_height> gap_over_height{};
inline constexpr gate<kinds::blending_exponent> blending_exponent{};
inline constexpr gate<kinds::entrance_factor> entrance_factor{};
inline constexpr gate<kinds::local_entrance_factor> local_entrance_factor{};
inline constexpr gate<kinds::velocity_entry_ratio> velocity_entry_ratio{};
inline constexpr gate<kinds::thermal_entry_ratio> thermal_entry_ratio{};
inline constexpr gate<kinds::friction_correction> friction_correction{};
inline constexpr gate<kinds::transition_reynolds> transition_reynolds{};

namespace detail {
template <auto L, auto... V>
struct reynolds_kind {
  using type = kinds::reynolds<kind_of<L>, kind_of<V>...>;
};
}  // namespace detail

/// `reynolds_of<diameter>` has the length's own velocity station;
/// `reynolds_of<diameter, minimum_section_velocity>` names another.
template <auto L, auto... V>
inline constexpr gate<typename detail::reynolds_kind<L, V...>::type> reynolds_of{};
template <auto L>
inline constexpr gate<kinds::nusselt<kind_of<L>>> nusselt_of{};
template <auto L>
inline constexpr gate<kinds::local_nusselt<kind_of<L>>> local_nusselt_of{};
template <auto L>
inline constexpr gate<kinds::grashof<kind_of<L>>> grashof_of{};
template <auto L>
inline constexpr gate<kinds::rayleigh<kind_of<L>>> rayleigh_of{};
template <auto L>
inline constexpr gate<kinds::flux_rayleigh<kind_of<L>>> flux_rayleigh_of{};
template <auto L>
inline constexpr gate<kinds::richardson<kind_of<L>>> richardson_of{};
template <auto L>
inline constexpr gate<kinds::peclet<kind_of<L>>> peclet_of{};
template <auto L>
inline constexpr gate<kinds::stanton<kind_of<L>>> stanton_of{};
template <auto L>
inline constexpr gate<kinds::biot<kind_of<L>>> biot_of{};

}  // namespace v0
}  // namespace convelope

#endif
