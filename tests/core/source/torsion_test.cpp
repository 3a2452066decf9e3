// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/torsion.h"

#include "tests/support/section_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

double constantOf(const Section& section) {
  return torsionConstantOf(modelOf(section).value()).value().J;
}

double shearOf(const Section& section, double T, const Fibre& fibre) {
  const auto shear = torsionAt(modelOf(section).value(), T, fibre);
  EXPECT_TRUE(shear) << (shear ? "" : plain(shear.error()));
  return shear ? shear->txy : 0;
}

std::string problemOf(const Section& section, const Fibre& fibre) {
  const auto shear = torsionAt(modelOf(section).value(), 1e6, fibre);
  return shear ? "none" : plain(shear.error());
}

// The table of handbooks, from memory: a/t, c1, c2.
TEST(RectangleTorsion, agreesWithTheTablesOfHandbooks) {
  constexpr double table[][3] = {{1, 0.208, 0.141},  {1.5, 0.231, 0.196}, {2, 0.246, 0.229},
                                 {3, 0.267, 0.263},  {4, 0.282, 0.281},   {5, 0.291, 0.291},
                                 {10, 0.312, 0.312}, {1e6, 0.333, 0.333}};
  for (const auto& [ratio, c1, c2] : table) {
    EXPECT_NEAR(rectangleTorsion(ratio).c1, c1, 6e-4) << ratio;
    EXPECT_NEAR(rectangleTorsion(ratio).c2, c2, 6e-4) << ratio;
  }
  EXPECT_NEAR(rectangleTorsion(1).c1, rectangleTorsion(1).c3, 1e-15);
}

// The series as they are printed, summed plainly.
RC_GTEST_PROP(RectangleTorsion, isTheSeries, ()) {
  const double ratio = *rc::gen::inRange(100, 1500) / 100.0;
  const double pi = std::numbers::pi;
  double fifth = 0, cosh = 0, tanh = 0;
  for (int n = 1; n < 4001; n += 2) {
    fifth += std::tanh(n * pi * ratio / 2) / std::pow(n, 5);
    cosh += n < 200 ? 1 / (n * n * std::cosh(std::min(700.0, n * pi * ratio / 2))) : 0;
    tanh += (n % 4 == 1 ? 1 : -1) * std::tanh(n * pi * ratio / 2) / (1.0 * n * n);
  }
  const RectangleTorsion torsion = rectangleTorsion(ratio);
  const double c2 = 1.0 / 3 - 64 / (std::pow(pi, 5) * ratio) * fifth;
  RC_ASSERT(std::abs(torsion.c2 - c2) <= 1e-13);
  RC_ASSERT(std::abs(torsion.c1 - c2 / (1 - 8 / (pi * pi) * cosh)) <= 1e-13);
  RC_ASSERT(std::abs(torsion.c3 - c2 * pi * pi / 8 / tanh) <= 1e-6);
}

TEST(Torsion, constants) {
  const double pi = std::numbers::pi;
  EXPECT_NEAR(constantOf(circleSection(40)), pi * 80000, 1e-6);
  EXPECT_NEAR(constantOf(tubeSection(40, 10)), pi * 75000, 1e-6);
  EXPECT_NEAR(constantOf(iSection(300, 8, 150, 10, 120, 12, 0)), (150 * 1e3 + 278 * 512.0 + 120 * 1728.0) / 3,
              1e-6);
  // A square tube of middle line a: J = a^3 t.
  EXPECT_NEAR(constantOf(boxSection(102, 102, 2, 2)), 2e6, 1e-6);
  EXPECT_NEAR(constantOf(rectangleSection(240, 90)), constantOf(rectangleSection(90, 240)), 1e-6);
  EXPECT_NEAR(constantOf(rectangleSection(100, 100)), 0.1405770e8, 10);
}

// The face towards the viewer is sheared downwards by a right-handed T, the far face upwards; in either view.
TEST(Torsion, signs) {
  for (const Section& section :
       {circleSection(60), tubeSection(60, 6), rectangleSection(60, 60), boxSection(60, 60, 4, 4)})
    for (const View view : {View::side, View::top}) {
      const Fibre near = view == View::side ? Fibre{0, 30, view} : Fibre{30, 0, view};
      const Fibre far = view == View::side ? Fibre{0, -30, view} : Fibre{-30, 0, view};
      EXPECT_LT(shearOf(section, 1e6, near), 0);
      EXPECT_DOUBLE_EQ(shearOf(section, 1e6, far), -shearOf(section, 1e6, near));
      EXPECT_DOUBLE_EQ(shearOf(section, -1e6, near), -shearOf(section, 1e6, near));
    }
  EXPECT_NEAR(shearOf(circleSection(60), 1e6, {0, 30, View::side}), -16e6 / (std::numbers::pi * 216000),
              1e-9);
}

