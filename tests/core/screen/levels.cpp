// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/core/screen/levels.h"

#ifdef PW_LEVELS
extern "C" const void* const kernels_v1[];
extern "C" const void* const kernels_v3[];
extern "C" const void* const kernels_v4[];
#endif

namespace planewright {

KernelSet kernelsOfProgram() {
  return {&resolveLane,       &combineLane,      &keepSquares,      &keepLinear,    &keepRatios,   &keepSum,
          &keepSquaresInBand, &keepLinearInBand, &keepRatiosInBand, &keepSumInBand, &principalLane};
}

#ifdef PW_LEVELS
namespace {

/// The types of forms and bands are those of the program under another name of their namespace.
template <class Function>
Function kernel(const void* address) {
  return reinterpret_cast<Function>(const_cast<void*>(address));
}

KernelSet kernelsIn(const void* const* table) {
  return {kernel<decltype(&resolveLane)>(table[0]),       kernel<decltype(&combineLane)>(table[1]),
          kernel<decltype(&keepSquares)>(table[2]),       kernel<decltype(&keepLinear)>(table[3]),
          kernel<decltype(&keepRatios)>(table[4]),        kernel<decltype(&keepSum)>(table[5]),
          kernel<decltype(&keepSquaresInBand)>(table[6]), kernel<decltype(&keepLinearInBand)>(table[7]),
          kernel<decltype(&keepRatiosInBand)>(table[8]),  kernel<decltype(&keepSumInBand)>(table[9]),
          kernel<decltype(&principalLane)>(table[10])};
}

} // namespace

std::vector<Level> levels() {
  return {
      {"x86-64", true, kernelsIn(kernels_v1)},
      {"x86-64-v3", __builtin_cpu_supports("avx2") && __builtin_cpu_supports("fma"), kernelsIn(kernels_v3)},
      {"x86-64-v4", __builtin_cpu_supports("avx512f") && __builtin_cpu_supports("avx512vl"),
       kernelsIn(kernels_v4)}};
}
#else
std::vector<Level> levels() {
  return {};
}
#endif

} // namespace planewright
