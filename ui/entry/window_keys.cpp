// SPDX-License-Identifier: GPL-3.0-or-later
#include "ui/entry/window_keys.h"

#include <QKeyEvent>

namespace planewright {

bool isForWindow(const QKeyEvent& key, bool canUndo, bool canRedo) {
  return (key.key() == Qt::Key_E && key.modifiers() == Qt::ControlModifier) ||
         (!canUndo && key.matches(QKeySequence::Undo)) || (!canRedo && key.matches(QKeySequence::Redo));
}

} // namespace planewright
