// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/stress/plane_stress.h"

#include <optional>

namespace planewright {

/// Mohr's circle of a state, with its principal values and planes.
///
/// mean = (sx+sy)/2, radius = hypot((sx-sy)/2, txy), s1 = mean + radius, s2 = mean - radius,
/// theta1 = atan2(2 txy, sx-sy)/2 folded to (-90, 90]. tnt is greatest (+radius) at theta1 - 45 deg, folded.
/// Relative error of the radius at most 4e-16, of s1 and s2 5e-16 of the larger, of theta1 5e-14 deg, for
/// components from 1e-300 to 1e300; the eigenvalue route is not used because it loses half the digits where
/// s1 and s2 are close. Formulas: common practice, no source.
struct Circle {
  double mean = 0;
  double radius = 0; ///< exactly 0 for a degenerate state
  double s1 = 0;
  double s2 = 0;
  std::optional<NormalAngle> theta1;      ///< none: every direction is principal
  std::optional<NormalAngle> thetaTauMax; ///< plane of the greatest positive tnt
  double tauAbsMax = 0;                   ///< half the spread of {s1, s2, s3}

  std::optional<NormalAngle> theta2() const;
  std::optional<NormalAngle> thetaTauMin() const;
  bool operator==(const Circle&) const = default;
};

/// The circle of `stress`. `scale` is sum |factor_i| max(|sx_i|, |sy_i|, |txy_i|), the size of the terms
/// before they cancelled: a radius of at most 8 eps scale counts as zero. `s3` is the third normal stress.
Circle circleOf(const PlaneStress& stress, double scale, double s3 = 0);
/// The same for a state given as it is: the scale is that of its own components.
Circle circleOf(const PlaneStress& stress);

/// Whether a value is no more than the rounding of terms of this size that cancelled: |value| <= 8 eps scale.
bool isRounding(double value, double scale);

/// 0 where a value is only rounding of terms of this size, else the value.
double withoutRounding(double value, double scale);
/// A sum of terms of this size without what is only their rounding: components, and a radius that is none of
/// theirs, become 0.
PlaneStress withoutRounding(PlaneStress sum, double scale);

/// max(|sx|, |sy|, |txy|).
double scaleOf(const PlaneStress& stress);

} // namespace planewright
