// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/pasted_points.h"

#include "core/record/copied_points.h"

#include <gtest/gtest.h>

namespace planewright {
namespace {

Study after(const Study& study, const PastedPoints& pasted) {
  EXPECT_TRUE(pasted.isSound()) << (pasted.isSound() ? "" : plain(pasted.allProblems().front()));
  const Result<Study> done = edited(study, pasted.edits);
  EXPECT_TRUE(done);
  return done.value_or(study);
}

std::string firstWords(const PastedPoints& pasted) {
  const Problems problems = pasted.allProblems();
  return problems.empty() ? std::string() : plain(problems.front());
}

bool contains(const std::string& text, const char* part) {
  return text.find(part) != std::string::npos;
}

/// P1 in a beam of 90 by 240, in which section forces can be given.
Study beam() {
  const Edits edits = {Insert{{Spot::section, "beam", {}}, std::nullopt},
                       Type{{Spot::size, "beam", "b"}, "90 mm"}, Type{{Spot::size, "beam", "h"}, "240 mm"},
                       Insert{{Spot::fibre, "P1", {}}, std::nullopt},
                       Type{{Spot::fibreSection, "P1", {}}, "beam"}};
  return edited(newStudy(), edits).value();
}

TEST(PastedPoints, stressesOfTheShownPointByHeadingsWithUnits) {
  const Study study = newStudy();
  const PastedPoints pasted = pastedPoints(study, "Case\tσx [kPa]\tsy (MPa)\tτ_xy\r\n"
                                                  "G\t1500\t0\t1.5*12 kN/(90 mm*240 mm)\r\n"
                                                  "\r\n"
                                                  "Q\t-2.5 N/mm^2\t(1+2)\t0.25\r\n");
  const Study done = after(study, pasted);
  EXPECT_EQ(pasted.newCases, std::vector<std::string>{"Q"});
  EXPECT_TRUE(pasted.newPoints.empty());
  EXPECT_EQ(findCase(done, "Q")->nature, Nature::variable);
  const CaseStress g{"G", "1500 kPa", "0 MPa", "1.5*12 kN/(90 mm*240 mm)"};
  const CaseStress q{"Q", "-2.5 N/mm^2", "(1+2) MPa", "0.25 MPa"};
  EXPECT_EQ(done.points[0].stress, (std::vector<CaseStress>{g, q}));
  EXPECT_EQ(pasted.rows[1].line, 4);
  EXPECT_EQ(pasted.rows[1].cells, (std::vector<std::string>{"Q", "-2.5 N/mm^2", "(1+2) MPa", "0.25 MPa"}));
  EXPECT_EQ(pasted.replaced, 2U);
}

TEST(PastedPoints, unitsOfHeadingsAreReadAsFramesWriteThem) {
  const Study study = beam();
  const PastedPoints pasted = pastedPoints(study, "case\tN [kN]\tM (kNm)\tsx [N/mm2]\nG\t1\t2\t3\n");
  const CaseStress g = after(study, pasted).points[0].stress[0];
  EXPECT_EQ(g.forces->Mz, "2 kN*m");
  EXPECT_EQ(g.sx, "3 N/mm^2");
  std::string said;
  for (const Text& caution : pasted.cautions)
    said += plain(caution) + "\n";
  EXPECT_NE(said.find("“kNm” in the heading “M (kNm)” is read as kN*m."), std::string::npos) << said;
}

TEST(PastedPoints, makesPointsWithALineAndTheirNotes) {
  const Study study = newStudy();
  const Study done = after(study, pastedPoints(study, "point,note,case,sx,sy,txy\n"
                                                      "P2,\"seat cut, left\",G,1,2,3\n"
                                                      "P2,,Q,4,5,6\n"
                                                      "P3,no stresses yet,,,,\n"));
  ASSERT_EQ(done.points.size(), 3U);
  EXPECT_EQ(done.points[1].note, "seat cut, left");
  EXPECT_EQ(done.points[1].lines, std::vector<Line>{Line{}});
  EXPECT_EQ(done.points[1].stress[1].sy, "5 MPa");
  EXPECT_EQ(done.points[2].note, "no stresses yet");
  EXPECT_TRUE(done.points[2].stress.empty());
  EXPECT_EQ(done.points[0], study.points[0]);
}

TEST(PastedPoints, guessesColumnsOnlyWhereTheirCountSaysThem) {
  const Study study = beam();
  const PastedPoints stresses = pastedPoints(study, "G;1;2;3\n");
  EXPECT_EQ(after(study, stresses).points[0].stress[0].txy, "3 MPa");
  EXPECT_TRUE(contains(plain(stresses.cautions.front()), "told by their count"));

  const PastedPoints forces = pastedPoints(study, "G;1;2;3;0\nQ;4;5;6;0\n");
  const Study done = after(study, forces);
  EXPECT_EQ(done.points[0].stress[1].forces,
            (ForceTexts{"4 kN", "5 kN", "0 kN", "0 kN*m", "0 kN*m", "6 kN*m"}));
  EXPECT_TRUE(contains(plain(forces.cautions.at(2)), "Vy positive upwards on the +x face"));
  EXPECT_TRUE(contains(plain(forces.cautions.back()), "must act at the same time"));

  for (const char* text : {"G;1;2\n", "P1;G;1;2;3\n", "1;2;3;4\n", "G;1;2;3;4;5\n"}) {
    const PastedPoints none = pastedPoints(study, text);
    EXPECT_TRUE(contains(firstWords(none), "not told what this column is")) << text;
    EXPECT_TRUE(none.edits.empty());
  }
}

TEST(PastedPoints, takesTheMeaningOfColumnsFromTheCaller) {
  using enum ColumnKind;
  const Study study = newStudy();
  ColumnChoices choices{{unused, sx, loadCase}, true};
  const PastedPoints pasted = pastedPoints(study, "row;Spannung [kPa];Lastfall\n1;2,5;G\n", choices);
  EXPECT_EQ(after(study, pasted).points[0].stress[0].sx, "2.5 kPa");
  EXPECT_EQ(pasted.columns[1].heading, "Spannung [kPa]");

  choices = {{unused, sx, loadCase}, false};
  EXPECT_EQ(after(study, pastedPoints(study, "1;2;G\n", choices)).points[0].stress[0].sx, "2 MPa");
}

TEST(PastedPoints, anEmptyCellLeavesWhatTheStudyHas) {
  Study study = newStudy();
  study.points[0].stress[0].sy = "7 MPa";
  const PastedPoints pasted = pastedPoints(study, "case\tsx\tsy\nG\t1\t\n");
  EXPECT_EQ(after(study, pasted).points[0].stress[0], (CaseStress{"G", "1 MPa", "7 MPa"}));
  EXPECT_EQ(pasted.rows[0].cells[2], "7 MPa");
  EXPECT_EQ(pastedPoints(study, "case\tsx\tsy\nG\t1\t\xC2\xA0\n").edits, pasted.edits);
}

TEST(PastedPoints, readsDecimalCommasAndRefusesWhatCanBeThousands) {
  const Study study = newStudy();
  const auto sx = [&](const char* text) {
    const PastedPoints pasted = pastedPoints(study, text);
    return pasted.isSound() ? after(study, pasted).points[0].stress[0].sx : firstWords(pasted);
  };
  EXPECT_EQ(sx("case\tsx\nG\t−2,5\n"), "−2.5 MPa");
  EXPECT_EQ(sx("case;sx\nG;1,234\n"), "1.234 MPa");
  EXPECT_EQ(sx("case\tsx\nG\t1,234\nQ\t2,5\n"), "1.234 MPa");
  EXPECT_EQ(sx("case\tsx\nG\t1.234\n"), "1.234 MPa");
  EXPECT_EQ(sx("case\tsx\nG\t0,125\n"), "0.125 MPa");
  for (const char* text : {"case\tsx\nG\t1,234\n", "case\tsx\nG\t1,234\nQ\t2.5\n",
                           "case\tsx\nG\t1.234\nQ\t2,5\n", "case;sx\nG;1.234\n", "case,sx\nG,\"1,234\"\n"})
    EXPECT_TRUE(contains(sx(text), "can be 1234 or 1.2340")) << text << sx(text);
  for (const char* text : {"case\tsx\nG\t1,234,567\n", "case\tsx\nG\t1,234.5\n", "case\tsx\nG\t1.234,5\n",
                           "case\tsx\nG\t1 234\n", "case\tsx\nG\t1'234\n", "case\tsx\nG\t2,5 MPa\n"})
    EXPECT_TRUE(contains(sx(text), "line 2, column 2")) << text << sx(text);
}

TEST(PastedPoints, oneWrongCellKeepsAllFromBeingTaken) {
  const PastedPoints pasted = pastedPoints(newStudy(), "case\tsx\tN\nG\t1\t\nQ\t12 kN\t\n");
  EXPECT_FALSE(pasted.isSound());
  EXPECT_TRUE(pasted.edits.empty());
  EXPECT_TRUE(pasted.rows[0].problems.empty());
  ASSERT_EQ(pasted.rows[1].problems.size(), 1U);
  const Problem& problem = pasted.rows[1].problems[0];
  EXPECT_EQ(problem.line, 3);
  EXPECT_EQ(problem.column, 2);
  EXPECT_EQ(problem.quoted, "12 kN");
  EXPECT_EQ(pasted.rows[1].cells[1], "12 kN");
}

TEST(PastedPoints, aCaseStandsOnceForAPoint) {
  const PastedPoints pasted = pastedPoints(newStudy(), "case\tsx\nG\t1\nQ\t1\nG\t2\n");
  EXPECT_TRUE(
      contains(firstWords(pasted), "line 4, column 1: Case G stands twice for point P1: in line 2 too"));
}

TEST(PastedPoints, forcesNeedAFibre) {
  const PastedPoints pasted = pastedPoints(newStudy(), "case\tN\nG\t1\n");
  EXPECT_TRUE(contains(firstWords(pasted), "Point P1 has no section"));
  EXPECT_FALSE(pastedPoints(beam(), "point\tcase\tN\nP9\tG\t1\n").isSound());
}

TEST(PastedPoints, makesPointsInSectionsThatTheStudyHas) {
  const Study study = beam();
  const PastedPoints pasted = pastedPoints(study, "point,section,y [cm],z,view,case,N,M_z\n"
                                                  "P2,beam,12,45,side,G,1,2\n"
                                                  "P2,,,,,Q,3,4\n"
                                                  "P3,beam,-12,0,top,,,\n");
  const Study done = after(study, pasted);
  ASSERT_EQ(done.points.size(), 3U);
  EXPECT_EQ(done.points[1].fibre, (FibreTexts{"beam", "12 cm", "45 mm", View::side}));
  EXPECT_EQ(done.points[1].stress[1].forces->Mz, "4 kN*m");
  EXPECT_EQ(done.points[2].fibre->view, View::top);
  EXPECT_EQ(pasted.rows[1].cells[1], "beam") << "what the study keeps";
}

TEST(PastedPoints, aSectionThatIsMissingIsNamedAtItsRow) {
  const PastedPoints pasted = pastedPoints(newStudy(), "point\tsection\ty\tz\tcase\tN\n"
                                                       "P2\tpurlin\t0\t0\tG\t1\n"
                                                       "P3\t\t\t\tG\t1\n");
  EXPECT_TRUE(contains(firstWords(pasted), "line 2, column 2: This study has no section “purlin”"))
      << firstWords(pasted);
  EXPECT_TRUE(contains(plain(pasted.allProblems().back()), "line 3, column 6: Point P3 has no section"));
  EXPECT_TRUE(pasted.edits.empty());
}

TEST(PastedPoints, aFibreIsGivenWhole) {
  const auto words = [](const char* text) { return firstWords(pastedPoints(beam(), text)); };
  EXPECT_TRUE(contains(words("point\tsection\ty\tcase\tN\nP2\tbeam\t0\tG\t1\n"),
                       "Where point P2 lies in section “beam” is not given."));
  EXPECT_TRUE(contains(words("point\ty\tz\tcase\tsx\nP2\t0\t0\tG\t1\n"), "Point P2 has no section"));
  EXPECT_TRUE(contains(words("case\ty\tsx\nG\t0\t1\nQ\t1\t1\n"), "line 3, column 2: Point P1 has another"));
  EXPECT_TRUE(contains(words("case\ty\tsx\nG\t121\t1\n"), "line 2"));
  EXPECT_TRUE(contains(words("case\tview\tsx\nG\tbelow\t1\n"), "line 2, column 2: “below” is not one"));
  EXPECT_EQ(after(beam(), pastedPoints(beam(), "case\ty\tsx\nG\t60\t1\n")).points[0].fibre->y, "60 mm");
}

TEST(PastedPoints, pressureIsGivenWholeWhereItIsNew) {
  const Study study = newStudy();
  const Study done = after(study, pastedPoints(study, "case\tpressure [bar]\tinner radius\twall\tends\n"
                                                      "G\t12\t600\t8\topen\n"));
  EXPECT_EQ(done.points[0].stress[0].pressure, (PressureTexts{"12 bar", "600 mm", "8 mm", Ends::open}));
  const PastedPoints half = pastedPoints(study, "case\tpressure\tinner radius\tends\nG\t1\t600\topen\n");
  EXPECT_TRUE(contains(firstWords(half), "of case G is not whole: t is not given")) << firstWords(half);
  EXPECT_TRUE(contains(firstWords(half), "“wall”"));
  EXPECT_EQ(after(done, pastedPoints(done, "case\tpressure\nG\t2\n")).points[0].stress[0].pressure->p,
            "2 MPa");
  EXPECT_FALSE(pastedPoints(study, "case\tpressure\tri\twall\tends\nG\t1\t600\t8\tshut\n").isSound());
}

TEST(PastedPoints, aCaseWithStrainsIsMadeAsMeasured) {
  const std::string head = "case\tstrain_a\tangle_a\tstrain_b\tangle_b\tstrain_c\tangle_c\tmaterial\tE\tnu\n";
  const Study study = newStudy();
  const PastedPoints pasted =
      pastedPoints(study, head + "M\t412\t0\t-87\t45\t120\t90\tisotropic\t210 GPa\t0.3\n");
  const Study done = after(study, pasted);
  EXPECT_EQ(findCase(done, "M")->nature, Nature::measured);
  EXPECT_EQ(pasted.newMeasured, std::vector<std::string>{"M"});
  EXPECT_TRUE(pasted.newCases.empty());
  EXPECT_EQ(done.points[0].stress[1].rosette->strainB, "-87 ustrain");

  const PastedPoints noModulus = pastedPoints(study, head + "M\t1\t0\t2\t45\t3\t90\tisotropic\t\t0.3\n");
  EXPECT_TRUE(contains(firstWords(noModulus), "line 2, column 9")) << firstWords(noModulus);
  const PastedPoints noGrain = pastedPoints(study, head + "M\t1\t0\t2\t45\t3\t90\torthotropic\t\t\n");
  EXPECT_TRUE(contains(firstWords(noGrain), "“E_along”")) << firstWords(noGrain);
  const PastedPoints permanent =
      pastedPoints(study, head + "G\t1\t0\t2\t45\t3\t90\tisotropic\t210 GPa\t0.3\n");
  EXPECT_TRUE(contains(firstWords(permanent), "line 2: Case G has measured strains"))
      << firstWords(permanent);
}

TEST(PastedPoints, theLineOfAPointIsTypedOrMade) {
  const Study study = newStudy();
  const auto lines = [&](const char* text, std::size_t point) {
    return after(study, pastedPoints(study, text)).points.at(point).lines;
  };
  EXPECT_EQ(lines("case\tsx\tline angle\nG\t1\t1 in 10\n", 0),
            (std::vector<Line>{{"grain", LineKind::grain, "1 in 10", ""}}));
  EXPECT_EQ(lines("point\tcase\tsx\tline\tline kind\tline tolerance\nP2\tG\t1\tthroat\tweld\t2\n", 1),
            (std::vector<Line>{{"throat", LineKind::weld, "0 deg", "2 deg"}}));
  EXPECT_TRUE(lines("point\tcase\tsx\tline\nP2\tG\t1\t\n", 1).empty());
  EXPECT_EQ(lines("case\tsx\tline\nG\t1\tbed\n", 0).size(), 2U);
  EXPECT_TRUE(contains(firstWords(pastedPoints(study, "case\tsx\tline tolerance\nG\t1\t-2\n")),
                       "line 2, column 3: “-2” is negative"));
}

TEST(PastedPoints, whatEditedRefusesStandsAtItsRow) {
  Study study = newStudy();
  study.combinations = {{"Q", {{"G", "1"}}}};
  ASSERT_TRUE(problemsIn(study).empty());
  const PastedPoints clash = pastedPoints(study, "case\tsx\nG\t1\nQ\t2\n");
  ASSERT_FALSE(clash.rows.at(1).problems.empty());
  EXPECT_TRUE(contains(firstWords(clash), "line 3"));
  EXPECT_TRUE(clash.edits.empty());

  const PastedPoints huge = pastedPoints(newStudy(), "case\tsy\tsx\nG\t0\t1e200 MPa\n");
  EXPECT_TRUE(contains(firstWords(huge), "line 2, column 3")) << firstWords(huge);
}

TEST(PastedPoints, tellsOfSourcesThatAddToWhatIsPasted) {
  Study study = newStudy();
  study.points[0].stress[0].pressure = PressureTexts{};
  const PastedPoints pasted = pastedPoints(study, "case\tsx\nG\t1\n");
  EXPECT_TRUE(contains(plain(pasted.cautions.back()), "pressure"));
  EXPECT_TRUE(after(study, pasted).points[0].stress[0].pressure);
}

TEST(PastedPoints, refusesTablesThatHaveNoUse) {
  for (const char* text :
       {"", "\n \n", "sx\tsy\n1\t2\n", "case\tpoint\nG\tP1\n", "case\tsx\n", "case\tsx\tsx\nG\t1\t1\n",
        "case\tsx [kN]\nG\t1\n", "case\tsx\tstrain\nG\t1\t2\n"}) {
    const PastedPoints pasted = pastedPoints(newStudy(), text);
    ASSERT_FALSE(pasted.problems.empty()) << text;
    EXPECT_FALSE(pasted.problems.front().mend.empty()) << text;
  }
}

TEST(PastedPoints, headingsAsPeopleWriteThem) {
  using enum ColumnKind;
  const std::vector<std::pair<const char*, ColumnKind>> known = {{"σx", sx},
                                                                 {"SX", sx},
                                                                 {"sigma_x", sx},
                                                                 {"σₓ", sx},
                                                                 {"σ_{x}", sx},
                                                                 {"τxy", txy},
                                                                 {"tau xy", txy},
                                                                 {"Txy", txy},
                                                                 {"n", N},
                                                                 {"V", Vy},
                                                                 {"V_y", Vy},
                                                                 {"vz", Vz},
                                                                 {"T", T},
                                                                 {"M", Mz},
                                                                 {"My", My},
                                                                 {"M_z", Mz},
                                                                 {"Load case", loadCase},
                                                                 {"POINT", point}};
  for (const auto& [heading, kind] : known)
    EXPECT_EQ(kindOfHeading(heading), kind) << heading;
  for (const char* heading : {"", "σ", "τ", "x", "MPa", "sxz", "[MPa]"})
    EXPECT_FALSE(kindOfHeading(heading)) << heading;
  for (const Named<ColumnKind>& row : namesOf<ColumnKind>())
    EXPECT_EQ(kindOfHeading(row.word).value_or(unused), row.value) << row.word;
}

TEST(CopiedPoints, typedTextsAsTheyAreAndForcesOnlyWhereThereAreAny) {
  Study study = newStudy();
  study.points[0].note = "a, \"b\"";
  EXPECT_EQ(copiedPoints(study.points, ','), "point,note,case,sx,sy,txy,sz\n"
                                             "P1,\"a, \"\"b\"\"\",G,0 MPa,0 MPa,0 MPa,0 MPa\n");
  study = beam();
  study.points[0].stress[0].forces = ForceTexts{};
  study.points.emplace_back().name = "P2";
  study.points.back().lines = {Line{}};
  EXPECT_EQ(copiedPoints(study.points, '\t'),
            "point\tnote\tsection\ty\tz\tview\tcase\tsx\tsy\ttxy\tsz\tN\tV_y\tV_z\tT\tM_y\tM_z\n"
            "P1\t\tbeam\t0 mm\t0 mm\tside\tG\t0 MPa\t0 MPa\t0 MPa\t0 MPa\t0 kN\t0 kN\t0 kN\t0 kN*m\t0 kN*m\t"
            "0 kN*m\n"
            "P2\t\t\t\t\t\t\t\t\t\t\t\t\t\t\t\t\n");
}

TEST(CopiedPoints, whatTheTableHasNotIsNamed) {
  Study study = newStudy();
  EXPECT_TRUE(leftOutOf(study.points).empty());
  study = beam();
  study.points[0].planes.emplace_back().name = "scarf";
  study.points[0].reading = "30 deg";
  std::vector<std::string> names;
  for (const Text& name : leftOutOf(study.points))
    names.push_back(plain(name));
  EXPECT_EQ(names, (std::vector<std::string>{"sizes of sections", "watched planes", "reading planes"}));
}

} // namespace
} // namespace planewright
