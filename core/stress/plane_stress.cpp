// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/stress/plane_stress.h"

namespace planewright {

PlaneStress operator+(const PlaneStress& a, const PlaneStress& b) {
  return {a.sx + b.sx, a.sy + b.sy, a.txy + b.txy};
}

PlaneStress operator*(double factor, const PlaneStress& stress) {
  return {factor * stress.sx, factor * stress.sy, factor * stress.txy};
}

Traction tractionOn(const PlaneStress& stress, NormalAngle normal) {
  const PlaneStress turned = inTurnedAxes(stress, normal.value);
  return {turned.sx, turned.txy};
}

// Halves are taken before sums so that nothing overflows below 1e308; adding 0.0 turns -0 into 0.
PlaneStress inTurnedAxes(const PlaneStress& stress, Angle turn) {
  const double mean = stress.sx / 2 + stress.sy / 2;
  const double half = stress.sx / 2 - stress.sy / 2;
  const CosSin twice = cosSinOfDouble(turn);
  // On the given axes the given numbers come back to the last digit.
  if (twice.sin == 0)
    return twice.cos > 0 ? PlaneStress{stress.sx + 0.0, stress.sy + 0.0, stress.txy + 0.0}
                         : PlaneStress{stress.sy + 0.0, stress.sx + 0.0, 0.0 - stress.txy};
  return {mean + half * twice.cos + stress.txy * twice.sin + 0.0,
          mean - half * twice.cos - stress.txy * twice.sin + 0.0,
          stress.txy * twice.cos - half * twice.sin + 0.0};
}

LineStress inAxesOf(const PlaneStress& stress, LineAngle line) {
  const PlaneStress turned = inTurnedAxes(stress, line.value);
  return {turned.sx, turned.sy, turned.txy};
}

} // namespace planewright
