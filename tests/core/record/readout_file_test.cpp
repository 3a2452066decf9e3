// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/record/readout_file.h"

#include "core/record/csv.h"
#include "core/record/json.h"
#include "core/study/edit.h"
#include "tests/support/approved.h"
#include "tests/support/judged_study.h"

#include <gtest/gtest.h>

#include "tests/support/study_gen.h"

#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

/// The golden state of the contract, with its line and plane.
Study goldenStudy() {
  Study study = newStudy();
  Point& point = study.points.front();
  point.stress = {{"G", "80 MPa", "20 MPa", "-30 MPa", "0 MPa"}};
  point.lines = {Line{"grain", LineKind::grain, "1 in 10", "2 deg"}};
  point.planes = {{"cut at 25", "25 deg", ""}};
  return study;
}

/// Two points, two cases of which one is missing at the second point, combinations, compression positive,
/// ksi.
Study combinedStudy() {
  Study study = newStudy();
  study.units.stress = "ksi";
  study.convention.positive = Positive::compression;
  study.cases = {{"G", "Self weight", Nature::permanent, Duration::permanent, {}},
                 {"S", "Snow, \"drifted\"", Nature::variable, Duration::shortTerm, {}}};
  study.combinations = {{"1.35 G + 1.5 S", {{"G", "1.35"}, {"S", "1.5"}}, Basis::design},
                        {"G - S", {{"G", "1"}, {"S", "-1"}}, Basis::characteristic}};
  Point weld;
  weld.name = "weld, \"left\"";
  weld.stress = {{"G", "1.2 ksi", "-0.4 ksi", "12 kip/(4 in*2 in)", "0.3 ksi"},
                 {"S", "1.2 ksi", "-0.4 ksi", "12 kip/(4 in*2 in)", "0 ksi"}};
  weld.lines = {Line{"seam", LineKind::weld, "-35 deg", ""}};
  weld.planes = {{"=throat", "10 deg", "2 deg"}, {"leg", "55 deg", ""}};
  Point bare;
  bare.name = "bare";
  bare.stress = {{"G", "5 ksi", "5 ksi", "0 ksi", "0 ksi"}};
  study.points = {weld, bare};
  return study;
}

std::vector<Readout> readoutsOf(const Study& study, const Extras& extras = {}) {
  EXPECT_EQ(problemsIn(study), Problems{});
  std::vector<Readout> readouts;
  for (const Point& point : study.points)
    readouts.push_back(evaluate(study, point.name, extras));
  return readouts;
}

TEST(ReadoutFile, goldenStateAsApproved) {
  const Study study = goldenStudy();
  const auto readouts = readoutsOf(study);
  EXPECT_TRUE(matchesApproved("record/golden.json", readoutJson(study, readouts)));
  EXPECT_TRUE(matchesApproved("record/golden.csv", readoutCsv(study, readouts)));
  EXPECT_TRUE(matchesApproved("record/golden.txt", readoutText(study, readouts)));
}

TEST(ReadoutFile, combinationsOfTwoPointsAsApproved) {
  const Study study = combinedStudy();
  const Extras extras{{{"line 1", LineKind::other, "8 %", "1 deg"}}, {{"normal 1", "90 deg", ""}}};
  const auto readouts = readoutsOf(study, extras);
  EXPECT_TRUE(matchesApproved("record/combined.json", readoutJson(study, readouts)));
  EXPECT_TRUE(matchesApproved("record/combined.csv", readoutCsv(study, readouts)));
  EXPECT_TRUE(matchesApproved("record/combined.txt", readoutText(study, {readouts.back()})));
}

TEST(ReadoutFile, checksAsApproved) {
  Study study = judgedStudy();
  study.points[0].checks.push_back({"uniaxial", "C24", Criterion::hankinson, "grain", "", {}});
  const auto readouts = readoutsOf(study);
  EXPECT_TRUE(matchesApproved("record/judged.json", readoutJson(study, readouts)));
  EXPECT_TRUE(matchesApproved("record/judged.csv", readoutCsv(study, readouts)));
  EXPECT_TRUE(matchesApproved("record/judged.txt", readoutText(study, readouts)));
}

