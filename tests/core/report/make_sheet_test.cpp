// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/report/make_sheet.h"

#include "core/record/fingerprint.h"
#include "core/report/sheet_html.h"
#include "core/report/sheet_text.h"
#include "core/working/recoverable.h"
#include "tests/support/approved.h"
#include "tests/support/judged_study.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <regex>
#include <sstream>

namespace planewright {
namespace {

TEST(Sheet, saysWhatItSaid) {
  SheetOrder order;
  order.studyName = "tie";
  EXPECT_TRUE(matchesApproved("report/judged.txt", sheetText(sheetOf(judgedStudy(), order))));
}

/// Where two texts differ: "12.8|12,8", in the order of the text.
std::vector<std::string> differences(const std::string& before, const std::string& after) {
  std::vector<std::string> found;
  for (std::size_t i = 0; i < before.size() && i < after.size(); ++i)
    if (before[i] != after[i])
      found.push_back(std::string{before[i], after[i]});
  return found;
}

TEST(Sheet, hasTheDecimalSignInItsNumbersAndWhatIsTypedAsItWas) {
  SheetOrder order;
  order.depth = Depth::all;
  const Study study = judgedStudy();
  const std::string point = sheetText(sheetOf(study, order));
  order.decimal = DecimalSign::comma;
  const std::string comma = sheetText(sheetOf(study, order));
  ASSERT_EQ(point.size(), comma.size());
  const std::vector<std::string> changes = differences(point, comma);
  EXPECT_GT(changes.size(), 200U);
  EXPECT_TRUE(std::ranges::all_of(changes, [](const std::string& one) { return one == ".,"; }));
  // What is left with a point is typed, a heading or the name of a combination: no line of working has one.
  std::istringstream lines(comma);
  for (std::string line; std::getline(lines, line);)
    if (line.find(" = ") != std::string::npos && line.ends_with(" MPa [4]")) {
      EXPECT_FALSE(std::regex_search(line, std::regex("[0-9]\\.[0-9]"))) << line;
    }
  EXPECT_NE(comma.find("1.35 G + 1.5 S"), std::string::npos);
}

TEST(Sheet, hasTheDecimalSignInTheNumbersOfItsCautions) {
  Study study = judgedStudy();
  study.points[0].stress[1].sy = "0.4 MPa";
  SheetOrder order;
  order.decimal = DecimalSign::comma;
  EXPECT_NE(sheetText(sheetOf(study, order)).find("(0,01/V)^0,2 is 0,46 at 0,5 m³"), std::string::npos);
}

TEST(Sheet, standsFirstWhatGoverns) {
  const Sheet sheet = sheetOf(judgedStudy(), {});
  const auto* box = std::get_if<SheetBox>(&sheet.blocks.front());
  ASSERT_NE(box, nullptr);
  EXPECT_EQ(box->alarms, sheet.exceeds);
  EXPECT_NE(plain(box->lines[1]).find("P1, 1.35 G + 1.5 S, check"), std::string::npos);
}

TEST(Sheet, everyStepFollowsFromItsPrintedNumbers) {
  SheetOrder order;
  order.depth = Depth::all;
  int steps = 0;
  for (const SheetBlock& block : sheetOf(judgedStudy(), order).blocks)
    if (const auto* step = std::get_if<SheetStep>(&block)) {
      EXPECT_TRUE(isRecoverable(step->step)) << plain(written(step->step));
      ++steps;
    }
  EXPECT_GT(steps, 30);
}

TEST(Sheet, depthChoosesTheWorking) {
  const auto stepsAt = [](Depth depth) {
    SheetOrder order;
    order.depth = depth;
    const Sheet sheet = sheetOf(judgedStudy(), order);
    return std::ranges::count_if(sheet.blocks,
                                 [](const auto& block) { return std::holds_alternative<SheetStep>(block); });
  };
  EXPECT_EQ(stepsAt(Depth::results), 0);
  EXPECT_GT(stepsAt(Depth::governing), 10);
  EXPECT_GT(stepsAt(Depth::all), stepsAt(Depth::governing));
}

TEST(Sheet, showsChosenPointsAlone) {
  Study study = judgedStudy();
  study.points.push_back(study.points.front());
  study.points.back().name = "other";
  SheetOrder order;
  order.points = {"other"};
  const std::string words = sheetText(sheetOf(study, order));
  EXPECT_NE(words.find("Point other"), std::string::npos);
  EXPECT_EQ(words.find("Point P1"), std::string::npos);
  EXPECT_NE(words.find("chosen points"), std::string::npos);
}

TEST(Sheet, isOneFileOfHtmlThatLoadsNothing) {
  const std::string html = sheetHtml(sheetOf(judgedStudy(), {}));
  for (const char* loading : {"<link", "<img", "src=", "@import", "url(", "<script"})
    EXPECT_EQ(html.find(loading), std::string::npos) << loading;
  EXPECT_NE(html.find("<math>"), std::string::npos);
  EXPECT_NE(html.find("<svg"), std::string::npos);
}

TEST(Fingerprint, changesWithEveryInputButNotWithNamesAndView) {
  const Study study = judgedStudy();
  const std::string before = fingerprintOf(study);
  EXPECT_EQ(before.size(), 19u);
  const auto after = [&](const Edit& edit) { return fingerprintOf(*edited(study, edit)); };
  EXPECT_EQ(after(Type{{Spot::titlePrepared, {}, {}}, "A. B."}), before);
  EXPECT_EQ(after(Type{{Spot::titleChecked, {}, {}}, "C. D."}), before);
  EXPECT_EQ(after(Type{{Spot::shownCombination, {}, {}}, "1.35 G"}), before);
  EXPECT_NE(after(Type{{Spot::titleRevision, {}, {}}, "B"}), before);
  EXPECT_NE(after(Type{{Spot::sx, "P1", "G"}, "1.61 MPa"}), before);
  EXPECT_NE(after(Type{{Spot::reading, "P1", {}}, "31 deg"}), before);
}

TEST(Fingerprint, bindsNamesToTheStudyForWhichTheyAreGiven) {
  const Place checked{Spot::titleChecked, {}, {}};
  const Study study = judgedStudy();
  EXPECT_EQ(signingsOf(study).checked, Signing::open);
  const Study bound = *editedAndSigned(study, {Type{checked, "C. D."}});
  EXPECT_EQ(signingsOf(bound).checked, Signing::bound);
  EXPECT_EQ(signingsOf(bound).prepared, Signing::open);
  EXPECT_EQ(plain(shownChecked(bound)), "C. D.");
  const Study changed = *editedAndSigned(bound, {Type{{Spot::sx, "P1", "G"}, "9 MPa"}});
  EXPECT_EQ(plain(shownChecked(changed)), "C. D., changed since checked");
  const Study again = *editedAndSigned(changed, {Type{checked, "C. D."}});
  EXPECT_EQ(signingsOf(again).checked, Signing::bound);
  const Study back = *editedAndSigned(changed, {Type{{Spot::sx, "P1", "G"}, "1.6 MPa"}});
  EXPECT_EQ(signingsOf(back).checked, Signing::bound);
  const Study cleared = *editedAndSigned(changed, {Type{checked, ""}});
  EXPECT_EQ(cleared.title.checkedFor, "");
}

TEST(Fingerprint, aNameThatAFileHasWithoutAStateIsNotTrusted) {
  Study study = judgedStudy();
  study.title.prepared = "A. B.";
  EXPECT_EQ(plain(shownPrepared(study)), "A. B., for an unknown state");
}

} // namespace
} // namespace planewright
