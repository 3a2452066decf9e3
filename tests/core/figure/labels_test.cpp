// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/labels.h"

#include "core/figure/label_rows.h"
#include "core/figure/metrics.h"
#include "tests/core/figure/dice.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>

namespace planewright {
namespace {

constexpr double size = 2.822;

LabelColumns columnsOf() {
  LabelColumns columns;
  columns.centre = 50;
  columns.leftEnd = 24;
  columns.rightStart = 76;
  columns.top = 0;
  columns.bottom = 80;
  columns.size = size;
  columns.leftStart = 0;
  columns.rightEnd = 100;
  return columns;
}

LabelWish wishAt(Vec mark, int number) {
  const std::string name = "σ" + std::to_string(number);
  return {mark, {{name + " −12.34", false}}, {{name, false}}, Role::state, number % 3 == 0, number, name};
}

std::vector<LabelWish> wishesAt(const std::vector<Vec>& marks) {
  std::vector<LabelWish> wishes;
  for (const Vec mark : marks)
    wishes.push_back(wishAt(mark, static_cast<int>(wishes.size())));
  return wishes;
}

/// Marks on a circle in all their special places, or anywhere between the columns.
std::vector<Vec> someMarks(Dice& dice, int most) {
  const bool onCircle = dice.flip();
  const double radius = dice.within(0, 22);
  std::vector<Vec> marks;
  for (int i = 0, count = dice.below(most + 1); i < count; ++i) {
    const double turn = 15.0 * dice.below(24) * 3.14159265358979 / 180;
    marks.push_back(onCircle ? Vec{50 + radius * std::cos(turn), 40 + radius * std::sin(turn)}
                             : Vec{dice.within(26, 74), dice.within(0, 80)});
  }
  return marks;
}

void expectNoOverlap(const PlacedLabels& placed, const LabelColumns& columns) {
  for (std::size_t i = 0; i < placed.labels.size(); ++i) {
    const Box box = boxOf(placed.labels[i]);
    ASSERT_TRUE(placed.labels[i].ground);
    ASSERT_TRUE(box.top >= columns.top - 1e-9);
    ASSERT_TRUE(box.bottom <= columns.bottom + 1e-9);
    ASSERT_TRUE(box.left >= columns.leftStart - boxSide * size - 1e-9);
    ASSERT_TRUE(box.right <= columns.rightEnd + boxSide * size + 1e-9);
    for (std::size_t j = 0; j < i; ++j)
      ASSERT_TRUE(!overlap(box, boxOf(placed.labels[j])));
  }
}

void expectNoCrossing(const PlacedLabels& placed) {
  for (std::size_t i = 0; i < placed.leaders.size(); ++i)
    for (std::size_t j = 0; j < i; ++j) {
      const auto& a = placed.leaders[i].points;
      const auto& b = placed.leaders[j].points;
      ASSERT_TRUE(!segmentsCross(a[0], a[1], b[0], b[1]));
    }
}

TEST(Labels, neverOverlapLeaveTheFrameOrCrossTheirLeaders) {
  for (unsigned seed = 0; seed < 5000; ++seed) {
    SCOPED_TRACE(seed);
    Dice dice(seed);
    const LabelColumns columns = columnsOf();
    const std::vector<LabelWish> wishes = wishesAt(someMarks(dice, 20));
    const PlacedLabels placed = placeLabels(wishes, columns);
    ASSERT_TRUE(placed.fits);
    ASSERT_TRUE(placed.labels.size() == wishes.size());
    ASSERT_TRUE(placed.shortened.empty());
    expectNoOverlap(placed, columns);
    expectNoCrossing(placed);
  }
}

TEST(Labels, keepTheOrderOfTheirMarks) {
  for (unsigned seed = 0; seed < 5000; ++seed) {
    SCOPED_TRACE(seed);
    Dice dice(seed);
    std::vector<Vec> marks = someMarks(dice, 20);
    for (Vec& mark : marks)
      mark.x = mark.x < 50 ? 30 : 70; // straight leaders from one upright never cross
    const std::vector<LabelWish> wishes = wishesAt(marks);
    const PlacedLabels placed = placeLabels(wishes, columnsOf());
    for (const Label& a : placed.labels)
      for (const Label& b : placed.labels) {
        const auto markOf = [&](const Label& label) {
          return std::find_if(wishes.begin(), wishes.end(),
                              [&](const auto& wish) { return wish.key == label.key; })
              ->mark;
        };
        if (a.align == b.align && markOf(a).y < markOf(b).y) {
          ASSERT_LT(a.at.y, b.at.y);
        }
      }
  }
}

TEST(Labels, aFullColumnGoesShortAndSharesRows) {
  for (unsigned seed = 0; seed < 5000; ++seed) {
    SCOPED_TRACE(seed);
    Dice dice(seed);
    LabelColumns columns = columnsOf();
    columns.bottom = dice.within(4, 40);
    const std::vector<LabelWish> wishes = wishesAt(someMarks(dice, 40));
    const PlacedLabels placed = placeLabels(wishes, columns);
    expectNoOverlap(placed, columns);
    ASSERT_TRUE(placed.fits == (placed.labels.size() == wishes.size()));
  }
}

TEST(Labels, theLeastWantedGoShortFirst) {
  LabelColumns columns = columnsOf();
  columns.bottom = 2.6 * labelPitch * size; // room for two rows and a half
  const std::vector<LabelWish> wishes = wishesAt({{70, 1}, {70, 2}, {70, 3}});
  const PlacedLabels placed = placeLabels(wishes, columns);
  EXPECT_TRUE(placed.fits);
  ASSERT_EQ(placed.labels.size(), 3U);
  const std::vector<std::string> expected = {"σ1", "σ2"};
  EXPECT_EQ(placed.shortened, expected);
  EXPECT_EQ(placed.labels[0].runs, wishes[0].longForm);
  EXPECT_DOUBLE_EQ(placed.labels[1].at.y, placed.labels[2].at.y);
}

TEST(Labels, aLabelTooWideForItsColumnGoesShort) {
  LabelColumns columns = columnsOf();
  columns.rightEnd = columns.rightStart + 8;
  const PlacedLabels placed = placeLabels(wishesAt({{30, 40}, {70, 40}}), columns);
  EXPECT_TRUE(placed.fits);
  EXPECT_EQ(placed.shortened, std::vector<std::string>{"σ1"});
}

TEST(Labels, noRoomAtAllIsSaid) {
  LabelColumns columns = columnsOf();
  columns.bottom = 1;
  const PlacedLabels placed = placeLabels(wishesAt({{70, 1}}), columns);
  EXPECT_FALSE(placed.fits);
  EXPECT_TRUE(placed.labels.empty());
}

TEST(Labels, aLoneLabelStandsLevelWithItsMark) {
  const PlacedLabels placed = placeLabels(wishesAt({{70, 40}}), columnsOf());
  ASSERT_EQ(placed.leaders.size(), 1U);
  EXPECT_DOUBLE_EQ(placed.leaders[0].points[1].y, 40);
  EXPECT_DOUBLE_EQ(placed.labels[0].at.y, 40 + capHeight / 2 * size);
  EXPECT_DOUBLE_EQ(placed.labels[0].at.x, 76);
}

double costOf(const std::vector<WishedHeight>& wished, const std::vector<double>& heights) {
  double cost = 0;
  for (std::size_t i = 0; i < wished.size(); ++i)
    cost += wished[i].weight * std::pow(heights[i] - wished[i].height, 2);
  return cost;
}

TEST(SpacedHeights, noFeasibleNeighbourIsBetter) {
  for (unsigned seed = 0; seed < 5000; ++seed) {
    SCOPED_TRACE(seed);
    Dice dice(seed);
    std::vector<WishedHeight> wished;
    for (int i = 0, count = 1 + dice.below(12); i < count; ++i)
      wished.push_back({dice.within(0, 40), 1.0 + dice.below(3)});
    std::sort(wished.begin(), wished.end(), [](const auto& a, const auto& b) { return a.height < b.height; });
    const std::vector<double> best = spacedHeights(wished, 3, 0, 40);
    const double bestCost = costOf(wished, best);
    for (std::size_t i = 0; i < best.size(); ++i) {
      ASSERT_TRUE(best[i] >= -1e-12);
      ASSERT_TRUE(best[i] <= 40 + 1e-12);
      ASSERT_TRUE(i == 0 || best[i] - best[i - 1] >= 3 - 1e-12);
    }
    // The feasible set is convex: if no step of whole groups lowers the cost, nothing does.
    for (std::size_t from = 0; from < best.size(); ++from)
      for (std::size_t to = from; to < best.size(); ++to)
        for (const double step : {-1e-3, 1e-3}) {
          std::vector<double> moved = best;
          for (std::size_t i = from; i <= to; ++i)
            moved[i] += step;
          const bool feasible = (from == 0 || moved[from] - moved[from - 1] >= 3) &&
                                (to + 1 == moved.size() || moved[to + 1] - moved[to] >= 3) &&
                                moved.front() >= 0 && moved.back() <= 40;
          ASSERT_TRUE(!feasible || costOf(wished, moved) >= bestCost - 1e-9);
        }
  }
}

} // namespace
} // namespace planewright
