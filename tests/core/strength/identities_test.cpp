// SPDX-License-Identifier: GPL-3.0-or-later
// Exact identities between the criteria, which need no source, and published numbers.
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

double utilisation(Criterion criterion, const Strengths& f, const PlaneStress& stress, Angle line,
                   const Parameters& parameters = {}) {
  const auto judge = Judge::of(criterion, f, parameters, demandOf(stress));
  EXPECT_TRUE(judge) << wordOf(criterion) << (judge ? "" : plain(judge.error().what));
  return judge ? judge->utilisation(line) : NAN;
}

/// The strength at an angle, for a uniaxial stress of one sense.
double offAxis(Criterion criterion, const Strengths& f, double angle, double sense = 1,
               const Parameters& parameters = {}) {
  return 1 / utilisation(criterion, f, {sense, 0, 0}, degrees(angle), parameters);
}

Strengths same(double X, double Y, double S) {
  return lineStrengths(MaterialKind::generic, X, X, Y, Y, S);
}

RC_GTEST_PROP(Identities, hankinsonIsAQuadraticFormWithAShearStrengthOfItsOwn, ()) {
  const double X = *rc::gen::inRange(100, 10000) / 100.0;
  const double Y = X * *rc::gen::inRange(1, 101) / 100.0;
  const double angle = *rc::gen::inRange(-90, 91);
  const auto with = [&](double inverseSquare) { return same(X, Y, 1 / std::sqrt(inverseSquare)); };
  const double expected = offAxis(Criterion::hankinson, with(1), angle);
  const double tolerance = 1e-12 * expected;
  RC_ASSERT(std::abs(offAxis(Criterion::azziTsai, with(1 / (X * X) + 2 / (X * Y)), angle) - expected) <=
            tolerance);
  RC_ASSERT(std::abs(offAxis(Criterion::norrisPlane, with(3 / (X * Y)), angle) - expected) <= tolerance);
  RC_ASSERT(std::abs(offAxis(Criterion::sumOfSquares, with(2 / (X * Y)), angle) - expected) <= tolerance);
  RC_ASSERT(std::abs(offAxis(Criterion::linearSum, same(X, Y, 1e200), angle) - expected) <= tolerance);
}

RC_GTEST_PROP(Identities, withOneStrengthTheQuadraticFormsAreVonMises, ()) {
  const double X = *rc::gen::inRange(100, 10000) / 100.0;
  const PlaneStress stress = *anyStress();
  const Angle line = *anyAngle();
  const Strengths f = same(X, X, X / std::sqrt(3.0));
  const Circle circle = circleOf(stress);
  const double mises = std::hypot(circle.s1 - circle.s2, circle.s1, circle.s2) / std::sqrt(2.0) / X;
  for (const Criterion criterion : {Criterion::norrisPlane, Criterion::azziTsai})
    RC_ASSERT(std::abs(utilisation(criterion, f, stress, line) - mises) <= 1e-7 * mises);
  RC_ASSERT(std::abs(utilisation(Criterion::tsaiWu, f, stress, line) - mises) <= 1e-7 * mises);
}

RC_GTEST_PROP(Identities, withEqualSensesTsaiAndWuIsNorrisOrAzziAndTsai, ()) {
  const double X = *rc::gen::inRange(1000, 10000) / 100.0;
  const double Y = X * *rc::gen::inRange(1, 101) / 100.0;
  const Strengths f = same(X, Y, Y);
  const PlaneStress stress = *anyStress();
  const Angle line = *anyAngle();
  const double norris = utilisation(Criterion::tsaiWu, f, stress, line);
  RC_ASSERT(std::abs(norris - utilisation(Criterion::norrisPlane, f, stress, line)) <= 1e-10 * (1 + norris));
  const double azzi = utilisation(Criterion::tsaiWu, f, stress, line, {{}, -1 / (2 * X * X), {}, {}});
  RC_ASSERT(std::abs(azzi - utilisation(Criterion::azziTsai, f, stress, line)) <= 1e-10 * (1 + azzi));
}

