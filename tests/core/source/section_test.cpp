// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/region.h"

#include "tests/support/section_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

std::string problemOf(const Section& section) {
  const Problems problems = problemsOf(section);
  return problems.empty() ? "none" : plain(problems.front());
}

TEST(SectionShape, wordsReadBack) {
  for (const Named<SectionShape>& row : namesOf<SectionShape>())
    EXPECT_EQ(fromWord<SectionShape>(wordOf(row.value)), row.value);
  EXPECT_EQ(namesOf<SectionShape>().size(), 9u);
  EXPECT_EQ(blockKey(12, "turn"), "12.turn");
}

TEST(Section, soundOnesHaveNoProblem) {
  EXPECT_EQ(problemOf(rectangleSection(90, 240)), "none");
  EXPECT_EQ(problemOf(tubeSection(114.3, 5)), "none");
  EXPECT_EQ(problemOf(boxSection(100, 200, 6, 8)), "none");
  EXPECT_EQ(problemOf(iSection(300, 7.1, 150, 10.7, 150, 10.7, 15)), "none");
  EXPECT_EQ(problemOf(channelSection(200, 75, 8, 11)), "none");
  EXPECT_EQ(problemOf(builtSection({{90, 40, 0, 0, {}}, {40, 90, 65, 0, {}}})), "none");
  EXPECT_EQ(problemOf({SectionShape::tabled, {}}), "none");
  EXPECT_EQ(problemOf({SectionShape::tabled, {{"A", 1200}, {"S_z", 0}}}), "none");
}

TEST(Section, sizesThatMakeNoSectionAreNamedWithAMend) {
  EXPECT_EQ(problemOf(rectangleSection(-90, 240)),
            "b: The width must be greater than zero. Give it without a sign.");
  EXPECT_EQ(problemOf({SectionShape::rectangle, {{"b", 90}}}), "h: The depth is missing. Give it.");
  EXPECT_EQ(problemOf({SectionShape::circle, {{"d", 90}, {"h", 9}}}),
            "h: This shape has no size h. Leave it out, or choose the shape that has it.");
  EXPECT_EQ(problemOf(tubeSection(100, 50)),
            "t: This wall is as thick as half the diameter or thicker. Give a "
            "thinner wall, or choose the solid shape.");
  EXPECT_EQ(problemOf(boxSection(100, 200, 60, 8)).substr(0, 4), "t_w:");
  EXPECT_EQ(problemOf(iSection(300, 7.1, 150, 150, 150, 150, 0)).substr(0, 6), "t_top:");
  EXPECT_EQ(problemOf(iSection(300, 7.1, 40, 10, 150, 10, 20)),
            "r: The root fillets do not fit between web and flanges. Give a smaller radius, or 0 for sharp "
            "corners.");
  EXPECT_EQ(problemOf(iSection(300, 7.1, 150, 10, 150, 10, -1)).substr(0, 2), "r:");
  EXPECT_EQ(problemOf(tSection(100, 80, 90, 10)).substr(0, 4), "t_w:");
  EXPECT_EQ(problemOf(channelSection(100, 80, 10, 50)).substr(0, 4), "t_f:");
  EXPECT_EQ(problemsOf(rectangleSection(-1, 0)).size(), 2u);
}

TEST(Section, blocksMustTouchAndNotOverlap) {
  EXPECT_EQ(problemOf({SectionShape::built, {}}).substr(0, 4), "1.b:");
  EXPECT_EQ(problemOf(builtSection({{90, 40, 0, 0, {}}, {40, 90, 60, 0, {}}})),
            "2.b: Block 2 overlaps block 1. Move one of them so that they only touch.");
  EXPECT_EQ(
      problemOf(builtSection({{90, 40, 0, 0, {}}, {40, 90, 70, 0, {}}})),
      "2.b: Block 2 does not hang together with block 1. Move it until edges touch; a section of loose parts "
      "does not bend as one.");
  // Corners alone hold nothing; a turned block may stand on an edge of another.
  EXPECT_NE(problemOf(builtSection({{40, 40, 0, 0, {}}, {40, 40, 40, 40, {}}})), "none");
  const double half = 20 * std::sqrt(2.0);
  EXPECT_NE(problemOf(builtSection({{90, 40, 0, 0, {}}, {40, 40, 20 + half, 0, Angle::fromDegrees(45)}})),
            "none");
  EXPECT_EQ(
      problemOf(builtSection({{40, 40, 0, 0, Angle::fromDegrees(30)},
                              {40, 40, 40 * std::cos(std::numbers::pi / 6), -20, Angle::fromDegrees(30)}})),
      "none");
  Section gap = builtSection({{90, 40, 0, 0, {}}, {40, 90, 65, 0, {}}});
  for (const char* key : {"b", "h", "y", "z", "turn"}) {
    gap.sizes[blockKey(3, key)] = gap.sizes[blockKey(2, key)];
    gap.sizes.erase(blockKey(2, key));
  }
  EXPECT_EQ(problemOf(gap).substr(0, 4), "3.b:");
}

TEST(Region, knowsWhereMaterialIs) {
  const Region region = regionOf(iSection(300, 8, 150, 10, 150, 10, 0));
  EXPECT_DOUBLE_EQ(region.yHigh, 150);
  EXPECT_TRUE(contains(region, 150, 75));
  EXPECT_TRUE(contains(region, 0, 4));
  EXPECT_FALSE(contains(region, 0, 4.001));
  EXPECT_TRUE(contains(region, 140, 50));
  EXPECT_FALSE(contains(region, 139.999, 50));
  EXPECT_EQ(levelsOf(region).size(), 4u);
  EXPECT_TRUE(isMirrored(region));
  EXPECT_FALSE(isMirrored(regionOf(channelSection(200, 75, 8, 11))));
  EXPECT_TRUE(isMirrored(transposed(regionOf(channelSection(200, 75, 8, 11)))));
}

// Placed by different sums of the same sizes, touching blocks still share their levels.
TEST(Region, roundingLeavesNoGapBetweenBlocks) {
  const Region region = regionOf(builtSection({{0.3, 0.1, 0.05, 0, {}}, {0.1, 0.7, 0.1 + 0.7 / 2, 0, {}}}));
  EXPECT_EQ(levelsOf(region).size(), 3u);
  EXPECT_TRUE(contains(region, levelsOf(region)[1], 0.1));
}

RC_GTEST_PROP(Outline, isThatOfThePieces, ()) {
  const Section section = anySection();
  RC_PRE(problemsOf(section).empty());
  const Region region = regionOf(section);
  AreaMoments outline;
  for (const Contour& contour : outlineOf(section))
    outline = outline + momentsOf(contour);
  const double scale = region.moments.yy + region.moments.zz;
  RC_ASSERT(std::abs(outline.area - region.moments.area) <= 1e-12 * region.moments.area);
  RC_ASSERT(std::abs(outline.yy - region.moments.yy) <= 1e-12 * scale);
  RC_ASSERT(std::abs(outline.zz - region.moments.zz) <= 1e-12 * scale);
  RC_ASSERT(std::abs(outline.yz) <= 1e-11 * scale);
}

} // namespace
} // namespace planewright
