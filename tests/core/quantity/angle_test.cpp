// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/angle.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>
#include <numbers>

namespace planewright {
namespace {

Angle deg(double degrees) {
  return Angle::fromDegrees(degrees);
}

TEST(Angle, cosineAndSineAreExactAtMultiplesOf90AndAlikeAt45) {
  for (int turn = -8; turn <= 8; ++turn) {
    const CosSin quarter = cosSin(deg(90.0 * turn));
    EXPECT_TRUE(quarter.cos == 0 || std::abs(quarter.cos) == 1) << turn;
    EXPECT_TRUE(quarter.sin == 0 || std::abs(quarter.sin) == 1) << turn;
    EXPECT_EQ(std::abs(quarter.cos) + std::abs(quarter.sin), 1) << turn;
    EXPECT_NEAR(quarter.cos, std::cos(turn * std::numbers::pi / 2), 1e-14) << turn;
    EXPECT_NEAR(quarter.sin, std::sin(turn * std::numbers::pi / 2), 1e-14) << turn;
    const CosSin diagonal = cosSin(deg(45 + 90.0 * turn));
    EXPECT_EQ(std::abs(diagonal.cos), std::abs(diagonal.sin)) << turn;
  }
}

RC_GTEST_PROP(Angle, cosineAndSineAgreeWithTheLibraryInLongDouble, (int millidegrees)) {
  const double degrees = millidegrees / 1000.0;
  const CosSin own = cosSin(deg(degrees));
  const long double radians =
      std::remainder(static_cast<long double>(degrees), 360.0L) * std::numbers::pi_v<long double> / 180;
  RC_ASSERT(std::abs(static_cast<double>(std::cos(radians)) - own.cos) <= 4e-16);
  RC_ASSERT(std::abs(static_cast<double>(std::sin(radians)) - own.sin) <= 4e-16);
}

TEST(Angle, foldsToTheHalfOpenHalfTurn) {
  EXPECT_EQ(folded(deg(-90)).degrees(), 90);
  EXPECT_EQ(folded(deg(90)).degrees(), 90);
  EXPECT_EQ(folded(deg(270)).degrees(), 90);
  EXPECT_EQ(folded(deg(94)).degrees(), -86);
  EXPECT_EQ(folded(deg(180)).degrees(), 0);
  EXPECT_FALSE(std::signbit(folded(deg(-180)).degrees()));
  EXPECT_FALSE(std::signbit(folded(deg(-0.0)).degrees()));
}

RC_GTEST_PROP(Angle, foldingIsIdempotentAndKeepsTheDirection, (int tenths)) {
  const Angle angle = deg(tenths / 10.0);
  const Angle once = folded(angle);
  RC_ASSERT(once.degrees() > -90);
  RC_ASSERT(once.degrees() <= 90);
  RC_ASSERT(folded(once) == once);
  RC_ASSERT(apart(once, angle).degrees() <= 1e-6);
}

RC_GTEST_PROP(Angle, lineToNormalAndBack, (int tenths)) {
  const LineAngle line{folded(deg(tenths % 1800 / 10.0))};
  RC_ASSERT(apart(cutOf(following(line)).value, line.value).degrees() <= 1e-12);
  RC_ASSERT(apart(normalOf(cutOf(crossing(line))).value, crossing(line).value).degrees() <= 1e-12);
  RC_ASSERT(apart(crossing(line).value, following(line).value).degrees() >= 90 - 1e-12);
}

} // namespace
} // namespace planewright