TEST(ReadoutFile, workingOfChecksAsApproved) {
  Study study = judgedStudy();
  study.points[0].checks.push_back({"uniaxial", "C24", Criterion::hankinson, "grain", "", {}});
  study.points[0].checks.push_back({"quadratic", "C24", Criterion::tsaiWu, "grain", "", {}});
  EXPECT_TRUE(matchesApproved("record/judged_working.txt", workingText(study, evaluate(study))));
  study.convention.positive = Positive::compression;
  study.shown.combination = "1.35 G + 1.5 S";
  EXPECT_TRUE(matchesApproved("record/judged_working_compression.txt", workingText(study, evaluate(study))));
}

TEST(ReadoutFile, aFactorThatTheMaterialDoesNotGiveIsNone) {
  Study study = judgedStudy();
  study.materials[0].durations.shortTerm.clear();
  const std::string json = readoutJson(study, readoutsOf(study));
  EXPECT_NE(json.find("\"factor\": null"), std::string::npos);
}

TEST(ReadoutFile, aNewStudyAsApproved) {
  const Study study = newStudy();
  EXPECT_TRUE(matchesApproved("record/new.json", readoutJson(study, readoutsOf(study))));
  EXPECT_TRUE(matchesApproved("record/new.txt", readoutText(study, readoutsOf(study))));
}

TEST(ReadoutFile, csvLosesNoStateWithoutPlanesAndLines) {
  const Study study = combinedStudy();
  const std::string csv = readoutCsv(study, {evaluate(study, "bare")});
  EXPECT_EQ(std::ranges::count(csv, '\n'), 1 + 4);
  EXPECT_NE(csv.find("No stresses are given for case S: it counts as 0."), std::string::npos);
}

// What is needed to read a row alone, and to work out its greatest shear again.
TEST(ReadoutFile, aCsvRowSaysItsUnitItsSignAndTheThirdStress) {
  const Study study = combinedStudy();
  const std::string csv = readoutCsv(study, readoutsOf(study));
  const auto heading = csvFields(csv.substr(0, csv.find('\n')));
  const std::size_t start = csv.find('\n') + 1;
  const auto row = csvFields(csv.substr(start, csv.find('\n', start) - start));
  const auto field = [&](const char* key) {
    return row.at(static_cast<std::size_t>(std::ranges::find(heading, key) - heading.begin()));
  };
  EXPECT_EQ(field("stress_unit"), "ksi");
  EXPECT_EQ(field("positive"), "compression");
  EXPECT_EQ(field("sz"), "0.405");
}

TEST(ReadoutFile, aSourceThatAllStepsShareIsSaidOnce) {
  const Study study = goldenStudy();
  const std::string text = readoutText(study, readoutsOf(study));
  const std::string source = "common practice, no source";
  ASSERT_NE(text.find(source), std::string::npos);
  EXPECT_EQ(text.find(source), text.rfind(source));
}

TEST(ReadoutFile, textIsWrittenInTheLanguageOfTheOutputs) {
  const Study study = goldenStudy();
  const Translate german = [](const std::string& context, const std::string& source) {
    return context == "Readout" && source == "Point %1" ? "Punkt %1" : source;
  };
  EXPECT_NE(readoutText(study, readoutsOf(study), german).find("\nPunkt P1\n"), std::string::npos);
}

RC_GTEST_PROP(ReadoutFile, jsonIsJsonAndEveryCsvRowHasAllItsFields, ()) {
  const Study study = *anyStudy();
  std::vector<Readout> readouts;
  for (const Point& point : study.points)
    readouts.push_back(evaluate(study, point.name));
  const std::string bytes = readoutJson(study, readouts);
  FileProblems problems(bytes);
  const std::optional<Json> json = readJson(problems);
  RC_ASSERT(json && problems.empty());
  RC_ASSERT(member(*json, "points")->value.members.size() == study.points.size());
  const std::string csv = readoutCsv(study, readouts);
  const std::size_t count = csvFields(csv.substr(0, csv.find('\n'))).size();
  std::size_t start = 0;
  for (std::size_t end; (end = csv.find('\n', start)) != std::string::npos; start = end + 1)
    RC_ASSERT(csvFields(std::string_view(csv).substr(start, end - start)).size() == count);
}

} // namespace
} // namespace planewright
