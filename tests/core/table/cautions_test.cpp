// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/cautions.h"

#include "core/table/table.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace planewright {
namespace {

using testing::Contains;
using testing::ElementsAre;
using testing::IsEmpty;

std::vector<std::string> words(const std::vector<Text>& cautions) {
  std::vector<std::string> sentences;
  for (const Text& caution : cautions)
    sentences.push_back(plain(caution));
  return sentences;
}

/// Cases G, Q and M of which the point lists G with 1 MPa, and Q where it is told.
Study studyWith(std::vector<Combination> combinations, const char* ofQ = nullptr) {
  Study study = newStudy();
  study.cases.push_back({"Q", "", Nature::variable, Duration::medium, {}});
  study.cases.push_back({"M", "", Nature::variable, Duration::medium, {}});
  study.points.front().stress.front().sx = "1 MPa";
  if (ofQ)
    study.points.front().stress.push_back({"Q", ofQ});
  study.combinations = std::move(combinations);
  return study;
}

const Combination ofBoth{"1.35 G + 1.5 Q", {{"G", "1.35"}, {"Q", "1.5"}}, Basis::design};
const Combination ofG{"1.35 G", {{"G", "1.35"}}, Basis::design};
const Combination ofM{"1 M", {{"M", "1"}}, Basis::design};

TEST(Cautions, aNameThatSaysOtherFactorsIsToldWhereItIsUsed) {
  Combination wrong = ofBoth;
  wrong.name = "1 G + 1 Q";
  const Readout readout = evaluate(studyWith({wrong, ofG}, "2 MPa"));
  const std::string caution =
      "The name “1 G + 1 Q” says other factors than the combination has: 1.35 G + 1.5 Q.";
  EXPECT_THAT(words(cautionsOf(readout, readout.states[0])), ElementsAre(caution));
  EXPECT_THAT(words(cautionsOf(readout, readout.states[1])), IsEmpty());
  EXPECT_THAT(words(cautionsOf(readout)), ElementsAre(caution));
}

TEST(Cautions, aCaseThatNoCombinationHasIsToldAtThePointsThatListIt) {
  const std::string caution = "Case Q has stresses here, but no combination has it.";
  const Readout readout = evaluate(studyWith({ofG}, "2 MPa"));
  EXPECT_THAT(words(cautionsOf(readout)), ElementsAre(caution));
  EXPECT_THAT(words(cautionsOf(readout, readout.states[0])), ElementsAre(caution));
  Combination without = ofBoth;
  without.factors[1].factor = "0";
  EXPECT_THAT(words(cautionsOf(evaluate(studyWith({without}, "2 MPa")))), Contains(caution));
  EXPECT_THAT(words(cautionsOf(evaluate(studyWith({ofG}, "0 MPa")))), IsEmpty());
  EXPECT_THAT(words(cautionsOf(evaluate(studyWith({ofBoth}, "2 MPa")))), IsEmpty());
  EXPECT_THAT(words(cautionsOf(evaluate(studyWith({}, "2 MPa")))),
              ElementsAre("No stresses are given for case M: it counts as 0."));
}

TEST(Cautions, aCaseThatCountsAsZeroIsToldWhereItIsJudged) {
  const std::string caution = "No stresses are given for case M: it counts as 0.";
  const Readout unjudged = evaluate(studyWith({ofG}));
  EXPECT_THAT(words(cautionsOf(unjudged)), IsEmpty());
  EXPECT_THAT(words(cautionsOf(unjudged, unjudged.states.back())), ElementsAre(caution))
      << "whoever looks at M alone";
  EXPECT_THAT(words(cautionsOf(evaluate(studyWith({ofG, ofM})))), ElementsAre(caution));
}

TEST(Cautions, aRangeSaysWhoseZeroIsInIt) {
  const Study study = studyWith({ofG, ofBoth, ofM});
  const Readout readout = evaluate(study);
  const std::string caution = "Least and greatest values count 0 for 1 M: none of its cases is listed here.";
  EXPECT_THAT(words(cautionsOfEnvelope(readout)), ElementsAre(caution));
  EXPECT_THAT(words(envelopeTable(study, readout).cautions), Contains(caution));
  EXPECT_THAT(words(cautionsOfEnvelope(evaluate(studyWith({ofG, ofBoth})))), IsEmpty());
  std::vector<Combination> many = {ofG};
  for (const char* factor : {"1", "2", "3", "4", "5"})
    many.push_back({std::string(factor) + " M", {{"M", factor}}, Basis::design});
  EXPECT_THAT(words(cautionsOfEnvelope(evaluate(studyWith(many)))),
              ElementsAre("Least and greatest values count 0 for 1 M, 2 M, 3 M and 2 more: none of its cases "
                          "is listed here."));
  EXPECT_THAT(words(cautionsOfEnvelope(evaluate(studyWith({ofM})))), IsEmpty()) << "no range";
}

} // namespace
} // namespace planewright
