// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/distribution.h"

#include "core/stress/circle.h"
#include "tests/support/section_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace planewright {
namespace {

SectionModel model(const Section& section) {
  return modelOf(section).value();
}

double s1(const PlaneStress& stress) {
  return circleOf(stress).s1;
}
double shear(const PlaneStress& stress) {
  return std::abs(stress.txy);
}

const SectionModel joist = model(iSection(300, 8, 150, 10, 150, 10, 0));

TEST(Distribution, showsBothSidesOfAJunction) {
  const auto drawn = distributionThrough(joist, {.Vy = 50e3, .Mz = 10e6}, {0, 4}, ShearRule::upward);
  ASSERT_TRUE(drawn);
  ASSERT_EQ(drawn->sx.size(), 1u);
  EXPECT_DOUBLE_EQ(drawn->sx[0].front().at, -150);
  EXPECT_DOUBLE_EQ(drawn->sx[0].back().at, 150);
  EXPECT_NEAR(drawn->sx[0].front().value, -drawn->sx[0].back().value, 1e-9);
  ASSERT_EQ(drawn->txy.size(), 1u);
  const Curve& curve = drawn->txy[0];
  EXPECT_EQ(curve.front().value, 0);
  EXPECT_EQ(curve.back().value, 0);
  // At the junction the shear jumps by the ratio of the widths.
  double least = 1e300, greatest = 0;
  for (const CurvePoint& point : curve)
    if (std::abs(point.at - 140) < 1e-5) {
      least = std::min(least, point.value);
      greatest = std::max(greatest, point.value);
    }
  EXPECT_NEAR(greatest / least, 150.0 / 8, 1e-4);
}

TEST(Distribution, leavesGapsWhereTheoryGivesNone) {
  const auto drawn = distributionThrough(joist, {.Vy = 50e3, .T = 1e5}, {0, 4}, ShearRule::upward);
  ASSERT_TRUE(drawn);
  ASSERT_EQ(drawn->txy.size(), 1u);
  EXPECT_NEAR(drawn->txy[0].front().at, -140, 1e-5);
  EXPECT_NEAR(drawn->txy[0].back().at, 140, 1e-5);
  const auto across =
      distributionThrough(model(boxSection(100, 200, 5, 8)), {.Mz = 1e6}, {0, 0}, ShearRule::upward);
  ASSERT_TRUE(across);
  EXPECT_EQ(across->sx.size(), 2u);
  EXPECT_EQ(across->txy.size(), 2u);
}

TEST(Distribution, fromTheTopRunsAlongZ) {
  const auto drawn =
      distributionThrough(joist, {.Vy = 50e3, .My = 1e6}, {150, 0, View::top}, ShearRule::upward);
  ASSERT_TRUE(drawn);
  EXPECT_DOUBLE_EQ(drawn->sx[0].front().at, -75);
  EXPECT_LT(drawn->sx[0].front().value, 0);
  EXPECT_EQ(drawn->txy[0].front().value, 0);
}

TEST(Distribution, hasProblemsWhereThereIsNothingToLookAlong) {
  const auto tabled =
      distributionThrough(model({SectionShape::tabled, {{"A", 1}}}), {}, {}, ShearRule::upward);
  EXPECT_EQ(plain(tabled.error()), "Tabled values have no shape to look along. Choose a shape with sizes.");
  EXPECT_FALSE(distributionThrough(joist, {}, {0, 80}, ShearRule::upward));
  EXPECT_FALSE(worstFibre(joist, {}, {0, 80}, ShearRule::upward, s1));
}

TEST(WorstFibre, isWhereItIsKnownToBe) {
  const SectionModel beam = model(rectangleSection(90, 240));
  const auto bent = worstFibre(beam, {.Mz = 10e6}, {0, 45}, ShearRule::upward, s1);
  ASSERT_TRUE(bent);
  EXPECT_DOUBLE_EQ(bent->fibre.y, -120);
  EXPECT_EQ(bent->fibre.z, 45);
  const auto sheared = worstFibre(beam, {.Vy = 10e3, .Mz = 10e6}, {0, 45}, ShearRule::upward, shear);
  ASSERT_TRUE(sheared);
  EXPECT_EQ(sheared->fibre.y, 0);
  EXPECT_FALSE(sheared->isPartial);
  EXPECT_NEAR(sheared->measure, 1.5 * 10e3 / 21600, 1e-12);
  const auto round = worstFibre(model(circleSection(60)), {.T = 1e6}, {0, 30}, ShearRule::upward, shear);
  ASSERT_TRUE(round);
  EXPECT_EQ(round->fibre, (Fibre{0, 30}));
}

// In a short deep joist s1 is greatest in the web beside the flange, not at the extreme fibre.
TEST(WorstFibre, findsTheJunction) {
  const auto worst = worstFibre(joist, {.Vy = 250e3, .Mz = 20e6}, {0, 4}, ShearRule::upward, s1);
  ASSERT_TRUE(worst);
  EXPECT_GT(worst->fibre.y, -140.001);
  EXPECT_LT(worst->fibre.y, -1);
}

TEST(WorstFibre, saysWhenPartOfTheDepthWasNotJudged) {
  const auto worst =
      worstFibre(model(rectangleSection(90, 240)), {.Vy = 10e3, .T = 1e5}, {0, 45}, ShearRule::upward, shear);
  ASSERT_TRUE(worst);
  EXPECT_TRUE(worst->isPartial);
  EXPECT_EQ(worst->fibre.y, 0);
}

RC_GTEST_PROP(WorstFibre, noFinerScanFindsAWorseOne, ()) {
  const Section section = anySection();
  RC_PRE(problemsOf(section).empty());
  const SectionModel made = model(section);
  const auto any = [] { return *rc::gen::inRange(-1000, 1001); };
  const SectionForces forces{any() * 100.0, any() * 300.0, 0, 0, 0, any() * 3e4};
  const Fibre near = section.shape == SectionShape::circle || section.shape == SectionShape::tube
                         ? Fibre{0, 0}
                         : Fibre{0, spansAt(made.region, 0, Side::above).back().to};
  for (const Measure& measure : {Measure(s1), Measure(shear)}) {
    const auto worst = worstFibre(made, forces, near, ShearRule::upward, measure);
    RC_ASSERT(worst.has_value());
    const double depth = made.region.yHigh - made.region.yLow;
    for (int i = 0; i <= 1000; ++i) {
      const auto stress =
          stressAt(made, forces, {made.region.yLow + depth * i / 1000, near.z}, ShearRule::upward);
      if (stress)
        RC_ASSERT(measure(stress->stress) <= worst->measure + 1e-7 * (std::abs(worst->measure) + 1e-6));
    }
  }
}

} // namespace
} // namespace planewright
