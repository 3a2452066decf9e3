// SPDX-License-Identifier: GPL-3.0-or-later
#pragma once

#include "ui/shell/filing.h"

class QWidget;

namespace planewright {

/// The questions asked by dialogs over this window.
FileQuestions askedOver(QWidget& window);

} // namespace planewright
