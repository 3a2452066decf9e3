// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/screen/opened_point.h"

#include "core/screen/one_point.h"
#include "core/study/verdict.h"
#include "tests/support/field_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

namespace planewright {
namespace {

// The study then says of the point what the field says of it.
RC_GTEST_PROP(OpenedPoint, saysTheSameAsItsRow, (const std::uint32_t& seed)) {
  Dice dice(seed + 1);
  const auto tolerance = *rc::gen::element(0.0, 1.0, 5.0, 30.0, 90.0);
  Study study =
      fieldStudy(*anyLineCriterion(), *anyLineStrengths(), Angle::fromDegrees(dice.between(-90, 90)),
                 Angle::fromDegrees(tolerance), {{1.35, 0}, {1.35, 1.5}, {1, -1.5}});
  study.units.stress = *rc::gen::element("MPa", "psi", "kPa", "ksi");
  study.convention.positive = *rc::gen::element(Positive::tension, Positive::compression);
  const Result<ScreenPlan> plan = screenPlanOf(study, "field");
  RC_ASSERT(plan.has_value());
  const bool hasOwn = *rc::gen::arbitrary<bool>();
  Field field = fieldOf(*plan, 40,
                        [&](std::size_t, std::size_t) {
                          return PlaneStress{dice.between(-80, 80), dice.between(-5, 5), dice.between(-9, 9)};
                        },
                        {false, hasOwn, hasOwn, false, false, false});
  for (std::size_t i = 0; hasOwn && i < field.size(); ++i) {
    field.setAxes(i, std::round(dice.between(-200, 200)));
    if (dice.below(2))
      field.setLine(i, dice.between(-200, 200));
  }
  const FieldResults results = *screened(*plan, field, 1);
  for (std::size_t i = 0; i < field.size(); ++i) {
    const Result<OpenedPoint> opened =
        openedPoint(study, "field", *plan, field, results, i, verbatim("deck.csv"));
    RC_ASSERT(opened.has_value());
    const Result<Study> with = edited(study, opened->edits);
    if (!with)
      RC_FAIL(plain(with.error()));
    RC_ASSERT(isScreenedAlike(study, *with, "field"));
    const Readout readout = evaluate(*with, opened->name);
    for (std::size_t k = 0; k < plan->cases.size(); ++k)
      RC_ASSERT(readout.cases[k].stress == field.stressOf(k, i));
    const PointResult row = results[i];
    const Verdict verdict = verdictOf(readout);
    RC_ASSERT(std::abs(verdict.governing->utilisation - row.utilisation) <= 1e-9 * row.utilisation);
    RC_ASSERT(readout.states[verdict.governing->state].combination == opened->combination);
    const CheckReading& reading = readingOf(readout, *verdict.governing);
    RC_ASSERT(reading.worst.mode == row.mode);
    const Angle turned = folded(Angle::fromDegrees(row.worstAngle - field.axesOf(i)));
    const double apart = folded(*reading.worstAngle - turned).degrees();
    RC_ASSERT(std::abs(apart) < 1e-5); // where the utilisation stands still its angle is not sharp
    const Angle nominal = readout.lines[0].angle.value;
    const double lineApart =
        folded(nominal - (lineAt(plan->checks[0], field, i) - Angle::fromDegrees(field.axesOf(i)))).degrees();
    RC_ASSERT(std::abs(lineApart) < 1e-9);
  }
}

TEST(OpenedPoint, takesAFreshNameWithItsLayerAndAPointThatLacksACaseNone) {
  const Study study =
      fieldStudy(Criterion::sumOfSquares, c24(), Angle(), Angle::fromDegrees(3), {{1.35, 1.5}});
  const Result<ScreenPlan> plan = screenPlanOf(study, "field");
  Field field(plan->cases, {true, false, false, false, false, false});
  for (const Layer layer : {Layer::none, Layer::top, Layer::mid}) {
    const std::size_t point = field.add("field", layer, 7);
    field.setStress(0, point, {1, 0, 0});
    if (layer != Layer::mid)
      field.setStress(1, point, {1, 0, 0});
    else
      field.setStanding(point, PointStanding::incomplete);
  }
  const FieldResults results = *screened(*plan, field, 1);
  const auto opened = [&](std::size_t point) {
    return openedPoint(study, "field", *plan, field, results, point, verbatim("deck.csv"));
  };
  EXPECT_EQ(opened(0)->name, "field 2");
  EXPECT_EQ(opened(1)->name, "field top");
  EXPECT_EQ(edited(study, opened(1)->edits)->points[1].note, "From deck.csv, line 7.");
  ASSERT_FALSE(opened(2));
  EXPECT_EQ(opened(2).error().line, 7);
}

TEST(OpenedPoint, onlyWhatJudgesTellsStudiesApart) {
  const Study study = fieldStudy(Criterion::sumOfSquares, c24(), Angle(), Angle(), {{1.35, 1.5}});
  Study other = study;
  other.title.subject = "another";
  other.points.push_back(study.points[0]);
  other.points.back().name = "more";
  other.points[0].reading = "5 deg";
  EXPECT_TRUE(isScreenedAlike(study, other, "field"));
  other.points[0].lines[0].angle = "1 deg";
  EXPECT_FALSE(isScreenedAlike(study, other, "field"));
  EXPECT_FALSE(isScreenedAlike(study, Study(), "field"));
}

} // namespace
} // namespace planewright
