// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/study/check_edits.h"

#include "core/study/fresh_name.h"
#include "core/study/judge_checks.h"
#include "core/study/strength_rules.h"
#include "core/study/text_fields.h"

#include <algorithm>

namespace planewright {

namespace {

Place placeIn(const Point& point, const std::string& check, Spot spot) {
  return {spot, point.name, check};
}

/// The name of the first line or watched plane that a criterion acts on; none where the point has none.
std::optional<std::string> directionFor(const Point& point, Criterion criterion) {
  switch (rowOf(criterion).actsOn) {
  case ActsOn::line:
    return point.lines.empty() ? std::nullopt : std::optional(point.lines.front().name);
  case ActsOn::plane:
    return point.planes.empty() ? std::nullopt : std::optional(point.planes.front().name);
  case ActsOn::principal:
    break;
  }
  return std::string();
}

std::string freshId(const Point& point, const std::string& stem) {
  const auto isTaken = [&point](const std::string& id) { return findCheck(point, id) != nullptr; };
  return isTaken(stem) ? freshNameLike(stem, isTaken) : stem;
}

void typeDirection(Edits& edits, const Point& point, const std::string& id, Criterion criterion,
                   const std::string& name) {
  const ActsOn actsOn = rowOf(criterion).actsOn;
  edits.push_back(Type{placeIn(point, id, Spot::checkLine), actsOn == ActsOn::line ? name : ""});
  edits.push_back(Type{placeIn(point, id, Spot::checkPlane), actsOn == ActsOn::plane ? name : ""});
}

void typeCriterion(Edits& edits, const Point& point, const Check& check, Criterion criterion) {
  edits.push_back(Type{placeIn(point, check.id, Spot::checkCriterion), std::string(wordOf(criterion))});
  if (rowOf(criterion).actsOn != rowOf(check.criterion).actsOn)
    typeDirection(edits, point, check.id, criterion, directionFor(point, criterion).value_or(""));
  const std::vector<Spot> known = parametersOf(criterion);
  for (const TextField<ParameterTexts>& field : textFieldsOf<ParameterTexts>())
    if (std::ranges::find(known, field.spot) == known.end())
      edits.push_back(Type{placeIn(point, check.id, field.spot), ""});
}

/// Judges one more state by the criterion of a row.
void judge(SideBySide& row, const Readout& readout, std::size_t index, std::size_t check) {
  const CheckSetup& setup = readout.checks[check];
  const StateReading& state = readout.states[index];
  const CheckReading& reading = state.checks[check];
  const Result<Judge> judge =
      reading.hasFactor ? judgeBy(row.criterion, setup, row.isChosen ? setup.parameters : Parameters{},
                                  reading.factor.value, demandOf(readout, state))
                        : tl::unexpected(*reading.problem);
  if (!judge) {
    if (!row.problem)
      row.problem = judge.error();
    return;
  }
  const Band band = setup.band.value_or(Band{});
  const Judgement nominal = judge->at(band.nominal);
  const Judgement worst = judge->hasDirection() ? worstIn(*judge, band).judgement : nominal;
  if (row.state && worst.utilisation <= row.worst.utilisation)
    return;
  row.state = index;
  row.nominal = nominal;
  row.worst = worst;
}

} // namespace

std::optional<Edits> insertionOfCheck(const Study& study, const Point& point, const std::string& material) {
  const Material& of = *findMaterial(study, material);
  const Criterion criterion = criteriaFor(of.kind).front();
  const std::optional<std::string> direction = directionFor(point, criterion);
  if (!direction)
    return std::nullopt;
  const std::string id = freshId(point, direction->empty() ? material : *direction);
  Edits edits = {Insert{placeIn(point, id, Spot::check), std::nullopt},
                 Type{placeIn(point, id, Spot::checkMaterial), material},
                 Type{placeIn(point, id, Spot::checkCriterion), std::string(wordOf(criterion))}};
  typeDirection(edits, point, id, criterion, *direction);
  return edits;
}

Edits withMaterial(const Study& study, const Point& point, const Check& check, const std::string& material) {
  Edits edits = {Type{placeIn(point, check.id, Spot::checkMaterial), material}};
  const MaterialKind kind = findMaterial(study, material)->kind;
  if (!applies(check.criterion, kind))
    typeCriterion(edits, point, check, criteriaFor(kind).front());
  return edits;
}

Edits withCriterion(const Point& point, const Check& check, Criterion criterion) {
  Edits edits;
  typeCriterion(edits, point, check, criterion);
  return edits;
}

Edits withDirection(const Point& point, const Check& check, const std::string& name) {
  Edits edits;
  typeDirection(edits, point, check.id, check.criterion, name);
  return edits;
}

Standing SideBySide::standing() const {
  if (state && exceedsLimit(worst.utilisation))
    return Standing::exceeds;
  return problem || !state ? Standing::unjudged : Standing::within;
}

std::vector<SideBySide> criteriaSideBySide(const Readout& readout, std::size_t check) {
  const CheckSetup& setup = readout.checks[check];
  std::vector<SideBySide> rows;
  for (const Criterion criterion : criteriaFor(setup.strengths.kind)) {
    SideBySide& row = rows.emplace_back();
    row.criterion = criterion;
    row.isChosen = criterion == setup.criterion;
    for (std::size_t i = 0; i < readout.states.size(); ++i)
      if (readout.states[i].judged)
        judge(row, readout, i, check);
  }
  return rows;
}

} // namespace planewright
