// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/clones.h"
#include "core/screen/kernels.h"

namespace planewright {

PW_CLONES
void resolveLane(const double* __restrict__ sx, const double* __restrict__ sy, const double* __restrict__ txy,
                 const double* __restrict__ cos2, const double* __restrict__ sin2,
                 double* __restrict__ state) {
  double* __restrict__ mean = state;
  double* __restrict__ half = state + laneSize;
  double* __restrict__ shear = state + 2 * laneSize;
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double x = 0.5 * sx[i];
    const double y = 0.5 * sy[i];
    const double t = txy[i];
    mean[i] = x + y;
    half[i] = (x - y) * cos2[i] + t * sin2[i];
    shear[i] = t * cos2[i] - (x - y) * sin2[i];
  }
}

PW_CLONES
void widenBounds(const double* __restrict__ values, std::size_t count, Bounds& bounds) {
  double least = bounds.least;
  double greatest = bounds.greatest;
  for (std::size_t from = 0; from < count; from += laneSize)
    for (std::size_t i = from; i < from + laneSize; ++i) {
      const double size = __builtin_fabs(values[i]);
      greatest = size > greatest ? size : greatest;
      const double orNone = size > 0 ? size : least;
      least = orNone < least ? orNone : least;
    }
  bounds = {least, greatest};
}

PW_CLONES
void combineLane(const double* const* states, const double* factors, std::size_t count,
                 double* __restrict__ sum) {
  std::size_t k = 0;
  if (count >= 3) {
    const double* __restrict__ a = states[0];
    const double* __restrict__ b = states[1];
    const double* __restrict__ c = states[2];
    const double fa = factors[0];
    const double fb = factors[1];
    const double fc = factors[2];
    for (std::size_t i = 0; i < stateSize; ++i)
      sum[i] = fa * a[i] + fb * b[i] + fc * c[i];
    k = 3;
  } else if (count == 2) {
    const double* __restrict__ a = states[0];
    const double* __restrict__ b = states[1];
    const double fa = factors[0];
    const double fb = factors[1];
    for (std::size_t i = 0; i < stateSize; ++i)
      sum[i] = fa * a[i] + fb * b[i];
    k = 2;
  } else if (count == 1) {
    const double* __restrict__ a = states[0];
    const double fa = factors[0];
    for (std::size_t i = 0; i < stateSize; ++i)
      sum[i] = fa * a[i];
    k = 1;
  } else {
    for (std::size_t i = 0; i < stateSize; ++i)
      sum[i] = 0;
  }
  for (; k + 3 <= count; k += 3) {
    const double* __restrict__ a = states[k];
    const double* __restrict__ b = states[k + 1];
    const double* __restrict__ c = states[k + 2];
    const double fa = factors[k];
    const double fb = factors[k + 1];
    const double fc = factors[k + 2];
    for (std::size_t i = 0; i < stateSize; ++i)
      sum[i] = sum[i] + fa * a[i] + fb * b[i] + fc * c[i];
  }
  for (; k < count; ++k) {
    const double* __restrict__ a = states[k];
    const double fa = factors[k];
    for (std::size_t i = 0; i < stateSize; ++i)
      sum[i] = sum[i] + fa * a[i];
  }
}

} // namespace planewright
