// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/measured.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace planewright {
namespace {

constexpr double micro = 1e-6;

Angle degrees(double value) {
  return Angle::fromDegrees(value);
}

Rosette rosetteAt(double a, double b, double c, double ea = 0, double eb = 0, double ec = 0) {
  return {{{degrees(a), ea * micro}, {degrees(b), eb * micro}, {degrees(c), ec * micro}}};
}

rc::Gen<double> angles() {
  return rc::gen::map(rc::gen::inRange(-18000, 18000), [](int hundredths) { return hundredths / 100.0; });
}
rc::Gen<PlaneStrain> strains() {
  const auto one = rc::gen::map(rc::gen::inRange(-400000, 400000), [](int value) { return value * 1e-8; });
  return rc::gen::construct<PlaneStrain>(one, one, one);
}

RC_GTEST_PROP(Rosette, returnsTheStrainThatItsGaugesSaw, ()) {
  const PlaneStrain strain = *strains();
  Rosette rosette = rosetteAt(*angles(), *angles(), *angles());
  for (Gauge& gauge : rosette)
    gauge.strain = strainAlong(strain, gauge.direction);
  const Result<RosetteSolution> solution = solved(rosette);
  RC_PRE(solution.has_value());
  RC_ASSERT(solution->errorGain <= greatestErrorGain);
  const double scale = std::abs(strain.ex) + std::abs(strain.ey) + std::abs(strain.gxy) + micro;
  const double tolerance = 1e-14 * solution->errorGain * scale;
  RC_ASSERT(std::abs(solution->strain.ex - strain.ex) <= tolerance);
  RC_ASSERT(std::abs(solution->strain.ey - strain.ey) <= tolerance);
  RC_ASSERT(std::abs(solution->strain.gxy - strain.gxy) <= tolerance);
}

RC_GTEST_PROP(Rosette, doesNotCareAboutTheOrderOfItsGauges, ()) {
  const Rosette rosette = rosetteAt(*angles(), *angles(), *angles(), 100, 300, -200);
  const auto solution = solved(rosette);
  const auto turned = solved({rosette[1], rosette[2], rosette[0]});
  RC_ASSERT(solution.has_value() == turned.has_value());
  RC_PRE(solution.has_value());
  RC_ASSERT(std::abs(solution->strain.gxy - turned->strain.gxy) <= 1e-14 * solution->errorGain);
}

TEST(Rosette, theErrorGainIsThatOfTheInverse) {
  // gxy = 2 e45 - e0 - e90: one unit of error in each reading makes four.
  EXPECT_NEAR(solved(rosetteAt(0, 45, 90))->errorGain, 4, 1e-12);
}

TEST(Rosette, nearlyParallelGaugesAreRefused) {
  for (const Rosette& rosette : {rosetteAt(0, 0, 90), rosetteAt(10, 190, 55), rosetteAt(0, 0.1, 90),
                                 rosetteAt(0, 3, 6), rosetteAt(30, 30, 30)}) {
    const auto solution = solved(rosette);
    ASSERT_FALSE(solution);
    EXPECT_TRUE(plain(solution.error()).find("too nearly parallel") != std::string::npos);
  }
  EXPECT_TRUE(solved(rosetteAt(0, 12, 24)));
}

TEST(Rosette, aCautionComesBeforeTheRefusal) {
  const auto measured = measuredBy(rosetteAt(0, 20, 40, 100, 90, 80), Isotropic{210000, 0.3});
  ASSERT_TRUE(measured);
  EXPECT_GT(measured->solution.errorGain, cautionedErrorGain);
  EXPECT_NE(plain(measured->contribution.cautions.front()).find("nearly parallel"), std::string::npos);
}

TEST(Elastic, constantsOutsideTheirRangeAreRefused) {
  EXPECT_EQ(problemsOf(Isotropic{0, 0.3}).front().place, "E");
  EXPECT_EQ(problemsOf(Isotropic{200000, 0.51}).front().place, "nu");
  EXPECT_EQ(problemsOf(Isotropic{200000, -1}).front().place, "nu");
  EXPECT_TRUE(problemsOf(Isotropic{200000, 0.5}).empty());
  const Orthotropic timber{11600, 390, 0.4, 650, degrees(5)};
  EXPECT_TRUE(problemsOf(timber).empty());
  Orthotropic wrong = timber;
  wrong.nu12 = 5.6; // 31.4 is more than 11600/390 = 29.7
  EXPECT_EQ(problemsOf(wrong).front().place, "nu12");
}

RC_GTEST_PROP(Elastic, anOrthotropicMaterialWithEqualConstantsIsIsotropic, ()) {
  const PlaneStrain strain = *strains();
  const Isotropic same{70000, 0.33};
  const PlaneStress expected = stressOf(strain, same);
  const PlaneStress stress = stressOf(strain, Orthotropic{70000, 70000, 0.33, same.G(), degrees(*angles())});
  const double tolerance = 1e-10;
  RC_ASSERT(std::abs(stress.sx - expected.sx) <= tolerance);
  RC_ASSERT(std::abs(stress.sy - expected.sy) <= tolerance);
  RC_ASSERT(std::abs(stress.txy - expected.txy) <= tolerance);
}

RC_GTEST_PROP(Elastic, stressAlongTheLineAloneStrainsAsItsConstantsSay, ()) {
  // From the definitions: pulled along the line by s, e along = s/E1 and e across = -nu12 s/E1.
  const Orthotropic timber{11600, 390, 0.4, 650, degrees(*angles())};
  const double s = 7.5;
  const PlaneStrain ofLine{s / timber.along, -timber.nu12 * s / timber.along, 0};
  const PlaneStress stress = stressOf(inTurnedAxes(ofLine, -timber.line), timber);
  const PlaneStress inLine = inTurnedAxes(stress, timber.line);
  RC_ASSERT(std::abs(inLine.sx - s) <= 1e-11);
  RC_ASSERT(std::abs(inLine.sy) <= 1e-11);
  RC_ASSERT(std::abs(inLine.txy) <= 1e-11);
}

TEST(Measured, theWorkingEvaluatesToWhatTheProgramComputed) {
  for (const Elastic& elastic :
       {Elastic(Isotropic{210000, 0.3}), Elastic(Orthotropic{11600, 390, 0.4, 650, degrees(12)})}) {
    const auto measured = measuredBy(rosetteAt(0, 60, 120, 190, 200, -300), elastic);
    ASSERT_TRUE(measured);
    for (const Step& step : measured->contribution.steps)
      EXPECT_NEAR(step.formula.valueWith(step.putIn), step.result,
                  1e-9 * std::max(1e-3, std::abs(step.result)))
          << plain(written(step));
  }
}

TEST(Measured, stepsAreWrittenInMicrostrain) {
  const auto measured = measuredBy(rosetteAt(0, 45, 90, 100, 300, -200), Isotropic{180000, 0.28});
  ASSERT_TRUE(measured);
  EXPECT_EQ(plain(written(measured->contribution.steps.at(3))),
            "ε1 = (εx + εy)/2 + √(((εx − εy)/2)² + (γxy/2)²) = (100.0 µε + (−200.0 µε))/2 + "
            "√(((100.0 µε − (−200.0 µε))/2)² + (700.0 µε/2)²) = 330.8 µε");
}

} // namespace
} // namespace planewright
