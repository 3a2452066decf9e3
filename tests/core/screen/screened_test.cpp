// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/screened.h"

#include "core/screen/one_point.h"
#include "tests/support/field_gen.h"
#include "tests/support/judged_study.h"

#include <gmock/gmock.h>
#include <rapidcheck/gtest.h>

#include <cmath>
#include <map>

namespace planewright {
namespace {

constexpr double share = 1e-12;

double allowed(const ScreenPlan& plan, const Field& field, std::size_t point, double utilisation) {
  return share * utilisation + 1e-14 * sizeOfTerms(plan, field, point);
}

/// The utilisation that the core finds for the combination, check and direction of a result.
double byCoreAt(const ScreenPlan& plan, const Field& field, std::size_t point, const PointResult& result) {
  Demand demand;
  const double sense = plan.positive == Positive::tension ? 1 : -1;
  for (const ActingCase& acting : plan.combinations[result.combination].acting) {
    const PlaneStress stress = field.stressOf(acting.index, point);
    demand.stress = demand.stress + sense * acting.factor * stress;
    demand.scale += std::abs(acting.factor) * scaleOf(stress);
  }
  demand.stress = withoutRounding(demand.stress, demand.scale);
  const ScreenedCheck& check = plan.checks[result.check];
  const double factor = check.forms[result.combination].factor.value;
  return Judge::of(check.setup.criterion, factor * check.setup.strengths,
                   forStrengthsTimes(factor, check.setup.parameters), demand)
      ->utilisation(Angle::fromDegrees(result.worstAngle - field.axesOf(point)));
}

std::vector<std::vector<double>> anyFactors(Dice& dice) {
  const std::size_t cases = 1 + dice.below(5);
  std::vector<std::vector<double>> factors(1 + dice.below(6));
  for (std::vector<double>& row : factors)
    for (std::size_t k = 0; k < cases; ++k)
      row.push_back(dice.below(4) == 0 ? 0 : std::round(dice.between(-2, 2) * 20) / 20);
  return factors;
}

PlaneStress anyStressOf(Dice& dice, double size) {
  const auto one = [&] { return dice.below(6) == 0 ? 0 : dice.between(-size, size); };
  switch (dice.below(8)) {
  case 0: // uniaxial
    return {one(), 0, 0};
  case 1: { // the same in all directions, almost
    const double s = one();
    return {s, s * (1 + 1e-12 * one()), 1e-12 * one()};
  }
  case 2: { // whole numbers, which cancel
    return {std::round(one()), std::round(one()), std::round(one())};
  }
  default:
    return {one(), one(), one()};
  }
}

Study anyFieldStudy(const std::vector<std::vector<double>>& factors) {
  const auto tolerance = *rc::gen::element(0.0, 0.001, 1.0, 5.0, 15.0, 30.0, 45.0, 60.0, 89.0, 90.0);
  Study study = fieldStudy(*anyLineCriterion(), *anyLineStrengths(), *anyAngle(),
                           Angle::fromDegrees(tolerance), factors);
  study.convention.positive = *rc::gen::element(Positive::tension, Positive::compression);
  return study;
}

RC_GTEST_PROP(Screened, agreesWithTheCore, (const std::uint32_t& seed)) {
  Dice dice(seed + 1);
  const Study study = anyFieldStudy(anyFactors(dice));
  const Result<ScreenPlan> plan = screenPlanOf(study, "field");
  RC_ASSERT(plan.has_value());
  const double size = *rc::gen::element(1e-30, 1e-3, 1.0, 100.0, 1e30);
  const bool hasOwn = *rc::gen::arbitrary<bool>();
  Field field = fieldOf(*plan, 150, [&](std::size_t, std::size_t) { return anyStressOf(dice, size); },
                        {false, hasOwn, hasOwn, false, false, false});
  for (std::size_t i = 0; hasOwn && i < field.size(); ++i) {
    field.setAxes(i, std::round(dice.between(-90, 90)));
    if (dice.below(2))
      field.setLine(i, std::round(dice.between(-90, 90)));
  }
  const auto results = screened(*plan, field, 1);
  for (std::size_t i = 0; i < field.size(); ++i) {
    const PointResult result = (*results)[i];
    const PointResult core = judgedByCore(*plan, field, i);
    const double most = allowed(*plan, field, i, core.utilisation);
    RC_ASSERT(std::abs(result.utilisation - core.utilisation) <= most);
    // What it names is as bad as it says.
    const double slope = 4e-15 * sizeOfTerms(*plan, field, i); // of an angle's last digit
    RC_ASSERT(std::abs(byCoreAt(*plan, field, i, result) - result.utilisation) <= 4 * most + slope);
    RC_ASSERT(result.mode.has_value() == core.mode.has_value());
    const Angle line = lineAt(plan->checks[0], field, i);
    RC_ASSERT(std::abs(result.worstAngle - line.degrees()) <=
              plan->checks[0].band.tolerance.degrees() + 1e-13);
  }
}

// Where one combination governs clearly, all that is said of it is what the core says.
RC_GTEST_PROP(Screened, namesWhatTheCoreNames, (const std::uint32_t& seed)) {
  Dice dice(seed + 1);
  const Study study = anyFieldStudy({{1.35, 0}, {1.35, 1.5}, {1, -1.5}});
  const Result<ScreenPlan> plan = screenPlanOf(study, "field");
  const Field field = fieldOf(*plan, 150, [&](std::size_t, std::size_t) {
    return PlaneStress{dice.between(-80, 80), dice.between(-5, 5), dice.between(-9, 9)};
  });
  const auto results = screened(*plan, field, 1);
  for (std::size_t i = 0; i < field.size(); ++i) {
    const PointResult result = (*results)[i];
    const PointResult core = judgedByCore(*plan, field, i);
    RC_ASSERT(result.combination == core.combination);
    RC_ASSERT(result.mode == core.mode);
    RC_ASSERT(std::abs(result.worstAngle - core.worstAngle) < 1e-5);
  }
}

RC_GTEST_PROP(Screened, doesNotDependOnThreadsOrNeighbours, (const std::uint32_t& seed)) {
  Dice dice(seed + 1);
  const Study study = anyFieldStudy(anyFactors(dice));
  const Result<ScreenPlan> plan = screenPlanOf(study, "field");
  std::vector<PlaneStress> stresses(3000 * plan->cases.size());
  for (PlaneStress& stress : stresses)
    stress = anyStressOf(dice, 100);
  const auto stressAt = [&](std::size_t k, std::size_t i) { return stresses[i * plan->cases.size() + k]; };
  const Field field = fieldOf(*plan, 3000, stressAt);
  const auto one = screened(*plan, field, 1);
  const auto three = screened(*plan, field, 3);
  const std::size_t from = 1 + dice.below(500);
  const Field part = fieldOf(*plan, 700, [&](std::size_t k, std::size_t i) { return stressAt(k, from + i); });
  const auto partly = screened(*plan, part, 2);
  for (std::size_t i = 0; i < field.size(); ++i)
    RC_ASSERT((*one)[i] == (*three)[i]);
  for (std::size_t i = 0; i < part.size(); ++i)
    RC_ASSERT((*partly)[i] == (*one)[from + i]);
}

// The way of one point through the study gives the same as its row in a field.
TEST(Screened, agreesWithTheReadoutOfAPoint) {
  Study study = judgedStudy();
  study.points[0].checks.pop_back();
  const Readout readout = evaluate(study);
  const Result<ScreenPlan> plan = screenPlanOf(study, study.points[0].name);
  ASSERT_TRUE(plan);
  const Field field = fieldOf(*plan, 1, [&](std::size_t k, std::size_t) { return readout.cases[k].stress; });
  const PointResult result = (*screened(*plan, field))[0];
  double worst = 0;
  for (const StateReading& state : readout.states)
    if (state.judged)
      worst = std::max(worst, state.checks[0].worst.utilisation);
  const CheckReading& reading = readout.states[result.combination].checks[0];
  EXPECT_NEAR(result.utilisation, worst, 1e-12 * worst);
  EXPECT_NEAR(*result.multiplier(), *reading.worst.multiplier, 1e-12 * *reading.worst.multiplier);
  EXPECT_NEAR(result.worstAngle, reading.worstAngle->degrees(), 1e-9);
  EXPECT_EQ(result.mode, reading.worst.mode);
}

TEST(Screened, sizesBeyondTheKernelsGoTheCoresWay) {
  for (const double size : {1e-200, 1e-70, 1e70, 1e99}) {
    const Study study = fieldStudy(Criterion::norrisPlane, c24(), Angle::fromDegrees(10),
                                   Angle::fromDegrees(5), {{1.35, 1.5}});
    const Result<ScreenPlan> plan = screenPlanOf(study, "field");
    const Field field = fieldOf(*plan, 5, [&](std::size_t k, std::size_t i) {
      return PlaneStress{size * static_cast<double>(i + 1), -size, size * static_cast<double>(k)};
    });
    const auto results = screened(*plan, field);
    for (std::size_t i = 0; i < field.size(); ++i)
      EXPECT_EQ((*results)[i], judgedByCore(*plan, field, i));
  }
}

TEST(Screened, anUnstressedPointHasNoMultiplierAndNoMode) {
  const Study study =
      fieldStudy(Criterion::tsaiWu, graphiteEpoxy(), Angle(), Angle::fromDegrees(5), {{1.0}, {1.5}});
  const Result<ScreenPlan> plan = screenPlanOf(study, "field");
  const Field field = fieldOf(*plan, 2, [](std::size_t, std::size_t) { return PlaneStress{}; });
  const PointResult result = (*screened(*plan, field))[1];
  EXPECT_EQ(result.utilisation, 0);
  EXPECT_EQ(result.multiplier(), std::nullopt);
  EXPECT_EQ(result.mode, std::nullopt);
}

TEST(Screened, leavesOutWhatIsNotWhole) {
  const Study study = fieldStudy(Criterion::sumOfSquares, c24(), Angle(), Angle(), {{1.0}});
  const Result<ScreenPlan> plan = screenPlanOf(study, "field");
  Field field = fieldOf(*plan, 3, [](std::size_t, std::size_t) { return PlaneStress{1, 0, 0}; });
  field.setStanding(0, PointStanding::incomplete);
  field.setStanding(2, PointStanding::leftOut);
  const auto results = screened(*plan, field);
  EXPECT_FALSE((*results)[0].isJudged());
  EXPECT_TRUE((*results)[1].isJudged());
  EXPECT_FALSE((*results)[2].isJudged());
}

TEST(Screened, theWatchEndsIt) {
  const Study study = fieldStudy(Criterion::sumOfSquares, c24(), Angle(), Angle(), {{1.0}});
  const Result<ScreenPlan> plan = screenPlanOf(study, "field");
  const Field field = fieldOf(*plan, 5000, [](std::size_t, std::size_t) { return PlaneStress{1, 0, 0}; });
  EXPECT_EQ(screened(*plan, field, 2, [](std::size_t, std::size_t) { return false; }), std::nullopt);
}

} // namespace
} // namespace planewright
