// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

class QKeyEvent;

namespace planewright {

/// Whether a key that a text field would take for itself is the window's: Ctrl+E, which on some platforms
/// means the end of the line and here the figure, and undo and redo of the study while the field has nothing
/// of its own to undo or redo.
bool isForWindow(const QKeyEvent& key, bool canUndo, bool canRedo);

} // namespace planewright
