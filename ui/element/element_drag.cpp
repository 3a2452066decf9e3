// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/element/element_drag.h"

#include "core/study/cut_text.h"

#include <cmath>

namespace planewright {

namespace {

constexpr double reach = 6; ///< px of arc within which a named direction takes the handle

} // namespace

std::optional<ElementHold> holdOf(const Readout& readout, ElementHandle handle) {
  if (handle == ElementHandle::reading)
    return ElementHold{
        handle, {Spot::reading, readout.point, {}}, readout.reading.value, directionsForNormal(readout)};
  if (handle == ElementHandle::line && !readout.lines.empty())
    return ElementHold{handle,
                       {Spot::lineAngle, readout.point, readout.lines.front().name},
                       readout.lines.front().angle.value,
                       directionsForLine(readout)};
  return std::nullopt;
}

ElementDrag::ElementDrag(const Study& study, const ElementHold& hold, const Facing& facing, QPointF pressed,
                         Gesture gesture)
    : m_handle(hold.handle), m_gesture(gesture), m_place(hold.place),
      m_startText(textAt(study, hold.place).value_or(std::string())), m_startFolded(hold.folded),
      m_startFacing(facing), m_turn(facing.shown(hold.folded)), m_slip(pressed), m_last(pressed) {}

std::optional<std::string> ElementDrag::moved(const ElementGeometry& geometry, const ElementHold& hold,
                                              QPointF to, Qt::KeyboardModifiers held, bool snapping) {
  const bool isDragged = m_handle != ElementHandle::line || m_slip.isOver(to);
  const std::optional<Angle> motion = isDragged ? geometry.motion(m_last, to) : std::nullopt;
  if (!motion || to == m_last)
    return std::nullopt;
  m_turn.move(*motion, held);
  m_last = to;
  if (std::abs((m_turn.now() - m_turn.start()).degrees()) < coinciding.degrees()) {
    m_onSnap = false;
    return m_startText;
  }
  const Rest rest = restOf(m_turn, snapping ? hold.directions : std::vector<NamedDirection>(),
                           geometry.arcOf(reach, m_handle), geometry.arcOf(1, m_handle), held);
  m_onSnap = rest.snapped();
  return angleText(rest.angle);
}

} // namespace planewright
