// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/clones.h"
#include "core/screen/kernels.h"

namespace planewright {

namespace {

/// atan(x)/x in degrees by x^2, for |x| up to tan 22.5 deg: interpolated at the Chebyshev nodes of degree 12
/// with 60 digits, off by 9e-16.
inline double degreesOver(double z) {
  double p = 0.8659549525873654;
  p = p * z - 1.9129814310429272;
  p = p * z + 2.5780240168682225;
  p = p * z - 2.989299908942649;
  p = p * z + 3.3671778536335757;
  p = p * z - 3.8194542676456464;
  p = p * z + 4.407352418546833;
  p = p * z - 5.208706637239543;
  p = p * z + 6.366197708899803;
  p = p * z - 8.185111358791413;
  p = p * z + 11.459155902614754;
  p = p * z - 19.098593171027435;
  return p * z + 57.29577951308232;
}

} // namespace

// The direction comes from the half angle: tan of it is |t|/(R + |d|), with d half the difference.
PW_CLONES
void principalLane(const double* __restrict__ sx, const double* __restrict__ sy,
                   const double* __restrict__ txy, double* __restrict__ s1, double* __restrict__ s2,
                   double* __restrict__ radius, double* __restrict__ theta1) {
  for (std::size_t i = 0; i < laneSize; ++i) {
    const double x = 0.5 * sx[i];
    const double y = 0.5 * sy[i];
    const double t = txy[i];
    const double mean = x + y;
    const double half = x - y;
    const double R = __builtin_sqrt(half * half + t * t);
    s1[i] = mean + R;
    s2[i] = mean - R;
    radius[i] = R;
    const double far = R + __builtin_fabs(half);
    const double tangent = __builtin_fabs(t) / (R > 0 ? far : 1);
    const bool isSteep = tangent > 0.41421356237309503;
    const double rest = isSteep ? (tangent - 1) / (tangent + 1) : tangent;
    const double angle = (isSteep ? 45.0 : 0.0) + rest * degreesOver(rest * rest);
    const double turned = half < 0 ? 90 - angle : angle;
    const bool isBelow = t < 0;
    const bool isNotUpright = turned < 90;
    theta1[i] = (isBelow & isNotUpright) ? -turned : turned;
  }
}

} // namespace planewright
