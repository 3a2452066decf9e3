// SPDX-License-Identifier: GPL-3.0-or-later
// Forms at the worst direction of a band. X = half of along less across runs from `low` to `high` over it;
// s1 = mean + X, s2 = mean - X, t^2 = R^2 - X^2.
#include "core/screen/clones.h"
#include "core/screen/keep.h"
#include "core/screen/kernels.h"

namespace planewright {

namespace {

/// The interval of X with the shear at its ends, which is taken by turning where R^2 - X^2 would cancel.
struct Interval {
  double R;
  double high, shearHigh;
  double low, shearLow;
};

inline Interval intervalOf(double half, double shear, double cos2, double sin2) {
  const double R = __builtin_sqrt(half * half + shear * shear);
  const double left = half * cos2 + shear * sin2;
  const double right = half * cos2 - shear * sin2;
  const double shearLeft = shear * cos2 - half * sin2;
  const double shearRight = shear * cos2 + half * sin2;
  const bool isLeftHigh = left > right;
  const double high = isLeftHigh ? left : right;
  const double shearHigh = isLeftHigh ? shearLeft : shearRight;
  const double low = isLeftHigh ? right : left;
  const double shearLow = isLeftHigh ? shearRight : shearLeft;
  // A principal direction lies in the band where the nominal one is no farther from it than the tolerance.
  const bool hasFirst = half >= R * cos2;
  const bool hasSecond = half <= -R * cos2;
  return {R, hasFirst ? R : high, hasFirst ? 0 : shearHigh, hasSecond ? -R : low, hasSecond ? 0 : shearLow};
}

/// A value at X, which counts only inside the interval.
inline double ifInside(const Interval& x, double X, double value) {
  const bool isAbove = X > x.low;
  const bool isBelow = X < x.high;
  return (isAbove & isBelow) ? value : 0;
}

/// Where one sign piece of squares stands still: X = mean * this; not a number where it does not.
inline double stillOf(const SquaresForm& f, int along, int across) {
  const double curve = f.a11[along] - f.a12[along][across] + f.a22[across] - f.a66;
  return (f.a22[across] - f.a11[along]) / curve;
}

} // namespace

PW_CLONES
static void keepPlainSquaresInBand(const double* __restrict__ state, const SquaresForm& form,
                                   const HalfBand& band, double number, double* __restrict__ best,
                                   double* __restrict__ which) {
  const double pull1 = form.a11[0], press1 = form.a11[1];
  const double pull2 = form.a22[0], press2 = form.a22[1];
  const double a66 = form.a66;
  const double bothPull = stillOf(form, 0, 0), bothPress = stillOf(form, 1, 1);
  const double pullPress = stillOf(form, 0, 1), pressPull = stillOf(form, 1, 0);
  const double cos2 = band.cos2, sin2 = band.sin2;
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double mean = state[i];
    const Interval x = intervalOf(state[laneSize + i], state[2 * laneSize + i], cos2, sin2);
    const auto at = [&](double X, double squareOfShear) {
      const double s1 = mean + X;
      const double s2 = mean - X;
      return (s1 < 0 ? press1 : pull1) * s1 * s1 + (s2 < 0 ? press2 : pull2) * s2 * s2 + a66 * squareOfShear;
    };
    const auto inside = [&](double X) { return ifInside(x, X, at(X, (x.R - X) * (x.R + X))); };
    double value = greater(at(x.high, x.shearHigh * x.shearHigh), at(x.low, x.shearLow * x.shearLow));
    value = greater(value, inside(mean * (mean < 0 ? bothPress : bothPull)));
    value = greater(value, inside(mean * pullPress));
    value = greater(value, inside(mean * pressPull));
    keep(value, number, best[i], which[i]);
  }
}

PW_CLONES
static void keepSquaresWithProductsInBand(const double* __restrict__ state, const SquaresForm& form,
                                          const HalfBand& band, double number, double* __restrict__ best,
                                          double* __restrict__ which) {
  const double pull1 = form.a11[0], press1 = form.a11[1];
  const double pull2 = form.a22[0], press2 = form.a22[1];
  const double pp = form.a12[0][0], pn = form.a12[0][1], np = form.a12[1][0], nn = form.a12[1][1];
  const double a66 = form.a66;
  const double bothPull = stillOf(form, 0, 0), bothPress = stillOf(form, 1, 1);
  const double pullPress = stillOf(form, 0, 1), pressPull = stillOf(form, 1, 0);
  const double cos2 = band.cos2, sin2 = band.sin2;
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double mean = state[i];
    const Interval x = intervalOf(state[laneSize + i], state[2 * laneSize + i], cos2, sin2);
    const auto at = [&](double X, double squareOfShear) {
      const double s1 = mean + X;
      const double s2 = mean - X;
      const double a12 = s1 < 0 ? (s2 < 0 ? nn : np) : (s2 < 0 ? pn : pp);
      return (s1 < 0 ? press1 : pull1) * s1 * s1 + a12 * s1 * s2 + (s2 < 0 ? press2 : pull2) * s2 * s2 +
             a66 * squareOfShear;
    };
    const auto inside = [&](double X) { return ifInside(x, X, at(X, (x.R - X) * (x.R + X))); };
    double value = greater(at(x.high, x.shearHigh * x.shearHigh), at(x.low, x.shearLow * x.shearLow));
    value = greater(value, inside(mean * (mean < 0 ? bothPress : bothPull)));
    value = greater(value, inside(mean * pullPress));
    value = greater(value, inside(mean * pressPull));
    // The product jumps in its slope where a stress changes its sign, and the worst can stand there.
    value = greater(value, inside(mean));
    value = greater(value, inside(-mean));
    keep(value, number, best[i], which[i]);
  }
}

