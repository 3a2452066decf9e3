// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/combination_text.h"
#include "core/study/copied_point.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

Study withCases(std::initializer_list<const char*> ids) {
  Study study = newStudy();
  study.cases.clear();
  study.points.front().stress.clear();
  for (const char* id : ids)
    study.cases.push_back({id, "", Nature::variable, Duration::medium, {}});
  return study;
}

TEST(CombinationText, readsTermsAsPeopleWriteThem) {
  const Study study = withCases({"G", "S", "W", "W2"});
  const auto factors = factorsIn(study, "1.35 G + 1.5*0.7 S - W + (1+0.5)*W2");
  ASSERT_TRUE(factors) << plain(factors.error());
  EXPECT_EQ(*factors, (std::vector<Factor>{{"G", "1.35"}, {"S", "1.5*0.7"}, {"W", "-1"}, {"W2", "(1+0.5)"}}));
  EXPECT_EQ(*factorsIn(study, "G"), (std::vector<Factor>{{"G", "1"}}));
  EXPECT_EQ(*factorsIn(study, "-0.5 G"), (std::vector<Factor>{{"G", "-0.5"}}));
  EXPECT_EQ(*factorsIn(study, "1e-1 G + 2*-3 S"), (std::vector<Factor>{{"G", "1e-1"}, {"S", "2*-3"}}));
}

TEST(CombinationText, theLongestIdEndsATerm) {
  const Study study = withCases({"G", "crane G"});
  EXPECT_EQ(factorsIn(study, "1.2 crane G")->front().caseId, "crane G");
}

TEST(CombinationText, wrongTermsAreToldWithTheirColumn) {
  const Study study = withCases({"G", "S"});
  struct Wrong {
    const char* text;
    int column;
    const char* piece;
  };
  for (const Wrong& wrong :
       {Wrong{"1.35 G + 1.5 X", 10, "names no case"}, Wrong{"1.35 G + 1,5 S", 10, "comma"},
        Wrong{"G + S + 2 G", 9, "stands twice"}, Wrong{"", 1, "names no case"},
        Wrong{"G + ", 4, "names no case"}, Wrong{"2 kN G", 1, "plain number"}}) {
    const auto factors = factorsIn(study, wrong.text);
    ASSERT_FALSE(factors) << wrong.text;
    EXPECT_EQ(factors.error().column, wrong.column) << wrong.text;
    EXPECT_NE(plain(factors.error()).find(wrong.piece), std::string::npos) << plain(factors.error());
  }
}

TEST(CombinationText, addedAndSetCombinationsGoByTheirExpression) {
  Study study = withCases({"G", "S"});
  study = *edited(study, *editsThatAdd(study, "1.35 G + 1.5 S"));
  ASSERT_EQ(study.combinations.size(), 1u);
  EXPECT_EQ(study.combinations[0].name, "1.35 G + 1.5 S");
  EXPECT_EQ(textOf(study.combinations[0]), "1.35 G + 1.5 S");
  study = *edited(study, *editsThatSet(study, "1.35 G + 1.5 S", "1.5 S - 0.9 G"));
  EXPECT_EQ(study.combinations[0].name, "1.5 S - 0.9 G");
  EXPECT_EQ(study.combinations[0].factors, (std::vector<Factor>{{"S", "1.5"}, {"G", "-0.9"}}));
  study = *edited(study, Edit{Rename{{Spot::combination, "1.5 S - 0.9 G", {}}, "uplift"}});
  study = *edited(study, *editsThatSet(study, "uplift", "1.5 S"));
  EXPECT_EQ(study.combinations[0].name, "uplift") << "a name of its own stays";
}

TEST(CombinationText, whatIsWrittenReadsBackWithItsValues) {
  const Study study = withCases({"G", "S", "W+x"});
  for (const char* factor : {"1.35", "-1", "1 - 0.5", "1-0.5", "-1 + 2", "- 0.5", "-(1 + 2)*3", "1.5*0.7",
                             "2^-1", "1e-3", "min(1, 2 - 0.5)", "+2"})
    for (const char* id : {"S", "W+x"}) {
      const Combination one{"any", {{"G", factor}, {id, factor}}, Basis::design};
      const Result<std::vector<Factor>> read = factorsIn(study, textOf(one));
      ASSERT_TRUE(read) << textOf(one) << ": " << plain(read.error());
      ASSERT_EQ(read->size(), 2U) << textOf(one);
      for (std::size_t i = 0; i < 2; ++i) {
        EXPECT_EQ((*read)[i].caseId, one.factors[i].caseId);
        EXPECT_EQ(readEntry((*read)[i].factor, {})->value, readEntry(factor, {})->value) << textOf(one);
      }
    }
}

