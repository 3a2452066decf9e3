// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/summary_text.h"

#include "core/screen/screened.h"
#include "tests/support/field_reading.h"
#include "tests/support/judged_study.h"

#include <gmock/gmock.h>

namespace planewright {
namespace {

using testing::HasSubstr;
using testing::Not;

std::string summaryOfTable(const std::string& table, const std::vector<LeftOut>& leftOut = {}) {
  const Study study = judgedStudy();
  const Result<ScreenPlan> plan = screenPlanOf(study, "P1");
  const Results<FieldReading> reading = readingOf(study, table);
  const FieldResults results = *screened(*plan, reading->field);
  return summaryText(study, "P1", *plan, *reading, results, summaryOf(reading->field, results), leftOut);
}

TEST(SummaryText, saysWhatWasReadWhatGovernsAndWhatToBearInMind) {
  const std::string text = summaryOfTable("point,layer,case,sx,sy,txy,id\n"
                                          "a,top,G,1,0,0,7\na,top,S,1,0,0,7\n"
                                          "b,mid,G,9,0.5,1,7\nb,mid,S,9,0.5,1,7\n"
                                          "c,top,G,1,inf,0,7\n",
                                          {{"corner*", 12}});
  EXPECT_THAT(text, HasSubstr("Judged by point P1, over 2 combinations."));
  EXPECT_THAT(text, HasSubstr("Check scarf is not used: it judges a plane"));
  EXPECT_THAT(text, HasSubstr("Rows: 5, of them faulty and left out: 1, of these not finite: 1."));
  EXPECT_THAT(text, HasSubstr("Points: 2, judged: 2"));
  EXPECT_THAT(text, HasSubstr("Points left out by “corner*”: 12"));
  EXPECT_THAT(text, HasSubstr("Column not read: id"));
  EXPECT_THAT(text, HasSubstr("at point b; 99.9 % of the points do not exceed"));
  EXPECT_THAT(text, testing::ContainsRegex("\n  b +mid +[0-9]"));
  EXPECT_THAT(text, HasSubstr("Caution: k"));
  EXPECT_TRUE(text.ends_with("local codes and a licensed engineer decide.\n"));
}

TEST(SummaryText, hasTenOfTheWorstAndAStrokeForEveryBinWithAPoint) {
  std::string table = "point,case,sx,sy,txy\n";
  for (int i = 1; i <= 200; ++i)
    for (const char* id : {"G", "S"})
      table += exactNumber(i) + "," + id + "," + (i == 1 ? "0" : "0.5") + ",0,0\n";
  table += "hot,G,500,0,0\nhot,S,500,0,0\n";
  const std::string text = summaryOfTable(table);
  EXPECT_THAT(text, HasSubstr("\n  hot "));
  EXPECT_THAT(text, HasSubstr("\n  10 "));
  EXPECT_THAT(text, Not(HasSubstr("\n  11 ")));
  EXPECT_THAT(text, testing::ContainsRegex("above 2.0 +1 #\n"));
  EXPECT_THAT(text, testing::ContainsRegex("up to 0.2 +199 ########################################\n"));
}

} // namespace
} // namespace planewright
