// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/built_combinations.h"
#include "core/study/readout.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

Study studyOf(const std::vector<std::pair<std::string, Nature>>& cases) {
  Study study = newStudy();
  study.cases.clear();
  for (const auto& [id, nature] : cases) {
    study.cases.push_back({id, "", nature, Duration::permanent, {}});
  }
  study.points.front().stress.clear();
  return study;
}

std::vector<std::string> namesBuilt(const Study& study, const CombinationFactors& factors) {
  const auto built = builtCombinations(study, factors);
  EXPECT_TRUE(built) << (built ? "" : plain(built.error().front()));
  std::vector<std::string> names;
  if (built)
    for (const Combination& combination : built->combinations)
      names.push_back(combination.name);
  return names;
}

TEST(BuiltCombinations, eachVariableCaseLeadsInTurn) {
  const Study study = studyOf({{"G", Nature::permanent}, {"S", Nature::variable}, {"W", Nature::variable}});
  EXPECT_EQ(namesBuilt(study, recommendedFactors(study)),
            (std::vector<std::string>{"1.35 G", "1 G", "1.35 G + 1.5 S", "1 G + 1.5 S", "1.35 G + 1.5 W",
                                      "1 G + 1.5 W", "1.35 G + 1.5 S + 0.9 W", "1 G + 1.5 S + 0.9 W",
                                      "1.35 G + 0.75 S + 1.5 W", "1 G + 0.75 S + 1.5 W"}));
}

TEST(BuiltCombinations, factorsStayAsTheyWereTyped) {
  const Study study = studyOf({{"G", Nature::permanent}, {"S", Nature::variable}, {"W", Nature::variable}});
  const auto built = builtCombinations(study, recommendedFactors(study));
  ASSERT_TRUE(built);
  const Combination& last = built->combinations.back();
  EXPECT_EQ(last.factors, (std::vector<Factor>{{"G", "1.00"}, {"S", "1.5*0.5"}, {"W", "1.5"}}));
  EXPECT_EQ(last.basis, Basis::design);
}

TEST(BuiltCombinations, thePairReducesThePermanentCasesWhereOneLeads) {
  const Study study = studyOf({{"G", Nature::permanent}, {"Q", Nature::variable}});
  CombinationFactors factors = recommendedFactors(study);
  factors.rule = CombinationRule::pair;
  EXPECT_EQ(namesBuilt(study, factors),
            (std::vector<std::string>{"1.35 G", "1 G", "1.35 G + 1.05 Q", "1 G + 1.05 Q", "1.1475 G",
                                      "1.1475 G + 1.5 Q", "1 G + 1.5 Q"}));
}

TEST(BuiltCombinations, casesThatExcludeEachOtherNeverMeet) {
  Study study = studyOf({{"G", Nature::permanent}, {"W", Nature::variable}, {"W2", Nature::variable}});
  study.cases[1].excludes = {"W2"};
  for (const std::string& name : namesBuilt(study, recommendedFactors(study)))
    EXPECT_FALSE(name.find(" W2") != std::string::npos && name.find(" W ") != std::string::npos) << name;
  EXPECT_EQ(namesBuilt(study, recommendedFactors(study)).size(), 6u);
}

// Without exclusions: 2^p (1 + v 2^(v-1)) by (6.10), where no two factors coincide.
TEST(BuiltCombinations, theirNumberIsTheClosedCount) {
  for (std::size_t p = 0; p <= 3; ++p)
    for (std::size_t v = 0; v <= 5; ++v) {
      std::vector<std::pair<std::string, Nature>> cases = {{"A", Nature::accidental}};
      for (std::size_t i = 0; i < p; ++i)
        cases.emplace_back("G" + std::string(1, static_cast<char>('a' + i)), Nature::permanent);
      for (std::size_t i = 0; i < v; ++i)
        cases.emplace_back("Q" + std::string(1, static_cast<char>('a' + i)), Nature::variable);
      const Study study = studyOf(cases);
      const std::size_t leads = v == 0 ? 1 : 1 + v * (std::size_t(1) << (v - 1));
      const std::size_t empty = p == 0 ? 1 : 0; // no term at all is no combination
      EXPECT_EQ(namesBuilt(study, recommendedFactors(study)).size(), (std::size_t(1) << p) * leads - empty)
          << p << " permanent, " << v << " variable";
    }
}

TEST(BuiltCombinations, tooManyAreRefusedBeforeTheyAreMade) {
  std::vector<std::pair<std::string, Nature>> cases;
  for (int i = 0; i < 40; ++i)
    cases.emplace_back("Q" + std::string(1, static_cast<char>('0' + i / 10)) +
                           std::string(1, static_cast<char>('0' + i % 10)),
                       Nature::variable);
  const auto built = builtCombinations(studyOf(cases), recommendedFactors(studyOf(cases)));
  ASSERT_FALSE(built);
  EXPECT_NE(plain(built.error().front()).find("more than 5000"), std::string::npos);
}

TEST(BuiltCombinations, eachFactorThatDoesNotReadIsToldAtItsPlace) {
  const Study study = studyOf({{"G", Nature::permanent}, {"S", Nature::variable}});
  CombinationFactors factors = recommendedFactors(study);
  factors.permanentUpper = "1,35";
  factors.variable = "-1.5";
  factors.accompanying.clear();
  const auto built = builtCombinations(study, factors);
  ASSERT_FALSE(built);
  ASSERT_EQ(built.error().size(), 3u);
  EXPECT_EQ(built.error()[0].place, "permanent upper");
  EXPECT_EQ(built.error()[1].place, "variable");
  EXPECT_EQ(built.error()[2].place, "S");
}

TEST(BuiltCombinations, whatTakesNoPartIsSaid) {
  const Study study = studyOf({{"G", Nature::permanent}, {"A", Nature::accidental}, {"M", Nature::measured}});
  const auto built = builtCombinations(study, recommendedFactors(study));
  ASSERT_TRUE(built);
  EXPECT_EQ(plain(built->notes.back()), "Neither permanent nor variable, so in none of them: A, M.");
}

TEST(BuiltCombinations, takenIntoAStudyTheyCombineTheirCases) {
  Study study = studyOf({{"G", Nature::permanent}, {"S", Nature::variable}});
  study.points.front().stress = {{"G", "-2 MPa", "0 MPa", "0 MPa", "0 MPa"},
                                 {"S", "3 MPa", "0 MPa", "1 MPa", "0 MPa"}};
  const auto built = builtCombinations(study, recommendedFactors(study));
  ASSERT_TRUE(built);
  const auto taken = edited(study, editsThatAdd(study, built->combinations));
  ASSERT_TRUE(taken) << plain(taken.error());
  EXPECT_EQ(taken->combinations, built->combinations);
  EXPECT_TRUE(editsThatAdd(*taken, built->combinations).empty());
  const Readout readout = evaluate(*taken);
  EXPECT_EQ(readout.states[2].combination, "1.35 G + 1.5 S");
  EXPECT_NEAR(readout.states[2].stress.sx, 1.35 * -2 + 1.5 * 3, 1e-12);
}

} // namespace
} // namespace planewright
