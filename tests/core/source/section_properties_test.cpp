// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/source/section_properties.h"

#include "core/working/written.h"
#include "tests/support/section_gen.h"
#include "tests/support/strips.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

SectionProperties of(const Section& section) {
  return propertiesOf(regionOf(section));
}

bool close(double a, double b, double tolerance = 1e-12) {
  return std::abs(a - b) <= tolerance * std::max(std::abs(a), std::abs(b));
}

TEST(SectionProperties, ofARectangle) {
  const SectionProperties p = of(rectangleSection(90, 240));
  EXPECT_DOUBLE_EQ(p.A, 21600);
  EXPECT_DOUBLE_EQ(p.Iz, 103.68e6);
  EXPECT_DOUBLE_EQ(p.Iy, 14.58e6);
  EXPECT_EQ(p.Iyz, 0);
  EXPECT_DOUBLE_EQ(p.WzTop(), 864e3);
  EXPECT_DOUBLE_EQ(p.WyLeft(), 324e3);
  EXPECT_DOUBLE_EQ(p.centroidFromBottom(), 120);
  EXPECT_DOUBLE_EQ(p.centroidFromLeft(), 45);
}

// Closed forms of a half circle turned into a whole: pi d^2/4, pi d^4/64.
TEST(SectionProperties, ofRoundSections) {
  const double pi = std::numbers::pi;
  EXPECT_TRUE(close(of(circleSection(80)).A, 1600 * pi));
  EXPECT_TRUE(close(of(circleSection(80)).Iz, 640000 * pi));
  EXPECT_TRUE(close(of(tubeSection(80, 10)).Iy, (640000 - 202500) * pi));
}

// By hand: legs 100x10 and 10x90, sum of areas times heights 54500, then the theorem of parallel axes.
TEST(SectionProperties, ofAnAngleHaveAProductOfInertia) {
  const SectionProperties p = of(builtSection({{100, 10, 5, 50, {}}, {10, 90, 55, 5, {}}}));
  EXPECT_NEAR(p.A, 1900, 1e-9);
  EXPECT_NEAR(p.centroidFromBottom(), 54500.0 / 1900, 1e-9);
  EXPECT_NEAR(p.centroidFromLeft(), 54500.0 / 1900, 1e-9);
  EXPECT_NEAR(p.Iz, 1800043.86, 0.005);
  EXPECT_NEAR(p.Iy, 1800043.86, 0.005);
  EXPECT_NEAR(p.Iyz, -1065789.47, 0.005);
}

RC_GTEST_PROP(SectionProperties, areThoseOfTheSameShapeBuiltOfRectangles, ()) {
  const Section section = anySharpSection();
  RC_PRE(problemsOf(section).empty());
  const SectionProperties a = of(section);
  const SectionProperties b = of(rebuilt(section));
  RC_ASSERT(problemsOf(rebuilt(section)).empty());
  RC_ASSERT(close(a.A, b.A) && close(a.Iz, b.Iz) && close(a.Iy, b.Iy) && a.Iyz == 0 && b.Iyz == 0);
  RC_ASSERT(close(a.yTop, b.yTop, 1e-10) && close(a.zLeft, b.zLeft, 1e-10));
}

RC_GTEST_PROP(SectionProperties, areThoseOfStrips, ()) {
  const Section section = anySection();
  RC_PRE(problemsOf(section).empty());
  const Region region = regionOf(section);
  const auto sum = [&](auto part) {
    return overStrips(
        region, region.yLow, [&](double y, const Span& span, double thin) { return thin * part(y, span); },
        1500);
  };
  const double area = sum([](double, const Span& span) { return span.length(); });
  const double first = sum([](double y, const Span& span) { return span.length() * y; });
  const double Iz = sum([](double y, const Span& span) { return span.length() * y * y; });
  const double Iy =
      sum([](double, const Span& span) { return (std::pow(span.to, 3) - std::pow(span.from, 3)) / 3; });
  const SectionProperties p = propertiesOf(region);
  RC_ASSERT(close(area, p.A, 1e-4) && close(Iz, p.Iz, 1e-4) && close(Iy, p.Iy, 1e-4));
  RC_ASSERT(std::abs(first) <= 1e-4 * p.A * region.yHigh);
}

