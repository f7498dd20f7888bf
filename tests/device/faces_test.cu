// Faces in device code, against the same faces on the host. Without a device it says so and is
// skipped (77); compiling it is a check already.
#define CONVELOPE_FUNCTION __host__ __device__
#include <cmath>
#include <cstdio>
#include <vector>

#include "convelope/boundary/surface.hpp"
#include "convelope/fluids/dry_air.hpp"
#include "convelope/fluids/liquid_water.hpp"
#include "convelope/surfaces/cylinder.hpp"
#include "convelope/surfaces/duct.hpp"
#include "convelope/surfaces/vertical_plate.hpp"

using namespace convelope;

namespace {

struct numbers {
  double flux;
  double slope;
  std::uint64_t verdict;
};

template <class Surface>
__host__ __device__ numbers ask(const Surface& wall, double wall_K) {
  const auto a = wall.at(typed<kinds::wall_temperature>::from_si(wall_K));
  return {a.flux().si(), a.slope().si(), a.verdict().bits()};
}

template <class Surface>
__global__ void ask_all(Surface wall, std::size_t count, const double* wall_K, numbers* answers) {
  const std::size_t i = blockIdx.x * std::size_t(blockDim.x) + threadIdx.x;
  if (i < count) answers[i] = ask(wall, wall_K[i]);
}

bool ok(cudaError_t e) {
  if (e != cudaSuccess) std::fprintf(stderr, "device: %s\n", cudaGetErrorString(e));
  return e == cudaSuccess;
}

template <class Surface>
bool same_as_host(const char* name, const Surface& wall, double from_K, double to_K) {
  constexpr std::size_t count = 1 << 20;
  std::vector<double> wall_K(count);
  for (std::size_t i = 0; i < count; ++i) {
    wall_K[i] = from_K + (to_K - from_K) * double((i * 7919) % count) / double(count);
  }
  double* on_device = nullptr;
  numbers* answers = nullptr;
  if (!ok(cudaMalloc(&on_device, count * sizeof(double))) ||
      !ok(cudaMalloc(&answers, count * sizeof(numbers))) ||
      !ok(cudaMemcpy(on_device, wall_K.data(), count * sizeof(double), cudaMemcpyHostToDevice))) {
    return false;
  }
  cudaEvent_t start;
  cudaEvent_t stop;
  cudaEventCreate(&start);
  cudaEventCreate(&stop);
  constexpr unsigned threads = 256;
  const auto launch = [&] {
    ask_all<<<unsigned(count / threads), threads>>>(wall, count, on_device, answers);
  };
  launch();
  cudaEventRecord(start);
  launch();
  cudaEventRecord(stop);
  std::vector<numbers> got(count);
  if (!ok(cudaMemcpy(got.data(), answers, count * sizeof(numbers), cudaMemcpyDeviceToHost))) {
    return false;
  }
  float ms = 0.0F;
  cudaEventElapsedTime(&ms, start, stop);
  cudaFree(on_device);
  cudaFree(answers);

  std::size_t off = 0;
  for (std::size_t i = 0; i < count; ++i) {
    const numbers want = ask(wall, wall_K[i]);
    const double scale = std::fabs(want.slope) * wall_K[i];
    const bool same = std::fabs(got[i].flux - want.flux) <= 1e-12 * scale &&
                      std::fabs(got[i].slope - want.slope) <= 1e-11 * std::fabs(want.slope) &&
                      got[i].verdict == want.verdict;
    if (!same) ++off;
  }
  std::printf("%s: %zu of %zu faces differ from the host's, %.3f ns per face\n", name, off, count,
              double(ms) * 1e6 / double(count));
  return off == 0;
}

template <class K>
typed<K> number(double si) {
  return typed<K>::from_si(si);
}

}  // namespace

int main() {
  int devices = 0;
  if (cudaGetDeviceCount(&devices) != cudaSuccess || devices == 0) {
    std::puts("no device: compiled only");
    return 77;
  }
  const stream<double> wind{number<kinds::free_stream_velocity>(4.0),
                            number<kinds::free_stream_temperature>(300.0)};
  const duct_flow<double> flow{number<kinds::mean_velocity>(0.3),
                               number<kinds::bulk_temperature>(300.0)};
  const bool tube = same_as_host(
      "tube", surface(cylinder_in_crossflow{number<kinds::diameter>(0.05)}, dry_air_fast{}, wind),
      310.0, 420.0);
  const bool plate = same_as_host(
      "plate", surface(vertical_wall{number<kinds::height>(0.3)}, dry_air{}, wind), 250.0, 900.0);
  const bool duct =
      same_as_host("duct",
                   surface(round_duct_segment{number<kinds::hydraulic_diameter>(0.02),
                                              number<kinds::distance_from_inlet>(0.1),
                                              number<kinds::distance_from_inlet>(0.4)},
                           liquid_water{}, flow),
                   280.0, 370.0);
  return tube && plate && duct ? 0 : 1;
}
