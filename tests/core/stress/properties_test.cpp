// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/stress/circle.h"

#include "tests/support/stress_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace planewright {
namespace {

bool close(double a, double b, double scale) {
  return std::abs(a - b) <= 1e-13 * (scale + 1e-300);
}

RC_GTEST_PROP(Rotation, keepsTheInvariants, ()) {
  const PlaneStress state = *anyStress();
  const PlaneStress turned = inTurnedAxes(state, *anyAngle());
  const double scale = scaleOf(state);
  RC_ASSERT(close(turned.sx + turned.sy, state.sx + state.sy, scale));
  RC_ASSERT(close(turned.sx * turned.sy - turned.txy * turned.txy,
                  state.sx * state.sy - state.txy * state.txy, scale * scale));
}

RC_GTEST_PROP(Rotation, isAGroup, ()) {
  const PlaneStress state = *anyStress();
  const Angle a = *anyAngle();
  const Angle b = *anyAngle();
  const PlaneStress once = inTurnedAxes(state, a + b);
  const PlaneStress twice = inTurnedAxes(inTurnedAxes(state, a), b);
  const double scale = scaleOf(state);
  RC_ASSERT(close(once.sx, twice.sx, scale) && close(once.sy, twice.sy, scale) &&
            close(once.txy, twice.txy, scale));
}

// The traction by Cauchy's relation, stress matrix times normal, resolved along n and t.
RC_GTEST_PROP(Rotation, agreesWithTheStressMatrix, ()) {
  const PlaneStress state = *anyStress();
  const Angle theta = *anyAngle();
  const double nx = std::cos(theta.radians());
  const double ny = std::sin(theta.radians());
  const double px = state.sx * nx + state.txy * ny;
  const double py = state.txy * nx + state.sy * ny;
  const Traction traction = tractionOn(state, {theta});
  const double scale = scaleOf(state);
  RC_ASSERT(close(traction.sn, px * nx + py * ny, scale));
  RC_ASSERT(close(traction.tnt, -px * ny + py * nx, scale));
}

RC_GTEST_PROP(Circle, everyPlaneLiesOnIt, ()) {
  const PlaneStress state = *anyStress();
  const Circle circle = circleOf(state);
  const Traction traction = tractionOn(state, {*anyAngle()});
  RC_ASSERT(close(std::hypot(traction.sn - circle.mean, traction.tnt), circle.radius, scaleOf(state)));
}

RC_GTEST_PROP(Circle, principalPlanesCarryThePrincipalValuesAndNoShear, ()) {
  const PlaneStress state = *anyStress();
  const Circle circle = circleOf(state);
  if (!circle.theta1)
    return;
  const double scale = scaleOf(state);
  const Traction first = tractionOn(state, *circle.theta1);
  const Traction second = tractionOn(state, *circle.theta2());
  RC_ASSERT(close(first.sn, circle.s1, scale) && close(first.tnt, 0, scale));
  RC_ASSERT(close(second.sn, circle.s2, scale) && close(second.tnt, 0, scale));
  RC_ASSERT(close(tractionOn(state, *circle.thetaTauMax).tnt, circle.radius, scale));
  RC_ASSERT(close(tractionOn(state, *circle.thetaTauMin()).tnt, -circle.radius, scale));
}

RC_GTEST_PROP(Circle, negatingTheStateTurnsTheFirstPrincipalPlaneByARightAngle, ()) {
  const PlaneStress state = *anyStress();
  const Circle circle = circleOf(state);
  const Circle negated = circleOf(-1.0 * state);
  RC_ASSERT(negated.s1 == -circle.s2);
  RC_ASSERT(circle.theta1.has_value() == negated.theta1.has_value());
  if (circle.theta1)
    RC_ASSERT(apart(circle.theta1->value, negated.theta1->value).degrees() >= 90 - 1e-12);
}

RC_GTEST_PROP(LineStress, theTwoCutsOfALineCarryOppositeShear, ()) {
  const PlaneStress state = *anyStress();
  const LineAngle line{*anyAngle()};
  const LineStress stress = inAxesOf(state, line);
  const double scale = scaleOf(state);
  const Traction across = tractionOn(state, following(line));
  RC_ASSERT(close(tractionOn(state, crossing(line)).sn, stress.along, scale));
  RC_ASSERT(close(across.sn, stress.across, scale));
  RC_ASSERT(close(across.tnt, -stress.shear, scale));
}

// The third normal stress takes part in the absolute greatest shear: with both principal stresses of one
// sign, half the greater one governs (common practice, no source).
RC_GTEST_PROP(Circle, absoluteGreatestShearIsHalfTheSpreadWithTheThirdStress, ()) {
  const PlaneStress state = *anyStress();
  const double s3 = *anyComponent();
  const Circle circle = circleOf(state, scaleOf(state), s3);
  RC_ASSERT(circle.tauAbsMax >= circle.radius - 1e-12 * (scaleOf(state) + std::abs(s3)));
  if (circle.s2 <= s3 && s3 <= circle.s1)
    RC_ASSERT(close(circle.tauAbsMax, circle.radius, scaleOf(state)));
  else
    RC_ASSERT(close(circle.tauAbsMax, std::max(std::abs(circle.s1 - s3), std::abs(circle.s2 - s3)) / 2,
                    scaleOf(state) + std::abs(s3)));
}

} // namespace
} // namespace planewright
