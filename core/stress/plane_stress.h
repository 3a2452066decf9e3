// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "core/quantity/angle.h"

namespace planewright {

/// Plane stress at a point in axes x, y: normal stresses tension positive, txy positive on the +x face in the
/// +y direction. All three in one unit (the study's base is N/mm2 = MPa). In a study with compression
/// positive the same type holds the negated tensor; every formula below is the same for both.
struct PlaneStress {
  double sx = 0;
  double sy = 0;
  double txy = 0;
  bool operator==(const PlaneStress&) const = default;
};

PlaneStress operator+(const PlaneStress& a, const PlaneStress& b);
PlaneStress operator*(double factor, const PlaneStress& stress);

/// The state written in axes turned by `turn` counter-clockwise.
/// sx' = sn(turn), sy' = sn(turn + 90 deg), txy' = tnt(turn). Common practice, no source.
PlaneStress inTurnedAxes(const PlaneStress& stress, Angle turn);

/// What acts on the plane with normal at theta, n = (cos, sin), t = n turned by +90 deg.
struct Traction {
  double sn = 0;  ///< (sx+sy)/2 + (sx-sy)/2 cos 2theta + txy sin 2theta
  double tnt = 0; ///< -(sx-sy)/2 sin 2theta + txy cos 2theta, positive towards t
  bool operator==(const Traction&) const = default;
};
Traction tractionOn(const PlaneStress& stress, NormalAngle normal);

/// The state in the axes of a line at phi.
struct LineStress {
  double along = 0;  ///< sn(phi): acts on the cut that crosses the line
  double across = 0; ///< sn(phi + 90 deg): acts on the cut that follows the line
  double shear = 0;  ///< tnt(phi): on the crossing cut, positive towards line + 90 deg
  bool operator==(const LineStress&) const = default;
};
LineStress inAxesOf(const PlaneStress& stress, LineAngle line);

} // namespace planewright
