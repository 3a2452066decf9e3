// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/free_edge.h"
#include "core/source/pressure.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

bool contains(const std::vector<Text>& texts, const char* words) {
  for (const Text& text : texts)
    if (plain(text).find(words) != std::string::npos)
      return true;
  return false;
}

// Lord, Richardson, Davison, Dillard: Strength of Materials (2026), Example 13.1: cylinder of 8 ft outside
// diameter, 2 in thick, under 250 psi: hoop 5750 psi, axial 2875 psi. Read in the work itself.
TEST(Pressure, hoopAndAxialStressOfAPrintedExample) {
  const auto psi = 6.894757293168361e-3;
  const auto contribution = contributionOf(Vessel{250 * psi, 46 * 25.4, 2 * 25.4, true});
  ASSERT_TRUE(contribution);
  EXPECT_NEAR(contribution->stress.sy / psi, 5750, 0.5);
  EXPECT_NEAR(contribution->stress.sx / psi, 2875, 0.5);
  EXPECT_EQ(contribution->stress.txy, 0);
  EXPECT_FALSE(contains(contribution->cautions, "not thin"));
}

TEST(Pressure, openEndsCarryNoAxialStress) {
  const auto contribution = contributionOf(Vessel{1.5, 90, 10, false});
  ASSERT_TRUE(contribution);
  EXPECT_EQ(contribution->stress.sx, 0);
  EXPECT_NEAR(contribution->stress.sy, 13.5, 1e-12);
  EXPECT_TRUE(contains(contribution->signRules, "ends are open"));
}

TEST(Pressure, aThickWallIsCautionedWithTheNumberOfLame) {
  const auto contribution = contributionOf(Vessel{10, 50, 10, true});
  ASSERT_TRUE(contribution);
  // (60^2 + 50^2)/((60 + 50) 50) = 1.109 by hand.
  EXPECT_TRUE(contains(contribution->cautions, "r/t = 5.0 is below 10"))
      << plain(contribution->cautions.front());
  EXPECT_TRUE(contains(contribution->cautions, "1.11 times"));
}

TEST(Pressure, lengthsThatAreNoneAreRefusedTogether) {
  const auto contribution = contributionOf(Vessel{10, 0, -1, true});
  ASSERT_FALSE(contribution);
  ASSERT_EQ(contribution.error().size(), 2u);
  EXPECT_EQ(contribution.error()[0].place, "r");
  EXPECT_EQ(contribution.error()[1].place, "t");
}

TEST(Pressure, theWorkingEvaluatesToTheResult) {
  const auto contribution = contributionOf(Vessel{1.5, 90, 5, true});
  ASSERT_TRUE(contribution);
  for (const Step& step : contribution->steps)
    EXPECT_NEAR(step.formula.valueWith(step.putIn), step.result, 1e-12) << plain(written(step));
}

TEST(FreeEdge, carriesNothingWhereTheStressRunsAlongIt) {
  const PlaneStress along =
      inTurnedAxes({12, 0, 0}, Angle::fromDegrees(-20)); // 12 MPa in the direction of 20 deg
  const FreeEdge edge = freeEdgeOf(along, {Angle::fromDegrees(20)});
  EXPECT_NEAR(edge.traction.sn, 0, 1e-14);
  EXPECT_NEAR(edge.traction.tnt, 0, 1e-14);
  EXPECT_NEAR(edge.share(), 0, 1e-15);
}

TEST(FreeEdge, aWrongSignOfTheShearShowsAtOnce) {
  PlaneStress wrong = inTurnedAxes({12, 0, 0}, Angle::fromDegrees(-20));
  wrong.txy = -wrong.txy;
  EXPECT_GT(freeEdgeOf(wrong, {Angle::fromDegrees(20)}).share(), 0.5);
  EXPECT_EQ(freeEdgeOf({}, {Angle()}).share(), 0);
}

} // namespace
} // namespace planewright
