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

/// A judge of any criterion with a direction, on any state.
Judge anyJudge() {
  const PlaneStress stress = *anyStress();
  const int which = *rc::gen::inRange(0, 4);
  if (which == 0) {
    const Parameters n{*rc::gen::element(1.5, 2.0, 2.5), {}, {}, {}};
    return *Judge::of(Criterion::hankinson, *anyLineStrengths(), n,
                      demandOf(uniaxial(stress.sx, *anyAngle())));
  }
  if (which == 1) {
    using enum StrengthKey;
    Strengths f;
    f.kind = MaterialKind::coulomb;
    f[cohesion] = *rc::gen::inRange(0, 1000) / 10.0;
    f[friction] = *rc::gen::inRange(1, 60);
    f[cutoff] = *rc::gen::inRange(0, 100) / 10.0;
    return *Judge::of(Criterion::coulomb, f, {}, demandOf(stress));
  }
  if (which == 2) {
    using enum StrengthKey;
    Strengths f;
    f.kind = MaterialKind::bond;
    f[tension] = *rc::gen::inRange(1, 1000) / 10.0;
    f[shear] = *rc::gen::inRange(1, 1000) / 10.0;
    return *Judge::of(Criterion::bond, f, {}, demandOf(stress));
  }
  return *Judge::of(*anyLineCriterion(), *anyLineStrengths(), {}, demandOf(stress));
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
