// SPDX-License-Identifier: GPL-3.0-or-later
#include "tests/core/study/rich_study.h"

namespace planewright {
namespace {

const Place sx{Spot::sx, "P1", "G"};
const Place angle{Spot::lineAngle, "P1", "grain"};

Problem refused(const Study& study, const Edits& edits) {
  const Result<Study> after = edited(study, edits);
  EXPECT_FALSE(after);
  return after ? Problem{} : after.error();
}

TEST(Edit, aBareNumberIsCompletedSoThatAChangeOfUnitChangesNoStress) {
  const Study typed = with(newStudy(), {Type{sx, "-2.1"}});
  EXPECT_EQ(textAt(typed, sx), "-2.1 MPa");
  const Study inPsi = with(typed, {Type{{Spot::unitStress, {}, {}}, "psi"}});
  EXPECT_EQ(textAt(inPsi, sx), "-2.1 MPa");
  EXPECT_EQ(textAt(with(inPsi, {Type{sx, "300"}}), sx), "300 psi");
}

TEST(Edit, theTypedTextIsKept) {
  const Study study = with(newStudy(), {Type{sx, "18.6 kN/(90 mm*240 mm)"}, Type{angle, "1 in 10"}});
  EXPECT_EQ(textAt(study, sx), "18.6 kN/(90 mm*240 mm)");
  EXPECT_EQ(textAt(study, angle), "1 in 10");
}

TEST(Edit, aTextThatDoesNotReadIsRefusedWithItsPlace) {
  const Problem problem = refused(newStudy(), {Type{sx, "12 kN"}});
  EXPECT_EQ(problem.place, "points/P1/stress/G/sx");
  EXPECT_FALSE(problem.what.empty());
}

TEST(Edit, whatCannotBeMeantIsRefused) {
  EXPECT_FALSE(refused(newStudy(), {Type{sx, "1e101 MPa"}}).what.empty());
  EXPECT_FALSE(refused(newStudy(), {Type{angle, "1e7 deg"}}).what.empty());
  EXPECT_FALSE(refused(newStudy(), {Type{{Spot::lineTolerance, "P1", "grain"}, "-3 deg"}}).what.empty());
  EXPECT_FALSE(refused(newStudy(), {Type{{Spot::lineKind, "P1", "grain"}, "Grain"}}).mend.empty());
  EXPECT_FALSE(refused(newStudy(), {Type{{Spot::unitStress, {}, {}}, "kN"}}).what.empty());
  EXPECT_FALSE(refused(newStudy(), {Rename{{Spot::line, "P1", "grain"}, "  "}}).what.empty());
  EXPECT_FALSE(refused(newStudy(), {Type{{Spot::pointNote, "P1", {}}, "\xC3\x28"}}).what.empty());
  EXPECT_FALSE(refused(newStudy(), {Type{{Spot::pointNote, "P1", {}},
                                         "a\xC2\x9B"
                                         "b"}})
                   .what.empty());
}

TEST(Edit, ofSeveralEditsAllAreTakenOrNone) {
  const Study before = newStudy();
  EXPECT_FALSE(edited(before, Edits{Type{sx, "5"}, Type{sx, "five"}}));
  EXPECT_EQ(before, newStudy());
}

TEST(Edit, anEmptyToleranceMeansNone) {
  const Place tolerance{Spot::lineTolerance, "P1", "grain"};
  const Study study = with(newStudy(), {Type{tolerance, "3"}});
  EXPECT_EQ(textAt(study, tolerance), "3 deg");
  EXPECT_EQ(textAt(with(study, {Type{tolerance, " "}}), tolerance), "");
}

TEST(Edit, aCaseTakesItsFactorsAndStressesAlongWhenItGoes) {
  const Study study = with(richStudy(), {Remove{{Spot::loadCase, "S", {}}}});
  EXPECT_EQ(study.cases.size(), 2U);
  EXPECT_EQ(study.combinations.front().factors.size(), 1U);
  EXPECT_EQ(study.points.front().stress.size(), 1U);
  EXPECT_TRUE(problemsIn(study).empty());
}

TEST(Edit, aRenamedThingIsFollowedEverywhere) {
  const Study study = with(
      richStudy(), {Rename{{Spot::loadCase, "S", {}}, "W"}, Rename{{Spot::loadCase, "G", {}}, "A"},
                    Rename{{Spot::point, "P2", {}}, "heel"}, Rename{{Spot::combination, sum, {}}, "ULS"}});
  EXPECT_EQ(study.combinations.front().factors.front().caseId, "A");
  EXPECT_EQ(study.points.front().stress.back().caseId, "W");
  EXPECT_EQ(study.cases.front().excludes, std::vector<std::string>{"A"});
  EXPECT_EQ(study.shown, (Shown{"heel", "ULS"}));
  EXPECT_TRUE(problemsIn(study).empty());
}

TEST(Edit, namesStayUniqueAndNeeded) {
  EXPECT_FALSE(refused(richStudy(), {Rename{{Spot::loadCase, "S", {}}, "G"}}).mend.empty());
  EXPECT_FALSE(refused(richStudy(), {Insert{{Spot::plane, "P1", "scarf"}, {}}}).mend.empty());
  EXPECT_FALSE(refused(newStudy(), {Remove{{Spot::loadCase, "G", {}}}}).what.empty());
  EXPECT_FALSE(refused(newStudy(), {Remove{{Spot::point, "P1", {}}}}).what.empty());
  EXPECT_FALSE(refused(newStudy(), {Type{{Spot::shownPoint, {}, {}}, "P9"}}).what.empty());
  EXPECT_FALSE(refused(newStudy(), {Insert{{Spot::caseStress, "P1", "Q"}, {}}}).what.empty());
}

// A state goes by the name of its combination or the id of its case: the two must tell states apart.
TEST(Edit, aCombinationCannotHaveTheIdOfACase) {
  const Place factored{Spot::combination, sum, {}};
  const Problem inserted = refused(richStudy(), {Insert{{Spot::combination, "G", {}}, {}}});
  EXPECT_EQ(inserted.place, "combinations/G");
  EXPECT_EQ(inserted.quoted, "G");
  EXPECT_NE(plain(inserted).find("“1.0 G”"), std::string::npos) << plain(inserted);
  EXPECT_EQ(refused(richStudy(), {Rename{factored, "S"}}).place, "combinations/S");
  EXPECT_EQ(refused(richStudy(), {Rename{{Spot::loadCase, "S", {}}, sum}}).place,
            "combinations/1.35 G + 1.5 S");
  EXPECT_EQ(refused(richStudy(), {Insert{{Spot::loadCase, sum, {}}, {}}}).place,
            "combinations/1.35 G + 1.5 S");
}

TEST(Edit, aLineMayBeRenamedToTheNameOfItsPoint) {
  const Place line{Spot::line, "P1", "grain"};
  EXPECT_EQ(with(newStudy(), {Rename{line, "P1"}}).points.front().lines.front().name, "P1");
  EXPECT_EQ(with(newStudy(), {Rename{line, "grain"}}), newStudy());
}

TEST(Edit, whatIsNotThereCannotBeRenamedToItsOwnName) {
  EXPECT_FALSE(edited(newStudy(), Edit{Rename{{Spot::loadCase, "Q", {}}, "Q"}}));
  EXPECT_EQ(with(newStudy(), {Rename{{Spot::loadCase, "G", {}}, "G"}}), newStudy());
}

TEST(Edit, aNewFactorIsOne) {
  const Study study =
      with(richStudy(), {Insert{{Spot::loadCase, "W", {}}, {}}, Insert{{Spot::factor, sum, "W"}, {}}});
  EXPECT_EQ(textAt(study, {Spot::factor, sum, "W"}), "1");
  EXPECT_TRUE(problemsIn(study).empty());
}

TEST(Edit, aCaseIsExcludedOnce) {
  const Place excludes{Spot::caseExcludes, "S", {}};
  const Problem twice = refused(richStudy(), {Type{excludes, "G, G"}});
  EXPECT_EQ(twice.place, "cases/S/excludes");
  EXPECT_EQ(twice.quoted, "G");
}

// The excluded ids are typed with commas between them.
TEST(Edit, theIdOfACaseHasNoComma) {
  EXPECT_EQ(refused(newStudy(), {Insert{{Spot::loadCase, "S,W", {}}, {}}}).quoted, "S,W");
  EXPECT_EQ(refused(newStudy(), {Rename{{Spot::loadCase, "G", {}}, "G,1"}}).quoted, "G,1");
  EXPECT_TRUE(edited(newStudy(), Edit{Insert{{Spot::point, "seat, left", {}}, {}}}));
  Study study = newStudy();
  study.cases.push_back({"S,W", {}, {}, {}, {}});
  const Problems problems = problemsIn(study);
  ASSERT_EQ(problems.size(), 1U);
  EXPECT_EQ(problems.front().place, "cases/S,W");
}

TEST(Edit, aUnitIsKeptWithoutItsBlanks) {
  const Place unit{Spot::unitStress, {}, {}};
  EXPECT_EQ(textAt(with(newStudy(), {Type{unit, " psi\t"}}), unit), "psi");
  const Place moment{Spot::unitMoment, {}, {}};
  EXPECT_EQ(textAt(with(newStudy(), {Type{moment, " N*mm "}}), moment), "N*mm");
}

TEST(Edit, movingChangesTheOrderOnly) {
  const Study study = with(richStudy(), {Move{{Spot::loadCase, "S", {}}, 0}});
  EXPECT_EQ(study.cases.front().id, "S");
  EXPECT_EQ(study.cases.back().id, "G");
  EXPECT_FALSE(edited(study, Edit{Move{{Spot::loadCase, "S", {}}, 3}}));
}

TEST(Edit, theLineComesAndGoes) {
  const Place line{Spot::line, "P1", "grain"};
  const Study without = with(newStudy(), {Remove{line}});
  EXPECT_TRUE(without.points.front().lines.empty());
  EXPECT_FALSE(textAt(without, angle));
  EXPECT_FALSE(edited(without, Edit{Type{angle, "5"}}));
  const Study again = with(without, {Insert{line, {}}, Type{angle, "5"}});
  EXPECT_EQ(textAt(again, angle), "5 deg");
  EXPECT_FALSE(edited(again, Edit{Insert{line, {}}}));
  EXPECT_EQ(with(again, {Rename{line, "seam"}}).points.front().lines.front().name, "seam");
}

TEST(Study, aTextWithoutItsUnitIsAProblemOfTheStudy) {
  Study study = newStudy();
  study.points.front().stress.front().sx = "-2.1";
  const Problems problems = problemsIn(study);
  ASSERT_EQ(problems.size(), 1U);
  EXPECT_EQ(problems.front().place, "points/P1/stress/G/sx");
  EXPECT_NE(plain(problems.front()).find("-2.1 MPa"), std::string::npos);
}

} // namespace
} // namespace planewright
