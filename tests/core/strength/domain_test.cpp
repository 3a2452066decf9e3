// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/cautions.h"
#include "core/strength/line_criteria.h"
#include "core/strength/slope_of_faces.h"
#include "tests/support/strength_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

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

TEST(Domain, criteriaOfOneStressTakeNoneOutOfThePlane) {
  Strengths f = c24();
  f[StrengthKey::alongBending] = 24;
  Demand demand = demandOf({-5, 0, 0});
  const Parameters edge{{}, {}, {}, Angle()};
  for (const Criterion criterion :
       {Criterion::hankinson, Criterion::compressionAtAngle, Criterion::taperedEdge}) {
    demand.sz = -5;
    EXPECT_FALSE(Judge::of(criterion, f, edge, demand)) << wordOf(criterion);
    demand.sz = -4e-6;
    EXPECT_TRUE(Judge::of(criterion, f, edge, demand)) << wordOf(criterion);
  }
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

TEST(Bending, raisesOnlyTheStrengthOfTheSignThatSxHas) {
  Strengths f = c24();
  f[StrengthKey::alongBending] = 24;
  Demand demand = demandOf({5, 0, 0});
  demand.bendingShare = 1;
  const auto X = [&](bool pulls) { return *alongStrengthOf(f, demand, pulls); };
  EXPECT_EQ(X(true), 24);
  EXPECT_EQ(X(false), 21);
  demand.stress.sx = -5;
  EXPECT_EQ(X(true), 14.5);
  EXPECT_EQ(X(false), 24);
}

TEST(Bending, countsOnlyForItsShareOfWhatActs) {
  Strengths f = c24();
  f[StrengthKey::alongBending] = 24;
  const auto at = [&](const PlaneStress& stress, double degrees) {
    Demand demand = demandOf(stress);
    demand.bendingShare = 1;
    return Judge::of(Criterion::maximumStress, f, {}, demand)->utilisation(Angle::fromDegrees(degrees));
  };
  EXPECT_NEAR(at({0.001, 15, 0}, 90), 15 / 14.5, 1e-4) << "sy is no bending";
  EXPECT_NEAR(at({0.001, 0, 3}, -10), at({0, 0, 3}, -10), 1e-3) << "nor is shear";
}

/// 1/X of the mix against the sum of ratios of what bends and what does not, within 45 deg of x.
RC_GTEST_PROP(Bending, isNeverMoreThanItsShareOfTheStressAlongTheLine, ()) {
  const PlaneStress stress = *anyStress();
  const double share = *rc::gen::inRange(0, 101) / 100.0;
  const double degrees = *rc::gen::inRange(-4500, 4501) / 100.0;
  Demand demand = demandOf(stress);
  demand.bendingShare = share;
  const CosSin turn = cosSin(Angle::fromDegrees(degrees));
  const double along = inAxesOf(stress, LineAngle{Angle::fromDegrees(degrees)}).along;
  RC_PRE(along * stress.sx > 0);
  const double bends = share * stress.sx * turn.cos * turn.cos;
  RC_ASSERT(bendingShareAlong(demand) * along / stress.sx <=
            bends / stress.sx + 1e-12 * scaleOf(stress) / std::abs(stress.sx));
}

TEST(Parameters, aGivenF12GoesWithTheStrengthsThatAFactorScales) {
  const Strengths lamina = graphiteEpoxy();
  Parameters given;
  given.F12 = -0.5 * std::sqrt(1 / (1500.0 * 1500 * 40 * 246));
  for (const double factor : {1.0, 0.5}) {
    const auto usual = Judge::of(Criterion::tsaiWu, factor * lamina, {}, demandOf({600, -60, 0}));
    const auto typed = Judge::of(Criterion::tsaiWu, factor * lamina, forStrengthsTimes(factor, given),
                                 demandOf({600, -60, 0}));
    EXPECT_NEAR(typed->utilisation({}), usual->utilisation({}), 1e-14);
  }
}

TEST(Cautions, speakWhereACriterionIsKnownToReassure) {
  const auto count = [](Criterion criterion, const Strengths& f, const Parameters& parameters = {},
                        const std::optional<Band>& band = {}) {
    return cautionsOf(criterion, f, parameters, band).size();
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
  const auto band = [](double nominal, double tolerance) {
    return bandOf(Angle::fromDegrees(nominal), Angle::fromDegrees(tolerance));
  };
  EXPECT_EQ(count(Criterion::taperedEdge, c24(), edge, band(9, 0)), 0);
  EXPECT_EQ(count(Criterion::taperedEdge, c24(), edge, band(-11, 0)), 1);
  EXPECT_EQ(count(Criterion::taperedEdge, c24(), edge, band(9, 2)), 1) << "its farther end";
  EXPECT_EQ(count(Criterion::compressionAtAngle, c24(), {{}, {}, 1.0, {}}), 0);
  EXPECT_EQ(count(Criterion::compressionAtAngle, c24(), {{}, {}, 1.5, {}}), 1);
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
