// SPDX-License-Identifier: GPL-3.0-or-later
// Forms at the nominal direction of the line.
#include "core/screen/clones.h"
#include "core/screen/keep.h"
#include "core/screen/kernels.h"

namespace planewright {

PW_CLONES
static void keepPlainSquares(const double* __restrict__ state, const SquaresForm& form, double number,
                             double* __restrict__ best, double* __restrict__ which) {
  const double pull1 = form.a11[0], press1 = form.a11[1];
  const double pull2 = form.a22[0], press2 = form.a22[1];
  const double a66 = form.a66;
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double s1 = state[i] + state[laneSize + i];
    const double s2 = state[i] - state[laneSize + i];
    const double t = state[2 * laneSize + i];
    const double a11 = s1 < 0 ? press1 : pull1;
    const double a22 = s2 < 0 ? press2 : pull2;
    keep(a11 * s1 * s1 + a22 * s2 * s2 + a66 * t * t, number, best[i], which[i]);
  }
}

PW_CLONES
static void keepSquaresWithProducts(const double* __restrict__ state, const SquaresForm& form, double number,
                                    double* __restrict__ best, double* __restrict__ which) {
  const double pull1 = form.a11[0], press1 = form.a11[1];
  const double pull2 = form.a22[0], press2 = form.a22[1];
  const double pp = form.a12[0][0], pn = form.a12[0][1], np = form.a12[1][0], nn = form.a12[1][1];
  const double a66 = form.a66;
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double s1 = state[i] + state[laneSize + i];
    const double s2 = state[i] - state[laneSize + i];
    const double t = state[2 * laneSize + i];
    const double a11 = s1 < 0 ? press1 : pull1;
    const double a22 = s2 < 0 ? press2 : pull2;
    const double pulled = s2 < 0 ? pn : pp;
    const double pressed = s2 < 0 ? nn : np;
    const double a12 = s1 < 0 ? pressed : pulled;
    keep(a11 * s1 * s1 + a12 * s1 * s2 + a22 * s2 * s2 + a66 * t * t, number, best[i], which[i]);
  }
}

void keepSquares(const double* state, const SquaresForm& form, double number, double* best, double* which) {
  if (form.hasProducts)
    keepSquaresWithProducts(state, form, number, best, which);
  else
    keepPlainSquares(state, form, number, best, which);
}

PW_CLONES
void keepLinear(const double* __restrict__ state, const LinearForm& form, double number,
                double* __restrict__ best, double* __restrict__ which) {
  const LinearForm f = form;
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double s1 = state[i] + state[laneSize + i];
    const double s2 = state[i] - state[laneSize + i];
    const double t = state[2 * laneSize + i];
    const double a = f.a11 * s1 * s1 + f.a12 * s1 * s2 + f.a22 * s2 * s2 + f.a66 * t * t;
    const double b = f.b1 * s1 + f.b2 * s2;
    const double twice = b + __builtin_sqrt(b * b + 4 * notBelowZero(a));
    const double u = 0.5 * notBelowZero(twice);
    keep(u * u, number, best[i], which[i]);
  }
}

PW_CLONES
void keepRatios(const double* __restrict__ state, const RatiosForm& form, double number,
                double* __restrict__ best, double* __restrict__ which) {
  const RatiosForm f = form;
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double s1 = state[i] + state[laneSize + i];
    const double s2 = state[i] - state[laneSize + i];
    const double t = state[2 * laneSize + i];
    const double r1 = s1 * (s1 < 0 ? f.along[1] : f.along[0]);
    const double r2 = s2 * (s2 < 0 ? f.across[1] : f.across[0]);
    const double r6 = t * f.shear;
    keep(greater(greater(r1 * r1, r2 * r2), r6 * r6), number, best[i], which[i]);
  }
}

PW_CLONES
void keepSum(const double* __restrict__ state, const SumForm& form, double number, double* __restrict__ best,
             double* __restrict__ which) {
  const SumForm f = form;
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double s1 = state[i] + state[laneSize + i];
    const double s2 = state[i] - state[laneSize + i];
    const double t = state[2 * laneSize + i];
    const double r1 = s1 * (s1 < 0 ? f.along[1] : f.along[0]);
    const double r2 = s2 * (s2 < 0 ? f.across[1] : f.across[0]);
    const double u = __builtin_fabs(r1) + __builtin_fabs(r2) + __builtin_fabs(t) * f.shear;
    keep(u * u, number, best[i], which[i]);
  }
}

} // namespace planewright