// A thin tube by the exact formula and by Bredt's: they meet as the wall gets thin.
TEST(Torsion, bredtsFormulaIsTheLimitOfTheTube) {
  const double tube = shearOf(tubeSection(1000, 1), 1e9, {0, 499.5, View::side});
  const double cell = std::numbers::pi * 499.5 * 499.5;
  EXPECT_NEAR(tube, -1e9 / (2 * cell), 1e-5 * std::abs(tube));
  // Of a box: T/(2 A_m t), each wall by its own thickness.
  EXPECT_NEAR(shearOf(boxSection(100, 200, 5, 8), 1e7, {0, 50, View::side}), -1e7 / (2 * 95 * 192.0 * 5),
              1e-9);
  EXPECT_NEAR(shearOf(boxSection(100, 200, 5, 8), 1e7, {100, 0, View::top}), -1e7 / (2 * 95 * 192.0 * 8),
              1e-9);
}

TEST(Torsion, ofOpenWallsIsLinearThroughTheWall) {
  const Section section = channelSection(200, 80, 8, 12);
  const Region region = modelOf(section)->region;
  const double J = constantOf(section);
  EXPECT_NEAR(shearOf(section, 1e6, {0, region.zLow + 8, View::side}), -1e6 * 8 / J, 1e-9);
  EXPECT_NEAR(shearOf(section, 1e6, {0, region.zLow, View::side}), 1e6 * 8 / J, 1e-9);
  EXPECT_NEAR(shearOf(section, 1e6, {0, region.zLow + 4, View::side}), 0, 1e-9);
  EXPECT_NEAR(shearOf(section, 1e6, {100, 20, View::top}), -1e6 * 12 / J, 1e-9);
  EXPECT_NEAR(shearOf(section, 1e6, {88, 20, View::top}), 1e6 * 12 / J, 1e-9);
}

TEST(Torsion, isRefusedWhereTheoryGivesNone) {
  EXPECT_EQ(problemOf(circleSection(60), {10, 0, View::side}),
            "The shear of torsion at this fibre does not lie in the plane that is seen. Look from the top, "
            "or take a "
            "fibre on a face that looks to the side.");
  EXPECT_NE(problemOf(rectangleSection(60, 90), {10, 30, View::side}), "none");
  EXPECT_NE(problemOf(rectangleSection(60, 90), {0, 0, View::side}), "none");
  EXPECT_EQ(shearOf(rectangleSection(60, 90), 1e6, {45, 30, View::side}), 0);
  EXPECT_NE(problemOf(boxSection(60, 90, 4, 4), {45, 0, View::side}), "none");
  EXPECT_NE(problemOf(iSection(300, 8, 150, 10, 150, 10, 0), {145, 40, View::side}), "none");
  EXPECT_EQ(problemOf(builtSection({{40, 60, 0, 0, Angle::fromDegrees(30)}}), {}),
            "The torsion of turned blocks is not given here. Leave T out, or type J as a tabled value.");
  EXPECT_EQ(problemOf(rebuilt(boxSection(60, 90, 4, 4)), {0, 30, View::side}),
            "These blocks enclose a cell: the sum of b t³/3 is not their torsion constant. Choose the hollow "
            "section, "
            "or leave T out.");
  EXPECT_EQ(problemOf({SectionShape::tabled, {{"A", 1}}}, {}),
            "The torsion constant J is not given. Give J, or leave T out.");
}

TEST(Torsion, saysHowFarItsTheoryReaches) {
  const auto cautions = [](const Section& section, const Fibre& fibre) {
    return torsionAt(modelOf(section).value(), 1e6, fibre).value().cautions.size();
  };
  EXPECT_EQ(cautions(circleSection(60), {0, 30, View::side}), 0u);
  EXPECT_EQ(cautions(boxSection(100, 200, 5, 5), {0, 50, View::side}), 0u);
  EXPECT_EQ(cautions(boxSection(100, 200, 12, 5), {0, 50, View::side}), 1u);
  EXPECT_EQ(cautions(boxSection(100, 200, 5, 5), {100, 50, View::side}), 1u);
  EXPECT_EQ(cautions(iSection(300, 8, 150, 10, 150, 10, 0), {0, 4, View::side}), 1u);
}

RC_GTEST_PROP(Torsion, constantIsThatOfTheSameShapeBuiltOfRectangles, ()) {
  const Section section =
      anySectionOf(*rc::gen::element(SectionShape::i, SectionShape::t, SectionShape::channel));
  RC_PRE(problemsOf(section).empty());
  const double J = constantOf(section);
  RC_ASSERT(std::abs(constantOf(rebuilt(section)) - J) <= 1e-9 * J);
}

} // namespace
} // namespace planewright
