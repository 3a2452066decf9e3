// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/planes/sweep_model.h"

#include <algorithm>
#include <cassert>

namespace planewright {

SweepModel::SweepModel(Desk& desk, QObject* parent) : TableModel(parent), m_desk(desk) {
  refresh();
}

void SweepModel::setStep(Angle step) {
  assert(step.degrees() >= leastStep && step.degrees() <= greatestStep);
  m_step = step;
  resetTable(swept());
}

void SweepModel::refresh() {
  setTable(swept());
}

Table SweepModel::swept() const {
  const Readout& readout = m_desk.readout();
  return withEnvelope(sweepTable(m_desk.study(), readout, readout.state(), m_step), m_desk.study(), readout);
}

int SweepModel::tintedRow() const {
  const Angle reading = m_desk.readout().reading.value;
  const auto distance = [reading](const Row& row) {
    const auto& normal = row.cells[static_cast<std::size_t>(PlaneColumn::normal)].exact;
    return apart(Angle::fromDegrees(normal.value_or(0)), reading);
  };
  const auto nearest = std::ranges::min_element(table().rows, {}, distance);
  return nearest == table().rows.end() ? -1 : static_cast<int>(nearest - table().rows.begin());
}

} // namespace planewright
