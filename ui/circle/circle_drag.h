// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/circle/circle_layers.h"
#include "ui/desk/desk.h"
#include "ui/desk/slip.h"
#include "ui/desk/turning.h"

#include <variant>

namespace planewright {

/// The reading mark on its way round the circle. Only the angle of the pointer counts, as seen from the
/// centre.
class ReadingDrag {
public:
  ReadingDrag(const Stage& stage, QPointF pointer);

  /// What the pointer's next place asks for; a named direction within 6 px of arc takes the mark.
  Edits moved(const Stage& stage, QPointF pointer, Qt::KeyboardModifiers held);
  Edits restored() const { return {Type{m_place, m_before}}; }
  const std::vector<Text>& on() const { return m_on; }

private:
  Place m_place;
  std::string m_before;
  Turn m_turn;
  QPointF m_last;
  std::vector<Text> m_on;
};

/// The x mark drawn by its ear: changes sx and txy of the one case that the shown state is.
class EarDrag {
public:
  /// `caseId` is the draggable case.
  EarDrag(const Stage& stage, const std::string& caseId, QPointF pointer);

  /// What the pointer's next place asks for: nothing while it may only have slipped; back at the press the
  /// texts of the start.
  Edits moved(const Stage& stage, QPointF pointer);
  Edits restored() const { return m_before; }

private:
  std::string m_caseId;
  Slip m_slip;
  QPointF m_hold; ///< from the pointer to the x mark
  Edits m_before;
};

/// Puts the x mark at this pair of values in the study's stress unit: each that moves by half a step or more
/// a number rounded to the power of ten next below `step`, with its unit.
Edits xFaceEdits(const Study& study, const Readout& readout, const std::string& caseId, QPointF values,
                 double step);

/// The drag that is going on: one gesture, so one step of undo.
struct CircleDrag {
  std::variant<ReadingDrag, EarDrag> hand;
  Gesture gesture;
};

Place readingPlace(const Readout& readout);

} // namespace planewright
