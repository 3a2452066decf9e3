// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/metrics.h"

#include "core/figure/advances.h"
#include "core/words/characters.h"

#include <gtest/gtest.h>

#include <algorithm>

namespace planewright {
namespace {

double widthOf(std::string_view text, bool bold = false) {
  return textWidth({{std::string(text), false}}, 2048, bold);
}

Label labelOf(const Runs& runs) {
  return {{10, 20}, runs, 2, Align::start, Role::ink, false, false, ""};
}

// Source: table hmtx of the font files of Liberation Sans 2.1.5.
TEST(Metrics, widthsAreThoseOfTheFont) {
  EXPECT_DOUBLE_EQ(widthOf("A"), 1366);
  EXPECT_DOUBLE_EQ(widthOf("A", true), 1479);
  EXPECT_DOUBLE_EQ(widthOf("0"), 1139);
  EXPECT_DOUBLE_EQ(widthOf("−"), 1196);
  EXPECT_DOUBLE_EQ(widthOf("θ"), 1139);
  EXPECT_DOUBLE_EQ(widthOf("Ab"), widthOf("A") + widthOf("b"));
}

TEST(Metrics, figuresAreAllOfOneWidth) {
  for (const bool bold : {false, true})
    for (char digit = '0'; digit <= '9'; ++digit)
      EXPECT_DOUBLE_EQ(widthOf(std::string(1, digit), bold), 1139) << digit;
}

TEST(Metrics, everyCharacterOfSymbolsAndWordsIsInTheTable) {
  const std::string_view needed = "σστθφ°−±–—·…“”|≤≥×²³ÄÖÜäöüßéàñçøåÆłšžőαβγΔΩМст";
  for (const Character& character : charactersOf(needed)) {
    const auto table = advanceTable();
    EXPECT_TRUE(std::any_of(table.begin(), table.end(), [&](const Advance& row) {
      return row.code == character.code;
    })) << character.bytes;
  }
}

TEST(Metrics, theTableAscends) {
  const auto table = advanceTable();
  ASSERT_GT(table.size(), 700U);
  EXPECT_TRUE(std::is_sorted(table.begin(), table.end(),
                             [](const Advance& a, const Advance& b) { return a.code <= b.code; }));
}

TEST(Metrics, whatTheFontLacksIsOneEmWide) {
  EXPECT_DOUBLE_EQ(widthOf("⊥"), 2048);
  EXPECT_DOUBLE_EQ(widthOf("木"), 2048);
  EXPECT_DOUBLE_EQ(widthOf("\xff"), 2048);
}

TEST(Metrics, anIndexIsSmallerAndReachesLower) {
  const Runs runs = {{"σ", false}, {"n", true}};
  EXPECT_DOUBLE_EQ(textWidth(runs, 2048, false), widthOf("σ") + 0.7 * widthOf("n"));
  const Box plain = boxOf(labelOf({{"x", false}}));
  const Box withIndex = boxOf(labelOf(runs));
  EXPECT_DOUBLE_EQ(plain.top, 20 - 2 * boxOver);
  EXPECT_DOUBLE_EQ(withIndex.bottom, 20 + 2 * boxUnderIndex);
  EXPECT_GT(withIndex.bottom, plain.bottom);
}

TEST(Metrics, theBoxFollowsTheAlignment) {
  Label label = labelOf({{"word", false}});
  const double width = textWidth(label.runs, 2, false);
  EXPECT_DOUBLE_EQ(boxOf(label).left, 10 - 2 * boxSide);
  label.align = Align::end;
  EXPECT_DOUBLE_EQ(boxOf(label).right, 10 + 2 * boxSide);
  label.align = Align::middle;
  EXPECT_DOUBLE_EQ(boxOf(label).left, 10 - width / 2 - 2 * boxSide);
}

TEST(Characters, malformedBytesComeOutOneByOne) {
  const auto codes = [](std::string_view text) {
    std::u32string result;
    for (const Character& character : charactersOf(text))
      result += character.code;
    return result;
  };
  EXPECT_EQ(codes("aσ木😀"), U"aσ木😀");
  EXPECT_EQ(codes("\xcf"), U"\xFFFD");
  EXPECT_EQ(codes("\xed\xa0\x80"), U"\xFFFD\xFFFD\xFFFD");   // a surrogate
  EXPECT_EQ(codes("\xe0\x80\x80z"), U"\xFFFD\xFFFD\xFFFDz"); // an overlong form
}

} // namespace
} // namespace planewright
