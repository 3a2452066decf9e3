// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/envelope.h"

#include "core/study/governing.h"
#include "tests/support/study_gen.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

namespace planewright {
namespace {

NormalAngle anyNormal() {
  return {Angle::fromDegrees(*rc::gen::inRange(-90000, 90001) / 1000.0)};
}

/// A study whose combinations are many and often equal, so that ties come up.
Study studyOfMany() {
  Study study = *anyStudy();
  const int count = *rc::gen::inRange(0, 30);
  for (int i = 0; i < count; ++i)
    study.combinations.push_back({"more " + std::to_string(i),
                                  {{study.cases.front().id, std::to_string(*rc::gen::inRange(-3, 4))}},
                                  Basis::design});
  return study;
}

RC_GTEST_PROP(Envelope, BoundsEveryJudgedStateAndIsAttainedByTheStatesItNames, ()) {
  const Readout readout = evaluate(studyOfMany());
  const NormalAngle normal = anyNormal();
  const std::optional<Envelope> envelope = envelopeOn(readout, normal);
  RC_ASSERT(envelope.has_value() == (judgedStates(readout) >= 2));
  if (!envelope)
    return;
  for (const StateReading& state : readout.states) {
    if (!state.judged)
      continue;
    const Traction traction = tractionOn(state.stress, normal);
    RC_ASSERT(traction.sn >= envelope->leastNormal.stress);
    RC_ASSERT(traction.sn <= envelope->greatestNormal.stress);
    RC_ASSERT(traction.tnt >= envelope->leastTnt.stress);
    RC_ASSERT(traction.tnt <= envelope->greatestTnt.stress);
    RC_ASSERT(std::abs(traction.tnt) <= envelope->greatestShear.stress);
  }
  const auto at = [&](const Extreme& extreme) {
    RC_ASSERT(readout.states[extreme.state].judged);
    return tractionOn(readout.states[extreme.state].stress, normal);
  };
  RC_ASSERT(at(envelope->leastNormal).sn == envelope->leastNormal.stress);
  RC_ASSERT(at(envelope->greatestNormal).sn == envelope->greatestNormal.stress);
  RC_ASSERT(at(envelope->leastTnt).tnt == envelope->leastTnt.stress);
  RC_ASSERT(at(envelope->greatestTnt).tnt == envelope->greatestTnt.stress);
  RC_ASSERT(std::abs(at(envelope->greatestShear).tnt) == envelope->greatestShear.stress);
}

RC_GTEST_PROP(Governing, NoStateOfAnyPointIsWorseAndTheNamedOnesAttainIt, ()) {
  const Study study = studyOfMany();
  std::vector<Readout> points;
  for (const Point& point : study.points)
    points.push_back(evaluate(study, point.name));
  const std::optional<GoverningStates> worst = governingOf(points);
  RC_ASSERT(worst.has_value());
  for (const Readout& readout : points)
    for (const StateReading& state : readout.states) {
      if (!state.judged)
        continue;
      RC_ASSERT(state.circle.s1 <= worst->principal.stress);
      RC_ASSERT(state.circle.radius <= worst->shear.stress);
    }
  const auto named = [&](const Governing& governing) {
    const auto readout = std::ranges::find(points, governing.point, &Readout::point);
    RC_ASSERT(readout != points.end());
    const StateReading& state = readout->states[governing.state];
    RC_ASSERT(state.judged);
    RC_ASSERT(state.combination == governing.combination);
    return state;
  };
  RC_ASSERT(named(worst->principal).circle.s1 == worst->principal.stress);
  RC_ASSERT(named(worst->shear).circle.radius == worst->shear.stress);
}

RC_GTEST_PROP(Governing, AStateGovernsWhereNoJudgedOneIsWorse, ()) {
  const Readout readout = evaluate(studyOfMany());
  for (const StateReading& state : readout.states) {
    const auto isWorse = [&](double Circle::*measure) {
      return std::ranges::any_of(readout.states, [&](const StateReading& other) {
        return other.judged && other.circle.*measure > state.circle.*measure;
      });
    };
    const bool counts = state.judged && judgedStates(readout) >= 2;
    const Governs expected{counts && !isWorse(&Circle::s1), counts && !isWorse(&Circle::radius)};
    RC_ASSERT(governs(readout, state) == expected);
  }
}

} // namespace
} // namespace planewright
