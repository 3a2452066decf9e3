// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/given/echoes.h"

#include "core/quantity/format.h"
#include "core/study/cut_text.h"
#include "core/study/place.h"
#include "core/table/table.h"
#include "ui/look/look.h"

#include <QCoreApplication>

#include <algorithm>
#include <cmath>

namespace planewright {

namespace {

QString stressWithUnit(const Study& study, const StateReading& state, double stress) {
  return fromUtf8(shownStress(study, state, stress) + " " + study.units.stress);
}

} // namespace

const StateReading* stateOfCase(const Readout& readout, const std::string& caseId) {
  const auto state = std::ranges::find(readout.states, caseId, &StateReading::combination);
  return state == readout.states.end() ? nullptr : &*state;
}

QString echoOfStress(const Study& study, const Readout& readout, const std::string& caseId,
                     const std::string& typed) {
  const StateReading* state = stateOfCase(readout, caseId);
  const Result<Entry> entry = readEntry(typed, entryKindOf(study, Spot::sx));
  return state && entry ? stressWithUnit(study, *state, entry->value) : QString();
}

QString echoOfThird(const Study& study, const Readout& readout, const std::string& caseId) {
  const StateReading* state = stateOfCase(readout, caseId);
  return state ? stressWithUnit(study, *state, state->sz) : QString();
}

QString echoOfLine(const Readout& readout, std::size_t index) {
  if (index >= readout.lines.size())
    return {};
  const Angle angle = readout.lines[index].angle.value;
  const QString degrees = fromUtf8(shownDegrees(angle, angleDecimals));
  const QString slope = fromUtf8(shownSlope(angle));
  if (slope.isEmpty())
    return QCoreApplication::translate("Echo", "%1 from +x").arg(degrees);
  return QCoreApplication::translate("Echo", "%1 from +x, %2").arg(degrees, slope);
}

QString echoOfTolerance(const Study& study, const Readout& readout, std::size_t index) {
  const std::vector<Line>& lines = shownPoint(study).lines;
  if (index >= lines.size() || lines[index].tolerance.empty())
    return {};
  return echoOfDirection(lines[index].tolerance, readout.lines[index].tolerance);
}

QString echoOfValue(const EntryKind& kind, const std::string& typed) {
  const Result<Entry> entry = readEntry(typed, kind);
  if (!entry || kind.dimension == dimension::angle)
    return {};
  const double value = kind.unit.fromBase(entry->value);
  const std::string unit = kind.unit.name.empty() ? "" : " " + kind.unit.name;
  if (typed == exactNumber(value) + unit)
    return {};
  return fromUtf8(shownNumber(value, decimalsFor(std::abs(value))) + unit);
}

QString echoOfDirection(const std::string& typed, Angle angle) {
  const std::string plainly = angleText(angle);
  return typed == plainly || typed + " deg" == plainly ? QString()
                                                       : fromUtf8(shownDegrees(angle, angleDecimals));
}

} // namespace planewright
