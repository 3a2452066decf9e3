// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/arrangement.h"

#include "core/figure/figure.h"
#include "core/figure/svg.h"
#include "tests/core/figure/faults.h"
#include "tests/core/figure/studies.h"
#include "tests/support/approved.h"
#include "tests/support/judged_study.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <map>

namespace planewright {
namespace {

using enum FigureBlock;

FigureOrder arranged(double width, Arrangement arrangement, const char* blocks = "elements") {
  FigureOrder order;
  order.width = width;
  order.arrangement = arrangement;
  order.blocks = *blocksIn(blocks);
  order.parts.version = false;
  return order;
}

/// Where a heading of each block stands; blocks that are not there are not in it.
std::map<FigureBlock, Vec> headings(const Picture& picture) {
  const std::map<std::string, FigureBlock> words = {
      {"Given axes", elements}, {"τnt (MPa), + down", circle}, {"Plane", planes}};
  std::map<FigureBlock, Vec> found;
  for (const auto& part : picture.parts)
    if (const auto* label = std::get_if<Label>(&part)) {
      const std::string text = plain(label->runs);
      for (const auto& [word, block] : words)
        if (text.starts_with(word))
          found.try_emplace(block, label->at);
      if (text.starts_with("within") || text.starts_with("exceeds"))
        found.try_emplace(check, label->at);
    }
  return found;
}

TEST(Arrangement, readsAListAndFillsItUp) {
  EXPECT_EQ(*blocksIn("check,planes,circle,elements"), (FigureBlocks{check, planes, circle, elements}));
  EXPECT_EQ(*blocksIn("circle"), (FigureBlocks{circle, elements, planes, check}));
  EXPECT_EQ(*blocksIn("planes,circle"), (FigureBlocks{planes, circle, elements, check}));
  EXPECT_EQ(listOf(*blocksIn("planes,circle")), "planes,circle,elements,check");
  EXPECT_EQ(*blocksIn(listOf(usualBlocks)), usualBlocks);
}

TEST(Arrangement, refusesListsThatNameNothingOrOneBlockTwice) {
  for (const char* list : {"", "circle,", "round", "circle, planes", "Circle", "circle,circle"}) {
    const Result<FigureBlocks> blocks = blocksIn(list);
    ASSERT_FALSE(blocks) << list;
    EXPECT_EQ(blocks.error().place, "order");
    EXPECT_NE(plain(blocks.error()).find("elements,circle,planes,check"), std::string::npos) << list;
  }
}

TEST(Arrangement, setsElementsAndCircleBesideOrBelow) {
  const Study study = judgedStudy();
  for (const double width : {130.0, 160.0, 250.0}) {
    auto at = headings(figure(study, arranged(width, Arrangement::beside)));
    EXPECT_NEAR(at[elements].y, at[circle].y, 10) << width;
    EXPECT_LT(at[elements].x, at[circle].x) << width;
    at = headings(figure(study, arranged(width, Arrangement::beside, "circle")));
    EXPECT_NEAR(at[elements].y, at[circle].y, 10) << width;
    EXPECT_GT(at[elements].x, at[circle].x) << width;
    at = headings(figure(study, arranged(width, Arrangement::below)));
    EXPECT_LT(at[elements].y + 40, at[circle].y) << width;
    at = headings(figure(study, arranged(width, Arrangement::below, "circle")));
    EXPECT_GT(at[elements].y, at[circle].y + 40) << width;
  }
}

TEST(Arrangement, byWidthIsBesideFromItsLeastWidthOnAndBelowUnderIt) {
  const Study study = judgedStudy();
  const auto bytes = [&](double width, Arrangement arrangement) {
    return svgOf(figure(study, arranged(width, arrangement)), Palette::paper);
  };
  EXPECT_EQ(bytes(130, Arrangement::byWidth), bytes(130, Arrangement::beside));
  EXPECT_EQ(bytes(129, Arrangement::byWidth), bytes(129, Arrangement::below));
}

TEST(Arrangement, keepsTheOrderThatIsAskedFor) {
  const Study study = judgedStudy();
  for (const double width : {90.0, 160.0}) {
    FigureBlocks blocks = usualBlocks;
    do {
      FigureOrder order = arranged(width, Arrangement::below);
      order.blocks = blocks;
      const Picture picture = figure(study, order);
      auto at = headings(picture);
      ASSERT_EQ(at.size(), blocks.size()) << listOf(blocks);
      for (std::size_t i = 1; i < blocks.size(); ++i)
        EXPECT_LT(at[blocks[i - 1]].y, at[blocks[i]].y) << listOf(blocks) << " at " << width;
      EXPECT_EQ(labelFault(picture), "") << listOf(blocks);
      EXPECT_EQ(strokeFault(picture), "") << listOf(blocks);
    } while (std::ranges::next_permutation(blocks).found);
  }
}

TEST(Arrangement, isSoundInRandomStates) {
  for (unsigned seed = 0; seed < 600; ++seed) {
    Dice dice(seed);
    const Study study = someStudy(dice);
    FigureOrder order =
        arranged(dice.within(90, 400), dice.flip() ? Arrangement::below : Arrangement::byWidth,
                 dice.flip() ? "circle" : "planes,circle");
    order.textPoints = dice.within(7, 10);
    order.parts.givenElement = dice.flip();
    order.parts.turnedElement = dice.flip();
    const Picture picture = figure(study, order);
    EXPECT_EQ(labelFault(picture), "") << "seed " << seed;
    EXPECT_EQ(strokeFault(picture), "") << "seed " << seed;
    if (HasFailure())
      return;
  }
}

TEST(Arrangement, saysWhenTheWidthDoesNotHoldThemBesideOneAnother) {
  const Study study = judgedStudy();
  FigureOrder order = arranged(90, Arrangement::beside);
  const Result<Picture> picture = figureOf(study, evaluate(study), order);
  ASSERT_FALSE(picture);
  EXPECT_EQ(plain(picture.error()), "width: A width of 90 mm does not hold elements and circle beside one "
                                    "another. Take 130 mm or more, or set them one below another.");
  order.parts.givenElement = order.parts.turnedElement = false;
  EXPECT_TRUE(figureOf(study, evaluate(study), order)) << "a circle alone stands beside nothing";
}

TEST(Arrangement, looksAsApproved) {
  const Study study = judgedStudy();
  EXPECT_TRUE(
      matchesApproved("figure/circle-first-160.svg",
                      svgOf(figure(study, arranged(160, Arrangement::beside, "circle")), Palette::paper)));
  EXPECT_TRUE(matchesApproved(
      "figure/check-first-below-160.svg",
      svgOf(figure(study, arranged(160, Arrangement::below, "check,planes,circle")), Palette::paper)));
}

} // namespace
} // namespace planewright
