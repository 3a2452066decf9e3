// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/strength_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace planewright {
namespace {

using enum StrengthKey;

Strengths isotropic(std::optional<double> ft, std::optional<double> fc = {}, std::optional<double> c = {},
                    std::optional<double> phi = {}) {
  Strengths f;
  f.kind = MaterialKind::isotropic;
  f[tension] = ft;
  f[compression] = fc;
  f[cohesion] = c;
  f[friction] = phi;
  return f;
}

Judgement judged(Criterion criterion, const Strengths& f, const PlaneStress& stress, double sz = 0) {
  return Judge::of(criterion, f, {}, {stress, sz, scaleOf(stress), 0})->at({});
}

// Beer, Johnston, DeWolf: Mechanics of Materials, sample problem 7.4 (read in a companion notebook).
TEST(PrincipalCriteria, samplesOfATextbook) {
  EXPECT_NEAR(*judged(Criterion::tresca, isotropic(250), {80, -40, 25}).multiplier, 1.923077, 5e-7);
  EXPECT_NEAR(*judged(Criterion::vonMises, isotropic(250), {80, -40, 25}).multiplier, 2.19, 5e-3);
}

// Dieter: Mechanical Metallurgy, example 3.2 (read in a companion notebook).
TEST(PrincipalCriteria, takeTheThirdNormalStress) {
  EXPECT_NEAR(*judged(Criterion::vonMises, isotropic(500), {200, 100, 30}, -50).multiplier, 2.23161, 5e-6);
}

TEST(PrincipalCriteria, trescaSortsTheThirdStressIn) {
  EXPECT_NEAR(judged(Criterion::tresca, isotropic(100), {70, 70, 0}).utilisation, 0.7, 1e-15);
}

TEST(PrincipalCriteria, rankineTakesTheWorseOfBothSenses) {
  const Judgement pulls = judged(Criterion::rankine, isotropic(10, 100), {5, -40, 0});
  EXPECT_NEAR(pulls.utilisation, 0.5, 1e-15);
  EXPECT_EQ(pulls.mode, Mode::tension);
  const Judgement presses = judged(Criterion::rankine, isotropic(10, 100), {4, -80, 0});
  EXPECT_NEAR(presses.utilisation, 0.8, 1e-15);
  EXPECT_EQ(presses.mode, Mode::compression);
}

// (ft, fc) and (c, phi) are one criterion: c = sqrt(ft fc)/2, sin phi = (fc-ft)/(fc+ft) (common practice, no
// source); Ugural, Fenster: example 4.3, pure shear at ft = 300, fc = 700 (read in a companion notebook).
TEST(PrincipalCriteria, mohrCoulombInPureShear) {
  const double phi = Angle::fromRadians(std::asin(0.4)).degrees();
  const Strengths f = isotropic({}, {}, std::sqrt(300.0 * 700) / 2, phi);
  EXPECT_NEAR(*judged(Criterion::mohrCoulomb, f, {0, 0, 1}).multiplier, 210, 5e-3);
  EXPECT_NEAR(judged(Criterion::mohrCoulomb, f, {0, 0, 210}).utilisation, 1, 1e-12);
}

TEST(PrincipalCriteria, mohrCoulombBeyondTheApexHasNoFiniteNumber) {
  const Strengths f = isotropic({}, {}, 1, 30);
  EXPECT_TRUE(std::isinf(judged(Criterion::mohrCoulomb, f, {5, 5, 0}, 5).utilisation));
  EXPECT_FALSE(judged(Criterion::mohrCoulomb, f, {-5, -5, 0}, -5).multiplier);
}

TEST(PrincipalCriteria, mohrCoulombWithoutCohesionLeavesRoundingOut) {
  const Strengths f = isotropic({}, {}, 0, 30);
  const double leftover = 0.1 + 0.2 - 0.3;
  ASSERT_NE(leftover, 0);
  EXPECT_EQ(Judge::of(Criterion::mohrCoulomb, f, {}, {{leftover, 0, 0}, 0, 0.6, 0})->at({}), Judgement{});
  EXPECT_NEAR(Judge::of(Criterion::mohrCoulomb, f, {}, {{leftover, -2, 0}, 0, 2, 0})->utilisation({}), 2,
              1e-14);
}

RC_GTEST_PROP(PrincipalCriteria, doNotCareAboutDirections, ()) {
  const PlaneStress stress = *anyStress();
  const Angle turn = *anyAngle();
  const Strengths f = isotropic(10, 20, 3, 25);
  for (const Criterion criterion : {Criterion::vonMises, Criterion::tresca, Criterion::rankine}) {
    const double one = judged(criterion, f, stress).utilisation;
    const double turned = judged(criterion, f, inTurnedAxes(stress, turn)).utilisation;
    RC_ASSERT(std::abs(one - turned) <= 1e-10 * (1 + one));
  }
}

} // namespace
} // namespace planewright
