// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/circle/circle_drag.h"

#include "core/quantity/format.h"
#include "core/study/cut_text.h"

#include <cmath>

namespace planewright {

namespace {

/// Pixels of arc within which a named direction takes the mark.
constexpr double snapReach = 6;

Place stressPlace(const Readout& readout, const std::string& caseId, Spot spot) {
  return {spot, readout.point, caseId};
}

Type asTyped(const Study& study, const Place& place) {
  return {place, textAt(study, place).value_or(std::string())};
}

} // namespace

Place readingPlace(const Readout& readout) {
  return {Spot::reading, readout.point, {}};
}

ReadingDrag::ReadingDrag(const Stage& stage, QPointF pointer)
    : m_place(readingPlace(stage.readout)), m_before(asTyped(stage.study, m_place).text),
      m_turn(stage.readout.reading.value), m_last(pointer) {}

Edits ReadingDrag::moved(const Stage& stage, QPointF pointer, Qt::KeyboardModifiers held) {
  const Round round = stage.round();
  m_turn.move(round.turnBetween(m_last, pointer), held);
  m_last = pointer;
  Rest rest = restOf(m_turn, directionsForNormal(stage.readout), round.turnAlong(snapReach),
                     round.turnAlong(1), held);
  m_on = std::move(rest.on);
  return {Type{m_place, angleText(rest.angle)}};
}

EarDrag::EarDrag(const Stage& stage, const std::string& caseId, QPointF pointer)
    : m_caseId(caseId), m_slip(pointer), m_hold(xMarkAt(stage) - pointer) {
  for (const Spot spot : {Spot::sx, Spot::txy})
    m_before.push_back(asTyped(stage.study, stressPlace(stage.readout, caseId, spot)));
}

Edits EarDrag::moved(const Stage& stage, QPointF pointer) {
  if (!m_slip.isOver(pointer))
    return {};
  if (pointer == m_slip.pressed())
    return m_before;
  return xFaceEdits(stage.study, stage.readout, m_caseId, stage.scale.valuesAt(pointer + m_hold),
                    1 / stage.scale.pixelsPerUnit());
}

Edits xFaceEdits(const Study& study, const Readout& readout, const std::string& caseId, QPointF values,
                 double step) {
  const QPointF present = plotted(study, planeAt(readout.state(), {Angle()}).traction);
  Edits edits;
  // What stands still keeps the text that was typed for it.
  const auto move = [&](Spot spot, double value, double from) {
    if (std::abs(value - from) < step / 2)
      return;
    const std::string number = exactNumber(roundedTo(value, decadeBelow(step)));
    edits.push_back(Type{stressPlace(readout, caseId, spot), number + " " + study.units.stress});
  };
  move(Spot::sx, values.x(), present.x());
  move(Spot::txy, values.y(), present.y());
  return edits;
}

} // namespace planewright
