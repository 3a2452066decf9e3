// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/working/step.h"
#include "core/working/written.h"

#include <gtest/gtest.h>

#include <cmath>

namespace planewright {
namespace {

const Formula a = Formula::symbol("a");
const Formula b = Formula::symbol("b_{1}");
const Formula angle = Formula::symbol("θ");
const NumbersPutIn numbers = {{"a", -3, 1, false}, {"b_{1}", 4, 2, false}, {"θ", 30, 1, true}};

std::string inSymbols(const Formula& formula) {
  return plain(written(formula));
}
std::string inNumbers(const Formula& formula) {
  return plain(written(formula, numbers));
}

TEST(Formula, evaluatesEveryOperation) {
  const auto value = [](const Formula& formula) { return formula.valueWith(numbers); };
  EXPECT_EQ(value(a + b), 1);
  EXPECT_EQ(value(a - b), -7);
  EXPECT_EQ(value(a * b), -12);
  EXPECT_EQ(value(a / b), -0.75);
  EXPECT_EQ(value(-a), 3);
  EXPECT_EQ(value(power(a, 2)), 9);
  EXPECT_EQ(value(root(b)), 2);
  EXPECT_EQ(value(hypotenuse(a, b)), 5);
  EXPECT_EQ(value(cosine(3 * angle)), 0);
  EXPECT_NEAR(value(sine(angle)), 0.5, 1e-15);
  EXPECT_NEAR(value(tangent(angle)), 1 / std::sqrt(3.0), 1e-15);
  EXPECT_EQ(value(tangent(1.5 * angle)), 1);
  EXPECT_EQ(value(absolute(a)), 3);
  EXPECT_EQ(value(absolute(b)), 4);
  EXPECT_EQ(value(power(b, 1.5)), 8);
  EXPECT_EQ(value(arcTangent(b, -b)), 135);
  EXPECT_EQ(value(arcTangent(-0.0, -1)), 180);
  EXPECT_EQ(value(greatest({a, b, 7})), 7);
  EXPECT_EQ(value(least({a, b, 7})), -3);
  EXPECT_EQ(value(Formula::degrees(45) + angle), 75);
}

TEST(Formula, isWrittenInSymbols) {
  EXPECT_EQ(inSymbols((a + b) / 2), "(a + b1)/2");
  EXPECT_EQ(inSymbols(a + b / 2), "a + b1/2");
  EXPECT_EQ(inSymbols(a - (b - 2)), "a − (b1 − 2)");
  EXPECT_EQ(inSymbols(a / (b * 2)), "a/(b1 · 2)");
  EXPECT_EQ(inSymbols((a - b) / 2 * cosine(2 * angle)), "(a − b1)/2 · cos(2θ)");
  EXPECT_EQ(inSymbols(-(a / 2 * sine(2 * angle)) + b), "−a/2 · sin(2θ) + b1");
  EXPECT_EQ(inSymbols(a - (-b)), "a − (−b1)");
  EXPECT_EQ(inSymbols(hypotenuse((a - b) / 2, b)), "√(((a − b1)/2)² + b1²)");
  EXPECT_EQ(inSymbols(power(power(a, 3), b)), "(a³)^b1");
  EXPECT_EQ(inSymbols(root(a + b)), "√(a + b1)");
  EXPECT_EQ(inSymbols(power(absolute(a - b), 2)), "|a − b1|²");
  EXPECT_EQ(inSymbols(a * power(sine(angle), b)), "a · sin(θ)^b1");
  EXPECT_EQ(inSymbols(b / tangent(2 * angle)), "b1/tan(2θ)");
  EXPECT_EQ(inSymbols(arcTangent(2 * a, a - b) / 2), "atan2(2a, a − b1)/2");
  EXPECT_EQ(inSymbols((greatest({a, b}) - least({a, b})) / 2), "(max(a, b1) − min(a, b1))/2");
  EXPECT_EQ(inSymbols(a - Formula::degrees(45)), "a − 45°");
}

TEST(Formula, isWrittenWithNumbersPutIn) {
  EXPECT_EQ(inNumbers((a + b) / 2), "(−3.0 + 4.00)/2");
  EXPECT_EQ(inNumbers(b + a), "4.00 + (−3.0)");
  EXPECT_EQ(inNumbers(b - a), "4.00 − (−3.0)");
  EXPECT_EQ(inNumbers(a * b), "(−3.0) · 4.00");
  EXPECT_EQ(inNumbers(hypotenuse(a, b)), "√((−3.0)² + 4.00²)");
  EXPECT_EQ(inNumbers(cosine(2 * angle)), "cos(2 · 30.0°)");
  EXPECT_EQ(inNumbers(absolute(a) / b), "|−3.0|/4.00");
  EXPECT_EQ(inNumbers(power(sine(angle), 1.5)), "sin(30.0°)^1.5");
}

TEST(Formula, numbersOfSeveralKindsAreWrittenInUnitsOfTheirOwn) {
  const Formula moment = Formula::symbol("M_{z}");
  const Formula y = Formula::symbol("y");
  const Formula second = Formula::symbol("I_{z}");
  const NumbersPutIn mixed = {{"M_{z}", -12.4e6, 1, false, "kN·m", 1e6},
                              {"y", 120, 0, false, "mm", 1},
                              {"I_{z}", 368.64e6, 2, false, "10⁶ mm⁴", 1e6}};
  const Formula bending = -(moment * y / second);
  EXPECT_EQ(plain(written(bending, mixed)), "−(−12.4 kN·m) · 120 mm/(368.64 10⁶ mm⁴)");
  EXPECT_DOUBLE_EQ(bending.valueWith(mixed), 12.4e6 * 120 / 368.64e6);
  EXPECT_EQ(plain(written(y + y, mixed)), "120 mm + 120 mm");
  EXPECT_EQ(plain(written(power(y, 3), mixed)), "(120 mm)³");
}

TEST(Formula, indicesStayIndices) {
  const Runs expected = {{"a + b", false}, {"1", true}};
  EXPECT_EQ(runs(written(a + b)), expected);
}

TEST(Formula, equalTreesAreEqual) {
  EXPECT_EQ((a + b) / 2, (a + b) / 2);
  EXPECT_NE((a + b) / 2, (a + b) / 3);
  EXPECT_NE(a + b, a - b);
}

TEST(Step, theResultIsWrittenInItsUnit) {
  const Step step{
      PW_TEXT("Test", "second moment"), symbol("I_{z}"), a, numbers, 368.64e6, 1, "10⁶ mm⁴", {}, 1e6};
  EXPECT_EQ(shownResult(step), "368.6 10⁶ mm⁴");
}

TEST(Step, isWrittenAsOneLine) {
  const Step step{PW_TEXT("Test", "mean"), symbol("σ_{m}"), (a + b) / 2, numbers, 0.5, 2, "MPa", {}};
  EXPECT_EQ(plain(written(step)), "σm = (a + b1)/2 = (−3.0 + 4.00)/2 = 0.50 MPa");
  Step degrees = step;
  degrees.unit = "°";
  EXPECT_EQ(shownResult(degrees), "0.50°");
}

} // namespace
} // namespace planewright