// Turning every block turns the axes: I_y, I_z, I_yz follow the rotation of a second-order tensor.
RC_GTEST_PROP(SectionProperties, ofTurnedBlocksAreThoseOfTurnedAxes, ()) {
  const double b = anyLength(5, 200);
  const double h = anyLength(5, 200);
  const double thick = anyLength(5, 50);
  const double degrees = *rc::gen::inRange(-1800, 1801) / 10.0;
  const Angle turn = Angle::fromDegrees(degrees);
  const auto [cos, sin] = cosSin(turn);
  const std::vector<Block> level = {{b, thick, 0, 0, {}},
                                    {thick, h, thick / 2 + h / 2, thick / 2 - b / 2, {}}};
  std::vector<Block> turned;
  for (const Block& block : level)
    turned.push_back({block.b, block.h, block.y * cos + block.z * sin, block.z * cos - block.y * sin, turn});
  RC_ASSERT(problemsOf(builtSection(turned)).empty());
  const SectionProperties p = of(builtSection(level));
  const SectionProperties q = of(builtSection(turned));
  const double scale = p.Iy + p.Iz;
  RC_ASSERT(close(p.A, q.A));
  RC_ASSERT(std::abs(q.Iz - (p.Iz * cos * cos + p.Iy * sin * sin + 2 * p.Iyz * sin * cos)) <= 1e-11 * scale);
  RC_ASSERT(std::abs(q.Iy - (p.Iy * cos * cos + p.Iz * sin * sin - 2 * p.Iyz * sin * cos)) <= 1e-11 * scale);
  RC_ASSERT(std::abs(q.Iyz - ((p.Iy - p.Iz) * sin * cos + p.Iyz * (cos * cos - sin * sin))) <= 1e-11 * scale);
}

void expectStepsHold(const Section& section) {
  for (const Step& step : propertySteps(section)) {
    EXPECT_NEAR(step.formula.valueWith(step.putIn), step.result, 1e-9 * std::abs(step.result))
        << plain(step.name) << ": " << plain(written(step));
    EXPECT_FALSE(step.source.empty());
  }
}

TEST(PropertySteps, everyFormulaConfirmsItsResult) {
  expectStepsHold(rectangleSection(90, 240));
  expectStepsHold(circleSection(80));
  expectStepsHold(tubeSection(114.3, 5));
  expectStepsHold(boxSection(100, 200, 6, 8));
  expectStepsHold(iSection(300, 7.1, 150, 10.7, 120, 14, 15));
  expectStepsHold(tSection(200, 100, 8, 12));
  expectStepsHold(channelSection(200, 75, 8, 11));
  expectStepsHold(builtSection({{100, 10, 5, 50, {}}, {10, 90, 55, 5, {}}}));
  expectStepsHold(builtSection({{40, 60, 0, 0, Angle::fromDegrees(30)}}));
}

TEST(PropertySteps, areWrittenWithNumbersAndUnits) {
  const std::vector<Step> steps = propertySteps(rectangleSection(90, 240));
  ASSERT_EQ(steps.size(), 7u);
  EXPECT_EQ(plain(written(steps[0])), "A = b · h = 90 mm · 240 mm = 21.60 10³ mm²");
  EXPECT_EQ(plain(written(steps[1])), "Iz = b · h³/12 = 90 mm · (240 mm)³/12 = 103.7 10⁶ mm⁴");
  const std::vector<Step> composed = propertySteps(tSection(200, 100, 8, 12));
  EXPECT_EQ(
      plain(written(composed[1])),
      "ys = (b1 · h1 · y1 + b2 · h2 · y2)/A = (100 mm · 12 mm · 194 mm + 8 mm · 188 mm · 94 mm)/(2704 mm²) = "
      "138.4 mm");
}

TEST(PropertySteps, followTheUnitsOfTheStudy) {
  const Unit inch{"in", dimension::length, 254, 10};
  const std::vector<Step> steps = propertySteps(rectangleSection(2 * 25.4, 4 * 25.4), {.length = inch});
  EXPECT_EQ(plain(written(steps[1])), "Iz = b · h³/12 = 2 in · (4 in)³/12 = 10.67 in⁴");
}

} // namespace
} // namespace planewright
