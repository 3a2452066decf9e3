// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/plan.h"

#include "tests/support/judged_study.h"

#include <gmock/gmock.h>

namespace planewright {
namespace {

using testing::ElementsAre;
using testing::HasSubstr;

TEST(ScreenPlan, takesCombinationsFactorsAndChecksOfThePoint) {
  const Result<ScreenPlan> plan = screenPlanOf(judgedStudy(), "P1");
  ASSERT_TRUE(plan);
  EXPECT_THAT(plan->cases, ElementsAre("G", "S"));
  EXPECT_THAT(plan->acts, ElementsAre(true, true));
  ASSERT_EQ(plan->combinations.size(), 2U);
  EXPECT_EQ(plan->combinations[1].name, "1.35 G + 1.5 S");
  ASSERT_EQ(plan->checks.size(), 1U);
  EXPECT_EQ(plan->checks[0].setup.id, "grain");
  EXPECT_DOUBLE_EQ(plan->checks[0].forms[0].factor.value, 0.6 / 1.3);
  EXPECT_DOUBLE_EQ(plan->checks[0].forms[1].strengths.S, 4 * 0.9 / 1.3);
  ASSERT_EQ(plan->unscreened.size(), 1U);
  EXPECT_EQ(plan->unscreened[0].id, "scarf");
}

TEST(ScreenPlan, withoutCombinationsEachCaseIsOne) {
  Study study = judgedStudy();
  study.combinations.clear();
  EXPECT_EQ(screenPlanOf(study, "P1")->combinations.size(), 2U);
}

TEST(ScreenPlan, saysWhyACheckCannotJudgeAField) {
  Study study = judgedStudy();
  study.points[0].checks[0].criterion = Criterion::hankinson;
  const Result<ScreenPlan> none = screenPlanOf(study, "P1");
  ASSERT_FALSE(none);
  EXPECT_THAT(plain(none.error()), HasSubstr("uniaxial stress only"));
  const Result<ScreenPlan> asked = screenPlanOf(judgedStudy(), "P1", {"scarf"});
  ASSERT_FALSE(asked);
  EXPECT_THAT(plain(asked.error()), HasSubstr("judges a plane"));
  EXPECT_THAT(plain(screenPlanOf(judgedStudy(), "P1", {"nothing"}).error()), HasSubstr("“nothing”"));
  study.points[0].checks.clear();
  EXPECT_THAT(plain(screenPlanOf(study, "P1").error()), HasSubstr("no check"));
}

TEST(ScreenPlan, refusesACombinationWithoutAFactorForTheStrengths) {
  Study study = judgedStudy();
  study.materials[0].durations.permanent.clear();
  const Result<ScreenPlan> plan = screenPlanOf(study, "P1");
  ASSERT_FALSE(plan);
  EXPECT_EQ(plan.error().place, "points/P1/checks/grain");
  EXPECT_THAT(plain(plan.error()), HasSubstr("has no factor for loads"));
}

// Every criterion of a line but those for uniaxial stress.
TEST(ScreenPlan, knowsEveryCriterionOfCombinedStresses) {
  for (const Named<Criterion>& row : namesOf<Criterion>()) {
    if (rowOf(row.value).actsOn != ActsOn::line)
      continue;
    Study study = judgedStudy();
    study.points[0].checks.pop_back();
    study.points[0].checks[0].criterion = row.value;
    const bool isUniaxial = row.value == Criterion::hankinson || row.value == Criterion::compressionAtAngle ||
                            row.value == Criterion::taperedEdge;
    EXPECT_EQ(screenPlanOf(study, "P1").has_value(), !isUniaxial) << row.word;
  }
}

} // namespace
} // namespace planewright
