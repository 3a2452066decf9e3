// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/band.h"
#include "core/strength/over_angles.h"
#include "tests/support/strength_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace planewright {
namespace {

Angle degrees(double value) {
  return Angle::fromDegrees(value);
}

bool isWithin(std::span<const Within> within, Angle direction) {
  return allowedTolerance(within, direction).has_value();
}

/// Whether within 1e-8 deg of a direction some other is on the other side of the limit.
bool isNextToAnEnd(const std::vector<Judge>& judges, Angle direction) {
  const auto exceeds = [&](double by) {
    return exceedsLimit(greatestUtilisation(judges, direction + degrees(by)));
  };
  return exceeds(1e-8) != exceeds(0) || exceeds(-1e-8) != exceeds(0);
}

RC_GTEST_PROP(AnglesWithinTheLimit, agreeWithAScan, ()) {
  const std::vector<Judge> judges = anyJudges();
  const std::vector<Within> within = withinLimit(judges);
  constexpr double step = 0.25;
  for (double at = -90; at <= 90; at += step) {
    const double utilisation = greatestUtilisation(judges, degrees(at));
    if (isWithin(within, degrees(at)) == !exceedsLimit(utilisation))
      continue;
    // Only within rounding of an end may the two differ; at a jump the end itself is one.
    if (std::abs(utilisation - 1) > 1e-8)
      RC_ASSERT(isNextToAnEnd(judges, degrees(at)));
  }
}

RC_GTEST_PROP(AnglesWithinTheLimit, endWhereTheUtilisationIsOne, ()) {
  const std::vector<Judge> judges = anyJudges();
  for (const Within& one : withinLimit(judges)) {
    RC_ASSERT(one.from > degrees(-90.001));
    if ((one.to - one.from).degrees() >= 180)
      continue;
    for (const Angle end : {one.from, one.to})
      if (std::abs(greatestUtilisation(judges, end) - 1) > 1e-8)
        RC_ASSERT(isNextToAnEnd(judges, end));
  }
}

RC_GTEST_PROP(AnglesWithinTheLimit, agreeWithTheBand, ()) {
  const std::vector<Judge> judges = anyJudges();
  const Angle nominal = *anyAngle();
  const std::optional<Angle> allowed = allowedTolerance(withinLimit(judges), nominal);
  if (!allowed)
    return;
  double worst = 0;
  for (const Judge& judge : judges)
    worst = std::max(worst, worstIn(judge, bandOf(nominal, *allowed)).judgement.utilisation);
  RC_ASSERT(worst <= 1 + 1e-8);
  if (allowed->degrees() > 89.9)
    return;
  for (const Judge& judge : judges)
    worst = std::max(worst, worstIn(judge, bandOf(nominal, *allowed + degrees(0.1))).judgement.utilisation);
  RC_ASSERT(worst > 1 - 1e-9);
}

RC_GTEST_PROP(BestDirection, noScanFindsABetterOne, ()) {
  const std::vector<Judge> judges = anyJudges();
  const BestDirection best = bestDirection(judges);
  for (double at = -90; at < 90; at += 0.1)
    RC_ASSERT(greatestUtilisation(judges, degrees(at)) >= best.utilisation * (1 - 1e-9));
  if (std::isfinite(best.utilisation))
    RC_ASSERT(std::abs(greatestUtilisation(judges, best.angle) - best.utilisation) <=
              1e-9 * (1 + best.utilisation));
}

TEST(AnglesWithinTheLimit, areTheHalfTurnOrNone) {
  const auto small = Judge::of(Criterion::sumOfSquares, c24(), {}, demandOf({0.1, 0, 0}));
  const std::vector<Within> all = withinLimit({&*small, 1});
  ASSERT_EQ(all.size(), 1);
  EXPECT_EQ(all.front(), (Within{degrees(-90), degrees(90)}));
  EXPECT_EQ(allowedTolerance(all, degrees(20)), degrees(90));
  const auto large = Judge::of(Criterion::sumOfSquares, c24(), {}, demandOf({100, 0, 0}));
  EXPECT_TRUE(withinLimit({&*large, 1}).empty());
}

TEST(AnglesWithinTheLimit, areJoinedAcrossTheUpright) {
  const auto judge = Judge::of(Criterion::sumOfSquares, c24(), {}, demandOf({0, 10, 0}));
  const std::vector<Within> within = withinLimit({&*judge, 1});
  ASSERT_EQ(within.size(), 1);
  EXPECT_NEAR((within[0].from + within[0].to).degrees(), 180, 1e-9);
  EXPECT_TRUE(allowedTolerance(within, degrees(-89)));
  EXPECT_FALSE(allowedTolerance(within, degrees(0)));
}

TEST(AnglesWithinTheLimit, endWhereAPlaneWithoutCutOffIsPulled) {
  using enum StrengthKey;
  Strengths f;
  f.kind = MaterialKind::coulomb;
  f[cohesion] = 100;
  f[friction] = 30;
  const auto judge = Judge::of(Criterion::coulomb, f, {}, demandOf({5, -5, 0}));
  EXPECT_TRUE(std::isinf(judge->utilisation({})));
  const std::vector<Within> within = withinLimit({&*judge, 1});
  ASSERT_EQ(within.size(), 1);
  EXPECT_NEAR(within[0].from.degrees(), 45, 1e-9);
  EXPECT_NEAR(within[0].to.degrees(), 135, 1e-9);
}

/// Two states of a Coulomb plane without a cut-off whose common directions touch the upright in a single one.
TEST(AnglesWithinTheLimit, doNotGoRoundBySingleDirections) {
  using enum StrengthKey;
  Strengths f;
  f.kind = MaterialKind::coulomb;
  f[cohesion] = 10;
  f[friction] = 30;
  for (const double sense : {1.0, -1.0}) {
    const double pressed = -std::sqrt(0.75);
    const std::vector<Judge> judges = {
        *Judge::of(Criterion::coulomb, f, {}, demandOf({0, 0, -sense})),
        *Judge::of(Criterion::coulomb, f, {}, demandOf({pressed, pressed, sense}))};
    const std::vector<Within> within = withinLimit(judges);
    for (double at = -89.5; at < 90; ++at)
      EXPECT_EQ(isWithin(within, degrees(at)), greatestUtilisation(judges, degrees(at)) <= 1) << at;
  }
}

TEST(AnglesWithinTheLimit, countAsWithinWhatTheVerdictCountsAsWithin) {
  const auto judge = Judge::of(Criterion::sumOfSquares, c24(), {}, demandOf({14.5 * (1 + 5e-10), 0, 0}));
  ASSERT_GT(judge->utilisation({}), 1);
  EXPECT_TRUE(allowedTolerance(withinLimit({&*judge, 1}), {}));
}

TEST(SlopePerDegree, isThatOfTheSteeperSideAtACorner) {
  // Two uniaxial states at +-20 deg: the greater of two mirrored curves has a corner at 0.
  const std::vector<Judge> judges = {
      *Judge::of(Criterion::sumOfSquares, c24(), {}, demandOf(uniaxial(5, degrees(20)))),
      *Judge::of(Criterion::sumOfSquares, c24(), {}, demandOf(uniaxial(5, degrees(-20))))};
  const double one = *slopePerDegree({&judges[0], 1}, {});
  EXPECT_NEAR(std::abs(*slopePerDegree(judges, {})), std::abs(one), 1e-6);
  EXPECT_NEAR(one, (judges[0].utilisation(degrees(1e-4)) - judges[0].utilisation(degrees(-1e-4))) / 2e-4,
              1e-6);
}

} // namespace
} // namespace planewright
