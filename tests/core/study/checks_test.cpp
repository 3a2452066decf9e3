// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/quantity/format.h"
#include "core/study/check_edits.h"
#include "core/study/judge_checks.h"
#include "core/study/verdict.h"
#include "tests/support/judged_study.h"
#include "tests/support/study_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <algorithm>
#include <cmath>

namespace planewright {
namespace {

Study with(const Study& study, const Edits& edits) {
  Result<Study> after = edited(study, edits);
  EXPECT_TRUE(after) << (after ? "" : plain(after.error()));
  return after.value_or(study);
}

std::string refused(const Study& study, const Edits& edits) {
  const Result<Study> after = edited(study, edits);
  return after ? "" : plain(after.error().what);
}

Place check(Spot spot, const std::string& id = "grain") {
  return {spot, "P1", id};
}

TEST(Checks, theJudgedStudyIsValid) {
  EXPECT_TRUE(problemsIn(judgedStudy()).empty());
}

TEST(Checks, strengthBelongsToTheCombination) {
  const Readout readout = evaluate(judgedStudy());
  const StrengthFactor& permanent = readout.states[0].checks[0].factor;
  EXPECT_NEAR(permanent.value, 0.6 / 1.3, 1e-15);
  EXPECT_EQ(permanent.duration, Duration::permanent);
  const StrengthFactor& snow = readout.states[1].checks[0].factor;
  EXPECT_NEAR(snow.value, 0.9 / 1.3, 1e-15);
  EXPECT_EQ(snow.duration, Duration::shortTerm);
}

TEST(Checks, aPermanentCombinationCanGovernThoughItsStressesAreLower) {
  Study study = judgedStudy();
  study.points[0].stress[1] = CaseStress{"S", "0.2 MPa", "0 MPa", "0 MPa"};
  const Readout readout = evaluate(study);
  EXPECT_LT(readout.states[0].circle.s1, readout.states[1].circle.s1);
  const Verdict verdict = verdictOfCheck(readout, 0);
  ASSERT_TRUE(verdict.governing);
  EXPECT_EQ(verdict.governing->state, 0);
}

TEST(Checks, aTypedFactorReplacesTheQuotient) {
  const Study study = with(judgedStudy(), {Type{{Spot::strengthFactor, "C24", {}}, "0.5"}});
  const StrengthFactor factor = evaluate(study).states[1].checks[0].factor;
  EXPECT_EQ(factor.value, 0.5);
  EXPECT_EQ(factor.origin, FactorOrigin::given);
}

TEST(Checks, aDurationWithoutAFactorLeavesTheCombinationUnjudged) {
  const Study study = with(judgedStudy(), {Type{{Spot::durationShort, "C24", {}}, ""}});
  const Readout readout = evaluate(study);
  EXPECT_FALSE(readout.states[0].checks[0].problem);
  EXPECT_TRUE(readout.states[1].checks[0].problem);
  EXPECT_NE(verdictOfCheck(readout, 0).standing, Standing::within);
  EXPECT_TRUE(verdictOfCheck(readout, 0).unjudged);
}

TEST(Checks, somethingUnjudgedNeverReadsAsWithin) {
  Study study = judgedStudy();
  study.points[0].checks[0].criterion = Criterion::hankinson;
  const Readout readout = evaluate(study);
  ASSERT_TRUE(readout.states[0].checks[0].problem) << "the shear makes it biaxial";
  EXPECT_EQ(verdictOfState(readout, 0).standing, Standing::unjudged);
  EXPECT_EQ(verdictOf(readout).standing, Standing::unjudged);
}

TEST(Checks, theBendingStrengthCountsForWhatBends) {
  Study study = judgedStudy();
  Readout readout = evaluate(study);
  readout.states[0].bending = readout.states[0].stress.sx;
  EXPECT_NEAR(demandOf(readout, readout.states[0]).bendingShare, 1, 1e-15);
  readout.states[0].bending = 0;
  EXPECT_EQ(demandOf(readout, readout.states[0]).bendingShare, 0);
}

TEST(Checks, theSenseOfSignsChangesNoVerdict) {
  Study study = judgedStudy();
  Study other = study;
  other.convention.positive = Positive::compression;
  for (CaseStress& stress : other.points[0].stress) {
    stress.sx = "-" + stress.sx;
    stress.txy = "-" + stress.txy;
  }
  const Readout a = evaluate(study);
  const Readout b = evaluate(other);
  for (std::size_t state = 0; state < 2; ++state)
    for (std::size_t check = 0; check < 2; ++check)
      EXPECT_EQ(a.states[state].checks[check], b.states[state].checks[check]);
}

TEST(Checks, basesThatDoNotMatchAreSaid) {
  Study study = judgedStudy();
  EXPECT_TRUE(evaluate(study).states[0].checks[0].pairing.empty()) << "design strengths, design loads";
  EXPECT_FALSE(evaluate(study).states[0].checks[1].pairing.empty()) << "allowable strengths, design loads";
  study.materials[0].partialFactor.clear();
  study.materials[0].durations = {};
  EXPECT_EQ(plain(evaluate(study).states[0].checks[0].pairing),
            "Against characteristic strengths: not a design check.");
  study.materials[0].basis = StrengthBasis::testMean;
  EXPECT_EQ(plain(evaluate(study).states[0].checks[0].pairing),
            "Against means of tests: not a design check.");
}

/// What stands with the first check of the first combination.
std::string pairingOf(const Study& study) {
  return plain(evaluate(study).states[0].checks[0].pairing);
}

TEST(Checks, aFactorOf1LeavesStrengthsCharacteristic) {
  const std::string none = "Against characteristic strengths: not a design check.";
  Study study = judgedStudy();
  study.materials[0].durations = {};
  study.materials[0].partialFactor = "1";
  EXPECT_EQ(pairingOf(study), none);
  study.materials[0].partialFactor = "1.3";
  EXPECT_EQ(pairingOf(study), "");
  study.materials[0].factor = "1";
  EXPECT_EQ(pairingOf(study), none);
  study.materials[0].factor = "0.5";
  EXPECT_EQ(pairingOf(study), "");
}

TEST(Checks, allowableStrengthsAreForAllowableCombinations) {
  Study study = judgedStudy();
  study.materials[0].basis = StrengthBasis::allowable;
  for (const Basis basis : {Basis::design, Basis::characteristic, Basis::allowable}) {
    study.combinations[0].basis = basis;
    EXPECT_EQ(pairingOf(study).empty(), basis == Basis::allowable) << wordOf(basis);
  }
}

std::size_t cautionsOfFirst(const Study& study) {
  return evaluate(study).checks[0].cautions.size();
}

TEST(Checks, timberWithoutDurationFactorsSaysSo) {
  Study study = judgedStudy();
  EXPECT_EQ(cautionsOfFirst(study), 0);
  study.materials[0].durations = {};
  EXPECT_EQ(cautionsOfFirst(study), 1);
  study.materials[0].factor = "0.6";
  EXPECT_EQ(cautionsOfFirst(study), 0) << "the factor stands for both";
  study.materials[0].factor.clear();
  study.materials[0].partialFactor.clear();
  EXPECT_EQ(cautionsOfFirst(study), 0) << "no design strengths at all";
}

TEST(Checks, aSlopeToOneSideSaysThatTheSignOfTheShearCounts) {
  Study study = judgedStudy();
  Line& grain = study.points[0].lines[0];
  grain.tolerance.clear();
  EXPECT_EQ(cautionsOfFirst(study), 1);
  grain.angle = "4 deg";
  EXPECT_EQ(cautionsOfFirst(study), 0) << "an angle that is known";
  grain.angle = "0 deg";
  grain.tolerance = "1 in 15";
  EXPECT_EQ(cautionsOfFirst(study), 0);
}

TEST(Checks, aThirdStressThatACriterionDoesNotSeeIsSaid) {
  Study study = judgedStudy();
  EXPECT_TRUE(evaluate(study).states[0].checks[0].cautions.empty());
  study.points[0].stress[1].sz = "0.2 MPa";
  const Readout readout = evaluate(study);
  EXPECT_TRUE(readout.states[0].checks[0].cautions.empty()) << "it does not act here";
  EXPECT_EQ(readout.states[1].checks[0].cautions.size(), 1);
  EXPECT_EQ(readout.states[1].checks[1].cautions.size(), 1);
}

TEST(Checks, aTypedF12GoesWithTheFactorOfTheStrengths) {
  Study study = judgedStudy();
  study.points[0].checks[0].criterion = Criterion::tsaiWu;
  const Readout usual = evaluate(study);
  study.points[0].checks[0].parameters.F12 = exactNumber(-0.5 / std::sqrt(14.5 * 21 * 0.4 * 2.5)) + " MPa^-2";
  const Readout typed = evaluate(study);
  for (std::size_t state = 0; state < 2; ++state)
    EXPECT_NEAR(typed.states[state].checks[0].worst.utilisation,
                usual.states[state].checks[0].worst.utilisation, 1e-12);
  const std::vector<SideBySide> rows = criteriaSideBySide(typed, 0);
  const SideBySide& chosen = *std::ranges::find(rows, true, &SideBySide::isChosen);
  EXPECT_EQ(chosen.worst, typed.states[*chosen.state].checks[0].worst);
}

TEST(Verdicts, tellWhatCouldNotBeJudgedUnlessSomethingExceeds) {
  Study study = with(judgedStudy(), {Type{{Spot::durationShort, "C24", {}}, ""}});
  const Verdict within = verdictOfCheck(evaluate(study), 0);
  ASSERT_EQ(within.standing, Standing::unjudged);
  EXPECT_EQ(toldOf(within)->state, 1);
  EXPECT_EQ(summarise(study).rows[0].combination, "1.35 G + 1.5 S");
  EXPECT_TRUE(summarise(study).rows[0].reading.problem);
  study.points[0].stress[0].sx = "16 MPa";
  const Verdict exceeds = verdictOfCheck(evaluate(study), 0);
  ASSERT_EQ(exceeds.standing, Standing::exceeds);
  EXPECT_EQ(toldOf(exceeds)->state, 0);
  EXPECT_FALSE(toldOf(Verdict()));
}

TEST(CheckEdits, aNewCheckTakesTheUsualCriterionAndTheFirstLine) {
  Study study = judgedStudy();
  const auto edits = insertionOfCheck(study, study.points[0], "C24");
  ASSERT_TRUE(edits);
  study = with(study, *edits);
  const Check& made = study.points[0].checks.back();
  EXPECT_EQ(made.criterion, Criterion::sumOfSquares);
  EXPECT_EQ(made.line, "grain");
  EXPECT_EQ(made.id, "grain 2");
}

TEST(CheckEdits, aPlaneKindNeedsAWatchedPlane) {
  Study study = judgedStudy();
  study.points[0].checks.pop_back();
  study.points[0].planes.clear();
  EXPECT_FALSE(insertionOfCheck(study, study.points[0], "glue"));
}

TEST(CheckEdits, anotherMaterialBringsItsCriterionAndDirection) {
  Study study = judgedStudy();
  study = with(study, withMaterial(study, study.points[0], study.points[0].checks[0], "glue"));
  const Check& changed = study.points[0].checks[0];
  EXPECT_EQ(changed.criterion, Criterion::bond);
  EXPECT_EQ(changed.plane, "scarf");
  EXPECT_EQ(changed.line, "");
}

TEST(CheckEdits, anotherCriterionDropsParametersThatItDoesNotKnow) {
  Study study = judgedStudy();
  study = with(study, withCriterion(study.points[0], study.points[0].checks[0], Criterion::tsaiWu));
  study = with(study, {Type{check(Spot::checkF12), "-0.01"}});
  EXPECT_EQ(study.points[0].checks[0].parameters.F12, "-0.01 MPa^-2");
  study = with(study, withCriterion(study.points[0], study.points[0].checks[0], Criterion::hankinson));
  EXPECT_EQ(study.points[0].checks[0].parameters, ParameterTexts{});
}

TEST(CheckRules, refuseWhatIsNoCheck) {
  const Study study = judgedStudy();
  EXPECT_NE(refused(study, {Type{check(Spot::checkMaterial), "C30"}}), "");
  EXPECT_NE(refused(study, {Type{check(Spot::checkLine), "bond"}}), "");
  EXPECT_NE(refused(study, {Type{check(Spot::checkLine), ""}}), "");
  EXPECT_NE(refused(study, {Type{check(Spot::checkPlane), "scarf"}}), "");
  EXPECT_NE(refused(study, {Type{check(Spot::checkCriterion), "von-mises"}}), "");
  EXPECT_NE(refused(study, {Type{check(Spot::checkN), "2"}}), "") << "sum of squares takes no exponent";
}

TEST(MaterialRules, refuseWhatIsNoStrength) {
  const Study study = judgedStudy();
  const auto type = [&](Spot spot, const std::string& text, const std::string& material = "C24") {
    return refused(study, {Type{{spot, material, {}}, text}});
  };
  EXPECT_NE(type(Spot::alongTension, "0"), "");
  EXPECT_NE(type(Spot::alongTension, "-14.5"), "");
  EXPECT_NE(type(Spot::cohesion, "1"), "") << "timber has no cohesion";
  EXPECT_NE(type(Spot::partialFactor, "0"), "");
  EXPECT_NE(type(Spot::durationShort, "-1"), "");
  EXPECT_NE(type(Spot::materialKind, "bond"), "") << "its strengths are none of a bond";
  EXPECT_NE(type(Spot::alongTension, "1e-30"), "");
  EXPECT_NE(type(Spot::alongTension, "1e30"), "");
  EXPECT_EQ(type(Spot::alongTension, "2 ksi"), "");
  EXPECT_EQ(type(Spot::alongTension, ""), "") << "not given";
}

TEST(MaterialRules, letAJointHaveCohesionAlone) {
  Study study = judgedStudy();
  Material joint;
  joint.name = "joint";
  joint.kind = MaterialKind::coulomb;
  joint.cohesion = "0.5 MPa";
  study.materials.push_back(joint);
  const auto type = [&](const std::string& friction) {
    return refused(study, {Type{{Spot::friction, "joint", {}}, friction}});
  };
  EXPECT_EQ(type("0 deg"), "");
  EXPECT_EQ(type("90 deg"), "An angle of friction is at least 0° and less than 90°.");
  study = with(study, {Type{{Spot::friction, "joint", {}}, "0 deg"}});
  study = with(study, withMaterial(study, study.points[0], study.points[0].checks[1], "joint"));
  study.points[0].stress = {CaseStress{"G", "-5 MPa", "-5 MPa", "0 MPa"},
                            CaseStress{"S", "-2 MPa", "-1 MPa", "0.1 MPa"}};
  const Readout readout = evaluate(study);
  for (const std::size_t state : {std::size_t{0}, std::size_t{1}})
    EXPECT_TRUE(std::isfinite(readout.states[state].checks[1].worst.utilisation))
        << "nothing is divided by the friction";
  EXPECT_NE(refused(study, {Type{{Spot::cohesion, "joint", {}}, "0 MPa"}}), "") << "neither would carry";
}

TEST(References, followMaterialsLinesAndPlanes) {
  Study study = judgedStudy();
  study =
      with(study, {Rename{{Spot::material, "C24", {}}, "tie"}, Rename{{Spot::line, "P1", "grain"}, "fibre"},
                   Rename{{Spot::plane, "P1", "scarf"}, "joint"}});
  EXPECT_EQ(study.points[0].checks[0].material, "tie");
  EXPECT_EQ(study.points[0].checks[0].line, "fibre");
  EXPECT_EQ(study.points[0].checks[1].plane, "joint");
  EXPECT_EQ(with(study, {Remove{{Spot::material, "tie", {}}}}).points[0].checks.size(), 1);
  EXPECT_EQ(with(study, {Remove{{Spot::line, "P1", "fibre"}}}).points[0].checks.size(), 1);
  EXPECT_EQ(with(study, {Remove{{Spot::plane, "P1", "joint"}}}).points[0].checks.size(), 1);
}

TEST(SideBySide, hasEveryCriterionOfTheKindAndMarksTheChosen) {
  const Readout readout = evaluate(judgedStudy());
  const std::vector<SideBySide> rows = criteriaSideBySide(readout, 0);
  EXPECT_EQ(rows.size(), criteriaFor(MaterialKind::timber).size());
  for (const SideBySide& row : rows)
    if (row.isChosen) {
      EXPECT_EQ(row.criterion, Criterion::sumOfSquares);
      EXPECT_EQ(row.worst, readout.states[1].checks[0].worst);
    }
}

TEST(SideBySide, theRowInUseIsTheVerdictWhateverIsShown) {
  Study study = judgedStudy();
  study.points[0].stress[1] = CaseStress{"S", "0.2 MPa", "0 MPa", "0 MPa"};
  for (const std::string shown : {"1.35 G", "1.35 G + 1.5 S"}) {
    study.shown.combination = shown;
    const Readout readout = evaluate(study);
    const Verdict verdict = verdictOfCheck(readout, 0);
    const std::vector<SideBySide> rows = criteriaSideBySide(readout, 0);
    const auto row = std::ranges::find_if(rows, &SideBySide::isChosen);
    EXPECT_EQ(row->state, verdict.governing->state);
    EXPECT_EQ(row->worst.utilisation, verdict.governing->utilisation);
    EXPECT_EQ(row->standing(), verdict.standing);
  }
}

TEST(SideBySide, whatIsNotJudgedInOneStateIsNoReassurance) {
  Study study = judgedStudy();
  study.points[0].stress[0] = CaseStress{"G", "1 MPa", "0 MPa", "0 MPa"}; // uniaxial, the snow is not
  for (const SideBySide& row : criteriaSideBySide(evaluate(study), 0))
    if (row.criterion == Criterion::hankinson) {
      EXPECT_TRUE(row.problem);
      EXPECT_EQ(row.state, 0u);
      EXPECT_EQ(row.standing(), Standing::unjudged);
    }
}

TEST(Summary, hasARowForEachCheckAndNamesWhatIsNotChecked) {
  Study study = judgedStudy();
  Point bare = study.points[0];
  bare.name = "P2";
  bare.checks.clear();
  study.points.push_back(bare);
  const Summary summary = summarise(study);
  ASSERT_EQ(summary.rows.size(), 2);
  EXPECT_EQ(summary.unchecked, std::vector<std::string>{"P2"});
  EXPECT_EQ(summary.rows[0].check.id, "grain");
  EXPECT_EQ(summary.rows[0].verdict.governing->utilisation, summary.rows[0].reading.worst.utilisation);
}

RC_GTEST_PROP(Checks, everyValidStudyIsJudgedWithoutANumberThatIsNone, ()) {
  const Study study = *anyStudy();
  for (const Point& point : study.points) {
    const Readout readout = evaluate(study, point.name);
    for (const StateReading& state : readout.states) {
      RC_ASSERT(state.checks.size() == (state.judged ? point.checks.size() : 0));
      for (const CheckReading& reading : state.checks)
        if (!reading.problem) {
          RC_ASSERT(!std::isnan(reading.worst.utilisation));
          RC_ASSERT(reading.worst.utilisation >= reading.nominal.utilisation * (1 - 1e-9));
        }
    }
  }
}

} // namespace
} // namespace planewright
