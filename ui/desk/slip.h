// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include <QLineF>

namespace planewright {

/// A press that is a drag only when it has moved by 4 px, for handles that change what is given: an unsteady
/// click changes nothing.
class Slip {
public:
  explicit Slip(QPointF pressed) : m_pressed(pressed) {}

  QPointF pressed() const { return m_pressed; }
  /// Whether the pointer, which is now at `to`, has moved so far at any time.
  bool isOver(QPointF to) {
    constexpr double most = 4;
    m_isOver = m_isOver || QLineF(m_pressed, to).length() >= most;
    return m_isOver;
  }

private:
  QPointF m_pressed;
  bool m_isOver = false;
};

} // namespace planewright
