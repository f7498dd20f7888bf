// Conduction in a board against solutions that can be written down.
#include "model/board_heat.hpp"

#include <doctest/doctest.h>

#include <Eigen/SparseLU>
#include <array>
#include <cmath>
#include <numbers>

namespace {

using chassis::face;

constexpr double pi = std::numbers::pi;
constexpr double length = 0.16;
constexpr double width = 0.1;
constexpr double h_back = 9;
constexpr double h_front = 23;
constexpr double air_K = 300;

// Manufactured solution: adiabatic edges by cosines; the back field is chosen, the front field
// follows from the balance of the middle, and the sources follow from the balances of the faces.
struct manufactured {
  chassis::plate plate{0.002, 15.0, 0.6};
  double through() const { return plate.through / (0.5 * plate.thickness); }

  double middle(double x, double y) const {
    return 330 + 12 * std::cos(pi * x / length) * std::cos(2 * pi * y / width) +
           7 * std::cos(2 * pi * x / length);
  }
  double laplacian(double x, double y) const {
    const double a = pi / length, b = 2 * pi / width, c = 2 * pi / length;
    return -12 * (a * a + b * b) * std::cos(a * x) * std::cos(b * y) - 7 * c * c * std::cos(c * x);
  }
  double back(double x, double y) const { return middle(x, y) - 2 - std::cos(pi * y / width); }
  double front(double x, double y) const {
    return 2 * middle(x, y) - back(x, y) -
           plate.in_plane * plate.thickness * laplacian(x, y) / through();
  }
  double back_source(double x, double y) const {
    return through() * (back(x, y) - middle(x, y)) + h_back * (back(x, y) - air_K);
  }
  double front_source(double x, double y) const {
    return through() * (front(x, y) - middle(x, y)) + h_front * (front(x, y) - air_K);
  }
};

// Root mean square and largest error over all cells and all three fields.
std::array<double, 2> errors_with(std::size_t n) {
  const manufactured exact;
  chassis::board b;
  b.length = length;
  b.width = width;
  b.cells_along = 2 * n;
  b.cells_across = n;
  chassis::board_layout board{chassis::board_mesh(b), exact.plate, {}, {}};
  const auto& mesh = board.mesh;
  board.back_power.resize(mesh.cells());
  board.front_power.resize(mesh.cells());
  const auto at = [&](std::size_t cell) {
    return std::array<double, 2>{(static_cast<double>(cell % mesh.along) + 0.5) * mesh.dx,
                                 (static_cast<double>(cell / mesh.along) + 0.5) * mesh.dy};
  };
  for (std::size_t cell = 0; cell < mesh.cells(); ++cell) {
    const auto [x, y] = at(cell);
    board.back_power[cell] = mesh.area() * exact.back_source(x, y);
    board.front_power[cell] = mesh.area() * exact.front_source(x, y);
  }
  const int unknowns = 3 * static_cast<int>(mesh.cells());
  Eigen::VectorXd t = Eigen::VectorXd::Constant(unknowns, air_K);
  chassis::balances sum(unknowns);
  chassis::add_board_heat(board, 0, 1.0, t, sum);
  for (int cell = 0; cell < unknowns; cell += 3) {
    sum.slope(cell + 1, cell + 1, mesh.area() * h_back);
    sum.slope(cell + 2, cell + 2, mesh.area() * h_front);
  }
  Eigen::SparseMatrix<double> matrix(unknowns, unknowns);
  matrix.setFromTriplets(sum.slopes.begin(), sum.slopes.end());
  Eigen::SparseLU<Eigen::SparseMatrix<double>> lu(matrix);
  REQUIRE(lu.info() == Eigen::Success);
  t -= lu.solve(sum.residual);

  double square = 0;
  double largest = 0;
  for (std::size_t cell = 0; cell < mesh.cells(); ++cell) {
    const auto [x, y] = at(cell);
    const int i = 3 * static_cast<int>(cell);
    for (const double e :
         {t[i] - exact.middle(x, y), t[i + 1] - exact.back(x, y), t[i + 2] - exact.front(x, y)}) {
      square += e * e;
      largest = (std::max)(largest, std::abs(e));
    }
  }
  return {std::sqrt(square / unknowns), largest};
}

TEST_CASE("a manufactured solution is met at second order") {
  auto before = errors_with(8);
  for (const std::size_t n : {16u, 32u, 64u}) {
    const auto now = errors_with(n);
    for (const std::size_t norm : {0u, 1u}) {
      const double order = std::log2(before[norm] / now[norm]);
      CAPTURE(n);
      CAPTURE(now[norm]);
      CHECK(order > 1.9);
      CHECK(order < 2.1);
    }
    before = now;
  }
  CHECK(before[1] < 0.05);
}

TEST_CASE("layers conduct in parallel in the plane and in series through it") {
  // Two layers worked out by hand: k t sums to 390*0.0001 + 0.3*0.0015 = 0.03945 W/K,
  // t/k sums to 0.0001/390 + 0.0015/0.3 = 0.00500026 m2 K/W.
  const auto p =
      chassis::plate_of({{"copper", 1e-4, 390, 1, 390}, {"laminate", 1.5e-3, 0.3, 1, 0.3}});
  CHECK(p.thickness == doctest::Approx(1.6e-3));
  CHECK(p.in_plane == doctest::Approx(0.03945 / 1.6e-3));
  CHECK(p.through == doctest::Approx(1.6e-3 / 0.00500025641));
  const auto half = chassis::plate_of({{"pattern", 1e-4, 390, 0.25, 0.3}});
  CHECK(half.in_plane == doctest::Approx(0.25 * 390 + 0.75 * 0.3));
}

TEST_CASE("the power of a component reaches its cells whole, wherever its edges fall") {
  chassis::board b;
  b.length = length;
  b.width = width;
  b.cells_along = 7;
  b.cells_across = 5;
  const chassis::board_mesh mesh(b);
  const chassis::rectangle r{0.0313, 0.0171, 0.0517, 0.0402};
  double area = 0;
  for (std::size_t j = 0; j < mesh.across; ++j) {
    for (std::size_t i = 0; i < mesh.along; ++i) area += mesh.shared_area(i, j, r);
  }
  CHECK(area == doctest::Approx(r.length * r.width).epsilon(1e-13));
}

}  // namespace