RC_GTEST_PROP(Identities, theTaperedEdgeIsTheSumOfSquaresAtTheEdge, (bool pulls)) {
  using enum StrengthKey;
  Strengths f = c24();
  f[alongBending] = 24;
  const double a = *rc::gen::inRange(-300, 301) / 10.0;
  const double s = (pulls ? 1 : -1) * *rc::gen::inRange(1, 200) / 10.0; // along the grain
  const double tan = std::tan(degrees(a).radians());
  const double fv = (pulls ? 0.75 : 1.5) * *f[shear];
  const double f90 = pulls ? *f[acrossTension] : *f[acrossCompression];
  const double km = 1 / std::sqrt(1 + std::pow(24 / fv * tan, 2) + std::pow(24 / f90 * tan * tan, 2));
  const PlaneStress edge{s / std::pow(std::cos(degrees(a).radians()), 2), 0, 0};
  const double found = utilisation(Criterion::taperedEdge, f, edge, degrees(a), {{}, {}, {}, degrees(0)});
  RC_ASSERT(std::abs(found - std::abs(s) / (km * 24)) <= 1e-12 * found);
}

TEST(Identities, offAxisSumOfSquaresHasAMinimumBelowAWeakShear) {
  const Strengths weak = same(10, 4, 2);
  double least = 1e9;
  for (int angle = 1; angle < 90; ++angle)
    least = std::min(least, offAxis(Criterion::sumOfSquares, weak, angle));
  EXPECT_LT(least, 4);
  EXPECT_GT(offAxis(Criterion::sumOfSquares, same(10, 4, 9), 1), 10);
  EXPECT_LT(offAxis(Criterion::sumOfSquares, same(10, 4, 7), 1), 10);
}

// Off-axis tension at 1 in 10 over f_t,0, C24: own arithmetic from the published equations; the strengths of
// C24 are from memory.
TEST(OffAxisTension, differsByCriterionAsItIsKnownTo) {
  const double slope = Angle::fromRadians(std::atan(0.1)).degrees();
  const auto share = [&](Criterion criterion) { return offAxis(criterion, c24(), slope) / 14.5; };
  EXPECT_NEAR(share(Criterion::norrisPlane), 1.064, 5e-4);
  EXPECT_NEAR(share(Criterion::norrisThreePlane), 1.010, 5e-4);
  EXPECT_NEAR(share(Criterion::maximumStress), 1.010, 5e-4);
  EXPECT_NEAR(share(Criterion::sumOfSquares), 0.90, 5e-3);
  EXPECT_NEAR(share(Criterion::hankinson), 0.74, 5e-3);
  EXPECT_NEAR(share(Criterion::linearSum), 0.59, 5e-3);
  Strengths taper = c24();
  taper[StrengthKey::alongBending] = 14.5;
  const Parameters edge{{}, {}, {}, degrees(0)};
  const double cos2 = std::pow(std::cos(degrees(slope).radians()), 2);
  EXPECT_NEAR(offAxis(Criterion::taperedEdge, taper, slope, 1, edge) * cos2 / 14.5, 0.856, 5e-4);
  taper[StrengthKey::alongBending] = 24;
  EXPECT_NEAR(offAxis(Criterion::taperedEdge, taper, slope, 1, edge) * cos2 / 24, 0.707, 5e-4);
}

// C24 pressed at 15 deg: own arithmetic, strengths from memory.
TEST(OffAxisCompression, isPromisedTooMuchByTsaiAndWu) {
  EXPECT_NEAR(offAxis(Criterion::tsaiWu, c24(), 15, -1), 25.96, 5e-3);
  EXPECT_NEAR(offAxis(Criterion::hankinson, c24(), 15, -1), 14.04, 5e-3);
  EXPECT_NEAR(offAxis(Criterion::sumOfSquares, c24(), 15, -1), 12.31, 5e-3);
}

