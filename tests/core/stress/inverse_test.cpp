// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/stress/inverse.h"

#include "tests/support/stress_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace planewright {
namespace {

using Kind = PlanesOfValue::Kind;

NormalAngle normalAt(double degrees) {
  return {Angle::fromDegrees(degrees)};
}

// In pure tension of 100 MPa along x, sn = 50 MPa on the planes at +-45 deg (sn = s cos^2, common practice).
TEST(Inverse, findsBothPlanesAndTakesTheNearer) {
  const Circle circle = circleOf({100, 0, 0});
  const PlanesOfValue planes = planesOf(circle, Component::sn, {50, 0.5}, normalAt(30));
  ASSERT_EQ(planes.kind, Kind::two);
  EXPECT_NEAR(planes.first.value.degrees(), 45, 1e-12);
  EXPECT_NEAR(planes.second.value.degrees(), -45, 1e-12);
}

TEST(Inverse, ofATieTheSmallerAngleComesFirst) {
  const PlanesOfValue planes = planesOf(circleOf({100, 0, 0}), Component::sn, {50, 0}, normalAt(0));
  EXPECT_NEAR(planes.first.value.degrees(), -45, 1e-12);
}

// Seen from a principal plane the two planes of one sn are equally near: rounding must not choose.
TEST(Inverse, ofATieRoundingDoesNotChoose) {
  const Circle circle = circleOf({80, 20, -30});
  ASSERT_EQ(circle.theta1->value.degrees(), -22.5);
  for (const double sn : {10.0, 20.0, 35.0, 50.0, 64.0, 80.0, 91.0}) {
    const PlanesOfValue planes = planesOf(circle, Component::sn, {sn, 0}, *circle.theta1);
    ASSERT_EQ(planes.kind, Kind::two);
    EXPECT_LT(planes.first.value.degrees(), planes.second.value.degrees()) << sn;
  }
}

RC_GTEST_PROP(Inverse, ofATieTheSmallerAngleComesFirstInEveryState, ()) {
  const PlaneStress state = *anyStress();
  const Circle circle = circleOf(state);
  RC_PRE(circle.theta1.has_value());
  const double part = *rc::gen::inRange(-99, 100) / 100.0;
  const Component component = *rc::gen::element(Component::sn, Component::tnt);
  const double value = (component == Component::sn ? circle.mean : 0) + part * circle.radius;
  const NormalAngle top = component == Component::sn ? *circle.theta1 : *circle.thetaTauMax;
  const PlanesOfValue planes = planesOf(circle, component, {value, 0}, top);
  RC_PRE(planes.kind == Kind::two);
  RC_ASSERT(planes.first < planes.second);
}

TEST(Inverse, zeroShearMeansThePrincipalPlanes) {
  const Circle circle = circleOf({80, 20, -30});
  const PlanesOfValue planes = planesOf(circle, Component::tnt, {0, 0}, normalAt(-20));
  ASSERT_EQ(planes.kind, Kind::two);
  EXPECT_NEAR(planes.first.value.degrees(), -22.5, 1e-12);
  EXPECT_NEAR(planes.second.value.degrees(), 67.5, 1e-12);
}

TEST(Inverse, outOfReachSaysHowFarItReaches) {
  const PlanesOfValue planes = planesOf(circleOf({80, 20, -30}), Component::sn, {100, 0.5}, normalAt(0));
  EXPECT_EQ(planes.kind, Kind::outOfReach);
  EXPECT_NEAR(planes.least, 7.573593, 5e-7);
  EXPECT_NEAR(planes.greatest, 92.426407, 5e-7);
}

// Typed 92.43 stands for 92.425 to 92.435, which holds s1 = 92.4264: within the spread sn is at least 92.425.
TEST(Inverse, aTargetThatRoundsToThePrincipalValueTouchesIt) {
  const PlaneStress state{80, 20, -30};
  const PlanesOfValue planes = planesOf(circleOf(state), Component::sn, {92.43, 0.005}, normalAt(0));
  ASSERT_EQ(planes.kind, Kind::touching);
  EXPECT_EQ(planes.first.value.degrees(), -22.5);
  EXPECT_GT(planes.spread.degrees(), 0);
  const Traction edge = tractionOn(state, {planes.first.value + planes.spread});
  EXPECT_NEAR(edge.sn, 92.425, 1e-9);
}

TEST(Inverse, touchesTheLeastValueToo) {
  const PlaneStress state{80, 20, -30};
  const PlanesOfValue planes = planesOf(circleOf(state), Component::sn, {7.57, 0.005}, normalAt(0));
  ASSERT_EQ(planes.kind, Kind::touching);
  EXPECT_EQ(planes.first.value.degrees(), 67.5);
  EXPECT_NEAR(tractionOn(state, {planes.first.value + planes.spread}).sn, 7.575, 1e-9);
}

TEST(Inverse, aDegenerateStateHasTheValueEverywhereOrNowhere) {
  const Circle circle = circleOf({5, 5, 0});
  EXPECT_EQ(planesOf(circle, Component::sn, {5, 0.5}, normalAt(12)).kind, Kind::every);
  EXPECT_EQ(planesOf(circle, Component::sn, {6, 0.5}, normalAt(12)).kind, Kind::outOfReach);
  EXPECT_EQ(planesOf(circle, Component::tnt, {0, 0}, normalAt(12)).kind, Kind::every);
}

RC_GTEST_PROP(Inverse, findsThePlaneItCameFrom, ()) {
  const PlaneStress state = *anyStress();
  const Circle circle = circleOf(state);
  const NormalAngle theta{folded(*anyAngle())};
  const Component component = *rc::gen::element(Component::sn, Component::tnt);
  const Traction traction = tractionOn(state, theta);
  const double value = component == Component::sn ? traction.sn : traction.tnt;
  const double half = 1e-12 * scaleOf(state);
  const PlanesOfValue planes = planesOf(circle, component, {value, half}, theta);
  RC_ASSERT(planes.kind != Kind::outOfReach);
  if (planes.kind == Kind::every)
    return;
  const Angle off = apart(planes.first.value, theta.value);
  // An error of 1e-12 in the value is one of 1e-6 rad in the angle where the circle is steepest.
  RC_ASSERT(off.degrees() <= planes.spread.degrees() + 1e-4);
  const Traction found = tractionOn(state, planes.first);
  RC_ASSERT(std::abs((component == Component::sn ? found.sn : found.tnt) - value) <=
            half + 1e-13 * scaleOf(state));
  if (planes.kind == Kind::two) {
    const Traction other = tractionOn(state, planes.second);
    RC_ASSERT(std::abs((component == Component::sn ? other.sn : other.tnt) - value) <=
              1e-11 * scaleOf(state));
  }
}

} // namespace
} // namespace planewright
