// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/figure/text_lines.h"

#include "core/figure/metrics.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

constexpr double size = 2;

Runs words(std::string_view text) {
  return {{std::string(text), false}};
}

std::vector<std::string> linesOf(const Runs& text, double width) {
  std::vector<std::string> lines;
  for (const Runs& line : brokenLines(text, width, size, false)) {
    EXPECT_LE(textWidth(line, size, false), width + 1e-9) << plain(line);
    lines.push_back(plain(line));
  }
  return lines;
}

TEST(BrokenLines, breakAtTheLastSpaceThatFits) {
  const double width = textWidth(words("Angles from"), size, false);
  const std::vector<std::string> expected = {"Angles from", "+x, seen", "from +z."};
  EXPECT_EQ(linesOf(words("Angles from +x, seen from +z."), width), expected);
}

TEST(BrokenLines, keepIndicesLowered) {
  const Runs text = {{"stress τ", false}, {"nt", true}, {" acts", false}};
  const std::vector<Runs> lines = brokenLines(text, textWidth(words("stress τnt"), size, false), size, false);
  ASSERT_EQ(lines.size(), 2U);
  const Runs first = {{"stress τ", false}, {"nt", true}};
  EXPECT_EQ(lines[0], first);
  EXPECT_EQ(lines[1], words("acts"));
}

TEST(BrokenLines, breakAWordThatIsTooWide) {
  const std::vector<std::string> lines = linesOf(words("σσσσσσσσσσ"), 4);
  std::string joined;
  for (const std::string& line : lines)
    joined += line;
  EXPECT_GT(lines.size(), 1U);
  EXPECT_EQ(joined, "σσσσσσσσσσ");
}

TEST(BrokenLines, nothingGivesNoLine) {
  EXPECT_TRUE(brokenLines({}, 10, size, false).empty());
  EXPECT_TRUE(brokenLines(words("  \n "), 10, size, false).empty());
}

TEST(Elided, leavesWhatFitsAndCutsWhatDoesNot) {
  const double width = textWidth(words("lower ch…"), size, false);
  EXPECT_EQ(elided(words("lower"), width, size, false), words("lower"));
  EXPECT_EQ(plain(elided(words("lower chord"), width, size, false)), "lower ch…");
  EXPECT_EQ(plain(elided(words("lower chord"), 0.1, size, false)), "…");
}

} // namespace
} // namespace planewright
