// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"
#include "ui/desk/slip.h"
#include "ui/desk/turning.h"
#include "ui/element/facing.h"
#include "ui/element/geometry.h"

namespace planewright {

/// A handle of the element and the typed text that it turns.
struct ElementHold {
  ElementHandle handle = ElementHandle::none;
  Place place;
  Angle folded; ///< as it reads now
  std::vector<NamedDirection> directions;
};
/// The reading plane or the first line of a readout; none where there is no line.
std::optional<ElementHold> holdOf(const Readout& readout, ElementHandle handle);

/// One drag of a handle, from press to release: one gesture, so one step of undo.
class ElementDrag {
public:
  ElementDrag(const Study& study, const ElementHold& hold, const Facing& facing, QPointF pressed,
              Gesture gesture);

  ElementHandle handle() const { return m_handle; }
  Gesture gesture() const { return m_gesture; }
  const Place& place() const { return m_place; }
  /// The text at the start, which Escape puts back.
  const std::string& startText() const { return m_startText; }
  Angle startAngle() const { return m_startFolded; }
  const Facing& startFacing() const { return m_startFacing; }
  /// Where the hand wants the handle, not folded.
  Angle wanted() const { return m_turn.now(); }
  bool onSnap() const { return m_onSnap; }

  /// The text that the pointer's next place asks for; none while it asks for nothing: a bar starts to move
  /// after 4 px, and near the centre a place has no direction. Back at the press the start's text stands.
  std::optional<std::string> moved(const ElementGeometry& geometry, const ElementHold& hold, QPointF to,
                                   Qt::KeyboardModifiers held, bool snapping);

private:
  ElementHandle m_handle;
  Gesture m_gesture;
  Place m_place;
  std::string m_startText;
  Angle m_startFolded;
  Facing m_startFacing;
  Turn m_turn;
  Slip m_slip;
  QPointF m_last;
  bool m_onSnap = false;
};

} // namespace planewright
