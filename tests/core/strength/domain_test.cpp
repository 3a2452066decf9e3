// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/cautions.h"
#include "core/strength/slope_of_faces.h"
#include "tests/support/strength_gen.h"

#include <gtest/gtest.h>

#include <cmath>

namespace planewright {
namespace {

std::string refused(Criterion criterion, const Strengths& f, const PlaneStress& stress,
                    const Parameters& parameters = {}) {
  const auto judge = Judge::of(criterion, f, parameters, demandOf(stress));
  return judge ? "" : plain(judge.error().what);
}

TEST(Domain, hankinsonIsForOneStressAndPrintsBoth) {
  EXPECT_EQ(
      refused(Criterion::hankinson, c24(), {10, 2, 0}),
      "This criterion is for uniaxial stress only; the principal stresses here are 10.0000 and 2.0000 MPa.");
  EXPECT_EQ(refused(Criterion::hankinson, c24(), {10, 9e-6, 0}), "");
  EXPECT_NE(refused(Criterion::hankinson, c24(), {10, 1.1e-5, 0}), "");
}

TEST(Domain, compressionAtAnAngleTakesNoTension) {
  EXPECT_NE(refused(Criterion::compressionAtAngle, c24(), {1, 0, 0}), "");
  EXPECT_EQ(refused(Criterion::compressionAtAngle, c24(), {-1, 0, 0}), "");
  EXPECT_NE(refused(Criterion::compressionAtAngle, c24(), {-1, -1, 0}), "");
}

TEST(Domain, theTaperedEdgeWantsTheStressAlongItsEdge) {
  Strengths f = c24();
  f[StrengthKey::alongBending] = 24;
  const auto edgeAt = [](double degrees) { return Parameters{{}, {}, {}, Angle::fromDegrees(degrees)}; };
  EXPECT_NE(refused(Criterion::taperedEdge, f, {5, 0, 0}), "") << "no edge";
  EXPECT_EQ(refused(Criterion::taperedEdge, f, {5, 0, 0}, edgeAt(0)), "");
  EXPECT_EQ(refused(Criterion::taperedEdge, f, {5, 0, 0}, edgeAt(180.009)), "");
  EXPECT_NE(refused(Criterion::taperedEdge, f, {5, 0, 0}, edgeAt(0.02)), "");
  EXPECT_NE(refused(Criterion::taperedEdge, c24(), {5, 0, 0}, edgeAt(0)), "") << "no bending strength";
}

TEST(Domain, surfacesThatAreNotClosedAreRefused) {
  const Strengths wide = lineStrengths(MaterialKind::generic, 10, 10, 25, 25, 5);
  EXPECT_NE(refused(Criterion::azziTsai, wide, {1, 1, 0}), "");
  EXPECT_NE(refused(Criterion::azziTsaiTwoSign, wide, {1, 1, 0}), "");
  EXPECT_NE(refused(Criterion::hoffman, wide, {1, 1, 0}), "");
  EXPECT_EQ(refused(Criterion::tsaiWu, wide, {1, 1, 0}), "");
  EXPECT_NE(refused(Criterion::tsaiWu, wide, {1, 1, 0}, {{}, 1 / 200.0, {}, {}}), "");
}

TEST(Domain, whatOverflowsIsNeverWithin) {
  const Strengths tiny = lineStrengths(MaterialKind::generic, 1e-200, 1e-200, 1e-200, 1e-200, 1e-200);
  for (const Criterion criterion : {Criterion::sumOfSquares, Criterion::norrisPlane}) {
    const auto judge = Judge::of(criterion, tiny, {}, demandOf({1, 0, 0}));
    ASSERT_TRUE(judge);
    EXPECT_GT(judge->utilisation({}), 1e100) << wordOf(criterion);
  }
}

TEST(Domain, aMissingStrengthIsNamedByTheCriterionThatNeedsIt) {
  Strengths f = c24();
  f[StrengthKey::shear].reset();
  EXPECT_EQ(refused(Criterion::sumOfSquares, f, {1, 0, 0}),
            "The material has no fv, which this criterion needs.");
  EXPECT_EQ(refused(Criterion::hankinson, f, {1, 0, 0}), "") << "Hankinson knows no shear";
}

TEST(Domain, bendingNeedsABendingStrengthOnlyWhereThereIsBending) {
  Demand demand = demandOf({5, 0, 0});
  EXPECT_TRUE(Judge::of(Criterion::sumOfSquares, c24(), {}, demand));
  demand.bendingShare = 0.5;
  EXPECT_FALSE(Judge::of(Criterion::sumOfSquares, c24(), {}, demand));
  Strengths f = c24();
  f[StrengthKey::alongBending] = 24;
  const auto judge = Judge::of(Criterion::sumOfSquares, f, {}, demand);
  ASSERT_TRUE(judge);
  EXPECT_NEAR(judge->utilisation({}), 2.5 / 14.5 + 2.5 / 24, 1e-15);
}

TEST(Cautions, speakWhereACriterionIsKnownToReassure) {
  const auto count = [](Criterion criterion, const Strengths& f, const Parameters& parameters = {},
                        std::optional<Angle> line = {}) {
    return cautionsOf(criterion, f, parameters, line).size();
  };
  for (const Criterion criterion : {Criterion::maximumStress, Criterion::norrisPlane,
                                    Criterion::norrisThreePlane, Criterion::tsaiWu, Criterion::hoffman}) {
    EXPECT_EQ(count(criterion, c24()), 1) << wordOf(criterion);
    EXPECT_EQ(count(criterion, graphiteEpoxy()), 0) << wordOf(criterion);
  }
  EXPECT_EQ(count(Criterion::sumOfSquares, c24()), 0);
  EXPECT_EQ(count(Criterion::hankinson, c24()), 0);
  EXPECT_EQ(count(Criterion::hankinson, c24(), {2.5, {}, {}, {}}), 1);
  EXPECT_EQ(count(Criterion::linearSum, c24()), 1);
  const Parameters edge{{}, {}, {}, Angle()};
  EXPECT_EQ(count(Criterion::taperedEdge, c24(), edge, Angle::fromDegrees(9)), 0);
  EXPECT_EQ(count(Criterion::taperedEdge, c24(), edge, Angle::fromDegrees(-11)), 1);
}

TEST(Cautions, theVolumeFactorIsSaidWithTensionAcrossTheGrain) {
  EXPECT_TRUE(cautionOfTensionAcross(MaterialKind::timber));
  EXPECT_FALSE(cautionOfTensionAcross(MaterialKind::lamina));
}

// tan = sqrt(tan^2 a + tan^2 b): USDA Wood Handbook for the combination.
TEST(SlopeOfFaces, combinesTwoSlopes) {
  const auto atan = [](double slope) { return Angle::fromRadians(std::atan(slope)); };
  EXPECT_NEAR(slopeOfFaces(atan(0.3), atan(0.4)).degrees(), atan(0.5).degrees(), 1e-12);
  EXPECT_NEAR(slopeOfFaces(atan(-0.1), Angle()).degrees(), atan(0.1).degrees(), 1e-12);
  EXPECT_NEAR(slopeOfFaces(Angle::fromDegrees(90), atan(0.1)).degrees(), 90, 1e-12);
}

} // namespace
} // namespace planewright