class CombinationNames : public testing::Test {
protected:
  Study take(const Edits& edits) {
    const Result<Study> after = edited(study, edits);
    EXPECT_TRUE(after) << plain(after.error());
    return after.value_or(study);
  }
  static std::vector<std::string> namesIn(const Study& study) {
    std::vector<std::string> names;
    for (const Combination& one : study.combinations)
      names.push_back(one.name);
    return names;
  }

  Study study = [] {
    Study made = withCases({"G", "S", "W"});
    made.combinations = {{"1.35 G", {{"G", "1.35"}}},
                         {"1.35 G + 1.5*0.7 S", {{"G", "1.35"}, {"S", "1.5*0.7"}}},
                         {"1.35 G + 1.05 S", {{"G", "1.35"}, {"S", "1.5*0.7"}}},
                         {"1.5 S", {{"S", "1.5"}}},
                         {"1.35 G + 1.5 S + 0.9 W", {{"G", "1.35"}, {"S", "1.5"}, {"W", "1.5*0.6"}}},
                         {"snow", {{"S", "1.5"}}}};
    made.shown.combination = "1.35 G + 1.05 S";
    return made;
  }();
};

TEST_F(CombinationNames, expressionsFollowACaseThatIsRenamed) {
  const Study after = take(editsThatRenameCase(study, "S", "Q"));
  EXPECT_EQ(namesIn(after), (std::vector<std::string>{"1.35 G", "1.35 G + 1.5*0.7 Q", "1.35 G + 1.05 Q",
                                                      "1.5 Q", "1.35 G + 1.5 Q + 0.9 W", "snow"}));
  EXPECT_EQ(after.shown.combination, "1.35 G + 1.05 Q");
  EXPECT_EQ(edited(after, editsThatRenameCase(after, "Q", "S")), study) << "and back";
}

TEST_F(CombinationNames, aNameThatIsTakenStays) {
  study.combinations.push_back({"1.5 Q", {{"G", "1"}}});
  const Study after = take(editsThatRenameCase(study, "S", "Q"));
  EXPECT_EQ(after.combinations[3].name, "1.5 S");
  EXPECT_FALSE(edited(study, editsThatRenameCase(study, "S", "W")));
}

TEST_F(CombinationNames, whatIsLeftWithoutACaseStandsOnce) {
  const Study after = take(editsThatRemoveCase(study, "S"));
  EXPECT_EQ(namesIn(after), (std::vector<std::string>{"1.35 G", "1.35 G + 0.9 W", "snow"}));
  EXPECT_TRUE(after.combinations[2].factors.empty());
  EXPECT_EQ(after.shown.combination, "");
}

TEST_F(CombinationNames, linesAreAddedAllOrNone) {
  const Study after = take(*editsThatAddLines(study, "1.35 G\r\n\n 1 G + 1.5 W \nwind\t1.5 W\r\n"));
  ASSERT_EQ(after.combinations.size(), study.combinations.size() + 2) << "1.35 G is there already";
  EXPECT_EQ(after.combinations[6].name, "1 G + 1.5 W");
  EXPECT_EQ(after.combinations[7], (Combination{"wind", {{"W", "1.5"}}, Basis::design}));
  const auto wrong = [&](const char* text) {
    const Result<Edits> edits = editsThatAddLines(study, text);
    return edits ? "taken" : std::to_string(edits.error().line) + ": " + plain(edits.error().what);
  };
  EXPECT_EQ(wrong("1 G\n1 X"), "2: “1 X” names no case.");
  EXPECT_EQ(wrong("snow\t1 G"), "1: The name “snow” is taken.");
  EXPECT_EQ(wrong("a\t1 G\na\t1 W"), "2: The name “a” is taken.");
  EXPECT_EQ(wrong(" \n"), "0: There is no combination in this text.");
  EXPECT_TRUE(editsThatAddLines(study, "1.35 G")->empty());
}

