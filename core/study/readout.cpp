// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/readout.h"

#include "core/study/case_sources.h"
#include "core/study/combination_text.h"
#include "core/study/judge_checks.h"
#include "core/study/typed.h"

#include <algorithm>
#include <cassert>
#include <cmath>

namespace planewright {

namespace {

Angle angleOf(const Study& study, Spot spot, const std::string& text) {
  return Angle::fromDegrees(valueOf(study, spot, text));
}

/// Of parts that cancel only rounding is left: it is not shown as a stress.
void dropRounding(PlaneStress& stress, double scale) {
  for (double* component : {&stress.sx, &stress.sy, &stress.txy})
    *component = withoutRounding(*component, scale);
}

/// Sources speak with tension positive.
void addSources(CaseReading& reading, SourceStress made, Positive positive) {
  const double sense = positive == Positive::tension ? 1 : -1;
  reading.stress = reading.stress + sense * made.stress;
  reading.axial = sense * made.axial;
  reading.bending = sense * made.bending;
  reading.measured = sense * made.measured;
  reading.scale += made.scale;
  reading.isDirect = false;
  reading.cautions = std::move(made.cautions);
  dropRounding(reading.stress, reading.scale);
}

std::vector<CaseReading> caseReadings(const Study& study, const Point& point) {
  const Results<PointSources> sources = PointSources::of(study, point);
  assert(sources && "a valid study has only sources that can be worked out");
  std::vector<CaseReading> readings;
  for (const LoadCase& loadCase : study.cases) {
    CaseReading& one = readings.emplace_back();
    one.id = loadCase.id;
    one.duration = loadCase.duration;
    const CaseStress* stress = findStress(point, loadCase.id);
    if (!stress)
      continue;
    one.isListed = true;
    one.stress = {valueOf(study, Spot::sx, stress->sx), valueOf(study, Spot::sy, stress->sy),
                  valueOf(study, Spot::txy, stress->txy)};
    one.sz = valueOf(study, Spot::sz, stress->sz);
    one.typed = one.stress.sx;
    one.scale = scaleOf(one.stress);
    if (stress->isDirect())
      continue;
    Results<SourceStress> made = sources->stressOf(*stress);
    assert(made);
    addSources(one, *std::move(made), study.convention.positive);
  }
  return readings;
}

void addTerm(StateReading& state, double factor, const std::vector<CaseReading>& cases, std::size_t index) {
  if (factor == 0)
    return;
  const CaseReading& one = cases[index];
  state.stress = state.stress + factor * one.stress;
  state.sz += factor * one.sz;
  state.typed += factor * one.typed;
  state.axial += factor * one.axial;
  state.bending += factor * one.bending;
  state.measured += factor * one.measured;
  state.scale += std::abs(factor) * one.scale;
  state.acting.push_back({index, factor});
}

/// Of several terms that cancel only rounding is left: it is not shown as a stress, nor as a direction.
/// `scaleOfThird` is to σz what the state's scale is to the components in the plane.
void dropRounding(StateReading& state, double scaleOfThird) {
  state.sz = withoutRounding(state.sz, scaleOfThird);
  state.stress = withoutRounding(state.stress, state.scale);
}

void resolve(StateReading& state, const Readout& readout) {
  state.circle = circleOf(state.stress, state.scale, state.sz);
  state.reading = tractionOn(state.stress, readout.reading);
  for (const LineReading& line : readout.lines)
    state.lines.push_back(inAxesOf(state.stress, line.angle));
  for (const WatchedReading& plane : readout.watched)
    state.watched.push_back(tractionOn(state.stress, plane.normal));
  if (readout.edge)
    state.edge = freeEdgeOf(state.stress, *readout.edge);
}

StateReading combinedState(const Study& study, const Combination& combination,
                           const std::vector<CaseReading>& cases) {
  StateReading state;
  state.combination = combination.name;
  if (isMisnamed(study, combination))
    state.factors = textOf(combination);
  state.basis = combination.basis;
  double scaleOfThird = 0;
  for (const Factor& factor : combination.factors) {
    const auto one = std::ranges::find(cases, factor.caseId, &CaseReading::id);
    assert(one != cases.end());
    const double value = valueOf(study, Spot::factor, factor.factor);
    addTerm(state, value, cases, static_cast<std::size_t>(one - cases.begin()));
    scaleOfThird += std::abs(value * one->sz);
  }
  if (combination.factors.size() > 1)
    dropRounding(state, scaleOfThird);
  return state;
}

StateReading singleState(const std::vector<CaseReading>& cases, std::size_t index, bool judged) {
  StateReading state;
  state.combination = cases[index].id;
  state.judged = judged;
  addTerm(state, 1, cases, index);
  return state;
}

LineReading readingOf(const Study& study, const Line& line) {
  return {line.name,
          line.kind,
          line.angle,
          {folded(angleOf(study, Spot::lineAngle, line.angle))},
          angleOf(study, Spot::lineTolerance, line.tolerance)};
}

WatchedReading readingOf(const Study& study, const WatchedPlane& plane) {
  return {plane.name,
          {folded(angleOf(study, Spot::planeNormal, plane.normal))},
          angleOf(study, Spot::planeTolerance, plane.tolerance)};
}

/// Lines and planes of the point first, then those asked for besides.
void readDirections(Readout& readout, const Study& study, const Point& point, const Extras& extras) {
  readout.reading = {folded(angleOf(study, Spot::reading, point.reading))};
  readout.axes = angleOf(study, Spot::axes, point.axes);
  if (!point.freeEdge.empty())
    readout.edge = LineAngle{folded(angleOf(study, Spot::freeEdge, point.freeEdge))};
  for (const Line& line : point.lines)
    readout.lines.push_back(readingOf(study, line));
  for (const Line& line : extras.lines)
    readout.lines.push_back(readingOf(study, line));
  for (const WatchedPlane& plane : point.planes)
    readout.watched.push_back(readingOf(study, plane));
  for (const WatchedPlane& plane : extras.planes)
    readout.watched.push_back(readingOf(study, plane));
}

} // namespace

AlongParts alongPartsOf(const StateReading& state, LineAngle line) {
  const double cos = cosSin(line.value).cos;
  return {state.axial * cos * cos, state.bending * cos * cos};
}

std::vector<std::string> missingCases(const Readout& readout, const StateReading& state) {
  std::vector<std::string> ids;
  for (const ActingCase& acting : state.acting)
    if (!readout.cases[acting.index].isListed)
      ids.push_back(readout.cases[acting.index].id);
  return ids;
}

std::optional<LineAngle> PlaneReading::cut() const {
  if (!normal)
    return std::nullopt;
  return cutOf(*normal);
}

Readout evaluate(const Study& study, std::string_view name, const Extras& extras) {
  const Point* point = findPoint(study, name);
  assert(point);
  Readout readout;
  readout.point = point->name;
  readout.positive = study.convention.positive;
  readDirections(readout, study, *point, extras);
  readout.cases = caseReadings(study, *point);
  for (const Combination& combination : study.combinations)
    readout.states.push_back(combinedState(study, combination, readout.cases));
  for (std::size_t i = 0; i < readout.cases.size(); ++i)
    readout.states.push_back(singleState(readout.cases, i, study.combinations.empty()));
  for (StateReading& state : readout.states)
    resolve(state, readout);
  judgeChecks(readout, study, *point);
  const auto shown = std::ranges::find(readout.states, study.shown.combination, &StateReading::combination);
  readout.shown =
      shown == readout.states.end() ? 0 : static_cast<std::size_t>(shown - readout.states.begin());
  return readout;
}

Readout evaluate(const Study& study) {
  return evaluate(study, shownPoint(study).name);
}

std::optional<std::string> draggableCase(const Study& study, const Readout& readout) {
  const StateReading& state = readout.state();
  std::string only = state.combination;
  if (readout.shown < study.combinations.size()) {
    only.clear();
    for (const Factor& factor : study.combinations[readout.shown].factors) {
      const double value = valueOf(study, Spot::factor, factor.factor);
      if (value == 0)
        continue;
      if (value != 1 || !only.empty())
        return std::nullopt;
      only = factor.caseId;
    }
  }
  const Point* point = findPoint(study, readout.point);
  const CaseStress* stress = point ? findStress(*point, only) : nullptr;
  return stress && stress->isDirect() ? std::optional(only) : std::nullopt;
}

} // namespace planewright
