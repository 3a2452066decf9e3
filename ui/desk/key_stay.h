// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/desk/desk.h"

namespace planewright {

/// Keys pressed one after the other on one handle: one gesture, and so one step of undo, until the place, the
/// focus or the history changes.
class KeyStay {
public:
  /// The gesture of a key that changes this place.
  Gesture gestureOn(const Place& place, Desk& desk) {
    if (place != m_place || desk.undoStack()->index() != m_index)
      m_gesture = desk.newCommand();
    m_place = place;
    return m_gesture;
  }
  /// After what the key asked for.
  void pressed(Desk& desk) { m_index = desk.undoStack()->index(); }
  /// The next key begins another stay.
  void end() { m_place.reset(); }

private:
  std::optional<Place> m_place;
  Gesture m_gesture;
  int m_index = -1; ///< where the undo stack stood after the last key
};

} // namespace planewright
