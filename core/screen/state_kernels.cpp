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

// Loops of their own, three or six terms at a time: nested in a loop over the terms, GCC would turn them
// about and gather values one by one.

PW_CLONES
[[gnu::noinline]] static void sumSix(const double* const* states, const double* f, double* __restrict__ sum) {
  const double* __restrict__ a = states[0];
  const double* __restrict__ b = states[1];
  const double* __restrict__ c = states[2];
  const double* __restrict__ d = states[3];
  const double* __restrict__ e = states[4];
  const double* __restrict__ g = states[5];
  const double fa = f[0], fb = f[1], fc = f[2], fd = f[3], fe = f[4], fg = f[5];
  for (std::size_t i = 0; i < stateSize; ++i)
    sum[i] = fa * a[i] + fb * b[i] + fc * c[i] + fd * d[i] + fe * e[i] + fg * g[i];
}

PW_CLONES
[[gnu::noinline]] static void sumThree(const double* const* states, const double* f,
                                       double* __restrict__ sum) {
  const double* __restrict__ a = states[0];
  const double* __restrict__ b = states[1];
  const double* __restrict__ c = states[2];
  const double fa = f[0], fb = f[1], fc = f[2];
  for (std::size_t i = 0; i < stateSize; ++i)
    sum[i] = fa * a[i] + fb * b[i] + fc * c[i];
}

PW_CLONES
[[gnu::noinline]] static void addThree(const double* const* states, const double* f,
                                       double* __restrict__ sum) {
  const double* __restrict__ a = states[0];
  const double* __restrict__ b = states[1];
  const double* __restrict__ c = states[2];
  const double fa = f[0], fb = f[1], fc = f[2];
  for (std::size_t i = 0; i < stateSize; ++i)
    sum[i] = sum[i] + fa * a[i] + fb * b[i] + fc * c[i];
}

void combineLane(const double* const* states, const double* factors, std::size_t count, double* sum) {
  // What is missing of the last three is filled up by zeros.
  static const double zeros[stateSize] = {};
  const double* some[6];
  double f[6];
  const std::size_t first = count > 3 ? 6 : 3;
  for (std::size_t from = 0; from == 0 || from < count; from += from == 0 ? first : 3) {
    const std::size_t size = from == 0 ? first : 3;
    for (std::size_t k = 0; k < size; ++k) {
      const bool isThere = from + k < count;
      some[k] = isThere ? states[from + k] : zeros;
      f[k] = isThere ? factors[from + k] : 0;
    }
    if (size == 6)
      sumSix(some, f, sum);
    else if (from == 0)
      sumThree(some, f, sum);
    else
      addThree(some, f, sum);
  }
}

} // namespace planewright
