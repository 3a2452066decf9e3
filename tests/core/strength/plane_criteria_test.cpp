// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/support/strength_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace planewright {
namespace {

using enum StrengthKey;

Strengths coulombPlane(double c, double phi, std::optional<double> limit = {}) {
  Strengths f;
  f.kind = MaterialKind::coulomb;
  f[cohesion] = c;
  f[friction] = phi;
  f[cutoff] = limit;
  return f;
}

Strengths filletThroat(double fu_, double beta, double gamma) {
  Strengths f;
  f.kind = MaterialKind::throat;
  f[fu] = fu_;
  f[betaW] = beta;
  f[gammaM2] = gamma;
  return f;
}

Judgement onPlane(Criterion criterion, const Strengths& f, double sn, double tnt) {
  return Judge::of(criterion, f, {}, demandOf({sn, 0, tnt}))->at({});
}

TEST(CoulombPlane, mobilisesFrictionAndCohesion) {
  const Judgement slips = onPlane(Criterion::coulomb, coulombPlane(2, 30), -10, 4);
  EXPECT_NEAR(slips.utilisation, 4 / (2 + 10 / std::sqrt(3.0)), 1e-14);
  EXPECT_EQ(slips.mode, Mode::slip);
  EXPECT_FALSE(slips.multiplier) << "clamping grows faster than the shear";
  const Judgement steep = onPlane(Criterion::coulomb, coulombPlane(2, 30), -10, 6);
  EXPECT_NEAR(*steep.multiplier, 2 / (6 - 10 / std::sqrt(3.0)), 1e-12);
}

TEST(CoulombPlane, hasNoFiniteNumberForTensionWithoutACutOff) {
  const Judgement pulled = onPlane(Criterion::coulomb, coulombPlane(2, 30), 0.1, 1);
  EXPECT_TRUE(std::isinf(pulled.utilisation));
  EXPECT_EQ(pulled.mode, Mode::separation);
  const Judgement cut = onPlane(Criterion::coulomb, coulombPlane(2, 30, 0.5), 0.4, 0);
  EXPECT_NEAR(cut.utilisation, 0.8, 1e-15);
  EXPECT_EQ(cut.mode, Mode::separation);
  EXPECT_NEAR(*cut.multiplier, 1.25, 1e-15);
}

TEST(CoulombPlane, withoutCohesionAnUnloadedPlaneOfAStressedBodyHasNoBound) {
  const auto upright = Angle::fromDegrees(90);
  const auto loose = Judge::of(Criterion::coulomb, coulombPlane(0, 30), {}, demandOf({-80, 0, 0}));
  EXPECT_TRUE(std::isinf(loose->utilisation(upright)));
  EXPECT_GT(loose->utilisation(Angle::fromDegrees(89.99)), 1000);
  const auto bound = Judge::of(Criterion::coulomb, coulombPlane(1, 30), {}, demandOf({-80, 0, 0}));
  EXPECT_EQ(bound->utilisation(upright), 0);
  EXPECT_EQ(Judge::of(Criterion::coulomb, coulombPlane(0, 30), {}, demandOf({}))->utilisation({}), 0);
}

TEST(CoulombPlane, resistsExactlyNothingWhereOnlyRoundingIsLeft) {
  int nothing = 0;
  for (int friction = 32; friction < 85; ++friction)
    for (const PlaneStress& stress :
         {PlaneStress{0, 0, 5}, PlaneStress{-10, 20, 3}, PlaneStress{900, 4, -70}}) {
      const auto judge = Judge::of(Criterion::coulomb, coulombPlane(3, friction), {}, demandOf(stress));
      const Branch& branch = judge->branches().front();
      for (const Angle turning : turningPointsOf(branch, judge->state())) {
        const double resists = resistanceOf(std::get<Mobilised>(branch), judge->state(), turning);
        EXPECT_TRUE(resists == 0 || std::abs(resists) > 1e-9) << friction << ' ' << resists;
        nothing += resists == 0 ? 1 : 0;
      }
    }
  EXPECT_GT(nothing, 100);
}

RC_GTEST_PROP(CoulombPlane, theMultiplierTakesTheLoadOntoTheLimit, ()) {
  const Strengths f = coulombPlane(*rc::gen::inRange(1, 1000) / 10.0, *rc::gen::inRange(1, 60),
                                   *rc::gen::inRange(1, 100) / 10.0);
  const double sn = *anyComponent();
  const double tnt = *anyComponent();
  const Judgement judgement = onPlane(Criterion::coulomb, f, sn, tnt);
  // Without shear the ratio jumps at the apex of the line.
  RC_PRE(judgement.multiplier.has_value() && tnt != 0);
  const double R = *judgement.multiplier;
  RC_ASSERT(std::abs(onPlane(Criterion::coulomb, f, R * sn, R * tnt).utilisation - 1) <= 1e-9);
}

// EN 1993-1-8, 4.5.3.2: sqrt(sn^2 + 3 t^2) <= fu/(beta gamma), |sn| <= 0.9 fu/gamma. S235: 360/(0.8*1.25) =
// 360.
TEST(Throat, takesTheCombinedAndTheNormalStress) {
  const Strengths s235 = filletThroat(360, 0.8, 1.25);
  EXPECT_NEAR(onPlane(Criterion::throat, s235, 100, 120).utilisation,
              std::sqrt(100 * 100 + 3 * 120 * 120) / 360, 1e-14);
  EXPECT_EQ(onPlane(Criterion::throat, s235, 100, 120).mode, Mode::throat);
  EXPECT_NEAR(onPlane(Criterion::throat, s235, -200, 0).utilisation, 200 / (0.9 * 360 / 1.25), 1e-14);
  EXPECT_EQ(onPlane(Criterion::throat, s235, -200, 0).mode, Mode::normal);
}

// Identities of 4.5.3.2: a load across a seam at 45 deg gives sqrt(2) F/(a l), one along it sqrt(3).
TEST(Throat, hasItsKnownEquivalentStresses) {
  const Strengths unit = filletThroat(1000, 1, 1);
  const double half = std::sqrt(0.5);
  EXPECT_NEAR(onPlane(Criterion::throat, unit, half, half).utilisation * 1000, std::sqrt(2.0), 1e-13);
  EXPECT_NEAR(onPlane(Criterion::throat, unit, 0, 1).utilisation * 1000, std::sqrt(3.0), 1e-13);
}

TEST(Throat, isRefusedForButtWelds) {
  Strengths f = filletThroat(360, 0.8, 1.25);
  f.seam = Seam::butt;
  EXPECT_FALSE(Judge::of(Criterion::throat, f, {}, demandOf({1, 0, 0})));
}

TEST(Bond, leavesCompressionOut) {
  Strengths f;
  f.kind = MaterialKind::bond;
  f[tension] = 2;
  f[shear] = 5;
  EXPECT_NEAR(onPlane(Criterion::bond, f, 1, 3).utilisation, std::hypot(0.5, 0.6), 1e-15);
  EXPECT_EQ(onPlane(Criterion::bond, f, 1, 3).mode, Mode::interaction);
  EXPECT_NEAR(onPlane(Criterion::bond, f, -100, 3).utilisation, 0.6, 1e-15);
  EXPECT_EQ(onPlane(Criterion::bond, f, -100, 3).mode, Mode::shear);
  EXPECT_EQ(onPlane(Criterion::bond, f, 1.9, 0).mode, Mode::separation);
}

TEST(Strengths, aFactorScalesWhatIsAStress) {
  const Strengths half = 0.5 * coulombPlane(2, 30, 1.0);
  EXPECT_EQ(half[cohesion], 1);
  EXPECT_EQ(half[friction], 30);
  EXPECT_EQ(half[cutoff], 0.5);
  EXPECT_EQ((0.5 * filletThroat(360, 0.8, 1.25))[fu], 360) << "the throat carries its own partial factor";
}

} // namespace
} // namespace planewright
