// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/circle_fit.h"

#include "tests/core/figure/studies.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

constexpr Box area{60, 10, 160, 100};

/// A fit with its study and readout, without labels at its sides.
struct Fitted {
  explicit Fitted(const Study& asked) : study(asked), readout(evaluate(study)) {
    fit = circleFitOf(settingOf(study, readout, order), {}, area, 40);
  }
  Study study;
  Readout readout;
  FigureOrder order;
  CircleFit fit;
};

TEST(CircleFit, hasOneScaleForBothAxesAndItsCircleInsideTheFrame) {
  for (unsigned seed = 0; seed < 500; ++seed) {
    Dice dice(seed);
    const Fitted fitted(someStudy(dice));
    const CircleFit& fit = fitted.fit;
    const Circle& circle = fitted.readout.state().circle;
    if (circle.radius == 0)
      continue;
    SCOPED_TRACE(seed);
    const Vec top = fit.at({circle.mean, circle.radius});
    const Vec right = fit.at({circle.s1, 0});
    EXPECT_NEAR(std::abs(top.y - fit.centre.y), fit.radius, 1e-6);
    EXPECT_NEAR(right.x - fit.centre.x, fit.radius, 1e-6);
    EXPECT_GT(fit.centre.x - fit.radius, fit.frame.left);
    EXPECT_LT(fit.centre.x + fit.radius, fit.frame.right);
    EXPECT_GT(fit.centre.y - fit.radius, fit.frame.top);
    EXPECT_GE(2 * fit.radius, 40);
  }
}

TEST(CircleFit, keepsTheOriginWhereItCostsLittle) {
  EXPECT_TRUE(Fitted(studyOf({80, 20, -30})).fit.showsZero());
  EXPECT_TRUE(Fitted(studyOf({-12, 0, 0})).fit.showsZero());
  EXPECT_FALSE(Fitted(studyOf({100, 98, 0.5})).fit.showsZero());
}

TEST(CircleFit, positiveShearStandsDownOrUp) {
  Study study = studyOf({8, -1, 2});
  const CircleFit down = Fitted(study).fit;
  EXPECT_GT(down.at({3.5, 1}).y, down.centre.y);
  EXPECT_DOUBLE_EQ(down.drawnTurn(Angle::fromDegrees(30)), 60);
  study.convention.shearAxis = ShearAxis::tensorUp;
  const CircleFit up = Fitted(study).fit;
  EXPECT_LT(up.at({3.5, 1}).y, up.centre.y);
  EXPECT_DOUBLE_EQ(up.drawnTurn(Angle::fromDegrees(30)), -60);
}

/// The point of a plane on the drawing is where turning by twice theta from x takes it, in both conventions.
TEST(CircleFit, thePointOfAPlaneTurnsAsTheConventionSays) {
  for (const ShearAxis axis : {ShearAxis::tensorDown, ShearAxis::tensorUp}) {
    Study study = studyOf({8, -1, 2});
    study.convention.shearAxis = axis;
    const Fitted fitted(study);
    const PlaneStress& stress = fitted.readout.state().stress;
    const Vec x = fitted.fit.at(tractionOn(stress, {})) - fitted.fit.centre;
    for (const double theta : {-80.0, -30.0, 10.0, 45.0, 90.0}) {
      const Angle turn = Angle::fromDegrees(theta);
      const CosSin by = cosSin(Angle::fromDegrees(fitted.fit.drawnTurn(turn)));
      const Vec turned{by.cos * x.x + by.sin * x.y,
                       -by.sin * x.x + by.cos * x.y}; // counter-clockwise, y down
      const Vec at = fitted.fit.at(tractionOn(stress, {turn})) - fitted.fit.centre;
      EXPECT_NEAR(at.x, turned.x, 1e-9);
      EXPECT_NEAR(at.y, turned.y, 1e-9);
    }
  }
}

TEST(RoundSteps, areOneTwoOrFiveTimesAPowerOfTen) {
  EXPECT_DOUBLE_EQ(roundSteps(0.9).step, 1);
  EXPECT_DOUBLE_EQ(roundSteps(1).step, 1);
  EXPECT_DOUBLE_EQ(roundSteps(1.01).step, 2);
  EXPECT_DOUBLE_EQ(roundSteps(2100).step, 5000);
  EXPECT_EQ(roundSteps(2100).decimals, 0);
  EXPECT_DOUBLE_EQ(roundSteps(0.0021).step, 0.005);
  EXPECT_EQ(roundSteps(0.0021).decimals, 3);
  for (unsigned seed = 0; seed < 1000; ++seed) {
    Dice dice(seed);
    const double least = std::pow(10.0, dice.within(-12, 12));
    const Steps steps = roundSteps(least);
    EXPECT_GE(steps.step, least * (1 - 1e-9));
    EXPECT_LE(steps.step, 2.5 * least * (1 + 1e-9));
  }
}

TEST(TickWords, zeroHasNoDecimals) {
  EXPECT_EQ(tickWords(0, {0.5, 1}), "0");
  EXPECT_EQ(tickWords(-0.5, {0.5, 1}), "−0.5");
}

} // namespace
} // namespace planewright
