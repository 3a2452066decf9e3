// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/page_flow.h"

#include <gtest/gtest.h>

#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

PageStrip strip(double height, bool keeps = false, const std::string& name = "x") {
  PageStrip one;
  one.height = height;
  one.before = 1;
  one.keepsWithNext = keeps;
  Label label;
  label.runs = {{name, false}};
  one.parts.emplace_back(label);
  return one;
}

std::vector<std::size_t> counts(const std::vector<PageStrip>& strips, double height) {
  std::vector<std::size_t> result;
  for (const auto& page : flowed(strips, height))
    result.push_back(page.size());
  return result;
}

TEST(PageFlow, fillsPages) {
  EXPECT_EQ(counts({strip(4), strip(4), strip(4)}, 9), (std::vector<std::size_t>{2, 1}));
  EXPECT_EQ(counts({strip(4), strip(4), strip(4)}, 8.9), (std::vector<std::size_t>{1, 1, 1}));
}

TEST(PageFlow, keepsAHeadingWithWhatFollows) {
  EXPECT_EQ(counts({strip(5), strip(2, true), strip(4)}, 10), (std::vector<std::size_t>{1, 2}));
}

TEST(PageFlow, whatIsTooTallTogetherIsParted) {
  EXPECT_EQ(counts({strip(6, true), strip(6, true), strip(6)}, 10), (std::vector<std::size_t>{1, 1, 1}));
}

TEST(PageFlow, aTableRepeatsItsHead) {
  PageStrip row = strip(4);
  row.head = std::make_shared<const PageStrip>(strip(2, true, "head"));
  const auto pages = flowed({*row.head, row, row, row}, 11);
  ASSERT_EQ(pages.size(), 2u);
  EXPECT_EQ(plain(std::get<Label>(pages[1].front()).runs), "head");
  EXPECT_EQ(pages[1].size(), 3u);
}

RC_GTEST_PROP(PageFlow, losesNothingAndLeavesNoPage, ()) {
  std::vector<PageStrip> strips;
  const int count = *rc::gen::inRange(1, 60);
  for (int i = 0; i < count; ++i)
    strips.push_back(strip(*rc::gen::inRange(1, 90) / 10.0, *rc::gen::inRange(0, 3) == 0));
  strips.back().keepsWithNext = false;
  std::size_t parts = 0;
  for (const auto& page : flowed(strips, 10)) {
    RC_ASSERT(!page.empty());
    parts += page.size();
    for (const PicturePart& part : page)
      RC_ASSERT(std::get<Label>(part).at.y < 10);
  }
  RC_ASSERT(parts == strips.size());
}

} // namespace
} // namespace planewright
