// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/sheet_pages.h"

#include "core/figure/metrics.h"
#include "core/quantity/format.h"
#include "core/report/make_sheet.h"
#include "core/report/sheet_html.h"
#include "tests/support/judged_study.h"

#include <gtest/gtest.h>

#include "tests/support/study_gen.h"

#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

/// The judged study with its point as often as is asked for.
Study studyWith(int points) {
  Study study = judgedStudy();
  for (int i = 2; i <= points; ++i) {
    study.points.push_back(study.points.front());
    study.points.back().name = "P" + std::to_string(i);
  }
  return study;
}

std::string wordsOf(const Picture& page) {
  std::string words;
  for (const auto& part : page.parts)
    if (const auto* label = std::get_if<Label>(&part))
      words += plain(label->runs) + "\n";
  return words;
}

/// Text that leaves the paper's margins, or a picture of another size.
std::string faultIn(const Picture& page, Vec size) {
  if (page.width != size.x || page.height != size.y)
    return "size of the page";
  for (const auto& part : page.parts)
    if (const auto* label = std::get_if<Label>(&part)) {
      const double width = textWidth(label->runs, label->size, label->bold);
      const double left = label->align == Align::start ? label->at.x
                          : label->align == Align::end ? label->at.x - width
                                                       : label->at.x - width / 2;
      if (left < 24.9 || left + width > size.x - 14.9 || label->at.y < 12 || label->at.y > size.y - 9)
        return plain(label->runs);
    }
  return {};
}

class Pagination : public testing::TestWithParam<int> {};

TEST_P(Pagination, everyPageHasItsNumberAndStaysInsideItsMargins) {
  const Sheet sheet = sheetOf(studyWith(GetParam()), {});
  for (const auto& [paper, size] :
       {std::pair{Paper::a4, Vec{210, 297}}, {Paper::letter, Vec{215.9, 279.4}}}) {
    const std::vector<Picture> pages = pagesOf(sheet, paper);
    for (std::size_t i = 0; i < pages.size(); ++i) {
      EXPECT_EQ(faultIn(pages[i], size), "") << "page " << i + 1;
      const std::string number = std::to_string(i + 1) + " of " + std::to_string(pages.size());
      EXPECT_NE(wordsOf(pages[i]).find(number), std::string::npos);
      EXPECT_NE(wordsOf(pages[i]).find(plain(sheet.identity)), std::string::npos);
    }
    EXPECT_GE(pages.size(), static_cast<std::size_t>(2 * GetParam()));
  }
}

INSTANTIATE_TEST_SUITE_P(Points, Pagination, testing::Values(1, 2, 60));

TEST(SheetPages, aHeadingIsNeverTheLastOfAPage) {
  const Sheet sheet = sheetOf(studyWith(7), {});
  std::vector<std::string> headings;
  for (const SheetBlock& block : sheet.blocks)
    if (const auto* heading = std::get_if<SheetHeading>(&block))
      headings.push_back(heading->number + "  " + plain(heading->words));
  for (const Picture& page : pagesOf(sheet, Paper::a4)) {
    // The foot has three labels; what stands before them is the last of the body.
    std::vector<const Label*> labels;
    for (const auto& part : page.parts)
      if (const auto* label = std::get_if<Label>(&part))
        labels.push_back(label);
    ASSERT_GT(labels.size(), 4u);
    const std::string last = plain(labels[labels.size() - 4]->runs);
    EXPECT_EQ(std::ranges::count(headings, last), 0) << last;
  }
}

RC_GTEST_PROP(SheetPages, anyStudyIsSetAndWritten, ()) {
  const Study study = *anyStudy();
  SheetOrder order;
  order.depth = *rc::gen::element(Depth::results, Depth::governing, Depth::all);
  order.figures = *rc::gen::inRange(0, 4) == 0;
  const Sheet sheet = sheetOf(study, order);
  RC_ASSERT(!sheet.disagrees);
  const std::vector<Picture> pages = pagesOf(sheet, Paper::a4);
  RC_ASSERT(!pages.empty());
  RC_ASSERT(sheetHtml(sheet).ends_with("</html>\n"));
}

} // namespace
} // namespace planewright
