// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/cut_properties.h"

#include "core/source/section_properties.h"
#include "tests/support/section_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

TEST(Cut, ofARectangle) {
  const Region region = regionOf(rectangleSection(90, 240));
  const Cut axis = cutAt(region, 0);
  EXPECT_DOUBLE_EQ(axis.S, 90.0 * 240 * 240 / 8);
  EXPECT_DOUBLE_EQ(axis.width, 90);
  EXPECT_DOUBLE_EQ(axis.area, 90 * 120);
  EXPECT_EQ(axis.walls, 1);
  EXPECT_FALSE(axis.isAtJunction());
  EXPECT_EQ(cutAt(region, 120).S, 0);
  EXPECT_EQ(cutAt(region, -120).S, 0);
  EXPECT_DOUBLE_EQ(cutAt(region, -120).width, 90);
}

// 2 r^3/3 over a width of d: the known 4/3 of the mean shear.
TEST(Cut, ofACircle) {
  const Cut axis = cutAt(regionOf(circleSection(60)), 0);
  EXPECT_NEAR(axis.S, 18000, 1e-9);
  EXPECT_DOUBLE_EQ(axis.width, 60);
}

TEST(Cut, atAJunctionTakesTheThinnerSide) {
  const Region region = regionOf(iSection(300, 8, 150, 10, 150, 10, 0));
  for (const double y : {140.0, -140.0}) {
    const Cut cut = cutAt(region, y);
    EXPECT_TRUE(cut.isAtJunction());
    EXPECT_DOUBLE_EQ(cut.width, 8);
    EXPECT_DOUBLE_EQ(cut.wider, 150);
    EXPECT_NEAR(cut.S, 150 * 10 * 145, 1e-6);
  }
}

TEST(Cut, ofAHollowSectionSumsItsWalls) {
  const Cut cut = cutAt(regionOf(boxSection(100, 200, 6, 8)), 0);
  EXPECT_EQ(cut.walls, 2);
  EXPECT_DOUBLE_EQ(cut.width, 12);
  EXPECT_FALSE(wallCutAt(regionOf(boxSection(100, 200, 6, 8)), 0, 47));
  EXPECT_FALSE(wallCutAt(regionOf(tubeSection(100, 5)), 0, 47));
}

// An upright cut through one flange takes off its outstand: t (b/2 - z) h_m/2 about the level axis.
TEST(Cut, throughOneFlangeTakesOffItsOutstand) {
  const Region turned = transposed(regionOf(iSection(300, 8, 150, 10, 150, 10, 0)));
  const std::optional<Cut> top = wallCutAt(turned, 4, 145);
  ASSERT_TRUE(top);
  EXPECT_DOUBLE_EQ(top->width, 10);
  EXPECT_NEAR(top->across, 71 * 10 * 145, 1e-6);
  EXPECT_NEAR(top->S, 71 * 10 * (4 + 71 / 2.0), 1e-6);
  const std::optional<Cut> bottom = wallCutAt(turned, 4, -145);
  ASSERT_TRUE(bottom);
  EXPECT_NEAR(bottom->across, -71 * 10 * 145, 1e-6);
  // On the left the part beyond is everything but the outstand.
  const std::optional<Cut> left = wallCutAt(turned, -40, 145);
  ASSERT_TRUE(left);
  EXPECT_NEAR(left->across, -35 * 10 * 145, 1e-6);
}

TEST(Cut, throughRootFilletsKeepsToItsWall) {
  const Region region = regionOf(iSection(300, 8, 150, 10, 150, 10, 15));
  const std::optional<Cut> cut = wallCutAt(transposed(region), 8, 145);
  ASSERT_TRUE(cut);
  EXPECT_GT(cut->width, 10);
  EXPECT_LT(cut->width, 25);
  EXPECT_GT(cut->across, 67 * 10 * 145);
}

TEST(Cut, throughOneLegOfABuiltFork) {
  // A level bar with two legs; the cut through the right leg takes off nothing of the left one.
  const Region region =
      regionOf(builtSection({{100, 10, 0, 0, {}}, {10, 50, 30, -45, {}}, {10, 50, 30, 45, {}}}));
  const double centroid = 1000.0 * 30 / 2000;
  const std::optional<Cut> cut = wallCutAt(region, 30 - centroid, 45);
  ASSERT_TRUE(cut);
  EXPECT_DOUBLE_EQ(cut->width, 10);
  EXPECT_NEAR(cut->S, 250 * (42.5 - centroid), 1e-9);
  EXPECT_NEAR(cut->across, 250 * 45, 1e-9);
}

RC_GTEST_PROP(Cut, firstMomentIsZeroAtFreeEdgesAndGreatestAtTheAxis, ()) {
  const Section section = anySection();
  RC_PRE(problemsOf(section).empty());
  const Region region = regionOf(section);
  RC_ASSERT(cutAt(region, region.yHigh).S == 0);
  RC_ASSERT(cutAt(region, region.yLow).S == 0);
  const double y = region.yLow + (region.yHigh - region.yLow) * *rc::gen::inRange(0, 1001) / 1000;
  RC_ASSERT(cutAt(region, y).S >= 0);
  RC_ASSERT(cutAt(region, y).S <= cutAt(region, 0).S);
}

// Integrating S over the depth gives I: by parts, S' = -y b and S = 0 at both ends.
RC_GTEST_PROP(Cut, firstMomentsOverTheDepthSumToTheSecond, ()) {
  const Section section = anySection();
  RC_PRE(problemsOf(section).empty());
  const Region region = regionOf(section);
  constexpr int steps = 2000;
  const double thin = (region.yHigh - region.yLow) / steps;
  double sum = 0;
  for (int i = 0; i < steps; ++i)
    sum += thin * cutAt(region, region.yLow + (i + 0.5) * thin).S;
  RC_ASSERT(std::abs(sum - region.moments.yy) <= 1e-4 * region.moments.yy);
}

RC_GTEST_PROP(Cut, isThatOfTheSameShapeBuiltOfRectangles, ()) {
  const Section section = anySharpSection();
  RC_PRE(problemsOf(section).empty());
  const Region a = regionOf(section);
  const Region b = regionOf(rebuilt(section));
  const double y = a.yLow + (a.yHigh - a.yLow) * *rc::gen::inRange(1, 1000) / 1000;
  const Cut cut = cutAt(a, y);
  const Cut other = cutAt(b, y);
  RC_ASSERT(std::abs(cut.S - other.S) <= 1e-9 * cutAt(a, 0).S);
  RC_ASSERT(std::abs(cut.width - other.width) <= 1e-9 * cut.width && cut.walls == other.walls);
}

} // namespace
} // namespace planewright
