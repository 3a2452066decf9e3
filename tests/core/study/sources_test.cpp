// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/case_sources.h"
#include "core/study/edit.h"
#include "core/study/readout.h"
#include "core/study/sum_of_case.h"
#include "tests/support/study_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <algorithm>

namespace planewright {
namespace {

const Place fibre{Spot::fibre, "P1", {}};
const Place forces{Spot::forces, "P1", "G"};

Edits fibreAt(const std::string& y, const std::string& z = "0") {
  return {Insert{{Spot::section, "beam", {}}, {}}, Insert{fibre, {}},
          Type{{Spot::fibreSection, "P1", {}}, "beam"}, Type{{Spot::fibreY, "P1", {}}, y},
          Type{{Spot::fibreZ, "P1", {}}, z}};
}

/// 100 mm x 200 mm, the fibre at 50 mm, N = 40 kN, V_y = 30 kN, M_z = 10 kN m.
Study beamStudy() {
  Edits edits = fibreAt("50");
  edits.insert(edits.end(), {Insert{forces, {}}, Type{{Spot::forceN, "P1", "G"}, "40"},
                             Type{{Spot::forceVy, "P1", "G"}, "30"}, Type{{Spot::forceMz, "P1", "G"}, "10"}});
  return *edited(newStudy(), edits);
}

Problem refused(const Study& study, const Edits& edits) {
  const Result<Study> after = edited(study, edits);
  EXPECT_FALSE(after);
  return after ? Problem{} : after.error();
}

Study with(const Study& study, const Edits& edits) {
  const Result<Study> after = edited(study, edits);
  EXPECT_TRUE(after) << plain(after.error());
  return after.value_or(study);
}

// Beam formulas with I = b h^3/12, S = b/2 (h^2/4 - y^2): common practice, no source.
constexpr double axial = 40e3 / (100.0 * 200);
constexpr double bending = -10e6 * 50 / (100.0 * 200 * 200 * 200 / 12);
constexpr double shear =
    30e3 * (100 / 2.0 * (200 * 200 / 4.0 - 50 * 50)) / (100.0 * 200 * 200 * 200 / 12 * 100);

TEST(Sources, sectionForcesMakeStressesWithTheSignsOfTheContract) {
  const StateReading state = evaluate(beamStudy()).state();
  EXPECT_NEAR(state.stress.sx, axial + bending, 1e-12);
  EXPECT_NEAR(state.stress.sy, 0, 0);
  EXPECT_NEAR(state.stress.txy, shear, 1e-12);
  EXPECT_NEAR(state.axial, axial, 1e-12);
  EXPECT_NEAR(state.bending, bending, 1e-12);
  const AlongParts parts = alongPartsOf(state, {Angle::fromDegrees(60)});
  EXPECT_NEAR(parts.axial, axial / 4, 1e-12);
  EXPECT_NEAR(parts.bending, bending / 4, 1e-12);
}

TEST(Sources, theRuleOfVTurnsTheSignOfTheShearAlone) {
  const StateReading state = evaluate(with(beamStudy(), {Type{{Spot::shearForce, {}, {}}, "slope"}})).state();
  EXPECT_NEAR(state.stress.txy, -shear, 1e-12);
  EXPECT_NEAR(state.stress.sx, axial + bending, 1e-12);
}

TEST(Sources, withCompressionPositiveTheForcesKeepTheirSigns) {
  const StateReading state =
      evaluate(with(beamStudy(), {Type{{Spot::positive, {}, {}}, "compression"}})).state();
  EXPECT_NEAR(state.stress.sx, -(axial + bending), 1e-12);
  EXPECT_NEAR(state.stress.txy, -shear, 1e-12);
  EXPECT_NEAR(state.axial, -axial, 1e-12);
}

TEST(Sources, typedStressesAndForcesAddUp) {
  const Study study =
      with(beamStudy(), {Type{{Spot::sx, "P1", "G"}, "5"}, Type{{Spot::sy, "P1", "G"}, "-3"}});
  const StateReading state = evaluate(study).state();
  EXPECT_NEAR(state.stress.sx, 5 + axial + bending, 1e-12);
  EXPECT_NEAR(state.stress.sy, -3, 0);
  EXPECT_NEAR(state.axial, axial, 1e-12);
}

TEST(Sources, partsThatCancelLeaveNothing) {
  // N/A = 2 MPa, M y/I at y = 50 mm of M = 80/15 kN m is 4 MPa: typed 2 MPa more, nothing is left.
  const Study study =
      with(beamStudy(), {Type{{Spot::forceMz, "P1", "G"}, "80/15"}, Type{{Spot::sx, "P1", "G"}, "2"}});
  EXPECT_EQ(evaluate(study).state().stress.sx, 0);
}

TEST(Sources, pressureGivesHoopAndAxialStress) {
  const Study study =
      with(newStudy(), {Insert{{Spot::pressure, "P1", "G"}, {}}, Type{{Spot::pressureP, "P1", "G"}, "2"},
                        Type{{Spot::pressureR, "P1", "G"}, "400"}, Type{{Spot::pressureT, "P1", "G"}, "8"}});
  const StateReading state = evaluate(study).state();
  EXPECT_NEAR(state.stress.sy, 2 * 400 / 8.0, 1e-12);
  EXPECT_NEAR(state.stress.sx, 2 * 400 / 16.0, 1e-12);
  const Study open = with(study, {Type{{Spot::pressureEnds, "P1", "G"}, "open"}});
  EXPECT_EQ(evaluate(open).state().stress.sx, 0);
}

Study measuredStudy() {
  return with(newStudy(),
              {Type{{Spot::caseNature, "G", {}}, "measured"}, Insert{{Spot::rosette, "P1", "G"}, {}},
               Type{{Spot::gaugeStrainA, "P1", "G"}, "100"}, Type{{Spot::gaugeStrainB, "P1", "G"}, "300"},
               Type{{Spot::gaugeStrainC, "P1", "G"}, "-200"}, Type{{Spot::rosetteE, "P1", "G"}, "180 GPa"},
               Type{{Spot::rosetteNu, "P1", "G"}, "0.28"}});
}

// Pytel, Kiusalaas: Mechanics of Materials, example 8.14, as in resources/checks/strain_rosettes.csv (R02).
TEST(Sources, aRosetteGivesThePrincipalStressesOfItsExample) {
  const Circle circle = evaluate(measuredStudy()).state().circle;
  EXPECT_NEAR(circle.s1, 41.0, 0.05);
  EXPECT_NEAR(circle.s2, -66.05, 0.005);
  EXPECT_NEAR(circle.theta1->value.degrees(), 33.4, 0.05);
}

TEST(Sources, aMeasuredCaseTakesFactorOneOnly) {
  const Place factor{Spot::factor, "sum", "G"};
  const Edits combined = {Insert{{Spot::combination, "sum", {}}, {}}, Insert{factor, {}}};
  const Study study = with(measuredStudy(), combined);
  const Problem problem = refused(study, {Type{factor, "1.35"}});
  EXPECT_EQ(problem.place, "combinations/sum/factors/G");
  EXPECT_FALSE(problem.mend.empty());
  EXPECT_EQ(textAt(with(study, {Type{factor, "0"}}), factor), "0");
  EXPECT_EQ(refused(study, {Type{{Spot::caseNature, "G", {}}, "variable"}}).place,
            "points/P1/stress/G/rosette");
}

TEST(Sources, whatIsMeasuredIsNeitherAxialNorBending) {
  const Study study = with(
      measuredStudy(), {Insert{{Spot::pressure, "P1", "G"}, {}}, Type{{Spot::pressureP, "P1", "G"}, "1"}});
  const StateReading state = evaluate(study).state();
  EXPECT_NE(evaluate(measuredStudy()).state().stress.sx, 0);
  EXPECT_EQ(evaluate(measuredStudy()).state().axial, 0);
  EXPECT_NEAR(state.axial, 25, 1e-12) << "of the closed ends alone: 1 MPa * 500 mm/(2 * 10 mm)";
  EXPECT_EQ(state.bending, 0);
}

TEST(Sources, aMaterialWithALineNeedsOne) {
  const Edits orthotropic = {Type{{Spot::rosetteMaterial, "P1", "G"}, "orthotropic"}};
  const Study study = with(measuredStudy(), orthotropic);
  EXPECT_EQ(refused(study, {Remove{{Spot::line, "P1", "grain"}}}).place,
            "points/P1/stress/G/rosette/material");
  const Problem stiff = refused(study, {Type{{Spot::rosetteNu12, "P1", "G"}, "9"}});
  EXPECT_EQ(stiff.place, "points/P1/stress/G/rosette/nu12");
}

TEST(Sources, whatTheoryDoesNotGiveIsRefusedAtItsPlace) {
  const Study study = beamStudy();
  EXPECT_EQ(refused(study, {Type{{Spot::fibreY, "P1", {}}, "101"}}).place, "points/P1/fibre");
  EXPECT_EQ(refused(study, {Type{{Spot::size, "beam", "h"}, "60"}}).place, "points/P1/fibre");
  EXPECT_EQ(refused(study, {Type{{Spot::size, "beam", "b"}, "-10"}}).place, "sections/beam/sizes/b");
  EXPECT_EQ(refused(study, {Type{{Spot::forceT, "P1", "G"}, "1"}}).place, "points/P1/stress/G/forces");
  EXPECT_EQ(refused(study, {Remove{fibre}}).place, "points/P1/stress/G/forces");
  EXPECT_EQ(refused(study, {Remove{{Spot::section, "beam", {}}}}).place, "points/P1/fibre/section");
  EXPECT_EQ(refused(study, {Type{{Spot::sectionShape, "beam", {}}, "tube"}}).place.substr(0, 19),
            "sections/beam/sizes");
  EXPECT_EQ(refused(newStudy(), {Insert{forces, {}}}).place, "points/P1/stress/G/forces");
  EXPECT_EQ(refused(study, {Insert{forces, {}}}).place, "points/P1/stress/G/forces");
}

TEST(Sources, aSectionChangesItsShapeWithItsSizes) {
  const Study study =
      with(beamStudy(), {Type{{Spot::sectionShape, "beam", {}}, "circle"}, Remove{{Spot::size, "beam", "b"}},
                         Remove{{Spot::size, "beam", "h"}}, Insert{{Spot::size, "beam", "d"}, {}},
                         Type{{Spot::size, "beam", "d"}, "200"}});
  EXPECT_EQ(study.sections.front().sizes, (std::vector<TypedSize>{{"d", "200 mm"}}));
  EXPECT_TRUE(problemsIn(study).empty());
}

TEST(Sources, sizesOfTabledSectionsTakeTheirPowerOfALength) {
  const Study study =
      with(newStudy(), {Insert{{Spot::section, "table", {}}, {}}, Remove{{Spot::size, "table", "b"}},
                        Remove{{Spot::size, "table", "h"}}, Insert{{Spot::size, "table", "I_z"}, {}},
                        Type{{Spot::sectionShape, "table", {}}, "tabled"},
                        Type{{Spot::size, "table", "I_z"}, "8.356e7"}});
  EXPECT_EQ(study.sections.front().sizes.front().text, "8.356e7 mm^4");
  EXPECT_FALSE(refused(study, {Type{{Spot::size, "table", "I_z"}, "12 mm^3"}}).what.empty());
}

TEST(Sources, aRenamedSectionIsFollowed) {
  const Study study = with(beamStudy(), {Rename{{Spot::section, "beam", {}}, "rafter"}});
  EXPECT_EQ(study.points.front().fibre->section, "rafter");
  EXPECT_EQ(evaluate(study).state(), evaluate(beamStudy()).state());
}

TEST(Sources, casesThatExcludeEachOtherDoNotMeetInACombination) {
  const Study study =
      with(newStudy(), {Insert{{Spot::loadCase, "W", {}}, {}}, Insert{{Spot::loadCase, "W2", {}}, {}},
                        Type{{Spot::caseExcludes, "W", {}}, "W2"}, Insert{{Spot::combination, "sum", {}}, {}},
                        Insert{{Spot::factor, "sum", "W2"}, {}}});
  EXPECT_EQ(refused(study, {Insert{{Spot::factor, "sum", "W"}, {}}}).place, "combinations/sum/factors/W");
  const Study apart =
      with(study, {Insert{{Spot::factor, "sum", "W"}, {}}, Type{{Spot::factor, "sum", "W"}, "0"}});
  EXPECT_EQ(refused(apart, {Type{{Spot::factor, "sum", "W"}, "1"}}).place, "combinations/sum/factors/W");
}

TEST(Sources, onlyACaseThatIsTypedDirectlyCanBeDragged) {
  EXPECT_EQ(draggableCase(newStudy(), evaluate(newStudy())), "G");
  EXPECT_FALSE(draggableCase(beamStudy(), evaluate(beamStudy())));
}

TEST(Sources, aFreeEdgeTellsWhatTheStressesLeaveThere) {
  const Study study = with(newStudy(), {Type{{Spot::sx, "P1", "G"}, "7"}, Type{{Spot::txy, "P1", "G"}, "0.5"},
                                        Type{{Spot::freeEdge, "P1", {}}, "0"}});
  const StateReading state = evaluate(study).state();
  ASSERT_TRUE(state.edge);
  EXPECT_NEAR(state.edge->traction.sn, 0, 1e-15);
  EXPECT_NEAR(std::abs(state.edge->traction.tnt), 0.5, 1e-15);
  EXPECT_FALSE(evaluate(with(study, {Type{{Spot::freeEdge, "P1", {}}, " "}})).state().edge);
}

TEST(Sources, contributionsCarryTheirWorking) {
  const Study study = with(beamStudy(), {Insert{{Spot::pressure, "P1", "G"}, {}}});
  const Point& point = study.points.front();
  const std::vector<NamedContribution> made = contributionsOf(study, point, point.stress.front());
  ASSERT_EQ(made.size(), 2U);
  EXPECT_EQ(plain(made.front().name), "section forces on beam");
  EXPECT_FALSE(made.front().contribution.steps.empty());
  EXPECT_FALSE(made.front().contribution.signRules.empty());
  EXPECT_NEAR(made.front().contribution.stress.sx, axial + bending, 1e-12);
  EXPECT_TRUE(contributionsOf(newStudy(), newStudy().points.front(), newStudy().points.front().stress.front())
                  .empty());
}

std::vector<std::string> sumAt(const Study& study) {
  const Point& point = study.points.front();
  const CaseStress& stress = point.stress.front();
  std::vector<std::string> lines;
  for (const Step& step : sumOfCase(study, stress, contributionsOf(study, point, stress)))
    lines.push_back(plain(written(step)));
  return lines;
}

TEST(Sources, theWorkingOfACaseEndsWithItsStresses) {
  EXPECT_EQ(sumAt(beamStudy()), std::vector<std::string>{}) << "one source, nothing typed: it does already";
  EXPECT_EQ(sumAt(with(beamStudy(), {Type{{Spot::sx, "P1", "G"}, "1"}})),
            (std::vector<std::string>{"σx = σx,typed + σx,1 = 1 MPa + (−5.5 MPa) = −4.500 MPa"}));
  const Study turned = with(beamStudy(), {Type{{Spot::positive, {}, {}}, "compression"}});
  EXPECT_EQ(sumAt(turned).front(), "σx = −σx,1 = −(−5.5 MPa) = 5.500 MPa");
  EXPECT_EQ(sumAt(turned).size(), 2U) << "and the shear";
  const Study both = with(turned, {Type{{Spot::sx, "P1", "G"}, "1"}, Insert{{Spot::pressure, "P1", "G"}, {}},
                                   Type{{Spot::pressureP, "P1", "G"}, "0.1"}});
  EXPECT_EQ(sumAt(both).front(), "σx = σx,typed − (σx,1 + σx,2) = 1 MPa − (−5.5 MPa + 2.5 MPa) = 4.000 MPa");
}

// What the readout adds up is what the contributions say one by one.
RC_GTEST_PROP(Sources, contributionsAddUpToTheStressOfTheCase, ()) {
  const Study study = *anyStudy();
  for (const Point& point : study.points) {
    const Readout readout = evaluate(study, point.name);
    for (const CaseStress& stress : point.stress) {
      const auto one = std::ranges::find(readout.cases, stress.caseId, &CaseReading::id);
      RC_ASSERT(one != readout.cases.end());
      double sx = readEntry(stress.sx, entryKindOf(study, Spot::sx))->value;
      const double sense = study.convention.positive == Positive::tension ? 1 : -1;
      double scale = std::abs(sx);
      for (const NamedContribution& made : contributionsOf(study, point, stress)) {
        sx += sense * made.contribution.stress.sx;
        scale += std::abs(made.contribution.axial) + std::abs(made.contribution.bending);
      }
      RC_ASSERT(std::abs(sx - one->stress.sx) <= 1e-12 * (scale + one->scale));
    }
  }
}

// A combination of one case with factor 1 is that case.
// And so does the sum that is written below them; the parts of sx leave nothing out.
RC_GTEST_PROP(Sources, theSumOfACaseIsItsStressAndItsPartsAddUp, ()) {
  const Study study = *anyStudy();
  for (const Point& point : study.points) {
    const Readout readout = evaluate(study, point.name);
    for (const CaseStress& stress : point.stress) {
      const auto one = std::ranges::find(readout.cases, stress.caseId, &CaseReading::id);
      const double parts = one->typed + one->axial + one->bending + one->measured;
      RC_ASSERT(std::abs(parts - one->stress.sx) <= 1e-12 * one->scale);
      for (const Step& step : sumOfCase(study, stress, contributionsOf(study, point, stress))) {
        const double confirmed = step.formula.valueWith(step.putIn);
        RC_ASSERT(std::abs(confirmed - step.result) <= 1e-9 * one->scale);
        if (plain(step.symbol) == "σx")
          RC_ASSERT(std::abs(confirmed - one->stress.sx) <= 1e-9 * one->scale);
      }
    }
  }
}

RC_GTEST_PROP(Sources, oneCaseWithFactorOneIsThatCase, ()) {
  Study study = *anyStudy();
  const std::string id = (*rc::gen::elementOf(study.cases)).id;
  const Result<Study> after = edited(study, Edits{Insert{{Spot::combination, "only this", {}}, 0},
                                                  Insert{{Spot::factor, "only this", id}, {}}});
  RC_ASSERT(after);
  const Readout readout = evaluate(*after);
  const StateReading& combined = readout.states.front();
  const auto single = std::ranges::find(readout.states, id, &StateReading::combination);
  RC_ASSERT(single != readout.states.end());
  RC_ASSERT(combined.stress == single->stress);
  RC_ASSERT(combined.axial == single->axial);
  RC_ASSERT(combined.bending == single->bending);
  RC_ASSERT(combined.circle == single->circle);
}

} // namespace
} // namespace planewright