void keepSquaresInBand(const double* state, const SquaresForm& form, const HalfBand& band, double number,
                       double* best, double* which) {
  if (form.hasProducts)
    keepSquaresWithProductsInBand(state, form, band, number, best, which);
  else
    keepPlainSquaresInBand(state, form, band, number, best, which);
}

// With a = a2 X^2 + a1 X + a0 and b = b0 + k X the utilisation stands still where u = -a'/k; put into
// u^2 - b u - a = 0 that is a quadratic in X, whose discriminant is known without the cancellation.
PW_CLONES
void keepLinearInBand(const double* __restrict__ state, const LinearForm& form, const HalfBand& band,
                      double number, double* __restrict__ best, double* __restrict__ which) {
  const LinearForm f = form;
  const double k = f.b1 - f.b2;
  const double a2 = f.a11 - f.a12 + f.a22 - f.a66;
  const double twiceDifference = 2 * (f.a11 - f.a22);
  const double sum = f.a11 + f.a12 + f.a22;
  const double sumOfB = f.b1 + f.b2;
  const double A = a2 * (4 * a2 + k * k);
  const double inverseA = 1 / A;
  const double cos2 = band.cos2, sin2 = band.sin2;
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double mean = state[i];
    const Interval x = intervalOf(state[laneSize + i], state[2 * laneSize + i], cos2, sin2);
    const auto at = [&](double X, double squareOfShear) {
      const double s1 = mean + X;
      const double s2 = mean - X;
      const double a = f.a11 * s1 * s1 + f.a12 * s1 * s2 + f.a22 * s2 * s2 + f.a66 * squareOfShear;
      const double b = f.b1 * s1 + f.b2 * s2;
      return b + __builtin_sqrt(b * b + 4 * notBelowZero(a));
    };
    const auto inside = [&](double X) { return ifInside(x, X, at(X, (x.R - X) * (x.R + X))); };
    const double a1 = mean * twiceDifference;
    const double a0 = mean * mean * sum + f.a66 * x.R * x.R;
    const double b0 = mean * sumOfB;
    const double H = a2 * (2 * a1 + b0 * k);
    const double C = a1 * a1 + a1 * b0 * k - a0 * k * k;
    const double inner = a2 * b0 * b0 + 4 * a2 * a0 - a1 * a1 - a1 * b0 * k + a0 * k * k;
    const double root = __builtin_sqrt(k * k * a2 * inner);
    const double q = -(H + (H < 0 ? -root : root));
    double twice = greater(at(x.high, x.shearHigh * x.shearHigh), at(x.low, x.shearLow * x.shearLow));
    twice = greater(twice, inside(q * inverseA));
    twice = greater(twice, inside(C / q));
    const double u = 0.5 * notBelowZero(twice);
    keep(u * u, number, best[i], which[i]);
  }
}

PW_CLONES
void keepRatiosInBand(const double* __restrict__ state, const RatiosForm& form, const HalfBand& band,
                      double number, double* __restrict__ best, double* __restrict__ which) {
  const RatiosForm f = form;
  const double cos2 = band.cos2, sin2 = band.sin2;
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double mean = state[i];
    const Interval x = intervalOf(state[laneSize + i], state[2 * laneSize + i], cos2, sin2);
    double u = greater((mean + x.high) * f.along[0], -(mean + x.low) * f.along[1]);
    u = greater(u, greater((mean - x.low) * f.across[0], -(mean - x.high) * f.across[1]));
    const double atEnds = greater(__builtin_fabs(x.shearHigh), __builtin_fabs(x.shearLow));
    const bool reachesAbove = x.high >= 0;
    const bool reachesBelow = x.low <= 0;
    u = greater(u, ((reachesAbove & reachesBelow) ? x.R : atEnds) * f.shear);
    keep(u * u, number, best[i], which[i]);
  }
}

// Between the corners |s1|/X + |s2|/Y is k X and a constant, and with |t|/S it stands still where X : |t| =
// k : 1/S. At the corners themselves the sum bends upwards: none is the greatest.
PW_CLONES
void keepSumInBand(const double* __restrict__ state, const SumForm& form, const HalfBand& band, double number,
                   double* __restrict__ best, double* __restrict__ which) {
  const SumForm f = form;
  double share[4];
  double shareOfShear[4];
  for (int piece = 0; piece < 4; ++piece) {
    const double along = piece & 1 ? -f.along[1] : f.along[0];
    const double across = piece & 2 ? -f.across[1] : f.across[0];
    const double k = along - across;
    const double length = __builtin_sqrt(k * k + f.shear * f.shear);
    share[piece] = k / length;
    shareOfShear[piece] = f.shear / length;
  }
  const double cos2 = band.cos2, sin2 = band.sin2;
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double mean = state[i];
    const Interval x = intervalOf(state[laneSize + i], state[2 * laneSize + i], cos2, sin2);
    const auto at = [&](double X, double shear) {
      const double s1 = mean + X;
      const double s2 = mean - X;
      return __builtin_fabs(s1 * (s1 < 0 ? f.along[1] : f.along[0])) +
             __builtin_fabs(s2 * (s2 < 0 ? f.across[1] : f.across[0])) + __builtin_fabs(shear) * f.shear;
    };
    const auto still = [&](double ofX, double ofShear) {
      const double X = x.R * ofX;
      return ifInside(x, X, at(X, x.R * ofShear));
    };
    double u = greater(at(x.high, x.shearHigh), at(x.low, x.shearLow));
    u = greater(u, still(mean < 0 ? share[3] : share[0], mean < 0 ? shareOfShear[3] : shareOfShear[0]));
    u = greater(u, still(share[1], shareOfShear[1]));
    u = greater(u, still(share[2], shareOfShear[2]));
    keep(u * u, number, best[i], which[i]);
  }
}

} // namespace planewright
