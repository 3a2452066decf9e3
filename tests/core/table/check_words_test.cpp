// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/check_words.h"

#include "core/study/edit.h"
#include "tests/support/judged_study.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

namespace planewright {
namespace {

using testing::Contains;
using testing::ElementsAre;
using testing::HasSubstr;
using testing::IsEmpty;
using testing::Not;

std::vector<std::string> words(const std::vector<Text>& texts) {
  std::vector<std::string> all;
  for (const Text& text : texts)
    all.push_back(plain(text));
  return all;
}

std::vector<std::string> cautionsOfCheck(const Study& study, std::size_t check) {
  return words(cautionsOf(evaluate(study), check));
}

/// The worst of a check over all combinations.
CheckReading worstOf(const Readout& readout, std::size_t check) {
  return readingOf(readout, *verdictOfCheck(readout, check).governing);
}

std::vector<std::string> sentences(const Study& study, std::size_t check) {
  const Readout readout = evaluate(study);
  return words(sentencesOf(readout.checks[check], *directionsOf(readout, check)));
}

/// A joint on the plane at 60 deg that the given stress along its normal presses or pulls.
Study joint(const std::string& sn) {
  Study study = judgedStudy();
  Material rough;
  rough.name = "rough";
  rough.kind = MaterialKind::coulomb;
  rough.basis = StrengthBasis::design;
  rough.cohesion = "0.5 MPa";
  rough.friction = "30 deg";
  study.materials.push_back(rough);
  study.points[0].checks[1].material = "rough";
  study.points[0].checks[1].criterion = Criterion::coulomb;
  study.points[0].stress = {CaseStress{"G", sn, sn, "0 MPa"}};
  return study;
}

Study welded() {
  Study study = judgedStudy();
  Material weld;
  weld.name = "weld";
  weld.kind = MaterialKind::throat;
  weld.fu = "470 MPa";
  weld.betaW = "0.9";
  weld.gammaM2 = "1.25";
  study.materials.push_back(weld);
  study.points[0].checks[1].material = "weld";
  study.points[0].checks[1].criterion = Criterion::throat;
  return study;
}

TEST(CheckWords, aPressedJointIsNotWithoutStress) {
  const Readout pressed = evaluate(joint("-5 MPa"));
  EXPECT_EQ(worstOf(pressed, 1).worst.utilisation, 0);
  EXPECT_EQ(plain(multiplierSentence(worstOf(pressed, 1).worst)),
            "No multiple of all loads reaches the limit.");
  const Readout free = evaluate(joint("0 MPa"));
  EXPECT_EQ(plain(multiplierSentence(worstOf(free, 1).worst)), "No stress acts.");
}

TEST(CheckWords, aPointWithoutStressesDoesNotReadAsPassed) {
  const Readout free = evaluate(joint("0 MPa"));
  EXPECT_EQ(verdictOf(free).standing, Standing::within);
  EXPECT_EQ(plain(shortVerdict(verdictOf(free))), "within: no stress is given");
  EXPECT_THAT(plain(verdictSentence(verdictOf(free))), HasSubstr("No stress is given at this point"));
  const Readout pressed = evaluate(joint("-5 MPa"));
  EXPECT_EQ(plain(shortVerdict(verdictOfCheck(pressed, 1))), "within, 0.00 of 1");
}

TEST(CheckWords, oneStressedCombinationIsStress) {
  Study study = judgedStudy();
  study.points[0].stress = {CaseStress{"S", "0.9 MPa", "0 MPa", "0 MPa"}};
  const Readout readout = evaluate(study);
  EXPECT_TRUE(readout.states[0].checks[0].worst.unstressed);
  EXPECT_TRUE(verdictOf(readout).stressed);
}

TEST(CheckWords, theWorstStandsInsideTheBandOfItsLine) {
  Study study = judgedStudy();
  study.points[0].lines[0].angle = "15 deg";
  study.points[0].lines[0].tolerance = "1 in 12";
  const Readout readout = evaluate(study);
  EXPECT_THAT(plain(worstSentence(readout.checks[0], worstOf(readout, 0))),
              HasSubstr("Worst at 19.76°, inside 15.00° ±\u00a04.76°; nominal"));
}

TEST(CheckWords, aProblemNamesItsCheckAndCombination) {
  Study study = judgedStudy();
  study.points[0].checks[0].criterion = Criterion::hankinson;
  const Readout readout = evaluate(study);
  EXPECT_THAT(plain(notJudgedSentence(readout, *verdictOf(readout).unjudged)),
              HasSubstr("Not judged: grain: C24, Hankinson, in 1.35 G. "));
}

TEST(CheckWords, aWeldSaysWhatItDividesBy) {
  const Readout readout = evaluate(welded());
  EXPECT_EQ(plain(factorSentence(worstOf(readout, 1).factor)), "fu over βw 0.9 and γM2 1.25.");
  EXPECT_THAT(words(cautionsOf(readout, 1)), Contains(HasSubstr("sees one shear on the throat")));
  EXPECT_FALSE(directionsOf(readout, 1)->best) << "a weld is where it is";
}

TEST(CheckWords, theVolumeFactorIsSaidWhereTheLineIsPulledAcross) {
  Study study = judgedStudy();
  EXPECT_THAT(cautionsOfCheck(study, 0), Not(Contains(HasSubstr("kvol")))) << "the shear presses across";
  study.points[0].stress[1].sy = "0.4 MPa";
  EXPECT_THAT(cautionsOfCheck(study, 0), Contains(HasSubstr("kvol = 1"))) << "in one combination";
}

TEST(CheckWords, anUnusualFactorIsCautionedWhereverItIsUsed) {
  Study study = judgedStudy();
  study.materials[0].durations.shortTerm = "9";
  EXPECT_THAT(cautionsOfCheck(study, 0), Contains("The duration factor for “short term” is 9, which is above "
                                                  "1.5: see that it is meant."));
  study.materials[0].factor = "60";
  EXPECT_THAT(cautionsOfCheck(study, 0), Contains(HasSubstr("The factor of the strengths is 60")));
  EXPECT_THAT(cautionsOfCheck(judgedStudy(), 0), Not(Contains(HasSubstr("above 1.5"))));
}

TEST(CheckWords, aMismatchIsSaidThoughItsCombinationDoesNotGovern) {
  Study study = judgedStudy();
  study.points[0].checks.pop_back();
  EXPECT_THAT(words(mismatchesOf(evaluate(study))), IsEmpty());
  study.combinations[0].basis = Basis::characteristic;
  const Readout readout = evaluate(study);
  ASSERT_EQ(verdictOf(readout).governing->state, 1u);
  EXPECT_THAT(words(mismatchesOf(readout)),
              ElementsAre("1.35 G: Design strengths against loads that are not design loads."));
  EXPECT_EQ(cautionsOfCheck(study, 0).front(),
            "1.35 G: Design strengths against loads that are not design loads.");
  EXPECT_THAT(words(mismatchesOf(evaluate(judgedStudy()))),
              ElementsAre("glue: Allowable strengths against factored design loads."));
}

TEST(CheckWords, aTaperedEdgeSaysThatTypedStressCountsAsBending) {
  Study study = judgedStudy();
  study.points[0].stress = {CaseStress{"G", "1.6 MPa", "0 MPa", "0 MPa"}};
  study.points[0].checks[0].criterion = Criterion::taperedEdge;
  study.points[0].checks[0].parameters.edge = "0 deg";
  EXPECT_THAT(cautionsOfCheck(study, 0), Contains(HasSubstr("is taken as bending")));
}

TEST(CheckWords, endsAreRoundedInwardsAndFolded) {
  const ShownEnds ends = shownEndsOf({Angle::fromDegrees(-11.853), Angle::fromDegrees(8.96)});
  EXPECT_EQ(ends.from, "−11.8°");
  EXPECT_EQ(ends.to, "8.9°");
  EXPECT_EQ(shownEndsOf({Angle::fromDegrees(82.61), Angle::fromDegrees(209.17)}).to, "29.1°");
  const ShownEnds narrow = shownEndsOf({Angle::fromDegrees(10.04), Angle::fromDegrees(10.06)});
  EXPECT_EQ(narrow.from + narrow.to, "10.04°10.06°");
}

TEST(CheckWords, anIntervalOverTheHalfTurnGoesOver90) {
  Study study = joint("0 MPa");
  study.points[0].stress = {CaseStress{"G", "3 MPa", "-3 MPa", "0 MPa"}};
  EXPECT_THAT(sentences(study, 1), Contains(HasSubstr(" over 90° to −")));
}

TEST(CheckWords, theSlopeSaysWhatGrowsAndWhere) {
  Study study = judgedStudy();
  EXPECT_THAT(sentences(study, 0), Contains(testing::MatchesRegex("Utilisation grows by .* per degree "
                                                                  "(counter-)?clockwise at the nominal "
                                                                  "direction.")));
  study = joint("-5 MPa");
  study.points[0].stress = {CaseStress{"G", "-5 MPa", "1 MPa", "0 MPa"}};
  study.points[0].lines[0].angle = "0 deg";
  EXPECT_THAT(sentences(study, 0), Contains("Utilisation stands still at the nominal direction."));
}

TEST(CheckWords, checksThatDifferInTheirParameterAreTold) {
  Study study = judgedStudy();
  study.points[0].checks[0].criterion = Criterion::hankinson;
  study.points[0].checks[0].parameters.n = "2.5";
  EXPECT_EQ(plain(checkName(evaluate(study).checks[0])), "grain: C24, Hankinson (n = 2.5)");
  study.points[0].checks[0].parameters.n = "2";
  EXPECT_EQ(plain(checkName(evaluate(study).checks[0])), "grain: C24, Hankinson");
}

TEST(CheckWords, withoutAnyCheckNothingIsSaidOfStrengths) {
  EXPECT_EQ(plain(verdictSentence({})), "No check yet: nothing is judged against strengths.");
}

} // namespace
} // namespace planewright
