// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/strength/band.h"
#include "tests/support/strength_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace planewright {
namespace {

Angle degrees(double value) {
  return Angle::fromDegrees(value);
}

/// A judge of any criterion, on any state.
Judge anyJudge() {
  return anyJudges().front();
}

/// Not worse, but for the rounding of a utilisation.
bool isNoWorse(double scanned, double exact) {
  return scanned <= exact + 1e-11 * std::abs(exact) || scanned == exact;
}

RC_GTEST_PROP(Band, noScanFindsAWorseDirection, ()) {
  const Judge judge = anyJudge();
  const Band band = bandOf(*anyAngle(), degrees(*rc::gen::inRange(0, 9500) / 100.0));
  const WorstInBand worst = worstIn(judge, band);
  RC_ASSERT(worst.angle >= band.from());
  RC_ASSERT(worst.angle <= band.to());
  RC_ASSERT(judge.utilisation(worst.angle) == worst.judgement.utilisation);
  const double width = (band.to() - band.from()).degrees();
  for (int i = 0; i <= 400; ++i) {
    const Angle at = band.from() + degrees(width * i / 400);
    if (!isNoWorse(judge.utilisation(at), worst.judgement.utilisation))
      RC_FAIL("worse at " + std::to_string(at.degrees()));
  }
}

RC_GTEST_PROP(Band, wideningNeverLowersTheWorst, ()) {
  const Judge judge = anyJudge();
  const Angle nominal = *anyAngle();
  double last = 0;
  for (const double tolerance : {0.0, 0.5, 3.0, 20.0, 60.0, 90.0, 120.0}) {
    const double worst = worstIn(judge, bandOf(nominal, degrees(tolerance))).judgement.utilisation;
    if (!isNoWorse(last, worst))
      RC_FAIL(std::to_string(last) + " to " + std::to_string(worst) + " at " + std::to_string(tolerance) +
              " round " + std::to_string(nominal.degrees()) + " in " +
              std::to_string(judge.state().stress.sx) + ", " + std::to_string(judge.state().stress.sy) +
              ", " + std::to_string(judge.state().stress.txy) + ", part " +
              std::to_string(judge.branches().front().index()));
    last = worst;
  }
}

RC_GTEST_PROP(Band, noScanFindsASmallerMultiplier, (bool slips)) {
  const Judge judge = slips ? anyJudges(Criterion::coulomb).front() : anyJudge();
  const Band band = bandOf(*anyAngle(), degrees(*rc::gen::inRange(0, 9500) / 100.0));
  const std::optional<FirstInBand> first = worstIn(judge, band).first;
  if (first)
    RC_ASSERT(judge.at(first->angle).multiplier == first->multiplier);
  const double width = (band.to() - band.from()).degrees();
  for (int i = 0; i <= 400; ++i) {
    const std::optional<double> at = judge.at(band.from() + degrees(width * i / 400)).multiplier;
    if (at)
      RC_ASSERT(first && *at >= first->multiplier * (1 - 1e-9));
  }
}

/// The worst utilisation lies where the clamping grows with the loads, and the first touch where it does not.
TEST(Band, ofAPlaneWithFrictionHasItsLeastMultiplierElsewhere) {
  using enum StrengthKey;
  Strengths f;
  f.kind = MaterialKind::coulomb;
  f[cohesion] = 1;
  f[friction] = 40;
  const auto judge = Judge::of(Criterion::coulomb, f, {}, demandOf({-3, -0.6, 0}));
  const WorstInBand worst = worstIn(*judge, bandOf(degrees(60), degrees(10)));
  EXPECT_NEAR(worst.angle.degrees(), 56.82, 0.01);
  EXPECT_FALSE(worst.judgement.multiplier);
  ASSERT_TRUE(worst.first);
  EXPECT_NEAR(worst.first->angle.degrees(), 65, 1e-9);
  EXPECT_NEAR(worst.first->multiplier, 17.8, 0.1);
}

TEST(Band, ofNoToleranceIsTheNominalDirection) {
  const auto judge = Judge::of(Criterion::sumOfSquares, c24(), {}, demandOf({3, 0.1, 0.5}));
  const WorstInBand worst = worstIn(*judge, bandOf(degrees(30), {}));
  EXPECT_EQ(worst.angle, degrees(30));
  EXPECT_EQ(worst.judgement, judge->at(degrees(30)));
}

TEST(Band, from90OnIsTheHalfTurnRoundTheNominalDirection) {
  EXPECT_EQ(bandOf(degrees(94), degrees(200)).from(), degrees(-176));
  EXPECT_EQ(bandOf(degrees(94), degrees(200)).to(), degrees(4));
}

TEST(Band, tiesGoToTheNearestDirectionAndThenTheSmaller) {
  const auto judge = Judge::of(Criterion::sumOfSquares, c24(), {}, demandOf({10, 0, 0}));
  const WorstInBand worst = worstIn(*judge, bandOf({}, degrees(20)));
  EXPECT_LT(worst.angle.degrees(), 0);
  EXPECT_NEAR(judge->utilisation(worst.angle), judge->utilisation(-worst.angle), 1e-15);
  const auto round = Judge::of(Criterion::sumOfSquares, c24(), {}, demandOf({1, 1, 0}));
  EXPECT_EQ(worstIn(*round, bandOf(degrees(7), degrees(20))).angle, degrees(7));
}

} // namespace
} // namespace planewright