TEST_F(CombinationNames, aBuiltOneIsRenamedByItsNewFactors) {
  const Study after = take(*editsThatSet(study, "1.35 G + 1.05 S", "1.35 G + 1.5 W"));
  EXPECT_EQ(after.combinations[2].name, "1.35 G + 1.5 W");
}

TEST(CombinationText, aNameThatSaysOtherFactorsIsSeen) {
  const Study study = withCases({"G", "Q"});
  const auto lies = [&](const char* name, std::vector<Factor> factors) {
    return isMisnamed(study, {name, std::move(factors), Basis::design});
  };
  EXPECT_TRUE(lies("1 G + 1 Q", {{"G", "1.35"}, {"Q", "1.5"}}));
  EXPECT_TRUE(lies("G + Q", {{"G", "1"}}));
  EXPECT_TRUE(lies("1.35 G", {{"G", "1.35"}, {"Q", "1.5"}}));
  EXPECT_TRUE(lies("1.5*0.7 Q", {{"Q", "1.5*0.5"}}));
  EXPECT_FALSE(lies("1.5 Q + 1.35 G", {{"G", "1.35"}, {"Q", "1.5"}})) << "the order does not matter";
  EXPECT_FALSE(lies("1.05 Q", {{"Q", "1.5*0.7"}}));
  EXPECT_FALSE(lies("0.93 Q", {{"Q", "1.4/1.5"}})) << "rounded";
  EXPECT_FALSE(lies("1.35 G", {{"G", "1.35"}, {"Q", "0"}}));
  EXPECT_FALSE(lies("fundamental", {{"G", "1.35"}})) << "no expression";
  EXPECT_FALSE(lies("1.35 G, 2", {{"G", "1"}})) << "no expression";
}

TEST(CombinationText, theNextOneHasOnlyCasesThatMeet) {
  const auto next = [](const Study& study) {
    const Study after = edited(study, editsThatAddNext(study)).value();
    return after.combinations.back().name + ": " + textOf(after.combinations.back());
  };
  Study study = newStudy();
  EXPECT_EQ(next(study), "1 G: 1 G");
  study.combinations = {{"1 G", {{"G", "1"}}}};
  EXPECT_EQ(next(study), "2 G: 2 G");
  study.cases.push_back({"W", "", Nature::variable, Duration::medium, {}});
  study.cases.push_back({"X", "", Nature::variable, Duration::medium, {"W"}});
  study.cases.push_back({"M", "", Nature::measured, Duration::medium, {}});
  EXPECT_EQ(next(study), "1 G + 1 W: 1 G + 1 W");
  study.cases = {{"M", "", Nature::measured, Duration::medium, {}}};
  study.points.front().stress.front().caseId = "M";
  study.combinations.clear();
  EXPECT_EQ(next(study), "1 M: 1 M");
  study.combinations = {{"1 M", {{"M", "1"}}}};
  EXPECT_EQ(next(study), "1 M, 2: 1 M");
}

TEST(CopiedPoint, hasEverythingThatWasSaidOfIt) {
  Study study = newStudy();
  Point& point = study.points.front();
  point.note = "heel";
  point.lines = {Line{"bond", LineKind::bond, "1 in 12", "3 deg"}};
  point.planes = {{"scarf", "55 deg", "2 deg"}};
  study.materials.emplace_back().name = "oak";
  point.checks.emplace_back();
  point.checks.back().id = "1";
  point.checks.back().material = "oak";
  point.checks.back().line = "bond";
  ASSERT_EQ(problemsIn(study), Problems());
  point.reading = "30 deg";
  study = *edited(study, editsThatCopyPoint(study, "P1", freshPointName(study, "P1")));
  ASSERT_EQ(study.points.size(), 2u);
  EXPECT_EQ(study.points[1].name, "P2");
  Point same = study.points[1];
  same.name = "P1";
  EXPECT_EQ(same, study.points[0]);
}

TEST(CopiedPoint, freshNamesCountOn) {
  Study study = newStudy();
  EXPECT_EQ(freshPointName(study, "P1"), "P2");
  EXPECT_EQ(freshPointName(study, "heel"), "heel 2");
  EXPECT_EQ(freshPointName(study, "P0"), "P2") << "P1 is taken";
  EXPECT_EQ(freshPointName(study, "P123456789012"), "P123456789012 2");
}

} // namespace
} // namespace planewright
