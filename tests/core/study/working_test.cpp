// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/working_of_state.h"

#include "core/quantity/format.h"
#include "core/working/written.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <algorithm>
#include <cmath>

namespace planewright {
namespace {

Study studyOf(const PlaneStress& stress, double sz, const std::string& unit) {
  Study study = newStudy();
  study.units.stress = unit;
  Point& point = study.points[0];
  point.stress = {{"G", exactNumber(stress.sx) + " " + unit, exactNumber(stress.sy) + " " + unit,
                   exactNumber(stress.txy) + " " + unit, exactNumber(sz) + " " + unit}};
  point.lines = {Line{"grain", LineKind::grain, "1 in 10", ""}};
  point.planes = {{"scarf", "55 deg", ""}};
  point.reading = "25 deg";
  return study;
}

std::vector<Step> steps(const Study& study) {
  const Readout readout = evaluate(study);
  return workingOf(study, readout, readout.state());
}

double distance(const Step& step) {
  const double off = step.formula.valueWith(step.putIn) - step.result;
  return std::abs(step.unit == "°" ? std::remainder(off, 180) : off);
}

/// Formulas against the code of core/stress: two ways to the same numbers. Stresses within 1e-12 of the
/// largest component, because sn and tnt may cancel; angles within 1e-12 of 180 deg.
RC_GTEST_PROP(Working, everyFormulaConfirmsTheFastCode, ()) {
  const auto component = [] { return *rc::gen::inRange(-999999, 999999) / *rc::gen::element(1.0, 1e3, 1e6); };
  const PlaneStress stress{component(), component(), component()};
  const double sz = component();
  Study study = studyOf(stress, sz, *rc::gen::element<std::string>("MPa", "psi", "kN/m^2"));
  study.points[0].reading = exactNumber(*rc::gen::inRange(-3600, 3600) / 10.0) + " deg";
  study.points[0].lines.front().angle = exactNumber(*rc::gen::inRange(-1800, 1800) / 10.0) + " deg";
  const double scale = std::max(scaleOf(stress), std::abs(sz));
  for (const Step& step : steps(study))
    RC_ASSERT(distance(step) <= 1e-12 * (step.unit == "°" ? 180 : scale));
}

TEST(Working, goesFromTheMeanToTheLine) {
  std::vector<std::string> symbols;
  for (const Step& step : steps(studyOf({80, 20, -30}, 0, "MPa")))
    symbols.push_back(plain(step.symbol));
  const std::vector<std::string> expected = {"σm", "r",   "σ1", "σ2",  "θ1", "θτ",     "τabs max",
                                             "σn", "τnt", "σn", "τnt", "σφ", "σφ+90°", "τφ"};
  EXPECT_EQ(symbols, expected);
}

TEST(Working, isWrittenWithOneMoreDecimalThanResults) {
  std::vector<std::string> lines;
  for (const Step& step : steps(studyOf({80, 20, -30}, 0, "MPa")))
    lines.push_back(plain(written(step)));
  EXPECT_EQ(lines[0], "σm = (σx + σy)/2 = (80.000 + 20.000)/2 = 50.00 MPa");
  EXPECT_EQ(lines[1], "r = √(((σx − σy)/2)² + τxy²) = √(((80.000 − 20.000)/2)² + (−30.000)²) = 42.43 MPa");
  EXPECT_EQ(lines[4], "θ1 = atan2(2τxy, σx − σy)/2 = atan2(2 · (−30.000), 80.000 − 20.000)/2 = −22.50°");
  EXPECT_EQ(lines[5], "θτ = θ1 − 45° = −22.500° − 45° = −67.50°");
  EXPECT_EQ(lines[6], "τabs max = (max(σ1, σ2, σz) − min(σ1, σ2, σz))/2 = (max(92.426, 7.574, 0.000) − "
                      "min(92.426, 7.574, 0.000))/2 = 46.21 MPa");
  EXPECT_EQ(lines[8],
            "τnt = −(σx − σy)/2 · sin(2θ) + τxy · cos(2θ) = −(80.000 − 20.000)/2 · sin(2 · 25.000°) + "
            "(−30.000) · cos(2 · 25.000°) = −42.26 MPa");
}

TEST(Working, anglesThatLeaveTheHalfTurnAreFoldedInTheFormula) {
  const auto all = steps(studyOf({20, 80, -30}, 0, "MPa"));
  EXPECT_EQ(plain(written(all[5].formula)), "θ1 − 45° + 180°");
  EXPECT_EQ(distance(all[5]), 0);
  EXPECT_EQ(all[5].formula.valueWith(all[5].putIn), all[5].result);
}

TEST(Working, aDegenerateStateHasNoAngles) {
  const auto all = steps(studyOf({5, 5, 0}, 0, "MPa"));
  EXPECT_TRUE(std::ranges::none_of(all, [](const Step& step) { return step.unit == "°"; }));
  EXPECT_EQ(all.size(), 12u);
}

TEST(Working, everyStepNamesItsSourceAndPutsInOnlyWhatItUses) {
  for (const Step& step : steps(studyOf({80, 20, -30}, 5, "psi"))) {
    EXPECT_FALSE(step.name.empty());
    EXPECT_FALSE(step.source.empty());
    EXPECT_EQ(step.unit == "°" || step.unit == "psi", true);
    const std::string words = plain(written(step.formula));
    for (const NumberPutIn& number : step.putIn)
      EXPECT_NE(words.find(plain(symbol(number.symbol))), std::string::npos) << number.symbol;
  }
}

} // namespace
} // namespace planewright
