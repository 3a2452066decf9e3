// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/stress/plane_stress.h"

namespace planewright {

PlaneStress operator+(const PlaneStress& a, const PlaneStress& b) {
  return {a.sx + b.sx, a.sy + b.sy, a.txy + b.txy};
}

PlaneStress operator*(double factor, const PlaneStress& stress) {
  return {factor * stress.sx, factor * stress.sy, factor * stress.txy};
}

// Halves are taken before sums so that nothing overflows below 1e308; adding 0.0 turns -0 into 0.
Traction tractionOn(const PlaneStress& stress, NormalAngle normal) {
  const double mean = stress.sx / 2 + stress.sy / 2;
  const double half = stress.sx / 2 - stress.sy / 2;
  const CosSin twice = cosSinOfDouble(normal.value);
  // On the given axes the given numbers come back to the last digit.
  if (twice.sin == 0)
    return twice.cos > 0 ? Traction{stress.sx + 0.0, stress.txy + 0.0}
                         : Traction{stress.sy + 0.0, 0.0 - stress.txy};
  return {mean + half * twice.cos + stress.txy * twice.sin + 0.0,
          stress.txy * twice.cos - half * twice.sin + 0.0};
}

PlaneStress inTurnedAxes(const PlaneStress& stress, Angle turn) {
  const Traction x = tractionOn(stress, {turn});
  const Traction y = tractionOn(stress, {turn + Angle::fromDegrees(90)});
  return {x.sn, y.sn, x.tnt};
}

LineStress inAxesOf(const PlaneStress& stress, LineAngle line) {
  const PlaneStress turned = inTurnedAxes(stress, line.value);
  return {turned.sx, turned.sy, turned.txy};
}

} // namespace planewright
