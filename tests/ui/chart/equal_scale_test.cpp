// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/chart/equal_scale.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <cmath>

namespace planewright {
namespace {

using testing::ElementsAre;

const QRectF plot(40, 20, 300, 200);

TEST(EqualScale, MapsTheMiddleAndGoesTheRightWay) {
  const EqualScale up(plot, {10, 0}, 5, false);
  EXPECT_EQ(up.pixelOf({10, 0}), QPointF(190, 120));
  EXPECT_EQ(up.pixelOf({20, 4}), QPointF(240, 100));
  const EqualScale down(plot, {10, 0}, 5, true);
  EXPECT_EQ(down.pixelOf({20, 4}), QPointF(240, 140));
}

TEST(EqualScale, ComesBackToTheValues) {
  for (const double size : {1e-12, 1.0, 1e12})
    for (const bool down : {true, false}) {
      const EqualScale scale(plot, {3 * size, -size}, 7 / size, down);
      const QPointF back = scale.valuesAt(scale.pixelOf({2.5 * size, 0.25 * size}));
      EXPECT_NEAR(back.x() / size, 2.5, 1e-13);
      EXPECT_NEAR(back.y() / size, 0.25, 1e-13);
    }
}

TEST(EqualScale, RangeIsWhatThePlotShows) {
  const QRectF range = EqualScale(plot, {10, -2}, 5, true).range();
  EXPECT_DOUBLE_EQ(range.left(), -20);
  EXPECT_DOUBLE_EQ(range.right(), 40);
  EXPECT_DOUBLE_EQ(range.top(), -22);
  EXPECT_DOUBLE_EQ(range.bottom(), 18);
}

TEST(Need, TheScaleLeavesExactlyThePadsOfTheNarrowest) {
  const std::vector<Need> needs = {{2, 4, 50, 60}, {-1, 8, 5, 5}};
  const double scale = greatestScale(needs, 300);
  EXPECT_DOUBLE_EQ(scale,
                   std::min({(300 - 110) / 2.0, (300 - 10) / 9.0, (300 - 55) / 6.0, (300 - 65) / 5.0}));
  const double middle = middleOf(needs, scale);
  for (const Need& need : needs) {
    EXPECT_GE(150 + scale * (need.low - middle), need.padLow - 1e-9);
    EXPECT_LE(150 + scale * (need.high - middle), 300 - need.padHigh + 1e-9);
  }
}

TEST(Need, WithoutExtentAnyScaleFits) {
  EXPECT_TRUE(std::isinf(greatestScale({{3, 3, 10, 10}}, 300)));
}

TEST(Ticks, StepsAreOneTwoFive) {
  EXPECT_DOUBLE_EQ(tickStep(0.9), 1);
  EXPECT_DOUBLE_EQ(tickStep(1), 1);
  EXPECT_DOUBLE_EQ(tickStep(1.1), 2);
  EXPECT_DOUBLE_EQ(tickStep(2.1), 5);
  EXPECT_DOUBLE_EQ(tickStep(5.1), 10);
  EXPECT_DOUBLE_EQ(tickStep(3e-10), 5e-10);
  EXPECT_DOUBLE_EQ(tickStep(7e20), 1e21);
}

TEST(Ticks, HoldZeroWhereverItIsInView) {
  EXPECT_THAT(ticksBetween(-7, 12, 5), ElementsAre(-5, 0, 5, 10));
  for (double low = -9.7; low < 0; low += 0.37) {
    const std::vector<double> ticks = ticksBetween(low, low + 11, 2);
    EXPECT_THAT(ticks, testing::Contains(0.0));
  }
}

TEST(Ticks, FarFromZeroAreStillWholeSteps) {
  EXPECT_THAT(tickLabels(ticksBetween(99.9991, 100.0011, 0.0005), 0.0005),
              ElementsAre("99.9995", "100.0000", "100.0005", "100.0010"));
}

TEST(Ticks, AreBoundedHoweverFineTheStep) {
  EXPECT_LE(ticksBetween(0, 1, 1e-9).size(), 1001U);
}

TEST(TickLabels, HaveTrueMinusAndOneCountOfDecimals) {
  EXPECT_THAT(tickLabels({-5, 0, 5}, 5), ElementsAre("\u22125", "0", "5"));
  EXPECT_THAT(tickLabels({-0.5, 0, 0.5}, 0.5), ElementsAre("\u22120.5", "0", "0.5"));
  EXPECT_THAT(tickLabels({1000, 1100}, 100), ElementsAre("1000", "1100"));
}

TEST(TickLabels, GoScientificWhereDecimalsWouldNotDo) {
  EXPECT_THAT(tickLabels({-2e-9, 0, 2e-9}, 1e-9), ElementsAre("\u22122e\u22129", "0", "2e\u22129"));
  EXPECT_THAT(tickLabels({1.5e12, 2e12}, 5e11), ElementsAre("1.5e12", "2.0e12"));
}

} // namespace
} // namespace planewright
