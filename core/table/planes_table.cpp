// SPDX-License-Identifier: GPL-3.0-or-later
#include "core/table/table.h"

#include "core/quantity/format.h"
#include "core/study/envelope.h"
#include "core/table/cautions.h"

#include <cassert>
#include <cmath>

namespace planewright {

namespace {

std::vector<Column> columnsOf(const Study& study) {
  const std::string& unit = study.units.stress;
  return {{"plane", PW_TEXT("Table", "Plane"), "", false},
          {"normal", PW_TEXT("Table", "normal at"), "", true},
          {"cut", PW_TEXT("Table", "cut at"), "", true},
          {"sn", symbol("σ_{n}"), unit, true},
          {"tnt", symbol("τ_{nt}"), unit, true}};
}

Text nameOf(const PlaneReading& plane) {
  switch (plane.kind) {
  case PlaneKind::reading:
    return PW_TEXT("Table", "Reading plane");
  case PlaneKind::x:
    return PW_TEXT("Table", "x face");
  case PlaneKind::y:
    return PW_TEXT("Table", "y face");
  case PlaneKind::s1:
    return PW_TEXT("Table", "Principal σ_{1}");
  case PlaneKind::s2:
    return PW_TEXT("Table", "Principal σ_{2}");
  case PlaneKind::shearMax:
    return PW_TEXT("Table", "Greatest shear, τ_{nt} > 0");
  case PlaneKind::shearMin:
    return PW_TEXT("Table", "Greatest shear, τ_{nt} < 0");
  case PlaneKind::crossing:
    return PW_TEXT("Table", "Crossing the %1 (stress along it)").with(plane.name);
  case PlaneKind::following:
    return PW_TEXT("Table", "Following the %1 (stress across it)").with(plane.name);
  case PlaneKind::watched:
    break;
  }
  return verbatim(plane.name);
}

int groupOf(PlaneKind kind) {
  switch (kind) {
  case PlaneKind::reading:
    return 0;
  case PlaneKind::x:
  case PlaneKind::y:
    return 1;
  case PlaneKind::s1:
  case PlaneKind::s2:
    return 2;
  case PlaneKind::shearMax:
  case PlaneKind::shearMin:
    return 3;
  case PlaneKind::crossing:
  case PlaneKind::following:
    return 4;
  case PlaneKind::watched:
    break;
  }
  return 5;
}

/// Folded angles lie in (-90, 90] deg, in what is shown too.
Cell angleCell(Angle angle) {
  const std::string shown = shownDegrees(angle, angleDecimals);
  const std::string least = shownDegrees(Angle::fromDegrees(-90), angleDecimals);
  return {verbatim(shown == least ? shownDegrees(Angle::fromDegrees(90), angleDecimals) : shown),
          angle.degrees()};
}

Cell stressCell(const StressForm& stresses, double stress) {
  return {verbatim(stresses.shown(stress)), stresses.inUnit(stress)};
}

/// A degenerate state has no angle of its own for these planes: every direction is one.
void addAngles(Row& row, const PlaneReading& plane) {
  if (plane.normal) {
    row.cells.push_back(angleCell(plane.normal->value));
    row.cells.push_back(angleCell(plane.cut()->value));
  } else {
    row.cells.push_back({PW_TEXT("Table", "every direction"), std::nullopt});
    row.cells.push_back({{}, std::nullopt});
  }
}

void addEnvelope(Row& row, const StressForm& stresses, const Readout& readout) {
  const std::optional<double> normal = row.cells[1].exact;
  if (!normal) {
    row.cells.resize(row.cells.size() + 3);
    return;
  }
  const Envelope envelope = *envelopeOn(readout, {Angle::fromDegrees(*normal)});
  for (const Extreme& extreme : {envelope.leastNormal, envelope.greatestNormal, envelope.greatestShear}) {
    Cell cell = stressCell(stresses, extreme.stress);
    cell.combination = readout.states[extreme.state].combination;
    row.cells.push_back(std::move(cell));
  }
}

Row rowOfPlane(const StressForm& stresses, const PlaneReading& plane, Text name) {
  Row row{plane.kind, plane.name, groupOf(plane.kind), {}};
  row.cells.push_back({std::move(name), std::nullopt});
  addAngles(row, plane);
  row.cells.push_back(stressCell(stresses, plane.traction.sn));
  row.cells.push_back(stressCell(stresses, plane.traction.tnt));
  return row;
}

} // namespace

Table planesTable(const Study& study, const Readout& readout, const StateReading& state) {
  Table table{columnsOf(study), {}, cautionsOf(readout, state)};
  const StressForm stresses = stressFormOf(study, state);
  for (const PlaneReading& plane : planesOf(readout, state))
    table.rows.push_back(rowOfPlane(stresses, plane, nameOf(plane)));
  return table;
}

Table withEnvelope(Table table, const Study& study, const Readout& readout) {
  if (judgedStates(readout) < 2)
    return table;
  const std::string& unit = study.units.stress;
  table.columns.push_back({"least_sn", PW_TEXT("Table", "least σ_{n}"), unit, true});
  table.columns.push_back({"greatest_sn", PW_TEXT("Table", "greatest σ_{n}"), unit, true});
  table.columns.push_back({"greatest_tnt", PW_TEXT("Table", "greatest |τ_{nt}|"), unit, true});
  const StressForm stresses = stressFormOf(study, readout);
  for (Row& row : table.rows)
    addEnvelope(row, stresses, readout);
  table.ofRange = cautionsOfEnvelope(readout);
  table.cautions.insert(table.cautions.end(), table.ofRange.begin(), table.ofRange.end());
  return table;
}

Table envelopeTable(const Study& study, const Readout& readout) {
  Table table = withEnvelope(planesTable(study, readout, readout.state()), study, readout);
  const auto isOfState = [](const Row& row) {
    return row.kind == PlaneKind::s1 || row.kind == PlaneKind::s2 || row.kind == PlaneKind::shearMax ||
           row.kind == PlaneKind::shearMin;
  };
  std::erase_if(table.rows, isOfState);
  const auto dropState = [](auto& cells) { cells.erase(cells.begin() + 3, cells.begin() + 5); };
  dropState(table.columns);
  for (Row& row : table.rows)
    dropState(row.cells);
  return table;
}

Table sweepTable(const Study& study, const Readout& readout, const StateReading& state, Angle step) {
  assert(step.degrees() >= 0.1 && step.degrees() <= 90);
  Table table{columnsOf(study), {}, cautionsOf(readout, state)};
  const StressForm stresses = stressFormOf(study, state);
  const int most = static_cast<int>(std::floor(90 / step.degrees() + 1e-9));
  for (int i = -most; i <= most; ++i) {
    const Angle angle = Angle::fromDegrees(i * step.degrees());
    if (angle.degrees() <= -90 + 1e-9)
      continue;
    const PlaneReading plane = planeAt(state, {angle});
    table.rows.push_back(rowOfPlane(stresses, plane, verbatim(shownDegrees(angle, angleDecimals))));
  }
  return table;
}

} // namespace planewright