TEST(OffAxisCompression, byEN1995IsHankinsonWithTheFactorInTheFormula) {
  for (const double kc90 : {1.0, 1.5, 1.75})
    for (const double angle : {0.0, 15.0, 45.0, 90.0}) {
      Strengths f = c24();
      f[StrengthKey::acrossCompression] = 2.5 * kc90;
      EXPECT_NEAR(offAxis(Criterion::compressionAtAngle, c24(), angle, -1, {{}, {}, kc90, {}}),
                  offAxis(Criterion::hankinson, f, angle, -1), 1e-12);
    }
}

// An exponent above 2 exceeds the strength along at small angles: 1.006 P at n = 2.5, Q/P = 0.4 (own
// arithmetic).
TEST(Hankinson, withAnExponentAboveTwoExceedsTheStrengthAlong) {
  double greatest = 0;
  for (double angle = 0; angle <= 90; angle += 0.1)
    greatest = std::max(greatest, offAxis(Criterion::hankinson, same(10, 4, 1), angle, 1, {2.5, {}, {}, {}}));
  EXPECT_NEAR(greatest / 10, 1.006, 5e-4);
}

// The state (2, -3, 4) at 60 deg on graphite/epoxy T300/5208, strength ratios printed in Kaw, Mechanics of
// Composite Materials (printed answers from memory, recomputed).
TEST(PublishedLamina, hasFourAnswers) {
  const PlaneStress stress{2, -3, 4};
  const auto ratio = [&](Criterion criterion, const Strengths& f) {
    return 1 / utilisation(criterion, f, stress, degrees(60));
  };
  EXPECT_NEAR(ratio(Criterion::azziTsai, lineStrengths(MaterialKind::lamina, 1500, 1500, 40, 40, 68)), 10.94,
              5e-3);
  EXPECT_NEAR(ratio(Criterion::azziTsaiTwoSign, graphiteEpoxy()), 16.06, 5e-3);
  EXPECT_NEAR(ratio(Criterion::maximumStress, graphiteEpoxy()), 16.33, 5e-3);
  EXPECT_NEAR(ratio(Criterion::tsaiWu, graphiteEpoxy()), 22.39, 5e-3);
}

// Golden numbers (own arithmetic, two routes).
TEST(Golden, theCornerOfNorrisIsFoundInsideTheBand) {
  const auto judge = Judge::of(Criterion::norrisPlane, c24(), {}, demandOf({-0.08, 4.36, 0.085}));
  ASSERT_TRUE(judge);
  const Band band = bandOf(degrees(94), degrees(5));
  EXPECT_EQ(band.nominal, degrees(-86));
  EXPECT_EQ(band.from(), degrees(-91));
  EXPECT_NEAR(judge->utilisation(band.nominal), 0.323415, 5e-7);
  const WorstInBand worst = worstIn(*judge, band);
  EXPECT_NEAR(worst.judgement.utilisation, 0.330724, 5e-7);
  EXPECT_NEAR(worst.angle.degrees(), -83.3065, 5e-5);
  EXPECT_NEAR(std::max(judge->utilisation(band.from()), judge->utilisation(band.to())), 0.318387, 5e-7);
}

TEST(Golden, theSenseOfTheShearDecidesAtAGlulamAxis) {
  const Strengths gl24h = lineStrengths(MaterialKind::timber, 19.2, 24, 0.5, 2.5, 3.5);
  const Angle slope = Angle::fromRadians(std::atan(0.1));
  EXPECT_NEAR(utilisation(Criterion::sumOfSquares, gl24h, {0, 0, 1.875}, slope), 0.5460, 5e-5);
  EXPECT_NEAR(utilisation(Criterion::sumOfSquares, gl24h, {0, 0, -1.875}, slope), 0.9096, 5e-5);
}

} // namespace
} // namespace planewright
