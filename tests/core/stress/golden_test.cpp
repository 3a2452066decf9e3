// SPDX-License-Identifier: GPL-3.0-or-later
// The golden numbers of the contract (own arithmetic, two routes).
#include "core/stress/circle.h"
#include "core/stress/plane_stress.h"

#include <gtest/gtest.h>

#include <cmath>

namespace planewright {
namespace {

constexpr PlaneStress golden{80, 20, -30};
NormalAngle normalAt(double degrees) {
  return {Angle::fromDegrees(degrees)};
}

TEST(Golden, circleOfTheState) {
  const Circle circle = circleOf(golden);
  EXPECT_EQ(circle.mean, 50);
  EXPECT_NEAR(circle.radius, 42.426407, 5e-7);
  EXPECT_NEAR(circle.s1, 92.426407, 5e-7);
  EXPECT_NEAR(circle.s2, 7.573593, 5e-7);
  ASSERT_TRUE(circle.theta1);
  EXPECT_EQ(circle.theta1->value.degrees(), -22.5);
  EXPECT_EQ(circle.thetaTauMax->value.degrees(), -67.5);
  EXPECT_NEAR(circle.tauAbsMax, 46.213203, 5e-7);
}

TEST(Golden, normalAt25) {
  const Traction traction = tractionOn(golden, normalAt(25));
  EXPECT_NEAR(traction.sn, 46.302295, 5e-7);
  EXPECT_NEAR(traction.tnt, -42.264962, 5e-7);
}

TEST(Golden, lineOneInTen) {
  const LineAngle line{Angle::fromRadians(std::atan(0.1))};
  EXPECT_NEAR(line.value.degrees(), 5.710593, 5e-7);
  const LineStress stress = inAxesOf(golden, line);
  EXPECT_NEAR(stress.along, 73.465347, 5e-7);
  EXPECT_NEAR(stress.across, 26.534653, 5e-7);
  EXPECT_NEAR(stress.shear, -35.346535, 5e-7);
  EXPECT_NEAR(following(line).value.degrees(), -84.289407, 5e-7);
  EXPECT_NEAR(tractionOn(golden, following(line)).tnt, 35.346535, 5e-7);
}

TEST(Golden, theSameBodyWithCompressionPositive) {
  const Circle negated = circleOf({-80, -20, 30});
  EXPECT_NEAR(negated.s1, -7.573593, 5e-7);
  EXPECT_NEAR(negated.s2, -92.426407, 5e-7);
  EXPECT_EQ(negated.theta1->value.degrees(), 67.5);
}

TEST(Degenerate, noFalseAngleWhereTermsCancelled) {
  EXPECT_FALSE(circleOf({5, 5, 0}).theta1);
  EXPECT_FALSE(circleOf({0, 0, 0}).theta1);
  const Circle cancelled = circleOf({1e-13, 0, 0}, 1000);
  EXPECT_EQ(cancelled.radius, 0);
  EXPECT_FALSE(cancelled.theta1);
  EXPECT_FALSE(cancelled.thetaTauMax);
  EXPECT_TRUE(circleOf({1e-13, 0, 0}).theta1);
}

TEST(Exact, givenComponentsComeBackOnTheirOwnFaces) {
  const PlaneStress state{0.1, 0.3, -0.7};
  EXPECT_EQ(tractionOn(state, normalAt(0)), (Traction{0.1, -0.7}));
  EXPECT_EQ(tractionOn(state, normalAt(90)), (Traction{0.3, 0.7}));
  EXPECT_EQ(tractionOn({0, 0, 3}, normalAt(45)), (Traction{3, 0}));
  EXPECT_FALSE(std::signbit(tractionOn({0, 0, 0}, normalAt(33)).tnt));
}

} // namespace
} // namespace planewright
