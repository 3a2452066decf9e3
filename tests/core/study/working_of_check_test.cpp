// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/working_of_check.h"

#include "core/quantity/format.h"
#include "core/strength/written_criterion.h"
#include "core/study/edit.h"
#include "core/study/judge_checks.h"
#include "core/study/text_fields.h"
#include "core/working/written.h"
#include "tests/support/formula_rounding.h"
#include "tests/support/judged_study.h"
#include "tests/support/strength_gen.h"
#include "tests/support/study_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <algorithm>
#include <cmath>
#include <map>
#include <set>

namespace planewright {
namespace {

std::string stressText(double value, const std::string& unit = "MPa") {
  return shortestNumber(value) + " " + unit;
}

double between(int from, int to, double per) {
  return *rc::gen::inRange(from, to) / per;
}

MaterialKind anyKindOf(Criterion criterion) {
  std::vector<MaterialKind> kinds;
  for (const Named<MaterialKind>& row : namesOf<MaterialKind>())
    if (applies(criterion, row.value))
      kinds.push_back(row.value);
  return *rc::gen::elementOf(kinds);
}

/// Strengths with closed surfaces, across at most along.
Material anyMaterial(MaterialKind kind) {
  Material material;
  material.name = "any";
  material.kind = kind;
  const double Xt = between(100, 20000, 100);
  const double Xc = between(100, 20000, 100);
  const double least = std::min(Xt, Xc);
  material.alongTension = stressText(Xt);
  material.alongCompression = stressText(Xc);
  material.acrossTension = stressText(between(1, 101, 100) * least);
  material.acrossCompression = stressText(between(1, 101, 100) * least);
  material.alongBending = stressText(between(100, 20000, 100));
  material.shear = stressText(between(10, 10000, 100));
  material.tension = stressText(between(10, 50000, 100));
  material.compression = stressText(between(10, 50000, 100));
  material.cohesion = stressText(*rc::gen::element(0.0, between(1, 1000, 100)));
  material.friction = shortestNumber(between(1, 80, 1)) + " deg";
  material.cutoff = *rc::gen::element<std::string>("", "0 MPa", stressText(between(1, 1000, 100)));
  material.fu = stressText(between(300, 600, 1));
  material.betaW = shortestNumber(between(80, 100, 100));
  material.gammaM2 = "1.25";
  for (const TextField<Material>& field : textFieldsOf<Material>())
    for (std::size_t i = 0; i < strengthKeys; ++i)
      if (field.spot == spotOf(static_cast<StrengthKey>(i)) && !has(kind, static_cast<StrengthKey>(i)))
        (material.*field.text).clear();
  if (kind != MaterialKind::throat) {
    material.factor = *rc::gen::element<std::string>("", "", "", "0.57");
    material.partialFactor = *rc::gen::element<std::string>("", "1.3");
    if (*rc::gen::element(0, 1, 2) == 0)
      material.durations.permanent = "0.6";
  }
  return material;
}

PlaneStress anyStressFor(Criterion criterion) {
  if (criterion == Criterion::taperedEdge || criterion == Criterion::hankinson ||
      criterion == Criterion::compressionAtAngle) {
    const double size = *anyComponent();
    return uniaxial(criterion == Criterion::compressionAtAngle ? -std::abs(size) : size, *anyAngle());
  }
  return *anyStress();
}

/// A point of one material under one case, with a check of a random criterion.
Study anyCheckedStudy(Criterion criterion) {
  Study study = newStudy();
  study.units.stress = *rc::gen::element<std::string>("MPa", "psi", "kN/m^2");
  study.convention.positive = *rc::gen::element(Positive::tension, Positive::compression);
  const double sense = study.convention.positive == Positive::tension ? 1 : -1;
  const PlaneStress stress = sense * anyStressFor(criterion);
  const bool hasThird = rowOf(criterion).actsOn == ActsOn::principal;
  Point& point = study.points[0];
  point.stress = {CaseStress{"G", stressText(stress.sx), stressText(stress.sy), stressText(stress.txy),
                             stressText(hasThird ? *anyComponent() : 0)}};
  const std::string angle = shortestNumber((*anyAngle()).degrees()) + " deg";
  const std::string tolerance = *rc::gen::element<std::string>("", "3 deg", "40 deg", "90 deg");
  point.lines = {{"grain", LineKind::grain, angle, tolerance}};
  point.planes = {{"joint", angle, tolerance}};
  study.materials = {anyMaterial(anyKindOf(criterion))};
  Check check;
  check.id = "check";
  check.material = "any";
  check.criterion = criterion;
  if (rowOf(criterion).actsOn == ActsOn::line)
    check.line = "grain";
  if (rowOf(criterion).actsOn == ActsOn::plane)
    check.plane = "joint";
  if (criterion == Criterion::hankinson)
    check.parameters.n = *rc::gen::element<std::string>("", "1.5", "2.5");
  if (criterion == Criterion::tsaiWu)
    check.parameters.F12 = *rc::gen::element<std::string>("", "", "1e-9 MPa^-2");
  if (criterion == Criterion::compressionAtAngle)
    check.parameters.kc90 = *rc::gen::element<std::string>("", "1.5");
  if (criterion == Criterion::taperedEdge) {
    const Circle circle = circleOf(stress);
    const bool isFirst = std::abs(circle.s1) >= std::abs(circle.s2);
    const auto axis = isFirst ? circle.theta1 : circle.theta2();
    check.parameters.edge = shortestNumber(axis ? axis->value.degrees() : 0) + " deg";
  }
  point.checks = {check};
  return study;
}

/// A share of bending, which section forces would bring.
void bend(Readout& readout) {
  StateReading& state = readout.states[0];
  state.bending = *rc::gen::element(0.0, 1.0, 0.4, -0.5) * state.stress.sx;
  state.axial = *rc::gen::element(0.0, 1.0, 0.6, -0.5) * state.stress.sx;
  CheckReading& reading = state.checks[0];
  const CheckSetup& setup = readout.checks[0];
  if (reading.problem)
    return;
  const Result<Judge> judge = judgeOf(readout, state, 0);
  if (!judge) { // with the strength of the mix the surface can be open
    reading.problem = judge.error();
    return;
  }
  const Angle nominal = setup.band ? setup.band->nominal : Angle();
  reading.nominal = reading.worst = judge->at(nominal);
  reading.first.reset();
  if (setup.band) {
    const WorstInBand worst = worstIn(*judge, *setup.band);
    reading.worst = worst.judgement;
    reading.worstAngle = worst.angle;
    reading.first = worst.first;
  } else if (reading.worst.multiplier)
    reading.first = {*reading.worst.multiplier, nominal};
}

const Step* lastOf(const std::vector<Step>& steps, const std::string& symbol, bool atWorst) {
  const Step* found = nullptr;
  for (const Step& step : steps)
    if (plain(step.symbol) == symbol &&
        (plain(step.name).find("at the worst") != std::string::npos) == atWorst)
      found = &step;
  return found;
}

/// Whether all that a formula is evaluated with, and what comes out, is a number.
void confirm(const Step& step, double scale) {
  for (const NumberPutIn& number : step.putIn)
    RC_ASSERT(std::isfinite(number.value));
  RC_ASSERT(std::isfinite(step.result));
  const Rounded value = roundedValue(step.formula, step.putIn);
  const double off = std::abs(step.formula.valueWith(step.putIn) - step.result);
  // What is only rounding of the state's terms counts as zero in the stresses.
  const double ofState = step.unit == "°" || step.unit.empty() ? 0 : 8 * 2.3e-16 * scale;
  if (!(off <= std::max(1e-12 * std::abs(step.result), 16 * value.error + ofState)))
    RC_LOG() << plain(written(step)) << " off by " << off << " of " << value.error << "\n";
  RC_ASSERT(off <= std::max(1e-12 * std::abs(step.result), 16 * value.error + ofState));
  RC_ASSERT(!step.name.empty());
  RC_ASSERT(!step.source.empty());
}

/// What a run has met of a criterion, for the count.
using Met = std::map<Criterion, std::set<std::string>>;

std::string signOf(double value) {
  return value < 0 ? "-" : "+";
}

std::string signsAt(const Judge& judge, Criterion criterion, Angle direction) {
  const LineStress s = judge.state().at(direction);
  if (isOfUniaxialStress(criterion))
    return signOf(judge.state().circle.mean);
  return rowOf(criterion).actsOn == ActsOn::line ? signOf(s.along) + signOf(s.across) : signOf(s.along);
}

void note(std::set<std::string>& seen, const Readout& readout, const std::vector<Step>& steps) {
  const CheckSetup& setup = readout.checks[0];
  const Step* nominal = lastOf(steps, "u", false);
  const Step* worst = lastOf(steps, "u", true);
  if (const Result<Judge> judge = judgeOf(readout, readout.states[0], 0); judge && judge->hasDirection()) {
    if (nominal)
      seen.insert(signsAt(*judge, setup.criterion, setup.band->nominal));
    if (worst)
      seen.insert("worst " + signsAt(*judge, setup.criterion, *readout.states[0].checks[0].worstAngle));
  }
  for (const char* symbol : {"w", "kmod", "γM", "km,α", "R", "u"})
    for (const Step& step : steps)
      if (plain(step.symbol) == symbol || plain(written(step.formula)).find(symbol) != std::string::npos)
        seen.insert(symbol);
  if (const Step* b = lastOf(steps, "b", false))
    seen.insert("b" + signOf(b->result));
  if (!steps.empty() && !nominal)
    seen.insert("no number");
}

/// What has to be met of a criterion.
std::set<std::string> wanted(Criterion criterion) {
  const ActsOn actsOn = rowOf(criterion).actsOn;
  std::set<std::string> all = {"u", "R"};
  if (criterion != Criterion::throat)
    all.insert({"kmod", "γM"});
  if (actsOn == ActsOn::principal)
    return all;
  std::vector<std::string> signs = {"+", "-"};
  if (actsOn == ActsOn::line && !isOfUniaxialStress(criterion))
    signs = {"++", "+-", "-+", "--"};
  if (criterion == Criterion::compressionAtAngle)
    signs = {"-"};
  for (const std::string& sign : signs)
    all.insert({sign, "worst " + sign});
  if (hasMixedStrength(criterion))
    all.insert("w");
  if (criterion == Criterion::hoffman || criterion == Criterion::tsaiWu)
    all.insert({"b+", "b-"});
  if (criterion == Criterion::taperedEdge)
    all.insert("km,α");
  if (criterion == Criterion::coulomb)
    all.insert("no number");
  return all;
}

void holdAgainstTheReading(const Readout& readout, const std::vector<Step>& steps) {
  const CheckReading& reading = readout.states[0].checks[0];
  if (reading.problem) {
    RC_ASSERT(steps.empty());
    return;
  }
  const auto holds = [](const Step* step, double utilisation) {
    if (!std::isfinite(utilisation))
      RC_ASSERT(!step);
    else if (utilisation > 0) {
      RC_ASSERT(step);
      RC_ASSERT(step->result == utilisation);
    }
  };
  const CheckSetup& setup = readout.checks[0];
  holds(lastOf(steps, "u", false), reading.nominal.utilisation);
  const bool hasWorst = setup.band && *reading.worstAngle != setup.band->nominal;
  if (hasWorst)
    holds(lastOf(steps, "u", true), reading.worst.utilisation);
  const bool hasMultiplier = !steps.empty() && steps.back().symbol == symbol("R");
  RC_ASSERT(reading.first.has_value() == hasMultiplier);
  if (reading.first)
    RC_ASSERT(steps.back().result == reading.first->multiplier);
}

/// Formulas against the code of core/strength: within 1e-12, or 16 times what rounding of each operation of
/// the formula can make of it.
TEST(WorkingOfCheck, everyFormulaConfirmsTheJudgementOfEveryCriterionAndSign) {
  constexpr int studiesOfEach = 10;
  Met met;
  EXPECT_TRUE(rc::check([&] {
    for (const Named<Criterion>& row : namesOf<Criterion>())
      for (int i = 0; i < studiesOfEach; ++i) {
        const Study study = anyCheckedStudy(row.value);
        RC_ASSERT(problemsIn(study).empty());
        Readout readout = evaluate(study);
        bend(readout);
        const std::vector<Step> steps = workingOfCheck(study, readout, readout.states[0], 0);
        holdAgainstTheReading(readout, steps);
        for (const Step& step : steps)
          confirm(step, readout.states[0].scale);
        note(met[row.value], readout, steps);
      }
  }));
  for (const Named<Criterion>& row : namesOf<Criterion>())
    for (const std::string& one : wanted(row.value))
      EXPECT_TRUE(met[row.value].contains(one)) << row.word << " never met " << one;
}

std::vector<std::string> linesOf(const Study& study, std::size_t state, std::size_t check) {
  const Readout readout = evaluate(study);
  std::vector<std::string> lines;
  for (const Step& step : workingOfCheck(study, readout, readout.states[state], check))
    lines.push_back(plain(written(step)));
  return lines;
}

std::string lineOf(const std::vector<std::string>& lines, const std::string& symbol) {
  for (const std::string& line : lines)
    if (line.starts_with(symbol + " = "))
      return line;
  return {};
}

/// The judged study with one case alone, and another criterion for its first check.
Study judgedBy(Criterion criterion, const CaseStress& stress, const ParameterTexts& parameters = {}) {
  Study study = judgedStudy();
  study.points[0].stress = {stress};
  study.points[0].checks[0].criterion = criterion;
  study.points[0].checks[0].parameters = parameters;
  EXPECT_TRUE(problemsIn(study).empty());
  return study;
}

/// A material on its own, checked on the plane "scarf" or without a direction.
Study judgedWith(const Material& material, Criterion criterion, const CaseStress& stress) {
  Study study = judgedStudy();
  study.materials = {material};
  const bool hasPlane = rowOf(criterion).actsOn == ActsOn::plane;
  study.points[0].stress = {stress};
  study.points[0].planes = {{"scarf", "0 deg", ""}};
  study.points[0].checks = {{"check", material.name, criterion, "", hasPlane ? "scarf" : "", {}}};
  EXPECT_TRUE(problemsIn(study).empty());
  return study;
}

TEST(WorkingOfCheck, goesFromTheFactorToTheMultiplier) {
  const std::vector<std::string> lines = linesOf(judgedStudy(), 1, 0);
  ASSERT_EQ(lines.size(), 10U);
  EXPECT_EQ(lines[0], "k = kmod/γM = 0.9/1.3 = 0.6923");
  EXPECT_EQ(lines[1], "ft,0,d = k · ft,0 = 0.69231 · 14.5 = 10.04 MPa");
  EXPECT_EQ(lines[4], "u = √((σφ/ft,0,d)² + (σφ+90°/fc,90,d)² + (τφ/fv,d)²) = √((3.5223 MPa/(10.038 MPa))² + "
                      "((−0.012345 MPa)/(1.7308 MPa))² + ((−0.024823 MPa)/(2.7692 MPa))²) = 0.3511");
  EXPECT_EQ(lines[7],
            "τφ = −(σx − σy)/2 · sin(2φ) + τxy · cos(2φ) = −(3.51 − 0)/2 · sin(2 · 6.814°) + 0.21 · "
            "cos(2 · 6.814°) = −0.209 MPa");
  EXPECT_EQ(lines[9].substr(0, 12), "R = 1/u = 1/");
}

TEST(WorkingOfCheck, strengthsWithoutAFactorEnterAsTheyAreGiven) {
  const std::vector<std::string> lines = linesOf(judgedStudy(), 1, 1);
  ASSERT_EQ(lines.size(), 2U);
  EXPECT_EQ(lines[0],
            "u = √((σn/fn)² + (τnt/fs)²) = √((1.0594 MPa/(2 MPa))² + ((−1.6249 MPa)/(3 MPa))²) = 0.7576");
}

TEST(WorkingOfCheck, theFormsOfTheCodeAreWrittenAsTheyAre) {
  const CaseStress pressed{"G", "-3 MPa", "0 MPa", "0 MPa"};
  EXPECT_EQ(
      lineOf(linesOf(judgedBy(Criterion::compressionAtAngle, pressed, {"", "", "1.5", ""}), 0, 0), "fc,α,d"),
      "fc,α,d = fc,0,d/(fc,0,d/(kc,90 · fc,90,d) · sin(α)² + cos(α)²) = 9.6923/(9.6923/(1.5 · 1.1538) · "
      "sin(3.814°)² + cos(3.814°)²) = 9.499 MPa");
  const std::vector<std::string> taper =
      linesOf(judgedBy(Criterion::taperedEdge, pressed, {"", "", "", "0 deg"}), 0, 0);
  EXPECT_EQ(
      lineOf(taper, "km,α"),
      "km,α = 1/√(1 + (fm,d/(1.5fv,d) · tan(α))² + (fm,d/fc,90,d · tan(α)²)²) = 1/√(1 + (11.077 MPa/(1.5 · "
      "1.8462 MPa) · tan(3.814°))² + (11.077 MPa/(1.1538 MPa) · tan(3.814°)²)²) = 0.9654");
  EXPECT_EQ(lineOf(taper, "u"), "u = |σφ|/(km,α · fm,d) = |−4.0321 MPa|/(0.96541 · 11.077 MPa) = 0.3770");
}

TEST(WorkingOfCheck, aGivenInteractionIsPutInWithItsUnit) {
  Study study =
      judgedBy(Criterion::tsaiWu, {"G", "1.6 MPa", "0.1 MPa", "0.1 MPa"}, {"", "-0.01 MPa^-2", "", ""});
  EXPECT_EQ(lineOf(linesOf(study, 0, 0), "F12,d"), "F12,d = F12/k² = (−0.01)/0.46154² = −0.04694 MPa⁻²");
  study.units.stress = "N/mm^2";
  EXPECT_EQ(lineOf(linesOf(study, 0, 0), "F12,d"), "F12,d = F12/k² = (−0.01)/0.46154² = −0.04694 (N/mm²)⁻²");
}

TEST(WorkingOfCheck, aSteepTaperIsTheSumOfSquaresItComesFrom) {
  Study study = judgedBy(Criterion::taperedEdge, {"G", "3 MPa", "0 MPa", "0 MPa"}, {"", "", "", "0 deg"});
  study.points[0].lines[0].angle = "89 deg";
  const std::vector<std::string> lines = linesOf(study, 0, 0);
  EXPECT_EQ(lineOf(lines, "km,α"), "");
  EXPECT_NE(lineOf(lines, "u").find("(τφ/(0.75fv,d))²"), std::string::npos);
}

TEST(WorkingOfCheck, stressesArePositiveInTensionWhateverTheStudySays) {
  Study study = judgedStudy();
  study.convention.positive = Positive::compression;
  const Readout readout = evaluate(study);
  const std::vector<Step> steps = workingOfCheck(study, readout, readout.states[1], 0);
  const auto along = std::ranges::find(steps, symbol("σ_{φ}"), &Step::symbol);
  ASSERT_NE(along, steps.end());
  EXPECT_EQ(plain(along->name), "stress along the grain, tension positive");
  EXPECT_EQ(along->result, -readout.states[1].lines[0].along);
  EXPECT_EQ(along->formula.operation(), Formula::Operation::negative);
}

TEST(WorkingOfCheck, bendingBringsTheStrengthOfTheMix) {
  const Study study = judgedStudy();
  Readout readout = evaluate(study);
  readout.states[1].axial = 1;
  readout.states[1].bending = 2.51;
  std::vector<std::string> lines;
  for (const Step& step : workingOfCheck(study, readout, readout.states[1], 0))
    lines.push_back(plain(written(step)));
  EXPECT_EQ(lineOf(lines, "w"), "w = σx,M/(σx,M + σx,N) = 2.51 MPa/(2.51 MPa + 1 MPa) = 0.7151");
  EXPECT_EQ(lineOf(lines, "wφ"),
            "wφ = w · |σx|/(|σx| + |σy| + 2 · |τxy|) = 0.71510 · |3.51 MPa|/(|3.51 MPa| + "
            "|0 MPa| + 2 · |0.21 MPa|) = 0.6387");
  EXPECT_EQ(lineOf(lines, "ft,NM,d"), "ft,NM,d = 1/((1 − wφ)/ft,0,d + wφ/fm,d) = 1/((1 − 0.63868)/10.038 + "
                                      "0.63868/16.615) = 13.43 MPa");
}

TEST(WorkingOfCheck, theThroatHasItsTwoLimits) {
  Material weld;
  weld.name = "weld";
  weld.kind = MaterialKind::throat;
  weld.fu = "360 MPa";
  weld.betaW = "0.8";
  weld.gammaM2 = "1.25";
  const std::vector<std::string> lines =
      linesOf(judgedWith(weld, Criterion::throat, {"G", "100 MPa", "0 MPa", "120 MPa"}), 0, 0);
  ASSERT_EQ(lines.size(), 4U);
  EXPECT_EQ(lines[0], "feq,d = fu/(βw · γM2) = 360/(0.8 · 1.25) = 360.0 MPa");
  EXPECT_EQ(lines[1], "fn,d = 0.9fu/γM2 = 0.9 · 360/1.25 = 259.2 MPa");
  EXPECT_EQ(lines[2], "u = max(√(σn² + 3 · τnt²)/feq,d, |σn|/fn,d) = max(√((135 MPa)² + 3 · (162 MPa)²)/(360 "
                      "MPa), |135 MPa|/(259.2 MPa)) = 0.8649");
}

TEST(WorkingOfCheck, theMultiplierIsThatOfTheDirectionThatComesToItsLimitFirst) {
  Material rock;
  rock.name = "joint";
  rock.kind = MaterialKind::coulomb;
  rock.cohesion = "1 MPa";
  rock.friction = "40 deg";
  Study study = judgedWith(rock, Criterion::coulomb, {"G", "-3 MPa", "-0.6 MPa", "0 MPa"});
  study.points[0].planes[0].normal = "60 deg";
  study.points[0].planes[0].tolerance = "10 deg";
  const Readout readout = evaluate(study);
  const CheckReading& reading = readout.states[0].checks[0];
  ASSERT_TRUE(reading.first);
  EXPECT_NEAR(reading.first->angle.degrees(), 65, 1e-9);
  const std::vector<Step> steps = workingOfCheck(study, readout, readout.states[0], 0);
  EXPECT_EQ(steps.back().symbol, symbol("R"));
  EXPECT_EQ(steps.back().result, reading.first->multiplier);
  EXPECT_NE(plain(steps.back().name).find("that comes to its limit first"), std::string::npos);
  for (const Step& step : steps)
    confirm(step, readout.states[0].scale);
}

TEST(WorkingOfCheck, whereNoFiniteNumberExistsItShowsWhy) {
  Material soil;
  soil.name = "joint";
  soil.kind = MaterialKind::coulomb;
  soil.cohesion = "0.1 MPa";
  soil.friction = "30 deg";
  const std::vector<std::string> pulled =
      linesOf(judgedWith(soil, Criterion::coulomb, {"G", "2 MPa", "0 MPa", "1 MPa"}), 0, 0);
  ASSERT_EQ(pulled.size(), 2U);
  EXPECT_EQ(pulled[0], "τR = c − σn · tan(φ) = 0.1 − 2.7 · tan(30.000°) = −1.459 MPa");
  EXPECT_EQ(pulled[1], "R = min(c/(|τnt| + σn · tan(φ)), σt/σn) = min(0.1 MPa/(|1.35 MPa| + 2.7 MPa · "
                       "tan(30.000°)), 0 MPa/(2.7 MPa)) = 0.000");
}

TEST(WorkingOfCheck, whatIsNotJudgedOrNotLoadedHasNoMoreThanMakesSense) {
  const CaseStress none{"G", "0 MPa", "0 MPa", "0 MPa"};
  EXPECT_EQ(linesOf(judgedBy(Criterion::hankinson, none), 0, 0),
            std::vector<std::string>{"k = kmod/γM = 0.6/1.3 = 0.4615"});
  const std::vector<std::string> squares = linesOf(judgedBy(Criterion::sumOfSquares, none), 0, 0);
  EXPECT_EQ(squares.back().substr(squares.back().size() - 7), "= 0.000") << squares.back();
  const CaseStress biaxial{"G", "1 MPa", "1 MPa", "0 MPa"};
  EXPECT_TRUE(linesOf(judgedBy(Criterion::hankinson, biaxial), 0, 0).empty());
  const Readout readout = evaluate(judgedStudy());
  EXPECT_TRUE(workingOfCheck(judgedStudy(), readout, readout.states[2], 0).empty())
      << "a case beside combinations";
}

TEST(WorkingOfCheck, theNumbersAsWrittenGiveTheResultAsWritten) {
  for (const Criterion criterion : criteriaFor(MaterialKind::timber)) {
    if (isOfUniaxialStress(criterion))
      continue;
    const Study study = judgedBy(criterion, {"G", "1.6 MPa", "0 MPa", "0.1 MPa"});
    const Readout readout = evaluate(study);
    for (const Step& step : workingOfCheck(study, readout, readout.states[0], 0)) {
      NumbersPutIn rounded = step.putIn;
      for (NumberPutIn& number : rounded)
        number.value =
            std::round(number.value * std::pow(10, number.decimals)) / std::pow(10, number.decimals);
      EXPECT_NEAR(step.formula.valueWith(rounded), step.result, 0.51 * std::pow(10, -step.decimals))
          << plain(written(step));
    }
  }
}

} // namespace
} // namespace planewright
