// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/readout.h"

#include "core/study/place.h"

#include <algorithm>
#include <cassert>
#include <cmath>
#include <limits>

namespace planewright {

namespace {

double valueOf(const Study& study, Spot spot, const std::string& text) {
  if (text.empty()) {
    assert(rowOf(spot).mayBeEmpty);
    return 0;
  }
  const Result<Entry> entry = readEntry(text, entryKindOf(study, spot));
  assert(entry && "a valid study holds only texts that read");
  return entry->value;
}

Angle angleOf(const Study& study, Spot spot, const std::string& text) {
  return Angle::fromDegrees(valueOf(study, spot, text));
}

/// The components of one case at a point, evaluated.
struct CaseValues {
  std::string id;
  PlaneStress stress;
  double sz = 0;
  bool listed = false;
};

std::vector<CaseValues> caseValues(const Study& study, const Point& point) {
  std::vector<CaseValues> values;
  for (const LoadCase& loadCase : study.cases) {
    CaseValues one{loadCase.id, {}, 0, false};
    if (const CaseStress* stress = findStress(point, loadCase.id)) {
      one.stress = {valueOf(study, Spot::sx, stress->sx), valueOf(study, Spot::sy, stress->sy),
                    valueOf(study, Spot::txy, stress->txy)};
      one.sz = valueOf(study, Spot::sz, stress->sz);
      one.listed = true;
    }
    values.push_back(one);
  }
  return values;
}

void addTerm(StateReading& state, double factor, const CaseValues& values) {
  if (factor == 0)
    return;
  state.stress = state.stress + factor * values.stress;
  state.sz += factor * values.sz;
  state.scale += std::abs(factor) * scaleOf(values.stress);
  if (!values.listed)
    state.missing.push_back(values.id);
}

/// Of several terms that cancel only rounding is left: it is not shown as a stress, nor as a direction.
/// `scaleOfThird` is to σz what the state's scale is to the components in the plane.
void dropRounding(StateReading& state, double scaleOfThird) {
  constexpr double relative = 8 * std::numeric_limits<double>::epsilon();
  if (std::abs(state.sz) <= relative * scaleOfThird)
    state.sz = 0;
  const double noise = relative * state.scale;
  for (double* component : {&state.stress.sx, &state.stress.sy, &state.stress.txy})
    if (std::abs(*component) <= noise)
      *component = 0;
  if (circleOf(state.stress, state.scale).theta1)
    return;
  const double mean = state.stress.sx / 2 + state.stress.sy / 2;
  state.stress = {mean, mean, 0};
}

void resolve(StateReading& state, const Readout& readout) {
  state.circle = circleOf(state.stress, state.scale, state.sz);
  state.reading = tractionOn(state.stress, readout.reading);
  for (const LineReading& line : readout.lines)
    state.lines.push_back(inAxesOf(state.stress, line.angle));
  for (const WatchedReading& plane : readout.watched)
    state.watched.push_back(tractionOn(state.stress, plane.normal));
}

StateReading combinedState(const Study& study, const Combination& combination,
                           const std::vector<CaseValues>& cases) {
  StateReading state;
  state.combination = combination.name;
  double scaleOfThird = 0;
  for (const Factor& factor : combination.factors) {
    const auto values = std::ranges::find(cases, factor.caseId, &CaseValues::id);
    assert(values != cases.end());
    const double value = valueOf(study, Spot::factor, factor.factor);
    addTerm(state, value, *values);
    scaleOfThird += std::abs(value * values->sz);
  }
  if (combination.factors.size() > 1)
    dropRounding(state, scaleOfThird);
  return state;
}

StateReading singleState(const CaseValues& values, bool judged) {
  StateReading state;
  state.combination = values.id;
  state.judged = judged;
  addTerm(state, 1, values);
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
  if (point.line)
    readout.lines.push_back(readingOf(study, *point.line));
  for (const Line& line : extras.lines)
    readout.lines.push_back(readingOf(study, line));
  for (const WatchedPlane& plane : point.planes)
    readout.watched.push_back(readingOf(study, plane));
  for (const WatchedPlane& plane : extras.planes)
    readout.watched.push_back(readingOf(study, plane));
}

} // namespace

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
  readDirections(readout, study, *point, extras);
  const std::vector<CaseValues> cases = caseValues(study, *point);
  for (const Combination& combination : study.combinations)
    readout.states.push_back(combinedState(study, combination, cases));
  for (const CaseValues& values : cases)
    readout.states.push_back(singleState(values, study.combinations.empty()));
  for (StateReading& state : readout.states)
    resolve(state, readout);
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
  return point && findStress(*point, only) ? std::optional(only) : std::nullopt;
}

} // namespace planewright
